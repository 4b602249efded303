package tideband.pull;

import java.util.Optional;
import java.util.function.DoubleBinaryOperator;
import tideband.design.PullSettings;
import tideband.oxide.Bath;
import tideband.oxide.Supply;
import tideband.piece.Piece;
import tideband.piece.Vessel;

/**
 * What a pull is made with.
 *
 * @param piece the piece
 * @param bath the bath
 * @param supply the supply
 * @param vessel the vessel, where it is narrow enough to matter
 * @param settings how the piece is to be drawn out
 * @param colourDifference CIEDE2000 difference between the colours of two films, both in nm
 */
public record Outfit(
        Piece piece,
        Bath bath,
        Supply supply,
        Optional<Vessel> vessel,
        PullSettings settings,
        DoubleBinaryOperator colourDifference) {

    /** Share of the supply's current that a pull may count on. */
    static final double SAFE_SHARE = 0.9;

    /**
     * The highest volts that both the bath and the supply's dial allow.
     *
     * @return volts, a whole number of dial steps
     */
    public double mostVolts() {
        return supply.highestVolts(bath.ceilingVolts());
    }

    /** The current that a pull may count on. */
    double safeAmps() {
        return SAFE_SHARE * supply.maxAmps();
    }

    /** The nearest setting of the dial that is not off and within what bath and supply allow. */
    double dialled(double volts) {
        return Math.min(mostVolts(), Math.max(supply.dialVolts(), supply.dialled(Math.max(0, volts))));
    }
}
