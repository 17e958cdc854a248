package shuntwright.board;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.quantity.Spread;

/**
 * One output rail and what its protection must do. Only name, rail voltage, load, no-trip and must-trip current are
 * needed for a plan; {@link Demand} fills in the rest.
 *
 * @param name      unique on the board
 * @param note      free text
 * @param rail      voltage the rail sits at, V
 * @param side      where the shunt stands
 * @param currents  what must pass and what must trip
 * @param release   what happens after a trip
 * @param reading   accuracy asked of the current reading
 * @param threshold where the threshold may come from
 * @param alertLine name of the alert line it pulls; empty for the board's first
 * @param zone      name of the zone its shunt heats; empty for none
 * @param diversity share of its heat counted in totals, 0 to 1
 * @param stress    inrush, fault and withstand
 * @param pins      parts and values the user has fixed
 */
public record Channel(String name, String note, Optional<Spread> rail, Side side, Currents currents,
        ReleaseDemand release, ReadingDemand reading, ThresholdDemand threshold, Optional<String> alertLine,
        Optional<String> zone, double diversity, Stress stress, Pins pins) {

    /** Where the shunt stands. */
    public enum Side {
        /** Between supply rail and load: the amplifier's inputs sit at the rail voltage. */
        HIGH,
        /** Between load and ground: the amplifier's inputs sit at 0 V. */
        LOW
    }

    /**
     * Currents of the demand, A; each empty until typed.
     *
     * @param load       continuous in normal service
     * @param noTrip     largest current that must never trip
     * @param mustTrip   by this current it must have tripped
     * @param tripTarget wanted trip current; empty for the geometric mean of no-trip and must-trip
     * @param least      smallest current to be read; empty when nothing is asked there
     * @param fullScale  largest current the ADC must still read; empty for must-trip
     */
    public record Currents(OptionalDouble load, OptionalDouble noTrip, OptionalDouble mustTrip,
            OptionalDouble tripTarget, OptionalDouble least, OptionalDouble fullScale) {

        public static final Currents NONE = new Currents(OptionalDouble.empty(), OptionalDouble.empty(),
                OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    }

    /**
     * Largest reading error allowed, as fractions of the current; empty when nothing is asked.
     *
     * @param atLeast at the least current
     * @param atLoad  at the load current
     * @param calibration done at production; empty for none
     */
    public record ReadingDemand(OptionalDouble atLeast, OptionalDouble atLoad, Optional<Calibration> calibration) {
        public static final ReadingDemand NONE = new ReadingDemand(OptionalDouble.empty(), OptionalDouble.empty(),
                Optional.empty());
    }

    /**
     * What the output must endure.
     *
     * @param fault        prospective short-circuit current at the output, A
     * @param clearingTime longest time a fault flows through the shunt, s
     * @param inrush       profile at switch-on that must not trip, by ascending time; empty list for none
     * @param withstand    what the wire, trace or switch survives
     */
    public record Stress(OptionalDouble fault, OptionalDouble clearingTime, List<TimePoint> inrush,
            Optional<Withstand> withstand) {
        public static final Stress NONE = new Stress(OptionalDouble.empty(), OptionalDouble.empty(), List.of(),
                Optional.empty());

        public Stress {
            inrush = List.copyOf(inrush);
        }
    }

    /** @throws IllegalArgumentException unless 0 ≤ diversity ≤ 1 */
    public Channel {
        if (!(diversity >= 0 && diversity <= 1)) {
            throw new IllegalArgumentException("diversity must be from 0 to 1, got " + diversity);
        }
    }

    /** A channel of that name with nothing typed yet. */
    public static Channel named(String name) {
        return new Channel(name, "", Optional.empty(), Side.HIGH, Currents.NONE, new ReleaseDemand.Between(),
                ReadingDemand.NONE, new ThresholdDemand.Free(), Optional.empty(), Optional.empty(), 1, Stress.NONE,
                Pins.NONE);
    }

    public Channel withName(String newName) {
        return new Channel(newName, note, rail, side, currents, release, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withRail(Optional<Spread> newRail) {
        return new Channel(name, note, newRail, side, currents, release, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withCurrents(Currents newCurrents) {
        return new Channel(name, note, rail, side, newCurrents, release, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withRelease(ReleaseDemand newRelease) {
        return new Channel(name, note, rail, side, currents, newRelease, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withReading(ReadingDemand newReading) {
        return new Channel(name, note, rail, side, currents, release, newReading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withThreshold(ThresholdDemand newThreshold) {
        return new Channel(name, note, rail, side, currents, release, reading, newThreshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withStress(Stress newStress) {
        return new Channel(name, note, rail, side, currents, release, reading, threshold, alertLine, zone, diversity,
                newStress, pins);
    }

    public Channel withPins(Pins newPins) {
        return new Channel(name, note, rail, side, currents, release, reading, threshold, alertLine, zone, diversity,
                stress, newPins);
    }

    public Channel withNote(String newNote) {
        return new Channel(name, newNote, rail, side, currents, release, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withSide(Side newSide) {
        return new Channel(name, note, rail, newSide, currents, release, reading, threshold, alertLine, zone,
                diversity, stress, pins);
    }

    public Channel withAlertLine(Optional<String> newAlertLine) {
        return new Channel(name, note, rail, side, currents, release, reading, threshold, newAlertLine, zone,
                diversity, stress, pins);
    }

    public Channel withZone(Optional<String> newZone) {
        return new Channel(name, note, rail, side, currents, release, reading, threshold, alertLine, newZone,
                diversity, stress, pins);
    }

    public Channel withDiversity(double newDiversity) {
        return new Channel(name, note, rail, side, currents, release, reading, threshold, alertLine, zone,
                newDiversity, stress, pins);
    }
}
