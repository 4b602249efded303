package tideband.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Holding;
import tideband.design.Reading;
import tideband.design.Wanted;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;

/** Edits of what surrounds the bands do what was asked, or as nearly as can be. */
class DesignEditsTest {
    private static final Design KEY = shipped("wick-key");
    private static final Design TUBE = shipped("burner-tube");
    private static final Design PIN = shipped("wick-pin");

    private static Design shipped(String name) {
        return ((Reading.Read<Design>) DesignFile.read(Path.of("designs", name + ".json"))).value();
    }

    private static Piece rod(double lengthMm) {
        return new Piece(new Section.Round(), List.of(new Station(0, 6), new Station(lengthMm, 6)));
    }

    @Test
    void titlesStandOnOneLine() {
        assertThat(DesignEdits.title(KEY, " two\nlines\u2028 \u0085").title()).isEqualTo("two lines");
        assertThat(DesignEdits.title(KEY, "x".repeat(99)).title()).hasSize(80);
        assertThat(DesignEdits.title(KEY, " \t")).isEqualTo(KEY);
    }

    @Test
    void theBathFollowsTheMetal() {
        Design bicarbonate = DesignEdits.bath(
                KEY, BathPresets.named(Metal.TITANIUM, "bicarbonate").orElseThrow(), Optional.empty());
        assertThat(DesignEdits.metal(bicarbonate, Metal.TI_6AL_4V).bath())
                .isEqualTo(BathPresets.named(Metal.TI_6AL_4V, "bicarbonate").orElseThrow());
        assertThat(DesignEdits.metal(bicarbonate, Metal.NIOBIUM).bath()).isEqualTo(BathPresets.usual(Metal.NIOBIUM));
        assertThat(DesignEdits.metal(TUBE, Metal.NIOBIUM).bathFile()).isEmpty();
        assertThat(DesignEdits.metal(TUBE, Metal.TANTALUM)).isEqualTo(TUBE);
    }

    @Test
    void aColourOfAScreenGoesOnMeaningItInAnotherLight() {
        Wanted.Colour lab = Wanted.Colour.ofLab(new Lab(50, 10, -20), OptionalInt.empty());
        Design design = DesignEdits.observer(
                DesignEdits.light(BandEdits.want(KEY, List.of(1), lab), Illuminant.A), Observer.CIE_1964_10_DEGREE);
        Viewing viewing = Viewing.of(Illuminant.A, Observer.CIE_1964_10_DEGREE);
        assertThat(design.bands().get(0).wanted())
                .isEqualTo(Wanted.Colour.ofHex("#3f4f9a", viewing, OptionalInt.empty()));
        assertThat(design.bands().get(1).wanted()).isEqualTo(lab);
        assertThat(DesignEdits.observer(DesignEdits.light(design, Illuminant.D65), Observer.CIE_1931_2_DEGREE)
                        .bands()
                        .get(0))
                .isEqualTo(KEY.bands().get(0));
    }

    @Test
    void bandsCoverAPieceOfAnotherLength() {
        Design twice = DesignEdits.piece(KEY, rod(180));
        assertThat(twice.bands()).extracting(Band::toMm).containsExactly(80.0, 180.0);
        assertThat(twice.holding()).isEqualTo(KEY.holding());
        Design tiny = DesignEdits.piece(KEY, rod(1.1));
        assertThat(tiny.bands()).extracting(Band::toMm).containsExactly(0.5, 1.1);
        assertThat(tiny.holding().dryMm()).isLessThan(1.1);
        assertThat(DesignEdits.piece(TUBE, rod(1.5))).as("four bands need 2 mm").isEqualTo(TUBE);
        assertThat(DesignEdits.piece(KEY, rod(6000))).isEqualTo(KEY);
        assertThat(DesignEdits.piece(PIN, rod(70)).piece()).isEqualTo(rod(70));
        Piece thick = new Piece(new Section.Round(), List.of(new Station(0, 13), new Station(70, 13)));
        assertThat(DesignEdits.piece(PIN, thick)).as("the vessel is 12 mm wide").isEqualTo(PIN);
    }

    @Test
    void aPieceThatIsHeldGetsWet() {
        Holding all = new Holding(EnumSet.of(End.B), 500);
        assertThat(DesignEdits.holding(KEY, all).holding()).isEqualTo(new Holding(EnumSet.of(End.B), 89.5));
    }

    @Test
    void aBathThatIsNoPresetKeepsOrGetsAFile() {
        Bath mine = KEY.bath().withResistanceOhm(5);
        assertThat(DesignEdits.bath(KEY, mine, Optional.of("jar 3.json")).bathFile())
                .contains("jar 3.json");
        assertThat(DesignEdits.bath(KEY, mine, Optional.empty()).bathFile()).contains("phosphate.json");
        assertThat(DesignEdits.bath(KEY, mine, Optional.of("../jar")).bathFile())
                .contains("phosphate.json");
        assertThat(DesignEdits.bath(KEY, TUBE.bath(), Optional.empty())).isEqualTo(KEY);
        Design renamed = BandEdits.rename(DesignEdits.bath(KEY, mine, Optional.of("jar.json")), 0, "other");
        assertThat(renamed.bathFile()).contains("jar.json");
    }

    @Test
    void suppliesAndVesselsAreOnesAFileCanHold() {
        Supply supply = DesignEdits.supply(KEY, new Supply(5000, 1e-9, 50, 1e9)).supply();
        assertThat(supply).isEqualTo(new Supply(1000, 0.001, 10, 1e6));
        assertThat(DesignEdits.supply(KEY, new Supply(1, 1, 10, Double.POSITIVE_INFINITY))
                        .supply())
                .isEqualTo(new Supply(1, 1, 1, Double.POSITIVE_INFINITY));
        assertThat(DesignEdits.vessel(KEY, Optional.of(Vessel.round(6)))).isEqualTo(KEY);
        Optional<Vessel> box = Optional.of(Vessel.rectangular(300, 7));
        assertThat(DesignEdits.vessel(KEY, box).vessel()).isEqualTo(box);
        assertThat(DesignEdits.vessel(PIN, Optional.empty()).vessel()).isEmpty();
    }
}
