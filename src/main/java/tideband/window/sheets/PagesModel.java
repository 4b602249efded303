package tideband.window.sheets;

import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicLong;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import tideband.sheet.Paper;
import tideband.sheet.SheetPrinter;

/** Leafs through the pages of a step sheet. */
public final class PagesModel {
    private static final double START_DOTS_PER_INCH = 96;

    private final Executor beside;
    private final Executor screen;
    private final ObjectProperty<Paper> paper;
    private final ReadOnlyIntegerWrapper page = new ReadOnlyIntegerWrapper();
    private final ReadOnlyObjectWrapper<Optional<PagePicture>> picture = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final AtomicLong asked = new AtomicLong();
    private Optional<ShownSheets> sheets = Optional.empty();
    private double dotsPerInch = START_DOTS_PER_INCH;

    PagesModel(Paper usual, Executor beside, Executor screen) {
        this.beside = beside;
        this.screen = screen;
        paper = new SimpleObjectProperty<>(usual);
        paper.addListener((value, before, after) -> turn(0));
    }

    /** Opens sheets at their first page, on the paper of the usual printer. */
    void open(ShownSheets shown) {
        sheets = Optional.of(shown);
        page.set(0);
        Optional<SheetPrinter> usual = shown.printers().stream().findFirst();
        paper.set(usual.map(p -> p.paper(paper.get())).orElse(paper.get()));
        draw();
    }

    void close() {
        sheets = Optional.empty();
        asked.incrementAndGet();
        picture.set(Optional.empty());
    }

    /**
     * How many pages there are.
     *
     * @return their number; 0 while no sheets are open
     */
    public int count() {
        return sheets.map(s -> s.pages(paper.get())).orElse(0);
    }

    /**
     * Turns pages.
     *
     * @param by how many on, below 0 for back; kept within the sheet
     */
    public void turn(int by) {
        page.set(Math.min(Math.max(page.get() + by, 0), Math.max(0, count() - 1)));
        draw();
    }

    /**
     * Says how finely pages are to be drawn.
     *
     * @param perInch dots an inch
     */
    public void fineness(double perInch) {
        if (perInch != dotsPerInch) {
            dotsPerInch = perInch;
            draw();
        }
    }

    private void draw() {
        sheets.ifPresent(open -> {
            long mine = asked.incrementAndGet();
            Paper on = paper.get();
            int number = page.get();
            double fine = dotsPerInch;
            beside.execute(() -> {
                // What has been leafed past is not drawn.
                if (asked.get() == mine) {
                    byte[] png = open.pictures(on).png(number, fine);
                    screen.execute(() -> {
                        if (asked.get() == mine) {
                            picture.set(Optional.of(new PagePicture(number, png)));
                        }
                    });
                }
            });
        });
    }

    /**
     * The paper that is shown and printed on.
     *
     * @return a property
     */
    public ObjectProperty<Paper> paperProperty() {
        return paper;
    }

    /**
     * The page that is shown.
     *
     * @return a property, 0-based
     */
    public ReadOnlyIntegerProperty pageProperty() {
        return page.getReadOnlyProperty();
    }

    /**
     * The picture of a page; that of the page shown as soon as it has been drawn.
     *
     * @return a property; empty while there is none
     */
    public ReadOnlyObjectProperty<Optional<PagePicture>> pictureProperty() {
        return picture.getReadOnlyProperty();
    }
}
