package shuntwright.planner.window.budget;

import java.util.List;
import java.util.Optional;

import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Outcome;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.session.BoardSession;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** The sorted contributions to one outcome of the selected channel. */
public final class BudgetModel {
    private final BoardSession session;
    private final ObservableList<BudgetRow> rows = FXCollections.observableArrayList();
    private final ObservableList<Outcome> outcomes = FXCollections.observableArrayList();
    private final ObjectProperty<Outcome> outcome = new SimpleObjectProperty<>(Outcome.TRIP);
    private final ReadOnlyStringWrapper summary = new ReadOnlyStringWrapper("");

    public BudgetModel(BoardSession session) {
        this.session = session;
        session.plannedProperty().subscribe(this::refresh);
        session.selectionProperty().subscribe(this::refresh);
        outcome.subscribe(this::refresh);
        refresh();
    }

    ObservableList<BudgetRow> rows() {
        return rows;
    }

    /** Outcomes the selected channel has. */
    ObservableList<Outcome> outcomes() {
        return outcomes;
    }

    ObjectProperty<Outcome> outcomeProperty() {
        return outcome;
    }

    /** The outcome as a whole, in words. */
    ReadOnlyStringProperty summaryProperty() {
        return summary.getReadOnlyProperty();
    }

    private void refresh() {
        List<Integer> selected = session.selectionProperty().get();
        Optional<ChannelPlan> plan = selected.isEmpty()
                ? Optional.empty()
                : session.plannedProperty().get().flatMap(each -> each.channel(selected.getLast()));
        Optional<SolvedChannel> solved = plan.flatMap(ChannelPlan::solved);
        List<Outcome> there = solved.map(each -> each.assessments().stream().map(Assessment::outcome).toList())
                .orElse(List.of());
        if (!there.equals(outcomes)) {
            outcomes.setAll(there);
        }
        Optional<Assessment> chosen = solved
                .flatMap(each -> each.assessment(outcome.get()).or(() -> Optional.of(each.trip())));
        if (chosen.isEmpty() || solved.isEmpty()) {
            rows.clear();
            summary.set(plan.isPresent()
                    ? "No error budget, since nothing could be chosen for this channel; see the findings."
                    : "Select a planned channel to see what its tolerances come from.");
            return;
        }
        Assessment assessment = chosen.get();
        double target = solved.get().demand().tripTarget();
        double longest = assessment.budget().stream().mapToDouble(BudgetLine::widest).max().orElse(1);
        rows.setAll(assessment.budget().stream().map(line -> row(line, target, longest > 0 ? longest : 1)).toList());
        summary.set(plan.get().channel().name() + ", " + assessment.outcome().words() + ": nominal "
                + show(assessment.nominal()) + ", limits " + show(assessment.limits().min()) + " to "
                + show(assessment.limits().max()) + ", combined ±" + show(assessment.combined().expanded()) + " (k = "
                + String.format(java.util.Locale.ROOT, "%.2f", assessment.combined().coverageFactor()) + "), allowed "
                + show(assessment.allowed().min()) + " to " + show(assessment.allowed().max()) + ".");
    }

    private static BudgetRow row(BudgetLine line, double target, double longest) {
        return new BudgetRow(line.input().label(), signed(line.towardsLow()), signed(line.towardsHigh()),
                percent(line.towardsLow() / target), percent(line.towardsHigh() / target),
                String.format(java.util.Locale.ROOT, "%.1f %%", line.varianceShare() * 100),
                line.towardsLow() / longest, line.towardsHigh() / longest, line.varianceShare(), line.widest());
    }

    private static String show(double current) {
        return QuantityWriter.show(current, Dimension.CURRENT);
    }

    private static String signed(double current) {
        String size = QuantityWriter.show(Math.abs(current), Dimension.CURRENT, 3);
        return current == 0 ? size : current < 0 ? "−" + size : "+" + size;
    }

    private static String percent(double share) {
        double value = Math.abs(share * 100);
        String size = String.format(java.util.Locale.ROOT, value < 0.01 ? "%.4f %%" : "%.2f %%", value);
        return value == 0 ? "0 %" : share < 0 ? "−" + size : "+" + size;
    }
}
