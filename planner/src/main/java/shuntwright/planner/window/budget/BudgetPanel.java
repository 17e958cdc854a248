package shuntwright.planner.window.budget;

import javafx.collections.ListChangeListener;
import javafx.collections.transformation.SortedList;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.RadioButton;
import javafx.scene.control.TableView;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

import org.jspecify.annotations.Nullable;

import shuntwright.accuracy.Outcome;
import shuntwright.planner.session.Documents;
import shuntwright.planner.window.chart.Pictures;

/** The error budget: what the outcome is, which input does what, and the trials in a picture. */
public final class BudgetPanel {
    /** Room for all columns. */
    private static final double TABLE = 1000;

    private final BudgetModel model;
    private final BorderPane pane = new BorderPane();
    private final TableView<BudgetRow> table = new TableView<>();
    private final HistogramView histogram = new HistogramView();
    private final FlowPane facts = new FlowPane();

    public BudgetPanel(BudgetModel model, Documents documents) {
        this.model = model;
        table.setId("budget");
        table.getStyleClass().add("plain-table");
        table.setPlaceholder(new Label(""));
        BudgetColumns.addTo(table);
        SortedList<BudgetRow> sorted = new SortedList<>(model.rows());
        sorted.comparatorProperty().bind(table.comparatorProperty());
        table.setItems(sorted);
        facts.getStyleClass().add("facts");
        facts.setId("budget-facts");
        model.facts().addListener((ListChangeListener<Fact>) _ -> showFacts());
        showFacts();
        model.drawingProperty().subscribe(histogram::show);
        table.setPrefWidth(TABLE);
        table.setMinWidth(TABLE / 2);
        HBox.setHgrow(histogram, Priority.ALWAYS);
        HBox both = new HBox(table, histogram);
        pane.setTop(new VBox(head(documents), facts));
        pane.setCenter(both);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private HBox head(Documents documents) {
        ComboBox<Outcome> outcomes = outcomes();
        Label of = new Label("Budget of the");
        of.setLabelFor(outcomes);
        Label summary = new Label();
        summary.textProperty().bind(model.summaryProperty());
        summary.getStyleClass().add("budget-summary");
        summary.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(summary, Priority.ALWAYS);
        Button save = new Button("Save picture…");
        save.setId("save-picture");
        save.setMnemonicParsing(false);
        save.disableProperty().bind(model.drawingProperty().map(java.util.Optional::isEmpty));
        save.setTooltip(new Tooltip("Save the picture as a PNG file"));
        save.setOnAction(_ -> documents.savePicture(model.summaryProperty().get(), () -> Pictures.of(histogram)));
        HBox head = new HBox(of, outcomes, calibration(), summary, save);
        head.getStyleClass().add("panel-head");
        return head;
    }

    private ComboBox<Outcome> outcomes() {
        ComboBox<Outcome> outcomes = new ComboBox<>(model.outcomes());
        outcomes.setId("budget-outcome");
        outcomes.setConverter(new StringConverter<>() {
            @Override
            public String toString(@Nullable Outcome outcome) {
                return outcome == null ? "" : outcome.words();
            }

            @Override
            public Outcome fromString(String text) {
                throw new UnsupportedOperationException("the box is not editable");
            }
        });
        outcomes.valueProperty().subscribe(chosen -> {
            if (chosen != null) {
                model.outcomeProperty().set(chosen);
            }
        });
        model.outcomes().subscribe(() -> outcomes.setValue(model.outcomes().contains(model.outcomeProperty().get())
                ? model.outcomeProperty().get()
                : model.outcomes().isEmpty() ? null : model.outcomes().getFirst()));
        return outcomes;
    }

    private HBox calibration() {
        RadioButton after = new RadioButton("after calibration");
        RadioButton before = new RadioButton("before calibration");
        after.setId("after-calibration");
        before.setId("before-calibration");
        ToggleGroup group = new ToggleGroup();
        after.setToggleGroup(group);
        before.setToggleGroup(group);
        after.setSelected(true);
        model.beforeCalibrationProperty().bind(before.selectedProperty());
        HBox both = new HBox(after, before);
        both.getStyleClass().add("calibration-choice");
        both.visibleProperty().bind(model.calibratedProperty());
        both.managedProperty().bind(model.calibratedProperty());
        return both;
    }

    private void showFacts() {
        facts.getChildren().setAll(model.facts().stream().map(BudgetPanel::fact).toList());
    }

    private static VBox fact(Fact fact) {
        Label title = new Label(fact.title());
        title.getStyleClass().add("tile-title");
        Label value = new Label(fact.value());
        value.getStyleClass().add("tile-value");
        title.setLabelFor(value);
        Tooltip tip = new Tooltip(fact.note());
        tip.setWrapText(true);
        tip.setMaxWidth(420);
        title.setTooltip(tip);
        value.setTooltip(tip);
        value.setAccessibleText(fact.title() + ": " + fact.value() + ". " + fact.note());
        VBox box = new VBox(title, value);
        box.getStyleClass().add("fact");
        return box;
    }
}
