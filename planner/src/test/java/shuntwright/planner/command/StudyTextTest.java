package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

import shuntwright.board.Sampling;
import shuntwright.plan.Plan;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;

class StudyTextTest {
    private final Plan plan = StudyFixture.sampled();
    private final BoardStudy study = plan.study().orElseThrow();
    private final List<String> table = StudyText.channels(study);

    private String row(int channel) {
        String name = plan.channels().get(channel).channel().name();
        return table.stream().filter(line -> line.startsWith(name + " ")).findFirst().orElseThrow();
    }

    @Test
    void the_board_comes_first_with_the_yield_the_product_and_what_costs_most() {
        List<String> lines = PlanText.of(plan, false);

        assertThat(lines.subList(1, 6)).containsExactly(
                "sampled                             1,000,000 to 1,200,000 trials of each channel, seed 7",
                "boards with every circuit inside    0.9876 (95 %: 0.9874 to 0.988)",
                "claimed by the product of channels  0.9512",
                "shared inputs that cost most of it  ambient 0.0041 ±2e-4",
                "");
    }

    @Test
    void a_cost_that_may_be_chance_is_not_named() {
        BoardYield doubtful = new BoardYield(study.yield().inside(), study.yield().product(),
                List.of(new BoardYield.SharedCost("supply", 0.9878, 0.0002, 2e-4)));

        assertThat(StudyText.board(new BoardStudy(study.sampling(), study.channels(), doubtful))).last().asString()
                .endsWith("none that stands out from chance");
    }

    @Test
    void adaptive_trials_that_ended_early_are_said() {
        List<String> lines = StudyText
                .board(StudyFixture.study(plan, new Sampling.Trials.Adaptive(2, 2_000_000), false));

        assertThat(lines.getFirst()).endsWith("trials of each channel (adaptive), seed 7");
        assertThat(lines.get(1)).startsWith("not stable yet ").contains(plan.channels().get(0).channel().name(),
                plan.channels().get(1).channel().name(), "--trials")
                .doesNotContain(plan.channels().get(2).channel().name());
    }

    @Test
    void every_circuit_has_a_line_with_interval_probability_and_validity() {
        assertThat(table.getFirst()).matches("channel +99\\.73 % of trips +probability of being outside +JCGM 100");
        assertThat(row(0)).matches(".* 11\\.21 \\.\\. 11\\.79 A +below 3\\.7e-6 \\(95 %\\) +valid");
        assertThat(row(1)).matches(".* 2e-5 \\(95 %: 1\\.2e-5 to 3\\.05e-5\\) +not valid");
        assertThat(row(2)).matches(".* 0\\.0123 \\(95 %: 0\\.0121 to 0\\.0126\\) +valid");
        assertThat(table).noneMatch(line -> line.startsWith(plan.channels().get(3).channel().name()));
    }

    @Test
    void the_lines_fit_a_terminal_of_a_hundred_columns() {
        assertThat(table).allSatisfy(line -> assertThat(line.length()).as(line).isLessThanOrEqualTo(100));
    }

    @Test
    void a_plan_that_was_not_sampled_says_so() {
        assertThat(PlanText.of(PlanFixture.plan(), false).get(1)).startsWith("not sampled");
    }

    @Test
    void a_board_without_a_circuit_has_no_table() {
        BoardStudy none = new BoardStudy(study.sampling(), List.of(), study.yield());

        assertThat(StudyText.channels(none)).isEmpty();
        assertThat(StudyText.board(none)).singleElement().asString().contains("no circuit");
    }

    @Test
    void a_product_of_which_nothing_failed_is_a_bound() {
        BoardStudy sure = new BoardStudy(study.sampling(), study.channels(),
                new BoardYield(study.yield().inside(), 1, List.of()));

        assertThat(StudyText.board(sure).get(2)).contains("product of channels").contains("above 1 - 0.013");
    }
}
