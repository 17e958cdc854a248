package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.quantity.Range;

/** Judges one circuit against one demand: the readers of one {@link InputDescription}. */
public final class ChannelAccuracy {

    /**
     * Stands for no limit at all, A: a current beyond any board, so that it stays a number. Thermal runaway and calibration
     * whose errors outweigh its signal come to it.
     */
    public static final double BEYOND = 1e9;

    private final ChannelEquations equations;
    private final InputDescription description;
    private final Demand demand;
    private final boolean reads;

    private ChannelAccuracy(SenseCircuit circuit, Surroundings around, Demand demand) {
        this.equations = new ChannelEquations(circuit, around);
        this.description = InputDescription.of(circuit, around, demand);
        this.demand = demand;
        this.reads = around.adc().isPresent();
    }

    public static ChannelAccuracy of(SenseCircuit circuit, Surroundings around, Demand demand) {
        return new ChannelAccuracy(circuit, around, demand);
    }

    /** The uncertain inputs of all outcomes. */
    public List<Input> inputs() {
        return List.copyOf(description.inputs());
    }

    /** The vector of the equations with every input at its nominal value; a copy. */
    public double[] nominal() {
        return description.nominal();
    }

    /** What the demand allows for each outcome it asks for, trip first. */
    public static List<Asked> asked(Demand demand, boolean reads) {
        List<Asked> asked = new ArrayList<>();
        asked.add(new Asked(Outcome.TRIP, 0, demand.tripWindow()));
        demand.rearm().ifPresent(window -> asked.add(new Asked(Outcome.RELEASE, 0, window)));
        Channel channel = demand.channel();
        if (reads) {
            OptionalDouble least = channel.currents().least();
            if (least.isPresent()) {
                within(Outcome.READING_AT_LEAST, least.getAsDouble(), channel.reading().atLeast(), asked);
            }
            within(Outcome.READING_AT_LOAD, demand.load(), channel.reading().atLoad(), asked);
        }
        return asked;
    }

    /**
     * One thing a demand asks for.
     *
     * @param outcome which
     * @param current at which a reading is taken, A; 0 for trip and release
     * @param allowed A
     */
    public record Asked(Outcome outcome, double current, Range allowed) {}

    private static void within(Outcome outcome, double current, OptionalDouble error, List<Asked> asked) {
        if (error.isPresent()) {
            double share = error.getAsDouble();
            asked.add(new Asked(outcome, current, Range.of(current * (1 - share), current * (1 + share))));
        }
    }

    /** Every outcome the demand asks for, with limits, combined uncertainty and budget. */
    public List<Assessment> assess(double coverage) {
        List<Assessment> all = new ArrayList<>();
        for (Asked each : asked(demand, reads)) {
            all.add(assess(each, equation(each), coverage));
        }
        return all;
    }

    /** The readings as they would be without calibration; empty where nothing is calibrated. */
    public List<Assessment> uncalibrated(double coverage) {
        if (calibration().isEmpty()) {
            return List.of();
        }
        List<Assessment> all = new ArrayList<>();
        for (Asked each : asked(demand, reads)) {
            if (each.outcome() == Outcome.READING_AT_LEAST || each.outcome() == Outcome.READING_AT_LOAD) {
                all.add(assess(each, equations.reading(each.current()), coverage));
            }
        }
        return all;
    }

    private Optional<Calibration> calibration() {
        return demand.channel().reading().calibration();
    }

    private Assessment assess(Asked asked, Equation equation, double coverage) {
        List<LimitsReader.Corner> extremes = new LimitsReader(equation, description).extremes();
        LimitsReader.Corner low = extremes.get(0);
        LimitsReader.Corner high = extremes.get(1);
        Propagation propagation = propagate(equation);
        double nominal = finite(equation.value(description.nominal()));
        return new Assessment(asked.outcome(), nominal, limits(equation, low, high), propagation.expanded(coverage),
                asked.allowed(), ErrorBudget.lines(equation, description, low, high, propagation), Optional.empty());
    }

    private static double finite(double current) {
        return Math.max(-BEYOND, Math.min(current, BEYOND));
    }

    /** The exact limits of one outcome, A; {@link #BEYOND} where there are none. */
    public Range limits(Asked asked) {
        Equation equation = equation(asked);
        List<LimitsReader.Corner> extremes = new LimitsReader(equation, description).extremes();
        return limits(equation, extremes.get(0), extremes.get(1));
    }

    private Range limits(Equation equation, LimitsReader.Corner low, LimitsReader.Corner high) {
        return equation instanceof CalibratedReading calibrated && !calibrates(calibrated)
                ? Range.of(-BEYOND, BEYOND)
                : Range.of(finite(low.value()), finite(high.value()));
    }

    private boolean calibrates(CalibratedReading calibrated) {
        List<LimitsReader.Corner> signal = new LimitsReader(calibrated.signal(), description).extremes();
        return signal.get(0).value() > 0 && signal.get(1).value() < Double.POSITIVE_INFINITY;
    }

    /** Combined standard uncertainty of one outcome and its expanded interval. */
    public CombinedUncertainty combined(Asked asked, double coverage) {
        return propagate(equation(asked)).expanded(coverage);
    }

    /** The outcome with every input at its nominal value, A. */
    public double nominal(Asked asked) {
        return finite(equation(asked).value(description.nominal()));
    }

    /** Nominal amplifier output voltage at which the comparator trips (false) or releases (true), V. */
    public double outputVoltage(boolean tripped) {
        return equations.outputVoltage(tripped, description.nominal());
    }

    /** Exact extremes of the amplifier output voltage at which the comparator trips, V. */
    public Range thresholdLimits() {
        return outputLimits(false);
    }

    /** Exact extremes of the amplifier output voltage at which the comparator releases, V; empty where it latches. */
    public Optional<Range> releaseLimits() {
        return demand.rearm().isPresent() ? Optional.of(outputLimits(true)) : Optional.empty();
    }

    /** Both, for {@link LimitRules}. */
    public LimitRules.Changeover changeover() {
        return new LimitRules.Changeover(thresholdLimits(), releaseLimits());
    }

    private Range outputLimits(boolean tripped) {
        List<LimitsReader.Corner> extremes = new LimitsReader(new ThresholdVoltage(equations, tripped), description)
                .extremes();
        return Range.of(extremes.get(0).value(), extremes.get(1).value());
    }

    private Equation equation(Asked asked) {
        return switch (asked.outcome()) {
            case TRIP -> equations.trip();
            case RELEASE -> equations.release();
            case READING_AT_LEAST, READING_AT_LOAD -> calibration()
                    .<Equation>map(each -> new CalibratedReading(equations, each, demand.load(), asked.current()))
                    .orElseGet(() -> equations.reading(asked.current()));
        };
    }

    private Propagation propagate(Equation equation) {
        List<Estimate> estimates = new ArrayList<>();
        for (double value : description.nominal()) {
            estimates.add(Estimate.of(value, 0));
        }
        for (Input input : description.inputs()) {
            estimates.set(Layout.index(input), new Estimate(input.limits().mid(), input.standardUncertainty(),
                    input.distribution().degreesOfFreedom()));
        }
        return Propagation.secondOrder(equation, estimates, description.correlation());
    }

}
