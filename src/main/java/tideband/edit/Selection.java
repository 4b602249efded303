package tideband.edit;

import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * What is selected in a drawing: some bands, and the part the keyboard acts on.
 *
 * @param bands indices of the selected bands, rising, each once
 * @param focus the part the arrow keys move, where there is one
 */
public record Selection(List<Integer> bands, Optional<Part> focus) {

    /** Nothing selected. */
    public static final Selection NONE = new Selection(List.of(), Optional.empty());

    /** Puts the bands in order, each once. */
    public Selection {
        bands = List.copyOf(new TreeSet<>(bands));
    }

    /**
     * A part alone, with its band.
     *
     * @param part the part
     * @return the selection; an edge selects no band
     */
    public static Selection of(Part part) {
        return new Selection(part instanceof Part.EdgeAt ? List.of() : List.of(part.band()), Optional.of(part));
    }

    /**
     * Some bands; the first has the focus.
     *
     * @param bands indices of bands
     * @return the selection
     */
    public static Selection ofBands(Collection<Integer> bands) {
        SortedSet<Integer> inOrder = new TreeSet<>(bands);
        return inOrder.isEmpty()
                ? NONE
                : new Selection(List.copyOf(inOrder), Optional.of(new Part.Level(inOrder.first())));
    }

    /**
     * Takes a band in, or out if it was in.
     *
     * @param band index of the band
     * @return the other selection
     */
    public Selection toggled(int band) {
        SortedSet<Integer> other = new TreeSet<>(bands);
        if (!other.remove(band)) {
            other.add(band);
            return new Selection(List.copyOf(other), Optional.of(new Part.Level(band)));
        }
        return ofBands(other);
    }

    /**
     * What is left of the selection in a drawing of so many bands.
     *
     * @param count number of bands
     * @return the selection without what is no longer there
     */
    public Selection within(int count) {
        List<Integer> left = bands.stream().filter(b -> b < count).toList();
        Optional<Part> stillThere =
                focus.filter(p -> p instanceof Part.EdgeAt edge ? edge.edge() < count - 1 : p.band() < count);
        return left.size() == bands.size() && stillThere.equals(focus) ? this : new Selection(left, stillThere);
    }
}
