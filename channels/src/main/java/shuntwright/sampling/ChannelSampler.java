package shuntwright.sampling;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Layout;
import shuntwright.accuracy.Owner;
import shuntwright.accuracy.Reel;
import shuntwright.accuracy.Slot;
import shuntwright.board.Demand;
import shuntwright.board.Sampling;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Samples one channel's outcomes from the one description of its inputs. */
public final class ChannelSampler {

    private final ChannelModel model;
    private final List<Input> inputs;
    private final double[] nominal;
    private final List<Variable> variables;
    private final List<Range> allowed;
    private final Demand demand;

    private ChannelSampler(SenseCircuit circuit, Surroundings around, Demand demand) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, around, demand);
        this.model = new ChannelModel(circuit, around, demand);
        this.inputs = accuracy.inputs();
        this.nominal = accuracy.nominal();
        this.demand = demand;
        this.variables = variables("");
        this.allowed = model.asked().stream().map(ChannelAccuracy.Asked::allowed).toList();
    }

    public static ChannelSampler of(SenseCircuit circuit, Surroundings around, Demand demand) {
        return new ChannelSampler(circuit, around, demand);
    }

    /** One variable for each place of the equations; those of one shared thing at their nominal values. */
    private List<Variable> variables(String frozen) {
        List<Variable> all = new ArrayList<>();
        for (double value : nominal) {
            all.add(Variable.of("", Range.exactly(value), new Distribution.Uniform()));
        }
        for (Input input : inputs) {
            boolean held = input.owner() instanceof Owner.Shared(String name) && name.equals(frozen);
            if (!held) {
                all.set(Layout.index(input), variable(input));
            }
        }
        return all;
    }

    private Variable variable(Input input) {
        Slot quantity = asThreshold(input.slot());
        String key = switch (input.owner()) {
            case Owner.Own(String name) -> "channel " + demand.channel().name() + " / " + name + " / " + quantity + " "
                    + input.piece();
            case Owner.Shared(String name) -> "board / " + name + " / " + quantity;
        };
        // Tolerances of one reel go together and drifts do, but not one with the other.
        Optional<Reel> reel = input.reel()
                .map(each -> new Reel(each.name() + " / " + quantity.unit(), each.correlation()));
        return new Variable(key, input.limits(), input.distribution(), reel);
    }

    /** A reference that feeds both thresholds and the ADC is one reference. */
    private static Slot asThreshold(Slot slot) {
        return switch (slot) {
            case ADC_REFERENCE_TOLERANCE -> Slot.REFERENCE_TOLERANCE;
            case ADC_REFERENCE_DRIFT -> Slot.REFERENCE_DRIFT;
            case ADC_REFERENCE_AGEING -> Slot.REFERENCE_AGEING;
            case ADC_REFERENCE_LOAD -> Slot.REFERENCE_LOAD;
            default -> slot;
        };
    }

    /** What the demand allows for each outcome asked for, A. */
    List<Range> allowed() {
        return allowed;
    }

    /** The shared things whose draws it takes. */
    public Set<String> shared() {
        Set<String> names = new LinkedHashSet<>();
        for (Input input : inputs) {
            if (input.owner() instanceof Owner.Shared(String name)) {
                names.add(name);
            }
        }
        return names;
    }

    /** A channel's study with the trials that were outside, to be put together with those of other channels. */
    public static final class Result {
        private final ChannelStudy study;
        private final OutsideTrials outside;

        Result(ChannelStudy study, OutsideTrials outside) {
            this.study = study;
            this.outside = outside;
        }

        public ChannelStudy study() {
            return study;
        }

        OutsideTrials outside() {
            return outside;
        }

        Result with(ChannelStudy other) {
            return new Result(other, outside);
        }
    }

    /**
     * Distributions of all outcomes.
     *
     * @param assessments of the same circuit, whose combined uncertainty is validated
     * @throws MonteCarlo.Cancelled when the watch says so
     */
    public Result sample(List<Assessment> assessments, double coverage, Sampling sampling, Watch watch) {
        MonteCarlo.Remembered remembered = MonteCarlo.remembered(model, variables, allowed, coverage, sampling, watch);
        int digits = sampling.trials() instanceof Sampling.Trials.Adaptive(int wanted, int _)
                ? wanted
                : MonteCarlo.DIGITS;
        List<Propagated> outcomes = new ArrayList<>();
        for (int i = 0; i < assessments.size(); i++) {
            Sampled sampled = remembered.run().outputs().get(i);
            Assessment assessment = assessments.get(i);
            outcomes.add(new Propagated(assessment.outcome(), assessment.allowed(), sampled,
                    Tolerances.validate(assessment.combined(), sampled.symmetric().range(), digits), List.of()));
        }
        return new Result(new ChannelStudy(demand.channel().name(), coverage, remembered.run().settled(), outcomes,
                remembered.run().outside()), remembered.outside());
    }

    /** Only the probabilistically symmetric coverage intervals; empty once that of an outcome in question is known to be outside. */
    Optional<List<CoverageInterval>> quickly(double coverage, Sampling sampling, List<Integer> inQuestion) {
        return MonteCarlo.intervals(model, variables, allowed, coverage, sampling, inQuestion);
    }

    /** The same result with effect indices. */
    public Result withEffects(Result result, long seed, Watch watch) {
        List<List<EffectSampler.Index>> indices = new EffectSampler(model, variables, seed).indices(watch);
        List<Propagated> outcomes = new ArrayList<>();
        for (int i = 0; i < result.study().outcomes().size(); i++) {
            Propagated each = result.study().outcomes().get(i);
            List<EffectSampler.Index> columns = indices.get(i);
            List<EffectIndex> effects = inputs.stream().map(input -> {
                EffectSampler.Index index = columns.get(Layout.index(input));
                return new EffectIndex(input, index.first(), index.firstError(), index.total(), index.totalError());
            }).filter(effect -> effect.total() > 0)
                    .sorted(Comparator.comparingDouble(EffectIndex::total).reversed()).toList();
            outcomes.add(new Propagated(each.outcome(), each.allowed(), each.sampled(), each.validation(), effects));
        }
        ChannelStudy study = result.study();
        return result.with(new ChannelStudy(study.channel(), study.coverage(), study.settled(), outcomes,
                study.outside()));
    }

    /** The trials that are outside when one shared thing is held at its nominal values, everything else drawn as before. */
    OutsideTrials without(String shared, int trials, long seed, Watch watch) {
        return MonteCarlo.outside(model, variables(shared), allowed, trials, seed, watch);
    }
}
