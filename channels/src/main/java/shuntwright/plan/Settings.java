package shuntwright.plan;

import java.util.OptionalDouble;

import shuntwright.quantity.Range;

/**
 * Nominal voltages and currents for the bench.
 *
 * @param threshold       V_T at the comparator's sense input when it trips, V
 * @param thresholdLimits its extremes, V
 * @param releaseVoltage  amplifier output at which it releases, V; empty where it latches
 * @param tripShunt       shunt voltage at nominal trip, V
 * @param outputAtLoad    amplifier output at the load current, V
 * @param outputAtFull    amplifier output at full scale, V
 */
public record Settings(double threshold, Range thresholdLimits, OptionalDouble releaseVoltage, double tripShunt,
        double outputAtLoad, double outputAtFull) {}
