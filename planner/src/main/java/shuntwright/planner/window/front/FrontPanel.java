package shuntwright.planner.window.front;

import java.util.List;

import javafx.beans.property.ObjectProperty;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

import org.jspecify.annotations.Nullable;

import shuntwright.board.Objective;
import shuntwright.planner.session.Documents;
import shuntwright.planner.window.chart.Pictures;
import shuntwright.planner.window.chart.PlotView;
import shuntwright.planner.window.explore.AskBar;
import shuntwright.planner.window.explore.Sum;
import shuntwright.planner.window.figures.Aims;

/** The front as a chart; a point shows its sums and can be taken. */
public final class FrontPanel {
    private final FrontModel model;
    private final BorderPane pane = new BorderPane();
    private final PlotView view = new PlotView("front");
    private final VBox beside = new VBox();
    private final Button take = new Button("Take this plan");

    public FrontPanel(FrontModel model, Documents documents) {
        this.model = model;
        view.onChosen(model::choose);
        model.plotProperty().subscribe(view::show);
        take.setId("take-plan");
        take.setMnemonicParsing(false);
        take.setTooltip(new Tooltip("Pins what this plan chose, so that the board has it; Undo takes it back"));
        take.disableProperty().bind(model.takeableBinding().not());
        take.setOnAction(_ -> model.take());
        beside.getStyleClass().add("beside");
        beside.setId("front-sums");
        model.sumsProperty().subscribe(this::show);
        pane.setTop(head(documents));
        pane.setCenter(view);
        pane.setRight(beside);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private HBox head(Documents documents) {
        ComboBox<Objective> first = objectives("front-first", model.firstProperty());
        ComboBox<Objective> second = objectives("front-second", model.secondProperty());
        Label of = new Label("Front of");
        of.setLabelFor(first);
        Label against = new Label("against");
        against.setLabelFor(second);
        HBox ask = new AskBar("compute-front", "Compute front", model.asked(), model.possibleBinding(),
                model.saidProperty(), model::ask).node();
        HBox.setHgrow(ask, Priority.ALWAYS);
        Button save = new Button("Save picture…");
        save.setId("save-front");
        save.setMnemonicParsing(false);
        save.disableProperty().bind(model.plotProperty().map(plot -> !plot.empty().isEmpty()));
        save.setTooltip(new Tooltip("Save the chart as a PNG file"));
        save.setOnAction(_ -> documents.savePicture("front", () -> Pictures.of(view)));
        HBox head = new HBox(of, first, against, second, ask, save);
        head.getStyleClass().add("panel-head");
        return head;
    }

    private static ComboBox<Objective> objectives(String id, ObjectProperty<Objective> chosen) {
        ComboBox<Objective> box = new ComboBox<>();
        box.setId(id);
        box.getItems().setAll(Objective.values());
        box.setConverter(new StringConverter<>() {
            @Override
            public String toString(@Nullable Objective objective) {
                return objective == null ? "" : Aims.title(objective);
            }

            @Override
            public Objective fromString(String text) {
                throw new UnsupportedOperationException("the box is not editable");
            }
        });
        box.valueProperty().bindBidirectional(chosen);
        return box;
    }

    private void show(List<Sum> sums) {
        beside.getChildren().clear();
        if (sums.isEmpty()) {
            Label hint = new Label("Choose a point with the mouse, or with ← and →, to see its sums.");
            hint.setWrapText(true);
            hint.getStyleClass().add("hint");
            beside.getChildren().add(hint);
        } else {
            GridPane grid = new GridPane();
            grid.getStyleClass().add("figures");
            Label title = new Label("This plan");
            title.getStyleClass().add("panel-title");
            Label now = new Label("against now");
            now.getStyleClass().add("hint");
            grid.addRow(0, title, new Label(), now);
            for (int at = 0; at < sums.size(); at++) {
                Sum sum = sums.get(at);
                Label value = new Label(sum.value());
                value.getStyleClass().add("tile-value");
                Label difference = new Label(sum.difference());
                GridPane.setHalignment(value, javafx.geometry.HPos.RIGHT);
                GridPane.setHalignment(difference, javafx.geometry.HPos.RIGHT);
                GridPane.setHalignment(now, javafx.geometry.HPos.RIGHT);
                grid.addRow(at + 1, new Label(sum.title()), value, difference);
            }
            beside.getChildren().addAll(grid, take);
        }
    }
}
