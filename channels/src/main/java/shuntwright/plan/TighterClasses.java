package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;

import shuntwright.choice.ChannelProblem;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Tries the next tolerance classes for each part of a circuit, everything else as it is. */
final class TighterClasses {

    /** Customary classes, as fractions (common practice). */
    private static final double[] CLASSES = {0.05, 0.02, 0.01, 0.005, 0.0025, 0.001, 0.0005, 0.0002, 0.0001};
    private static final double EFFORT = 0.08;

    private TighterClasses() {
    }

    static List<Cure> of(SolvedChannel solved, Trials trials) {
        SenseCircuit c = solved.circuit();
        List<Cure> cures = new ArrayList<>();
        attempt("shunt tolerance", c.shunt().tolerance().widest(), t -> with(c, shunt(c.shunt(), t)), trials, cures);
        attempt("amplifier gain error", c.amplifier().gainError(), t -> with(c, amplifier(c.amplifier(), t)), trials,
                cures);
        attempt("divider resistor tolerance", c.resistors().tolerance(), t -> with(c, resistors(c.resistors(), t)),
                trials, cures);
        SourceVoltage source = c.threshold().source();
        attempt(source.isSupply() ? "supply tolerance at the divider" : "reference tolerance",
                source.voltage().tolerance().widest(), t -> with(c, source(c.threshold(), t)),
                trials, cures);
        return cures;
    }

    private static void attempt(String what, double now, DoubleFunction<SenseCircuit> tighter, Trials trials,
            List<Cure> cures) {
        Optional<Cure> last = Optional.empty();
        int steps = 0;
        for (double next : CLASSES) {
            if (next >= now * 0.999) {
                continue;
            }
            steps++;
            ChannelPlan reached = trials.judged(supplied(trials.problem(), what, next), tighter.apply(next));
            last = Optional.of(new Cure(Cure.Lever.TOLERANCE_CLASS,
                    what + " ±" + show(now, Dimension.RATIO, 3) + " → ±" + show(next, Dimension.RATIO, 3),
                    reached.verdict(), reached.solved().map(SolvedChannel::margin), EFFORT * steps, Optional.empty()));
            if (last.get().cures()) {
                break;
            }
        }
        last.ifPresent(cures::add);
    }

    /** Where the divider hangs on the supply, the supply itself is tightened. */
    private static ChannelProblem supplied(ChannelProblem problem, String what, double tolerance) {
        if (!what.startsWith("supply")) {
            return problem;
        }
        var around = problem.around();
        var supply = new Toleranced(around.supply().nominal(), Tolerance.symmetric(tolerance));
        return new ChannelProblem(problem.demand(),
                new shuntwright.circuit.Surroundings(around.ambient(), supply, around.rules(), around.adc(),
                        around.stated(),
                        around.zone()),
                problem.catalogue(), problem.sources(), problem.tap(), problem.resistors(), problem.pullUp(),
                problem.acceptance(), problem.buildQuantity());
    }

    private static SenseCircuit with(SenseCircuit c, Shunt shunt) {
        return new SenseCircuit(shunt, c.shuntCount(), c.amplifier(), c.comparator(), c.threshold(), c.network(),
                c.resistors());
    }

    private static SenseCircuit with(SenseCircuit c, SenseAmplifier amplifier) {
        return new SenseCircuit(c.shunt(), c.shuntCount(), amplifier, c.comparator(), c.threshold(), c.network(),
                c.resistors());
    }

    private static SenseCircuit with(SenseCircuit c, ResistorSeries resistors) {
        return new SenseCircuit(c.shunt(), c.shuntCount(), c.amplifier(), c.comparator(), c.threshold(), c.network(),
                resistors);
    }

    private static SenseCircuit with(SenseCircuit c, Threshold threshold) {
        return new SenseCircuit(c.shunt(), c.shuntCount(), c.amplifier(), c.comparator(), threshold, c.network(),
                c.resistors());
    }

    private static Shunt shunt(Shunt s, double tolerance) {
        return new Shunt(s.partNumber(), s.description(), s.resistance(), Tolerance.symmetric(tolerance),
                s.temperatureCoefficient(), s.ageing(), s.correlation(), s.terminals(), s.mountingResistance(),
                s.thermalEmf(),
                s.rating(), s.purchase());
    }

    private static SenseAmplifier amplifier(SenseAmplifier a, double error) {
        return new SenseAmplifier(a.partNumber(), a.description(), a.gain(), error, a.gainDrift(), a.gainAgeing(),
                a.input(),
                a.ranges(), a.bandwidth(), a.slewRate(), a.supplyCurrent(), a.sections(), a.purchase());
    }

    private static ResistorSeries resistors(ResistorSeries r, double tolerance) {
        return new ResistorSeries(r.partNumber(), r.description(), r.series(), r.values(), tolerance,
                r.temperatureCoefficient(), r.ageing(), r.correlation(), r.power(), r.purchase());
    }

    private static Threshold source(Threshold threshold, double tolerance) {
        SourceVoltage s = threshold.source();
        SourceVoltage tight = new SourceVoltage(s.source(),
                new Toleranced(s.voltage().nominal(), Tolerance.symmetric(tolerance)),
                s.drift(), s.ageing(), s.loadDrop());
        return switch (threshold) {
            case Threshold.Divider d -> new Threshold.Divider(tight, d.top(), d.bottom(), d.tap(), d.users());
            case Threshold.DacOutput d -> new Threshold.DacOutput(tight, d.dac(), d.code(), d.tap());
        };
    }
}
