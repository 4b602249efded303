package tideband.sheet;

import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.GraphicsEnvironment;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import org.apache.batik.transcoder.TranscoderException;
import org.apache.batik.transcoder.TranscoderInput;
import org.apache.batik.transcoder.TranscoderOutput;
import org.apache.batik.transcoder.image.PNGTranscoder;

/** Turns the preview into pixels. Needs a Java with fonts (a font configuration and one font on the system). */
final class PreviewPng {
    private static final float DOTS_PER_INCH = 200;

    private PreviewPng() {}

    /**
     * Renders an SVG file.
     *
     * @param svg the file's bytes
     * @return a PNG file's bytes, 200 dots an inch
     * @throws IOException if it cannot be rendered, for one where this Java has no fonts
     */
    static byte[] bytes(byte[] svg) throws IOException {
        try {
            registerTypeface();
            PNGTranscoder transcoder = new PNGTranscoder();
            transcoder.addTranscodingHint(PNGTranscoder.KEY_PIXEL_UNIT_TO_MILLIMETER, 25.4f / DOTS_PER_INCH);
            // The picture is ours and refers to nothing; scripts and outside files stay off all the same.
            transcoder.addTranscodingHint(PNGTranscoder.KEY_ALLOW_EXTERNAL_RESOURCES, false);
            transcoder.addTranscodingHint(PNGTranscoder.KEY_EXECUTE_ONLOAD, false);
            ByteArrayOutputStream png = new ByteArrayOutputStream();
            transcoder.transcode(new TranscoderInput(new ByteArrayInputStream(svg)), new TranscoderOutput(png));
            return png.toByteArray();
        } catch (TranscoderException | FontFormatException | RuntimeException | LinkageError | InternalError e) {
            // Without a font configuration the JDK fails with errors of several kinds, not one documented exception.
            throw new IOException(
                    "the PNG preview cannot be drawn here: this Java may lack fonts (install fontconfig and a font), or"
                            + " leave the PNG out",
                    e);
        }
    }

    /** Makes the typeface the sheets are measured in known to Java, so that pixels are the same everywhere. */
    private static void registerTypeface() throws IOException, FontFormatException {
        try (InputStream typeface = Typeface.open()) {
            GraphicsEnvironment.getLocalGraphicsEnvironment()
                    .registerFont(Font.createFont(Font.TRUETYPE_FONT, typeface));
        }
    }
}
