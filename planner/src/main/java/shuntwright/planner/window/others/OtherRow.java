package shuntwright.planner.window.others;

import java.util.Optional;

import shuntwright.plan.OtherChoice;
import shuntwright.plan.Verdict;

/**
 * One circuit for the channel.
 *
 * @param choice    empty for the circuit that the channel has now
 * @param number    "now", "1", "2" …
 * @param shunt     value and part
 * @param amplifier gain and part
 * @param threshold where its voltage comes from
 * @param verdict   of the channel
 * @param margin    of the channel
 * @param cost      of the whole build
 * @param heat      of the whole board
 * @param parts     distinct part numbers of the whole board
 * @param broken    shared limits broken with it; empty when none is
 */
record OtherRow(Optional<OtherChoice> choice, String number, String shunt, String amplifier, String threshold,
        Optional<Verdict> verdict, String margin, Amount cost, Amount heat, Amount parts, String broken) {

    /** @param difference against now; empty for the circuit that the channel has */
    record Amount(String value, String difference, double key) {}
}
