package tideband.window;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.document.StartingShape;
import tideband.oxide.Metal;

/**
 * What lies on the desk when the window opens. It takes a while to get ready, and needs no screen: so it can be done beside
 * while the toolkit starts.
 *
 * @param design the design
 * @param colours its colours
 */
record Beginning(Design design, Colours colours) {

    /**
     * A design with its colours.
     *
     * @param design the design
     * @return both
     */
    static Beginning with(Design design) {
        return new Beginning(design, Colours.of(design));
    }

    /**
     * The design of a file, so that it need not be worked out twice; a plain rod where there is none or it cannot be
     * read, which is said when the file is opened.
     *
     * @param file the file the window will open
     * @return what to begin with
     */
    static Beginning of(Optional<Path> file) {
        if (file.isPresent()
                && DesignFile.read(file.get()) instanceof Reading.Read<Design> read
                && Colours.obstacle(read.value()).isEmpty()) {
            return with(read.value());
        }
        return with(plainRod());
    }

    private static Design plainRod() {
        Reading<Design> rod = StartingShape.ROUND_ROD.design("Untitled", Metal.TITANIUM, Map.of());
        if (rod instanceof Reading.Read<Design> read) {
            return read.value();
        }
        throw new IllegalStateException("the plain rod is not sound: " + rod);
    }
}
