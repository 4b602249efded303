package tideband.cli;

import picocli.CommandLine.Option;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.oxide.Metal;
import tideband.sheet.Figures;

/** The metal, and how it is looked at. */
final class LookOptions {
    @Option(
            names = "--metal",
            required = true,
            converter = Words.OfMetal.class,
            paramLabel = "METAL",
            description = "titanium, ti-6al-4v, niobium or tantalum.")
    private Metal metal;

    @Option(
            names = "--finish",
            converter = Words.OfFinish.class,
            defaultValue = "polished",
            paramLabel = "FINISH",
            description = "mirror (one ideal mirror), polished, satin or blasted. Default: ${DEFAULT-VALUE}.")
    private Finish finish;

    @Option(
            names = "--light",
            converter = Words.OfLight.class,
            defaultValue = "D65",
            paramLabel = "LIGHT",
            description = "CIE illuminant: A, D50, D65, F2, F11 or LED-B3. Default: ${DEFAULT-VALUE}.")
    private Illuminant light;

    @Option(
            names = "--observer",
            converter = Words.OfObserver.class,
            defaultValue = "2",
            paramLabel = "DEGREES",
            description = "CIE observer: 2 (1931) or 10 (1964). Default: ${DEFAULT-VALUE}.")
    private Observer observer;

    @Option(
            names = "--angle",
            converter = Decimal.class,
            defaultValue = "0",
            paramLabel = "DEGREES",
            description = "Angle of light and eye from the normal, 0 to 85. Default: ${DEFAULT-VALUE}.")
    private double angleDegrees;

    void check(Limits limits) {
        limits.within("--angle", angleDegrees, 0, 85, "degrees");
    }

    Metal metal() {
        return metal;
    }

    Viewing viewing() {
        return Viewing.of(light, observer);
    }

    Palette palette(FilmSystem system, double maxNm) {
        return new Palette(system, finish, viewing(), angleDegrees, maxNm);
    }

    /** Metal, finish and light in words. */
    String words() {
        return metal.key() + ", " + finish.key() + ", " + light.key() + ", " + observer.key()
                + " degree observer, seen at " + Figures.plain(angleDegrees, 6) + " degrees";
    }

    /** Tells where the optical constants come from, and how the finish is drawn. */
    void tell(CsvWriter csv, FilmSystem system) {
        system.metal().source().lines().forEach(line -> csv.comment("metal: " + line));
        system.oxide().source().lines().forEach(line -> csv.comment("oxide: " + line));
        if (metal == Metal.TI_6AL_4V) {
            csv.comment("no open set of constants of Ti-6Al-4V was found: these are titanium's");
        }
        if (finish != Finish.MIRROR) {
            csv.comment("finish " + finish.key() + ", estimated: local tilt " + Figures.plain(finish.tiltDegrees(), 2)
                    + " degrees, local film " + Figures.plain(100 * finish.filmSpread(), 2)
                    + " % (standard deviations),"
                    + " first-surface scatter " + Figures.plain(100 * finish.scatteredShare(), 2) + " %");
        }
    }
}
