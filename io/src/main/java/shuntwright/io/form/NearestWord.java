package shuntwright.io.form;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** Finds what someone probably meant to type. */
public final class NearestWord {
    private NearestWord() {
    }

    /** The known word with the fewest single-letter edits, if it is near enough to be meant. */
    public static Optional<String> find(String typed, Collection<String> known) {
        String lower = typed.toLowerCase(Locale.ROOT);
        int limit = Math.max(2, typed.length() / 3);
        return known.stream().filter(word -> distance(lower, word.toLowerCase(Locale.ROOT)) <= limit)
                .min(Comparator.comparingInt((String word) -> distance(lower, word.toLowerCase(Locale.ROOT)))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /**
     * The message for a word that is not known.
     *
     * @param what  kind of word, for example "key"
     * @param typed the word
     * @param known the words that are known here
     */
    public static String unknown(String what, String typed, Collection<String> known) {
        String start = "there is no " + what + " \"" + typed + "\" here; ";
        if (known.isEmpty()) {
            return start + "none is defined";
        }
        return start + find(typed, known).map(near -> "maybe \"" + near + "\" is meant")
                .orElse("known are " + String.join(", ", known));
    }

    /** Least number of insertions, deletions, exchanges and swaps of neighbours that turn one word into the other. */
    static int distance(String from, String to) {
        int[][] cost = new int[from.length() + 1][to.length() + 1];
        for (int i = 0; i <= from.length(); i++) {
            for (int j = 0; j <= to.length(); j++) {
                cost[i][j] = i == 0 || j == 0 ? i + j : step(cost, from, to, i, j);
            }
        }
        return cost[from.length()][to.length()];
    }

    private static int step(int[][] cost, String from, String to, int i, int j) {
        int exchange = cost[i - 1][j - 1] + (from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1);
        int best = Math.min(exchange, Math.min(cost[i - 1][j], cost[i][j - 1]) + 1);
        boolean swap = i > 1 && j > 1 && from.charAt(i - 1) == to.charAt(j - 2)
                && from.charAt(i - 2) == to.charAt(j - 1);
        return swap ? Math.min(best, cost[i - 2][j - 2] + 1) : best;
    }
}
