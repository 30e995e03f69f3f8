package broadside.assess;

import broadside.action.FootActions;
import broadside.action.HoardingPosts;
import broadside.action.PostAction;
import broadside.action.SignPosts;
import broadside.panel.Item;
import java.util.List;
import java.util.Map;

/** The equilibrium lines: what acts on the item, and the sum of what its posts answer, in one and the same case. */
final class Balances {

    static List<Loads.Balance> of(Item item, FootActions.Result actions, List<PostAction> posts, Map<String, String> governing) {
        if (posts.isEmpty()) {
            return List.of();
        }
        FootActions.Combined worst = actions.combinations().stream()
            .filter(c -> c.name().equals(governing.get("post-moment"))).findFirst().orElseThrow();
        double[] sums = item.choose(
            sign -> SignPosts.sums(worst, sign.posts().positions()),
            hoarding -> HoardingPosts.sums(worst, hoarding, hoarding.spacing().orElseThrow().metres()));
        String gate = item.choose(sign -> "", hoarding -> hoarding.gates().isEmpty() ? "" : ", gate leaves left out");
        return List.of(new Loads.Balance("shear at the ground, case " + worst.name() + gate, worst.force(), sums[0], "N"),
            new Loads.Balance("moment at the ground, case " + worst.name() + gate, worst.moment(), sums[1], "N m"));
    }

    private Balances() { }
}
