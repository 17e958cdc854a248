package shuntwright.planner.window;

import java.nio.file.Path;
import java.util.List;

import javafx.beans.binding.Bindings;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCombination;

import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Documents;
import shuntwright.planner.window.help.HelpTopic;

/** The menu bar: everything that can be done, with its keys. */
final class Commands {
    /** What the menus call besides session and documents. */
    interface Window {
        void close();

        void find();

        void help(HelpTopic topic);

        void scaleText(boolean larger);
    }

    private final BoardSession session;
    private final Documents documents;
    private final MenuBar bar = new MenuBar();

    Commands(BoardSession session, Documents documents, ThemeChoice themes, List<Path> demos, List<Path> newParts,
            Window window) {
        this.session = session;
        this.documents = documents;
        bar.getMenus().addAll(file(demos, newParts, window), edit(window), view(themes, window), help(window));
        bar.setId("menus");
    }

    MenuBar node() {
        return bar;
    }

    private Menu file(List<Path> demos, List<Path> newParts, Window window) {
        Menu demo = new Menu("Open demo board");
        demos.forEach(path -> demo.getItems().add(item(demoName(path), "", () -> documents.openCopy(path))));
        demo.setDisable(demos.isEmpty());
        Menu menu = new Menu("File");
        menu.getItems().addAll(item("New board", "Shortcut+N", () -> documents.newBoard(newParts)),
                item("Open…", "Shortcut+O", documents::open), demo, new SeparatorMenuItem(),
                whenOpen(item("Save", "Shortcut+S", documents::save)),
                whenOpen(item("Save as…", "Shortcut+Shift+S", documents::saveAs)), new SeparatorMenuItem(),
                whenOpen(item("Add parts file…", "", documents::addParts)),
                whenOpen(item("Export workbook…", "Shortcut+E", documents::exportWorkbook)),
                whenOpen(item("Export plan file…", "", documents::exportPlan)), new SeparatorMenuItem(),
                item("Close", "Shortcut+Q", window::close));
        return menu;
    }

    static String demoName(Path path) {
        return path.getFileName().toString().replace(".board.json", "").replace('-', ' ');
    }

    private Menu edit(Window window) {
        MenuItem undo = item("Undo", "Shortcut+Z", session::undo);
        undo.textProperty().bind(Bindings.createStringBinding(() -> session.undoNameProperty().get().isEmpty()
                ? "Undo"
                : "Undo: " + session.undoNameProperty().get(), session.undoNameProperty()));
        undo.disableProperty().bind(session.undoNameProperty().isEmpty());
        MenuItem redo = item("Redo", "Shortcut+Shift+Z", session::redo);
        redo.textProperty().bind(Bindings.createStringBinding(() -> session.redoNameProperty().get().isEmpty()
                ? "Redo"
                : "Redo: " + session.redoNameProperty().get(), session.redoNameProperty()));
        redo.disableProperty().bind(session.redoNameProperty().isEmpty());
        Menu menu = new Menu("Edit");
        menu.getItems().addAll(undo, redo, new SeparatorMenuItem(),
                whenOpen(item("Add channel", "Insert", () -> session.addChannel("channel"))),
                whenOpen(item("Duplicate channel", "Shortcut+D", session::duplicateSelected)),
                whenOpen(item("Remove channel", "Shortcut+Delete", session::removeSelected)), new SeparatorMenuItem(),
                whenOpen(item("Find channel", "Shortcut+F", window::find)),
                whenOpen(item("Plan again", "F5", session::plan)));
        return menu;
    }

    private static Menu view(ThemeChoice themes, Window window) {
        Menu menu = new Menu("View");
        ToggleGroup group = new ToggleGroup();
        for (ThemeChoice.Wish wish : ThemeChoice.Wish.values()) {
            RadioMenuItem item = new RadioMenuItem(wish.words());
            item.setToggleGroup(group);
            item.setSelected(themes.wishProperty().get() == wish);
            item.setOnAction(_ -> themes.wishProperty().set(wish));
            menu.getItems().add(item);
        }
        menu.getItems().addAll(new SeparatorMenuItem(),
                item("Larger text", "Shortcut+Plus", () -> window.scaleText(true)),
                item("Smaller text", "Shortcut+Minus", () -> window.scaleText(false)));
        return menu;
    }

    private static Menu help(Window window) {
        Menu menu = new Menu("Help");
        for (HelpTopic topic : HelpTopic.values()) {
            menu.getItems()
                    .add(item(topic.title(), topic == HelpTopic.FIRST_STEPS ? "F1" : "", () -> window.help(topic)));
        }
        return menu;
    }

    private MenuItem whenOpen(MenuItem item) {
        item.disableProperty().bind(session.openProperty().not());
        return item;
    }

    private static MenuItem item(String text, String keys, Runnable action) {
        MenuItem item = new MenuItem(text);
        item.setMnemonicParsing(false);
        if (!keys.isEmpty()) {
            item.setAccelerator(KeyCombination.valueOf(keys));
        }
        item.setOnAction(_ -> action.run());
        return item;
    }
}
