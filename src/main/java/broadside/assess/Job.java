package broadside.assess;

import broadside.panel.Item;
import broadside.quantity.Speed;
import broadside.quantity.Units;
import broadside.site.Site;
import broadside.trace.OwnValue;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * One job: who, by which code, where, what.
 *
 * @param header     texts of the head of the job by their names in the job file: title, reference, client and so on
 * @param remarks    texts of single items by mark and name: what it is fixed to, who gave the solidity
 * @param overrides  values that the user sets in place of calculated ones
 * @param compared   speeds and terrains typed for single codes of the comparison side by side
 */
public record Job(Map<String, String> header, Basis basis, Site site, List<Item> items, Map<String, String> remarks,
                  List<OwnValue> overrides, List<Compared> compared) {

    /** What was typed for one code of the comparison; {@code key} is that of its edition. */
    public record Compared(String key, Optional<Speed> speed, Optional<String> terrain) { }

    /** The code by which loads are found; {@code stability} and {@code design} name the rules for overturning and for posts, where they are chosen. */
    public record Basis(String code, String edition, Optional<String> overlay, Optional<String> stability, Optional<String> design) {

        /** Key of the edition or overlay among the tables. */
        public String key() {
            return code + "/" + edition + overlay.map(o -> "-" + o).orElse("");
        }
    }

    public Job {
        header = Map.copyOf(header);
        items = List.copyOf(items);
        remarks = Map.copyOf(remarks);
        overrides = List.copyOf(overrides);
        compared = List.copyOf(compared);
    }

    public Optional<String> head(String name) {
        return Optional.ofNullable(header.get(name));
    }

    public Optional<String> remark(String mark, String name) {
        return Optional.ofNullable(remarks.get(mark + "/" + name));
    }

    public Job withSite(Site other) {
        return new Job(header, basis, other, items, remarks, overrides, compared);
    }

    /** The system of units: the one the job names, else the one its wind speed is typed in. */
    public Units units() {
        return head("units").map(u -> u.equals("us") ? Units.US : Units.METRIC).orElseGet(() -> {
            String typed = site().basicSpeed().typed().toLowerCase(Locale.ROOT);
            return typed.contains("mph") || typed.contains("ft/s") ? Units.US : Units.METRIC;
        });
    }
}
