package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import org.junit.jupiter.api.Test;

import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.parts.SenseAmplifier;

/** An amplifier whose output cannot fall below the release voltage never lets its channel re-arm. */
class AmplifierFloorTest {

    /** Windows so wide that least heat alone would choose voltages of a few millivolts. */
    private static final Channel WIDE = TrialBoards.channel("wide", 1, 10, 40);

    @Test
    void theReleaseVoltageStaysAboveTheLowestLevel() {
        ChannelPlan plan = TrialBoards.only(TrialBoards.plan(TrialBoards.board(WIDE)));
        SolvedChannel solved = plan.solved().orElseThrow();
        SenseAmplifier amplifier = solved.circuit().amplifier();
        LimitCheck floor = solved.limits().stream().filter(each -> each.limit() == Limit.RELEASE_FLOOR).findFirst()
                .orElseThrow();
        assertThat(plan.verdict()).isEqualTo(Verdict.INSIDE);
        assertThat(amplifier.ranges().outputLow()).isEqualTo(0.02);
        assertThat(floor.bound()).isEqualTo(0.02);
        assertThat(floor.reached()).isBetween(0.02, solved.settings().releaseVoltage().orElseThrow());
        double lowest = solved.assessment(shuntwright.accuracy.Outcome.RELEASE).orElseThrow().limits().min();
        assertThat(lowest * solved.circuit().resistance() * amplifier.gain()).isGreaterThan(0.02 * 0.95);
    }

    @Test
    void aPinnedCircuitBelowItIsNoFit() {
        Channel pinned = WIDE.withThreshold(new ThresholdDemand.OwnDivider(new Source.OfReference("quiet")))
                .withRelease(new ReleaseDemand.Latch())
                .withPins(new Pins(Optional.of("R0.5"), OptionalInt.of(1), Optional.of("A20"), Optional.of("CL"),
                        Optional.of("RES"), OptionalDouble.of(16.9e3), OptionalDouble.of(100), OptionalDouble.empty()));
        ChannelPlan plan = TrialBoards.only(new BoardPlanner().check(TrialBoards.board(pinned), TrialBoards.CATALOGUE,
                Progress.SILENT));
        assertThat(plan.verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(plan.findings()).extracting(Finding::text)
                .anySatisfy(text -> assertThat(text).contains("smallest threshold above the amplifier's lowest level")
                        .contains("allowed at least 20 mV"));
    }
}
