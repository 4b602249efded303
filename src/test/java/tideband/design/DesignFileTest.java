package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tideband.design.Samples.HOOK;
import static tideband.design.Samples.PIPE;
import static tideband.design.Samples.SHUTTER;
import static tideband.design.Samples.sound;
import static tideband.design.Samples.with;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Srgb;
import tideband.colour.Viewing;
import tideband.optics.Finish;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;

/** What sound files say. */
class DesignFileTest {

    @Test
    void everyKeyOfARoundPiece(@TempDir Path folder) throws IOException {
        Path file = Files.writeString(folder.resolve("hook.json"), HOOK);
        Design design = ((Reading.Read<Design>) DesignFile.read(file)).value();
        assertThat(design)
                .isEqualTo(new Design(
                        "Lantern hook",
                        Metal.TITANIUM,
                        Finish.POLISHED,
                        Illuminant.D65,
                        Observer.CIE_1931_2_DEGREE,
                        new Piece(new Section.Round(), List.of(new Station(0, 3), new Station(160, 8))),
                        new Holding(EnumSet.allOf(End.class), 10),
                        List.of(
                                new Band("tip", 0, 42, new Wanted.Film(150, 150), Edge.SOFT),
                                new Band("dusk", 42, 110, new Wanted.Film(150, 46), Edge.SOFT),
                                new Band(
                                        "collar",
                                        110,
                                        160,
                                        new Wanted.Colour(
                                                "#3a3f8f",
                                                Viewing.daylight().lab(Srgb.ofHex("#3a3f8f")),
                                                OptionalInt.empty()),
                                        Edge.SOFT)),
                        BathPresets.usual(Metal.TITANIUM),
                        new Supply(120, 2, 0.1, Double.POSITIVE_INFINITY),
                        Optional.empty(),
                        new BenchTimes(4, 3, 6, 1, 1.5),
                        Order.THICKER_FIRST,
                        new PullSettings(30, FadeStyle.RAMPED, 2, 0.3, 10)));
    }

    @Test
    void everyOtherKey() {
        Design design = sound(SHUTTER);
        assertThat(design.metal()).isEqualTo(Metal.NIOBIUM);
        assertThat(design.finish()).isEqualTo(Finish.SATIN);
        assertThat(design.light()).isEqualTo(Illuminant.LED_B3);
        assertThat(design.observer()).isEqualTo(Observer.CIE_1964_10_DEGREE);
        assertThat(design.piece().section()).isEqualTo(new Section.Flat(0.8));
        assertThat(design.vessel()).contains(Vessel.rectangular(30, 200));
        assertThat(design.holding()).isEqualTo(new Holding(EnumSet.of(End.B), 5));
        assertThat(design.bands())
                .containsExactly(
                        new Band("band 1", 0, 20, new Wanted.Bare(), Edge.CRISP),
                        new Band("sky", 20, 50, new Wanted.Volts(28.5), Edge.SOFT),
                        new Band(
                                "band 3",
                                50,
                                90,
                                new Wanted.Colour("lab(52.5, -3, 21)", new Lab(52.5, -3, 21), OptionalInt.of(2)),
                                Edge.CRISP));
        assertThat(design.bath())
                .isEqualTo(BathPresets.named(Metal.NIOBIUM, "sulfuric").orElseThrow());
        assertThat(design.supply()).isEqualTo(new Supply(90, 0.5, 1, 20));
        assertThat(design.bench()).isEqualTo(new BenchTimes(5, 2, 9, 0, 3));
        assertThat(design.order()).isEqualTo(Order.LEAST_MINUTES);
        assertThat(design.pull()).isEqualTo(new PullSettings(12, FadeStyle.STEPPED, 1.5, 0.5, 4));
    }

    @Test
    void defaultsOfWhatIsLeftOut() {
        Design design = sound(PIPE);
        assertThat(design.piece().section()).isEqualTo(new Section.Tube(4));
        assertThat(design.vessel()).contains(Vessel.round(25));
        assertThat(design.finish()).isEqualTo(Finish.POLISHED);
        assertThat(design.light()).isEqualTo(Illuminant.D65);
        assertThat(design.observer()).isEqualTo(Observer.CIE_1931_2_DEGREE);
        assertThat(design.holding()).isEqualTo(new Holding(EnumSet.allOf(End.class), 10));
        assertThat(design.bands()).containsExactly(new Band("band 1", 0, 70, new Wanted.Film(60, 60), Edge.SOFT));
        assertThat(design.bath()).isEqualTo(BathPresets.usual(Metal.TANTALUM));
        assertThat(design.supply()).isEqualTo(Supply.USUAL);
        assertThat(design.bench()).isEqualTo(BenchTimes.USUAL);
        assertThat(design.order()).isEqualTo(Order.THICKER_FIRST);
        assertThat(design.pull()).isEqualTo(PullSettings.USUAL);
        Design bare = sound(with(with(with(PIPE, "/supply", "{}"), "/bench", "{}"), "/pull", "{}"));
        assertThat(bare).isEqualTo(sound(with(PIPE, "/holding", "{}"))).isEqualTo(design);
    }

    @Test
    void lastBandEndsExactlyAtTheLength() {
        Design design = sound(with(HOOK, "/bands/2/to_mm", "160.0000005"));
        assertThat(design.bands().get(2).toMm()).isEqualTo(160);
    }

    @Test
    void bandOfHalfAMillimetreIsLongEnough() {
        String shortBand = with(with(HOOK, "/bands/0/to_mm", "0.3"), "/bands/1/to_mm", "0.8");
        assertThat(Samples.faults(shortBand)).extracting(Fault::at).containsExactly("/bands/0/to_mm");
        assertThat(sound(with(with(HOOK, "/bands/0/to_mm", "0.6"), "/bands/1/to_mm", "1.1"))
                        .bands())
                .hasSize(3);
    }

    // Reference: white is 100, 0, 0 by definition; red is from memory, as colour tables print it for D65 (the tests of
    // sRGB
    // itself are those of the colour package).
    @ParameterizedTest
    @CsvSource({"#ff0000, 53.24, 80.09, 67.20", "#FFFFFF, 100, 0, 0"})
    void hexadecimalColoursAreSrgb(String hex, double lightness, double a, double b) {
        Design design = sound(with(HOOK, "/bands/2/colour", "\"" + hex + "\""));
        Wanted.Colour colour = (Wanted.Colour) design.bands().get(2).wanted();
        assertThat(colour.text()).isEqualTo(hex);
        assertThat(colour.lab().lightness()).isCloseTo(lightness, within(0.02));
        assertThat(colour.lab().a()).isCloseTo(a, within(0.02));
        assertThat(colour.lab().b()).isCloseTo(b, within(0.02));
    }

    @Test
    void minusZeroIsZero() {
        Design design = sound(HOOK.replace("\"dry_mm\": 10", "\"dry_mm\": -0.0"));
        assertThat(design).isEqualTo(sound(with(HOOK, "/holding/dry_mm", "0")));
        assertThat(1 / design.holding().dryMm()).isPositive();
    }

    @Test
    void titlesStayPlainText() {
        for (String title : List.of(
                "<script>alert(1)</script>",
                "'; DROP TABLE bands; --",
                "=HYPERLINK(1)",
                "${jndi:ldap://x}",
                "%n%s",
                "Ω é 灯 🏮")) {
            assertThat(sound(with(HOOK, "/title", "\"" + title + "\"")).title()).isEqualTo(title);
        }
    }

    @Test
    void eightyCharactersAreCountedAsPeopleCount() {
        assertThat(sound(with(HOOK, "/title", "\"" + "🏮".repeat(80) + "\"")).title())
                .hasSize(160);
        assertThat(Samples.faults(with(HOOK, "/title", "\"" + "🏮".repeat(81) + "\"")))
                .extracting(Fault::at)
                .containsExactly("/title");
    }
}
