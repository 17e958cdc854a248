package shuntwright.plan;

import java.util.List;

import shuntwright.circuit.SenseCircuit;

/**
 * Another circuit for one channel, and what it would mean for the whole board, chosen again around it.
 *
 * @param circuit of the channel
 * @param channel judged with it
 * @param board   what the whole board then reaches, by objective in the order wanted
 * @param cost    of the whole build, the catalogue's currency
 * @param heat    of the board, W
 * @param parts   distinct part numbers
 * @param broken  shared limits broken with it
 */
public record OtherChoice(SenseCircuit circuit, ChannelPlan channel, List<Reached> board, double cost, double heat,
        int parts, List<String> broken) {
    public OtherChoice {
        board = List.copyOf(board);
        broken = List.copyOf(broken);
    }
}
