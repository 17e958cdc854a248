package shuntwright.io.workplace;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import shuntwright.io.json.Problem;
import shuntwright.parts.Catalogue;

class WorkplaceTest {
    @TempDir
    Path folder;

    private Path board(String parts, String more) throws IOException {
        return Files.writeString(folder.resolve("b.board.json"),
                "{\"format\": \"shuntwright board 1\", \"name\": \"b\",\n\"parts\": [" + parts + "]" + more + "}");
    }

    private static String shunt(String number) {
        return """
                {"partNumber": "%s", "description": "a metal strip", "resistance": "4 mΩ", "tolerance": "±1 %%",
                 "temperatureCoefficient": "50 ppm/K", "ageing": "0.5 %%", "terminals": "two", "thermalEmf": "3 µV/K",
                 "mountingResistance": "0.1 .. 0.3 mΩ", "power": "2 W", "maximumTemperature": "170 °C",
                 "thermalResistance": "45 K/W", "pulseEnergy": "0.8 J", "body": "2512",
                 "prices": [[1, 0.42], [10, 0.40], [100, 0.31], [1000, 0.2]], "pack": 10, "minimumOrder": 20}"""
                .formatted(number);
    }

    private Path parts(String name, List<String> shunts) throws IOException {
        return Files.writeString(folder.resolve(name), "{\"format\": \"shuntwright parts 1\", \"currency\": \"EUR\",\n"
                + "\"shunts\": [" + String.join(",\n", shunts) + "]}");
    }

    @Test
    void partsFilesAreFoundBesideTheBoardAndReadOnce() throws IOException {
        Files.createDirectory(folder.resolve("parts"));
        Path extra = parts("parts/a.json", List.of(shunt("A")));
        parts("c.json", List.of(shunt("C")));

        Catalogue catalogue = Workplace
                .open(board("\"parts/a.json\", \"./parts/../parts/a.json\", \"c.json\"", ""), List.of(extra)).ifOpened()
                .orElseThrow().catalogue();

        assertThat(catalogue.shunts()).hasSize(2);
    }

    @Test
    void unknownPartNumbersDoNotRefuseTheBoard() throws IOException {
        Path board = board("", ", \"references\": [{\"name\": \"r\", \"part\": \"NOWHERE\"}],"
                + "\"channels\": [{\"name\": \"a\", \"pins\": {\"shunt\": \"NOWHERE\"}}]");

        assertThat(Workplace.open(board, List.of()).problems()).isEmpty();
    }

    @Test
    void problemsOfBoardAndPartsComeTogether() throws IOException {
        parts("a.json", List.of(shunt("A"), shunt("A")));

        List<Problem> problems = Workplace
                .open(board("\"a.json\", \"none.json\", \"a\\u0000b\"", ", \"colour\": 1"), List.of()).problems();

        assertThat(problems).extracting(Problem::file).contains("b.board.json", "a.json");
        assertThat(problems).extracting(Problem::path).containsExactly("parts[1]", "parts[2]", "colour",
                "shunts[1].partNumber");
    }

    @Test
    void aLargeBoardAndCatalogueOpenQuickly() throws IOException {
        List<String> shunts = new ArrayList<>();
        for (int i = 0; i < 5000; i++) {
            shunts.add(shunt("EX-" + i));
        }
        parts("a.json", shunts);
        List<String> channels = new ArrayList<>();
        for (int i = 0; i < 64; i++) {
            channels.add("{\"name\": \"" + i + "\", \"rail\": \"12 V ±5 %\", \"load\": \"8 A\", \"noTrip\": \"12 A\","
                    + "\"mustTrip\": \"16 A\", \"inrush\": [[\"0 s\", \"0 A\"], [\"1 ms\", \"40 A\"]]}");
        }
        Path board = board("\"a.json\"", ", \"channels\": [" + String.join(",", channels) + "]");

        ThreadMXBean clock = ManagementFactory.getThreadMXBean();
        Duration best = Duration.ofHours(1);
        for (int i = 0; i < 4; i++) {
            long start = clock.getCurrentThreadCpuTime();
            Workplace workplace = Workplace.open(board, List.of()).ifOpened().orElseThrow();
            Duration taken = Duration.ofNanos(clock.getCurrentThreadCpuTime() - start);
            best = taken.compareTo(best) < 0 ? taken : best;

            assertThat(workplace.board().channels()).hasSize(64);
            assertThat(workplace.catalogue().shunts()).hasSize(5000);
        }

        // Time of this thread, and the best of a few, because other work of the machine is no property of the program.
        assertThat(best).isLessThan(Duration.ofMillis(800));
    }
}
