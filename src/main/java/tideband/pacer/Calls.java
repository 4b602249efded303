package tideband.pacer;

import tideband.oxide.Supply;
import tideband.pull.Row;
import tideband.sheet.Figures;
import tideband.sheet.HandMark;

/** Puts a mark into few and large words. */
final class Calls {
    private final Supply supply;

    Calls(Supply supply) {
        this.supply = supply;
    }

    /** A mark with the state before it and the stretch after it. */
    Call call(HandMark mark, Row before, Stretch after, boolean last) {
        if (last) {
            return call(mark, "RINSE", "", before.volts() > 0);
        }
        boolean on = before.volts() == 0 && after.live();
        boolean off = before.volts() > 0 && !after.live();
        boolean jump = before.volts() > 0
                && after.live()
                && before.volts() != mark.row().volts();
        String lead = on ? "ON \u00b7 " : jump ? "SET \u00b7 " : "";
        Row to = after.to();
        String depth = "to " + Figures.fixed(to.depthMm(), 1) + " mm";
        String volts = Figures.volts(to.volts(), supply) + " V";
        return switch (mark.row().act()) {
            case LOWERED, OFF -> call(mark, "STAND", "supply off", off);
            case RAISE -> call(mark, lead + "RAISE", "to " + volts, on);
            case HOLD -> call(mark, lead + "HOLD", "at " + mark.volts(supply) + " V", on);
            case WITHDRAW -> call(mark, "OFF \u00b7 DRAW", depth, off);
            case FADE -> call(mark, lead + "FADE", depth, on);
            case FOLLOW -> call(mark, (on ? "ON \u00b7 " : "") + "FOLLOW", depth, on);
            case LIFT_OUT -> call(mark, "OFF \u00b7 LIFT", "out of the bath", off);
        };
    }

    private Call call(HandMark mark, String words, String target, boolean switches) {
        return new Call(
                mark,
                words,
                target,
                mark.volts(supply),
                Figures.clock(mark.row().timeS()),
                switches);
    }

    /** The volts somewhere in a stretch, in words as the timing table has them. */
    String volts(Stretch stretch, double volts) {
        if (!stretch.live()) {
            return "off";
        }
        String figures = Figures.volts(volts, supply);
        return stretch.from().act() == Row.Act.FOLLOW ? "(" + figures + ")" : figures;
    }
}
