package shuntwright.planner.window.budget;

import java.util.List;
import java.util.Optional;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.Outcome;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.session.BoardSession;
import shuntwright.sampling.ChannelStudy;

/** One outcome of the selected channel by limits, combined uncertainty and propagated distribution. */
public final class BudgetModel {
    private final BoardSession session;
    private final ObservableList<BudgetRow> rows = FXCollections.observableArrayList();
    private final ObservableList<Outcome> outcomes = FXCollections.observableArrayList();
    private final ObservableList<Fact> facts = FXCollections.observableArrayList();
    private final ObjectProperty<Outcome> outcome = new SimpleObjectProperty<>(Outcome.TRIP);
    private final BooleanProperty beforeCalibration = new SimpleBooleanProperty();
    private final ReadOnlyBooleanWrapper calibrated = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper summary = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Optional<HistogramDrawing>> drawing = new ReadOnlyObjectWrapper<>(
            Optional.empty());

    public BudgetModel(BoardSession session) {
        this.session = session;
        session.plannedProperty().subscribe(this::refresh);
        session.selectionProperty().subscribe(this::refresh);
        session.sampling().stateProperty().subscribe(this::refresh);
        outcome.subscribe(this::refresh);
        beforeCalibration.subscribe(this::refresh);
        refresh();
    }

    ObservableList<BudgetRow> rows() {
        return rows;
    }

    /** Outcomes the selected channel has. */
    ObservableList<Outcome> outcomes() {
        return outcomes;
    }

    /** What the three ways say of the outcome as a whole. */
    ObservableList<Fact> facts() {
        return facts;
    }

    ObjectProperty<Outcome> outcomeProperty() {
        return outcome;
    }

    /** Whether a calibrated reading is shown as it would be without calibration. */
    BooleanProperty beforeCalibrationProperty() {
        return beforeCalibration;
    }

    /** True when the outcome is a calibrated reading. */
    ReadOnlyBooleanProperty calibratedProperty() {
        return calibrated.getReadOnlyProperty();
    }

    /** Whose outcome it is, or why there is none, in words. */
    ReadOnlyStringProperty summaryProperty() {
        return summary.getReadOnlyProperty();
    }

    /** The picture; empty without an outcome. */
    ReadOnlyObjectProperty<Optional<HistogramDrawing>> drawingProperty() {
        return drawing.getReadOnlyProperty();
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
        if (plan.isEmpty() || solved.isEmpty()) {
            calibrated.set(false);
            drawing.set(Optional.empty());
            rows.clear();
            facts.clear();
            summary.set(plan.isPresent()
                    ? "No error budget, since nothing could be chosen for this channel; see the findings."
                    : "Select a planned channel to see what its tolerances come from.");
            return;
        }
        show(plan.get(), solved.get());
    }

    private void show(ChannelPlan plan, SolvedChannel solved) {
        Assessment after = solved.assessment(outcome.get()).orElseGet(solved::trip);
        Optional<Assessment> before = solved.uncalibrated().stream()
                .filter(each -> each.outcome() == after.outcome()).findFirst();
        calibrated.set(before.isPresent());
        boolean bare = before.isPresent() && beforeCalibration.get();
        Assessment shown = bare ? before.get() : after;
        Optional<ChannelStudy> study = bare ? Optional.empty() : study(plan.channel().name());
        String unsampled = bare ? "not sampled: trials are of the calibrated reading" : unsampled();
        List<BudgetRow> lines = BudgetRows.of(shown, study.flatMap(each -> each.outcome(shown.outcome())),
                solved.demand().tripTarget());
        if (!lines.equals(rows)) {
            rows.setAll(lines);
        }
        List<Fact> said = new java.util.ArrayList<>(Facts.of(shown, study, unsampled));
        if (!bare) {
            before.ifPresent(each -> said.add(Facts.before(each)));
        }
        if (!said.equals(facts)) {
            facts.setAll(said);
        }
        String title = plan.channel().name() + ", " + shown.outcome().words()
                + (bare ? " without calibration" : before.isPresent() ? " with calibration" : "");
        drawing.set(Optional.of(HistogramDrawing.of(title, shown,
                study.flatMap(each -> each.outcome(shown.outcome())), unsampled)));
        summary.set(title);
    }

    private Optional<ChannelStudy> study(String channel) {
        return session.plannedProperty().get().flatMap(each -> each.plan().study())
                .flatMap(each -> each.channel(channel));
    }

    private String unsampled() {
        return switch (session.sampling().stateProperty().get()) {
            case RUNNING -> "sampling …";
            case STOPPED -> "not sampled: stopped before the first picture";
            case FAILED -> "not sampled: an error within the program, see the status bar";
            case IDLE, DONE -> "not sampled";
        };
    }
}
