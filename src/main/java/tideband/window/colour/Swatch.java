package tideband.window.colour;

import javafx.scene.layout.Region;

/** A patch of colour with a frame of ink, so that it is seen on any ground; what it shows is said in words beside it. */
final class Swatch extends Region {
    Swatch(double widthEm, double heightEm) {
        getStyleClass().add("swatch-frame");
        setMinSize(0, 0);
        widthEms = widthEm;
        heightEms = heightEm;
        setMouseTransparent(true);
        show("#808080");
    }

    private final double widthEms;
    private final double heightEms;
    private String hex = "";

    void show(String colourHex) {
        if (!hex.equals(colourHex)) {
            hex = colourHex;
            String size = "-fx-min-width: " + widthEms + "em; -fx-pref-width: " + widthEms + "em; -fx-min-height: "
                    + heightEms + "em; -fx-pref-height: " + heightEms + "em; -fx-max-height: " + heightEms + "em;";
            setStyle(size + " -fx-background-color: " + hex + ";");
        }
    }
}
