package broadside.codes;

import broadside.table.Edition;

/**
 * What is fixed about a code.
 *
 * @param edition   the edition whose tables are read
 * @param terms     what it wants to know of the site
 * @param level     the level of its loads and the companion
 * @param symbols   how it writes the sizes of a panel
 * @param pressure  how it writes the velocity pressure
 */
public record CodeFacts(Edition edition, SiteTerms terms, Level level, PanelSymbols symbols, String pressure) { }
