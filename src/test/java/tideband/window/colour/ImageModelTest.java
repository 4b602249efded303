package tideband.window.colour;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import tideband.window.Desk;

class ImageModelTest {
    private final Desk desk = Desk.with("lantern-hook");
    private final WantedModel model = new WantedModel(desk.drawing(), desk.work(), Runnable::run, Runnable::run);

    // Left half dark blue, right half transparent, one white pixel at 2, 3.
    private record Test20(int widthPx, int heightPx) implements Pixels {
        @Override
        public int argb(int xPx, int yPx) {
            if (xPx >= widthPx / 2) {
                return 0x00ffffff;
            }
            return xPx == 2 && yPx == 3 ? 0xffffffff : 0xff203070;
        }
    }

    @Test
    void takesTheColourUnderTheCrosshair() {
        model.image().averagingProperty().set(Averaging.ONE);
        model.image().open("lamp.png", new Test20(20, 20));
        model.image().place(1, 1);
        assertThat(model.entryProperty().get()).isEqualTo("#203070");
        assertThat(model.image().messageProperty().get()).isEqualTo("lamp.png at 1, 1: #203070");
        model.image().place(2, 3);
        assertThat(model.entryProperty().get()).isEqualTo("#ffffff");
        assertThat(model.foundProperty().get()).isPresent();
    }

    @Test
    void staysInsideThePicture() {
        model.image().open("lamp.png", new Test20(20, 10));
        model.image().place(-5, 99);
        assertThat(model.image().xPxProperty().get()).isZero();
        assertThat(model.image().yPxProperty().get()).isEqualTo(9);
    }

    /** Reference: half the light of white is #bcbcbc, IEC 61966-2-1 equation 7: 1.055·0.5^(1/2.4) − 0.055 = 0.7354. */
    @Test
    void averagesLightAndNotCodeValues() {
        Pixels checks = new Pixels() {
            @Override
            public int widthPx() {
                return 2;
            }

            @Override
            public int heightPx() {
                return 1;
            }

            @Override
            public int argb(int xPx, int yPx) {
                return xPx == 0 ? 0xffffffff : 0xff000000;
            }
        };
        assertThat(Averaging.THREE.at(checks, 0, 0).orElseThrow().hex()).isEqualTo("#bcbcbc");
    }

    @Test
    void transparentPixelsAddNothingAndAloneAreNoColour() {
        model.image().averagingProperty().set(Averaging.NINE);
        model.image().open("lamp.png", new Test20(40, 40));
        model.image().place(21, 30);
        assertThat(model.entryProperty().get()).isEqualTo("#203070");
        model.image().place(39, 30);
        assertThat(model.entryProperty().get()).isEqualTo("#203070");
        assertThat(model.image().messageProperty().get())
                .contains("transparent")
                .contains("Move the crosshair");
    }

    @Test
    void closingKeepsTheColour() {
        model.image().open("lamp.png", new Test20(20, 20));
        model.image().place(1, 1);
        String colour = model.entryProperty().get();
        model.image().close();
        assertThat(model.image().pixelsProperty().get()).isEmpty();
        assertThat(model.entryProperty().get()).isEqualTo(colour);
    }
}
