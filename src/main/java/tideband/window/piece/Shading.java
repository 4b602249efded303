package tideband.window.piece;

import tideband.optics.Finish;

/**
 * How lamps model the piece across its width. This is for show: it makes a round part look round. What is computed is the
 * colour of the film, and in even light nothing is added to it.
 *
 * <p>A lamp is a long one, hung along the piece in the direction {@code φ} across it, and does two things by the turn {@code Δφ}
 * of the surface from it: light falls off from 1 on a broad middle to {@code 1 − depth} (diffuse), and a stripe {@code g ·
 * exp(−(Δφ/w)²)} is added (gloss). Both work in linear light, so hues stay. The smoother the finish, the deeper the shade and
 * the sharper the stripe: numbers chosen by eye, no source.
 */
final class Shading {
    /** The turn from a lamp at which shade begins and where it is deepest, in degrees. */
    private static final double SHADE_FROM_DEG = 30;

    private static final double SHADE_TO_DEG = 105;
    /** A flat is shaded as if it were crowned by this much at its sides, in degrees. */
    private static final double CROWN_DEG = 14;
    /** The share of a stripe that is the lamp's own white, the rest being tinted by the film. */
    private static final float WHITE_SHARE = 0.35f;

    // A lamp: where it is, across the piece, and how strong.
    private record Lamp(double atDeg, double strength) {}

    private static final Lamp ABOVE = new Lamp(-32, 1);
    private static final Lamp BELOW = new Lamp(48, 0.45);

    private final float[] factor;
    private final float[] white;

    private Shading(int levels) {
        factor = new float[levels];
        white = new float[levels];
    }

    /**
     * The shading of a piece.
     *
     * @param lamps the lamps
     * @param finish the finish
     * @param flat whether the piece is flat
     * @param levels across the piece, from above to below, at least 2
     * @return what is done to light at each level
     */
    static Shading of(Lamps lamps, Finish finish, boolean flat, int levels) {
        Shading shading = new Shading(levels);
        for (int level = 0; level < levels; level++) {
            double offset = 2.0 * level / (levels - 1) - 1;
            double turnDeg = flat ? CROWN_DEG * offset : Math.toDegrees(Math.asin(offset));
            shading.factor[level] = 1;
            switch (lamps) {
                case EVEN -> {}
                case ONE -> shading.light(level, turnDeg, finish, ABOVE);
                case TWO -> shading.light(level, turnDeg, finish, ABOVE, BELOW);
            }
        }
        return shading;
    }

    private void light(int level, double turnDeg, Finish finish, Lamp... lamps) {
        double shade = 1;
        double stripe = 0;
        for (Lamp lamp : lamps) {
            double away = Math.abs(turnDeg - lamp.atDeg());
            double s = Math.min(1, Math.max(0, (away - SHADE_FROM_DEG) / (SHADE_TO_DEG - SHADE_FROM_DEG)));
            double smooth = s * s * (3 - 2 * s);
            shade *= 1 - lamp.strength() * (1 - smooth);
            double widths = away / glossDeg(finish);
            stripe += lamp.strength() * gloss(finish) * Math.exp(-widths * widths);
        }
        double lit = 1 - depth(finish) * shade;
        factor[level] = (float) (lit + stripe * (1 - WHITE_SHARE));
        white[level] = (float) (stripe * WHITE_SHARE);
    }

    private static double depth(Finish finish) {
        return switch (finish) {
            case MIRROR -> 0.85;
            case POLISHED -> 0.78;
            case SATIN -> 0.62;
            case BLASTED -> 0.5;
        };
    }

    private static double gloss(Finish finish) {
        return switch (finish) {
            case MIRROR -> 0.95;
            case POLISHED -> 0.75;
            case SATIN -> 0.32;
            case BLASTED -> 0.06;
        };
    }

    private static double glossDeg(Finish finish) {
        return switch (finish) {
            case MIRROR -> 4;
            case POLISHED -> 6;
            case SATIN -> 15;
            case BLASTED -> 30;
        };
    }

    /**
     * What becomes of light.
     *
     * @param level the level
     * @param linear a channel in linear light
     * @return the channel as lit
     */
    float lit(int level, float linear) {
        return linear * factor[level] + white[level];
    }
}
