package tideband.plan;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;

/** How bands, films and minutes are put in sentences. */
final class Wording {

    private final Problem problem;

    Wording(Problem problem) {
        this.problem = problem;
    }

    /** A number with at most so many decimals, none of them idle. */
    static String number(double value, int decimals) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    static String minutes(double minutes) {
        return number(minutes, 2) + " min";
    }

    String name(int band) {
        return problem.nameOf(band);
    }

    /** A band's name with its film: {@code dusk (150 to 46 nm)}. */
    String withFilm(int band) {
        Stretch s = problem.stretches().get(band);
        if (s.bare()) {
            return name(band) + " (bare)";
        }
        String a = number(s.aSideNm(), 2);
        String b = number(s.bSideNm(), 2);
        return name(band) + " (" + (a.equals(b) ? a : a + " to " + b) + " nm)";
    }

    /** The names of some bands with their least films: {@code dusk (46 nm) and tail (60 nm)}. */
    String withLows(long bands) {
        StringBuilder words = new StringBuilder();
        List<Integer> list = Masks.list(bands);
        for (int i = 0; i < list.size(); i++) {
            Stretch s = problem.stretches().get(list.get(i));
            String join = i == 0 ? "" : i == list.size() - 1 ? " and " : ", ";
            String from = s.aSideNm() == s.bSideNm() ? "" : "from ";
            words.append(join).append(name(list.get(i))).append(" (").append(from);
            words.append(number(Math.min(s.aSideNm(), s.bSideNm()), 2)).append(" nm)");
        }
        return words.toString();
    }

    /** The names of some bands, the neighbours in a long run by its first and last. */
    String names(long bands) {
        StringBuilder names = new StringBuilder();
        List<Run> runs = Masks.runList(bands);
        for (int i = 0; i < runs.size(); i++) {
            Run run = runs.get(i);
            String join = i == 0 ? "" : i == runs.size() - 1 ? " and " : ", ";
            names.append(join).append(name(run.first()));
            if (run.last() > run.first()) {
                names.append(run.last() == run.first() + 1 ? " and " : " to ").append(name(run.last()));
            }
        }
        return names.toString();
    }
}
