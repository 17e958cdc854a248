package shuntwright.planner.window.front;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Front;
import shuntwright.plan.Plan;
import shuntwright.planner.DemoBoards;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.window.explore.Sums;
import shuntwright.planner.work.Explorer;
import shuntwright.planner.work.Exploring;

/** The front of a demo board by the real planner. */
class FrontOfDemoBoardTest {
    private final BoardSession session = Sessions.planned(new BoardPlanner()::plan);
    private final FrontModel model = new FrontModel(session,
            new Exploring(Explorer.of(new BoardPlanner()), Runnable::run, Runnable::run), 4);

    @Test
    void theBoardHasThePlanThatWasTaken() {
        DemoBoards.Demo demo = DemoBoards.camp();
        session.start(demo.board(), demo.catalogue(), true);
        model.ask();
        Front front = model.asked().answerProperty().get().orElseThrow();
        assertThat(front.points()).as("heat and cost pull apart on this board").hasSizeGreaterThan(2);
        for (int at : new int[]{0, front.points().size() - 1}) {
            model.choose(at);
            model.take();
            Plan taken = session.plannedProperty().get().orElseThrow().plan();
            assertThat(session.plannedProperty().get().orElseThrow().isOf(session.state())).isTrue();
            assertThat(Sums.heat(taken)).isCloseTo(front.points().get(at).first(), within(1e-9));
            assertThat(taken.buildCost()).isCloseTo(front.points().get(at).second(), within(1e-6));
            assertThat(taken.channels()).extracting(each -> each.solved().map(solved -> solved.circuit()))
                    .isEqualTo(front.points().get(at).plan().channels().stream()
                            .map(each -> each.solved().map(solved -> solved.circuit())).toList());
        }
    }
}
