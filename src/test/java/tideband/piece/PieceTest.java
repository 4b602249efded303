package tideband.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

class PieceTest {

    private static Piece piece(Section section, double... positionsAndSizes) {
        List<Station> stations = new ArrayList<>();
        for (int i = 0; i < positionsAndSizes.length; i += 2) {
            stations.add(new Station(positionsAndSizes[i], positionsAndSizes[i + 1]));
        }
        return new Piece(section, stations);
    }

    private static final Section ROUND = new Section.Round();

    // Reference: frustum of a cone, lateral area π(r1 + r2)l and volume πh(r1² + r1 r2 + r2²)/3; Euclid's cone as the
    // limit.
    // CRC Standard Mathematical Tables and Formulae, section "Cones and conical frustums". The numbers are whole
    // because
    // 3-4-5 makes the slant whole: r1 = 2, r2 = 5, h = 4, l = 5.
    @Test
    void frustumHasItsClosedForms() {
        Piece frustum = piece(ROUND, 0, 4, 4, 10);
        double ends = Math.PI * (4 + 25);
        assertThat(frustum.wetAreaMm2(0, 4)).isCloseTo(35 * Math.PI + ends, within(1e-12));
        assertThat(frustum.volumeMm3(0, 4)).isCloseTo(52 * Math.PI, within(1e-12));
        assertThat(frustum.perimeterMm(0)).isCloseTo(4 * Math.PI, within(1e-12));
        assertThat(frustum.perimeterMm(2)).isCloseTo(7 * Math.PI, within(1e-12));
        assertThat(frustum.sectionAreaMm2(2)).isCloseTo(12.25 * Math.PI, within(1e-12));
    }

    // Reference: a double cone is two frustums; Pappus's centroid theorem gives area 2π · (mean radius) · (generator).
    @Test
    void stretchesRunAcrossStations() {
        Piece spindle = piece(ROUND, 0, 4, 4, 10, 8, 4);
        assertThat(spindle.wetAreaMm2(2, 6)).isCloseTo(2 * (2 * Math.PI * 4.25 * 2.5), within(1e-12));
        assertThat(spindle.wetAreaMm2(0, 8)).isCloseTo(2 * 35 * Math.PI + 2 * Math.PI * 4, within(1e-12));
        assertThat(spindle.largestSizeMm(0, 8)).isEqualTo(10);
        assertThat(spindle.largestSizeMm(0, 2)).isEqualTo(7);
        assertThat(spindle.largestSizeMm(6, 8)).isEqualTo(7);
    }

    // Reference: right circular cylinder and hollow cylinder, elementary.
    @Test
    void tubeIsWetInside() {
        Piece tube = piece(new Section.Tube(6), 0, 8, 100, 8);
        double annulus = Math.PI * (16 - 9);
        assertThat(tube.wetAreaMm2(10, 20)).isCloseTo(Math.PI * (8 + 6) * 10, within(1e-11));
        assertThat(tube.wetAreaMm2(0, 20)).isCloseTo(Math.PI * (8 + 6) * 20 + annulus, within(1e-11));
        assertThat(tube.wetAreaMm2(90, 100)).isCloseTo(Math.PI * (8 + 6) * 10 + annulus, within(1e-11));
        assertThat(tube.sectionAreaMm2(5)).isCloseTo(annulus, within(1e-12));
        assertThat(tube.volumeMm3(0, 100)).isCloseTo(100 * annulus, within(1e-10));
        assertThat(tube.perimeterMm(5)).isCloseTo(8 * Math.PI, within(1e-12));
    }

    // Reference: trapezium and prism, elementary. Half the width grows by 3 over 4, so the edges are 5 long.
    @Test
    void flatHasFacesAndSlantedEdges() {
        Piece strip = piece(new Section.Flat(0.5), 0, 2, 4, 8);
        assertThat(strip.wetAreaMm2(0, 4)).isCloseTo(2 * 20 + 2 * 0.5 * 5 + 0.5 * (2 + 8), within(1e-12));
        assertThat(strip.volumeMm3(0, 4)).isCloseTo(20 * 0.5, within(1e-12));
        assertThat(strip.perimeterMm(0)).isCloseTo(5, within(1e-12));
        assertThat(strip.sectionAreaMm2(4)).isCloseTo(4, within(1e-12));
    }

    @Property(tries = 200)
    void mirroredPieceHasMirroredMeasures(
            @ForAll @Size(min = 2, max = 6) List<@DoubleRange(min = 1, max = 30) Double> sizes,
            @ForAll @DoubleRange(min = 0, max = 1) double share1,
            @ForAll @DoubleRange(min = 0, max = 1) double share2) {
        List<Station> forward = new ArrayList<>();
        List<Station> mirrored = new ArrayList<>();
        double length = 7.0 * (sizes.size() - 1);
        for (int i = 0; i < sizes.size(); i++) {
            forward.add(new Station(7.0 * i, sizes.get(i)));
            mirrored.add(0, new Station(length - 7.0 * i, sizes.get(i)));
        }
        double from = Math.min(share1, share2) * length;
        double to = Math.max(share1, share2) * length;
        for (Section section : List.of(ROUND, new Section.Flat(0.7), new Section.Tube(0.9))) {
            Piece piece = new Piece(section, forward);
            Piece mirror = new Piece(section, mirrored);
            double mirrorFrom = mirror.fromEnd(End.B, to);
            double mirrorTo = mirror.fromEnd(End.B, from);
            assertThat(mirror.wetAreaMm2(mirrorFrom, mirrorTo)).isCloseTo(piece.wetAreaMm2(from, to), within(1e-8));
            assertThat(mirror.volumeMm3(mirrorFrom, mirrorTo)).isCloseTo(piece.volumeMm3(from, to), within(1e-8));
        }
    }

    @Property(tries = 200)
    void measuresAddUp(
            @ForAll @DoubleRange(min = 0, max = 50) double a,
            @ForAll @DoubleRange(min = 0, max = 50) double b,
            @ForAll @DoubleRange(min = 0, max = 50) double c) {
        double[] cut = {a, b, c};
        Arrays.sort(cut);
        Piece piece = piece(new Section.Tube(1), 0, 3, 20, 9, 21, 2, 50, 2);
        assertThat(piece.wetAreaMm2(cut[0], cut[1]) + piece.wetAreaMm2(cut[1], cut[2]))
                .isCloseTo(
                        piece.wetAreaMm2(cut[0], cut[2]) + twiceCountedFace(piece, cut[0], cut[1], cut[2]),
                        within(1e-9));
        assertThat(piece.volumeMm3(cut[0], cut[1]) + piece.volumeMm3(cut[1], cut[2]))
                .isCloseTo(piece.volumeMm3(cut[0], cut[2]), within(1e-9));
    }

    // An empty stretch at an end still has that end's face.
    private static double twiceCountedFace(Piece piece, double a, double b, double c) {
        double twice = a == 0 && b == 0 ? piece.sectionAreaMm2(0) : 0;
        return twice + (b == 50 && c == 50 ? piece.sectionAreaMm2(50) : 0);
    }

    @Test
    void distancesFromAnEndReverse() {
        Piece rod = piece(ROUND, 0, 3, 160, 8);
        assertThat(rod.fromEnd(End.A, 12.5)).isEqualTo(12.5);
        assertThat(rod.fromEnd(End.B, 12.5)).isEqualTo(147.5);
        assertThat(rod.fromEnd(End.B, rod.fromEnd(End.B, 31))).isEqualTo(31);
        assertThat(rod.fromEnd(End.B, 160)).isEqualTo(0);
    }

    @Test
    void sizeIsExactAtStations() {
        Piece rod = piece(ROUND, 0, 0.1, 0.3, 0.7, 160, 8.3);
        assertThat(rod.sizeMm(0)).isEqualTo(0.1);
        assertThat(rod.sizeMm(0.3)).isEqualTo(0.7);
        assertThat(rod.sizeMm(160)).isEqualTo(8.3);
    }

    @Test
    void shapesThatCannotBeAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Station(Double.NaN, 1))
                .withMessage("atMm must be finite and at least 0, but was NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> new Station(Double.POSITIVE_INFINITY, 1));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Station(0, -0.0))
                .withMessage("sizeMm must be finite and above 0, but was -0.0");
        assertThatIllegalArgumentException().isThrownBy(() -> new Station(0, Double.NaN));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Section.Flat(0))
                .withMessage("thicknessMm must be finite and above 0, but was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Section.Tube(Double.NaN))
                .withMessage("boreMm must be finite and above 0, but was NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> piece(ROUND, 0, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> piece(ROUND, 1, 1, 2, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> piece(ROUND, 0, 1, 2, 1, 2, 1));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> piece(new Section.Tube(3), 0, 4, 10, 3))
                .withMessage("a tube must be wider than its bore of 3.0 mm everywhere, but at 10.0 mm it was 3.0 mm");
    }

    @Test
    void placesOffThePieceAreRefused() {
        Piece rod = piece(ROUND, 0, 3, 160, 8);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> rod.sizeMm(160.5))
                .withMessage("atMm must be from 0 to 160.0 mm, the piece's length, but was 160.5");
        assertThatIllegalArgumentException().isThrownBy(() -> rod.sizeMm(-1e-9));
        assertThatIllegalArgumentException().isThrownBy(() -> rod.sizeMm(Double.NaN));
        assertThatIllegalArgumentException().isThrownBy(() -> rod.wetAreaMm2(0, 161));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> rod.volumeMm3(2, 1))
                .withMessage("fromMm must not be beyond toMm, but they were 2.0 and 1.0 mm");
        assertThatIllegalArgumentException().isThrownBy(() -> rod.fromEnd(End.A, -1));
    }
}
