package tideband.sheet;

import java.awt.print.PageFormat;
import java.awt.print.Pageable;
import java.awt.print.Printable;
import java.awt.print.PrinterAbortException;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javax.print.DocFlavor;
import javax.print.DocPrintJob;
import javax.print.PrintException;
import javax.print.PrintService;
import javax.print.PrintServiceLookup;
import javax.print.SimpleDoc;
import javax.print.attribute.HashPrintRequestAttributeSet;
import javax.print.attribute.PrintRequestAttributeSet;
import javax.print.attribute.standard.JobName;
import javax.print.attribute.standard.Media;
import javax.print.attribute.standard.MediaSizeName;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.printing.Orientation;
import org.apache.pdfbox.printing.PDFPageable;

/** A printer the computer knows. No window of the print system is ever opened, so that it works without a screen. */
public final class InstalledPrinter implements SheetPrinter {
    private static final DocFlavor PAGES = DocFlavor.SERVICE_FORMATTED.PAGEABLE;

    private final PrintService service;

    InstalledPrinter(PrintService service) {
        this.service = service;
    }

    /**
     * Looks for printers, which may take some seconds.
     *
     * @return those that can print sheets, the usual one first and the others by name
     * @throws IOException if this computer cannot be asked for its printers
     */
    public static List<SheetPrinter> found() throws IOException {
        try {
            List<SheetPrinter> printers = new ArrayList<>();
            PrintService usual = PrintServiceLookup.lookupDefaultPrintService();
            if (usual != null && usual.isDocFlavorSupported(PAGES)) {
                printers.add(new InstalledPrinter(usual));
            }
            List.of(PrintServiceLookup.lookupPrintServices(PAGES, null)).stream()
                    .filter(service -> !service.equals(usual))
                    .sorted(Comparator.comparing(PrintService::getName))
                    .forEach(service -> printers.add(new InstalledPrinter(service)));
            return printers;
        } catch (RuntimeException | LinkageError | InternalError e) {
            // A Java without its print libraries fails with errors of several kinds, not one documented exception.
            throw new IOException("this Java cannot ask for printers (" + e + ")", e);
        }
    }

    @Override
    public String name() {
        return service.getName();
    }

    @Override
    public Paper paper(Paper otherwise) {
        Object media = service.getDefaultAttributeValue(Media.class);
        if (MediaSizeName.ISO_A4.equals(media)) {
            return Paper.A4;
        }
        return MediaSizeName.NA_LETTER.equals(media) ? Paper.LETTER : otherwise;
    }

    @Override
    public void print(byte[] pdf, Paper paper, Consumer<String> progress, BooleanSupplier cancelled)
            throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            PrintRequestAttributeSet wishes = new HashPrintRequestAttributeSet();
            wishes.add(new JobName(document.getDocumentInformation().getTitle(), null));
            wishes.add(paper == Paper.A4 ? MediaSizeName.ISO_A4 : MediaSizeName.NA_LETTER);
            DocPrintJob job = service.createPrintJob();
            // At full size: gauges are laid on the piece.
            Pageable pages = new PDFPageable(document, Orientation.PORTRAIT, false, 0, false);
            Pageable watched = new Watched(pages, progress, cancelled);
            job.print(new SimpleDoc(watched, PAGES, null), wishes);
        } catch (PrintException | RuntimeException | LinkageError | InternalError e) {
            if (cancelled.getAsBoolean()) {
                CancellationException givenUp = new CancellationException("given up while printing");
                givenUp.initCause(e);
                throw givenUp;
            }
            throw new IOException(e.getMessage() == null ? e.toString() : e.getMessage(), e);
        }
    }

    // Pages that tell when they are drawn, and refuse to be once printing is given up.
    private record Watched(Pageable pages, Consumer<String> progress, BooleanSupplier cancelled) implements Pageable {
        @Override
        public int getNumberOfPages() {
            return pages.getNumberOfPages();
        }

        @Override
        public PageFormat getPageFormat(int page) {
            return pages.getPageFormat(page);
        }

        @Override
        public Printable getPrintable(int page) {
            Printable printable = pages.getPrintable(page);
            return (graphics, format, index) -> {
                if (cancelled.getAsBoolean()) {
                    throw new PrinterAbortException("given up");
                }
                progress.accept("printing page " + (index + 1) + " of " + getNumberOfPages());
                return printable.print(graphics, format, index);
            };
        }
    }
}
