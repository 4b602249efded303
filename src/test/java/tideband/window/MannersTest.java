package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Function;
import java.util.stream.Stream;
import javafx.application.Platform;
import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.TabPane;
import javafx.scene.control.TitledPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.image.PixelReader;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.paint.Color;
import javafx.stage.PopupWindow;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.Sample;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.files.FilesView;
import tideband.window.look.Look;

/** The manners of the whole window: names, room for text, contrast, focus. */
@ScreenTest
class MannersTest {
    @TempDir
    static Path folder;

    private final ComfortModel comfort = new ComfortModel();
    private DrawingDesk desk;

    @Start
    void start(Stage stage) {
        stage.setWidth(1280);
        stage.setHeight(800);
        desk = new DrawingDesk(
                stage,
                Beginning.with(Desk.shipped("snuffer-handle")),
                comfort,
                Desk.threads(),
                new Recovery(folder.resolve("state")),
                new RecentFiles(folder.resolve("recent")),
                new FilesView(stage, comfort),
                () -> 0);
        desk.show();
    }

    @AfterEach
    void close(FxRobot robot) {
        robot.interact(() -> List.copyOf(Window.getWindows()).forEach(Window::hide));
    }

    private record State(String name, Runnable enter) {}

    /** What the main window can look like; each state is entered from the one before. */
    private List<State> states() {
        return List.of(
                new State("bands", () -> {
                    desk.model().drawing().select(Selection.of(new Part.Level(2)));
                    tab(0);
                }),
                new State("none", () -> desk.model().drawing().select(Selection.NONE)),
                new State("colour", () -> {
                    desk.model().drawing().select(Selection.of(new Part.Level(1)));
                    tab(1);
                    unfold();
                }),
                new State("bench", () -> {
                    tab(2);
                    unfold();
                }),
                new State("cautions", () -> cautions().setSelected(true)),
                new State("obstacles", () -> {
                    cautions().setSelected(false);
                    desk.model().drawing().change("Draw", MannersTest::tooThick);
                }),
                new State("mended", () -> desk.model().drawing().undo()));
    }

    private static Design tooThick(Design design) {
        Design named = BandEdits.rename(design, 1, "ring over the second collar, towards the wick");
        return BandEdits.want(named, List.of(1, 3), new Wanted.Film(300, 300));
    }

    private void tab(int index) {
        ((TabPane) root().lookup(".beside")).getSelectionModel().select(index);
    }

    /** Unfolds all there is to see, so that it is looked at too. */
    private void unfold() {
        settle(root());
        Manners.walk(root(), node -> {
            if (node instanceof TitledPane fold) {
                fold.setAnimated(false);
                fold.setExpanded(true);
            }
        });
    }

    private ToggleButton cautions() {
        return (ToggleButton) root().lookup(".caution-button");
    }

    private Parent root() {
        return desk.stage().getScene().getRoot();
    }

    private static void settle(Parent root) {
        for (int i = 0; i < 3; i++) {
            root.applyCss();
            root.layout();
        }
    }

    private List<String> inAllStates(FxRobot robot, Function<Parent, List<String>> look) {
        Set<String> found = new LinkedHashSet<>();
        for (State state : states()) {
            robot.interact(() -> {
                state.enter().run();
                settle(root());
                look.apply(root()).forEach(fault -> found.add(state.name() + ": " + fault));
            });
        }
        return List.copyOf(found);
    }

    private void act(FxRobot robot, String id) {
        Command command = desk.commands().stream()
                .filter(each -> each.id().equals(id))
                .findFirst()
                .orElseThrow();
        // Later, for a dialog waits within the act.
        robot.interact(() -> Platform.runLater(command.act()));
        WaitForAsyncUtils.waitForFxEvents();
        pulses(robot);
    }

    /** Lets what was opened find its size and be laid out. */
    private void pulses(FxRobot robot) {
        CountDownLatch pulses = new CountDownLatch(3);
        Runnable count = () -> {
            pulses.countDown();
            Platform.requestNextPulse();
        };
        robot.interact(() -> {
            over().getScene().addPostLayoutPulseListener(count);
            Platform.requestNextPulse();
        });
        try {
            assertThat(pulses.await(10, TimeUnit.SECONDS)).as("laid out").isTrue();
        } catch (InterruptedException stopped) {
            throw new AssertionError(stopped);
        }
        robot.interact(() -> over().getScene().removePostLayoutPulseListener(count));
    }

    private Parent over() {
        return Window.getWindows().stream()
                .filter(window -> window != desk.stage() && window instanceof Stage && window.isShowing())
                .map(window -> window.getScene().getRoot())
                .findFirst()
                .orElseThrow(() -> new AssertionError("no window was opened"));
    }

    private List<String> inWindowsOver(FxRobot robot, Function<Parent, List<String>> look) {
        List<String> found = new ArrayList<>();
        for (String id : List.of("new-drawing", "all-keys", "export-sheets", "print-sheets", "pace-immersion")) {
            act(robot, id);
            robot.interact(() -> {
                settle(over());
                look.apply(over()).forEach(fault -> found.add(id + ": " + fault));
                Pictures.save(over().getScene(), "manners-" + id);
                over().getScene().getWindow().hide();
                if (id.endsWith("sheets")) {
                    desk.model().sheets().close();
                }
            });
        }
        return found;
    }

    /** Looks at an open menu and an open box of choices, each with something chosen. */
    private List<String> inLists(FxRobot robot, Function<Parent, List<String>> look) {
        List<String> found = new ArrayList<>();
        Menu file = desk.view().menus().getMenus().get(0);
        robot.interact(() -> {
            tab(0);
            desk.model().drawing().select(Selection.of(new Part.Level(2)));
        });
        ComboBox<?> choices = (ComboBox<?>) root().lookup(".choices");
        for (Runnable open : List.<Runnable>of(file::show, choices::show)) {
            robot.interact(open);
            robot.push(KeyCode.DOWN);
            WaitForAsyncUtils.waitForFxEvents();
            robot.interact(() -> {
                found.addAll(look.apply(root()));
                List<Window> lists = Window.getWindows().stream()
                        .filter(window -> window instanceof PopupWindow && window.isShowing())
                        .toList();
                assertThat(lists).isNotEmpty();
                lists.forEach(list -> {
                    boolean menu = file.isShowing();
                    Pictures.save(
                            list.getScene(),
                            (menu ? "manners-menu-" : "manners-choices-")
                                    + (comfort.darkProperty().get() ? "dark" : "light"));
                    found.addAll(look.apply(list.getScene().getRoot()));
                });
                file.hide();
                choices.hide();
            });
        }
        return found;
    }

    @Test
    void everythingHasANameARoleAndATooltip(FxRobot robot) {
        assertThat(inAllStates(robot, Manners::nameless)).isEmpty();
        assertThat(inAllStates(robot, Manners::withoutTooltip)).isEmpty();
        assertThat(inWindowsOver(robot, Manners::nameless)).isEmpty();
    }

    @Test
    void everyActionStandsInTheMenusWithAKeyOfItsOwn() {
        List<MenuItem> items = new ArrayList<>();
        desk.view().menus().getMenus().forEach(menu -> leaves(menu, items));
        assertThat(items)
                .extracting(MenuItem::getId)
                .containsAll(desk.commands().stream().map(Command::id).toList())
                .hasSize(desk.commands().size() + Sample.values().length);
        assertThat(items).allSatisfy(item -> {
            assertThat(item.getText()).isNotBlank();
            assertThat(item.getAccelerator()).as(item.getText()).isInstanceOf(KeyCodeCombination.class);
        });
        assertThat(items).extracting(MenuItem::getAccelerator).doesNotHaveDuplicates();
    }

    private static void leaves(MenuItem item, List<MenuItem> into) {
        if (item instanceof Menu menu) {
            menu.getItems().forEach(inner -> leaves(inner, into));
        } else if (!(item instanceof SeparatorMenuItem)) {
            into.add(item);
        }
    }

    private record Size(int widthPx, int heightPx, int textPercent) {}

    @Test
    void noTextIsCutAtAnySize(FxRobot robot) {
        List<String> found = new ArrayList<>();
        for (Size size : List.of(
                new Size(1280, 800, 200),
                new Size(1280, 800, 150),
                new Size(1280, 800, 100),
                new Size(1024, 640, 100),
                new Size(1920, 1080, 100),
                new Size(3840, 2160, 100))) {
            robot.interact(() -> {
                desk.stage().setWidth(size.widthPx());
                desk.stage().setHeight(size.heightPx());
                comfort.textPercentProperty().set(size.textPercent());
            });
            inAllStates(robot, Manners::cut).forEach(fault -> found.add(size + " " + fault));
            if (size.textPercent() == ComfortModel.LARGEST_TEXT) {
                inWindowsOver(robot, Manners::cut).forEach(fault -> found.add(size + " " + fault));
            }
        }
        assertThat(found).isEmpty();
    }

    @Test
    void textStandsOutFromItsGround(FxRobot robot) {
        for (boolean dark : new boolean[] {false, true}) {
            robot.interact(() -> comfort.darkProperty().set(dark));
            Look look = Look.of(comfort);
            for (Color ink : List.of(look.ink(), look.faint(), look.accent(), look.warn())) {
                assertThat(Contrast.ratio(ink, look.paper())).isGreaterThanOrEqualTo(Contrast.LEAST);
                assertThat(Contrast.ratio(ink, look.panel())).isGreaterThanOrEqualTo(Contrast.LEAST);
            }
            assertThat(inAllStates(robot, Contrast::faint)).as("dark %s", dark).isEmpty();
            assertThat(inWindowsOver(robot, Contrast::faint))
                    .as("dark %s", dark)
                    .isEmpty();
            assertThat(inLists(robot, Contrast::faint))
                    .as("lists, dark %s", dark)
                    .isEmpty();
        }
    }

    @Test
    void contrastIsMeasuredAsTheGuidelinesDo() {
        // Reference: WCAG 2.2, definition of contrast ratio: 21 for black on white; 4.48 for #777 on white, just too
        // faint.
        assertThat(Contrast.ratio(Color.BLACK, Color.WHITE)).isEqualTo(21);
        assertThat(Contrast.ratio(Color.web("#777777"), Color.WHITE)).isBetween(4.47, 4.49);
    }

    @Test
    void tabReachesEverythingAndShowsWhereItIs(FxRobot robot) {
        robot.interact(() -> desk.model().drawing().select(Selection.of(new Part.Level(2))));
        Node field = desk.view().field();
        robot.interact(field::requestFocus);
        Set<String> reached = new LinkedHashSet<>(walkRound(robot, field, field));
        for (int tab = 1; tab < 3; tab++) {
            int index = tab;
            Node tabs = root().lookup(".beside");
            robot.interact(() -> {
                tab(index);
                if (index == 1) {
                    unfold();
                }
                tabs.requestFocus();
            });
            reached.addAll(walkRound(robot, tabs, root().lookup(".caution-button")));
        }
        assertThat(reached)
                .contains(
                        "field",
                        "piece-pane",
                        "slider",
                        "band-label",
                        "tab-pane",
                        "typed",
                        "choices",
                        "bands-table",
                        "colour-canvas",
                        "fold",
                        "caution-button",
                        "work-strip",
                        "why",
                        "button");
    }

    /** Tabs from one place to another, looks at each thing with the focus and without it, and gives the style classes met. */
    private Set<String> walkRound(FxRobot robot, Node from, Node to) {
        Scene scene = desk.stage().getScene();
        Set<Node> seen = new HashSet<>();
        Set<String> met = new LinkedHashSet<>();
        List<String> unseen = new ArrayList<>();
        Node at = from;
        do {
            assertThat(seen.add(at))
                    .as("comes back to where it was: %s", Manners.path(at))
                    .isTrue();
            met.addAll(at.getStyleClass());
            Node here = at;
            WritableImage[] pictures = new WritableImage[2];
            robot.interact(() -> pictures[0] = here.snapshot(null, null));
            if (painted(here)) {
                robot.push(KeyCode.TAB);
                WaitForAsyncUtils.waitForFxEvents();
                robot.interact(() -> pictures[1] = here.snapshot(null, null));
            } else {
                robot.interact(() -> pictures[1] = unfocused(here));
                robot.push(KeyCode.TAB);
                WaitForAsyncUtils.waitForFxEvents();
            }
            if (!differ(pictures[0], pictures[1])) {
                unseen.add(Manners.path(here));
            }
            at = scene.getFocusOwner();
        } while (at != to);
        assertThat(unseen).as("focus that cannot be seen").isEmpty();
        return met;
    }

    /** Whether the focus is painted and not styled. */
    private static boolean painted(Node node) {
        return node.getStyleClass().contains("field") || node.getStyleClass().contains("work-strip");
    }

    /** The same but for the style of the focus: what else changes as the focus goes is no sign of where it is. */
    private static WritableImage unfocused(Node node) {
        List<PseudoClass> focus = Stream.of("focused", "focus-visible", "focus-within", "contains-focus")
                .map(PseudoClass::getPseudoClass)
                .filter(node.getPseudoClassStates()::contains)
                .toList();
        focus.forEach(state -> node.pseudoClassStateChanged(state, false));
        node.applyCss();
        WritableImage picture = node.snapshot(null, null);
        focus.forEach(state -> node.pseudoClassStateChanged(state, true));
        node.applyCss();
        return picture;
    }

    private static boolean differ(WritableImage first, WritableImage second) {
        if (first.getWidth() != second.getWidth() || first.getHeight() != second.getHeight()) {
            return true;
        }
        PixelReader a = first.getPixelReader();
        PixelReader b = second.getPixelReader();
        int different = 0;
        for (int y = 0; y < first.getHeight(); y++) {
            for (int x = 0; x < first.getWidth(); x++) {
                different += a.getArgb(x, y) == b.getArgb(x, y) ? 0 : 1;
            }
        }
        return different > 8;
    }
}
