package tideband.window.bands;

import tideband.design.Wanted;

/** What says what a band is to be. */
enum BandKind {
    /** The same film all along. */
    LEVEL("Level film", "The same film from side to side."),
    /** A film that runs straight from one thickness to another. */
    FADE("Fade", "The film runs straight from its A side to its B side."),
    /** The film of a coupon at these volts. */
    VOLTS("Volts", "The film a small coupon would have at the end of a hold at these volts."),
    /** The film nearest to a colour. */
    COLOUR("Colour", "The film that comes nearest to a colour."),
    /** Natural metal. */
    BARE("Bare", "Natural metal: no film.");

    private final String title;
    private final String meaning;

    BandKind(String title, String meaning) {
        this.title = title;
        this.meaning = meaning;
    }

    String title() {
        return title;
    }

    String meaning() {
        return meaning;
    }

    static BandKind of(Wanted wanted) {
        if (wanted instanceof Wanted.Film film) {
            return film.aSideNm() == film.bSideNm() ? LEVEL : FADE;
        }
        if (wanted instanceof Wanted.Volts) {
            return VOLTS;
        }
        return wanted instanceof Wanted.Colour ? COLOUR : BARE;
    }
}
