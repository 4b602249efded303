package tideband.window.entry;

import javafx.css.PseudoClass;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/** A field for what is typed: Enter or leaving it commits, Escape takes back. */
public final class TypedFieldView extends TextField {
    private static final PseudoClass FAULTY = PseudoClass.getPseudoClass("faulty");

    private final TypedSetting setting;

    /**
     * A field.
     *
     * @param setting what is typed in it
     */
    public TypedFieldView(TypedSetting setting) {
        this.setting = setting;
        getStyleClass().add("typed");
        textProperty().bindBidirectional(setting.typedProperty());
        setOnAction(event -> {
            if (setting.commit()) {
                selectAll();
            }
        });
        focusedProperty().addListener((value, before, after) -> {
            if (!after) {
                setting.commit();
            }
        });
        addEventFilter(KeyEvent.KEY_PRESSED, this::takeBack);
        setting.faultProperty().addListener((value, before, after) -> tell());
        setting.lockProperty().addListener((value, before, after) -> tell());
        setting.boundsProperty().addListener((value, before, after) -> tell());
        setTooltip(new Tooltip(setting.about().help()));
        tell();
    }

    private void takeBack(KeyEvent event) {
        boolean typing = !getText().equals(setting.shown())
                || !setting.faultProperty().get().isEmpty();
        if (event.getCode() == KeyCode.ESCAPE && typing) {
            setting.restore();
            selectAll();
            event.consume();
        }
    }

    private void tell() {
        String fault = setting.faultProperty().get();
        String lock = setting.lockProperty().get();
        pseudoClassStateChanged(FAULTY, !fault.isEmpty());
        setEditable(lock.isEmpty());
        setPromptText(setting.mixed() ? "mixed" : "");
        String unit = setting.symbol().isEmpty() ? "" : ", in " + setting.symbol();
        setAccessibleText(setting.about().name() + unit);
        String more = fault.isEmpty() ? setting.boundsProperty().get() : "Not taken: " + fault;
        setAccessibleHelp(setting.about().help() + " " + (lock.isEmpty() ? more : lock));
    }
}
