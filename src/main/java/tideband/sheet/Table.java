package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.sheet.Mark.Anchor;

/** A table that breaks between rows, with its heading again on every page. */
final class Table {
    private static final double HEAD_PT = 10.5;
    private static final double PAD_MM = 1.2;
    private static final double CHIP_MM = 9;
    private static final double LEADING = 1.2;

    /** So many rows stay together at the beginning and at the end. */
    private static final int TOGETHER = 3;

    private final Flow flow;
    private final List<Column> columns;
    private final double leastRowMm;
    private final double stretch;
    private final List<Row> rows = new ArrayList<>();

    /**
     * A table across the page; columns are stretched alike to fill it.
     *
     * @param leastRowMm least height of a row in mm
     */
    Table(Flow flow, List<Column> columns, double leastRowMm) {
        this.flow = flow;
        this.columns = List.copyOf(columns);
        this.leastRowMm = leastRowMm;
        double sum = columns.stream().mapToDouble(Column::widthMm).sum();
        this.stretch = flow.widthMm() / sum;
    }

    /**
     * A column.
     *
     * @param head its heading
     * @param widthMm its share of the width, in mm
     */
    record Column(String head, double widthMm) {}

    /**
     * A line of a cell.
     *
     * @param text its text
     * @param sizePt its type size in points
     * @param bold whether it is bold
     */
    record Line(String text, double sizePt, boolean bold) {}

    /**
     * A cell: a chip of colours, if any, and lines below each other.
     *
     * @param chip its colours, or none
     * @param lines its lines, broken where they are too long
     */
    record Cell(List<String> chip, List<Line> lines) {
        static Cell of(String text, double sizePt, boolean bold) {
            return new Cell(List.of(), List.of(new Line(text, sizePt, bold)));
        }

        Cell {
            chip = List.copyOf(chip);
            lines = List.copyOf(lines);
        }
    }

    /**
     * A row, its cells broken into lines.
     *
     * @param cells its cells
     * @param lines the lines of each cell
     * @param heightMm its height in mm
     */
    private record Row(List<Cell> cells, List<List<Line>> lines, double heightMm) {}

    /** Takes up a row; it is drawn with the whole table. */
    void row(List<Cell> cells) {
        List<List<Line>> broken = new ArrayList<>();
        double height = leastRowMm;
        for (int i = 0; i < columns.size(); i++) {
            Cell cell = cells.get(i);
            double room = columns.get(i).widthMm() * stretch - 2 * PAD_MM - chipRoom(cell);
            List<Line> lines = cell.lines().stream()
                    .flatMap(l -> Typeface.wrap(l.text(), Flow.mm(l.sizePt()), l.bold(), room).stream()
                            .map(t -> new Line(t, l.sizePt(), l.bold())))
                    .toList();
            broken.add(lines);
            height = Math.max(height, heightMm(lines) + 2 * PAD_MM);
        }
        rows.add(new Row(cells, broken, height));
    }

    /** Draws the table; its first and its last rows stay together, so that none stands alone on a page. */
    void draw() {
        int kept = Math.min(TOGETHER, rows.size());
        flow.need(headMm() + heightMm(0, kept));
        head();
        for (int i = 0; i < rows.size(); i++) {
            boolean tail = i == rows.size() - TOGETHER && i > 0;
            if (flow.need(tail ? heightMm(i, rows.size()) : rows.get(i).heightMm())) {
                head();
            }
            draw(rows.get(i));
        }
    }

    private double heightMm(int from, int to) {
        return rows.subList(from, to).stream().mapToDouble(Row::heightMm).sum();
    }

    private void draw(Row row) {
        double x = flow.leftMm();
        for (int i = 0; i < columns.size(); i++) {
            cell(row.cells().get(i), row.lines().get(i), x + PAD_MM, row.heightMm());
            x += columns.get(i).widthMm() * stretch;
        }
        flow.down(row.heightMm());
        flow.pen().line(flow.leftMm(), flow.yMm(), x, flow.yMm(), 0.2);
    }

    private void cell(Cell cell, List<Line> lines, double leftMm, double rowMm) {
        double x = leftMm;
        if (!cell.chip().isEmpty()) {
            double height = Math.min(rowMm - 2, 9);
            flow.pen().chip(cell.chip(), x, flow.yMm() + (rowMm - height) / 2, CHIP_MM, height);
            x += chipRoom(cell);
        }
        double top = flow.yMm() + (rowMm - heightMm(lines)) / 2;
        for (Line line : lines) {
            double size = Flow.mm(line.sizePt());
            // Capitals are about 0.72 em high, so this stands in the middle of its line.
            flow.pen().words(line.text(), x, top + size * (LEADING / 2 + 0.36), size, line.bold(), Anchor.START);
            top += size * LEADING;
        }
    }

    private static double chipRoom(Cell cell) {
        return cell.chip().isEmpty() ? 0 : CHIP_MM + 2;
    }

    private static double heightMm(List<Line> lines) {
        return lines.stream().mapToDouble(l -> Flow.mm(l.sizePt()) * LEADING).sum();
    }

    private double headMm() {
        return headLines().stream().mapToInt(List::size).max().orElse(1) * Flow.mm(HEAD_PT) * LEADING + 2;
    }

    private List<List<String>> headLines() {
        return columns.stream()
                .map(c -> Typeface.wrap(c.head(), Flow.mm(HEAD_PT), true, c.widthMm() * stretch - 2 * PAD_MM))
                .toList();
    }

    private void head() {
        double size = Flow.mm(HEAD_PT);
        double x = flow.leftMm();
        flow.pen().box(x, flow.yMm(), flow.widthMm(), headMm(), Ink.fill(Ink.PALE));
        for (int i = 0; i < columns.size(); i++) {
            double base = flow.yMm() + 1 + size * 0.85;
            for (String line : headLines().get(i)) {
                flow.pen().words(line, x + PAD_MM, base, size, true, Anchor.START);
                base += size * LEADING;
            }
            x += columns.get(i).widthMm() * stretch;
        }
        flow.down(headMm());
        flow.pen().line(flow.leftMm(), flow.yMm(), x, flow.yMm(), 0.5);
    }
}
