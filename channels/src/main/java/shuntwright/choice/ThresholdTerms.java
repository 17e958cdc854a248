package shuntwright.choice;

import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.ArrayList;
import java.util.List;

import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/**
 * What the sources of a channel's threshold spread by at both ends of ambient, worked out once for all candidates. The zone is as
 * warm as it gets at the upper end and not at all at the lower one; it warms the channel's own parts, not references and taps.
 */
final class ThresholdTerms {

    private final List<SourceVoltage> sources;
    private final Range[][] extremes;
    /** Distance of each end of ambient from 25 °C, K. */
    private final double[] distance = new double[2];
    /** Distance of the channel's own parts from 25 °C at each end of ambient, K. */
    final double[] local = new double[2];
    /** Smallest ratio of largest to smallest voltage of any source, by end of ambient. */
    final double[] tightest = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};

    ThresholdTerms(ChannelProblem problem) {
        sources = new ArrayList<>(problem.sources());
        problem.tap().map(Threshold::source).ifPresent(sources::add);
        Range ambient = problem.around().ambient();
        distance[0] = Math.abs(ambient.min() - REFERENCE_TEMPERATURE);
        distance[1] = Math.abs(ambient.max() - REFERENCE_TEMPERATURE);
        local[0] = Math.abs(problem.around().local().min() - REFERENCE_TEMPERATURE);
        local[1] = Math.abs(problem.around().local().max() - REFERENCE_TEMPERATURE);
        extremes = new Range[sources.size()][2];
        for (int i = 0; i < sources.size(); i++) {
            for (int end = 0; end < 2; end++) {
                extremes[i][end] = SourceTerms.extremes(sources.get(i), distance[end]);
                tightest[end] = Math.min(tightest[end], extremes[i][end].max() / extremes[i][end].min());
            }
        }
    }

    /** Relative movement of a resistor of a tap (true), or of the channel's own, at an end of ambient. */
    double movement(ResistorSeries resistors, boolean tap, int end) {
        return resistors.tolerance() + resistors.ageing()
                + resistors.temperatureCoefficient() * (tap ? distance[end] : local[end]);
    }

    @SuppressWarnings("ReferenceEquality")
    Range extremes(SourceVoltage source, int end) {
        for (int i = 0; i < extremes.length; i++) {
            // Almost always the very same record; comparing all its fields took a tenth of a plan.
            if (sources.get(i) == source || sources.get(i).equals(source)) {
                return extremes[i][end];
            }
        }
        return SourceTerms.extremes(source, distance[end]);
    }
}
