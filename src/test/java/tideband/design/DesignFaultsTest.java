package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static tideband.design.Samples.HOOK;
import static tideband.design.Samples.PIPE;
import static tideband.design.Samples.SHUTTER;
import static tideband.design.Samples.faults;
import static tideband.design.Samples.with;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every kind of fault a design can have, one at a time and all together. */
class DesignFaultsTest {

    // Columns: value put in ("-" takes the member out), its pointer, the fault's pointer where another, what is wrong,
    // and
    // part of what would be right.
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "-              | /title             | | is missing                                   | give it",
                "-              | /metal             | | is missing                                   | give it",
                "-              | /piece             | | is missing                                   | give it",
                "-              | /bands             | | is missing                                   | give it",
                "-              | /format            | | is missing                                   | give it",
                "-              | /version           | | is missing                                   | give it",
                "\"drawing\"    | /format            | | is \"drawing\"                               | it must be \"tideband-design\"",
                "2              | /version           | | is 2                                         | it must be 1, the version",
                "\"1\"          | /version           | | is \"1\"                                     | it must be 1",
                "7              | /title             | | is 7                                         | a text in double quotes",
                "\"\"           | /title             | | is \"\"                                      | 1 to 80 characters",
                "\"   \"        | /title             | | is \"   \"                                   | not only spaces",
                "\"a\\u0007b\"  | /title             | | is \"a\\u0007b\"                             | without control characters",
                "\"a\\nb\"      | /title             | | is \"a\\u000ab\"                             | on one line",
                "\"a\\u2028b\"  | /title             | | is \"a\\u2028b\"                             | on one line",
                "\"titanum\"    | /metal             | | is \"titanum\"                               | did you mean \"titanium\"?",
                "\"zirconium\"  | /metal             | | is \"zirconium\"                             | \"titanium\", \"ti-6al-4v\", \"niobium\", \"tantalum\"",
                "null           | /finish            | | is null                                      | \"mirror\", \"polished\", \"satin\", \"blasted\"",
                "\"d65\"        | /light             | | is \"d65\"                                   | did you mean \"D65\"?",
                "5              | /observer          | | is 5                                         | 2 or 10, in degrees",
                "\"2\"          | /observer          | | is \"2\"                                     | 2 or 10, in degrees",
                "\"red\"        | /colours           | | is not a known key                           | the keys here are \"format\"",
                "1              | /Title             | | is not a known key                           | did you mean \"title\"?",
                "1              | /a~1b~0c           | | is not a known key                           | the keys here are",
                "[]             | /piece             | | is an array                                  | it must be an object with the keys \"shape\"",
                "\"square\"     | /piece/shape       | | is \"square\"                                | \"round\", \"flat\", \"tube\"",
                "1              | /piece/thickness_mm| | does not belong here                         | only a flat piece has a thickness",
                "1              | /piece/bore_mm     | | does not belong here                         | only a tube has a bore",
                "3              | /piece/stations    | | is 3                                         | an array of 2 to 200",
                "[]             | /piece/stations    | | has 0 elements                               | an array of 2 to 200",
                "5              | /piece/stations/0  | | is 5                                         | an object with the keys \"at_mm\", \"size_mm\"",
                "1              | /piece/stations/0/at_mm   | | is 1                                  | the first station must be at 0",
                "0              | /piece/stations/1/at_mm   | | is 0                                  | above 0, where the one before is",
                "5000.1         | /piece/stations/1/at_mm   | | is 5000.1, out of range               | from 0 to 5000",
                "0.5            | /piece/stations/1/at_mm   | | makes the piece 0.5 mm long           | at least 1 mm long",
                "0              | /piece/stations/1/size_mm | | is 0, out of range                    | a number from 0.05 to 1000",
                "-3             | /piece/stations/1/size_mm | | is -3, out of range                   | a number from 0.05 to 1000",
                "\"8\"          | /piece/stations/1/size_mm | | is \"8\"                              | a number from 0.05 to 1000",
                "1e400          | /piece/stations/1/size_mm | | is a number beyond all bounds, out of range | from 0.05 to 1000",
                "-1e400         | /piece/stations/1/size_mm | | is a number beyond all bounds, out of range | from 0.05 to 1000",
                "-              | /piece/stations/1/size_mm | | is missing                            | give it",
                "[]             | /holding/ends_down        | | has 0 elements                        | an array of 1 to 2",
                "[\"A\",\"A\"]  | /holding/ends_down | /holding/ends_down/1 | is given more than once   | name each end once",
                "[\"C\"]        | /holding/ends_down | /holding/ends_down/0 | is \"C\"                  | one of \"A\", \"B\"",
                "-1             | /holding/dry_mm           | | is -1, out of range                   | from 0 to 5000",
                "160            | /holding/dry_mm           | | is 160                                | less than the piece's length, 160",
                "[]             | /bands                    | | has 0 elements                        | an array of 1 to 60",
                "7              | /bands/1                  | | is 7                                  | an object with the keys \"name\"",
                "-              | /bands/1/to_mm            | | is missing                            | give it",
                "42.2           | /bands/1/to_mm            | | is 42.2                               | it must be at least 42.5",
                "30             | /bands/1/to_mm            | | is 30                                 | it must be at least 42.5",
                "150            | /bands/2/to_mm            | | is 150                                | the piece's length, 160",
                "\"tip\"        | /bands/2/name             | | is \"tip\", the name of /bands/0 too  | a name of its own",
                "\"\"           | /bands/2/name             | | is \"\"                               | 1 to 80 characters",
                "0              | /bands/0/film_nm          | | is 0                                  | say \"bare\": true",
                "0.5            | /bands/0/film_nm          | | is 0.5, out of range                  | from 1 to 2000",
                "2000.5         | /bands/0/film_nm          | | is 2000.5, out of range               | from 1 to 2000",
                "true           | /bands/0/film_nm          | | is true                               | from 1 to 2000",
                "[1,2,3]        | /bands/0/film_nm          | | has 3 elements                        | an array of 2",
                "[0,50]         | /bands/0/film_nm | /bands/0/film_nm/0 | is 0                         | say \"bare\": true",
                "[50,\"x\"]     | /bands/0/film_nm | /bands/0/film_nm/1 | is \"x\"                     | from 1 to 2000",
                "1              | /bands/0/order            | | does not belong here                  | only a colour is wanted in an order",
                "21             | /bands/2/order            | | is 21, out of range                   | from 1 to 20",
                "1.5            | /bands/2/order            | | is 1.5                                | a whole number",
                "true           | /bands/0/bare | /bands/0  | says what it is to be by \"film_nm\", \"bare\" | exactly one of",
                "-              | /bands/0/film_nm | /bands/0 | does not say what it is to be          | exactly one of \"film_nm\"",
                "\"#12345\"     | /bands/2/colour           | | is \"#12345\"                         | \"#rrggbb\" in hexadecimal",
                "\"teal\"       | /bands/2/colour           | | is \"teal\"                           | {\"lab\": [L, a, b]}",
                "{}             | /bands/2/colour | /bands/2/colour/lab | is missing                   | give it",
                "{\"lab\":[1,2]}      | /bands/2/colour | /bands/2/colour/lab | has 2 elements         | an array of 3",
                "{\"lab\":[101,2,3]}  | /bands/2/colour | /bands/2/colour/lab/0 | is 101, out of range | from 0 to 100",
                "{\"lab\":[1,-201,3]} | /bands/2/colour | /bands/2/colour/lab/1 | is -201, out of range | from -200 to 200",
                "{\"lab\":[1,2,null]} | /bands/2/colour | /bands/2/colour/lab/2 | is null            | from -200 to 200",
                "{\"lch\":[1,2,3],\"lab\":[1,2,3]} | /bands/2/colour | /bands/2/colour/lch | is not a known key | the keys here are \"lab\"",
                "\"sharp\"      | /bands/0/edge             | | is \"sharp\"                          | one of \"crisp\", \"soft\"",
                "\"phosfate\"   | /bath                     | | is \"phosfate\", which is no preset   | did you mean \"phosphate\"?",
                "\"../b.json\"  | /bath                     | | is \"../b.json\", neither a preset nor a plain file name | the presets for titanium are \"phosphate\"",
                "\"/etc/passwd\"| /bath                     | | is \"/etc/passwd\", neither a preset nor a plain file name | beside the design",
                "\"C:\\\\b.json\"| /bath                    | | is \"C:\\b.json\", neither a preset nor a plain file name | beside the design",
                "\"..\"         | /bath                     | | is \"..\", neither a preset nor a plain file name | beside the design",
                "\"\"           | /bath                     | | is \"\", neither a preset nor a plain file name | beside the design",
                "7              | /bath                     | | is 7                                  | a text in double quotes",
                "0              | /supply/max_volts         | | is 0, out of range                    | from 1 to 1000",
                "0              | /supply/max_amps          | | is 0, out of range                    | from 0.001 to 1000",
                "0              | /supply/dial_volts        | | is 0, out of range                    | from 0.001 to 10",
                "0              | /supply/slew_volts_per_s  | | is 0, out of range                    | from 0.001 to 1000000",
                "-1             | /bench/immersion_min      | | is -1, out of range                   | from 0 to 1000000",
                "0.5            | /bench/hold_s             | | is 0.5, out of range                  | from 1 to 36000",
                "\"cheapest\"   | /bench/order              | | is \"cheapest\"                       | one of \"thicker-first\", \"least-minutes\"",
            })
    void oneFaultInTheHook(String value, String pointer, String faultPointer, String wrong, String right) {
        assertThat(faults(with(HOOK, pointer, value.equals("-") ? null : value)))
                .singleElement()
                .satisfies(fault -> {
                    assertThat(fault.at()).isEqualTo(faultPointer == null ? pointer : faultPointer);
                    assertThat(fault.wrong()).isEqualTo(wrong);
                    assertThat(fault.right()).contains(right);
                });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "-              | /piece/thickness_mm  | | is missing                             | give it",
                "0              | /piece/thickness_mm  | | is 0, out of range                     | from 0.05 to 1000",
                "false          | /bands/0/bare        | | is false                               | it must be true, or left out",
                "600            | /bands/1/volts       | | is 600, out of range                   | from 0.1 to 500",
                "\"bicarbonate\"| /bath                | | is \"bicarbonate\", which is no preset | the presets for niobium are \"phosphate\", \"sulfuric\"",
                "10             | /vessel/bore_mm | /vessel | is both round and rectangular          | either \"bore_mm\", or",
                "-              | /vessel/length_mm    | | is missing                             | give it",
                "0              | /vessel/width_mm     | | is 0, out of range                     | from 1 to 10000",
                "{}             | /vessel              | | has no size                            | either \"bore_mm\", or",
                "{\"bore_mm\": 20}  | /vessel          | | is too narrow: where the piece gets wet it is up to 20 mm across | take a larger vessel",
                "{\"width_mm\": 0.8, \"length_mm\": 50} | /vessel | /vessel/width_mm | is 0.8, out of range | from 1 to 10000",
                "\"slow\"       | /pull/fade           | | is \"slow\"                            | one of \"ramped\", \"fixed-volts\", \"stepped\"",
                "0.1            | /pull/step_dE00      | | is 0.1, out of range                   | from 0.2 to 50",
                "4              | /pull/slowest_mm_s   | | makes the slowest speed 4 and the fastest 4 | the slowest must be below the fastest",
                "0              | /pull/fastest_mm_s   | | is 0, out of range                     | from 0.001 to 1000",
            })
    void oneFaultInTheShutter(String value, String pointer, String faultPointer, String wrong, String right) {
        assertThat(faults(with(SHUTTER, pointer, value.equals("-") ? null : value)))
                .singleElement()
                .satisfies(fault -> {
                    assertThat(fault.at()).isEqualTo(faultPointer == null ? pointer : faultPointer);
                    assertThat(fault.wrong()).isEqualTo(wrong);
                    assertThat(fault.right()).contains(right);
                });
    }

    @Test
    void tubeMustBeWiderThanItsBore() {
        assertThat(faults(with(PIPE, "/piece/bore_mm", "6")))
                .containsExactly(new Fault(
                        "/piece/stations/0/size_mm",
                        "is 6, no larger than the bore",
                        "it must be larger than the bore of 6 mm"));
        assertThat(faults(with(PIPE, "/piece/bore_mm", null)))
                .containsExactly(new Fault("/piece/bore_mm", "is missing", "give it"));
    }

    @Test
    void dryLengthByDefaultMayBeTooMuchForAShortPiece() {
        String stub = with(with(PIPE, "/piece/stations/1/at_mm", "8"), "/bands/0/to_mm", "8");
        assertThat(faults(stub))
                .containsExactly(new Fault(
                        "/holding/dry_mm",
                        "is 10 by default",
                        "it must be less than the piece's length, 8, for anything to get wet"));
        assertThat(faults(with(stub, "/holding", "{\"dry_mm\": 3}"))).isEmpty();
    }

    @Test
    void vesselNeedOnlyTakeWhatGetsWet() {
        String tight = with(HOOK, "/vessel", "{\"bore_mm\": 7.8}");
        assertThat(faults(tight)).extracting(Fault::at).containsExactly("/vessel");
        assertThat(faults(with(tight, "/holding/ends_down", "[\"A\"]"))).isEmpty();
    }

    @Test
    void defaultNamesCountAsNames() {
        String clash = with(with(HOOK, "/bands/0/name", "\"band 3\""), "/bands/2/name", null);
        assertThat(faults(clash))
                .containsExactly(new Fault(
                        "/bands/2/name",
                        "is \"band 3\", the name of /bands/0 too",
                        "give every band a name of its own"));
    }

    @Test
    void dialCoarserThanTheSupplyIsAFault() {
        assertThat(faults(with(with(HOOK, "/supply/max_volts", "5"), "/supply/dial_volts", "6")))
                .extracting(Fault::at)
                .containsExactly("/supply/dial_volts");
    }

    @ParameterizedTest
    @ValueSource(strings = {"[]", "7", "\"design\"", "null", "true"})
    void whatIsNoObjectIsNoDesign(String json) {
        assertThat(faults(json)).singleElement().satisfies(fault -> {
            assertThat(fault.at()).isEmpty();
            assertThat(fault.right()).startsWith("it must be an object with the keys \"format\"");
        });
    }

    @Test
    void minusZeroIsAFilmOfNothingToo() {
        assertThat(faults(HOOK.replace("\"film_nm\": 150,", "\"film_nm\": -0.0,")))
                .extracting(Fault::at, Fault::wrong)
                .containsExactly(tuple("/bands/0/film_nm", "is 0"));
    }

    @Test
    void halfACharacterIsNoText() {
        assertThat(faults(HOOK.replace("Lantern hook", "a\\ud800b")))
                .extracting(Fault::at, Fault::wrong)
                .containsExactly(tuple("/title", "is \"a\\ud800b\""));
    }

    @Test
    void allFaultsAreReportedTogether() {
        String bad = """
                {
                  "format": "tideband-design", "version": 3, "metal": "tin", "metal": "niobium", "lihgt": "D65",
                  "piece": { "shape": "tube", "stations": [ { "at_mm": 5, "size_mm": "thin" }, { "at_mm": 4 }, 6 ] },
                  "holding": { "ends_down": ["A", "A", "B"], "dry_mm": null },
                  "bands": [
                    { "to_mm": 30, "film_nm": 0, "edge": "soft", "edge": "crisp" },
                    { "to_mm": 20, "volts": -1, "colour": "#12" },
                    { "name": "\\u001b[31m", "order": 2 }
                  ],
                  "vessel": { "bore_mm": 5, "depth_mm": 9 },
                  "supply": [], "bench": { "order": "any" }, "pull": { "fade": "ramp" }
                }
                """;
        assertThat(faults(bad).stream().map(f -> f.at() + " " + f.wrong()).collect(Collectors.toList()))
                .containsExactlyInAnyOrder(
                        "/metal is given more than once",
                        "/bands/0/edge is given more than once",
                        "/lihgt is not a known key",
                        "/title is missing",
                        "/version is 3",
                        "/metal is \"tin\"",
                        "/piece/bore_mm is missing",
                        "/piece/stations/0/at_mm is 5",
                        "/piece/stations/0/size_mm is \"thin\"",
                        "/piece/stations/1/at_mm is 4",
                        "/piece/stations/1/size_mm is missing",
                        "/piece/stations/2 is 6",
                        "/holding/ends_down has 3 elements",
                        "/holding/dry_mm is null",
                        "/bands/0/film_nm is 0",
                        "/bands/1/to_mm is 20",
                        "/bands/1/volts is -1, out of range",
                        "/bands/1/colour is \"#12\"",
                        "/bands/1 says what it is to be by \"volts\", \"colour\"",
                        "/bands/2/name is \"\\u001b[31m\"",
                        "/bands/2/to_mm is missing",
                        "/bands/2/order does not belong here",
                        "/bands/2 does not say what it is to be",
                        "/vessel/depth_mm is not a known key",
                        "/supply is an array",
                        "/bench/order is \"any\"",
                        "/pull/fade is \"ramp\"");
    }

    @Test
    void aVeryBadFileIsCutShort() {
        StringBuilder keys = new StringBuilder();
        for (int i = 0; i < 500; i++) {
            keys.append(", \"key").append(i).append("\": 0");
        }
        List<Fault> faults = faults(HOOK.replaceFirst("\\{", "{ \"x\": 0" + keys + ","));
        assertThat(faults).hasSize(Faults.MOST + 1);
        assertThat(faults.get(Faults.MOST))
                .isEqualTo(new Fault("", "401 more faults are not listed", "mend these first"));
    }

    @Test
    void messagesAreShortAndHarmless() {
        String key = "\\u001b[2J\\u202e" + "k".repeat(5000);
        List<Fault> faults = faults(HOOK.replaceFirst("\\{", "{ \"" + key.replace("\\", "\\\\") + "\": 0,"));
        assertThat(faults).singleElement().satisfies(fault -> {
            assertThat(fault.at()).startsWith("/\\u001b[2J\\u202ekkk").hasSizeLessThan(100);
            assertThat(fault.text()).startsWith(fault.at() + ": is not a known key; the keys here are");
        });
    }
}
