package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.board.Acceptance;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/** R_H and the feedback network against loops over all values. */
class HysteresisChoiceTest {

    private static double room(ChannelProblem problem, Window window, Hysteresis.InjectedCurrent injected,
            Threshold threshold, ResistorSeries series, double ohm) {
        double room = Double.POSITIVE_INFINITY;
        for (int end = 0; end < 2; end++) {
            double kelvin = Math.abs((end == 0
                    ? problem.around().local().min()
                    : problem.around().local().max()) - 25);
            double moves = series.tolerance() + series.ageing() + series.temperatureCoefficient() * kelvin;
            Range spread = HysteresisChoice.spread(window, threshold, series, end);
            double most = spread.max() - injected.builtIn().min() - injected.current().min() * ohm * (1 - moves);
            double least = spread.min() - injected.builtIn().max() - injected.current().max() * ohm * (1 + moves);
            room = Math.min(room, Math.min(window.releaseHigh[end] - most, least - window.releaseLow[end]));
        }
        return room;
    }

    @Test
    void senseResistorLeavesTheMostRoom() {
        int compared = 0;
        for (int seed = 0; seed < 400; seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), Acceptance.Basis.LIMITS);
            ResistorSeries series = problem.resistors().getFirst();
            for (Window window : BruteForce.windows(problem)) {
                if (!(window.comparator.hysteresis() instanceof Hysteresis.InjectedCurrent injected)
                        || !window.rearms) {
                    continue;
                }
                for (SourceVoltage source : problem.sources()) {
                    Threshold.Divider divider = new Threshold.Divider(source, 10e3, 12e3, "", 1);
                    Optional<HysteresisNetwork> chosen = HysteresisChoice.senseResistor(window, injected, divider,
                            series, OptionalDouble.empty());
                    double best = Double.NEGATIVE_INFINITY;
                    for (double ohm : series.series().within(series.values())) {
                        best = Math.max(best, room(problem, window, injected, divider, series, ohm));
                    }
                    double ohm = ((HysteresisNetwork.SenseResistor) chosen.orElseThrow()).resistance();
                    assertThat(series.series().contains(ohm) && series.values().contains(ohm)).isTrue();
                    assertThat(room(problem, window, injected, divider, series, ohm)).as("seed " + seed)
                            .isEqualTo(best, within(1e-9));
                    compared++;
                }
            }
        }
        assertThat(compared).isGreaterThan(100);
    }

    @Test
    void senseResistorStaysPinned() {
        ChannelProblem problem = RandomProblems.problem(new SplittableRandom(3), Acceptance.Basis.LIMITS);
        Hysteresis.InjectedCurrent injected = (Hysteresis.InjectedCurrent) TrialParts.injected();
        Threshold.Divider divider = new Threshold.Divider(TrialParts.supply(3.3, 0.01), 10e3, 10e3, "", 1);
        assertThat(HysteresisChoice.senseResistor(BruteForce.windows(problem).getFirst(), injected, divider,
                problem.resistors().getFirst(), OptionalDouble.of(1234)))
                .contains(new HysteresisNetwork.SenseResistor(1234));
    }

    private static double miss(FeedbackDemand demand, double top, double bottom, double feedback) {
        double source = demand.source().voltage().nominal();
        double io = demand.pullUp().voltage().nominal();
        double series = feedback + demand.pullUp().resistance();
        double upper = (source / top + io / series) / (1 / top + 1 / bottom + 1 / series);
        double lower = (source / top + demand.outputLow() / feedback) / (1 / top + 1 / bottom + 1 / feedback);
        double gap = demand.tripAt() - demand.releaseAt();
        return Math.max(Math.abs(upper - demand.tripAt()), Math.abs(lower - demand.releaseAt()) * 0.5) / gap;
    }

    /**
     * The search fixes R_b, then brackets R_F, then R_t; the best triple may lie a step further off. It must never be
     * worse than the best of all by more than a tenth of the wanted hysteresis, and mostly equal to it.
     */
    @Test
    void feedbackComesNearAllTriples() {
        SplittableRandom random = new SplittableRandom(11);
        double[] values = ESeries.E24.within(Range.of(1e3, 100e3));
        double[] feedbacks = ESeries.E24.within(Range.of(1e3, 1e6));
        int equal = 0;
        int all = 0;
        for (int i = 0; i < 120; i++) {
            double trip = random.nextDouble(0.5, 2.3);
            double release = trip - random.nextDouble(0.05, 0.4);
            PullUp pull = new PullUp(10e3, TrialParts.supply(3.3, 0.02).voltage(), true, false);
            FeedbackDemand demand = new FeedbackDemand(TrialParts.supply(random.nextBoolean() ? 3.3 : 2.5, 0.02),
                    new FeedbackDemand.Levels(trip, release, 0.2), pull,
                    new FeedbackDemand.Values(values, values, feedbacks, 5e3, OptionalDouble.empty()));
            double best = Double.POSITIVE_INFINITY;
            for (double top : values) {
                for (double bottom : values) {
                    for (double feedback : feedbacks) {
                        if (top + bottom >= 5e3) {
                            best = Math.min(best, miss(demand, top, bottom, feedback));
                        }
                    }
                }
            }
            HysteresisChoice.Feedback found = HysteresisChoice.feedback(demand).orElseThrow();
            Threshold.Divider divider = found.threshold();
            assertThat(divider.top() + divider.bottom()).isGreaterThanOrEqualTo(5e3);
            double reached = miss(demand, divider.top(), divider.bottom(), found.network().resistance());
            assertThat(reached).as("trip " + trip + " V, release " + release + " V").isLessThanOrEqualTo(best + 0.1);
            equal += reached <= best + 1e-9 ? 1 : 0;
            all++;
        }
        assertThat(equal).as("as good as the best of all triples").isGreaterThan(all * 19 / 20);
    }

    @Test
    void feedbackKeepsThePinnedResistor() {
        double[] values = ESeries.E24.within(Range.of(1e3, 100e3));
        FeedbackDemand demand = new FeedbackDemand(TrialParts.supply(3.3, 0.02),
                new FeedbackDemand.Levels(1.5, 1.4, 0.2),
                new PullUp(10e3, TrialParts.supply(3.3, 0.02).voltage(), true, false),
                new FeedbackDemand.Values(values, values, values, 5e3, OptionalDouble.of(123456)));
        assertThat(HysteresisChoice.feedback(demand).orElseThrow().network().resistance()).isEqualTo(123456);
    }
}
