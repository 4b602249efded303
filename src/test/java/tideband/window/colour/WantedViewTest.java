package tideband.window.colour;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javafx.scene.Scene;
import javafx.scene.control.TextField;
import javafx.scene.control.TitledPane;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.design.Wanted;
import tideband.edit.Selection;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.look.Look;

@ScreenTest
class WantedViewTest {
    @TempDir
    static Path folder;

    private final Desk desk = Desk.with("lantern-hook");
    private final WantedModel model = new WantedModel(desk.drawing(), desk.work(), Runnable::run, Runnable::run);
    private WantedView view;
    private Scene scene;

    @Start
    void start(Stage stage) {
        view = new WantedView(model, desk.comfort());
        scene = new Scene(view, 300, 560);
        Look.dress(view, desk.comfort());
        stage.setScene(scene);
        stage.show();
    }

    @Test
    void aColourIsTypedAndAFilmTakenByKeysAlone(FxRobot robot) {
        robot.interact(() -> {
            desk.drawing().select(Selection.ofBands(List.of(3)));
            model.commands().get(0).act().run();
        });
        assertThat(scene.getFocusOwner()).isInstanceOf(TextField.class);
        robot.write("#3a3f8f");
        robot.type(KeyCode.DOWN);
        assertThat(scene.getFocusOwner()).isInstanceOf(MatchRow.class);
        assertThat(scene.getFocusOwner().getAccessibleText()).startsWith("Take deep blue, order 1, film ");
        robot.type(KeyCode.SPACE);
        assertThat(desk.drawing().undoNameProperty().get()).startsWith("Take deep blue, ");
        assertThat(desk.drawing().design().bands().get(3).wanted()).isInstanceOf(Wanted.Film.class);
        robot.interact(() -> Pictures.save(scene, "wanted-taken-light"));
    }

    @Test
    void swatchesAreWalkedByArrowKeysAndComeIntoView(FxRobot robot) {
        robot.interact(() -> scene.lookup(".named").requestFocus());
        for (int i = 0; i < 12; i++) {
            robot.type(KeyCode.DOWN);
        }
        assertThat(view.getVvalue()).isGreaterThan(0.2);
        assertThat(scene.getFocusOwner().getAccessibleText()).startsWith("teal, order 2");
        robot.type(KeyCode.SPACE);
        assertThat(model.foundProperty()
                        .get()
                        .orElseThrow()
                        .matches()
                        .best()
                        .colour()
                        .name()
                        .text())
                .isEqualTo("teal");
        robot.interact(() -> Pictures.save(scene, "wanted-swatches-light"));
    }

    @Test
    void looksRightInLightAndDarkAndLarge(FxRobot robot) {
        robot.interact(() -> Pictures.save(scene, "wanted-empty-light"));
        robot.interact(() -> {
            model.entryProperty().set("#d02020");
            desk.comfort().darkProperty().set(true);
        });
        robot.interact(() -> Pictures.save(scene, "wanted-out-of-reach-dark"));
        robot.interact(() -> {
            model.entryProperty().set("lab(62, -9, -27)");
            desk.comfort().textPercentProperty().set(200);
        });
        robot.interact(() -> Pictures.save(scene, "wanted-200-dark"));
        robot.interact(() -> {
            desk.comfort().textPercentProperty().set(100);
            desk.comfort().darkProperty().set(false);
            robot.lookup((TitledPane fold) -> fold.getText().startsWith("By hue"))
                    .queryAs(TitledPane.class)
                    .setExpanded(true);
        });
        robot.interact(() -> view.setVvalue(0.85));
        robot.interact(() -> Pictures.save(scene, "wanted-plane-light"));
        robot.interact(() -> {
            desk.comfort().darkProperty().set(true);
            model.plane().chromaProperty().set(25);
        });
        robot.interact(() -> Pictures.save(scene, "wanted-plane-dark"));
        assertThat(model.plane().planeProperty().get()).isPresent();
    }

    @Test
    void aColourIsTakenFromAPicture(FxRobot robot) throws Exception {
        Path file = picture();
        robot.interact(() -> view.openPicture(file));
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(() -> view.setVvalue(1));
        assertThat(model.image().messageProperty().get()).startsWith("evening.png at 160, 120: #");
        String before = model.entryProperty().get();
        robot.type(KeyCode.RIGHT).type(KeyCode.EQUALS);
        assertThat(model.image().xPxProperty().get()).isEqualTo(161);
        robot.interact(() -> Pictures.save(scene, "wanted-picture-light"));
        robot.press(KeyCode.SHIFT).type(KeyCode.DOWN).release(KeyCode.SHIFT);
        assertThat(model.image().yPxProperty().get()).isEqualTo(130);
        assertThat(model.entryProperty().get()).isNotEqualTo(before);
        Path text = Files.writeString(folder.resolve("notes.png"), "no picture");
        robot.interact(() -> view.openPicture(text));
        assertThat(model.image().messageProperty().get())
                .isEqualTo(
                        "notes.png cannot be shown: it is no PNG, JPEG, GIF or BMP picture. Open a PNG, JPEG, GIF or BMP"
                                + " picture.");
    }

    private static Path picture() throws Exception {
        BufferedImage image = new BufferedImage(320, 240, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        for (int y = 0; y < 240; y++) {
            g.setColor(Color.getHSBColor(0.6f + y / 700f, 0.7f, 0.3f + y / 400f));
            g.fillRect(0, y, 320, 1);
        }
        g.setColor(new Color(0xe0b040));
        g.fillOval(200, 60, 50, 50);
        g.dispose();
        File file = folder.resolve("evening.png").toFile();
        ImageIO.write(image, "png", file);
        return file.toPath();
    }
}
