package shuntwright.sampling;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Sampling;

/**
 * The propagated distributions of a board.
 *
 * @param sampling how it was sampled
 * @param channels every channel with a circuit, in the board's order
 * @param yield    that all of them are inside together
 */
public record BoardStudy(Sampling sampling, List<ChannelStudy> channels, BoardYield yield) {

    public BoardStudy {
        channels = List.copyOf(channels);
    }

    /** What the product of the channels' own probabilities of being inside is at least, each at the end of its interval. */
    public double productAtLeast() {
        return channels.stream().mapToDouble(each -> 1 - each.outside().interval().max()).reduce(1, (a, b) -> a * b);
    }

    /** What it is at most. */
    public double productAtMost() {
        return channels.stream().mapToDouble(each -> 1 - each.outside().interval().min()).reduce(1, (a, b) -> a * b);
    }

    public Optional<ChannelStudy> channel(String name) {
        return channels.stream().filter(each -> each.channel().equals(name)).findFirst();
    }
}
