package tideband.sheet;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.text.Normalizer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/**
 * The typeface of the sheets (Liberation Sans, which ships with PDFBox): which characters it has, how wide they are, and
 * how text is cut and broken to a width.
 */
final class Typeface {
    /** Millimetres in a typographic point, 1/72 inch. */
    static final double MM_PER_PT = 25.4 / 72;

    /** Stands for what cannot be shown. */
    static final int REPLACEMENT = 0x25A1;

    private static final String FILE = "/org/apache/pdfbox/resources/ttf/LiberationSans-Regular.ttf";
    private static final String ELLIPSIS = "\u2026";
    static final String NO_BREAK = "\u00a0";

    /** The space between a number and its unit, where no line is broken. */
    private static final Pattern NUMBER_AND_UNIT =
            Pattern.compile("(?<=\\d) (?=(?:V|A|s|mm|nm|min|ohm|L|%)(?:[ ,.;:)]|$))");

    /** Bold is drawn as a regular stroked and this much widened; a true bold face of the family is about as wide. */
    static final double BOLD_WIDTH = 1.07;

    private Typeface() {}

    /** The font file; the caller closes it. */
    static InputStream open() {
        InputStream stream = Typeface.class.getResourceAsStream(FILE);
        if (stream == null) {
            throw new IllegalStateException("the PDFBox library lacks its font " + FILE);
        }
        return stream;
    }

    /**
     * Text that is only text: composed (NFC), line ends and tabs made spaces, and everything without a shape of its own
     * (control and direction-changing characters, lone surrogates, unassigned code points) replaced visibly.
     */
    static String clean(String text) {
        StringBuilder out = new StringBuilder();
        Normalizer.normalize(text, Normalizer.Form.NFC).codePoints().forEach(c -> out.appendCodePoint(shown(c)));
        return out.toString();
    }

    private static int shown(int codePoint) {
        if (codePoint == '\t' || codePoint == '\n' || codePoint == '\r' || codePoint == 0x2028 || codePoint == 0x2029) {
            return ' ';
        }
        return switch (Character.getType(codePoint)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.PRIVATE_USE,
                    Character.UNASSIGNED -> REPLACEMENT;
            default -> codePoint;
        };
    }

    /** Whether the typeface has a shape for the character. */
    static boolean has(int codePoint) {
        return codePoint < Advances.EM.length && Advances.EM[codePoint] >= 0;
    }

    /** Width of a line of text in mm; a character the typeface lacks counts as one em. */
    static double widthMm(String text, double sizeMm, boolean bold) {
        double em =
                text.codePoints().mapToDouble(c -> has(c) ? Advances.EM[c] : 1).sum();
        return em * sizeMm * (bold ? BOLD_WIDTH : 1);
    }

    /** The text, or as much of it as fits with an ellipsis. */
    static String fit(String text, double sizeMm, boolean bold, double widthMm) {
        String line = clean(text);
        if (widthMm(line, sizeMm, bold) <= widthMm) {
            return line;
        }
        int[] points = line.codePoints().toArray();
        int length = points.length;
        while (length > 0
                && widthMm(new String(points, 0, length).stripTrailing() + ELLIPSIS, sizeMm, bold) > widthMm) {
            length--;
        }
        return new String(points, 0, length).stripTrailing() + ELLIPSIS;
    }

    /**
     * Breaks text into lines no wider than {@code widthMm}, at spaces, or within a word that is wider alone, never
     * between a number and its unit.
     */
    static List<String> wrap(String text, double sizeMm, boolean bold, double widthMm) {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : tied(text).split(" +", -1)) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (widthMm(longer, sizeMm, bold) <= widthMm) {
                line = longer;
                continue;
            }
            if (!line.isEmpty()) {
                lines.add(line);
            }
            line = word;
            while (widthMm(line, sizeMm, bold) > widthMm && line.codePointCount(0, line.length()) > 1) {
                int cut = headThatFits(line, sizeMm, bold, widthMm);
                lines.add(line.substring(0, cut));
                line = line.substring(cut);
            }
        }
        lines.add(line);
        return lines.stream().map(l -> l.replace(NO_BREAK, " ")).toList();
    }

    /** Clean text in which a number and its unit are tied by a no-break space. */
    static String tied(String text) {
        return NUMBER_AND_UNIT.matcher(clean(text).strip()).replaceAll(NO_BREAK);
    }

    private static int headThatFits(String word, double sizeMm, boolean bold, double widthMm) {
        int cut = word.offsetByCodePoints(0, 1);
        while (cut < word.length()) {
            int next = word.offsetByCodePoints(cut, 1);
            if (widthMm(word.substring(0, next), sizeMm, bold) > widthMm) {
                break;
            }
            cut = next;
        }
        return cut;
    }

    /** Advance widths by code point, read once from the font file and never changed. */
    private static final class Advances {
        /** In em; below 0 where the typeface has no shape. */
        private static final double[] EM = read();

        private static double[] read() {
            try (InputStream stream = open();
                    TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(stream))) {
                CmapLookup cmap = font.getUnicodeCmapLookup();
                double[] em = new double[0x10000];
                Arrays.fill(em, -1);
                for (int c = ' '; c < em.length; c++) {
                    int glyph = cmap.getGlyphId(c);
                    if (glyph != 0) {
                        em[c] = (double) font.getAdvanceWidth(glyph) / font.getUnitsPerEm();
                    }
                }
                return em;
            } catch (IOException e) {
                throw new UncheckedIOException("the typeface cannot be read", e);
            }
        }
    }
}
