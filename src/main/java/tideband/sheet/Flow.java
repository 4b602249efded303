package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.sheet.Mark.Anchor;

/** Fills pages from top to bottom: headings, steps to tick off, text; numbers the pages at the end. */
final class Flow {
    static final double BODY_PT = 12;
    static final double STEP_PT = 13;

    private static final double LEFT_MM = 18;
    private static final double RIGHT_MM = 14;
    private static final double TOP_MM = 24;
    private static final double BOTTOM_MM = 18;
    private static final double LEADING = 1.28;
    private static final double MARGIN_PT = 10;

    private final Paper paper;
    private final String title;
    private final List<Pen> pages = new ArrayList<>();
    private double y;
    private int step;
    private double insetMm;
    private double insetBottomMm;

    Flow(Paper paper, String title) {
        this.paper = paper;
        this.title = title;
        newPage();
    }

    /** The pen of the page at hand. */
    Pen pen() {
        return pages.get(pages.size() - 1);
    }

    double leftMm() {
        return LEFT_MM;
    }

    /** Where lines end: short of a picture that stands at the right. */
    double rightMm() {
        return paper.widthMm() - RIGHT_MM - (y < insetBottomMm ? insetMm : 0);
    }

    double widthMm() {
        return rightMm() - LEFT_MM;
    }

    /** Where the next thing begins. */
    double yMm() {
        return y;
    }

    double bottomMm() {
        return paper.heightMm() - BOTTOM_MM;
    }

    void newPage() {
        pages.add(new Pen());
        y = TOP_MM;
        insetMm = 0;
        insetBottomMm = 0;
    }

    /** Begins a new page unless this one is still empty. */
    void freshPage() {
        if (y > TOP_MM) {
            newPage();
        }
    }

    /** Begins a new page unless so much room is left; true if it did. */
    boolean need(double heightMm) {
        if (y + heightMm > bottomMm() && y > TOP_MM) {
            newPage();
            return true;
        }
        return false;
    }

    void down(double mm) {
        y += mm;
    }

    /** Keeps the right of this page free from here down for a picture. */
    void inset(double widthMm, double heightMm) {
        insetMm = widthMm;
        insetBottomMm = y + heightMm;
    }

    /** Goes below the picture at the right, if there is one on this page. */
    void clearInset() {
        y = Math.max(y, insetBottomMm);
        insetMm = 0;
        insetBottomMm = 0;
    }

    /** A chapter's heading. */
    void chapter(String text) {
        y += y > TOP_MM ? 6 : 0;
        for (String line : Typeface.wrap(text, mm(22), true, widthMm())) {
            need(14);
            y += mm(22);
            pen().words(line, LEFT_MM, y, mm(22), true, Anchor.START);
            y += 1.6;
        }
        pen().line(LEFT_MM, y + 1, rightMm(), y + 1, 0.6);
        y += 6;
    }

    /** A numbered step's heading: white on black, to be found from afar. */
    void step(String text) {
        step++;
        double size = mm(17);
        String number = Integer.toString(step);
        double box = Math.max(11, Typeface.widthMm(number, size, true) + 4);
        List<String> lines = Typeface.wrap(text, size, true, widthMm() - box - 4);
        need(box + 22 + (lines.size() - 1) * size * LEADING);
        y += 3;
        pen().box(LEFT_MM, y, box, 10, Ink.fill(Ink.BLACK));
        pen().words(number, LEFT_MM + box / 2, y + 7.3, size, true, Anchor.MIDDLE, Ink.WHITE);
        double base = y + 7.3;
        for (String line : lines) {
            pen().words(line, LEFT_MM + box + 4, base, size, true, Anchor.START);
            base += size * LEADING;
        }
        y = base - size * LEADING + 6.5;
    }

    /** Something to do, with a box to tick. */
    void act(String text) {
        double size = mm(STEP_PT);
        List<String> lines = Typeface.wrap(text, size, false, widthMm() - 9);
        need(Math.min(lines.size(), 3) * size * LEADING + 3);
        pen().box(LEFT_MM, y + 0.6, 4.8, 4.8, Ink.outline(Ink.BLACK, 0.5));
        lines(lines, LEFT_MM + 9, size, false);
        y += 2.6;
    }

    /** Plain text. */
    void text(String text, double sizePt, boolean bold, double indentMm) {
        lines(Typeface.wrap(text, mm(sizePt), bold, widthMm() - indentMm), LEFT_MM + indentMm, mm(sizePt), bold);
        y += 2;
    }

    private void lines(List<String> lines, double leftMm, double sizeMm, boolean bold) {
        for (String line : lines) {
            need(sizeMm * LEADING);
            pen().words(line, leftMm, y + sizeMm, sizeMm, bold, Anchor.START);
            y += sizeMm * LEADING;
        }
    }

    /** Boxes side by side, each with a big value over a few words. */
    void figures(List<Figure> figures) {
        double gap = 3;
        double width = (widthMm() - gap * (figures.size() - 1)) / figures.size();
        need(26);
        for (int i = 0; i < figures.size(); i++) {
            double x = LEFT_MM + i * (width + gap);
            Figure figure = figures.get(i);
            double size = mm(26);
            while (Typeface.widthMm(figure.value(), size, true) > width - 4) {
                size *= 0.95;
            }
            pen().box(x, y, width, 22, Ink.outline(Ink.BLACK, 0.7));
            pen().words(figure.value(), x + width / 2, y + 11.5, size, true, Anchor.MIDDLE);
            pen().words(
                            Typeface.fit(figure.words(), mm(11), false, width - 3),
                            x + width / 2,
                            y + 18.5,
                            mm(11),
                            false,
                            Anchor.MIDDLE);
        }
        y += 27;
    }

    /**
     * A big value and what it is.
     *
     * @param value the value with its unit
     * @param words what it is
     */
    record Figure(String value, String words) {}

    /** The pages, each with the title above and its number below. */
    List<Drawing> pages() {
        List<Drawing> drawings = new ArrayList<>();
        double right = paper.widthMm() - RIGHT_MM;
        double size = mm(MARGIN_PT);
        for (int i = 0; i < pages.size(); i++) {
            Pen pen = pages.get(i);
            pen.words(Typeface.fit(title, size, true, right - LEFT_MM - 45), LEFT_MM, 14, size, true, Anchor.START);
            pen.words("step sheet", right, 14, size, false, Anchor.END);
            pen.line(LEFT_MM, 17, right, 17, 0.3);
            double foot = paper.heightMm() - 9;
            pen.words("page " + (i + 1) + " of " + pages.size(), right, foot, size, true, Anchor.END);
            pen.words("Local codes and licensed practice go before this sheet.", LEFT_MM, foot, size);
            drawings.add(new Drawing(paper.widthMm(), paper.heightMm(), title, "", pen.marks()));
        }
        return List.copyOf(drawings);
    }

    /** Points to millimetres. */
    static double mm(double points) {
        return points * Typeface.MM_PER_PT;
    }
}
