package tideband.document;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where the program keeps what is its own: what it needs after a crash, recent files, preferences. */
public final class StateFolder {

    private StateFolder() {}

    /**
     * The folder of this user on this system.
     *
     * @return such as {@code ~/.local/state/tideband}; it need not be there yet
     */
    public static Path usual() {
        return of(System.getenv(), System.getProperty("os.name"), Path.of(System.getProperty("user.home")));
    }

    /**
     * The folder as the system wants it: the XDG Base Directory Specification where it holds, else that of the vendor.
     *
     * @param environment the environment variables
     * @param system the system's name, as Java has it
     * @param home the user's home
     * @return the folder
     */
    static Path of(Map<String, String> environment, String system, Path home) {
        String name = system.toLowerCase(Locale.ROOT);
        if (name.startsWith("windows")) {
            String local = environment.getOrDefault("LOCALAPPDATA", "");
            return (local.isBlank() ? home.resolve("AppData").resolve("Local") : Path.of(local)).resolve("tideband");
        }
        if (name.startsWith("mac")) {
            return home.resolve("Library").resolve("Application Support").resolve("tideband");
        }
        Path state = Path.of(environment.getOrDefault("XDG_STATE_HOME", ""));
        // The specification wants relative paths to be ignored.
        return (state.isAbsolute() ? state : home.resolve(".local").resolve("state")).resolve("tideband");
    }
}
