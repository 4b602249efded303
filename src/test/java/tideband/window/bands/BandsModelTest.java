package tideband.window.bands;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tideband.bench.DrawnFilm;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.Desk;
import tideband.window.comfort.LengthUnit;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.TypedSetting;

class BandsModelTest {
    // Bands: tip 160 nm to 30 mm, rainbow 160 to 24 nm to 125 mm, shank 24 nm to 145 mm, stub bare to 160 mm.
    private final Desk desk = Desk.with("lantern-hook");
    private final Design start = desk.drawing().design();
    private final BandsModel model = new BandsModel(desk.drawing(), desk.work(), desk.comfort());

    private Design design() {
        return desk.drawing().design();
    }

    private void select(Integer... bands) {
        desk.drawing().select(Selection.ofBands(List.of(bands)));
    }

    private Setting setting(String thing) {
        return model.settings().stream()
                .filter(setting -> setting.about().thing().equals(thing))
                .findFirst()
                .orElseThrow();
    }

    private TypedSetting type(String thing, String text) {
        TypedSetting typed = (TypedSetting) setting(thing);
        assertThat(typed.placedProperty().get()).as(thing).isTrue();
        typed.typedProperty().set(text);
        typed.commit();
        return typed;
    }

    private String fault(String thing, String text) {
        return type(thing, text).faultProperty().get();
    }

    private void done(String thing) {
        assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Set " + thing);
        desk.drawing().undo();
        assertThat(design()).isEqualTo(start);
    }

    @SuppressWarnings("unchecked")
    private ChoiceSetting<BandKind> kind() {
        return (ChoiceSetting<BandKind>) setting("kind of band");
    }

    @Test
    void withNothingSelectedItSaysWhatToDo() {
        assertThat(model.headingProperty().get()).contains("Select one");
        assertThat(model.settings())
                .noneMatch(setting -> setting.placedProperty().get());
        model.commands().get(0).act().run();
        assertThat(model.chosen()).containsExactly(0);
        assertThat(model.calledProperty().get()).isEqualTo(1);
    }

    @Test
    void aPlaceIsSetBetweenTheNeighbours() {
        select(1);
        assertThat(fault("beginning of band", "0.4")).isEqualTo("must be from 0.5 to 124.5 mm");
        assertThat(fault("end of band", "144.6")).isEqualTo("must be from 30.5 to 144.5 mm");
        assertThat(fault("beginning of band", "31,5")).isEmpty();
        assertThat(design().bands().get(0).toMm()).isEqualTo(31.5);
        assertThat(((TypedSetting) setting("end of band")).typedProperty().get())
                .isEqualTo("144.6");
        done("beginning of band");
        type("end of band", "120");
        assertThat(design().bands().get(2).fromMm()).isEqualTo(120);
        done("end of band");
        type("length of band", "80");
        assertThat(design().bands().get(1).toMm()).isEqualTo(110);
        done("length of band");
    }

    @Test
    void theEndsOfThePieceStay() {
        select(0);
        assertThat(setting("beginning of band").lockProperty().get()).contains("end A");
        select(3);
        assertThat(setting("end of band").lockProperty().get()).contains("end B");
        assertThat(setting("edge of band").lockProperty().get()).contains("last band");
        type("length of band", "20");
        assertThat(design().bands().get(3).fromMm()).isEqualTo(140);
        done("length of band");
    }

    @Test
    void placesInInches() {
        desk.comfort().unitProperty().set(LengthUnit.INCH);
        select(1);
        assertThat(((TypedSetting) setting("end of band")).typedProperty().get())
                .isEqualTo("4.9213");
        type("end of band", "4.5");
        assertThat(design().bands().get(1).toMm()).isEqualTo(114.3);
        type("end of band", "120 mm");
        assertThat(design().bands().get(1).toMm()).isEqualTo(120);
        assertThat(fault("end of band", "9")).isEqualTo("must be from 1.2008 to 5.6889 in");
    }

    @Test
    void aNameIsItsOwn() {
        select(1);
        assertThat(fault("band name", "tip")).contains("another band");
        assertThat(fault("band name", " ")).contains("1 to 80");
        assertThat(fault("band name", "dusk")).isEmpty();
        assertThat(design().bands().get(1).name()).isEqualTo("dusk");
        done("band name");
    }

    @Test
    void filmsAreSetForAllSelected() {
        select(0, 2);
        assertThat(((TypedSetting) setting("film of band")).typedProperty().get())
                .isEmpty();
        assertThat(((TypedSetting) setting("film of band")).mixed()).isTrue();
        assertThat(((TypedSetting) setting("film of band")).commit()).isTrue();
        assertThat(design()).isSameAs(start);
        assertThat(fault("film of band", "0.9")).isEqualTo("must be from 1 to 2000 nm");
        type("film of band", "88.25");
        assertThat(design().bands().get(0).wanted()).isEqualTo(new Wanted.Film(88.25, 88.25));
        assertThat(design().bands().get(2).wanted()).isEqualTo(new Wanted.Film(88.25, 88.25));
        assertThat(design().bands().get(1)).isEqualTo(start.bands().get(1));
        done("film of band");
    }

    @Test
    void aFadeHasTwoSides() {
        select(1);
        type("A side of fade", "150");
        assertThat(design().bands().get(1).wanted()).isEqualTo(new Wanted.Film(150, 24));
        done("A side of fade");
        type("B side of fade", "40.5 nm");
        assertThat(design().bands().get(1).wanted()).isEqualTo(new Wanted.Film(160, 40.5));
        done("B side of fade");
    }

    @ParameterizedTest
    @EnumSource(BandKind.class)
    void anotherKindComesOutAsNearlyAsCanBe(BandKind kind) {
        select(0);
        assertThat(kind().choose(kind)).isTrue();
        assertThat(kind().chosenProperty().get().orElseThrow().value()).isEqualTo(kind);
        DrawnFilm film = desk.work().coloursProperty().get().filmsOf(design()).get(0);
        if (kind == BandKind.BARE) {
            assertThat(film.bare()).isTrue();
        } else {
            // One dial step of 0.1 V is about 0.2 nm; the nearest film to a colour of 8 bits a channel lies within 1
            // nm.
            assertThat(film.aSideNm()).isCloseTo(160, within(1.0));
        }
        if (kind != BandKind.LEVEL) {
            done("kind of band");
        }
    }

    @ParameterizedTest
    @EnumSource(BandKind.class)
    void severalBandsOfDifferentKindsCanBeMadeAlike(BandKind kind) {
        select(0, 1, 3);
        assertThat(kind().chosenProperty().get()).isEmpty();
        kind().choose(kind);
        assertThat(List.of(0, 1, 3))
                .allMatch(i -> BandKind.of(design().bands().get(i).wanted()) == kind);
        assertThat(design().bands().get(2)).isEqualTo(start.bands().get(2));
        done("kind of band");
    }

    @Test
    void voltsAreSet() {
        select(0);
        kind().choose(BandKind.VOLTS);
        assertThat(fault("volts of band", "501")).isEqualTo("must be from 0.1 to 500 V");
        type("volts of band", "45.5 V");
        assertThat(design().bands().get(0).wanted()).isEqualTo(new Wanted.Volts(45.5));
    }

    @Test
    void coloursAreSetWithTheirOrder() {
        select(0);
        kind().choose(BandKind.COLOUR);
        assertThat(fault("colour of band", "lab(101, 0, x)"))
                .contains("L: is 101")
                .contains("b: is no number");
        assertThat(fault("colour of band", "lab(45, 10, -38)")).isEmpty();
        assertThat(fault("order of colour", "1.5")).isEqualTo("must be a whole number");
        assertThat(fault("order of colour", "21")).isEqualTo("must be from 1 to 20, or any");
        assertThat(fault("order of colour", "2")).isEmpty();
        Wanted.Colour colour = (Wanted.Colour) design().bands().get(0).wanted();
        assertThat(colour.text()).isEqualTo("lab(45, 10, -38)");
        assertThat(colour.order()).isEqualTo(OptionalInt.of(2));
        type("order of colour", "any");
        assertThat(((Wanted.Colour) design().bands().get(0).wanted()).order()).isEmpty();
        type("colour of band", "3A3F8F");
        assertThat(((Wanted.Colour) design().bands().get(0).wanted()).text()).isEqualTo("#3a3f8f");
        assertThat(model.outcomeProperty().get()).contains("dE00 off what is wanted");
    }

    @Test
    @SuppressWarnings("unchecked")
    void edgesAreSetExceptThatOfTheLastBand() {
        select(2, 3);
        assertThat(((ChoiceSetting<Edge>) setting("edge of band")).choose(Edge.CRISP))
                .isTrue();
        assertThat(design().bands().get(2).edge()).isEqualTo(Edge.CRISP);
        assertThat(design().bands().get(3).edge())
                .isEqualTo(start.bands().get(3).edge());
        done("edge of band");
    }

    @Test
    void theTableFollowsTheDrawingAndTheWork() {
        assertThat(model.rows()).hasSize(4);
        BandRow fade = model.rows().get(1);
        assertThat(fade.place()).isEqualTo("30\u2013125");
        assertThat(fade.film()).isEqualTo("160 \u2192 24");
        assertThat(fade.volts()).contains(" \u2192 ");
        assertThat(model.rows().get(3).film()).isEqualTo("bare");
        desk.drawing().change("Split band", d -> BandEdits.split(d, 1, 60));
        assertThat(model.rows()).hasSize(5);
        assertThat(model.rows().get(1).place()).isEqualTo("30\u201360");
        desk.drawing().change("Set film", d -> BandEdits.want(d, List.of(0), BandEdits.film(1900, 1900)));
        assertThat(model.rows().get(0).film()).isEqualTo("1900");
        assertThat(model.rows().get(0).volts()).as("out of reach, so no volts").isEmpty();
    }

    @Test
    void whatWasTypedForOneBandIsNotTakenForAnother() {
        select(0);
        TypedSetting film = (TypedSetting) setting("film of band");
        film.typedProperty().set("99");
        desk.drawing().change("Set film", d -> BandEdits.want(d, List.of(2), BandEdits.film(160, 160)));
        assertThat(film.typedProperty().get()).as("edits elsewhere leave it").isEqualTo("99");
        select(2);
        assertThat(film.typedProperty().get()).isEqualTo("160");
    }

    @Test
    void theFocusedEdgeStandsForTheBandBeforeIt() {
        desk.drawing().select(Selection.of(new Part.EdgeAt(1)));
        assertThat(model.chosen()).containsExactly(1);
        desk.drawing().change("Delete band", d -> BandEdits.delete(d, List.of(1, 2, 3)));
        assertThat(model.chosen()).isEmpty();
    }
}
