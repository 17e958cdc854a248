package shuntwright.planner.work;

import java.util.Locale;

import shuntwright.board.Sampling;

/** Numbers of trials as people read them. */
public final class TrialWords {
    private TrialWords() {
    }

    /** "1,000,000". */
    public static String count(long trials) {
        return String.format(Locale.ROOT, "%,d", trials);
    }

    /** "1,000,000 trials" or "up to 2,000,000 trials". */
    public static String of(Sampling sampling) {
        return switch (sampling.trials()) {
            case Sampling.Trials.Fixed(int most) -> count(most) + " trials";
            case Sampling.Trials.Adaptive(int _, int most) -> "up to " + count(most) + " trials";
        };
    }
}
