package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.window.Desk;

/** A lantern post of twelve bands that takes many immersions. */
final class TwelveBands {
    private static final double[] FILMS_NM = {60, 135, 40, 120, 30, 130, 50, 110, 35, 95, 45, 80};

    private TwelveBands() {}

    static Design design() {
        Design design = Desk.shipped("snuffer-handle");
        double lengthMm = design.piece().lengthMm();
        double eachMm = Math.floor((lengthMm - 12) / FILMS_NM.length);
        List<Band> bands = new ArrayList<>();
        for (int i = 0; i < FILMS_NM.length; i++) {
            double fromMm = i * eachMm;
            double toMm = i == FILMS_NM.length - 1 ? lengthMm : fromMm + eachMm;
            boolean fade = i % 4 == 1;
            Wanted wanted = new Wanted.Film(FILMS_NM[i], fade ? FILMS_NM[i] - 40 : FILMS_NM[i]);
            bands.add(new Band("ring " + (i + 1), fromMm, toMm, wanted, fade ? Edge.SOFT : Edge.CRISP));
        }
        return design.withBands(bands);
    }
}
