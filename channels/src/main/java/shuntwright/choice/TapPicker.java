package shuntwright.choice;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import shuntwright.board.Tap;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;

/**
 * Chooses the voltage of a tap: the one at which most of its channels find a candidate, then the one with least heat of
 * them all (within the design rules' heat step for each), in the middle of the widest stretch of such voltages.
 */
public final class TapPicker {

    private static final int STEPS = 600;
    /** Below this share of the source a divider or DAC is of no use: offsets decide (common practice). */
    private static final double LEAST = 0.02;
    /** A source further off than this factor from its nominal voltage is not served well anyway. */
    private static final double WIDEST = 1.3;
    private static final double MOST = 0.995;

    private final DividerTables tables;

    public TapPicker(DividerTables tables) {
        this.tables = tables;
    }

    /**
     * @param tap      the tap
     * @param source   its source
     * @param problems of the channels that use it, as if each had an own divider from that source
     * @param users    comparators that load it
     */
    public Optional<Threshold> pick(Tap tap, SourceVoltage source, List<ChannelProblem> problems, int users) {
        return several(tap, source, problems, users, 1).stream().findFirst();
    }

    /**
     * Thresholds that serve most of the channels, the one that {@link #pick} takes first, then others spread over all voltages that serve
     * as many.
     *
     * @param most how many, ≥ 1
     */
    public List<Threshold> several(Tap tap, SourceVoltage source, List<ChannelProblem> problems, int users, int most) {
        double nominal = source.voltage().nominal();
        List<Double> ratios = tap.voltage().isPresent()
                ? List.of(tap.voltage().getAsDouble() / nominal)
                : best(tap.kind(), source, problems, most);
        Set<Threshold> thresholds = new LinkedHashSet<>();
        for (double ratio : ratios) {
            threshold(tap, source, problems, users, ratio).ifPresent(thresholds::add);
        }
        return List.copyOf(thresholds);
    }

    private Optional<Threshold> threshold(Tap tap, SourceVoltage source, List<ChannelProblem> problems, int users,
            double ratio) {
        return switch (tap.kind()) {
            case Tap.Kind.Dac dac -> {
                int steps = 1 << dac.bits();
                int code = (int) Math.max(1, Math.min(steps - 1, Math.round(ratio * steps)));
                yield Optional.of(new Threshold.DacOutput(source, dac, code, tap.name()));
            }
            case Tap.Kind.Divider divider -> problems.isEmpty()
                    ? Optional.empty()
                    : new ValueChoice(tables)
                            .nearest(source, ratio * source.voltage().nominal(),
                                    problems.getFirst().resistors().getFirst(),
                                    problems.getFirst().around().rules(), tap.name(), users, divider.top(),
                                    divider.bottom())
                            .map(Threshold.class::cast);
        };
    }

    private static List<Double> best(Tap.Kind kind, SourceVoltage source, List<ChannelProblem> problems, int wanted) {
        int[] served = new int[STEPS];
        double[] heat = new double[STEPS];
        for (ChannelProblem problem : problems) {
            double[] least = leastHeat(kind, source, problem);
            for (int i = 0; i < STEPS; i++) {
                if (least[i] < Double.POSITIVE_INFINITY) {
                    served[i]++;
                    heat[i] += least[i];
                }
            }
        }
        int most = Arrays.stream(served).max().orElse(0);
        double least = Double.POSITIVE_INFINITY;
        double step = 0;
        for (ChannelProblem problem : problems) {
            step += problem.around().rules().heatStep();
        }
        for (int i = 0; i < STEPS; i++) {
            if (served[i] == most) {
                least = Math.min(least, heat[i]);
            }
        }
        List<Double> ratios = new ArrayList<>(
                List.of(ratio(middleOfWidest(served, heat, most, least * (1 + 1e-9) + step))));
        List<Integer> serving = new ArrayList<>();
        for (int i = 0; i < STEPS; i++) {
            if (served[i] == most && most > 0) {
                serving.add(i);
            }
        }
        for (int i = 1; i < wanted && !serving.isEmpty(); i++) {
            ratios.add(ratio(serving.get((int) ((2L * i - 1) * serving.size() / (2L * (wanted - 1))))));
        }
        return ratios;
    }

    /** Middle of the widest run of steps that serve {@code most} channels with no more than {@code allowed} heat. */
    private static double middleOfWidest(int[] served, double[] heat, int most, double allowed) {
        double middle = 0;
        int widest = 0;
        int from = 0;
        for (int i = 0; i <= STEPS; i++) {
            if (i == STEPS || served[i] != most || heat[i] > allowed) {
                if (i - from > widest) {
                    widest = i - from;
                    middle = (from + i - 1) / 2.0;
                }
                from = i + 1;
            }
        }
        return middle;
    }

    private static double ratio(double step) {
        return LEAST * Math.pow(MOST / LEAST, step / (STEPS - 1));
    }

    private static int step(double ratio) {
        return (int) Math.round(Math.log(ratio / LEAST) / Math.log(MOST / LEAST) * (STEPS - 1));
    }

    /** Those with built-in hysteresis only, whose window depends on it, and the one with least offset of the others. */
    private static List<Comparator> distinct(List<Comparator> comparators) {
        List<Comparator> distinct = new ArrayList<>(comparators.stream()
                .filter(each -> each.hysteresis() instanceof Hysteresis.BuiltIn).toList());
        comparators.stream().filter(each -> !(each.hysteresis() instanceof Hysteresis.BuiltIn))
                .min(java.util.Comparator.comparingDouble(each -> each.inputs().offset())).ifPresent(distinct::add);
        return distinct;
    }

    /** Steps not yet taken; finds the next one in almost constant time. */
    private static final class Free {
        private final int[] next = new int[STEPS + 1];

        Free() {
            for (int i = 0; i <= STEPS; i++) {
                next[i] = i;
            }
        }

        int from(int step) {
            int root = Math.min(step, STEPS);
            while (next[root] != root) {
                next[root] = next[next[root]];
                root = next[root];
            }
            return root;
        }

        /** True when some step within these ratios is not yet taken. */
        boolean within(double low, double high) {
            return low <= MOST && high >= LEAST
                    && from(Math.max(0, step(Math.max(low, LEAST)))) <= Math.min(STEPS - 1, step(high));
        }

        void take(int step) {
            next[step] = step + 1;
        }
    }

    /** Least heat of a channel's candidates for each step of the ratio; infinite where there is none. */
    private static double[] leastHeat(Tap.Kind kind, SourceVoltage source, ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        Candidates found = search.promising();
        boolean none = found.size() == 0;
        if (none) {
            found = search.nearest(40);
        }
        double[] least = new double[STEPS];
        Arrays.fill(least, Double.POSITIVE_INFINITY);
        List<Comparator> comparators = distinct(ChannelPicker.comparators(problem));
        ResistorSeries resistors = problem.resistors().getFirst();
        double[] ratios = new double[2];
        Free free = new Free();
        double nominal = source.voltage().nominal();
        for (int candidate = 0; candidate < found.size(); candidate++) {
            ShuntTerms shunt = search.shunt(found.shunt(candidate));
            if (!none && !free.within(found.low(candidate, 1) / nominal / WIDEST,
                    found.high(candidate, 1) / nominal * WIDEST)) {
                continue;
            }
            for (Comparator comparator : comparators) {
                Window window = search.window(found, candidate, comparator);
                switch (kind) {
                    case Tap.Kind.Divider _ -> window.ratios(source, resistors, ratios);
                    case Tap.Kind.Dac dac -> window.dacRatios(source, dac, resistors, ratios);
                }
                double low = none ? Math.min(ratios[0], ratios[1]) : ratios[0];
                double high = none ? Math.max(ratios[0], ratios[1]) : ratios[1];
                if (low <= high && high >= LEAST && low <= MOST) {
                    int to = Math.min(STEPS - 1, step(high));
                    // By ascending heat the first candidate to reach a step is its best (not so for the nearest ones).
                    for (int i = none
                            ? Math.max(0, step(Math.max(low, LEAST)))
                            : free.from(Math.max(0, step(Math.max(low, LEAST)))); i <= to; i = none
                                    ? i + 1
                                    : free.from(i + 1)) {
                        least[i] = Math.min(least[i], shunt.heat);
                        free.take(i);
                    }
                }
            }
        }
        return least;
    }
}
