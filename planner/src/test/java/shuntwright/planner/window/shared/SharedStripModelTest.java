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
    void theYieldStandsBesideWhatTheProductWouldClaim() {
        // the anchor light is outside beyond two standard deviations, 4.55 %, the hand-made board half as often
        assertThat(tile("Board yield").value()).isEqualTo("97.7 % [97.6 .. 97.8 %]");
        assertThat(tile("Board yield").note()).isEqualTo("product 95.4 %, ambient costs 1.1 %");
        assertThat(tile("Board yield").words()).contains("would have claimed").contains("ambient at its nominal value")
                .contains("1,000,000 boards tried");
    }

    @Test
    void aYieldWithoutAFailureIsABoundAndNoCertainty() {
        BoardSession good = Sessions.of(HandMadeBoards.boat()
                .withChannels(HandMadeBoards.boat().channels().subList(0, 2)));
        SharedStripModel strip = new SharedStripModel(good);
        assertThat(strip.tiles()).filteredOn(each -> each.title().equals("Board yield")).singleElement()
                .satisfies(tile -> {
                    assertThat(tile.value()).isEqualTo("above 99.9996 % (95 %)");
                    assertThat(tile.note()).isEqualTo("product above 99.9992 %");
                });
    }

    @Test
    void withoutACircuitThereIsNoYield() {
        session.start(Board.named("empty"), Catalogue.EMPTY, true);
        assertThat(model.tiles()).noneMatch(each -> each.title().equals("Board yield"));
    }

    @Test
    void tapsAreShownWithTheirChannels() {
        assertThat(model.tiles()).noneMatch(each -> each.title().equals("Taps"));
        Tap tap = new Tap("low", new Source.Supply(), new Tap.Kind.Divider(OptionalDouble.empty(),
                OptionalDouble.empty()), OptionalDouble.empty());
        Board board = HandMadeBoards.boat().withTaps(List.of(tap));
        TapPlan planned = new TapPlan(tap, List.of("radar", "windlass"), Optional.of(new Threshold.Divider(
                new SourceVoltage(new Source.Supply(), board.supply().voltage(), 0, 0, 0), 10e3, 10e3, "low", 2)));
        BoardSession tapped = Sessions.planned((asked, parts, progress) -> {
            Plan plan = HandMadePlans.plan(asked, parts, progress);
            return new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), plan.alerts(),
                    List.of(planned), plan.references(), plan.parts(), List.of(), plan.choice(), Optional.empty());
        });
        SharedStripModel strip = new SharedStripModel(tapped);
        tapped.start(board, Catalogue.EMPTY, true);
        assertThat(strip.tiles()).filteredOn(each -> each.title().equals("Taps")).singleElement()
                .satisfies(tile -> {
                    assertThat(tile.value()).isEqualTo("low 1.65 V");
                    assertThat(tile.words()).contains("low 1.65 V from supply, 2 channels: radar, windlass");
                });
    }
}
