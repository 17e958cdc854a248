package shuntwright.planner.window.budget;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.planner.window.figures.Currents;
import shuntwright.planner.work.TrialWords;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;
import shuntwright.sampling.Histogram;
import shuntwright.sampling.Propagated;

/**
 * Trials of one outcome inside its allowed window, with the intervals of the three ways; all places are shares of the axis.
 *
 * @param title   whose outcome it is
 * @param axis    currents from its left to its right end, A
 * @param allowed the window; its ends are cut off at the axis
 * @param bars    cells of the histogram, from left to right; empty until sampled
 * @param spans   intervals, from above to below
 * @param empty   why there are no bars, in words; empty when there are
 * @param caption what the height of a bar is
 * @param words   everything in words
 */
record HistogramDrawing(String title, Range axis, Span allowed, List<Bar> bars, List<Span> spans, String empty,
        String caption, String words) {
    /** The axis reaches no farther beyond what was sampled than so many of its widths. */
    private static final double FARTHEST = 3;
    private static final double ROOM = 0.03;

    HistogramDrawing {
        bars = List.copyOf(bars);
        spans = List.copyOf(spans);
    }

    /**
     * One cell.
     *
     * @param from    left end
     * @param to      right end
     * @param height  0 to 1, the highest has 1
     * @param outside true where its middle is not allowed
     */
    record Bar(double from, double to, double height, boolean outside) {}

    /**
     * An interval on the axis.
     *
     * @param label  what it is
     * @param value  in words
     * @param from   left end, cut off at the axis
     * @param to     right end, cut off at the axis
     * @param before true when it goes on to the left of the axis
     * @param beyond true when it goes on to the right of the axis
     */
    record Span(String label, String value, double from, double to, boolean before, boolean beyond) {}

    /**
     * A current on the axis.
     *
     * @param at   its place
     * @param text with unit
     */
    record Tick(double at, String text) {}

    static HistogramDrawing of(String title, Assessment assessment, Optional<Propagated> propagated, String empty) {
        Range allowed = assessment.allowed();
        Range combined = assessment.combined().interval();
        List<Range> near = new ArrayList<>(List.of(combined));
        propagated.ifPresent(each -> near.addAll(List.of(each.sampled().symmetric().range(),
                each.sampled().shortest().range(), each.sampled().histogram().range())));
        Range axis = axis(near, List.of(allowed, assessment.limits()));
        List<Span> spans = new ArrayList<>();
        spans.add(span("limits", assessment.limits(), axis));
        spans.add(span("combined", combined, axis));
        propagated.ifPresent(each -> {
            spans.add(span("symmetric", each.sampled().symmetric().range(), axis));
            spans.add(span("shortest", each.sampled().shortest().range(), axis));
        });
        Span window = span("allowed", allowed, axis);
        List<Bar> bars = propagated.map(each -> bars(each.sampled().histogram(), allowed, axis)).orElse(List.of());
        return new HistogramDrawing(title, axis, window, bars, spans, bars.isEmpty() ? empty : "",
                propagated.map(each -> "share of " + TrialWords.count(each.sampled().trials()) + " trials").orElse(""),
                words(title, window, spans, propagated, empty));
    }

    private static Range axis(List<Range> near, List<Range> far) {
        double min = near.stream().mapToDouble(Range::min).min().orElse(0);
        double max = near.stream().mapToDouble(Range::max).max().orElse(1);
        double width = Math.max(max - min, Math.max(Math.abs(max) * 1e-6, 1e-12));
        double low = min;
        double high = max;
        for (Range each : far) {
            low = Math.min(low, Math.max(each.min(), min - FARTHEST * width));
            high = Math.max(high, Math.min(each.max(), max + FARTHEST * width));
        }
        double room = ROOM * Math.max(high - low, width);
        return Range.of(low - room, high + room);
    }

    private static double place(double current, Range axis) {
        return (current - axis.min()) / axis.width();
    }

    private static Span span(String label, Range range, Range axis) {
        double from = place(range.min(), axis);
        double to = place(range.max(), axis);
        return new Span(label, Currents.show(range), Math.clamp(from, 0, 1), Math.clamp(to, 0, 1), from < 0, to > 1);
    }

    private static List<Bar> bars(Histogram histogram, Range allowed, Range axis) {
        List<Long> counts = histogram.counts();
        long most = counts.stream().mapToLong(Long::longValue).max().orElse(0);
        List<Bar> bars = new ArrayList<>();
        double width = counts.isEmpty() ? 0 : histogram.range().width() / counts.size();
        for (int at = 0; at < counts.size() && most > 0; at++) {
            double from = histogram.range().min() + at * width;
            bars.add(new Bar(place(from, axis), place(from + width, axis), (double) counts.get(at) / most,
                    !allowed.contains(from + width / 2)));
        }
        return bars;
    }

    private static String words(String title, Span window, List<Span> spans, Optional<Propagated> propagated,
            String empty) {
        StringBuilder words = new StringBuilder("Distribution of ").append(title).append(": allowed ")
                .append(window.value());
        spans.forEach(each -> words.append("; ").append(each.label()).append(' ').append(each.value()));
        propagated.ifPresentOrElse(each -> words.append("; mean ").append(Currents.show(each.sampled().mean()))
                .append(", standard deviation ").append(Currents.small(each.sampled().standard())),
                () -> words.append("; ").append(empty));
        return words.append('.').toString();
    }

    /** Round currents along the axis, in steps of 1, 2 or 5. */
    List<Tick> ticks(int most) {
        double rough = axis.width() / Math.max(1, most);
        double power = Math.pow(10, Math.floor(Math.log10(rough)));
        double step = power * (rough <= power ? 1 : rough <= 2 * power ? 2 : rough <= 5 * power ? 5 : 10);
        double largest = Math.max(Math.abs(axis.min()), Math.abs(axis.max()));
        int digits = (int) Math.clamp(Math.floor(Math.log10(largest)) - Math.floor(Math.log10(step) + 1e-9) + 1, 1, 12);
        List<Tick> ticks = new ArrayList<>();
        for (double number = Math.ceil(axis.min() / step); number * step <= axis.max(); number++) {
            double current = number * step;
            ticks.add(new Tick(place(current, axis), QuantityWriter.show(current, Dimension.CURRENT, digits)));
        }
        return ticks;
    }
}
