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

/** What a board file says of uncertainty, calibration and warm zones is refused with its place where it makes no sense. */
class BadUncertaintyTest {
    private static List<Problem> problems(String members) {
        return BoardFiles.parse("bad.board.json", "{\"format\": \"shuntwright board 1\",\n\"name\": \"x\",\n" + members
                + "}").problems();
    }

    private static String uncertainty(String members) {
        return "\"uncertainty\": {" + members + "}";
    }

    private static String stated(String members) {
        return uncertainty("\"distributions\": [{" + members + "}]");
    }

    private static String calibration(String members) {
        return "\"channels\": [{\"name\": \"a\", \"calibration\": {" + members + "}}]";
    }

    static Stream<Arguments> trials() {
        return Stream.of(
                arguments("\"trials\": 9999", "uncertainty.trials", "from 10000 to 100000000"),
                arguments("\"trials\": 100000001", "uncertainty.trials", "from 10000 to 100000000"),
                arguments("\"trials\": 10000.5", "uncertainty.trials", "whole number"),
                arguments("\"trials\": \"adaptiv\"", "uncertainty.trials", "allowed is \"adaptive\""),
                arguments("\"trials\": \"1000000\"", "uncertainty.trials", "without quotes"),
                arguments("\"trials\": \"adaptive\", \"digits\": 3", "uncertainty.digits", "from 1 to 2"),
                arguments("\"trials\": \"adaptive\", \"mostTrials\": 100", "uncertainty.mostTrials", "from 10000"),
                arguments("\"trials\": 20000, \"digits\": 2", "uncertainty.digits", "only adaptive trials have"),
                arguments("\"digits\": 2", "uncertainty.digits", "set \"trials\" to \"adaptive\""),
                arguments("\"mostTrials\": 20000", "uncertainty.mostTrials", "only adaptive trials have"),
                arguments("\"seed\": 1.5", "uncertainty.seed", "whole number"),
                arguments("\"seed\": 1e300", "uncertainty.seed", "whole number of at most 18 digits"),
                arguments("\"seed\": 9223372036854775808", "uncertainty.seed", "at most 18 digits"),
                arguments("\"seed\": NaN", "uncertainty.seed", "NaN"),
                arguments("\"seed\": \"1\"", "uncertainty.seed", "without quotes"),
                arguments("\"sead\": 1", "uncertainty.sead", "maybe \"seed\" is meant"));
    }

    static Stream<Arguments> distributions() {
        String path = "uncertainty.distributions[0]";
        String input = "\"input\": \"shunt tolerance\", \"distribution\": ";
        return Stream.of(
                arguments(input + "\"normal\"", path, "\"k\" is missing: the distribution \"normal\" needs how many"),
                arguments(input + "\"t\", \"k\": 2", path, "\"degreesOfFreedom\" is missing"),
                arguments(input + "\"t\", \"degreesOfFreedom\": 9", path, "\"k\" is missing"),
                arguments(input + "\"trapezoid\"", path, "\"ratio\" is missing"),
                arguments(input + "\"uniform\", \"k\": 3", path + ".k", "\"uniform\" has no \"k\"; remove it"),
                arguments(input + "\"triangular\", \"ratio\": 0.5", path + ".ratio", "\"triangular\" has no \"ratio\""),
                arguments(input + "\"arcsine\", \"degreesOfFreedom\": 5", path + ".degreesOfFreedom", "has no"),
                arguments(input + "\"normal\", \"k\": 3, \"ratio\": 0.5", path + ".ratio",
                        "\"normal\" has no \"ratio\""),
                arguments(input + "\"normal\", \"k\": 0", path + ".k", "above 0"),
                arguments(input + "\"normal\", \"k\": \"3\"", path + ".k", "without quotes"),
                arguments(input + "\"trapezoid\", \"ratio\": \"101 %\"", path + ".ratio", "from 0 % to 100 %"),
                arguments(input + "\"t\", \"k\": 2, \"degreesOfFreedom\": 2", path + ".degreesOfFreedom", "above 2"),
                arguments(input + "\"gaussian\"", path + ".distribution", "\"normal\""),
                arguments(input + "\"norml\", \"k\": 3", path + ".distribution", "maybe \"normal\" is meant"),
                arguments("\"input\": \"shunt tolerance\"", path, "\"distribution\" is missing"),
                arguments("\"distribution\": \"uniform\"", path, "\"input\" is missing"),
                arguments(input + "\"uniform\", \"part\": \"\"", path + ".part", "not empty"));
    }

    static Stream<Arguments> inputs() {
        String path = "uncertainty.distributions[0].";
        String uniform = "\"distribution\": \"uniform\", ";
        return Stream.of(
                arguments(uniform + "\"input\": \"shunt tolerence\"", path + "input",
                        "there is no input \"shunt tolerence\"; maybe \"shunt tolerance\" is meant; the guide"),
                arguments(uniform + "\"input\": \"Gain Error\"", path + "input", "maybe \"gain error\" is meant"),
                arguments(uniform + "\"input\": \"rejection of anything\"", path + "input",
                        "maybe \"common-mode rejection\" or \"supply rejection\" is meant"),
                arguments(uniform + "\"input\": \"xyzzy plugh\"", path + "input",
                        "there is no input \"xyzzy plugh\"; the guide to the board file lists all inputs"),
                arguments(uniform + "\"input\": 3", path + "input", "such as \"shunt tolerance\" are needed here"),
                arguments(uniform + "\"input\": \"sense supply\", \"part\": \"EX-1\"", path + "part",
                        "\"sense supply\" is no property of a shunt"),
                arguments(uniform + "\"input\": \"reference tolerance\", \"part\": \"EX-1\"", path + "part",
                        "remove \"part\""));
    }

    static Stream<Arguments> calibrations() {
        String path = "channels[0].calibration";
        return Stream.of(
                arguments("\"uncertainty\": \"0.1 %\"", path, "\"points\" is missing"),
                arguments("\"points\": \"two\"", path, "\"uncertainty\" is missing"),
                arguments("\"points\": 2, \"uncertainty\": \"0.1 %\"", path + ".points", "\"one\" or \"two\""),
                arguments("\"points\": \"one\", \"uncertainty\": \"0.1 %\", \"lower\": \"1 A\"", path + ".lower",
                        "one point has no lower current"),
                arguments("\"points\": \"two\", \"uncertainty\": \"0.1 %\", \"lower\": \"4 A\", \"upper\": \"4 A\"",
                        path + ".lower", "below the upper one of 4 A"),
                arguments("\"points\": \"two\", \"uncertainty\": \"0.1 %\", \"upper\": \"0 A\"", path + ".upper",
                        "above 0 A"),
                arguments("\"points\": \"two\", \"uncertainty\": \"100 %\"", path + ".uncertainty",
                        "from 0 % to below 100 %"),
                arguments("\"points\": \"two\", \"uncertainty\": \"1 A\"", path + ".uncertainty", "ratio"),
                arguments("\"points\": \"two\", \"uncertainty\": 0, \"temperature\": \"-300 .. 20 °C\"",
                        path + ".temperature", "at least -273"));
    }

    static Stream<Arguments> all() {
        return Stream.of(trials().map(each -> in(each, BadUncertaintyTest::uncertainty)),
                distributions().map(each -> in(each, BadUncertaintyTest::stated)),
                inputs().map(each -> in(each, BadUncertaintyTest::stated)),
                calibrations().map(each -> in(each, BadUncertaintyTest::calibration)),
                Stream.of(arguments("\"zones\": [{\"name\": \"z\", \"thermalResistance\": \"0 K/W\"}]",
                        "zones[0].thermalResistance", "above 0 K/W"),
                        arguments("\"zones\": [{\"name\": \"z\", \"thermalResistance\": \"12 W\"}]",
                                "zones[0].thermalResistance", "thermal resistance")))
                .flatMap(each -> each);
    }

    private static Arguments in(Arguments inner, java.util.function.UnaryOperator<String> around) {
        return arguments(around.apply((String) inner.get()[0]), inner.get()[1], inner.get()[2]);
    }

    @ParameterizedTest
    @MethodSource("all")
    void isRefusedWithItsPlace(String members, String path, String words) {
        List<Problem> problems = problems(members);

        assertThat(problems).hasSize(1);
        assertThat(problems.getFirst().toString()).startsWith("bad.board.json:3:").contains(" " + path + ": ");
        assertThat(problems.getFirst().message()).contains(words);
    }

    @Test
    void aBrokenNumberOfTrialsIsNotBlamedOnWhatBelongsToAdaptiveOnes() {
        assertThat(problems(uncertainty("\"trials\": \"adaptve\", \"digits\": 1, \"mostTrials\": 20000")))
                .extracting(Problem::path).containsExactly("uncertainty.trials");
    }

    @Test
    void everyWordsOfAnInputAreTaken() {
        for (String row : BoardFiles.inputTable().split("\n")) {
            if (row.startsWith("| `")) {
                String words = row.substring(3, row.indexOf('`', 3));
                assertThat(problems(stated("\"input\": \"" + words + "\", \"distribution\": \"uniform\""))).isEmpty();
            }
        }
    }
}
