package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.colour.Ciede2000;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Srgb;
import tideband.colour.Viewing;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;

class AngleTableTest {
    private static final double MAX_NM = 220;
    /** Less than the eye sees; beyond 80° lie the last one and a half per cent of the width. */
    private static final double MOST_DE00 = 0.5;

    private static final double MOST_DE00_BEYOND_80_DEG = 1;

    /** Property: between its films and angles the table shows what a palette computes for just that angle. */
    @ParameterizedTest
    @CsvSource({
        "titanium, MIRROR, D65",
        "titanium, SATIN, A",
        "niobium, POLISHED, D50",
        "niobium, BLASTED, F11",
        "tantalum, MIRROR, LED_B3"
    })
    void agreesWithPalettesAtAnyAngle(String metal, Finish finish, Illuminant light) {
        Viewing viewing = Viewing.of(light, Observer.CIE_1931_2_DEGREE);
        AngleTable.Builder builder = new AngleTable.Builder(new AngleTable.Basis(metal, 0.98, finish, viewing, MAX_NM));
        while (!builder.complete()) {
            builder.step();
        }
        AngleTable table = builder.table();
        float[] film = new float[AngleTable.ANGLES * 3];
        AngleTable.Between between = new AngleTable.Between();
        for (double angleDeg : new double[] {0, 2.5, 12.3, 27.5, 45, 52.6, 67.4, 72.5, 77.5, 80, 82.5, 85}) {
            Palette palette = new Palette(FilmSystem.of(metal, 0.98), finish, viewing, angleDeg, MAX_NM);
            between.set(angleDeg);
            double worst = 0;
            for (double filmNm = 0; filmNm <= MAX_NM; filmNm += 1.7) {
                table.film(filmNm, film, 0);
                Srgb shown = new Srgb(
                        encoded(between.of(film, 0)), encoded(between.of(film, 1)), encoded(between.of(film, 2)), true);
                Srgb computed = viewing.srgb(palette.at(filmNm).xyz());
                worst = Math.max(worst, Ciede2000.between(shown.lab(), computed.lab()));
            }
            assertThat(worst)
                    .as("%s %s at %.1f°", metal, finish, angleDeg)
                    .isLessThan(angleDeg > 80 ? MOST_DE00_BEYOND_80_DEG : MOST_DE00);
        }
    }

    /** Transfer function of IEC 61966-2-1, equations 6 and 7. */
    private static double encoded(double linear) {
        double within = Math.min(1, Math.max(0, linear));
        return within <= 0.0031308 ? 12.92 * within : 1.055 * Math.pow(within, 1 / 2.4) - 0.055;
    }
}
