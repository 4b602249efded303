package tideband.window;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;
import org.junit.jupiter.api.extension.ExecutionCondition;
import org.junit.jupiter.api.extension.ExtensionContext;

/**
 * Skips what needs a screen where the library that draws JavaFX's text on Linux is missing, and says which package brings
 * it. Never skips in CI: there, what is missing is a failure.
 */
final class TextLibrary implements ExecutionCondition {
    private static final String MISSING = "JavaFX cannot draw text here: libpangoft2 is missing, so the window is not"
            + " tested. Install it (Debian, Ubuntu): apt-get install --no-install-recommends libpangoft2-1.0-0";

    @Override
    public ConditionEvaluationResult evaluateExecutionCondition(ExtensionContext context) {
        if ("true".equals(System.getenv("CI")) || there()) {
            return ConditionEvaluationResult.enabled("text can be drawn");
        }
        System.err.println(MISSING);
        return ConditionEvaluationResult.disabled(MISSING);
    }

    private static boolean there() {
        if (!System.getProperty("os.name").toLowerCase(Locale.ROOT).contains("linux")) {
            return true;
        }
        try {
            Process known = new ProcessBuilder("/sbin/ldconfig", "-p")
                    .redirectErrorStream(true)
                    .start();
            String libraries = new String(known.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            return libraries.contains("libpangoft2-1.0.so");
        } catch (IOException noSuchTool) {
            // Without ldconfig nothing is known; the tests will tell.
            return true;
        }
    }
}
