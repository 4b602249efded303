package tideband.design;

import java.util.List;
import java.util.Optional;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.Piece;
import tideband.piece.Vessel;

/**
 * A design: what is to be made, of what, and with what.
 *
 * @param title its title
 * @param metal the metal
 * @param finish the surface finish
 * @param light the light its colours are judged in
 * @param observer the standard observer
 * @param piece the piece's shape
 * @param holding how it is held
 * @param bands the bands from end A to end B, without gaps
 * @param bath the bath
 * @param supply the supply
 * @param vessel the vessel the bath stands in, where it is narrow enough to matter
 * @param bench what each act costs
 * @param order the rule for the order of immersions
 * @param pull how the piece is drawn out
 */
public record Design(
        String title,
        Metal metal,
        Finish finish,
        Illuminant light,
        Observer observer,
        Piece piece,
        Holding holding,
        List<Band> bands,
        Bath bath,
        Supply supply,
        Optional<Vessel> vessel,
        BenchTimes bench,
        Order order,
        PullSettings pull) {

    /** Copies the bands, so that the value cannot change; refuses bands that do not cover the piece. */
    public Design {
        bands = List.copyOf(bands);
        double coveredMm = 0;
        for (Band band : bands) {
            if (band.fromMm() != coveredMm) {
                throw new IllegalArgumentException("band " + band.name() + " must begin where the one before ends, at "
                        + coveredMm + " mm, but begins at " + band.fromMm());
            }
            coveredMm = band.toMm();
        }
        if (coveredMm != piece.lengthMm()) {
            throw new IllegalArgumentException(
                    "the bands must end at the piece's length, " + piece.lengthMm() + " mm, but end at " + coveredMm);
        }
        if (bath.metal() != metal) {
            throw new IllegalArgumentException("the bath must be for " + metal + ", but is for " + bath.metal());
        }
        if (!(holding.dryMm() < piece.lengthMm())) {
            throw new IllegalArgumentException("dryMm must be less than the piece's length, " + piece.lengthMm()
                    + " mm, but was " + holding.dryMm());
        }
    }
}
