package shuntwright.plan;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

import shuntwright.board.Objective;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** The board-wide choice in words that may be quoted: no value without what is known of better ones. */
public final class ChoiceWords {
    private static final int DIGITS = 4;

    private ChoiceWords() {
    }

    /** "least heat, then least cost". */
    public static String order(List<Objective> order) {
        return order.stream().map(Objective::word).collect(Collectors.joining(", then "));
    }

    /**
     * "4.31 W", "1,234.50 EUR"; "none" for what is not finite, such as a margin of no channels.
     *
     * @param value    in the units of {@link Reached}
     * @param currency ISO 4217 code
     */
    public static String value(Objective objective, double value, String currency) {
        if (!Double.isFinite(value)) {
            return "none";
        }
        return switch (objective) {
            case LEAST_HEAT -> QuantityWriter.show(value, Dimension.POWER, DIGITS);
            case MOST_EVEN_HEAT -> percent(value) + " of a heat limit";
            case LEAST_COST -> money(value, currency);
            case FEWEST_PARTS -> partNumbers(value);
            case WIDEST_MARGIN -> percent(value) + " margin";
        };
    }

    /**
     * Whether it is proven best only because heats within the design rules' heat step count as equal: then the bound is what heat could
     * be without later objectives.
     */
    public static boolean withinStep(Reached reached) {
        double bound = reached.bound().orElse(reached.value());
        return reached.proof() == Reached.Proof.PROVEN
                && Math.abs(reached.value() - bound) > 1e-9 * Math.max(Math.abs(reached.value()), Math.abs(bound));
    }

    /** "proven best", or the bound and the distance from it. */
    public static String proof(Reached reached, String currency) {
        return switch (reached.proof()) {
            case PROVEN -> withinStep(reached)
                    ? "proven best within the heat step; nothing is better than "
                            + value(reached.objective(), reached.bound().orElseThrow(), currency)
                    : "proven best";
            case BOUNDED -> "not proven best: nothing is better than "
                    + value(reached.objective(), reached.bound().orElseThrow(), currency) + apart(reached.gap());
            case OPEN -> "not proven best: nothing is known of what could be better";
        };
    }

    private static String apart(OptionalDouble gap) {
        double share = gap.orElse(Double.NaN);
        return Double.isFinite(share) ? ", " + distance(share) + " away" : "";
    }

    /** The distance from the bound in a few signs: "proven", "within step", "1.2 %", "open". */
    public static String distance(Reached reached) {
        return switch (reached.proof()) {
            case PROVEN -> withinStep(reached) ? "within step" : "proven";
            case BOUNDED -> {
                double share = reached.gap().orElse(Double.NaN);
                yield Double.isFinite(share) ? distance(share) : "open";
            }
            case OPEN -> "open";
        };
    }

    /** Two digits, rounded up so that the distance is never understated: "below 0.01 %", "1.2 %". */
    private static String distance(double share) {
        if (share < 1e-4) {
            return share == 0 ? "0 %" : "below 0.01 %";
        }
        double step = Math.pow(10, Math.floor(Math.log10(share)) - 1);
        return QuantityWriter.show(Math.ceil(share / step - 1e-9) * step, Dimension.RATIO, 3);
    }

    /** How it was looked for: "300 rounds, seed 1". */
    public static String search(BoardChoice choice) {
        return String.format(Locale.ROOT, "%,d %s, seed %d", choice.rounds(), choice.rounds() == 1 ? "round" : "rounds",
                choice.seed())
                + (choice.cutShort() ? "; ended before its rounds, so another run may end elsewhere" : "");
    }

    /** Among how many ways: "12,345 ways to serve the channels, 420 of them compared for the whole board". */
    public static String among(BoardChoice choice) {
        return String.format(Locale.ROOT, "%,d %s to serve the channels, %,d of them compared for the whole board",
                choice.candidates(), choice.candidates() == 1 ? "way" : "ways", choice.kept());
    }

    /** A demand of a conflict: "zone port: heat limit", "channel winch: must-trip current". */
    public static String demand(Conflict.Member member) {
        return owner(member) + ": " + member.what();
    }

    /** Whose demand: "zone port", "channel winch", "tap low". */
    public static String owner(Conflict.Member member) {
        return switch (member.kind()) {
            case SHARED_LIMIT -> member.name();
            case CHANNEL -> "channel " + member.name();
            case TAP -> "tap " + member.name();
        };
    }

    /** What relaxing it alone would need: "2.5 W → 2.9 W would do". */
    public static String relaxed(Conflict.Member member) {
        if (member.relaxed().isEmpty()) {
            return (member.now().isPresent() ? show(member.now(), member.dimension()) + "; " : "")
                    + "no value was found that would do alone";
        }
        return (member.now().isPresent() ? show(member.now(), member.dimension()) + " → " : "")
                + show(member.relaxed(), member.dimension()) + " would do";
    }

    /** Whether the set could be smaller. */
    public static String minimal(Conflict conflict) {
        return conflict.minimal()
                ? "proven: without any one of these the others can be met"
                : "not proven that all of these are needed for the conflict";
    }

    private static String show(OptionalDouble value, Dimension dimension) {
        return QuantityWriter.show(value.orElseThrow(), dimension, DIGITS);
    }

    /** "1,234.50 EUR". */
    public static String money(double value, String currency) {
        return String.format(Locale.ROOT, "%,.2f %s", value, currency);
    }

    /** "12 part numbers"; a bound may lie between whole numbers, and then says so. */
    private static String partNumbers(double value) {
        String count = value == Math.rint(value)
                ? String.format(Locale.ROOT, "%,d", (long) value)
                : String.format(Locale.ROOT, "%,.1f", value);
        return count + (value == 1 ? " part number" : " part numbers");
    }

    private static String percent(double share) {
        return QuantityWriter.show(share, Dimension.RATIO, DIGITS);
    }
}
