package shuntwright.planner.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.selection.Aim;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Watch;

/** The solver's model against every selection there is. */
@SuppressWarnings("NullAway.Init")
class SolverModelTest {

    private static final List<Aim> AIMS = List.of(new Aim.Use(SmallSelections.HEAT), new Aim.LargestShare(),
            new Aim.Cost(), new Aim.Lines(), new Aim.LeastMargin(), new Aim.Use(SmallSelections.SUPPLY));

    private static BatchProver prover;

    @BeforeAll
    static void start() throws IOException {
        prover = new BatchProver(BatchChild.class);
    }

    @AfterAll
    static void stop() {
        prover.close();
    }

    static IntStream seeds() {
        return IntStream.range(0, Integer.getInteger("seeds", 50));
    }

    private static Selection selection(int seed) {
        return SmallSelections.of(seed, 3 + seed % 4, 6, seed % 5 == 0 ? 0.7 : 1.3);
    }

    /** Same optimum of every aim, with and without a cap on another, with and without a selection known beforehand. */
    @ParameterizedTest
    @MethodSource("seeds")
    void itsOptimumIsTheLeastOfAllSelections(int seed) {
        Selection selection = selection(seed);
        EverySelection every = new EverySelection(selection);
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < AIMS.size(); i++) {
            Aim aim = AIMS.get(i);
            Aim other = AIMS.get((i + 1 + random.nextInt(AIMS.size() - 1)) % AIMS.size());
            List<EverySelection.Sums> all = every.keeping();
            List<Aim.Cap> caps = List.of();
            List<Integer> hint = List.of();
            if (!all.isEmpty() && seed % 2 == 0) {
                EverySelection.Sums known = all.get(random.nextInt(all.size()));
                caps = List.of(new Aim.Cap(other, known.value(other)));
                hint = seed % 4 == 0 ? known.choice() : List.of();
            }
            Prover.Finding finding = prover.ask(selection, new Prover.Question(caps, Optional.of(aim), hint),
                    Watch.NONE);
            assertThat(finding.complaint()).isEmpty();
            Optional<Double> least = every.least(aim, caps);
            assertThat(finding.impossible()).as("%s under %s", aim, caps).isEqualTo(least.isEmpty());
            if (least.isPresent()) {
                // The solver's numbers have nine digits.
                double tolerance = 1e-7 * (1 + Math.abs(least.get()));
                assertThat(finding.bound().orElseThrow()).as("bound of %s under %s", aim, caps)
                        .isCloseTo(least.get(), within(tolerance));
                List<Integer> best = finding.better().orElse(hint);
                OptionalDouble value = Check.value(selection, new Prover.Question(caps, Optional.of(aim), hint), best);
                assertThat(value.orElseThrow()).as("%s under %s", aim, caps).isCloseTo(least.get(), within(tolerance));
            }
        }
    }

    /** Asked for nothing but whether limits and a cap can be kept. */
    @ParameterizedTest
    @MethodSource("seeds")
    void saysWhetherLimitsCanBeKept(int seed) {
        Selection selection = selection(seed);
        EverySelection every = new EverySelection(selection);
        double middle = every.least(new Aim.Cost(), List.of()).orElse(1.0);
        for (double most : new double[]{middle * 0.999, middle, middle * 1.001}) {
            List<Aim.Cap> caps = List.of(new Aim.Cap(new Aim.Cost(), most));
            Prover.Question question = new Prover.Question(caps, Optional.empty(), List.of());
            Prover.Finding finding = prover.ask(selection, question, Watch.NONE);
            assertThat(finding.complaint()).isEmpty();
            assertThat(finding.bound()).isEmpty();
            assertThat(finding.impossible()).isEqualTo(every.least(new Aim.Cost(), caps).isEmpty());
            finding.better().ifPresent(
                    choice -> assertThat(every.keeping()).anyMatch(sums -> sums.choice().equals(choice)));
            assertThat(finding.better().isPresent()).isNotEqualTo(finding.impossible());
        }
    }
}
