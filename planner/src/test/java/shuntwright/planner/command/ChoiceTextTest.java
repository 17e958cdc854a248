package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.Plan;

class ChoiceTextTest {
    private final Plan plan = ChoiceFixture.plan();
    private final List<String> lines = PlanText.of(plan, Optional.of(Duration.ofMillis(2140)), false);

    @Test
    void what_was_wanted_and_reached_stands_with_its_proof() {
        assertThat(lines).containsSubsequence("chosen for     least heat, then least cost",
                "least heat     1.8 W, proven best",
                "least cost     1,250.00 EUR, not proven best: nothing is better than 1,225.00 EUR, 2 % away",
                "among          12,345 ways to serve the channels, 420 of them compared for the whole board",
                "search         2.1 s, 300 rounds, seed 1", "limits broken  zone rear edge");
    }

    @Test
    void a_conflict_says_what_each_demand_would_have_to_be() {
        assertThat(lines).containsSubsequence("Cannot be met together",
                "  Zone rear edge may dissipate 200 mW; its channels need 250 mW at least.",
                "  zone rear edge              heat limit         200 mW → 250 mW would do",
                "  channel Winch of the drill  must-trip current  42 A; no value was found that would do alone",
                "  proven: without any one of these the others can be met");
    }

    @Test
    void a_checked_board_has_neither() {
        assertThat(PlanText.of(PlanFixture.plan(), false)).noneMatch(line -> line.startsWith("chosen for"))
                .noneMatch(line -> line.startsWith("Cannot be met"))
                .anyMatch(line -> line.equals("whole build: 0.00 EUR, 0 part numbers"));
    }

    @Test
    void a_choice_that_breaks_nothing_says_nothing_of_it() {
        BoardChoice kept = ChoiceFixture.choice(plan.choice().orElseThrow().reached(), List.of(), Optional.empty());

        assertThat(ChoiceText.of(kept, "EUR", Optional.empty())).hasSize(5)
                .noneMatch(line -> line.contains("broken")).last().asString()
                .isEqualTo("search      300 rounds, seed 1");
    }

    @Test
    void the_best_so_far_fits_beside_the_progress() {
        assertThat(ChoiceText.brief(plan.choice().orElseThrow())).isEqualTo("1.8 W (proven), 1,250.00 (2 %)");
    }

    @Test
    void times_are_as_people_say_them() {
        assertThat(ChoiceText.words(Duration.ofNanos(1))).isEqualTo("1 ms");
        assertThat(ChoiceText.words(Duration.ofMillis(85))).isEqualTo("85 ms");
        assertThat(ChoiceText.words(Duration.ofSeconds(125))).isEqualTo("2 min 5 s");
    }
}
