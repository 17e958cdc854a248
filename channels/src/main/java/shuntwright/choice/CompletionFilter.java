package shuntwright.choice;

import java.util.List;

import shuntwright.board.Acceptance;
import shuntwright.board.Pins;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/**
 * Rejects completions that certainly cannot be accepted, before their values are chosen and judged exactly. Every test
 * here is a necessary condition; a property test holds them against exact judgement.
 */
final class CompletionFilter {

    private final ChannelProblem problem;
    private final CandidateSearch search;
    private final Candidates found;
    private final DividerTables tables;
    private final boolean coverage;
    private final boolean rearms;
    /** The part of a source's spread that is certain: with feedback the pull-up shares in the threshold. */
    private final double share;
    private final double tapShift;

    CompletionFilter(ChannelProblem problem, CandidateSearch search, Candidates found, List<Comparator> comparators,
            DividerTables tables) {
        this.problem = problem;
        this.search = search;
        this.found = found;
        this.tables = tables;
        this.coverage = problem.acceptance().basis() == Acceptance.Basis.COVERAGE;
        this.rearms = problem.demand().rearm().isPresent();
        this.share = comparators.stream().anyMatch(CompletionFilter::feedsBack) ? 0.5 : 1;
        this.tapShift = problem.tap().isPresent() ? tapShift(comparators) : 0;
    }

    /** False only when no source, or not the tap, can serve this candidate with any comparator and series. */
    boolean roomForAny(int candidate) {
        if (coverage) {
            return true;
        }
        ShuntTerms shunt = search.shunt(found.shunt(candidate));
        AmplifierTerms a = search.amplifiers();
        int j = found.amplifier(candidate);
        for (int end = 0; end < 2; end++) {
            double low = found.low(candidate, end);
            double high = found.high(candidate, end);
            double spread = low * share * (search.thresholds().tightest[end] - 1);
            if (problem.tap().isPresent() ? !tapFits(low, high, end) : high < low + spread) {
                return false;
            }
            if (rearms) {
                double from = a.gainHigh[end][j] * (shunt.rearmLowHigh[end] + a.error[end][j] + shunt.emf);
                double to = a.gainLow[end][j] * (shunt.rearmHighLow[end] - a.error[end][j] - shunt.emf);
                if (to < from + (problem.tap().isPresent() ? 0 : spread)) {
                    return false;
                }
            }
        }
        return true;
    }

    private boolean tapFits(double low, double high, int end) {
        Threshold tap = problem.tap().orElseThrow();
        Range source = search.thresholds().extremes(tap.source(), end);
        double ratio = tap.nominalVoltage() / tap.source().voltage().nominal();
        return source.max() * ratio <= high + tapShift && source.min() * ratio >= low - tapShift;
    }

    /** Largest shift of the tap's threshold by any comparator's bias current, V. */
    private double tapShift(List<Comparator> comparators) {
        double shift = 0;
        double load = problem.tap().orElseThrow() instanceof Threshold.Divider divider
                ? divider.parallel() * divider.users()
                : 0;
        for (Comparator comparator : comparators) {
            Range bias = comparator.inputs().biasCurrent();
            double most = Math.max(Math.abs(bias.min()), Math.abs(bias.max()));
            boolean oneSided = !bias.contains(0);
            for (ResistorSeries resistors : problem.resistors()) {
                shift = Math.max(shift, most * (load + (oneSided ? resistors.values().max() : 0)));
            }
        }
        return shift;
    }

    /** False only when no pair of this series can serve from this source. */
    boolean mayServe(int candidate, Window window, SourceVoltage source, ResistorSeries resistors,
            double[] ratios) {
        if (coverage && search.mayBeLikely(found, candidate, variance(window, source, resistors))) {
            return true;
        }
        if (feedsBack(window.comparator)) {
            return feedbackMayServe(window, source);
        }
        double nominal = source.voltage().nominal();
        double shift = ownShift(window, resistors, ratios[1] * nominal) / nominal;
        ratios[0] -= shift;
        ratios[1] += shift;
        boolean there = problem.demand().channel().pins().dividerTop().isPresent()
                || tables.of(resistors).has(ratios[0], ratios[1]);
        return ratios[0] <= ratios[1] && there
                && window.releaseMayFit(narrowest(window, source, resistors, ratios), resistors);
    }

    /**
     * With feedback the threshold is w·V_out + (1 − w)·V_divider with w close to the wanted hysteresis over the output's
     * swing; the source's spread counts by 1 − w, the divider's resistors are left out.
     */
    private boolean feedbackMayServe(Window window, SourceVoltage source) {
        double swing = problem.pullUp().voltage().nominal() - window.comparator.output().lowLevel().mid();
        boolean may = true;
        for (int end = 0; end < 2; end++) {
            double trip = (window.low[end] + window.high[end]) / 2;
            double least = Math.max(0, window.low[end] - window.releaseHigh[end]);
            double most = Math.max(0, window.high[end] - window.releaseLow[end]);
            double share = Math.max(0, 1 - most / swing);
            Range range = window.source(source, end);
            double spread = (range.max() - range.min()) / range.max() * (trip - least) * share * 0.7;
            may &= window.high[end] - window.low[end] >= spread + 2 * window.offset[end]
                    && window.releaseHigh[end] - window.releaseLow[end] >= 2 * window.offset[end];
        }
        return may;
    }

    /** Relative variance of a threshold in the middle of the window, rather too small than too large. */
    private double variance(Window window, SourceVoltage source, ResistorSeries resistors) {
        if (feedsBack(window.comparator)) {
            return 0;
        }
        double middle = (window.low[0] + window.high[0]) / 2;
        double nominal = source.voltage().nominal();
        double tolerance = (source.voltage().tolerance().below() + source.voltage().tolerance().above()) / 2;
        double rest = 1 - Math.min(1, Math.max(0, window.high[0] / nominal));
        double pair = 2 * rest * rest * (resistors.tolerance() * resistors.tolerance() * (1 - resistors.correlation())
                + resistors.ageing() * resistors.ageing());
        double offset = window.comparator.inputs().offset() / Math.max(middle, window.high[0]);
        return (tolerance * tolerance + source.ageing() * source.ageing() + pair + offset * offset) / 3;
    }

    private static boolean feedsBack(Comparator comparator) {
        return comparator.hysteresis() instanceof Hysteresis.PositiveFeedback;
    }

    /** The smallest spread of a threshold between two ratios, V; a concave function of the ratio, so at one of them. */
    private static double narrowest(Window window, SourceVoltage source, ResistorSeries resistors, double[] ratios) {
        double least = Double.POSITIVE_INFINITY;
        for (double ratio : ratios) {
            double k = Math.max(0, Math.min(1, ratio));
            for (int end = 0; end < 2; end++) {
                least = Math.min(least,
                        window.highest(source, resistors, k, end) - window.lowest(source, resistors, k, end));
            }
        }
        return least;
    }

    /** Largest shift of a threshold of about that voltage by a bias current that never vanishes, V. */
    private double ownShift(Window window, ResistorSeries resistors, double voltage) {
        double bias = leastBias(window);
        if (bias == 0) {
            return 0;
        }
        Pins pins = problem.demand().channel().pins();
        double divider = pins.dividerTop().isPresent() && pins.dividerBottom().isPresent()
                ? bias / (1 / pins.dividerTop().getAsDouble() + 1 / pins.dividerBottom().getAsDouble())
                : problem.around().rules().biasShare() * voltage;
        return 1.1 * (divider + bias * senseResistor(window, resistors));
    }

    private static double leastBias(Window window) {
        Range bias = window.comparator.inputs().biasCurrent();
        return bias.contains(0) ? 0 : Math.min(Math.abs(bias.min()), Math.abs(bias.max()));
    }

    /** Largest R_H that may come to stand before the sense input, Ω. */
    private double senseResistor(Window window, ResistorSeries resistors) {
        return window.comparator.hysteresis() instanceof Hysteresis.InjectedCurrent
                ? problem.demand().channel().pins().hysteresisResistor().orElse(resistors.values().max())
                : 0;
    }

    /** False only when the tap's threshold cannot serve, whatever the bias current does. */
    boolean tapMayServe(Window window, ResistorSeries resistors, double room) {
        if (coverage) {
            return true;
        }
        Range bias = window.comparator.inputs().biasCurrent();
        double most = Math.max(Math.abs(bias.min()), Math.abs(bias.max()));
        double load = problem.tap().orElseThrow() instanceof Threshold.Divider divider
                ? divider.parallel() * divider.users()
                : 0;
        return room >= -(most * load + leastBias(window) * (load + senseResistor(window, resistors)));
    }

    /** Slack of the tap's threshold within the window, V; negative outside. */
    double tapRoom(Window window, ResistorSeries resistors) {
        Threshold tap = problem.tap().orElseThrow();
        double room = Double.POSITIVE_INFINITY;
        for (int end = 0; end < 2; end++) {
            Range spread = HysteresisChoice.spread(window, tap, resistors, end);
            room = Math.min(room, window.slack(spread.min(), spread.max(), end));
        }
        return room;
    }
}
