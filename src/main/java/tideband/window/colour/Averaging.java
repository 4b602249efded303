package tideband.window.colour;

import java.util.Optional;
import tideband.colour.Srgb;
import tideband.colour.Xyz;

/**
 * How much of a picture makes up the colour of a place: a disc of pixels. Light is averaged (X, Y and Z), not code
 * values, each pixel by its opacity; that is how the eye blends dots too small to see.
 */
public enum Averaging {
    /** The pixel alone. */
    ONE(1),
    /** A small patch, against noise. */
    THREE(3),
    /** A large patch, against texture. */
    NINE(9);

    private final int radiusPx;

    Averaging(int radiusPx) {
        this.radiusPx = radiusPx;
    }

    /**
     * The radius of the disc; pixels whose middle is nearer than this to that of the place are in it.
     *
     * @return pixels
     */
    public int radiusPx() {
        return radiusPx;
    }

    /**
     * The colour of a place.
     *
     * @param pixels the picture
     * @param xPx from the left
     * @param yPx from the top
     * @return its colour; empty where the picture is wholly transparent
     */
    public Optional<Srgb> at(Pixels pixels, int xPx, int yPx) {
        double opacity = 0;
        double x = 0;
        double y = 0;
        double z = 0;
        int out = radiusPx - 1;
        for (int row = Math.max(0, yPx - out); row <= Math.min(pixels.heightPx() - 1, yPx + out); row++) {
            for (int column = Math.max(0, xPx - out); column <= Math.min(pixels.widthPx() - 1, xPx + out); column++) {
                int dx = column - xPx;
                int dy = row - yPx;
                int argb = pixels.argb(column, row);
                double alpha = (argb >>> 24) / 255.0;
                if (dx * dx + dy * dy < radiusPx * radiusPx && alpha > 0) {
                    Xyz light = light(argb);
                    opacity += alpha;
                    x += alpha * light.x();
                    y += alpha * light.y();
                    z += alpha * light.z();
                }
            }
        }
        return opacity > 0 ? Optional.of(Srgb.of(new Xyz(x / opacity, y / opacity, z / opacity))) : Optional.empty();
    }

    private static Xyz light(int argb) {
        Srgb pixel = new Srgb((argb >> 16 & 0xff) / 255.0, (argb >> 8 & 0xff) / 255.0, (argb & 0xff) / 255.0, true);
        return pixel.lab().toXyz(Srgb.WHITE);
    }
}
