package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;

@ScreenTest
class LateTabTest {
    private Tab first;
    private Tab second;
    private TabPane tabs;
    private LateTab<Label> late;
    private int made;

    @Start
    void start(Stage stage) {
        first = new Tab("First", new Label("here"));
        second = new Tab("Second");
        tabs = new TabPane(first, second);
        late = new LateTab<>(second, () -> new Label("made " + ++made));
        stage.setScene(new Scene(tabs, 300, 200));
        stage.show();
    }

    @Test
    void itsContentIsMadeOnceWhenItIsFirstLookedAt(FxRobot robot) {
        assertThat(late.made()).isFalse();
        assertThat(second.getContent()).isNull();
        robot.interact(() -> tabs.getSelectionModel().select(second));
        assertThat(second.getContent()).isSameAs(late.content());
        robot.interact(() -> tabs.getSelectionModel().select(first));
        robot.interact(() -> tabs.getSelectionModel().select(second));
        assertThat(made).isEqualTo(1);
    }
}
