package tideband.window.entry;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyStringProperty;

/** Something that can be set. */
public sealed interface Setting permits TypedSetting, ChoiceSetting, SwitchSetting {

    /**
     * What it is called and what it means.
     *
     * @return name and help
     */
    About about();

    /**
     * Whether it has a place at the moment, as a bore has only in a tube.
     *
     * @return a property; what has none is not shown
     */
    ReadOnlyBooleanProperty placedProperty();

    /**
     * Why it cannot be changed at the moment.
     *
     * @return a property; empty where it can be
     */
    ReadOnlyStringProperty lockProperty();

    /**
     * What is usual and what is allowed, in words: "0 to 10000 ohm, usually 2".
     *
     * @return a property; empty where there is nothing to say
     */
    ReadOnlyStringProperty boundsProperty();

    /**
     * Why what was entered was not accepted.
     *
     * @return a property; empty where nothing is wrong
     */
    ReadOnlyStringProperty faultProperty();

    /**
     * Whether it differs from what is usual.
     *
     * @return a property; false where nothing is
     */
    ReadOnlyBooleanProperty unusualProperty();

    /** Sets what is usual, where something is. */
    void backToUsual();

    /** Takes over what it stands for now. What is being typed is kept unless its value has changed. */
    void refresh();
}
