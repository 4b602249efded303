package tideband.sheet;

import java.io.IOException;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;

/** Something that puts a step sheet on paper. */
public interface SheetPrinter {
    /**
     * What it is called.
     *
     * @return the name its owner knows it by
     */
    String name();

    /**
     * The paper that lies in it, as far as it tells.
     *
     * @param otherwise the paper to take where it does not tell
     * @return the paper
     */
    Paper paper(Paper otherwise);

    /**
     * Prints a step sheet at full size.
     *
     * @param pdf the sheet's bytes, as {@link StepSheetPdf} gives them
     * @param paper the paper it was made for
     * @param progress told in a few words, page by page, what is being done
     * @param cancelled asked at every page whether to give up; giving up throws {@link CancellationException}
     * @throws IOException if it cannot be printed, with what the printer says
     */
    void print(byte[] pdf, Paper paper, Consumer<String> progress, BooleanSupplier cancelled) throws IOException;
}
