package tideband.window.sheets;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.bench.Colours;
import tideband.sheet.PagePictures;
import tideband.sheet.Paper;
import tideband.sheet.SheetPrinter;
import tideband.sheet.StepSheetPdf;

/** Step sheets ready to be looked at and printed, for every paper, with the printers there are. */
public final class ShownSheets {
    private final String title;
    private final List<Caution> cautions;
    private final List<SheetPrinter> printers;
    private final String printerTrouble;
    private final Map<Paper, byte[]> pdfs = new EnumMap<>(Paper.class);
    private final Map<Paper, PagePictures> pictures = new EnumMap<>(Paper.class);

    ShownSheets(BenchPlan plan, Colours colours, List<SheetPrinter> printers, String printerTrouble) {
        this.title = plan.design().title();
        this.cautions = plan.cautions();
        this.printers = List.copyOf(printers);
        this.printerTrouble = printerTrouble;
        for (Paper paper : Paper.values()) {
            byte[] pdf = StepSheetPdf.bytes(plan, colours, paper);
            pdfs.put(paper, pdf);
            pictures.put(paper, new PagePictures(pdf));
        }
    }

    byte[] pdf(Paper paper) {
        return pdfs.get(paper);
    }

    PagePictures pictures(Paper paper) {
        return pictures.get(paper);
    }

    /**
     * The printers there are, the usual one first.
     *
     * @return the printers; none where none was found
     */
    public List<SheetPrinter> printers() {
        return printers;
    }

    /**
     * How many pages the sheet has on a paper.
     *
     * @param paper the paper
     * @return at least 1
     */
    public int pages(Paper paper) {
        return pictures.get(paper).count();
    }

    /**
     * The cautions of this plan, by their headings; they stand in full on the sheet.
     *
     * @return one line
     */
    public String cautions() {
        return cautions.stream().map(Caution::heading).collect(Collectors.joining(" \u00b7 "));
    }

    /**
     * How many cautions there are.
     *
     * @return their number
     */
    public int cautionCount() {
        return cautions.size();
    }

    String title() {
        return title;
    }

    String said() {
        if (!printers.isEmpty()) {
            return "";
        }
        String why = printerTrouble.isEmpty()
                ? "No printer was found."
                : "No printer could be looked for: " + printerTrouble + ".";
        return why + " Write the step sheet as a PDF here, then open it and print it from there.";
    }
}
