package broadside.job;

import broadside.assess.BadJob;
import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.codes.CodeLibrary;
import broadside.codes.WindCode;
import broadside.panel.Item;
import broadside.quantity.Quantity;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SpeedConversion;
import broadside.trace.OwnValue;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tools.jackson.databind.JsonNode;

/** Reads a job. All problems are gathered, each with its place, so that all can be mended at once. */
public final class JobReader {

    /** Values set in place of calculated ones lie between these, in SI. */
    private static final double LEAST_OVERRIDE = 1e-6;
    private static final double MOST_OVERRIDE = 1e9;

    private final CodeLibrary codes;
    private final SpeedConversion conversion;

    public JobReader(CodeLibrary codes, SpeedConversion conversion) {
        this.codes = codes;
        this.conversion = conversion;
    }

    /** A job with the JSON it was read from, or what does not fit. */
    public record Result(Optional<Job> job, List<Problem> problems) {

        /** The job; throws {@link BadJob} when something does not fit. */
        public Job orThrow() {
            return job.orElseThrow(() -> new BadJob(problems));
        }
    }

    /** Reads the bytes of a job file. */
    public Job read(byte[] bytes) {
        return read(JobText.read(bytes)).orThrow();
    }

    /** Reads a job from its JSON. */
    public Result read(JsonNode node) {
        List<Problem> problems = new ArrayList<>();
        Values values = new StructureReader(problems).read(node, Shapes.JOB, "");
        if (values.whole("broadside").filter(v -> v != 1).isPresent()) {
            problems.add(new Problem("broadside", "is " + values.whole("broadside").get() + "; this version reads job files of version 1"));
        }
        Optional<Job.Basis> basis = values.object("basis").flatMap(v -> basis(v, problems));
        Optional<Site> site = values.object("site").flatMap(v -> new SiteReader(codes, conversion, problems).read(v, basis));
        List<Item> items = items(values, basis.flatMap(b -> codes.code(b.key())), problems);
        List<OwnValue> overrides = overrides(values.list("overrides"), problems);
        List<Job.Compared> compared = compared(values.list("comparison"), problems);
        if (!problems.isEmpty()) {
            return new Result(Optional.empty(), List.copyOf(problems));
        }
        return new Result(Optional.of(new Job(header(values), basis.orElseThrow(), site.orElseThrow(), items, remarks(values), overrides,
            compared)), List.of());
    }

    private Optional<Job.Basis> basis(Values values, List<Problem> problems) {
        Optional<String> code = values.text("code");
        Optional<String> edition = values.text("edition");
        if (code.isEmpty() || edition.isEmpty()) {
            return Optional.empty();
        }
        Job.Basis basis = new Job.Basis(code.get(), edition.get(), values.text("overlay"), values.text("stability"), values.text("design"));
        String plain = code.get() + "/" + edition.get();
        if (!codes.editions().contains(plain)) {
            problems.add(new Problem(values.at("code"), "\"" + StructureReader.clean(plain) + "\" is not among the codes: "
                + String.join(", ", codes.editions())));
            return Optional.empty();
        }
        if (basis.overlay().isPresent() && codes.code(basis.key()).isEmpty()) {
            List<String> there = codes.overlays(plain).stream().map(k -> k.substring(plain.length() + 1)).toList();
            problems.add(new Problem(values.at("overlay"), "\"" + StructureReader.clean(basis.overlay().get()) + "\" is not an overlay of " + plain
                + (there.isEmpty() ? "; it has none" : "; there are " + String.join(", ", there))));
            return Optional.empty();
        }
        return Optional.of(basis);
    }

    private static List<Item> items(Values values, Optional<WindCode> code, List<Problem> problems) {
        List<Values> list = values.list("items");
        ItemReader reader = new ItemReader(problems, code);
        List<Item> items = new ArrayList<>();
        Set<String> marks = new HashSet<>();
        for (Values item : list) {
            item.text("mark").filter(m -> !marks.add(m)).ifPresent(m ->
                problems.add(new Problem(item.at("mark"), "\"" + StructureReader.clean(m) + "\" stands twice; each item needs its own mark")));
            reader.read(item).ifPresent(items::add);
        }
        return items;
    }

    private static List<OwnValue> overrides(List<Values> list, List<Problem> problems) {
        List<OwnValue> overrides = new ArrayList<>();
        Set<String> names = new HashSet<>();
        for (Values each : list) {
            Optional<OwnValue> own = override(each);
            own.filter(o -> !names.add(o.name())).ifPresent(o -> problems.add(new Problem(each.at("name"), "\"" + StructureReader.clean(o.name())
                + "\" stands twice; a value is replaced once")));
            own.filter(o -> !(o.value() >= LEAST_OVERRIDE && o.value() <= MOST_OVERRIDE)).ifPresent(o -> problems.add(new Problem(each.at("value"),
                "must be above 0 and of a usual size; " + o.value() + (o.unit().equals("1") ? "" : " " + o.unit()) + " is not")));
            own.ifPresent(overrides::add);
        }
        return overrides;
    }

    /** Speeds and terrains typed for single codes of the comparison. */
    private List<Job.Compared> compared(List<Values> list, List<Problem> problems) {
        List<Job.Compared> compared = new ArrayList<>();
        for (Values each : list) {
            String key = each.text("code").orElse("") + "/" + each.text("edition").orElse("");
            Optional<WindCode> code = codes.code(key);
            if (code.isEmpty() && each.text("code").isPresent() && each.text("edition").isPresent()) {
                problems.add(new Problem(each.at("code"), "\"" + StructureReader.clean(key) + "\" is not among the codes: " + String.join(", ", codes.editions())));
            }
            Optional<String> terrain = each.text("terrain");
            code.filter(c -> terrain.isPresent() && !c.terms().hasTerrain(terrain.get())).ifPresent(c -> problems.add(new Problem(each.at("terrain"), "\""
                + StructureReader.clean(terrain.get()) + "\" is not a terrain class of " + c.edition().property("title") + "; it has " + c.terms().terrainNames())));
            Optional<Speed> speed = each.quantity("basic-speed", Speed.class);
            speed.filter(s -> !(s.metresPerSecond() >= 1 && s.metresPerSecond() <= 150)).ifPresent(s ->
                problems.add(new Problem(each.at("basic-speed"), "must lie between 1 m/s and 150 m/s")));
            compared.add(new Job.Compared(key, speed, terrain));
        }
        return compared;
    }

    /** An older word for the topographic factor is kept. */
    private static Optional<OwnValue> override(Values values) {
        Optional<String> name = values.text("name").map(n -> n.equals("orography") ? "topography-factor" : n);
        Optional<String> reason = values.text("reason");
        if (name.isEmpty() || reason.isEmpty()) {
            return Optional.empty();
        }
        Optional<Quantity> quantity = values.quantity("value", Quantity.class);
        return quantity.map(q -> new OwnValue(name.get(), q.si(), unit(q), reason.get()))
            .or(() -> values.number("value").map(v -> new OwnValue(name.get(), v, "1", reason.get())));
    }

    private static String unit(Quantity quantity) {
        return quantity.dimension().siUnit().replace("m3", "m³").replace("m2", "m²");
    }

    private static Map<String, String> header(Values values) {
        Map<String, String> header = new LinkedHashMap<>();
        for (Field field : Shapes.HEADER) {
            values.text(field.name()).ifPresent(text -> header.put(field.name(), text));
        }
        for (String name : List.of("terrain-reason", "ground-nearby")) {
            values.object("site").flatMap(s -> s.text(name)).ifPresent(text -> header.put(name, text));
        }
        return header;
    }

    private static Map<String, String> remarks(Values values) {
        Map<String, String> remarks = new LinkedHashMap<>();
        for (Values item : values.list("items")) {
            for (String name : Shapes.REMARK_NAMES) {
                item.text(name).ifPresent(text -> remarks.put(item.text("mark").orElse("") + "/" + name, text));
            }
        }
        return remarks;
    }
}
