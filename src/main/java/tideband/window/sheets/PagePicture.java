package tideband.window.sheets;

import java.io.ByteArrayInputStream;
import java.io.InputStream;

/** One page as a picture. */
public final class PagePicture {
    private final int page;
    private final byte[] png;

    PagePicture(int page, byte[] png) {
        this.page = page;
        this.png = png.clone();
    }

    /**
     * Which page it is.
     *
     * @return 0-based
     */
    public int page() {
        return page;
    }

    /**
     * The picture.
     *
     * @return a PNG file, to be read once
     */
    public InputStream png() {
        return new ByteArrayInputStream(png);
    }
}
