package tideband.window.colour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.Illuminant;
import tideband.colour.Srgb;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.ColourMatch;
import tideband.match.FilmColour;
import tideband.match.Match;
import tideband.piece.End;
import tideband.window.Desk;
import tideband.window.action.Command;

class WantedModelTest {
    private final Desk desk = Desk.with("lantern-hook");
    private final WantedModel model = new WantedModel(desk.drawing(), desk.work(), Runnable::run, Runnable::run);

    @Test
    void saysWhatToDoAtFirst() {
        assertThat(model.messageProperty().get()).startsWith("Type a colour");
        assertThat(model.matchesProperty().get()).isEmpty();
        assertThat(command("clear-marks").possible().get()).isFalse();
        assertThat(command("take-nearest-film").possible().get()).isFalse();
    }

    @Test
    void findsWhatTheMatchFinds() {
        model.entryProperty().set("#3a3f8f");
        var colours = desk.work().coloursProperty().get();
        var matches = new ColourMatch(colours.palette(), colours.scale())
                .find(colours.viewing().lab(Srgb.ofHex("#3a3f8f")), 5);
        Found found = model.foundProperty().get().orElseThrow();
        assertThat(found.matches()).isEqualTo(matches);
        assertThat(found.hex()).isEqualTo("#3a3f8f");
    }

    @Test
    void everyFilmShownIsNearEnoughNearestFirst() {
        model.withinProperty().set(12);
        model.entryProperty().set("lab(62, -9, -26)");
        List<Match> shown = model.matchesProperty().get();
        assertThat(shown).isNotEmpty().allMatch(m -> m.difference() <= 12);
        assertThat(shown).isSortedAccordingTo((one, other) -> Double.compare(one.difference(), other.difference()));
    }

    @Test
    void saysHowFarOffTheNearestIsWhereNoneIsNear() {
        model.entryProperty().set("#ff0000");
        Found found = model.foundProperty().get().orElseThrow();
        assertThat(found.matches().reached()).isFalse();
        assertThat(model.matchesProperty().get()).isNotEmpty().hasSizeLessThanOrEqualTo(3);
        assertThat(model.messageProperty().get())
                .startsWith("No film comes within dE00 5 of #ff0000")
                .contains(Said.difference(found.matches().best().difference()) + " off: another colour");
    }

    @Test
    void saysWhatIsWrongWithWhatWasTyped() {
        model.entryProperty().set("lab(200, x, 3)");
        assertThat(model.messageProperty().get())
                .isEqualTo("Not a colour yet: L is 200; L must be a number from 0 to 100. a is no number; a must be a"
                        + " number from -200 to 200.");
        assertThat(model.matchesProperty().get()).isEmpty();
    }

    @Test
    void takesExactlyTheFilmInOneStep() {
        Design before = desk.drawing().design();
        desk.drawing().select(Selection.ofBands(List.of(0, 2)));
        model.entryProperty().set("#3a3f8f");
        Match best = model.matchesProperty().get().get(0);
        assertThat(model.take(best)).isTrue();
        assertThat(desk.drawing().undoNameProperty().get())
                .isEqualTo("Take " + best.colour().name().text() + ", " + Said.film(best.filmNm()));
        for (int band : List.of(0, 2)) {
            Wanted.Film film =
                    (Wanted.Film) desk.drawing().design().bands().get(band).wanted();
            assertThat(film.aSideNm()).isEqualTo(film.bSideNm()).isCloseTo(best.filmNm(), within(0.005001));
        }
        assertThat(model.takenProperty().get()).contains("2 bands");
        desk.drawing().undo();
        assertThat(desk.drawing().design()).isEqualTo(before);
    }

    @Test
    void takesForOneEndOfAFadeWhereThatIsSelected() {
        desk.drawing().select(Selection.of(new Part.FadeEnd(1, End.B)));
        Wanted.Film fade = (Wanted.Film) desk.drawing().design().bands().get(1).wanted();
        model.entryProperty().set("#3a3f8f");
        model.takeNearest();
        Wanted.Film film = (Wanted.Film) desk.drawing().design().bands().get(1).wanted();
        assertThat(film.aSideNm()).isEqualTo(fade.aSideNm());
        assertThat(film.bSideNm())
                .isCloseTo(model.matchesProperty().get().get(0).filmNm(), within(0.005001));
    }

    @Test
    void takesBareMetalWhereNoVoltsAreNeeded() {
        desk.drawing().select(Selection.of(new Part.Level(0)));
        model.want(desk.work().coloursProperty().get().ofFilm(0));
        model.takeNearest();
        assertThat(desk.drawing().design().bands().get(0).wanted()).isEqualTo(new Wanted.Bare());
        assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Take bare metal");
    }

    @Test
    void saysWhatToDoWhereNoBandIsSelected() {
        Design before = desk.drawing().design();
        model.entryProperty().set("#3a3f8f");
        assertThat(model.take(model.matchesProperty().get().get(0))).isFalse();
        assertThat(model.takenProperty().get()).contains("Select a band first");
        assertThat(desk.drawing().design()).isEqualTo(before);
        desk.drawing().select(Selection.of(new Part.Level(0)));
        assertThat(model.takenProperty().get()).isEmpty();
        assertThat(command("take-nearest-film").possible().get()).isTrue();
    }

    @Test
    void clearTakesTheMarksAway() {
        model.entryProperty().set("#3a3f8f");
        assertThat(command("clear-marks").possible().get()).isTrue();
        command("clear-marks").act().run();
        assertThat(model.matchesProperty().get()).isEmpty();
        assertThat(model.foundProperty().get()).isEqualTo(Optional.empty());
    }

    @Test
    void findsAnewWhenTheLightChanges() {
        model.entryProperty().set("#3a3f8f");
        Found day = model.foundProperty().get().orElseThrow();
        desk.drawing().change("Light", d -> inLight(d, Illuminant.A));
        Found lamp = model.foundProperty().get().orElseThrow();
        assertThat(lamp.lab()).isNotEqualTo(day.lab());
        assertThat(lamp.hex()).isEqualTo("#3a3f8f");
        assertThat(lamp.matches().best().filmNm())
                .isNotEqualTo(day.matches().best().filmNm());
    }

    /** Property: white and black and the strongest colours a file allows can be asked for in every light. */
    @ParameterizedTest
    @EnumSource(Illuminant.class)
    void anyColourCanBeAskedForInAnyLight(Illuminant light) {
        desk.drawing().change("Light", d -> inLight(d, light));
        for (String text : List.of(
                "#ffffff", "#000000", "lab(100, 0, 0)", "lab(0, 0, 0)", "lab(100, 200, -200)", "lab(0, -200, 200)")) {
            model.entryProperty().set(text);
            assertThat(model.foundProperty().get().map(f -> f.text().text()))
                    .as(text)
                    .contains(text);
        }
    }

    private static Design inLight(Design d, Illuminant light) {
        return new Design(
                d.title(),
                d.metal(),
                d.finish(),
                light,
                d.observer(),
                d.piece(),
                d.holding(),
                d.bands(),
                d.bath(),
                d.supply(),
                d.vessel(),
                d.bench(),
                d.order(),
                d.pull());
    }

    /** Property: each swatch is a film of the bath, and wanting it finds that film. */
    @ParameterizedTest
    @ValueSource(strings = {"lantern-hook", "burner-tube", "wick-pin"})
    void swatchesAreFilmsThatAreFoundAgain(String name) {
        Desk own = Desk.with(name);
        WantedModel wanted = new WantedModel(own.drawing(), own.work(), Runnable::run, Runnable::run);
        List<FilmColour> films = wanted.namedFilmsProperty().get().films();
        assertThat(films).hasSizeGreaterThan(8);
        for (int i = 0; i < films.size(); i++) {
            wanted.want(films.get(i));
            Match best = wanted.matchesProperty().get().get(0);
            assertThat(best.difference()).isLessThan(0.05);
            if (i > 0) {
                FilmColour one = films.get(i - 1);
                assertThat(one.filmNm()).isLessThan(films.get(i).filmNm());
            }
        }
    }

    private Command command(String id) {
        return model.commands().stream()
                .filter(c -> c.id().equals(id))
                .findFirst()
                .orElseThrow();
    }
}
