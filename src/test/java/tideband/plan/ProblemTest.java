package tideband.plan;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Collections;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/** What a problem refuses, and what it says then. */
class ProblemTest {

    private static final Stretch BAND = new Stretch(10, 50, 50, false, false);

    @Test
    void refusesNoBandAndTooMany() {
        refused(List.of(), Set.of(End.A), 0, "from 1 to 60 stretches, but had 0");
        refused(Collections.nCopies(61, BAND), Set.of(End.A), 0, "from 1 to 60 stretches, but had 61");
    }

    @Test
    void refusesNoEnd() {
        refused(List.of(BAND), Set.of(), 0, "endsDown must name an end, A or B or both, but was empty");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesImpossibleDryLengths(double dryMm) {
        refused(List.of(BAND), Set.of(End.A), dryMm, "dryMm must be finite and 0 or more, but was " + dryMm);
    }

    @Test
    void refusesEndlessPieces() {
        Stretch endless = new Stretch(2e5, 50, 50, false, false);
        refused(List.of(endless), Set.of(End.A), 0, "at most 100000.0 mm long, but were 200000.0");
    }

    @Test
    void refusesNamesThatDoNotMatch() {
        assertThatThrownBy(() -> new Problem(
                        List.of(BAND), List.of("tip", "tail"), Set.of(End.A), 0, BenchTimes.USUAL, Order.LEAST_MINUTES))
                .hasMessageContaining("names must be none or one a stretch, 1 in all, but there were 2");
    }

    private static void refused(List<Stretch> stretches, Set<End> ends, double dryMm, String message) {
        assertThatThrownBy(() -> new Problem(stretches, ends, dryMm, BenchTimes.USUAL, Order.THICKER_FIRST))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining(message);
    }
}
