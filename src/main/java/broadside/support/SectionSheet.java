package broadside.support;

import broadside.support.Section.Form;
import broadside.support.Section.Properties;
import broadside.table.Coefficient;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.Optional;

/** Puts a section on the calculation sheet: its sizes, from the table that lists it or as typed, then its properties. */
final class SectionSheet {

    /**
     * Records a section.
     *
     * @param like  the series that lists it, or whose form it has
     */
    static Properties record(Section section, Series like, SectionShape shape, Trace trace) {
        boolean printed = !section.series().equals(Catalogue.NOT_LISTED);
        Optional<Source> source = printed ? Optional.of(like.rows().number(section.designation(), "depth").source()) : Optional.empty();
        boolean round = section.form() == Form.ROUND_TUBE;
        double depth = round ? size("section-diameter", "D_s", "outer diameter", section.depth(), section, source, trace)
            : size("section-depth", "H_s", "depth of the section", section.depth(), section, source, trace);
        double width = round ? depth : size("section-width", "B_s", "width of the section", section.width(), section, source, trace);
        if (section.form() == Form.SOLID_RECTANGLE) {
            return properties(section, new Sizes(section.form(), depth, width, 0, 0, Optional.empty()), like, shape, trace);
        }
        double wall;
        double nominal;
        if (section.wall() == section.nominalWall()) {
            wall = size("section-wall", "t_s", "wall of the section", section.wall(), section, source, trace);
            nominal = wall;
        } else {
            nominal = size("section-wall/nominal", "t_n", "wall as sold", section.nominalWall(), section, source, trace);
            wall = like.factor().isPresent() && !like.rows().isPrinted(section.designation(), "design-wall") ? share(like.factor().get(), nominal, trace)
                : size("section-wall", "t_s", "wall that is counted", section.wall(), section, source, trace);
        }
        String finish = section.designation().endsWith(" cold") ? "cold" : section.designation().endsWith(" hot") ? "hot" : like.corners();
        Sizes sizes = new Sizes(section.form(), depth, width, wall, nominal, like.corner(printed ? like.corners() : finish, nominal));
        return properties(section, sizes, like, shape, trace);
    }

    private static Properties properties(Section section, Sizes sizes, Series like, SectionShape shape, Trace trace) {
        sizes.problem().ifPresent(p -> {
            throw new UnfitAnswer("posts.section", section.designation() + " with the values set by the user can be no section: " + p);
        });
        return shape.of(sizes, like.density(), trace);
    }

    private static double size(String name, String symbol, String meaning, double value, Section section, Optional<Source> source, Trace trace) {
        return source.isEmpty() ? trace.given(symbol, meaning + ", " + section.designation(), value, "m", section.designation())
            : trace.line(name, symbol, meaning).from(source.get().citation(), source.get().status()).reads("read at " + section.designation(), value, "m");
    }

    private static double share(Coefficient factor, double nominal, Trace trace) {
        double f = factor.into(trace.line("section-wall-factor", "f_t", "design wall over the wall as sold"));
        return trace.line("section-wall", "t_s", "wall that is counted").in("f_t", f).in("t_n", nominal, "m")
            .from(factor.source().citation(), factor.source().status()).gives("f_t t_n", f * nominal, "m");
    }

    private SectionSheet() { }
}
