package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;

/** Values that no design can have are refused by the values themselves, whoever builds them. */
class DesignTest {

    private static final Design HOOK = Samples.sound(Samples.HOOK);

    private static Design hook(List<Band> bands, Holding holding, Bath bath) {
        return new Design(
                HOOK.title(),
                HOOK.metal(),
                HOOK.finish(),
                HOOK.light(),
                HOOK.observer(),
                HOOK.piece(),
                holding,
                bands,
                bath,
                HOOK.supply(),
                HOOK.vessel(),
                HOOK.bench(),
                HOOK.order(),
                HOOK.pull());
    }

    private static Band bare(double fromMm, double toMm) {
        return new Band("bare", fromMm, toMm, new Wanted.Bare(), Edge.SOFT);
    }

    @Test
    void bandsCoverThePieceWithoutGaps() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> hook(List.of(bare(0, 50), bare(60, 160)), HOOK.holding(), HOOK.bath()))
                .withMessage("band bare must begin where the one before ends, at 50.0 mm, but begins at 60.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> hook(List.of(bare(0, 150)), HOOK.holding(), HOOK.bath()))
                .withMessage("the bands must end at the piece's length, 160.0 mm, but end at 150.0");
        assertThatIllegalArgumentException().isThrownBy(() -> hook(List.of(), HOOK.holding(), HOOK.bath()));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> bare(5, 5))
                .withMessage("fromMm must be at least 0 and toMm finite and above it, but they were 5.0 and 5.0");
        assertThatIllegalArgumentException().isThrownBy(() -> bare(Double.NaN, 5));
        assertThatIllegalArgumentException().isThrownBy(() -> bare(0, Double.POSITIVE_INFINITY));
    }

    @Test
    void bathIsForTheMetal() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> hook(HOOK.bands(), HOOK.holding(), BathPresets.usual(Metal.NIOBIUM)))
                .withMessage("the bath must be for TITANIUM, but is for NIOBIUM");
    }

    @Test
    void somethingGetsWet() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> hook(HOOK.bands(), new Holding(EnumSet.of(End.A), 160), HOOK.bath()))
                .withMessage("dryMm must be less than the piece's length, 160.0 mm, but was 160.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Holding(EnumSet.of(End.A), Double.NaN))
                .withMessage("dryMm must be finite and at least 0, but was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Holding(EnumSet.noneOf(End.class), 5))
                .withMessage("at least one end must be able to go down");
    }

    @Test
    void wetPlacesDependOnTheEndThatIsDown() {
        assertThat(new Holding(EnumSet.of(End.A), 64).largestWetSizeMm(HOOK.piece()))
                .isEqualTo(6);
        assertThat(new Holding(EnumSet.of(End.B), 64).largestWetSizeMm(HOOK.piece()))
                .isEqualTo(8);
        assertThat(Holding.USUAL.largestWetSizeMm(HOOK.piece())).isEqualTo(8);
    }

    @Test
    void filmsAndVoltsAreAboveNothing() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Wanted.Film(0, 20))
                .withMessage("films must be finite and above 0 nm, but they were 0.0 and 20.0");
        assertThatIllegalArgumentException().isThrownBy(() -> new Wanted.Film(20, Double.NaN));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Wanted.Volts(Double.POSITIVE_INFINITY))
                .withMessage("volts must be finite and above 0, but was Infinity");
        assertThatIllegalArgumentException().isThrownBy(() -> new Wanted.Volts(-0.0));
    }

    @Test
    void timesSettingsAndSuppliesRefuseNaN() {
        assertThatIllegalArgumentException().isThrownBy(() -> new BenchTimes(4, Double.NaN, 6, 1, 1.5));
        assertThatIllegalArgumentException().isThrownBy(() -> new BenchTimes(4, 3, 6, 1, -1));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new PullSettings(Double.NaN, FadeStyle.RAMPED, 2, 0.3, 10))
                .withMessage("holdS must be from 1 to 36000 s, but was NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> new PullSettings(30, FadeStyle.RAMPED, 2, 5, 5));
        assertThatIllegalArgumentException().isThrownBy(() -> new PullSettings(30, FadeStyle.RAMPED, 0, 0.3, 10));
        assertThatIllegalArgumentException().isThrownBy(() -> new Supply(Double.NaN, 2, 0.1, 1));
    }

    @Test
    void listsAndSetsCannotBeChanged() {
        assertThatExceptionOfType(UnsupportedOperationException.class)
                .isThrownBy(() -> HOOK.bands().clear());
        assertThatExceptionOfType(UnsupportedOperationException.class)
                .isThrownBy(() -> HOOK.holding().endsDown().clear());
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Reading.Faulty<Design>(List.of()))
                .withMessage("a faulty file has at least one fault");
    }
}
