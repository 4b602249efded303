package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static tideband.colour.TradeName.BLUE;
import static tideband.colour.TradeName.DEEP_BLUE;
import static tideband.colour.TradeName.GOLD;
import static tideband.colour.TradeName.GREEN;
import static tideband.colour.TradeName.MAGENTA;
import static tideband.colour.TradeName.PALE_YELLOW;
import static tideband.colour.TradeName.PURPLE;
import static tideband.colour.TradeName.ROSE;
import static tideband.colour.TradeName.SILVER;
import static tideband.colour.TradeName.SKY_BLUE;
import static tideband.colour.TradeName.STRAW;
import static tideband.colour.TradeName.TEAL;
import static tideband.colour.TradeName.VIOLET;
import static tideband.colour.TradeName.YELLOW;

import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tideband.colour.TradeName;
import tideband.colour.Viewing;
import tideband.match.FilmColour;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.oxide.BathPresets;
import tideband.oxide.Coupon;
import tideband.oxide.Metal;

/**
 * Growth and optics together against what the trade sees: titanium in a weak carbonate bath, a few seconds at each
 * voltage. Common practice, no source: yellow from about 5 to 15 V, purple near 25 V, blue near 30 V, then paler to silver,
 * a second yellow, red-pink, purple past 100 V, then green.
 */
class TitaniumByVoltsTest {
    private static final double DIP_S = 5;

    private static final Coupon COUPON =
            new Coupon(BathPresets.named(Metal.TITANIUM, "carbonate").orElseThrow(), 2, DIP_S, Coupon.USUAL_CM2);

    private static final Palette PALETTE =
            new Palette(FilmSystem.of("titanium", 1), Finish.POLISHED, Viewing.daylight(), 0, 300);

    static Stream<Arguments> asTheTradeSeesIt() {
        return Stream.of(
                Arguments.of(5, Set.of(STRAW, GOLD)),
                Arguments.of(10, Set.of(STRAW, GOLD)),
                Arguments.of(15, Set.of(GOLD)),
                Arguments.of(25, Set.of(PURPLE)),
                Arguments.of(30, Set.of(DEEP_BLUE, BLUE)),
                Arguments.of(45, Set.of(SKY_BLUE)),
                Arguments.of(60, Set.of(SILVER, SKY_BLUE)),
                Arguments.of(75, Set.of(YELLOW, PALE_YELLOW)),
                Arguments.of(85, Set.of(YELLOW)),
                Arguments.of(95, Set.of(ROSE)),
                Arguments.of(105, Set.of(MAGENTA, VIOLET, PURPLE)),
                Arguments.of(115, Set.of(MAGENTA, VIOLET, PURPLE)),
                Arguments.of(130, Set.of(TEAL, GREEN)),
                Arguments.of(140, Set.of(GREEN)));
    }

    @ParameterizedTest
    @MethodSource
    void asTheTradeSeesIt(double volts, Set<TradeName> names) {
        FilmColour colour = PALETTE.at(COUPON.filmNm(volts));
        assertThat(names).as("%.1f nm at %.0f V", colour.filmNm(), volts).contains(colour.name());
    }
}
