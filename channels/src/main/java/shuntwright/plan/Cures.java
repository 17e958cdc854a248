package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.DoubleFunction;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.board.Channel;
import shuntwright.board.Channel.Currents;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.circuit.Limit;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

/**
 * Tries single changes on a failing channel, each by solving the channel again, and reports what each reaches. Nothing
 * here knows answers: what does not cure is reported with the margin it reaches.
 */
final class Cures {

    /** Effort of a change of parts, as compared with a relative change of a demand (for ranking only). */
    private static final double PART_EFFORT = 0.02;
    private static final double SOURCE_EFFORT = 0.05;
    private static final int BISECTIONS = 7;

    private final Channel channel;
    private final ChannelPlan failing;
    private final Trials trials;
    private final List<Cure> cures = new ArrayList<>();

    private Cures(ChannelPlan failing, Trials trials) {
        this.channel = failing.channel();
        this.failing = failing;
        this.trials = trials;
    }

    /** The changes tried, those that cure first, smallest first. */
    static List<Cure> of(ChannelPlan failing, Trials trials) {
        if (!wanted(failing)) {
            return List.of();
        }
        Cures cures = new Cures(failing, trials);
        cures.pins();
        cures.side();
        if (!cures.excludedByRail()) {
            cures.source();
            cures.parallel();
            if (failing.solved().isPresent()) {
                cures.cures.addAll(TighterClasses.of(failing.solved().get(), trials));
                cures.outcomes(failing.solved().get());
            } else {
                cures.limits();
            }
            cures.windows();
        }
        return cures.cures.stream()
                .sorted(Comparator.comparing((Cure each) -> !each.cures()).thenComparingDouble(Cure::size)).toList();
    }

    /** True for channels to which cures are of use. */
    static boolean wanted(ChannelPlan plan) {
        return !plan.accepted() && plan.verdict() != Verdict.INCOMPLETE;
    }

    private void add(Cure.Lever lever, String change, double size, Channel edited) {
        add(lever, change, size, trials.of(edited), Optional.of(edited));
    }

    private void add(Cure.Lever lever, String change, double size, ChannelPlan reached, Optional<Channel> edit) {
        cures.add(new Cure(lever, change, reached.verdict(), reached.solved().map(SolvedChannel::margin), size, edit));
    }

    private void pins() {
        Pins p = channel.pins();
        if (p.shunt().isPresent() || p.shuntCount().isPresent()) {
            add(Cure.Lever.OTHER_SHUNT, "free choice of the shunt instead of " + p.shunt().orElse("the pinned number"),
                    PART_EFFORT, channel.withPins(new Pins(Optional.empty(), OptionalInt.empty(), p.amplifier(),
                            p.comparator(), p.resistors(), p.dividerTop(), p.dividerBottom(),
                            p.hysteresisResistor())));
        }
        if (p.amplifier().isPresent()) {
            add(Cure.Lever.OTHER_AMPLIFIER, "free choice of the amplifier instead of " + p.amplifier().get(),
                    PART_EFFORT, channel.withPins(new Pins(p.shunt(), p.shuntCount(), Optional.empty(),
                            p.comparator(), p.resistors(), p.dividerTop(), p.dividerBottom(),
                            p.hysteresisResistor())));
        }
        if (p.comparator().isPresent()) {
            add(Cure.Lever.OTHER_COMPARATOR, "free choice of the comparator instead of " + p.comparator().get(),
                    PART_EFFORT, channel.withPins(new Pins(p.shunt(), p.shuntCount(), p.amplifier(),
                            Optional.empty(), p.resistors(), p.dividerTop(), p.dividerBottom(),
                            OptionalDouble.empty())));
        }
        boolean values = p.dividerTop().isPresent() || p.dividerBottom().isPresent()
                || p.hysteresisResistor().isPresent() || p.resistors().isPresent();
        if (values) {
            add(Cure.Lever.FREE_VALUES, "free choice of divider and hysteresis resistors", PART_EFFORT / 2,
                    channel.withPins(new Pins(p.shunt(), p.shuntCount(), p.amplifier(), p.comparator(),
                            Optional.empty(), OptionalDouble.empty(), OptionalDouble.empty(),
                            OptionalDouble.empty())));
        }
        boolean parts = p.shunt().isPresent() || p.shuntCount().isPresent() || p.amplifier().isPresent()
                || p.comparator().isPresent();
        if (values && parts) {
            add(Cure.Lever.FREE_VALUES, "nothing pinned", 2 * PART_EFFORT, channel.withPins(Pins.NONE));
        }
    }

    /** True when the rail or the supply excludes every amplifier or comparator, whatever the currents. */
    private boolean excludedByRail() {
        return failing.refusals().stream().anyMatch(each -> each.refused() == each.examined()
                && switch (each.nearMiss().limit()) {
                    case COMMON_MODE_HIGH, COMMON_MODE_LOW, AMPLIFIER_SUPPLY, COMPARATOR_SUPPLY, OUTPUT_VOLTAGE -> true;
                    case SWING_AT_TRIP, SWING_AT_FULL_SCALE, TRIP_FLOOR, RELEASE_FLOOR, OUTPUT_FLOOR,
                            DIFFERENTIAL_RANGE, DIFFERENTIAL_SURVIVAL, COMPARATOR_HEADROOM, COMPARATOR_FLOOR,
                            SHUNT_POWER, SHUNT_PULSE, ADC_FULL_SCALE ->
                        false;
                });
    }

    /** A shunt in the return lead sits at 0 V; worth trying where the rail is what excludes amplifiers. */
    private void side() {
        boolean rail = failing.refusals().stream().map(each -> each.nearMiss().limit())
                .anyMatch(limit -> limit == Limit.COMMON_MODE_HIGH || limit == Limit.COMMON_MODE_LOW);
        if (rail && channel.side() == Channel.Side.HIGH) {
            add(Cure.Lever.SIDE, "a shunt in the return lead (low side) instead of the rail", SOURCE_EFFORT,
                    channel.withSide(Channel.Side.LOW));
        }
    }

    private void source() {
        switch (channel.threshold()) {
            case ThresholdDemand.Free _ -> {
            }
            case ThresholdDemand.SharedTap(String tap) ->
                add(Cure.Lever.SOURCE, "a divider of its own instead of tap " + tap, SOURCE_EFFORT,
                        freeValues(channel.withThreshold(new ThresholdDemand.Free())));
            case ThresholdDemand.OwnDivider(Source source) -> {
                for (Source other : trials.sources()) {
                    if (!other.equals(source)) {
                        add(Cure.Lever.SOURCE, words(other) + " instead of " + words(source), SOURCE_EFFORT,
                                freeValues(channel.withThreshold(new ThresholdDemand.OwnDivider(other))));
                    }
                }
            }
        }
        trials.withBestReference(channel).ifPresent(reached -> add(Cure.Lever.SOURCE,
                "a precision reference on the board, part " + trials.bestReference(), 2 * SOURCE_EFFORT, reached,
                Optional.empty()));
    }

    /** Another source needs other values: a pinned divider would only carry the old ratio over. */
    private static Channel freeValues(Channel edited) {
        Pins p = edited.pins();
        return edited.withPins(new Pins(p.shunt(), p.shuntCount(), p.amplifier(), p.comparator(), p.resistors(),
                OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty()));
    }

    private static String words(Source source) {
        return switch (source) {
            case Source.Supply _ -> "the supply";
            case Source.OfReference(String name) -> "reference " + name;
        };
    }

    private void parallel() {
        if (channel.pins().shuntCount().isPresent()) {
            return;
        }
        int now = trials.parallelShunts();
        for (int more = now + 1; more <= Math.min(now + 2, 8); more++) {
            add(Cure.Lever.MORE_SHUNTS, "up to " + more + " shunts in parallel instead of " + now,
                    SOURCE_EFFORT * (more - now), trials.withParallel(channel, more), Optional.empty());
        }
    }

    private void windows() {
        Currents c = channel.currents();
        double mustTrip = c.mustTrip().orElseThrow();
        double noTrip = c.noTrip().orElseThrow();
        double load = c.load().orElseThrow();
        smallest(1.0, share -> withWindow(noTrip, rounded(mustTrip * (1 + share), true)))
                .ifPresent(edit -> add(Cure.Lever.WINDOW,
                        "must-trip " + ampere(mustTrip) + " → "
                                + ampere(edit.currents().mustTrip().orElseThrow()),
                        edit.currents().mustTrip().orElseThrow() / mustTrip - 1, edit));
        if (load < noTrip) {
            smallest(1 - load / noTrip, share -> withWindow(Math.max(load * 1.001,
                    rounded(noTrip * (1 - share), false)), mustTrip))
                    .ifPresent(edit -> add(Cure.Lever.WINDOW,
                            "no-trip " + ampere(noTrip) + " → "
                                    + ampere(edit.currents().noTrip().orElseThrow()),
                            1 - edit.currents().noTrip().orElseThrow() / noTrip, edit));
        }
    }

    private Channel withWindow(double noTrip, double mustTrip) {
        Currents c = channel.currents();
        OptionalDouble target = c.tripTarget().isPresent() && c.tripTarget().getAsDouble() > noTrip
                && c.tripTarget().getAsDouble() < mustTrip ? c.tripTarget() : OptionalDouble.empty();
        return channel.withCurrents(new Currents(c.load(), OptionalDouble.of(noTrip), OptionalDouble.of(mustTrip),
                target, c.least(), c.fullScale()));
    }

    /** The smallest share up to {@code most} whose edit is accepted, by doubling and bisection; verified by solving. */
    private Optional<Channel> smallest(double most, DoubleFunction<Channel> edit) {
        double high = 0.01;
        while (high < most && !trials.accepts(edit.apply(high))) {
            high *= 2;
        }
        high = Math.min(high, most);
        if (!trials.accepts(edit.apply(high))) {
            return Optional.empty();
        }
        double low = high <= 0.01 ? 0 : high / 2;
        for (int i = 0; i < BISECTIONS; i++) {
            double middle = (low + high) / 2;
            if (trials.accepts(edit.apply(middle))) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return Optional.of(edit.apply(high));
    }

    private void outcomes(SolvedChannel solved) {
        for (Assessment each : solved.assessments()) {
            if (each.insideByLimits() || each.limits().max() >= ChannelAccuracy.BEYOND) {
                continue;
            }
            switch (each.outcome()) {
                case TRIP -> bothEnds(each);
                case RELEASE -> {
                    Range allowed = each.allowed();
                    Range wide = Range.of(rounded(Math.min(allowed.min(), Math.max(0, each.limits().min())), false),
                            rounded(Math.max(allowed.max(), each.limits().max()), true));
                    add(Cure.Lever.RELEASE,
                            "release window " + show(allowed, Dimension.CURRENT, 4) + " → "
                                    + show(wide, Dimension.CURRENT, 4),
                            wide.width() / allowed.width() - 1,
                            channel.withRelease(new ReleaseDemand.Window(wide)));
                    add(Cure.Lever.RELEASE, "latch instead of re-arming", SOURCE_EFFORT,
                            channel.withRelease(new ReleaseDemand.Latch()));
                }
                case READING_AT_LEAST, READING_AT_LOAD -> reading(each);
            }
        }
    }

    /** Where the values are pinned the interval cannot shift, so both ends of the window may have to move. */
    private void bothEnds(Assessment trip) {
        Range allowed = trip.allowed();
        Range reached = trip.limits();
        if (reached.min() < allowed.min() && reached.max() > allowed.max()) {
            double noTrip = rounded(reached.min(), false);
            double mustTrip = rounded(reached.max(), true);
            add(Cure.Lever.WINDOW,
                    "no-trip " + ampere(allowed.min()) + " → " + ampere(noTrip) + " and must-trip "
                            + ampere(allowed.max()) + " → " + ampere(mustTrip),
                    mustTrip / allowed.max() - noTrip / allowed.min(), withWindow(noTrip, mustTrip));
        }
    }

    private void reading(Assessment each) {
        double current = (each.allowed().min() + each.allowed().max()) / 2;
        double reached = rounded(Math.max(each.limits().max() / current - 1, 1 - each.limits().min() / current), true);
        if (!(reached < 1)) {
            return;
        }
        double allowed = each.allowed().max() / current - 1;
        var reading = channel.reading();
        boolean least = each.outcome() == shuntwright.accuracy.Outcome.READING_AT_LEAST;
        Channel edited = channel.withReading(new Channel.ReadingDemand(
                least ? OptionalDouble.of(reached) : reading.atLeast(),
                least ? reading.atLoad() : OptionalDouble.of(reached), reading.calibration()));
        add(Cure.Lever.READING,
                each.outcome().words() + " ±" + show(allowed, Dimension.RATIO, 3) + " → ±"
                        + show(reached, Dimension.RATIO, 3),
                reached / allowed - 1, edited);
    }

    /** For channels that no circuit fits: relaxes one demand of the limits at a time. */
    private void limits() {
        Currents c = channel.currents();
        if (c.fullScale().isPresent()) {
            add(Cure.Lever.LIMIT, "full scale " + ampere(c.fullScale().getAsDouble()) + " → must-trip current", 0.2,
                    channel.withCurrents(new Currents(c.load(), c.noTrip(), c.mustTrip(), c.tripTarget(), c.least(),
                            OptionalDouble.empty())));
        }
        if (c.least().isPresent()) {
            add(Cure.Lever.LIMIT, "no reading at the least current of " + ampere(c.least().getAsDouble()), 0.3,
                    channel.withCurrents(new Currents(c.load(), c.noTrip(), c.mustTrip(), c.tripTarget(),
                            OptionalDouble.empty(), c.fullScale()))
                            .withReading(new Channel.ReadingDemand(OptionalDouble.empty(),
                                    channel.reading().atLoad(), channel.reading().calibration())));
        }
        Channel.Stress stress = channel.stress();
        if (stress.fault().isPresent()) {
            add(Cure.Lever.LIMIT, "fault current " + ampere(stress.fault().getAsDouble())
                    + " kept away by other means", 0.4,
                    channel.withStress(new Channel.Stress(OptionalDouble.empty(),
                            OptionalDouble.empty(), stress.inrush(), stress.withstand())));
        }
        if (stress.clearingTime().isPresent()) {
            for (FamilyRefusal refusal : failing.refusals()) {
                if (refusal.nearMiss().limit() == Limit.SHUNT_PULSE) {
                    double time = rounded(stress.clearingTime().getAsDouble() * refusal.nearMiss().bound()
                            / refusal.nearMiss().reached(), false);
                    add(Cure.Lever.LIMIT, "clearing time "
                            + show(stress.clearingTime().getAsDouble(), Dimension.TIME) + " → "
                            + show(time, Dimension.TIME), 1 - time / stress.clearingTime().getAsDouble(),
                            channel.withStress(new Channel.Stress(stress.fault(), OptionalDouble.of(time),
                                    stress.inrush(), stress.withstand())));
                }
            }
        }
        if (channel.release() instanceof ReleaseDemand.Latch) {
            add(Cure.Lever.RELEASE, "re-arm instead of latching", SOURCE_EFFORT,
                    channel.withRelease(new ReleaseDemand.Between()));
        }
    }

    private static String ampere(double value) {
        return show(value, Dimension.CURRENT);
    }

    /** Rounded to three significant digits, away from the failing side. */
    static double rounded(double value, boolean up) {
        if (!(value > 0)) {
            return 0;
        }
        return new java.math.BigDecimal(value).round(new java.math.MathContext(3,
                up ? java.math.RoundingMode.CEILING : java.math.RoundingMode.FLOOR)).doubleValue();
    }
}
