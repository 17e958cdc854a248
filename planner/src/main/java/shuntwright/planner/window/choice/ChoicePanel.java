package shuntwright.planner.window.choice;

import java.util.List;

import javafx.beans.binding.Bindings;
import javafx.css.PseudoClass;
import javafx.geometry.HPos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

import shuntwright.plan.Conflict;
import shuntwright.planner.work.Planning;

/** What the board-wide choice reaches, how good that is, what it breaks, and what conflicts. */
public final class ChoicePanel {
    private static final int ROW_OF_FIRST = 1;

    private final ChoiceModel model;
    private final VBox list = new VBox();
    private final Node work;
    private final ScrollPane scroll;

    public ChoicePanel(ChoiceModel model) {
        this.model = model;
        work = work();
        list.getStyleClass().add("findings");
        list.setId("choice");
        list.setMinWidth(0);
        HBox.setHgrow(list, Priority.ALWAYS);
        Region order = new OrderEditor(model).node();
        order.setMinWidth(Region.USE_PREF_SIZE);
        HBox both = new HBox(order, list);
        scroll = new ScrollPane(both);
        scroll.setFitToWidth(true);
        model.shownProperty().subscribe(this::show);
    }

    /** The control for the window. */
    public Region node() {
        return scroll;
    }

    private void show(Shown shown) {
        list.getChildren().setAll(title(shown.title()));
        if (shown.working()) {
            // the same button each time, so that a click on it is not lost
            list.getChildren().add(work);
        }
        if (!shown.aims().isEmpty()) {
            list.getChildren().add(aims(shown.aims()));
        }
        if (!shown.broken().isEmpty()) {
            list.getChildren().add(broken(shown.broken()));
        }
        shown.conflict().ifPresent(this::conflict);
        if (!shown.facts().isEmpty()) {
            list.getChildren().add(facts(shown.facts()));
        }
    }

    /** Progress, and a button that is content with what there is. */
    private Node work() {
        Planning planning = model.session().planning();
        ProgressBar bar = new ProgressBar();
        bar.progressProperty().bind(planning.progressProperty());
        bar.setPrefWidth(180);
        Label stage = new Label();
        stage.textProperty().bind(Bindings.createStringBinding(() -> planning.stageProperty().get() + " …",
                planning.stageProperty()));
        Button keep = new Button("Keep the best so far");
        keep.setId("choice-keep-best");
        keep.setMnemonicParsing(false);
        keep.setTooltip(new Tooltip("Look no further; the best choice so far becomes the plan"));
        keep.setOnAction(_ -> model.keepBest());
        HBox row = new HBox(bar, stage, keep);
        row.getStyleClass().add("cure");
        return row;
    }

    private static Node aims(List<Shown.Aim> aims) {
        GridPane grid = new GridPane();
        grid.setId("choice-aims");
        grid.getStyleClass().add("figures");
        List<String> heads = List.of("", "Wanted", "Reached", "Bound", "Distance", "");
        for (int at = 0; at < heads.size(); at++) {
            boolean number = at >= 2 && at <= 4;
            ColumnConstraints column = new ColumnConstraints();
            column.setHalignment(number ? HPos.RIGHT : HPos.LEFT);
            column.setMinWidth(number ? 92 : Region.USE_PREF_SIZE);
            grid.getColumnConstraints().add(column);
            Label head = new Label(heads.get(at));
            head.getStyleClass().add("hint");
            grid.add(head, at, 0);
        }
        for (int at = 0; at < aims.size(); at++) {
            Shown.Aim aim = aims.get(at);
            Label value = new Label(aim.value());
            value.getStyleClass().add("tile-value");
            value.setAccessibleText(aim.wanted() + ": " + aim.value() + ", " + aim.words());
            Label distance = new Label(aim.distance());
            distance.setTooltip(new Tooltip("Nothing is better by more than this share of the value"));
            HBox proof = new HBox(new ProofMark(aim.proof()), new Label(aim.words()));
            proof.getStyleClass().add("proof");
            grid.addRow(ROW_OF_FIRST + at, new Label(at + 1 + "."), new Label(aim.wanted()), value,
                    new Label(aim.bound()), distance, proof);
        }
        return grid;
    }

    private static Node facts(List<Shown.Fact> facts) {
        HBox row = new HBox();
        row.getStyleClass().add("choice-facts");
        for (Shown.Fact each : facts) {
            Label title = new Label(each.title());
            title.getStyleClass().add("tile-title");
            Label value = new Label(each.value());
            value.setId("choice-" + each.title().toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
            title.setLabelFor(value);
            row.getChildren().add(new VBox(title, value));
        }
        return row;
    }

    private static Node broken(List<String> limits) {
        return flagged("broken", "fault", "Breaks the limit of " + String.join(", ", limits) + ".");
    }

    private static Node flagged(String word, String severity, String words) {
        Label kind = new Label(word);
        kind.getStyleClass().add("severity");
        kind.pseudoClassStateChanged(PseudoClass.getPseudoClass(severity), true);
        Label text = text(words);
        HBox.setHgrow(text, Priority.ALWAYS);
        HBox row = new HBox(kind, text);
        row.getStyleClass().add("finding");
        return row;
    }

    private void conflict(Shown.Clash clash) {
        list.getChildren().addAll(title(clash.title()), flagged("conflict", "fault", clash.words()),
                title("What would end the conflict, each by itself"));
        for (Shown.Part part : clash.parts()) {
            Label words = text(part.demand() + ": " + part.change());
            HBox.setHgrow(words, Priority.ALWAYS);
            HBox row = new HBox(button(part), words);
            row.getStyleClass().addAll("cure", "conflict-member");
            list.getChildren().add(row);
        }
    }

    /** Limits are applied as a cure is; of a channel the findings tell more. */
    private Button button(Shown.Part part) {
        boolean channel = part.member().kind() == Conflict.Kind.CHANNEL;
        Button button = new Button(channel ? "Select" : "Apply");
        button.getStyleClass().add("conflict-button");
        button.setMnemonicParsing(false);
        button.setAccessibleText(button.getText() + ": " + part.demand() + " " + part.change());
        button.setVisible(channel || part.member().kind() == Conflict.Kind.SHARED_LIMIT);
        button.setDisable(!channel && !part.applies());
        button.setOnAction(_ -> {
            if (channel) {
                model.select(part.member());
            } else {
                model.apply(part);
            }
        });
        return button;
    }

    private static Label title(String words) {
        Label label = text(words);
        label.getStyleClass().add("panel-title");
        return label;
    }

    private static Label text(String words) {
        Label label = new Label(words);
        label.setWrapText(true);
        return label;
    }
}
