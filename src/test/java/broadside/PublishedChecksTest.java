package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.PublishedCheck;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicContainer;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Each file of examples/published is a test, each printed value a line of it. The files name their publications. */
class PublishedChecksTest {

    private static final List<PublishedCheck> CHECKS = AllJobs.TOOL.checks().shipped();

    @TestFactory
    Stream<DynamicContainer> published() {
        return CHECKS.stream().map(check -> DynamicContainer.dynamicContainer(check.file(), check.lines().stream().map(line ->
            DynamicTest.dynamicTest(line.item() + " " + line.step(), () -> assertThat(line.passed()).as(line.toString()).isTrue()))));
    }

    @Test
    void there_are_enough_of_them_and_of_traps() {
        assertThat(CHECKS).hasSizeGreaterThanOrEqualTo(25);
        assertThat(CHECKS.stream().filter(PublishedCheck::trap)).hasSizeGreaterThanOrEqualTo(4);
    }

    @Test
    void each_cites_a_publication_of_the_bibliography() {
        for (PublishedCheck check : CHECKS) {
            assertThat(AllJobs.TOOL.tables().publication(check.source().publication())).as(check.file() + ": " + check.source().publication()).isPresent();
        }
    }
}
