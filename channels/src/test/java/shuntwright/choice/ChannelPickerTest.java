package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

import shuntwright.board.Acceptance;
import shuntwright.circuit.SenseCircuit;

/** The search against a judge that rejects nothing early. */
class ChannelPickerTest {

    private static final int PROBLEMS = 500;
    private static final double SAME = 1e-6;

    private final DividerTables tables = new DividerTables();
    private final List<String> disagreements = new ArrayList<>();
    private int accepted;
    private int nearest;
    private int none;

    @ParameterizedTest
    @EnumSource
    void findsWhatExactLimitsAccept(Acceptance.Basis basis) {
        for (int seed = 0; seed < problems(basis); seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), basis);
            compare("seed " + seed, problem);
        }
        assertThat(disagreements).isEmpty();
        assertThat(accepted).as("accepted").isGreaterThan(problems(basis) / 8);
        assertThat(nearest).as("nearest").isGreaterThan(problems(basis) / 12);
        assertThat(none).as("no fit").isGreaterThan(problems(basis) / 50);
    }

    /** Demands that one circuit of the catalogue meets with nothing to spare. */
    @ParameterizedTest
    @CsvSource({"LIMITS, false", "LIMITS, true", "COVERAGE, false", "COVERAGE, true"})
    void findsCircuitsWithNothingToSpare(Acceptance.Basis basis, boolean pinned) {
        for (int seed = 0; seed < problems(basis); seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            ChannelProblem loose = RandomProblems.problem(random, basis);
            int which = seed;
            TightProblems.of(loose, BruteForce.all(loose, tables), random, pinned)
                    .ifPresent(problem -> compare("seed " + which, problem));
        }
        assertThat(disagreements).isEmpty();
        assertThat(accepted).as("accepted").isGreaterThan(problems(basis) / 8);
    }

    /** Sampling every circuit takes its time. */
    private static int problems(Acceptance.Basis basis) {
        return basis == Acceptance.Basis.COVERAGE ? PROBLEMS / 8 : PROBLEMS;
    }

    private void expect(boolean holds, String which, Object what) {
        if (!holds) {
            disagreements.add(which + ": " + what);
        }
    }

    private void compare(String which, ChannelProblem problem) {
        List<BruteForce.Tried> all = BruteForce.all(problem, tables);
        List<BruteForce.Tried> good = all.stream().filter(BruteForce.Tried::accepted).toList();
        switch (new ChannelPicker(tables).pick(problem)) {
            case ChannelChoice.Accepted(List<SenseCircuit> circuits) -> {
                accepted++;
                circuits.forEach(each -> best(which, problem, each, good));
            }
            case ChannelChoice.Nearest(SenseCircuit circuit) -> {
                nearest++;
                expect(good.isEmpty(), which,
                        "missed " + good.stream().map(each -> words(each.circuit())).toList());
                expect(BruteForce.tried(problem, circuit).respects(), which,
                        "does not respect the limits: " + words(circuit));
            }
            case ChannelChoice.NoFit _ -> {
                none++;
                expect(all.stream().noneMatch(BruteForce.Tried::respects), which, "no fit, but there is one: "
                        + all.stream().filter(BruteForce.Tried::respects).map(each -> words(each.circuit())).toList());
            }
        }
    }

    private void best(String which, ChannelProblem problem, SenseCircuit circuit, List<BruteForce.Tried> good) {
        expect(BruteForce.tried(problem, circuit).accepted(), which,
                "not accepted: " + words(circuit));
        double least = good.stream().mapToDouble(BruteForce.Tried::heat).min().orElse(0);
        double heat = BruteForce.heat(problem, circuit);
        expect(heat <= (least + problem.around().rules().heatStep()) * (1 + SAME), which,
                "heat " + heat + " of " + words(circuit) + ", least " + least + " of " + good.stream()
                        .filter(each -> each.heat() <= least).map(each -> words(each.circuit())).toList());
        double cheapest = good.stream()
                .filter(each -> each.heat() <= (least + problem.around().rules().heatStep()) * (1 + 1e-9))
                .mapToDouble(BruteForce.Tried::cost).min().orElse(0);
        double cost = BruteForce.cost(problem, circuit);
        expect(cost <= cheapest * (1 + SAME), which, "cost " + cost + " of " + words(circuit) + ", least " + cheapest);
    }

    private static String words(SenseCircuit circuit) {
        return circuit.shuntCount() + " × " + circuit.shunt().partNumber() + ", " + circuit.amplifier().partNumber()
                + ", " + circuit.comparator().hysteresis() + ", " + circuit.threshold() + ", "
                + circuit.resistors().partNumber();
    }
}
