package broadside.assess;

import broadside.action.EdgeOn;
import broadside.action.FootActions.Combined;
import broadside.action.PostAction;
import broadside.action.SignPosts;
import broadside.panel.Board;
import broadside.panel.Hoarding;
import broadside.panel.PostSign;
import broadside.quantity.Mass;
import broadside.support.PostLoad;
import broadside.table.Coefficient;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * What one post of an item is checked for: every case of every post, and the wind along the face. The mass counts where it
 * does harm, also where it had to be assumed, and helps only where it was given.
 *
 * @param loads      at the level of the code
 * @param tipMass    kg on one post
 * @param tipHeight  of its middle above the ground, m
 * @param top        of the highest board, m
 * @param given      weight that was given, on the post with the least of it, N; below zero where boards beside the posts lift it
 * @param torsion    greatest of a single post, N m
 * @param assumed    what was taken without having been given
 */
record PostDemands(List<PostLoad> loads, double tipMass, double tipHeight, double top, double given, double torsion, List<String> assumed) {

    /** Name of the case of wind along the face. */
    static final String ALONG = "along the face";

    static PostDemands of(PostSign sign, List<Combined> combinations, EdgeOn edge, Coefficient boardMass, Trace sheet) {
        double n = sign.posts().count();
        List<Double> at = sign.posts().positions();
        double spread = at.stream().mapToDouble(x -> x * x).sum();
        double mass = 0;
        double given = 0;
        double moment = 0;
        double aside = 0;
        double givenAside = 0;
        List<String> assumed = new ArrayList<>();
        for (Board board : sign.boards()) {
            double each = board.mass().map(Mass::kilograms).orElseGet(() -> boardMass.value() * board.areaShare() * board.width().metres() * board.height().metres());
            mass += each;
            given += board.mass().map(Mass::kilograms).orElse(0.0);
            moment += each * (board.clearance().metres() + board.height().metres() / 2);
            aside += each * board.offset().metres();
            givenAside += board.mass().map(Mass::kilograms).orElse(0.0) * board.offset().metres();
        }
        if (sign.boards().stream().anyMatch(b -> b.mass().isEmpty())) {
            boardMass.into(sheet.line("board-mass", "m_A", "mass of a board for each square metre, kg, where none was given"));
            assumed.add("The mass of a board was not given: " + (long) boardMass.value() + " kg for each square metre are taken where mass does harm, and none where it helps.");
        }
        double weight = Weights.newtons(mass) / n;
        double turned = Weights.newtons(Math.abs(aside));
        double most = n > 1 ? weight + turned * at.get(at.size() - 1) / spread : weight;
        double leaning = n > 1 ? 0 : turned;
        double least = Weights.newtons(given) / n - (n > 1 ? Weights.newtons(Math.abs(givenAside)) * at.get(at.size() - 1) / spread : 0);
        Set<PostLoad> loads = new LinkedHashSet<>();
        SignPosts.cases(at, combinations).forEach(c -> loads.add(new PostLoad(named(c.named(), c.state()), c.shear(), c.moment(), c.torsion(), 0, 0, most, leaning,
            c.squares(), c.cubes())));
        loads.add(new PostLoad(ALONG, 0, 0, 0, edge.force() / n, edge.moment() / n, most, leaning, 0, 0));
        double top = sign.boards().stream().mapToDouble(b -> b.clearance().metres() + b.height().metres()).max().orElseThrow();
        double middle = sign.boards().stream().mapToDouble(b -> b.clearance().metres() + b.height().metres() / 2).max().orElseThrow();
        return new PostDemands(List.copyOf(loads), mass / n, mass > 0 ? moment / mass : middle, top, least,
            loads.stream().mapToDouble(PostLoad::torsion).max().orElse(0), assumed);
    }

    private static String named(String load, String state) {
        return state.equals(PostSign.ENVELOPE) ? load + ", as one board" : load;
    }

    /** The worst post of a hoarding. */
    static PostDemands of(Hoarding hoarding, PostAction worst, EdgeOn edge, int posts, Coefficient boardMass, Trace sheet) {
        double height = hoarding.height().metres();
        double middle = hoarding.clearance().metres() + height / 2;
        double mass = boardMass.into(sheet.line("board-mass", "m_A", "mass of the boards for each square metre, kg")) * height
            * (worst.share().orElseThrow() + worst.gate());
        double z = worst.shear() == 0 ? middle : worst.moment() / worst.shear();
        List<PostLoad> loads = List.of(
            new PostLoad(worst.named(), worst.shear(), worst.moment(), 0, 0, 0, Weights.newtons(mass), 0, worst.moment() * z + worst.shear() * height * height / 12,
                worst.moment() * z * z + worst.moment() * height * height / 4),
            new PostLoad(ALONG, 0, 0, 0, edge.force() / posts, edge.moment() / posts, Weights.newtons(mass), 0, 0, 0));
        return new PostDemands(loads, mass, middle, hoarding.clearance().metres() + height, 0, 0, List.of("The mass of the boards is not asked for: " + (long) boardMass.value()
            + " kg for each square metre are taken where mass does harm, and none where it helps."));
    }
}
