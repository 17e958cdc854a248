package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;

import shuntwright.plan.Plan;

class BudgetTextTest {
    private final Plan plan = StudyFixture.sampled();
    private final List<String> lines = BudgetText.of(plan, plan.channels().get(1), false);

    private String line(String start) {
        return lines.stream().filter(each -> each.strip().startsWith(start)).findFirst().orElseThrow();
    }

    @Test
    void the_verdict_comes_first_and_the_caution_last() {
        assertThat(lines.getFirst()).isEqualTo(plan.channels().get(1).channel().name() + ": likely, not accepted");
        assertThat(lines.getLast()).contains("Verify by test");
    }

    @Test
    void the_three_readers_stand_below_each_other() {
        assertThat(line("limits")).contains("11.25 .. 14.5 A", "inside");
        assertThat(line("combined uncertainty")).contains("k = 3.00", "standard uncertainty 100 mA");
        assertThat(line("sampled, symmetric")).contains("11.21 .. 11.79 A", "1 mA and 2 mA");
        assertThat(line("sampled, shortest")).contains("11.2 .. 11.78 A", "3 mA and 4 mA");
        assertThat(line("outside")).contains("2e-5 (95 %: 1.2e-5 to 3.05e-5)", "weighted");
        assertThat(line("JCGM 101, clause 8")).contains("not valid", "1.5 mA and 200 µA", "tolerance 500 µA");
    }

    @Test
    void each_input_has_its_part_of_all_three() {
        assertThat(line("input")).contains("low limit", "high limit", "of u_c²", "first order", "total");
        assertThat(line("sense supply (supply)")).containsSubsequence("-200 mA", "+210 mA", "70.0 %", "70.0 ±0.3 %",
                "71.0 ±0.2 %");
        assertThat(line("shunt tolerance (shunt 1)")).containsSubsequence("-100 mA", "+110 mA", "28.0 %",
                "28.0 ±0.2 %", "28.1 ±0.1 %");
    }

    @Test
    void an_input_without_an_index_shows_none() {
        assertThat(line("thermal EMF of the shunt (shunt 1)")).matches(".*2\\.0 % +- +-");
    }

    @Test
    void what_would_round_to_nothing_is_said_to_be_little() {
        assertThat(line("amplifier offset (amplifier)")).matches(".* < 0\\.1 % +< 0\\.1 % +0\\.1 %");
    }

    @Test
    void trials_without_a_value_are_said() {
        assertThat(BudgetText.of(plan, plan.channels().get(2), false)).anySatisfy(
                each -> assertThat(each).contains("thermal runaway", "in 12", "counted as outside"));
        assertThat(lines).noneMatch(each -> each.contains("runaway"));
    }

    @Test
    void without_sampling_two_readers_remain() {
        Plan plain = new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), plan.alerts(), plan.taps(),
                plan.references(), plan.parts(), plan.findings(), plan.choice(), Optional.empty());
        List<String> two = BudgetText.of(plain, plain.channels().get(1), false);

        assertThat(two).noneMatch(each -> each.contains("sampled") || each.contains("first order"))
                .anyMatch(each -> each.contains("sense supply (supply)"));
    }

    @Test
    void a_channel_without_a_circuit_has_no_budget() {
        assertThat(BudgetText.of(plan, plan.channels().get(3), false)).anyMatch(each -> each.contains("no circuit"));
    }
}
