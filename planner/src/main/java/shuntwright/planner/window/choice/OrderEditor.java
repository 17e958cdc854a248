package shuntwright.planner.window.choice;

import java.util.List;
import java.util.Optional;

import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;

import shuntwright.board.Objective;
import shuntwright.planner.window.figures.Aims;

/** What is wanted of the choice, to be put in order. */
final class OrderEditor {
    private final ChoiceModel model;
    private final GridPane grid = new GridPane();
    private final MenuButton more = new MenuButton("Want also …");

    OrderEditor(ChoiceModel model) {
        this.model = model;
        grid.getStyleClass().add("order-editor");
        grid.setId("order-editor");
        more.setId("want-also");
        more.setMnemonicParsing(false);
        model.orderProperty().subscribe(this::show);
    }

    Region node() {
        return grid;
    }

    private void show(List<Objective> order) {
        Optional<String> focused = grid.getChildren().stream().filter(Node::isFocused).map(Node::getId).findFirst();
        fill(order);
        // whoever moves an objective by keys goes on doing so
        focused.flatMap(id -> grid.getChildren().stream().filter(each -> id.equals(each.getId())).findFirst())
                .ifPresent(Node::requestFocus);
    }

    private void fill(List<Objective> order) {
        grid.getChildren().clear();
        Label title = new Label("Wanted, the first decides");
        title.getStyleClass().add("panel-title");
        grid.add(title, 0, 0, 5, 1);
        for (int at = 0; at < order.size(); at++) {
            Objective each = order.get(at);
            String name = each.word();
            Label place = new Label(at + 1 + ".");
            place.getStyleClass().add("hint");
            Label words = new Label(Aims.wanted(each));
            words.setMaxWidth(Double.MAX_VALUE);
            Node earlier = button("↑", "earlier", "Put " + name + " earlier", at > 0, () -> model.move(each, -1), name);
            Node later = button("↓", "later", "Put " + name + " later", at < order.size() - 1,
                    () -> model.move(each, 1), name);
            Node remove = button("✕", "remove", "Do not want " + name, order.size() > 1, () -> model.remove(each),
                    name);
            grid.addRow(at + 1, place, words, earlier, later, remove);
        }
        more.getItems().setAll(model.others().stream().map(each -> {
            MenuItem item = new MenuItem(Aims.wanted(each));
            item.setOnAction(_ -> model.add(each));
            return item;
        }).toList());
        more.setDisable(more.getItems().isEmpty());
        grid.add(more, 0, order.size() + 1, 5, 1);
    }

    private static Button button(String sign, String id, String words, boolean useful, Runnable action, String name) {
        Button button = new Button(sign);
        button.setId(id + "-" + name.replace(' ', '-'));
        button.setMnemonicParsing(false);
        button.getStyleClass().add("small-button");
        button.setAccessibleText(words);
        button.setTooltip(new Tooltip(words));
        button.setDisable(!useful);
        button.setOnAction(_ -> action.run());
        return button;
    }
}
