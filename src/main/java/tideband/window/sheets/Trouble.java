package tideband.window.sheets;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;

/** What to say of a file that could not be written. */
final class Trouble {
    private static final String ELSEWHERE = "Choose another folder.";

    private Trouble() {}

    static Standing.Failed writing(Errand errand, IOException e) {
        if (e instanceof AccessDeniedException denied) {
            return failed(errand, denied.getFile() + " may not be written to.", "Choose a folder of your own.");
        }
        if (e instanceof FileAlreadyExistsException || e instanceof NotDirectoryException) {
            String file = ((FileSystemException) e).getFile();
            return failed(errand, file + " is a file and no folder.", ELSEWHERE);
        }
        if (e instanceof NoSuchFileException gone) {
            return failed(errand, gone.getFile() + " is not there any more.", ELSEWHERE);
        }
        if (e instanceof FileSystemException fault && fault.getReason() != null) {
            return failed(
                    errand,
                    fault.getFile() + " could not be written: " + fault.getReason() + ".",
                    "Choose another folder, or make room in this one.");
        }
        return failed(
                errand, "It did not work: " + e.getMessage() + ".", "Choose another folder, or leave the PNG out.");
    }

    static Standing.Failed printing(String printer, IOException e) {
        return failed(
                Errand.PRINT,
                "The printer " + printer + " did not take the sheets: " + e.getMessage() + ".",
                "Check that it is on and has paper and try again, or write the PDF and print it from there.");
    }

    static Standing.Failed fault(Errand errand, RuntimeException e) {
        return failed(
                errand,
                "The program made a mistake: " + e + ".",
                "Nothing was written. Save the design, and please report this with it.");
    }

    private static Standing.Failed failed(Errand errand, String what, String change) {
        return new Standing.Failed(
                errand, what + " Nothing was changed.".repeat(errand == Errand.EXPORT ? 1 : 0), change);
    }
}
