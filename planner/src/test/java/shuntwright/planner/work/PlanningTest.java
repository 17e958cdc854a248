package shuntwright.planner.work;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardPlanner;
import shuntwright.planner.HandMadePlans;

class PlanningTest {
    private final Queue<Runnable> background = new ArrayDeque<>();
    private final Queue<Runnable> publisher = new ArrayDeque<>();
    private final List<String> heard = new ArrayList<>();

    private void ask(Planning planning, String name) {
        planning.ask(Board.named(name), Catalogue.EMPTY, plan -> heard.add(plan.board().name()), heard::add);
    }

    private static void run(Queue<Runnable> queue) {
        while (!queue.isEmpty()) {
            queue.remove().run();
        }
    }

    @Test
    void answersArriveOnThePublisherOnly() {
        Planning planning = new Planning(HandMadePlans::plan, background::add, publisher::add);
        ask(planning, "a");
        run(background);
        assertThat(heard).isEmpty();
        assertThat(planning.runningProperty().get()).isTrue();
        run(publisher);
        assertThat(heard).containsExactly("a");
        assertThat(planning.runningProperty().get()).isFalse();
    }

    @Test
    void theLatestQuestionWins() {
        Planning planning = new Planning(HandMadePlans::plan, background::add, publisher::add);
        ask(planning, "a");
        background.remove().run();
        ask(planning, "b");
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("b");
    }

    @Test
    void cancellingStopsTheWorkAndGivesNoAnswer() {
        Planning[] held = new Planning[1];
        Planning planning = new Planning((board, catalogue, progress) -> {
            held[0].cancel();
            if (progress.cancelled()) {
                throw new BoardPlanner.Cancelled();
            }
            return HandMadePlans.plan(board, catalogue, progress);
        }, background::add, publisher::add);
        held[0] = planning;
        ask(planning, "a");
        run(background);
        run(publisher);
        assertThat(heard).isEmpty();
        assertThat(planning.runningProperty().get()).isFalse();
    }

    @Test
    void progressIsPublishedAtMostOnceAtATime() {
        Planning planning = new Planning((board, catalogue, progress) -> {
            for (int step = 0; step < 1000; step++) {
                progress.reached("channels", step, 1000);
            }
            return HandMadePlans.plan(board, catalogue, progress);
        }, background::add, publisher::add);
        ask(planning, "a");
        run(background);
        assertThat(publisher).as("messages under way").hasSize(2);
        publisher.remove().run();
        assertThat(planning.stageProperty().get()).isNotEmpty();
        run(publisher);
        assertThat(planning.progressProperty().get()).isZero();
    }
}
