package shuntwright.planner.window.whatif;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.board.Board;
import shuntwright.plan.WhatIf;
import shuntwright.planner.session.Asked;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;
import shuntwright.planner.window.chart.Plot;
import shuntwright.planner.window.figures.Took;
import shuntwright.planner.work.Exploring;
import shuntwright.quantity.Reading;

/** One limit varied over a range, and the curves that come of it. */
public final class WhatIfModel {
    /** Values most tried at once. */
    static final int MOST_VALUES = 60;
    private static final double LEAST_SHARE = 0.6;
    private static final double MOST_SHARE = 1.6;

    private final BoardSession session;
    private final Exploring exploring;
    private final Asked<Varied> asked;
    private final ObservableList<Lever> levers = FXCollections.observableArrayList();
    private final ObjectProperty<Lever> lever = new SimpleObjectProperty<>(
            new Lever(WhatIf.Varied.BOARD_HEAT_LIMIT, ""));
    private final StringProperty from = new SimpleStringProperty("");
    private final StringProperty to = new SimpleStringProperty("");
    private final StringProperty count = new SimpleStringProperty("9");
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<List<Plot>> plots = new ReadOnlyObjectWrapper<>(List.of());
    private final ReadOnlyStringWrapper said = new ReadOnlyStringWrapper("");
    private final BooleanBinding possible;
    private boolean suggested;

    /** An answer with what was varied. */
    record Varied(Lever lever, OptionalDouble now, WhatIf answer) {}

    /** A range that was typed rightly. */
    private record Wish(double from, double to, int count) {}

    public WhatIfModel(BoardSession session, Exploring exploring) {
        this.session = session;
        this.exploring = exploring;
        asked = new Asked<>(session, exploring.inquiry());
        possible = Bindings.createBooleanBinding(
                () -> problem.get().isEmpty() && !session.state().board().channels().isEmpty(), problem,
                session.stateProperty());
        session.stateProperty().subscribe(this::follow);
        session.plannedProperty().subscribe(this::follow);
        session.startsProperty().subscribe(() -> {
            suggested = false;
            follow();
        });
        lever.subscribe(() -> {
            suggested = false;
            follow();
        });
        from.subscribe(this::check);
        to.subscribe(this::check);
        count.subscribe(this::check);
        asked.answerProperty().subscribe(this::refresh);
        asked.staleProperty().subscribe(this::refresh);
        follow();
    }

    Asked<?> asked() {
        return asked;
    }

    /** What can be varied on the board. */
    ObservableList<Lever> levers() {
        return levers;
    }

    ObjectProperty<Lever> leverProperty() {
        return lever;
    }

    StringProperty fromProperty() {
        return from;
    }

    StringProperty toProperty() {
        return to;
    }

    StringProperty countProperty() {
        return count;
    }

    /** What is wrong with the range typed; empty when all is well. */
    ReadOnlyStringProperty problemProperty() {
        return problem.getReadOnlyProperty();
    }

    BooleanBinding possibleBinding() {
        return possible;
    }

    /** Cost, heat and parts. */
    ReadOnlyObjectProperty<List<Plot>> plotsProperty() {
        return plots.getReadOnlyProperty();
    }

    ReadOnlyStringProperty saidProperty() {
        return said.getReadOnlyProperty();
    }

    private void follow() {
        Board board = session.state().board();
        List<Lever> there = Lever.of(board);
        if (!there.equals(levers)) {
            Lever before = lever.get();
            levers.setAll(there);
            lever.set(there.contains(before) ? before : there.getFirst());
        }
        if (!suggested) {
            suggest(board);
        }
        refresh();
    }

    /** A range around the limit, or around what is used where there is no limit; what was typed stays. */
    private void suggest(Board board) {
        OptionalDouble middle = lever.get().now(board);
        Optional<Planned> planned = session.plannedProperty().get();
        if (middle.isEmpty() && planned.isPresent()) {
            middle = lever.get().used(planned.get().plan());
        }
        if (middle.isPresent() && middle.getAsDouble() > 0) {
            double about = middle.getAsDouble();
            boolean boards = lever.get().counts();
            from.set(lever.get().show(boards ? Math.max(1, Math.rint(about / 10)) : about * LEAST_SHARE));
            to.set(lever.get().show(boards ? Math.min(Lever.MOST_BOARDS, about * 10) : about * MOST_SHARE));
            suggested = true;
        }
    }

    private void check() {
        problem.set(wish().ifProblem().orElse(""));
    }

    private Reading<Wish> wish() {
        return lever.get().read(from.get()).then(low -> lever.get().read(to.get()).then(high -> {
            if (!(low < high)) {
                return Reading.misread("The range must go up: type a larger value behind \"to\" than "
                        + lever.get().show(low) + ".");
            }
            return values().then(many -> Reading.value(new Wish(low, high, many)));
        }));
    }

    private Reading<Integer> values() {
        try {
            int many = Integer.parseInt(count.get().strip());
            if (many >= 2 && many <= MOST_VALUES) {
                return Reading.value(many);
            }
        } catch (NumberFormatException _) {
            // told below with the allowed range
        }
        return Reading.misread("Type a number of values from 2 to " + MOST_VALUES + ", got \"" + count.get().strip()
                + "\".");
    }

    void ask() {
        wish().ifValue().ifPresent(wish -> {
            Lever which = lever.get();
            List<Double> values = which.values(wish.from(), wish.to(), wish.count());
            OptionalDouble now = which.now(session.state().board());
            asked.ask("trying " + values.size() + " values of: " + which.words(),
                    (board, catalogue) -> progress -> new Varied(which, now, exploring.explorer().whatIf(board,
                            catalogue, which.varied(), which.zone(), values, progress)));
        });
    }

    private void refresh() {
        check();
        Optional<Varied> answer = asked.answerProperty().get().filter(each -> each.lever().equals(lever.get()));
        String currency = session.currency();
        plots.set(answer.map(each -> WhatIfPlots.of(each.answer(), each.lever(), each.now(), currency))
                .orElseGet(() -> WhatIfPlots.none(lever.get(), "Not computed yet.")));
        said.set(answer.map(this::words).orElse(""));
    }

    private String words(Varied varied) {
        List<WhatIf.Point> points = varied.answer().points();
        long met = points.stream().filter(each -> each.reached().isPresent()).count();
        return (met == points.size()
                ? points.size() + " values, all can be met"
                : met == 0
                        ? "At none of the " + points.size() + " values everything can be met"
                        : points.size() + " values, " + met + " can be met, the first at "
                                + points.stream().filter(each -> each.reached().isPresent()).findFirst()
                                        .map(each -> varied.lever().show(each.value())).orElse(""))
                + ", found in " + Took.words(asked.took())
                + (asked.staleProperty().get() ? " – as of before the last edit" : "");
    }
}
