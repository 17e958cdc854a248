package shuntwright.planner.window.budget;

import java.util.Comparator;
import java.util.function.Function;

import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;

import org.jspecify.annotations.Nullable;

/** Columns of the budget: the input, and one or more for each of the three readers. */
final class BudgetColumns {
    private BudgetColumns() {
    }

    static void addTo(TableView<BudgetRow> table) {
        words(table, "Input", 168, BudgetRow::label);
        words(table, "Draw of", 100, BudgetRow::owner);
        words(table, "Distribution", 86, BudgetRow::distribution);
        Comparator<BudgetRow> widest = Comparator.comparingDouble(row -> row.limits().widest());
        column(table, "Limits", 70, widest, "How far this input alone moves the lower and the upper limit")
                .setCellFactory(_ -> new LimitsCell());
        number(table, "Lower", 70, row -> row.limits().low(), "How far it moves the lower limit",
                Comparator.comparingDouble(row -> row.limits().lowBar()));
        number(table, "Upper", 70, row -> row.limits().high(), "How far it moves the upper limit",
                Comparator.comparingDouble(row -> row.limits().highBar()));
        number(table, "of target", 100, row -> row.limits().ofTarget(), "The same as shares of the trip target",
                widest);
        share(table, "Variance", BudgetRow::variance,
                "Its share of the combined variance (JCGM 100): sensitivity times standard uncertainty, squared");
        share(table, "First-order", BudgetRow::first,
                "The share of the trials' variance that it explains by itself (Sobol index); the thin line is ± one "
                        + "standard error");
        share(table, "Total effect", BudgetRow::total,
                "The share of the trials' variance that it takes part in, together with all it multiplies; above the "
                        + "first-order index where it acts through others");
    }

    private static TableColumn<BudgetRow, BudgetRow> column(TableView<BudgetRow> table, String title, double width,
            Comparator<BudgetRow> order, String meaning) {
        TableColumn<BudgetRow, BudgetRow> column = new TableColumn<>();
        Label head = new Label(title);
        head.setTooltip(new Tooltip(meaning));
        column.setGraphic(head);
        column.setId("budget-" + title.toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new ReadOnlyObjectWrapper<>(row.getValue()));
        column.setComparator(order);
        table.getColumns().add(column);
        return column;
    }

    private static void words(TableView<BudgetRow> table, String title, double width,
            Function<BudgetRow, String> text) {
        column(table, title, width, Comparator.comparing(text), title).setCellFactory(_ -> new TextCell(text));
    }

    private static void number(TableView<BudgetRow> table, String title, double width, Function<BudgetRow, String> text,
            String meaning, Comparator<BudgetRow> order) {
        TableColumn<BudgetRow, BudgetRow> column = column(table, title, width, order, meaning);
        column.getStyleClass().add("number-column");
        column.setCellFactory(_ -> {
            TextCell cell = new TextCell(text);
            cell.getStyleClass().add("figure-cell");
            return cell;
        });
    }

    private static void share(TableView<BudgetRow> table, String title, Function<BudgetRow, BudgetRow.Share> share,
            String meaning) {
        Comparator<BudgetRow> order = Comparator.comparingDouble(row -> share.apply(row).value());
        TableColumn<BudgetRow, BudgetRow> column = column(table, title, 106, order, meaning);
        column.setCellFactory(_ -> new ShareCell(title, share));
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

    private static final class LimitsCell extends TableCell<BudgetRow, BudgetRow> {
        private final ContributionBar bar = new ContributionBar();

        @Override
        protected void updateItem(@Nullable BudgetRow row, boolean empty) {
            super.updateItem(row, empty);
            if (empty || row == null) {
                setGraphic(null);
                setAccessibleText(null);
            } else {
                bar.show(row.limits().lowBar(), row.limits().highBar());
                setGraphic(bar);
                setAccessibleText("moves the limits by " + row.limits().low() + " and " + row.limits().high());
            }
        }
    }

    private static final class ShareCell extends TableCell<BudgetRow, BudgetRow> {
        private final String title;
        private final Function<BudgetRow, BudgetRow.Share> share;
        private final ShareBar bar = new ShareBar();
        private final Tooltip tip = new Tooltip();

        ShareCell(String title, Function<BudgetRow, BudgetRow.Share> share) {
            this.title = title;
            this.share = share;
        }

        @Override
        protected void updateItem(@Nullable BudgetRow row, boolean empty) {
            super.updateItem(row, empty);
            if (empty || row == null) {
                setGraphic(null);
                setTooltip(null);
                setAccessibleText(null);
                return;
            }
            BudgetRow.Share shown = share.apply(row);
            bar.show(shown);
            setGraphic(bar);
            String words = title + " " + (shown.equals(BudgetRow.Share.OPEN) ? "not sampled yet" : shown.text())
                    + (shown.note().isEmpty() ? "" : " " + shown.note());
            tip.setText(words);
            setTooltip(tip);
            setAccessibleText(words);
        }
    }
}
