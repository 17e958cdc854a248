package shuntwright.planner.command;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.function.Supplier;

import shuntwright.board.Board;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.planner.work.Explorer;

/**
 * A question about a whole board that one plan does not answer.
 *
 * @param file      of the board
 * @param original  as its file has it
 * @param board     for this run
 * @param catalogue of its parts
 */
record Question(Path file, Board original, Board board, Catalogue catalogue) {

    /** @throws BadInput when a file cannot be opened */
    static Question of(Path file, List<Path> parts, List<Entered> entered) {
        Workplace opened = Opening.of(file, parts);
        return new Question(file, opened.board(), Entered.applied(entered, opened.board()), opened.catalogue());
    }

    /** Asks an explorer. */
    @FunctionalInterface
    interface Ask<T> {
        T ask(Explorer explorer, Board board, Catalogue catalogue, Progress progress);
    }

    /**
     * An answer.
     *
     * @param plan   of the board as it is
     * @param answer to the question
     * @param took   to plan the board and to find the answer
     */
    record Answered<T>(Plan plan, T answer, Duration took) {}

    /** @param json true when nothing but JSON is to be shown */
    <T> Answered<T> answered(Supplier<Solver> solvers, Terminal terminal, boolean json, Ask<T> ask) {
        try (ProgressLine progress = ProgressLine.on(terminal, !json)) {
            Solver solver = solvers.get();
            long start = System.nanoTime();
            Plan plan = solver.plans().plan(board, catalogue, progress);
            T answer = ask.ask(solver.explorer(), board, catalogue, progress);
            return new Answered<>(plan, answer, Duration.ofNanos(System.nanoTime() - start));
        }
    }
}
