package shuntwright.planner.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

import shuntwright.board.Board;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.board.Sampling;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Uncertainty;
import shuntwright.board.Zone;
import shuntwright.planner.HandMadeBoards;
import shuntwright.quantity.Distribution;

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
            "ALERT_LINES|alert, pumps|alert, pumps", "PARALLEL_SHUNTS|4|4", "POWER_MARGIN|50 %|50 %",
            "TRIALS|250000|250,000", "TRIALS|2.5e5|250,000", "TRIALS|2 000 000|2,000,000",
            "TRIALS|Adaptive|'adaptive, 2 digits, most 10,000,000'",
            "TRIALS|adaptive 1 digit, at most 50,000|'adaptive, 1 digit, most 50,000'", "SEED|-7|-7",
            "WANTED|Least  COST; least heat|'least cost, least heat'", "WANTED|widest margin,|widest margin",
            "PART_NUMBER_COST|12.50|12.5", "PART_NUMBER_COST|0|0", "ROUNDS|0|0", "ROUNDS|1000000|1000000",
            "TIME_LIMIT|1500m|1.5 s", "TIME_LIMIT|''|''", "CHOICE_SEED|-9|-9"})
    void takesWhatEngineersWrite(BoardField field, String typed, String shown) {
        assertThat(field.read(typed, board).ifValue().map(field::text)).contains(shown);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"NAME|''|needs a name", "SUPPLY_CURRENT|''|needed",
            "SUPPLY_CURRENT|-1|above 0",
            "BUILD_QUANTITY|0|whole number", "BUILD_QUANTITY|many|whole number", "COVERAGE|1|below 100 %",
            "COVERAGE|0.3|50 %", "BASIS|luck|limits", "REFERENCES|quiet|name = part number",
            "REFERENCES|supply = X|cannot be called", "ZONES|a, a|twice", "PARALLEL_SHUNTS|9|1 to 8",
            "POWER_MARGIN|70|above 100 %", "SUPPLY_VOLTAGE|-3|above 0 V", "TRIALS|1000|from 10,000 to 100,000,000",
            "TRIALS|lots|such as 1,000,000", "TRIALS|1e9|from 10,000", "TRIALS|1.23456e4|whole number",
            "COVERAGE|99.9|Maybe 99.9 % was meant",
            "TRIALS|adaptive 3 digits|such as 1,000,000", "TRIALS|99999999999|from 10,000", "SEED|1.5|whole number",
            "AMBIENT|-300..20|-273", "WANTED|least beauty|none of least heat", "WANTED|''|At least one",
            "WANTED|'least heat, least heat'|stands twice", "PART_NUMBER_COST|-1|from 0", "PART_NUMBER_COST|much|12.50",
            "PART_NUMBER_COST|NaN|from 0", "ROUNDS|-1|0 to 1000000", "ROUNDS|1000001|0 to 1000000",
            "TIME_LIMIT|0|above 0 s", "CHOICE_SEED|1.5|whole number"})
    void refusesWithAReason(BoardField field, String typed, String reason) {
        assertThat(field.read(typed, board).ifProblem().orElse("")).contains(reason);
    }

    private static Zone zone(String name, double limit, double resistance) {
        return new Zone(name, limit > 0 ? OptionalDouble.of(limit) : OptionalDouble.empty(),
                resistance > 0 ? OptionalDouble.of(resistance) : OptionalDouble.empty());
    }

    private List<Zone> zones(String typed) {
        return BoardField.ZONES.read(typed, board).ifValue().orElseThrow().zones();
    }

    @Test
    void aZoneMayHaveBlanksInItsNameALimitAndAThermalResistance() {
        assertThat(zones("port row 1.5 W, bow")).containsExactly(zone("port row", 1.5, 0), zone("bow", 0, 0));
        assertThat(zones("port row 1.5 W 12 K/W, bow 900 mW 8.5K/W, stern 20 K/W"))
                .containsExactly(zone("port row", 1.5, 12), zone("bow", 0.9, 8.5), zone("stern", 0, 20));
        assertThat(zones("stern 20 K/W 3 W")).containsExactly(zone("stern", 3, 20));
        assertThat(BoardField.ZONES.read("port 1 W 2 W", board).ifProblem().orElse("")).contains("two heat limits");
        assertThat(BoardField.ZONES.read("port 1 K/W 1 W 2 K/W", board).ifProblem().orElse(""))
                .contains("two thermal resistances");
    }

    @Test
    void zonesThatAreThereKeepTheirData() {
        Board odd = board
                .withZones(List.of(zone("row 2", 0, 0), zone("row 2 W", 3, 0.1 + 0.2), zone("bow 8 K/W", 0, 0)));

        assertThat(BoardField.ZONES.read(BoardField.ZONES.text(odd), odd).ifValue()).contains(odd);
        assertThat(BoardField.ZONES.read("new 4 K/W, " + BoardField.ZONES.text(odd), odd).ifValue().orElseThrow()
                .zones()).containsExactly(zone("new", 0, 4), odd.zones().get(0), odd.zones().get(1),
                        odd.zones().get(2));
    }

    /** Everything that a board file holds and the strip does not show. */
    @ParameterizedTest
    @EnumSource(BoardField.class)
    void typingLosesNothingThatIsNotShown(BoardField field) {
        Board full = board.withUncertainty(new Uncertainty(
                List.of(new StatedDistribution("shunt tolerance", Optional.empty(), new Distribution.Normal(3))),
                new Sampling(new Sampling.Trials.Adaptive(1, 50_000), 9))).withPreference(new Preference(
                        List.of(Objective.WIDEST_MARGIN, Objective.FEWEST_PARTS), 0.1 + 0.2, 7, OptionalDouble.of(1.5),
                        -3))
                .withChannels(List.of(
                        board.channels().getFirst().withReading(new Channel.ReadingDemand(OptionalDouble.empty(),
                                OptionalDouble.of(0.02), Optional.of(new Calibration(Calibration.Points.ONE,
                                        OptionalDouble.empty(), OptionalDouble.empty(), 1e-3,
                                        Calibration.DEFAULT_TEMPERATURE))))));

        Board read = field.read(field.text(full), full).ifValue().orElseThrow();

        assertThat(read).isEqualTo(full);
    }

    @Test
    void alertLinesThatAreThereKeepTheirData() {
        Board changed = BoardField.ALERT_LINES.read("other, alert", board).ifValue().orElseThrow();
        assertThat(changed.alertLines().getLast()).isEqualTo(board.alertLines().getFirst());
    }
}
