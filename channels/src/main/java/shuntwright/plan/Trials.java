package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Channel;
import shuntwright.board.Source;
import shuntwright.choice.ChannelProblem;
import shuntwright.circuit.SenseCircuit;

/** Solves variants of one channel on its board, for {@link Cures}. */
interface Trials {

    /** The channel with its demand changed, planned by itself. */
    ChannelPlan of(Channel edited);

    /** True when the channel with its demand changed is accepted. */
    boolean accepts(Channel edited);

    /** Sources an own divider may start from on this board. */
    List<Source> sources();

    /** The channel with an own divider from the catalogue's best reference; empty when the board has a reference. */
    Optional<ChannelPlan> withBestReference(Channel channel);

    /** Part number of that reference. */
    String bestReference();

    /** The board's rule. */
    int parallelShunts();

    /** The channel with another rule for parallel shunts. */
    ChannelPlan withParallel(Channel channel, int parallel);

    /** A complete circuit on this or a similar problem. */
    ChannelPlan judged(ChannelProblem where, SenseCircuit circuit);

    /** The problem of the channel as it is. */
    ChannelProblem problem();
}
