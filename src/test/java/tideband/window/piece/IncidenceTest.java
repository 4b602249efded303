package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.RotationConvention;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;

class IncidenceTest {

    /** Property: the rule against a cylinder's normal turned in space by a library's rotation. */
    @Property
    void isTheAngleBetweenTheTurnedNormalAndTheEye(
            @ForAll @DoubleRange(min = -1, max = 1) double offset, @ForAll @DoubleRange(max = 80) double tiltDeg) {
        Vector3D normal = new Vector3D(0, offset, Math.sqrt(1 - offset * offset));
        Rotation tilt = new Rotation(Vector3D.PLUS_J, Math.toRadians(tiltDeg), RotationConvention.VECTOR_OPERATOR);
        double angleDeg = Math.toDegrees(Vector3D.angle(tilt.applyTo(normal), Vector3D.PLUS_K));
        assertThat(Incidence.angleDeg(offset, tiltDeg)).isCloseTo(Math.min(Incidence.MOST_DEG, angleDeg), within(1e-5));
    }

    @Test
    void theMiddleIsSeenUnderTheTiltAndTheOutlineAtTheSteepestAngle() {
        assertThat(Incidence.angleDeg(0, 37)).isCloseTo(37, within(1e-9));
        assertThat(Incidence.angleDeg(0.5, 0)).isCloseTo(30, within(1e-9));
        assertThat(Incidence.angleDeg(1, 0)).isEqualTo(85);
    }
}
