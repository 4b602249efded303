package tideband.window.order;

import javafx.scene.canvas.GraphicsContext;
import javafx.scene.text.TextAlignment;
import tideband.piece.Piece;
import tideband.window.look.Look;

/** Paints a card: what is done in large type, how deep, how many volts, how long, and a small picture. */
final class CardPainter {
    /** Width of a card, in ems. */
    static final double WIDTH_EM = 12.6;
    /** Height of a card, in ems. */
    static final double HEIGHT_EM = 8.6;

    private static final double PAD_EM = 0.65;
    private static final double TOP_EM = 1.25;
    private static final double HEADLINE_EM = 1.45;
    private static final double HEADLINE_Y_EM = 2.75;
    private static final double FIGURES_Y_EM = 4.45;
    private static final double FIGURE_EM = 1.25;
    /** What is long, such as a range, is set a little smaller before it is squeezed. */
    private static final double RANGE_EM = 1.1;

    private static final double LINE_EM = 1.6;
    private static final double PICTURE_EM = 3.1;
    private static final double LYING_EM = 2.7;
    private static final double ARC_EM = 0.5;
    /** How wide a letter is, about, in shares of its height. */
    private static final double LETTER = 0.56;

    private static final double MOST_SQUEEZED = 1.45;

    private final GraphicsContext pen;
    private final Look look;
    private final double em;

    CardPainter(GraphicsContext pen, Look look) {
        this.pen = pen;
        this.look = look;
        this.em = look.emPx();
    }

    void paint(WorkCard card, Piece piece, boolean first, boolean pointed) {
        double width = WIDTH_EM * em;
        double height = HEIGHT_EM * em;
        pen.clearRect(0, 0, width, height);
        pen.setFill(look.panel());
        pen.fillRoundRect(1, 1, width - 2, height - 2, ARC_EM * em, ARC_EM * em);
        pen.setStroke(pointed ? look.accent() : look.rule());
        pen.setLineWidth(pointed ? 3 : 1);
        pen.setLineDashes();
        pen.strokeRoundRect(1.5, 1.5, width - 3, height - 3, ARC_EM * em, ARC_EM * em);
        pen.setTextAlign(TextAlignment.LEFT);
        head(card, first, width);
        BathPainter picture = new BathPainter(pen, look, piece, card.picture());
        if (card.beside() && card.kind() != WorkCard.Kind.TURN) {
            picture.lying(PAD_EM * em, height - LYING_EM * em, width - 2 * PAD_EM * em, (LYING_EM - PAD_EM) * em);
            figures(card, PAD_EM * em, width - 2 * PAD_EM * em);
        } else {
            double top = (TOP_EM + 0.35) * em;
            picture.upright(PAD_EM * em, top, PICTURE_EM * em, height - top - PAD_EM * em, card.kind());
            figures(card, (PICTURE_EM + 2 * PAD_EM) * em, width - (PICTURE_EM + 3 * PAD_EM) * em);
        }
    }

    private void head(WorkCard card, boolean first, double width) {
        if (first) {
            pen.setFill(look.ink());
            pen.fillRect(1, 1, 0.3 * em, HEIGHT_EM * em - 2);
        }
        pen.setFill(first ? look.ink() : look.faint());
        pen.setFont(first ? look.bold(0.9) : look.font(0.9));
        pen.fillText("Immersion " + (card.immersion() + 1), PAD_EM * em, TOP_EM * em);
        pen.setFill(look.faint());
        pen.setFont(look.font(0.9));
        pen.setTextAlign(TextAlignment.RIGHT);
        pen.fillText(card.number() + "/" + card.of(), width - PAD_EM * em, TOP_EM * em);
        pen.setTextAlign(TextAlignment.LEFT);
    }

    private void figures(WorkCard card, double x, double width) {
        pen.setFill(look.ink());
        pen.setFont(look.bold(HEADLINE_EM));
        pen.fillText(card.headline(), x, HEADLINE_Y_EM * em, width);
        double y = FIGURES_Y_EM * em;
        int lines = card.beside() && card.kind() != WorkCard.Kind.TURN
                ? 2
                : card.figures().size();
        for (int i = 0; i < Math.min(lines, card.figures().size()); i++) {
            String figure = card.figures().get(i);
            boolean range = figure.length() * LETTER * FIGURE_EM * em > width;
            pen.setFont(look.bold(range ? RANGE_EM : FIGURE_EM));
            pen.fillText(fitted(figure, width), x, y, width);
            y += (lines == 2 ? 1.35 : LINE_EM) * em;
        }
    }

    /** Shortened where even squeezed it would not fit. */
    private String fitted(String text, double width) {
        int most = (int) (MOST_SQUEEZED * width / (LETTER * RANGE_EM * em));
        return text.length() <= most ? text : text.substring(0, most - 1) + "\u2026";
    }
}
