package broadside.support;
import broadside.trace.*;
import java.util.*;
public class Timing {
    public static void main(String[] a) {
        PostDesign d = new PostDesign(Tubes.RULES);
        List<Section> s = Tubes.series();
        System.out.println(s.size() + " sections");
        for (String route : List.of("en", "us-asd")) {
            for (double f : new double[]{2000, 60000}) {
            List<PostLoad> loads = new ArrayList<>();
            for (int p = 0; p < 4; p++) for (String n : List.of("a", "b", "c", "d")) { double k = f * (1 - 0.05 * p - 0.01 * n.charAt(0)/97); loads.add(new PostLoad(n, k, 3*k, n.equals("b") ? 0.3*k : 0, 0, 0, 400, 0, 9*k, 27*k)); }
            loads.add(new PostLoad("edge", 0, 0, 0, 150, 450, 400, 0, 150*9, 150*27));
            PostTask t = new PostTask(route, "short", loads, new WindLevels(1, 1.5, "x", Status.RECALLED), x -> OwnDrag.even(1200 * x.width(), 0, 2), 3.75, 4, 40, 3, Optional.empty());
            double[] times = new double[4000];
            PostDesign.Sized r = null;
            for (int i = 0; i < times.length; i++) { long n = System.nanoTime(); r = d.size(s, Tubes.S235, t, new Trace()); times[i] = (System.nanoTime() - n) / 1e6; }
            double[] last = Arrays.copyOfRange(times, 2000, 4000); Arrays.sort(last);
            System.out.printf("%s %.0f N: median %.3f ms, chosen %s at %d%n", route, f, last[1000], r.chosen().map(c -> c.section().designation()).orElse("none"), r.chosen().map(c -> s.indexOf(c.section())).orElse(-1));
            System.out.println(r.candidates().get(0));
            }
        }
    }
}
