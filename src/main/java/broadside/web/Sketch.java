package broadside.web;

import broadside.action.Foot;
import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Loads;
import broadside.codes.WindCode;
import broadside.job.JobReader;
import broadside.quantity.Dimension;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Units;
import broadside.web.FormView.Picture;
import java.util.Optional;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/** The drawing beside the form while it is filled in: as soon as the sizes can be read, and with forces when all can. */
final class Sketch {

    private final Assessor assessor;
    private final JobReader reader;
    private final Documents documents;

    Sketch(Assessor assessor, JobReader reader, Documents documents) {
        this.assessor = assessor;
        this.reader = reader;
        this.documents = documents;
    }

    /** Where the drawing of the item on a form is, and what it shows in words. */
    Picture picture(Draft draft, JsonNode job) {
        ObjectNode one = alone(job, draft.index());
        Optional<Job> whole = reader.read(one).job();
        ObjectNode source = whole.isPresent() ? one : standIn(one);
        Optional<Job> drawn = whole.isPresent() ? whole : reader.read(source).job();
        if (drawn.isEmpty() || !Token.fits(source)) {
            return new Picture("", "The drawing appears here as soon as the sizes can be read.");
        }
        return new Picture("/drawing.svg?item=0" + (whole.isPresent() ? "" : "&loads=no") + "&j=" + Token.of(source),
            documents.words(drawn.get().items().get(0), whole.flatMap(j -> loads(j, 0)), FormReader.units(draft.answers())));
    }

    /** The same for the script of the page, with how each quantity is read. */
    byte[] json(Draft draft, JsonNode job) {
        Picture picture = picture(draft, job);
        ObjectNode answer = JsonNodeFactory.instance.objectNode();
        answer.put("source", picture.source()).put("words", picture.words()).put("status", status(draft, job, picture));
        ObjectNode readings = answer.putObject("readings");
        draft.quantities(leaf -> readings.put(leaf.path(), Questions.reading(draft.answers().get(leaf.path()), leaf.field().dimension().orElseThrow(),
            leaf.unit(FormReader.units(draft.answers())))));
        return answer.toString().getBytes(java.nio.charset.StandardCharsets.UTF_8);
    }

    private String status(Draft draft, JsonNode job, Picture picture) {
        Optional<Job> whole = reader.read(alone(job, draft.index())).job();
        if (picture.source().isEmpty()) {
            return picture.words();
        }
        if (whole.isEmpty()) {
            return "The drawing shows the sizes typed so far.";
        }
        try {
            return status(assessor.assess(whole.get()).items().get(0), FormReader.units(draft.answers()));
        } catch (BadJob e) {
            return "The drawing is up to date.";
        }
    }

    private static String status(ItemResult result, Units units) {
        String outside = result.outcome() == ItemResult.Outcome.OUTSIDE_SCOPE ? ItemResult.OUTSIDE + ". " : "";
        return outside + result.loads().map(l -> "Preliminary: " + l.level().name() + " wind force "
            + Show.of(l.governs("base-shear").baseShear(), Dimension.FORCE, units, 3, Rounding.UP).text() + (l.foot() == Foot.NONE ? "" : ", " + l.foot().moment() + " "
            + Show.of(l.governs("base-moment").baseMoment(), Dimension.MOMENT, units, 3, Rounding.UP).text()) + ".")
            .orElse(outside.isEmpty() ? "The drawing is up to date. The code has no loads for this item." : "No loads are given for it.");
    }

    /** The loads of an item of a job, when the code has them. */
    Optional<Loads> loads(Job job, int item) {
        try {
            ItemResult result = assessor.assess(job).items().get(item);
            return result.loads();
        } catch (BadJob e) {
            return Optional.empty();
        }
    }

    private static ObjectNode alone(JsonNode job, int index) {
        ObjectNode one = ((ObjectNode) job).deepCopy();
        JsonNode item = job.path("items").path(index);
        one.putArray("items").add(item.isObject() && item.path("held-by").asString("").isEmpty() ? ((ObjectNode) item.deepCopy()).without("held-by") : item);
        return one;
    }

    /** A job around the item of a form whose other answers cannot be read yet; only its sizes are drawn from it. */
    private ObjectNode standIn(ObjectNode one) {
        ObjectNode job = JsonNodeFactory.instance.objectNode();
        WindCode code = assessor.codes().code(assessor.codes().editions().get(0)).orElseThrow();
        String key = code.edition().key();
        job.put("broadside", 1);
        if (one.path("units").isString()) {
            job.set("units", one.get("units"));
        }
        job.putObject("basis").put("code", key.substring(0, key.indexOf('/'))).put("edition", key.substring(key.indexOf('/') + 1));
        job.putObject("site").put("basic-speed", "20 m/s").put("averaging", code.terms().averaging().words())
            .put("terrain", FormReader.UNKNOWN);
        job.set("items", one.get("items"));
        return job;
    }
}
