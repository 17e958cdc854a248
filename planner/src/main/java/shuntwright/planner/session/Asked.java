package shuntwright.planner.session;

import java.time.Duration;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.function.UnaryOperator;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.planner.work.Inquiry;

/**
 * A question about the session's board, its latest answer, and whether that answer still is of the board as it stands. An edit ends
 * the work under way, since its answer would be of a board that is no more. To be used on the publisher's thread only.
 *
 * @param <T> the answer
 */
public final class Asked<T> {
    private final BoardSession session;
    private final Inquiry<T> inquiry;
    private final ReadOnlyObjectWrapper<Optional<T>> answer = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyBooleanWrapper stale = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");
    /** Boards that the answer is of. */
    private final Set<Board> boards = new HashSet<>();
    private Board asking = Board.named("");

    public Asked(BoardSession session, Inquiry<T> inquiry) {
        this.session = session;
        this.inquiry = inquiry;
        session.stateProperty().subscribe(this::follow);
        session.startsProperty().subscribe(this::forget);
        session.catalogueProperty().subscribe(this::forget);
    }

    private void follow() {
        Board now = session.state().board();
        if (inquiry.runningProperty().get() && !asking.equals(now)) {
            inquiry.cancel();
            message.set("Ended by an edit of the board.");
        }
        stale.set(answer.get().isPresent() && !boards.contains(now));
    }

    private void forget() {
        inquiry.cancel();
        message.set("");
        boards.clear();
        answer.set(Optional.empty());
        stale.set(false);
    }

    /**
     * Asks about the board as it stands.
     *
     * @param what     is being done, in words
     * @param question of board and parts
     */
    public void ask(String what, BiFunction<Board, Catalogue, Inquiry.Question<T>> question) {
        Board board = session.state().board();
        asking = board;
        message.set("");
        inquiry.ask(what, question.apply(board, session.catalogueProperty().get()), found -> {
            boards.clear();
            boards.add(board);
            answer.set(Optional.of(found));
            stale.set(!board.equals(session.state().board()));
        }, problem -> message.set("It stopped on an error within the program (" + problem
                + "). The board is unharmed; change what is asked for to go on."));
    }

    /** Makes an edit after which the answer still holds, such as taking one of the plans it consists of. */
    public void editWithin(String name, UnaryOperator<BoardState> change) {
        boards.add(change.apply(session.state()).board());
        session.edit(name, change);
    }

    /** Ends the work under way; the last answer stays. */
    public void cancel() {
        if (inquiry.runningProperty().get()) {
            inquiry.cancel();
            message.set("Cancelled.");
        }
    }

    public ReadOnlyObjectProperty<Optional<T>> answerProperty() {
        return answer.getReadOnlyProperty();
    }

    /** True when the answer is of an earlier state of the board. */
    public ReadOnlyBooleanProperty staleProperty() {
        return stale.getReadOnlyProperty();
    }

    /** Why there is no newer answer; empty when all is well. */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }

    public Inquiry<T> inquiry() {
        return inquiry;
    }

    /** How long the last answer took. */
    public Duration took() {
        return inquiry.took();
    }
}
