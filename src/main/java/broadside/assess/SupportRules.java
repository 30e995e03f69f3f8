package broadside.assess;

import broadside.support.BracketFixings;
import broadside.support.Catalogue;
import broadside.support.FenceStability;
import broadside.support.FixingGroup;
import broadside.support.Footings;
import broadside.support.KentledgeStability;
import broadside.support.PostDesign;
import broadside.support.StabilityRules;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableLibrary;

/**
 * Sections and rules for what carries items, read once at the start, so that a broken table stops it.
 *
 * @param own  what this tool takes where nothing is given
 */
record SupportRules(Catalogue catalogue, PostDesign posts, Footings footings, StabilityRules stability, FenceStability fences, KentledgeStability kentledge,
                    FixingGroup fixings, BracketFixings brackets, Rows own) {

    static SupportRules of(TableLibrary tables, Catalogue catalogue) {
        Edition stability = tables.edition("stability/1").orElseThrow();
        return new SupportRules(catalogue, new PostDesign(tables.edition("post-rules/1").orElseThrow()), new Footings(tables), new StabilityRules(stability),
            new FenceStability(stability), new KentledgeStability(stability), new FixingGroup(stability), new BracketFixings(stability),
            tables.edition("own-rules/1").orElseThrow().rows("supports"));
    }
}
