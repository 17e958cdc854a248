package shuntwright.planner.window.others;

import java.util.Comparator;
import java.util.Optional;
import java.util.function.Function;

import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

import org.jspecify.annotations.Nullable;

import shuntwright.plan.Verdict;
import shuntwright.planner.window.explore.AskBar;
import shuntwright.planner.window.table.VerdictMark;

/** Other circuits of the selected channel in a table, each with a button that pins it. */
public final class OthersPanel {
    private final OthersModel model;
    private final BorderPane pane = new BorderPane();
    private final TableView<OtherRow> table = new TableView<>();

    public OthersPanel(OthersModel model) {
        this.model = model;
        table.setId("other-choices");
        table.getStyleClass().add("plain-table");
        Label empty = new Label();
        empty.textProperty().bind(model.emptyProperty());
        empty.setWrapText(true);
        table.setPlaceholder(empty);
        column("", 92, Comparator.comparing(OtherRow::number)).setCellFactory(_ -> new PinCell());
        words("", 40, OtherRow::number);
        words("Shunt", 170, OtherRow::shunt);
        words("Amplifier", 150, OtherRow::amplifier);
        words("Threshold", 196, OtherRow::threshold);
        column("Verdict", 96, Comparator.comparing(row -> row.verdict().map(Verdict::ordinal).orElse(-1)))
                .setCellFactory(_ -> new VerdictCell());
        number("Margin", 70, OtherRow::margin, Comparator.comparing(OtherRow::margin));
        amount("Cost of the build", 120, OtherRow::cost);
        amount("Heat of the board", 110, OtherRow::heat);
        amount("Part numbers", 100, OtherRow::parts);
        words("Breaks", 140, OtherRow::broken);
        table.setItems(model.rows());
        HBox ask = new AskBar("find-others", "Look for other choices", model.asked(), model.possibleBinding(),
                model.saidProperty(), model::ask).node();
        HBox.setHgrow(ask, Priority.ALWAYS);
        HBox head = new HBox(ask);
        head.getStyleClass().add("panel-head");
        pane.setTop(head);
        pane.setCenter(table);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private TableColumn<OtherRow, OtherRow> column(String title, double width, Comparator<OtherRow> order) {
        TableColumn<OtherRow, OtherRow> column = new TableColumn<>(title);
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new ReadOnlyObjectWrapper<>(row.getValue()));
        column.setComparator(order);
        table.getColumns().add(column);
        return column;
    }

    private void words(String title, double width, Function<OtherRow, String> text) {
        column(title, width, Comparator.comparing(text)).setCellFactory(_ -> new TextCell(text));
    }

    private void number(String title, double width, Function<OtherRow, String> text, Comparator<OtherRow> order) {
        TableColumn<OtherRow, OtherRow> column = column(title, width, order);
        column.getStyleClass().add("number-column");
        column.setCellFactory(_ -> {
            TextCell cell = new TextCell(text);
            cell.getStyleClass().add("figure-cell");
            return cell;
        });
    }

    private void amount(String title, double width, Function<OtherRow, OtherRow.Amount> amount) {
        Comparator<OtherRow> order = Comparator.comparingDouble(row -> amount.apply(row).key());
        number(title, width, row -> amount.apply(row).value(), order);
        number("against now", 92, row -> amount.apply(row).difference(), order);
    }

    private static final class TextCell extends TableCell<OtherRow, OtherRow> {
        private final Function<OtherRow, String> text;

        TextCell(Function<OtherRow, String> text) {
            this.text = text;
        }

        @Override
        protected void updateItem(@Nullable OtherRow row, boolean empty) {
            super.updateItem(row, empty);
            setText(empty || row == null ? null : text.apply(row));
        }
    }

    private static final class VerdictCell extends TableCell<OtherRow, OtherRow> {
        private final VerdictMark mark = new VerdictMark();

        VerdictCell() {
            getStyleClass().add("verdict-cell");
        }

        @Override
        protected void updateItem(@Nullable OtherRow row, boolean empty) {
            super.updateItem(row, empty);
            Optional<Verdict> verdict = empty || row == null ? Optional.empty() : row.verdict();
            mark.show(verdict);
            setGraphic(verdict.isPresent() ? mark : null);
            setText(verdict.map(Verdict::word).orElse(null));
        }
    }

    private final class PinCell extends TableCell<OtherRow, OtherRow> {
        private final Button pin = new Button("Pin this");

        PinCell() {
            pin.setMnemonicParsing(false);
            pin.getStyleClass().addAll("pin-button", "small-button");
            pin.setTooltip(
                    new Tooltip("Pins these parts and values on the channel; the rest of the board is chosen again "
                            + "around it. Undo takes it back"));
            pin.setOnAction(_ -> {
                OtherRow row = getItem();
                if (row != null) {
                    model.pin(row);
                }
            });
        }

        @Override
        protected void updateItem(@Nullable OtherRow row, boolean empty) {
            super.updateItem(row, empty);
            if (empty || row == null || row.choice().isEmpty()) {
                setGraphic(null);
            } else {
                setGraphic(pin);
                pin.setDisable(!model.pinnable(row));
                pin.setAccessibleText("Pin choice " + row.number() + ": " + row.shunt() + ", " + row.amplifier());
            }
        }
    }
}
