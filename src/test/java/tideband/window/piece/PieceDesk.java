package tideband.window.piece;

import java.util.concurrent.Executor;
import tideband.design.Design;
import tideband.window.Desk;
import tideband.window.drawing.Viewport;

/**
 * A picture's model over a shared desk; all work is done at once on the thread that asks.
 *
 * @param desk the desk
 * @param model the model
 */
public record PieceDesk(Desk desk, PieceModel model) {

    /**
     * A model over a shipped design.
     *
     * @param name the design's name
     * @return desk and model
     */
    public static PieceDesk with(String name) {
        return with(Desk.shipped(name), Runnable::run);
    }

    /**
     * A model over a shipped design that never gets to build colours under angles, which take the longest.
     *
     * @param name the design's name
     * @return desk and model
     */
    public static PieceDesk straightOn(String name) {
        return with(Desk.shipped(name), task -> {});
    }

    private static PieceDesk with(Design design, Executor beside) {
        Desk desk = Desk.with(design);
        PieceModel model = new PieceModel(
                desk.drawing(), desk.work(), desk.tilt(), desk.comfort(), beside, Runnable::run, task -> {});
        return new PieceDesk(desk, model);
    }

    /**
     * A view of the whole piece.
     *
     * @param widthPx width of the view
     * @return the viewport
     */
    public Viewport viewport(double widthPx) {
        double marginPx = 50;
        return new Viewport(
                marginPx,
                (widthPx - 2 * marginPx) / desk.drawing().design().piece().lengthMm(),
                0);
    }

    /**
     * What would be painted.
     *
     * @param widthPx width of the picture
     * @param heightPx its height
     * @return a frame with the piece to scale as far as it fits
     */
    Frame frame(double widthPx, double heightPx) {
        Viewport view = viewport(widthPx);
        Portrait portrait = model.portraitProperty().get();
        double largestMm = portrait.piece().largestSizeMm(0, portrait.piece().lengthMm());
        return new Frame(
                view,
                heightPx / 2,
                AcrossScale.fit(largestMm, view.pxPerMm(), 24, heightPx).pxPerMm(),
                portrait.piece(),
                portrait.finish(),
                portrait.upper(),
                portrait.lower(),
                model.tableProperty().get(),
                model.tiltDegProperty().get(),
                model.lampsProperty().get());
    }
}
