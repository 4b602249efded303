package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class PatchworkTest {
    private static final double INTEGRATION_NM = 20 * Growth.TOLERANCE_NM;
    private static final Bath BATH = BathPresets.usual(Metal.TITANIUM);

    /** Property: cells grouped by film end as cells integrated one by one, while one after the other goes dry. */
    @Test
    void groupingChangesNothing() {
        Random random = new Random(5);
        for (int round = 0; round < 20; round++) {
            int cells = 12;
            double[] filmNm = new double[cells];
            double[] areaCm2 = new double[cells];
            double[] choices = {3, 3, 45, 70.5, 180};
            for (int cell = 0; cell < cells; cell++) {
                filmNm[cell] = choices[random.nextInt(choices.length)];
                areaCm2[cell] = 3 * random.nextDouble();
            }
            Patchwork patchwork = new Patchwork(BATH, 1, filmNm, areaCm2, 80, 60);
            Growth separate = new Growth(BATH, 1, filmNm, areaCm2);
            boolean[] dry = new boolean[cells];
            for (int leg = 0; leg < 6; leg++) {
                double volts = 25 + 11 * leg;
                patchwork.growth().advance(5, volts, volts + 5);
                separate.advance(5, volts, volts + 5);
                for (int cell = 0; cell < cells; cell++) {
                    if (!dry[cell]) {
                        assertThat(patchwork.filmNm(cell)).isCloseTo(separate.filmNm(cell), within(INTEGRATION_NM));
                    }
                }
                int leaves = random.nextInt(cells);
                dry[leaves] = true;
                patchwork.setWetAreaCm2(leaves, 0);
                separate.setAreaCm2(leaves, 0);
                int shrinks = random.nextInt(cells);
                if (!dry[shrinks]) {
                    patchwork.setWetAreaCm2(shrinks, areaCm2[shrinks] / 2);
                    separate.setAreaCm2(shrinks, areaCm2[shrinks] / 2);
                }
            }
        }
    }

    /** Property: films left out as too thick gain less than the stated 1e-4 nm when they are integrated all the same. */
    @Test
    void whatIsLeftOutWouldNotGrow() {
        for (double filmNm = 100; filmNm < 260; filmNm += 0.5) {
            double[] films = {filmNm};
            double[] areas = {1};
            Patchwork patchwork = new Patchwork(BATH, 2, films, areas, 60, 120);
            Growth growth = new Growth(BATH, 2, films, areas);
            patchwork.growth().advance(120, 60, 60);
            growth.advance(120, 60, 60);
            assertThat(patchwork.filmNm(0)).isCloseTo(growth.filmNm(0), within(1.1e-4));
            assertThat(patchwork.filmNm(0)).isGreaterThanOrEqualTo(filmNm);
        }
    }

    /** Property: a copy, and a copy under another limit, leave the first as it was. */
    @Test
    void copiesAreTheirOwn() {
        Patchwork patchwork = new Patchwork(BATH, 2, new double[] {3, 3, 50}, new double[] {1, 1, 1}, 60, 60);
        patchwork.growth().advance(1, 40, 40);
        double filmNm = patchwork.filmNm(0);
        Patchwork copy = patchwork.copy();
        copy.setWetAreaCm2(0, 0);
        copy.growth().advance(10, 60, 60);
        Patchwork throttled = patchwork.copyWithLimit(1e-3);
        throttled.growth().advance(10, 60, 60);
        assertThat(patchwork.filmNm(0)).isEqualTo(filmNm);
        assertThat(throttled.filmNm(0)).isLessThan(copy.filmNm(1)).isGreaterThan(filmNm);
        assertThat(patchwork.filmWithinStepNm(2, 1)).isEqualTo(patchwork.filmNm(2));
    }

    /** Property: a cell that is dry from the beginning keeps its film, however thin it is beside the wet ones. */
    @Test
    void dryCellsKeepTheirFilm() {
        Patchwork patchwork = new Patchwork(BATH, 2, new double[] {3, 100, 3}, new double[] {0, 5, 1}, 70, 30);
        patchwork.growth().advance(30, 70, 70);
        assertThat(patchwork.filmNm(0)).isEqualTo(3);
        assertThat(patchwork.filmNm(1)).isGreaterThan(110);
        assertThat(patchwork.filmNm(2)).isGreaterThan(110);
    }
}
