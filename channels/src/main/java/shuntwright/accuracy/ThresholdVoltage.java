package shuntwright.accuracy;

import java.util.Arrays;

/**
 * The amplifier output voltage at which the comparator trips.
 *
 * @param equations of the channel
 */
record ThresholdVoltage(ChannelEquations equations) implements Equation {

    @Override
    public double value(double[] x) {
        return equations.outputVoltage(false, x);
    }

    @Override
    public double gradient(double[] x, double[] gradient) {
        Arrays.fill(gradient, 0);
        return equations.outputSlopes(x, gradient);
    }
}
