package tideband.design;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word a mistyped one was meant to be. */
final class Nearest {

    // A key far longer than any of ours is no slip of the finger.
    private static final int LONGEST = 64;

    private Nearest() {}

    /**
     * The known word fewest slips away: a letter left out, put in, changed or swapped with its neighbour (optimal string
     * alignment distance). Upper and lower case are taken as one.
     *
     * @return the nearest, the first of equals, if at most a third of its letters differ
     */
    static Optional<String> to(String word, Collection<String> known) {
        if (word.length() > LONGEST) {
            return Optional.empty();
        }
        String nearest = null;
        int fewest = Integer.MAX_VALUE;
        for (String candidate : known) {
            int slips = slips(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
            if (slips < fewest && slips <= Math.max(1, candidate.length() / 3)) {
                fewest = slips;
                nearest = candidate;
            }
        }
        return Optional.ofNullable(nearest);
    }

    private static int slips(String a, String b) {
        int[][] distance = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    distance[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                int best = Math.min(distance[i - 1][j] + 1, distance[i][j - 1] + 1);
                best = Math.min(best, distance[i - 1][j - 1] + change);
                boolean swapped =
                        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
                distance[i][j] = swapped ? Math.min(best, distance[i - 2][j - 2] + 1) : best;
            }
        }
        return distance[a.length()][b.length()];
    }
}
