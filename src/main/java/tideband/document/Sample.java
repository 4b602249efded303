package tideband.document;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/** The designs that come with the program, from a lantern maker's workshop. */
public enum Sample {
    /** A rainbow pull. */
    LANTERN_HOOK("lantern-hook", "A rainbow pull: one dip, one long fade, no mask"),
    /** Two tones. */
    WICK_KEY("wick-key", "Two tones at a crisp edge; one is asked for as a colour and matched"),
    /** A zigzag. */
    SNUFFER_HANDLE("snuffer-handle", "Five bands up and down: three dips, masks before the first only"),
    /** A valley. */
    CARRY_BAIL("carry-bail", "A valley that needs both ends down, with fades at fixed volts"),
    /** Niobium. */
    WICK_PIN("wick-pin", "Niobium under D50, a fade in dial steps, a narrow vessel whose level falls"),
    /** A flat plate. */
    VENT_PLATE("vent-plate", "A flat, blasted plate with three tones and a fade"),
    /** A bare collar. */
    CHIMNEY_POST("chimney-post", "A bare collar between colours"),
    /** Tantalum. */
    BURNER_TUBE("burner-tube", "A tantalum tube in a bath with a file of its own");

    private final String file;
    private final String shows;

    Sample(String file, String shows) {
        this.file = file;
        this.shows = shows;
    }

    private static Optional<byte[]> bytes(String name) {
        try (InputStream in = Sample.class.getResourceAsStream("samples/" + name)) {
            return in == null ? Optional.empty() : Optional.of(in.readAllBytes());
        } catch (IOException e) {
            throw new UncheckedIOException("what comes with the program can be read", e);
        }
    }

    /**
     * Its name as a file.
     *
     * @return such as {@code lantern-hook}
     */
    public String file() {
        return file;
    }

    /**
     * What it shows.
     *
     * @return a line for people
     */
    public String shows() {
        return shows;
    }

    /**
     * Its title.
     *
     * @return the design's title
     */
    public String title() {
        return design().title();
    }

    /**
     * The design.
     *
     * @return the design as it comes with the program
     */
    public Design design() {
        Reading<Design> reading = DesignFile.read(bytes(file + ".json").orElseThrow(), Sample::bytes);
        if (reading instanceof Reading.Read<Design> read) {
            return read.value();
        }
        throw new IllegalStateException("a sample that comes with the program is sound, but " + reading);
    }
}
