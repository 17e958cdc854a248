package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.board.ThresholdDemand;
import shuntwright.circuit.Threshold;
import shuntwright.quantity.Dimension;

/** Says so where channels that share a tap cannot all meet their demand at one voltage. */
final class TapFindings {

    private TapFindings() {
    }

    /** The channels with a finding added to those that their tap does not suit; findings about taps go to the board's. */
    static List<ChannelPlan> added(List<ChannelPlan> channels, List<TapPlan> taps, List<Finding> board) {
        for (TapPlan tap : taps) {
            if (tap.channels().isEmpty()) {
                board.add(Findings.board(Finding.Key.TAP_UNUSED,
                        "Tap \"" + tap.tap().name() + "\" is used by no channel.", List.of()));
            }
        }
        List<ChannelPlan> all = new ArrayList<>();
        for (ChannelPlan plan : channels) {
            Optional<TapPlan> tap = plan.channel().threshold() instanceof ThresholdDemand.SharedTap(String name)
                    ? taps.stream().filter(each -> each.tap().name().equals(name)).findFirst()
                    : Optional.empty();
            boolean conflict = tap.isPresent() && !plan.accepted() && plan.verdict() != Verdict.INCOMPLETE;
            all.add(conflict ? with(plan, finding(plan, tap.get())) : plan);
        }
        return all;
    }

    private static Finding finding(ChannelPlan plan, TapPlan tap) {
        String voltage = tap.threshold().map(Threshold::nominalVoltage)
                .map(v -> "at " + show(v, Dimension.VOLTAGE)).orElse("without a usable voltage");
        int others = tap.channels().size() - 1;
        return Findings.channel(Finding.Key.TAP_CONFLICT, plan.channel(),
                "It shares tap \"" + tap.tap().name() + "\" " + voltage + " with " + others
                        + (others == 1 ? " other channel" : " other channels")
                        + " and does not meet its demand there. A divider of its own, or another voltage of the tap, "
                        + "may serve: see the cures.");
    }

    private static ChannelPlan with(ChannelPlan plan, Finding finding) {
        List<Finding> findings = new ArrayList<>(plan.findings());
        findings.add(finding);
        return new ChannelPlan(plan.channel(), plan.verdict(), plan.accepted(), plan.solved(),
                Findings.sorted(findings), plan.cures(), plan.refusals());
    }
}
