package broadside.codes;

import broadside.panel.Building;
import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.quantity.Length;
import broadside.quantity.Period;
import broadside.quantity.Pressure;
import broadside.quantity.Quantity;
import broadside.quantity.Speed;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.site.Topography;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Sites, panels and the codes of EN 1991-1-4 made by hand, and a peak pressure worked out without them. */
final class En1991Inputs {

    private static final CodeLibrary CODES = new CodeLibrary(TableLibrary.shipped());

    static WindCode code(String overlay) {
        return CODES.code("en-1991-1-4/2005" + overlay).orElseThrow();
    }

    static Site site(double speed, String terrain) {
        return new Site("", Speed.of(speed + " m/s"), Averaging.MEAN_10_MIN, Optional.empty(), new Site.Ground(terrain, Optional.empty(), Optional.empty(), Set.of()),
            Optional.empty(), SiteOptions.NONE);
    }

    static Site with(Site site, String name, String word) {
        SiteOptions o = site.options();
        Map<String, String> words = new java.util.HashMap<>(o.words());
        words.put(name, word);
        return with(site, new SiteOptions(o.numbers(), o.quantities(), words));
    }

    static Site with(Site site, String name, Quantity quantity) {
        SiteOptions o = site.options();
        Map<String, Quantity> quantities = new java.util.HashMap<>(o.quantities());
        quantities.put(name, quantity);
        return with(site, new SiteOptions(o.numbers(), quantities, o.words()));
    }

    static Site with(Site site, SiteOptions options) {
        return new Site(site.name(), site.basicSpeed(), site.averaging(), site.returnPeriod(), site.ground(), site.authorityMinimum(), options);
    }

    static Site with(Site site, Period returnPeriod) {
        return new Site(site.name(), site.basicSpeed(), site.averaging(), Optional.of(returnPeriod), site.ground(), site.authorityMinimum(), site.options());
    }

    static Site withLeast(Site site, Pressure least) {
        return new Site(site.name(), site.basicSpeed(), site.averaging(), site.returnPeriod(), site.ground(), Optional.of(new Site.AuthorityMinimum(least, false)),
            site.options());
    }

    static Site at(Site site, Length altitude) {
        return ground(site, new Site.Ground(site.ground().terrain(), Optional.of(altitude), Optional.empty(), Set.of()));
    }

    static Site near(Site site, Topography hill) {
        return ground(site, new Site.Ground(site.ground().terrain(), Optional.empty(), Optional.of(hill), Set.of()));
    }

    static Site unknownGround(Site site) {
        return ground(site, new Site.Ground(site.ground().terrain(), Optional.empty(), Optional.empty(), Set.of(Site.Unknown.SHAPE)));
    }

    private static Site ground(Site site, Site.Ground ground) {
        return new Site(site.name(), site.basicSpeed(), site.averaging(), site.returnPeriod(), ground, site.authorityMinimum(), site.options());
    }

    /** A wall on the ground. */
    static Panel wall(double length, double height, double solidity, double returnLeft, double returnRight, double shelter) {
        return new Panel("", Panel.Kind.WALL, length, height, 0, 0, solidity, returnLeft, returnRight, shelter, 1, new Panel.AsTyped("", "", "", ""));
    }

    static Panel board(double width, double height, double clearance, double solidity) {
        return new Panel("", Panel.Kind.BOARD, width, height, clearance, 0, solidity, 0, 0, new Panel.AsTyped("", "", "", ""));
    }

    /** A panel on a building: sizes in metres. */
    record Face(double width, double depth, double height, double corner, double panelWidth, double panelHeight, double bottom) {

        FacadePanel panel(FacadePanel.Backing backing, Building.Enclosure enclosure) {
            return new FacadePanel("F1", backing, Length.metres(panelWidth), Length.metres(panelHeight), Length.metres(bottom), Length.metres(corner),
                new Building(Length.metres(width), Length.metres(depth), Length.metres(height), Optional.empty(), enclosure), Optional.empty(), Length.metres(0), Optional.empty(), Optional.empty(),
                List.of());
        }
    }

    static double value(Trace trace, String step) {
        return trace.find(step).orElseThrow(() -> new AssertionError("no step " + step)).value();
    }

    /** Peak velocity pressure of terrain II without orography, from the formulas in one line: k_r is 0.19 there. */
    static double peakInTerrain2(double speed, double z) {
        double log = Math.log(Math.max(z, 2) / 0.05);
        return (1 + 7 / log) * 0.625 * Math.pow(0.19 * log * speed, 2);
    }

    private En1991Inputs() { }
}
