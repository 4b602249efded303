package tideband.window.field;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tideband.match.Match;
import tideband.match.VoltScale;

/**
 * Where a film that comes near a wanted colour is marked in the field.
 *
 * @param match the film
 * @param text what stands at the mark
 * @param yPx the film's height
 * @param labelLeftPx where its label begins
 * @param labelTopPx the top of its label
 * @param labelWidthPx how wide the label is
 * @param labelHeightPx how high the label is
 * @param windowTopPx the upper end of its window of volts
 * @param windowBottomPx the lower end of its window
 */
public record MatchMark(
        Match match,
        String text,
        double yPx,
        double labelLeftPx,
        double labelTopPx,
        double labelWidthPx,
        double labelHeightPx,
        double windowTopPx,
        double windowBottomPx) {
    private static final double LINE_PX = 4;
    private static final double LABEL_EMS = 1.45;
    private static final double LETTER_EMS = 0.5;

    static List<MatchMark> of(List<Match> matches, FieldArea area, NmScale scale, VoltScale volts) {
        double heightPx = LABEL_EMS * area.emPx();
        List<Match> inView = matches.stream()
                .filter(m -> m.filmNm() >= scale.fromNm() && m.filmNm() <= scale.toNm())
                .sorted(Comparator.comparingDouble(Match::filmNm).reversed())
                .toList();
        List<MatchMark> marks = new ArrayList<>();
        double freePx = area.topPx() + 2;
        for (int i = 0; i < inView.size(); i++) {
            Match match = inView.get(i);
            String text = FieldWords.match(match);
            double widthPx = (text.length() * LETTER_EMS + 1) * area.emPx();
            double yPx = scale.px(match.filmNm());
            // Room is left below for the labels still to come.
            double lowestPx = area.bottomPx() - (inView.size() - i) * heightPx;
            double topPx = Math.max(freePx, Math.min(yPx - heightPx / 2, lowestPx));
            freePx = topPx + heightPx;
            marks.add(new MatchMark(
                    match,
                    text,
                    yPx,
                    area.rightPx() - widthPx - area.emPx(),
                    topPx,
                    widthPx,
                    heightPx,
                    scale.px(volts.filmNmAtVolts().applyAsDouble(match.windowHighVolts())),
                    scale.px(volts.filmNmAtVolts().applyAsDouble(match.windowLowVolts()))));
        }
        return marks;
    }

    boolean onLabel(double xPx, double y) {
        return xPx >= labelLeftPx
                && xPx <= labelLeftPx + labelWidthPx
                && y >= labelTopPx
                && y <= labelTopPx + labelHeightPx;
    }

    boolean onLine(double xPx, double y, FieldArea area) {
        return area.overFilms(xPx, y) && Math.abs(y - yPx) <= LINE_PX * area.emPx() / 13;
    }
}
