package broadside.web;

import broadside.job.Field;
import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import java.util.HashMap;
import java.util.Map;

/**
 * How a field of the job file is asked for. A field without its own words here is asked for in the words of its declaration.
 *
 * @param label   the question, without its unit
 * @param hint    one short sentence, may be empty
 * @param metric  unit beside the box in metric; empty when there is none
 * @param us      the same in feet and inches
 */
record Wording(String label, String hint, String metric, String us) {

    /** One line for each field: shape.field, label, hint, and the two units where they are not those of every such quantity. */
    private static final String LINES = """
        job.title|Name of the job|
        job.reference|Reference|Your own number for the job
        job.revision|Revision|
        job.prepared-by|Prepared by|
        job.checked-by|Checked by|
        job.client|Client|
        job.applicant|Applicant|
        job.address|Address of the site|
        job.coordinates|Coordinates of the site|
        job.drawing-number|Drawing number|
        job.date|Date of the job|Like 2026-12-01
        job.engineer|Engineer, with licence|The person who will review it
        basis.stability|Rule for overturning|
        site.name|Name of the place|
        site.basic-speed|Basic wind speed|From the wind map or the national annex for this place
        site.averaging|Kind of speed|A gust and a mean of the same wind differ by half
        site.return-period|Once in how many years|The basic speed of most codes is passed once in 50 years
        site.terrain|What the ground is like on the windward side|If you are not sure between two, take the smoother one: it gives the larger load
        site.terrain-reason|Why this one|A line for the reviewer, such as what is seen to the west
        site.altitude|Height above the sea|
        site.authority-minimum-pressure|Least pressure asked for|
        site.authority-minimum-level|The authority means it|
        site.direction-factor|Direction factor|c_dir, 1 where nothing else is known
        site.season-factor|Season factor|c_season, 1 for anything that stays all year
        site.air-density|Air density|
        site.risk-category|Risk category|II for ordinary signs and fences
        site.topographic-factor|Topographic factor|K_zt, in place of the sizes of the slope
        site.ground-elevation|Elevation of the ground|For K_e; left empty, sea level is taken, which is safe
        site.gust-factor|Gust-effect factor|G, a number, or the word computed; left empty, 0.85 is taken
        topography.feature|What the ground does near by|
        topography.height|Height of the slope|From its foot to its crest
        topography.upwind-length|Length of the slope|In plan, from the foot to the crest on the windward side
        topography.downwind-length|How long the slope behind the crest is|In plan
        topography.half-length|From the crest to half the height|In plan, on the windward side
        topography.distance-from-crest|From the crest to the item|In plan; behind the crest as it is, in front of it with a minus
        post-sign.mark|Mark|The short name on drawings, such as S1
        hoarding.mark|Mark|The short name on drawings, such as H1
        post-sign.faces|Faces that are read|2 when it is read from both sides
        board.mark|Mark of this board|
        board.width|Width|Across the wind
        board.height|Height|Of the board itself
        board.clearance|Gap below|From the ground to the lower edge
        board.shape|Outline|
        board.offset|How far it sticks out to one side|From the middle of the posts to the middle of the board; to the left with a minus
        board.depth|Thickness|Of the board or box|mm|in
        board.solidity|Closed part|1 for a closed board, 0.8 when a fifth of it is open
        board.mass|Mass|
        post-sign.fixed-to|What it is fixed to|
        post-sign.solidity-by|Who gave the closed part|
        post-sign.lighting|Lighting and openings|
        post-sign.design-life|Design life|
        post-sign.inspection-interval|Inspection interval|
        hoarding.length|Length|Over all, from end to end
        hoarding.height|Height|Of the boards themselves
        hoarding.clearance|Gap below|From the ground to the lower edge; 0 where it stands on the ground
        hoarding.solidity|Closed part|1 for closed boards, 0.8 when a fifth of it is open
        hoarding.fixed-to|What it is fixed to|
        hoarding.solidity-by|Who gave the closed part|
        hoarding.lighting|Lighting and openings|
        hoarding.design-life|Design life|
        hoarding.inspection-interval|Inspection interval|
        returns.left|Return at the left end|Length of the part that turns back; empty for a free end
        returns.right|Return at the right end|Length of the part that turns back; empty for a free end
        gate.from|From the left end to the gate|
        gate.width|Width of the gate|
        posts.count|Number of posts|
        posts.spacing|Distance between posts|From middle to middle
        posts.section|Section of a post|Such as CHS 114.3x5
        posts.grade|Grade of the posts|Such as S355
        hoarding-posts.spacing|Distance between posts|From middle to middle
        hoarding-posts.section|Section of a post|Such as SHS 100x5
        hoarding-posts.grade|Grade of the posts|Such as S355
        footing.kind|Kind of footing|planted, pier or pad
        footing.shape|Shape in plan|round or square
        footing.width|Width or diameter|
        footing.length|Length in plan|
        footing.depth|Depth below the ground|
        footing.ground|Class of the ground|
        ballast.mass|Mass at each brace|
        ballast.lever|From the face to the middle of the ballast|
        ballast.ground|Surface that it stands on|
        override.name|Name of the value|As it stands in the calculation, such as topography-factor
        override.value|Your value|A plain number, or a number with its unit
        override.reason|Why|Stands on every output
        """;

    private static final Map<String, Wording> KNOWN = known();

    static Wording of(String shape, Field field) {
        Wording known = KNOWN.get(shape + "." + field.name());
        String label = known == null ? sentence(field.meaning()) : known.label();
        String hint = known == null ? "" : known.hint();
        if (field.dimension().isEmpty()) {
            return new Wording(label, hint, "", "");
        }
        Dimension dimension = field.dimension().get();
        boolean own = known != null && !known.metric().isEmpty();
        return new Wording(label, hint, own ? known.metric() : usual(dimension, Units.METRIC), own ? known.us() : usual(dimension, Units.US));
    }

    /** The unit that a bare number takes. */
    Unit unit(Dimension dimension, Units system) {
        return Unit.of(dimension, system == Units.METRIC ? metric : us).orElseThrow();
    }

    private static String usual(Dimension dimension, Units system) {
        boolean metric = system == Units.METRIC;
        return switch (dimension) {
            case LENGTH -> metric ? "m" : "ft";
            case SPEED -> metric ? "m/s" : "mph";
            case PRESSURE -> metric ? "kN/m2" : "psf";
            case FORCE -> metric ? "kN" : "lbf";
            case MOMENT -> metric ? "kN m" : "lbf ft";
            case MASS -> metric ? "kg" : "lb";
            case ANGLE -> "deg";
            case AREA -> metric ? "m2" : "ft2";
            case DENSITY -> metric ? "kg/m3" : "lb/ft3";
            case MASS_PER_AREA -> metric ? "kg/m2" : "lb/ft2";
            case PERIOD -> "years";
        };
    }

    private static String sentence(String meaning) {
        return meaning.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + meaning.substring(1);
    }

    private static Map<String, Wording> known() {
        Map<String, Wording> known = new HashMap<>();
        LINES.lines().forEach(line -> {
            String[] cells = line.split("\\|", -1);
            known.put(cells[0], new Wording(cells[1], cells[2], cells.length > 3 ? cells[3] : "", cells.length > 4 ? cells[4] : ""));
        });
        return Map.copyOf(known);
    }
}
