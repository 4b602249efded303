package tideband.document;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What the user chose for all drawings.
 *
 * @param inches whether lengths are shown in inches rather than millimetres
 * @param textPercent size of text in per cent, 100 to 200
 * @param dark whether the window is dark
 * @param muted whether sounds are off
 * @param widthPx width of the window in pixels, 600 to 10000
 * @param heightPx its height
 */
public record Preferences(boolean inches, int textPercent, boolean dark, boolean muted, int widthPx, int heightPx) {

    /** What holds until something is chosen. */
    public static final Preferences USUAL = new Preferences(false, 100, false, false, 1280, 800);

    private static final int SMALLEST_TEXT = 100;
    private static final int LARGEST_TEXT = 200;
    private static final int SMALLEST_PX = 600;
    private static final int LARGEST_PX = 10_000;

    /** Brings sizes within their bounds. */
    public Preferences {
        textPercent = Math.min(Math.max(textPercent, SMALLEST_TEXT), LARGEST_TEXT);
        widthPx = Math.min(Math.max(widthPx, SMALLEST_PX), LARGEST_PX);
        heightPx = Math.min(Math.max(heightPx, SMALLEST_PX), LARGEST_PX);
    }

    /**
     * Preferences as read.
     *
     * @param preferences the preferences; the usual where the file is silent or damaged
     * @param notes what was damaged, for the user; empty if nothing was
     */
    public record Loaded(Preferences preferences, List<String> notes) {

        // Copies the notes, so that the value cannot change.
        public Loaded {
            notes = List.copyOf(notes);
        }
    }

    /**
     * Reads preferences.
     *
     * @param file their file; it need not be there
     * @return the preferences, with notes on what was damaged
     */
    public static Loaded read(Path file) {
        if (!Files.exists(file)) {
            return new Loaded(USUAL, List.of());
        }
        try {
            Map<String, String> values = KeyValues.parse(Files.readAllBytes(file));
            List<String> notes = new ArrayList<>();
            Words words = new Words(values, file, notes);
            boolean inches = words.word("unit", "in", "mm", USUAL.inches);
            int textPercent = words.number("text-percent", USUAL.textPercent, SMALLEST_TEXT, LARGEST_TEXT);
            boolean dark = words.word("dark", "yes", "no", USUAL.dark);
            boolean muted = words.word("muted", "yes", "no", USUAL.muted);
            int widthPx = words.number("width-px", USUAL.widthPx, SMALLEST_PX, LARGEST_PX);
            int heightPx = words.number("height-px", USUAL.heightPx, SMALLEST_PX, LARGEST_PX);
            return new Loaded(new Preferences(inches, textPercent, dark, muted, widthPx, heightPx), notes);
        } catch (IOException e) {
            return new Loaded(
                    USUAL,
                    List.of("The preferences in " + file + " cannot be read (" + Reasons.of(e)
                            + "), so the usual ones hold. They are written anew when you change one."));
        }
    }

    // Values of a file, with notes on those that are none.
    private record Words(Map<String, String> values, Path file, List<String> notes) {

        boolean word(String key, String yes, String no, boolean usual) {
            String value = values.getOrDefault(key, usual ? yes : no).strip();
            if (!value.equals(yes) && !value.equals(no)) {
                note(key, value, "\"" + yes + "\" or \"" + no + "\"", usual ? yes : no);
                return usual;
            }
            return value.equals(yes);
        }

        int number(String key, int usual, int low, int high) {
            String value = values.getOrDefault(key, Integer.toString(usual)).strip();
            int number = value.matches("\\d{1,5}") ? Integer.parseInt(value) : -1;
            if (number < low || number > high) {
                note(key, value, "a number from " + low + " to " + high, Integer.toString(usual));
                return usual;
            }
            return number;
        }

        private void note(String key, String value, String right, String usual) {
            String shown = value.length() > 40 ? value.substring(0, 40) + "…" : value;
            notes.add("In the preferences (" + file + ") \"" + key + "\" is \"" + shown + "\"; it must be " + right
                    + ". " + usual + " is used.");
        }
    }

    /**
     * Writes the preferences.
     *
     * @param file their file
     * @throws IOException if it cannot be written; the file is then as it was
     */
    public void write(Path file) throws IOException {
        Map<String, String> values = new LinkedHashMap<>();
        values.put("unit", inches ? "in" : "mm");
        values.put("text-percent", Integer.toString(textPercent));
        values.put("dark", dark ? "yes" : "no");
        values.put("muted", muted ? "yes" : "no");
        values.put("width-px", Integer.toString(widthPx));
        values.put("height-px", Integer.toString(heightPx));
        Files.createDirectories(file.toAbsolutePath().getParent());
        WholeFile.write(file, KeyValues.bytes(values));
    }
}
