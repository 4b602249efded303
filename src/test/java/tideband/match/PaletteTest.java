package tideband.match;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.Ciede2000;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Srgb;
import tideband.colour.TradeName;
import tideband.colour.Viewing;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.optics.Surface;

class PaletteTest {

    private static final List<String> METALS = List.of("titanium", "niobium", "tantalum");

    private static Palette palette(String metal, Finish finish) {
        return new Palette(FilmSystem.of(metal, 1), finish, Viewing.daylight(), 0, 250);
    }

    /** Property: a film's colour is that of its own reflectance, not a neighbour's. */
    @Test
    void eachColourIsComputedForItsOwnFilm() {
        FilmSystem system = FilmSystem.of("titanium", 0.98);
        Viewing viewing = Viewing.of(Illuminant.F2, Observer.CIE_1964_10_DEGREE);
        Palette palette = new Palette(system, Finish.SATIN, viewing, 35, 200);
        Surface surface = new Surface(system, Finish.SATIN, 35);
        for (double film = 0; film <= 200; film += 3.7) {
            FilmColour colour = palette.at(film);
            assertThat(colour.filmNm()).isEqualTo(film);
            assertThat(colour.xyz()).isEqualTo(viewing.xyz(surface.reflectance(film)));
            assertThat(colour.lab()).isEqualTo(viewing.lab(colour.xyz()));
            Srgb screen = viewing.srgb(colour.xyz());
            assertThat(colour.srgbHex()).isEqualTo(screen.hex());
            assertThat(colour.inGamut()).isEqualTo(screen.inGamut());
            assertThat(colour.order()).isEqualTo(palette.orderAt(film));
        }
    }

    /** Property: the quick table is within its stated 1e-5 dE00 of the computed colour, from end to end. */
    @ParameterizedTest
    @ValueSource(strings = {"titanium", "niobium", "tantalum"})
    void theTableIsWithinItsStatedError(String metal) {
        Random films = new Random(7);
        for (Finish finish : List.of(Finish.MIRROR, Finish.POLISHED)) {
            Palette palette = palette(metal, finish);
            for (int i = 0; i < 500; i++) {
                double film = i < 3 ? 125.0 * i : palette.maxNm() * films.nextDouble();
                assertThat(Ciede2000.between(
                                palette.labAt(film), palette.at(film).lab()))
                        .as("film %s", film)
                        .isLessThan(1e-5);
            }
        }
    }

    /**
     * Reference: thickness windows of anodized titanium's colours after Velten et al., J. Biomed. Mater. Res. 59, 18 (2002),
     * recalled from the literature and not re-read (from memory): golden 10–25, purple 25–40, deep blue 40–50, light blue
     * 50–80, yellow 80–120, orange 120–150, purple 150–180, green 180–210 nm. Film indices differ from paper to paper, so each
     * colour must fill at least a fifth of its window, and the colours must come in that order.
     */
    @ParameterizedTest
    @EnumSource
    void titaniumRunsThroughThePublishedWindows(Finish finish) {
        Palette titanium = palette("titanium", finish);
        requireFamily(titanium, 10, 25, EnumSet.of(TradeName.STRAW, TradeName.GOLD));
        requireFamily(titanium, 25, 40, EnumSet.of(TradeName.PURPLE));
        requireFamily(titanium, 40, 50, EnumSet.of(TradeName.DEEP_BLUE));
        requireFamily(titanium, 50, 80, EnumSet.of(TradeName.SKY_BLUE));
        requireFamily(titanium, 80, 120, EnumSet.of(TradeName.PALE_YELLOW, TradeName.YELLOW));
        requireFamily(titanium, 120, 150, EnumSet.of(TradeName.ORANGE));
        requireFamily(titanium, 150, 180, EnumSet.of(TradeName.VIOLET, TradeName.PURPLE));
        requireFamily(titanium, 180, 210, EnumSet.of(TradeName.GREEN));
    }

    private static void requireFamily(Palette palette, int fromNm, int toNm, Set<TradeName> family) {
        int met = 0;
        for (int film = fromNm; film < toNm; film++) {
            if (family.contains(palette.at(film).name())) {
                met++;
            }
        }
        assertThat(met).as("%s within %d to %d nm", family, fromNm, toNm).isGreaterThanOrEqualTo((toNm - fromNm) / 5);
    }

    /** The same sequence, as an order: no colour of the list is met for the first time before the one named before it. */
    @ParameterizedTest
    @EnumSource
    void titaniumColoursComeInThePublishedOrder(Finish finish) {
        Palette titanium = palette("titanium", finish);
        List<TradeName> met = new ArrayList<>();
        for (double film = 0; film <= 210; film += 0.5) {
            TradeName name = titanium.at(film).name();
            if (!met.contains(name)) {
                met.add(name);
            }
        }
        assertThat(met)
                .containsSubsequence(
                        TradeName.NATURAL,
                        TradeName.STRAW,
                        TradeName.GOLD,
                        TradeName.BRONZE,
                        TradeName.PURPLE,
                        TradeName.DEEP_BLUE,
                        TradeName.BLUE,
                        TradeName.SKY_BLUE,
                        TradeName.PALE_YELLOW,
                        TradeName.YELLOW,
                        TradeName.ROSE,
                        TradeName.MAGENTA,
                        TradeName.VIOLET,
                        TradeName.TEAL,
                        TradeName.GREEN);
    }

    /**
     * Reference: Int. J. Biomater. 2015, 395657, Ti-6Al-4V, colours and thicknesses as read in its table 1: golden 23 nm, blue
     * 48 nm, pink and yellow 130 nm, dark green and pink 192 nm. And Gaul, J. Chem. Educ. 70, 176 (1993): purple at 15 V, which
     * at 5 nm of native film and 2 nm/V (derived) is a film of 35 nm.
     */
    @ParameterizedTest
    @CsvSource({"23,GOLD", "35,PURPLE", "48,DEEP_BLUE", "130,ROSE", "192,GREEN"})
    void measuredFilmsHaveTheirColours(double film, TradeName name) {
        assertThat(palette("titanium", Finish.POLISHED).at(film).name()).isEqualTo(name);
    }

    /**
     * Property: however it is looked at, gold and blue are of the first order, yellow and violet of the second; a true green
     * begins in the second and the third goes on from it.
     */
    @ParameterizedTest
    @EnumSource
    void ordersOfTitaniumHoldInEveryLight(Illuminant light) {
        for (Observer observer : Observer.values()) {
            for (Finish finish : Finish.values()) {
                Palette titanium =
                        new Palette(FilmSystem.of("titanium", 1), finish, Viewing.of(light, observer), 0, 250);
                assertThat(titanium.orderAt(0)).isEqualTo(1);
                assertThat(titanium.orderAt(20)).isEqualTo(1);
                assertThat(titanium.orderAt(45)).isEqualTo(1);
                assertThat(titanium.orderAt(110)).isEqualTo(2);
                assertThat(titanium.orderAt(150)).isEqualTo(2);
                assertThat(titanium.orderAt(190)).isEqualTo(2);
                assertThat(titanium.orderAt(230)).isEqualTo(3);
            }
        }
    }

    /** Property: an order begins once and is never given back; tantalum's pale zone counts although it all but meets grey. */
    @Test
    void ordersRiseOneByOne() {
        for (String metal : METALS) {
            for (Finish finish : Finish.values()) {
                Palette palette = palette(metal, finish);
                int last = 1;
                for (double film = 0; film <= 250; film += 0.25) {
                    int order = palette.orderAt(film);
                    assertThat(order).isBetween(last, last + 1);
                    last = order;
                }
                assertThat(last).as("%s %s", metal, finish).isEqualTo(3);
                assertThat(palette.orderAt(135)).as("%s %s", metal, finish).isEqualTo(2);
            }
        }
    }

    /** Property: the orders of a made-up series: two turns at full chroma, one of them passing the wrong side of neutral. */
    @Test
    void ordersOfAMadeUpSeries() {
        List<Lab> colours = new ArrayList<>();
        for (int i = 0; i <= 72; i++) {
            colours.add(ofHue(90 - 10.0 * i, i == 40 ? 3 : 40));
        }
        Orders orders = new Orders(1, colours);
        // The hue falls from 90 below 120 − 360 = −240 with the 34th step and below −600 with the 70th.
        assertThat(orders.at(33)).isEqualTo(1);
        assertThat(orders.at(34)).isEqualTo(2);
        assertThat(orders.at(69)).isEqualTo(2);
        assertThat(orders.at(70)).isEqualTo(3);
        List<Lab> across = List.of(ofHue(280, 20), ofHue(290, 9), ofHue(10, 1), ofHue(80, 5), ofHue(95, 20));
        assertThat(new Orders(1, across).at(3)).isEqualTo(1);
        assertThat(new Orders(1, across).at(4)).isEqualTo(2);
    }

    private static Lab ofHue(double degrees, double chroma) {
        double radians = Math.toRadians(degrees);
        return new Lab(50, chroma * Math.cos(radians), chroma * Math.sin(radians));
    }

    /** Property: thin films that cannot be told from bare metal are natural, however dull the finish. */
    @Test
    void bareMetalIsNatural() {
        for (String metal : METALS) {
            for (Finish finish : Finish.values()) {
                assertThat(palette(metal, finish).at(0).name()).isEqualTo(TradeName.NATURAL);
                assertThat(palette(metal, finish).at(45).name()).isNotEqualTo(TradeName.NATURAL);
            }
        }
    }

    @Test
    void refusesFilmsOutside() {
        Palette palette = palette("titanium", Finish.MIRROR);
        for (double film : new double[] {-0.01, 250.01, Double.NaN}) {
            String message = "filmNm must be from 0 to 250.0 nm, but was " + film;
            assertThatThrownBy(() -> palette.at(film)).hasMessage(message);
            assertThatThrownBy(() -> palette.labAt(film)).hasMessage(message);
            assertThatThrownBy(() -> palette.orderAt(film)).hasMessage(message);
        }
        for (double max : new double[] {0, 2001, Double.NaN}) {
            assertThatThrownBy(
                            () -> new Palette(FilmSystem.of("titanium", 1), Finish.MIRROR, Viewing.daylight(), 0, max))
                    .hasMessage("maxNm must be above 0 to 2000 nm, but was " + max);
        }
    }
}
