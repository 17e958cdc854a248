package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.SplittableRandom;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

import shuntwright.board.Acceptance;
import shuntwright.circuit.SenseCircuit;

/** The search against a judge that rejects nothing early. */
class ChannelPickerTest {

    private static final int PROBLEMS = 500;
    private static final double SAME = 1e-6;

    private final DividerTables tables = new DividerTables();
    private int accepted;
    private int nearest;
    private int none;

    @ParameterizedTest
    @EnumSource
    void findsWhatExactLimitsAccept(Acceptance.Basis basis) {
        for (int seed = 0; seed < PROBLEMS; seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), basis);
            agrees("seed " + seed + " by " + basis, problem);
        }
        assertThat(accepted).as("accepted").isGreaterThan(PROBLEMS / 8);
        assertThat(nearest).as("nearest").isGreaterThan(PROBLEMS / 8);
        assertThat(none).as("no fit").isGreaterThan(PROBLEMS / 50);
    }

    private void agrees(String which, ChannelProblem problem) {
        List<BruteForce.Tried> all = BruteForce.all(problem, tables);
        List<BruteForce.Tried> good = all.stream().filter(BruteForce.Tried::accepted).toList();
        switch (new ChannelPicker(tables).pick(problem)) {
            case ChannelChoice.Accepted(List<SenseCircuit> circuits) -> {
                accepted++;
                assertThat(good).as("%s: accepted by brute force", which).isNotEmpty();
                circuits.forEach(each -> best(which, problem, each, good));
            }
            case ChannelChoice.Nearest(SenseCircuit circuit) -> {
                nearest++;
                assertThat(good).as("%s: only a nearest circuit was found", which).isEmpty();
                assertThat(all).as("%s: respects the limits", which)
                        .anyMatch(each -> each.circuit().equals(circuit) && each.respects());
            }
            case ChannelChoice.NoFit _ -> {
                none++;
                assertThat(all).as("%s: no fit was found", which).noneMatch(BruteForce.Tried::respects);
            }
        }
    }

    private static void best(String which, ChannelProblem problem, SenseCircuit circuit,
            List<BruteForce.Tried> good) {
        assertThat(good).as("%s: accepted", which).anyMatch(each -> each.circuit().equals(circuit));
        double step = problem.around().rules().heatStep();
        double heat = BruteForce.heat(problem, circuit);
        double cost = BruteForce.cost(problem, circuit);
        double least = good.stream().mapToDouble(BruteForce.Tried::heat).min().orElseThrow();
        assertThat(heat).as("%s: heat", which).isLessThanOrEqualTo((least + step) * (1 + SAME));
        double cheapest = good.stream().filter(each -> each.heat() <= least * (1 + 1e-9))
                .mapToDouble(BruteForce.Tried::cost).min().orElseThrow();
        assertThat(cost).as("%s: cost", which).isLessThanOrEqualTo(cheapest * (1 + SAME));
    }
}
