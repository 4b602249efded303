package tideband.sheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.text.Bidi;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.pdmodel.graphics.state.RenderingMode;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;
import org.apache.pdfbox.util.Matrix;

/**
 * Writes drawings as the pages of a PDF: vectors and selectable text in one embedded subset font, no dates and a fixed
 * document id, so that the same drawings give the same bytes.
 */
final class PdfWriter implements Mark.Writer {
    private static final double PT_PER_MM = 72 / 25.4;
    private static final long DOCUMENT_ID = 1L;

    /** Stroke that makes the regular face a bold one, as a share of the type size. */
    private static final double BOLD_STROKE = 0.035;

    private static final String BRACKETS = "()[]{}<>";

    private final PDPageContentStream content;
    private final PDFont font;

    private PdfWriter(PDPageContentStream content, PDFont font) {
        this.content = content;
        this.font = font;
    }

    static byte[] bytes(String title, List<Drawing> pages) {
        try (PDDocument document = new PDDocument();
                InputStream typeface = Typeface.open()) {
            document.setDocumentId(DOCUMENT_ID);
            document.getDocumentInformation().setTitle(Typeface.clean(title));
            document.getDocumentCatalog().setLanguage("en");
            PDViewerPreferences viewer = new PDViewerPreferences(new COSDictionary());
            viewer.setDisplayDocTitle(true);
            // A gauge is only right at full size, so viewers are asked not to scale when printing.
            viewer.setPrintScaling(PDViewerPreferences.PRINT_SCALING.None);
            document.getDocumentCatalog().setViewerPreferences(viewer);
            PDFont font = PDType0Font.load(document, typeface, true);
            for (Drawing page : pages) {
                write(document, font, page);
            }
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            document.save(out);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
    }

    private static void write(PDDocument document, PDFont font, Drawing drawing) throws IOException {
        float heightPt = (float) (drawing.heightMm() * PT_PER_MM);
        PDPage page = new PDPage(new PDRectangle((float) (drawing.widthMm() * PT_PER_MM), heightPt));
        document.addPage(page);
        try (PDPageContentStream content = new PDPageContentStream(document, page)) {
            float k = (float) PT_PER_MM;
            content.transform(new Matrix(k, 0, 0, -k, 0, heightPt));
            PdfWriter writer = new PdfWriter(content, font);
            drawing.marks().forEach(mark -> mark.to(writer));
        }
    }

    @Override
    public void box(Mark.Box box) {
        draw(() -> {
            content.addRect((float) box.xMm(), (float) box.yMm(), (float) box.widthMm(), (float) box.heightMm());
            paint(box.ink());
        });
    }

    @Override
    public void shape(Mark.Shape shape) {
        draw(() -> {
            Point first = shape.corners().get(0);
            content.moveTo((float) first.xMm(), (float) first.yMm());
            for (Point p : shape.corners().subList(1, shape.corners().size())) {
                content.lineTo((float) p.xMm(), (float) p.yMm());
            }
            content.closePath();
            paint(shape.ink());
        });
    }

    @Override
    public void line(Mark.Line line) {
        draw(() -> {
            stroke(line.hex(), line.widthMm());
            float dash = (float) line.dashMm();
            content.setLineDashPattern(dash > 0 ? new float[] {dash} : new float[0], 0);
            content.moveTo((float) line.from().xMm(), (float) line.from().yMm());
            content.lineTo((float) line.to().xMm(), (float) line.to().yMm());
            content.stroke();
            content.setLineDashPattern(new float[0], 0);
        });
    }

    @Override
    public void words(Mark.Words words) {
        draw(() -> {
            content.beginText();
            content.setFont(font, (float) words.sizeMm());
            int rgb = rgb(words.hex());
            content.setNonStrokingColor(channel(rgb, 16), channel(rgb, 8), channel(rgb, 0));
            if (words.bold()) {
                stroke(words.hex(), words.sizeMm() * BOLD_STROKE);
                content.setRenderingMode(RenderingMode.FILL_STROKE);
            } else {
                content.setRenderingMode(RenderingMode.FILL);
            }
            content.setHorizontalScaling(words.bold() ? 100 * (float) Typeface.BOLD_WIDTH : 100);
            content.setTextMatrix(new Matrix(
                    1, 0, 0, -1, (float) words.leftMm(), (float) words.at().yMm()));
            content.showText(inTypeface(visual(words.text())));
            content.endText();
        });
    }

    /** Replaces what the typeface lacks, so that it shows as missing and never stops the sheet. */
    private static String inTypeface(String text) {
        StringBuilder out = new StringBuilder();
        text.codePoints().forEach(c -> out.appendCodePoint(Typeface.has(c) ? c : Typeface.REPLACEMENT));
        return out.toString();
    }

    /** The text as it stands from left to right: runs of right-to-left scripts are turned round (Unicode UAX 9). */
    private static String visual(String text) {
        char[] chars = text.toCharArray();
        if (!Bidi.requiresBidi(chars, 0, chars.length)) {
            return text;
        }
        Bidi bidi = new Bidi(text, Bidi.DIRECTION_DEFAULT_LEFT_TO_RIGHT);
        int count = bidi.getRunCount();
        byte[] levels = new byte[count];
        Object[] runs = new Object[count];
        for (int i = 0; i < count; i++) {
            String run = text.substring(bidi.getRunStart(i), bidi.getRunLimit(i));
            levels[i] = (byte) bidi.getRunLevel(i);
            runs[i] = levels[i] % 2 == 0 ? run : turned(run);
        }
        Bidi.reorderVisually(levels, 0, runs, 0, count);
        List<String> ordered = new ArrayList<>();
        for (Object run : runs) {
            ordered.add((String) run);
        }
        return String.join("", ordered);
    }

    private static String turned(String run) {
        StringBuilder out = new StringBuilder();
        for (char c : new StringBuilder(run).reverse().toString().toCharArray()) {
            int bracket = BRACKETS.indexOf(c);
            // Opening and closing brackets stand side by side, so the other one differs in the last bit.
            out.append(bracket < 0 ? c : BRACKETS.charAt(bracket ^ 1));
        }
        return out.toString();
    }

    private void paint(Ink ink) throws IOException {
        if (!ink.fillHex().isEmpty()) {
            int rgb = rgb(ink.fillHex());
            content.setNonStrokingColor(channel(rgb, 16), channel(rgb, 8), channel(rgb, 0));
        }
        if (ink.lineHex().isEmpty()) {
            content.fill();
            return;
        }
        stroke(ink.lineHex(), ink.lineMm());
        if (ink.fillHex().isEmpty()) {
            content.stroke();
        } else {
            content.fillAndStroke();
        }
    }

    private void stroke(String hex, double widthMm) throws IOException {
        int rgb = rgb(hex);
        content.setStrokingColor(channel(rgb, 16), channel(rgb, 8), channel(rgb, 0));
        content.setLineWidth((float) widthMm);
    }

    private static int rgb(String hex) {
        return Integer.parseInt(hex.substring(1), 16);
    }

    private static float channel(int rgb, int shift) {
        return (rgb >> shift & 0xff) / 255f;
    }

    private static void draw(Drawn drawn) {
        try {
            drawn.run();
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
    }

    /** A few operators of a page. */
    private interface Drawn {
        void run() throws IOException;
    }
}
