package shuntwright.sampling;

import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.IntStream;

/** Puts the channels of a board together, trial by trial. */
public final class YieldSampler {

    /** Trials by which the cost of a shared thing is found. */
    private static final int COST_TRIALS = 1 << 17;

    private YieldSampler() {
    }

    /**
     * One channel of the board.
     *
     * @param sampler  of its circuit
     * @param result   what it said
     * @param mayFail  false when its limits are inside and no input can leave its limits, so that no draw is outside
     */
    public record Part(ChannelSampler sampler, ChannelSampler.Result result, boolean mayFail) {}

    /** The yield without what shared things cost. */
    public static BoardYield of(List<Part> parts) {
        int trials = parts.stream().mapToInt(each -> each.result().outside().remembered()).min().orElse(0);
        double product = parts.stream().mapToDouble(each -> 1 - each.result().study().outside().estimate())
                .reduce(1, (a, b) -> a * b);
        if (trials == 0) {
            return new BoardYield(Binomial.of(1, 1), product, List.of());
        }
        long[] outside = together(parts.stream().map(each -> each.result().outside()).toList(), trials);
        return new BoardYield(Binomial.of(count(outside), trials).opposite(), product, List.of());
    }

    /** Finds what each shared thing costs, one task each; none where no trial was outside. */
    public static List<Supplier<BoardYield.SharedCost>> costs(List<Part> parts, long seed, Watch watch) {
        int trials = Math.min(COST_TRIALS,
                parts.stream().mapToInt(each -> each.result().outside().remembered()).min().orElse(0));
        List<OutsideTrials> plain = parts.stream().map(each -> each.result().outside()).toList();
        long[] before = trials == 0 ? new long[0] : together(plain, trials);
        if (trials == 0 || count(before) == 0) {
            return List.of();
        }
        Set<String> names = new LinkedHashSet<>();
        parts.forEach(each -> names.addAll(each.sampler().shared()));
        return names.stream().<Supplier<BoardYield.SharedCost>>map(name -> () -> {
            List<OutsideTrials> held = parts.stream()
                    .map(each -> each.mayFail() && each.sampler().shared().contains(name)
                            ? each.sampler().without(name, trials, seed, watch)
                            : each.result().outside())
                    .toList();
            return cost(name, before, together(held, trials), trials);
        }).toList();
    }

    /** The yield with what each shared thing costs, most first. */
    public static BoardYield withCosts(BoardYield yield, List<BoardYield.SharedCost> costs) {
        return new BoardYield(yield.inside(), yield.product(), costs.stream()
                .sorted(Comparator.comparingDouble(BoardYield.SharedCost::cost).reversed()).toList());
    }

    private static BoardYield.SharedCost cost(String name, long[] before, long[] after, int trials) {
        long cured = 0;
        long broken = 0;
        for (int i = 0; i < before.length; i++) {
            cured += Long.bitCount(before[i] & ~after[i]);
            broken += Long.bitCount(after[i] & ~before[i]);
        }
        double cost = (cured - broken) / (double) trials;
        double variance = (cured + broken) / (double) trials - cost * cost;
        return new BoardYield.SharedCost(name, 1 - count(after) / (double) trials, cost,
                Math.sqrt(Math.max(0, variance) / trials));
    }

    /** The trials in which any channel is outside. */
    private static long[] together(List<OutsideTrials> channels, int trials) {
        long[] words = new long[(trials + Long.SIZE - 1) / Long.SIZE];
        for (OutsideTrials each : channels) {
            for (int i = 0; i < words.length; i++) {
                words[i] |= each.word(i);
            }
        }
        int rest = trials % Long.SIZE;
        if (rest > 0) {
            words[words.length - 1] &= (1L << rest) - 1;
        }
        return words;
    }

    private static long count(long[] words) {
        return IntStream.range(0, words.length).mapToLong(i -> Long.bitCount(words[i])).sum();
    }
}
