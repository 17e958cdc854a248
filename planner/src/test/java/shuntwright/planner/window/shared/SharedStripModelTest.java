package shuntwright.planner.window.shared;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

import shuntwright.board.Board;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Plan;
import shuntwright.plan.TapPlan;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.BoardField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.work.Planning;

class SharedStripModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final SharedStripModel model = new SharedStripModel(session);

    private SharedTile tile(String title) {
        return model.tiles().stream().filter(each -> each.title().startsWith(title)).findFirst().orElseThrow();
    }

    @Test
    void eachSharedThingShowsUseAndLimit() {
        assertThat(tile("Supply").value()).isEqualTo("7.5 mA of 100 mA");
        assertThat(tile("Supply").share()).hasValue(0.075);
        assertThat(tile("Heat").holds()).isTrue();
        assertThat(tile("Zone starboard").share()).isEmpty();
        assertThat(tile("References").value()).isEqualTo("none");
        assertThat(tile("Alert pull-up").value()).isEqualTo("alert 10 kΩ");
        assertThat(tile("Accepted").value()).isEqualTo("inside by limits");
    }

    @Test
    void aTighterLimitIsShownAsBroken() {
        session.enter(new Place.OfBoard(BoardField.HEAT_LIMIT), "100 mW");
        assertThat(tile("Heat").holds()).isFalse();
        assertThat(tile("Heat").words()).endsWith("over its limit");
        session.enter(new Place.OfBoard(BoardField.HEAT_LIMIT), "");
        assertThat(tile("Heat").share()).isEqualTo(OptionalDouble.empty());
    }

    @Test
    void aWrongEntryMarksItsTile() {
        session.enter(new Place.OfBoard(BoardField.AMBIENT), "hot");
        assertThat(tile("Ambient").well()).isFalse();
        assertThat(tile("Ambient").words()).contains("Wrong entry: 'hot'");
        session.undo();
        assertThat(tile("Ambient").well()).isTrue();
    }

    @Test
    void allAlertLinesStandBehindTheTile() {
        session.enter(new Place.OfBoard(BoardField.ALERT_LINES), "alert, second");
        assertThat(tile("Alert pull-up").value()).isEqualTo("alert 10 kΩ and 1 more");
        assertThat(tile("Alert pull-up").words()).contains("alert: pull-up 10 kΩ (2 .. 40 kΩ allowed)")
                .contains("second: pull-up 10 kΩ");
    }

    @Test
    void tapsAreShownWithTheirChannels() {
        assertThat(model.tiles()).noneMatch(each -> each.title().equals("Taps"));
        Tap tap = new Tap("low", new Source.Supply(), new Tap.Kind.Divider(OptionalDouble.empty(),
                OptionalDouble.empty()), OptionalDouble.empty());
        Board board = HandMadeBoards.boat().withTaps(List.of(tap));
        TapPlan planned = new TapPlan(tap, List.of("radar", "windlass"), Optional.of(new Threshold.Divider(
                new SourceVoltage(new Source.Supply(), board.supply().voltage(), 0, 0, 0), 10e3, 10e3, "low", 2)));
        BoardSession tapped = new BoardSession(new Planning((asked, parts, progress) -> {
            Plan plan = HandMadePlans.plan(asked, parts, progress);
            return new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), plan.alerts(),
                    List.of(planned), plan.references(), plan.parts(), List.of(), Optional.empty());
        }, Runnable::run, Runnable::run));
        SharedStripModel strip = new SharedStripModel(tapped);
        tapped.start(board, Catalogue.EMPTY, true);
        assertThat(strip.tiles()).filteredOn(each -> each.title().equals("Taps")).singleElement()
                .satisfies(tile -> {
                    assertThat(tile.value()).isEqualTo("low 1.65 V");
                    assertThat(tile.words()).contains("low 1.65 V from supply, 2 channels: radar, windlass");
                });
    }
}
