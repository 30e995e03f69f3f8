package broadside.assess;

import broadside.codes.WindCode;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.quantity.Period;
import broadside.site.Site;
import broadside.site.Topography;
import broadside.trace.OwnValue;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The sentences that go with a result: what was assumed, what to mind, what was not checked. */
final class Notes {

    private static final List<String> NEVER_CHECKED = List.of("ice and snow", "earthquake", "fatigue and vortex shedding", "impact and vehicles",
        "crowd load", "electrical parts", "anchors in masonry", "any existing structure", "flutter of loose fabric");

    private final List<Note> notes = new ArrayList<>();

    /** The sentences; without loads only those that do not speak of any. */
    static List<Note> of(Job job, Item item, WindCode code, Trace sheet, Optional<Loads> loads) {
        Notes notes = new Notes();
        if (loads.isEmpty()) {
            notes.heldBy(job, item);
            notes.always();
            return notes.notes;
        }
        notes.overrides(sheet);
        notes.site(job.site(), code, sheet, job.head("ground-nearby").filter("flat"::equals).isPresent());
        notes.unused(job.site(), code, sheet);
        notes.returnPeriod(job.site(), sheet);
        notes.stay(job.site());
        notes.leastHeight(job.site(), item, code, sheet);
        notes.noRegion(sheet);
        notes.leastPressures(job.site(), sheet);
        notes.notes.addAll(item.choose(new ItemNotes(job, code, sheet, loads.get())));
        notes.solidity(job, item, sheet);
        notes.heldBy(job, item);
        notes.carrying(item, loads.get());
        notes.statuses(sheet);
        notes.always();
        return notes.notes;
    }

    private void add(Note.Kind kind, String text) {
        notes.add(new Note(kind, text));
    }

    private void overrides(Trace sheet) {
        for (OwnValue own : sheet.overridesUsed()) {
            add(Note.Kind.OVERRIDE, own.name() + " was set to " + number(own.value()) + (own.unit().equals("1") ? "" : " " + own.unit())
                + " by the user: " + own.reason());
        }
    }

    private void site(Site site, WindCode code, Trace sheet, boolean flat) {
        if (site.ground().unknown().contains(Site.Unknown.TERRAIN)) {
            add(Note.Kind.ASSUMPTION, "The terrain was not known: class " + site.ground().terrain() + ", the smoothest of the code, is taken, which gives the largest load. "
                + "Anyone who looks at the place can say which class it is.");
        }
        if (site.ground().shapeUnknown()) {
            add(Note.Kind.CAUTION, "Whether the ground near by is higher or lower was not known: the worst value that the code can give is taken. Height, length and distance of the slope "
                + "would lower it, or show that there is none.");
        } else if (site.ground().topography().isEmpty() && site.options().number("topographic-factor").isEmpty()) {
            add(Note.Kind.ASSUMPTION, "The ground is taken as flat: " + (flat ? "so it was answered." : "no hill, ridge or escarpment was given.") + " If the ground within 1 km (3300 ft) is higher or lower "
                + "by more than 10 m (33 ft), the load can be much larger.");
        }
        site.ground().topography().ifPresent(ground -> topography(ground, sheet));
        site.authorityMinimum().ifPresent(minimum -> add(Note.Kind.ASSUMPTION, code.level(site).name().equals("characteristic")
            ? "The authority's least pressure of " + minimum.pressure().typed() + " is taken as a characteristic pressure."
            : minimum.service() ? "The authority's least pressure of " + minimum.pressure().typed() + " is taken at allowable stress and brought to strength level."
            : "The authority's least pressure of " + minimum.pressure().typed() + " is taken at strength level, as the code's loads are. "
                + "If the authority means it at allowable stress, say so: the loads are then larger."));
        if (site.basicSpeed().metresPerSecond() > 90 || site.basicSpeed().metresPerSecond() < 10) {
            add(Note.Kind.CAUTION, "A basic wind speed of " + site.basicSpeed().typed() + " is unusual. Check its unit.");
        }
        if (site.options().number("gust-factor").filter(g -> g < code.edition().rows("constants").number("gust-factor", "value").value()).isPresent()) {
            String least = code.edition().rows("constants").text("gust-factor", "value");
            add(Note.Kind.CAUTION, "The gust factor given is below " + least + "; a small sign gets more than " + least + " by the formula, not less.");
        }
        boolean shielded = site.options().number("shielding-multiplier").filter(m -> m < 1).isPresent();
        add(Note.Kind.ASSUMPTION, shielded ? "The shelter of other structures is counted by the shielding multiplier given: they must stay as long as this stands."
            : uses(sheet, "shelter-factor")
            ? "The shelter of a wall or fence in front is counted by the factor given: it must stay as long as this stands, be at least as high and not more open than the code asks."
            : "No shelter by other structures is counted.");
    }

    /** Values that were given and that this code does not use: said, so that nobody believes they count. */
    private void unused(Site site, WindCode code, Trace sheet) {
        boolean counted = uses(sheet, "probability-factor") || uses(sheet, "regional-speed");
        if (site.returnPeriod().isPresent() && !counted && uses(sheet, "velocity-pressure")) {
            add(Note.Kind.CAUTION, "The return period of " + site.returnPeriod().get().typed() + " is not used by this code: the basic wind speed "
                + (code.terms().options().contains("risk-category") ? "must be that of the map for the risk category." : "counts as it was given."));
        }
        if (site.ground().altitude().isPresent() && !uses(sheet, "air-temperature") && !uses(sheet, "altitude-factor")) {
            add(Note.Kind.ASSUMPTION, "The altitude of " + site.ground().altitude().get().typed() + " does not change these loads: this code takes the basic wind "
                + "speed of the place as it is" + (site.options().si("ground-elevation").isPresent() ? "; the ground elevation is counted." : "."));
        }
    }

    private void returnPeriod(Site site, Trace sheet) {
        sheet.find("probability-factor").filter(f -> Math.abs(f.value() - 1) > 1e-9).ifPresent(f -> {
            long percent = Math.round(Math.abs(1 - f.value() * f.value()) * 100);
            add(Note.Kind.CAUTION, "The wind of a return period of " + site.returnPeriod().map(Period::typed)
                .orElseGet(() -> number(sheet.find("return-period").orElseThrow().value()) + " years") + " is used: its pressure is " + percent + " % "
                + (f.value() < 1 ? "lower than that of the code's basic wind. How long a thing stands does not lower the safety that people near it need; the authority "
                    + "decides whether this is allowed." : "higher than that of the code's basic wind."));
        });
    }

    /** How long it stands, and that a short stay lowers no safety. */
    private void stay(Site site) {
        String safety = "How long a thing stands does not lower the safety that people near it need; the authority decides whether this is allowed.";
        String stay = site.options().quantities().containsKey("stands-for") ? site.options().quantities().get("stands-for").typed() : "";
        if (site.options().word("duration-rule").isPresent()) {
            add(Note.Kind.CAUTION, "The code's rule for a short stay" + (stay.isEmpty() ? "" : " of " + stay) + " lowers the wind. " + safety);
        } else if (!stay.isEmpty()) {
            add(Note.Kind.ASSUMPTION, "It stands for " + stay + ": this does not lower the loads, which are those of something that stays.");
        }
        if (site.options().word("structure-class").filter("temporary"::equals).isPresent()) {
            add(Note.Kind.CAUTION, "The class for temporary structures lowers the wind. " + safety);
        }
        if (site.options().word("season").isPresent() || site.options().number("season-factor").filter(f -> f < 1).isPresent()) {
            add(Note.Kind.CAUTION, "A season lowers the wind: it holds for those months only. What is moved and used again through the year gets none. " + safety);
        }
    }

    /** A class of terrain that lifts a panel to the least height of its profile, so that the choice of class decides. */
    private void leastHeight(Site site, Item item, WindCode code, Trace sheet) {
        List<String> below = item.panels().stream().map(Panel::part).filter(part -> sheet.find("profile-height" + (part.isEmpty() ? "" : "/" + part))
            .filter(s -> s.inputs().size() == 2 && s.value() > s.inputs().get(0).value() * (1 + 1e-9)).isPresent()).toList();
        if (!below.isEmpty() && !site.ground().terrain().equals(code.terms().smoothest())) {
            add(Note.Kind.CAUTION, "In terrain " + site.ground().terrain() + " " + (item.panels().size() == 1 ? "the item" : "board " + String.join(", ", below))
                + " stands below the least height of the wind profile: the choice of class sets everything there. If there is open ground near by on the windward side, take the smoother class.");
        }
    }

    /** A multiplier that some regions raise and that is not raised, as no region was given: the speed alone does not tell it. */
    private void noRegion(Trace sheet) {
        for (Step step : sheet.steps()) {
            if (step.formula().contains("as no region is given")) {
                add(Note.Kind.CAUTION, "The " + step.meaning() + " is " + step.formula() + ". Give the region where it is one of these: the load is then larger.");
                return;
            }
        }
    }

    private static boolean uses(Trace sheet, String step) {
        for (Step each : sheet.steps()) {
            if (each.name().startsWith(step)) {
                return true;
            }
        }
        return false;
    }

    /** Which least pressures hold a zone up. */
    private void leastPressures(Site site, Trace sheet) {
        Map<String, Double> own = new HashMap<>();
        sheet.steps().stream().filter(s -> s.name().startsWith("code-pressure/")).forEach(s -> own.put(s.name().substring("code-".length()), s.value()));
        List<String> raised = own.entrySet().stream().filter(e -> sheet.find(e.getKey()).filter(s -> Math.abs(s.value()) > Math.abs(e.getValue())).isPresent())
            .map(e -> e.getKey().substring("pressure/".length())).sorted().toList();
        if (site.authorityMinimum().isPresent() && !own.isEmpty()) {
            add(Note.Kind.CAUTION, raised.isEmpty() ? "The authority's least pressure does not govern: the code gives more in every zone."
                : "The authority's least pressure governs in " + (raised.size() == own.size() ? "every zone" : "the zones " + String.join(", ", raised)) + ".");
        }
        sheet.find("minimum-pressure").filter(least -> sheet.steps().stream().anyMatch(s -> s.name().startsWith("pressure/case-a") && s.value() == least.value()))
            .ifPresent(least -> add(Note.Kind.CAUTION, "The code's own least pressure governs cases A and B."));
    }

    private void topography(Topography ground, Trace sheet) {
        add(Note.Kind.ASSUMPTION, "The hill is counted wherever the code's formulas give a factor, also where a condition on the ground around it might excuse "
            + "the site.");
        if (uses(sheet, "half-length")) {
            add(Note.Kind.ASSUMPTION, "Half the height of the slope is taken to lie half-way along it, as for an even slope.");
        }
        boolean behind = ground.distanceFromCrest().metres() > 0 && ground.feature() != Topography.Feature.ESCARPMENT;
        boolean used = sheet.givens().stream().anyMatch(g -> g.symbol().equals("L_d"));
        if (behind && used && ground.downwindLength().isEmpty()) {
            add(Note.Kind.ASSUMPTION, "The downwind slope is taken as long as the upwind one, as it was not given.");
        }
    }

    private void solidity(Job job, Item item, Trace sheet) {
        if (item.panels().stream().anyMatch(p -> p.solidity() < 1)) {
            if (uses(sheet, "signboard-rule")) {
                add(Note.Kind.ASSUMPTION, "The code's rule for signboards has no reduction for openings: the board is counted as closed.");
            }
            if (uses(sheet, "lattice-coefficient") || uses(sheet, "solid-area-pressure")) {
                add(Note.Kind.CAUTION, "So open a panel counts as a lattice or an open sign, whose rule has no higher pressure at an end. A panel that is a little more closed gets more. "
                    + "Where the openness is not sure, take the panel as closed.");
            }
            add(Note.Kind.CAUTION, job.remark(item.mark(), "solidity-by").map(who -> "The solidity was given by " + who + ".").orElse("Who gave the solidity was not said.")
                + " A printer's figure for a mesh is not an aerodynamic one.");
        }
    }

    private void heldBy(Job job, Item item) {
        if (job.remark(item.mark(), "held-by").isEmpty()) {
            add(Note.Kind.ASSUMPTION, "What it is fixed to was not said: it is taken to stand by itself, on supports made for it. Anything fixed to an old post, a wall, a fence, a parapet, a "
                + "lamp column, a scaffold, a tree or a roof is outside the scope of this tool.");
        }
    }

    /** What was assumed about what carries it, or that nothing of it was checked. */
    private void carrying(Item item, Loads loads) {
        loads.carried().ifPresentOrElse(carried -> carried.parts().forEach(part -> part.assumed().forEach(a -> add(Note.Kind.ASSUMPTION, part.title() + ": " + a))), () -> {
            if (!item.carrying().isEmpty()) {
                add(Note.Kind.NOT_CHECKED, "What carries it is kept as typed and not checked: " + String.join("; ",
                    item.carrying().stream().map(c -> c.name() + " " + c.typed()).toList()) + ".");
            } else if (item instanceof PostSign || item instanceof Hoarding) {
                add(Note.Kind.NOT_CHECKED, "Posts, footing and ground: loads only.");
            }
        });
    }

    private void statuses(Trace sheet) {
        long recalled = sheet.steps().stream().map(Step::status).filter(s -> s == Status.RECALLED).count();
        if (recalled > 0) {
            add(Note.Kind.CAUTION, recalled + " steps rest on figures that are only recalled and not yet checked against print; they are named in the "
                + "calculation.");
        }
    }

    private void always() {
        add(Note.Kind.NOT_CHECKED, "Not checked: " + String.join(", ", NEVER_CHECKED) + ".");
        add(Note.Kind.CAUTION, "The local building code, the authority and the engineer of record decide.");
        add(Note.Kind.CAUTION, "A sign, fence or panel that comes loose is dangerous far below design speed.");
    }

    private static String number(double value) {
        return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
    }
}
