package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.piece.End;
import tideband.window.drawing.Viewport;

/**
 * What can be taken hold of in a field, and what a hand means when several are near: the nearest handle; else an edge's
 * line when the hand is close to it, else a band's line, else the edge's line from farther away.
 */
final class Handles {
    static final double HIT_PX = 12;
    private static final double CLOSE_PX = 6;
    private static final double INSET_PX = 16;

    private final Design design;
    private final List<DrawnFilm> films;
    private final FieldArea area;
    private final Viewport viewport;
    private final NmScale scale;
    private final double hitPx;
    private final List<Handle> all = new ArrayList<>();

    /**
     * The handles of a drawing.
     *
     * @param design the design
     * @param films its films
     * @param area where the field is
     * @param viewport what of its length is in view
     * @param scale what of its films is in view
     * @param enlarged how much larger than usual everything is, as text is
     */
    Handles(Design design, List<DrawnFilm> films, FieldArea area, Viewport viewport, NmScale scale, double enlarged) {
        this.design = design;
        this.films = films;
        this.area = area;
        this.viewport = viewport;
        this.scale = scale;
        this.hitPx = HIT_PX * enlarged;
        double insetPx = INSET_PX * enlarged;
        int last = design.bands().size() - 1;
        for (int i = 0; i <= last; i++) {
            Band band = design.bands().get(i);
            double fromPx = viewport.px(band.fromMm());
            double toPx = viewport.px(band.toMm());
            double inPx = Math.min(insetPx, (toPx - fromPx) / 4);
            boolean bare = films.get(i).bare();
            if (!bare) {
                add(new Part.FadeEnd(i, End.A), fromPx + inPx);
            }
            double seenFromPx = Math.max(fromPx, area.leftPx());
            double seenToPx = Math.min(toPx, area.rightPx());
            add(new Part.Level(i), seenFromPx < seenToPx ? (seenFromPx + seenToPx) / 2 : (fromPx + toPx) / 2);
            if (!bare) {
                add(new Part.FadeEnd(i, End.B), toPx - inPx);
            }
            if (i < last) {
                all.add(new Handle(new Part.EdgeAt(i), toPx, area.railPx(), hitPx));
            }
        }
    }

    private void add(Part part, double xPx) {
        all.add(new Handle(part, xPx, linePx(part.band(), xPx), hitPx));
    }

    /** The handles from end A to end B, in the order the keyboard walks them. */
    List<Handle> all() {
        return List.copyOf(all);
    }

    Optional<Handle> of(Part part) {
        return all.stream().filter(h -> h.part().equals(part)).findFirst();
    }

    /** What a hand at a place takes hold of. */
    Optional<Part> at(double xPx, double yPx) {
        if (xPx < area.leftPx() - hitPx || xPx > area.rightPx() + hitPx || yPx > area.bottomPx() + hitPx) {
            return Optional.empty();
        }
        Part best = null;
        double bestPx = Double.POSITIVE_INFINITY;
        for (Handle handle : all) {
            double awayPx = awayPx(handle, xPx, yPx);
            if (awayPx < bestPx) {
                best = handle.part();
                bestPx = awayPx;
            }
        }
        return Optional.ofNullable(best);
    }

    private double awayPx(Handle handle, double xPx, double yPx) {
        if (handle.xPx() < area.leftPx() || handle.xPx() > area.rightPx()) {
            return Double.POSITIVE_INFINITY;
        }
        double pointPx = handle.awayPx(xPx, yPx);
        if (pointPx <= hitPx) {
            return pointPx;
        }
        if (handle.part() instanceof Part.EdgeAt) {
            double asidePx = Math.abs(xPx - handle.xPx());
            double closePx = CLOSE_PX / HIT_PX * hitPx;
            if (asidePx > hitPx) {
                return Double.POSITIVE_INFINITY;
            }
            return asidePx <= closePx ? asidePx + closePx / 3 : asidePx + 2 * hitPx;
        }
        if (handle.part() instanceof Part.Level level) {
            Band band = design.bands().get(level.band());
            boolean above = xPx >= viewport.px(band.fromMm()) && xPx <= viewport.px(band.toMm());
            double linePx = above ? Math.abs(yPx - linePx(level.band(), xPx)) : Double.POSITIVE_INFINITY;
            return linePx <= hitPx ? linePx + hitPx : Double.POSITIVE_INFINITY;
        }
        return Double.POSITIVE_INFINITY;
    }

    /** The height of a band's line, kept within the field so that it can always be reached. */
    private double linePx(int band, double xPx) {
        Band on = design.bands().get(band);
        DrawnFilm film = films.get(band);
        double share = (viewport.mm(xPx) - on.fromMm()) / (on.toMm() - on.fromMm());
        double within = Math.min(Math.max(share, 0), 1);
        double yPx = scale.px(film.aSideNm() + within * (film.bSideNm() - film.aSideNm()));
        return Math.min(Math.max(yPx, area.topPx()), area.bottomPx());
    }
}
