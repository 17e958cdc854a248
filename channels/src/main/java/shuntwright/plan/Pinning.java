package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;

/** Writes the choices of a plan back into its board as pins. */
final class Pinning {

    private Pinning() {
    }

    static Board of(Plan plan) {
        Board b = plan.board();
        List<Channel> channels = new ArrayList<>();
        for (ChannelPlan each : plan.channels()) {
            channels.add(each.solved().map(solved -> pinned(each.channel(), solved.circuit())).orElse(each.channel()));
        }
        List<Tap> taps = plan.taps().stream().map(Pinning::tap).toList();
        List<AlertLine> lines = plan.alerts().stream().map(Pinning::line).toList();
        return b.withAlertLines(lines).withTaps(taps).withChannels(channels);
    }

    private static AlertLine line(AlertPlan plan) {
        AlertLine line = plan.line();
        return plan.channels().isEmpty()
                ? line
                : new AlertLine(line.name(), line.voltage(), OptionalDouble.of(plan.pullUp()), line.inputHigh(),
                        line.inputLow(), line.inputLeakage(), line.capacitance(), line.riseTime());
    }

    private static Tap tap(TapPlan plan) {
        Tap tap = plan.tap();
        if (plan.threshold().isEmpty()) {
            return tap;
        }
        return switch (plan.threshold().get()) {
            case Threshold.Divider divider -> new Tap(tap.name(), tap.source(), new Tap.Kind.Divider(
                    OptionalDouble.of(divider.top()), OptionalDouble.of(divider.bottom())), tap.voltage());
            case Threshold.DacOutput dac ->
                new Tap(tap.name(), tap.source(), tap.kind(), OptionalDouble.of(dac.openVoltage()));
        };
    }

    static Channel pinned(Channel channel, SenseCircuit circuit) {
        OptionalDouble network = switch (circuit.network()) {
            case HysteresisNetwork.None _ -> OptionalDouble.empty();
            case HysteresisNetwork.SenseResistor(double ohm) -> OptionalDouble.of(ohm);
            case HysteresisNetwork.Feedback feedback -> OptionalDouble.of(feedback.resistance());
        };
        OptionalDouble top = OptionalDouble.empty();
        OptionalDouble bottom = OptionalDouble.empty();
        ThresholdDemand threshold = channel.threshold();
        if (circuit.threshold() instanceof Threshold.Divider divider && divider.tap().isEmpty()) {
            top = OptionalDouble.of(divider.top());
            bottom = OptionalDouble.of(divider.bottom());
            threshold = new ThresholdDemand.OwnDivider(divider.source().source());
        }
        return channel.withThreshold(threshold)
                .withPins(new Pins(Optional.of(circuit.shunt().partNumber()), OptionalInt.of(circuit.shuntCount()),
                        Optional.of(circuit.amplifier().partNumber()), Optional.of(circuit.comparator().partNumber()),
                        Optional.of(circuit.resistors().partNumber()), top, bottom, network));
    }
}
