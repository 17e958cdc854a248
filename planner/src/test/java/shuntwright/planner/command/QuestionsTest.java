package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.assertj.core.api.InstanceOfAssertFactories;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Objective;
import shuntwright.io.planfile.AnswerFile;
import shuntwright.io.planfile.Cautions;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.workplace.Workplace;
import shuntwright.plan.WhatIf;

/** The commands front, others and what-if, with answers put together by hand. */
class QuestionsTest {
    @TempDir
    private Path folder = Path.of("");

    private final ChoiceFixture.Asked solver = new ChoiceFixture.Asked();

    private Run run(Object... args) {
        return Run.with(solver, args);
    }

    @Test
    void a_front_has_a_line_for_each_plan_and_one_for_the_board_as_it_is() {
        Run run = run("front", Run.WREN);

        assertThat(run.err()).isEmpty();
        assertThat(solver.heard).containsExactly(Objective.LEAST_HEAT, Objective.LEAST_COST, 9);
        assertThat(run.out().lines().toList()).first().asString()
                .startsWith("Instrument sledge Wren: least heat against least cost, 2 plans of the whole board, ");
        assertThat(run.out().lines().map(line -> line.replaceAll(" {2,}", "|")))
                .containsSubsequence(
                        "plan|least heat|least cost|from bound|whole build|part numbers|all accepted",
                        "1|1.8 W|1,250.00 EUR|4 %|0.00 EUR|0|no", "2|2.25 W|1,100.00 EUR|proven|0.00 EUR|0|no",
                        "now|1.8 W|1,250.00 EUR|-|0.00 EUR|0|no");
        assertThat(run.out()).contains("sampled", "may lie between", Cautions.LINE);
        assertThat(run.code()).as("not every plan is accepted").isEqualTo(1);
    }

    @Test
    void objectives_and_points_can_be_chosen() {
        run("front", Run.WREN, "--of", "Fewest  parts", "--against", "widest margin", "--points", "2");

        assertThat(solver.heard).containsExactly(Objective.FEWEST_PARTS, Objective.WIDEST_MARGIN, 2);
    }

    @Test
    void the_plans_of_a_front_are_written_and_can_be_taken_up() throws IOException {
        Path out = folder.resolve("wren-front");

        Run run = run("front", Run.WREN, "--out", out, "--rounds", "7");

        assertThat(run.err()).isEmpty();
        assertThat(run.out().lines().filter(line -> line.startsWith("Written: "))).hasSize(4);
        assertThat(Files.readAllBytes(out.resolve("front-02.plan.json"))).isEqualTo(
                PlanFile.bytes(ChoiceFixture.front(Objective.LEAST_HEAT, Objective.LEAST_COST).points().get(1).plan()));
        var reading = Workplace.open(out.resolve("front-01.board.json"), List.of());
        assertThat(reading.problems()).isEmpty();
        Workplace taken = reading.ifOpened().orElseThrow();
        assertThat(taken.board().channels().getFirst().pins().shunt()).isPresent();
        assertThat(taken.board().preference()).as("options are for the run")
                .isEqualTo(PlanFixture.board().preference());
    }

    @Test
    void nothing_that_is_there_is_replaced() throws IOException {
        Path there = Files.writeString(folder.resolve("front-03.board.json"), "mine");

        Run run = run("front", Run.WREN, "--out", folder);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("front-03.board.json", "would be replaced", "empty folder");
        assertThat(solver.heard).as("no work is done").isEmpty();
        assertThat(there).hasContent("mine");
    }

    @Test
    void a_place_that_is_no_folder_is_refused() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "");

        assertThat(run("front", Run.WREN, "--out", file).err()).contains("--out", "is a file", "name a folder");
        assertThat(run("front", Run.WREN, "--out", folder.resolve("none").resolve("deeper")).err())
                .contains("--out", "there is no folder", "create it");
        assertThat(solver.heard).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({"--points, 1, from 2 to 50", "--points, 51, from 2 to 50", "--points, x, --points",
            "--of, least heet, maybe \"least heat\"", "--against, cheap, 'known are least heat, most even heat'",
            "--against, least heat, two different ones"})
    void a_wrong_front_is_refused(String option, String value, String said) {
        Run run = run("front", Run.WREN, option, value);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(option, said).doesNotContain("Exception");
        assertThat(solver.heard).isEmpty();
    }

    @Test
    void other_choices_stand_below_what_is_chosen_now() {
        Run run = run("others", Run.WREN, "Winch of the drill", "--most", "3");

        assertThat(run.err()).isEmpty();
        assertThat(solver.heard).containsExactly("Winch of the drill", 3);
        List<String> rows = run.out().lines().map(line -> line.replaceAll(" {2,}", "|")).toList();
        assertThat(rows).anyMatch(line -> line.startsWith("now|2 × 50 mΩ") && line.contains("|inside|")
                && line.endsWith("|1.8 W|proven|1,250.00 EUR|2 %|0.00 EUR|0|zone rear edge"));
        assertThat(rows).anyMatch(line -> line.startsWith("1|") && line.contains("|likely, not accepted|")
                && line.endsWith("|1.9 W|proven|1,300.00 EUR|5 %|1,300.00 EUR|13|none"));
        assertThat(rows).anyMatch(line -> line.startsWith("2|") && line.endsWith("|1,200.00 EUR|12|supply"));
        assertThat(run.out()).contains(Cautions.LINE);
        assertThat(run.code()).as("no other is accepted").isEqualTo(1);
    }

    @Test
    void an_unknown_channel_is_refused_with_the_nearest_one() {
        Run run = run("others", Run.WREN, "Winch of the dril");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("CHANNEL", "maybe \"Winch of the drill\"");
        assertThat(run("others", Run.WREN, "Winch of the drill", "--most", "0").err()).contains("--most", "1 to 50",
                "0");
        assertThat(run("others", Run.WREN).err()).contains("CHANNEL");
        assertThat(solver.heard).isEmpty();
    }

    @Test
    void what_if_has_a_line_for_each_value() {
        Run run = run("what-if", Run.WREN, "--vary", "zone rear edge heat limit", "--from", "100 mW", "--to", "0.3W",
                "--steps", "3");

        assertThat(run.err()).isEmpty();
        assertThat(solver.heard).startsWith(WhatIf.Varied.ZONE_HEAT_LIMIT, "rear edge").hasSize(3);
        assertThat(run.out()).contains("what if the zone rear edge heat limit changes; now 200 mW");
        assertThat(run.out().lines().map(line -> line.replaceAll(" {2,}", "|"))).containsSubsequence(
                "zone rear edge heat limit|whole build|each board|heat|part numbers",
                "100 mW|no choice was found that keeps to every shared limit",
                "200 mW|1,200.00 EUR|200.00 EUR|612.5 mW|11", "300 mW|1,200.00 EUR|200.00 EUR|612.5 mW|11");
        assertThat(run.out()).contains("least heat, then least cost", Cautions.LINE);
        assertThat(run.code()).isZero();
    }

    @Test
    void boards_are_whole_and_each_number_comes_once() {
        run("what-if", Run.WREN, "--vary", "build quantity", "--from", "1", "--to", "4", "--steps", "9");

        assertThat(solver.heard).containsExactly(WhatIf.Varied.BUILD_QUANTITY, "", List.of(1.0, 2.0, 3.0, 4.0));
    }

    @Test
    void both_ends_are_among_the_values() {
        run("what-if", Run.WREN, "--vary", "supply current", "--from", "10mA", "--to", "70mA", "--steps", "4");

        assertThat(solver.heard.getLast()).asInstanceOf(InstanceOfAssertFactories.LIST).hasSize(4)
                .startsWith(0.01).endsWith(0.07);
    }

    @ParameterizedTest
    @CsvSource({"heat, 1W, 2W, 9, zone NAME heat limit", "zone reer edge heat limit, 1W, 2W, 9, maybe \"rear edge\"",
            "heat limit, 2W, 1W, 9, must be below", "heat limit, 1W, 1W, 9, must be below",
            "heat limit, 0W, 1W, 9, above 0 W", "heat limit, 1A, 2W, 9, --from", "heat limit, 1W, lots, 9, --to",
            "supply current, -1A, 2A, 9, above 0 A", "build quantity, 0, 10, 9, from 1 to 10000000",
            "build quantity, 1.5, 10, 9, from 1 to 10000000", "heat limit, 1W, 2W, 1, from 2 to 100",
            "heat limit, 1W, 2W, 101, from 2 to 100"})
    void a_wrong_what_if_is_refused(String vary, String from, String to, int steps, String said) {
        Run run = run("what-if", Run.WREN, "--vary", vary, "--from", from, "--to", to, "--steps", steps);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(said).doesNotContain("Exception");
        assertThat(solver.heard).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"--vary", "--from", "--to"})
    void what_if_needs_to_know_what_changes(String option) {
        assertThat(run("what-if", Run.WREN).err()).contains(option);
    }

    @Test
    void json_is_the_answer_and_nothing_else() {
        String front = run("front", Run.WREN, "--json").out();
        String others = run("others", Run.WREN, "Winch of the drill", "--json").out();

        assertThat(front.getBytes(StandardCharsets.UTF_8)).isEqualTo(AnswerFile.front(
                ChoiceFixture.plan(), ChoiceFixture.front(Objective.LEAST_HEAT, Objective.LEAST_COST)));
        assertThat(others.getBytes(StandardCharsets.UTF_8))
                .isEqualTo(AnswerFile.others(ChoiceFixture.plan(), "Winch of the drill", ChoiceFixture.others()));
        assertThat(run("what-if", Run.WREN, "--vary", "heat limit", "--from", "1W", "--to", "2W", "--json").out())
                .startsWith("{\n  \"format\" : \"shuntwright what-if 1\"").endsWith("}\n");
    }

    @ParameterizedTest
    @ValueSource(strings = {"front", "others", "what-if"})
    void a_missing_board_is_named(String command) {
        Path none = folder.resolve("none.board.json");
        Run run = switch (command) {
            case "front" -> run("front", none);
            case "others" -> run("others", none, "Pump");
            default -> run("what-if", none, "--vary", "heat limit", "--from", "1W", "--to", "2W");
        };

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("none.board.json", "there is no file");
    }
}
