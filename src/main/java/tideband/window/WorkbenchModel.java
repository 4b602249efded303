package tideband.window;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.LongSupplier;
import java.util.function.Supplier;
import tideband.bench.Work;
import tideband.window.action.Command;
import tideband.window.bands.BandsModel;
import tideband.window.colour.WantedModel;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.field.FieldModel;
import tideband.window.order.OrderModel;
import tideband.window.pacer.PacerModel;
import tideband.window.piece.PieceModel;
import tideband.window.settings.SettingsModel;
import tideband.window.sheets.SheetsModel;
import tideband.window.status.StatusModel;
import tideband.window.work.Answer;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/** Where the parts of the window meet: makes their models and hands each what it needs. */
public final class WorkbenchModel {
    private final ComfortModel comfort;
    private final LongSupplier nanoTime;
    private final DrawingModel drawing;
    private final WorkModel work;
    private final TiltModel tilt;
    private final OrderModel order;
    private final WantedModel wanted;
    private final FieldModel field;
    private final PieceModel piece;
    private final BandsModel bands;
    private final SettingsModel settings;
    private final SheetsModel sheets;
    private final StatusModel status = new StatusModel();
    private Consumer<PacerModel> pacing = model -> {};

    /**
     * A workbench with a drawing on it.
     *
     * @param first what to begin with
     * @param comfort what suits the user
     * @param threads the threads beside the screen's
     * @param chooseBathFile asks the user for a bath file; empty if none was chosen
     * @param nanoTime the clock pulls are paced by
     */
    WorkbenchModel(
            Beginning first,
            ComfortModel comfort,
            Threads threads,
            Supplier<Optional<Path>> chooseBathFile,
            LongSupplier nanoTime) {
        this.comfort = comfort;
        this.nanoTime = nanoTime;
        drawing = new DrawingModel(first.design());
        work = new WorkModel(drawing.designProperty(), first.colours(), threads.work(), threads.screen());
        tilt = new TiltModel(work, threads.look(), threads.screen());
        order = new OrderModel(drawing, work, comfort);
        wanted = new WantedModel(drawing, work, threads.look(), threads.screen());
        field = new FieldModel(
                drawing,
                work,
                tilt,
                comfort,
                wanted.matchesProperty(),
                wanted::take,
                order.glanceProperty(),
                order.faultyProperty());
        piece = new PieceModel(drawing, work, tilt, comfort, threads.look(), threads.screen());
        bands = new BandsModel(drawing, work, comfort);
        settings = new SettingsModel(drawing, work, comfort, chooseBathFile);
        sheets = new SheetsModel(drawing, work, threads.write(), threads.screen());
        order.onPace(this::pace);
        status.follow(field.messageProperty());
        status.follow(wanted.takenProperty());
        status.follow(work.troubleProperty());
    }

    private void pace(int immersion) {
        Optional<Answer> answer = work.answerProperty().get();
        if (answer.isPresent() && !work.staleProperty().get() && answer.get().work() instanceof Work.Worked worked) {
            pacing.accept(new PacerModel(worked.plan(), answer.get().colours(), immersion, comfort, nanoTime));
        } else {
            status.say("There is no plan to pace yet: wait a moment, or mend what the order of work says is wrong.");
        }
    }

    /**
     * Says what opens the pacer.
     *
     * @param opens opens it
     */
    void onPace(Consumer<PacerModel> opens) {
        pacing = opens;
    }

    /**
     * Every command of the window's parts.
     *
     * @return commands in the order they stand within their menus; documents are not among them
     */
    List<Command> commands() {
        List<Command> all = new ArrayList<>();
        all.addAll(sheets.commands());
        all.addAll(HistoryCommands.of(drawing));
        all.addAll(field.commands());
        all.addAll(bands.commands());
        all.addAll(wanted.commands());
        all.addAll(piece.commands());
        all.addAll(settings.commands());
        all.addAll(order.commands());
        return all;
    }

    ComfortModel comfort() {
        return comfort;
    }

    DrawingModel drawing() {
        return drawing;
    }

    WorkModel work() {
        return work;
    }

    OrderModel order() {
        return order;
    }

    WantedModel wanted() {
        return wanted;
    }

    FieldModel field() {
        return field;
    }

    PieceModel piece() {
        return piece;
    }

    BandsModel bands() {
        return bands;
    }

    SettingsModel settings() {
        return settings;
    }

    SheetsModel sheets() {
        return sheets;
    }

    StatusModel status() {
        return status;
    }
}
