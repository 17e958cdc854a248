package shuntwright.planner.window.others;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.board.Channel;
import shuntwright.circuit.SenseCircuit;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.session.Asked;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;
import shuntwright.planner.window.circuit.CircuitWords;
import shuntwright.planner.window.explore.Sums;
import shuntwright.planner.window.figures.Aims;
import shuntwright.planner.window.figures.Took;
import shuntwright.planner.work.Exploring;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** The next-best circuits of the selected channel. */
public final class OthersModel {
    /** Circuits looked for. */
    static final int MOST = 8;

    private final BoardSession session;
    private final Exploring exploring;
    private final Asked<Found> asked;
    private final ObservableList<OtherRow> rows = FXCollections.observableArrayList();
    private final ReadOnlyStringWrapper said = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper empty = new ReadOnlyStringWrapper("");
    private final BooleanBinding possible;

    /** What was found for a channel. */
    record Found(String channel, List<OtherChoice> choices) {
        Found {
            choices = List.copyOf(choices);
        }
    }

    public OthersModel(BoardSession session, Exploring exploring) {
        this.session = session;
        this.exploring = exploring;
        asked = new Asked<>(session, exploring.inquiry());
        possible = Bindings.createBooleanBinding(() -> solved().isPresent(), session.selectionProperty(),
                session.plannedProperty(), session.stateProperty());
        asked.answerProperty().subscribe(this::refresh);
        asked.staleProperty().subscribe(this::refresh);
        session.selectionProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        refresh();
    }

    Asked<?> asked() {
        return asked;
    }

    ObservableList<OtherRow> rows() {
        return rows;
    }

    /** What is to be said of the choices on show, in words. */
    ReadOnlyStringProperty saidProperty() {
        return said.getReadOnlyProperty();
    }

    /** Why there are none, in words. */
    ReadOnlyStringProperty emptyProperty() {
        return empty.getReadOnlyProperty();
    }

    /** True when the selected channel has a circuit. */
    BooleanBinding possibleBinding() {
        return possible;
    }

    private Optional<Integer> row() {
        List<Integer> selected = session.selectionProperty().get();
        return selected.isEmpty() ? Optional.empty() : Optional.of(selected.getLast());
    }

    private Optional<Channel> channel() {
        return row().flatMap(session.state()::channel);
    }

    private Optional<SolvedChannel> solved() {
        return row().flatMap(id -> session.plannedProperty().get().flatMap(each -> each.channel(id)))
                .flatMap(ChannelPlan::solved);
    }

    /** Looks for other circuits of the selected channel. */
    void ask() {
        channel().map(Channel::name).ifPresent(name -> asked.ask("looking for other choices for " + name,
                (board, catalogue) -> progress -> new Found(name,
                        exploring.explorer().others(board, catalogue, name, MOST, progress))));
    }

    private void refresh() {
        Optional<String> name = channel().map(Channel::name);
        Optional<Found> found = asked.answerProperty().get().filter(each -> name.equals(Optional.of(each.channel())));
        empty.set(name.isEmpty()
                ? "Select a channel to look for other choices."
                : solved().isEmpty()
                        ? "Nothing could be chosen for " + name.get() + "; see its findings."
                        : "Not looked for yet: each other choice is counted with the whole board chosen again around it.");
        if (found.isEmpty() || solved().isEmpty()) {
            rows.clear();
            said.set("");
            return;
        }
        List<OtherRow> all = new ArrayList<>();
        Optional<Plan> plan = session.plannedProperty().get().map(Planned::plan);
        plan.ifPresent(each -> all.add(now(solved().orElseThrow(), each)));
        int number = 1;
        for (OtherChoice each : found.get().choices()) {
            all.add(row(each, number++, plan));
        }
        rows.setAll(all);
        int count = found.get().choices().size();
        said.set((count == 0
                ? "There is no other choice for " + found.get().channel()
                : count + (count == 1 ? " other choice for " : " other choices for ") + found.get().channel())
                + ", found in " + Took.words(asked.took())
                + (asked.staleProperty().get() ? " – as of before the last edit; look again to pin one" : ""));
    }

    private OtherRow now(SolvedChannel solved, Plan plan) {
        return new OtherRow(Optional.empty(), "now", shunt(solved.circuit()), amplifier(solved.circuit()),
                CircuitWords.threshold(solved.circuit()),
                row().flatMap(id -> session.plannedProperty().get().flatMap(each -> each.channel(id)))
                        .map(ChannelPlan::verdict),
                margin(solved), amount(Aims.money(plan.buildCost(), plan.currency()), "", plan.buildCost()),
                amount(Aims.watts(Sums.heat(plan)), "", Sums.heat(plan)),
                amount(Integer.toString(plan.parts().size()), "", plan.parts().size()),
                plan.choice().map(each -> String.join(", ", each.broken())).orElse(""));
    }

    private OtherRow row(OtherChoice choice, int number, Optional<Plan> now) {
        String currency = session.currency();
        return new OtherRow(Optional.of(choice), Integer.toString(number), shunt(choice.circuit()),
                amplifier(choice.circuit()), CircuitWords.threshold(choice.circuit()),
                Optional.of(choice.channel().verdict()), choice.channel().solved().map(OthersModel::margin).orElse("–"),
                amount(Aims.money(choice.cost(), currency),
                        now.map(each -> Sums.costDifference(choice.cost(), each.buildCost(), currency)).orElse(""),
                        choice.cost()),
                amount(Aims.watts(choice.heat()),
                        now.map(each -> Sums.heatDifference(choice.heat(), Sums.heat(each))).orElse(""),
                        choice.heat()),
                amount(Integer.toString(choice.parts()),
                        now.map(each -> Sums.countDifference(choice.parts(), each.parts().size())).orElse(""),
                        choice.parts()),
                String.join(", ", choice.broken()));
    }

    private static OtherRow.Amount amount(String value, String difference, double key) {
        return new OtherRow.Amount(value, difference, key);
    }

    private static String margin(SolvedChannel solved) {
        return String.format(Locale.ROOT, "%.1f %%", solved.margin() * 100).replace('-', '−');
    }

    private static String shunt(SenseCircuit circuit) {
        return CircuitWords.shunt(circuit) + " " + circuit.shunt().partNumber();
    }

    private static String amplifier(SenseCircuit circuit) {
        return QuantityWriter.show(circuit.amplifier().gain(), Dimension.GAIN) + " "
                + circuit.amplifier().partNumber();
    }

    /** True when the row can be pinned: it is another choice, and of the board as it stands. */
    boolean pinnable(OtherRow row) {
        return row.choice().isPresent() && !asked.staleProperty().get();
    }

    /** Pins the row's circuit on the selected channel; the board is then chosen again around it. */
    void pin(OtherRow row) {
        if (pinnable(row)) {
            row.choice().ifPresent(choice -> row().ifPresent(id -> channel().ifPresent(channel -> session.edit(
                    "pin " + row.shunt() + " and " + choice.circuit().amplifier().partNumber() + " (" + channel.name()
                            + ")",
                    state -> state.withChannel(id, BoardPlanner.pinned(channel, choice.circuit()))))));
        }
    }
}
