package broadside.job;

import static broadside.quantity.Dimension.DENSITY;
import static broadside.quantity.Dimension.LENGTH;
import static broadside.quantity.Dimension.PERIOD;
import static broadside.quantity.Dimension.PRESSURE;
import static broadside.quantity.Dimension.SPEED;

import broadside.site.Averaging;
import java.util.List;
import java.util.Map;

/** The fields of the job file, version 1. */
public final class Shapes {

    static final Shape BASIS = new Shape("basis", List.of(
        Field.text("code", "key of the wind code, such as en-1991-1-4").needed(),
        Field.text("edition", "edition of the code, such as 2005").needed(),
        Field.text("overlay", "national or own overlay of the edition; null for none"),
        Field.text("stability", "rule for overturning and sliding, such as en-1990-equ; empty for the one that goes with the code"),
        Field.choice("design", "rules for posts: en, Eurocodes; us-asd, allowable stress; us-strength, load and resistance factors; empty for those that go with the code",
            List.of("en", "us-asd", "us-strength"))));

    static final Shape TOPOGRAPHY = new Shape("topography", List.of(
        Field.choice("feature", "shape of the ground", List.of("hill", "ridge", "escarpment")).needed(),
        Field.quantity("height", LENGTH, "height of the crest above the foot").needed(),
        Field.quantity("upwind-length", LENGTH, "length of the upwind slope in plan, from the foot to the crest").needed(),
        Field.quantity("downwind-length", LENGTH, "length of the downwind slope in plan"),
        Field.quantity("half-length", LENGTH, "distance in plan upwind from the crest to half the height"),
        Field.quantity("distance-from-crest", LENGTH, "from the crest to the site, positive downwind").needed()));

    static final Shape SITE = new Shape("site", List.of(
        Field.text("name", "name of the place"),
        Field.quantity("basic-speed", SPEED, "basic wind speed as the code defines it; other values of the site may take its place"),
        Field.choice("averaging", "averaging time of the basic speed", Averaging.allWords()),
        Field.quantity("return-period", PERIOD, "return period asked for"),
        Field.text("terrain", "terrain or exposure class in the words of the code, or \"unknown\" for the one with the largest load").needed(),
        Field.choice("ground-nearby", "whether the ground within 1 km is higher or lower by more than 10 m; \"unknown\" takes the worst value of the code",
            List.of("flat", "hill", "unknown")),
        Field.text("terrain-reason", "why this class was chosen"),
        Field.quantity("altitude", LENGTH, "altitude above the sea"),
        Field.object("topography", TOPOGRAPHY, "hill, ridge or escarpment near by"),
        Field.quantity("authority-minimum-pressure", PRESSURE, "least pressure that the local authority asks for"),
        Field.choice("authority-minimum-level", "level at which the authority means its least pressure", List.of("code", "service")),
        Field.quantity("stands-for", PERIOD, "how long it stands"),
        Field.choice("duration-rule", "whether the code's rule for a short stay counts; it does only when it is asked for", List.of("none", "code")),
        Field.number("direction-factor", "direction factor c_dir (EN)"),
        Field.number("season-factor", "season factor c_season (EN)"),
        Field.quantity("air-density", DENSITY, "air density (EN)"),
        Field.choice("risk-category", "risk category (ASCE 7)", List.of("I", "II", "III", "IV")),
        Field.number("topographic-factor", "topographic factor K_zt, in place of topography (ASCE 7)"),
        Field.quantity("ground-elevation", LENGTH, "elevation of the ground above the sea, for K_e (ASCE 7)"),
        Field.numberOrChoice("gust-factor", "gust-effect factor G, or \"computed\" for the formula (ASCE 7)", List.of("computed")),
        Field.text("season", "season in which it stands, in the words of a national overlay (EN)"),
        Field.text("wind-zone", "wind zone of a national overlay (EN)"),
        Field.choice("structure-class", "class of structure for k1 (IS 875)", List.of("general", "temporary", "low hazard", "important")),
        Field.number("k4", "cyclone factor k4 (IS 875)"),
        Field.number("directionality", "directionality factor K_d (IS 875)"),
        Field.text("region", "wind region (AS/NZS 1170.2)"),
        Field.quantity("regional-speed", SPEED, "regional wind speed, in place of region and return-period (AS/NZS 1170.2)"),
        Field.number("direction-multiplier", "direction multiplier M_d (AS/NZS 1170.2)"),
        Field.number("shielding-multiplier", "shielding multiplier M_s (AS/NZS 1170.2)"),
        Field.number("climate-multiplier", "climate change multiplier M_c (AS/NZS 1170.2)")));

    private static final List<Field> REMARKS = List.of(
        Field.choice("held-by", "what it is fixed to", HeldBy.WORDS),
        Field.text("fixed-to", "more about what it is fixed to"),
        Field.text("solidity-by", "who gave the solidity"),
        Field.text("lighting", "lighting and openings"),
        Field.text("design-life", "design life"),
        Field.text("inspection-interval", "inspection interval"));

    static final List<String> REMARK_NAMES = REMARKS.stream().map(Field::name).toList();

    /** The kinds of item and their fields. */
    public static final Map<String, Shape> KINDS = KindShapes.all();

    static final Shape OVERRIDE = new Shape("override", List.of(
        Field.text("name", "name of the step whose value is replaced").needed(),
        Field.numberOrQuantity("value", "a plain number, or text with its unit").needed(),
        Field.text("reason", "why").needed()));

    static final Shape COMPARED = new Shape("compared", List.of(
        Field.text("code", "key of a wind code").needed(),
        Field.text("edition", "edition of the code").needed(),
        Field.quantity("basic-speed", SPEED, "basic wind speed of this place as that code defines it"),
        Field.text("terrain", "terrain class of that code")));

    /** Texts of the head of a job. */
    public static final List<Field> HEADER = List.of(
        Field.text("title", "name of the job"),
        Field.text("reference", "reference of the job"),
        Field.text("revision", "revision letter"),
        Field.text("prepared-by", "who prepared it"),
        Field.text("checked-by", "who checked it"),
        Field.text("client", "client"),
        Field.text("applicant", "applicant"),
        Field.text("address", "address of the site"),
        Field.text("coordinates", "coordinates of the site"),
        Field.text("drawing-number", "drawing number"),
        Field.text("date", "date of the job, such as 2026-12-01"),
        Field.text("engineer", "name and licence of the engineer"),
        Field.text("remarks", "remarks of the person who prepared it"),
        Field.choice("units", "system of units that leads on page and paper", List.of("metric", "us")));

    /** The whole job file; the shape of an item follows from its kind. */
    public static final Shape JOB = job();

    static Shape item(String kind, List<Field> own) {
        List<Field> fields = new java.util.ArrayList<>();
        fields.add(Field.text("mark", "mark of the item, unique in the job").needed());
        fields.add(Field.choice("kind", "kind of item", List.of(kind)).needed());
        fields.addAll(own);
        fields.addAll(REMARKS);
        return new Shape(kind, fields);
    }

    private static Shape job() {
        List<Field> fields = new java.util.ArrayList<>();
        fields.add(Field.whole("broadside", "version of the job file: 1").needed());
        fields.addAll(HEADER);
        fields.add(Field.object("basis", BASIS, "code by which loads are found").needed());
        fields.add(Field.object("site", SITE, "where it stands").needed());
        fields.add(Field.list("items", new Shape("item", List.of()), "what stands in the wind").needed());
        fields.add(Field.list("overrides", OVERRIDE, "values set in place of calculated ones"));
        fields.add(Field.list("comparison", COMPARED, "speeds and terrains for single codes of the comparison side by side"));
        return new Shape("job", fields);
    }

    private Shapes() { }
}
