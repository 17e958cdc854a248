package shuntwright.planner.command;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.SenseSupply;
import shuntwright.board.Source;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.FamilyRefusal;
import shuntwright.plan.Finding;
import shuntwright.plan.Plan;
import shuntwright.plan.Settings;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.Verdict;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

/** A plan put together by hand: one channel of each verdict, numbers chosen to be told apart. */
final class PlanFixture {
    private static final Workplace WREN = Workplace.open(Run.WREN, List.of()).ifOpened().orElseThrow();
    private static final Catalogue PARTS = WREN.catalogue();

    private PlanFixture() {
    }

    static Board board() {
        return WREN.board();
    }

    private static Channel channel(int index) {
        return board().channels().get(index);
    }

    /** The first five channels of the board: inside, likely, outside, no fit, incomplete. */
    static Plan plan() {
        return new Plan(board(), "EUR", List.of(
                new ChannelPlan(channel(0), Verdict.INSIDE, true, solved(0, 2), List.of(), List.of(), List.of()),
                new ChannelPlan(channel(1), Verdict.LIKELY, false, solved(1, 1),
                        List.of(finding(Finding.Key.MARGIN, channel(1), "little is left")), List.of(), List.of()),
                new ChannelPlan(channel(2), Verdict.OUTSIDE, false, solved(2, 1),
                        List.of(finding(Finding.Key.OUTSIDE_WINDOW, channel(2), "misses by 300 mA")),
                        List.of(new Cure(Cure.Lever.WINDOW, "must-trip 12.5 A → 13.1 A", Verdict.INSIDE,
                                Optional.of(0.07), 0.05, Optional.empty()),
                                new Cure(Cure.Lever.SOURCE, "vref", Verdict.LIKELY, Optional.of(-0.02), 1,
                                        Optional.empty())),
                        List.of()),
                new ChannelPlan(channel(3), Verdict.NO_FIT, false, Optional.empty(), List.of(), List.of(),
                        List.of(new FamilyRefusal(Limit.Family.SHUNT, 90, 88, "NEAR-R010",
                                new LimitCheck(Limit.SHUNT_POWER, 1.25, 0.5, true)))),
                new ChannelPlan(channel(4), Verdict.INCOMPLETE, false, Optional.empty(),
                        List.of(finding(Finding.Key.DATA_MISSING, channel(4), "the load current is missing")),
                        List.of(), List.of())),
                List.of(new SharedUse(SharedUse.Kind.SUPPLY, "supply", 0.031, OptionalDouble.of(0.04),
                        Dimension.CURRENT),
                        new SharedUse(SharedUse.Kind.ZONE_HEAT, "zone rear edge", 0.25, OptionalDouble.of(0.2),
                                Dimension.POWER)),
                List.of(), List.of(), List.of(), List.of(),
                List.of(new Finding(Finding.Key.HEAT_OVER_LIMIT, Optional.empty(),
                        "zone rear edge is over its limit by 50 mW", List.of())),
                Optional.empty(), Optional.empty());
    }

    private static Finding finding(Finding.Key key, Channel channel, String text) {
        return new Finding(key, Optional.of(channel.name()), text, List.of());
    }

    private static Optional<SolvedChannel> solved(int index, int shunts) {
        if (!(Demand.of(channel(index)) instanceof Demand.Reading.Complete(Demand demand))) {
            throw new IllegalStateException(channel(index) + " is incomplete");
        }
        SourceVoltage source = new SourceVoltage(new Source.Supply(), board().supply().voltage(), 0, 0, 0);
        SenseCircuit circuit = new SenseCircuit(PARTS.shunts().get(index), shunts, PARTS.amplifiers().get(index),
                PARTS.comparators().getFirst(), new Threshold.Divider(source, 10e3, 10e3, "", 1),
                new HysteresisNetwork.None(), PARTS.resistors().getFirst());
        Range window = demand.tripWindow();
        double target = demand.tripTarget();
        Range limits = Range.of(window.min() + 0.25, window.max() - 0.5);
        Assessment trip = new Assessment(Outcome.TRIP, target, limits,
                new CombinedUncertainty(target, 0.1, Double.POSITIVE_INFINITY, 0.9973, 3), window, List.of(),
                Optional.empty());
        Settings settings = new Settings(1.65, Range.of(1.6, 1.7), OptionalDouble.empty(), 0.0825, 0.9, 2.2);
        return Optional
                .of(new SolvedChannel(demand, circuit, AROUND, settings, List.of(), List.of(trip), List.of(), List.of(),
                        0.125 * (index + 1), 1));
    }

    /** A board with every default. */
    private static final Surroundings AROUND = new Surroundings(Board.DEFAULT_AMBIENT, SenseSupply.DEFAULT.voltage(),
            DesignRules.DEFAULT, Optional.empty(), List.of(), Optional.empty());
}
