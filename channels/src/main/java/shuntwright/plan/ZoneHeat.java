package shuntwright.plan;

import static shuntwright.circuit.Surroundings.COPPER_COEFFICIENT;
import static shuntwright.circuit.Surroundings.COPPER_TEMPERATURE;
import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

import shuntwright.board.Zone;
import shuntwright.circuit.SenseCircuit;
import shuntwright.parts.Shunt;

/**
 * How far a zone's own heat warms its board above ambient: ΔT = θ·Σ d·I_L²·R_s(T_a + ΔT), every shunt as resistive as its limits
 * let it be, at the hottest ambient, with its diversity d.
 *
 * <p>Warmer shunts heat more, so this is a fixed point. R_s is linear in the temperature around the shunt (its own self-heating at a
 * given current is a constant factor), so with R_s(T_a + ΔT) = A + B·ΔT the fixed point is ΔT = θ·ΣA/(1 − θ·ΣB), and there is none,
 * thermal runaway, where θ·ΣB ≥ 1 or where a shunt by itself runs away.
 */
final class ZoneHeat {

    private ZoneHeat() {
    }

    /** Rise of every zone with a thermal resistance, K, by name; infinite in thermal runaway. */
    static Map<String, Double> rises(List<Zone> zones, List<ChannelPlan> channels, double hottest) {
        Map<String, Double> rises = new LinkedHashMap<>();
        for (Zone zone : zones) {
            OptionalDouble resistance = zone.thermalResistance();
            if (resistance.isPresent()) {
                List<SolvedChannel> solved = channels.stream()
                        .filter(each -> each.channel().zone().orElse("").equals(zone.name()))
                        .flatMap(each -> each.solved().stream()).toList();
                rises.put(zone.name(), rise(resistance.getAsDouble(), solved, hottest));
            }
        }
        return rises;
    }

    /**
     * @param thermalResistance of the zone, K/W
     * @param hottest           ambient, °C
     * @return K; infinite in thermal runaway
     */
    static double rise(double thermalResistance, List<SolvedChannel> channels, double hottest) {
        double heat = 0;
        double perKelvin = 0;
        for (SolvedChannel each : channels) {
            double load = each.demand().load();
            double square = load * load * each.demand().channel().diversity();
            if (square == 0) {
                continue;
            }
            double[] line = resistance(each.circuit(), load, hottest);
            heat += square * line[0];
            perKelvin += square * line[1];
        }
        double room = 1 - thermalResistance * perKelvin;
        return room > 0 ? thermalResistance * heat / room : Double.POSITIVE_INFINITY;
    }

    /** Highest resistance by limits at an ambient temperature, Ω, and its slope by that temperature, Ω/K; infinite in runaway. */
    private static double[] resistance(SenseCircuit circuit, double current, double ambient) {
        Shunt shunt = circuit.shunt();
        double own = shunt.resistance() * (1 + shunt.tolerance().above()) * (1 + shunt.ageing());
        double mounting = shunt.mountingResistance().max();
        double at25 = own + mounting * (1 + COPPER_COEFFICIENT * (REFERENCE_TEMPERATURE - COPPER_TEMPERATURE));
        double away = ambient - REFERENCE_TEMPERATURE;
        double slope = own * shunt.temperatureCoefficient() + mounting * COPPER_COEFFICIENT;
        // Below 25 °C the other sign makes it more resistive; the slope stays that of the hotter side.
        double extra = away < 0 ? -2 * away * own * shunt.temperatureCoefficient() : 0;
        int n = circuit.shuntCount();
        double room = 1 - slope / n * shunt.rating().thermalResistance() / n * current * current;
        if (!(room > 0)) {
            return new double[]{Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        }
        return new double[]{(at25 + slope * away + extra) / n / room, slope / n / room};
    }
}
