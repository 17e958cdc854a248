package shuntwright.planner.window;

import java.nio.file.Path;
import java.util.List;

import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

import shuntwright.planner.session.Documents;
import shuntwright.planner.window.help.HelpTopic;

/** What stands in the window before a board is open. */
final class StartPane {
    private final StackPane pane = new StackPane();

    StartPane(Documents documents, List<Path> demos, List<Path> newParts) {
        Label title = new Label("Plan the overcurrent protection of a power board");
        title.getStyleClass().add("start-title");
        FlowPane buttons = new FlowPane();
        buttons.getStyleClass().add("start-buttons");
        for (Path demo : demos) {
            buttons.getChildren()
                    .add(button("Demo board: " + Commands.demoName(demo), () -> documents.openCopy(demo)));
        }
        buttons.getChildren().addAll(button("New board", () -> documents.newBoard(newParts)),
                button("Open a board…", documents::open));
        VBox box = new VBox(title, buttons);
        box.getStyleClass().add("start");
        for (String line : HelpTopic.FIRST_STEPS.lines()) {
            box.getChildren().add(line(line));
        }
        Label caution = line(HelpTopic.CAUTIONS.lines().getFirst() + " " + HelpTopic.CAUTIONS.lines().get(1));
        caution.getStyleClass().add("caution");
        box.getChildren().add(caution);
        pane.getChildren().add(box);
        pane.getStyleClass().add("start-pane");
        pane.setId("start");
    }

    Node node() {
        return pane;
    }

    private static Button button(String text, Runnable action) {
        Button button = new Button(text);
        button.setMnemonicParsing(false);
        button.setOnAction(_ -> action.run());
        return button;
    }

    private static Label line(String text) {
        Label label = new Label(text);
        label.setWrapText(true);
        return label;
    }
}
