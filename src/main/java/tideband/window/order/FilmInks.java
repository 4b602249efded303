package tideband.window.order;

import tideband.bench.Colours;

/** The colours of films as a screen shows them, one a nanometre, each worked out when it is first wanted. */
final class FilmInks {
    private final Colours colours;
    private final String[] hexes;

    FilmInks(Colours colours) {
        this.colours = colours;
        this.hexes = new String[(int) Math.floor(colours.palette().maxNm()) + 1];
    }

    Colours colours() {
        return colours;
    }

    String hex(double filmNm) {
        int nm = Math.min(hexes.length - 1, (int) Math.rint(filmNm));
        if (hexes[nm] == null) {
            hexes[nm] = colours.hexOf(colours.palette().labAt(nm));
        }
        return hexes[nm];
    }
}
