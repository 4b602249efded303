package tideband.edit;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.UnaryOperator;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Limits;
import tideband.design.Wanted;
import tideband.edit.Layout.Stretch;

/**
 * Edits of the bands of a design. Each gives a valid design; one that cannot be made as asked is made as nearly as can be,
 * and one that cannot be made at all gives the design it was given.
 */
public final class BandEdits {
    /** The shortest band, in mm: what a design's file allows. */
    public static final double SHORTEST_MM = Limits.SHORTEST_BAND_MM;
    /** The most bands a design has. */
    public static final int MOST_BANDS = Limits.MOST_BANDS;
    /** The thinnest film that can be drawn, in nm; the bench may want more. */
    public static final double THINNEST_NM = 1;
    /** The thickest film that can be drawn, in nm. */
    public static final double THICKEST_NM = 2000;

    private BandEdits() {}

    /**
     * Moves an edge; its neighbours give and take.
     *
     * @param design the design
     * @param edge index of the band on the edge's A side, not the last
     * @param toMm where to, in mm from end A; kept so that both neighbours stay at least {@link #SHORTEST_MM} long
     * @return the design with the edge there
     */
    public static Design moveEdge(Design design, int edge, double toMm) {
        Band before = design.bands().get(edge);
        Band after = design.bands().get(edge + 1);
        double low = before.fromMm() + SHORTEST_MM;
        double high = after.toMm() - SHORTEST_MM;
        if (low > high) {
            return design;
        }
        double atMm = Layout.between(toMm, low, high);
        List<Band> bands = new ArrayList<>(design.bands());
        bands.set(edge, new Band(before.name(), before.fromMm(), atMm, before.wanted(), before.edge()));
        bands.set(edge + 1, new Band(after.name(), atMm, after.toMm(), after.wanted(), after.edge()));
        return design.withBands(bands);
    }

    /**
     * Moves an edge and all that follows towards end B; the last band gives or takes the length, as the piece keeps its own.
     *
     * @param design the design
     * @param edge index of the band on the edge's A side, not the last
     * @param toMm where to, in mm from end A; kept so that the first and the last band moved stay long enough
     * @return the design with the edge there
     */
    public static Design moveEdgeAndFollowing(Design design, int edge, double toMm) {
        List<Band> old = design.bands();
        int last = old.size() - 1;
        double fromMm = old.get(edge).toMm();
        double least = old.get(edge).fromMm() + SHORTEST_MM - fromMm;
        double most = old.get(last).toMm() - SHORTEST_MM - old.get(last).fromMm();
        if (least > most) {
            return design;
        }
        double byMm = Math.min(Math.max(toMm - fromMm, least), most);
        List<Band> bands = new ArrayList<>(old.subList(0, edge));
        double startMm = old.get(edge).fromMm();
        for (int i = edge; i <= last; i++) {
            Band band = old.get(i);
            double endMm = i == last
                    ? band.toMm()
                    : Layout.end(band.toMm() + byMm, startMm, old.get(last).toMm(), last - i);
            bands.add(new Band(band.name(), startMm, endMm, band.wanted(), band.edge()));
            startMm = endMm;
        }
        return design.withBands(bands);
    }

    /**
     * Says anew what bands are to be.
     *
     * @param design the design
     * @param chosen indices of bands
     * @param wanted what they are to be; kept within what a design's file can hold, and a colour in hexadecimal notation is
     *     seen in the design's light
     * @return the changed design
     */
    public static Design want(Design design, Collection<Integer> chosen, Wanted wanted) {
        Wanted allowed = Wishes.allowed(design, wanted);
        return each(design, chosen, band -> new Band(band.name(), band.fromMm(), band.toMm(), allowed, band.edge()));
    }

    /**
     * A film that can be drawn, as near as can be.
     *
     * @param aSideNm film at the A side in nm
     * @param bSideNm film at the B side in nm
     * @return the film, within what can be drawn, to 0.01 nm
     */
    public static Wanted.Film film(double aSideNm, double bSideNm) {
        return new Wanted.Film(drawable(aSideNm), drawable(bSideNm));
    }

    /**
     * Sets the kind of the edges at the B side of bands.
     *
     * @param design the design
     * @param chosen indices of bands
     * @param edge the kind
     * @return the changed design
     */
    public static Design setEdge(Design design, Collection<Integer> chosen, Edge edge) {
        return each(design, chosen, band -> new Band(band.name(), band.fromMm(), band.toMm(), band.wanted(), edge));
    }

    /**
     * Names a band.
     *
     * @param design the design
     * @param band index of the band
     * @param name the name; made different from those of the others by a number, as every band has a name of its own
     * @return the changed design; the same if the name is blank
     */
    public static Design rename(Design design, int band, String name) {
        String line = Line.of(name);
        if (line.isEmpty()) {
            return design;
        }
        Set<String> taken = names(design);
        taken.remove(design.bands().get(band).name());
        String own = Line.fresh(line, taken);
        return each(design, List.of(band), b -> new Band(own, b.fromMm(), b.toMm(), b.wanted(), b.edge()));
    }

    /**
     * Splits a band in two of the same kind; a fade keeps its line.
     *
     * @param design the design
     * @param band index of the band
     * @param atMm where, in mm from end A; kept so that both parts are long enough
     * @return the design with a band more; the same if the band is too short or there are {@link #MOST_BANDS}
     */
    public static Design split(Design design, int band, double atMm) {
        Band old = design.bands().get(band);
        double low = old.fromMm() + SHORTEST_MM;
        double high = old.toMm() - SHORTEST_MM;
        if (low > high || design.bands().size() >= MOST_BANDS) {
            return design;
        }
        double cutMm = Layout.between(atMm, low, high);
        Wanted first = old.wanted();
        Wanted second = old.wanted();
        if (old.wanted() instanceof Wanted.Film film) {
            double share = (cutMm - old.fromMm()) / (old.toMm() - old.fromMm());
            double cutNm = drawable(film.aSideNm() + share * (film.bSideNm() - film.aSideNm()));
            first = new Wanted.Film(film.aSideNm(), film.aSideNm() == film.bSideNm() ? film.bSideNm() : cutNm);
            second = new Wanted.Film(film.aSideNm() == film.bSideNm() ? film.aSideNm() : cutNm, film.bSideNm());
        }
        List<Band> bands = new ArrayList<>(design.bands());
        bands.set(band, new Band(old.name(), old.fromMm(), cutMm, first, Edge.SOFT));
        bands.add(band + 1, new Band(Line.fresh(old.name(), names(design)), cutMm, old.toMm(), second, old.edge()));
        return design.withBands(bands);
    }

    /**
     * Joins neighbouring bands into one. Where all are films, the joined band runs straight from the A side of the first to
     * the B side of the last; otherwise it is what the first is.
     *
     * @param design the design
     * @param first index of the first band
     * @param last index of the last band, inclusive
     * @return the design with fewer bands; the same if first is last
     */
    public static Design join(Design design, int first, int last) {
        if (last <= first) {
            return design;
        }
        Band head = design.bands().get(first);
        Band tail = design.bands().get(last);
        Wanted wanted = head.wanted();
        boolean films =
                design.bands().subList(first, last + 1).stream().allMatch(b -> b.wanted() instanceof Wanted.Film);
        if (films) {
            wanted = new Wanted.Film(((Wanted.Film) head.wanted()).aSideNm(), ((Wanted.Film) tail.wanted()).bSideNm());
        }
        List<Band> bands = new ArrayList<>(design.bands().subList(0, first));
        bands.add(new Band(head.name(), head.fromMm(), tail.toMm(), wanted, tail.edge()));
        bands.addAll(design.bands().subList(last + 1, design.bands().size()));
        return design.withBands(bands);
    }

    /**
     * Inserts a band after another; it takes the B half of that band's length.
     *
     * @param design the design
     * @param after index of the band it follows
     * @param wanted what it is to be; see {@link #want}
     * @return the design with a band more; the same if that band is too short or there are {@link #MOST_BANDS}
     */
    public static Design insert(Design design, int after, Wanted wanted) {
        Band old = design.bands().get(after);
        double low = old.fromMm() + SHORTEST_MM;
        double high = old.toMm() - SHORTEST_MM;
        if (low > high || design.bands().size() >= MOST_BANDS) {
            return design;
        }
        double middleMm = Layout.between((old.fromMm() + old.toMm()) / 2, low, high);
        Wanted allowed = Wishes.allowed(design, wanted);
        List<Band> bands = new ArrayList<>(design.bands());
        bands.set(after, new Band(old.name(), old.fromMm(), middleMm, old.wanted(), Edge.SOFT));
        bands.add(after + 1, new Band(Line.fresh("band", names(design)), middleMm, old.toMm(), allowed, old.edge()));
        return design.withBands(bands);
    }

    /**
     * Repeats bands right after the last of them. The repeats are as long as the bands; those that follow are shortened in
     * proportion to make room, and if they cannot be, all bands are.
     *
     * @param design the design
     * @param first index of the first band
     * @param last index of the last band, inclusive
     * @return the design with more bands; the same if there would be more than {@link #MOST_BANDS}
     */
    public static Design duplicate(Design design, int first, int last) {
        List<Band> old = design.bands();
        if (old.size() + last - first + 1 > MOST_BANDS) {
            return design;
        }
        List<Stretch> drawn = new ArrayList<>(old.stream().map(Stretch::of).toList());
        Set<String> taken = names(design);
        List<Stretch> repeats = new ArrayList<>();
        for (Stretch one : List.copyOf(drawn.subList(first, last + 1))) {
            String name = Line.fresh(one.name(), taken);
            taken.add(name);
            repeats.add(one.named(name));
        }
        drawn.addAll(last + 1, repeats);
        double moreMm = repeats.stream().mapToDouble(Stretch::lengthMm).sum();
        int from = last + 1 + repeats.size();
        double followingMm = drawn.subList(from, drawn.size()).stream()
                .mapToDouble(Stretch::lengthMm)
                .sum();
        double leastMm = SHORTEST_MM * (drawn.size() - from);
        boolean room = followingMm - moreMm >= leastMm && from < drawn.size();
        int squeezeFrom = room ? from : 0;
        List<Stretch> squeezed = new ArrayList<>(drawn.subList(0, squeezeFrom));
        double roomMm = room ? followingMm - moreMm : design.piece().lengthMm();
        squeezed.addAll(Layout.stretched(drawn.subList(squeezeFrom, drawn.size()), roomMm));
        return laid(design, squeezed);
    }

    /**
     * Turns the drawing end for end; the piece keeps its shape.
     *
     * @param design the design
     * @return the drawing seen in a mirror
     */
    public static Design mirror(Design design) {
        List<Band> old = design.bands();
        List<Stretch> drawn = new ArrayList<>();
        for (int i = old.size() - 1; i >= 0; i--) {
            Band band = old.get(i);
            Wanted wanted = band.wanted() instanceof Wanted.Film film
                    ? new Wanted.Film(film.bSideNm(), film.aSideNm())
                    : band.wanted();
            Edge edge = i > 0 ? old.get(i - 1).edge() : old.get(old.size() - 1).edge();
            drawn.add(new Stretch(band.name(), band.toMm() - band.fromMm(), wanted, edge));
        }
        return laid(design, drawn);
    }

    /**
     * Deletes bands; the neighbour on the A side, or else on the B side, takes their length.
     *
     * @param design the design
     * @param chosen indices of bands
     * @return the design with fewer bands; one band is always left
     */
    public static Design delete(Design design, Collection<Integer> chosen) {
        Set<Integer> gone = new HashSet<>(chosen);
        List<Band> left = new ArrayList<>();
        double headMm = 0;
        for (int i = 0; i < design.bands().size(); i++) {
            Band band = design.bands().get(i);
            if (!gone.contains(i)) {
                left.add(new Band(band.name(), headMm, band.toMm(), band.wanted(), band.edge()));
                headMm = band.toMm();
            } else if (!left.isEmpty()) {
                Band before = left.remove(left.size() - 1);
                left.add(new Band(before.name(), before.fromMm(), band.toMm(), before.wanted(), band.edge()));
                headMm = band.toMm();
            }
        }
        return left.isEmpty() ? design : design.withBands(left);
    }

    /** Lays bands out from end A; the design itself if the piece is too short for them. */
    private static Design laid(Design design, List<Stretch> stretches) {
        return Layout.laid(stretches, design.piece().lengthMm())
                .map(bands -> design.withBands(bands))
                .orElse(design);
    }

    private static Design each(Design design, Collection<Integer> chosen, UnaryOperator<Band> edit) {
        List<Band> bands = new ArrayList<>(design.bands());
        for (int i : chosen) {
            bands.set(i, edit.apply(bands.get(i)));
        }
        return design.withBands(bands);
    }

    private static Set<String> names(Design design) {
        Set<String> names = new HashSet<>();
        design.bands().forEach(b -> names.add(b.name()));
        return names;
    }

    private static double drawable(double filmNm) {
        double inside = Limits.FILM_NM.nearest(filmNm);
        return Math.rint(inside * 100) / 100;
    }
}
