package shuntwright.choice;

import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.List;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Outcome;
import shuntwright.circuit.Surroundings;
import shuntwright.quantity.Range;

/** Whether the readings a demand asks for can be accurate enough with given shunts and amplifier, without the threshold. */
final class Readings {

    /** Uncertainties are known here to better than this share. */
    private static final double SURELY = 0.95;

    private final List<ChannelAccuracy.Asked> asked;
    private final AmplifierTerms amplifiers;
    private final double[] scaleLow = new double[2];
    private final double[] scaleHigh = new double[2];
    private double offset;
    private double step;
    /** Relative standard uncertainty of the converter's gain and source, squared; at least. */
    private double gainVariance;

    Readings(ChannelProblem problem, AmplifierTerms amplifiers) {
        this.amplifiers = amplifiers;
        Surroundings around = problem.around();
        this.asked = ChannelAccuracy.asked(problem.demand(), around.adc().isPresent()).stream()
                .filter(each -> each.outcome() == Outcome.READING_AT_LEAST
                        || each.outcome() == Outcome.READING_AT_LOAD)
                // What calibration leaves is judged exactly, later.
                .filter(_ -> problem.demand().channel().reading().calibration().isEmpty())
                .toList();
        if (around.adc().isPresent()) {
            Surroundings.Converter converter = around.adc().get();
            offset = converter.adc().offset();
            step = (converter.adc().nonlinearity() + 0.5) * converter.step();
            double source = converter.source().voltage().range().width() / 2
                    / converter.source().voltage().nominal();
            gainVariance = (converter.adc().gainError() * converter.adc().gainError() + source * source) / 3;
            for (int end = 0; end < 2; end++) {
                double ta = (end == 0 ? around.ambient().min() : around.ambient().max()) - REFERENCE_TEMPERATURE;
                Range reaches = SourceTerms.extremes(converter.source(), Math.abs(ta));
                double nominal = converter.source().voltage().nominal();
                scaleLow[end] = (1 - converter.adc().gainError()) * nominal / reaches.max();
                scaleHigh[end] = (1 + converter.adc().gainError()) * nominal / reaches.min();
            }
        }
    }

    /** False only when some reading is certainly not accurate enough. */
    boolean mayHold(ShuntTerms shunt, int amplifier) {
        return asked.isEmpty() || room(shunt, amplifier) >= 0;
    }

    /** False only when some reading is certainly neither inside by limits nor by its coverage interval. */
    boolean mayBeLikely(ShuntTerms shunt, int amplifier, double coverageFactor) {
        for (ChannelAccuracy.Asked each : asked) {
            double half = each.allowed().width() / 2 / each.current();
            if (room(each, shunt, amplifier) < 0
                    && SURELY * coverageFactor * Math.sqrt(variance(each, shunt, amplifier)) > half) {
                return false;
            }
        }
        return true;
    }

    /** Relative variance of a reading, at least. */
    private double variance(ChannelAccuracy.Asked each, ShuntTerms shunt, int amplifier) {
        double voltage = each.current() * shunt.resistance;
        double output = voltage * amplifiers.gain[amplifier];
        return shunt.variance + amplifiers.gainVariance[amplifier]
                + amplifiers.errorVariance[amplifier] / (voltage * voltage) + gainVariance
                + (offset * offset + step * step) / 3 / (output * output);
    }

    /** Smallest slack of the readings as a share of the current; positive infinity when none is asked for. */
    double room(ShuntTerms shunt, int amplifier) {
        double room = Double.POSITIVE_INFINITY;
        for (ChannelAccuracy.Asked each : asked) {
            room = Math.min(room, room(each, shunt, amplifier));
        }
        return room;
    }

    private double room(ChannelAccuracy.Asked each, ShuntTerms shunt, int amplifier) {
        double room = Double.POSITIVE_INFINITY;
        double full = amplifiers.gain[amplifier] * shunt.resistance;
        for (int end = 0; end < 2; end++) {
            double error = amplifiers.error[end][amplifier] + shunt.emf;
            double high = ((shunt.voltage(each.current(), end, true) + error) * amplifiers.gainHigh[end][amplifier]
                    + offset) * scaleHigh[end] + step;
            double low = ((shunt.voltage(each.current(), end, false) - error) * amplifiers.gainLow[end][amplifier]
                    - offset) * scaleLow[end] - step;
            room = Math.min(room, (each.allowed().max() - high / full) / each.current());
            room = Math.min(room, (low / full - each.allowed().min()) / each.current());
        }
        return room;
    }
}
