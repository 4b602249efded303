package tideband.window.order;

import java.util.List;
import tideband.plan.Run;

/**
 * One act at the bench, ready to be shown. Equal cards look and read the same.
 *
 * @param number its place in the order of work, from 1
 * @param of how many there are
 * @param immersion index of the immersion it belongs to, 0-based
 * @param kind what is done
 * @param headline the act in a word or two, to be read from afar
 * @param figures what goes with it, most needed first: depth, volts, seconds, or what is masked
 * @param sentence all of it in one full sentence
 * @param runs the runs it masks or strips
 * @param stage depth, volts and seconds, as the pull has them; all 0 for what is done beside the bath
 * @param picture what its small picture shows
 */
public record WorkCard(
        int number,
        int of,
        int immersion,
        Kind kind,
        String headline,
        List<String> figures,
        String sentence,
        List<Run> runs,
        Stage stage,
        BenchPicture picture) {

    /** What is done. */
    public enum Kind {
        /** The piece is turned end for end. */
        TURN,
        /** A run is stripped. */
        STRIP,
        /** A run is masked. */
        MASK,
        /** The piece is lowered into the bath with the supply off. */
        DIP,
        /** Volts are held at a depth, after drawing out to it where it is not the first. */
        HOLD,
        /** Many holds, each a little shallower than the one before. */
        HOLDS,
        /** The piece is drawn out evenly with the supply on. */
        FADE,
        /** The piece is drawn out after the film, the supply's current limit holding the volts down. */
        FOLLOW,
        /** The supply is switched off, the piece lifted out and rinsed. */
        LIFT,
        /** All that is still masked is stripped. */
        STRIP_ALL
    }

    /** Copies the lists, so that the value cannot change. */
    public WorkCard {
        figures = List.copyOf(figures);
        runs = List.copyOf(runs);
    }

    /**
     * Whether it is done beside the bath, the piece lying.
     *
     * @return true for masking, stripping and turning
     */
    public boolean beside() {
        return switch (kind) {
            case TURN, STRIP, MASK, STRIP_ALL -> true;
            case DIP, HOLD, HOLDS, FADE, FOLLOW, LIFT -> false;
        };
    }
}
