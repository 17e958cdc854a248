package shuntwright.planner.window.chart;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A chart; all places are shares of its scales.
 *
 * @param x     from left to right
 * @param y     from below to above
 * @param lines each from point to point
 * @param spots points; those that can be chosen and others
 * @param gaps  where there is nothing to show, from left to right
 * @param gap   why, in words
 * @param now   where the board stands at present
 * @param empty why there is nothing at all, in words; empty when there is
 * @param words everything in words
 */
public record Plot(Scale x, Scale y, List<Line> lines, List<Spot> spots, List<Gap> gaps, String gap, OptionalDouble now,
        String empty, String words) {
    public Plot {
        lines = List.copyOf(lines);
        spots = List.copyOf(spots);
        gaps = List.copyOf(gaps);
    }

    /** A place. */
    public record Place(double x, double y) {}

    /** A line from place to place. */
    public record Line(List<Place> places) {
        public Line {
            places = List.copyOf(places);
        }
    }

    /** What a point is. */
    public enum Kind {
        /** One of those computed. */
        POINT,
        /** The one chosen of them. */
        CHOSEN,
        /** The board as it is planned at present. */
        PRESENT
    }

    /** @param words its values */
    public record Spot(Place place, Kind kind, String words) {}

    /** Where no value can be had. */
    public record Gap(double from, double to) {}

    /** A chart without anything on it. */
    public static Plot empty(Scale x, Scale y, String why) {
        return new Plot(x, y, List.of(), List.of(), List.of(), "", OptionalDouble.empty(), why, why);
    }
}
