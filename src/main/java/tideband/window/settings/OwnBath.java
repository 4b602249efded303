package tideband.window.settings;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import tideband.design.Design;
import tideband.edit.DesignEdits;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;

/** How a bath becomes the shop's own: under a name of its own, and saying which of its numbers were set by hand. */
final class OwnBath {
    private static final String OWN = "own ";
    private static final String BY_HAND = " Set by hand: ";
    private static final int LONGEST_NAME = 80;
    private static final int LONGEST_SOURCE = 1000;

    /** The numbers of a bath. */
    enum Figure {
        /** Film a volt. */
        RATIO("ratio"),
        /** Field slope. */
        SLOPE("field slope"),
        /** Native film. */
        NATIVE("native film"),
        /** Current efficiency. */
        EFFICIENCY("efficiency"),
        /** Resistance. */
        RESISTANCE("resistance"),
        /** Ceiling. */
        CEILING("ceiling"),
        /** Index scale. */
        INDEX("index scale");

        private final String text;

        Figure(String text) {
            this.text = text;
        }
    }

    private OwnBath() {}

    /** The preset a bath was made from, as far as its name tells; else the metal's usual one. */
    static Bath base(Bath bath) {
        String name = bath.name().startsWith(OWN) ? bath.name().substring(OWN.length()) : bath.name();
        return BathPresets.named(bath.metal(), name).orElseGet(() -> BathPresets.usual(bath.metal()));
    }

    /** The design with one number of its bath changed. The file of a bath that was fitted is left alone. */
    static Design with(Design design, Figure which, double number) {
        Bath old = design.bath();
        boolean own = old.name().startsWith(OWN);
        String name = own ? old.name() : cut(OWN + old.name(), LONGEST_NAME);
        Bath bath = new Bath(
                name,
                old.metal(),
                which == Figure.RATIO ? number : old.nmPerVolt(),
                which == Figure.SLOPE ? number : old.fieldSlope(),
                which == Figure.NATIVE ? number : old.nativeNm(),
                which == Figure.EFFICIENCY ? number : old.efficiency(),
                which == Figure.RESISTANCE ? number : old.resistanceOhm(),
                which == Figure.CEILING ? number : old.ceilingVolts(),
                which == Figure.INDEX ? number : old.indexScale(),
                source(old.source(), which));
        return DesignEdits.bath(design, bath, own ? design.bathFile() : Optional.empty());
    }

    static Bath named(Bath old, String name) {
        return new Bath(
                name,
                old.metal(),
                old.nmPerVolt(),
                old.fieldSlope(),
                old.nativeNm(),
                old.efficiency(),
                old.resistanceOhm(),
                old.ceilingVolts(),
                old.indexScale(),
                old.source());
    }

    private static String source(String old, Figure which) {
        int mark = old.lastIndexOf(BY_HAND);
        String before = mark < 0 ? old : old.substring(0, mark);
        List<String> byHand = new ArrayList<>();
        if (mark >= 0) {
            String list = old.substring(mark + BY_HAND.length()).replaceAll("\\.$", "");
            byHand.addAll(Arrays.asList(list.split(", ", -1)));
        }
        if (!byHand.contains(which.text)) {
            byHand.add(which.text);
        }
        String after = BY_HAND + String.join(", ", byHand) + ".";
        return cut(before, LONGEST_SOURCE - after.length()) + after;
    }

    private static String cut(String text, int most) {
        int count = text.codePointCount(0, text.length());
        return count <= most
                ? text
                : text.substring(0, text.offsetByCodePoints(0, most)).strip();
    }
}
