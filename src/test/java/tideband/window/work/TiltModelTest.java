package tideband.window.work;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.window.Desk;

class TiltModelTest {
    private final Desk desk = Desk.with("lantern-hook");

    @Test
    void showsTheColoursSeenStraightOnUntilTilted() {
        assertThat(desk.tilt().paletteProperty().get())
                .isSameAs(desk.work().coloursProperty().get().palette());
    }

    @Test
    void tiltedItShowsThePaletteOfThatAngle() {
        desk.tilt().tiltDegProperty().set(60);
        Palette expected = new Palette(
                FilmSystem.of("titanium", 1),
                desk.drawing().design().finish(),
                desk.work().coloursProperty().get().viewing(),
                60,
                100);
        assertThat(desk.tilt().paletteProperty().get().labAt(62)).isEqualTo(expected.labAt(62));
        desk.tilt().tiltDegProperty().set(0);
        assertThat(desk.tilt().paletteProperty().get())
                .isSameAs(desk.work().coloursProperty().get().palette());
    }
}
