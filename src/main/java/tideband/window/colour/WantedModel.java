package tideband.window.colour;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicLong;
import javafx.beans.binding.Bindings;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import tideband.bench.Colours;
import tideband.colour.Lab;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Reading;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.ColourText;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.ColourMatch;
import tideband.match.FilmColour;
import tideband.match.Match;
import tideband.piece.End;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.WorkModel;

/**
 * A wanted colour, every film that comes near it, and the taking of one.
 *
 * <p>Taking gives the bands the film itself and not the colour: what was seen and pointed at, in nm, is what will be made,
 * and a later change of light does not move it. Whoever wants the colour to be matched anew gives the band the colour.
 */
public final class WantedModel {
    /** The smallest dE00 that can count as near. */
    public static final double NEAREST = 0.5;
    /** The largest dE00 that can count as near. */
    public static final double FARTHEST = 20;

    private static final double START_WITHIN = 5;

    private final DrawingModel drawing;
    private final WorkModel work;
    private final Executor beside;
    private final Executor screen;
    private final StringProperty entry = new SimpleStringProperty("");
    private final DoubleProperty within = new SimpleDoubleProperty(START_WITHIN);
    private final ReadOnlyObjectWrapper<Optional<Found>> found = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<List<Match>> matches = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper(Said.NOTHING_WANTED);
    private final ReadOnlyStringWrapper taken = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<NamedFilms> named = new ReadOnlyObjectWrapper<>(new NamedFilms(List.of()));
    private final ReadOnlyIntegerWrapper callsForEntry = new ReadOnlyIntegerWrapper();
    private final ReadOnlyIntegerWrapper callsForImage = new ReadOnlyIntegerWrapper();
    private final AtomicLong looks = new AtomicLong();
    private final PlaneModel plane;
    private final ImageModel image;
    private boolean choosing;

    /**
     * Wants nothing yet.
     *
     * @param drawing the drawing
     * @param work the work behind it, which knows the colours
     * @param beside runs what takes long on another thread
     * @param screen runs what changes properties on the thread they are used on
     */
    public WantedModel(DrawingModel drawing, WorkModel work, Executor beside, Executor screen) {
        this.drawing = drawing;
        this.work = work;
        this.beside = beside;
        this.screen = screen;
        plane = new PlaneModel(work, within, this::choose, beside, screen);
        image = new ImageModel(entry::set);
        entry.addListener((value, before, after) -> find());
        within.addListener((value, before, after) -> find());
        work.coloursProperty().addListener((value, before, after) -> {
            find();
            lookAlongFilms();
        });
        drawing.selectionProperty().addListener((value, before, after) -> taken.set(""));
        lookAlongFilms();
    }

    private void lookAlongFilms() {
        long mine = looks.incrementAndGet();
        Colours colours = work.coloursProperty().get();
        beside.execute(() -> {
            NamedFilms films = NamedFilms.of(colours);
            screen.execute(() -> {
                if (looks.get() == mine) {
                    named.set(films);
                }
            });
        });
    }

    private void find() {
        taken.set("");
        if (entry.get().isBlank()) {
            nothing(Said.NOTHING_WANTED);
            return;
        }
        Reading<ColourText> reading = ColourText.read(entry.get());
        if (reading instanceof Reading.Read<ColourText> read) {
            find(read.value());
        } else {
            nothing(Said.faults((Reading.Faulty<ColourText>) reading));
        }
    }

    private void find(ColourText text) {
        Colours colours = work.coloursProperty().get();
        Lab lab = text.labIn(colours.viewing());
        Found next = new Found(
                text,
                lab,
                colours.hexOf(lab),
                new ColourMatch(colours.palette(), colours.scale()).find(lab, within.get()));
        found.set(Optional.of(next));
        matches.set(next.shown());
        message.set(Said.found(next));
        if (!choosing) {
            plane.follow(lab);
        }
    }

    private void nothing(String why) {
        found.set(Optional.empty());
        matches.set(List.of());
        message.set(why);
    }

    private void choose(Lab lab) {
        choosing = true;
        entry.set(ColourText.of(lab).text());
        choosing = false;
    }

    /**
     * Wants the colour of a film.
     *
     * @param film the film
     */
    public void want(FilmColour film) {
        Lab lab = film.lab();
        entry.set(ColourText.of(new Lab(hundredth(lab.lightness()), hundredth(lab.a()), hundredth(lab.b())))
                .text());
    }

    private static double hundredth(double value) {
        return Math.rint(value * 100) / 100 + 0.0;
    }

    /**
     * Gives the selected bands a film. Where one end of a fade is selected, that end alone.
     *
     * @param match the film; one that no volts are needed for is bare metal
     * @return whether a band was selected to give it to; if not, {@link #takenProperty()} says what to do
     */
    public boolean take(Match match) {
        Selection selection = drawing.selection();
        if (selection.bands().isEmpty()) {
            taken.set(Said.NOTHING_SELECTED);
            return false;
        }
        boolean bare = match.volts() == 0 || match.filmNm() < BandEdits.THINNEST_NM;
        String what = bare ? "bare metal" : match.colour().name().text() + ", " + Said.film(match.filmNm());
        drawing.change("Take " + what, design -> bare ? bare(design) : filmed(design, match.filmNm()));
        taken.set("Taken: " + what + ", for " + names(selection) + ".");
        return true;
    }

    private Design bare(Design design) {
        return BandEdits.want(design, drawing.selection().bands(), new Wanted.Bare());
    }

    private Design filmed(Design design, double filmNm) {
        Selection selection = drawing.selection();
        Wanted.Film film = BandEdits.film(filmNm, filmNm);
        if (selection.bands().size() == 1 && selection.focus().orElse(null) instanceof Part.FadeEnd end) {
            Wanted now = design.bands().get(end.band()).wanted();
            if (now instanceof Wanted.Film fade && fade.aSideNm() != fade.bSideNm()) {
                film = end.side() == End.A
                        ? BandEdits.film(filmNm, fade.bSideNm())
                        : BandEdits.film(fade.aSideNm(), filmNm);
            }
        }
        return BandEdits.want(design, selection.bands(), film);
    }

    private String names(Selection selection) {
        List<Band> bands = drawing.design().bands();
        return selection.bands().size() == 1
                ? "band " + bands.get(selection.bands().get(0)).name()
                : selection.bands().size() + " bands";
    }

    /** Takes the nearest film, if a colour is wanted. */
    public void takeNearest() {
        found.get().ifPresent(f -> take(f.matches().best()));
    }

    /** Wants nothing any more; the marks go. */
    public void clear() {
        entry.set("");
    }

    /**
     * What the user can do about a wanted colour.
     *
     * @return the commands, in menu order
     */
    public List<Command> commands() {
        var always = Bindings.createBooleanBinding(() -> true);
        var some = Bindings.createBooleanBinding(() -> !entry.get().isEmpty(), entry);
        var takeable = Bindings.createBooleanBinding(
                () -> found.get().isPresent() && !drawing.selection().bands().isEmpty(),
                found,
                drawing.selectionProperty());
        return List.of(
                new Command(
                        "find-colour",
                        Command.Menu.BAND,
                        new ReadOnlyStringWrapper("Find a colour\u2026"),
                        "F8",
                        "Goes to where a wanted colour is typed; every film that comes near it is then marked.",
                        always,
                        () -> callsForEntry.set(callsForEntry.get() + 1)),
                new Command(
                        "colour-from-image",
                        Command.Menu.BAND,
                        new ReadOnlyStringWrapper("Colour from image\u2026"),
                        "Shift+F8",
                        "Opens a picture to take a wanted colour from.",
                        always,
                        () -> callsForImage.set(callsForImage.get() + 1)),
                new Command(
                        "take-nearest-film",
                        Command.Menu.BAND,
                        new ReadOnlyStringWrapper("Take nearest film"),
                        "Shortcut+F8",
                        "Gives the selected bands the film nearest to the wanted colour; needs a wanted colour and a"
                                + " selected band.",
                        takeable,
                        this::takeNearest),
                new Command(
                        "clear-marks",
                        Command.Menu.BAND,
                        new ReadOnlyStringWrapper("Clear marks"),
                        "Shortcut+Shift+F8",
                        "Wants no colour any more and takes its marks off the field.",
                        some,
                        this::clear));
    }

    /**
     * What is typed as the wanted colour: {@code #rrggbb} or {@code lab(L, a, b)}; blank for none.
     *
     * @return a property
     */
    public StringProperty entryProperty() {
        return entry;
    }

    /**
     * How near is near enough.
     *
     * @return a property: dE00, {@link #NEAREST} to {@link #FARTHEST}
     */
    public DoubleProperty withinProperty() {
        return within;
    }

    /**
     * The wanted colour with all that was found for it.
     *
     * @return a property; empty while no colour is wanted or what is typed is none
     */
    public ReadOnlyObjectProperty<Optional<Found>> foundProperty() {
        return found.getReadOnlyProperty();
    }

    /**
     * The films to mark, nearest first: see {@link Found#shown()}.
     *
     * @return a property; an empty list while no colour is wanted
     */
    public ReadOnlyObjectProperty<List<Match>> matchesProperty() {
        return matches.getReadOnlyProperty();
    }

    /**
     * What was found, or what to do, in sentences.
     *
     * @return a property, never empty
     */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }

    /**
     * What came of the last taking, until the colour or the selection changes.
     *
     * @return a property; empty when there is nothing to say
     */
    public ReadOnlyStringProperty takenProperty() {
        return taken.getReadOnlyProperty();
    }

    /**
     * The colours the metal can show, by name.
     *
     * @return a property
     */
    public ReadOnlyObjectProperty<NamedFilms> namedFilmsProperty() {
        return named.getReadOnlyProperty();
    }

    /**
     * How often the user asked to type a colour; each time it rises the entry is to be shown and given the focus.
     *
     * @return a property
     */
    public ReadOnlyIntegerProperty callsForEntryProperty() {
        return callsForEntry.getReadOnlyProperty();
    }

    /**
     * How often the user asked for a picture; each time it rises one is to be opened.
     *
     * @return a property
     */
    public ReadOnlyIntegerProperty callsForImageProperty() {
        return callsForImage.getReadOnlyProperty();
    }

    /**
     * The chooser by hue and lightness.
     *
     * @return its model
     */
    public PlaneModel plane() {
        return plane;
    }

    /**
     * The picture that colours are taken from.
     *
     * @return its model
     */
    public ImageModel image() {
        return image;
    }
}
