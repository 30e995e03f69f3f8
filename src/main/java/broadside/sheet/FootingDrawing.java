package broadside.sheet;

import broadside.assess.Carried;
import broadside.assess.Loads;
import broadside.sheet.Drawing.Fill;
import java.util.Optional;

/**
 * The footing below the ground in a side view, with its depth; nothing where none was sized.
 *
 * @param width  along the wind, m
 * @param depth  below the ground, m
 */
record FootingDrawing(double width, double depth) {

    static Optional<FootingDrawing> of(Optional<Loads> loads) {
        Optional<Carried.Part> part = loads.flatMap(Loads::carried).flatMap(c -> c.part("footing")).filter(p -> p.refused().isEmpty());
        return part.flatMap(p -> value(p, "depth").flatMap(d -> value(p, "width").map(w -> new FootingDrawing(w, d))));
    }

    private static Optional<Double> value(Carried.Part part, String key) {
        return part.results().stream().filter(r -> r.key().equals(key) && r.unit().equals("m")).map(Carried.Result::value).findFirst();
    }

    /** Draws it below the origin of a side view, its depth beside it. */
    void draw(Canvas side, Format format) {
        side.box(-width / 2, -depth, width, depth, Canvas.THIN, Fill.NONE);
        double at = side.x(width / 2) + 16;
        side.help(side.x(width / 2), side.y(-depth), at + 4, side.y(-depth));
        side.upwardRight(-depth, 0, at, format.length(depth));
    }

    /** Room that it needs below the ground line, points. */
    double room(double scale, Format format) {
        return Math.max(depth * scale, Canvas.width(format.length(depth))) + 10;
    }
}
