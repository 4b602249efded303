package tideband.window.piece;

import java.util.List;
import tideband.colour.Viewing;
import tideband.colour.Xyz;
import tideband.optics.FilmSeries;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.optics.Surface;

/**
 * The screen colour of every film under every angle, in linear light.
 *
 * <p>A table of films every {@value #FILM_STEP_NM} nm at the angles 0°, {@value #STEP_DEG}° … 85°, each entry computed as a palette
 * computes it and mapped into the screen's gamut. Between films it is read straight, between angles by the cubic through the four
 * angles around; as a colour is the same seen from either side of the normal, −5° stands for 5°. A test holds it against
 * palettes at angles between.
 */
final class AngleTable {
    /** Interval of the angles, in degrees. */
    static final double STEP_DEG = 5;
    /** How many angles there are. */
    static final int ANGLES = 18;
    /** Interval of the films, in nm. */
    static final double FILM_STEP_NM = 0.5;

    private final double maxNm;
    private final float[][] byAngle;

    private AngleTable(double maxNm, float[][] byAngle) {
        this.maxNm = maxNm;
        this.byAngle = byAngle;
    }

    /**
     * What a table depends on.
     *
     * @param opticsKey the metal and its oxide
     * @param indexScale factor on the oxide's n
     * @param finish the finish
     * @param viewing light and observer
     * @param maxNm thickest film in nm
     */
    record Basis(String opticsKey, double indexScale, Finish finish, Viewing viewing, double maxNm) {}

    /** Builds a table angle by angle, so that other work can come between. */
    static final class Builder {
        private final Basis basis;
        private final FilmSystem system;
        private final float[][] byAngle = new float[ANGLES][];
        private int done;

        /**
         * Nothing built yet.
         *
         * @param basis what the table depends on
         */
        Builder(Basis basis) {
            this.basis = basis;
            this.system = FilmSystem.of(basis.opticsKey(), basis.indexScale());
        }

        /**
         * Whether all angles are there.
         *
         * @return true if {@link #table()} may be asked for
         */
        boolean complete() {
            return done == ANGLES;
        }

        /** Builds one more angle; takes about as long as a palette. */
        void step() {
            Surface surface = new Surface(system, basis.finish(), done * STEP_DEG);
            int count = (int) Math.ceil(basis.maxNm() / FILM_STEP_NM) + 2;
            List<Xyz> films = FilmSeries.colours(surface, basis.viewing(), FILM_STEP_NM, count);
            float[] linear = new float[count * 3];
            for (int film = 0; film < count; film++) {
                LinearLight.put(basis.viewing().srgb(films.get(film)), linear, film * 3);
            }
            byAngle[done++] = linear;
        }

        /**
         * The finished table.
         *
         * @return the table
         */
        AngleTable table() {
            if (!complete()) {
                throw new IllegalStateException("only " + done + " of " + ANGLES + " angles have been built");
            }
            return new AngleTable(basis.maxNm(), byAngle.clone());
        }
    }

    /**
     * The thickest film of this table.
     *
     * @return film in nm
     */
    double maxNm() {
        return maxNm;
    }

    /**
     * A film's colour at each of the table's angles.
     *
     * @param filmNm film in nm, 0 to {@link #maxNm()}
     * @param into takes three channels an angle
     * @param at index of the first
     */
    void film(double filmNm, float[] into, int at) {
        if (!(filmNm >= 0 && filmNm <= maxNm)) {
            throw new IllegalArgumentException("filmNm must be from 0 to " + maxNm + " nm, but was " + filmNm);
        }
        double place = filmNm / FILM_STEP_NM;
        int below = (int) place;
        float share = (float) (place - below);
        for (int angle = 0; angle < ANGLES; angle++) {
            float[] linear = byAngle[angle];
            for (int channel = 0; channel < 3; channel++) {
                float low = linear[below * 3 + channel];
                float high = linear[below * 3 + 3 + channel];
                into[at + angle * 3 + channel] = low + share * (high - low);
            }
        }
    }

    /** How four neighbouring angles of the table are weighted to give the one between. */
    static final class Between {
        private final int[] angle = new int[4];
        private final float[] weight = new float[4];

        /**
         * Sets the angle that is to be read.
         *
         * @param angleDeg angle in degrees, 0 to 85
         */
        void set(double angleDeg) {
            double place = angleDeg / STEP_DEG;
            int first = Math.min((int) place - 1, ANGLES - 4);
            double t = place - first;
            weight[0] = (float) (-(t - 1) * (t - 2) * (t - 3) / 6);
            weight[1] = (float) (t * (t - 2) * (t - 3) / 2);
            weight[2] = (float) (-t * (t - 1) * (t - 3) / 2);
            weight[3] = (float) (t * (t - 1) * (t - 2) / 6);
            for (int i = 0; i < 4; i++) {
                angle[i] = Math.abs(first + i) * 3;
            }
        }

        /**
         * A channel at that angle.
         *
         * @param film what {@link AngleTable#film} gave
         * @param at index of the film's first angle, plus the channel
         * @return linear value; a cubic may pass the ends of 0 to 1 by a trifle
         */
        float of(float[] film, int at) {
            return weight[0] * film[at + angle[0]]
                    + weight[1] * film[at + angle[1]]
                    + weight[2] * film[at + angle[2]]
                    + weight[3] * film[at + angle[3]];
        }
    }
}
