package broadside.aero;

/**
 * An even screen across the wind. The loss coefficient K is the loss of pressure over the dynamic pressure of the
 * approaching air; the open share is open area over gross area.
 */
public final class Screen {

    /** Loss of round wire mesh, b (1 - beta^2) / beta^2. */
    public static double wireLoss(double openShare, double b) {
        return b * (1 - openShare * openShare) / (openShare * openShare);
    }

    /** Drag on the gross area of an open screen, K / (1 + K/4)^2 (Taylor and Davies); right below K = 4, where it peaks at 1. */
    public static double openDrag(double loss) {
        double slowed = 1 + loss / 4;
        return loss / (slowed * slowed);
    }

    /** Open share of the round wire mesh with the same loss: 1 / (1 + K/b)^0.5. */
    public static double effectiveOpenShare(double loss, double b) {
        return 1 / Math.sqrt(1 + loss / b);
    }

    private Screen() { }
}
