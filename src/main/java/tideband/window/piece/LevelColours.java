package tideband.window.piece;

import java.util.Optional;

/**
 * The screen colours of a strip across the width: each stretch at each level from the upper outline to the lower one, shaded.
 * The arrays are kept and used again.
 *
 * <p>A stretch's own colour, which is mixed where a waterline blurs it, and the colour of its mean film differ a little. That
 * difference is taken straight on, in linear light, and added at every angle; so straight on in even light a stretch has exactly
 * its own colour.
 */
final class LevelColours {
    private static final int OPAQUE = 0xff000000;

    private int[] argb = new int[0];
    private final float[] film = new float[AngleTable.ANGLES * 3];
    private AngleTable.Between[] between = new AngleTable.Between[0];
    private int levels;
    private int first;

    /**
     * Works the colours out.
     *
     * @param strip the strip
     * @param from index of the first stretch in view
     * @param to index after the last
     * @param count levels across, odd
     * @param frame tilt and table
     * @param round whether the surface turns away across the width
     * @param shading the shading, of as many levels
     */
    void compute(Strip strip, int from, int to, int count, Frame frame, boolean round, Shading shading) {
        levels = count;
        first = from;
        int needed = (to - from) * count;
        if (argb.length < needed) {
            argb = new int[needed + needed / 4];
        }
        int half = count / 2;
        setAngles(half, frame.tiltDeg(), round);
        for (int index = from; index < to; index++) {
            stretch(strip, index, half, frame.table(), shading);
        }
    }

    private void setAngles(int half, double tiltDeg, boolean round) {
        if (between.length <= half) {
            between = new AngleTable.Between[half + 1];
            for (int i = 0; i <= half; i++) {
                between[i] = new AngleTable.Between();
            }
        }
        for (int i = 0; i <= half; i++) {
            between[i].set(Incidence.angleDeg(round ? (double) i / half : 0, tiltDeg));
        }
    }

    private void stretch(Strip strip, int index, int half, Optional<AngleTable> table, Shading shading) {
        float red = strip.linear(index, 0);
        float green = strip.linear(index, 1);
        float blue = strip.linear(index, 2);
        int base = (index - first) * levels + half;
        double filmNm = strip.get(index).filmNm();
        boolean angled = table.isPresent() && filmNm <= table.get().maxNm();
        if (angled) {
            table.get().film(filmNm, film, 0);
            red -= film[0];
            green -= film[1];
            blue -= film[2];
        }
        for (int i = 0; i <= half; i++) {
            float r = red;
            float g = green;
            float b = blue;
            if (angled) {
                r = held(r + between[i].of(film, 0));
                g = held(g + between[i].of(film, 1));
                b = held(b + between[i].of(film, 2));
            }
            argb[base + i] = encoded(shading, half + i, r, g, b);
            if (i > 0) {
                argb[base - i] = encoded(shading, half - i, r, g, b);
            }
        }
    }

    /**
     * The colour of a strip's first stretch under one angle, not shaded.
     *
     * @param strip the strip
     * @param table colours under angles; without it the colour straight on is given
     * @param angleDeg angle in degrees, 0 to 85
     * @return opaque ARGB
     */
    static int plain(Strip strip, Optional<AngleTable> table, double angleDeg) {
        float[] film = new float[AngleTable.ANGLES * 3];
        double filmNm = strip.get(0).filmNm();
        boolean angled = table.isPresent() && filmNm <= table.get().maxNm();
        AngleTable.Between between = new AngleTable.Between();
        between.set(angleDeg);
        if (angled) {
            table.get().film(filmNm, film, 0);
        }
        int argb = 0xff;
        for (int channel = 0; channel < 3; channel++) {
            float own = strip.linear(0, channel) - film[channel];
            argb = argb << 8 | LinearLight.eightBits(angled ? own + between.of(film, channel) : own);
        }
        return argb;
    }

    /** A colour that the sum of three terms took out of the screen's range. */
    private static float held(float linear) {
        return Math.min(1, Math.max(0, linear));
    }

    private static int encoded(Shading shading, int level, float r, float g, float b) {
        return OPAQUE
                | LinearLight.eightBits(shading.lit(level, r)) << 16
                | LinearLight.eightBits(shading.lit(level, g)) << 8
                | LinearLight.eightBits(shading.lit(level, b));
    }

    /**
     * A colour.
     *
     * @param stretch index of the stretch, one of those worked out
     * @param level 0 at the upper outline
     * @return opaque ARGB
     */
    int at(int stretch, int level) {
        return argb[(stretch - first) * levels + level];
    }
}
