package tideband.cli;

import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.optics.Finish;
import tideband.oxide.Metal;

/**
 * Reads an option whose value is one of a few words.
 *
 * @param <T> what the words stand for
 */
abstract class Words<T> implements ITypeConverter<T> {
    private final List<T> all;
    private final Function<T, String> word;

    private Words(T[] all, Function<T, String> word) {
        this.all = Arrays.asList(all);
        this.word = word;
    }

    @Override
    public T convert(String given) {
        return all.stream()
                .filter(each -> word.apply(each).equals(given))
                .findFirst()
                .orElseThrow(() -> new TypeConversionException(
                        "'" + given + "' is none of " + all.stream().map(word).collect(Collectors.joining(", "))));
    }

    /** Reads a metal. */
    static final class OfMetal extends Words<Metal> {
        OfMetal() {
            super(Metal.values(), Metal::key);
        }
    }

    /** Reads a finish. */
    static final class OfFinish extends Words<Finish> {
        OfFinish() {
            super(Finish.values(), Finish::key);
        }
    }

    /** Reads a light. */
    static final class OfLight extends Words<Illuminant> {
        OfLight() {
            super(Illuminant.values(), Illuminant::key);
        }
    }

    /** Reads an observer by its field in degrees. */
    static final class OfObserver extends Words<Observer> {
        OfObserver() {
            super(Observer.values(), observer -> Integer.toString(observer.key()));
        }
    }
}
