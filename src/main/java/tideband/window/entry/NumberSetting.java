package tideband.window.entry;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleConsumer;
import java.util.function.DoubleFunction;
import java.util.function.Supplier;

/** A number with a unit and a range. */
public final class NumberSetting extends TypedSetting {
    private final Measure measure;
    private final Bounds bounds;
    private final Supplier<OptionalDouble> value;
    private final DoubleFunction<String> alsoWrong;
    private final DoubleConsumer set;

    /**
     * A number.
     *
     * @param about what it is called and what it means
     * @param terms when it can be changed
     * @param measure how it is shown and typed
     * @param bounds what it may be
     * @param value what it is now; empty where it stands for several that differ
     * @param alsoWrong why a number within the range can still not be taken; empty where it can
     * @param set puts a number that was accepted in its place
     */
    public NumberSetting(
            About about,
            Terms terms,
            Measure measure,
            Bounds bounds,
            Supplier<OptionalDouble> value,
            DoubleFunction<String> alsoWrong,
            DoubleConsumer set) {
        super(about, terms);
        this.measure = measure;
        this.bounds = bounds;
        this.value = value;
        this.alsoWrong = alsoWrong;
        this.set = set;
        refresh();
    }

    /**
     * What it may be.
     *
     * @return the bounds, in the unit inside
     */
    public Bounds bounds() {
        return bounds;
    }

    /**
     * What it is now.
     *
     * @return the number in the unit inside; empty where it has no place or stands for several that differ
     */
    public OptionalDouble value() {
        return placedProperty().get() ? value.get() : OptionalDouble.empty();
    }

    @Override
    public String symbol() {
        return measure.symbol();
    }

    @Override
    Optional<?> now() {
        OptionalDouble now = value();
        return now.isPresent() ? Optional.of(now.getAsDouble()) : Optional.empty();
    }

    @Override
    String shownNow() {
        OptionalDouble now = value();
        return now.isPresent() ? text(now.getAsDouble()) : "";
    }

    @Override
    String accept(String text) {
        if (!bounds.word().isEmpty() && text.equalsIgnoreCase(bounds.word())) {
            set.accept(Double.POSITIVE_INFINITY);
            return "";
        }
        OptionalDouble read = measure.read(text);
        if (read.isEmpty()) {
            String what = text.isEmpty() ? "nothing is typed" : "that is no number";
            return what + "; it must be from " + limits();
        }
        double number = read.getAsDouble() + 0.0;
        if (!bounds.range().get().holds(number)) {
            return "must be from " + limits();
        }
        String fault = alsoWrong.apply(number);
        if (fault.isEmpty()) {
            set.accept(number);
        }
        return fault;
    }

    @Override
    String boundsNow() {
        OptionalDouble usual = bounds.usual().get();
        String unit = measure.symbol().isEmpty() ? "" : " " + measure.symbol();
        return limits() + (usual.isPresent() ? "; usual " + withUnit(usual.getAsDouble(), unit) : "");
    }

    private String limits() {
        String unit = measure.symbol().isEmpty() ? "" : " " + measure.symbol();
        String or = bounds.word().isEmpty() ? "" : ", or " + bounds.word();
        return measure.lowest(bounds.range().get().low()) + " to "
                + measure.highest(bounds.range().get().high()) + unit + or;
    }

    private String withUnit(double number, String unit) {
        return Double.isInfinite(number) ? bounds.word() : measure.number(number) + unit;
    }

    private String text(double number) {
        return withUnit(number, "");
    }

    @Override
    boolean unusualNow() {
        OptionalDouble usual = bounds.usual().get();
        OptionalDouble now = value();
        return usual.isPresent() && now.isPresent() && usual.getAsDouble() != now.getAsDouble();
    }

    @Override
    String setUsual() {
        double usual = bounds.usual().get().orElseThrow();
        String fault = alsoWrong.apply(usual);
        if (fault.isEmpty()) {
            set.accept(usual);
        }
        return fault;
    }
}
