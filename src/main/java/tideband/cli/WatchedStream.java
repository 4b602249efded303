package tideband.cli;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.Locale;
import java.util.Optional;

/** A stream that remembers why it could not be written; a print writer over it would keep that to itself. */
final class WatchedStream extends FilterOutputStream {
    private IOException failure;

    WatchedStream(OutputStream stream) {
        super(stream);
    }

    @Override
    public void write(int value) throws IOException {
        write(new byte[] {(byte) value}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int from, int count) throws IOException {
        try {
            out.write(bytes, from, count);
        } catch (IOException e) {
            remember(e);
            throw e;
        }
    }

    @Override
    public void flush() throws IOException {
        try {
            out.flush();
        } catch (IOException e) {
            remember(e);
            throw e;
        }
    }

    private void remember(IOException e) {
        failure = failure == null ? e : failure;
    }

    /** The first failure, if there was one. */
    Optional<IOException> failure() {
        return Optional.ofNullable(failure);
    }

    /** Whether the failure is only that nobody reads any more, as behind {@code head}: Java tells it by its words alone. */
    boolean readerGone() {
        return failure != null
                && String.valueOf(failure.getMessage()).toLowerCase(Locale.ROOT).contains("pipe");
    }
}
