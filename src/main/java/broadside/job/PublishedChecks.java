package broadside.job;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.site.SpeedConversion;
import broadside.table.TableFiles;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import tools.jackson.databind.JsonNode;

/** Runs published cases: files that hold a job or a part of one, and what a publication prints for it. */
public final class PublishedChecks {

    private final Assessor assessor;
    private final JobReader reader;
    private final Supplier<Parts> making;
    private Parts parts; // made when checks are first run

    public PublishedChecks(Assessor assessor, JobReader reader, SpeedConversion conversion) {
        this.assessor = assessor;
        this.reader = reader;
        this.making = () -> new Parts(conversion, assessor.codes(), assessor.catalogue(), assessor.tables());
    }

    /** The cases that ship with the tool. */
    public List<PublishedCheck> shipped() {
        return run(TableFiles.shipped("examples/published"));
    }

    /** Runs files by their names; files that do not end in .json are left out. */
    public synchronized List<PublishedCheck> run(Map<String, byte[]> files) {
        parts = parts == null ? making.get() : parts;
        List<PublishedCheck> checks = new ArrayList<>();
        files.forEach((name, bytes) -> {
            if (name.endsWith(".json")) {
                checks.add(run(name, bytes));
            }
        });
        return checks;
    }

    private PublishedCheck run(String name, byte[] bytes) {
        try {
            JsonNode file = JobText.read(bytes);
            return run(name, file);
        } catch (BadJob e) {
            return broken(name, e.problems().get(0).line());
        }
    }

    private PublishedCheck run(String name, JsonNode file) {
        String title = text(file, "title");
        JsonNode source = file.path("source");
        Optional<Status> status = Status.of(text(source, "status")).filter(s -> s != Status.GIVEN);
        JsonNode expected = file.path("expected");
        if (title.isEmpty() || status.isEmpty() || !expected.isArray() || expected.isEmpty() || !file.path("given").isObject()) {
            return broken(name, "a published check has title, source with a status, given and a list of expected values");
        }
        PublishedCheck.Source printed = new PublishedCheck.Source(text(source, "publication"), text(source, "edition"), text(source, "place"), status.get());
        if (file.has("trap") && !file.get("trap").isBoolean()) {
            return broken(name, "trap must be true or false, without quotation marks");
        }
        boolean trap = file.path("trap").isBoolean() && file.path("trap").booleanValue();
        List<PublishedCheck.Line> lines = new ArrayList<>();
        Sheets sheets = sheets(file.get("given"));
        for (JsonNode each : expected) {
            lines.add(line(each, sheets, trap));
        }
        return new PublishedCheck(name, title, printed, trap, lines);
    }

    /** The calculation sheets of a job by the marks of its items, or of a part under an empty mark; or why there are none. */
    private record Sheets(Map<String, Trace> byMark, Map<String, String> failures) { }

    private Sheets sheets(JsonNode given) {
        try {
            if (given.has("part")) {
                return new Sheets(Map.of("", parts.run(given)), Map.of());
            }
            Job job = reader.read(given).orThrow();
            Assessment assessment = assessor.assess(job);
            Map<String, Trace> sheets = new java.util.LinkedHashMap<>();
            Map<String, String> failures = new java.util.LinkedHashMap<>();
            for (ItemResult item : assessment.items()) {
                sheets.put(item.item().mark(), item.sheet());
                item.refusal().ifPresent(r -> failures.put(item.item().mark(), r.reason()));
            }
            return new Sheets(sheets, failures);
        } catch (BadJob e) {
            return new Sheets(Map.of(), Map.of("", e.problems().get(0).line()));
        } catch (ArithmeticException e) {
            return new Sheets(Map.of(), Map.of("", "the calculation has no result: " + e.getMessage()));
        }
    }

    private static PublishedCheck.Line line(JsonNode expected, Sheets sheets, boolean trap) {
        String item = text(expected, "item");
        String step = text(expected, "step");
        String why = text(expected, "why");
        Trace sheet = item.isEmpty() && sheets.byMark().size() == 1 ? sheets.byMark().values().iterator().next() : sheets.byMark().get(item);
        if (sheet == null) {
            return failed(expected, item, step, why, sheets.failures().getOrDefault("", "no item has the mark \"" + item + "\""));
        }
        Optional<Step> found = sheet.find(step);
        if (found.isEmpty()) {
            return failed(expected, item, step, why, sheets.failures().getOrDefault(item, "the calculation has no step of this name"));
        }
        try {
            Printed printed = Printed.of(expected.path("value"), found.get().unit());
            double within = printed.tolerance(expected.path("within"));
            double difference = found.get().value() - printed.si();
            boolean near = Math.abs(difference) <= within * (1 + 1e-9);
            return new PublishedCheck.Line(item, step, printed.text(), printed.inUnit(found.get().value()), printed.inUnit(difference),
                plain(expected.path("within")), why, near != trap);
        } catch (BadJob e) {
            return failed(expected, item, step, why, e.problems().get(0).line());
        }
    }

    private static PublishedCheck.Line failed(JsonNode expected, String item, String step, String why, String reason) {
        return new PublishedCheck.Line(item, step, plain(expected.path("value")), reason, "-", plain(expected.path("within")), why, false);
    }

    private static PublishedCheck broken(String name, String reason) {
        return new PublishedCheck(name, "This file cannot be read", new PublishedCheck.Source("-", "-", "-", Status.RECALLED), false,
            List.of(new PublishedCheck.Line("-", "-", "-", reason, "-", "-", "-", false)));
    }

    private static String plain(JsonNode node) {
        return node.isMissingNode() ? "-" : node.isString() ? node.stringValue() : node.toString();
    }

    static String text(JsonNode node, String name) {
        JsonNode value = node.path(name);
        return value.isString() ? value.stringValue().strip() : "";
    }

    static BadJob bad(String problem) {
        return new BadJob(List.of(new Problem("", problem)));
    }
}
