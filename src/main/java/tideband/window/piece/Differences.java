package tideband.window.piece;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;

/** How far predicted and wanted colours are apart along the piece. */
final class Differences {

    /**
     * The difference on a stretch.
     *
     * @param atMm the middle of the stretch, in mm from end A
     * @param de00 CIEDE2000 difference
     */
    record Point(double atMm, double de00) {}

    private Differences() {}

    /**
     * The differences of all stretches.
     *
     * @param drawn what is wanted
     * @param predicted what the trial gives
     * @return a line from end A to end B
     */
    static List<Point> of(AsDrawn drawn, Strip predicted) {
        List<Point> line = new ArrayList<>(predicted.size());
        for (int i = 0; i < predicted.size(); i++) {
            Strip.Stretch stretch = predicted.get(i);
            double atMm = (stretch.fromMm() + stretch.toMm()) / 2;
            Optional<Lab> wanted = drawn.labAt(drawn.bandAt(atMm), atMm);
            wanted.ifPresent(lab -> line.add(new Point(atMm, Ciede2000.between(lab, stretch.lab()))));
        }
        return List.copyOf(line);
    }
}
