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
import shuntwright.board.BoardReference;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.planner.HandMadeBoards;
import shuntwright.quantity.Range;

class ChannelFieldTest {
    private final Board board = HandMadeBoards.boat().withReferences(List.of(new BoardReference("quiet", "REF-1")));
    private final Channel channel = board.channels().get(1);

    private Optional<Channel> read(ChannelField field, String text) {
        return field.read(text, channel, board).ifValue();
    }

    @ParameterizedTest
    @EnumSource(ChannelField.class)
    void whatACellShowsReadsBackAsTheSameChannel(ChannelField field) {
        for (Channel each : board.channels()) {
            assertThat(field.read(field.text(each), each, board).ifValue()).contains(each);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"LOAD|13|13 A", "LOAD|13A|13 A", "LOAD|500m|500 mA", "LOAD|''|''",
            "RAIL|12|12 V", "RAIL|10.5 .. 12 .. 14.4 V|10.5 .. 12 .. 14.4 V", "SIDE|l|low", "SIDE|High|high",
            "ZONE|Port|port", "ZONE|''|''", "RELEASE|latch|latch", "RELEASE|13..14|13 .. 14 A", "RELEASE|''|auto",
            "SOURCE|supply|supply", "SOURCE|quiet|quiet", "SOURCE|reference quiet|quiet", "SOURCE|''|any",
            "READING_AT_LOAD|1 %|1 %", "DIVERSITY|50 %|50 %", "NAME| horn |horn", "PINNED_SHUNT|SH-1|SH-1"})
    void takesWhatEngineersWrite(ChannelField field, String typed, String shown) {
        assertThat(read(field, typed).map(field::text)).contains(shown);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"LOAD|twelve|twelve", "LOAD|-3|above 0 A", "LOAD|0|above 0 A", "LOAD|5 V|V",
            "RAIL|x|x",
            "SIDE|middle|high or low", "ZONE|stern|port, starboard", "RELEASE|14..14|two currents",
            "SOURCE|loud|any, supply, quiet", "SOURCE|tap x|no tap", "READING_AT_LOAD|1|below 100 %",
            "DIVERSITY|2|0 to 100 %", "NAME|bilge pump|already", "NAME|''|needs a name", "LOAD|1e999|too large"})
    void refusesWithAReason(ChannelField field, String typed, String reason) {
        assertThat(field.read(typed, channel, board).ifProblem().orElse("")).contains(reason);
    }

    @Test
    void keepsEverythingElseOfTheChannel() {
        Channel pinned = read(ChannelField.PINNED_AMPLIFIER, "AMP").orElseThrow();
        assertThat(pinned.withPins(channel.pins())).isEqualTo(channel);
        Channel loaded = read(ChannelField.LOAD, "13").orElseThrow();
        assertThat(loaded.withCurrents(channel.currents())).isEqualTo(channel);
    }

    @ParameterizedTest
    @EnumSource(ChannelField.class)
    void keepsTheCalibration(ChannelField field) {
        Calibration calibration = new Calibration(Calibration.Points.TWO, OptionalDouble.of(1), OptionalDouble.empty(),
                1e-3, Range.of(18, 28));
        Channel calibrated = channel.withReading(new Channel.ReadingDemand(OptionalDouble.of(0.1),
                OptionalDouble.of(0.02), Optional.of(calibration)));

        assertThat(field.read(field.text(calibrated), calibrated, board).ifValue()).contains(calibrated);
    }
}
