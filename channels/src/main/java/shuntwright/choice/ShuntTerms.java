package shuntwright.choice;

import static shuntwright.circuit.Surroundings.COPPER_COEFFICIENT;
import static shuntwright.circuit.Surroundings.COPPER_TEMPERATURE;
import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import shuntwright.board.Demand;
import shuntwright.circuit.Surroundings;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;

/**
 * What n equal shunts in parallel contribute, worked out once for all amplifiers: extreme shunt voltages at the currents
 * of the demand for both ends of ambient (index 0 and 1).
 */
final class ShuntTerms {

    final Shunt shunt;
    final int count;
    /** Nominal resistance of all together, Ω. */
    final double resistance;
    /** I_L²·R_s times diversity, W. */
    final double heat;
    /** Thermal EMF limit, V. */
    final double emf;
    /** Largest shunt voltage at the no-trip current, V. */
    final double[] noTripHigh = new double[2];
    /** Smallest shunt voltage at the must-trip current, V. */
    final double[] mustTripLow = new double[2];
    /** Largest at the lower end of the release window, V; 0 where it latches. */
    final double[] rearmLowHigh = new double[2];
    /** Smallest at the upper end of the release window, V. */
    final double[] rearmHighLow = new double[2];
    /** Relative standard uncertainty of the resistance, squared. */
    final double variance;

    /** Temperatures around the shunts: the coldest and the hottest ambient with the zone's rise, °C. */
    private final Range local;
    private final double heating;

    ShuntTerms(Shunt shunt, int count, ChannelProblem problem) {
        this.shunt = shunt;
        this.count = count;
        Demand demand = problem.demand();
        this.local = problem.around().local();
        this.heating = shunt.rating().thermalResistance() / count;
        this.resistance = shunt.inParallel(count);
        this.heat = demand.load() * demand.load() * resistance * demand.channel().diversity();
        this.emf = shunt.thermalEmf() * problem.around().rules().shuntGradient();
        for (int end = 0; end < 2; end++) {
            noTripHigh[end] = voltage(demand.tripWindow().min(), end, true);
            mustTripLow[end] = voltage(demand.tripWindow().max(), end, false);
            if (demand.rearm().isPresent()) {
                rearmLowHigh[end] = voltage(demand.rearm().get().min(), end, true);
                rearmHighLow[end] = voltage(demand.rearm().get().max(), end, false);
            }
        }
        double a = (shunt.tolerance().above() + shunt.tolerance().below()) / 2;
        // Self-heating may bring the middle to 25 °C; what ambient spreads by remains.
        double tcr = shunt.temperatureCoefficient() * spread(problem.around());
        this.variance = (a * a + shunt.ageing() * shunt.ageing() + tcr * tcr) / 3 / count;
    }

    /** Standard deviation of the temperature around the channel's parts: ambient and rise of the zone, both uniform, K. */
    private static double spread(Surroundings around) {
        return Math.hypot(around.ambient().width(), around.rise()) / Math.sqrt(12);
    }

    /** Root mean square distance of that temperature from 25 °C, K. */
    static double distance(Surroundings around) {
        return Math.hypot(around.local().mid() - REFERENCE_TEMPERATURE, spread(around));
    }

    /** Extreme shunt voltage at a current, self-heating included, V; infinite in thermal runaway. */
    double voltage(double current, int end, boolean highest) {
        double ta = (end == 0 ? local.min() : local.max()) - REFERENCE_TEMPERATURE;
        double tolerance = highest ? shunt.tolerance().above() : -shunt.tolerance().below();
        double ageing = highest ? shunt.ageing() : -shunt.ageing();
        double own = shunt.resistance() * (1 + tolerance) * (1 + ageing);
        double mounting = highest ? shunt.mountingResistance().max() : shunt.mountingResistance().min();
        double at25 = own + mounting * (1 + COPPER_COEFFICIENT * (REFERENCE_TEMPERATURE - COPPER_TEMPERATURE));
        double up = of(current, at25, own * shunt.temperatureCoefficient() + mounting * COPPER_COEFFICIENT, ta);
        double down = of(current, at25, -own * shunt.temperatureCoefficient() + mounting * COPPER_COEFFICIENT, ta);
        return highest ? Math.max(up, down) : Math.min(up, down);
    }

    private double of(double current, double at25, double slope, double ta) {
        double room = 1 - slope / count * heating * current * current;
        return room > 0 ? current * (at25 + slope * ta) / count / room : Double.POSITIVE_INFINITY;
    }

}
