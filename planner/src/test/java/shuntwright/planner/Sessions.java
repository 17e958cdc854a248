package shuntwright.planner;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.work.Planning;

/** Sessions that plan at once, on the calling thread. */
public final class Sessions {
    private Sessions() {
    }

    public static BoardSession of(Board board) {
        BoardSession session = closed();
        session.start(board, Catalogue.EMPTY, true);
        return session;
    }

    /** Without a board yet. */
    public static BoardSession closed() {
        return new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run));
    }
}
