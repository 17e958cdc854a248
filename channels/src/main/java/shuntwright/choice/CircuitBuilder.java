package shuntwright.choice;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;

import shuntwright.board.Pins;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/** Gives a combination of parts its divider and hysteresis values. */
final class CircuitBuilder {

    /** R_b is looked for between the smallest total divided by this and the bias bound times this. */
    private static final double BOTTOMS = 20;

    private final ChannelProblem problem;
    private final ValueChoice values;
    private final DividerTables tables;

    CircuitBuilder(ChannelProblem problem, DividerTables tables) {
        this.problem = problem;
        this.values = new ValueChoice(tables);
        this.tables = tables;
    }

    /** The circuits with the best values (several when equally good); empty when no values fit. */
    List<SenseCircuit> build(ShuntTerms shunt, AmplifierTerms amplifiers, int amplifier, Window window,
            Optional<SourceVoltage> source, ResistorSeries resistors) {
        Parts parts = new Parts(shunt, amplifiers, amplifier, window.comparator, resistors);
        if (window.comparator.hysteresis() instanceof Hysteresis.PositiveFeedback positive) {
            return feedback(parts, window, positive, source);
        }
        List<? extends Threshold> thresholds = problem.tap().isPresent()
                ? List.of(problem.tap().get())
                : values.dividers(window, source.orElseThrow(), resistors, problem.around().rules(), pins());
        return thresholds.stream()
                .flatMap(threshold -> network(window, threshold, resistors).stream()
                        .map(network -> parts.circuit(threshold, network)))
                .toList();
    }

    private Pins pins() {
        return problem.demand().channel().pins();
    }

    /** The parts chosen so far. */
    private record Parts(ShuntTerms shunt, AmplifierTerms amplifiers, int amplifier, Comparator comparator,
            ResistorSeries resistors) {
        SenseCircuit circuit(Threshold threshold, HysteresisNetwork network) {
            return new SenseCircuit(shunt.shunt, shunt.count, amplifiers.amplifiers[amplifier], comparator, threshold,
                    network, resistors);
        }
    }

    private Optional<HysteresisNetwork> network(Window window, Threshold threshold, ResistorSeries resistors) {
        return switch (window.comparator.hysteresis()) {
            case Hysteresis.InjectedCurrent injected -> HysteresisChoice.senseResistor(window, injected, threshold,
                    resistors, pins().hysteresisResistor());
            case Hysteresis.BuiltIn _,Hysteresis.Latched _,Hysteresis.PositiveFeedback _ -> Optional
                    .of(new HysteresisNetwork.None());
        };
    }

    private List<SenseCircuit> feedback(Parts parts, Window window, Hysteresis.PositiveFeedback positive,
            Optional<SourceVoltage> source) {
        PullUp pull = problem.pullUp();
        Optional<Threshold.Divider> fixed = fixedDivider(source);
        OptionalDouble pinned = pins().hysteresisResistor();
        if (fixed.isPresent() && pinned.isPresent()) {
            return List.of(parts.circuit(fixed.get(), new HysteresisNetwork.Feedback(pinned.getAsDouble(),
                    pull.resistance(), pull.voltage(), pull.supplied())));
        }
        if (problem.tap().isPresent() || source.isEmpty()) {
            return List.of();
        }
        double trip = window.target();
        double release = middle(window.releaseLow, window.releaseHigh) + positive.builtIn().mid();
        if (!(release < trip)) {
            return List.of();
        }
        double least = source.get().voltage().max() / problem.around().rules().dividerCurrent();
        DividerTable table = tables.of(parts.resistors());
        double most = biasBound(window, trip);
        double[] bottoms = fixed.map(divider -> new double[]{divider.bottom()}).orElseGet(() -> DoubleStream
                .of(table.values()).filter(value -> value >= least / BOTTOMS && value <= most).toArray());
        double[] tops = fixed.map(divider -> new double[]{divider.top()}).orElseGet(table::values);
        return HysteresisChoice.feedback(new FeedbackDemand(source.get(),
                new FeedbackDemand.Levels(trip, release, window.comparator.output().lowLevel().mid()), pull,
                new FeedbackDemand.Values(tops, bottoms,
                        parts.resistors().series().within(parts.resistors().values()), least, pinned)))
                .map(found -> List.of(parts.circuit(found.threshold(), found.network()))).orElse(List.of());
    }

    private Optional<Threshold.Divider> fixedDivider(Optional<SourceVoltage> source) {
        if (problem.tap().isPresent()) {
            return problem.tap().get() instanceof Threshold.Divider divider ? Optional.of(divider) : Optional.empty();
        }
        Pins pins = pins();
        return source.isPresent() && pins.dividerTop().isPresent() && pins.dividerBottom().isPresent()
                ? Optional.of(new Threshold.Divider(source.get(), pins.dividerTop().getAsDouble(),
                        pins.dividerBottom().getAsDouble(), "", 1))
                : Optional.empty();
    }

    /** Largest R_b at which the comparator's bias current shifts the threshold by the allowed share at most, Ω. */
    private double biasBound(Window window, double threshold) {
        Range bias = window.comparator.inputs().biasCurrent();
        double largest = Math.max(Math.abs(bias.min()), Math.abs(bias.max()));
        // The parallel resistance is what counts; R_b may exceed it by the ratio of the divider.
        return largest > 0
                ? problem.around().rules().biasShare() * threshold / largest * BOTTOMS
                : DividerTable.TOTAL.max();
    }

    private static double middle(double[] low, double[] high) {
        return (Math.max(low[0], low[1]) + Math.min(high[0], high[1])) / 2;
    }

}
