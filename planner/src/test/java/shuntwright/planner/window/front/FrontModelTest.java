package shuntwright.planner.window.front;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.List;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.board.Channel;
import shuntwright.board.Objective;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.window.chart.Plot;
import shuntwright.planner.window.explore.Sum;
import shuntwright.planner.work.Exploring;

class FrontModelTest {
    private final BoardSession session = Sessions.chosen(HandMadeBoards.boat());
    private final FrontModel model = new FrontModel(session, Sessions.exploring());

    private Plot plot() {
        return model.plotProperty().get();
    }

    @Test
    void untilItIsComputedTheChartSaysSo() {
        assertThat(plot().empty()).startsWith("Not computed yet");
        assertThat(plot().x().unit().words()).isEqualTo("Heat of all shunts, W");
        model.secondProperty().set(Objective.LEAST_HEAT);
        assertThat(model.possibleBinding().get()).isFalse();
        assertThat(plot().empty()).isEqualTo("Choose two different objectives.");
    }

    @Test
    void pointsStandByHeatAndCostWithTheBoardAsItIs() {
        model.ask();
        assertThat(plot().empty()).isEmpty();
        assertThat(plot().y().unit().words()).isEqualTo("Cost of the build, EUR");
        assertThat(plot().spots()).hasSize(7);
        assertThat(plot().spots()).extracting(Plot.Spot::kind).containsOnlyOnce(Plot.Kind.PRESENT)
                .doesNotContain(Plot.Kind.CHOSEN);
        List<Plot.Spot> points = plot().spots().subList(0, 6);
        for (int at = 1; at < points.size(); at++) {
            assertThat(points.get(at).place().x()).isGreaterThan(points.get(at - 1).place().x());
            assertThat(points.get(at).place().y()).isLessThan(points.get(at - 1).place().y());
        }
        // steps: never below a point's own place to the left of it
        assertThat(plot().lines().getFirst().places()).hasSize(11);
        assertThat(plot().lines().getFirst().places().get(1))
                .isEqualTo(new Plot.Place(points.get(1).place().x(), points.get(0).place().y()));
        assertThat(plot().words()).contains("2 W, ").contains("now: 1.128 W, ");
        assertThat(model.saidProperty().get()).startsWith("6 plans, found in ");
    }

    @Test
    void aPointShowsItsSumsAgainstNow() {
        model.ask();
        assertThat(model.sumsProperty().get()).isEmpty();
        model.choose(1);
        assertThat(plot().spots().get(1).kind()).isEqualTo(Plot.Kind.CHOSEN);
        assertThat(model.sumsProperty().get()).contains(new Sum("Heat of all shunts", "2.500 W", "+1.372 W"),
                new Sum("Part numbers", "1", "same"));
        model.choose(17);
        assertThat(plot().spots().get(1).kind()).isEqualTo(Plot.Kind.CHOSEN);
    }

    @Test
    void aPlanIsTakenByPinningItAndAnotherOneAfterIt() {
        model.ask();
        model.choose(0);
        model.take();
        Channel pump = session.state().board().channels().getFirst();
        assertThat(pump.pins().shuntCount()).as("of the coolest plan").hasValue(12);
        assertThat(session.undoNameProperty().get()).startsWith("take the plan of 2 W and ");
        assertThat(model.takeableBinding().get()).as("the front still holds").isTrue();
        model.choose(4);
        model.take();
        assertThat(session.state().board().channels().getFirst().pins().shuntCount()).hasValue(4);
        session.undo();
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
        assertThat(model.takeableBinding().get()).isTrue();
    }

    @Test
    void afterAnotherEditNothingOfItCanBeTaken() {
        model.ask();
        model.choose(0);
        session.addChannel("horn");
        assertThat(model.takeableBinding().get()).isFalse();
        assertThat(model.saidProperty().get()).contains("as of before the last edit");
        model.take();
        assertThat(session.undoNameProperty().get()).isEqualTo("add horn");
        session.undo();
        assertThat(model.takeableBinding().get()).as("of this board again").isTrue();
    }

    @Test
    void anEditEndsTheWorkAndAnotherBoardForgetsTheAnswer() {
        Queue<Runnable> background = new ArrayDeque<>();
        FrontModel slow = new FrontModel(session,
                new Exploring(HandMadeChoices.EXPLORER, background::add, Runnable::run));
        slow.ask();
        session.addChannel("horn");
        background.remove().run();
        assertThat(slow.plotProperty().get().empty()).startsWith("Not computed yet");
        assertThat(slow.asked().messageProperty().get()).isEqualTo("Ended by an edit of the board.");
        slow.ask();
        background.remove().run();
        assertThat(slow.plotProperty().get().empty()).isEmpty();
        session.start(HandMadeBoards.boat(), shuntwright.parts.Catalogue.EMPTY, true);
        assertThat(slow.plotProperty().get().empty()).startsWith("Not computed yet");
    }

    @Test
    void cancellingKeepsTheFrontBefore() {
        Queue<Runnable> background = new ArrayDeque<>();
        FrontModel slow = new FrontModel(session,
                new Exploring(HandMadeChoices.EXPLORER, background::add, Runnable::run));
        slow.ask();
        background.remove().run();
        slow.ask();
        slow.asked().cancel();
        background.remove().run();
        assertThat(slow.plotProperty().get().spots()).hasSize(7);
        assertThat(slow.asked().messageProperty().get()).isEqualTo("Cancelled.");
    }
}
