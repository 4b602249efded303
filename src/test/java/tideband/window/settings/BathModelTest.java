package tideband.window.settings;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.Design;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.window.Desk;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.TextSetting;
import tideband.window.entry.TypedSetting;

class BathModelTest {
    private final Desk desk = Desk.with("burner-tube");
    private Optional<Path> file = Optional.empty();
    private final SettingsModel model = new SettingsModel(desk.drawing(), desk.work(), desk.comfort(), () -> file);
    private final BathModel bath = model.bath();

    @Test
    void aBathFromAFileSaysSoAndWhereItsNumbersComeFrom() {
        assertThat(bath.originProperty().get()).contains("shop-tantalum.json");
        assertThat(bath.sourceProperty().get()).isEqualTo(design().bath().source());
        assertThat(bath.ownProperty().get()).isTrue();
    }

    @Test
    void theWayBackToThePreset() {
        Design start = design();
        bath.backToPreset();
        assertThat(design().bath()).isEqualTo(BathPresets.usual(Metal.TANTALUM));
        assertThat(design().bathFile()).isEmpty();
        assertThat(bath.originProperty().get()).contains("starting points until a coupon has been run");
        assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Back to the preset bath");
        desk.drawing().undo();
        assertThat(design()).isEqualTo(start);
    }

    @Test
    void changingAPresetMakesItTheShopsOwn() {
        bath.backToPreset();
        type("bath resistance", "5");
        assertThat(design().bath().resistanceOhm()).isEqualTo(5);
        assertThat(design().bath().name()).isEqualTo("own phosphate");
        assertThat(design().bathFile()).contains("own phosphate.json");
        type("native film", "4");
        type("bath resistance", "6");
        assertThat(design().bath().source())
                .startsWith(BathPresets.usual(Metal.TANTALUM).source())
                .endsWith(" Set by hand: resistance, native film.");
        TextSetting name = (TextSetting) setting("bath name");
        name.typedProperty().set("sulfuric");
        assertThat(name.commit()).isFalse();
        name.typedProperty().set("bench bath");
        assertThat(name.commit()).isTrue();
        assertThat(design().bathFile()).contains("bench bath.json");
        desk.drawing().undo();
        desk.drawing().undo();
        desk.drawing().undo();
        desk.drawing().undo();
        assertThat(design().bath()).isEqualTo(BathPresets.usual(Metal.TANTALUM));
        assertThat(setting("bath resistance").unusualProperty().get()).isFalse();
    }

    @Test
    void aFittedFileIsNotWrittenOver() {
        type("bath resistance", "5");
        assertThat(design().bathFile()).contains("own shop tantalum.json");
    }

    @Test
    void everyFaultOfAFileIsToldAtOnce(@TempDir Path folder) throws IOException {
        Design start = design();
        file = Optional.of(Files.writeString(folder.resolve("bad.json"), """
                {"format": "tideband-bath", "version": 1, "name": "", "metal": "tantalum", "nm_per_volt": 50,
                 "field_slope": 33, "native_nm": 3, "efficiency": 2, "resistance_ohm": 2, "ceiling_volts": 100}
                """));
        bath.load();
        assertThat(design()).isSameAs(start);
        assertThat(bath.fileFaults()).hasSize(4).first().asString().startsWith("bad.json was not taken");
        assertThat(bath.fileFaults())
                .anyMatch(f -> f.contains("/nm_per_volt"))
                .anyMatch(f -> f.contains("/efficiency"));
        bath.dismissFaults();
        assertThat(bath.fileFaults()).isEmpty();
    }

    @Test
    void aFileForAnotherMetalIsRefusedWithTheWayOut() {
        Desk other = Desk.with("wick-pin");
        SettingsModel settings = new SettingsModel(
                other.drawing(),
                other.work(),
                other.comfort(),
                () -> Optional.of(Path.of("designs", "shop-tantalum.json")));
        settings.bath().load();
        assertThat(settings.bath().fileFaults().get(1)).contains("for tantalum").contains("niobium");
    }

    @Test
    void aSoundFileIsTakenInOneStep() {
        bath.backToPreset();
        file = Optional.of(Path.of("designs", "shop-tantalum.json"));
        bath.load();
        assertThat(design().bath().name()).isEqualTo("shop tantalum");
        assertThat(design().bathFile()).contains("shop-tantalum.json");
        assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Set bath from shop-tantalum.json");
    }

    @Test
    void anUnchosenFileChangesNothing() {
        Design start = design();
        bath.load();
        assertThat(design()).isSameAs(start);
        assertThat(bath.fileFaults()).isEmpty();
    }

    private Design design() {
        return desk.drawing().design();
    }

    private Setting setting(String thing) {
        return model.bathGroup().settings().stream()
                .filter(s -> s.about().thing().equals(thing))
                .findFirst()
                .orElseThrow();
    }

    private void type(String thing, String text) {
        TypedSetting number = (NumberSetting) setting(thing);
        number.typedProperty().set(text);
        assertThat(number.commit()).isTrue();
    }
}
