package shuntwright.planner.window.parts;

import java.util.List;
import java.util.Locale;

import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;

/** The parts of the latest plan, with what to order for the build. */
public final class PartsModel {
    private final ObservableList<PartUse> parts = FXCollections.observableArrayList();
    private final ReadOnlyStringWrapper total = new ReadOnlyStringWrapper("");
    private int boards = 1;

    public PartsModel(BoardSession session) {
        session.plannedProperty().subscribe(planned -> planned.map(Planned::plan).ifPresentOrElse(this::show, () -> {
            parts.clear();
            total.set("");
        }));
    }

    private void show(Plan plan) {
        boards = plan.board().buildQuantity();
        parts.setAll(plan.parts());
        int pieces = plan.parts().stream().mapToInt(PartUse::quantity).sum();
        double build = plan.parts().stream().mapToDouble(this::orderCost).sum();
        List<PartUse> unpriced = plan.parts().stream().filter(use -> use.purchase().prices().isEmpty()).toList();
        total.set(plan.parts().size() + " part numbers, " + pieces + " pieces on a board. "
                + String.format(Locale.ROOT, "Parts of a board %.2f %s; order for %d %s %.2f %s",
                        plan.costPerBoard(), plan.currency(), boards, boards == 1 ? "board" : "boards", build,
                        plan.currency())
                + " (whole packs, without attrition)"
                + (unpriced.isEmpty() ? "." : ", " + unpriced.size() + " without a price."));
    }

    ObservableList<PartUse> parts() {
        return parts;
    }

    /** Totals in words. */
    ReadOnlyStringProperty totalProperty() {
        return total.getReadOnlyProperty();
    }

    int toOrder(PartUse use) {
        return use.purchase().orderQuantity(use.quantity() * boards);
    }

    double unitPrice(PartUse use) {
        return use.purchase().unitPriceAt(toOrder(use));
    }

    double orderCost(PartUse use) {
        return toOrder(use) * unitPrice(use);
    }
}
