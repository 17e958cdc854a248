package shuntwright.choice;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.random.RandomGenerator;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageLook;

/** Problems whose windows are exactly what one circuit reaches. */
final class TightProblems {

    private static final double SPARE = 1e-9;

    private TightProblems() {
    }

    static Optional<ChannelProblem> of(ChannelProblem loose, List<BruteForce.Tried> all, RandomGenerator random,
            boolean pinned) {
        if (all.isEmpty()) {
            return Optional.empty();
        }
        SenseCircuit circuit = all.get(random.nextInt(all.size())).circuit();
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, loose.around(), loose.demand());
        List<Assessment> reached = accuracy.assess(loose.acceptance().coverage());
        List<Range> intervals = switch (loose.acceptance().basis()) {
            case LIMITS -> reached.stream().map(Assessment::limits).toList();
            case COVERAGE -> CoverageLook.intervals(circuit, loose.around(), loose.demand(),
                    loose.acceptance().coverage());
        };
        Range trip = intervals.getFirst();
        if (!(trip.min() > 0 && trip.max() < 1e6)) {
            return Optional.empty();
        }
        Channel channel = loose.demand().channel();
        double noTrip = trip.min() * (1 - SPARE);
        double load = Math.min(loose.demand().load(), noTrip);
        Channel tight = channel.withCurrents(new Channel.Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip),
                OptionalDouble.of(trip.max() * (1 + SPARE)), OptionalDouble.empty(),
                OptionalDouble.empty(), OptionalDouble.empty())).withReading(Channel.ReadingDemand.NONE);
        Optional<Range> release = loose.demand().rearm().map(_ -> intervals.get(1));
        if (release.isPresent() && !(release.get().min() > 0 && release.get().max() < 1e6)) {
            return Optional.empty();
        }
        if (release.isPresent()) {
            tight = tight.withRelease(new ReleaseDemand.Window(
                    Range.of(release.get().min() * (1 - SPARE), release.get().max() * (1 + SPARE))));
        }
        if (pinned) {
            tight = tight.withPins(pins(circuit));
        }
        return Demand.of(tight) instanceof Demand.Reading.Complete(Demand demand)
                ? Optional.of(new ChannelProblem(demand, loose.around(), loose.catalogue(),
                        pinned && loose.tap().isEmpty() ? List.of(circuit.threshold().source()) : loose.sources(),
                        loose.tap(), pinned ? List.of(circuit.resistors()) : loose.resistors(), loose.pullUp(),
                        loose.acceptance(), loose.buildQuantity()))
                : Optional.empty();
    }

    private static Pins pins(SenseCircuit circuit) {
        boolean own = circuit.threshold().tapName().isEmpty();
        OptionalDouble top = own && circuit.threshold() instanceof Threshold.Divider divider
                ? OptionalDouble.of(divider.top())
                : OptionalDouble.empty();
        OptionalDouble bottom = own && circuit.threshold() instanceof Threshold.Divider divider
                ? OptionalDouble.of(divider.bottom())
                : OptionalDouble.empty();
        OptionalDouble network = switch (circuit.network()) {
            case HysteresisNetwork.None _ -> OptionalDouble.empty();
            case HysteresisNetwork.SenseResistor(double ohm) -> OptionalDouble.of(ohm);
            case HysteresisNetwork.Feedback feedback -> OptionalDouble.of(feedback.resistance());
        };
        return new Pins(Optional.of(circuit.shunt().partNumber()), OptionalInt.of(circuit.shuntCount()),
                Optional.of(circuit.amplifier().partNumber()), Optional.of(circuit.comparator().partNumber()),
                Optional.of(circuit.resistors().partNumber()), top, bottom, network);
    }
}
