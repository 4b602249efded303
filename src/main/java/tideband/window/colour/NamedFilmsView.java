package tideband.window.colour;

import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.TilePane;
import javafx.scene.layout.VBox;
import tideband.match.FilmColour;

/** The colours the metal can show, as swatches with their names; arrow keys go from one to the next. */
final class NamedFilmsView extends TilePane {
    private final WantedModel model;

    NamedFilmsView(WantedModel model) {
        this.model = model;
        setStyle("-fx-hgap: 0.2em; -fx-vgap: 0.2em;");
        setPrefColumns(3);
        model.namedFilmsProperty().addListener((value, before, after) -> show(after));
        show(model.namedFilmsProperty().get());
        addEventFilter(KeyEvent.KEY_PRESSED, e -> {
            int step = step(e.getCode());
            int at = getChildren().indexOf(getScene().getFocusOwner());
            if (step != 0 && at >= 0) {
                int to = Math.min(Math.max(at + step, 0), getChildren().size() - 1);
                // The grid is one stop for the Tab key: the swatch that had the focus last.
                getChildren().get(at).setFocusTraversable(false);
                getChildren().get(to).setFocusTraversable(true);
                getChildren().get(to).requestFocus();
                e.consume();
            }
        });
    }

    private int step(KeyCode code) {
        int columns = Math.max(1, (int) Math.floor((getWidth() + getHgap()) / (getTileWidth() + getHgap())));
        return switch (code) {
            case LEFT -> -1;
            case RIGHT -> 1;
            case UP -> -columns;
            case DOWN -> columns;
            default -> 0;
        };
    }

    private void show(NamedFilms films) {
        List<FilmColour> all = films.films();
        getChildren().setAll(all.stream().map(this::swatch).toList());
        getChildren().stream().skip(1).forEach(swatch -> swatch.setFocusTraversable(false));
    }

    private Button swatch(FilmColour film) {
        Swatch patch = new Swatch(5, 1.8);
        patch.show(film.srgbHex());
        Label name = new Label(film.name().text());
        Label nm = new Label(Said.plain(film.filmNm()) + " nm (" + film.order() + ")");
        nm.getStyleClass().add("faint");
        Button button = new Button();
        button.getStyleClass().add("named");
        button.setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        button.setGraphic(new VBox(patch, name, nm));
        button.setAccessibleText(film.name().text() + ", order " + film.order() + ", film " + Said.film(film.filmNm()));
        button.setAccessibleHelp("Wants this colour");
        button.setTooltip(new Tooltip("Want this colour: " + Said.colour(film) + " at " + Said.film(film.filmNm())));
        button.setOnMousePressed(e -> {
            getChildren().forEach(other -> other.setFocusTraversable(other == button));
            button.requestFocus();
        });
        button.setOnAction(e -> model.want(film));
        return button;
    }
}
