package tideband.window.settings;

import java.util.List;
import java.util.Optional;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.design.Design;
import tideband.edit.DesignEdits;
import tideband.optics.Finish;
import tideband.oxide.Metal;
import tideband.window.entry.About;
import tideband.window.entry.Choice;

/** Of what the piece is made and how its colours are looked at. */
final class LookSettings {
    private LookSettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Metal and look",
                () -> chosen(make),
                List.of(
                        make.choice(
                                new About(
                                        "metal",
                                        "Metal",
                                        "Decides the colours there are. A bath is fitted for one metal, so another metal takes"
                                                + " a preset bath of its own."),
                                List.of(
                                        new Choice<>(Metal.TITANIUM, "Titanium", "Commercially pure, grade 1 or 2."),
                                        new Choice<>(
                                                Metal.TI_6AL_4V,
                                                "Ti-6Al-4V",
                                                "The alloy of grade 5. Shown with titanium's optical constants, as no open"
                                                        + " set of its own was found."),
                                        new Choice<>(Metal.NIOBIUM, "Niobium", "Its film is Nb2O5."),
                                        new Choice<>(Metal.TANTALUM, "Tantalum", "Its film is Ta2O5.")),
                                Optional.empty(),
                                Design::metal,
                                metal -> "",
                                DesignEdits::metal),
                        make.choice(
                                new About(
                                        "finish",
                                        "Finish",
                                        "The surface before anodizing: how far it is from a mirror."),
                                List.of(
                                        new Choice<>(Finish.MIRROR, "Mirror", "One ideal mirror."),
                                        new Choice<>(
                                                Finish.POLISHED,
                                                "Polished",
                                                "Polished by hand, machine or electrolytically."),
                                        new Choice<>(Finish.SATIN, "Satin", "Brushed or finely abraded."),
                                        new Choice<>(Finish.BLASTED, "Blasted", "Blasted or coarsely etched.")),
                                Finish.POLISHED,
                                Design::finish,
                                DesignEdits::finish),
                        make.choice(
                                new About(
                                        "light",
                                        "Light",
                                        "The light the colours are judged in. A film's colour changes with it; a colour given"
                                                + " as #rrggbb keeps its look on a screen."),
                                List.of(
                                        new Choice<>(Illuminant.A, "A", "Incandescent lamp, 2856 K."),
                                        new Choice<>(Illuminant.D50, "D50", "Horizon daylight, 5003 K; print."),
                                        new Choice<>(Illuminant.D65, "D65", "Noon daylight, 6504 K."),
                                        new Choice<>(Illuminant.F2, "F2", "Cool white fluorescent lamp."),
                                        new Choice<>(Illuminant.F11, "F11", "Narrow-band fluorescent lamp, 4000 K."),
                                        new Choice<>(Illuminant.LED_B3, "LED-B3", "Blue-pumped white LED, 4103 K.")),
                                Illuminant.D65,
                                Design::light,
                                DesignEdits::light),
                        make.choice(
                                new About(
                                        "observer",
                                        "Observer",
                                        "The CIE standard observer colours are worked out for."),
                                List.of(
                                        new Choice<>(
                                                Observer.CIE_1931_2_DEGREE,
                                                "2 degrees",
                                                "CIE 1931: for small fields, such as a thin rod in the hand."),
                                        new Choice<>(
                                                Observer.CIE_1964_10_DEGREE,
                                                "10 degrees",
                                                "CIE 1964: for large fields, such as a plate close by.")),
                                Observer.CIE_1931_2_DEGREE,
                                Design::observer,
                                DesignEdits::observer)));
    }

    private static String chosen(DesignSettings make) {
        Design design = make.design();
        return design.metal().key() + ", " + design.finish().key() + ", "
                + design.light().key();
    }
}
