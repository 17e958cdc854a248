package shuntwright.planner.window.budget;

import java.util.Comparator;
import java.util.function.Function;

import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.util.StringConverter;

import org.jspecify.annotations.Nullable;

import shuntwright.accuracy.Outcome;

/** The error budget as a table of bars. */
public final class BudgetPanel {
    private final BorderPane pane = new BorderPane();
    private final TableView<BudgetRow> table = new TableView<>();

    public BudgetPanel(BudgetModel model) {
        table.setId("budget");
        table.getStyleClass().add("plain-table");
        table.setPlaceholder(new Label(""));
        words("Contribution", 300, BudgetRow::label, Comparator.comparing(BudgetRow::label));
        bars(260);
        number("Lower limit", BudgetRow::low, Comparator.comparingDouble(BudgetRow::lowBar));
        number("of trip target", BudgetRow::lowPercent, Comparator.comparingDouble(BudgetRow::lowBar));
        number("Upper limit", BudgetRow::high, Comparator.comparingDouble(BudgetRow::highBar));
        number("of trip target ", BudgetRow::highPercent, Comparator.comparingDouble(BudgetRow::highBar));
        number("Variance share", BudgetRow::variance, Comparator.comparingDouble(BudgetRow::share));
        table.setItems(model.rows());
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
        Label of = new Label("Budget of the");
        of.setLabelFor(outcomes);
        Label summary = new Label();
        summary.textProperty().bind(model.summaryProperty());
        summary.getStyleClass().add("budget-summary");
        HBox head = new HBox(of, outcomes, summary);
        head.getStyleClass().add("panel-head");
        pane.setTop(head);
        pane.setCenter(table);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private TableColumn<BudgetRow, BudgetRow> column(String title, double width, Comparator<BudgetRow> order) {
        TableColumn<BudgetRow, BudgetRow> column = new TableColumn<>(title);
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new ReadOnlyObjectWrapper<>(row.getValue()));
        column.setComparator(order);
        table.getColumns().add(column);
        return column;
    }

    private void words(String title, double width, Function<BudgetRow, String> text, Comparator<BudgetRow> order) {
        column(title, width, order).setCellFactory(_ -> new TextCell(text));
    }

    private void number(String title, Function<BudgetRow, String> text, Comparator<BudgetRow> order) {
        TableColumn<BudgetRow, BudgetRow> column = column(title, 104, order);
        column.getStyleClass().add("number-column");
        column.setCellFactory(_ -> {
            TextCell cell = new TextCell(text);
            cell.getStyleClass().add("figure-cell");
            return cell;
        });
    }

    private void bars(double width) {
        TableColumn<BudgetRow, BudgetRow> column = column("Moves the limits by", width,
                Comparator.comparingDouble(BudgetRow::widest));
        column.setCellFactory(_ -> new BarCell());
    }

    private static final class TextCell extends TableCell<BudgetRow, BudgetRow> {
        private final Function<BudgetRow, String> text;

        TextCell(Function<BudgetRow, String> text) {
            this.text = text;
        }

        @Override
        protected void updateItem(@Nullable BudgetRow row, boolean empty) {
            super.updateItem(row, empty);
            setText(empty || row == null ? null : text.apply(row));
        }
    }

    private static final class BarCell extends TableCell<BudgetRow, BudgetRow> {
        private final ContributionBar bar = new ContributionBar();

        @Override
        protected void updateItem(@Nullable BudgetRow row, boolean empty) {
            super.updateItem(row, empty);
            if (empty || row == null) {
                setGraphic(null);
            } else {
                bar.show(row.lowBar(), row.highBar());
                setGraphic(bar);
            }
        }
    }
}
