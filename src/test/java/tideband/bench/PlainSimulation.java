package tideband.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import tideband.design.Design;
import tideband.piece.End;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.pull.Row;

/**
 * The growth law carried out on a piece in the plainest way, to hold the trial against: no code is shared with it.
 *
 * <pre>
 *   i = 0.1 mA/cm² · exp( s · ( k · V_film / d − 1 ) )      high-field law (L. Young, Anodic Oxide Films, 1961)
 *   dd/dt = eta · M / (z · F · rho) · i                     Faraday's law
 *   V_film = V − I · R + d0 / k ,  I = Σ A i ≤ limit        one supply, one resistance
 * </pre>
 *
 * <p>Cells of at most half a millimetre; midpoint steps in which no film grows by more than {@value #STEP_NM} nm and no time
 * longer than {@value #STEP_S} s passes, and which end where the line passes the middle of a cell.
 */
final class PlainSimulation {
    private static final double STEP_NM = 0.1;
    private static final double STEP_S = 0.1;
    private static final double FARADAY = 96_485.332_12;

    /**
     * A metal in a bath.
     *
     * @param k nm/V at 0.1 mA/cm²
     * @param s field slope there
     * @param d0 native film in nm
     * @param eta current efficiency
     * @param molar molar mass of the oxide, g/mol
     * @param z electrons a formula unit
     * @param rho density of the oxide, g/cm³
     */
    private record Oxide(double k, double s, double d0, double eta, double molar, int z, double rho) {

        double milliAmpsPerCm2(double filmVolts, double nm) {
            return 0.1 * Math.exp(s * (k * filmVolts / nm - 1));
        }

        double nmPerS(double milliAmpsPerCm2) {
            return eta * molar / (z * FARADAY * rho) * milliAmpsPerCm2 * 1e-3 * 1e7;
        }
    }

    private static Oxide titanium(double k) {
        return new Oxide(k, 27.7, 3, 0.9, 79.866, 4, 3.8);
    }

    private static final Oxide NIOBIUM = new Oxide(2.45, 33.7, 4, 0.95, 265.81, 10, 4.6);
    private static final Oxide TANTALUM = new Oxide(1.77, 33.7, 3.3, 1, 441.893, 10, 8.0);

    /** Working defaults by metal and bath; ratios are common practice, no source. */
    private static final Map<String, Oxide> OXIDES = Map.ofEntries(
            Map.entry("titanium phosphate", titanium(1.80)),
            Map.entry("titanium sulfuric", titanium(1.65)),
            Map.entry("titanium bicarbonate", titanium(1.90)),
            Map.entry("titanium carbonate", titanium(1.45)),
            Map.entry("ti-6al-4v phosphate", titanium(1.80 * 1.05)),
            Map.entry("ti-6al-4v sulfuric", titanium(1.65 * 1.05)),
            Map.entry("ti-6al-4v bicarbonate", titanium(1.90 * 1.05)),
            Map.entry("ti-6al-4v carbonate", titanium(1.45 * 1.05)),
            Map.entry("niobium phosphate", NIOBIUM),
            Map.entry("niobium sulfuric", NIOBIUM),
            Map.entry("tantalum phosphate", TANTALUM),
            Map.entry("tantalum sulfuric", TANTALUM),
            Map.entry("tantalum shop tantalum", TANTALUM));

    private final Design design;
    private final Oxide oxide;
    private final double[] fromMm;
    private final double[] toMm;
    private final double[] filmNm;
    private final double[] cm2;

    PlainSimulation(Design design) {
        this.design = design;
        this.oxide = OXIDES.get(design.metal().key() + " " + design.bath().name());
        List<double[]> cells = new ArrayList<>();
        design.bands().forEach(band -> {
            int count = (int) Math.ceil((band.toMm() - band.fromMm()) / 0.5);
            double pitchMm = (band.toMm() - band.fromMm()) / count;
            for (int i = 0; i < count; i++) {
                cells.add(new double[] {band.fromMm() + i * pitchMm, band.fromMm() + (i + 1) * pitchMm});
            }
        });
        fromMm = cells.stream().mapToDouble(cell -> cell[0]).toArray();
        toMm = cells.stream().mapToDouble(cell -> cell[1]).toArray();
        filmNm = new double[cells.size()];
        Arrays.fill(filmNm, oxide.d0());
        cm2 = new double[cells.size()];
        for (int i = 0; i < cm2.length; i++) {
            cm2[i] = areaMm2(fromMm[i], toMm[i]) / 100;
        }
    }

    int cells() {
        return filmNm.length;
    }

    double middleMm(int cell) {
        return (fromMm[cell] + toMm[cell]) / 2;
    }

    double filmNm(int cell) {
        return filmNm[cell];
    }

    private double sizeMm(double atMm) {
        List<Station> stations = design.piece().stations();
        int i = 1;
        while (i < stations.size() - 1 && stations.get(i).atMm() < atMm) {
            i++;
        }
        Station a = stations.get(i - 1);
        Station b = stations.get(i);
        return a.sizeMm() + (b.sizeMm() - a.sizeMm()) * (atMm - a.atMm()) / (b.atMm() - a.atMm());
    }

    /** Wet surface of a cell; the size at its middle and the slant there, and the faces of the ends. */
    private double areaMm2(double aMm, double bMm) {
        double size = sizeMm((aMm + bMm) / 2);
        double slant = Math.hypot(bMm - aMm, (sizeMm(bMm) - sizeMm(aMm)) / 2);
        double faces = (aMm == 0 ? 1 : 0) + (bMm == design.piece().lengthMm() ? 1 : 0);
        if (design.piece().section() instanceof Section.Flat flat) {
            return 2 * size * (bMm - aMm) + 2 * flat.thicknessMm() * slant + faces * size * flat.thicknessMm();
        }
        if (design.piece().section() instanceof Section.Tube tube) {
            double bore = tube.boreMm();
            return Math.PI * (size * slant + bore * (bMm - aMm) + faces * (size * size - bore * bore) / 4);
        }
        return Math.PI * (size * slant + faces * size * size / 4);
    }

    /** One immersion: rows straight between, two at one time a jump, volts 0 off. */
    void dip(End down, List<Integer> maskedBands, List<Row> rows) {
        boolean[] wet = new boolean[filmNm.length];
        for (int cell = 0; cell < wet.length; cell++) {
            double middleMm = middleMm(cell);
            wet[cell] = fromDownMm(down, cell) < rows.get(0).lineMm()
                    && maskedBands.stream()
                            .map(band -> design.bands().get(band))
                            .noneMatch(band -> band.fromMm() < middleMm && middleMm < band.toMm());
        }
        for (int i = 1; i < rows.size(); i++) {
            Row from = rows.get(i - 1);
            Row to = rows.get(i);
            double lastsS = to.timeS() - from.timeS();
            double doneS = 0;
            while (doneS < lastsS) {
                double untilS = lastsS;
                for (int cell = 0; cell < wet.length; cell++) {
                    double passedShare = (from.lineMm() - fromDownMm(down, cell)) / (from.lineMm() - to.lineMm());
                    if (wet[cell] && passedShare >= 0 && passedShare < 1) {
                        untilS = Math.min(untilS, Math.max(passedShare * lastsS, doneS));
                    }
                }
                doneS = grow(wet, from.volts(), (to.volts() - from.volts()) / lastsS, doneS, untilS);
                double lineMm = from.lineMm() + (to.lineMm() - from.lineMm()) * doneS / lastsS;
                for (int cell = 0; cell < wet.length; cell++) {
                    wet[cell] &= fromDownMm(down, cell) < lineMm - 1e-9;
                }
            }
        }
    }

    private double fromDownMm(End down, int cell) {
        return down == End.A ? middleMm(cell) : design.piece().lengthMm() - middleMm(cell);
    }

    /** Grows by one midpoint step, at most to a moment; says when it is then. */
    private double grow(boolean[] wet, double startVolts, double voltsPerS, double atS, double untilS) {
        if (startVolts == 0 && voltsPerS == 0) {
            return untilS;
        }
        double[] rate = rates(wet, filmNm, startVolts + voltsPerS * atS);
        double fastest = Arrays.stream(rate).max().orElse(0);
        // Volts that are only being raised may not have begun to grow anything: so half a step at the rate that is to
        // come.
        double[] later = rates(wet, filmNm, startVolts + voltsPerS * Math.min(untilS, atS + STEP_S));
        fastest = Math.max(fastest, Arrays.stream(later).max().orElse(0));
        double stepS = Math.min(Math.min(STEP_S, untilS - atS), fastest > 0 ? STEP_NM / fastest : STEP_S);
        double[] middle = filmNm.clone();
        for (int cell = 0; cell < middle.length; cell++) {
            middle[cell] += rate[cell] * stepS / 2;
        }
        double[] half = rates(wet, middle, startVolts + voltsPerS * (atS + stepS / 2));
        for (int cell = 0; cell < middle.length; cell++) {
            filmNm[cell] += half[cell] * stepS;
        }
        return untilS - atS - stepS < 1e-12 ? untilS : atS + stepS;
    }

    private double[] rates(boolean[] wet, double[] nm, double volts) {
        double filmVolts = filmVolts(wet, nm, volts);
        double[] rate = new double[nm.length];
        for (int cell = 0; cell < nm.length; cell++) {
            if (wet[cell]) {
                boolean same = cell > 0 && wet[cell - 1] && nm[cell] == nm[cell - 1];
                rate[cell] = same ? rate[cell - 1] : oxide.nmPerS(oxide.milliAmpsPerCm2(filmVolts, nm[cell]));
            }
        }
        return rate;
    }

    private double filmVolts(boolean[] wet, double[] nm, double volts) {
        double drive = volts + oxide.d0() / oxide.k();
        double limit = design.supply().maxAmps();
        double ohm = design.bath().resistanceOhm();
        // With the films' own potential unknown, the one that balances is where either bound is met first.
        double low = 0;
        if (amps(wet, nm, drive) < 1e-12) {
            return drive;
        }
        return new BrentSolver(1e-9, 1e-9)
                .solve(
                        500,
                        p -> {
                            double amps = amps(wet, nm, p);
                            double overDrive = p + ohm * amps - drive;
                            double overLimit = Math.log(amps / limit);
                            return Math.max(Math.min(overDrive, 1e3), Math.min(overLimit, 1e3));
                        },
                        low,
                        drive + 1e-6);
    }

    private double amps(boolean[] wet, double[] nm, double filmVolts) {
        double sum = 0;
        double last = 0;
        for (int cell = 0; cell < nm.length; cell++) {
            if (wet[cell]) {
                boolean same = cell > 0 && wet[cell - 1] && nm[cell] == nm[cell - 1];
                last = same ? last : 1e-3 * oxide.milliAmpsPerCm2(filmVolts, nm[cell]);
                sum += cm2[cell] * last;
            }
        }
        return sum;
    }
}
