package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.board.Acceptance;
import shuntwright.board.Pins;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/** The pair chosen for a divider against a loop over all pairs. */
class ValueChoiceTest {

    private static final double LEAST_VALUE = 47;
    private static final Range TOTAL = Range.of(500, 1e6);

    private final ValueChoice choice = new ValueChoice(new DividerTables());

    private record Pair(double top, double bottom, double room) {}

    /** Every pair that respects the bounds, with the room it leaves. */
    private static List<Pair> all(ChannelProblem problem, Window window, SourceVoltage source, ResistorSeries series) {
        List<Pair> pairs = new ArrayList<>();
        Pins pins = problem.demand().channel().pins();
        double[] values = series.series().within(series.values());
        for (double top : values) {
            for (double bottom : values) {
                boolean pinned = pins.dividerTop().orElse(top) == top && pins.dividerBottom().orElse(bottom) == bottom;
                if (pinned && Math.min(top, bottom) >= LEAST_VALUE && TOTAL.contains(top + bottom)
                        && respects(problem, window, source, top, bottom)) {
                    pairs.add(new Pair(top, bottom, room(problem, window, source, series, top, bottom)));
                }
            }
        }
        return pairs;
    }

    private static boolean respects(ChannelProblem problem, Window window, SourceVoltage source, double top,
            double bottom) {
        Range bias = window.comparator.inputs().biasCurrent();
        double shift = Math.max(Math.abs(bias.min()), Math.abs(bias.max())) / (1 / top + 1 / bottom);
        double current = source.voltage().max() / (top + bottom);
        double voltage = source.voltage().nominal() * bottom / (top + bottom);
        return current <= problem.around().rules().dividerCurrent() * (1 + 1e-12)
                && shift <= problem.around().rules().biasShare() * voltage * (1 + 1e-12);
    }

    private static double room(ChannelProblem problem, Window window, SourceVoltage source, ResistorSeries series,
            double top, double bottom) {
        double room = Double.POSITIVE_INFINITY;
        double nominal = source.voltage().nominal();
        Range bias = window.comparator.inputs().biasCurrent();
        double parallel = 1 / (1 / top + 1 / bottom);
        for (int end = 0; end < 2; end++) {
            Range ambient = problem.around().ambient();
            double air = Math.abs((end == 0 ? ambient.min() : ambient.max()) - 25);
            double kelvin = Math.abs((end == 0 ? ambient.min() : ambient.max() + problem.around().rise()) - 25);
            double moves = series.tolerance() + series.ageing() + series.temperatureCoefficient() * kelvin;
            double drifts = source.drift() * air + source.ageing();
            double least = source.voltage().min() - nominal * drifts - source.loadDrop();
            double most = source.voltage().max() + nominal * drifts;
            double down = least * bottom * (1 - moves) / (bottom * (1 - moves) + top * (1 + moves));
            double up = most * bottom * (1 + moves) / (bottom * (1 + moves) + top * (1 - moves));
            double offset = window.comparator.inputs().offset() + window.comparator.inputs().offsetDrift() * kelvin;
            double base = Math.max(window.low[0], window.low[1]);
            double lid = Math.min(window.ceiling(), Math.min(window.high[0], window.high[1]));
            double below = base < lid ? window.target() - base : 1;
            double above = base < lid ? lid - window.target() : 1;
            room = Math.min(room, (down - offset - bias.max() * parallel - window.low[end]) / below);
            room = Math.min(room,
                    (Math.min(window.high[end], window.ceiling()) - (up + offset - bias.min() * parallel)) / above);
        }
        return room;
    }

    @Test
    void leavesTheMostRoomOfAllPairs() {
        int compared = 0;
        for (int seed = 0; seed < 150; seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), Acceptance.Basis.LIMITS);
            for (Window window : BruteForce.windows(problem)) {
                for (SourceVoltage source : problem.sources()) {
                    ResistorSeries series = problem.resistors().getFirst();
                    compare(problem, window, source, series, Pins.NONE);
                    compared++;
                }
            }
        }
        assertThat(compared).isGreaterThan(500);
    }

    private void compare(ChannelProblem problem, Window window, SourceVoltage source, ResistorSeries series,
            Pins pins) {
        List<Threshold.Divider> chosen = choice.dividers(window, source, series, problem.around().rules(), pins);
        List<Pair> all = all(problem, window, source, series).stream()
                .filter(each -> pins.dividerTop().orElse(each.top()) == each.top()
                        && pins.dividerBottom().orElse(each.bottom()) == each.bottom())
                .toList();
        if (all.isEmpty()) {
            assertThat(chosen).isEmpty();
            return;
        }
        double best = all.stream().mapToDouble(Pair::room).max().orElseThrow();
        double same = 1e-7;
        assertThat(chosen).isNotEmpty().allSatisfy(each -> {
            assertThat(respects(problem, window, source, each.top(), each.bottom())).isTrue();
            assertThat(room(problem, window, source, series, each.top(), each.bottom())).isEqualTo(best, within(same));
            assertThat(each.source()).isEqualTo(source);
            assertThat(each.users()).isEqualTo(1);
        });
        long ties = all.stream().filter(each -> each.room() >= best - 1e-10).count();
        assertThat(chosen).hasSizeGreaterThanOrEqualTo((int) Math.min(3, ties)).doesNotHaveDuplicates();
    }

    @Test
    void keepsPinnedValues() {
        for (int seed = 0; seed < 60; seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), Acceptance.Basis.LIMITS);
            ResistorSeries series = problem.resistors().getFirst();
            for (SourceVoltage source : problem.sources()) {
                for (Window window : BruteForce.windows(problem)) {
                    compare(problem, window, source, series, pins(OptionalDouble.of(10e3), OptionalDouble.empty()));
                    compare(problem, window, source, series, pins(OptionalDouble.empty(), OptionalDouble.of(10e3)));
                    assertThat(choice.dividers(window, source, series, problem.around().rules(),
                            pins(OptionalDouble.of(1234), OptionalDouble.of(77))))
                            .containsExactly(new Threshold.Divider(source, 1234, 77, "", 1));
                }
            }
        }
    }

    private static Pins pins(OptionalDouble top, OptionalDouble bottom) {
        return new Pins(Optional.empty(), OptionalInt.empty(), Optional.empty(), Optional.empty(), Optional.empty(),
                top,
                bottom, OptionalDouble.empty());
    }

    @Test
    void prefersTiesInTheMiddleOfTheAllowedTotals() {
        ChannelProblem problem = RandomProblems.problem(new SplittableRandom(0), Acceptance.Basis.LIMITS);
        int found = 0;
        for (int seed = 0; seed < 100; seed++) {
            problem = RandomProblems.problem(new SplittableRandom(seed), Acceptance.Basis.LIMITS);
            ResistorSeries series = problem.resistors().getFirst();
            for (SourceVoltage source : problem.sources()) {
                for (Window window : BruteForce.windows(problem)) {
                    List<Threshold.Divider> chosen = choice.dividers(window, source, series, problem.around().rules(),
                            Pins.NONE);
                    double middle = Math.sqrt(source.voltage().max() / problem.around().rules().dividerCurrent() * 1e6);
                    List<Double> distance = chosen.stream()
                            .map(each -> Math.abs(Math.log((each.top() + each.bottom()) / middle))).toList();
                    found += chosen.size() > 1 ? 1 : 0;
                    for (int i = 1; i < distance.size(); i++) {
                        assertThat(distance.get(i)).isGreaterThanOrEqualTo(distance.get(i - 1) - 1e-9);
                    }
                }
            }
        }
        assertThat(found).as("ties").isGreaterThan(10);
    }
}
