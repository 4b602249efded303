package tideband.plan;

import java.util.List;
import java.util.function.IntPredicate;
import tideband.piece.End;

/** What one immersion finishes: the walk outward, word for word from the specification. */
final class Walk {

    private Walk() {}

    static boolean[] finishes(Problem problem, IntPredicate masked, End end) {
        List<Stretch> bands = problem.stretches();
        int n = bands.size();
        double totalMm = bands.stream().mapToDouble(Stretch::lengthMm).sum();
        boolean[] finished = new boolean[n];
        double running = Double.POSITIVE_INFINITY;
        double farMm = 0;
        for (int k = 0; k < n; k++) {
            int i = end == End.A ? k : n - 1 - k;
            Stretch band = bands.get(i);
            farMm += band.lengthMm();
            if (farMm > totalMm - problem.dryMm() + 1e-9) {
                break;
            }
            if (masked.test(i)) {
                continue;
            }
            if (band.bare()) {
                break;
            }
            double deep = end == End.A ? band.aSideNm() : band.bSideNm();
            double far = end == End.A ? band.bSideNm() : band.aSideNm();
            boolean conflict = false;
            int next = end == End.A ? i + 1 : i - 1;
            if (next >= 0 && next < n && !masked.test(next)) {
                boolean crisp = bands.get(Math.min(i, next)).crispAtB();
                double there = end == End.A
                        ? bands.get(next).aSideNm()
                        : bands.get(next).bSideNm();
                conflict = crisp && there < far;
            }
            finished[i] = far <= deep && deep <= running && !conflict;
            running = Math.min(running, Math.min(deep, far));
        }
        return finished;
    }
}
