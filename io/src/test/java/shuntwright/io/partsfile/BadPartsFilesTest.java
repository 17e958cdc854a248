package shuntwright.io.partsfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.io.json.Problem;
import shuntwright.parts.Catalogue;

/** The stored file with one thing changed is refused with words that name what is allowed. */
class BadPartsFilesTest {
    @TempDir
    Path folder;

    static Stream<Arguments> changes() {
        return Stream.of(arguments("\"4 mΩ\"", "\"4 MΩ\"", "shunts[0].resistance", "mΩ"),
                arguments("\"4 mΩ\"", "\"0 Ω\"", "shunts[0].resistance", "Ω"),
                arguments("\"R002\"", "\"2 V\"", "shunts[1].resistance", "resistance"),
                arguments("\"tolerance\": \"±1 %\",\n     \"temperatureCoefficient\": \"50",
                        "\"tolerance\": \"-1 %\",\n"
                                + "     \"temperatureCoefficient\": \"50",
                        "shunts[0].tolerance", "-1 %"),
                arguments("\"terminals\": \"two\"", "\"terminals\": \"four\"", "shunts[0].mountingResistance",
                        "leave mountingResistance out"),
                arguments("\"terminals\": \"two\"", "\"terminals\": \"three\"", "shunts[0].terminals",
                        "\"two\" or \"four\""),
                arguments("\"ratedTemperature\": \"70 °C\"", "\"ratedTemperature\": \"180 °C\"",
                        "shunts[0].maximumTemperature", "above ratedTemperature"),
                arguments("\"25 %\"", "\"125 %\"", "shunts[0].correlation", "from 0 % to 100 %"),
                arguments("\"25 %\"", "-0.1", "shunts[0].correlation", "from 0 % to 100 %"),
                arguments("\"±0.05 %\"", "\"100 %\"", "amplifiers[0].gainAgeing", "from 0 % to below 100 %"),
                arguments("\"±0.05 %\"", "\"0.05 V\"", "amplifiers[0].gainAgeing", "ratio"),
                arguments("[100, 0.31]", "[1, 0.31]", "shunts[0].prices", "start at 1 and ascend"),
                arguments("[1, 0.42]", "[2, 0.42]", "shunts[0].prices", "2 stands first"),
                arguments("[1, 0.42]", "[1, -0.42]", "shunts[0].prices[0][1]", "price of one piece"),
                arguments("\"pack\": 10", "\"pack\": 0", "shunts[0].pack", "whole number from 1"),
                arguments("\"EX-SH2K\"", "\"EX-SH4\"", "shunts[1].partNumber", "stands twice, first in f, line 6"),
                arguments("\"EX-REF25\"", "\"EX-SH4\"", "references[0].partNumber", "stands twice"),
                arguments("\"EX-SH4\"", "\"\"", "shunts[0].partNumber", "not empty"),
                arguments("\"survival\": \"26 V\"", "\"survival\": \"50 mV\"", "amplifiers[0].survival",
                        "not be below differential"),
                arguments("\"gain\": \"50 V/V\"", "\"gain\": 0", "amplifiers[0].gain", "above 0"),
                arguments("\"gain\": \"50 V/V\", ", "", "amplifiers[0]", "\"gain\" is missing: output volts"),
                arguments("\"gainDrift\"", "\"gaindrif\"", "amplifiers[0].gaindrif", "maybe \"gainDrift\" is meant"),
                arguments("\"supply\": \"2.7 .. 5.5 V\"", "\"supply\": \"5.5 .. 2.7 V\"", "amplifiers[0].supply",
                        "5.5"),
                arguments(", \"current\": \"10 µA ±5 %\"", "", "comparators[0].hysteresis", "\"current\" is missing"),
                arguments("\"positiveFeedback\"", "\"positiveFeedback\", \"current\": \"1 µA\"",
                        "comparators[1].hysteresis.current", "only the kind \"injectedCurrent\""),
                arguments("\"latched\"", "\"latched\", \"builtIn\": \"1 mV\"", "comparators[3].hysteresis.builtIn",
                        "no built-in hysteresis"),
                arguments("\"E96\"", "\"E97\"", "resistorSeries[0].series", "\"E96\""),
                arguments("\"10 Ω .. 1 MΩ\"", "\"1 MΩ .. 10 Ω\"", "resistorSeries[0].values", "Ω"),
                arguments("\"EUR\"", "\"euro\"", "currency", "\"EUR\""),
                arguments("shuntwright parts 1", "shuntwright board 1", "format", "this is a board file"));
    }

    @ParameterizedTest
    @MethodSource("changes")
    void aBrokenValueIsRefusedWithItsPlace(String from, String to, String path, String words) throws IOException {
        String good = PartsRoundTripTest.fixture();
        String bad = good.replace(from, to);
        assertThat(bad).isNotEqualTo(good);

        List<Problem> problems = PartsFiles.parse("f", bad).problems();

        Problem found = problems.stream().filter(each -> each.path().equals(path)).findFirst().orElseThrow();
        assertThat(found.message()).contains(words);
        assertThat(found.line()).isPositive();
        assertThat(found.column()).isPositive();
    }

    private Path file(String name, String currency, String... numbers) throws IOException {
        String series = String.join(",\n", Stream.of(numbers).map(number -> """
                {"partNumber": "%s", "series": "E24", "values": "1 .. 10 kΩ", "tolerance": "1 %%",
                 "temperatureCoefficient": "50 ppm/K", "power": "0.1 W"}""".formatted(number)).toList());
        return Files.writeString(folder.resolve(name),
                "{\"format\": \"shuntwright parts 1\", \"currency\": \"" + currency
                        + "\",\n\"resistorSeries\": [" + series + "]}");
    }

    @Test
    void severalFilesMakeOneCatalogue() throws IOException {
        Catalogue catalogue = PartsFiles.open(List.of(file("a.json", "EUR", "A", "B"), file("b.json", "EUR", "C")))
                .ifOpened().orElseThrow();

        assertThat(catalogue.currency()).isEqualTo("EUR");
        assertThat(catalogue.resistors()).extracting(each -> each.partNumber()).containsExactly("A", "B", "C");
        assertThat(PartsFiles.open(List.of()).ifOpened().orElseThrow().parts()).isEmpty();
    }

    @Test
    void problemsOfAllFilesComeTogether() throws IOException {
        List<Path> files = List.of(file("a.json", "EUR", "A", "B"), file("b.json", "USD", "C", "A"),
                folder.resolve("none.json"));

        List<Problem> problems = PartsFiles.open(files).problems();

        assertThat(problems).extracting(Problem::toString).satisfiesExactly(
                currency -> assertThat(currency).startsWith("b.json:1:").contains(
                        "the prices are in USD, but a.json has them in EUR"),
                number -> assertThat(number).startsWith("b.json:4:16 resistorSeries[1].partNumber: ")
                        .contains("\"A\" stands twice, first in a.json, line 2"),
                missing -> assertThat(missing).startsWith("none.json: there is no file"));
    }
}
