package tideband.window.action;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.scene.control.Menu;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import tideband.window.ScreenTest;

@ScreenTest
class MenusViewTest {

    @Test
    void everyMenuOpensByALetterOfItsOwn(FxRobot robot) {
        robot.interact(() -> {
            List<Command> commands = Arrays.stream(Command.Menu.values())
                    .map(menu -> new Command(
                            menu.name(),
                            menu,
                            new SimpleStringProperty(menu.title()),
                            "",
                            "Does nothing.",
                            new SimpleBooleanProperty(true),
                            () -> {}))
                    .toList();
            assertThat(new MenusView(commands, Set.of()).getMenus())
                    .extracting(Menu::getText)
                    .containsExactly("_File", "_Edit", "_Band", "_View", "Be_nch", "_Help");
        });
    }
}
