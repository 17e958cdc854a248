package shuntwright.planner.window.figures;

import java.util.Locale;

import shuntwright.board.Objective;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** Values of objectives in words. */
public final class Aims {
    private Aims() {
    }

    /** "Least heat". */
    public static String wanted(Objective objective) {
        String words = objective.word();
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    /** What its value is, "Heat of all shunts". */
    public static String title(Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> "Heat of all shunts";
            case MOST_EVEN_HEAT -> "Largest share of a heat limit";
            case LEAST_COST -> "Cost of the build";
            case FEWEST_PARTS -> "Distinct part numbers";
            case WIDEST_MARGIN -> "Margin of the tightest channel";
        };
    }

    /** "4.127 W", "81.3 %", "812.40 EUR", "37 part numbers". */
    public static String show(Objective objective, double value, String currency) {
        if (!Double.isFinite(value)) {
            return "none";
        }
        return switch (objective) {
            case LEAST_HEAT -> QuantityWriter.show(value, Dimension.POWER);
            case MOST_EVEN_HEAT, WIDEST_MARGIN -> percent(value);
            case LEAST_COST -> money(value, currency);
            case FEWEST_PARTS -> parts((int) Math.ceil(value - 1e-9));
        };
    }

    /** "1,812.40 EUR". */
    public static String money(double amount, String currency) {
        return (amount < 0 ? "−" : "") + String.format(Locale.ROOT, "%,.2f %s", Math.abs(amount), currency).strip();
    }

    public static String parts(int count) {
        return count + (count == 1 ? " part number" : " part numbers");
    }

    private static String percent(double fraction) {
        return String.format(Locale.ROOT, "%.1f %%", fraction * 100).replace('-', '−');
    }

    /** Heat for columns, always with three decimals, "1.128 W". */
    public static String watts(double heat) {
        return String.format(Locale.ROOT, "%.3f W", heat);
    }
}
