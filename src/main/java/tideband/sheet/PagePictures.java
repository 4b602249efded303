package tideband.sheet;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import javax.imageio.ImageIO;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.ImageType;
import org.apache.pdfbox.rendering.PDFRenderer;

/** The pages of a step sheet as pictures, to be looked at before they are printed. */
public final class PagePictures {
    private final byte[] pdf;
    private final int count;

    /**
     * The pages of a PDF file.
     *
     * @param pdf the file's bytes, as {@link StepSheetPdf} gives them
     */
    public PagePictures(byte[] pdf) {
        this.pdf = pdf.clone();
        try (PDDocument document = Loader.loadPDF(this.pdf)) {
            count = document.getNumberOfPages();
        } catch (IOException e) {
            throw new UncheckedIOException("the step sheet just made cannot be read", e);
        }
    }

    /**
     * How many pages there are.
     *
     * @return at least 1
     */
    public int count() {
        return count;
    }

    /**
     * One page.
     *
     * @param page which page, 0-based
     * @param dotsPerInch how fine
     * @return a PNG file's bytes
     */
    public byte[] png(int page, double dotsPerInch) {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            BufferedImage picture =
                    new PDFRenderer(document).renderImageWithDPI(page, (float) dotsPerInch, ImageType.RGB);
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            ImageIO.write(picture, "png", out);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("a page of the step sheet just made cannot be drawn", e);
        }
    }
}
