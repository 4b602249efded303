package tideband.window.action;

import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.scene.text.Text;
import javafx.scene.text.TextFlow;

/** A page of everything that can be done: first the keys of the parts of the window, then each menu. Arrow keys scroll it. */
public final class KeysView extends ScrollPane {
    private final GridPane grid = new GridPane();
    private int row;

    /**
     * The page.
     *
     * @param commands all commands
     * @param samples the commands that open samples
     */
    public KeysView(List<Command> commands, List<Command> samples) {
        grid.getStyleClass().add("keys-page");
        ColumnConstraints keys = new ColumnConstraints();
        ColumnConstraints words = new ColumnConstraints();
        words.setHgrow(Priority.ALWAYS);
        grid.getColumnConstraints().addAll(keys, words);
        Label start = new Label(
                "Arrow keys and Page Down scroll, Esc closes. The keys of the field, the piece, the order of work"
                        + " and the pacer stand at the end.");
        start.getStyleClass().add("start");
        start.setWrapText(true);
        start.setMinHeight(USE_PREF_SIZE);
        grid.add(start, 0, row, 2, 1);
        row++;
        for (Command.Menu menu : Command.Menu.values()) {
            section(menu.title() + " menu");
            commands.stream().filter(c -> c.menu() == menu).forEach(this::command);
            if (menu == Command.Menu.FILE) {
                section("File menu, Samples");
                samples.forEach(this::command);
            }
        }
        for (PartKeys part : PartKeys.all()) {
            section(part.part());
            part.keys().forEach(does -> add(does.keys(), new TextFlow(text(does.does(), "does"))));
        }
        setContent(grid);
        setFitToWidth(true);
        setFocusTraversable(true);
        getStyleClass().add("keys");
        setAccessibleText("Everything that can be done, with its key");
        setAccessibleHelp("Arrow keys, Page Down and Page Up scroll; Esc closes.");
    }

    private void section(String title) {
        Label heading = new Label(title);
        heading.getStyleClass().add("section");
        heading.setMaxWidth(Double.MAX_VALUE);
        grid.add(heading, 0, row, 2, 1);
        row++;
    }

    private void command(Command command) {
        Text name = text("", "name");
        name.textProperty().bind(command.name());
        add(
                List.of(KeyCombination.valueOf(command.key()).getDisplayText()),
                new TextFlow(name, text("   " + command.help(), "does")));
    }

    private void add(List<String> keys, TextFlow words) {
        VBox caps = new VBox();
        caps.getStyleClass().add("caps");
        for (String key : keys) {
            Label cap = new Label(key);
            cap.getStyleClass().add("key");
            cap.setMinWidth(USE_PREF_SIZE);
            caps.getChildren().add(cap);
        }
        grid.addRow(row, caps, words);
        GridPane.setValignment(words, VPos.TOP);
        row++;
    }

    private static Text text(String words, String style) {
        Text text = new Text(words);
        text.getStyleClass().add(style);
        return text;
    }
}
