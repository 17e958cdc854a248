package shuntwright.accuracy;

import java.util.Arrays;

/**
 * The amplifier output voltage at which the comparator trips or releases.
 *
 * @param equations of the channel
 * @param tripped   true for release
 */
record ThresholdVoltage(ChannelEquations equations, boolean tripped) implements Equation {

    @Override
    public double value(double[] x) {
        return equations.outputVoltage(tripped, x);
    }

    @Override
    public double gradient(double[] x, double[] gradient) {
        Arrays.fill(gradient, 0);
        return equations.outputSlopes(tripped, x, gradient);
    }
}
