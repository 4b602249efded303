package tideband.sheet;

import java.util.ArrayList;
import java.util.List;

/** What is wrong with the layout of a drawing, computed from its marks. */
final class Layout {
    /** Capitals reach this far above the baseline and tails this far below, in em. */
    private static final double ABOVE = 0.72;

    private static final double BELOW = 0.19;

    private Layout() {}

    /** Texts that leave the drawing. */
    static List<String> outside(Drawing drawing) {
        return words(drawing).stream()
                .filter(w -> w.leftMm() < 0
                        || w.leftMm() + w.widthMm() > drawing.widthMm()
                        || w.at().yMm() - ABOVE * w.sizeMm() < 0
                        || w.at().yMm() + BELOW * w.sizeMm() > drawing.heightMm())
                .map(Mark.Words::text)
                .toList();
    }

    /** Pairs of texts that lie on each other. */
    static List<String> overlaps(Drawing drawing) {
        List<Mark.Words> words = words(drawing);
        List<String> pairs = new ArrayList<>();
        for (int i = 0; i < words.size(); i++) {
            for (int j = i + 1; j < words.size(); j++) {
                if (overlap(words.get(i), words.get(j))) {
                    pairs.add(words.get(i).text() + " / " + words.get(j).text());
                }
            }
        }
        return pairs;
    }

    static List<Mark.Words> words(Drawing drawing) {
        return drawing.marks().stream()
                .filter(m -> m instanceof Mark.Words)
                .map(m -> (Mark.Words) m)
                .toList();
    }

    private static boolean overlap(Mark.Words a, Mark.Words b) {
        double slack = 0.02;
        return a.leftMm() + slack < b.leftMm() + b.widthMm()
                && b.leftMm() + slack < a.leftMm() + a.widthMm()
                && a.at().yMm() - ABOVE * a.sizeMm() + slack < b.at().yMm() + BELOW * b.sizeMm()
                && b.at().yMm() - ABOVE * b.sizeMm() + slack < a.at().yMm() + BELOW * a.sizeMm();
    }
}
