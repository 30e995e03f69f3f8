package broadside;

import broadside.assess.Assessment;
import broadside.assess.Job;
import broadside.report.Attachment;
import broadside.report.Paper;
import broadside.report.PdfWriter;
import broadside.sheet.Sheet;
import broadside.sheet.SheetMaker;
import broadside.support.Catalogue;
import broadside.support.OwnDrag;
import broadside.support.PostDesign;
import broadside.support.PostLoad;
import broadside.support.PostRules;
import broadside.support.PostTask;
import broadside.support.Section;
import broadside.support.WindLevels;
import broadside.trace.Status;
import broadside.trace.Trace;
import com.sun.management.ThreadMXBean;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;

/** Measures what the tool must reach and prints a table. Run by the command in DEVELOPERS.md, never by the tests. */
public final class Benchmark {

    private static final Path JAR = Path.of("target", "broadside.jar");

    public static void main(String[] args) throws Exception {
        System.out.printf(Locale.ROOT, "%-78s %12s %12s%n", "what", "measured", "at most");
        Job job = AllJobs.demo("entrance-sign.json");
        warm("loads of one post sign, full trace, warm", 0.2, 20_000, () -> AllJobs.TOOL.assessor().loadsOnly(job));
        everyCodeAndKind();
        warm("one item by every code side by side, warm", 3, 1000, () -> AllJobs.TOOL.assessor().sideBySide(job, job.items().get(0)));
        sizing(job);
        limits();
        pdf("PDF of its loads, assessment and sheet included", "entrance-sign.json", 10, 10, () -> AllJobs.TOOL.assessor().loadsOnly(job));
        pdf("PDF of that sign, post and footing sized", "entrance-sign.json", 25, 20, () -> AllJobs.assess(job));
        if (!Files.exists(JAR)) {
            System.out.println("no " + JAR + ": run mvn -q -DskipTests package for the rows of whole processes");
            return;
        }
        row("check of one job, loads only, whole process", times(9, () -> check("examples/old-post-sign.json")), 700, "ms");
        row("check of one job, post and footing sized, whole process", times(9, () -> check("examples/entrance-sign.json")), 1000, "ms");
        row("first page after start, plain JVM", times(5, Benchmark::firstPage), 2000, "ms");
    }

    /** One row for each code: the kind that takes longest. */
    private static void everyCodeAndKind() throws Exception {
        Map<String, String> items = Map.of(
            "post-sign", "'boards': [{'width': '3 m', 'height': '2 m', 'clearance': '2.5 m', 'depth': '0.05 m'}], 'posts': {'count': 2, 'spacing': '2 m', 'section': 'CHS 114.3x5'}",
            "hoarding", "'length': '48 m', 'height': '2.4 m', 'returns': {'left': '2.4 m'}, 'posts': {'spacing': '2.4 m'}",
            "banner-fence", "'panel-length': '3.45 m', 'panel-height': '2 m', 'panels': 40, 'cover-solidity': 0.85, 'fence-solidity': 0.25",
            "facade-panel", "'backing': 'skin', 'width': '1.2 m', 'height': '2.5 m', 'bottom': '6 m', 'distance-from-corner': '0.3 m', "
                + "'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m'}",
            "projecting-sign", "'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'depth': '0.12 m', 'mass': '34 kg', 'brackets': {'count': 2, 'spacing': '1.8 m'}",
            "spanned-banner", "'width': '9 m', 'height': '0.9 m', 'bottom': '5.2 m', 'sag': '0.45 m'");
        for (String[] code : JobTexts.CODES) {
            String slowest = "";
            double most = 0;
            for (Map.Entry<String, String> item : items.entrySet()) {
                Job job = JobTexts.job(code[0], code[1], "{'mark': 'X1', 'kind': '" + item.getKey() + "', " + item.getValue() + "}");
                double median = median(3000, () -> AllJobs.TOOL.assessor().loadsOnly(job));
                slowest = median > most ? item.getKey() : slowest;
                most = Math.max(median, most);
            }
            row("loads by " + code[0] + ", slowest of six kinds, " + slowest, most, 0.3, "ms");
        }
    }

    /** Choosing among 300 sections of which none but the heaviest could do; then whole assessments with what carries the item. */
    private static void sizing(Job job) throws Exception {
        PostDesign design = new PostDesign(AllJobs.TOOL.assessor().tables().edition(PostRules.EDITION).orElseThrow());
        Catalogue catalogue = AllJobs.TOOL.assessor().catalogue();
        List<Section> sections = new ArrayList<>(catalogue.sections().stream().filter(s -> s.material() == Section.Material.STEEL).toList());
        for (int d = 400; sections.size() < 300; d += 10) {
            sections.add(catalogue.find("CHS " + d + "x12").orElseThrow());
        }
        sections.sort(Comparator.comparingDouble(Section::mass));
        List<PostLoad> loads = new ArrayList<>();
        for (String named : List.of("A, left", "A, right", "B, left", "B, right", "along the face")) {
            loads.add(new PostLoad(named, 90_000, 270_000, 20_000, 4000, 12_000, 800, 0, 810_000, 2_430_000));
        }
        PostTask task = new PostTask("en", "short", loads, new WindLevels(1, 1.5, "EN 1990", Status.RECALLED), section -> OwnDrag.NONE, 4, 4, 60, 3, Optional.empty());
        warm("sizing from a catalogue of " + sections.size() + " sections, warm", 2, 2000, () -> design.size(sections, catalogue.grade("S355", Section.Material.STEEL), task, new Trace()));
        warm("assessment of one post sign, post and footing sized, warm", 3, 3000, () -> AllJobs.assess(job));
        StringBuilder ten = new StringBuilder();
        for (int i = 0; i < 10; i++) {
            ten.append(i == 0 ? "" : ",").append("{'mark': 'S").append(i).append("', 'kind': 'post-sign', 'boards': [{'width': '").append(1 + 0.3 * i)
                .append(" m', 'height': '1.5 m', 'clearance': '2.5 m', 'depth': '0.05 m', 'mass': '40 kg'}], 'posts': {'count': ").append(i % 2 == 0 ? "1" : "2, 'spacing': '1.2 m'")
                .append(", 'section': 'auto'}}");
        }
        Job signs = JobTexts.job("en-1991-1-4/2005", JobTexts.EN, ten.toString());
        warm("job with ten signs, posts and footings sized, warm", 30, 500, () -> AllJobs.assess(signs));
    }

    /** All limits of one item, and what one change would do to them: the demo job that takes longest. */
    private static void limits() throws Exception {
        double most = 0;
        String slowest = "";
        for (String name : List.of("entrance-sign.json", "stacked-signs.json", "granary-hoarding.json", "depot-hoarding.json", "riverside-fence.json", "optician-blade.json", "dental-panel.json")) {
            Assessment assessed = AllJobs.assess(AllJobs.demo(name));
            double median = median(200, () -> AllJobs.TOOL.assessor().withLimits(assessed));
            slowest = median > most ? name.replace(".json", "") : slowest;
            most = Math.max(median, most);
        }
        row("all limits of one item, warm, slowest of seven jobs, " + slowest, most, 20, "ms");
    }

    private static void pdf(String what, String file, double millis, double megabytes, Callable<Assessment> assessed) throws Exception {
        PdfWriter writer = new PdfWriter();
        Attachment attachment = new Attachment("job.json", "the job", AllJobs.files().get(file));
        Callable<Integer> task = () -> {
            ByteArrayOutputStream out = new ByteArrayOutputStream(200_000);
            Sheet sheet = SheetMaker.of(assessed.call(), "2026-12-01");
            writer.write(sheet, Paper.A4, attachment, out);
            return out.size();
        };
        warm(what + ", warm", millis, 1000, task);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        for (int i = 0; i < 20; i++) {
            task.call();
        }
        row("  allocated for it", (threads.getCurrentThreadAllocatedBytes() - before) / 20.0 / 1e6, megabytes, "MB");
    }

    private static void warm(String what, double most, int times, Callable<?> task) throws Exception {
        row(what + ", median", median(times, task), most, "ms");
    }

    /** Median of as many runs as went before to warm up, ms. */
    private static double median(int times, Callable<?> task) throws Exception {
        for (int i = 0; i < times; i++) {
            task.call();
        }
        double[] millis = new double[times];
        for (int i = 0; i < times; i++) {
            long start = System.nanoTime();
            task.call();
            millis[i] = (System.nanoTime() - start) / 1e6;
        }
        Arrays.sort(millis);
        return millis[times / 2];
    }

    private static double check(String job) throws IOException, InterruptedException {
        long start = System.nanoTime();
        Process process = java("check", job).redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
        process.waitFor();
        return (System.nanoTime() - start) / 1e6;
    }

    private static double firstPage() throws IOException, InterruptedException {
        int port = 20_000 + (int) (System.nanoTime() % 20_000);
        long start = System.nanoTime();
        Process process = java("serve", "--port", Integer.toString(port)).redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
        HttpClient client = HttpClient.newHttpClient();
        try {
            while (true) {
                try {
                    client.send(HttpRequest.newBuilder(URI.create("http://127.0.0.1:" + port + "/")).build(), HttpResponse.BodyHandlers.ofString());
                    return (System.nanoTime() - start) / 1e6;
                } catch (IOException notYet) {
                    Thread.sleep(5);
                }
            }
        } finally {
            process.destroy();
            process.waitFor();
        }
    }

    private static ProcessBuilder java(String... command) {
        List<String> line = new java.util.ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-jar", JAR.toString()));
        line.addAll(List.of(command));
        return new ProcessBuilder(line).redirectError(ProcessBuilder.Redirect.DISCARD);
    }

    private interface Timed {
        double run() throws IOException, InterruptedException;
    }

    private static double times(int times, Timed task) throws IOException, InterruptedException {
        double[] millis = new double[times];
        for (int i = 0; i < times; i++) {
            millis[i] = task.run();
        }
        Arrays.sort(millis);
        return millis[times / 2];
    }

    private static void row(String what, double measured, double most, String unit) {
        System.out.printf(Locale.ROOT, "%-78s %9.3f %s %9.1f %s%n", what, measured, unit, most, unit);
    }

    private Benchmark() { }
}
