package shuntwright.planner.window.choice;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;

import shuntwright.board.Board;
import shuntwright.board.SenseSupply;
import shuntwright.board.Zone;
import shuntwright.plan.Conflict;

/** Relaxes a limit that takes part in a conflict. */
final class Relaxing {
    /** Names of limits in a choice. */
    private static final String SUPPLY = "sense supply";
    private static final String BOARD = "board heat";
    private static final String ZONE = "zone ";
    private static final MathContext UPWARD = new MathContext(4, RoundingMode.CEILING);

    private Relaxing() {
    }

    /** What it would have to be, rounded so that it still suffices; empty where relaxing it alone does not help. */
    static OptionalDouble needed(Conflict.Member member) {
        if (member.relaxed().isEmpty()) {
            return OptionalDouble.empty();
        }
        double exact = member.relaxed().getAsDouble();
        double round = BigDecimal.valueOf(exact).round(UPWARD).doubleValue();
        boolean larger = member.now().isEmpty() || exact > member.now().getAsDouble();
        return OptionalDouble.of(larger ? round : exact);
    }

    /** The change of the board that relaxes this limit; empty for a member that is no limit of the board. */
    static Optional<UnaryOperator<Board>> change(Conflict.Member member, Board board) {
        OptionalDouble needed = needed(member);
        if (member.kind() != Conflict.Kind.SHARED_LIMIT || needed.isEmpty()) {
            return Optional.empty();
        }
        double value = needed.getAsDouble();
        if (member.name().equals(SUPPLY)) {
            return Optional.of(at -> at.withSupply(new SenseSupply(at.supply().voltage(), value)));
        }
        if (member.name().equals(BOARD)) {
            return Optional.of(at -> at.withHeatLimit(OptionalDouble.of(value)));
        }
        return zone(member.name(), board).map(zone -> at -> at.withZones(relaxed(at.zones(), zone, value)));
    }

    private static Optional<Zone> zone(String name, Board board) {
        return board.zones().stream().filter(each -> (ZONE + each.name()).equals(name)).findFirst();
    }

    private static List<Zone> relaxed(List<Zone> zones, Zone wanted, double limit) {
        return zones.stream().map(each -> each.name().equals(wanted.name())
                ? new Zone(each.name(), OptionalDouble.of(limit), each.thermalResistance())
                : each).toList();
    }
}
