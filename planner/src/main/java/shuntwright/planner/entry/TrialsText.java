package shuntwright.planner.entry;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import shuntwright.board.Board;
import shuntwright.board.Sampling;
import shuntwright.quantity.Reading;

/** Trials and seed of a board as text. */
final class TrialsText {
    private static final Pattern FIXED = Pattern.compile("\\d[\\d, ]*|\\d+(?:\\.\\d+)?e\\d{1,2}");
    private static final Pattern ADAPTIVE = Pattern
            .compile("adaptive,?( ([12]) digits?)?,?( (?:at )?most (\\d[\\d, ]*))?");
    private static final int DIGITS = 2;
    private static final int MOST = 10_000_000;

    private TrialsText() {
    }

    /** "1,000,000" or "adaptive, 2 digits, most 10,000,000". */
    static String trials(Board board) {
        return switch (board.uncertainty().sampling().trials()) {
            case Sampling.Trials.Fixed(int count) -> grouped(count);
            case Sampling.Trials.Adaptive(int digits, int most) -> "adaptive, " + digits
                    + (digits == 1 ? " digit" : " digits") + ", most " + grouped(most);
        };
    }

    static Reading<Board> withTrials(String text, Board board) {
        String typed = text.strip().toLowerCase(Locale.ROOT).replaceAll("\\s+", " ");
        if (FIXED.matcher(typed).matches()) {
            return count(typed).then(count -> with(board, new Sampling.Trials.Fixed(count)));
        }
        Matcher adaptive = ADAPTIVE.matcher(typed);
        if (adaptive.matches()) {
            String wanted = adaptive.group(2);
            String bound = adaptive.group(4);
            int digits = wanted == null ? DIGITS : Integer.parseInt(wanted);
            return (bound == null ? Reading.value(MOST) : count(bound))
                    .then(most -> with(board, new Sampling.Trials.Adaptive(digits, most)));
        }
        return Reading
                .misread("Type a number of trials from " + grouped(Sampling.LEAST) + " to " + grouped(Sampling.MOST)
                        + ", such as 1,000,000, or adaptive, 2 digits, most 10,000,000; got \"" + text.strip() + "\".");
    }

    private static Reading<Board> with(Board board, Sampling.Trials trials) {
        Sampling sampling = new Sampling(trials, board.uncertainty().sampling().seed());
        return Reading.value(board.withUncertainty(board.uncertainty().withSampling(sampling)));
    }

    private static Reading<Integer> count(String text) {
        String plain = text.replaceAll("[, ]", "");
        double count = Double.parseDouble(plain);
        return count >= Sampling.LEAST && count <= Sampling.MOST && count == Math.rint(count)
                ? Reading.value((int) count)
                : Reading.misread("The number of trials must be a whole number from " + grouped(Sampling.LEAST) + " to "
                        + grouped(Sampling.MOST) + ", got " + text.strip() + ".");
    }

    private static String grouped(int count) {
        return String.format(Locale.ROOT, "%,d", count);
    }

    static Reading<Board> withSeed(String text, Board board) {
        try {
            Sampling sampling = new Sampling(board.uncertainty().sampling().trials(), Long.parseLong(text.strip()));
            return Reading.value(board.withUncertainty(board.uncertainty().withSampling(sampling)));
        } catch (NumberFormatException _) {
            return Reading.misread("The seed must be a whole number from " + Long.MIN_VALUE + " to " + Long.MAX_VALUE
                    + ", such as 1, got \""
                    + text.strip() + "\".");
        }
    }
}
