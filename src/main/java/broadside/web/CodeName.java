package broadside.web;

import broadside.assess.Problem;
import broadside.codes.WindCode;
import broadside.table.Edition;
import java.util.Optional;

/** The name of a code inside a sentence: its title up to the first comma or colon that a space follows; of national values, that of the code they belong to. */
final class CodeName {

    static String of(WindCode code) {
        Edition edition = code.edition();
        return edition.basis().orElse(edition).property("title").replaceFirst("[,:] .*", "");
    }

    /** A problem in which the whole title of the code stands in its short form. */
    static Problem told(Problem problem, Optional<WindCode> code) {
        return code.map(c -> new Problem(problem.path(), problem.text().replace(c.edition().property("title"), of(c)), problem.options())).orElse(problem);
    }

    private CodeName() { }
}
