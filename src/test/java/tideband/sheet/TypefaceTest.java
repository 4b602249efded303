package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class TypefaceTest {
    /** Reference: Liberation Sans is metric-compatible with Helvetica, whose AFM gives A 667, i 222 and space 278. */
    @Test
    void widthsAreThoseOfHelvetica() {
        assertThat(Typeface.widthMm("A", 1000, false)).isCloseTo(667, within(0.5));
        assertThat(Typeface.widthMm("i", 1000, false)).isCloseTo(222, within(0.5));
        assertThat(Typeface.widthMm(" ", 1000, false)).isCloseTo(278, within(0.5));
    }

    /** Property. */
    @Test
    void whatHasNoShapeIsReplacedVisibly() {
        assertThat(Typeface.clean("a\u0000b\u202ec\ud800d")).isEqualTo("a\u25a1b\u25a1c\u25a1d");
        assertThat(Typeface.clean("one\ntwo\tthree")).isEqualTo("one two three");
        assertThat(Typeface.clean("e\u0301")).isEqualTo("\u00e9");
        assertThat(Typeface.has(Typeface.REPLACEMENT)).isTrue();
    }

    /** Property: no character is lost and no line is too wide, for any text of any script. */
    @Property(tries = 300)
    void wrappedLinesFit(@ForAll String text, @ForAll @DoubleRange(min = 20, max = 120) double widthMm) {
        List<String> lines = Typeface.wrap(text, 4, false, widthMm);
        assertThat(lines)
                .allSatisfy(l -> assertThat(Typeface.widthMm(l, 4, false)).isLessThanOrEqualTo(widthMm));
        assertThat(String.join("", lines).replaceAll("\\p{Z}", ""))
                .isEqualTo(Typeface.clean(text).replaceAll("\\p{Z}", ""));
    }

    /** Property. */
    @Property(tries = 300)
    void cutTextFits(@ForAll String text, @ForAll @DoubleRange(min = 10, max = 60) double widthMm) {
        assertThat(Typeface.widthMm(Typeface.fit(text, 4, true, widthMm), 4, true))
                .isLessThanOrEqualTo(widthMm);
    }

    /** Property. */
    @Test
    void numbersStayWithTheirUnits() {
        assertThat(Typeface.wrap("raise to 0 V", 4, false, Typeface.widthMm("raise to 0", 4, false) + 1))
                .containsExactly("raise to", "0 V");
    }
}
