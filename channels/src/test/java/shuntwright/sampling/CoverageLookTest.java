package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.board.Sampling;
import shuntwright.quantity.Range;

/** A look that ends early says what the whole look says. */
class CoverageLookTest {

    private static final Sampling SAMPLING = Runs.fixed(20_000, 1);

    @Test
    void anEarlyNoIsANo() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(23);
        Model model = new Formula(3, List.of(x -> x[0] + x[1], x -> x[0] + x[2] > 1.9 ? Double.NaN : x[0] * x[2]),
                List.of());
        List<Variable> variables = Runs.many(3, key -> Runs.uniform(key, 0, 1));
        int early = 0;
        int within = 0;
        for (int round = 0; round < 300; round++) {
            double coverage = new double[]{0.9, 0.9973, 0.9999999}[round % 3];
            List<Range> allowed = List.of(
                    Range.of(-random.nextDouble(1.7, 2.1), random.nextDouble(1.7, 2.1)),
                    Range.of(-random.nextDouble(0.8, 1.1), random.nextDouble(0.8, 1.1)));
            List<Integer> inQuestion = round % 2 == 0 ? List.of(0) : List.of(0, 1);
            List<CoverageInterval> whole = MonteCarlo
                    .intervals(model, variables, allowed, coverage, SAMPLING, List.of()).orElseThrow();
            boolean inside = inQuestion.stream().allMatch(i -> allowed.get(i).contains(whole.get(i).range()));
            var found = MonteCarlo.intervals(model, variables, allowed, coverage, SAMPLING, inQuestion);
            found.ifPresent(each -> assertThat(each).isEqualTo(whole));
            if (found.isEmpty()) {
                early++;
                assertThat(inside).as("round %d", round).isFalse();
            }
            within += inside ? 1 : 0;
        }
        assertThat(early).isGreaterThan(50);
        assertThat(within).isGreaterThan(50);
    }
}
