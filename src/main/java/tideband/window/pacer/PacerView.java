package tideband.window.pacer;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javafx.animation.AnimationTimer;
import javafx.geometry.Pos;
import javafx.scene.AccessibleAttribute;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import tideband.window.look.Look;

/**
 * The whole screen: words to be read from the bath, numbers below them, the piece at the right, buttons at the foot. It asks the
 * model at every frame while it runs, and changes only what has changed.
 */
public final class PacerView extends Region {
    /** The words to be read from afar are no lower than this share of the height. */
    static final double WORDS_SHARE = 1.0 / 8;

    /** The height of a line of letters, to their size. */
    private static final double LINE = 1.21;

    private static final double PIECE_SHARE = 0.25;
    /** Room kept at the sides of warning words. */
    private static final double INSET_SHARE = 0.03;

    private static final Map<KeyCode, List<PacerAct>> KEYS = new EnumMap<>(Map.of(
            KeyCode.SPACE, List.of(PacerAct.PAUSE, PacerAct.RESUME, PacerAct.STOP_COUNT),
            KeyCode.ESCAPE, List.of(PacerAct.ABORT),
            KeyCode.ENTER, List.of(PacerAct.CONFIRM, PacerAct.GO_ON),
            KeyCode.RIGHT, List.of(PacerAct.CONFIRM),
            KeyCode.LEFT, List.of(PacerAct.BACK),
            KeyCode.C, List.of(PacerAct.COUNT_AGAIN, PacerAct.AGAIN),
            KeyCode.N, List.of(PacerAct.NEXT),
            KeyCode.M, List.of(PacerAct.MUTE),
            KeyCode.L, List.of(PacerAct.LIGHT),
            KeyCode.Q, List.of(PacerAct.LEAVE)));

    private final PacerModel model;
    private final Chime chime;
    private final Runnable leave;
    private final Runnable next;
    private final FarType type = new FarType();
    private final Label title = new Label();
    private final Label progress = new Label();
    private final Region wholeTrack = new Region();
    private final Region whole = new Region();
    private final Label words = new Label();
    private final Label target = new Label();
    private final DialsView dials = new DialsView();
    private final SentencesView sentences = new SentencesView();
    private final BathView piece;
    private final ButtonsView buttons;
    private final Label live = new Label();
    private final Set<KeyCode> held = EnumSet.noneOf(KeyCode.class);
    private final AnimationTimer timer = new AnimationTimer() {
        @Override
        public void handle(long now) {
            poll();
        }
    };
    private String troubleTold = "";
    private List<String> shownSentences = List.of();

    /**
     * The view of a run.
     *
     * @param model the run
     * @param chime what makes it heard
     * @param leave closes the pacer
     * @param next goes on to the next immersion
     */
    public PacerView(PacerModel model, Chime chime, Runnable leave, Runnable next) {
        this.model = model;
        this.chime = chime;
        this.leave = leave;
        this.next = next;
        this.piece = new BathView(model);
        this.buttons = new ButtonsView(model, this::perform);
        getStylesheets().add(PacerView.class.getResource("pacer.css").toExternalForm());
        Look.dress(this, model.look());
        setId("pacer");
        title.getStyleClass().add("pacer-small");
        progress.getStyleClass().add("pacer-small");
        progress.setAlignment(Pos.CENTER_RIGHT);
        words.setId("pacer-words");
        words.getStyleClass().add("pacer-words");
        target.getStyleClass().add("pacer-words");
        wholeTrack.getStyleClass().add("pacer-track");
        whole.getStyleClass().add("pacer-whole");
        live.setId("pacer-live-words");
        live.setAccessibleRole(AccessibleRole.TEXT);
        live.setFocusTraversable(true);
        live.setOpacity(0);
        getChildren().addAll(live, title, progress, wholeTrack, whole, words, target, dials, sentences, piece, buttons);
        getChildren().forEach(node -> node.setManaged(false));
        addEventFilter(KeyEvent.KEY_PRESSED, this::pressed);
        addEventFilter(KeyEvent.KEY_RELEASED, event -> held.remove(event.getCode()));
        model.boardProperty().addListener((value, before, after) -> show(after));
        model.announcementProperty().addListener((value, before, after) -> announce(after));
        announce(model.announcementProperty().get());
        show(model.board());
    }

    /** Begins to follow the clock; the live words get the focus, so that they are read out. */
    public void start() {
        timer.start();
        live.requestFocus();
    }

    /** Stops following the clock. */
    public void stop() {
        timer.stop();
    }

    /** Comes up to the clock once. */
    void poll() {
        model.poll().ifPresent(chime::sound);
        if (!chime.trouble().equals(troubleTold)) {
            troubleTold = chime.trouble();
            announce(troubleTold);
            requestLayout();
        }
    }

    /** Breaks off a run that is under way. */
    void abort() {
        perform(PacerAct.ABORT);
    }

    /**
     * Whether a run is under way.
     *
     * @return false before it begins and once it has ended
     */
    public boolean underWay() {
        return model.underWay();
    }

    private void announce(String sentence) {
        live.setText(sentence);
        live.setAccessibleText(sentence);
        live.notifyAccessibleAttributeChanged(AccessibleAttribute.TEXT);
    }

    private void pressed(KeyEvent event) {
        if (event.isShortcutDown() || event.isAltDown()) {
            return;
        }
        if (event.getCode() == KeyCode.DOWN || event.getCode() == KeyCode.PAGE_DOWN) {
            sentences.scroll(0.5);
            event.consume();
        } else if (event.getCode() == KeyCode.UP || event.getCode() == KeyCode.PAGE_UP) {
            sentences.scroll(-0.5);
            event.consume();
        } else if (KEYS.containsKey(event.getCode())) {
            // A key held down repeats; what it does is done once.
            if (held.add(event.getCode())) {
                KEYS.get(event.getCode()).stream()
                        .filter(act -> model.board().acts().contains(act))
                        .findFirst()
                        .ifPresent(this::perform);
            }
            event.consume();
        }
    }

    private void perform(PacerAct act) {
        model.perform(act).ifPresent(chime::sound);
        if (act == PacerAct.LEAVE) {
            leave.run();
        } else if (act == PacerAct.NEXT) {
            next.run();
        }
    }

    private void show(Board board) {
        boolean moved = set(title, board.title());
        moved |= set(progress, board.progress());
        moved |= set(words, board.words());
        moved |= set(target, board.target());
        boolean urgent = words.getStyleClass().contains("pacer-urgent");
        if (board.urgent() != urgent) {
            if (urgent) {
                words.getStyleClass().remove("pacer-urgent");
            } else {
                words.getStyleClass().add("pacer-urgent");
            }
            moved = true;
        }
        moved |= dials.isVisible() != board.dials().isPresent()
                || piece.isVisible() != board.place().isPresent();
        moved |= !board.sentences().equals(shownSentences);
        shownSentences = board.sentences();
        dials.setVisible(board.dials().isPresent());
        sentences.setVisible(board.dials().isEmpty());
        piece.setVisible(board.place().isPresent());
        board.dials().ifPresent(dials::show);
        board.place().ifPresent(piece::show);
        buttons.show(board.acts());
        placeWhole(board);
        if (moved) {
            requestLayout();
        }
    }

    private static boolean set(Label label, String text) {
        boolean changed = !label.getText().equals(text);
        if (changed) {
            label.setText(text);
        }
        return changed;
    }

    private void placeWhole(Board board) {
        whole.resizeRelocate(
                wholeTrack.getLayoutX(),
                wholeTrack.getLayoutY(),
                Math.rint(wholeTrack.getWidth() * board.wholeShare()),
                wholeTrack.getHeight());
    }

    @Override
    protected void layoutChildren() {
        Board board = model.board();
        double height = getHeight();
        double margin = height / 50;
        double wide = getWidth() - 2 * margin;
        double width = board.place().isPresent() ? getWidth() * (1 - PIECE_SHARE) - 2 * margin : wide;
        double smallPx = height / 32;
        FarType.size(title, type.fitPx(title.getText(), false, smallPx, wide * 0.72));
        title.resizeRelocate(margin, margin, wide * 0.75, smallPx * 1.4);
        FarType.size(progress, type.fitPx(progress.getText(), false, smallPx, wide * 0.23));
        progress.resizeRelocate(margin + wide * 0.75, margin, wide * 0.25, smallPx * 1.4);
        double y = margin + smallPx * 1.5;
        wholeTrack.resizeRelocate(margin, y, wide, height / 90);
        placeWhole(board);
        y += height / 90 + margin / 2;
        double piecesTop = y;
        double wantedPx = height * (board.dials().isPresent() ? 0.132 : WORDS_SHARE * 1.02);
        y = far(words, board.words(), margin, y, width, wantedPx);
        y = board.target().isEmpty() ? y : far(target, board.target(), margin, y, width, wantedPx);
        target.setVisible(!board.target().isEmpty());
        buttons.setScreenHeight(height);
        double footPx = buttons.heightPx();
        double foot = height - margin - footPx;
        buttons.resizeRelocate(margin, foot, wide, footPx);
        y += margin / 2;
        dials.setScreenHeight(height);
        dials.resizeRelocate(margin, y, width, foot - y - margin / 2);
        if (board.dials().isEmpty()) {
            double leastPx = Math.max(Look.of(model.look()).emPx() * 1.2, height / 42);
            sentences.show(said(board), width, foot - y - margin / 2, height / 21, leastPx);
            sentences.relocate(margin, y);
        }
        piece.resizeRelocate(
                margin + width + margin, piecesTop, getWidth() - width - 3 * margin, foot - piecesTop - margin);
        live.resizeRelocate(0, 0, 1, 1);
    }

    private List<String> said(Board board) {
        if (troubleTold.isEmpty() || !board.acts().contains(PacerAct.CONFIRM)) {
            return board.sentences();
        }
        List<String> all = new ArrayList<>(board.sentences());
        all.add(Character.toUpperCase(troubleTold.charAt(0)) + troubleTold.substring(1) + ".");
        return all;
    }

    private double far(Label label, String text, double x, double y, double width, double wantedPx) {
        double px = type.fitPx(text, true, wantedPx, width - INSET_SHARE * getHeight());
        FarType.size(label, px);
        label.resizeRelocate(x, y, width, px * LINE);
        return y + px * LINE;
    }
}
