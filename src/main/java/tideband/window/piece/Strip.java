package tideband.window.piece;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.Colours;
import tideband.colour.Lab;
import tideband.trial.Trial;
import tideband.trial.TrialCell;

/** The piece's colours along its length, straight on: stretches from end A to end B without gaps, ready to be painted. */
final class Strip {

    /**
     * A stretch of one colour.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     * @param filmNm its film in nm; beyond the palette's end where {@code known} is false
     * @param lab its colour straight on
     * @param known whether colours are known for that film
     */
    record Stretch(double fromMm, double toMm, double filmNm, Lab lab, boolean known) {}

    /** What stands for a film whose colour is not known; it is hatched besides. */
    private static final Lab UNKNOWN = new Lab(60, 0, 0);

    private final List<Stretch> stretches;
    private final float[] linear;

    private Strip(List<Stretch> stretches, Colours colours) {
        this.stretches = List.copyOf(stretches);
        linear = new float[stretches.size() * 3];
        Lab last = null;
        for (int i = 0; i < stretches.size(); i++) {
            Lab lab = stretches.get(i).lab();
            if (lab.equals(last)) {
                System.arraycopy(linear, i * 3 - 3, linear, i * 3, 3);
            } else {
                LinearLight.put(
                        colours.viewing().srgb(lab.toXyz(colours.viewing().white())), linear, i * 3);
                last = lab;
            }
        }
    }

    /**
     * As the trial leaves the piece.
     *
     * @param trial the trial
     * @param colours the colours it was made with
     * @return the strip
     */
    static Strip of(Trial trial, Colours colours) {
        List<Stretch> stretches = new ArrayList<>(trial.cells().size());
        for (TrialCell cell : trial.cells()) {
            stretches.add(new Stretch(cell.fromMm(), cell.toMm(), cell.filmNm(), cell.lab(), true));
        }
        return new Strip(stretches, colours);
    }

    /**
     * As the piece is drawn.
     *
     * @param drawn the drawing
     * @param colours its colours
     * @return the strip
     */
    static Strip of(AsDrawn drawn, Colours colours) {
        List<Stretch> stretches = new ArrayList<>();
        for (AsDrawn.Cut cut : drawn.cuts()) {
            double middleMm = (cut.fromMm() + cut.toMm()) / 2;
            Lab lab = drawn.labAt(cut.band(), middleMm).orElse(UNKNOWN);
            boolean known = drawn.labAt(cut.band(), middleMm).isPresent();
            stretches.add(new Stretch(cut.fromMm(), cut.toMm(), drawn.filmNmAt(cut.band(), middleMm), lab, known));
        }
        return new Strip(stretches, colours);
    }

    /**
     * How many stretches there are.
     *
     * @return the count
     */
    int size() {
        return stretches.size();
    }

    /**
     * A stretch.
     *
     * @param index 0-based from end A
     * @return the stretch
     */
    Stretch get(int index) {
        return stretches.get(index);
    }

    /**
     * A channel of a stretch's screen colour in linear light.
     *
     * @param index the stretch
     * @param channel 0 red, 1 green, 2 blue
     * @return 0 to 1
     */
    float linear(int index, int channel) {
        return linear[index * 3 + channel];
    }

    /**
     * The stretch at a place.
     *
     * @param atMm position in mm from end A
     * @return its index; the first or last for a place off the piece
     */
    int indexAt(double atMm) {
        int low = 0;
        int high = stretches.size() - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (atMm < stretches.get(middle).toMm()) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return low;
    }
}
