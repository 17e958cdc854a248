package shuntwright.choice;

import java.util.OptionalDouble;

import shuntwright.board.Acceptance;
import shuntwright.board.Tap;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/**
 * Where a threshold may lie for given shunts, amplifier and comparator, at both ends of ambient; and how far a threshold
 * from a given source spreads. Everything that decides the values of divider and hysteresis, in volts at the amplifier's
 * output.
 */
final class Window {

    /** A target is kept this share of the window away from its ends. */
    private static final double EDGE = 0.02;

    /** The threshold must stay at or above, by end of ambient, V. */
    final double[] low = new double[2];
    /** The threshold must stay at or below, V. */
    final double[] high = new double[2];
    /** The release voltage must stay at or above, V; unused where it latches. */
    final double[] releaseLow = new double[2];
    /** The release voltage must stay at or below, V. */
    final double[] releaseHigh = new double[2];
    /** Comparator offset with drift, V. */
    final double[] offset = new double[2];
    final Comparator comparator;
    final boolean rearms;

    private final ThresholdTerms terms;
    private final double ceiling;
    private final double target;
    private final double above;
    private final double below;
    private final boolean byLimits;
    private final OptionalDouble pinned;

    Window(Candidates candidates, int candidate, ShuntTerms s, AmplifierTerms a, Comparator comparator,
            ThresholdTerms terms, ChannelProblem problem) {
        this.comparator = comparator;
        this.terms = terms;
        this.byLimits = problem.acceptance().basis() == Acceptance.Basis.LIMITS;
        this.pinned = problem.demand().channel().pins().hysteresisResistor();
        this.rearms = problem.demand().rearm().isPresent();
        Surroundings around = problem.around();
        int j = candidates.amplifier(candidate);
        double bottom = a.amplifiers[j].ranges().outputLow();
        for (int end = 0; end < 2; end++) {
            offset[end] = comparator.inputs().offset() + comparator.inputs().offsetDrift() * terms.local[end];
            low[end] = Math.max(candidates.low(candidate, end), bottom);
            high[end] = candidates.high(candidate, end);
            if (rearms) {
                releaseLow[end] = Math.max(bottom,
                        a.gainHigh[end][j] * (s.rearmLowHigh[end] + a.error[end][j] + s.emf));
                releaseHigh[end] = a.gainLow[end][j] * (s.rearmHighLow[end] - a.error[end][j] - s.emf);
            }
            if (rearms && comparator.hysteresis() instanceof Hysteresis.BuiltIn(Range builtIn)) {
                low[end] = Math.max(low[end], releaseLow[end] + builtIn.max());
                high[end] = Math.min(high[end], releaseHigh[end] + builtIn.min());
            }
        }
        ceiling = Math.min(LimitRules.highestOutput(a.amplifiers[j], around),
                LimitRules.highestThreshold(comparator, around));
        double top = Math.min(ceiling, Math.min(high[0], high[1]));
        double base = Math.max(low[0], low[1]);
        boolean open = base < top;
        double edge = EDGE * (top - base);
        double wanted = a.gain[j] * s.resistance * problem.demand().tripTarget();
        target = open ? Math.min(top - edge, Math.max(base + edge, wanted)) : (base + top) / 2;
        above = open ? top - target : 1;
        below = open ? target - base : 1;
    }

    /** The threshold that corresponds to the trip target, kept a little inside the window, V. */
    double target() {
        return target;
    }

    /** Room left above a threshold's highest value at an end, as a share of the room above the target. */
    double roomAbove(double most, int end) {
        return (Math.min(high[end], ceiling) - most) / above;
    }

    /** Room left below a threshold's lowest value at an end, as a share of the room below the target. */
    double roomBelow(double least, int end) {
        return (least - low[end]) / below;
    }

    /** Relative movement of a resistor of the channel's own at an end of ambient. */
    double movement(ResistorSeries resistors, int end) {
        return terms.movement(resistors, false, end);
    }

    Range source(SourceVoltage source, int end) {
        return terms.extremes(source, end);
    }

    /** Highest threshold that amplifier and comparator take, V. */
    double ceiling() {
        return ceiling;
    }

    /** True when the spread of the release voltage certainly fits its window. */
    boolean releaseMayFit(double thresholdSpread, ResistorSeries resistors) {
        if (!rearms) {
            return true;
        }
        return switch (comparator.hysteresis()) {
            case Hysteresis.InjectedCurrent injected -> {
                boolean fits = true;
                for (int end = 0; end < 2; end++) {
                    double least = Math.max(0, low[end] - releaseHigh[end] - injected.builtIn().min());
                    double t = movement(resistors, end);
                    double share = (injected.current().max() * (1 + t) - injected.current().min() * (1 - t))
                            / injected.current().nominal();
                    fits &= thresholdSpread + injected.builtIn().width() + share * least <= releaseHigh[end]
                            - releaseLow[end];
                }
                yield fits;
            }
            case Hysteresis.PositiveFeedback _,Hysteresis.BuiltIn _ -> {
                boolean fits = true;
                for (int end = 0; end < 2; end++) {
                    fits &= thresholdSpread <= releaseHigh[end] - releaseLow[end];
                }
                yield fits;
            }
            case Hysteresis.Latched _ -> false;
        };
    }

    /** Lowest threshold from which the least hysteresis that R_H can make still leaves the release in its window, V. */
    private double floor(ResistorSeries resistors, int end) {
        double least = Math.max(low[end], comparator.inputs().lowest());
        if (rearms && byLimits && comparator.hysteresis() instanceof Hysteresis.InjectedCurrent injected) {
            double smallest = pinned.orElse(resistors.values().min());
            return Math.max(least, releaseLow[end] + injected.builtIn().max()
                    + injected.current().max() * smallest * (1 + movement(resistors, end)));
        }
        return least;
    }

    /**
     * Ratios k of a divider whose threshold stays within the window at both ends, without bias current; min &gt; max when
     * there is none. Written to {@code into}.
     */
    void ratios(SourceVoltage source, ResistorSeries resistors, double[] into) {
        double least = 0;
        double most = 1;
        for (int end = 0; end < 2; end++) {
            double t = movement(resistors, end);
            Range vx = source(source, end);
            double upper = (Math.min(high[end], ceiling) - offset[end]) / vx.max();
            double lower = (floor(resistors, end) + offset[end]) / vx.min();
            most = Math.min(most, upper >= 1 ? 1 : upper <= 0 ? 0 : SourceTerms.moved(upper, -t));
            least = Math.max(least, lower >= 1 ? 1 : lower <= 0 ? 0 : SourceTerms.moved(lower, t));
        }
        into[0] = least;
        into[1] = most;
    }

    /** The same for a DAC output whose full scale is the source. */
    void dacRatios(SourceVoltage source, Tap.Kind.Dac dac, ResistorSeries resistors, double[] into) {
        double gainError = dac.gainError();
        double error = dac.offset() + dac.nonlinearity() * source.voltage().nominal() / (1 << dac.bits());
        double least = 0;
        double most = 1;
        for (int end = 0; end < 2; end++) {
            Range vx = source(source, end);
            double slip = offset[end] + error;
            most = Math.min(most, (Math.min(high[end], ceiling) - slip) / (vx.max() * (1 + gainError)));
            least = Math.max(least,
                    (floor(resistors, end) + slip) / (vx.min() * (1 - gainError)));
        }
        into[0] = least;
        into[1] = most;
    }

    /** Extremes of the threshold of a tap's divider of ratio k at an end of ambient without bias, V. */
    Range tap(SourceVoltage source, ResistorSeries resistors, double k, int end) {
        double t = terms.movement(resistors, true, end);
        Range vx = source(source, end);
        return Range.of(vx.min() * SourceTerms.moved(k, -t) - offset[end],
                vx.max() * SourceTerms.moved(k, t) + offset[end]);
    }

    /** Largest possible threshold at an end of ambient for an own divider of ratio k without bias, V. */
    double highest(SourceVoltage source, ResistorSeries resistors, double k, int end) {
        return source(source, end).max() * SourceTerms.moved(k, movement(resistors, end)) + offset[end];
    }

    /** Smallest possible threshold, V. */
    double lowest(SourceVoltage source, ResistorSeries resistors, double k, int end) {
        return source(source, end).min() * SourceTerms.moved(k, -movement(resistors, end)) - offset[end];
    }

    /** Slack of a threshold that spreads over {@code least} .. {@code most} at an end, V; negative outside. */
    double slack(double least, double most, int end) {
        return Math.min(Math.min(high[end], ceiling) - most, least - low[end]);
    }
}
