package tideband.window.action;

import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javafx.beans.binding.Bindings;
import javafx.scene.Node;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCombination;

/** The menu bar: every command in its place, with its key and its tooltip. */
public final class MenusView extends MenuBar {
    private final Map<Command.Menu, Menu> menus = new EnumMap<>(Command.Menu.class);

    /**
     * A menu bar of all commands.
     *
     * @param commands in the order they stand within their menus
     * @param firsts the commands a line is drawn before
     */
    public MenusView(List<Command> commands, Set<String> firsts) {
        Set<Character> letters = new HashSet<>();
        for (Command.Menu place : Command.Menu.values()) {
            Menu menu = new Menu(marked(place.title(), letters));
            menus.put(place, menu);
            List<Command> inIt =
                    commands.stream().filter(c -> c.menu() == place).toList();
            for (Command command : inIt) {
                if (firsts.contains(command.id())) {
                    menu.getItems().add(new SeparatorMenuItem());
                }
                menu.getItems().add(item(command));
            }
            menu.setOnShown(event -> tips(menu, inIt));
            if (!inIt.isEmpty()) {
                getMenus().add(menu);
            }
        }
        setAccessibleText("Menus");
    }

    /** A title with its first letter that no other menu has marked, to open the menu by with Alt. */
    private static String marked(String title, Set<Character> taken) {
        for (int i = 0; i < title.length(); i++) {
            if (taken.add(Character.toLowerCase(title.charAt(i)))) {
                return title.substring(0, i) + "_" + title.substring(i);
            }
        }
        return title;
    }

    /**
     * Puts a menu of its own inside a menu, after a command.
     *
     * @param command the command's id
     * @param inner the menu
     */
    public void insertAfter(String command, Menu inner) {
        for (Menu menu : menus.values()) {
            for (int i = 0; i < menu.getItems().size(); i++) {
                if (command.equals(menu.getItems().get(i).getId())) {
                    menu.getItems().add(i + 1, inner);
                    return;
                }
            }
        }
        throw new IllegalArgumentException("no command is called " + command);
    }

    /**
     * A menu of commands inside another.
     *
     * @param title its title
     * @param commands what stands in it
     * @return the menu
     */
    public static Menu inner(String title, List<Command> commands) {
        Menu menu = new Menu(title);
        commands.forEach(command -> menu.getItems().add(item(command)));
        menu.setOnShown(event -> tips(menu, commands));
        return menu;
    }

    private static MenuItem item(Command command) {
        MenuItem item = new MenuItem();
        item.setId(command.id());
        item.textProperty().bind(command.name());
        item.disableProperty().bind(Bindings.not(command.possible()));
        item.setMnemonicParsing(false);
        if (!command.key().isEmpty()) {
            item.setAccelerator(KeyCombination.valueOf(command.key()));
        }
        item.setOnAction(event -> command.act().run());
        return item;
    }

    /** Menu items exist as nodes only while they are shown, so tooltips are put on then. */
    private static void tips(Menu menu, List<Command> commands) {
        for (Command command : commands) {
            menu.getItems().stream()
                    .filter(item -> command.id().equals(item.getId()))
                    .map(MenuItem::getStyleableNode)
                    .filter(node -> node != null)
                    .forEach(node -> tip(node, command.help()));
        }
    }

    private static void tip(Node node, String help) {
        Tooltip.install(node, new Tooltip(help));
        node.setAccessibleHelp(help);
    }
}
