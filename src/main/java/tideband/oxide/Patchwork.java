package tideband.oxide;

import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * The wet cells of a piece, grown together: cells with the same film grow alike for as long as both are wet, so each
 * distinct film is integrated once.
 *
 * <p>Grouping equal films is exact. Films too thick to grow are left out: those that could gain less than
 * {@value #INERT_NM} nm even if the highest volts stood across them all the time. A mutable work object for one thread.
 */
public final class Patchwork {
    private static final double INERT_NM = 1e-4;
    private static final int INERT = -1;

    private final double[] startNm;
    private final int[] patchOfCell;
    private final double[] cellAreaCm2;
    private final double[] patchAreaCm2;
    private final Growth growth;

    /**
     * Cells ready to grow.
     *
     * @param bath the bath
     * @param limitAmps the supply's current limit, in A
     * @param filmNm film of each cell, in nm
     * @param areaCm2 wet area of each cell, in cm²; a cell of area 0 is dry and keeps its film
     * @param mostVolts the highest supply volts to come
     * @param mostS the longest time they may stand, in s
     */
    public Patchwork(Bath bath, double limitAmps, double[] filmNm, double[] areaCm2, double mostVolts, double mostS) {
        this.startNm = filmNm.clone();
        this.cellAreaCm2 = areaCm2.clone();
        this.patchOfCell = new int[filmNm.length];
        GrowthLaw law = new GrowthLaw(bath);
        double[] distinct = distinctGrowing(law, startNm, cellAreaCm2, mostVolts + law.nativeVolts(), mostS);
        this.patchAreaCm2 = new double[distinct.length];
        for (int cell = 0; cell < startNm.length; cell++) {
            int patch = cellAreaCm2[cell] == 0 ? INERT : Arrays.binarySearch(distinct, startNm[cell]);
            patchOfCell[cell] = patch < 0 ? INERT : patch;
            if (patch >= 0) {
                patchAreaCm2[patch] += cellAreaCm2[cell];
            }
        }
        this.growth = new Growth(bath, limitAmps, distinct, patchAreaCm2);
    }

    private Patchwork(Patchwork other, Growth growth) {
        this.startNm = other.startNm;
        this.patchOfCell = other.patchOfCell;
        this.cellAreaCm2 = other.cellAreaCm2.clone();
        this.patchAreaCm2 = other.patchAreaCm2.clone();
        this.growth = growth;
    }

    private static double[] distinctGrowing(
            GrowthLaw law, double[] filmNm, double[] areaCm2, double filmVolts, double mostS) {
        double[] growing = IntStream.range(0, filmNm.length)
                .filter(cell -> areaCm2[cell] > 0)
                .mapToDouble(cell -> filmNm[cell])
                .filter(film -> law.growthNmPerS(law.currentMilliAmpsPerCm2(filmVolts, film)) * mostS > INERT_NM)
                .sorted()
                .toArray();
        int distinct = 0;
        for (int i = 0; i < growing.length; i++) {
            if (i == 0 || growing[i] != growing[i - 1]) {
                growing[distinct++] = growing[i];
            }
        }
        return Arrays.copyOf(growing, distinct);
    }

    /**
     * The same cells in the same state, to try something on.
     *
     * @return a copy whose growth and areas are its own
     */
    public Patchwork copy() {
        return new Patchwork(this, growth.copy());
    }

    /**
     * The same cells in the same state under another current limit.
     *
     * @param limitAmps the limit in A
     * @return a copy whose growth and areas are its own
     */
    public Patchwork copyWithLimit(double limitAmps) {
        return new Patchwork(this, growth.copyWithLimit(limitAmps));
    }

    /**
     * Changes the wet area of a cell, as when it leaves the bath.
     *
     * @param cell its index
     * @param cm2 its wet area now, in cm²
     */
    public void setWetAreaCm2(int cell, double cm2) {
        int patch = patchOfCell[cell];
        if (cm2 != cellAreaCm2[cell] && patch != INERT) {
            patchAreaCm2[patch] += cm2 - cellAreaCm2[cell];
            if (patchAreaCm2[patch] < 1e-12) {
                patchAreaCm2[patch] = 0;
            }
            growth.setAreaCm2(patch, patchAreaCm2[patch]);
        }
        cellAreaCm2[cell] = cm2;
    }

    /**
     * The film a cell has now, if it has been wet until now.
     *
     * @param cell its index
     * @return film in nm
     */
    public double filmNm(int cell) {
        return patchOfCell[cell] == INERT ? startNm[cell] : growth.filmNm(patchOfCell[cell]);
    }

    /**
     * The film a cell had within the last step, if it was wet until then.
     *
     * @param cell its index
     * @param share how far into the step, 0 to 1
     * @return film in nm
     */
    public double filmWithinStepNm(int cell, double share) {
        return patchOfCell[cell] == INERT ? startNm[cell] : growth.filmWithinStepNm(patchOfCell[cell], share);
    }

    /**
     * The growth of all cells, for time, volts and current.
     *
     * @return the growth
     */
    public Growth growth() {
        return growth;
    }
}
