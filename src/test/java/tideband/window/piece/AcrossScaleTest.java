package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class AcrossScaleTest {

    @Test
    void isToScaleWhereItFits() {
        assertThat(AcrossScale.fit(8, 6, 24, 100).words()).isEqualTo("to scale");
        assertThat(AcrossScale.fit(8, 6, 24, 100).pxPerMm()).isEqualTo(6);
    }

    @Test
    void aThinPieceIsWidenedAndAWideOneNarrowed() {
        assertThat(AcrossScale.fit(2, 3, 24, 100).words()).isEqualTo("across ×4");
        assertThat(AcrossScale.fit(30, 8, 24, 100).words()).isEqualTo("across ×0.41");
    }

    /** Property: whatever the size, the piece fits its room. */
    @Property
    void alwaysFits(
            @ForAll @DoubleRange(min = 0.1, max = 500) double sizeMm,
            @ForAll @DoubleRange(min = 0.01, max = 200) double pxPerMm,
            @ForAll @DoubleRange(min = 5, max = 400) double roomPx) {
        AcrossScale scale = AcrossScale.fit(sizeMm, pxPerMm, 24, roomPx);
        assertThat(scale.pxPerMm() * sizeMm).isLessThanOrEqualTo(roomPx * (1 + 1e-9));
        assertThat(scale.times()).isPositive();
    }
}
