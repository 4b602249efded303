package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.input.KeyCombination;
import org.junit.jupiter.api.Test;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;

/** What every command owes the user. */
class CommandsTest {
    private final List<Command> commands = new WorkbenchModel(
                    Beginning.with(Desk.shipped("snuffer-handle")),
                    new ComfortModel(),
                    Desk.threads(),
                    Optional::empty,
                    () -> 0)
            .commands();

    @Test
    void everyCommandHasANameAKeyAndAHelpOfItsOwn() {
        assertThat(commands).hasSizeGreaterThan(40);
        assertThat(commands).extracting(Command::id).doesNotHaveDuplicates();
        assertThat(commands).allSatisfy(command -> {
            assertThat(command.name().getValue()).isNotBlank();
            assertThat(command.help()).as(command.id()).endsWith(".").hasSizeGreaterThan(10);
            assertThat(command.key()).as(command.id()).isNotBlank();
        });
    }

    @Test
    void noTwoCommandsShareAKey() {
        List<KeyCombination> keys = new ArrayList<>();
        for (Command command : commands) {
            if (!command.key().isEmpty()) {
                keys.add(KeyCombination.valueOf(command.key()));
            }
        }
        keys.add(KeyCombination.valueOf("F1"));
        keys.add(KeyCombination.valueOf("F11"));
        for (String files : List.of("N", "O", "S", "Shift+S", "Q")) {
            keys.add(KeyCombination.valueOf("Shortcut+" + files));
        }
        assertThat(keys).doesNotHaveDuplicates();
    }
}
