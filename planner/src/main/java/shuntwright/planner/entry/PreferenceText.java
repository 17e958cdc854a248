package shuntwright.planner.entry;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Reading;

/** What is wanted of the board-wide choice as text. */
final class PreferenceText {
    private PreferenceText() {
    }

    /** "least heat, least cost". */
    static String order(List<Objective> order) {
        return order.stream().map(Objective::word).collect(Collectors.joining(", "));
    }

    static Reading<Board> withOrder(String text, Board board) {
        List<Objective> order = new ArrayList<>();
        for (String part : text.split("[,;]")) {
            String typed = Words.plain(part).replaceAll("\\s+", " ");
            if (typed.isEmpty()) {
                continue;
            }
            Optional<Objective> found = Arrays.stream(Objective.values()).filter(each -> each.word().equals(typed))
                    .findFirst();
            if (found.isEmpty()) {
                return Reading.misread("\"" + part.strip() + "\" is none of "
                        + order(List.of(Objective.values())) + ". Type those wanted, the first decides.");
            }
            if (order.contains(found.get())) {
                return Reading.misread(Words.capital(typed) + " stands twice; remove the later one.");
            }
            order.add(found.get());
        }
        return order.isEmpty()
                ? Reading.misread("At least one is needed of " + order(List.of(Objective.values())) + ".")
                : with(board, board.preference().withOrder(order));
    }

    static String partNumberCost(Board board) {
        double cost = board.preference().partNumberCost();
        return cost == Math.rint(cost) && cost < 1e15 ? Long.toString((long) cost) : Double.toString(cost);
    }

    static Reading<Board> withPartNumberCost(String text, Board board) {
        try {
            double cost = Double.parseDouble(text.strip());
            if (cost >= 0 && Double.isFinite(cost)) {
                return with(board, board.preference().withPartNumberCost(cost));
            }
        } catch (NumberFormatException _) {
            // told below with the allowed range
        }
        return Reading.misread("Type an amount of money from 0, in the catalogue's currency, such as 12.50; got \""
                + text.strip() + "\".");
    }

    static Reading<Board> withTimeLimit(String text, Board board) {
        return Words.positive(text, "the time limit", Dimension.TIME)
                .then(limit -> with(board, board.preference().withTimeLimit(limit)));
    }

    static String timeLimit(Board board) {
        OptionalDouble limit = board.preference().timeLimit();
        return Words.text(limit, Dimension.TIME);
    }

    static Reading<Board> withSeed(String text, Board board) {
        try {
            return with(board, board.preference().withSeed(Long.parseLong(text.strip())));
        } catch (NumberFormatException _) {
            return Reading.misread("Type a whole number from " + Long.MIN_VALUE + " to " + Long.MAX_VALUE + ", got \""
                    + text.strip() + "\".");
        }
    }

    private static Reading<Board> with(Board board, Preference preference) {
        return Reading.value(board.withPreference(preference));
    }
}
