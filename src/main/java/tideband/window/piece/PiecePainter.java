package tideband.window.piece;

import java.util.Arrays;
import tideband.piece.Section;

/**
 * Paints the piece, pixel by pixel, into an array.
 *
 * <p>Lengths along the piece keep the scale of the view at every tilt, as though the eye came nearer by what tilting shortens. On
 * a tilted round piece a line round it shows as an arc, since its near side stands {@code h cos φ sin τ} in front of the axis;
 * it is drawn bent by {@code h (1 − cos φ) sin τ} towards end A at the outlines, so that along the middle of the picture every place
 * is where the view says. End A is the near end and shows its face, seen at 90° − τ; a tube shows its bore.
 *
 * <p>All scratch space is kept from one picture to the next.
 */
final class PiecePainter {
    private static final int MOST_HALF_LEVELS = 150;
    private static final int FEWEST_HALF_LEVELS = 8;
    private static final int MORE_LEVELS = 30;
    /** A flat's broken edge, in px. */
    private static final float EDGE_PX = 1.5f;
    /** A tube shows a little of its mouth even when it is not tilted, for show. */
    private static final double LEAST_MOUTH_SINE = 0.2;

    private static final double SEAM_PX = 1.5;
    /** How much lighter a flat's broken edges are. */
    private static final float EDGE_GLOSS = 0.45f;
    /** How far from the outline the piece darkens into it, in px, and to what share. */
    private static final float RIM_PX = 1;

    private static final float RIM_SHARE = 0.62f;

    private static final int NOTHING = -1;
    private static final int BORE_RGB = 0x14161a;
    private static final int BORE_LIT_RGB = 0x4a4f56;

    private final LevelColours colours = new LevelColours();
    private float[] halfPx = new float[0];
    private float[] bendPx = new float[0];
    private float[] levelsPerPx = new float[0];
    private int[] stretchAt = new int[0];

    private Frame frame;
    private int[] argb;
    private int width;
    private int levels;
    private int firstColumn;
    private int lastColumn;
    private int columns;
    private boolean flat;

    /**
     * Paints a picture; what is not piece becomes clear.
     *
     * @param into takes the picture, row by row, premultiplied
     * @param widthPx width of the picture
     * @param heightPx its height
     * @param what what is painted
     */
    void paint(int[] into, int widthPx, int heightPx, Frame what) {
        Arrays.fill(into, 0, widthPx * heightPx, 0);
        argb = into;
        frame = what;
        width = widthPx;
        double sine = sine(what);
        double largestPx = what.piece().largestSizeMm(0, what.piece().lengthMm()) / 2 * what.acrossPxPerMm();
        int mostBend = (int) Math.ceil(largestPx * sine);
        firstColumn = (int) Math.max(0, Math.floor(what.view().px(0) - 2 * mostBend));
        lastColumn = (int)
                Math.min(widthPx - 1, Math.ceil(what.view().px(what.piece().lengthMm())));
        if (firstColumn > lastColumn) {
            return;
        }
        columns = lastColumn - firstColumn + 2 + mostBend;
        // More levels than px, so that a stripe on a taper runs smoothly from row to row.
        int halfLevels = (int) Math.ceil(Math.min(2 * largestPx, largestPx + MORE_LEVELS));
        levels = 2 * Math.min(MOST_HALF_LEVELS, Math.max(FEWEST_HALF_LEVELS, halfLevels)) + 1;
        measure(sine);
        flat = what.piece().section() instanceof Section.Flat;
        Shading shading = Shading.of(what.lamps(), what.finish(), flat, levels);
        int top = (int) Math.max(0, Math.floor(what.centrePx() - largestPx - 1));
        int bottom = (int) Math.min(heightPx, Math.ceil(what.centrePx() + largestPx + 1));
        if (what.upper() == what.lower()) {
            half(what.upper(), top, bottom, shading, sine);
        } else {
            int middle = (int) Math.min(bottom, Math.max(top, Math.round(what.centrePx())));
            half(what.upper(), top, middle, shading, sine);
            half(what.lower(), middle, bottom, shading, sine);
        }
    }

    private static double sine(Frame frame) {
        double sine = Math.sin(Math.toRadians(frame.tiltDeg()));
        if (frame.piece().section() instanceof Section.Tube) {
            return Math.max(LEAST_MOUTH_SINE, sine);
        }
        return frame.piece().section() instanceof Section.Flat ? 0 : sine;
    }

    /**
     * How far end B is bent back.
     *
     * @param frame what is painted
     * @param offPx offset from the axis in px, at most the half width there
     * @return px towards end A
     */
    static double bendPx(Frame frame, double offPx) {
        double half = frame.piece().sizeMm(frame.piece().lengthMm()) / 2 * frame.acrossPxPerMm();
        return sine(frame) * (half - Math.sqrt(half * half - offPx * offPx));
    }

    /** Half width and bend of every column. */
    private void measure(double sine) {
        if (halfPx.length < columns) {
            halfPx = new float[columns];
            bendPx = new float[columns];
            levelsPerPx = new float[columns];
            stretchAt = new int[columns];
        }
        double lengthMm = frame.piece().lengthMm();
        for (int i = 0; i < columns; i++) {
            double atMm = frame.view().mm(firstColumn + i + 0.5);
            double half = frame.piece().sizeMm(Math.min(lengthMm, Math.max(0, atMm))) / 2 * frame.acrossPxPerMm();
            halfPx[i] = (float) half;
            bendPx[i] = (float) (half * sine);
            levelsPerPx[i] = (float) ((levels - 1) / 2.0 / half);
        }
    }

    private void half(Strip strip, int top, int bottom, Shading shading, double sine) {
        int from = strip.size();
        int to = 0;
        // Under the face of end A the outside goes on a little, so that no seam shows.
        double seamMm = sine > 0 ? SEAM_PX / frame.view().pxPerMm() : 0;
        int index = strip.indexAt(frame.view().mm(firstColumn + 0.5));
        for (int i = 0; i < columns; i++) {
            double atMm = frame.view().mm(firstColumn + i + 0.5);
            if (atMm < -seamMm || atMm > strip.get(strip.size() - 1).toMm()) {
                stretchAt[i] = NOTHING;
                continue;
            }
            while (atMm >= strip.get(index).toMm() && index < strip.size() - 1) {
                index++;
            }
            stretchAt[i] = index;
            from = Math.min(from, index);
            to = index + 1;
        }
        if (from < to) {
            colours.compute(strip, from, to, levels, frame, !flat, shading);
            if (sine > 0) {
                bentRows(top, bottom);
                face(strip, top, bottom, sine);
            } else {
                rows(top, bottom);
            }
        }
    }

    private void rows(int top, int bottom) {
        for (int y = top; y < bottom; y++) {
            float off = (float) (y + 0.5 - frame.centrePx());
            for (int x = firstColumn; x <= lastColumn; x++) {
                int i = x - firstColumn;
                float depth = halfPx[i] - Math.abs(off);
                if (depth > -0.5f && stretchAt[i] != NOTHING) {
                    argb[y * width + x] = edged(colours.at(stretchAt[i], level(off, i)), depth, 1);
                }
            }
        }
    }

    private void bentRows(int top, int bottom) {
        float end = (float) frame.view().px(frame.piece().lengthMm());
        float[] bend = new float[levels];
        for (int level = 0; level < levels; level++) {
            double share = 2.0 * level / (levels - 1) - 1;
            bend[level] = (float) (1 - Math.sqrt(1 - share * share));
        }
        for (int y = top; y < bottom; y++) {
            float off = (float) (y + 0.5 - frame.centrePx());
            for (int x = firstColumn; x <= lastColumn; x++) {
                int i = x - firstColumn;
                float depth = halfPx[i] - Math.abs(off);
                if (depth > -0.5f) {
                    int level = level(off, i);
                    float back = bendPx[i] * bend[level];
                    int source = stretchAt[i + (int) (back + 0.5f)];
                    float before = end - (x + back);
                    if (source != NOTHING && before > 0) {
                        argb[y * width + x] = edged(colours.at(source, level), depth, Math.min(1, before));
                    }
                }
            }
        }
    }

    /** A colour near the outline: a flat's edge is bright, every outline ends in a thin dark rim and is smoothed. */
    private int edged(int opaque, float depth, float cover) {
        if (depth > EDGE_PX + 1 && cover == 1) {
            return opaque;
        }
        int colour = opaque;
        if (flat && depth < EDGE_PX + 1) {
            float gloss = EDGE_GLOSS * Math.min(1, EDGE_PX + 1 - depth);
            colour = mixed(colour, 0xffffffff, gloss);
        }
        float rim = Math.min(1, Math.max(0, RIM_PX + 0.5f - depth));
        colour = mixed(colour, 0xff000000, rim * (1 - RIM_SHARE));
        return covered(colour, Math.min(1, depth + 0.5f) * cover);
    }

    private static int mixed(int opaque, int other, float share) {
        int sum = 0xff;
        for (int shift = 16; shift >= 0; shift -= 8) {
            int own = opaque >> shift & 0xff;
            sum = sum << 8 | (int) (own + ((other >> shift & 0xff) - own) * share + 0.5f);
        }
        return sum;
    }

    /** The level at an offset from the axis; a pixel that the outline cuts may lie a little beyond the last. */
    private int level(float off, int column) {
        int last = levels - 1;
        int level = (int) (off * levelsPerPx[column] + 0.5f * last + 0.5f);
        return Math.min(last, Math.max(0, level));
    }

    /** The face of end A: an ellipse half as wide as the outline bends. */
    private void face(Strip strip, int top, int bottom, double sine) {
        double half = frame.piece().sizeMm(0) / 2 * frame.acrossPxPerMm();
        double across = half * sine;
        double centre = frame.view().px(0) - across;
        boolean tube = frame.piece().section() instanceof Section.Tube;
        double bore = frame.piece().section() instanceof Section.Tube mouth
                ? mouth.boreMm() / frame.piece().sizeMm(0)
                : 0;
        int metal = LevelColours.plain(strip, frame.table(), Incidence.angleDeg(0, 90 - frame.tiltDeg()));
        int end = (int) Math.min(lastColumn, Math.ceil(centre + across));
        for (int y = top; y < bottom; y++) {
            double high = (y + 0.5 - frame.centrePx()) / half;
            for (int x = (int) Math.max(firstColumn, Math.floor(centre - across)); x <= end; x++) {
                double wide = (x + 0.5 - centre) / across;
                double out = Math.hypot(wide, high);
                float cover = (float) ((1 - out) * Math.min(half, across) + 0.5);
                if (cover > 0) {
                    int colour = tube && out < bore ? inside(high / bore) : metal;
                    argb[y * width + x] = over(covered(colour, cover), argb[y * width + x]);
                }
            }
        }
    }

    /** The bore: light from above falls on its lower wall. */
    private static int inside(double high) {
        double lit = Math.max(0, high);
        int colour = 0xff;
        for (int shift = 16; shift >= 0; shift -= 8) {
            int dark = BORE_RGB >> shift & 0xff;
            int light = BORE_LIT_RGB >> shift & 0xff;
            colour = colour << 8 | (int) Math.round(dark + (light - dark) * lit * lit);
        }
        return colour;
    }

    private static int covered(int opaque, float cover) {
        if (cover >= 1) {
            return opaque;
        }
        int alpha = (int) (cover * 255 + 0.5f);
        int red = (opaque >> 16 & 0xff) * alpha / 255;
        int green = (opaque >> 8 & 0xff) * alpha / 255;
        int blue = (opaque & 0xff) * alpha / 255;
        return alpha << 24 | red << 16 | green << 8 | blue;
    }

    private static int over(int front, int back) {
        int rest = 255 - (front >>> 24);
        if (rest == 0) {
            return front;
        }
        int sum = 0;
        for (int shift = 24; shift >= 0; shift -= 8) {
            sum = sum << 8 | Math.min(255, (front >>> shift & 0xff) + (back >>> shift & 0xff) * rest / 255);
        }
        return sum;
    }
}
