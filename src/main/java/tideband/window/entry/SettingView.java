package tideband.window.entry;

import java.util.function.Supplier;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Control;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A setting with its name, its field, what is wrong with what was entered, its help and the way back to what is usual. */
public final class SettingView extends VBox {
    private final Control control;
    private final Label help;

    private SettingView(Setting setting, boolean withHelp) {
        getStyleClass().add("setting");
        visibleProperty().bind(setting.placedProperty());
        managedProperty().bind(visibleProperty());
        help = help(setting, withHelp);
        if (setting instanceof NumberSetting number) {
            TypedFieldView field = new TypedFieldView(number);
            field.getStyleClass().add("number");
            Label unit = new Label(number.symbol());
            unit.getStyleClass().add("unit");
            // The unit of a length follows the user's liking, and the bounds are told anew when it changes.
            number.boundsProperty().addListener((value, before, after) -> unit.setText(number.symbol()));
            getChildren().add(line(setting, field, field, unit));
            control = field;
        } else if (setting instanceof TextSetting text) {
            TypedFieldView field = new TypedFieldView(text);
            if (withHelp) {
                getChildren().addAll(name(setting, field), field);
            } else {
                field.getStyleClass().add("short");
                getChildren().add(line(setting, field, field));
            }
            control = field;
        } else if (setting instanceof ChoiceSetting<?> choice) {
            ChoiceBoxView<?> box = new ChoiceBoxView<>(choice);
            getChildren().add(line(setting, box, box));
            if (withHelp) {
                getChildren().add(meaning(choice));
            }
            control = box;
        } else {
            control = box((SwitchSetting) setting);
            getChildren().add(control);
        }
        getChildren().add(fault(setting));
        if (withHelp) {
            getChildren().add(help);
        }
        getChildren().add(backToUsual(setting));
    }

    /**
     * A setting with its help below it.
     *
     * @param setting the setting
     * @return the view
     */
    public static SettingView of(Setting setting) {
        return new SettingView(setting, true);
    }

    /**
     * A setting whose help stands elsewhere; see {@link #helpProperty()}.
     *
     * @param setting the setting
     * @return the view
     */
    public static SettingView brief(Setting setting) {
        return new SettingView(setting, false);
    }

    /**
     * What the setting means and what it may be.
     *
     * @return a property
     */
    public ReadOnlyStringProperty helpProperty() {
        return help.textProperty();
    }

    /**
     * The setting's field.
     *
     * @return what takes the focus
     */
    public Control control() {
        return control;
    }

    private static HBox line(Setting setting, Control field, Node... right) {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox line = new HBox(name(setting, field), gap);
        line.getChildren().addAll(right);
        line.getStyleClass().add("setting-line");
        line.setAlignment(Pos.CENTER_LEFT);
        return line;
    }

    private static Label name(Setting setting, Control field) {
        Label name = new Label(setting.about().name());
        name.getStyleClass().add("setting-name");
        name.setLabelFor(field);
        name.setMinWidth(Region.USE_PREF_SIZE);
        return name;
    }

    private static CheckBox box(SwitchSetting setting) {
        CheckBox box = new CheckBox(setting.about().name());
        box.getStyleClass().add("setting-name");
        box.setSelected(setting.onProperty().get());
        setting.onProperty().addListener((value, before, after) -> box.setSelected(after));
        box.setOnAction(event -> {
            setting.turn(box.isSelected());
            box.setSelected(setting.onProperty().get());
        });
        box.disableProperty().bind(setting.lockProperty().isNotEmpty());
        box.setAccessibleText(setting.about().name());
        box.setAccessibleHelp(setting.about().help());
        box.setTooltip(new Tooltip(setting.about().help()));
        return box;
    }

    private static Label fault(Setting setting) {
        return paragraph("setting-fault", setting.faultProperty(), () -> {
            String fault = setting.faultProperty().get();
            String back =
                    setting instanceof TypedSetting typed && !typed.shown().isEmpty()
                            ? " Escape brings " + typed.shown() + " back."
                            : "";
            return fault.isEmpty() ? "" : "Not taken: " + fault + "." + back;
        });
    }

    private static <T> Label meaning(ChoiceSetting<T> choice) {
        return paragraph(
                "setting-meaning",
                choice.chosenProperty(),
                () -> choice.chosenProperty().get().map(Choice::meaning).orElse(""));
    }

    private static Label help(Setting setting, boolean meaningApart) {
        Supplier<String> text = () -> {
            String lock = setting.lockProperty().get();
            String bounds = setting.boundsProperty().get();
            String meaning = setting instanceof ChoiceSetting<?> choice && !meaningApart
                    ? choice.chosenProperty().get().map(Choice::meaning).orElse("")
                    : "";
            return lock.isEmpty()
                    ? Stream.of(meaning, setting.about().help(), bounds.isEmpty() ? "" : bounds + ".")
                            .filter(part -> !part.isEmpty())
                            .collect(Collectors.joining(" "))
                    : lock;
        };
        Label help = paragraph("setting-help", setting.boundsProperty(), text);
        setting.lockProperty().addListener((value, before, after) -> help.setText(text.get()));
        if (setting instanceof ChoiceSetting<?> choice && !meaningApart) {
            choice.chosenProperty().addListener((value, before, after) -> help.setText(text.get()));
        }
        return help;
    }

    private static Label paragraph(String style, ObservableValue<?> heed, Supplier<String> text) {
        Label label = new Label(text.get());
        label.getStyleClass().add(style);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        heed.addListener((value, before, after) -> label.setText(text.get()));
        label.visibleProperty().bind(label.textProperty().isNotEmpty());
        label.managedProperty().bind(label.visibleProperty());
        return label;
    }

    private static Hyperlink backToUsual(Setting setting) {
        Hyperlink back = new Hyperlink("Back to usual");
        back.getStyleClass().add("back-to-usual");
        back.setOnAction(event -> {
            setting.backToUsual();
            back.setVisited(false);
        });
        back.visibleProperty()
                .bind(Bindings.and(
                        setting.unusualProperty(), setting.lockProperty().isEmpty()));
        back.managedProperty().bind(back.visibleProperty());
        back.setAccessibleText(setting.about().name() + ": back to usual");
        back.setTooltip(new Tooltip("Sets what is usual; undo brings yours back."));
        return back;
    }
}
