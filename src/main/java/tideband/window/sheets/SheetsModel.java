package tideband.window.sheets;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.bench.BenchPlan;
import tideband.bench.BenchPlanner;
import tideband.bench.Colours;
import tideband.bench.Obstacle;
import tideband.bench.Work;
import tideband.design.Band;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.sheet.Exports;
import tideband.sheet.InstalledPrinter;
import tideband.sheet.Paper;
import tideband.sheet.SheetPrinter;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.Answer;
import tideband.window.work.WorkModel;

/** Exports and prints the sheets of the drawing as it stands, one errand at a time. */
public final class SheetsModel {
    /** How often the planner tells what it is doing. */
    private static final int PLANNING_STAGES = 4;

    private static final Standing IDLE = new Standing.Idle();

    /** Looks for printers. */
    interface Printers {
        List<SheetPrinter> found() throws IOException;
    }

    /** Does an errand with a finished plan. */
    private interface Deed {
        Standing done(BenchPlan plan, Colours colours, Steps steps) throws IOException;
    }

    private final DrawingModel drawing;
    private final WorkModel work;
    private final Executor beside;
    private final Executor screen;
    private final Printers printers;
    private final SheetsForm form;
    private final ReadOnlyObjectWrapper<Standing> standing = new ReadOnlyObjectWrapper<>(IDLE);
    private final PagesModel pages;
    // Where "back" leads.
    private final Deque<Standing> trail = new ArrayDeque<>();
    private AtomicBoolean calledOff = new AtomicBoolean();
    private Runnable replacing = () -> {};

    /**
     * Sheets of a drawing; they are written below the user's home until another folder is named.
     *
     * @param drawing the drawing
     * @param work the work behind it
     * @param beside runs what takes long on another thread
     * @param screen runs what changes properties on the thread they are used on
     */
    public SheetsModel(DrawingModel drawing, WorkModel work, Executor beside, Executor screen) {
        this(
                drawing,
                work,
                beside,
                screen,
                InstalledPrinter::found,
                Path.of(System.getProperty("user.home"), "tideband-sheets"),
                Locale.getDefault());
    }

    SheetsModel(
            DrawingModel drawing,
            WorkModel work,
            Executor beside,
            Executor screen,
            Printers printers,
            Path folder,
            Locale place) {
        this.drawing = drawing;
        this.work = work;
        this.beside = beside;
        this.screen = screen;
        this.printers = printers;
        this.form = new SheetsForm(folder);
        this.pages = new PagesModel(Paper.usualIn(place), beside, screen);
    }

    /** Asks where the sheets are to go, unless the drawing is known not to be makeable. */
    public void export() {
        begin(Errand.EXPORT, () -> {
            form.offer(drawing.design().title());
            go(new Standing.Asked(Errand.EXPORT));
        });
    }

    /** Makes the step sheets and shows them. */
    public void print() {
        begin(Errand.PRINT, () -> run(Errand.PRINT, PLANNING_STAGES + 2, this::sheets));
    }

    private void begin(Errand errand, Runnable first) {
        if (standing.get() instanceof Standing.Working) {
            return;
        }
        trail.clear();
        standing.set(IDLE);
        Optional<Work> known = answer().map(Answer::work);
        if (known.isPresent() && known.get() instanceof Work.CannotBeMade cannot) {
            go(new Standing.Refused(errand, cannot.obstacles()));
        } else {
            first.run();
        }
    }

    private Optional<Answer> answer() {
        return work.answerProperty().get().filter(a -> a.design().equals(drawing.design()));
    }

    /** Asks where the step sheet shown is to go as a PDF. */
    public void askForPdf() {
        if (standing.get() instanceof Standing.Shown) {
            go(new Standing.Asked(Errand.PRINT));
        }
    }

    /** Writes what was asked for where the form says; asks first if files are there already. */
    public void write() {
        if (standing.get() instanceof Standing.Asked asked
                && form.faultProperty().get().isEmpty()) {
            Path folder = form.path().orElseThrow();
            String name = form.nameProperty().get();
            if (asked.errand() == Errand.EXPORT) {
                writeAll(folder, name, form.pngProperty().get());
            } else if (trail.peek() instanceof Standing.Shown shown) {
                writePdf(
                        shown.sheets(),
                        folder,
                        name + Exports.steps(pages.paperProperty().get()));
            }
        }
    }

    private void writeAll(Path folder, String name, boolean png) {
        int stages = PLANNING_STAGES + Exports.stages(png);
        guarded(
                Errand.EXPORT,
                folder,
                Exports.names(name, png),
                () -> run(Errand.EXPORT, stages, (plan, colours, steps) -> {
                    List<Path> files = Exports.write(plan, colours, folder, name, png, steps, steps);
                    return new Standing.Written(Errand.EXPORT, folder, files);
                }));
    }

    private void writePdf(ShownSheets sheets, Path folder, String name) {
        byte[] pdf = sheets.pdf(pages.paperProperty().get());
        guarded(
                Errand.PRINT,
                folder,
                List.of(name),
                () -> start(Errand.PRINT, 1, steps -> {
                    steps.accept("writing the step sheet");
                    Path file = folder.resolve(name);
                    Files.createDirectories(folder);
                    Exports.write(file, pdf);
                    return new Standing.Written(Errand.PRINT, folder, List.of(file));
                }));
    }

    private void guarded(Errand errand, Path folder, List<String> names, Runnable writing) {
        List<String> existing = SheetsForm.existing(folder, names);
        if (existing.isEmpty()) {
            writing.run();
        } else {
            replacing = writing;
            go(new Standing.InTheWay(errand, folder, existing));
        }
    }

    /** Replaces the files that are in the way. */
    public void replace() {
        if (standing.get() instanceof Standing.InTheWay) {
            replacing.run();
        }
    }

    /**
     * Prints the pages shown.
     *
     * @param printer the printer
     */
    public void printOn(SheetPrinter printer) {
        if (standing.get() instanceof Standing.Shown shown) {
            Paper on = pages.paperProperty().get();
            int count = shown.sheets().pages(on);
            start(Errand.PRINT, count, steps -> {
                try {
                    printer.print(shown.sheets().pdf(on), on, steps, steps);
                } catch (CancellationException off) {
                    return new Standing.CalledOff(Errand.PRINT, true);
                } catch (IOException e) {
                    return Trouble.printing(printer.name(), e);
                }
                return new Standing.Printed(printer.name(), count);
            });
        }
    }

    /** Calls off what is being done. */
    public void cancel() {
        if (standing.get() instanceof Standing.Working working) {
            calledOff.set(true);
            standing.set(new Standing.Working(working.errand(), working.stage(), working.share(), true));
        }
    }

    /** Goes back to what the user was asked or shown before. */
    public void back() {
        if (!(standing.get() instanceof Standing.Working)) {
            standing.set(trail.isEmpty() ? IDLE : trail.pop());
        }
    }

    /** Has done with it; what is being done is called off instead. */
    public void close() {
        if (standing.get() instanceof Standing.Working) {
            cancel();
        } else {
            trail.clear();
            standing.set(IDLE);
            pages.close();
        }
    }

    /**
     * Goes to the band that an obstacle is about.
     *
     * @param obstacle the obstacle
     */
    public void point(Obstacle obstacle) {
        List<Band> bands = drawing.design().bands();
        for (int i = 0; i < bands.size(); i++) {
            if (obstacle.where().equals("band \"" + bands.get(i).name() + "\"")) {
                drawing.select(Selection.of(new Part.Level(i)));
            }
        }
        close();
    }

    private void run(Errand errand, int stages, Deed deed) {
        Design design = drawing.design();
        Optional<Colours> known = answer().map(Answer::colours);
        start(errand, stages, steps -> {
            Optional<Obstacle> obstacle = Colours.obstacle(design);
            if (obstacle.isPresent()) {
                return new Standing.Refused(errand, List.of(obstacle.get()));
            }
            Colours colours = known.orElseGet(() -> Colours.of(design));
            Work worked = new BenchPlanner(design, colours).work(steps, steps);
            return worked instanceof Work.CannotBeMade cannot
                    ? new Standing.Refused(errand, cannot.obstacles())
                    : deed.done(((Work.Worked) worked).plan(), colours, steps);
        });
    }

    private Standing sheets(BenchPlan plan, Colours colours, Steps steps) {
        steps.accept("looking for printers");
        List<SheetPrinter> found = List.of();
        String trouble = "";
        try {
            found = printers.found();
        } catch (IOException e) {
            trouble = e.getMessage();
        }
        steps.accept("drawing the step sheets");
        return new Standing.Shown(new ShownSheets(plan, colours, found, trouble));
    }

    /** What is done beside the screen, step by step. */
    private interface Task {
        Standing done(Steps steps) throws IOException;
    }

    private void start(Errand errand, int stages, Task task) {
        AtomicBoolean off = new AtomicBoolean();
        calledOff = off;
        go(new Standing.Working(errand, "beginning", 0, false));
        Steps steps = new Steps(
                stages,
                off,
                (stage, share) -> screen.execute(() -> {
                    if (!off.get()) {
                        standing.set(new Standing.Working(errand, stage, share, false));
                    }
                }));
        beside.execute(() -> {
            Standing end = ended(errand, task, steps);
            screen.execute(() -> finish(end));
        });
    }

    private static Standing ended(Errand errand, Task task, Steps steps) {
        try {
            return task.done(steps);
        } catch (CancellationException off) {
            return new Standing.CalledOff(errand, false);
        } catch (IOException e) {
            return Trouble.writing(errand, e);
        } catch (RuntimeException e) {
            return Trouble.fault(errand, e);
        }
    }

    private void finish(Standing end) {
        if (end instanceof Standing.Shown shown) {
            form.offer(shown.sheets().title());
            pages.open(shown.sheets());
        }
        standing.set(end);
    }

    private void go(Standing next) {
        if (!(standing.get() instanceof Standing.Idle)) {
            trail.push(standing.get());
        }
        standing.set(next);
    }

    /**
     * What the user can do with sheets.
     *
     * @return the commands, in menu order
     */
    public List<Command> commands() {
        var free = Bindings.createBooleanBinding(() -> standing.get() instanceof Standing.Idle, standing);
        return List.of(
                new Command(
                        "export-sheets",
                        Command.Menu.FILE,
                        new ReadOnlyStringWrapper("Export sheets\u2026"),
                        "Shortcut+E",
                        "Writes the preview, the step sheets, the timing table and the plan to a folder.",
                        free,
                        this::export),
                new Command(
                        "print-sheets",
                        Command.Menu.FILE,
                        new ReadOnlyStringWrapper("Print step sheets\u2026"),
                        "Shortcut+P",
                        "Shows the step sheets page by page and prints them.",
                        free,
                        this::print));
    }

    /**
     * Where the errand has got to.
     *
     * @return a property
     */
    public ReadOnlyObjectProperty<Standing> standingProperty() {
        return standing.getReadOnlyProperty();
    }

    /**
     * Where the files are to go.
     *
     * @return the form
     */
    public SheetsForm form() {
        return form;
    }

    /**
     * The pages to be printed.
     *
     * @return their model
     */
    public PagesModel pages() {
        return pages;
    }
}
