package tideband.plan;

import java.util.List;
import tideband.piece.End;

/**
 * One visit to the bath. Band indices count from end A, 0-based, and stand in rising order.
 *
 * @param endDown the end that is deepest
 * @param maskedBefore runs masked just before it
 * @param strippedBefore runs stripped just before it
 * @param masked all bands masked while it lasts
 * @param finishes bands it finishes that no earlier immersion finished
 * @param peakNm the highest film among {@code finishes}, in nm
 * @param why plain sentences: why each mask is there, why it comes now, why this end is down
 */
public record Immersion(
        End endDown,
        List<Run> maskedBefore,
        List<Run> strippedBefore,
        List<Integer> masked,
        List<Integer> finishes,
        double peakNm,
        List<String> why) {

    /** Copies the lists, so that the value cannot change. */
    public Immersion {
        maskedBefore = List.copyOf(maskedBefore);
        strippedBefore = List.copyOf(strippedBefore);
        masked = List.copyOf(masked);
        finishes = List.copyOf(finishes);
        why = List.copyOf(why);
    }
}
