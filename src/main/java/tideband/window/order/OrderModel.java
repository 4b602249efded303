package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntConsumer;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.bench.Mend;
import tideband.bench.Obstacle;
import tideband.bench.Work;
import tideband.design.Order;
import tideband.edit.Selection;
import tideband.piece.Piece;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.Answer;
import tideband.window.work.Glance;
import tideband.window.work.WorkModel;

/**
 * The order of work: the plan as cards, or what stands in its way. While a new plan is being worked out the last one stays,
 * so that nothing flickers.
 */
public final class OrderModel {
    private final DrawingModel drawing;
    private final WorkModel work;
    private final ComfortModel comfort;
    private final OrderCommands commands;
    private final ObservableList<WorkCard> cards = FXCollections.observableArrayList();
    private final ObservableList<ObstacleNote> obstacles = FXCollections.observableArrayList();
    private final ObservableList<Caution> cautions = FXCollections.observableArrayList();
    // Kept, for listeners to a list that nothing holds would be lost with it.
    private final ObservableList<WorkCard> cardsToSee = FXCollections.unmodifiableObservableList(cards);
    private final ObservableList<ObstacleNote> obstaclesToSee = FXCollections.unmodifiableObservableList(obstacles);
    private final ObservableList<Caution> cautionsToSee = FXCollections.unmodifiableObservableList(cautions);
    private final ObjectProperty<Optional<Integer>> pointed = new SimpleObjectProperty<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Optional<Glance>> glance = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<List<Integer>> faulty = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyObjectWrapper<Piece> piece = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyStringWrapper why = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper verdict = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper saving = new ReadOnlyStringWrapper("");
    private final ReadOnlyDoubleWrapper minutes = new ReadOnlyDoubleWrapper(Double.NaN);
    private final ReadOnlyDoubleWrapper savedMin = new ReadOnlyDoubleWrapper(0);
    private final ReadOnlyBooleanWrapper leastMinutes = new ReadOnlyBooleanWrapper(false);
    private Optional<BenchPlan> plan = Optional.empty();
    private List<Obstacle> inTheWay = List.of();
    private FilmInks inks;
    private IntConsumer pace = immersion -> {};

    /**
     * Begins to follow the work.
     *
     * @param drawing the drawing, which nearest changes are made in
     * @param work the work behind it
     * @param comfort the unit lengths are shown in
     */
    public OrderModel(DrawingModel drawing, WorkModel work, ComfortModel comfort) {
        this.drawing = drawing;
        this.work = work;
        this.comfort = comfort;
        this.inks = new FilmInks(work.coloursProperty().get());
        this.commands = new OrderCommands(this, drawing, work);
        this.piece.set(drawing.design().piece());
        work.answerProperty().addListener((value, before, after) -> show());
        work.troubleProperty().addListener((value, before, after) -> say());
        comfort.unitProperty().addListener((value, before, after) -> show());
        pointed.addListener((value, before, after) -> point());
        show();
    }

    /**
     * Says who paces an immersion when that is asked for.
     *
     * @param starts is given the index of the immersion, 0-based
     */
    public void onPace(IntConsumer starts) {
        this.pace = starts;
    }

    /**
     * The acts in order; empty where the design cannot be made, or has nothing to be made.
     *
     * @return a list not to be changed
     */
    public ObservableList<WorkCard> cards() {
        return cardsToSee;
    }

    /**
     * The card that the pointer is on or that has the focus.
     *
     * @return a property of the card's index
     */
    public ObjectProperty<Optional<Integer>> pointedProperty() {
        return pointed;
    }

    /**
     * What the immersion of the card pointed at gives along the piece.
     *
     * @return a property; empty while none is pointed at
     */
    public ReadOnlyObjectProperty<Optional<Glance>> glanceProperty() {
        return glance.getReadOnlyProperty();
    }

    /**
     * Why the immersion pointed at is as it is, and what is to be known of its pull.
     *
     * @return a property, sentences; empty while none is pointed at
     */
    public ReadOnlyStringProperty whyProperty() {
        return why.getReadOnlyProperty();
    }

    /**
     * What the plan costs and how sure it is that none costs less, or that there is none.
     *
     * @return a property
     */
    public ReadOnlyStringProperty verdictProperty() {
        return verdict.getReadOnlyProperty();
    }

    /**
     * What the other rule for the order would save, once that is known.
     *
     * @return a property; empty while it is not
     */
    public ReadOnlyStringProperty savingProperty() {
        return saving.getReadOnlyProperty();
    }

    /**
     * The minutes that least-minutes would save.
     *
     * @return a property; 0 while it is not known, or nothing
     */
    public ReadOnlyDoubleProperty savedMinProperty() {
        return savedMin.getReadOnlyProperty();
    }

    /**
     * Whether the plan shown is one of least minutes.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty leastMinutesProperty() {
        return leastMinutes.getReadOnlyProperty();
    }

    /**
     * The minutes the plan costs.
     *
     * @return a property; NaN where there is no plan
     */
    public ReadOnlyDoubleProperty minutesProperty() {
        return minutes.getReadOnlyProperty();
    }

    /**
     * The cautions of the plan, the gravest first.
     *
     * @return a list not to be changed; empty where there is no plan
     */
    public ObservableList<Caution> cautions() {
        return cautionsToSee;
    }

    /**
     * What stands in the way.
     *
     * @return a list not to be changed; empty where there is a plan
     */
    public ObservableList<ObstacleNote> obstacles() {
        return obstaclesToSee;
    }

    /**
     * The bands with obstacles.
     *
     * @return a property of their indices, rising
     */
    public ReadOnlyObjectProperty<List<Integer>> faultyProperty() {
        return faulty.getReadOnlyProperty();
    }

    /**
     * The piece the cards are of.
     *
     * @return a property that is never null
     */
    public ReadOnlyObjectProperty<Piece> pieceProperty() {
        return piece.getReadOnlyProperty();
    }

    /**
     * Whether what is shown is of an earlier drawing.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty staleProperty() {
        return work.staleProperty();
    }

    /**
     * What can be done here.
     *
     * @return the commands
     */
    public List<Command> commands() {
        return commands.all();
    }

    /**
     * Makes the nearest change that takes an obstacle away, as one step that can be undone. Does nothing where there is no
     * definite change, or while the drawing has gone on and a new answer is on its way.
     *
     * @param index index of the obstacle
     */
    public void mend(int index) {
        Optional<Mend> mend = index < inTheWay.size() ? inTheWay.get(index).mend() : Optional.empty();
        mend.filter(m -> !work.staleProperty().get())
                .ifPresent(m -> drawing.change("Make the nearest change: " + m.act(), d -> m.design()));
    }

    /**
     * Selects the band an obstacle concerns, if it concerns one.
     *
     * @param index index of the obstacle
     */
    public void showBand(int index) {
        obstacles.get(index).band().ifPresent(band -> drawing.select(Selection.ofBands(List.of(band))));
    }

    /** Switches between thicker first and least minutes. */
    public void switchOrder() {
        Order other = drawing.design().order() == Order.THICKER_FIRST ? Order.LEAST_MINUTES : Order.THICKER_FIRST;
        drawing.change("Order by " + other.key(), d -> d.withOrder(other));
    }

    /** Points at the next card, or at the first. */
    public void pointNext() {
        pointAt(pointed.get().map(i -> i + 1).orElse(0));
    }

    /** Points at the card before, or at the last. */
    public void pointPrevious() {
        pointAt(pointed.get().map(i -> i - 1).orElse(cards.size() - 1));
    }

    private void pointAt(int index) {
        if (index >= 0 && index < cards.size()) {
            pointed.set(Optional.of(index));
        }
    }

    /** Paces the immersion pointed at, or the first. */
    public void paceThis() {
        if (!cards.isEmpty()) {
            pace.accept(cards.get(pointed.get().orElse(0)).immersion());
        }
    }

    private void show() {
        Optional<Answer> answer = work.answerProperty().get();
        if (answer.isEmpty()) {
            say();
            return;
        }
        if (!inks.colours().equals(answer.get().colours())) {
            inks = new FilmInks(answer.get().colours());
        }
        piece.set(answer.get().design().piece());
        Work outcome = answer.get().work();
        plan = outcome instanceof Work.Worked worked ? Optional.of(worked.plan()) : Optional.empty();
        inTheWay = outcome instanceof Work.CannotBeMade cannot ? cannot.obstacles() : List.of();
        put(
                cards,
                plan.map(p -> new CardWriter(p, inks, comfort.unit()).cards()).orElse(List.of()));
        put(obstacles, inTheWay.stream().map(OrderModel::note).toList());
        put(cautions, plan.map(BenchPlan::cautions).orElse(List.of()));
        faulty.set(obstacles.stream()
                .flatMapToInt(note -> note.band().stream())
                .sorted()
                .distinct()
                .boxed()
                .toList());
        minutes.set(plan.map(p -> p.plan().cost().minutes()).orElse(Double.NaN));
        savedMin.set(plan.map(p -> p.plan().savedByOtherOrderMin().orElse(0)).orElse(0.0));
        leastMinutes.set(
                plan.filter(p -> p.design().order() == Order.LEAST_MINUTES).isPresent());
        if (pointed.get().filter(i -> i >= cards.size()).isPresent()) {
            pointed.set(Optional.empty());
        }
        point();
        say();
    }

    private static ObstacleNote note(Obstacle obstacle) {
        return new ObstacleNote(
                obstacle.band(),
                obstacle.where(),
                obstacle.reason(),
                obstacle.change(),
                obstacle.mend().map(Mend::act).orElse(""),
                obstacle.mend().isPresent());
    }

    /** Changes only what is no longer the same, so that what shows it need not show all of it anew. */
    private static <T> void put(ObservableList<T> list, List<T> next) {
        if (list.size() != next.size()) {
            list.setAll(next);
            return;
        }
        for (int i = 0; i < next.size(); i++) {
            if (!list.get(i).equals(next.get(i))) {
                list.set(i, next.get(i));
            }
        }
    }

    private void point() {
        Optional<Integer> immersion = pointed.get()
                .filter(i -> i >= 0 && i < cards.size())
                .map(i -> cards.get(i).immersion());
        if (plan.isEmpty() || immersion.isEmpty()) {
            glance.set(Optional.empty());
            why.set("");
            return;
        }
        int index = immersion.get();
        glance.set(Optional.of(new Gives(plan.get(), index).glance()));
        List<String> sentences =
                new ArrayList<>(plan.get().plan().immersions().get(index).why());
        sentences.addAll(plan.get().pulls().get(index).notes());
        why.set(String.join(" ", sentences));
    }

    private void say() {
        String trouble = work.troubleProperty().get();
        if (!trouble.isEmpty()) {
            verdict.set(trouble);
            saving.set("");
        } else if (plan.isPresent()) {
            verdict.set(Verdict.of(plan.get()));
            saving.set(Verdict.saving(plan.get().plan()));
        } else {
            verdict.set(
                    inTheWay.isEmpty()
                            ? "The plan is being worked out."
                            : inTheWay.size() == 1
                                    ? "Cannot be made yet: 1 obstacle"
                                    : "Cannot be made yet: " + inTheWay.size() + " obstacles");
            saving.set("");
        }
    }
}
