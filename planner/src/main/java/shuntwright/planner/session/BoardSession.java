package shuntwright.planner.session;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.function.UnaryOperator;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.parts.Catalogue;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.undo.History;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;

/**
 * The open board: what was entered, how to undo it, and the latest plan. Every edit is a function from state to state
 * with a name, and starts planning again; a new plan is sampled again. To be used on the publisher's thread only.
 */
public final class BoardSession {
    private final Planning planning;
    private final PlanSampling sampling;
    private final Executor patience;
    private final ReadOnlyObjectWrapper<BoardState> state = new ReadOnlyObjectWrapper<>(
            BoardState.of(Board.named("new board")));
    private final ReadOnlyObjectWrapper<Catalogue> catalogue = new ReadOnlyObjectWrapper<>(Catalogue.EMPTY);
    private final ReadOnlyObjectWrapper<Optional<Planned>> planned = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyBooleanWrapper open = new ReadOnlyBooleanWrapper();
    private final ReadOnlyIntegerWrapper starts = new ReadOnlyIntegerWrapper();
    private final ReadOnlyBooleanWrapper unsaved = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper undoName = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper redoName = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");
    private final ObjectProperty<List<Integer>> selection = new SimpleObjectProperty<>(List.of());
    private final BooleanBinding current = Bindings.createBooleanBinding(
            () -> planned.get().map(plan -> plan.isOf(state.get())).orElse(false), planned, state);
    private History<BoardState> history = new History<>(state.get());
    private Optional<Board> saved = Optional.empty();
    /** A plan that waits for its first picture. */
    private Optional<Planned> held = Optional.empty();

    /** @param patience runs things a little later on the publisher's thread */
    public BoardSession(Planning planning, PlanSampling sampling, Executor patience) {
        this.planning = planning;
        this.sampling = sampling;
        this.patience = patience;
    }

    /**
     * Starts with a board.
     *
     * @param saved whether a file holds exactly this board
     */
    public void start(Board board, Catalogue parts, boolean saved) {
        planned.set(Optional.empty());
        selection.set(List.of());
        history = new History<>(BoardState.of(board));
        this.saved = saved ? Optional.of(board) : Optional.empty();
        catalogue.set(parts);
        message.set("");
        state.set(history.now());
        open.set(true);
        refreshMarks();
        if (!board.channels().isEmpty()) {
            selection.set(List.of(history.now().rows().getFirst()));
        }
        starts.set(starts.get() + 1);
        plan();
    }

    /** Makes an edit, unless it changes nothing. */
    public void edit(String name, UnaryOperator<BoardState> change) {
        history.step(name, change.apply(history.now()));
        show();
    }

    /** Types a text somewhere; right or wrong, it is kept. */
    public void enter(Place place, String text) {
        if (!text.equals(state.get().text(place))) {
            edit(named(place), now -> now.enter(place, text));
        }
    }

    /** Gives up a wrong entry. */
    public void revert(Place place) {
        if (state.get().wrong(place).isPresent()) {
            edit("give up " + named(place), now -> now.revert(place));
        }
    }

    private String named(Place place) {
        return switch (place) {
            case Place.Cell(int row, var field) -> field.words() + " of "
                    + state.get().channel(row).map(Channel::name).orElse("a channel");
            case Place.OfBoard(var field) -> field.title().toLowerCase(java.util.Locale.ROOT);
        };
    }

    public void undo() {
        history.undo();
        show();
    }

    public void redo() {
        history.redo();
        show();
    }

    /** Adds a channel behind the selected ones and selects it. */
    public int addChannel(String name) {
        int behind = selection.get().isEmpty() ? -1 : selection.get().getLast();
        return addChannel(name, behind);
    }

    /** Adds a channel at the end by a text typed into the empty row, as one edit. */
    public int appendChannel(ChannelField field, String text) {
        int row = state.get().nextRow();
        String free = state.get().freeName(field == ChannelField.NAME ? text.strip() : "channel");
        edit("add " + free, now -> {
            BoardState added = now.add(Channel.named(free), -1);
            return field == ChannelField.NAME ? added : added.enter(new Place.Cell(row, field), text);
        });
        selection.set(List.of(row));
        return row;
    }

    private int addChannel(String name, int behind) {
        int row = state.get().nextRow();
        String free = state.get().freeName(name);
        edit("add " + free, now -> now.add(Channel.named(free), behind));
        selection.set(List.of(row));
        return row;
    }

    public void duplicateSelected() {
        List<Integer> rows = selection.get();
        if (!rows.isEmpty()) {
            int first = state.get().nextRow();
            edit("duplicate " + names(rows), now -> now.duplicate(rows));
            selection.set(state.get().rows().stream().filter(row -> row >= first).toList());
        }
    }

    public void removeSelected() {
        List<Integer> rows = selection.get();
        if (!rows.isEmpty()) {
            List<Integer> before = state.get().rows();
            int at = before.indexOf(rows.getFirst());
            edit("remove " + names(rows), now -> now.remove(rows));
            List<Integer> left = state.get().rows();
            selection.set(left.isEmpty() ? List.of() : List.of(left.get(Math.clamp(at, 0, left.size() - 1))));
        }
    }

    private String names(List<Integer> rows) {
        return rows.size() > 2
                ? rows.size() + " channels"
                : String.join(" and ", rows.stream().map(row -> state.get().channel(row).map(Channel::name).orElse(""))
                        .toList());
    }

    /** Says that a file now holds this board. */
    public void markSaved(Board board) {
        saved = Optional.of(board);
        refreshMarks();
    }

    /** Exchanges the parts to choose from and plans again. */
    public void useCatalogue(Catalogue parts) {
        catalogue.set(parts);
        plan();
    }

    private void show() {
        Board before = state.get().board();
        state.set(history.now());
        selection.set(selection.get().stream().filter(state.get().rows()::contains).toList());
        refreshMarks();
        if (!before.equals(state.get().board())) {
            message.set("");
            plan();
        }
    }

    private void refreshMarks() {
        undoName.set(history.undoName().orElse(""));
        redoName.set(history.redoName().orElse(""));
        unsaved.set(!saved.equals(Optional.of(state.get().board())));
    }

    /** Plans the board as it stands. */
    public void plan() {
        BoardState of = state.get();
        sampling.cancel();
        held = Optional.empty();
        planning.ask(of.board(), catalogue.get(), plan -> {
            message.set("");
            take(new Planned(plan, of, planning.took()));
        }, message::set);
    }

    /**
     * Where a sampled plan is on show, a new one waits a moment for its first picture, so that what rests on trials does not come
     * and go with each edit.
     */
    private void take(Planned fresh) {
        boolean circuits = fresh.plan().channels().stream().anyMatch(each -> each.solved().isPresent());
        held = Optional.of(fresh);
        if (!circuits || !sampled()) {
            release();
        }
        if (circuits) {
            patience.execute(() -> {
                if (held.equals(Optional.of(fresh))) {
                    release();
                }
            });
            sample(fresh);
        }
    }

    /** True when the plan on show rests on trials. */
    private boolean sampled() {
        return planned.get().flatMap(each -> each.plan().study()).isPresent();
    }

    private void sample(Planned bare) {
        sampling.ask(bare.plan(), plan -> {
            held = Optional.of(new Planned(plan, bare.of(), bare.took()));
            release();
        }, problem -> {
            release();
            message.set(problem);
        });
    }

    private void release() {
        Optional<Planned> waiting = held;
        held = Optional.empty();
        if (waiting.isPresent()) {
            planned.set(waiting);
        }
    }

    /** Ends sampling; the best picture so far stays. */
    public void stopSampling() {
        sampling.stop();
        release();
    }

    /** Goes on with sampling where it was stopped. */
    public void sampleAgain() {
        planned.get().filter(each -> each.isOf(state.get())).ifPresent(each -> {
            message.set("");
            sample(each);
        });
    }

    public PlanSampling sampling() {
        return sampling;
    }

    public Planning planning() {
        return planning;
    }

    public ReadOnlyObjectProperty<BoardState> stateProperty() {
        return state.getReadOnlyProperty();
    }

    public BoardState state() {
        return state.get();
    }

    public ReadOnlyObjectProperty<Catalogue> catalogueProperty() {
        return catalogue.getReadOnlyProperty();
    }

    /** The latest good plan; it stays on show while a newer one is being made. */
    public ReadOnlyObjectProperty<Optional<Planned>> plannedProperty() {
        return planned.getReadOnlyProperty();
    }

    /** ISO 4217 code of the costs on show. */
    public String currency() {
        return planned.get().map(each -> each.plan().currency()).orElse(catalogue.get().currency());
    }

    /** True when the plan on show is of the board as it stands. */
    public BooleanBinding currentBinding() {
        return current;
    }

    /** False until a board is opened or made. */
    public ReadOnlyBooleanProperty openProperty() {
        return open.getReadOnlyProperty();
    }

    /** How many boards were opened or made so far; changes when another one stands in the window. */
    public ReadOnlyIntegerProperty startsProperty() {
        return starts.getReadOnlyProperty();
    }

    public ReadOnlyBooleanProperty unsavedProperty() {
        return unsaved.getReadOnlyProperty();
    }

    /** Name of the edit that undo takes back; empty when there is none. */
    public ReadOnlyStringProperty undoNameProperty() {
        return undoName.getReadOnlyProperty();
    }

    /** Name of the edit that redo makes again; empty when there is none. */
    public ReadOnlyStringProperty redoNameProperty() {
        return redoName.getReadOnlyProperty();
    }

    /** Why there is no newer plan; empty when all is well. */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }

    /** Identities of the selected rows, in the order shown. */
    public ObjectProperty<List<Integer>> selectionProperty() {
        return selection;
    }
}
