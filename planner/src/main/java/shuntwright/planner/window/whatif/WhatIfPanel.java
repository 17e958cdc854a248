package shuntwright.planner.window.whatif;

import java.util.ArrayList;
import java.util.List;

import javafx.beans.property.StringProperty;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

import org.jspecify.annotations.Nullable;

import shuntwright.planner.session.Documents;
import shuntwright.planner.window.chart.Pictures;
import shuntwright.planner.window.chart.PlotView;
import shuntwright.planner.window.explore.AskBar;

/** A limit varied over a range: curves of cost, heat and parts beside each other. */
public final class WhatIfPanel {
    private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");

    private final WhatIfModel model;
    private final BorderPane pane = new BorderPane();
    private final HBox curves = new HBox();

    public WhatIfPanel(WhatIfModel model, Documents documents) {
        this.model = model;
        List<PlotView> views = new ArrayList<>();
        for (String id : List.of("what-if-cost", "what-if-heat", "what-if-parts")) {
            PlotView view = new PlotView(id);
            HBox.setHgrow(view, Priority.ALWAYS);
            views.add(view);
        }
        curves.getChildren().addAll(views);
        curves.getStyleClass().add("curves");
        model.plotsProperty().subscribe(plots -> {
            for (int at = 0; at < Math.min(plots.size(), views.size()); at++) {
                views.get(at).show(plots.get(at));
            }
        });
        Label problem = new Label();
        problem.setId("what-if-problem");
        problem.getStyleClass().addAll("hint", "ask-problem");
        problem.pseudoClassStateChanged(WRONG, true);
        problem.textProperty().bind(model.problemProperty());
        problem.visibleProperty().bind(model.problemProperty().isNotEmpty());
        problem.managedProperty().bind(problem.visibleProperty());
        pane.setTop(new VBox(head(documents), problem));
        pane.setCenter(curves);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private HBox head(Documents documents) {
        ComboBox<Lever> lever = new ComboBox<>(model.levers());
        lever.setId("what-if-lever");
        lever.setConverter(new StringConverter<>() {
            @Override
            public String toString(@Nullable Lever shown) {
                return shown == null ? "" : shown.words();
            }

            @Override
            public Lever fromString(String text) {
                throw new UnsupportedOperationException("the box is not editable");
            }
        });
        lever.setValue(model.leverProperty().get());
        lever.valueProperty().subscribe(chosen -> {
            if (chosen != null) {
                model.leverProperty().set(chosen);
            }
        });
        model.leverProperty().subscribe(lever::setValue);
        model.levers().subscribe(() -> lever.setValue(model.leverProperty().get()));
        Label what = new Label("What if");
        what.setLabelFor(lever);
        HBox ask = new AskBar("compute-what-if", "Compute", model.asked(), model.possibleBinding(),
                model.saidProperty(), model::ask).node();
        HBox.setHgrow(ask, Priority.ALWAYS);
        Button save = new Button("Save picture…");
        save.setId("save-what-if");
        save.setMnemonicParsing(false);
        save.disableProperty().bind(model.plotsProperty().map(plots -> plots.stream()
                .anyMatch(each -> !each.empty().isEmpty())));
        save.setTooltip(new Tooltip("Save the three charts as a PNG file"));
        save.setOnAction(_ -> documents.savePicture("what if", () -> Pictures.of(curves)));
        HBox head = new HBox(what, lever, new Label("goes from"), field("what-if-from", model.fromProperty(), 6),
                new Label("to"), field("what-if-to", model.toProperty(), 6), new Label("in"),
                field("what-if-count", model.countProperty(), 3), new Label("values"), ask, save);
        head.getStyleClass().add("panel-head");
        return head;
    }

    private TextField field(String id, StringProperty text, int columns) {
        TextField field = new TextField();
        field.setId(id);
        field.setPrefColumnCount(columns);
        field.setMinWidth(Region.USE_PREF_SIZE);
        field.setAccessibleText(switch (id) {
            case "what-if-from" -> "first value";
            case "what-if-to" -> "last value";
            default -> "number of values";
        });
        field.textProperty().bindBidirectional(text);
        field.setOnAction(_ -> {
            if (model.possibleBinding().get() && !model.asked().inquiry().runningProperty().get()) {
                model.ask();
            }
        });
        return field;
    }
}
