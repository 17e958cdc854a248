package shuntwright.planner.window.budget;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Outcome;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.Histogram;
import shuntwright.sampling.Probability;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

class HistogramDrawingTest {
    private static Assessment trip(Range limits, Range allowed) {
        return new Assessment(Outcome.TRIP, 10, limits,
                new CombinedUncertainty(10, 0.1, Double.POSITIVE_INFINITY, 0.9545, 2), allowed, List.of(),
                Optional.empty());
    }

    private static Propagated trials(Range allowed) {
        CoverageInterval interval = new CoverageInterval(Range.of(9.8, 10.2), new CoverageInterval.Ends(1e-3, 1e-3));
        return new Propagated(Outcome.TRIP, allowed, new Sampled(100, 0, 10, 0.1, interval, interval,
                new Probability(0.1, Range.of(0.05, 0.2), 0.03, Probability.Method.COUNTED, 100),
                new Histogram(Range.of(9.6, 10.4), List.of(10L, 40L, 40L, 10L), 100)),
                new Validation(true, 2, 0.005, 0.001, 0.001), List.of());
    }

    @Test
    void cellsBeyondTheWindowAreOutside() {
        Range allowed = Range.of(9.5, 10.2);
        HistogramDrawing drawing = HistogramDrawing.of("horn, trip current", trip(Range.of(9.5, 10.5), allowed),
                Optional.of(trials(allowed)),
                "sampling …");
        assertThat(drawing.bars()).extracting(HistogramDrawing.Bar::height).containsExactly(0.25, 1.0, 1.0, 0.25);
        assertThat(drawing.bars()).extracting(HistogramDrawing.Bar::outside).containsExactly(false, false, false, true);
        assertThat(drawing.empty()).isEmpty();
        assertThat(drawing.spans()).extracting(HistogramDrawing.Span::label).containsExactly("limits", "combined",
                "symmetric", "shortest");
        // the middle of the axis is the middle of limits and window
        assertThat(drawing.bars().get(1).to()).isEqualTo(0.5, within(1e-9));
        assertThat(drawing.words()).contains("allowed 9.5 .. 10.2 A").contains("symmetric 9.8 .. 10.2 A")
                .contains("mean 10 A");
    }

    @Test
    void aFarAwayEndIsCutOffAndMarked() {
        HistogramDrawing drawing = HistogramDrawing.of("horn, trip current",
                trip(Range.of(9.5, 1e9), Range.of(0.1, 10.5)),
                Optional.of(trials(Range.of(0.1, 10.5))), "");
        HistogramDrawing.Span limits = drawing.spans().getFirst();
        assertThat(limits.beyond()).isTrue();
        assertThat(limits.to()).isEqualTo(1);
        assertThat(limits.value()).isEqualTo("9.5 A .. thermal runaway");
        assertThat(drawing.allowed().before()).isTrue();
        assertThat(drawing.axis().width()).as("the trials stay readable").isLessThan(8 * 0.8);
    }

    @Test
    void withoutTrialsTheIntervalsStillStand() {
        Range allowed = Range.of(9.7, 10.3);
        HistogramDrawing drawing = HistogramDrawing.of("horn, trip current", trip(Range.of(9.5, 10.5), allowed),
                Optional.empty(),
                "not sampled");
        assertThat(drawing.bars()).isEmpty();
        assertThat(drawing.empty()).isEqualTo("not sampled");
        assertThat(drawing.spans()).hasSize(2);
        assertThat(drawing.allowed().from()).isGreaterThan(drawing.spans().getFirst().from());
    }

    @Test
    void ticksAreRoundDistinctAndOnTheAxis() {
        for (double width : new double[]{1e-6, 3e-3, 0.02, 0.7, 40}) {
            HistogramDrawing drawing = HistogramDrawing.of("horn, trip current",
                    trip(Range.of(10 - width, 10 + width), Range.of(9, 11)),
                    Optional.empty(), "");
            List<HistogramDrawing.Tick> ticks = drawing.ticks(6);
            assertThat(ticks).as("ticks for ±" + width + " A").hasSizeBetween(2, 7)
                    .allMatch(tick -> tick.at() >= 0 && tick.at() <= 1)
                    .allMatch(tick -> tick.text().endsWith("A"));
            assertThat(ticks.stream().map(HistogramDrawing.Tick::text).distinct().count()).isEqualTo(ticks.size());
        }
    }
}
