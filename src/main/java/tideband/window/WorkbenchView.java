package tideband.window;

import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import javafx.beans.binding.Bindings;
import javafx.geometry.Orientation;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.window.action.Command;
import tideband.window.action.MenusView;
import tideband.window.action.ToolsView;
import tideband.window.action.ToolsView.Tool;
import tideband.window.bands.BandsView;
import tideband.window.bands.ReadoutView;
import tideband.window.colour.WantedView;
import tideband.window.field.FieldView;
import tideband.window.look.Look;
import tideband.window.order.OrderView;
import tideband.window.piece.PieceView;
import tideband.window.settings.SettingsView;
import tideband.window.status.StatusView;

/**
 * How the window is arranged: the field over the piece on one scale, numbers and settings beside them, the order of work
 * below. Where there is too little room it scrolls as a whole.
 */
final class WorkbenchView extends BorderPane {
    private static final double BESIDE_SHARE = 0.7;
    private static final double UPPER_SHARE = 0.75;
    private static final double PIECE_SHARE = 0.23;
    private static final double LEAST_PIECE_PX = 40;
    /** The commands that begin a group within their menu. */
    private static final Set<String> GROUPS = Set.of(
            "save-drawing",
            "export-sheets",
            "quit",
            "join-next",
            "insert-band",
            "bare-band",
            "select-all-bands",
            "nudge-right",
            "exact-values",
            "tilt-more",
            "larger-text",
            "switch-unit");

    private final FieldView field;
    private final OrderView order;
    private final TabPane beside = new TabPane();
    private final MenusView menus;

    /**
     * An arrangement.
     *
     * @param model the models of all parts
     * @param commands all commands, those of documents among them
     */
    WorkbenchView(WorkbenchModel model, List<Command> commands) {
        field = new FieldView(model.field(), model.comfort());
        PieceView piece =
                new PieceView(model.piece(), model.comfort(), model.field().viewportProperty());
        ReadoutView readout =
                new ReadoutView(model.piece(), model.comfort(), model.field().viewportProperty());
        VBox drawing = new VBox(field, piece, readout);
        VBox.setVgrow(field, Priority.ALWAYS);
        drawing.setMinWidth(Region.USE_PREF_SIZE);
        // The field comes first; the piece has its share of a tall window, and its least height in a low one.
        piece.prefHeightProperty()
                .bind(Bindings.max(LEAST_PIECE_PX, drawing.heightProperty().multiply(PIECE_SHARE)));

        Tab exact = tab("Bands", "The bands in exact numbers");
        Tab colour = tab("Colour", "From a wanted colour to the films that come near");
        Tab bench = tab("Bench", "Metal, bath, supply, holder, vessel, hand and times");
        beside.getTabs().setAll(exact, colour, bench);
        beside.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        beside.setAccessibleText("Numbers and settings");
        beside.getStyleClass().add("beside");
        LateTab<WantedView> wanted = new LateTab<>(colour, () -> new WantedView(model.wanted(), model.comfort()));
        LateTab<SettingsView> settings =
                new LateTab<>(bench, () -> new SettingsView(model.settings(), model.comfort()));
        // Listening before the parts do, so that a part called to the front is there when it takes the focus.
        model.wanted()
                .callsForEntryProperty()
                .addListener((value, before, after) -> front(wanted, WantedView::callForEntry));
        model.wanted()
                .callsForImageProperty()
                .addListener((value, before, after) -> front(wanted, WantedView::callForImage));
        model.settings()
                .calledProperty()
                .addListener((value, before, after) -> front(settings, SettingsView::focusFirst));
        model.bands().calledProperty().addListener((value, before, after) -> front(exact));
        model.field().exactValuesProperty().set(model.bands()::call);
        exact.setContent(new BandsView(model.bands(), model.comfort()));

        SplitPane upper = new SplitPane(drawing, beside);
        upper.setDividerPositions(BESIDE_SHARE);
        SplitPane.setResizableWithParent(beside, false);
        order = new OrderView(model.order(), model.comfort());
        SplitPane all = new SplitPane(upper, order);
        all.setOrientation(Orientation.VERTICAL);
        all.setDividerPositions(UPPER_SHARE);
        SplitPane.setResizableWithParent(order, false);

        menus = new MenusView(commands, GROUPS);
        ScrollPane room = new ScrollPane(all);
        room.setFitToWidth(true);
        room.setFitToHeight(true);
        room.getStyleClass().add("room");
        Look.paintDirectly(room);
        List.of(upper, all, room).forEach(WorkbenchView::leaveBare);
        ToolsView tools = new ToolsView(commands, tools());
        menus.setMinWidth(Region.USE_PREF_SIZE);
        tools.setMinWidth(0);
        HBox.setHgrow(tools, Priority.ALWAYS);
        HBox top = new HBox(menus, tools);
        top.setAlignment(Pos.CENTER_LEFT);
        top.getStyleClass().add("top");
        setTop(top);
        setCenter(room);
        setBottom(new StatusView(model.status()));
    }

    FieldView field() {
        return field;
    }

    OrderView order() {
        return order;
    }

    MenusView menus() {
        return menus;
    }

    /** What lies on the window's own ground needs none of its own: each is one more layer to be painted in every frame. */
    private static void leaveBare(Region region) {
        region.setStyle("-fx-background-color: null;");
    }

    private void front(Tab tab) {
        beside.getSelectionModel().select(tab);
    }

    /** Brings a tab to the front. A part made only now has not heard the call, and is told. */
    private <T extends Node> void front(LateTab<T> late, Consumer<T> call) {
        boolean made = late.made();
        front(late.tab());
        if (!made) {
            // Else what scrolls would not be in the scene yet, and nothing in it could take the focus.
            late.content().applyCss();
            call.accept(late.content());
        }
    }

    private static Tab tab(String title, String help) {
        Tab tab = new Tab(title);
        tab.setTooltip(new Tooltip(help));
        return tab;
    }

    private static List<List<Tool>> tools() {
        return List.of(
                List.of(new Tool("save-drawing", "Save")),
                List.of(new Tool("undo", "Undo"), new Tool("redo", "Redo")),
                List.of(
                        new Tool("split-here", "Split"),
                        new Tool("join-next", "Join"),
                        new Tool("insert-band", "Insert"),
                        new Tool("delete-bands", "Delete"),
                        new Tool("bare-band", "Bare"),
                        new Tool("edge-kind", "Crisp/soft")),
                List.of(new Tool("fit-field", "Fit")),
                List.of(new Tool("print-sheets", "Print"), new Tool("pace-immersion", "Pace")));
    }
}
