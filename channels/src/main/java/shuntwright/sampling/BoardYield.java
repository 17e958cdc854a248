package shuntwright.sampling;

import java.util.List;

/**
 * The share of boards on which every channel with a circuit is inside in every outcome.
 *
 * @param inside  with shared draws: one supply, one ambient, one reference for the whole board in each trial
 * @param product what the product of the channels' own probabilities would have claimed
 * @param shared  what each shared input costs, most first
 */
public record BoardYield(Probability inside, double product, List<SharedCost> shared) {

    public BoardYield {
        shared = List.copyOf(shared);
    }

    /**
     * What one shared thing costs.
     *
     * @param owner   the shared thing, for example "ambient", "supply" or "reference quiet"
     * @param without yield with all its inputs held at their nominal values, everything else drawn as before
     * @param cost    {@code without} minus the yield, of the same trials; may be slightly negative by chance
     * @param standardError of the cost
     */
    public record SharedCost(String owner, double without, double cost, double standardError) {}
}
