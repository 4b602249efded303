package tideband.window.field;

import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/** The keys of the field while it has the focus. */
final class FieldKeys {
    private static final double BY_TEN = 10;
    private static final double BY_A_TENTH = 0.1;

    private final FieldModel model;
    private boolean space;

    FieldKeys(FieldModel model) {
        this.model = model;
    }

    /** Whether the key that turns a drag into a movement of the view is down. */
    boolean panning() {
        return space;
    }

    void letGo() {
        space = false;
    }

    void released(KeyEvent event) {
        if (event.getCode() == KeyCode.SPACE) {
            space = false;
        }
    }

    void pressed(KeyEvent event) {
        if (event.isShortcutDown() && event.isAltDown()) {
            return;
        }
        boolean done = event.isShortcutDown() ? withShortcut(event) : plain(event);
        if (done) {
            event.consume();
        }
    }

    private boolean withShortcut(KeyEvent event) {
        int steps = event.isShiftDown() ? (int) BY_TEN : 1;
        switch (event.getCode()) {
            case RIGHT, KP_RIGHT -> model.keyboard().stepHandle(1);
            case LEFT, KP_LEFT -> model.keyboard().stepHandle(-1);
            case UP, KP_UP -> model.keyboard().nudgeDial(steps);
            case DOWN, KP_DOWN -> model.keyboard().nudgeDial(-steps);
            case A -> model.edits().selectAll();
            default -> {
                return false;
            }
        }
        return true;
    }

    private boolean plain(KeyEvent event) {
        double size = event.isShiftDown() ? BY_TEN : event.isAltDown() ? BY_A_TENTH : 1;
        switch (event.getCode()) {
            case RIGHT, KP_RIGHT -> model.keyboard().nudgeAlong(size, false);
            case LEFT, KP_LEFT -> model.keyboard().nudgeAlong(-size, false);
            case UP, KP_UP -> model.keyboard().nudgeUp(size);
            case DOWN, KP_DOWN -> model.keyboard().nudgeUp(-size);
            case PAGE_DOWN -> model.keyboard().stepBand(1, event.isShiftDown());
            case PAGE_UP -> model.keyboard().stepBand(-1, event.isShiftDown());
            case HOME -> model.keyboard().firstBand();
            case END -> model.keyboard().lastBand();
            case ENTER -> model.openExactValues();
            case DELETE, BACK_SPACE -> model.edits().delete();
            case SPACE -> space = true;
            case ESCAPE -> {
                if (!model.hand().busy()) {
                    return model.keyboard().letGo();
                }
                model.hand().cancel();
            }
            default -> {
                return false;
            }
        }
        return true;
    }
}
