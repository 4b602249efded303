package tideband.window.settings;

import javafx.beans.Observable;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableValue;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Where the bath's numbers come from, in full, and the ways to another bath. */
final class BathNotesView extends VBox {

    BathNotesView(SettingsModel settings) {
        BathModel bath = settings.bath();
        getStyleClass().add("setting");
        Label title = new Label("Where its numbers come from");
        title.getStyleClass().add("setting-name");
        Button load = new Button("From a file\u2026");
        load.setOnAction(event -> bath.load());
        load.setTooltip(new Tooltip("Takes the bath in a tideband-bath file, as a fit to coupons leaves it."));
        load.setAccessibleText("Bath from a file");
        Button preset = new Button();
        preset.textProperty().bind(Bindings.concat("Back to ", bath.presetProperty()));
        preset.setOnAction(event -> bath.backToPreset());
        preset.visibleProperty().bind(bath.ownProperty());
        preset.managedProperty().bind(preset.visibleProperty());
        preset.setTooltip(
                new Tooltip("Gives the shop's own numbers up for those of the preset; undo brings them back."));
        FlowPane ways = new FlowPane(load, preset);
        ways.getStyleClass().add("ways");
        getChildren()
                .addAll(
                        title,
                        paragraph(bath.originProperty(), "setting-origin"),
                        paragraph(bath.sourceProperty(), "setting-help"),
                        paragraph(settings.reachProperty(), "setting-help"),
                        ways,
                        faults(bath));
    }

    private static VBox faults(BathModel bath) {
        VBox faults = new VBox();
        faults.getStyleClass().add("file-faults");
        Runnable fill = () -> {
            faults.getChildren().clear();
            for (String fault : bath.fileFaults()) {
                Label line = new Label(fault);
                line.getStyleClass().add("setting-fault");
                line.setWrapText(true);
                line.setMinHeight(Region.USE_PREF_SIZE);
                faults.getChildren().add(line);
            }
            boolean some = !bath.fileFaults().isEmpty();
            if (some) {
                Button dismiss = new Button("Put away");
                dismiss.setOnAction(event -> bath.dismissFaults());
                dismiss.setTooltip(new Tooltip("Takes what was wrong with the file off the screen."));
                faults.getChildren().add(dismiss);
            }
            faults.setVisible(some);
            faults.setManaged(some);
        };
        bath.fileFaults().addListener((Observable list) -> fill.run());
        fill.run();
        return faults;
    }

    private static Label paragraph(ObservableValue<String> text, String style) {
        Label label = new Label();
        label.textProperty().bind(text);
        label.getStyleClass().add(style);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        return label;
    }
}
