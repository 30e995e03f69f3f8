package broadside.assess;

import broadside.codes.WindCode;
import java.util.List;

/**
 * The result of a job. It is always preliminary.
 *
 * @param about  the tool and its tables at the time of the assessment
 */
public record Assessment(Job job, WindCode code, List<ItemResult> items, About about) {

    public Assessment {
        items = List.copyOf(items);
    }

    public boolean allAssessed() {
        return items.stream().allMatch(i -> i.outcome() == ItemResult.Outcome.ASSESSED);
    }
}
