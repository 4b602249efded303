package tideband.window.files;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.document.Leftover;

/** Questions to the user, and what is said to them. Each waits for the answer. */
public interface Asks {

    /** What becomes of changes that are not saved. */
    enum Unsaved {
        /** Save them first. */
        SAVE,
        /** Let them go. */
        DISCARD,
        /** Stay. */
        KEEP_DRAWING
    }

    /** What is done about a file that another program changed. */
    enum Elsewhere {
        /** Take what is on disk. */
        LOAD,
        /** Go on with what is here. */
        KEEP_MINE
    }

    /** What is done about a file that was changed on disk, when saving. */
    enum Overwrite {
        /** Replace it by what is here. */
        REPLACE,
        /** Take what is on disk. */
        LOAD,
        /** Save nothing. */
        KEEP_DRAWING
    }

    /** What is done where another bath has the name of the design's bath file. */
    enum BathChoice {
        /** Write this design's bath under a name of its own. */
        OWN_NAME,
        /** Replace the bath there, for all designs that name it. */
        REPLACE,
        /** Save nothing. */
        KEEP_DRAWING
    }

    /**
     * What is done about drawings that were left behind.
     *
     * @param act what
     * @param drawing the drawing meant
     */
    record LeftChoice(Act act, Leftover drawing) {

        /** What is done about one of them. */
        public enum Act {
            /** Open it. */
            OPEN,
            /** Discard it. */
            DISCARD
        }
    }

    /**
     * Changes would be lost.
     *
     * @param name what the drawing is called
     * @return what becomes of them
     */
    Unsaved unsaved(String name);

    /**
     * A design to be opened.
     *
     * @param folder where to begin looking, if anywhere
     * @return its file; nothing if the user thought better of it
     */
    Optional<Path> fileToOpen(Optional<Path> folder);

    /**
     * A place to save to; what is there already has been asked about.
     *
     * @param folder where to begin looking, if anywhere
     * @param name a name to begin with
     * @return the file; nothing if the user thought better of it
     */
    Optional<Path> fileToSave(Optional<Path> folder, String name);

    /**
     * A new drawing.
     *
     * @return a bare drawing of a shape; nothing if the user thought better of it
     */
    Optional<Design> newDrawing();

    /**
     * Another program changed or deleted the file of the drawing.
     *
     * @param name the file's name
     * @param gone whether it was deleted
     * @param changedHere whether there are changes here that loading would lose
     * @return what is done about it; where it is gone, there is nothing to load
     */
    Elsewhere changedElsewhere(String name, boolean gone, boolean changedHere);

    /**
     * The file to be saved was changed by another program.
     *
     * @param name the file's name
     * @return what is done about it
     */
    Overwrite overwrite(String name);

    /**
     * Another bath, or something else, has the name of the design's bath file.
     *
     * @param bathFile the name
     * @param ownName a name the bath could have instead
     * @return what is done about it
     */
    BathChoice bathInTheWay(String bathFile, String ownName);

    /**
     * Drawings were left open when the program stopped.
     *
     * @param drawings the drawings, at least one
     * @return what is done about one of them; nothing to decide later
     */
    Optional<LeftChoice> leftBehind(List<Leftover> drawings);

    /**
     * Says all faults of a file.
     *
     * @param what what could not be done, a sentence
     * @param faults the faults, with place and remedy
     */
    void faults(String what, List<Fault> faults);

    /**
     * Says that something went wrong or was found.
     *
     * @param what what happened, a sentence
     * @param remedy what to do about it, a sentence
     */
    void say(String what, String remedy);
}
