package shuntwright.planner.window.parts;

import java.util.Comparator;
import java.util.Locale;
import java.util.function.Function;

import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.scene.control.Label;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;

import shuntwright.plan.PartUse;

/** The consolidated parts list with its totals. */
public final class PartsPanel {
    private final BorderPane pane = new BorderPane();
    private final TableView<PartUse> table = new TableView<>();

    public PartsPanel(PartsModel model) {
        table.setId("parts-list");
        table.getStyleClass().add("plain-table");
        table.setPlaceholder(new Label("No parts yet."));
        column("Part number", 160, false, PartUse::partNumber);
        column("Description", 300, false, PartUse::description);
        column("Pieces", 64, true, use -> Integer.toString(use.quantity()));
        column("Designators", 220, false, use -> String.join(", ", use.designators()));
        column("For", 220, false, use -> String.join(", ", use.users().stream().distinct().toList()));
        column("To order", 80, true, use -> Integer.toString(model.toOrder(use)));
        column("Each", 90, true, use -> use.purchase().prices().isEmpty() ? "no price" : money(model.unitPrice(use)));
        column("Build", 100, true, use -> use.purchase().prices().isEmpty() ? "–" : money(model.orderCost(use)));
        table.setItems(model.parts());
        Label total = new Label();
        total.textProperty().bind(model.totalProperty());
        total.getStyleClass().add("panel-head");
        pane.setTop(total);
        pane.setCenter(table);
    }

    private static String money(double amount) {
        return String.format(Locale.ROOT, amount < 0.1 ? "%.4f" : "%.2f", amount);
    }

    /** The control for the window. */
    public Region node() {
        return pane;
    }

    private void column(String title, double width, boolean number, Function<PartUse, String> text) {
        TableColumn<PartUse, String> column = new TableColumn<>(title);
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new ReadOnlyStringWrapper(text.apply(row.getValue())));
        if (number) {
            column.getStyleClass().add("number-column");
            column.setComparator(Comparator.comparingDouble(PartsPanel::key));
        }
        table.getColumns().add(column);
    }

    private static double key(String text) {
        return text.isEmpty() || !Character.isDigit(text.charAt(0)) ? -1 : Double.parseDouble(text);
    }
}
