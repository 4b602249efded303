package tideband.bench;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import tideband.design.Design;
import tideband.oxide.Metal;
import tideband.plan.Plan;
import tideband.pull.Pull;
import tideband.pull.Row;

/**
 * Which cautions apply to a plan.
 *
 * <p>Levels of direct voltage follow IEC 61558-1:2005, 3.7.16 (120 V, end of extra-low voltage), IEC 60364-4-41, 414.4.5
 * (60 V dry, 30 V otherwise, for bare parts) and IEC 60204-1, 6.4.1 (15 V in wet places). They are planner's levels: a
 * local code may set lower ones, and it goes first.
 */
public final class Cautions {
    /** Beyond this difference a film shows another colour than was asked for: common practice, no source. */
    private static final double COLOUR_IN_REACH_DE00 = 5;

    /** IEC 60204-1, 6.4.1: bare parts outside dry places. */
    private static final double WET_HANDS_ABOVE_V = 15;

    /** IEC 60364-4-41, 414.4.5: bare parts in other than dry conditions. */
    private static final double NO_WET_CONTACT_ABOVE_V = 30;

    /** IEC 60364-4-41, 414.4.5: bare parts in dry conditions. */
    private static final double GUARD_ABOVE_V = 60;

    /** IEC 61558-1:2005, 3.7.16: ripple-free direct voltage. */
    private static final double EXTRA_LOW_UP_TO_V = 120;

    /** Share of a bath's ceiling above which colour may suffer: common practice, no source. */
    private static final double NEAR_CEILING = 0.8;

    /** Molar volume of an ideal gas at 20 °C and 101.325 kPa, {@code R T / p} with R of CODATA 2018, in L/mol. */
    private static final double LITRES_PER_MOL = 8.314_462_618 * 293.15 / 101.325;

    /** Two electrons a molecule of hydrogen. */
    private static final double LITRES_PER_COULOMB = LITRES_PER_MOL / (2 * Metal.FARADAY_C_PER_MOL);

    private static final String LOCAL_CODES =
            " Local electrical and workplace codes, and a licensed electrician where they ask for one, go before this"
                    + " sheet.";
    private static final String LOCAL_RULES =
            " The maker's safety data sheet and local rules for chemicals and waste go before this sheet.";

    private Cautions() {}

    /**
     * The cautions that apply, the gravest first.
     *
     * @param design what is to be made
     * @param plan its immersions
     * @param pulls one pull an immersion
     * @return the cautions, in a fixed order
     */
    public static List<Caution> of(Design design, Plan plan, List<Pull> pulls) {
        if (pulls.size() != plan.immersions().size()) {
            throw new IllegalArgumentException("there must be one pull an immersion, but there were " + pulls.size()
                    + " for " + plan.immersions().size() + " immersions");
        }
        double highestV = highestVolts(pulls);
        List<Caution> cautions = new ArrayList<>();
        electric(highestV).forEach(cautions::add);
        chemical(design.bath().name()).forEach(cautions::add);
        if (highestV > 0) {
            cautions.add(hydrogen(pulls));
        }
        cautions.add(chloride());
        nearCeiling(design, highestV).forEach(cautions::add);
        if (design.metal() == Metal.TI_6AL_4V) {
            cautions.add(new Caution(
                    "Colours of Ti-6Al-4V are titanium's",
                    "No open set of optical constants of this alloy was found, so the colours shown are those of"
                            + " titanium. Trust a coupon of the same alloy and finish before the picture."));
        }
        cautions.add(new Caution(
                "Pickling is not part of this sheet",
                "Pickles with hydrofluoric acid are work for trained staff with the right first aid at hand, under local"
                        + " rules. Do not degrease with chlorinated solvents or methanol."));
        cautions.add(new Caution(
                "Coded and medical parts",
                "Where a colour says which screw, plate or tool a part is, the code belongs to the owner of the device"
                        + " and is never read from the hue. Such parts, and all implants, are made under the owner's"
                        + " own procedure and signed limit samples."));
        return List.copyOf(cautions);
    }

    /**
     * Says of which bands the colour asked for is out of reach.
     *
     * @param bands the bands with the films found for them
     * @return one caution a band whose film shows another colour than the drawing asks for
     */
    static List<Caution> ofColours(List<BenchBand> bands) {
        return bands.stream()
                .filter(band -> band.wantedDe00() > COLOUR_IN_REACH_DE00)
                .map(band -> new Caution(
                        "Colour out of reach: " + band.name(),
                        String.format(
                                Locale.ROOT,
                                "No film this metal, finish and bath can show comes nearer to %s than %.1f dE00: the nearest is"
                                        + " %s, %.1f nm. Ask whether that will do before you begin.",
                                band.wantedHex(),
                                band.wantedDe00(),
                                band.aSide().name().text(),
                                band.aSide().filmNm())))
                .toList();
    }

    private static double highestVolts(List<Pull> pulls) {
        return pulls.stream()
                .flatMap(p -> p.rows().stream())
                .mapToDouble(Row::volts)
                .max()
                .orElse(0);
    }

    private static Stream<Caution> electric(double highestV) {
        String reached = "This plan goes to " + plain(highestV, 1) + " V DC. ";
        if (highestV > EXTRA_LOW_UP_TO_V) {
            return Stream.of(new Caution(
                    "Outside extra-low voltage: over 120 V",
                    reached
                            + "It can kill, wet or dry. The installation must be built and checked by a licensed"
                            + " electrician: guards, an interlock that takes the volts away when they open, an emergency"
                            + " stop, and no lone work. Nobody touches piece, holder, bath or leads while the supply is"
                            + " on." + LOCAL_CODES));
        }
        if (highestV > GUARD_ABOVE_V) {
            return Stream.of(new Caution(
                    "Guard and interlock: over 60 V",
                    reached
                            + "Guard the bath and all bare metal, with an interlock that takes the volts away when the"
                            + " guard opens, and move the piece by an insulated handle. No hand near bath, piece or leads"
                            + " until the supply is off and its meter reads 0 V." + LOCAL_CODES));
        }
        if (highestV > NO_WET_CONTACT_ABOVE_V) {
            return Stream.of(new Caution(
                    "No wet contact: over 30 V",
                    reached
                            + "Touch neither bath, piece, holder nor leads while the supply is on, and least of all with"
                            + " wet hands or gloves. Move the piece by a dry insulated handle. Supply off and 0 V on its"
                            + " meter before you reach in." + LOCAL_CODES));
        }
        if (highestV > WET_HANDS_ABOVE_V) {
            return Stream.of(new Caution(
                    "Wet hands: over 15 V",
                    reached
                            + "Wet skin carries current well. Dry gloves, a dry floor, one hand at a time, and the supply"
                            + " off before you reach into the bath." + LOCAL_CODES));
        }
        return Stream.of();
    }

    /** By the bath's name; one that says nothing is taken to burn. */
    private static Stream<Caution> chemical(String bathName) {
        String name = bathName.toLowerCase(Locale.ROOT);
        List<Caution> found = new ArrayList<>();
        if (holds(name, "sulfuric", "sulphuric", "phosphoric", "h2so4", "h3po4", "acid")) {
            found.add(new Caution(
                    "Acid bath",
                    "It burns skin and eyes, and its mist burns the lungs. Goggles and face shield, acid-proof gloves and"
                            + " apron, an extractor or open air, an eye wash within reach. Acid into water, never water"
                            + " into acid." + LOCAL_RULES));
        }
        if (holds(name, "phosphate", "tsp", "carbonate", "hydroxide", "caustic", "naoh", "koh", "alkali")) {
            found.add(new Caution(
                    "Alkaline bath",
                    "Baths of carbonate, and of phosphate salts such as TSP, can be caustic: they harm eyes first, then"
                            + " skin, and feel only slippery. Goggles, alkali-proof gloves, an eye wash within reach."
                            + LOCAL_RULES));
        }
        if (holds(name, "borax", "borate", "boric")) {
            found.add(new Caution(
                    "Borate bath",
                    "Borates are classed as harmful to fertility and the unborn child. Gloves, no dust, no food or drink"
                            + " near the bath." + LOCAL_RULES));
        }
        if (found.isEmpty()) {
            found.add(new Caution(
                    "Bath: read its safety data sheet",
                    "This bath's name does not say what is in it. Until you have read its safety data sheet, treat it as"
                            + " corrosive: goggles, gloves, apron, an eye wash within reach." + LOCAL_RULES));
        }
        return found.stream();
    }

    private static boolean holds(String name, String... words) {
        return Stream.of(words).anyMatch(name::contains);
    }

    private static Caution hydrogen(List<Pull> pulls) {
        double mostCoulombs =
                pulls.stream().mapToDouble(p -> p.peakAmps() * p.durationS()).sum();
        String amount = mostCoulombs > 0
                ? "At most " + plain(atLeastTwoFigures(mostCoulombs * LITRES_PER_COULOMB), 4)
                        + " L over the whole plan, if the peak current flowed all the time. "
                : "";
        return new Caution(
                "Hydrogen at the cathode",
                amount
                        + "It burns from 4 % in air. Work in moving air, with no lid over the bath and no flame or spark"
                        + " near it; make and break contacts with the supply off.");
    }

    /** Rounded up to two figures, so that the bound stays one. */
    private static double atLeastTwoFigures(double litres) {
        return BigDecimal.valueOf(litres)
                .round(new MathContext(2, RoundingMode.CEILING))
                .doubleValue();
    }

    private static Caution chloride() {
        return new Caution(
                "Never salt",
                "No table salt, no other chloride and no hydrochloric acid in the bath or in the rinse before it: the"
                        + " anode makes chlorine gas of it, and titanium pits.");
    }

    private static Stream<Caution> nearCeiling(Design design, double highestV) {
        double ceilingV = design.bath().ceilingVolts();
        if (!(highestV > NEAR_CEILING * ceilingV)) {
            return Stream.of();
        }
        return Stream.of(new Caution(
                "Near the bath's ceiling",
                "The plan goes to " + plain(highestV, 1) + " V, and this bath's ceiling is " + plain(ceilingV, 1)
                        + " V. Near it a film may crystallise, grey or spark. If the current stops falling during a hold,"
                        + " or you see or hear sparks, switch the supply off. Try it on a coupon first."));
    }

    private static String plain(double value, int decimals) {
        return BigDecimal.valueOf(value)
                .setScale(decimals, RoundingMode.HALF_EVEN)
                .stripTrailingZeros()
                .toPlainString();
    }
}
