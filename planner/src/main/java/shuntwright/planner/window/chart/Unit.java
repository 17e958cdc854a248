package shuntwright.planner.window.chart;

import shuntwright.board.Objective;
import shuntwright.planner.window.figures.Aims;

/**
 * In what the numbers of a scale are written.
 *
 * @param title  what is measured
 * @param symbol behind the title; empty for counts
 * @param factor multiplies values for the scale
 * @param whole  true when only whole numbers mean something
 */
public record Unit(String title, String symbol, double factor, boolean whole) {

    /** A quantity with a prefix that suits its largest value. */
    public static Unit of(String title, String symbol, double largest) {
        return largest > 0 && largest < 1
                ? new Unit(title, "m" + symbol, 1000, false)
                : new Unit(title, symbol, 1, false);
    }

    public static Unit count(String title) {
        return new Unit(title, "", 1, true);
    }

    public static Unit money(String title, String currency) {
        return new Unit(title, currency, 1, false);
    }

    /** The unit of an objective's values. */
    public static Unit of(Objective objective, double largest, String currency) {
        String title = Aims.title(objective);
        return switch (objective) {
            case LEAST_HEAT -> of(title, "W", largest);
            case MOST_EVEN_HEAT, WIDEST_MARGIN -> new Unit(title, "%", 100, false);
            case LEAST_COST -> money(title, currency);
            case FEWEST_PARTS -> count(title);
        };
    }

    /** "Heat of all shunts, W". */
    public String words() {
        return symbol.isEmpty() ? title : title + ", " + symbol;
    }
}
