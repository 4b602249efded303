package tideband.window.bands;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import java.util.function.Supplier;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import tideband.colour.Viewing;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Fault;
import tideband.design.Limits;
import tideband.design.Reading;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.ColourText;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;
import tideband.window.entry.TextSetting;
import tideband.window.work.WorkModel;

/** The values of the selected bands as settings. Where they differ nothing is shown; what is set is set for all. */
final class BandSettings {
    private static final String LAST = "The last band ends with the piece.";

    private final DrawingModel drawing;
    private final WorkModel work;
    private final Supplier<List<Integer>> chosen;

    private BandSettings(DrawingModel drawing, WorkModel work, Supplier<List<Integer>> chosen) {
        this.drawing = drawing;
        this.work = work;
        this.chosen = chosen;
    }

    static List<Setting> of(
            DrawingModel drawing, WorkModel work, ComfortModel comfort, Supplier<List<Integer>> chosen) {
        BandSettings make = new BandSettings(drawing, work, chosen);
        List<Setting> settings = new ArrayList<>();
        settings.add(make.name());
        settings.addAll(BandPlaces.of(drawing, comfort, chosen));
        settings.addAll(List.of(
                make.kind(),
                make.film(),
                make.aSide(),
                make.bSide(),
                make.volts(),
                make.colour(),
                make.order(),
                make.edge()));
        return List.copyOf(settings);
    }

    private List<Band> bands() {
        return chosen.get().stream().map(drawing.design().bands()::get).toList();
    }

    /** What all selected bands have in common, where they do. */
    private <T> Optional<T> common(Function<Band, T> value) {
        List<T> values = bands().stream().map(value).distinct().toList();
        return values.size() == 1 ? Optional.of(values.get(0)) : Optional.empty();
    }

    private boolean all(BandKind kind) {
        return common(band -> BandKind.of(band.wanted())).filter(kind::equals).isPresent();
    }

    private Setting name() {
        About about = new About("band name", "Name", "Every band has a name of its own; it stands on the sheets.");
        return new TextSetting(
                about,
                new Terms(
                        () -> !chosen.get().isEmpty(),
                        () -> chosen.get().size() > 1 ? "Select one band to name it." : ""),
                "1 to " + Limits.LONGEST_LINE + " characters",
                () -> common(Band::name),
                this::wrongName,
                text -> change(
                        about, design -> BandEdits.rename(design, chosen.get().get(0), text)));
    }

    private String wrongName(String text) {
        int count = text.codePointCount(0, text.length());
        if (text.isBlank() || count > Limits.LONGEST_LINE) {
            return "must be 1 to " + Limits.LONGEST_LINE + " characters, but has " + count;
        }
        Set<String> taken = new HashSet<>();
        drawing.design().bands().forEach(band -> taken.add(band.name()));
        return taken.contains(text) ? "is the name of another band; choose a name of its own" : "";
    }

    private Setting kind() {
        About about = new About("kind of band", "Given as", "What says what the band is to be.");
        List<Choice<BandKind>> kinds = Arrays.stream(BandKind.values())
                .map(kind -> new Choice<>(kind, kind.title(), kind.meaning()))
                .toList();
        return new ChoiceSetting<>(
                about,
                somethingChosen(),
                () -> kinds,
                Optional::empty,
                () -> common(band -> BandKind.of(band.wanted())),
                kind -> {
                    change(
                            about,
                            design ->
                                    KindChange.of(design, work.coloursProperty().get(), chosen.get(), kind));
                    return "";
                });
    }

    private Setting film() {
        return filmSetting(
                new About("film of band", "Film", "Thickness all along the band."),
                BandKind.LEVEL,
                Wanted.Film::aSideNm,
                (film, nm) -> BandEdits.film(nm, nm));
    }

    private Setting aSide() {
        return filmSetting(
                new About("A side of fade", "Film at A side", "Where the fade begins, towards end A."),
                BandKind.FADE,
                Wanted.Film::aSideNm,
                (film, nm) -> BandEdits.film(nm, film.bSideNm()));
    }

    private Setting bSide() {
        return filmSetting(
                new About("B side of fade", "Film at B side", "Where the fade ends, towards end B."),
                BandKind.FADE,
                Wanted.Film::bSideNm,
                (film, nm) -> BandEdits.film(film.aSideNm(), nm));
    }

    private Setting filmSetting(
            About about,
            BandKind kind,
            Function<Wanted.Film, Double> value,
            BiFunction<Wanted.Film, Double, Wanted.Film> edit) {
        return new NumberSetting(
                about,
                Terms.when(() -> all(kind)),
                new Measure.Plain("nm", 2),
                Bounds.of(Limits.FILM_NM),
                () -> optional(common(band -> value.apply((Wanted.Film) band.wanted()))),
                nm -> "",
                nm -> eachWanted(about, wanted -> edit.apply((Wanted.Film) wanted, nm)));
    }

    private Setting volts() {
        About about = new About(
                "volts of band",
                "Volts",
                "Of a small coupon at the end of a hold. The plan sets its own for the piece.");
        return new NumberSetting(
                about,
                Terms.when(() -> all(BandKind.VOLTS)),
                new Measure.Plain("V", 3),
                Bounds.of(Limits.BAND_VOLTS),
                () -> optional(common(band -> ((Wanted.Volts) band.wanted()).volts())),
                volts -> "",
                volts -> eachWanted(about, wanted -> new Wanted.Volts(volts)));
    }

    private Setting colour() {
        About about = new About(
                "colour of band",
                "Colour",
                "#rrggbb as a screen shows it, or lab(L, a, b) against the white of the design's light.");
        return new TextSetting(
                about,
                Terms.when(() -> all(BandKind.COLOUR)),
                "",
                () -> common(band -> ((Wanted.Colour) band.wanted()).text()),
                text -> ColourText.read(text) instanceof Reading.Faulty<ColourText> faulty
                        ? faulty.faults().stream().map(Fault::text).collect(Collectors.joining("; "))
                        : "",
                text -> eachWanted(about, wanted -> colour(text, ((Wanted.Colour) wanted).order())));
    }

    private Wanted colour(String text, OptionalInt order) {
        Design design = drawing.design();
        Viewing viewing = Viewing.of(design.light(), design.observer());
        return ((Reading.Read<ColourText>) ColourText.read(text)).value().wanted(viewing, order);
    }

    private Setting order() {
        About about = new About(
                "order of colour",
                "Order",
                "How many times the hues have been passed; a colour comes back in several. Type any where it does not matter.");
        DoubleFunction<String> whole = order -> order == Math.rint(order) ? "" : "must be a whole number";
        return new NumberSetting(
                about,
                Terms.when(() -> all(BandKind.COLOUR)),
                new Measure.Plain("", 3),
                new Bounds(() -> Limits.ORDER, () -> OptionalDouble.of(Double.POSITIVE_INFINITY), "any"),
                () -> optional(common(band -> number(((Wanted.Colour) band.wanted()).order()))),
                whole,
                order -> eachWanted(about, wanted -> {
                    Wanted.Colour colour = (Wanted.Colour) wanted;
                    OptionalInt asked = Double.isInfinite(order) ? OptionalInt.empty() : OptionalInt.of((int) order);
                    return new Wanted.Colour(colour.text(), colour.lab(), asked);
                }));
    }

    private static double number(OptionalInt order) {
        return order.isPresent() ? order.getAsInt() : Double.POSITIVE_INFINITY;
    }

    private Setting edge() {
        About about = new About("edge of band", "Edge at B side", "The boundary to the next band towards end B.");
        List<Choice<Edge>> edges = List.of(
                new Choice<>(Edge.SOFT, "Soft", "A waterline will do."),
                new Choice<>(Edge.CRISP, "Crisp", "A mask line."));
        return new ChoiceSetting<>(
                about,
                new Terms(() -> !chosen.get().isEmpty(), () -> withEdge().isEmpty() ? LAST : ""),
                () -> edges,
                Optional::empty,
                this::commonEdge,
                edge -> {
                    change(about, design -> BandEdits.setEdge(design, withEdge(), edge));
                    return "";
                });
    }

    /** The last band has no edge of its own. */
    private List<Integer> withEdge() {
        int last = drawing.design().bands().size() - 1;
        return chosen.get().stream().filter(band -> band != last).toList();
    }

    private Optional<Edge> commonEdge() {
        List<Edge> edges = withEdge().stream()
                .map(band -> drawing.design().bands().get(band).edge())
                .distinct()
                .toList();
        return edges.size() == 1 ? Optional.of(edges.get(0)) : Optional.empty();
    }

    private Terms somethingChosen() {
        return Terms.when(() -> !chosen.get().isEmpty());
    }

    private void eachWanted(About about, UnaryOperator<Wanted> edit) {
        List<Integer> these = List.copyOf(chosen.get());
        change(about, design -> {
            Design changed = design;
            for (int band : these) {
                Wanted now = design.bands().get(band).wanted();
                changed = BandEdits.want(changed, List.of(band), edit.apply(now));
            }
            return changed;
        });
    }

    private void change(About about, UnaryOperator<Design> edit) {
        drawing.change("Set " + about.thing(), edit);
    }

    private static OptionalDouble optional(Optional<Double> number) {
        return number.isPresent() ? OptionalDouble.of(number.get()) : OptionalDouble.empty();
    }
}
