package broadside.assess;

import broadside.action.FootActions;
import broadside.action.HoardingPosts;
import broadside.action.PanelCases;
import broadside.action.PostAction;
import broadside.action.SignPosts;
import broadside.codes.LoadCase;
import broadside.panel.Hoarding;
import broadside.panel.PostSign;
import java.util.Comparator;
import java.util.List;

/** The equilibrium lines: what acts on the item, and the sum of what its posts answer, in one and the same case. */
final class Balances {

    static List<Loads.Balance> sign(PostSign sign, List<FootActions.Combined> combinations, List<PostAction> posts) {
        String governing = posts.stream().max(Comparator.comparingDouble(PostAction::moment)).orElseThrow().named();
        FootActions.Combined worst = combinations.stream().filter(c -> c.name().equals(governing)).findFirst().orElseThrow();
        double[] sums = SignPosts.sums(worst, sign.posts().positions());
        return List.of(new Loads.Balance("shear at the ground by the wind on the boards, case " + LoadCase.shortName(worst.name()), worst.force(), sums[0], "N"),
            new Loads.Balance("moment at the ground by the wind on the boards, case " + LoadCase.shortName(worst.name()), worst.moment(), sums[1], "N m"));
    }

    static List<Loads.Balance> hoarding(Hoarding hoarding, List<PanelCases> panels) {
        double[] sums = HoardingPosts.balance(hoarding, hoarding.spacing().orElseThrow().metres(), panels);
        return List.of(new Loads.Balance("force on the boards and shears of all posts, case " + HoardingPosts.balanceCase(panels)
            + (hoarding.gates().isEmpty() ? "" : ", gates open"), sums[0], sums[1], "N"));
    }

    private Balances() { }
}
