package tideband.window.piece;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.Executor;
import java.util.concurrent.TimeUnit;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import tideband.bench.Colours;
import tideband.bench.Work;
import tideband.colour.Ciede2000;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.FilmColour;
import tideband.piece.End;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.Answer;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/**
 * What the picture of the piece shows and says.
 *
 * <p>While the newest edit is being worked out the last prediction stays, so that nothing flickers; as a rule the next is there
 * within two or three frames. Where it takes longer than {@value #PATIENCE_MS} ms the picture turns to the colours wanted, which are always
 * known, and says so, until the prediction has caught up. So the picture never shows an older drawing for more than a
 * quarter of a second.
 */
public final class PieceModel {
    /** How long a prediction may lag behind the drawing before the colours wanted take its place. */
    static final int PATIENCE_MS = 200;
    /** A step of the tilt, in degrees. */
    public static final double TILT_STEP_DEG = 5;

    private static final String CANNOT = "as wanted – it cannot be made as drawn";
    private static final String FOLLOWS = "as wanted – the prediction follows";

    private final DrawingModel drawing;
    private final WorkModel work;
    private final TiltModel tilt;
    private final ComfortModel comfort;
    private final Executor beside;
    private final Executor screen;
    private final Executor later;

    private final ObjectProperty<Lamps> lamps = new SimpleObjectProperty<>(Lamps.ONE);
    private final ObjectProperty<Comparison> comparison = new SimpleObjectProperty<>(Comparison.PREDICTED);
    private final BooleanProperty differenceShown = new SimpleBooleanProperty(false);
    private final ReadOnlyBooleanWrapper behind = new ReadOnlyBooleanWrapper(false);
    private final ReadOnlyObjectWrapper<Portrait> portrait = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<List<Differences.Point>> differences = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyObjectWrapper<List<BandReading>> readings = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyObjectWrapper<Optional<AngleTable>> table = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyStringWrapper summary = new ReadOnlyStringWrapper("");

    private AsDrawn now;
    private AsDrawn answered;
    private Optional<Strip> predicted = Optional.empty();
    private Strip wanted;
    private AngleTable.Basis basis;
    private Colours tableColours;
    private long waits;

    /**
     * A picture of the drawing's piece.
     *
     * @param drawing the drawing
     * @param work the work behind it
     * @param tilt the tilt, shared with other views
     * @param comfort what suits the user
     * @param beside runs work on another thread
     * @param screen runs what changes properties on the thread they are used on
     */
    public PieceModel(
            DrawingModel drawing,
            WorkModel work,
            TiltModel tilt,
            ComfortModel comfort,
            Executor beside,
            Executor screen) {
        this(
                drawing,
                work,
                tilt,
                comfort,
                beside,
                screen,
                CompletableFuture.delayedExecutor(PATIENCE_MS, TimeUnit.MILLISECONDS, screen));
    }

    /** The same with a clock of the caller's: {@code later} runs on the screen's thread when patience has run out. */
    PieceModel(
            DrawingModel drawing,
            WorkModel work,
            TiltModel tilt,
            ComfortModel comfort,
            Executor beside,
            Executor screen,
            Executor later) {
        this.drawing = drawing;
        this.work = work;
        this.tilt = tilt;
        this.comfort = comfort;
        this.beside = beside;
        this.screen = screen;
        this.later = later;
        work.answerProperty().addListener((value, before, after) -> takeAnswer());
        work.staleProperty().addListener((value, before, after) -> waitForAnswer());
        work.troubleProperty().addListener((value, before, after) -> show());
        drawing.designProperty().addListener((value, before, after) -> drawn());
        comparison.addListener((value, before, after) -> show());
        differenceShown.addListener((value, before, after) -> compare());
        takeAnswer();
        waitForAnswer();
    }

    /**
     * The lamps.
     *
     * @return a property that is never null
     */
    public ObjectProperty<Lamps> lampsProperty() {
        return lamps;
    }

    /**
     * Whose colours are shown.
     *
     * @return a property that is never null
     */
    public ObjectProperty<Comparison> comparisonProperty() {
        return comparison;
    }

    /**
     * Whether the difference between wanted and predicted is shown as a line along the piece.
     *
     * @return a property
     */
    public BooleanProperty differenceShownProperty() {
        return differenceShown;
    }

    /**
     * The tilt, shared with other views.
     *
     * @return a property in degrees, 0 to {@link TiltModel#MOST_DEG}
     */
    public DoubleProperty tiltDegProperty() {
        return tilt.tiltDegProperty();
    }

    /**
     * Whether the prediction has lagged behind the drawing for longer than it may, so that colours wanted stand in for it.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty behindProperty() {
        return behind.getReadOnlyProperty();
    }

    /**
     * Every band in words and numbers, as of the latest answer.
     *
     * @return a property; empty until the first answer is there
     */
    public ReadOnlyObjectProperty<List<BandReading>> readingsProperty() {
        return readings.getReadOnlyProperty();
    }

    /**
     * The whole picture in a sentence, to be read out.
     *
     * @return a property
     */
    public ReadOnlyStringProperty summaryProperty() {
        return summary.getReadOnlyProperty();
    }

    /**
     * What the picture shows.
     *
     * @return a property that is never null
     */
    ReadOnlyObjectProperty<Portrait> portraitProperty() {
        return portrait.getReadOnlyProperty();
    }

    /**
     * The difference between wanted and predicted along the piece.
     *
     * @return a property; empty while it is not shown or nothing is predicted
     */
    ReadOnlyObjectProperty<List<Differences.Point>> differencesProperty() {
        return differences.getReadOnlyProperty();
    }

    /**
     * Colours under angles.
     *
     * @return a property; empty until they have been worked out for the drawing's metal, finish and light
     */
    ReadOnlyObjectProperty<Optional<AngleTable>> tableProperty() {
        return table.getReadOnlyProperty();
    }

    /**
     * What is selected in the drawing.
     *
     * @return a property
     */
    public ReadOnlyObjectProperty<Selection> selectionProperty() {
        return drawing.selectionProperty();
    }

    /**
     * Selects the band at a place.
     *
     * @param atMm position in mm from end A; nothing happens off the piece
     */
    public void selectAt(double atMm) {
        if (atMm >= 0 && atMm <= drawing.design().piece().lengthMm()) {
            select(now().bandAt(atMm));
        }
    }

    /**
     * Selects a band.
     *
     * @param band its index, 0-based
     */
    public void select(int band) {
        drawing.select(Selection.of(new Part.Level(band)));
    }

    /**
     * What is at a place, as far as the picture shows it.
     *
     * @param atMm position in mm from end A
     * @return the reading, or nothing off the piece
     */
    public Optional<PlaceReading> readingAt(double atMm) {
        if (!(atMm >= 0 && atMm <= portrait.get().piece().lengthMm())) {
            return Optional.empty();
        }
        Strip strip = portrait.get().lower();
        Strip.Stretch stretch = strip.get(strip.indexAt(atMm));
        boolean asPredicted = predicted.isPresent() && strip == predicted.get();
        AsDrawn drawn = asPredicted ? answered : now();
        int band = drawn.bandAt(atMm);
        double filmNm = asPredicted ? stretch.filmNm() : drawn.filmNmAt(band, atMm);
        OptionalDouble de00 = !asPredicted
                ? OptionalDouble.empty()
                : drawn.labAt(band, atMm)
                        .map(lab -> OptionalDouble.of(Ciede2000.between(lab, stretch.lab())))
                        .orElse(OptionalDouble.empty());
        return Optional.of(new PlaceReading(atMm, band, filmNm, colourWords(drawn, filmNm), de00));
    }

    private static String colourWords(AsDrawn drawn, double filmNm) {
        if (filmNm > drawn.colours().palette().maxNm()) {
            return "colour not known";
        }
        FilmColour colour = drawn.colours().ofFilm(filmNm);
        return colour.name().text() + " (" + colour.order() + ")";
    }

    /**
     * A length as it is shown.
     *
     * @param mm the length in mm
     * @return such as {@code 62.3 mm}
     */
    public String length(double mm) {
        return comfort.unit().text(Math.rint(mm * 100) / 100);
    }

    /**
     * What the user can do here.
     *
     * @return the commands
     */
    public List<Command> commands() {
        return new PieceCommands(this).all();
    }

    private AsDrawn now() {
        Design design = drawing.design();
        Colours colours = work.coloursProperty().get();
        if (now == null || !now.design().equals(design) || !now.colours().equals(colours)) {
            now = AsDrawn.of(design, colours);
            wanted = null;
        }
        return now;
    }

    private Strip wanted() {
        AsDrawn drawn = now();
        if (wanted == null) {
            wanted = Strip.of(drawn, drawn.colours());
        }
        return wanted;
    }

    private void takeAnswer() {
        Optional<Answer> answer = work.answerProperty().get();
        if (answer.isPresent()) {
            Answer latest = answer.get();
            answered = AsDrawn.of(latest);
            predicted = latest.work() instanceof Work.Worked worked
                    ? Optional.of(Strip.of(worked.plan().trial(), latest.colours()))
                    : Optional.empty();
            readings.set(Readings.of(answered, latest.work()));
            waits++;
            // Once behind, an answer to an older drawing would only make the picture jump back.
            behind.set(behind.get() && !latest.design().equals(drawing.design()));
            keepTable(latest);
        }
        show();
        compare();
        waitForAnswer();
    }

    private void drawn() {
        if (behind.get() || predicted.isEmpty() || comparison.get() != Comparison.PREDICTED) {
            show();
        }
        waitForAnswer();
    }

    /** From now on, or from the last answer, the next has so long to come. */
    private void waitForAnswer() {
        if (!work.staleProperty().get()) {
            waits++;
            if (behind.get()) {
                behind.set(false);
                show();
            }
        } else if (!behind.get()) {
            long wait = waits;
            later.execute(() -> {
                if (wait == waits && work.staleProperty().get() && !behind.get()) {
                    behind.set(true);
                    show();
                }
            });
        }
    }

    private void show() {
        boolean asWanted = behind.get() || predicted.isEmpty() || comparison.get() == Comparison.WANTED;
        AsDrawn drawn = asWanted ? now() : answered;
        Strip lower = asWanted ? wanted() : predicted.get();
        Strip upper = comparison.get() == Comparison.BOTH && !asWanted ? wanted() : lower;
        Portrait next = new Portrait(
                drawn.design().piece(), drawn.design().finish(), upper, lower, dry(drawn.design()), note());
        portrait.set(next);
        summary.set(summary(drawn.design(), next));
    }

    private String note() {
        if (!work.troubleProperty().get().isEmpty()) {
            return "as wanted – the plan could not be worked out";
        }
        if (behind.get()) {
            return FOLLOWS;
        }
        if (predicted.isPresent()) {
            return "";
        }
        return work.answerProperty().get().isPresent() ? CANNOT : FOLLOWS;
    }

    private String summary(Design design, Portrait shown) {
        StringBuilder text = new StringBuilder("Picture of ")
                .append(design.title())
                .append(", ")
                .append(length(design.piece().lengthMm()))
                .append(" long, ")
                .append(design.bands().size())
                .append(design.bands().size() == 1 ? " band, " : " bands, ");
        String plainly = comparison.get() == Comparison.WANTED ? "colours as wanted" : "colours as predicted";
        String noted = shown.note().isEmpty() ? plainly : shown.note();
        text.append(shown.split() ? "wanted above predicted" : noted);
        for (BandReading reading : readings.get()) {
            text.append("; ").append(reading.title()).append(": ").append(reading.colourWords());
            text.append(", ").append(reading.differenceWords());
        }
        return text.append('.').toString();
    }

    /** The dry lengths at the ends that are up in some immersion of the plan, or, without a plan, that may be. */
    private List<Portrait.Dry> dry(Design design) {
        double dryMm = design.holding().dryMm();
        List<Portrait.Dry> lengths = new ArrayList<>();
        for (End down : End.values()) {
            if (dryMm > 0 && goesDown(design, down)) {
                double lengthMm = design.piece().lengthMm();
                lengths.add(down == End.A ? new Portrait.Dry(lengthMm - dryMm, lengthMm) : new Portrait.Dry(0, dryMm));
            }
        }
        return lengths;
    }

    private boolean goesDown(Design design, End end) {
        Optional<Work> answer = work.answerProperty().get().map(Answer::work);
        if (answer.isPresent() && answer.get() instanceof Work.Worked worked) {
            return worked.plan().plan().immersions().stream().anyMatch(immersion -> immersion.endDown() == end);
        }
        return design.holding().endsDown().contains(end);
    }

    private void compare() {
        differences.set(
                differenceShown.get() && predicted.isPresent() ? Differences.of(answered, predicted.get()) : List.of());
    }

    /** Builds another table where the colours have changed; colours of an earlier design, kept where there are none for this, do not. */
    private void keepTable(Answer answer) {
        if (answer.colours().equals(tableColours)) {
            return;
        }
        tableColours = answer.colours();
        Design design = answer.design();
        AngleTable.Basis next = new AngleTable.Basis(
                design.metal().opticsKey(),
                design.bath().indexScale(),
                design.finish(),
                answer.colours().viewing(),
                answer.colours().palette().maxNm());
        if (!next.equals(basis)) {
            basis = next;
            table.set(Optional.empty());
            beside.execute(() -> build(new AngleTable.Builder(next), next));
        }
    }

    /** One angle at a time, so that planning comes between. */
    private void build(AngleTable.Builder builder, AngleTable.Basis wantedBasis) {
        builder.step();
        screen.execute(() -> {
            if (!wantedBasis.equals(basis)) {
                return;
            }
            if (builder.complete()) {
                table.set(Optional.of(builder.table()));
            } else {
                beside.execute(() -> build(builder, wantedBasis));
            }
        });
    }
}
