package tideband.window.colour;

import java.util.function.Consumer;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import tideband.match.Match;

/** One film that comes near: a press takes it. */
final class MatchRow extends Button {
    private final Swatch wanted = new Swatch(1.9, 2.6);
    private final Swatch film = new Swatch(1.9, 2.6);
    private final Label name = new Label();
    private final Label volts = new Label();
    private final Label off = new Label();
    private Match match;

    MatchRow(Consumer<Match> take) {
        getStyleClass().add("match");
        setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        setMaxWidth(Double.MAX_VALUE);
        name.getStyleClass().add("numeral");
        off.getStyleClass().add("faint");
        VBox words = new VBox(name, volts, off);
        words.setMinWidth(0);
        HBox.setHgrow(words, Priority.ALWAYS);
        HBox pair = new HBox(wanted, film);
        pair.setMinWidth(USE_PREF_SIZE);
        pair.setMaxHeight(USE_PREF_SIZE);
        HBox all = new HBox(pair, words);
        all.setStyle("-fx-spacing: 0.6em; -fx-alignment: center-left;");
        setGraphic(all);
        setTooltip(new Tooltip(
                "Left: the colour wanted. Right: this film. Press to give the film to the selected bands."));
        setOnAction(e -> take.accept(match));
    }

    void show(Found found, Match next) {
        match = next;
        wanted.show(found.hex());
        film.show(next.colour().srgbHex());
        name.setText(Said.colour(next.colour()) + "  " + Said.film(next.filmNm()));
        volts.setText(Said.volts(next.volts()) + "  (window " + Said.window(next) + ")");
        off.setText("dE00 " + Said.difference(next.difference()) + ", " + Said.howFar(next.difference()));
        setAccessibleText("Take " + Said.spoken(next));
        setAccessibleHelp("Gives this film to the selected bands");
    }
}
