package tideband.window.colour;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.Iterator;
import javafx.scene.image.Image;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.stream.ImageInputStream;

/** Reads pictures; one that is larger than needed is read smaller, so that it fits into memory. */
final class ImageReading {
    private static final double MOST_PX = 4000;

    private ImageReading() {}

    /**
     * Reads a picture.
     *
     * @param file a PNG, JPEG, GIF or BMP file
     * @return the picture
     * @throws IOException in words, if it cannot be read
     */
    static Image read(Path file) throws IOException {
        double scale = scale(file);
        try (InputStream in = Files.newInputStream(file)) {
            Image image = scale < 1 ? new Image(in, MOST_PX, MOST_PX, true, true) : new Image(in);
            if (image.isError()) {
                throw new IOException("it is damaged or of a kind that is not known", image.getException());
            }
            return image;
        }
    }

    private static double scale(Path file) throws IOException {
        if (!Files.isRegularFile(file)) {
            throw new IOException("there is no such file");
        }
        try (ImageInputStream in = ImageIO.createImageInputStream(file.toFile())) {
            Iterator<ImageReader> readers = in == null ? Collections.emptyIterator() : ImageIO.getImageReaders(in);
            if (!readers.hasNext()) {
                throw new IOException("it is no PNG, JPEG, GIF or BMP picture");
            }
            ImageReader reader = readers.next();
            try {
                reader.setInput(in, true, true);
                return MOST_PX / Math.max(reader.getWidth(0), reader.getHeight(0));
            } finally {
                reader.dispose();
            }
        }
    }
}
