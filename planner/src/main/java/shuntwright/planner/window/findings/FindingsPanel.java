package shuntwright.planner.window.findings;

import java.util.List;

import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

import shuntwright.plan.Cure;
import shuntwright.plan.Finding;
import shuntwright.planner.window.circuit.CircuitWords;
import shuntwright.planner.window.table.VerdictMark;

/** Findings with their numbers, and cures with a button each. */
public final class FindingsPanel {
    private final FindingsModel model;
    private final VBox list = new VBox();
    private final GridPane chosen = new GridPane();
    private final ScrollPane scroll = new ScrollPane(new HBox(list, chosen));

    public FindingsPanel(FindingsModel model) {
        this.model = model;
        list.getStyleClass().add("findings");
        HBox.setHgrow(list, Priority.ALWAYS);
        list.setMinWidth(0);
        chosen.getStyleClass().add("chosen");
        chosen.setId("chosen");
        scroll.setFitToWidth(true);
        scroll.setId("findings");
        model.shownProperty().subscribe(this::show);
    }

    /** The control for the window. */
    public Region node() {
        return scroll;
    }

    private void show(FindingsModel.Shown shown) {
        list.getChildren().clear();
        if (!shown.title().isEmpty()) {
            list.getChildren().add(head(shown));
            shown.wrong().forEach(each -> list.getChildren().add(wrong(each)));
            shown.findings().forEach(each -> list.getChildren().add(finding(each)));
            if (shown.findings().isEmpty() && shown.verdict().isPresent()) {
                list.getChildren().add(text("Nothing to report: everything asked of this channel is met."));
            }
            cures(shown);
        }
        if (!shown.board().isEmpty()) {
            list.getChildren().add(title("The board"));
            shown.board().forEach(each -> list.getChildren().add(finding(each)));
        }
        if (list.getChildren().isEmpty()) {
            list.getChildren().add(text("Select a channel to see what was found."));
        }
        choice(shown.chosen());
    }

    private void choice(List<CircuitWords.Line> lines) {
        chosen.getChildren().clear();
        chosen.setVisible(!lines.isEmpty());
        chosen.setManaged(!lines.isEmpty());
        if (!lines.isEmpty()) {
            chosen.add(title("Chosen"), 0, 0, 2, 1);
        }
        for (int at = 0; at < lines.size(); at++) {
            Label what = new Label(lines.get(at).title());
            what.getStyleClass().add("hint");
            what.setMinWidth(Region.USE_PREF_SIZE);
            Label words = text(lines.get(at).words());
            what.setLabelFor(words);
            chosen.addRow(at + 1, what, words);
        }
    }

    private static Node wrong(String words) {
        Label kind = new Label("wrong entry");
        kind.getStyleClass().add("severity");
        kind.pseudoClassStateChanged(PseudoClass.getPseudoClass("fault"), true);
        HBox row = new HBox(kind, text(words));
        row.getStyleClass().add("finding");
        return row;
    }

    private static Node head(FindingsModel.Shown shown) {
        VerdictMark mark = new VerdictMark();
        mark.show(shown.verdict());
        String words = shown.verdict().map(verdict -> ": " + verdict.word()).orElse(": not planned yet")
                + (shown.stale()
                        ? " – as of before the last edit"
                        : shown.wrong().isEmpty() ? "" : " – as of the last good entries");
        HBox head = new HBox(title(shown.title() + words));
        if (shown.verdict().isPresent()) {
            head.getChildren().addFirst(mark);
        }
        head.getStyleClass().add("finding-head");
        return head;
    }

    private void cures(FindingsModel.Shown shown) {
        List<Cure> cures = shown.cures();
        if (cures.isEmpty()) {
            return;
        }
        list.getChildren().add(title(cures.stream().anyMatch(Cure::cures)
                ? "What would cure it, tried one at a time"
                : "No single change cures it; this was tried, one at a time"));
        for (Cure cure : cures) {
            Button apply = new Button("Apply");
            apply.setDisable(shown.stale() || cure.edit().isEmpty());
            apply.setVisible(cure.edit().isPresent());
            apply.setOnAction(_ -> model.apply(cure));
            apply.setAccessibleText("Apply: " + cure.change());
            VerdictMark mark = new VerdictMark();
            mark.show(java.util.Optional.of(cure.reached()));
            Label words = text(cure.change() + " – then " + cure.reached().word() + cure.margin().map(
                    margin -> String.format(java.util.Locale.ROOT, ", margin %.1f %%", margin * 100).replace('-', '−'))
                    .orElse(""));
            HBox row = new HBox(apply, mark, words);
            HBox.setHgrow(words, Priority.ALWAYS);
            row.getStyleClass().add("cure");
            list.getChildren().add(row);
        }
    }

    private static Label title(String words) {
        Label label = new Label(words);
        label.getStyleClass().add("panel-title");
        return label;
    }

    private static Label text(String words) {
        Label label = new Label(words);
        label.setWrapText(true);
        return label;
    }

    private static Node finding(Finding finding) {
        Label kind = new Label(finding.key().severity().word());
        kind.getStyleClass().add("severity");
        kind.pseudoClassStateChanged(PseudoClass.getPseudoClass(finding.key().severity().word()), true);
        Label words = text(finding.text());
        HBox.setHgrow(words, Priority.ALWAYS);
        HBox row = new HBox(kind, words);
        row.getStyleClass().add("finding");
        return row;
    }
}
