package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import tideband.pull.Pull;
import tideband.pull.Row;

/** Cuts a pull into what a person does as one act each. */
final class Stages {
    /** A pull of more acts than this is told in short. */
    private static final int MANY = 6;

    private static final int FEWEST_IN_SHORT = 3;

    private final List<Row> rows;
    private final List<Stage> stages = new ArrayList<>();

    private Stages(Pull pull) {
        this.rows = pull.rows();
        for (int first = 0; first + 1 < rows.size(); ) {
            first = take(first);
        }
    }

    /** The acts of a pull, from lowering to lifting out; where there are many, holds in a row are one. */
    static List<Stage> of(Pull pull) {
        List<Stage> all = new Stages(pull).stages;
        return all.size() > MANY ? inShort(all) : List.copyOf(all);
    }

    /** Takes the act that begins at a row, and gives the row at which it is over. */
    private int take(int first) {
        int main = first;
        while (main + 2 < rows.size() && isBefore(rows.get(main).act())) {
            main++;
        }
        WorkCard.Kind kind = switch (rows.get(main).act()) {
            case HOLD -> WorkCard.Kind.HOLD;
            case FADE -> WorkCard.Kind.FADE;
            case FOLLOW -> WorkCard.Kind.FOLLOW;
            case LOWERED -> WorkCard.Kind.DIP;
            case RAISE, OFF, WITHDRAW, LIFT_OUT -> WorkCard.Kind.LIFT;
        };
        int last = main + 1;
        while (moves(kind)
                && last + 1 < rows.size()
                && rows.get(last).act() == rows.get(main).act()) {
            last++;
        }
        double drawS = 0;
        for (int i = first; i < main; i++) {
            drawS += rows.get(i).act() == Row.Act.RAISE
                    ? 0
                    : rows.get(i + 1).timeS() - rows.get(i).timeS();
        }
        Row before = rows.get(first);
        Row from = rows.get(main);
        Row to = rows.get(last);
        stages.add(new Stage(
                kind,
                last,
                kind == WorkCard.Kind.HOLD ? 1 : 0,
                drawS,
                from.timeS() - before.timeS() - drawS,
                to.timeS() - from.timeS(),
                from.volts(),
                to.volts(),
                moves(kind) || kind == WorkCard.Kind.LIFT ? from.depthMm() : before.depthMm(),
                to.depthMm(),
                moves(kind) || kind == WorkCard.Kind.LIFT ? from.lineMm() : before.lineMm(),
                to.lineMm()));
        return last;
    }

    private static boolean moves(WorkCard.Kind kind) {
        return kind == WorkCard.Kind.FADE || kind == WorkCard.Kind.FOLLOW;
    }

    private static boolean isBefore(Row.Act act) {
        return switch (act) {
            case RAISE, OFF, WITHDRAW -> true;
            case LOWERED, HOLD, FADE, FOLLOW, LIFT_OUT -> false;
        };
    }

    private static List<Stage> inShort(List<Stage> all) {
        List<Stage> few = new ArrayList<>();
        for (int first = 0; first < all.size(); ) {
            int after = first;
            while (after < all.size() && all.get(after).kind() == WorkCard.Kind.HOLD) {
                after++;
            }
            if (after - first >= FEWEST_IN_SHORT) {
                few.add(together(all.subList(first, after)));
                first = after;
            } else {
                few.add(all.get(first));
                first++;
            }
        }
        return few;
    }

    private static Stage together(List<Stage> holds) {
        Stage first = holds.get(0);
        Stage last = holds.get(holds.size() - 1);
        double allS = holds.stream().mapToDouble(Stage::wholeS).sum();
        return new Stage(
                WorkCard.Kind.HOLDS,
                last.lastRow(),
                holds.size(),
                first.drawS(),
                0,
                allS - first.drawS(),
                first.toVolts(),
                last.toVolts(),
                first.toDepthMm(),
                last.toDepthMm(),
                first.toLineMm(),
                last.toLineMm());
    }
}
