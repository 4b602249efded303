package tideband.document;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;

/** Lines of {@code key=value} in UTF-8; a backslash or a line end within a value is escaped. */
final class KeyValues {

    private KeyValues() {}

    static byte[] bytes(Map<String, String> values) {
        StringBuilder text = new StringBuilder();
        values.forEach((key, value) -> text.append(key)
                .append('=')
                .append(value.replace("\\", "\\\\").replace("\n", "\\n").replace("\r", "\\r"))
                .append('\n'));
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    /** What can be read; lines that are none of these are left out, and their number is in the notes of whoever asks. */
    static Map<String, String> parse(byte[] bytes) throws CharacterCodingException {
        String text = StandardCharsets.UTF_8
                .newDecoder()
                .decode(ByteBuffer.wrap(bytes))
                .toString();
        Map<String, String> values = new LinkedHashMap<>();
        text.lines().filter(line -> line.indexOf('=') > 0).forEach(line -> {
            int at = line.indexOf('=');
            values.put(line.substring(0, at).strip(), unescaped(line.substring(at + 1)));
        });
        return values;
    }

    private static String unescaped(String value) {
        StringBuilder plain = new StringBuilder();
        for (int i = 0; i < value.length(); i++) {
            char c = value.charAt(i);
            if (c == '\\' && i + 1 < value.length()) {
                i++;
                char escaped = value.charAt(i);
                plain.append(escaped == 'n' ? '\n' : escaped == 'r' ? '\r' : escaped);
            } else {
                plain.append(c);
            }
        }
        return plain.toString();
    }
}
