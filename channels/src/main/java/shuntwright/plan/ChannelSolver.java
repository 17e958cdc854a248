package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Acceptance;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.choice.ChannelChoice;
import shuntwright.choice.ChannelProblem;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Comparator;
import shuntwright.parts.Part;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageLook;

/** Turns a chosen circuit into a judged channel. */
final class ChannelSolver {

    private ChannelSolver() {
    }

    /** The channel with this circuit, judged; without cures. */
    static ChannelPlan judged(ChannelProblem problem, SenseCircuit circuit) {
        SolvedChannel solved = looked(solve(problem, circuit), problem.acceptance().coverage());
        Verdict verdict = verdict(solved);
        boolean coupled = problem.pullUp().sharedLine() || problem.tap().isPresent();
        List<Finding> findings = new ArrayList<>(Findings.of(solved, verdict, coupled));
        Channel channel = problem.demand().channel();
        boolean asksReading = channel.reading().atLeast().isPresent() || channel.reading().atLoad().isPresent();
        if (asksReading && problem.around().adc().isEmpty()) {
            findings.add(Findings.channel(Finding.Key.READING_WITHOUT_ADC, channel,
                    "A reading accuracy is asked for, but the board has no ADC; it is not judged. Add an ADC to the board "
                            + "or remove the reading accuracy."));
        }
        return new ChannelPlan(channel, verdict, accepted(verdict, problem.acceptance()), Optional.of(solved),
                Findings.sorted(findings), List.of(), List.of());
    }

    static boolean accepted(Verdict verdict, Acceptance acceptance) {
        return switch (verdict) {
            case INSIDE -> true;
            case LIKELY -> acceptance.basis() == Acceptance.Basis.COVERAGE;
            case OUTSIDE, NO_FIT, INCOMPLETE -> false;
        };
    }

    /** With a first look at the coverage intervals where limits do not decide and a coverage interval may. */
    private static SolvedChannel looked(SolvedChannel solved, double coverage) {
        boolean open = solved.assessments().stream().anyMatch(each -> !each.insideByLimits())
                && solved.limits().stream().allMatch(LimitCheck::holds)
                && solved.assessments().stream().allMatch(Assessment::mayBeInsideByCoverage);
        if (!open) {
            return solved;
        }
        List<Range> intervals = CoverageLook.intervals(solved.circuit(), solved.around(), solved.demand(), coverage);
        List<Assessment> assessments = new ArrayList<>();
        for (int i = 0; i < intervals.size(); i++) {
            assessments.add(solved.assessments().get(i).withPropagated(intervals.get(i)));
        }
        return solved.withAssessments(assessments);
    }

    static Verdict verdict(SolvedChannel solved) {
        if (!solved.limits().stream().allMatch(LimitCheck::holds)) {
            return Verdict.NO_FIT;
        }
        if (solved.assessments().stream().allMatch(Assessment::insideByLimits)) {
            return Verdict.INSIDE;
        }
        boolean likely = solved.assessments().stream()
                .allMatch(each -> each.insideByLimits() || each.insideByCoverage());
        return likely ? Verdict.LIKELY : Verdict.OUTSIDE;
    }

    static SolvedChannel solve(ChannelProblem problem, SenseCircuit circuit) {
        Demand demand = problem.demand();
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, problem.around(), demand);
        List<Assessment> assessments = accuracy.assess(problem.acceptance().coverage());
        Range threshold = accuracy.thresholdLimits();
        double resistance = circuit.resistance();
        double gain = circuit.amplifier().gain();
        boolean releases = assessments.stream().anyMatch(each -> each.outcome() == Outcome.RELEASE);
        Settings settings = new Settings(accuracy.outputVoltage(false), threshold,
                releases ? OptionalDouble.of(accuracy.outputVoltage(true)) : OptionalDouble.empty(),
                assessments.getFirst().nominal() * resistance, gain * demand.load() * resistance,
                gain * demand.fullScale() * resistance);
        List<LimitCheck> limits = LimitRules.all(circuit, accuracy.changeover(), problem.pullUp().voltage().max(),
                demand,
                problem.around());
        double heat = demand.load() * demand.load() * resistance * demand.channel().diversity();
        return new SolvedChannel(demand, circuit, problem.around(), settings, accuracy.inputs(), assessments,
                accuracy.uncalibrated(problem.acceptance().coverage()), limits, heat,
                cost(circuit, problem.buildQuantity()));
    }

    /** Price of the channel's own parts; a share of packages with several sections. */
    static double cost(SenseCircuit circuit, int boards) {
        int divider = circuit.threshold().tapName().isEmpty() ? 2 : 0;
        int network = switch (circuit.network()) {
            case HysteresisNetwork.None _ -> 0;
            case HysteresisNetwork.SenseResistor _,HysteresisNetwork.Feedback _ -> 1;
        };
        return circuit.shuntCount()
                * circuit.shunt().purchase().unitPriceAt(
                        (int) Math.min(Integer.MAX_VALUE, (long) circuit.shuntCount() * boards))
                + circuit.amplifier().purchase().unitPriceAt(boards) / circuit.amplifier().sections()
                + circuit.comparator().purchase().unitPriceAt(boards) / circuit.comparator().sections()
                + (divider + network) * circuit.resistors().purchase().unitPriceAt(boards);
    }

    /** A channel that cannot be planned because data are missing. */
    static ChannelPlan incomplete(Channel channel, List<String> missing) {
        String text = "Not planned: " + String.join("; ", missing) + ".";
        Finding.Key key = missing.stream().anyMatch(each -> each.contains("missing"))
                ? Finding.Key.DATA_MISSING
                : Finding.Key.DEMAND_CONTRADICTS;
        return new ChannelPlan(channel, Verdict.INCOMPLETE, false, Optional.empty(),
                List.of(Findings.channel(key, channel, text)), List.of(), List.of());
    }

    /** A channel for which no circuit respects the limits. */
    static ChannelPlan noFit(ChannelProblem problem, ChannelChoice.NoFit none) {
        Channel channel = problem.demand().channel();
        List<FamilyRefusal> refusals = none.refusals().stream().map(each -> new FamilyRefusal(each.family(),
                each.examined(), each.refused(), each.nearest(), each.miss())).toList();
        List<Finding> findings = new ArrayList<>();
        List<String> lacks = Lacks.of(problem);
        if (!lacks.isEmpty()) {
            findings.add(Findings.channel(Finding.Key.NO_FIT, channel,
                    "No circuit can be tried: " + String.join("; ", lacks)
                            + ". Add a parts file, free what is pinned, or ask for something else."));
        } else if (refusals.isEmpty()) {
            findings.add(Findings.channel(Finding.Key.NO_FIT, channel,
                    "Every part respects its limits, but no values of divider and hysteresis resistors bring threshold "
                            + "and release together. Free what is pinned, or widen the release window."));
        }
        for (FamilyRefusal each : refusals) {
            LimitCheck miss = each.nearMiss();
            var dimension = miss.limit().dimension();
            findings.add(Findings.channel(Finding.Key.NO_FIT, channel,
                    Findings.capital(miss.limit().counted()) + ": " + each.refused() + " of " + each.examined()
                            + " excluded, because they break: " + miss.limit().words() + ". Nearest: " + each.nearest()
                            + " with " + show(miss.reached(), dimension) + ", allowed "
                            + (miss.atMost() ? "at most " : "at least ") + show(miss.bound(), dimension)
                            + ", missed by " + show(miss.miss(), dimension) + ".",
                    new Measure("reached", miss.reached(), dimension),
                    new Measure("allowed", miss.bound(), dimension),
                    new Measure("misses by", miss.miss(), dimension)));
        }
        return new ChannelPlan(channel, Verdict.NO_FIT, false, Optional.empty(), findings, List.of(), refusals);
    }

    /** Part numbers that are pinned but not in the catalogue, in words. */
    static List<String> unknownPins(Channel channel, Catalogue catalogue) {
        List<String> unknown = new ArrayList<>();
        look(channel.pins().shunt(), Shunt.class, "shunt", catalogue, unknown);
        look(channel.pins().amplifier(), SenseAmplifier.class, "amplifier", catalogue, unknown);
        look(channel.pins().comparator(), Comparator.class, "comparator", catalogue, unknown);
        look(channel.pins().resistors(), ResistorSeries.class, "resistor series", catalogue, unknown);
        return unknown;
    }

    private static void look(Optional<String> number, Class<? extends Part> kind, String what, Catalogue catalogue,
            List<String> unknown) {
        if (number.isPresent() && catalogue.find(number.get(), kind).isEmpty()) {
            unknown.add("the pinned " + what + " \"" + number.get() + "\" is in no parts file");
        }
    }

    static ChannelPlan unknown(Channel channel, List<String> unknown) {
        String text = "Not planned: " + String.join("; ", unknown) + ". Pin another, unpin it, or add its parts file.";
        return new ChannelPlan(channel, Verdict.NO_FIT, false, Optional.empty(),
                List.of(Findings.channel(Finding.Key.UNKNOWN_PART, channel, text)), List.of(), List.of());
    }

    /** The circuit that the pins describe, or what is not pinned. */
    sealed interface Pinned {
        /** @param circuit complete */
        record Complete(SenseCircuit circuit) implements Pinned {}

        /** @param missing what is not pinned, in words */
        record Incomplete(List<String> missing) implements Pinned {
            public Incomplete {
                missing = List.copyOf(missing);
            }
        }
    }

    static Pinned pinned(ChannelProblem problem) {
        var pins = problem.demand().channel().pins();
        Catalogue catalogue = problem.catalogue();
        Optional<Shunt> shunt = pins.shunt().flatMap(number -> catalogue.find(number, Shunt.class));
        Optional<SenseAmplifier> amplifier = pins.amplifier()
                .flatMap(number -> catalogue.find(number, SenseAmplifier.class));
        Optional<Comparator> comparator = pins.comparator().flatMap(number -> catalogue.find(number, Comparator.class));
        Optional<Threshold> threshold = problem.tap().or(() -> problem.sources().size() == 1
                && pins.dividerTop().isPresent() && pins.dividerBottom().isPresent()
                        ? Optional.of(new Threshold.Divider(problem.sources().getFirst(),
                                pins.dividerTop().getAsDouble(), pins.dividerBottom().getAsDouble(), "", 1))
                        : Optional.empty());
        List<String> missing = new ArrayList<>();
        need(shunt.isPresent(), "shunt", missing);
        need(pins.shuntCount().isPresent(), "number of shunts", missing);
        need(amplifier.isPresent(), "amplifier", missing);
        need(comparator.isPresent(), "comparator", missing);
        need(problem.resistors().size() == 1, "resistor series", missing);
        need(threshold.isPresent(), "threshold source with both divider resistors", missing);
        Optional<HysteresisNetwork> network = comparator.flatMap(each -> network(each, problem));
        need(comparator.isEmpty() || network.isPresent(), "hysteresis resistor", missing);
        if (!missing.isEmpty()) {
            return new Pinned.Incomplete(missing);
        }
        return new Pinned.Complete(new SenseCircuit(shunt.get(), pins.shuntCount().getAsInt(), amplifier.get(),
                comparator.get(), threshold.get(), network.get(), problem.resistors().getFirst()));
    }

    private static void need(boolean there, String what, List<String> missing) {
        if (!there) {
            missing.add(what);
        }
    }

    private static Optional<HysteresisNetwork> network(Comparator comparator, ChannelProblem problem) {
        OptionalDouble resistor = problem.demand().channel().pins().hysteresisResistor();
        return switch (comparator.hysteresis()) {
            case shuntwright.parts.Hysteresis.InjectedCurrent _ -> resistor.isEmpty()
                    ? Optional.empty()
                    : Optional.of(new HysteresisNetwork.SenseResistor(resistor.getAsDouble()));
            case shuntwright.parts.Hysteresis.PositiveFeedback _ -> resistor.isEmpty()
                    ? Optional.empty()
                    : Optional.of(new HysteresisNetwork.Feedback(resistor.getAsDouble(),
                            problem.pullUp().resistance(), problem.pullUp().voltage(),
                            problem.pullUp().supplied()));
            case shuntwright.parts.Hysteresis.BuiltIn _,shuntwright.parts.Hysteresis.Latched _ -> Optional
                    .of(new HysteresisNetwork.None());
        };
    }
}
