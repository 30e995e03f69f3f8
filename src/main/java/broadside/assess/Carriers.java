package broadside.assess;

import broadside.codes.WindCode;
import broadside.support.StabilityRule;
import broadside.support.WindLevels;
import broadside.trace.Trace;

/** What is common to the supports of every kind of item in one job: rules chosen with the code or by the user, and levels of the wind. */
record Carriers(Job job, WindCode code, SupportRules rules) {

    private static final String EN = "en";

    /** The rules for posts: "en", "us-asd" or "us-strength". */
    String route() {
        return job.basis().design().orElseGet(() -> code.edition().hasProperty("design") ? code.edition().property("design") : EN);
    }

    boolean us() {
        return !route().equals(EN);
    }

    /** The rule for overturning and sliding. */
    StabilityRule stability() {
        return rules.stability().of(job.basis().stability().orElseGet(() -> code.edition().hasProperty("stability") ? code.edition().property("stability") : "en-1990-equ"));
    }

    /** Records the factors from the code's loads to service and strength. */
    WindLevels levels(Trace sheet) {
        return SupportLevels.of(code.level(job.site()), rules.own().number("strength-factor", "value"), sheet);
    }
}
