package shuntwright.planner.window.front;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Front;
import shuntwright.plan.Plan;
import shuntwright.planner.session.Asked;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.BoardState;
import shuntwright.planner.session.Planned;
import shuntwright.planner.window.chart.Plot;
import shuntwright.planner.window.explore.Sum;
import shuntwright.planner.window.explore.Sums;
import shuntwright.planner.window.figures.Aims;
import shuntwright.planner.window.figures.Took;
import shuntwright.planner.work.Exploring;

/** The front of two objectives, and the point chosen of it. */
public final class FrontModel {
    /** Most plans of a front. */
    private static final int POINTS = 15;

    private final BoardSession session;
    private final Exploring exploring;
    private final int points;
    private final Asked<Front> asked;
    private final ObjectProperty<Objective> first = new SimpleObjectProperty<>(Objective.LEAST_HEAT);
    private final ObjectProperty<Objective> second = new SimpleObjectProperty<>(Objective.LEAST_COST);
    private final ReadOnlyObjectWrapper<OptionalInt> chosen = new ReadOnlyObjectWrapper<>(OptionalInt.empty());
    private final ReadOnlyObjectWrapper<Plot> plot = new ReadOnlyObjectWrapper<>(FrontPlot.none(
            Objective.LEAST_HEAT, Objective.LEAST_COST, ""));
    private final ReadOnlyObjectWrapper<List<Sum>> sums = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyStringWrapper said = new ReadOnlyStringWrapper("");
    private final BooleanBinding possible;
    private final BooleanBinding takeable;

    public FrontModel(BoardSession session, Exploring exploring) {
        this(session, exploring, POINTS);
    }

    /** @param points most plans of a front */
    FrontModel(BoardSession session, Exploring exploring, int points) {
        this.points = points;
        this.session = session;
        this.exploring = exploring;
        asked = new Asked<>(session, exploring.inquiry());
        possible = Bindings.createBooleanBinding(
                () -> first.get() != second.get() && !session.state().board().channels().isEmpty(), first, second,
                session.stateProperty());
        takeable = Bindings.createBooleanBinding(() -> chosen.get().isPresent() && !asked.staleProperty().get(), chosen,
                asked.staleProperty());
        asked.answerProperty().subscribe(this::choosePresent);
        asked.staleProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        chosen.subscribe(this::refresh);
        first.subscribe(this::refresh);
        second.subscribe(this::refresh);
        refresh();
    }

    Asked<Front> asked() {
        return asked;
    }

    ObjectProperty<Objective> firstProperty() {
        return first;
    }

    ObjectProperty<Objective> secondProperty() {
        return second;
    }

    /** True when there are channels and two different objectives. */
    BooleanBinding possibleBinding() {
        return possible;
    }

    /** True when the chosen point's plan can become the board's. */
    BooleanBinding takeableBinding() {
        return takeable;
    }

    ReadOnlyObjectProperty<Plot> plotProperty() {
        return plot.getReadOnlyProperty();
    }

    /** Sums of the chosen point; empty when none is chosen. */
    ReadOnlyObjectProperty<List<Sum>> sumsProperty() {
        return sums.getReadOnlyProperty();
    }

    /** What is to be said of the front, in words. */
    ReadOnlyStringProperty saidProperty() {
        return said.getReadOnlyProperty();
    }

    void ask() {
        Objective along = first.get();
        Objective other = second.get();
        asked.ask("looking for the front of " + Aims.title(along) + " and " + Aims.title(other),
                (board, catalogue) -> progress -> ascending(exploring.explorer().front(board, catalogue, along, other,
                        points, progress)));
    }

    /** From left to right, so that keys go that way too. */
    private static Front ascending(Front front) {
        return new Front(front.first(), front.second(), front.points().stream()
                .sorted(Comparator.comparingDouble(Front.Point::first)).toList());
    }

    /** Chooses a point. */
    void choose(int point) {
        asked.answerProperty().get().filter(front -> point >= 0 && point < front.points().size())
                .ifPresent(_ -> chosen.set(OptionalInt.of(point)));
    }

    private void choosePresent() {
        chosen.set(OptionalInt.empty());
        refresh();
    }

    private Optional<Front.Point> point() {
        return asked.answerProperty().get()
                .flatMap(front -> chosen.get().isPresent() && chosen.get().getAsInt() < front.points().size()
                        ? Optional.of(front.points().get(chosen.get().getAsInt()))
                        : Optional.empty());
    }

    private Optional<Plan> now() {
        return session.plannedProperty().get().map(Planned::plan);
    }

    private void refresh() {
        Optional<Front> front = asked.answerProperty().get();
        plot.set(front.map(each -> FrontPlot.of(each, chosen.get(), now())).orElseGet(() -> FrontPlot.none(first.get(),
                second.get(), first.get() == second.get()
                        ? "Choose two different objectives."
                        : "Not computed yet: each point will be a whole plan that can be looked at and taken.")));
        sums.set(point().map(each -> Sums.of(each.plan(), now())).orElse(List.of()));
        said.set(front.map(this::words).orElse(""));
    }

    private String words(Front front) {
        if (front.points().isEmpty()) {
            return "No plan meets every limit, so there is no front.";
        }
        int count = front.points().size();
        return count + (count == 1 ? " plan" : " plans") + ", found in " + Took.words(asked.took())
                + (asked.staleProperty().get() ? " – as of before the last edit; compute it again to take one" : "");
    }

    /** Pins the chosen point's plan, so that the board has it. */
    void take() {
        point().filter(_ -> takeable.get()).ifPresent(point -> {
            asked.answerProperty().get().ifPresent(front -> asked.editWithin("take the plan of "
                    + Aims.show(front.first(), point.first(), point.plan().currency()) + " and "
                    + Aims.show(front.second(), point.second(), point.plan().currency()),
                    state -> pinned(state, point.plan())));
        });
    }

    /** Only what is chosen comes from the plan: its board may have been asked for with other limits or another order. */
    private static BoardState pinned(BoardState state, Plan plan) {
        Board with = BoardPlanner.pinned(plan);
        return state.withBoard(state.board().withAlertLines(with.alertLines()).withTaps(with.taps())
                .withChannels(with.channels()));
    }
}
