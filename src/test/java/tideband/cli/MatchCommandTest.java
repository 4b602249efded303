package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.oxide.BathPresets;
import tideband.oxide.Coupon;
import tideband.oxide.Metal;

class MatchCommandTest {
    private static final String BATH = """
            {"format": "tideband-bath", "version": 1, "name": "crock", "metal": "titanium", "nm_per_volt": 1.9,
             "field_slope": 30, "native_nm": 4, "efficiency": 0.8, "resistance_ohm": 5, "ceiling_volts": %s,
             "source": "three coupons"}
            """;

    @TempDir
    private Path folder;

    /** Reference: the contract's words; the columns, to the byte. */
    @Test
    void theTable() {
        Ran ran = Ran.line("match --metal titanium --colour #3a3f8f");
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.header()).isEqualTo("film_nm,order,name,volts,dE00,volts_low,volts_high,L,a,b,srgb");
        assertThat(ran.out()).doesNotContain("\r");
        assertThat(ran.remarks()).anyMatch(line -> line.contains("1 of 3 come within 5 dE00"));
    }

    /** Property: best first; volts give the film on a coupon; the window holds the volts, within the bath's ceiling. */
    @ParameterizedTest
    @ValueSource(strings = {"titanium", "ti-6al-4v", "niobium", "tantalum"})
    void theRows(String metal) {
        Ran ran = Ran.of("match", "--metal", metal, "--colour", "lab:55,-20,25", "--hold", "60", "--bath", "sulfuric");
        Metal of = List.of(Metal.values()).stream()
                .filter(each -> each.key().equals(metal))
                .findFirst()
                .orElseThrow();
        Coupon coupon = new Coupon(BathPresets.named(of, "sulfuric").orElseThrow(), 2, 60, 1);
        double before = 0;
        assertThat(ran.rows()).isNotEmpty();
        for (int i = 0; i < ran.rows().size(); i++) {
            assertThat(ran.number(i, 4)).isGreaterThanOrEqualTo(before);
            before = ran.number(i, 4);
            if (ran.number(i, 3) > 0) {
                assertThat(coupon.filmNm(ran.number(i, 3))).isCloseTo(ran.number(i, 0), within(0.01));
            }
            assertThat(ran.number(i, 3)).isBetween(ran.number(i, 5), ran.number(i, 6));
            assertThat(ran.number(i, 6))
                    .isLessThanOrEqualTo(
                            BathPresets.named(of, "sulfuric").orElseThrow().ceilingVolts() + 1e-3);
        }
    }

    /** Property: a film's own colour, asked for in CIELAB, is found at that film. */
    @Test
    void findsWhatColoursShows() {
        Ran colours = Ran.line("colours --metal niobium --light A --from 63 --to 63");
        String lab = String.join(",", colours.rows().get(0).subList(6, 9));
        Ran ran = Ran.of("match", "--metal", "niobium", "--light", "A", "--colour", "lab:" + lab);
        assertThat(ran.number(0, 0)).isCloseTo(63, within(0.011));
        assertThat(ran.number(0, 4)).isLessThan(0.001);
    }

    /** Property: a true red, which no film shows, is answered with the nearest and how far off they are. */
    @Test
    void noFilmIsRed() {
        Ran ran = Ran.line("match --metal titanium --colour #ff0000 --within 4");
        assertThat(ran.code()).isZero();
        assertThat(ran.rows()).isNotEmpty();
        assertThat(ran.remarks())
                .anyMatch(line -> line.matches("# no film comes within 4 dE00: the nearest, .* is [0-9.]+ off"));
        assertThat(ran.number(0, 4)).isGreaterThan(4);
    }

    /** Property: a bath file is taken as it says; one at fault is answered with every fault, and exit code 1. */
    @Test
    void aBathOfOnesOwn() throws Exception {
        Path file = Files.writeString(folder.resolve("crock.json"), BATH.formatted("80"));
        Ran own = Ran.of("match", "--metal", "titanium", "--colour", "#3a3f8f", "--bath", file.toString());
        assertThat(own.code()).isZero();
        assertThat(own.remarks())
                .anyMatch(line -> line.contains("bath crock for titanium: 1.9 nm/V"))
                .anyMatch(line -> line.contains("three coupons"));

        Ran other = Ran.of("match", "--metal", "niobium", "--colour", "#3a3f8f", "--bath", file.toString());
        assertThat(other.code()).isEqualTo(Program.AT_FAULT);
        assertThat(other.err()).contains("/metal: is titanium; take a bath file for niobium");

        Files.writeString(file, BATH.formatted("-80").replace("0.8", "8"));
        Ran faulty = Ran.of("match", "--metal", "titanium", "--colour", "#3a3f8f", "--bath", file.toString());
        assertThat(faulty.code()).isEqualTo(Program.AT_FAULT);
        assertThat(faulty.out()).isEmpty();
        assertThat(faulty.err()).contains("2 faults", "/efficiency", "/ceiling_volts");
    }

    /** Property: a bath that would grow films beyond all known colours is refused in words. */
    @Test
    void aBathTooThick() throws Exception {
        Path file = Files.writeString(
                folder.resolve("thick.json"), BATH.formatted("500").replace("1.9", "19"));
        Ran ran = Ran.of("match", "--metal", "titanium", "--colour", "#3a3f8f", "--bath", file.toString());
        assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
        assertThat(ran.err()).contains("colours are known up to 2000 nm").doesNotContain("Exception");
    }
}
