package shuntwright.circuit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.parts.Comparator;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;

/**
 * The limits of docs/equations.md, each stated once: the search excludes by them, the explanations quote them, the plan
 * lists them.
 */
public final class LimitRules {

    private LimitRules() {
    }

    /** What a shunt alone must keep to, n in parallel: P = (I_NT/n)²·R and the pulse energy of a cleared fault. */
    public static List<LimitCheck> ofShunt(Shunt shunt, int count, Demand demand, Surroundings around) {
        List<LimitCheck> checks = new ArrayList<>();
        double each = demand.tripWindow().min() / count;
        checks.add(atMost(Limit.SHUNT_POWER, each * each * shunt.resistance(),
                around.rules().powerMargin() * shunt.rating().powerAt(around.local().max())));
        Channel.Stress stress = demand.channel().stress();
        OptionalDouble rated = shunt.rating().pulseEnergy();
        if (stress.fault().isPresent() && stress.clearingTime().isPresent() && rated.isPresent()) {
            double fault = stress.fault().getAsDouble() / count;
            checks.add(atMost(Limit.SHUNT_PULSE,
                    fault * fault * shunt.resistance() * stress.clearingTime().getAsDouble(), rated.getAsDouble()));
        }
        return checks;
    }

    /** What an amplifier alone must keep to. */
    public static List<LimitCheck> ofAmplifier(SenseAmplifier amplifier, Demand demand, Surroundings around) {
        List<LimitCheck> checks = new ArrayList<>();
        Range common = amplifier.ranges().commonMode();
        checks.add(atMost(Limit.COMMON_MODE_HIGH, demand.commonMode().max(), common.max()));
        checks.add(atLeast(Limit.COMMON_MODE_LOW, demand.commonMode().min(), common.min()));
        supply(Limit.AMPLIFIER_SUPPLY, amplifier.ranges().supply(), around, checks);
        return checks;
    }

    private static void supply(Limit limit, Range allowed, Surroundings around, List<LimitCheck> checks) {
        checks.add(atMost(limit, around.supply().max(), allowed.max()));
        checks.add(atLeast(limit, around.supply().min(), allowed.min()));
    }

    /** What amplifier and shunts must keep to together; resistance of all shunts in parallel, Ω. */
    public static List<LimitCheck> ofPair(SenseAmplifier amplifier, double resistance, Demand demand,
            Surroundings around) {
        List<LimitCheck> checks = new ArrayList<>();
        double full = demand.fullScale() * resistance;
        checks.add(atMost(Limit.SWING_AT_FULL_SCALE, amplifier.gain() * full, highestOutput(amplifier, around)));
        around.adc().ifPresent(adc -> checks
                .add(atMost(Limit.ADC_FULL_SCALE, amplifier.gain() * full, adc.source().voltage().min())));
        checks.add(atMost(Limit.DIFFERENTIAL_RANGE, full, amplifier.ranges().differential()));
        demand.channel().stress().fault().ifPresent(fault -> checks
                .add(atMost(Limit.DIFFERENTIAL_SURVIVAL, fault * resistance, amplifier.ranges().survival())));
        demand.channel().currents().least().ifPresent(least -> checks.add(
                atLeast(Limit.OUTPUT_FLOOR, amplifier.gain() * least * resistance, amplifier.ranges().outputLow())));
        return checks;
    }

    /** Largest shunt voltage per ampere of full scale, fault and least current that {@link #ofPair} allows, V. */
    public static double largestAtFullScale(SenseAmplifier amplifier, Surroundings around) {
        double output = highestOutput(amplifier, around);
        if (around.adc().isPresent()) {
            output = Math.min(output, around.adc().get().source().voltage().min());
        }
        return Math.min(output / amplifier.gain(), amplifier.ranges().differential());
    }

    /** V_S,min − h_hi. */
    public static double highestOutput(SenseAmplifier amplifier, Surroundings around) {
        return around.supply().min() - amplifier.ranges().outputHeadroom();
    }

    /** What a comparator alone must keep to; the largest voltage its output is pulled up to, V. */
    public static List<LimitCheck> ofComparator(Comparator comparator, double pulledTo, Surroundings around) {
        List<LimitCheck> checks = new ArrayList<>();
        supply(Limit.COMPARATOR_SUPPLY, comparator.supply(), around, checks);
        checks.add(atMost(Limit.OUTPUT_VOLTAGE, pulledTo, comparator.output().maximumVoltage()));
        return checks;
    }

    /**
     * What amplifier and comparator must keep to with these voltages at the amplifier's output. An amplifier whose lowest
     * level is above the threshold trips without current; one whose lowest level is above the release never re-arms.
     */
    public static List<LimitCheck> ofThreshold(Changeover at, SenseAmplifier amplifier, Comparator comparator,
            Surroundings around) {
        Range threshold = at.threshold();
        double floor = amplifier.ranges().outputLow();
        List<LimitCheck> checks = new ArrayList<>();
        checks.add(atMost(Limit.SWING_AT_TRIP, threshold.max(), highestOutput(amplifier, around)));
        checks.add(atLeast(Limit.TRIP_FLOOR, threshold.min(), floor));
        at.release().ifPresent(release -> checks.add(atLeast(Limit.RELEASE_FLOOR, release.min(), floor)));
        checks.add(atMost(Limit.COMPARATOR_HEADROOM, threshold.max(), highestThreshold(comparator, around)));
        checks.add(atLeast(Limit.COMPARATOR_FLOOR, threshold.min(), comparator.inputs().lowest()));
        return checks;
    }

    /**
     * Extremes of the amplifier output voltage at which the comparator changes over, V.
     *
     * @param threshold at trip
     * @param release   at release; empty where it latches
     */
    public record Changeover(Range threshold, Optional<Range> release) {}

    /** Highest threshold the comparator's inputs take at the lowest supply, V. */
    public static double highestThreshold(Comparator comparator, Surroundings around) {
        return around.supply().min() - comparator.inputs().headroom();
    }

    /** Every limit of a circuit. */
    public static List<LimitCheck> all(SenseCircuit circuit, Changeover at, double pulledTo, Demand demand,
            Surroundings around) {
        List<LimitCheck> checks = new ArrayList<>();
        checks.addAll(ofShunt(circuit.shunt(), circuit.shuntCount(), demand, around));
        checks.addAll(ofAmplifier(circuit.amplifier(), demand, around));
        checks.addAll(ofPair(circuit.amplifier(), circuit.resistance(), demand, around));
        checks.addAll(ofComparator(circuit.comparator(), pulledTo, around));
        checks.addAll(ofThreshold(at, circuit.amplifier(), circuit.comparator(), around));
        return checks;
    }

    private static LimitCheck atMost(Limit limit, double reached, double bound) {
        return new LimitCheck(limit, reached, bound, true);
    }

    private static LimitCheck atLeast(Limit limit, double reached, double bound) {
        return new LimitCheck(limit, reached, bound, false);
    }
}
