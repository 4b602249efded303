package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CancellationException;
import javax.print.DocFlavor;
import javax.print.StreamPrintServiceFactory;
import org.junit.jupiter.api.Test;

/** Prints into PostScript, which every Java can, so that no printer is needed. */
class InstalledPrinterTest {
    private static final byte[] PDF = StepSheetPdf.bytes(BenchPlans.lanternHook(), BenchPlans.COLOURS, Paper.A4);

    private final ByteArrayOutputStream postScript = new ByteArrayOutputStream();
    private final SheetPrinter printer = new InstalledPrinter(StreamPrintServiceFactory
            .lookupStreamPrintServiceFactories(DocFlavor.SERVICE_FORMATTED.PAGEABLE, "application/postscript")[0]
            .getPrintService(postScript));

    @Test
    void printsEveryPage() throws Exception {
        List<String> stages = new ArrayList<>();
        printer.print(PDF, Paper.A4, stages::add, () -> false);
        int pages = new PagePictures(PDF).count();
        String printed = postScript.toString(StandardCharsets.ISO_8859_1);
        assertThat(printed).startsWith("%!PS-Adobe");
        assertThat(printed.split("%%Page: ", -1)).hasSize(pages + 1);
        assertThat(stages).contains("printing page 1 of " + pages, "printing page " + pages + " of " + pages);
    }

    @Test
    void stopsWhenItIsCalledOff() {
        List<String> stages = new ArrayList<>();
        assertThatExceptionOfType(CancellationException.class)
                .isThrownBy(() -> printer.print(
                        PDF,
                        Paper.A4,
                        stages::add,
                        () -> stages.contains("printing page 2 of " + new PagePictures(PDF).count())));
        assertThat(stages).noneMatch(s -> s.startsWith("printing page 4"));
    }

    @Test
    void lookingForPrintersWorksWithoutAScreen() throws Exception {
        assertThat(InstalledPrinter.found())
                .isNotNull()
                .allSatisfy(p -> assertThat(p.name()).isNotBlank());
    }

    /** Reference: Unicode CLDR, paperSize, by way of UTS #35 part 6. */
    @Test
    void paperIsThatOfThePlace() {
        assertThat(Paper.usualIn(Locale.US)).isEqualTo(Paper.LETTER);
        assertThat(Paper.usualIn(Locale.CANADA_FRENCH)).isEqualTo(Paper.LETTER);
        assertThat(Paper.usualIn(Locale.UK)).isEqualTo(Paper.A4);
        assertThat(Paper.usualIn(Locale.ROOT)).isEqualTo(Paper.A4);
    }
}
