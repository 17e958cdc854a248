package shuntwright.planner.window.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.board.Board;
import shuntwright.board.SenseSupply;
import shuntwright.board.Zone;
import shuntwright.plan.BoardPlanner;
import shuntwright.planner.DemoBoards;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;

/** Limits of a demo board that the real planner finds too tight, relaxed as it says. */
class ConflictOfDemoBoardTest {

    static Stream<Arguments> tight() {
        return Stream.of(
                Arguments.of("board heat",
                        (UnaryOperator<Board>) board -> board.withHeatLimit(OptionalDouble.of(0.05))),
                Arguments.of("sense supply",
                        (UnaryOperator<Board>) board -> board
                                .withSupply(new SenseSupply(board.supply().voltage(), 1e-4))),
                Arguments.of("zone tight", (UnaryOperator<Board>) board -> board
                        .withZones(Stream.concat(board.zones().stream(), Stream.of(new Zone("tight",
                                OptionalDouble.of(1e-3), OptionalDouble.empty()))).toList())
                        .withChannels(board.channels().stream()
                                .map(each -> each.withZone(java.util.Optional.of("tight"))).toList())));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("tight")
    void applyingWhatALimitWouldNeedEndsTheConflict(String limit, UnaryOperator<Board> tighten) {
        DemoBoards.Demo demo = DemoBoards.camp();
        BoardSession session = Sessions.planned(new BoardPlanner()::plan);
        ChoiceModel model = new ChoiceModel(session);
        session.start(tighten.apply(demo.board()), demo.catalogue(), true);
        assertThat(model.shownProperty().get().broken()).containsExactly(limit);
        List<Shown.Part> parts = model.shownProperty().get().conflict().orElseThrow().parts();
        Shown.Part part = parts.stream().filter(each -> each.member().name().equals(limit)).findFirst().orElseThrow();
        assertThat(part.applies()).isTrue();
        model.apply(part);
        assertThat(model.shownProperty().get().broken()).isEmpty();
        assertThat(model.shownProperty().get().conflict()).isEmpty();
    }
}
