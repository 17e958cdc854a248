package shuntwright.planner.window.whatif;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;

import shuntwright.plan.WhatIf;
import shuntwright.planner.window.chart.Plot;
import shuntwright.planner.window.chart.Scale;
import shuntwright.planner.window.chart.Unit;
import shuntwright.planner.window.figures.Aims;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** Draws curves of cost, heat and parts, each with a gap where nothing meets the limits. */
final class WhatIfPlots {
    static final String GAP = "nothing meets the limits";

    private WhatIfPlots() {
    }

    /** Cost, heat and parts. */
    static List<Plot> none(Lever lever, String why) {
        Scale x = Scale.around(lever.unit(1), DoubleStream.empty(), false);
        return List.of(Plot.empty(x, Scale.around(Unit.money(cost(lever), ""), DoubleStream.empty(), false), why),
                Plot.empty(x, Scale.around(Unit.of("Heat of all shunts", "W", 1), DoubleStream.empty(), false), why),
                Plot.empty(x, Scale.around(Unit.count("Distinct part numbers"), DoubleStream.empty(), false), why));
    }

    private static String cost(Lever lever) {
        return lever.counts() ? "Cost of a board" : "Cost of the build";
    }

    /** @param now where the board stands; empty where it sets no limit */
    static List<Plot> of(WhatIf answer, Lever lever, OptionalDouble now, String currency) {
        List<WhatIf.Point> points = answer.points();
        double largest = points.stream().mapToDouble(WhatIf.Point::value).max().orElse(1);
        Scale x = Scale.around(lever.unit(largest), points.stream().mapToDouble(WhatIf.Point::value), lever.counts());
        double heat = sums(points).stream().mapToDouble(WhatIf.Sums::heat).max().orElse(1);
        ToDoubleFunction<WhatIf.Sums> cost = lever.counts() ? WhatIf.Sums::costPerBoard : WhatIf.Sums::cost;
        return List.of(
                plot(points, lever, x, now, Unit.money(cost(lever), currency), cost,
                        each -> Aims.money(cost.applyAsDouble(each), currency)),
                plot(points, lever, x, now, Unit.of("Heat of all shunts", "W", heat), WhatIf.Sums::heat,
                        each -> QuantityWriter.show(each.heat(), Dimension.POWER)),
                plot(points, lever, x, now, Unit.count("Distinct part numbers"), WhatIf.Sums::parts,
                        each -> Aims.parts(each.parts())));
    }

    private static List<WhatIf.Sums> sums(List<WhatIf.Point> points) {
        return points.stream().flatMap(each -> each.reached().stream()).toList();
    }

    private static Plot plot(List<WhatIf.Point> points, Lever lever, Scale x, OptionalDouble now, Unit unit,
            ToDoubleFunction<WhatIf.Sums> value, java.util.function.Function<WhatIf.Sums, String> show) {
        Scale y = Scale.around(unit, sums(points).stream().mapToDouble(value), false);
        List<Plot.Line> lines = new ArrayList<>();
        List<Plot.Place> line = new ArrayList<>();
        List<Plot.Spot> spots = new ArrayList<>();
        List<String> words = new ArrayList<>();
        for (WhatIf.Point each : points) {
            Optional<WhatIf.Sums> reached = each.reached();
            if (reached.isPresent()) {
                Plot.Place place = new Plot.Place(x.place(each.value()), y.place(value.applyAsDouble(reached.get())));
                line.add(place);
                String said = lever.show(each.value()) + ": " + show.apply(reached.get());
                spots.add(new Plot.Spot(place, Plot.Kind.POINT, said));
                words.add(said);
            } else {
                words.add(lever.show(each.value()) + ": " + GAP);
                if (!line.isEmpty()) {
                    lines.add(new Plot.Line(line));
                    line.clear();
                }
            }
        }
        if (!line.isEmpty()) {
            lines.add(new Plot.Line(line));
        }
        return new Plot(x, y, lines, spots, gaps(points, x), GAP,
                now.isPresent() ? OptionalDouble.of(x.place(now.getAsDouble())) : now, "",
                unit.words() + " over " + x.unit().words() + ": " + String.join("; ", words) + ".");
    }

    /** From the middle before the first value that nothing meets to the middle behind the last. */
    private static List<Plot.Gap> gaps(List<WhatIf.Point> points, Scale x) {
        List<Plot.Gap> gaps = new ArrayList<>();
        int at = 0;
        while (at < points.size()) {
            int from = at;
            while (at < points.size() && points.get(at).reached().isEmpty()) {
                at++;
            }
            if (at > from) {
                gaps.add(new Plot.Gap(from == 0 ? 0 : between(points, from - 1, x),
                        at == points.size() ? 1 : between(points, at - 1, x)));
            }
            at = Math.max(at, from + 1);
        }
        return gaps;
    }

    private static double between(List<WhatIf.Point> points, int before, Scale x) {
        return (x.place(points.get(before).value()) + x.place(points.get(before + 1).value())) / 2;
    }
}
