package shuntwright.choice;

import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/** Chooses R_H for injected current, and R_t, R_b, R_F together for positive feedback. */
final class HysteresisChoice {

    /** How many neighbours of the ideal value are tried on either side. */
    private static final int NEIGHBOURS = 6;

    private HysteresisChoice() {
    }

    /**
     * R_H that leaves the release voltage most room within its window; nominal threshold and its spread in V. Empty when
     * no positive resistance makes the release low enough.
     */
    static Optional<HysteresisNetwork> senseResistor(Window window, Hysteresis.InjectedCurrent injected,
            Threshold threshold, ResistorSeries resistors, OptionalDouble pinned) {
        if (pinned.isPresent()) {
            return Optional.of(new HysteresisNetwork.SenseResistor(pinned.getAsDouble()));
        }
        double centre = centre(window);
        double ideal = (threshold.nominalVoltage() - centre - injected.builtIn().mid()) / injected.current().nominal();
        Range values = resistors.values();
        if (!(ideal > values.min())) {
            ideal = values.min();
        }
        ideal = Math.min(ideal, values.max());
        double best = Double.NEGATIVE_INFINITY;
        double chosen = 0;
        double value = resistors.series().nearest(ideal);
        for (int i = 0; i < NEIGHBOURS; i++) {
            value = below(resistors.series(), value);
        }
        for (int i = 0; i <= 2 * NEIGHBOURS; i++) {
            if (values.contains(value)) {
                double room = room(window, injected, threshold, resistors, value);
                if (room > best) {
                    best = room;
                    chosen = value;
                }
            }
            value = above(resistors.series(), value);
        }
        return chosen > 0 ? Optional.of(new HysteresisNetwork.SenseResistor(chosen)) : Optional.empty();
    }

    static double below(ESeries series, double value) {
        return series.atMost(value * (1 - 1e-6));
    }

    static double above(ESeries series, double value) {
        return series.atLeast(value * (1 + 1e-6));
    }

    private static double centre(Window window) {
        double low = Math.max(window.releaseLow[0], window.releaseLow[1]);
        double high = Math.min(window.releaseHigh[0], window.releaseHigh[1]);
        return (low + high) / 2;
    }

    private static double room(Window window, Hysteresis.InjectedCurrent injected, Threshold threshold,
            ResistorSeries resistors, double value) {
        double room = Double.POSITIVE_INFINITY;
        for (int end = 0; end < 2; end++) {
            double t = window.movement(resistors, end);
            Range spread = spread(window, threshold, resistors, end);
            double most = spread.max() - injected.builtIn().min() - injected.current().min() * value * (1 - t);
            double least = spread.min() - injected.builtIn().max() - injected.current().max() * value * (1 + t);
            room = Math.min(room,
                    Math.min(window.releaseHigh[end] - most, least - window.releaseLow[end]));
        }
        return room;
    }

    /** Extremes of a threshold at an end of ambient, V. */
    static Range spread(Window window, Threshold threshold, ResistorSeries resistors, int end) {
        return switch (threshold) {
            case Threshold.Divider divider -> {
                double k = divider.bottom() / (divider.top() + divider.bottom());
                Range bias = window.comparator.inputs().biasCurrent();
                double load = divider.parallel() * divider.users();
                Range unloaded = divider.tap().isEmpty()
                        ? Range.of(window.lowest(divider.source(), resistors, k, end),
                                window.highest(divider.source(), resistors, k, end))
                        : window.tap(divider.source(), resistors, k, end);
                yield Range.of(unloaded.min() - bias.max() * load, unloaded.max() - bias.min() * load);
            }
            case Threshold.DacOutput dac -> {
                double share = dac.code() / (double) (1 << dac.dac().bits());
                Range source = window.source(dac.source(), end);
                double step = dac.source().voltage().nominal() / (1 << dac.dac().bits());
                double error = dac.dac().offset() + dac.dac().nonlinearity() * step + window.offset[end];
                yield Range.of(source.min() * share * (1 - dac.dac().gainError()) - error,
                        source.max() * share * (1 + dac.dac().gainError()) + error);
            }
        };
    }

    /**
     * Divider and feedback resistor.
     *
     * @param threshold divider
     * @param network   feedback
     */
    record Feedback(Threshold.Divider threshold, HysteresisNetwork.Feedback network) {}

    /**
     * Solves R_t, R_b and R_F together: for every R_b of the series the R_F and R_t that meet the wanted thresholds exactly
     * are bracketed by series values, and all bracketing triples are compared by how far both thresholds are off.
     */
    static Optional<Feedback> feedback(FeedbackDemand demand) {
        FeedbackSearch search = new FeedbackSearch(demand);
        for (double bottom : demand.bottoms()) {
            search.look(bottom);
        }
        return search.best();
    }
}
