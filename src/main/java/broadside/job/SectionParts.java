package broadside.job;

import broadside.support.Catalogue;
import broadside.support.Section;
import broadside.support.UnfitAnswer;
import broadside.trace.Trace;
import tools.jackson.databind.JsonNode;

/** Published checks of the sections of posts, without a job. */
final class SectionParts {

    /** Properties of the section whose designation is given. */
    static Trace section(JsonNode given, Catalogue catalogue) {
        String designation = PublishedChecks.text(given, "section");
        Trace trace = new Trace();
        try {
            Section section = catalogue.find(designation).orElseThrow(() -> PublishedChecks.bad("section \"" + StructureReader.clean(designation)
                + "\" is not known; sections are given like \"CHS 114.3x3.6\", \"SHS 100x5 hot\", \"RHS 120x80x8 cold\" or \"PIPE 4 STD\""));
            catalogue.record(section, trace);
        } catch (UnfitAnswer e) {
            throw PublishedChecks.bad("section: " + e.getMessage());
        }
        return trace;
    }

    private SectionParts() { }
}
