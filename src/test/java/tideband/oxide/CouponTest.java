package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class CouponTest {
    private static final double SOLVED_NM = 0.002;

    /** Property: volts, then the film they give, is where one began; and more film wants more volts. */
    @ParameterizedTest
    @EnumSource(Metal.class)
    void voltsAndFilmAreEachOthersInverse(Metal metal) {
        for (Bath bath : BathPresets.of(metal)) {
            for (double holdS : new double[] {2, 30, 600}) {
                Coupon coupon = new Coupon(bath, 2, holdS, Coupon.USUAL_CM2);
                double last = 0;
                for (double filmNm = 5; filmNm < 230; filmNm += 7.3) {
                    double volts = coupon.volts(filmNm);
                    assertThat(volts).isGreaterThan(last);
                    assertThat(coupon.filmNm(volts)).isCloseTo(filmNm, within(SOLVED_NM));
                    last = volts;
                }
            }
        }
    }

    /** Property: the same where the limit throttles for part of the hold, and where it throttles to the end. */
    @Test
    void theLimitMakesItDearAndThenImpossible() {
        Bath bath = BathPresets.usual(Metal.TITANIUM);
        Coupon throttled = new Coupon(bath, 0.01, 30, 1);
        Coupon free = new Coupon(bath, 2, 30, 1);
        double mostNm = bath.nativeNm() + new GrowthLaw(bath).growthNmPerS(10) * 30;
        for (double share : new double[] {0.3, 0.6, 0.9, 0.99, 0.9999, 0.999_999}) {
            double filmNm = share * mostNm;
            double volts = throttled.volts(filmNm);
            assertThat(volts).isFinite().isGreaterThan(free.volts(filmNm));
            assertThat(throttled.filmNm(volts)).isCloseTo(filmNm, within(SOLVED_NM));
        }
        assertThat(throttled.volts(mostNm)).isInfinite();
        assertThat(throttled.volts(mostNm + 1)).isInfinite();
        assertThat(throttled.filmNm(500)).isCloseTo(mostNm, within(1e-5));
    }

    /** Property: a film the supply cannot stay below wants no volts; the law puts the native film at 0.1 mA/cm² at 0 V. */
    @ParameterizedTest
    @EnumSource(Metal.class)
    void theNativeFilmWantsNoVolts(Metal metal) {
        Bath bath = BathPresets.usual(metal);
        Coupon coupon = new Coupon(bath, 2, 30, 1);
        assertThat(coupon.volts(0)).isZero();
        assertThat(coupon.volts(bath.nativeNm())).isZero();
        assertThat(coupon.volts(Math.nextUp(bath.nativeNm()))).isZero();
        assertThat(coupon.filmNm(0)).isEqualTo(bath.nativeNm());
        double leastNm = coupon.filmNm(1e-7);
        assertThat(coupon.volts(leastNm)).isZero();
        assertThat(coupon.volts(leastNm + 0.01)).isBetween(1e-4, 0.1);
    }

    /** Property: baths at the corners of what a bath may be are solved as well, short of no film at all. */
    @Test
    void theCornersOfABath() {
        for (double slope : new double[] {5, 200}) {
            for (double nativeNm : new double[] {0.1, 20}) {
                for (double holdS : new double[] {0.1, 1e4}) {
                    Bath bath = new Bath(
                            "corner", Metal.NIOBIUM, 2.4, slope, nativeNm, 1, 2, 100, 1, "a corner of the limits");
                    Coupon coupon = new Coupon(bath, 2, holdS, 1);
                    for (double filmNm = nativeNm; filmNm < 90; filmNm += 5.1) {
                        double volts = coupon.volts(filmNm);
                        assertThat(volts).isNotNaN();
                        double error = Double.isInfinite(volts) ? 0 : coupon.filmNm(volts) - filmNm;
                        boolean leastOfAll = volts == 0 && filmNm <= coupon.filmNm(1e-7);
                        assertThat(leastOfAll || Math.abs(error) <= SOLVED_NM).isTrue();
                    }
                }
            }
        }
    }

    /** Property: a longer hold or a smaller resistance never wants more volts. */
    @Test
    void timeAndResistanceCount() {
        Bath bath = BathPresets.usual(Metal.NIOBIUM);
        double thirty = new Coupon(bath, 2, 30, 1).volts(90);
        assertThat(new Coupon(bath, 2, 60, 1).volts(90)).isLessThan(thirty);
        assertThat(new Coupon(bath.withResistanceOhm(1000), 2, 30, 1).volts(90)).isGreaterThan(thirty);
        assertThat(new Coupon(bath.withResistanceOhm(0), 2, 30, 1).volts(90)).isLessThan(thirty);
    }

    /** Property: what cannot be is refused. */
    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, 0, -1})
    void refusesWhatCannotBe(double bad) {
        Bath bath = BathPresets.usual(Metal.TITANIUM);
        assertThatThrownBy(() -> new Coupon(bath, bad, 30, 1)).hasMessageContaining("limitAmps");
        assertThatThrownBy(() -> new Coupon(bath, 1, bad, 1)).hasMessageContaining("holdS");
        assertThatThrownBy(() -> new Coupon(bath, 1, 30, bad)).hasMessageContaining("areaCm2");
        assertThatThrownBy(() -> new Coupon(bath, 1, 30, 1).volts(Double.NaN)).hasMessageContaining("filmNm must be");
    }
}
