package tideband.window.entry;

import javafx.beans.Observable;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

/**
 * A box to choose from; each choice says what it is.
 *
 * @param <T> the kind of thing chosen
 */
final class ChoiceBoxView<T> extends ComboBox<Choice<T>> {
    private final ChoiceSetting<T> setting;
    private boolean following;

    ChoiceBoxView(ChoiceSetting<T> setting) {
        this.setting = setting;
        getStyleClass().add("choices");
        setConverter(new Names<>());
        setCellFactory(list -> new Meaning<>());
        setButtonCell(new Name<>());
        setPromptText("mixed");
        setVisibleRowCount(6);
        setAccessibleText(setting.about().name());
        setAccessibleHelp(setting.about().help());
        setTooltip(new Tooltip(setting.about().help()));
        disableProperty().bind(setting.lockProperty().isNotEmpty());
        setting.choices().addListener((Observable list) -> follow());
        setting.chosenProperty().addListener((value, before, after) -> follow());
        valueProperty().addListener((value, before, after) -> {
            if (!following && after != null) {
                setting.choose(after.value());
                follow();
            }
        });
        follow();
    }

    private void follow() {
        following = true;
        if (!getItems().equals(setting.choices())) {
            getItems().setAll(setting.choices());
        }
        setValue(setting.chosenProperty().get().orElse(null));
        following = false;
    }

    private static final class Names<T> extends StringConverter<Choice<T>> {
        @Override
        public String toString(Choice<T> choice) {
            return choice == null ? "" : choice.name();
        }

        @Override
        public Choice<T> fromString(String name) {
            throw new UnsupportedOperationException("the box is not typed in");
        }
    }

    private static final class Name<T> extends ListCell<Choice<T>> {
        @Override
        protected void updateItem(Choice<T> choice, boolean empty) {
            super.updateItem(choice, empty);
            setText(empty || choice == null ? "mixed" : choice.name());
        }
    }

    private static final class Meaning<T> extends ListCell<Choice<T>> {
        private final Label name = new Label();
        private final Label meaning = new Label();
        private final VBox both = new VBox(name, meaning);

        Meaning() {
            meaning.getStyleClass().add("choice-meaning");
            meaning.setWrapText(true);
        }

        @Override
        protected void updateItem(Choice<T> choice, boolean empty) {
            super.updateItem(choice, empty);
            boolean shown = !empty && choice != null;
            setGraphic(shown ? both : null);
            setAccessibleText(shown ? choice.name() + ". " + choice.meaning() : "");
            name.setText(shown ? choice.name() : "");
            meaning.setText(shown ? choice.meaning() : "");
            meaning.setVisible(!meaning.getText().isEmpty());
            meaning.setManaged(meaning.isVisible());
        }
    }
}
