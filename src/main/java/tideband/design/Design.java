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
 * @param bathFile the name of the file the bath stands in, beside the design's; empty only for a preset
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
        Optional<String> bathFile,
        Supply supply,
        Optional<Vessel> vessel,
        BenchTimes bench,
        Order order,
        PullSettings pull) {

    /**
     * Copies the bands, so that the value cannot change; refuses bands that do not cover the piece. A bath that is no preset
     * and has no file yet gets the name of one from its own.
     */
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
        if (bathFile.isEmpty()) {
            bathFile = BathChoice.fileFor(bath);
        } else if (!isBathFileName(metal, bathFile.get())) {
            throw new IllegalArgumentException("bathFile must be a plain file name and none of the presets of "
                    + metal.key() + ", but was " + Shown.quoted(bathFile.get()));
        }
    }

    /**
     * A design whose bath is a preset, or has no file yet.
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
    public Design(
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
        this(
                title,
                metal,
                finish,
                light,
                observer,
                piece,
                holding,
                bands,
                bath,
                Optional.empty(),
                supply,
                vessel,
                bench,
                order,
                pull);
    }

    /**
     * Whether a design can name its bath file so: plainly, without a path, and by none of the presets' names.
     *
     * @param metal the design's metal
     * @param name the name
     * @return whether it can
     */
    public static boolean isBathFileName(Metal metal, String name) {
        return BathChoice.isFileName(metal, name);
    }

    /**
     * The same design with other bands.
     *
     * @param other the bands from end A to end B, without gaps
     * @return the changed design
     */
    public Design withBands(List<Band> other) {
        return new Design(
                title, metal, finish, light, observer, piece, holding, other, bath, bathFile, supply, vessel, bench,
                order, pull);
    }

    /**
     * The same design with its piece held otherwise.
     *
     * @param other how it is held
     * @return the changed design
     */
    public Design withHolding(Holding other) {
        return new Design(
                title, metal, finish, light, observer, piece, other, bands, bath, bathFile, supply, vessel, bench,
                order, pull);
    }

    /**
     * The same design with another supply.
     *
     * @param other the supply
     * @return the changed design
     */
    public Design withSupply(Supply other) {
        return new Design(
                title, metal, finish, light, observer, piece, holding, bands, bath, bathFile, other, vessel, bench,
                order, pull);
    }

    /**
     * The same design with another rule for the order of immersions.
     *
     * @param other the rule
     * @return the changed design
     */
    public Design withOrder(Order other) {
        return new Design(
                title, metal, finish, light, observer, piece, holding, bands, bath, bathFile, supply, vessel, bench,
                other, pull);
    }

    /**
     * The same design with its piece drawn out otherwise.
     *
     * @param other how the piece is drawn out
     * @return the changed design
     */
    public Design withPull(PullSettings other) {
        return new Design(
                title, metal, finish, light, observer, piece, holding, bands, bath, bathFile, supply, vessel, bench,
                order, other);
    }
}
