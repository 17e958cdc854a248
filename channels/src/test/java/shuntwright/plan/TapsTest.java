package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.board;
import static shuntwright.plan.TrialBoards.channel;

import java.util.List;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.TrialParts;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Part;
import shuntwright.quantity.ESeries;

/** Channels that share a threshold. With ×50: 1 mΩ gives 50 mV/A, 2 mΩ 100 mV/A, 4 mΩ 200 mV/A. */
class TapsTest {

    private static final Catalogue CATALOGUE = Catalogue.of("EUR", List.<Part>of(
            TrialParts.shunt("R1", 0.001, 0.002), TrialParts.shunt("R2", 0.002, 0.002),
            TrialParts.shunt("R4", 0.004, 0.002), TrialParts.amplifier("A50", 50, 0.002, 50e-6),
            TrialParts.comparator("CI", TrialParts.injected()), TrialParts.reference("REF25", 2.5, 0.001),
            TrialParts.series("RES", ESeries.E96, 0.001)));

    private static final Tap.Kind DIVIDER = new Tap.Kind.Divider(OptionalDouble.empty(), OptionalDouble.empty());
    private static final Tap.Kind DAC = new Tap.Kind.Dac(10, 0.001, 0.5e-3, 0.5);

    private static Channel tapped(String name, double noTrip, double mustTrip) {
        return channel(name, noTrip * 0.8, noTrip, mustTrip).withThreshold(new ThresholdDemand.SharedTap("tap"));
    }

    private static Board shared(Tap.Kind kind, OptionalDouble voltage, Channel... channels) {
        return TrialBoards.withTaps(board(channels), new Tap("tap", new Source.OfReference("quiet"), kind, voltage));
    }

    private static Plan plan(Board board) {
        return new BoardPlanner().plan(board, CATALOGUE, Progress.SILENT);
    }

    /** 20 A at 0.5 mΩ (two of 1 mΩ) to 4 mΩ: 0.5 V or more; 5 A at 4 mΩ at most: 1 V or less. */
    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void channelsThatCanShareAVoltageDo(boolean dac) {
        Channel large = tapped("large", 19, 21);
        Channel small = tapped("small", 4.75, 5.25);
        Plan plan = plan(shared(dac ? DAC : DIVIDER, OptionalDouble.empty(), large, small));
        assertThat(plan.channels()).extracting(ChannelPlan::verdict).containsOnly(Verdict.INSIDE);
        TapPlan tap = plan.taps().getFirst();
        assertThat(tap.channels()).containsExactly("large", "small");
        Threshold threshold = tap.threshold().orElseThrow();
        assertThat(threshold instanceof Threshold.DacOutput).isEqualTo(dac);
        for (ChannelPlan each : plan.channels()) {
            assertThat(each.solved().orElseThrow().circuit().threshold()).isEqualTo(threshold);
        }
        // Alone the large channel would take less heat and another voltage.
        Plan alone = plan(shared(dac ? DAC : DIVIDER, OptionalDouble.empty(), large));
        assertThat(alone.channels().getFirst().solved().orElseThrow().heat())
                .isLessThanOrEqualTo(plan.channels().getFirst().solved().orElseThrow().heat());
        double ratio = plan.channels().getLast().solved().orElseThrow().circuit().resistance()
                / plan.channels().getFirst().solved().orElseThrow().circuit().resistance();
        assertThat(ratio).as("resistances are as 20 A to 5 A").isEqualTo(4, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.5, 1, 1.37, 2})
    void aGivenVoltageIsKept(double volt) {
        Plan divider = plan(shared(DIVIDER, OptionalDouble.of(volt), tapped("c", 9, 11)));
        assertThat(divider.taps().getFirst().threshold().orElseThrow().nominalVoltage()).isEqualTo(volt,
                within(volt * 0.002));
        Plan dac = plan(shared(DAC, OptionalDouble.of(volt), tapped("c", 9, 11)));
        Threshold.DacOutput output = (Threshold.DacOutput) dac.taps().getFirst().threshold().orElseThrow();
        assertThat(output.code()).isEqualTo((int) Math.round(volt / 2.5 * 1024));
    }

    @Test
    void pinnedResistorsAreKept() {
        Tap.Kind pinned = new Tap.Kind.Divider(OptionalDouble.of(15e3), OptionalDouble.of(10e3));
        Plan plan = plan(shared(pinned, OptionalDouble.empty(), tapped("c", 9, 11), tapped("d", 9, 11)));
        Threshold.Divider divider = (Threshold.Divider) plan.taps().getFirst().threshold().orElseThrow();
        assertThat(divider.top()).isEqualTo(15e3);
        assertThat(divider.bottom()).isEqualTo(10e3);
        assertThat(divider.users()).isEqualTo(2);
        assertThat(divider.nominalVoltage()).isEqualTo(1.0, within(1e-12));
    }

    @Test
    void whatCannotShareIsAConflict() {
        // 1 V needs 100 mV/A for 10 A; 11.5 A would need 87 mV/A, which no shunts of the catalogue make.
        Plan plan = plan(shared(DIVIDER, OptionalDouble.of(1), tapped("fits", 9, 11), tapped("not", 11.2, 11.8)));
        assertThat(plan.channel("fits").orElseThrow().verdict()).isEqualTo(Verdict.INSIDE);
        ChannelPlan not = plan.channel("not").orElseThrow();
        assertThat(not.accepted()).isFalse();
        assertThat(not.findings()).filteredOn(each -> each.key() == Finding.Key.TAP_CONFLICT).singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("tap", "1 V", "1 other channel"));
        assertThat(not.cures()).anySatisfy(cure -> {
            assertThat(cure.lever()).isEqualTo(Cure.Lever.SOURCE);
            assertThat(cure.cures()).isTrue();
        });
    }

    @Test
    void anUnusedTapIsNoted() {
        Plan plan = plan(shared(DIVIDER, OptionalDouble.of(1), channel("own", 5)));
        assertThat(plan.findings()).extracting(Finding::key).contains(Finding.Key.TAP_UNUSED);
        assertThat(plan.accepted()).isTrue();
    }
}
