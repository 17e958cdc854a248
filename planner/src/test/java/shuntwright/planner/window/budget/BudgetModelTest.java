package shuntwright.planner.window.budget;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Outcome;
import shuntwright.accuracy.Owner;
import shuntwright.accuracy.Reel;
import shuntwright.accuracy.Slot;
import shuntwright.board.Board;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Sampling;
import shuntwright.board.Uncertainty;
import shuntwright.parts.Catalogue;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Histogram;
import shuntwright.sampling.Probability;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

class BudgetModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final BudgetModel model = new BudgetModel(session);

    private static String fact(BudgetModel of, String title) {
        return of.facts().stream().filter(each -> each.title().startsWith(title)).findFirst().map(Fact::value)
                .orElse("no such fact");
    }

    @Test
    void eachInputIsReadInThreeWays() {
        session.selectionProperty().set(List.of(2));
        BudgetRow first = model.rows().getFirst();
        assertThat(first.label()).isEqualTo("sense supply");
        assertThat(first.owner()).isEqualTo("supply, shared");
        assertThat(first.distribution()).isEqualTo("uniform");
        assertThat(first.limits().low()).isEqualTo("−200 mA");
        assertThat(first.limits().ofTarget()).isEqualTo("−2.00 +1.80 %");
        assertThat(first.limits().lowBar()).isEqualTo(-1);
        assertThat(first.variance().text()).isEqualTo("70.0 %");
        assertThat(first.first().text()).isEqualTo("68.6 %");
        assertThat(first.first().note()).startsWith("± 0.4 %");
        assertThat(first.total().text()).isEqualTo("71.4 %");
        assertThat(model.rows()).extracting(row -> row.limits().widest())
                .isSortedAccordingTo((a, b) -> Double.compare(b, a));
        assertThat(model.summaryProperty().get()).isEqualTo("radar, trip current");
    }

    @Test
    void theFactsHoldAllThreeIntervals() {
        session.selectionProperty().set(List.of(2));
        assertThat(fact(model, "allowed")).isEqualTo("9.8 .. 10.2 A");
        assertThat(fact(model, "limits")).isEqualTo("9.6981 .. 10.298 A");
        assertThat(fact(model, "combined, k = 3.00")).isEqualTo("9.998 A ± 150 mA");
        assertThat(fact(model, "symmetric 99.73 %")).isEqualTo("9.848 .. 10.148 A ± 250 µA");
        assertThat(fact(model, "shortest")).startsWith("9.848 .. 10.148 A");
        // 3.96 and 4.04 standard deviations: 3.75e-5 and 2.67e-5 of a normal distribution, 64 of a million trials
        assertThat(fact(model, "outside allowed")).isEqualTo("6.4e-5 [4.8e-5 .. 8e-5]");
        assertThat(fact(model, "combined uncertainty is")).isEqualTo("valid, 1 mA off of 2.5 mA allowed");
        assertThat(fact(model, "trials")).isEqualTo("1,000,000");
    }

    @Test
    void whatNeverHappenedInTheTrialsIsNotImpossible() {
        session.selectionProperty().set(List.of(0));
        assertThat(fact(model, "outside allowed")).isEqualTo("below 3.7e-6 (95 %)");
    }

    @Test
    void anotherOutcomeCanBeChosen() {
        session.selectionProperty().set(List.of(0));
        assertThat(model.outcomes()).containsExactly(Outcome.TRIP, Outcome.READING_AT_LOAD);
        model.outcomeProperty().set(Outcome.READING_AT_LOAD);
        assertThat(model.summaryProperty().get()).isEqualTo("bilge pump, reading at load current");
        assertThat(fact(model, "combined")).startsWith("20 A");
        assertThat(model.calibratedProperty().get()).isFalse();
    }

    @Test
    void aCalibratedReadingIsShownBeforeAndAfter() {
        Channel channel = HandMadeBoards.boat().channels().getFirst();
        Channel calibrated = channel.withReading(new Channel.ReadingDemand(OptionalDouble.empty(),
                OptionalDouble.of(0.05), Optional.of(
                        new Calibration(Calibration.Points.ONE, OptionalDouble.empty(), OptionalDouble.empty(), 0.001,
                                Calibration.DEFAULT_TEMPERATURE))));
        session.start(HandMadeBoards.boat().withChannels(List.of(calibrated)), Catalogue.EMPTY, true);
        assertThat(model.calibratedProperty().get()).as("the trip current is never calibrated").isFalse();
        model.outcomeProperty().set(Outcome.READING_AT_LOAD);
        assertThat(model.calibratedProperty().get()).isTrue();
        assertThat(fact(model, "limits")).isEqualTo("19.4 .. 20.6 A");
        assertThat(fact(model, "before calibration")).isEqualTo("limits 18.8 .. 21.2 A, ±600 mA");
        model.beforeCalibrationProperty().set(true);
        assertThat(fact(model, "limits")).isEqualTo("18.8 .. 21.2 A");
        assertThat(fact(model, "propagated")).startsWith("not sampled: trials are of the calibrated reading");
        assertThat(model.rows()).allMatch(row -> !row.first().known());
    }

    @Test
    void piecesOfOneReelHaveOneIndex() {
        Reel reel = new Reel("reel of SH-4", 0.5);
        Assessment trip = new Assessment(Outcome.TRIP, 10, Range.of(9, 11),
                new CombinedUncertainty(10, 0.1, Double.POSITIVE_INFINITY, 0.9973, 3), Range.of(8, 12),
                List.of(line("shunt 1", Optional.of(reel)), line("shunt 2", Optional.of(reel)),
                        line("amplifier", Optional.empty())),
                Optional.empty());
        List<EffectIndex> effects = trip.budget().stream().limit(2)
                .map(each -> new EffectIndex(each.input(), 0.6, 0.01, 0.62, 0.01)).toList();
        Propagated propagated = new Propagated(Outcome.TRIP, trip.allowed(), SAMPLED,
                new Validation(true, 2, 1, 0, 0), effects);
        List<BudgetRow> rows = BudgetRows.of(trip, Optional.of(propagated), 10);
        assertThat(rows).extracting(row -> row.total().text()).containsExactly("62.0 %", "with shunt 1", "0.0 %");
        assertThat(rows.getFirst().total().note()).contains("of all pieces of reel of SH-4 together");
        assertThat(BudgetRows.of(trip, Optional.empty(), 10)).as("before trials")
                .allMatch(row -> !row.total().known());
    }

    private static BudgetLine line(String owner, Optional<Reel> reel) {
        return new BudgetLine(new Input(Slot.SHUNT_TOLERANCE, 0, new Owner.Own(owner), 0, Range.of(-0.01, 0.01),
                new Distribution.Uniform(), reel), 1, -0.1, 0.1, 0.05, 0.3);
    }

    private static final CoverageInterval NINE_TO_ELEVEN = new CoverageInterval(Range.of(9, 11),
            new CoverageInterval.Ends(0.1, 0.1));

    private static final Sampled SAMPLED = new Sampled(10_000, 0, 10, 0.1, NINE_TO_ELEVEN, NINE_TO_ELEVEN,
            new Probability(0, Range.of(0, 4e-4), 0, Probability.Method.COUNTED, 10_000),
            new Histogram(Range.of(9, 11), List.of(10_000L), 10_000));

    @Test
    void anIncompleteChannelHasNoBudget() {
        session.selectionProperty().set(List.of(4));
        assertThat(model.rows()).isEmpty();
        assertThat(model.facts()).isEmpty();
        assertThat(model.drawingProperty().get()).isEmpty();
        assertThat(model.summaryProperty().get()).startsWith("No error budget");
    }

    @Test
    void beforeTheFirstPictureItSaysSoAndPicturesRefineIt() {
        Queue<Runnable> background = new ArrayDeque<>();
        BoardSession waiting = new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run),
                new PlanSampling(HandMadeStudies::sample, background::add, Runnable::run), Sessions.PATIENT);
        BudgetModel budget = new BudgetModel(waiting);
        waiting.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        assertThat(fact(budget, "propagated")).isEqualTo("sampling …");
        assertThat(budget.drawingProperty().get().orElseThrow().empty()).isEqualTo("sampling …");
        assertThat(budget.rows()).as("limits and variance need no trials").isNotEmpty();
        waiting.stopSampling();
        assertThat(fact(budget, "propagated")).isEqualTo("not sampled: stopped before the first picture");
        waiting.sampleAgain();
        background.forEach(Runnable::run);
        assertThat(budget.drawingProperty().get().orElseThrow().bars()).isNotEmpty();
        assertThat(fact(budget, "trials")).isEqualTo("1,000,000");
    }

    @Test
    void asManyTrialsAsTheBoardAsksFor() {
        Board few = HandMadeBoards.boat()
                .withUncertainty(new Uncertainty(List.of(), new Sampling(new Sampling.Trials.Fixed(20_000), 7)));
        session.start(few, Catalogue.EMPTY, true);
        assertThat(fact(model, "trials")).isEqualTo("20,000");
    }
}
