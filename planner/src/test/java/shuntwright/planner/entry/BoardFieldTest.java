package shuntwright.planner.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

import shuntwright.board.Board;
import shuntwright.board.Zone;
import shuntwright.planner.HandMadeBoards;

class BoardFieldTest {
    private final Board board = HandMadeBoards.boat();

    @ParameterizedTest
    @EnumSource(BoardField.class)
    void whatTheEditorShowsReadsBackAsTheSameBoard(BoardField field) {
        assertThat(field.read(field.text(board), board).ifValue()).contains(board);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"SUPPLY_VOLTAGE|5V ±1%|5 V ±1 %", "SUPPLY_CURRENT|60m|60 mA",
            "AMBIENT|-20..60|-20 .. 60 °C", "HEAT_LIMIT|''|''", "HEAT_LIMIT|4|4 W", "BASIS|coverage|coverage",
            "BUILD_QUANTITY|12|12", "REFERENCES|quiet = REF-1, adc=REF-2|quiet = REF-1, adc = REF-2",
            "ALERT_LINES|alert, pumps|alert, pumps", "PARALLEL_SHUNTS|4|4", "POWER_MARGIN|50 %|50 %"})
    void takesWhatEngineersWrite(BoardField field, String typed, String shown) {
        assertThat(field.read(typed, board).ifValue().map(field::text)).contains(shown);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"NAME|''|needs a name", "SUPPLY_CURRENT|''|needed",
            "SUPPLY_CURRENT|-1|above 0",
            "BUILD_QUANTITY|0|whole number", "BUILD_QUANTITY|many|whole number", "COVERAGE|1|below 100 %",
            "COVERAGE|0.3|50 %", "BASIS|luck|limits", "REFERENCES|quiet|name = part number",
            "REFERENCES|supply = X|cannot be called", "ZONES|a, a|twice", "PARALLEL_SHUNTS|9|1 to 8",
            "POWER_MARGIN|70|above 100 %", "SUPPLY_VOLTAGE|-3|above 0 V", "AMBIENT|-300..20|-273"})
    void refusesWithAReason(BoardField field, String typed, String reason) {
        assertThat(field.read(typed, board).ifProblem().orElse("")).contains(reason);
    }

    @Test
    void aZoneMayHaveBlanksInItsNameAndALimit() {
        Board changed = BoardField.ZONES.read("port row 1.5 W, bow", board).ifValue().orElseThrow();
        assertThat(changed.zones()).containsExactly(
                new Zone("port row", OptionalDouble.of(1.5), OptionalDouble.empty()),
                new Zone("bow", OptionalDouble.empty(), OptionalDouble.empty()));
    }

    @Test
    void alertLinesThatAreThereKeepTheirData() {
        Board changed = BoardField.ALERT_LINES.read("other, alert", board).ifValue().orElseThrow();
        assertThat(changed.alertLines().getLast()).isEqualTo(board.alertLines().getFirst());
    }
}
