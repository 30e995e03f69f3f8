package broadside.codes;

/** The symbols by which a code writes the width and the height of a panel and the gap below it. */
public record PanelSymbols(String width, String height, String gap) { }
