package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.workplace.Workplace;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;

/** Planning and checking the demo board, one of whose channels asks for more than can be promised. */
class BoardCommandsTest {
    @TempDir
    private static Path folder = Path.of("");
    private static Plan plan = PlanFixture.plan();
    private static Path easy = Path.of("");

    @BeforeAll
    static void planOnce() {
        Workplace wren = Workplace.open(Run.WREN, List.of()).ifOpened().orElseThrow();
        Plan chosen = new BoardPlanner().plan(wren.board(), wren.catalogue(), Progress.SILENT);
        plan = new BoardSampler(1).sample(chosen, wren.board().uncertainty().sampling(), BoardSampler.Depth.FULL,
                Progress.SILENT);
        easy = folder.resolve("easy.board.json");
        List<String> accepted = plan.channels().stream().filter(ChannelPlan::accepted)
                .map(each -> each.channel().name()).toList();
        Board board = wren.board().withChannels(
                wren.board().channels().stream().filter(each -> accepted.contains(each.name())).limit(2).toList());
        BoardFiles.save(PartsPaths.moved(board, Run.WREN, List.of(), easy), easy);
    }

    @Test
    void the_table_has_every_channel_with_its_verdict() {
        Run run = Run.of("plan", Run.WREN);

        assertThat(run.err()).isEmpty();
        assertThat(plan.channels()).hasSize(8);
        for (ChannelPlan each : plan.channels()) {
            assertThat(run.out().lines()).anySatisfy(line -> assertThat(line).startsWith(each.channel().name() + " ")
                    .contains("  " + each.verdict().word()));
        }
    }

    @Test
    void a_channel_that_is_not_accepted_shows_in_the_exit_code() {
        assertThat(plan.accepted()).isFalse();
        assertThat(Run.of("plan", Run.WREN).code()).isEqualTo(1);
    }

    @Test
    void a_board_of_accepted_channels_exits_with_zero() {
        Run run = Run.of("plan", easy);

        assertThat(run.out()).contains("2 of 2 channels accepted");
        assertThat(run.code()).isZero();
    }

    @Test
    void json_is_the_plan_file_and_nothing_else() throws IOException {
        Path file = folder.resolve("wren.plan.json");

        Run run = Run.of("plan", Run.WREN, "--json", "--plan", file);

        assertThat(run.err()).isEmpty();
        assertThat(run.out()).isEqualTo(new String(PlanFile.bytes(plan), StandardCharsets.UTF_8));
        assertThat(file).hasContent(run.out());
        assertThat(run.code()).isEqualTo(1);
    }

    @Test
    void outputs_are_written_and_named() {
        Path workbook = folder.resolve("wren.xlsx");
        Path file = folder.resolve("out.plan.json");

        Run run = Run.of("plan", Run.WREN, "--workbook", workbook, "--plan", file);

        assertThat(run.out()).contains("Written: " + workbook, "Written: " + file);
        assertThat(workbook).isNotEmptyFile();
        assertThat(file).isNotEmptyFile();
    }

    @Test
    void the_pinned_board_checks_as_it_was_planned_from_wherever_it_stands() throws IOException {
        Path pinned = Files.createDirectory(folder.resolve("deeper")).resolve("pinned.board.json");

        Run planned = Run.of("plan", easy, "--trials", "20000", "--pinned", pinned);
        Run checked = Run.of("check", pinned, "--trials", "20000");

        assertThat(checked.err()).isEmpty();
        assertThat(checked.code()).isZero();
        assertThat(table(checked)).isEqualTo(table(planned)).hasSize(3);
    }

    @Test
    void the_table_says_what_was_sampled() {
        Run run = Run.of("plan", easy, "--trials", "20000", "--seed", "9", "--coverage", "95 %");

        assertThat(run.out()).contains("20,000 trials of each channel, seed 9", "95 % of trips")
                .containsPattern("boards with every circuit inside +(above|0\\.\\d+)");
    }

    @Test
    void without_sampling_there_is_none_of_it() {
        Run run = Run.of("plan", easy, "--no-sampling");

        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("not sampled").doesNotContain("trials of each channel", "boards with");
    }

    @Test
    void the_same_seed_gives_the_same_bytes_and_another_does_not() {
        Run first = Run.of("plan", easy, "--trials", "20000", "--seed", "9", "--json");
        Run again = Run.of("plan", easy, "--trials", "20000", "--seed", "9", "--json");
        Run other = Run.of("plan", easy, "--trials", "20000", "--seed", "10", "--json");

        assertThat(again.out()).isEqualTo(first.out());
        assertThat(other.out().replace("\"seed\": 10", "\"seed\": 9")).isNotEqualTo(first.out());
    }

    @Test
    void options_hold_for_the_run_and_not_for_the_pinned_board() {
        Path pinned = folder.resolve("own.board.json");

        Run run = Run.of("plan", easy, "--trials", "20000", "--coverage", "0.9", "--pinned", pinned);

        assertThat(run.err()).isEmpty();
        Board kept = Workplace.open(pinned, List.of()).ifOpened().orElseThrow().board();
        Board own = Workplace.open(easy, List.of()).ifOpened().orElseThrow().board();
        assertThat(kept.acceptance()).isEqualTo(own.acceptance());
        assertThat(kept.uncertainty()).isEqualTo(own.uncertainty());
    }

    @Test
    void a_channels_budget_is_printed_in_place_of_the_table() {
        Run run = Run.of("check", pinnedEasy(), "--trials", "20000", "--budget",
                plan.channels().getFirst().channel().name());

        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        assertThat(run.out()).startsWith(plan.channels().getFirst().channel().name() + ": ")
                .contains("Trip current: nominal", "sampled, symmetric", "shunt tolerance (shunt")
                .doesNotContain("channels accepted");
    }

    @Test
    void what_is_wanted_of_the_choice_decides_it() {
        Run cheap = Run.of("plan", easy, "--no-sampling", "--prefer", "least cost", "--rounds", "20");
        Run cool = Run.of("plan", easy, "--no-sampling", "--prefer", "least heat, least cost", "--rounds", "20");

        assertThat(cheap.out()).contains("chosen for  least cost\n")
                .containsPattern("search +[\\d.]+ m?s, \\d+ rounds?, seed");
        assertThat(cool.out()).contains("chosen for  least heat, then least cost\n");
        assertThat(build(cheap)).isLessThanOrEqualTo(build(cool));
    }

    private static double build(Run run) {
        String line = run.out().lines().filter(each -> each.startsWith("whole build: ")).findFirst().orElseThrow();
        return Double.parseDouble(line.substring("whole build: ".length(), line.indexOf(" EUR")).replace(",", ""));
    }

    @Test
    void a_front_of_a_real_board_leads_from_cool_to_cheap_and_its_plans_check() {
        Path out = folder.resolve("easy-front");

        Run run = Run.of("front", easy, "--points", "3", "--rounds", "20", "--out", out);

        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        List<Plan> plans = List.of(checked(out.resolve("front-01.board.json")),
                checked(out.resolve("front-02.board.json")));
        assertThat(heat(plans.get(0))).isLessThan(heat(plans.get(1)));
        assertThat(plans.get(0).buildCost()).isGreaterThan(plans.get(1).buildCost());
        assertThat(plans).allMatch(Plan::accepted);
    }

    private static Plan checked(Path board) {
        Workplace workplace = Workplace.open(board, List.of()).ifOpened().orElseThrow();
        return new BoardPlanner().check(workplace.board(), workplace.catalogue(), Progress.SILENT);
    }

    private static double heat(Plan checked) {
        return checked.channels().stream().mapToDouble(each -> each.solved().orElseThrow().heat()).sum();
    }

    @Test
    void other_choices_and_what_ifs_of_a_real_board_are_answered() {
        String channel = plan.channels().getFirst().channel().name();

        Run others = Run.of("others", easy, channel, "--most", "2", "--rounds", "10");
        Run whatIf = Run.of("what-if", easy, "--vary", "build quantity", "--from", "5", "--to", "50", "--steps", "2",
                "--rounds", "10");

        assertThat(others.err() + whatIf.err()).isEmpty();
        assertThat(others.out().lines()).anyMatch(line -> line.startsWith("now "))
                .anyMatch(line -> line.startsWith("1   ")).anyMatch(line -> line.startsWith("2   "));
        assertThat(whatIf.code()).isZero();
        assertThat(whatIf.out().lines()).anyMatch(line -> line.startsWith("5 boards") && line.contains(" EUR"))
                .anyMatch(line -> line.startsWith("50 boards") && line.contains(" EUR"));
    }

    private static Path pinnedEasy() {
        Path pinned = folder.resolve("easy-pinned.board.json");
        assertThat(Run.of("plan", easy, "--no-sampling", "--pinned", pinned).code()).isZero();
        return pinned;
    }

    private static List<String> table(Run run) {
        return run.out().lines().dropWhile(line -> !line.startsWith("channel ")).takeWhile(line -> !line.isEmpty())
                .toList();
    }

    @Test
    void checking_chooses_nothing() {
        Run run = Run.of("check", easy);

        assertThat(run.code()).isEqualTo(1);
        assertThat(run.out()).contains("not pinned");
    }
}
