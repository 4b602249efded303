package tideband.window.action;

import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.scene.control.Button;
import javafx.scene.control.Separator;
import javafx.scene.control.ToolBar;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCombination;

/** The commands used most, as a row of buttons; what has no room is behind the arrow at its end. */
public final class ToolsView extends ToolBar {

    /**
     * What stands in the row.
     *
     * @param id the command
     * @param label a short name for the button
     */
    public record Tool(String id, String label) {}

    /**
     * A row of buttons.
     *
     * @param commands all commands
     * @param groups groups of buttons, a line between each two
     */
    public ToolsView(List<Command> commands, List<List<Tool>> groups) {
        for (List<Tool> group : groups) {
            if (!getItems().isEmpty()) {
                getItems().add(new Separator());
            }
            for (Tool tool : group) {
                getItems().add(button(tool, find(commands, tool.id())));
            }
        }
        setAccessibleText("Tools");
        getStyleClass().add("tools");
    }

    private static Command find(List<Command> commands, String id) {
        return commands.stream()
                .filter(c -> c.id().equals(id))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no command is called " + id));
    }

    private static Button button(Tool tool, Command command) {
        Button button = new Button(tool.label());
        button.setId("tool-" + command.id());
        button.setMnemonicParsing(false);
        button.disableProperty().bind(Bindings.not(command.possible()));
        button.setOnAction(event -> command.act().run());
        String key = command.key().isEmpty()
                ? ""
                : " (" + KeyCombination.valueOf(command.key()).getDisplayText() + ")";
        Tooltip tip = new Tooltip();
        tip.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> command.name().getValue() + key + "\n" + command.help(), command.name()));
        button.setTooltip(tip);
        button.accessibleTextProperty().bind(command.name());
        button.setAccessibleHelp(command.help());
        return button;
    }
}
