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

    public Optional<ChannelStudy> channel(String name) {
        return channels.stream().filter(each -> each.channel().equals(name)).findFirst();
    }
}
