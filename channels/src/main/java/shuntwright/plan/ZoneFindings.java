package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import shuntwright.quantity.Dimension;

/** Says so where a zone's own heat has no end, or more of it than was counted with. */
final class ZoneFindings {

    private ZoneFindings() {
    }

    static List<Finding> of(BoardContext context, List<ChannelPlan> channels) {
        List<Finding> findings = new ArrayList<>();
        Map<String, Double> rises = ZoneHeat.rises(context.board().zones(), channels, context.board().ambient().max());
        rises.forEach((zone, rise) -> {
            double resistance = context.board().zone(zone).orElseThrow().thermalResistance().orElseThrow();
            double counted = context.rises().getOrDefault(zone, 0.0);
            if (Double.isInfinite(rise)) {
                findings.add(Findings.board(Finding.Key.THERMAL_RUNAWAY, "Zone \"" + zone
                        + "\" runs away thermally: with " + show(resistance, Dimension.THERMAL_RESISTANCE)
                        + " to ambient each kelvin of warming makes its shunts heat it by more than another. Its channels "
                        + "are judged with " + show(counted, Dimension.TEMPERATURE_DIFFERENCE)
                        + " of warmth only. A lower "
                        + "thermal resistance, or shunts of less resistance or temperature coefficient, would cure it.",
                        List.of(new Measure("thermal resistance", resistance, Dimension.THERMAL_RESISTANCE),
                                new Measure("counted", counted, Dimension.TEMPERATURE_DIFFERENCE))));
            } else if (rise > counted * (1 + SAME)) {
                findings.add(Findings.board(Finding.Key.THERMAL_RUNAWAY, "Zone \"" + zone + "\" warms by "
                        + show(rise, Dimension.TEMPERATURE_DIFFERENCE) + ", more than the "
                        + show(counted, Dimension.TEMPERATURE_DIFFERENCE)
                        + " its channels are judged with: each choice makes it warmer. Pin the parts of its channels, or "
                        + "lower its thermal resistance.",
                        List.of(new Measure("rise", rise, Dimension.TEMPERATURE_DIFFERENCE),
                                new Measure("counted", counted, Dimension.TEMPERATURE_DIFFERENCE))));
            }
        });
        return findings;
    }

    private static final double SAME = 1e-9;
}
