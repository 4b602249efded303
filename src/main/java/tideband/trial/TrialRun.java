package tideband.trial;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.Xyz;
import tideband.match.Palette;
import tideband.oxide.Bath;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Waterline;

/**
 * Carries a plan out on paper.
 *
 * <p>Each immersion in turn grows the cells that are wet and not covered, all sharing the supply's current, while the
 * line moves as the pull says; a cell keeps the film it has when the line leaves it. Then every band is held against
 * the drawing.
 */
public final class TrialRun {
    /** Cells are at most this long. */
    public static final double LONGEST_CELL_MM = 0.5;

    private static final int FEWEST_CELLS = 200;

    private final Piece piece;
    private final Palette palette;
    private final Xyz white;
    private final List<Wish> wishes;
    private final double[] edgesMm;
    private final int[] firstCell;

    /**
     * A piece to try plans on.
     *
     * @param piece the piece
     * @param wishes what the drawing wants, from end A to end B without gaps
     * @param palette the colours of its films; must reach the thickest film that may come
     * @param white the white of the light the colours are seen in
     */
    public TrialRun(Piece piece, List<Wish> wishes, Palette palette, Xyz white) {
        this.piece = piece;
        this.palette = palette;
        this.white = white;
        this.wishes = List.copyOf(wishes);
        this.firstCell = new int[wishes.size() + 1];
        double longestMm = Math.min(LONGEST_CELL_MM, piece.lengthMm() / FEWEST_CELLS);
        List<Double> edges = new ArrayList<>();
        for (int i = 0; i < wishes.size(); i++) {
            Wish wish = wishes.get(i);
            int cells = (int) Math.ceil((wish.toMm() - wish.fromMm()) / longestMm);
            firstCell[i] = edges.size();
            for (int cell = 0; cell < cells; cell++) {
                edges.add(wish.fromMm() + (wish.toMm() - wish.fromMm()) * cell / cells);
            }
        }
        firstCell[wishes.size()] = edges.size();
        edges.add(piece.lengthMm());
        this.edgesMm = edges.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /**
     * Carries out the immersions, one after the other, on a piece that starts with its native film.
     *
     * @param bath the bath
     * @param limitAmps the supply's current limit, in A
     * @param dips the immersions in order
     * @return what comes of them
     */
    public Trial carryOut(Bath bath, double limitAmps, List<Dip> dips) {
        Surface surface = new Surface(piece, bath, limitAmps, edgesMm);
        dips.forEach(surface::dip);
        List<TrialCell> cells = new ArrayList<>(edgesMm.length - 1);
        for (int cell = 0; cell < edgesMm.length - 1; cell++) {
            cells.add(cell(surface, cell));
        }
        List<TrialBand> bands = new ArrayList<>();
        for (int i = 0; i < wishes.size(); i++) {
            bands.add(band(wishes.get(i), cells.subList(firstCell[i], firstCell[i + 1])));
        }
        return new Trial(cells, bands);
    }

    private TrialCell cell(Surface surface, int cell) {
        double firstNm = surface.filmNm(cell, 0);
        double meanNm = 0;
        boolean alike = true;
        for (int lane = 0; lane < Surface.lanes(); lane++) {
            meanNm += Surface.laneShare(lane) * surface.filmNm(cell, lane);
            alike &= surface.filmNm(cell, lane) == firstNm;
        }
        Lab lab = alike ? palette.labAt(firstNm) : mixed(surface, cell);
        return new TrialCell(edgesMm[cell], edgesMm[cell + 1], alike ? firstNm : meanNm, lab);
    }

    /** Lights add, so colours side by side mix in XYZ. */
    private Lab mixed(Surface surface, int cell) {
        double x = 0;
        double y = 0;
        double z = 0;
        for (int lane = 0; lane < Surface.lanes(); lane++) {
            Xyz part = palette.labAt(surface.filmNm(cell, lane)).toXyz(white);
            x += Surface.laneShare(lane) * part.x();
            y += Surface.laneShare(lane) * part.y();
            z += Surface.laneShare(lane) * part.z();
        }
        return Lab.of(new Xyz(x, y, z), white);
    }

    private TrialBand band(Wish wish, List<TrialCell> all) {
        List<TrialCell> cells = clearOfEdges(wish, all);
        double[] differences = cells.stream()
                .mapToDouble(cell -> {
                    double filmNm = wish.filmNm((cell.fromMm() + cell.toMm()) / 2);
                    return Ciede2000.between(wish.lab().orElseGet(() -> palette.labAt(filmNm)), cell.lab());
                })
                .sorted()
                .toArray();
        double[] sides = wish.aSideNm() == wish.bSideNm() ? level(cells) : line(wish, cells);
        return new TrialBand(sides[0], sides[1], median(differences), differences[differences.length - 1]);
    }

    /** Leaves out what a waterline at either edge of the band blurs; all cells where that is the whole band. */
    private List<TrialCell> clearOfEdges(Wish wish, List<TrialCell> cells) {
        double nearMm = new Waterline(piece, End.A, Optional.empty()).blurMm(wish.fromMm());
        double farMm = new Waterline(piece, End.A, Optional.empty()).blurMm(wish.toMm());
        List<TrialCell> clear = cells.stream()
                .filter(cell -> cell.fromMm() >= wish.fromMm() + nearMm && cell.toMm() <= wish.toMm() - farMm)
                .toList();
        return clear.isEmpty() ? cells : clear;
    }

    private static double[] level(List<TrialCell> cells) {
        double[] films = cells.stream().mapToDouble(TrialCell::filmNm).sorted().toArray();
        return new double[] {median(films), median(films)};
    }

    private static double[] line(Wish wish, List<TrialCell> cells) {
        double[] at =
                cells.stream().mapToDouble(c -> (c.fromMm() + c.toMm()) / 2).toArray();
        double[] film = cells.stream().mapToDouble(TrialCell::filmNm).toArray();
        double meanAt = Arrays.stream(at).average().orElseThrow();
        double meanFilm = Arrays.stream(film).average().orElseThrow();
        double covariance = 0;
        double variance = 0;
        for (int i = 0; i < at.length; i++) {
            covariance += (at[i] - meanAt) * (film[i] - meanFilm);
            variance += (at[i] - meanAt) * (at[i] - meanAt);
        }
        double slope = variance > 0 ? covariance / variance : 0;
        return new double[] {meanFilm + slope * (wish.fromMm() - meanAt), meanFilm + slope * (wish.toMm() - meanAt)};
    }

    private static double median(double[] sorted) {
        int middle = sorted.length / 2;
        return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
    }
}
