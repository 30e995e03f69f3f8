package broadside.table;

/** The printed table does not cover the value asked for. Tables are never extended past their printed ends. */
public final class OutsideTable extends RuntimeException {

    private final Source source;

    public OutsideTable(Source source, String problem) {
        super(source.citation() + " " + problem);
        this.source = source;
    }

    static OutsideTable range(Source source, String axis, double asked, double from, double to) {
        return new OutsideTable(source, "covers " + axis + " from " + number(from) + " to " + number(to)
            + "; this case has " + number(asked));
    }

    public Source source() {
        return source;
    }

    static String number(double value) {
        if (value == Math.rint(value) && Math.abs(value) < 1e9) {
            return Long.toString((long) value);
        }
        double rounded = Math.round(value * 1e4) / 1e4;
        return Double.toString(rounded == 0 ? value : rounded);
    }
}
