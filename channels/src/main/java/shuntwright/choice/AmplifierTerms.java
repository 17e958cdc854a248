package shuntwright.choice;

import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.List;

import shuntwright.board.Demand;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.Surroundings;
import shuntwright.parts.InputErrors;
import shuntwright.parts.SenseAmplifier;
import shuntwright.quantity.Range;

/** The amplifiers that respect their own limits, as arrays: extremes of gain and input error for both ends of ambient. */
final class AmplifierTerms {

    final SenseAmplifier[] amplifiers;
    final double[] gain;
    /** Largest shunt voltage at full scale, V. */
    final double[] mostAtFull;
    /** Smallest shunt voltage at the least current, V. */
    final double[] leastAtLeast;
    /** Largest shunt voltage at the fault current, V. */
    final double[] mostAtFault;
    /** Gain extremes by end of ambient. */
    final double[][] gainLow;
    final double[][] gainHigh;
    /** Magnitude of the input error by end of ambient (at the kinder end of the supply), V. */
    final double[][] error;
    /** Relative standard uncertainty of the gain, squared. */
    final double[] gainVariance;
    /** Standard uncertainty of the input error, squared, V². */
    final double[] errorVariance;

    AmplifierTerms(List<SenseAmplifier> chosen, ChannelProblem problem) {
        int n = chosen.size();
        amplifiers = chosen.toArray(new SenseAmplifier[0]);
        gain = new double[n];
        mostAtFull = new double[n];
        leastAtLeast = new double[n];
        mostAtFault = new double[n];
        gainLow = new double[2][n];
        gainHigh = new double[2][n];
        error = new double[2][n];
        gainVariance = new double[n];
        errorVariance = new double[n];
        for (int j = 0; j < n; j++) {
            fill(j, problem);
        }
    }

    private void fill(int j, ChannelProblem problem) {
        SenseAmplifier amplifier = amplifiers[j];
        Surroundings around = problem.around();
        Demand demand = problem.demand();
        gain[j] = amplifier.gain();
        mostAtFull[j] = LimitRules.largestAtFullScale(amplifier, around) * (1 + LimitCheck.ROUNDING);
        leastAtLeast[j] = demand.channel().currents().least().isPresent()
                ? amplifier.ranges().outputLow() / amplifier.gain() * (1 - LimitCheck.ROUNDING)
                : 0;
        mostAtFault[j] = amplifier.ranges().survival() * (1 + LimitCheck.ROUNDING);
        InputErrors input = amplifier.input();
        for (int end = 0; end < 2; end++) {
            double ta = (end == 0 ? around.local().min() : around.local().max()) - REFERENCE_TEMPERATURE;
            double relative = amplifier.gainError() + amplifier.gainDrift() * Math.abs(ta) + amplifier.gainAgeing();
            gainLow[end][j] = amplifier.gain() * (1 - relative);
            gainHigh[end][j] = amplifier.gain() * (1 + relative);
            Range rail = demand.commonMode().range();
            double common = Math.max(Math.abs(rail.max() - input.commonModeSpec()),
                    Math.abs(rail.min() - input.commonModeSpec())) * input.perCommonModeVolt();
            double supply = kinder(around.supply().range(), input.supplySpec())
                    * input.perSupplyVolt();
            error[end][j] = input.offset() + input.offsetDrift() * Math.abs(ta) + common + supply
                    + input.biasCurrent() * around.rules().inputResistance() * around.rules().inputMismatch();
        }
        double drift = amplifier.gainDrift() * ShuntTerms.distance(around);
        double ageing = amplifier.gainAgeing();
        gainVariance[j] = (amplifier.gainError() * amplifier.gainError() + drift * drift + ageing * ageing) / 3;
        errorVariance[j] = input.offset() * input.offset() / 3;
    }

    /** The smaller distance of the two supply ends: the bound must hold whichever end the threshold sees. */
    private static double kinder(Range supply, double spec) {
        return Math.min(Math.abs(supply.min() - spec), Math.abs(supply.max() - spec));
    }

    int size() {
        return amplifiers.length;
    }
}
