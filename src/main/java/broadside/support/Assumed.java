package broadside.support;

/** Something that was assumed and must be confirmed on site. */
public record Assumed(String text) { }
