package shuntwright.selection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SelectorTest {

    private static final Selector.Effort EFFORT = new Selector.Effort(150, 150, 1);

    static IntStream seeds() {
        return IntStream.range(0, 400);
    }

    private static List<Aim> aims(int seed) {
        List<Aim> aims = new ArrayList<>(
                List.of(new Aim.Use(RandomSelections.HEAT), new Aim.LargestShare(), new Aim.Cost(),
                        new Aim.Lines(), new Aim.LeastMargin()));
        Collections.shuffle(aims, new Random(seed));
        return aims.subList(0, 1 + seed % 3);
    }

    private static List<Double> slack(List<Aim> aims, int seed) {
        return aims.stream().map(aim -> aim instanceof Aim.Use && seed % 2 == 0 ? 0.2 : 0.0).toList();
    }

    private static Selection selection(int seed) {
        return new RandomSelections(seed).small(3 + seed % 4, 6, seed % 5 == 0 ? 0.7 : 1.3);
    }

    /** The search against every selection there is: same optimum of every aim in every order under every kind of limit. */
    @ParameterizedTest
    @MethodSource("seeds")
    void reachesTheBestOfAllSelections(int seed) {
        Selection selection = selection(seed);
        List<Aim> aims = aims(seed);
        List<Double> slack = slack(aims, seed);
        Exhaustive exhaustive = new Exhaustive(selection, aims, slack);
        Answer answer = Selector.select(selection, new Selector.Order(aims, slack, List.of()), EFFORT, List.of(),
                Prover.NONE,
                Watch.NONE);
        Optional<List<Double>> best = exhaustive.best();
        assertThat(answer.keepsLimits()).isEqualTo(best.isPresent());
        Exhaustive.Sums real = exhaustive.sums(answer.choice());
        assertThat(real.keeps()).isEqualTo(answer.keepsLimits());
        for (int i = 0; i < aims.size(); i++) {
            Answer.Reached reached = answer.reached().get(i);
            assertThat(reached.value()).as("sum of %s", reached.aim()).isCloseTo(real.values().get(i),
                    within(1e-9 * (1 + Math.abs(real.values().get(i)))));
            if (best.isPresent()) {
                double least = best.get().get(i);
                // A later aim may use the slack, not more.
                assertThat(reached.value()).as("%s in order %s", reached.aim(), aims)
                        .isBetween(least - 1e-9 * (1 + Math.abs(least)),
                                least + slack.get(i) + 1e-9 * (1 + Math.abs(least)));
                if (slack.get(i) == 0) {
                    assertThat(reached.bound().orElse(least)).isLessThanOrEqualTo(least + 1e-9 * (1 + Math.abs(least)));
                }
            }
        }
    }

    @Test
    void repeatsExactly() {
        Selection selection = new RandomSelections(77).small(12, 9, 1.2);
        Selector.Order order = new Selector.Order(List.of(new Aim.Cost(), new Aim.Use(RandomSelections.HEAT)),
                List.of(0.0, 0.0),
                List.of());
        Answer first = Selector.select(selection, order, EFFORT, List.of(), Prover.NONE, Watch.NONE);
        Answer second = Selector.select(selection, order, EFFORT, List.of(), Prover.NONE, Watch.NONE);
        assertThat(second).isEqualTo(first);
    }

    /** The relaxation never says more than the best there is, nor that limits cannot be kept when they can. */
    @ParameterizedTest
    @MethodSource("seeds")
    void boundsHoldForAnyMultipliers(int seed) {
        Selection selection = selection(seed);
        for (Aim aim : List.of(new Aim.Cost(), new Aim.Lines(), new Aim.Use(RandomSelections.HEAT),
                new Aim.Use(RandomSelections.SUPPLY))) {
            Exhaustive exhaustive = new Exhaustive(selection, List.of(aim), List.of(0.0));
            exhaustive.best().ifPresent(best -> {
                double least = best.getFirst();
                double bound = new Lagrangian(selection, Optional.of(aim), List.of()).bound(least, 120, Watch.NONE);
                assertThat(bound).as("%s", aim).isLessThanOrEqualTo(least + 1e-9 * (1 + least));
                Lagrangian keeps = new Lagrangian(selection, Optional.empty(), List.of());
                keeps.bound(0, 120, Watch.NONE);
                assertThat(keeps.impossible()).isFalse();
            });
        }
    }
}
