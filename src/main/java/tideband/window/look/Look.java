package tideband.window.look;

import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.ScrollPane;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import tideband.window.comfort.ComfortModel;

/**
 * The inks and type of what is painted on a canvas; the style sheet holds the same for controls.
 *
 * @param paper the ground
 * @param panel the ground of what stands on it
 * @param ink text and lines that matter
 * @param faint text and lines that matter less; still readable on paper and panel
 * @param rule dividing lines
 * @param accent what is selected or has the focus
 * @param warn what is wrong
 * @param emPx the height of text in pixels
 */
public record Look(
        Color paper, Color panel, Color ink, Color faint, Color rule, Color accent, Color warn, double emPx) {
    private static final double PLAIN_EM_PX = 13;
    private static final Look LIGHT = new Look(
            Color.web("#f4f2ee"),
            Color.web("#ffffff"),
            Color.web("#1b1d1f"),
            Color.web("#565c61"),
            Color.web("#c3c0b8"),
            Color.web("#9a4a00"),
            Color.web("#a81c0c"),
            PLAIN_EM_PX);
    private static final Look DARK = new Look(
            Color.web("#16191d"),
            Color.web("#21262c"),
            Color.web("#f1f3f4"),
            Color.web("#aeb6bd"),
            Color.web("#414a53"),
            Color.web("#ffb454"),
            Color.web("#ff8d7a"),
            PLAIN_EM_PX);

    /**
     * The look that suits the user.
     *
     * @param comfort what the user chose
     * @return inks and type
     */
    public static Look of(ComfortModel comfort) {
        double emPx = PLAIN_EM_PX * comfort.textPercentProperty().get() / 100;
        return (comfort.darkProperty().get() ? DARK : LIGHT).sized(emPx);
    }

    private Look sized(double px) {
        return px == emPx ? this : new Look(paper, panel, ink, faint, rule, accent, warn, px);
    }

    /**
     * Type for a canvas.
     *
     * @param ems height in ems
     * @return the font
     */
    public Font font(double ems) {
        return Font.font(emPx * ems);
    }

    /**
     * Bold type for a canvas.
     *
     * @param ems height in ems
     * @return the font
     */
    public Font bold(double ems) {
        return Font.font(null, FontWeight.BOLD, emPx * ems);
    }

    /**
     * Has a pane that scrolls painted like any other. By default the whole of what it holds is painted into a picture of its own
     * whenever anything in it changes, for the sake of quick scrolling; that costs more than it saves where much changes and
     * little is scrolled.
     *
     * @param scroll the pane
     */
    public static void paintDirectly(ScrollPane scroll) {
        scroll.skinProperty().addListener((value, before, after) -> {
            for (Node part : scroll.lookupAll(".viewport")) {
                part.setCache(false);
                ((Parent) part).getChildrenUnmodifiable().forEach(child -> child.setCache(false));
            }
        });
    }

    /**
     * Dresses a window's root and keeps it dressed as the user's choice changes.
     *
     * @param root the root of a scene
     * @param comfort what the user chose
     */
    public static void dress(Parent root, ComfortModel comfort) {
        root.getStylesheets().add(Look.class.getResource("tideband.css").toExternalForm());
        Runnable put = () -> {
            root.setStyle("-fx-font-size: " + of(comfort).emPx() + "px;");
            root.getStyleClass().removeAll("light", "dark");
            root.getStyleClass().add(comfort.darkProperty().get() ? "dark" : "light");
        };
        comfort.darkProperty().addListener((value, before, after) -> put.run());
        comfort.textPercentProperty().addListener((value, before, after) -> put.run());
        put.run();
    }
}
