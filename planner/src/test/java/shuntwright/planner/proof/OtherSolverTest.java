package shuntwright.planner.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.selection.Aim;
import shuntwright.selection.Answer;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Selector;
import shuntwright.selection.Watch;

/** The search and the child's solver against another solver with a plain model of its own, on selections too large to be enumerated. */
@SuppressWarnings("NullAway.Init")
class OtherSolverTest {

    private static BatchProver other;
    private static BatchProver own;

    @BeforeAll
    static void start() throws IOException {
        other = new BatchProver(OtherSolverChild.class);
        own = new BatchProver(BatchChild.class);
    }

    @AfterAll
    static void stop() {
        other.close();
        own.close();
    }

    static IntStream seeds() {
        return IntStream.range(100, 112);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void allThreeReachTheSame(int seed) {
        Selection selection = SmallSelections.of(seed, 8 + seed % 5, 6, 1.3);
        for (Aim aim : List.of(new Aim.Cost(), new Aim.Use(SmallSelections.HEAT))) {
            Answer answer = Selector.select(selection, new Selector.Order(List.of(aim), List.of(0.0), List.of()),
                    new Selector.Effort(400, 0, seed), List.of(), Prover.NONE, Watch.NONE);
            Prover.Question question = new Prover.Question(List.of(), Optional.of(aim), List.of());
            Prover.Finding finding = other.ask(selection, question, Watch.NONE);
            Prover.Finding ours = own.ask(selection, question, Watch.NONE);
            assertThat(finding.complaint()).isEmpty();
            assertThat(answer.keepsLimits()).isNotEqualTo(finding.impossible());
            assertThat(ours.impossible()).isEqualTo(finding.impossible());
            if (answer.keepsLimits()) {
                double value = answer.reached().getFirst().value();
                assertThat(finding.bound().orElseThrow()).as("%s", aim).isCloseTo(value, within(1e-6 * value));
                assertThat(ours.bound().orElseThrow()).as("%s", aim).isCloseTo(value, within(1e-6 * value));
            }
        }
    }
}
