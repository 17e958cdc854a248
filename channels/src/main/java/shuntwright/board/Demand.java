package shuntwright.board;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;

/**
 * A channel's demand with every default filled in; currents in A, voltages in V.
 *
 * @param channel      what was typed
 * @param commonMode   what the amplifier's inputs sit at: the rail (high side) or 0 V (low side)
 * @param load         I_L
 * @param tripWindow   I_NT .. I_MT
 * @param tripTarget   I_T, by default √(I_NT·I_MT)
 * @param rearm        window in which it must re-arm; empty where it latches
 * @param fullScale    I_FS, by default I_MT
 */
public record Demand(Channel channel, Spread commonMode, double load, Range tripWindow, double tripTarget,
        Optional<Range> rearm, double fullScale) {

    /** A complete demand, or what is missing or contradictory in it, each in words. */
    public sealed interface Reading {
        /** @param demand ready to be planned */
        record Complete(Demand demand) implements Reading {}

        /** @param missing what is missing or contradictory, in words */
        record Incomplete(List<String> missing) implements Reading {
            public Incomplete {
                missing = List.copyOf(missing);
            }
        }
    }

    /** Fills in defaults, or says what is missing. */
    public static Reading of(Channel channel) {
        List<String> missing = new ArrayList<>();
        Channel.Currents currents = channel.currents();
        if (channel.rail().isEmpty()) {
            missing.add("the rail voltage is missing");
        }
        positive(currents.load(), "load current", missing);
        positive(currents.noTrip(), "no-trip current", missing);
        positive(currents.mustTrip(), "must-trip current", missing);
        if (!missing.isEmpty()) {
            return new Reading.Incomplete(missing);
        }
        double load = currents.load().getAsDouble();
        double noTrip = currents.noTrip().getAsDouble();
        double mustTrip = currents.mustTrip().getAsDouble();
        if (!(load <= noTrip)) {
            missing.add("the no-trip current " + amperes(noTrip) + " must not be below the load current "
                    + amperes(load));
        }
        if (!(noTrip < mustTrip)) {
            missing.add("the no-trip current " + amperes(noTrip) + " must be below the must-trip current "
                    + amperes(mustTrip));
        }
        double target = currents.tripTarget().orElse(Math.sqrt(noTrip * mustTrip));
        if (noTrip < mustTrip && !(noTrip < target && target < mustTrip)) {
            missing.add("the trip target " + amperes(target) + " must lie between no-trip current " + amperes(noTrip)
                    + " and must-trip current " + amperes(mustTrip));
        }
        double least = currents.least().orElse(load);
        if (!(least > 0 && least <= load)) {
            missing.add("the least current " + amperes(least) + " must be above 0 A and not above the load current "
                    + amperes(load));
        }
        double fullScale = currents.fullScale().orElse(mustTrip);
        if (!(fullScale >= load)) {
            missing.add("the full-scale current " + amperes(fullScale) + " must not be below the load current "
                    + amperes(load));
        }
        if (channel.reading().atLeast().isPresent() && currents.least().isEmpty()) {
            missing.add("a reading accuracy at the least current is asked for, but the least current is missing");
        }
        OptionalDouble fault = channel.stress().fault();
        if (fault.isPresent() && !(fault.getAsDouble() >= mustTrip)) {
            missing.add("the fault current " + amperes(fault.getAsDouble())
                    + " must not be below the must-trip current " + amperes(mustTrip));
        }
        channel.reading().calibration().ifPresent(each -> calibration(each, load, fullScale, missing));
        if (channel.release() instanceof ReleaseDemand.Between && !(load < noTrip)) {
            missing.add("the release window between load current " + amperes(load) + " and no-trip current "
                    + amperes(noTrip) + " is empty");
        }
        if (channel.release() instanceof ReleaseDemand.Window(Range window) && !(window.min() < window.max())) {
            missing.add("the release window is empty");
        }
        if (!missing.isEmpty()) {
            return new Reading.Incomplete(missing);
        }
        Spread commonMode = switch (channel.side()) {
            case HIGH -> channel.rail().get();
            case LOW -> Spread.exactly(0);
        };
        Optional<Range> rearm = switch (channel.release()) {
            case ReleaseDemand.Between _ -> Optional.of(Range.of(load, noTrip));
            case ReleaseDemand.Window(Range window) -> Optional.of(window);
            case ReleaseDemand.Latch _ -> Optional.empty();
        };
        return new Reading.Complete(new Demand(channel, commonMode, load, Range.of(noTrip, mustTrip), target, rearm,
                fullScale));
    }

    private static void calibration(Calibration calibration, double load, double fullScale, List<String> missing) {
        double upper = calibration.upperCurrent(load);
        double lower = calibration.lowerCurrent(load);
        if (calibration.points() == Calibration.Points.TWO && !(lower < upper)) {
            missing.add("the lower calibration current " + amperes(lower) + " must be below the upper one "
                    + amperes(upper) + (calibration.upper().isEmpty() ? ", which is the load current" : ""));
        }
        if (!(upper <= fullScale)) {
            missing.add("the calibration current " + amperes(upper) + " must not be above the full-scale current "
                    + amperes(fullScale) + ", beyond which nothing is read");
        }
    }

    private static String amperes(double current) {
        return QuantityWriter.show(current, Dimension.CURRENT);
    }

    private static void positive(OptionalDouble value, String what, List<String> missing) {
        if (value.isEmpty()) {
            missing.add("the " + what + " is missing");
        } else if (!(value.getAsDouble() > 0)) {
            missing.add("the " + what + " must be above 0 A");
        }
    }
}
