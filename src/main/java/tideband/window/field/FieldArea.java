package tideband.window.field;

/**
 * How the field's place on the screen is shared out: films in the middle, their axes left and right, the length below, and
 * above a rail on which edges can be taken hold of.
 *
 * @param widthPx width of it all
 * @param heightPx height of it all
 * @param emPx the height of text
 */
public record FieldArea(double widthPx, double heightPx, double emPx) {
    private static final double AXIS_EMS = 3.7;
    private static final double RAIL_EMS = 1.7;
    private static final double LENGTH_EMS = 1.9;
    private static final double LEAST_PX = 16;

    /**
     * Where films begin.
     *
     * @return px from the left
     */
    public double leftPx() {
        return Math.rint(AXIS_EMS * emPx);
    }

    /**
     * Where films end.
     *
     * @return px from the left
     */
    public double rightPx() {
        return Math.max(leftPx() + LEAST_PX, Math.rint(widthPx - AXIS_EMS * emPx));
    }

    /**
     * Where films end upwards.
     *
     * @return px from the top
     */
    public double topPx() {
        return Math.rint(RAIL_EMS * emPx);
    }

    /**
     * The line of no film.
     *
     * @return px from the top
     */
    public double bottomPx() {
        return Math.max(topPx() + LEAST_PX, Math.rint(heightPx - LENGTH_EMS * emPx));
    }

    /**
     * The middle of the rail.
     *
     * @return px from the top
     */
    public double railPx() {
        return topPx() - 0.65 * emPx;
    }

    boolean overFilms(double xPx, double yPx) {
        return xPx >= leftPx() && xPx <= rightPx() && yPx >= topPx() && yPx <= bottomPx();
    }
}
