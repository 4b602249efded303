package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.animation.PauseTransition;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.value.ObservableBooleanValue;
import javafx.collections.FXCollections;
import javafx.collections.ListChangeListener;
import javafx.collections.ObservableList;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.util.Duration;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** The order of work as a strip: a line that judges the plan, the cards, and why the one pointed at is there. */
public final class OrderView extends BorderPane {
    private static final Duration PATIENCE = Duration.millis(250);
    private static final double OUT_OF_DATE = 0.6;
    private static final double GAP_EM = 0.5;
    private static final double BAR_EM = 1.2;
    private static final double WHY_EM = 17;
    private static final double WHY_SHARE = 0.26;

    private final OrderModel order;
    private final ComfortModel comfort;
    // The places of the cards rather than the cards: a card that changes is painted anew where it stands, and the list,
    // which
    // would lay out and style all its cells, does not hear of it.
    private final ObservableList<Integer> places = FXCollections.observableArrayList();
    private final ListView<Integer> strip = new ListView<>(places);
    private final List<CardCell> cells = new ArrayList<>();
    private final List<ObstacleCard> obstacleCards = new ArrayList<>();
    private final HBox obstacleRow = new HBox();
    private final ScrollPane obstacles = new ScrollPane(obstacleRow);
    private final Label why = new Label();
    private final ScrollPane whyPane = new ScrollPane(why);
    private final StackPane middle = new StackPane();
    private final PauseTransition patience = new PauseTransition(PATIENCE);
    private boolean byPointer;

    /**
     * A strip.
     *
     * @param order what it shows
     * @param comfort what suits the user
     */
    public OrderView(OrderModel order, ComfortModel comfort) {
        this.order = order;
        this.comfort = comfort;
        getStylesheets().add(OrderView.class.getResource("order.css").toExternalForm());
        getStyleClass().add("order");
        setAccessibleText("Order of work");
        VerdictLine line = new VerdictLine(order);
        CautionsPane cautions = new CautionsPane(order);
        cautions.visibleProperty().bind(line.allCautionsProperty());
        setTop(line);
        cards();
        obstacles();
        whyPane(line.allCautionsProperty());
        Label nothing =
                new Label("Every band is bare, so there is nothing to do. Give a band a film, volts or a colour.");
        nothing.getStyleClass().add("faint");
        nothing.setWrapText(true);
        BooleanBinding bare = Bindings.isEmpty(order.cards())
                .and(Bindings.isEmpty(order.obstacles()))
                .and(order.minutesProperty().isEqualTo(0));
        nothing.visibleProperty().bind(bare);
        strip.visibleProperty()
                .bind(Bindings.isNotEmpty(order.cards())
                        .and(line.allCautionsProperty().not()));
        obstacles.visibleProperty().bind(Bindings.isNotEmpty(order.obstacles()));
        middle.getChildren().addAll(nothing, strip, obstacles, cautions);
        setCenter(middle);
        addEventHandler(KeyEvent.KEY_PRESSED, event -> {
            if (event.getCode() == KeyCode.ESCAPE && line.allCautionsProperty().get()) {
                line.allCautionsProperty().set(false);
                event.consume();
            }
        });
        dimWhenOutOfDate();
        comfort.darkProperty().addListener((value, before, after) -> dress());
        comfort.textPercentProperty().addListener((value, before, after) -> dress());
        order.pieceProperty().addListener((value, before, after) -> paintAll());
        dress();
    }

    private void cards() {
        strip.setOrientation(Orientation.HORIZONTAL);
        strip.getStyleClass().add("work-strip");
        strip.setAccessibleText("Order of work, one card an act");
        strip.setCellFactory(list -> {
            CardCell cell = new CardCell(order, comfort, this::pointByPointer);
            cells.add(cell);
            return cell;
        });
        order.cards().addListener((ListChangeListener<WorkCard>) change -> showCards());
        showCards();
        strip.setOnMouseExited(event -> point(focusedCard()));
        strip.focusedProperty().addListener((value, before, after) -> {
            if (after && strip.getFocusModel().getFocusedIndex() < 0) {
                strip.getFocusModel().focus(0);
            }
            // Why a card is there stays readable while it is scrolled with the keys.
            if (!strip.isHover() && !whyPane.isFocused()) {
                order.pointedProperty().set(focusedCard());
            }
        });
        whyPane.focusedProperty().addListener((value, before, after) -> {
            if (!after && !strip.isHover()) {
                order.pointedProperty().set(focusedCard());
            }
        });
        strip.getFocusModel().focusedIndexProperty().addListener((value, before, after) -> {
            if (strip.isFocused() && after.intValue() >= 0) {
                order.pointedProperty().set(Optional.of(after.intValue()));
            }
        });
        order.pointedProperty().addListener((value, before, after) -> {
            if (!byPointer) {
                after.ifPresent(this::bringIntoSight);
            }
            paintAll();
        });
    }

    private void showCards() {
        int count = order.cards().size();
        if (places.size() > count) {
            places.remove(count, places.size());
        }
        while (places.size() < count) {
            places.add(places.size());
        }
        paintAll();
    }

    private void pointByPointer(int index) {
        point(Optional.of(index));
    }

    /** Points without moving the strip: what is under the pointer must stay there. */
    private void point(Optional<Integer> index) {
        byPointer = true;
        order.pointedProperty().set(index);
        byPointer = false;
    }

    private Optional<Integer> focusedCard() {
        int index = strip.getFocusModel().getFocusedIndex();
        return strip.isFocused() && index >= 0 ? Optional.of(index) : Optional.empty();
    }

    private void bringIntoSight(int index) {
        if (strip.getFocusModel().getFocusedIndex() != index) {
            strip.getSelectionModel().clearAndSelect(index);
        }
        boolean seen = cells.stream().anyMatch(cell -> !cell.isEmpty() && cell.getIndex() == index && wholly(cell));
        if (!seen) {
            strip.scrollTo(index);
        }
    }

    private boolean wholly(Node cell) {
        double x = cell.localToScene(0, 0).getX() - strip.localToScene(0, 0).getX();
        return x >= 0 && x + CardPainter.WIDTH_EM * Look.of(comfort).emPx() <= strip.getWidth();
    }

    private void obstacles() {
        obstacles.getStyleClass().add("obstacles");
        obstacleRow.getStyleClass().add("obstacle-row");
        obstacles.setAccessibleText("What stands in the way");
        order.obstacles().addListener((ListChangeListener<ObstacleNote>) change -> showObstacles());
        showObstacles();
    }

    private void showObstacles() {
        int count = order.obstacles().size();
        while (obstacleCards.size() < count) {
            obstacleCards.add(new ObstacleCard(order, obstacleCards.size(), this::requestFocus));
        }
        for (int i = 0; i < count; i++) {
            obstacleCards.get(i).show(order.obstacles().get(i));
        }
        if (obstacleRow.getChildren().size() != count) {
            obstacleRow.getChildren().setAll(obstacleCards.subList(0, count));
        }
    }

    private void whyPane(ObservableBooleanValue allCautions) {
        why.setWrapText(true);
        why.setMinHeight(Region.USE_PREF_SIZE);
        why.textProperty()
                .bind(Bindings.when(order.whyProperty().isEmpty())
                        .then(
                                "Point at a card, or move to it with the arrow keys, to see why that immersion is as it is.")
                        .otherwise(order.whyProperty()));
        whyPane.getStyleClass().add("why");
        whyPane.setFitToWidth(true);
        Look.paintDirectly(whyPane);
        whyPane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        whyPane.setAccessibleText("Why this immersion");
        whyPane.setFocusTraversable(true);
        BooleanBinding planned = Bindings.isNotEmpty(order.cards()).and(Bindings.not(allCautions));
        whyPane.visibleProperty().bind(planned);
        whyPane.managedProperty().bind(planned);
        setRight(whyPane);
    }

    private void dimWhenOutOfDate() {
        patience.setOnFinished(event -> middle.setOpacity(OUT_OF_DATE));
        order.staleProperty().addListener((value, before, after) -> {
            if (after) {
                patience.playFromStart();
            } else {
                patience.stop();
                middle.setOpacity(1);
                handOnFocus();
            }
        });
    }

    /** After a change that was made here: to the cards there are now, or to what still stands in the way. */
    private void handOnFocus() {
        if (!isFocused()) {
            return;
        }
        if (strip.isVisible()) {
            strip.requestFocus();
        } else if (!order.obstacles().isEmpty()) {
            obstacleCards.get(0).takeFocus();
        }
    }

    private void dress() {
        double em = Look.of(comfort).emPx();
        strip.setFixedCellSize((CardPainter.WIDTH_EM + GAP_EM) * em);
        double height = (CardPainter.HEIGHT_EM + BAR_EM) * em;
        middle.setMinHeight(height);
        middle.setPrefHeight(height);
        whyPane.prefWidthProperty()
                .bind(Bindings.min(WHY_EM * em, widthProperty().multiply(WHY_SHARE)));
        whyPane.setPrefHeight(height);
        obstacleCards.forEach(Region::requestLayout);
        paintAll();
    }

    private void paintAll() {
        cells.forEach(CardCell::refresh);
    }
}
