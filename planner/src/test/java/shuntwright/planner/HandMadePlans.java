package shuntwright.planner;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Outcome;
import shuntwright.accuracy.Owner;
import shuntwright.accuracy.Slot;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.SenseSupply;
import shuntwright.board.Source;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.Finding;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.Settings;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.Verdict;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/**
 * A planner whose plans are made by hand: a fixed accuracy of ±3 % by limits and ±1.5 % by coverage for every channel,
 * so that the verdict follows from the width of the window alone.
 */
public final class HandMadePlans {
    /** Half-width of the limits, of the trip target. */
    public static final double LIMITS = 0.03;
    /** Half-width of the coverage interval, of the trip target. */
    public static final double COVERAGE = 0.015;

    private HandMadePlans() {
    }

    public static Plan plan(Board board, Catalogue catalogue, Progress progress) {
        progress.reached("planning channels", 0, board.channels().size());
        if (progress.cancelled()) {
            throw new shuntwright.plan.BoardPlanner.Cancelled();
        }
        List<ChannelPlan> channels = board.channels().stream().map(channel -> channel(channel, board)).toList();
        double heat = channels.stream().flatMap(each -> each.solved().stream()).mapToDouble(SolvedChannel::heat).sum();
        List<SharedUse> shared = new ArrayList<>();
        shared.add(new SharedUse(SharedUse.Kind.SUPPLY, "supply", 1.5e-3 * channels.size(),
                OptionalDouble.of(board.supply().availableCurrent()), Dimension.CURRENT));
        shared.add(new SharedUse(SharedUse.Kind.BOARD_HEAT, "board", heat, board.heatLimit(), Dimension.POWER));
        board.zones().forEach(zone -> shared.add(
                new SharedUse(SharedUse.Kind.ZONE_HEAT, "zone " + zone.name(), heat / 2, zone.heatLimit(),
                        Dimension.POWER)));
        List<AlertPlan> alerts = board.alertLines().stream()
                .map(line -> new AlertPlan(line, List.of(), 10e3, Optional.of(Range.of(2e3, 40e3)), 2e3, 40e3, 3.4e-4))
                .toList();
        List<PartUse> parts = channels.isEmpty()
                ? List.of()
                : List.of(new PartUse(HandMadeParts.SHUNT.partNumber(), HandMadeParts.SHUNT.description(),
                        channels.size(), designators(channels.size()),
                        channels.stream().map(each -> each.channel().name()).toList(), HandMadeParts.PURCHASE));
        return new Plan(board, "EUR", channels, shared, alerts, List.of(), List.of(), parts, List.of(),
                Optional.empty(), Optional.empty());
    }

    private static List<String> designators(int count) {
        return java.util.stream.IntStream.rangeClosed(1, count).mapToObj(number -> "R" + number).toList();
    }

    private static ChannelPlan channel(Channel channel, Board board) {
        return switch (Demand.of(channel)) {
            case Demand.Reading.Incomplete(List<String> missing) -> new ChannelPlan(channel, Verdict.INCOMPLETE, false,
                    Optional.empty(), missing.stream().map(each -> new Finding(Finding.Key.DATA_MISSING,
                            Optional.of(channel.name()), "Not planned: " + each + ".", List.of())).toList(),
                    List.of(), List.of());
            case Demand.Reading.Complete(Demand demand) -> solved(channel, demand, board);
        };
    }

    private static ChannelPlan solved(Channel channel, Demand demand, Board board) {
        double target = demand.tripTarget();
        double resistance = HandMadeParts.SHUNT.resistance();
        SourceVoltage source = new SourceVoltage(new Source.Supply(), board.supply().voltage(), 0, 0, 0);
        SenseCircuit circuit = new SenseCircuit(HandMadeParts.SHUNT, 2, HandMadeParts.AMPLIFIER,
                HandMadeParts.COMPARATOR, new Threshold.Divider(source, 10e3, 10e3, "", 1),
                new HysteresisNetwork.SenseResistor(4700), HandMadeParts.RESISTORS);
        double threshold = target * resistance / 2 * 50;
        Assessment trip = assessment(Outcome.TRIP, target, demand.tripWindow(), 1);
        List<Assessment> all = new ArrayList<>(List.of(trip));
        channel.reading().atLoad().ifPresent(error -> all.add(assessment(Outcome.READING_AT_LOAD, demand.load(),
                Range.of(demand.load() * (1 - error), demand.load() * (1 + error)), 1)));
        SolvedChannel solved = new SolvedChannel(demand, circuit,
                AROUND, new Settings(threshold, Range.of(threshold * 0.98, threshold * 1.02), OptionalDouble.empty(),
                        target * resistance, threshold * 0.7, threshold * 1.1),
                List.of(), all, uncalibrated(channel, all), List.of(), demand.load() * demand.load() * resistance / 2,
                1.2);
        boolean inside = all.stream().allMatch(Assessment::insideByLimits);
        boolean likely = all.stream().allMatch(Assessment::insideByCoverage);
        Verdict verdict = inside ? Verdict.INSIDE : likely ? Verdict.LIKELY : Verdict.OUTSIDE;
        double wider = target * (1 + 2 * LIMITS);
        Channel cured = channel.withCurrents(new Channel.Currents(channel.currents().load(),
                java.util.OptionalDouble.of(target * (1 - 2 * LIMITS)), OptionalDouble.of(wider),
                channel.currents().tripTarget(), channel.currents().least(), channel.currents().fullScale()));
        List<Cure> cures = inside
                ? List.of()
                : List.of(new Cure(Cure.Lever.WINDOW, String.format(java.util.Locale.ROOT,
                        "window widened to end at %.1f A", wider), Verdict.INSIDE, Optional.of(0.5), 1,
                        Optional.of(cured)));
        List<Finding> findings = inside
                ? List.of()
                : List.of(new Finding(Finding.Key.OUTSIDE_WINDOW, Optional.of(channel.name()),
                        String.format(java.util.Locale.ROOT,
                                "The trip current may lie between %.2f A and %.2f A, but %.2f A to %.2f A is asked for.",
                                trip.limits().min(), trip.limits().max(), trip.allowed().min(), trip.allowed().max()),
                        List.of()));
        return new ChannelPlan(channel, verdict, inside, Optional.of(solved), findings, cures, List.of());
    }

    /** Calibration halves limits and uncertainty of readings. */
    private static List<Assessment> uncalibrated(Channel channel, List<Assessment> all) {
        return channel.reading().calibration().isEmpty()
                ? List.of()
                : all.stream().filter(each -> each.outcome() == Outcome.READING_AT_LOAD)
                        .map(each -> assessment(each.outcome(), each.nominal(), each.allowed(), 2)).toList();
    }

    private static Assessment assessment(Outcome outcome, double nominal, Range allowed, double wider) {
        double expanded = nominal * COVERAGE * wider;
        return new Assessment(outcome, nominal,
                Range.of(nominal * (1 - LIMITS * wider), nominal * (1 + LIMITS * wider)),
                new CombinedUncertainty(nominal, expanded / 3, Double.POSITIVE_INFINITY, 0.9973, 3), allowed,
                List.of(line(Slot.SUPPLY, new Owner.Shared("supply"), nominal * 0.02, 0.7),
                        line(Slot.SHUNT_TOLERANCE, new Owner.Own("shunt 1"), nominal * 0.006, 0.2),
                        line(Slot.OFFSET, new Owner.Own("amplifier"), nominal * 0.003, 0.09),
                        line(Slot.THERMAL_EMF, new Owner.Own("shunt 1"), nominal * 0.001, 0.01)),
                Optional.empty());
    }

    private static BudgetLine line(Slot slot, Owner owner, double size, double share) {
        return new BudgetLine(
                new Input(slot, 0, owner, 0, Range.of(-0.01, 0.01), new Distribution.Uniform(), Optional.empty()), 1,
                -size, size * 0.9,
                size / Math.sqrt(3), share);
    }

    /** A board with every default. */
    private static final Surroundings AROUND = new Surroundings(Board.DEFAULT_AMBIENT, SenseSupply.DEFAULT.voltage(),
            DesignRules.DEFAULT, Optional.empty(), List.of(), Optional.empty());
}
