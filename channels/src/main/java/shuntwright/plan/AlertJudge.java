package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.AlertLine;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/**
 * Pull-ups of alert lines: V_IO,min − R·(Σ I_leak + I_in) ≥ V_IH, (V_IO,max − V_OL)/R ≤ I_OL, V_OL ≤ V_IL, and
 * ln(0.7/0.3)·R·C within the rise time (30 % to 70 %, as the I²C-bus specification UM10204, 7.1, counts it).
 */
final class AlertJudge {

    /** ln(0.7/0.3). */
    static final double RISE_FACTOR = Math.log(0.7 / 0.3);
    /** Levels of CMOS inputs as shares of V_IO where the board gives none (JESD8 family: 0.65 and 0.35 or wider). */
    private static final double HIGH_SHARE = 0.7;
    private static final double LOW_SHARE = 0.3;

    private AlertJudge() {
    }

    /** @param settled pull-up that feedback networks have been worked out with, Ω; empty lets it be chosen here */
    static AlertPlan judge(AlertLine line, Toleranced voltage, OptionalDouble settled, List<String> channels,
            List<OpenDrainOutput> outputs) {
        double leakage = line.inputLeakage();
        double sink = Double.POSITIVE_INFINITY;
        double low = 0;
        double highestLow = 0;
        for (OpenDrainOutput output : outputs) {
            leakage += output.leakage();
            if (output.sinkCurrent() < sink) {
                sink = output.sinkCurrent();
                low = output.lowLevel().min();
            }
            highestLow = Math.max(highestLow, output.lowLevel().max());
        }
        double least = outputs.isEmpty() ? 0 : (voltage.max() - low) / sink;
        double most = leakage > 0 ? (voltage.min() - high(line, voltage)) / leakage : 1e9;
        if (line.riseTime().isPresent() && line.capacitance() > 0) {
            most = Math.min(most, line.riseTime().getAsDouble() / (RISE_FACTOR * line.capacitance()));
        }
        boolean levels = highestLow <= low(line, voltage);
        Optional<Range> allowed = levels && least <= most && most > 0
                ? Optional.of(Range.of(least, most))
                : Optional.empty();
        double pullUp = line.pullUp().orElseGet(() -> settled.orElseGet(() -> allowed.map(AlertJudge::choose)
                .orElse(BoardContext.DEFAULT_PULL_UP)));
        return new AlertPlan(line, channels, pullUp, allowed, least, most, voltage.max() / pullUp);
    }

    private static double high(AlertLine line, Toleranced voltage) {
        return line.inputHigh().orElse(HIGH_SHARE * voltage.nominal());
    }

    private static double low(AlertLine line, Toleranced voltage) {
        return line.inputLow().orElse(LOW_SHARE * voltage.nominal());
    }

    /** The E24 value nearest to the usual 10 kΩ within the interval; its geometric middle when no value lies within. */
    static double choose(Range allowed) {
        double wanted = Math.max(allowed.min(), Math.min(allowed.max(), BoardContext.DEFAULT_PULL_UP));
        double up = ESeries.E24.atLeast(Math.max(wanted, 1e-3));
        double down = ESeries.E24.atMost(Math.max(wanted, 1e-3));
        boolean upFits = allowed.contains(up);
        boolean downFits = allowed.contains(down);
        if (upFits && downFits) {
            return wanted / down < up / wanted ? down : up;
        }
        return upFits ? up : downFits ? down : wanted;
    }

    static List<Finding> findings(AlertPlan plan, Toleranced voltage, List<OpenDrainOutput> outputs) {
        List<Finding> findings = new ArrayList<>();
        String name = "Alert line \"" + plan.line().name() + "\"";
        Dimension ohm = Dimension.RESISTANCE;
        for (OpenDrainOutput output : outputs) {
            double allowed = low(plan.line(), voltage);
            if (output.lowLevel().max() > allowed) {
                findings.add(Findings.board(Finding.Key.ALERT_LEVELS,
                        name + ": an output pulls down only to " + show(output.lowLevel().max(), Dimension.VOLTAGE)
                                + ", but the input needs at most " + show(allowed, Dimension.VOLTAGE) + ".",
                        List.of(new Measure("low level", output.lowLevel().max(), Dimension.VOLTAGE),
                                new Measure("allowed", allowed, Dimension.VOLTAGE))));
                break;
            }
        }
        boolean fits = plan.least() <= plan.pullUp() && plan.pullUp() <= plan.most();
        if (!fits && !plan.channels().isEmpty()) {
            List<Measure> measures = List.of(new Measure("pull-up", plan.pullUp(), ohm),
                    new Measure("least", plan.least(), ohm), new Measure("most", plan.most(), ohm));
            String text = plan.least() > plan.most()
                    ? name + ": no pull-up satisfies both ends: sink current asks for at least "
                            + show(plan.least(), ohm) + ", high level and rise time for at most "
                            + show(plan.most(), ohm) + ". Fewer channels on the line, less leakage or capacitance, or "
                            + "a higher V_IO would cure it."
                    : name + ": the pull-up of " + show(plan.pullUp(), ohm) + " is not within "
                            + show(Range.of(plan.least(), plan.most()), ohm, 3) + ".";
            findings.add(Findings.board(Finding.Key.ALERT_LEVELS, text, measures));
        }
        return findings;
    }
}
