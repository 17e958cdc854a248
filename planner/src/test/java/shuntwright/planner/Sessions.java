package shuntwright.planner;

import java.util.concurrent.Executor;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.work.Exploring;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;

/** Sessions that plan at once, on the calling thread. */
public final class Sessions {
    /** Waits for the first picture however long it takes. */
    public static final Executor PATIENT = _ -> {
    };

    private Sessions() {
    }

    public static BoardSession of(Board board) {
        BoardSession session = closed();
        session.start(board, Catalogue.EMPTY, true);
        return session;
    }

    /** Without a board yet, with this planner. */
    public static BoardSession planned(Planning.Planner planner) {
        return new BoardSession(new Planning(planner, Runnable::run, Runnable::run), sampling(), PATIENT);
    }

    /** Samples at once. */
    public static PlanSampling sampling() {
        return new PlanSampling(HandMadeStudies::sample, Runnable::run, Runnable::run);
    }

    /** Without a board yet. */
    public static BoardSession closed() {
        return planned(HandMadePlans::plan);
    }

    /** Asks hand-made choices at once. */
    public static Exploring exploring() {
        return new Exploring(HandMadeChoices.EXPLORER, Runnable::run, Runnable::run);
    }

    /** With board-wide choices in its plans. */
    public static BoardSession chosen(Board board) {
        BoardSession session = planned(HandMadeChoices::plan);
        session.start(board, Catalogue.EMPTY, true);
        return session;
    }
}
