package shuntwright.planner;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Channel.Currents;
import shuntwright.board.Channel.ReadingDemand;
import shuntwright.board.Zone;
import shuntwright.quantity.Spread;

/** Boards for tests. */
public final class HandMadeBoards {
    private HandMadeBoards() {
    }

    /** Two channels inside, one likely, one outside, one incomplete by {@link HandMadePlans}. */
    public static Board boat() {
        return Board.named("boat")
                .withZones(
                        List.of(new Zone("port", OptionalDouble.of(2), OptionalDouble.of(12)),
                                new Zone("starboard", OptionalDouble.empty(), OptionalDouble.empty())))
                .withAlertLines(List.of(AlertLine.named("alert"))).withHeatLimit(OptionalDouble.of(6))
                .withChannels(List.of(channel("bilge pump", 20, 25, 31), channel("windlass", 12, 15, 18).withZone(
                        Optional.of("port")), channel("radar", 4, 9.8, 10.2), channel("anchor light", 2, 4.95, 5.05),
                        Channel.named("spare")));
    }

    public static Channel channel(String name, double load, double noTrip, double mustTrip) {
        return Channel.named(name).withRail(Optional.of(new Spread(10.5, 12, 14.4)))
                .withCurrents(new Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip),
                        OptionalDouble.of(mustTrip), OptionalDouble.empty(), OptionalDouble.empty(),
                        OptionalDouble.empty()))
                .withReading(new ReadingDemand(OptionalDouble.empty(), OptionalDouble.of(0.05), Optional.empty()));
    }
}
