package shuntwright.planner.window.findings;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

import shuntwright.board.Channel;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.Finding;
import shuntwright.plan.Verdict;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.session.Planned;
import shuntwright.planner.window.circuit.CircuitWords;

/** Findings of the selected channel and of the board, and the cures that can be applied. */
public final class FindingsModel {
    /**
     * What the panel shows.
     *
     * @param title    name of the channel; empty when none is selected
     * @param verdict  of the channel
     * @param stale    true when they belong to an earlier state of the channel; cures then cannot be applied
     * @param findings of the channel
     * @param cures    of the channel
     * @param board    findings of the board
     * @param chosen   the channel's circuit in words
     * @param wrong    texts of the channel that could not be taken over, in words
     */
    record Shown(String title, Optional<Verdict> verdict, boolean stale, List<Finding> findings, List<Cure> cures,
            List<Finding> board, List<CircuitWords.Line> chosen, List<String> wrong) {
        Shown {
            findings = List.copyOf(findings);
            cures = List.copyOf(cures);
            board = List.copyOf(board);
            chosen = List.copyOf(chosen);
            wrong = List.copyOf(wrong);
        }
    }

    private final BoardSession session;
    private final ReadOnlyObjectWrapper<Shown> shown = new ReadOnlyObjectWrapper<>(
            new Shown("", Optional.empty(), false, List.of(), List.of(), List.of(), List.of(), List.of()));

    public FindingsModel(BoardSession session) {
        this.session = session;
        session.stateProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        session.selectionProperty().subscribe(this::refresh);
        refresh();
    }

    ReadOnlyObjectProperty<Shown> shownProperty() {
        return shown.getReadOnlyProperty();
    }

    private Optional<Integer> row() {
        List<Integer> rows = session.selectionProperty().get();
        return rows.isEmpty() ? Optional.empty() : Optional.of(rows.getLast());
    }

    private void refresh() {
        Optional<Planned> planned = session.plannedProperty().get();
        Optional<Channel> channel = row().flatMap(session.state()::channel);
        Optional<ChannelPlan> plan = row().flatMap(id -> planned.flatMap(each -> each.channel(id)));
        boolean stale = plan.isPresent() && channel.isPresent() && !plan.get().channel().equals(channel.get());
        shown.set(new Shown(channel.map(Channel::name).orElse(""), plan.map(ChannelPlan::verdict), stale,
                plan.map(ChannelPlan::findings).orElse(List.of()), plan.map(ChannelPlan::cures).orElse(List.of()),
                planned.map(each -> each.plan().findings()).orElse(List.of()),
                plan.flatMap(each -> planned.map(all -> CircuitWords.lines(each, all.plan()))).orElse(List.of()),
                row().map(this::wrong).orElse(List.of())));
    }

    private List<String> wrong(int row) {
        List<String> lines = new ArrayList<>();
        session.state().wrong().forEach((place, entry) -> {
            if (place instanceof Place.Cell(int at, var field) && at == row) {
                String good = session.state().channel(row).map(field::text).orElse("");
                lines.add(field.title() + " \"" + entry.text() + "\": " + entry.reason() + " Until then "
                        + (good.isEmpty() ? "it counts as not typed." : good + " counts."));
            }
        });
        return lines;
    }

    /** Makes the cure's change on the selected channel. */
    void apply(Cure cure) {
        row().ifPresent(id -> cure.edit().ifPresent(changed -> {
            if (!shown.get().stale()) {
                session.edit(cure.change() + " (" + shown.get().title() + ")",
                        state -> state.withChannel(id, changed));
            }
        }));
    }
}
