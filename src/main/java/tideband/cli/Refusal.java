package tideband.cli;

import java.util.List;

/** Says why a command does not do what it was asked: input at fault, or something that cannot be read or written. */
final class Refusal extends Exception {
    private static final long serialVersionUID = 1;

    private final transient List<String> points;

    /**
     * A refusal.
     *
     * @param head what is refused, in one line
     * @param points every reason, one a line
     */
    Refusal(String head, List<String> points) {
        super(head);
        this.points = List.copyOf(points);
    }

    List<String> points() {
        return points;
    }
}
