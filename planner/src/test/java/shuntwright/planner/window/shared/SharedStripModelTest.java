package shuntwright.planner.window.shared;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

import shuntwright.planner.HandMadeBoards;
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
}
