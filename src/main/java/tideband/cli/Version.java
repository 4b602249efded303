package tideband.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine.IVersionProvider;

/** The program's version, as the build wrote it down. */
final class Version implements IVersionProvider {
    private static final String RESOURCE = "version.txt";

    @Override
    public String[] getVersion() throws IOException {
        try (InputStream in = Version.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks its file " + RESOURCE);
            }
            return new String[] {"tideband " + new String(in.readAllBytes(), StandardCharsets.UTF_8).strip()};
        }
    }
}
