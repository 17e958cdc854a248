package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.List;

import shuntwright.board.Calibration;
import shuntwright.fixture.RandomCircuits;

/** The equations of a drawn circuit by name. */
final class Outcomes {

    private Outcomes() {
    }

    /**
     * An equation with its name.
     *
     * @param name     what it gives
     * @param equation of the channel
     */
    record Named(String name, Equation equation) {}

    static List<Named> of(RandomCircuits.Drawn drawn) {
        ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
        List<Named> all = new ArrayList<>();
        all.add(new Named("trip", equations.trip()));
        all.add(new Named("release", equations.release()));
        all.add(new Named("threshold voltage", new ThresholdVoltage(equations, false)));
        all.add(new Named("release voltage", new ThresholdVoltage(equations, true)));
        if (drawn.around().adc().isPresent()) {
            double load = drawn.demand().load();
            all.add(new Named("reading at least current", equations.reading(load / 10)));
            all.add(new Named("reading at load", equations.reading(load)));
            drawn.demand().channel().reading().calibration().ifPresent(each -> {
                String points = each.points() == Calibration.Points.ONE ? "one point" : "two points";
                for (double share : new double[]{0.1, 0.3, 1}) {
                    all.add(new Named("calibrated at " + points, new CalibratedReading(equations, each, load,
                            share * load)));
                }
            });
        }
        return all;
    }

    /** False for a calibrated reading that has no limits, because errors may outweigh the signal at calibration. */
    static boolean hasLimits(Equation equation, InputDescription description) {
        if (!(equation instanceof CalibratedReading reading)) {
            return true;
        }
        List<LimitsReader.Corner> signal = new LimitsReader(reading.signal(), description).extremes();
        return signal.get(0).value() > 0 && signal.get(1).value() < Double.POSITIVE_INFINITY;
    }
}
