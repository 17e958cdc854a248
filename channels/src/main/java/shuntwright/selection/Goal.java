package shuntwright.selection;

import java.util.List;

/**
 * What a search goes for: within limits and caps first, then the aims one after the other.
 *
 * @param caps   aims that must not exceed a value
 * @param aims   to be least, the first first; may be empty
 * @param fewest true when the number of limits broken counts before how far they are exceeded
 */
record Goal(List<Aim.Cap> caps, List<Aim> aims, boolean fewest) {

    /** Values closer than this, relative, count as equal. */
    static final double SAME = 1e-9;
    static final double SMALLEST = 1e-12;

    Goal {
        caps = List.copyOf(caps);
        aims = List.copyOf(aims);
    }

    int size() {
        return aims.isEmpty() ? 1 : 2 + aims.size();
    }

    /** Values in order of weight, written to {@code score}; compared by {@link #compare}. */
    void score(State state, double[] score) {
        score[0] = violation(state);
        int at = 1;
        for (Aim aim : aims) {
            score[at++] = state.value(aim);
            if (at == 2) {
                score[at++] = state.slope(aim);
            }
        }
    }

    double violation(State state) {
        double sum = state.excess();
        if (fewest) {
            sum = state.broken() + 1e-3 * sum / (1 + sum);
        }
        for (Aim.Cap cap : caps) {
            double value = state.value(cap.aim());
            double over = value - cap.most();
            if (over > SAME * Math.max(Math.abs(cap.most()), SMALLEST)) {
                sum += 10 * over / Math.max(Math.abs(cap.most()), SMALLEST);
            }
        }
        return sum;
    }

    /** Negative when the first score is better; 0 when they are equal to rounding. */
    static int compare(double[] a, double[] b) {
        for (int i = 0; i < a.length; i++) {
            double scale = Math.max(Math.abs(a[i]), Math.abs(b[i]));
            if (Math.abs(a[i] - b[i]) > SAME * scale) {
                return a[i] < b[i] ? -1 : 1;
            }
        }
        return 0;
    }
}
