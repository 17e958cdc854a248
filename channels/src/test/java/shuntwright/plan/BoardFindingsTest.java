package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Sampling;
import shuntwright.board.Source;
import shuntwright.board.StatedDistribution;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.Uncertainty;
import shuntwright.choice.TrialParts;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.fixture.Records;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.Part;
import shuntwright.parts.Reference;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/** Findings that name what is wrong with the board or the catalogue instead of a consequence of it. */
class BoardFindingsTest {

    private static final Channel CHANNEL = TrialBoards.channel("fan", 2);

    private static Reference needing(Range supply) {
        Reference r = TrialBoards.CATALOGUE.find("REF25", Reference.class).orElseThrow();
        return new Reference(r.partNumber(), r.description(), r.voltage(), r.drift(), r.ageing(), r.loadRegulation(),
                r.availableCurrent(), supply, r.supplyCurrent(), r.purchase());
    }

    private static Plan plan(Range supply) {
        List<Part> parts = new ArrayList<>(TrialBoards.CATALOGUE.shunts());
        parts.addAll(TrialBoards.CATALOGUE.amplifiers());
        parts.addAll(TrialBoards.CATALOGUE.comparators());
        parts.addAll(TrialBoards.CATALOGUE.resistors());
        parts.add(needing(supply));
        return new BoardPlanner().plan(TrialBoards.board(CHANNEL), Catalogue.of("EUR", parts), Progress.SILENT);
    }

    @Test
    void aReferenceOutsideItsSupplyRangeIsAFault() {
        Plan plan = plan(Range.of(3.3, 5.5));
        assertThat(plan.accepted()).isFalse();
        assertThat(plan.findings()).singleElement().satisfies(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.REFERENCE_SUPPLY);
            assertThat(finding.text()).contains("\"quiet\"", "REF25", "3.3 .. 5.5 V", "3.234 .. 3.366 V");
        });
        assertThat(plan(Range.of(3.234, 3.366)).accepted()).isTrue();
    }

    private static List<Finding> stated(String input, String part) {
        Uncertainty uncertainty = new Uncertainty(List.of(new StatedDistribution(input, Optional.of(part),
                new Distribution.Triangular())), Sampling.DEFAULT);
        return new BoardPlanner().plan(TrialBoards.board(CHANNEL).withUncertainty(uncertainty), TrialBoards.CATALOGUE,
                Progress.SILENT).findings();
    }

    @Test
    void aDistributionStatedForAPartThatNoFileHoldsIsAFault() {
        String amplifier = TrialBoards.CATALOGUE.amplifiers().getFirst().partNumber();
        assertThat(stated("gain error", amplifier)).isEmpty();
        assertThat(stated("gain error", amplifier.substring(0, 1) + "*")).isEmpty();
        assertThat(stated("gain error", amplifier + "X")).singleElement().satisfies(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.UNKNOWN_PART);
            assertThat(finding.text()).contains("\"gain error\"", "\"" + amplifier + "X\"", "no amplifier");
        });
        assertThat(stated("shunt tolerance", amplifier)).as("an amplifier has no shunt tolerance").singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("no shunt"));
    }

    private static String firstFinding(Channel channel, Catalogue catalogue) {
        return TrialBoards.only(new BoardPlanner().plan(TrialBoards.board(channel), catalogue, Progress.SILENT))
                .findings().getFirst().text();
    }

    @Test
    void saysWhatTheCatalogueLacks() {
        List<Part> parts = new ArrayList<>(TrialBoards.CATALOGUE.amplifiers());
        parts.addAll(TrialBoards.CATALOGUE.comparators());
        assertThat(firstFinding(CHANNEL, Catalogue.of("EUR", parts))).contains("no parts file holds a shunt",
                "no parts file holds a resistor series").doesNotContain("amplifier", "comparator");
    }

    @Test
    void saysThatAPinnedComparatorDoesNotSuitTheRelease() {
        Channel pinned = CHANNEL
                .withPins(TrialBoards.pins(Optional.empty(), Optional.empty(), Optional.of("CL")));
        assertThat(firstFinding(pinned, TrialBoards.CATALOGUE)).contains("the pinned comparator CL latches");
    }

    @Test
    void saysThatTheSourceIsMissing() {
        Board board = TrialBoards.withReferences(TrialBoards.board(), new BoardReference("quiet", "NONE"))
                .withChannels(List.of(CHANNEL
                        .withThreshold(new ThresholdDemand.OwnDivider(new Source.OfReference("quiet")))));
        assertThat(TrialBoards.only(TrialBoards.plan(board)).findings().getFirst().text())
                .contains("the source of its threshold");
    }

    @Test
    void aLimitThatIsMetExactlyIsNotMissedByRounding() {
        assertThat(new LimitCheck(Limit.DIFFERENTIAL_RANGE, 2.2 * 0.025, 0.055, true).holds()).isTrue();
        assertThat(new LimitCheck(Limit.DIFFERENTIAL_RANGE, 0.0550001, 0.055, true).holds()).isFalse();
        assertThat(new LimitCheck(Limit.DIFFERENTIAL_RANGE, Double.NaN, 0.055, true).holds()).isFalse();
    }

    @Test
    void countsWhatEachLimitExaminesByItself() {
        Channel high = CHANNEL.withRail(Optional.of(new shuntwright.quantity.Spread(90, 100, 110)));
        FamilyRefusal refusal = TrialBoards.only(TrialBoards.plan(TrialBoards.board(high))).refusals().stream()
                .filter(each -> each.nearMiss().limit() == Limit.COMMON_MODE_HIGH).findFirst().orElseThrow();
        assertThat(refusal.examined()).isEqualTo(TrialBoards.CATALOGUE.amplifiers().size());
        assertThat(TrialBoards.CATALOGUE.shunts()).hasAtLeastOneElementOfType(Shunt.class);
    }

    /** A resistance that falls by 0.2 % per kelvin holds no more than √(R/(4·α·θ)) = 0.25 V, less than the threshold asks. */
    @Test
    void aShuntThatFadesWithItsHeatMayNeverTrip() {
        Shunt fading = Records.with(
                Records.with(TrialParts.shunt("FADES", 0.02, 0.005), "temperatureCoefficient", 2e-3),
                "rating", new ShuntRating(100, 70, 170, 40, OptionalDouble.empty()));
        List<Part> parts = new ArrayList<>(List.of(fading, TrialParts.amplifier("A", 4, 0.002, 50e-6),
                TrialParts.comparator("C", new Hysteresis.Latched()), TrialParts.series("S", ESeries.E96, 0.001)));
        Channel pinned = TrialBoards.channel("c", 16, 25, 35).withRelease(new ReleaseDemand.Latch())
                .withThreshold(new ThresholdDemand.OwnDivider(new Source.Supply()))
                .withPins(new Pins(Optional.of("FADES"), OptionalInt.of(1), Optional.of("A"), Optional.of("C"),
                        Optional.of("S"), OptionalDouble.of(10e3), OptionalDouble.of(27.4e3), OptionalDouble.empty()));
        Plan plan = new BoardPlanner().check(Board.named("fades").withChannels(List.of(pinned)),
                Catalogue.of("EUR", parts), Progress.SILENT);
        ChannelPlan channel = plan.channels().getFirst();
        assertThat(channel.accepted()).isFalse();
        assertThat(channel.solved().orElseThrow().trip().limits().max()).isEqualTo(ChannelAccuracy.BEYOND);
        assertThat(channel.findings()).filteredOn(each -> each.key() == Finding.Key.THERMAL_RUNAWAY).singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("may never trip", "thermal resistance"));
    }
}
