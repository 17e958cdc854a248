package shuntwright.io.boardfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.io.json.Problem;

/** Each broken board file is refused with the place, and with words that name what is allowed. */
class BadBoardFilesTest {
    private static List<Problem> problems(String text) {
        return BoardFiles.parse("bad.board.json", text).problems();
    }

    /** A board whose line 3 holds the given members, from column 1. */
    private static String board(String members) {
        return "{\"format\": \"shuntwright board 1\",\n\"name\": \"x\",\n" + members + "}";
    }

    /** A board whose line 3 holds one channel with the given members, from column 1. */
    private static String channel(String members) {
        return "{\"format\": \"shuntwright board 1\", \"name\": \"x\",\n\"channels\": [{\"name\": \"a\",\n" + members
                + "}]}";
    }

    static Stream<Arguments> brokenValues() {
        return Stream.of(
                arguments(channel("\"load\": \"35 V\""), 9, "channels[0].load", "current"),
                arguments(channel("\"load\": \"-3 A\""), 9, "channels[0].load", "at least 0 A"),
                arguments(channel("\"load\": -3"), 9, "channels[0].load", "at least 0 A"),
                arguments(channel("\"load\": \"NaN\""), 9, "channels[0].load", "A"),
                arguments(channel("\"load\": 1e999"), 9, "channels[0].load", "larger than"),
                arguments(channel("\"load\": null"), 9, "channels[0].load", "a current is needed here"),
                arguments(channel("\"load\": \"\""), 9, "channels[0].load", "current"),
                arguments(channel("\"load\": [\"3 A\"]"), 9, "channels[0].load", "not a list"),
                arguments(channel("\"noTrip\": \"0 A\""), 11, "channels[0].noTrip", "above 0 A"),
                arguments(channel("\"noTrip\": \"5 A\", \"mustTrip\": \"4 A\""), 30, "channels[0].mustTrip",
                        "must be above the no-trip current 5 A"),
                arguments(channel("\"noTrip\": \"5 A\", \"mustTrip\": \"5 A\""), 30, "channels[0].mustTrip",
                        "must be above the no-trip current 5 A"),
                arguments(channel("\"noTrip\": 5, \"mustTrip\": 6, \"tripTarget\": 7"), 43, "channels[0].tripTarget",
                        "from noTrip 5 A to mustTrip 6 A"),
                arguments(channel("\"least\": 5, \"fullScale\": 4"), 10, "channels[0].least", "4 A"),
                arguments(channel("\"release\": \"34 .. 30 A\""), 12, "channels[0].release", "3"),
                arguments(channel("\"release\": \" .. \""), 12, "channels[0].release", "\"30 .. 34 A\""),
                arguments(channel("\"release\": \"later\""), 12, "channels[0].release", "\"latch\""),
                arguments(channel("\"release\": \"30 .. 30 A\""), 12, "channels[0].release", "is empty"),
                arguments(channel("\"release\": \"30 A\""), 12, "channels[0].release", "both 30 A"),
                arguments(channel("\"load\": " + "9".repeat(2000)), 9, "channels[0].load", "9… is larger than"),
                arguments(channel("\"load\": NaN"), 9, "channels[0].load", "NaN is not a number"),
                arguments(channel("\"load\": -Infinity"), 9, "channels[0].load", "-Infinity is not a number"),
                arguments(board("\"zones\": [{\"name\": \"a\\u001b[31m\"}]"), 20, "zones[0].name",
                        "control characters"),
                arguments(channel("\"release\": \"0 A\""), 12, "channels[0].release", "above 0 A"),
                arguments(channel("\"rail\": \"14 .. 12 .. 10 V\""), 9, "channels[0].rail", "14"),
                arguments(channel("\"readingAtLoad\": \"-1 %\""), 18, "channels[0].readingAtLoad", "above 0 %"),
                arguments(channel("\"diversity\": \"120 %\""), 14, "channels[0].diversity", "from 0 % to 100 %"),
                arguments(channel("\"side\": \"hihg\""), 9, "channels[0].side", "maybe \"high\" is meant"),
                arguments(channel("\"threshold\": \"tapcommon\""), 14, "channels[0].threshold", "\"tap NAME\""),
                arguments(channel("\"threshold\": \"tap common\""), 14, "channels[0].threshold", "no tap \"common\""),
                arguments(channel("\"threshold\": \"reference 2V5\""), 14, "channels[0].threshold",
                        "no reference \"2V5\""),
                arguments(channel("\"alertLine\": \"main\""), 14, "channels[0].alertLine", "no alert line \"main\""),
                arguments(channel("\"zone\": \"left\""), 9, "channels[0].zone", "no zone \"left\""),
                arguments(channel("\"withstand\": {}"), 14, "channels[0].withstand", "exactly one of"),
                arguments(channel("\"withstand\": {\"energy\": 5, \"curve\": [[2, 1], [1, 2]]}"), 37,
                        "channels[0].withstand.curve", "exactly one of"),
                arguments(channel("\"withstand\": {\"energy\": \"5 J\"}"), 25, "channels[0].withstand.energy", "I²t"),
                arguments(channel("\"withstand\": {\"curve\": [[1, 2]]}"), 24, "channels[0].withstand.curve",
                        "at least two points"),
                arguments(channel("\"withstand\": {\"curve\": [[1, 2], [2, 3]]}"), 24, "channels[0].withstand.curve",
                        "current must rise"),
                arguments(channel("\"inrush\": [[0, 1], [0, 2]]"), 11, "channels[0].inrush", "ascend"),
                arguments(channel("\"inrush\": [[0, 1, 2]]"), 12, "channels[0].inrush[0]", "[time, current]"),
                arguments(channel("\"pins\": {\"shuntCount\": 0}"), 24, "channels[0].pins.shuntCount", "from 1"),
                arguments(channel("\"pins\": {\"shuntCount\": \"2\"}"), 24, "channels[0].pins.shuntCount",
                        "without quotes"),
                arguments(channel("\"pins\": {\"dividerTop\": \"0 Ω\"}"), 24, "channels[0].pins.dividerTop",
                        "above 0 Ω"),
                arguments(channel("\"laod\": \"3 A\""), 1, "channels[0].laod", "maybe \"load\" is meant"),
                arguments(channel("\"zzzzzz\": \"3 A\""), 1, "channels[0].zzzzzz", "known are name, note, rail"),
                arguments(channel("\"load\": 1, \"load\": 2"), 12, "channels[0].load", "stands twice"),
                arguments(board("\"supply\": {\"voltage\": \"3.3 V ±-2 %\"}"), 23, "supply.voltage", "-2"),
                arguments(board("\"supply\": {\"voltage\": \"0 V\"}"), 23, "supply.voltage", "above 0 V"),
                arguments(board("\"supply\": \"3.3 V\""), 11, "supply", "voltage, availableCurrent"),
                arguments(board("\"ambient\": \"60 .. -20 °C\""), 12, "ambient", "-20"),
                arguments(board("\"ambient\": \"-300 °C .. 0 °C\""), 12, "ambient", "at least -273"),
                arguments(board("\"buildQuantity\": 0"), 18, "buildQuantity", "whole number from 1"),
                arguments(board("\"buildQuantity\": 2.5"), 18, "buildQuantity", "whole number from 1"),
                arguments(board("\"buildQuantity\": 3000000000"), 18, "buildQuantity", "whole number from 1"),
                arguments(board("\"acceptance\": {\"coverage\": \"100 %\"}"), 28, "acceptance.coverage",
                        "from 50 % to below 100 %"),
                arguments(board("\"rules\": {\"parallelShunts\": 9}"), 29, "rules.parallelShunts", "from 1 to 8"),
                arguments(board("\"adc\": {\"source\": \"supply\"}"), 8, "adc", "\"bits\" is missing"),
                arguments(board("\"adc\": {\"source\": \"R\", \"bits\": 12}"), 19, "adc.source", "known are supply"),
                arguments(board("\"references\": [{\"name\": \"supply\", \"part\": \"p\"}]"), 25, "references[0].name",
                        "another name"),
                arguments(board("\"taps\": [{\"name\": \"t\", \"source\": \"other\"}]"), 34, "taps[0].source",
                        "no source \"other\""),
                arguments(board("\"taps\": [{\"name\": \"t\", \"divider\": {}, \"dac\": {\"bits\": 8}}]"), 46,
                        "taps[0].dac", "either a divider or a DAC"),
                arguments(board("\"alertLines\": [{\"name\": \"l\", \"inputHigh\": 1, \"inputLow\": 2}]"), 58,
                        "alertLines[0].inputLow", "below inputHigh"),
                arguments(board("\"zones\": [{\"name\": \"z\"}, {\"name\": \"z\"}]"), 35, "zones[1].name",
                        "first in line 3"),
                arguments(board("\"channels\": [{\"name\": \"a\"}, {\"name\": \"a\"}]"), 38, "channels[1].name",
                        "the channel \"a\" stands twice"),
                arguments(board("\"channels\": [{\"name\": \" a\"}]"), 23, "channels[0].name", "no blanks"),
                arguments(board("\"channels\": [{\"load\": 1}]"), 14, "channels[0]", "\"name\" is missing"),
                arguments(board("\"channels\": {\"a\": 1}"), 13, "channels", "a list [ … ] is needed"),
                arguments(board("\"parts\": [1]"), 11, "parts[0]", "a name"),
                arguments(board("\"heatLimit\": true"), 14, "heatLimit", "not true"));
    }

    @ParameterizedTest
    @MethodSource("brokenValues")
    void aBrokenValueIsRefusedWithItsPlace(String text, int column, String path, String words) {
        List<Problem> problems = problems(text);

        assertThat(problems).hasSize(1);
        assertThat(problems.getFirst().toString()).startsWith("bad.board.json:3:" + column + " " + path + ": ");
        assertThat(problems.getFirst().message()).contains(words);
    }

    static Stream<Arguments> brokenSyntax() {
        return Stream.of(arguments("{\"a\": 1,}", 9, "remove the comma"),
                arguments("{\"a\": [1,]}", 10, "remove the comma"),
                arguments("{'a': 1}", 2, "double quotes"),
                arguments("{a: 1}", 2, "double quotes"), arguments("{\"a\": 1 \"b\": 2}", 9, "a comma"),
                arguments("{\"a\" 1}", 6, "a colon"), arguments("{\"a\": 1", 8, "ends too early"),
                arguments("{\"a\": \"x", 9, "closing quote"), arguments("{\"a\": \"x\ny\"}", 9, "closing quote"),
                arguments("{\"a\": 35 A}", 10, "\"35 A\""), arguments("{\"a\": 01}", 8, "no leading zero"),
                arguments("{\"a\": tru}", 7, "\"tru\""), arguments("{\"a\": 1} x", 10, "\"x\""),
                arguments("{\"a\": 1} {}", 10, "more text after the end"), arguments("// a\n{}", 1, "comments"),
                arguments("{\"a\": \"\\q\"}", 9, "backslash"), arguments("{\"a\": [1}", 9, "does not match"),
                arguments("{\"a\": ,}", 7, "a value is missing"),
                arguments("[".repeat(65) + "]".repeat(65), 65, "more than 64 deep"));
    }

    @ParameterizedTest
    @MethodSource("brokenSyntax")
    void aSyntaxErrorHasItsPlaceAndPlainWords(String text, int column, String words) {
        List<Problem> problems = problems(text);

        assertThat(problems).hasSize(1);
        assertThat(problems.getFirst().line()).isEqualTo(1);
        assertThat(problems.getFirst().column()).isEqualTo(column);
        assertThat(problems.getFirst().message()).contains(words).doesNotContain("Source", "Feature", "CTRL");
    }

    @Test
    void everyProblemIsListedInTheOrderOfTheFile() {
        List<Problem> problems = problems("""
                {
                  "format": "shuntwright board 1",
                  "colour": "red",
                  "supply": {"voltage": "3.3 A"},
                  "taps": [{"name": "t", "voltage": "-1 V"}],
                  "channels": [
                    {"name": "a", "load": "35 V", "noTrip": 5, "mustTrip": 4, "threshold": "tap t"},
                    {"name": "a", "zone": "nowhere"}
                  ]
                }
                """);

        assertThat(problems).extracting(Problem::line).containsExactly(1, 3, 4, 5, 7, 7, 8, 8);
        assertThat(problems).extracting(Problem::path).containsExactly("", "colour", "supply.voltage",
                "taps[0].voltage", "channels[0].load", "channels[0].mustTrip", "channels[1].name", "channels[1].zone");
    }

    static Stream<Arguments> wrongFormats() {
        return Stream.of(arguments("{\"format\": \"shuntwright parts 1\"}", "this is a parts file"),
                arguments("{\"format\": \"shuntwright board 2\"}",
                        "version 2 of the board file is not known; known is version 1"),
                arguments("{\"format\": \"other\"}", "\"shuntwright board 1\""),
                arguments("{\"format\": 1}", "\"shuntwright board 1\""),
                arguments("{\"name\": \"x\"}", "\"format\" is missing"), arguments("[]", "one object"));
    }

    @ParameterizedTest
    @MethodSource("wrongFormats")
    void aFileOfAnotherFormatHasThatOneProblem(String text, String words) {
        assertThat(problems(text)).hasSize(1);
        assertThat(problems(text).getFirst().message()).contains(words);
    }

    @Test
    void aHalfFilledBoardOpens() {
        assertThat(problems(board("\"channels\": [{\"name\": \"a\"}, {\"name\": \"b\", \"mustTrip\": \"3 A\"}]")))
                .isEmpty();
    }
}
