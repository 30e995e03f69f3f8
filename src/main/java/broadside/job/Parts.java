package broadside.job;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Speed;
import broadside.quantity.Typed;
import broadside.site.Averaging;
import broadside.site.SpeedConversion;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import tools.jackson.databind.JsonNode;

/** Published checks of one part of the calculation, without a job. */
final class Parts {

    private static final String FASTEST_MILE = "fastest mile";

    private final SpeedConversion conversion;

    Parts(SpeedConversion conversion) {
        this.conversion = conversion;
    }

    Trace run(JsonNode given) {
        String part = PublishedChecks.text(given, "part");
        if (!part.equals("convert-speed")) {
            throw PublishedChecks.bad("the part \"" + StructureReader.clean(part) + "\" is not one that this version checks; it knows convert-speed");
        }
        return convertSpeed(given);
    }

    private Trace convertSpeed(JsonNode given) {
        Reading reading = Typed.read(PublishedChecks.text(given, "speed"), Dimension.SPEED);
        if (!(reading instanceof Reading.Value value) || !(value.si() > 0)) {
            throw PublishedChecks.bad("speed: a speed above zero is typed with its unit, like \"80 mph\"");
        }
        String terrain = PublishedChecks.text(given, "terrain");
        if (!terrain.isEmpty() && !terrain.equals("open")) {
            throw PublishedChecks.bad("terrain \"" + StructureReader.clean(terrain) + "\": the conversion holds for \"open\" only");
        }
        Speed speed = new Speed(value.si(), value.typed());
        String from = PublishedChecks.text(given, "from");
        Averaging to = averaging(given, "to");
        Trace trace = new Trace();
        try {
            if (from.equals(FASTEST_MILE)) {
                conversion.convertFastestMile(speed, to, trace);
            } else {
                conversion.convert(speed, averaging(given, "from"), to, trace);
            }
        } catch (OutsideTable e) {
            throw PublishedChecks.bad(e.getMessage());
        }
        return trace;
    }

    private static Averaging averaging(JsonNode given, String name) {
        String words = PublishedChecks.text(given, name);
        return Averaging.of(words).orElseThrow(() -> PublishedChecks.bad(name + " \"" + StructureReader.clean(words) + "\" is none of "
            + FASTEST_MILE + ", " + String.join(", ", Averaging.allWords())));
    }
}
