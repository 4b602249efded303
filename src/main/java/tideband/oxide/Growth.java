package tideband.oxide;

import java.util.Arrays;

/**
 * Oxide growing on patches of one piece that are wet together under one supply.
 *
 * <p>Integrates {@code dd/dt} of every patch by the embedded Runge-Kutta pair of order 3(2) of P. Bogacki and L. F.
 * Shampine, Appl. Math. Lett. 2 (1989) 321-325, with steps that keep the estimated error of each below
 * {@value #TOLERANCE_NM} nm; over a hold they add up to less than twenty times that. Where the limit takes hold or lets
 * go within a step, growth has a kink, and the step is shortened until it does no harm. Between the ends of a step the film is read from the cubic through both films and both
 * growths (third order as well). A mutable work object for one thread; the volts run straight over each advance, and 0
 * at both ends is supply off.
 */
public final class Growth {
    /** The estimated error allowed in one step, in nm. */
    public static final double TOLERANCE_NM = 1e-3;

    private static final double FIRST_STEP_S = 1e-3;
    private static final double SMALLEST_STEP_S = 1e-9;
    /** How much of the change of growth over a step with a kink may go into its error. */
    private static final double KINK_SHARE = 0.25;
    /** Volts this near are the same: a ramp cut into steps leaves a rounding error between them. */
    private static final double SAME_VOLTS = 1e-9;

    private final Circuit circuit;
    private final int count;
    private final double[] areaCm2;
    private double[] filmNm;
    private double[] growth;
    private double[] filmBefore;
    private double[] growthBefore;
    private final double[] second;
    private final double[] third;
    private final double[] trialFilm;
    private double nextStepS = FIRST_STEP_S;
    private double stepS;
    private double peakAmps;
    private boolean growthKnown;
    private boolean growthLimited;
    private double growthVolts;

    /**
     * Patches ready to grow.
     *
     * @param bath the bath
     * @param limitAmps the supply's current limit, in A, above 0 to 1e6
     * @param filmNm film of each patch, in nm, above 0
     * @param areaCm2 area of each patch, in cm², at least 0; one of area 0 is dry and keeps its film
     */
    public Growth(Bath bath, double limitAmps, double[] filmNm, double[] areaCm2) {
        if (filmNm.length != areaCm2.length) {
            throw new IllegalArgumentException("each patch has one film and one area");
        }
        for (int patch = 0; patch < filmNm.length; patch++) {
            if (!(filmNm[patch] > 0 && filmNm[patch] < Double.POSITIVE_INFINITY)) {
                throw new IllegalArgumentException("filmNm must be finite and above 0 nm, but was " + filmNm[patch]);
            }
            requireArea(areaCm2[patch]);
        }
        this.circuit = new Circuit(bath, limitAmps, filmNm.length);
        this.count = filmNm.length;
        this.filmNm = filmNm.clone();
        this.areaCm2 = areaCm2.clone();
        this.growth = new double[count];
        this.filmBefore = new double[count];
        this.growthBefore = new double[count];
        this.second = new double[count];
        this.third = new double[count];
        this.trialFilm = new double[count];
    }

    private Growth(Growth other, Circuit circuit) {
        this.circuit = circuit;
        this.count = other.count;
        this.filmNm = other.filmNm.clone();
        this.areaCm2 = other.areaCm2.clone();
        this.growth = other.growth.clone();
        this.filmBefore = other.filmBefore.clone();
        this.growthBefore = other.growthBefore.clone();
        this.second = new double[count];
        this.third = new double[count];
        this.trialFilm = new double[count];
        this.nextStepS = other.nextStepS;
        this.stepS = other.stepS;
        this.peakAmps = other.peakAmps;
        this.growthKnown = other.growthKnown;
        this.growthLimited = other.growthLimited;
        this.growthVolts = other.growthVolts;
    }

    private static void requireArea(double cm2) {
        if (!(cm2 >= 0 && cm2 < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("areaCm2 must be finite and at least 0 cm², but was " + cm2);
        }
    }

    /**
     * The same patches in the same state, to try something on.
     *
     * @return a copy that shares nothing with this
     */
    public Growth copy() {
        return new Growth(this, circuit.copy());
    }

    /**
     * The same patches in the same state under another current limit.
     *
     * @param limitAmps the limit in A
     * @return a copy that shares nothing with this
     */
    public Growth copyWithLimit(double limitAmps) {
        Growth changed = new Growth(this, circuit.withLimit(limitAmps));
        changed.growthKnown = false;
        return changed;
    }

    /**
     * Changes the wet area of a patch, as when part of it has left the bath.
     *
     * @param patch its index
     * @param cm2 its area now, in cm²; 0 leaves it dry
     */
    public void setAreaCm2(int patch, double cm2) {
        requireArea(cm2);
        areaCm2[patch] = cm2;
        growthKnown = false;
    }

    /**
     * The film of a patch now.
     *
     * @param patch its index
     * @return film in nm
     */
    public double filmNm(int patch) {
        return filmNm[patch];
    }

    /**
     * The film of a patch within the last step.
     *
     * @param patch its index
     * @param share how far into the step, 0 to 1
     * @return film in nm
     */
    public double filmWithinStepNm(int patch, double share) {
        double u = share;
        double h00 = (1 + 2 * u) * (1 - u) * (1 - u);
        double h10 = u * (1 - u) * (1 - u);
        double h01 = u * u * (3 - 2 * u);
        double h11 = u * u * (u - 1);
        return h00 * filmBefore[patch]
                + h10 * stepS * growthBefore[patch]
                + h01 * filmNm[patch]
                + h11 * stepS * growth[patch];
    }

    /**
     * The current that flows now.
     *
     * @return amps
     */
    public double amps() {
        return circuit.amps();
    }

    /**
     * The volts at the supply's terminals now: its set volts, or less while the current limit holds.
     *
     * @return volts
     */
    public double terminalVolts() {
        return circuit.terminalVolts();
    }

    /**
     * The highest current since the beginning.
     *
     * @return amps
     */
    public double peakAmps() {
        return peakAmps;
    }

    /**
     * Settles the circuit at once, without growing anything.
     *
     * @param volts the supply's set volts; 0 is off
     */
    public void settle(double volts) {
        rates(volts, filmNm, growth);
        growthKnown = true;
        growthLimited = circuit.limited();
        growthVolts = volts;
        peakAmps = Math.max(peakAmps, circuit.amps());
    }

    /**
     * Grows for a time.
     *
     * @param durationS seconds, at least 0
     * @param voltsFrom the supply's set volts at the beginning, at least 0
     * @param voltsTo its set volts at the end, at least 0; they run straight between
     */
    public void advance(double durationS, double voltsFrom, double voltsTo) {
        if (!(durationS >= 0 && durationS < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("durationS must be finite and at least 0 s, but was " + durationS);
        }
        if (!(voltsFrom >= 0 && voltsTo >= 0 && voltsFrom + voltsTo < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "voltsFrom and voltsTo must be finite and at least 0 V, but were " + voltsFrom + " and " + voltsTo);
        }
        double done = 0;
        while (done < durationS) {
            double left = durationS - done;
            double slope = (voltsTo - voltsFrom) / durationS;
            done += step(left, voltsFrom + slope * done, slope);
        }
    }

    /**
     * Grows for one step, as long as accuracy allows.
     *
     * @param mostS the longest step wanted, in s, above 0
     * @param volts the supply's set volts at its beginning
     * @param voltsPerS their change
     * @return the length of the step taken, in s; exactly {@code mostS} when it was not cut short
     */
    public double step(double mostS, double volts, double voltsPerS) {
        if (volts <= 0 && voltsPerS <= 0) {
            System.arraycopy(filmNm, 0, filmBefore, 0, count);
            circuit.open(growth);
            Arrays.fill(growthBefore, 0);
            growthKnown = false;
            nextStepS = FIRST_STEP_S;
            stepS = mostS;
            return mostS;
        }
        if (!growthKnown || Math.abs(growthVolts - volts) > SAME_VOLTS) {
            settle(volts);
        }
        double wishS = Math.min(mostS, nextStepS);
        while (true) {
            double error = attempt(wishS, volts, voltsPerS);
            if (circuit.limited() != growthLimited) {
                error = Math.max(error, kinkError(wishS));
            }
            double factor = error == 0 ? 5 : Math.min(5, Math.max(0.2, 0.9 * Math.cbrt(TOLERANCE_NM / error)));
            if (error <= TOLERANCE_NM || wishS <= SMALLEST_STEP_S) {
                accept(wishS, volts + voltsPerS * wishS);
                // A step cut short by its caller says nothing against the longer one tried before.
                nextStepS = wishS < nextStepS ? Math.max(nextStepS, wishS * factor) : wishS * factor;
                return wishS;
            }
            wishS *= factor;
            nextStepS = wishS;
        }
    }

    private double attempt(double h, double volts, double voltsPerS) {
        for (int j = 0; j < count; j++) {
            trialFilm[j] = filmNm[j] + 0.5 * h * growth[j];
        }
        rates(volts + 0.5 * h * voltsPerS, trialFilm, second);
        for (int j = 0; j < count; j++) {
            trialFilm[j] = filmNm[j] + 0.75 * h * second[j];
        }
        rates(volts + 0.75 * h * voltsPerS, trialFilm, third);
        for (int j = 0; j < count; j++) {
            filmBefore[j] = filmNm[j] + h / 9 * (2 * growth[j] + 3 * second[j] + 4 * third[j]);
        }
        rates(volts + h * voltsPerS, filmBefore, growthBefore);
        double worst = 0;
        for (int j = 0; j < count; j++) {
            double error = h * (-5.0 / 72 * growth[j] + second[j] / 12 + third[j] / 9 - growthBefore[j] / 8);
            worst = Math.max(worst, Math.abs(error));
        }
        return worst;
    }

    /**
     * The error where the limit takes hold or lets go within a step: growth has a kink there, which the pair of orders cannot
     * be trusted to see.
     */
    private double kinkError(double h) {
        double most = 0;
        for (int j = 0; j < count; j++) {
            most = Math.max(most, Math.abs(growthBefore[j] - growth[j]));
        }
        return KINK_SHARE * h * most;
    }

    /** The attempt left the new film and growth in the "before" arrays: swapping them makes both names true. */
    private void accept(double h, double voltsNow) {
        double[] film = filmBefore;
        filmBefore = filmNm;
        filmNm = film;
        double[] rate = growthBefore;
        growthBefore = growth;
        growth = rate;
        stepS = h;
        growthKnown = true;
        growthLimited = circuit.limited();
        growthVolts = voltsNow;
        peakAmps = Math.max(peakAmps, circuit.amps());
    }

    private void rates(double volts, double[] film, double[] into) {
        if (volts > 0) {
            circuit.settle(volts, film, areaCm2, into);
        } else {
            circuit.open(into);
        }
    }
}
