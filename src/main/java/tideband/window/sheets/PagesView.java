package tideband.window.sheets;

import java.util.Locale;
import java.util.Optional;
import javafx.beans.InvalidationListener;
import javafx.geometry.Insets;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.image.Image;
import javafx.scene.image.ImageView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import tideband.sheet.Paper;

/** The pages of the step sheet, one at a time. */
final class PagesView extends BorderPane {
    private static final double MM_PER_INCH = 25.4;
    private static final double FINEST_DPI = 220;
    private static final double COARSEST_DPI = 40;

    private final PagesModel model;
    private final ShownSheets sheets;
    private final ImageView image = new ImageView();
    private final StackPane page = new StackPane();
    private final Label cautions = SheetsFormView.plain("");
    private final ScrollPane scroll = new ScrollPane();
    private final Label number = new Label();
    private final Button back = new Button("\u25c0 Previous");
    private final Button on = new Button("Next \u25b6");
    private final ToggleButton whole = new ToggleButton("Whole page");
    private final InvalidationListener turned = o -> told();
    private final InvalidationListener drawn = o -> show();

    PagesView(PagesModel model, ShownSheets sheets) {
        this.model = model;
        this.sheets = sheets;
        page.getChildren().setAll(image);
        page.getStyleClass().add("page");
        VBox.setVgrow(page, Priority.ALWAYS);
        image.setPreserveRatio(true);
        image.setSmooth(true);
        VBox content = new VBox(cautions(), page);
        content.getStyleClass().add("pages-content");
        scroll.setContent(content);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        scroll.getStyleClass().add("pages");
        scroll.setFocusTraversable(true);
        scroll.setMinSize(0, 0);
        scroll.viewportBoundsProperty().addListener(o -> fit());
        scroll.setAccessibleHelp("Page up and page down turn pages, arrow keys move the page");
        whole.selectedProperty().addListener(o -> fit());
        setTop(bar());
        setCenter(scroll);
        addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        model.pageProperty().addListener(turned);
        model.paperProperty().addListener(turned);
        model.pictureProperty().addListener(drawn);
        told();
        show();
    }

    /** Lets go of the model. */
    void dispose() {
        model.pageProperty().removeListener(turned);
        model.paperProperty().removeListener(turned);
        model.pictureProperty().removeListener(drawn);
    }

    @Override
    public void requestFocus() {
        scroll.requestFocus();
    }

    private Label cautions() {
        cautions.setText(sheets.cautionCount() + " cautions apply to this plan and stand in full on the sheet: "
                + sheets.cautions() + ". Read them before you switch on.");
        cautions.getStyleClass().add("warning");
        cautions.getStyleClass().add("pages-cautions");
        cautions.setMaxWidth(Double.MAX_VALUE);
        return cautions;
    }

    private FlowPane bar() {
        back.setOnAction(e -> model.turn(-1));
        back.setTooltip(new Tooltip("The page before (Page up)"));
        back.setAccessibleText("Page before");
        on.setOnAction(e -> model.turn(1));
        on.setTooltip(new Tooltip("The next page (Page down)"));
        on.setAccessibleText("Next page");
        whole.setTooltip(new Tooltip("Shows the whole page instead of its full width"));
        whole.setAccessibleText("Show the whole page");
        ComboBox<Paper> paper = new ComboBox<>();
        paper.getItems().setAll(Paper.values());
        paper.setConverter(new StringConverter<>() {
            @Override
            public String toString(Paper one) {
                return one == Paper.A4 ? "A4" : "Letter";
            }

            @Override
            public Paper fromString(String text) {
                throw new UnsupportedOperationException("the choice is not typed");
            }
        });
        paper.valueProperty().bindBidirectional(model.paperProperty());
        paper.setAccessibleText("Paper");
        paper.setTooltip(new Tooltip("The paper that is printed on"));
        number.setMinWidth(Region.USE_PREF_SIZE);
        FlowPane bar = new FlowPane(back, number, on, whole, paper);
        bar.setStyle("-fx-hgap: 0.6em; -fx-vgap: 0.3em; -fx-padding: 0.5em 1em; -fx-row-valignment: center;");
        return bar;
    }

    private void key(KeyEvent e) {
        if (e.getCode() == KeyCode.PAGE_DOWN) {
            model.turn(1);
        } else if (e.getCode() == KeyCode.PAGE_UP) {
            model.turn(-1);
        } else if (e.getCode() == KeyCode.HOME && e.isShortcutDown()) {
            model.turn(-model.count());
        } else if (e.getCode() == KeyCode.END && e.isShortcutDown()) {
            model.turn(model.count());
        } else {
            return;
        }
        e.consume();
    }

    private void told() {
        int at = model.pageProperty().get() + 1;
        int of = model.count();
        number.setText(String.format(Locale.ROOT, "Page %d of %d", at, of));
        scroll.setAccessibleText(number.getText() + " of the step sheet");
        image.setAccessibleText(scroll.getAccessibleText());
        // They lie on the first page, so that the others have all the room.
        cautions.setVisible(at == 1);
        cautions.setManaged(at == 1);
        boolean stuck = (at == 1 && back.isFocused()) || (at == of && on.isFocused());
        back.setDisable(at == 1);
        on.setDisable(at == of);
        if (stuck) {
            scroll.requestFocus();
        }
    }

    private void show() {
        Optional<PagePicture> picture = model.pictureProperty().get();
        boolean other = picture.isPresent() && !picture.get().equals(image.getUserData());
        if (other) {
            image.setImage(new Image(picture.get().png()));
            image.setUserData(picture.get());
            scroll.setVvalue(0);
            fit();
        }
    }

    private void fit() {
        Insets around = page.getInsets();
        double wide = Math.floor(scroll.getViewportBounds().getWidth() - around.getLeft() - around.getRight());
        double high = Math.floor(scroll.getViewportBounds().getHeight() - around.getTop() - around.getBottom());
        if (wide < 50 || high < 50) {
            return;
        }
        Paper paper = model.paperProperty().get();
        double width = whole.isSelected() ? Math.min(wide, high * paper.widthMm() / paper.heightMm()) : wide;
        image.setFitWidth(width);
        model.fineness(Math.rint(Math.min(Math.max(width * MM_PER_INCH / paper.widthMm(), COARSEST_DPI), FINEST_DPI)));
    }
}
