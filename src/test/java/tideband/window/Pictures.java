package tideband.window;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javax.imageio.ImageIO;

/** Saves what a test shows to {@code target/pictures}, for people to look at. To be called on the JavaFX thread. */
public final class Pictures {
    private Pictures() {}

    /**
     * Saves a scene.
     *
     * @param scene the scene
     * @param name the file's name, without its ending
     * @return the picture
     */
    public static WritableImage save(Scene scene, String name) {
        return save(scene.snapshot(null), name);
    }

    /**
     * Saves a node.
     *
     * @param node the node
     * @param name the file's name, without its ending
     * @return the picture
     */
    public static WritableImage save(Node node, String name) {
        return save(node.snapshot(null, null), name);
    }

    private static WritableImage save(WritableImage picture, String name) {
        try {
            Path folder = Files.createDirectories(Path.of("target", "pictures"));
            ImageIO.write(
                    SwingFXUtils.fromFXImage(picture, null),
                    "png",
                    folder.resolve(name + ".png").toFile());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return picture;
    }
}
