package shuntwright.planner.window.circuit;

import java.util.ArrayList;
import java.util.List;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Hysteresis;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** What was chosen for a channel, for people. */
public final class CircuitWords {
    /**
     * One line about the circuit.
     *
     * @param title what it is
     * @param words part and value
     */
    public record Line(String title, String words) {}

    private CircuitWords() {
    }

    /** Everything chosen for a channel; empty where nothing could be chosen. */
    public static List<Line> lines(ChannelPlan channel, Plan plan) {
        List<Line> lines = new ArrayList<>();
        channel.solved().ifPresent(solved -> add(lines, solved));
        if (channel.solved().isPresent()) {
            plan.alerts().stream().filter(each -> each.channels().contains(channel.channel().name()))
                    .forEach(each -> lines.add(new Line("Alert line", alert(each))));
        }
        return lines;
    }

    private static void add(List<Line> lines, SolvedChannel solved) {
        SenseCircuit circuit = solved.circuit();
        lines.add(new Line("Shunt", shunt(circuit) + " " + circuit.shunt().partNumber()));
        lines.add(new Line("Amplifier", circuit.amplifier().partNumber() + ", "
                + QuantityWriter.show(circuit.amplifier().gain(), Dimension.GAIN)));
        lines.add(new Line("Comparator", circuit.comparator().partNumber()));
        lines.add(new Line("Hysteresis", hysteresis(circuit)));
        lines.add(new Line("Threshold", QuantityWriter.show(solved.settings().threshold(), Dimension.VOLTAGE)
                + " from " + threshold(circuit)));
        solved.settings().releaseVoltage()
                .ifPresent(voltage -> lines.add(new Line("Releases at", QuantityWriter.show(voltage, Dimension.VOLTAGE)
                        + " of the amplifier's output")));
    }

    /** "3 × 100 µΩ" where several are in parallel. */
    public static String shunt(SenseCircuit circuit) {
        String piece = QuantityWriter.show(circuit.shunt().resistance(), Dimension.RESISTANCE);
        return circuit.shuntCount() > 1 ? circuit.shuntCount() + " × " + piece : piece;
    }

    /** Kind of hysteresis and the value that sets it. */
    public static String hysteresis(SenseCircuit circuit) {
        return switch (circuit.network()) {
            case HysteresisNetwork.SenseResistor(double resistance) -> "injected current, " + ohms(resistance);
            case HysteresisNetwork.Feedback feedback -> "feedback, " + ohms(feedback.resistance());
            case HysteresisNetwork.None _ -> circuit.comparator().hysteresis() instanceof Hysteresis.Latched
                    ? "latch"
                    : "built in";
        };
    }

    /** Where the threshold voltage comes from. */
    public static String threshold(SenseCircuit circuit) {
        String made = switch (circuit.threshold()) {
            case Threshold.Divider divider -> ohms(divider.top()) + " over " + ohms(divider.bottom()) + " at "
                    + divider.source().source().word();
            case Threshold.DacOutput dac -> "DAC code " + dac.code() + " of " + dac.source().source().word();
        };
        String tap = circuit.threshold().tapName();
        return tap.isEmpty() ? made : "tap " + tap + " (" + made + ")";
    }

    private static String alert(AlertPlan alert) {
        return alert.line().name() + ", pull-up " + ohms(alert.pullUp())
                + (alert.channels().size() > 1 ? ", shared by " + alert.channels().size() + " channels" : "");
    }

    private static String ohms(double resistance) {
        return QuantityWriter.show(resistance, Dimension.RESISTANCE);
    }
}
