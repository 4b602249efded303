package tideband.window.colour;

import javafx.scene.image.Image;

// A picture on the screen as numbers.
record ImagePixels(Image image) implements Pixels {
    @Override
    public int widthPx() {
        return (int) image.getWidth();
    }

    @Override
    public int heightPx() {
        return (int) image.getHeight();
    }

    @Override
    public int argb(int xPx, int yPx) {
        return image.getPixelReader().getArgb(xPx, yPx);
    }
}
