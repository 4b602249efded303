package tideband.window.piece;

import java.util.Locale;
import java.util.Optional;

/**
 * A band in words and numbers, for someone who cannot tell the colours apart.
 *
 * @param band its index, 0-based from end A
 * @param name its name
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param bare whether it is to stay natural metal
 * @param colourName plain name of the colour of the film wanted, at the A side
 * @param order how many times the hue circle has been passed there, from 1; {@link #NO_ORDER} where not known
 * @param bSideColourName the same at the B side; differs for a fade
 * @param bSideOrder the same at the B side
 * @param wantedHex the screen colour wanted in the middle of the band; {@code unknown} for a film whose colour is not known
 * @param filmWantedNm the film wanted at the A side, in nm; the native film where bare
 * @param bSideFilmWantedNm the film wanted at the B side
 * @param predicted what the trial gives, or nothing where the design cannot be made
 */
public record BandReading(
        int band,
        String name,
        double fromMm,
        double toMm,
        boolean bare,
        String colourName,
        int order,
        String bSideColourName,
        int bSideOrder,
        String wantedHex,
        double filmWantedNm,
        double bSideFilmWantedNm,
        Optional<Predicted> predicted) {
    /** Stands for the order of a film whose colour is not known. */
    public static final int NO_ORDER = 0;

    /**
     * A band as the trial leaves it.
     *
     * @param colourName plain name of the colour of its film, at the A side
     * @param order order of that film
     * @param hex the screen colour predicted there
     * @param filmNm the film at the A side, in nm
     * @param bSideFilmNm the film at the B side
     * @param de00Median median CIEDE2000 difference between wanted and predicted
     * @param de00Worst the largest, edges blurred by a waterline left out
     */
    public record Predicted(
            String colourName,
            int order,
            String hex,
            double filmNm,
            double bSideFilmNm,
            double de00Median,
            double de00Worst) {

        /**
         * The median difference in a word.
         *
         * @return how near the band comes
         */
        public Nearness nearness() {
            return Nearness.of(de00Median);
        }
    }

    /**
     * Number and name.
     *
     * @return such as {@code 2 dusk}
     */
    public String title() {
        return number() + " " + name;
    }

    /**
     * The number bands are counted by on screen.
     *
     * @return 1 for the band at end A
     */
    public int number() {
        return band + 1;
    }

    /**
     * The colour wanted.
     *
     * @return such as {@code deep blue (2)}, or {@code gold (1) to deep blue (1)} for a fade
     */
    public String colourWords() {
        String aSide = aSideColourWords();
        String bSide = bSideColourWords();
        return aSide.equals(bSide) ? aSide : aSide + " to " + bSide;
    }

    /**
     * The colour wanted at the A side alone.
     *
     * @return such as {@code deep blue (2)}
     */
    public String aSideColourWords() {
        return words(colourName, order);
    }

    /**
     * The colour wanted at the B side alone.
     *
     * @return such as {@code gold (1)}
     */
    public String bSideColourWords() {
        return words(bSideColourName, bSideOrder);
    }

    private String words(String name, int times) {
        if (bare) {
            return "bare metal";
        }
        return times == NO_ORDER ? name : name + " (" + times + ")";
    }

    /**
     * The difference without its word.
     *
     * @return such as {@code dE00 0.4}; says so where nothing is predicted
     */
    public String differenceNumber() {
        return predicted.map(p -> text("dE00 %.1f", p.de00Median())).orElse("not predicted");
    }

    /**
     * The film predicted, or wanted where nothing is predicted.
     *
     * @return such as {@code 46.0 nm}, or {@code 150.0–46.0 nm} for a fade
     */
    public String filmWords() {
        return predicted
                .map(p -> films(p.filmNm(), p.bSideFilmNm()))
                .orElseGet(() -> films(filmWantedNm, bSideFilmWantedNm));
    }

    /**
     * The difference between wanted and predicted.
     *
     * @return such as {@code dE00 0.4, same to the eye}; says so where nothing is predicted
     */
    public String differenceWords() {
        return predicted
                .map(p -> text("dE00 %.1f, %s", p.de00Median(), p.nearness().text()))
                .orElse("not predicted");
    }

    /**
     * Everything in sentences.
     *
     * @param from where the band begins, as lengths are shown
     * @param to where it ends
     * @return text for a tooltip or to be read out
     */
    public String sentences(String from, String to) {
        String wanted = text(
                "Band %s, %s to %s. Wanted: %s, %s, screen colour %s in the middle.",
                title(), from, to, colourWords(), films(filmWantedNm, bSideFilmWantedNm), wantedHex);
        return wanted
                + predicted
                        .map(p -> text(
                                " Predicted: %s (%d)%s, %s, screen colour %s in the middle. Difference dE00 %.1f in the"
                                        + " median (%s), at worst %.1f (%s).",
                                p.colourName(),
                                p.order(),
                                fade() ? " at its A side" : "",
                                films(p.filmNm(), p.bSideFilmNm()),
                                p.hex(),
                                p.de00Median(),
                                p.nearness().text(),
                                p.de00Worst(),
                                Nearness.of(p.de00Worst()).text()))
                        .orElse(" Nothing is predicted: the design cannot be made as drawn.");
    }

    private boolean fade() {
        return filmWantedNm != bSideFilmWantedNm;
    }

    private String films(double aSideNm, double bSideNm) {
        return fade() ? text("%.1f–%.1f nm", aSideNm, bSideNm) : text("%.1f nm", aSideNm);
    }

    private static String text(String form, Object... values) {
        return String.format(Locale.ROOT, form, values);
    }
}
