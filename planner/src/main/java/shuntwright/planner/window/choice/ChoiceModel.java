package shuntwright.planner.window.choice;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

import shuntwright.board.Channel;
import shuntwright.board.Objective;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.Conflict;
import shuntwright.plan.Plan;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;

/** The board-wide choice of the latest plan, or the best so far while a plan is made; and what is wanted of it. */
public final class ChoiceModel {
    private final BoardSession session;
    private final ReadOnlyObjectWrapper<Shown> shown = new ReadOnlyObjectWrapper<>(Shown.NOTHING);
    private final ReadOnlyObjectWrapper<List<Objective>> order = new ReadOnlyObjectWrapper<>(List.of());

    public ChoiceModel(BoardSession session) {
        this.session = session;
        session.stateProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        session.planning().bestProperty().subscribe(this::refresh);
        session.planning().runningProperty().subscribe(this::refresh);
        refresh();
    }

    ReadOnlyObjectProperty<Shown> shownProperty() {
        return shown.getReadOnlyProperty();
    }

    /** What is wanted, the first decides. */
    ReadOnlyObjectProperty<List<Objective>> orderProperty() {
        return order.getReadOnlyProperty();
    }

    BoardSession session() {
        return session;
    }

    /** Objectives that are not in the order. */
    List<Objective> others() {
        return Arrays.stream(Objective.values()).filter(each -> !order.get().contains(each)).toList();
    }

    private void refresh() {
        if (!order.get().equals(session.state().board().preference().order())) {
            order.set(session.state().board().preference().order());
        }
        Shown now = session.planning().bestProperty().get().map(this::working).orElseGet(this::settled);
        if (!now.equals(shown.get())) {
            shown.set(now);
        }
    }

    private Shown working(BoardChoice best) {
        return new Shown("Best so far, still looking for a better choice", true,
                ShownWords.aims(best, session.currency()),
                ShownWords.facts(best, Duration.ZERO), best.broken(), Optional.empty());
    }

    private Shown settled() {
        Optional<Planned> planned = session.plannedProperty().get();
        if (planned.isEmpty()) {
            return nothing(session.planning().runningProperty().get()
                    ? "The choice for the board is looked for …"
                    : "Nothing is chosen yet.");
        }
        Plan plan = planned.get().plan();
        boolean current = planned.get().isOf(session.state());
        return plan.choice().map(choice -> new Shown(title(choice) + (current ? "" : " – as of before the last edit"),
                false, ShownWords.aims(choice, plan.currency()), ShownWords.facts(choice, planned.get().took()),
                choice.broken(),
                choice.conflict().map(each -> ShownWords.clash(each, session.state().board(), current))))
                .orElse(nothing("Nothing was chosen for the board: it has no channel that could be planned."));
    }

    private static Shown nothing(String why) {
        return new Shown(why, false, List.of(), List.of(), List.of(), Optional.empty());
    }

    private static String title(BoardChoice choice) {
        if (choice.conflict().isPresent() || !choice.broken().isEmpty()) {
            return "Not everything can be met; the choice that breaks least";
        }
        if (choice.reached().stream().allMatch(each -> each.gap().orElse(1) == 0)) {
            return "The best choice for the board, proven";
        }
        return choice.cutShort() ? "The best choice found until it was ended" : "The best choice found";
    }

    /** Puts an objective one place earlier or later. */
    void move(Objective objective, int by) {
        List<Objective> moved = new ArrayList<>(order.get());
        int from = moved.indexOf(objective);
        int to = Math.clamp(from + by, 0, moved.size() - 1);
        if (from >= 0 && from != to) {
            moved.remove(from);
            moved.add(to, objective);
            edit("put " + objective.word() + (by < 0 ? " before " : " behind ")
                    + order.get().get(to).word(), moved);
        }
    }

    /** Wants an objective too, after all others. */
    void add(Objective objective) {
        List<Objective> more = new ArrayList<>(order.get());
        if (!more.contains(objective)) {
            more.add(objective);
            edit("want " + objective.word() + " too", more);
        }
    }

    /** Wants an objective no more, unless it is the only one. */
    void remove(Objective objective) {
        List<Objective> left = new ArrayList<>(order.get());
        if (left.size() > 1 && left.remove(objective)) {
            edit("do not want " + objective.word(), left);
        }
    }

    private void edit(String name, List<Objective> wanted) {
        session.edit(name, state -> state.withBoard(
                state.board().withPreference(state.board().preference().withOrder(wanted))));
    }

    /** Ends the search with the best so far. */
    void keepBest() {
        session.planning().stop();
    }

    /** Relaxes a limit as far as the conflict says is needed. */
    void apply(Shown.Part part) {
        if (part.applies()) {
            Relaxing.change(part.member(), session.state().board()).ifPresent(change -> session.edit(
                    part.demand() + " " + part.change(), state -> state.withBoard(change.apply(state.board()))));
        }
    }

    /** Selects the channel of a demand, so that its findings show. */
    void select(Conflict.Member member) {
        List<Channel> channels = session.state().board().channels();
        for (int at = 0; at < channels.size(); at++) {
            if (channels.get(at).name().equals(member.name())) {
                session.selectionProperty().set(List.of(session.state().rows().get(at)));
            }
        }
    }
}
