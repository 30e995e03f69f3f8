package broadside.job;

import broadside.assess.Problem;
import broadside.panel.BannerFence;
import broadside.panel.Building;
import broadside.panel.FacadePanel;
import broadside.panel.FenceFeet;
import broadside.panel.Fixings;
import broadside.panel.Item;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.quantity.Angle;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads fences, panels on walls, blade signs and banners from their values, and notes what does not fit. */
final class KindReader {

    private static final Length ZERO = Length.metres(0);

    private final ItemReader sizes;
    private final SupportReader supports;
    private final List<Problem> problems;

    KindReader(ItemReader sizes, SupportReader supports, List<Problem> problems) {
        this.sizes = sizes;
        this.supports = supports;
        this.problems = problems;
    }

    Optional<Item> bannerFence(Values values) {
        Optional<Length> length = sizes.size(values, "panel-length");
        Optional<Length> height = sizes.size(values, "panel-height");
        Optional<Integer> count = values.whole("panels");
        count.filter(n -> n < 1 || n > 1000).ifPresent(n -> problem(values, "panels", "must lie between 1 and 1000"));
        double cover = sizes.solidity(values, "cover-solidity");
        double fence = values.number("fence-solidity").isPresent() ? sizes.solidity(values, "fence-solidity") : 0.25;
        FenceFeet feet = supports.feet(values);
        if (length.isEmpty() || height.isEmpty() || count.filter(n -> n >= 1 && n <= 1000).isEmpty() || values.text("mark").isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new BannerFence(values.text("mark").get(), length.get(), height.get(), count.get(), cover, fence, values.number("fence-solidity").isPresent(),
            sizes.shelter(values), feet, ItemReader.carrying(values)));
    }

    Optional<Item> facadePanel(Values values) {
        Optional<Length> width = sizes.size(values, "width");
        Optional<Length> height = sizes.size(values, "height");
        Optional<Length> bottom = sizes.notBelow(values, "bottom", "the lower edge would lie below the ground");
        Optional<Length> corner = sizes.notBelow(values, "distance-from-corner", "it is measured from the corner along the wall");
        Optional<Building> building = values.object("building").flatMap(this::building);
        Optional<Fixings> fixings = supports.fixings(values);
        building.ifPresent(b -> inside(values, b, width, height, bottom, corner));
        if (width.isEmpty() || height.isEmpty() || bottom.isEmpty() || corner.isEmpty() || building.isEmpty() || values.text("mark").isEmpty()
            || values.text("backing").isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new FacadePanel(values.text("mark").get(), FacadePanel.Backing.valueOf(values.text("backing").get().toUpperCase(Locale.ROOT)),
            width.get(), height.get(), bottom.get(), corner.get(), building.get(), sizes.notBelow(values, "gap", "a gap is not below zero"),
            sizes.notBelow(values, "depth", "a thickness is not below zero").orElse(ZERO), mass(values), fixings, ItemReader.carrying(values)));
    }

    /** A panel must lie on its wall. */
    private void inside(Values values, Building building, Optional<Length> width, Optional<Length> height, Optional<Length> bottom, Optional<Length> corner) {
        if (width.isPresent() && corner.isPresent() && corner.get().metres() + width.get().metres() > building.width().metres() + 1e-9) {
            problem(values, "distance-from-corner", "the panel, " + width.get().typed() + " wide and " + corner.get().typed()
                + " from the corner, ends beyond the wall of " + building.width().typed());
        }
        if (height.isPresent() && bottom.isPresent() && bottom.get().metres() + height.get().metres() > building.height().metres() + 1e-9) {
            problem(values, "bottom", "the panel, " + height.get().typed() + " high and " + bottom.get().typed() + " above the ground, ends above the wall of "
                + building.height().typed());
        }
    }

    private Optional<Building> building(Values values) {
        Optional<Length> width = sizes.size(values, "width");
        Optional<Length> depth = sizes.size(values, "depth");
        Optional<Length> height = sizes.size(values, "height");
        Optional<Angle> slope = values.quantity("roof-slope", Angle.class);
        slope.filter(a -> a.radians() < 0 || a.radians() > Math.PI / 2).ifPresent(a -> problem(values, "roof-slope", "must lie between 0 and 90 degrees"));
        Building.Enclosure enclosure = values.text("enclosure").map(w -> Building.Enclosure.valueOf(w.toUpperCase(Locale.ROOT).replace(' ', '_')))
            .orElse(Building.Enclosure.ENCLOSED);
        return width.isEmpty() || depth.isEmpty() || height.isEmpty() ? Optional.empty()
            : Optional.of(new Building(width.get(), depth.get(), height.get(), slope, enclosure));
    }

    Optional<Item> projectingSign(Values values) {
        Optional<Length> projection = sizes.size(values, "projection");
        Optional<Length> height = sizes.size(values, "height");
        Optional<Length> bottom = sizes.notBelow(values, "bottom", "the lower edge would lie below the ground");
        Length gap = sizes.notBelow(values, "gap", "a gap is not below zero").orElse(ZERO);
        Length depth = sizes.notBelow(values, "depth", "a thickness is not below zero").orElse(ZERO);
        Optional<Values> brackets = values.object("brackets");
        int count = brackets.flatMap(b -> b.whole("count")).orElse(1);
        Optional<Length> spacing = brackets.flatMap(b -> sizes.size(b, "spacing"));
        if (count < 1 || count > 50) {
            problem(brackets.orElseThrow(), "count", "must lie between 1 and 50");
        }
        if (count > 1 && spacing.isEmpty()) {
            problem(brackets.orElseThrow(), "spacing", "is missing: two or more brackets need the distance between them, like \"1.8 m\" or \"6 ft\"");
        }
        if (projection.isEmpty() || height.isEmpty() || bottom.isEmpty() || values.text("mark").isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new ProjectingSign(values.text("mark").get(), projection.get(), height.get(), bottom.get(), gap, depth, mass(values),
            new ProjectingSign.Brackets(Math.max(1, count), spacing), supports.fixings(values), ItemReader.carrying(values)));
    }

    Optional<Item> spannedBanner(Values values) {
        Optional<Length> width = sizes.size(values, "width");
        Optional<Length> height = sizes.size(values, "height");
        Optional<Length> bottom = sizes.notBelow(values, "bottom", "the lower edge would lie below the ground");
        Optional<Length> sag = values.quantity("sag", Length.class);
        sag.filter(s -> width.isPresent() && !(s.metres() >= width.get().metres() / 1000 && s.metres() <= width.get().metres())).ifPresent(s ->
            problem(values, "sag", "\"" + s.typed() + "\" is no sag: a banner without sag would pull without limit; it must lie between a thousandth of the span and the span"));
        double solidity = sizes.solidity(values);
        if (width.isEmpty() || height.isEmpty() || bottom.isEmpty() || sag.isEmpty() || values.text("mark").isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new SpannedBanner(values.text("mark").get(), width.get(), height.get(), bottom.get(), sag.get(), solidity,
            ItemReader.carrying(values)));
    }

    private Optional<Mass> mass(Values values) {
        Optional<Mass> mass = values.quantity("mass", Mass.class);
        mass.filter(m -> m.kilograms() < 0).ifPresent(m -> problem(values, "mass", "must not be below zero"));
        return mass;
    }

    private void problem(Values values, String name, String text) {
        problems.add(new Problem(values.at(name), text));
    }
}
