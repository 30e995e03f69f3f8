package broadside.web;

import broadside.job.PublishedCheck;
import broadside.job.PublishedChecks;
import broadside.table.Edition;
import broadside.table.TableFile;
import broadside.table.TableLibrary;
import io.javalin.http.Context;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Supplier;
import java.util.stream.Stream;

/** The two pages by which an engineer decides whether to trust the rest: the code tables and the published checks. */
final class Shelf {

    private final Pages pages;
    private final TableLibrary tables;
    private final Supplier<List<PublishedCheck>> checks;

    /** All editions and publications. */
    public record Tables(String digest, List<EditionView> editions, List<TableLibrary.Publication> publications) { }

    /** One edition with its tables. */
    public record EditionView(String href, String title, String status, String basis, List<TableView> tables) { }

    /** One table; {@code rows} end with the status of the row in words. */
    public record TableView(String anchor, String title, String file, String source, String status, String axes, String value, String between,
                            String beyond, String entered, String note, String digest, List<String> headings, List<List<String>> rows) { }

    /** The published checks, by publication. */
    public record Checks(int passed, int failed, int lines, List<Group> groups, Group mistakes) { }

    /** The checks of one publication, or all that print a mistake. */
    public record Group(String href, String title, int lines, String outcome, List<CheckView> checks) { }

    /** One check. */
    public record CheckView(String title, String place, String edition, String status, String outcome, List<LineView> lines) { }

    /** One printed value and what comes out here. */
    public record LineView(String item, String step, String printed, String computed, String difference, String within, String outcome) { }

    Shelf(Pages pages, TableLibrary tables, PublishedChecks checks) {
        this.pages = pages;
        this.tables = tables;
        this.checks = once(checks::shipped);
    }

    /** Checks run once, when they are first asked for: neither they nor the tables change while the tool runs. */
    private static <T> Supplier<T> once(Supplier<T> source) {
        List<T> found = new ArrayList<>(1);
        return () -> {
            synchronized (found) {
                if (found.isEmpty()) {
                    found.add(source.get());
                }
                return found.get(0);
            }
        };
    }

    void tables(Context ctx) {
        pages.show(ctx, 200, "tables", "Code tables", new Tables(tables.digest(), tables.editions().stream().map(Shelf::view).toList(),
            tables.publications()));
    }

    void edition(Context ctx) {
        EditionView edition = tables.edition(ctx.pathParam("code") + "/" + ctx.pathParam("edition")).map(Shelf::view).orElseThrow(Refused::notFound);
        pages.show(ctx, 200, "edition", edition.title(), edition);
    }

    private static EditionView view(Edition edition) {
        return new EditionView("/tables/" + edition.key(), edition.property("title"), edition.property("status"),
            edition.basis().map(b -> b.property("title")).orElse(""), edition.ownFiles().stream().map(Shelf::view).toList());
    }

    private static TableView view(TableFile file) {
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < file.body().size(); i++) {
            List<String> row = new ArrayList<>(file.body().get(i));
            row.add(file.rowStatus().get(i).told());
            rows.add(row);
        }
        List<String> headings = new ArrayList<>(file.headings().stream().filter(h -> !h.equals("status")).toList());
        headings.add("status");
        String status = file.statusText().equals("by row") ? "by row, the weakest " + file.source().status().told().replace(": ", ", ") : file.source().status().told();
        return new TableView(file.name().replaceAll("[^a-z0-9]+", "-"), file.title(), file.name(), file.source().citation(), status,
            String.join("; ", file.axes()), file.value(), file.betweenWord(), file.beyondWords(), file.entered(), file.note(), file.digest(), headings, rows);
    }

    void checks(Context ctx) {
        List<PublishedCheck> all = checks.get();
        int passed = (int) all.stream().filter(PublishedCheck::passed).count();
        pages.show(ctx, 200, "checks", "Published checks", new Checks(passed, all.size() - passed, all.stream().mapToInt(c -> c.lines().size()).sum(),
            groups(all), mistakes(all)));
    }

    void publication(Context ctx) {
        List<PublishedCheck> all = checks.get();
        Group group = Stream.concat(groups(all).stream(), Stream.of(mistakes(all))).filter(g -> g.href().equals("/checks/" + ctx.pathParam("publication"))).findFirst()
            .orElseThrow(Refused::notFound);
        pages.show(ctx, 200, "publication", "Published checks: " + group.title(), group);
    }

    private List<Group> groups(List<PublishedCheck> all) {
        Map<String, List<PublishedCheck>> sorted = new TreeMap<>();
        all.stream().filter(c -> !c.trap()).forEach(c -> sorted.computeIfAbsent(c.source().publication(), k -> new ArrayList<>()).add(c));
        Map<String, Group> groups = new LinkedHashMap<>();
        sorted.forEach((key, list) -> groups.put(key, group(key.replaceAll("[^A-Za-z0-9]+", "-"), tables.publication(key).map(TableLibrary.Publication::title).orElse(key), list)));
        return List.copyOf(groups.values());
    }

    private static Group mistakes(List<PublishedCheck> all) {
        return group("mistakes-in-print", "Mistakes in print that are not repeated here", all.stream().filter(PublishedCheck::trap).toList());
    }

    private static Group group(String place, String title, List<PublishedCheck> list) {
        return new Group("/checks/" + place, title, list.stream().mapToInt(c -> c.lines().size()).sum(), outcome(list.stream().allMatch(PublishedCheck::passed)),
            list.stream().map(Shelf::view).toList());
    }

    private static CheckView view(PublishedCheck check) {
        return new CheckView(check.title(), check.source().place(), check.source().publication() + ", " + check.source().edition(),
            check.source().status().told(), outcome(check.passed()), check.lines().stream().map(l -> new LineView(l.item(), l.step(), l.printed(),
                l.computed(), l.difference(), l.within(), outcome(l.passed()))).toList());
    }

    private static String outcome(boolean passed) {
        return passed ? "passed" : "failed";
    }
}
