package tideband.document;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tideband.design.BathFile;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Fault;
import tideband.design.Reading;

/**
 * A folder that holds a drawing as it stood at one time: {@code design.json}, its bath's file, and in {@code about} where it
 * belongs. It is written under another name and renamed when whole, so that under its own name it is never half there.
 *
 * @param folder where it is
 * @param owner the program that wrote it
 * @param drawing tells the drawings of a program apart
 * @param number rises with each snapshot of a drawing
 * @param whole whether it was finished
 */
record Snapshot(Path folder, Owner owner, String drawing, long number, boolean whole) {
    static final String UNFINISHED = ".unfinished";
    static final String DISCARDED = ".discarded";

    private static final String DESIGN = "design.json";
    private static final String ABOUT = "about";
    private static final String BELONGS = "belongs-to";
    private static final Pattern NAME =
            Pattern.compile("(\\d{1,18})-(\\d{1,18})-([0-9a-f-]{36})\\.(\\d{1,18})(\\.unfinished)?");

    /** The snapshot in a folder, if its name is that of one. */
    static Optional<Snapshot> in(Path folder) {
        Matcher name = NAME.matcher(folder.getFileName().toString());
        return name.matches() && Files.isDirectory(folder)
                ? Optional.of(new Snapshot(
                        folder,
                        new Owner(Long.parseLong(name.group(1)), Long.parseLong(name.group(2))),
                        name.group(3),
                        Long.parseLong(name.group(4)),
                        name.group(5) == null))
                : Optional.empty();
    }

    static String name(Owner owner, String drawing, long number) {
        return owner.pid() + "-" + owner.startMillis() + "-" + drawing + "." + number;
    }

    /** Writes a snapshot; the answer is its folder. */
    static Path write(Path root, String name, Design design, Optional<Path> belongs) throws IOException {
        Files.createDirectories(root);
        Path unfinished = Files.createDirectory(root.resolve(name + UNFINISHED));
        if (design.bathFile().isPresent()) {
            WholeFile.writeThrough(besides(unfinished, design.bathFile().get()), BathFile.bytes(design.bath()));
        }
        Map<String, String> about = new LinkedHashMap<>();
        belongs.ifPresent(file -> about.put(BELONGS, file.toAbsolutePath().toString()));
        WholeFile.writeThrough(unfinished.resolve(ABOUT), KeyValues.bytes(about));
        WholeFile.writeThrough(unfinished.resolve(DESIGN), DesignFile.bytes(design));
        WholeFile.syncFolder(unfinished);
        Path folder = Files.move(unfinished, root.resolve(name), StandardCopyOption.ATOMIC_MOVE);
        WholeFile.syncFolder(root);
        return folder;
    }

    /** A bath file may be called as it likes, even as one of ours. */
    private static Path besides(Path folder, String bathFile) throws IOException {
        return Files.createDirectories(folder.resolve("bath")).resolve(bathFile);
    }

    Reading<Leftover> read() {
        try {
            Map<String, String> about = KeyValues.parse(Files.readAllBytes(folder.resolve(ABOUT)));
            Path file = folder.resolve(DESIGN);
            Reading<Design> reading = DesignFile.read(Files.readAllBytes(file), Optional.of(folder.resolve("bath")));
            if (reading instanceof Reading.Faulty<Design> faulty) {
                return new Reading.Faulty<>(faulty.faults());
            }
            Optional<Path> belongs = Optional.ofNullable(about.get(BELONGS)).map(Path::of);
            return new Reading.Read<>(new Leftover(
                    ((Reading.Read<Design>) reading).value(),
                    belongs,
                    Files.getLastModifiedTime(file).toInstant(),
                    folder));
        } catch (IOException e) {
            return new Reading.Faulty<>(List.of(new Fault("", Reasons.of(e), "")));
        } catch (InvalidPathException e) {
            return new Reading.Faulty<>(List.of(new Fault("", "it does not say where it belongs", "")));
        }
    }

    /** Takes a snapshot away; one that is half gone is no longer taken for one. */
    static void discard(Path folder) throws IOException {
        Path discarded = folder.resolveSibling(folder.getFileName() + DISCARDED);
        Files.move(folder, discarded, StandardCopyOption.ATOMIC_MOVE);
        WholeFile.deleteFolder(discarded);
    }
}
