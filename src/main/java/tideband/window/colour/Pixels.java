package tideband.window.colour;

/** A picture as numbers, row by row from its upper left corner; its colours are taken as sRGB. */
public interface Pixels {
    /**
     * Its width.
     *
     * @return pixels, at least 1
     */
    int widthPx();

    /**
     * Its height.
     *
     * @return pixels, at least 1
     */
    int heightPx();

    /**
     * One pixel.
     *
     * @param xPx from the left, 0-based
     * @param yPx from the top, 0-based
     * @return {@code 0xaarrggbb}, not multiplied by its alpha
     */
    int argb(int xPx, int yPx);
}
