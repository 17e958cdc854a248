package shuntwright.planner.window.front;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.DoubleStream;

import shuntwright.board.Objective;
import shuntwright.plan.Front;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.window.chart.Plot;
import shuntwright.planner.window.chart.Scale;
import shuntwright.planner.window.chart.Unit;
import shuntwright.planner.window.explore.Sums;
import shuntwright.planner.window.figures.Aims;

/** Draws a front: its points, the edge between what can be had and what cannot, and the board as it is planned. */
final class FrontPlot {
    private FrontPlot() {
    }

    static Plot none(Objective first, Objective second, String why) {
        return Plot.empty(Scale.around(Unit.of(first, 1, ""), DoubleStream.empty(), false),
                Scale.around(Unit.of(second, 1, ""), DoubleStream.empty(), false), why);
    }

    static Plot of(Front front, OptionalInt chosen, Optional<Plan> now) {
        List<Front.Point> points = front.points();
        if (points.isEmpty()) {
            return none(front.first(), front.second(), "No plan meets every limit, so there is no front.");
        }
        String currency = points.getFirst().plan().currency();
        OptionalDouble nowFirst = value(front.first(), now);
        OptionalDouble nowSecond = value(front.second(), now);
        boolean present = nowFirst.isPresent() && nowSecond.isPresent();
        double[] firsts = points.stream().mapToDouble(Front.Point::first).toArray();
        double[] seconds = points.stream().mapToDouble(Front.Point::second).toArray();
        Scale x = scale(front.first(), present ? with(firsts, nowFirst.getAsDouble()) : firsts, currency);
        Scale y = scale(front.second(), present ? with(seconds, nowSecond.getAsDouble()) : seconds, currency);
        List<Plot.Spot> spots = new ArrayList<>();
        for (int at = 0; at < points.size(); at++) {
            spots.add(new Plot.Spot(place(x, y, firsts[at], seconds[at]),
                    chosen.orElse(-1) == at ? Plot.Kind.CHOSEN : Plot.Kind.POINT,
                    words(front, firsts[at], seconds[at], currency)));
        }
        if (present) {
            spots.add(new Plot.Spot(place(x, y, nowFirst.getAsDouble(), nowSecond.getAsDouble()), Plot.Kind.PRESENT,
                    "now: " + words(front, nowFirst.getAsDouble(), nowSecond.getAsDouble(), currency)));
        }
        return new Plot(x, y, List.of(edge(x, y, front)), spots, List.of(), "", OptionalDouble.empty(), "",
                "Front of " + Aims.title(front.first()) + " and " + Aims.title(front.second()) + ": "
                        + String.join("; ", spots.stream().map(Plot.Spot::words).toList()) + ".");
    }

    private static double[] with(double[] values, double more) {
        return DoubleStream.concat(DoubleStream.of(values), DoubleStream.of(more)).toArray();
    }

    private static Scale scale(Objective objective, double[] values, String currency) {
        double largest = DoubleStream.of(values).map(Math::abs).max().orElse(1);
        return Scale.around(Unit.of(objective, largest, currency), DoubleStream.of(values), false);
    }

    private static Plot.Place place(Scale x, Scale y, double first, double second) {
        return new Plot.Place(x.place(first), y.place(second));
    }

    private static String words(Front front, double first, double second, String currency) {
        return Aims.show(front.first(), first, currency) + ", " + Aims.show(front.second(), second, currency);
    }

    /** Steps: until the next point there is nothing better than this one. */
    private static Plot.Line edge(Scale x, Scale y, Front front) {
        List<Plot.Place> places = new ArrayList<>();
        List<Front.Point> points = front.points();
        // where more of the first is better, a point reaches back to the one before
        boolean back = front.first() == Objective.WIDEST_MARGIN;
        for (int at = 0; at < points.size(); at++) {
            Front.Point each = points.get(at);
            if (at > 0) {
                Front.Point before = points.get(at - 1);
                places.add(back
                        ? place(x, y, before.first(), each.second())
                        : place(x, y, each.first(), before.second()));
            }
            places.add(place(x, y, each.first(), each.second()));
        }
        return new Plot.Line(places);
    }

    /** What the board as planned has of an objective. */
    static OptionalDouble value(Objective objective, Optional<Plan> now) {
        if (now.isEmpty()) {
            return OptionalDouble.empty();
        }
        Plan plan = now.get();
        OptionalDouble reached = plan.choice().stream().flatMap(each -> each.reached().stream())
                .filter(each -> each.objective() == objective).mapToDouble(Reached::value).findFirst();
        if (reached.isPresent()) {
            return reached;
        }
        return switch (objective) {
            case LEAST_HEAT -> OptionalDouble.of(Sums.heat(plan));
            case LEAST_COST -> OptionalDouble.of(plan.buildCost());
            case FEWEST_PARTS -> OptionalDouble.of(plan.parts().size());
            case WIDEST_MARGIN -> plan.channels().stream().flatMap(each -> each.solved().stream())
                    .mapToDouble(SolvedChannel::margin).min();
            case MOST_EVEN_HEAT -> OptionalDouble.empty();
        };
    }
}
