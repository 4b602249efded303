package tideband.trial;

import java.util.List;

/**
 * What the plan gives when carried out without error.
 *
 * @param cells the piece from end A to end B
 * @param bands each band against the drawing, from end A to end B
 */
public record Trial(List<TrialCell> cells, List<TrialBand> bands) {

    /** Copies the lists, so that the value cannot change. */
    public Trial {
        cells = List.copyOf(cells);
        bands = List.copyOf(bands);
    }
}
