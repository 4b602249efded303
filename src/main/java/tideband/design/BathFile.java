package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tideband.design.JsonWriter.Inline;
import tideband.oxide.Bath;
import tideband.oxide.Metal;

/**
 * A bath's file: JSON in UTF-8 with {@code "format": "tideband-bath"}, as a fit to coupons leaves it. Its keys and limits
 * are written down in the JSON Schema {@code tideband-bath.schema.json} beside this class.
 */
public final class BathFile {

    static final String FORMAT = "tideband-bath";

    private BathFile() {}

    /**
     * Reads a bath.
     *
     * @param file the file
     * @return the bath or every fault
     */
    public static Reading<Bath> read(Path file) {
        Faults faults = new Faults();
        Optional<byte[]> bytes = JsonText.bytes(file, faults);
        return bytes.isPresent() ? read(bytes.get()) : new Reading.Faulty<>(faults.list());
    }

    /**
     * Reads a bath from memory.
     *
     * @param bytes the file's content
     * @return the bath or every fault
     */
    public static Reading<Bath> read(byte[] bytes) {
        Faults faults = new Faults();
        Optional<JsonNode> root = JsonText.parse(bytes, faults);
        return root.isPresent() ? bath(root.get(), faults) : new Reading.Faulty<>(faults.list());
    }

    /**
     * Whether a file can hold a bath: its name and its source stand on one line each and are not too long.
     *
     * @param bath the bath
     * @return whether it can be written and read again
     */
    public static boolean canHold(Bath bath) {
        return Members.LINE_OF_TEXT.matcher(bath.name()).matches()
                && Members.PARAGRAPH.matcher(bath.source()).matches();
    }

    /**
     * Writes a bath.
     *
     * @param bath the bath
     * @return the content of its file: UTF-8, always the same for the same bath; read again, it gives an equal one if
     *     {@link #canHold}
     */
    public static byte[] bytes(Bath bath) {
        return new JsonWriter()
                .line(new Inline()
                        .text("format", FORMAT)
                        .number("version", Members.VERSION)
                        .text("name", bath.name()))
                .line(new Inline().text("metal", bath.metal().key()))
                .line(new Inline()
                        .number("nm_per_volt", bath.nmPerVolt())
                        .number("field_slope", bath.fieldSlope())
                        .number("native_nm", bath.nativeNm())
                        .number("efficiency", bath.efficiency())
                        .number("resistance_ohm", bath.resistanceOhm()))
                .line(new Inline()
                        .number("ceiling_volts", bath.ceilingVolts())
                        .number("index_scale", bath.indexScale()))
                .line(new Inline().text("source", bath.source()))
                .bytes();
    }

    private static Reading<Bath> bath(JsonNode root, Faults faults) {
        if (Members.isOther(
                root,
                DesignReader.FORMAT,
                faults,
                "this is a design, not a bath",
                "take a bath file, one that begins with \"format\": \"tideband-bath\"")) {
            return new Reading.Faulty<>(faults.list());
        }
        Optional<Members> found = Members.of(
                root,
                "",
                faults,
                List.of(
                        "format",
                        "version",
                        "name",
                        "metal",
                        "nm_per_volt",
                        "field_slope",
                        "native_nm",
                        "efficiency",
                        "resistance_ohm",
                        "ceiling_volts",
                        "index_scale",
                        "source"));
        if (found.isEmpty()) {
            return new Reading.Faulty<>(faults.list());
        }
        Members bath = found.get();
        bath.require("format", "version", "name", "metal", "nm_per_volt", "field_slope");
        bath.require("native_nm", "efficiency", "resistance_ohm", "ceiling_volts");
        bath.checkFormat(FORMAT);
        Optional<String> name = bath.line("name");
        Optional<Metal> metal = bath.word("metal", List.of(Metal.values()), Metal::key);
        OptionalDouble nmPerVolt = bath.number("nm_per_volt", Limits.BATH_NM_PER_VOLT);
        OptionalDouble fieldSlope = bath.number("field_slope", Limits.BATH_FIELD_SLOPE);
        OptionalDouble nativeNm = bath.number("native_nm", Limits.BATH_NATIVE_NM);
        OptionalDouble efficiency = bath.number("efficiency", Limits.BATH_EFFICIENCY);
        OptionalDouble resistanceOhm = bath.number("resistance_ohm", Limits.BATH_RESISTANCE_OHM);
        OptionalDouble ceilingVolts = bath.number("ceiling_volts", Limits.BATH_CEILING_VOLTS);
        OptionalDouble indexScale = bath.number("index_scale", Limits.BATH_INDEX_SCALE);
        Optional<String> source = bath.paragraph("source");
        return faults.orElse(() -> new Bath(
                name.orElseThrow(),
                metal.orElseThrow(),
                nmPerVolt.getAsDouble(),
                fieldSlope.getAsDouble(),
                nativeNm.getAsDouble(),
                efficiency.getAsDouble(),
                resistanceOhm.getAsDouble(),
                ceilingVolts.getAsDouble(),
                indexScale.orElse(1),
                source.orElse("not stated")));
    }
}
