package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;

class StepSheetPdfTest {
    static List<BenchPlan> plans() {
        return BenchPlans.all();
    }

    /** Property, computed from the marks. */
    @ParameterizedTest
    @MethodSource("plans")
    void noTextLiesOnAnotherOrOutside(BenchPlan plan) {
        for (Paper paper : Paper.values()) {
            for (Drawing page : StepSheetPdf.pages(plan, BenchPlans.COLOURS, paper)) {
                assertThat(Layout.outside(page)).isEmpty();
                assertThat(Layout.overlaps(page)).isEmpty();
            }
        }
    }

    /** Property: nothing a person works from is smaller than 11 points; margins and fine scales may be. */
    @Test
    void workingTextIsBig() {
        for (Drawing page : StepSheetPdf.pages(BenchPlans.twelveBands(), BenchPlans.COLOURS, Paper.A4)) {
            assertThat(Layout.words(page).stream()
                            .filter(w -> w.at().yMm() > 20 && w.at().yMm() < 280)
                            .filter(w -> w.sizeMm() < Flow.mm(10.5))
                            .map(Mark.Words::text))
                    .allMatch(t -> t.matches("\\d*|mm|join"));
        }
    }

    /** Reference: ISO 216 (A4 is 210 mm by 297 mm) and 8.5 by 11 inches at 72 points an inch. */
    @Test
    void pagesHaveThePapersSize() throws Exception {
        for (PDPage page : document(BenchPlans.lanternHook(), Paper.A4).getPages()) {
            assertThat((double) page.getMediaBox().getWidth()).isCloseTo(210 * 72 / 25.4, within(0.001));
            assertThat((double) page.getMediaBox().getHeight()).isCloseTo(297 * 72 / 25.4, within(0.001));
        }
        for (PDPage page : document(BenchPlans.lanternHook(), Paper.LETTER).getPages()) {
            assertThat((double) page.getMediaBox().getWidth()).isCloseTo(612, within(0.001));
            assertThat((double) page.getMediaBox().getHeight()).isCloseTo(792, within(0.001));
        }
    }

    /** Property: what the bench needs can be selected and searched, and every caution is there. */
    @Test
    void textIsSelectable() throws Exception {
        BenchPlan plan = BenchPlans.lanternHook();
        String text = flat(new PDFTextStripper().getText(document(plan, Paper.A4)));
        assertThat(text)
                .contains("Lantern hook", "Proven", "16.5 min", "1 \u00d7 turn 1.5")
                .contains("Immersion 2 of 2: end B down", "Mask bands 1 tip to 2 dusk", "Turn the piece end for end")
                .contains("Bands 1 and 2 are masked so that their holder stays clean", "clean gloves only")
                .contains("Coupon first", "film never shrinks", "Signed off", GaugePages.CHECK_WORDS)
                .contains("violet (2)", "Hold 30 s", "Strip bands 1 tip to 2 dusk");
        for (Caution caution : plan.cautions()) {
            assertThat(text).contains(flat(caution.heading()), flat(caution.text()));
        }
    }

    /** Property: a long pull's table says on every page what its columns are, and pages are counted. */
    @Test
    void longTablesRepeatTheirHeadings() throws Exception {
        PDDocument document = document(BenchPlans.twelveBands(), Paper.LETTER);
        int tablePages = 0;
        for (int i = 1; i <= document.getNumberOfPages(); i++) {
            PDFTextStripper stripper = new PDFTextStripper();
            stripper.setStartPage(i);
            stripper.setEndPage(i);
            String text = flat(stripper.getText(document));
            assertThat(text).contains("page " + i + " of " + document.getNumberOfPages(), "Lantern pole with a title");
            if (text.contains("Fade 2.5 s")) {
                tablePages++;
                assertThat(text).contains("clock min:s", "depth mm");
            }
        }
        assertThat(tablePages).isGreaterThanOrEqualTo(3);
    }

    /** Property: one font, embedded, with a map to Unicode. */
    @Test
    void fontsAreEmbedded() throws Exception {
        for (PDPage page : document(BenchPlans.twoTone(), Paper.A4).getPages()) {
            for (COSName name : page.getResources().getFontNames()) {
                assertThat(page.getResources().getFont(name).isEmbedded()).isTrue();
                assertThat(page.getResources().getFont(name).getCOSObject().containsKey(COSName.TO_UNICODE))
                        .isTrue();
            }
        }
    }

    /** Property: the same plan gives the same bytes, on another day's locale and time zone too. */
    @Test
    void sameBytesEverywhere() {
        BenchPlan plan = BenchPlans.twelveBands();
        byte[] pdf = StepSheetPdf.bytes(plan, BenchPlans.COLOURS, Paper.A4);
        byte[] svg = PreviewSvg.bytes(plan, BenchPlans.COLOURS);
        byte[] csv = TimingCsv.bytes(plan, BenchPlans.COLOURS);
        byte[] json = PlanJson.bytes(plan);
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            for (String tag : List.of("de-DE", "tr-TR", "ar-EG-u-nu-arab")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Kiritimati"));
                assertThat(StepSheetPdf.bytes(plan, BenchPlans.COLOURS, Paper.A4))
                        .isEqualTo(pdf);
                assertThat(PreviewSvg.bytes(plan, BenchPlans.COLOURS)).isEqualTo(svg);
                assertThat(TimingCsv.bytes(plan, BenchPlans.COLOURS)).isEqualTo(csv);
                assertThat(PlanJson.bytes(plan)).isEqualTo(json);
            }
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    /** Reference: at 254 dots an inch (25.4 mm) a millimetre is 10 pixels, so the check ruler is 1000 long. */
    @Test
    void checkRulerIsExactlyAsLongAsItSays() throws Exception {
        for (Paper paper : Paper.values()) {
            PDDocument document = document(BenchPlans.flatPlate(), paper);
            BufferedImage page = new PDFRenderer(document).renderImageWithDPI(document.getNumberOfPages() - 1, 254);
            int longest = 0;
            for (int y = page.getHeight() - 350; y < page.getHeight() - 150; y++) {
                int run = 0;
                for (int x = 0; x < page.getWidth(); x++) {
                    run = (page.getRGB(x, y) & 0xff) < 128 ? run + 1 : 0;
                    longest = Math.max(longest, run);
                }
            }
            // The end ticks are 0.3 mm wide, half of it outside.
            assertThat(longest).isBetween(998, 1005);
        }
    }

    /** Property: any title is printed, what the font lacks as a sign of its own. */
    @Test
    void anyTitleIsPrinted() throws Exception {
        BenchPlan plan = BenchPlans.lanternHook(
                "x \ud83d\udd25 \u706f\u7c60 \u0000\u0007 \\) Tj ET <</JS (x)>> \u202e \ud83d", "phosphate");
        PDDocument document = document(plan, Paper.A4);
        assertThat(flat(new PDFTextStripper().getText(document)))
                .contains("x \u25a1 \u25a1\u25a1 \u25a1\u25a1 \\) Tj ET <</JS (x)>> \u25a1 \u25a1");
        BenchPlan hebrew = BenchPlans.lanternHook("\u05e9\u05dc\u05d5\u05dd (\u05d0)", "phosphate");
        assertThat(flat(new PDFTextStripper().getText(document(hebrew, Paper.A4))))
                .contains("\u05e9\u05dc\u05d5\u05dd (\u05d0)");
        assertThat(document.getDocumentCatalog().getOpenAction()).isNull();
        assertThat(document.getDocumentCatalog().getNames()).isNull();
    }

    /** Property: a piece that stays bare all over has no immersion, and still gets its sheet. */
    @Test
    void planWithoutImmersionsIsPrinted() throws Exception {
        assertThat(flat(new PDFTextStripper().getText(document(BenchPlans.allBare(), Paper.A4))))
                .contains("bare metal", "Signed off")
                .doesNotContain("Coupon first", "Dip gauges");
    }

    private static PDDocument document(BenchPlan plan, Paper paper) throws Exception {
        return Loader.loadPDF(StepSheetPdf.bytes(plan, BenchPlans.COLOURS, paper));
    }

    private static String flat(String text) {
        return text.replaceAll("\\s+", " ");
    }
}
