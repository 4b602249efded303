package tideband.match;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.colour.TradeName;
import tideband.colour.Viewing;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;

class ColourMatchTest {

    /** The straight scale of common practice, no source: 3 nm of native film and 2 nm/V up to 100 V. */
    private static final VoltScale SCALE =
            new VoltScale(100, volts -> 3 + 2 * volts, filmNm -> Math.max(0, (filmNm - 3) / 2));

    private static final double CEILING_NM = 203;

    private static final Palette TITANIUM = palette("titanium");
    private static final Palette NIOBIUM = palette("niobium");
    private static final Palette TANTALUM = palette("tantalum");

    private static Palette palette(String metal) {
        return new Palette(FilmSystem.of(metal, 1), Finish.POLISHED, Viewing.daylight(), 0, 210);
    }

    private static final Palette MIRROR =
            new Palette(FilmSystem.of("titanium", 1), Finish.MIRROR, Viewing.daylight(), 0, 210);

    private static Palette of(int metal) {
        return List.of(TITANIUM, NIOBIUM, TANTALUM).get(metal);
    }

    /** Property: the colour of a film is matched at that film to 0.01 nm, and nothing else comes nearer. */
    @Property(tries = 100)
    void findsThePlantedFilm(
            @ForAll @IntRange(min = 0, max = 2) int metal,
            @ForAll @DoubleRange(min = 0, max = CEILING_NM) double filmNm) {
        Palette palette = of(metal);
        Matches matches =
                new ColourMatch(palette, SCALE).find(palette.at(filmNm).lab(), 2);
        Match best = matches.best();
        assertThat(best.filmNm()).isCloseTo(filmNm, within(0.01));
        assertThat(best.difference()).isLessThan(0.01);
        assertThat(matches.reached()).isTrue();
        assertThat(best.colour()).isEqualTo(palette.at(best.filmNm()));
        assertThat(best.volts()).isEqualTo(SCALE.volts(best.filmNm()));
        assertThat(best.windowLowVolts()).isLessThanOrEqualTo(best.volts());
        assertThat(best.windowHighVolts()).isGreaterThanOrEqualTo(best.volts());
    }

    /** Property: both ends of the range are found when they are the film looked for. */
    @ParameterizedTest
    @ValueSource(doubles = {0, CEILING_NM})
    void findsTheEnds(double filmNm) {
        Matches matches =
                new ColourMatch(TITANIUM, SCALE).find(TITANIUM.at(filmNm).lab(), 2);
        assertThat(matches.best().filmNm()).isEqualTo(filmNm);
        assertThat(matches.best().difference()).isZero();
    }

    /** Property: every local minimum is found: the same ones as by scanning every 0.02 nm, exact colour by exact colour. */
    @ParameterizedTest
    @ValueSource(strings = {"#3a3f8f", "#c9a227", "#7a3b8f", "#2e8b7a", "#ff0000", "#808080", "#ffffff", "#000000"})
    void findsEveryLocalMinimum(String hex) {
        Lab wanted = Srgb.ofHex(hex).lab();
        double step = 0.02;
        int count = (int) Math.round(CEILING_NM / step);
        double[] difference = new double[count + 1];
        for (int i = 0; i <= count; i++) {
            difference[i] = Ciede2000.between(
                    wanted, MIRROR.at(Math.min(CEILING_NM, i * step)).lab());
        }
        List<Double> expected = new ArrayList<>();
        for (int i = 0; i <= count; i++) {
            boolean falls = i == 0 || difference[i] <= difference[i - 1];
            boolean rises = i == count || difference[i] < difference[i + 1];
            if (falls && rises) {
                expected.add(i * step);
            }
        }
        List<Match> found = new ColourMatch(MIRROR, SCALE).find(wanted, 5).bestFirst();
        assertThat(found).hasSameSizeAs(expected);
        List<Double> films = found.stream().map(Match::filmNm).sorted().toList();
        for (int i = 0; i < films.size(); i++) {
            assertThat(films.get(i)).isCloseTo(expected.get(i), within(0.02));
        }
        assertThat(found).isSortedAccordingTo((a, b) -> Double.compare(a.difference(), b.difference()));
    }

    /** A true red is beyond every film of titanium (common practice, no source): answered with the nearest, not refused. */
    @Test
    void redIsAnsweredWithTheNearest() {
        Matches matches =
                new ColourMatch(MIRROR, SCALE).find(Srgb.ofHex("#ff0000").lab(), 5);
        assertThat(matches.reached()).isFalse();
        assertThat(matches.best().difference()).isGreaterThan(10);
        assertThat(matches.best().colour().name()).isNotEqualTo(TradeName.RED);
        double least = Double.POSITIVE_INFINITY;
        for (double film = 0; film <= CEILING_NM; film += 0.05) {
            least = Math.min(
                    least, Ciede2000.between(matches.wanted(), MIRROR.at(film).lab()));
        }
        assertThat(matches.best().difference()).isCloseTo(least, within(0.01));
    }

    /** Property: at a window's edge the difference is what was allowed; a volt's hundredth further it is more. */
    @ParameterizedTest
    @CsvSource({"45,1", "45,3", "110,3", "150,2", "190,5"})
    void windowsEndWhereTheDifferenceIsUsedUp(double filmNm, double allowed) {
        Lab wanted = TITANIUM.at(filmNm).lab();
        Match match = new ColourMatch(TITANIUM, SCALE).find(wanted, allowed).best();
        for (double edge : new double[] {match.windowLowVolts(), match.windowHighVolts()}) {
            double film = SCALE.filmNmAtVolts().applyAsDouble(edge);
            double beyond = film + Math.signum(film - filmNm) * 0.02;
            assertThat(Ciede2000.between(wanted, TITANIUM.at(film).lab())).isCloseTo(allowed, within(0.01));
            assertThat(Ciede2000.between(wanted, TITANIUM.at(beyond).lab())).isGreaterThan(allowed);
        }
    }

    /** Property: where the colour is out of reach the window is measured from the matched colour. */
    @Test
    void windowOfAColourOutOfReach() {
        Match match = new ColourMatch(TITANIUM, SCALE)
                .find(Srgb.ofHex("#ff0000").lab(), 2)
                .best();
        for (double edge : new double[] {match.windowLowVolts(), match.windowHighVolts()}) {
            double film = SCALE.filmNmAtVolts().applyAsDouble(edge);
            assertThat(Ciede2000.between(match.colour().lab(), TITANIUM.at(film).lab()))
                    .isCloseTo(2, within(0.01));
        }
    }

    /** Property: a window stops at bare metal and at the ceiling. */
    @Test
    void windowsStopAtTheEnds() {
        ColourMatch match = new ColourMatch(TITANIUM, SCALE);
        assertThat(match.find(TITANIUM.at(1).lab(), 5).best().windowLowVolts()).isZero();
        assertThat(match.find(TITANIUM.at(202.5).lab(), 5).best().windowHighVolts())
                .isCloseTo(100, within(1e-9));
    }

    /** Property: the film to draw with is the first of the matches, or the first of the order asked for, if there is one. */
    @Property(tries = 50)
    void theNearestFilmIsTheBestMatch(
            @ForAll @DoubleRange(min = 5, max = 95) double lightness,
            @ForAll @DoubleRange(min = -50, max = 50) double a,
            @ForAll @DoubleRange(min = -50, max = 50) double b,
            @ForAll @IntRange(min = 0, max = 2) int metal,
            @ForAll @IntRange(min = 1, max = 7) int order) {
        Lab wanted = new Lab(lightness, a, b);
        ColourMatch match = new ColourMatch(of(metal), SCALE);
        List<Match> bestFirst = match.find(wanted, 5).bestFirst();
        double nearestNm = match.nearestFilmNm(wanted, OptionalInt.empty()).orElseThrow();
        assertThat(Ciede2000.between(wanted, of(metal).labAt(nearestNm)))
                .isCloseTo(bestFirst.get(0).difference(), within(1e-4));
        Optional<Match> asked =
                bestFirst.stream().filter(m -> m.order() == order).findFirst();
        OptionalDouble askedNm = match.nearestFilmNm(wanted, OptionalInt.of(order));
        assertThat(askedNm.isPresent()).isEqualTo(asked.isPresent());
        askedNm.ifPresent(filmNm -> {
            assertThat(Ciede2000.between(wanted, of(metal).labAt(filmNm)))
                    .isCloseTo(asked.orElseThrow().difference(), within(1e-4));
            assertThat(of(metal).orderAt(filmNm)).isEqualTo(order);
        });
    }

    /** Property: nothing beyond the ceiling is offered. */
    @Test
    void nothingBeyondTheCeiling() {
        VoltScale low = new VoltScale(30, SCALE.filmNmAtVolts(), SCALE.voltsForFilmNm());
        Matches matches = new ColourMatch(TITANIUM, low).find(TITANIUM.at(150).lab(), 5);
        assertThat(matches.bestFirst()).allSatisfy(match -> {
            assertThat(match.filmNm()).isLessThanOrEqualTo(63);
            assertThat(match.windowHighVolts()).isLessThanOrEqualTo(30);
        });
    }

    @Test
    void refusesWhatCannotBe() {
        VoltScale high = new VoltScale(120, SCALE.filmNmAtVolts(), SCALE.voltsForFilmNm());
        assertThatThrownBy(() -> new ColourMatch(TITANIUM, high))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("the film at the ceiling of 120.0 V must be above 0 and within the palette's 210.0 nm,"
                        + " but was 243.0 nm; build the palette up to it");
        ColourMatch match = new ColourMatch(TITANIUM, SCALE);
        for (double allowed : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> match.find(new Lab(50, 0, 0), allowed))
                    .hasMessage("within must be a finite dE00 above 0, but was " + allowed);
        }
        for (double ceiling : new double[] {0, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> new VoltScale(ceiling, SCALE.filmNmAtVolts(), SCALE.voltsForFilmNm()))
                    .hasMessage("ceilingVolts must be finite and above 0, but was " + ceiling);
        }
        assertThatThrownBy(() -> new Matches(new Lab(50, 0, 0), 5, List.of()))
                .hasMessage("bestFirst must hold at least one film");
    }
}
