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
        job.remarks|Remarks|
        basis.stability|Rule for overturning and sliding|How weight counts against wind; the usual one goes with the code
        basis.design|Rules for posts|Left empty, those that go with the code
        site.name|Name of the place|
        site.basic-speed|Basic wind speed|From the wind map or the national annex for this place
        site.averaging|Kind of speed|A gust and a mean of the same wind differ by half
        site.region|Wind region|As on the code's map; with a return period it stands in place of the speed
        site.regional-speed|Regional wind speed|In place of the region and the basic speed
        site.wind-zone|Wind zone|As on the national map; it stands in place of the speed
        site.season|Season in which it stands|As the national annex divides the year
        site.return-period|Once in how many years|The basic speed of most codes is passed once in 50 years
        site.stands-for|How long it stands||months|months
        site.duration-rule|Is the load lowered for the short stay?|
        site.terrain|What the ground is like on the windward side|If you are not sure between two, take the smoother one: it gives the larger load
        site.terrain-reason|Why this one|A line for the reviewer, such as what is seen to the west
        site.ground-nearby|Is the ground within 1 km (3300 ft) higher or lower by more than 10 m (33 ft)?|The wind is stronger on a hill and above a slope
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
        site.structure-class|Class of structure|For k1
        site.k4|Importance factor for cyclones|k4
        site.directionality|Directionality factor|K_d
        site.direction-multiplier|Direction multiplier|M_d, 1 where nothing else is known
        site.shielding-multiplier|Shielding multiplier|M_s, 1 where nothing stands around that will stay
        site.climate-multiplier|Climate change multiplier|M_c
        topography.feature|Shape of the ground near by|
        topography.height|Height of the slope|From its foot to its crest
        topography.upwind-length|Length of the slope|In plan, from the foot to the crest on the windward side
        topography.downwind-length|How long the slope behind the crest is|In plan
        topography.half-length|From the crest to half the height|In plan, on the windward side
        topography.distance-from-crest|From the crest to the item|In plan; behind the crest as it is, in front of it with a minus
        item.mark|Mark|Its short name on drawings and in tables
        item.held-by|What is it fixed to?|What was not made to hold it cannot be checked here
        item.fixed-to|More about what it is fixed to|Its material, thickness, age, owner: whatever the engineer should know
        item.solidity-by|Who gave the closed part|A printer's figure for a mesh is not one of wind
        item.lighting|Lighting and openings|
        item.design-life|Design life|
        item.inspection-interval|Inspection interval|
        item.shelter-factor|Shelter factor|By the code's rule for walls and fences in front
        post-sign.faces|Faces that are read|2 when it is read from both sides
        post-sign.opening-angle|Angle between two faces that open in a V|Leave empty where they are parallel
        board.mark|Mark of this board|
        board.width|Width|Across the wind
        board.height|Height|Of the board itself
        board.clearance|Gap below|From the ground to the lower edge
        board.shape|Outline|
        board.offset|How far it sticks out to one side|From the middle of the posts to the middle of the board; to the left with a minus
        board.depth|Thickness|Of the board or box|mm|in
        board.solidity|Closed part|1 for a closed board, 0.8 when a fifth of it is open
        board.mass|Mass|
        hoarding.length|Length|Over all, from end to end
        hoarding.height|Height|Of the boards themselves
        hoarding.clearance|Gap below|From the ground to the lower edge; 0 where it stands on the ground
        hoarding.solidity|Closed part|1 for closed boards, 0.8 when a fifth of it is open
        returns.left|Return at the left end|Length of the part that turns back; empty for a free end
        returns.right|Return at the right end|Length of the part that turns back; empty for a free end
        gate.from|From the left end to the gate|
        gate.width|Width of the gate|
        banner-fence.panel-length|Length of one panel|From joint to joint
        banner-fence.panel-height|Height of one panel|From the ground to its upper edge
        banner-fence.panels|Number of panels in the line|
        banner-fence.cover-solidity|Closed part of the cover|1 for closed fabric, 0.8 when a fifth of it is open; left empty, closed
        banner-fence.fence-solidity|Closed part of the bare fence|Bars and mesh over the whole area; left empty, 0.25
        banner-fence.panel-mass|Mass of one panel|With its cover
        banner-fence.foot-mass|Mass of one foot|
        banner-fence.foot-length|Length of a foot|Across the line of the fence
        banner-fence.ground|What it stands on|Feet of bare steel grip less: they are at the end of the list
        banner-fence.stakes|Stakes|Say what they are; they count only against tipping, and only with the pull that was proved on this ground
        banner-fence.friction|Friction coefficient|Left empty, the lowest printed value for that surface
        banner-fence.friction-reason|Why it may be above 1|
        banner-fence.stake-proof-load|Proof load of one stake|Pulled on this ground, on this day; without one, stakes do not count
        banner-fence.stakes-per-panel|Stakes that hold one panel|Against each direction
        block.mass|Mass of the block|
        block.lever|From the line of the fence to the middle of the block|
        brace.lever|From the line of the fence to the foot of the brace|
        brace.mass|Mass on the foot of the brace|
        facade-panel.backing|What is behind it?|
        facade-panel.width|Width|Of the panel, along the wall
        facade-panel.height|Height|Of the panel
        facade-panel.bottom|Height of its lower edge|Above the ground
        facade-panel.distance-from-corner|From the corner of the building to the panel|Along the wall, from the nearer corner
        facade-panel.gap|Gap between wall and panel||mm|in
        facade-panel.depth|Thickness|Of the panel|mm|in
        facade-panel.mass|Mass|Of the panel
        building.width|Width of this wall|From corner to corner
        building.depth|Depth of the building|At right angles to this wall
        building.height|Height of this wall|From the ground to its top
        building.roof-slope|Slope of the roof|0 for a flat roof
        building.enclosure|Large openings in the walls|They let the wind in, and the pressure inside rises
        projecting-sign.projection|How far the board stands out|From its inner to its outer edge
        projecting-sign.height|Height|Of the board
        projecting-sign.bottom|Height of its lower edge|Above the ground
        projecting-sign.gap|Gap to the wall|From the wall to the inner edge; 0 where it touches|mm|in
        projecting-sign.depth|Thickness|Of the board or box|mm|in
        projecting-sign.mass|Mass|Of the sign with its brackets
        brackets.count|Number of brackets|One above the other
        brackets.spacing|Distance between brackets|From middle to middle; empty for one bracket
        spanned-banner.width|Length of the banner|From one end to the other
        spanned-banner.height|Height|Of the fabric
        spanned-banner.bottom|Height of its lower edge|Above the ground
        spanned-banner.sag|How far its middle bows out|In the wind, seen from above: half the sag means twice the pull
        spanned-banner.solidity|Closed part|1 for closed fabric, 0.8 when a fifth of it is open; slits do not count
        spanned-banner.mass-per-area|Mass of the fabric||g/m2|lb/ft2
        posts.count|Number of posts|
        posts.spacing|Distance between posts|From middle to middle; empty for one post
        posts.section|Section of a post|Such as CHS 114.3x5, SHS 100x5 hot, PIPE 4 STD or TIMBER 100x100; left empty, one is proposed
        posts.grade|Grade of the posts|The usual one is the weakest in common use for the section
        posts.series|Series to choose from|The usual ones are steel tubes of the country of the code
        posts.deflection-limit|Limit on the deflection|The usual one goes with the code
        posts.load-duration|Duration of the wind on timber|Short is the safe one
        posts.shape|Outline of a post|
        posts.width|Width of a post|Across the wind, or its diameter|mm|in
        posts.depth|Depth of a post|Along the wind|mm|in
        hoarding-posts.spacing|Distance between posts|From middle to middle
        hoarding-posts.section|Section of a post|Such as CHS 114.3x5, SHS 100x5 hot, PIPE 4 STD or TIMBER 100x100; left empty, one is proposed
        hoarding-posts.grade|Grade of the posts|The usual one is the weakest in common use for the section
        hoarding-posts.series|Series to choose from|The usual ones are steel tubes of the country of the code
        hoarding-posts.deflection-limit|Limit on the deflection|The usual one goes with the code
        hoarding-posts.load-duration|Duration of the wind on timber|Short is the safe one
        footing.kind|Kind of footing|Left empty, posts planted in concrete
        footing.shape|Outline in plan|
        footing.width|Width or diameter|Of the concrete or of the post in the ground; of a pad along the wind
        footing.length|Length of a pad|Across the wind
        footing.depth|Depth below the ground|Left empty, it is sized
        footing.ground|Ground|good, average or poor; or rock, soft rock, gravel, sand or clay; left empty, the poorest is taken
        footing.rule|Rule for the depth|Left empty, the one that fits what is known
        footing.lateral-bearing|Allowable lateral bearing|For each metre or foot of depth
        footing.cohesion|Undrained shear strength|Of clay
        footing.friction-angle|Angle of friction|Of sand
        footing.soil-density|Density of the soil|
        footing.bearing|Allowable pressure under a pad|
        footing.friction|Friction coefficient under a pad|
        footing.safety-factor|Factor on the loads of an ultimate method|
        footing.half-inch-motion|May the post move 12.7 mm (half an inch) at the ground?|IBC then counts lateral bearing twice
        footing.third-increase|Does the increase of a third for wind count?|IBC, alternate load combinations only
        footing.paved|Does a rigid floor or pavement hold the post at the ground?|
        footing.slope|Does the ground near it slope?|
        footing.water|Ground water|
        footing.frost-depth|Depth of frost|
        footing.services|Buried services|
        ballast.mass|Mass on the foot of each brace|Left empty, it is sized
        ballast.lever|From the face to the middle of the ballast|
        ballast.front-mass|Mass on the foot below the face|At each brace
        ballast.face-mass|Mass of boards and post|That goes with one brace
        ballast.ground|Surface that it stands on|Feet of bare steel grip less: they are at the end of the list
        ballast.friction|Friction coefficient|Left empty, the lowest printed value for that surface
        ballast.friction-reason|Why it may be above 1|
        fixings.columns|Columns of fixings|Side by side
        fixings.rows|Rows of fixings|One above the other
        fixings.horizontal-pitch|Distance between columns||mm|in
        fixings.vertical-pitch|Distance between rows||mm|in
        fixings.allowable-tension|Pull that one fixing may take|By its maker, for this wall
        fixings.allowable-shear|Shear that one fixing may take|By its maker, for this wall
        override.name|Name of the value|As it stands in the calculation, such as topography-factor
        override.value|Your value|A plain number, or a number with its unit
        override.reason|Why|Stands on every output
        """;

    private static final Map<String, Wording> KNOWN = known();

    /** The words of a shape, of the shape it is like, or those that all kinds of item share. */
    static Wording of(String shape, Field field) {
        String own = (shape.equals("replaces") ? "board" : shape) + "." + field.name();
        return of(KNOWN.getOrDefault(own, KNOWN.get("item." + field.name())), field);
    }

    private static Wording of(Wording known, Field field) {
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
            case PRESSURE_PER_DEPTH -> metric ? "kPa/m" : "psf/ft";
            case FORCE_PER_LENGTH -> metric ? "kN/m" : "lbf/ft";
            case MASS_PER_LENGTH -> metric ? "kg/m" : "lb/ft";
            case VOLUME -> metric ? "m3" : "ft3";
            case INERTIA -> metric ? "cm4" : "in4";
            case FREQUENCY -> "Hz";
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
