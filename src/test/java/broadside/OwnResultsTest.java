package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.action.PostAction;
import broadside.assess.Assessment;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Units;
import broadside.report.SvgWriter;
import broadside.sheet.ItemDrawing;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/**
 * Our own results, frozen. They come from this tool and prove nothing by themselves; they show when a result changes.
 * When one does, a person looks at the new text that this test prints and decides.
 */
class OwnResultsTest {

    private static final Path OWN = Path.of("examples", "own");

    @Test
    void the_demo_jobs_give_what_they_gave_before() throws IOException {
        StringBuilder text = new StringBuilder("# Our own results for the demo jobs: job, item, velocity pressure Pa, force N, base moment N m, torsion N m, worst post N m, then what carries it with its greatest share, then what its supports must take\n");
        AllJobs.files().keySet().stream().filter(n -> n.endsWith(".json") && !n.contains("/")).sorted().forEach(name -> {
            Assessment assessment = AllJobs.assess(AllJobs.demo(name));
            for (ItemResult item : assessment.items()) {
                if (item.loads().isEmpty()) {
                    text.append(name).append(", ").append(item.item().mark()).append(", ").append(item.outcome().word()).append('\n');
                    continue;
                }
                Loads l = item.loads().get();
                text.append(name).append(", ").append(item.item().mark());
                for (double value : new double[] {l.velocity().pressure(), l.governs("base-shear").force(), l.governs("base-moment").baseMoment(),
                    Math.abs(l.governs("torsion").torsion()), l.worstPost().map(PostAction::moment).orElse(0.0)}) {
                    text.append(", ").append(Show.number(value, 7, Rounding.NEAREST));
                }
                l.carried().ifPresent(c -> c.parts().forEach(part -> carried(part, text)));
                l.reactions().forEach(r -> text.append(", ").append(r.step()).append(' ').append(Show.number(r.value(), 7, Rounding.NEAREST)));
                text.append('\n');
            }
        });
        compare("results.csv", text.toString());
    }

    /** What a part is, and the greatest share of its checks. */
    private static void carried(Carried.Part part, StringBuilder text) {
        text.append(", ").append(part.key());
        part.results().stream().filter(r -> !r.key().equals("rule") && !r.key().equals("limit")).forEach(r -> text.append(' ')
            .append(r.unit().isEmpty() ? r.text().replace(",", "") : Show.number(r.value(), 7, Rounding.NEAREST)).append(';'));
        part.worst().ifPresent(w -> text.append(' ').append(w.name()).append(' ').append(Show.number(w.utilisation(), 7, Rounding.NEAREST)));
    }

    @Test
    void the_picture_of_the_readme_is_the_drawing_of_today() throws IOException {
        ItemResult item = AllJobs.assess(AllJobs.demo("entrance-sign.json")).items().get(0);
        compare("entrance-sign.svg", SvgWriter.svg(ItemDrawing.of(item.item(), item.loads(), Units.METRIC), "Entrance sign",
            ItemDrawing.words(item.item(), item.loads(), Units.METRIC)) + "\n");
    }

    private static void compare(String name, String now) throws IOException {
        String before = Optional.of(OWN.resolve(name)).filter(Files::exists).map(OwnResultsTest::text).orElse("");
        if (!before.equals(now)) {
            Path proposal = Path.of("target", name);
            Files.writeString(proposal, now);
            System.out.println("examples/own/" + name + " differs; the new text is in " + proposal + ":\n" + now);
        }
        assertThat(now).isEqualTo(before);
    }

    private static String text(Path file) {
        try {
            return new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
