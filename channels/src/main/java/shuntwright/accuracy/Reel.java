package shuntwright.accuracy;

/**
 * Pieces of one reel deviate alike. The same quantity of two pieces has this correlation coefficient.
 *
 * @param name        which reel, the same for every channel of the board that takes pieces of it
 * @param correlation above 0 to 1
 */
public record Reel(String name, double correlation) {

    /** @throws IllegalArgumentException unless 0 &lt; correlation ≤ 1 */
    public Reel {
        if (!(correlation > 0 && correlation <= 1)) {
            throw new IllegalArgumentException("a reel's correlation must be above 0 to 1, got " + correlation);
        }
    }
}
