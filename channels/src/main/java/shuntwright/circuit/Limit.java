package shuntwright.circuit;

import shuntwright.quantity.Dimension;

/** A limit that a choice of parts must respect; each excludes for a reason of its own. */
public enum Limit {
    SWING_AT_TRIP(Family.AMPLIFIER, Dimension.VOLTAGE, "largest threshold within the amplifier's output swing"),
    SWING_AT_FULL_SCALE(Family.AMPLIFIER, Dimension.VOLTAGE, "output at full scale within the amplifier's swing"),
    TRIP_FLOOR(Family.AMPLIFIER, Dimension.VOLTAGE, "smallest threshold above the amplifier's lowest level"),
    RELEASE_FLOOR(Family.AMPLIFIER, Dimension.VOLTAGE, "smallest release voltage above the amplifier's lowest level"),
    OUTPUT_FLOOR(Family.AMPLIFIER, Dimension.VOLTAGE, "output at the least current above the amplifier's lowest level"),
    DIFFERENTIAL_RANGE(Family.AMPLIFIER, Dimension.VOLTAGE, "shunt voltage at full scale within the input range"),
    DIFFERENTIAL_SURVIVAL(Family.AMPLIFIER, Dimension.VOLTAGE, "shunt voltage at the fault current survived"),
    COMMON_MODE_HIGH(Family.AMPLIFIER, Dimension.VOLTAGE, "highest rail voltage within the common-mode range"),
    COMMON_MODE_LOW(Family.AMPLIFIER, Dimension.VOLTAGE, "lowest rail voltage within the common-mode range"),
    AMPLIFIER_SUPPLY(Family.AMPLIFIER, Dimension.VOLTAGE, "sense supply within the amplifier's supply range"),
    COMPARATOR_SUPPLY(Family.COMPARATOR, Dimension.VOLTAGE, "sense supply within the comparator's supply range"),
    COMPARATOR_HEADROOM(Family.COMPARATOR, Dimension.VOLTAGE, "largest threshold within the comparator's input range"),
    COMPARATOR_FLOOR(Family.COMPARATOR, Dimension.VOLTAGE, "smallest threshold within the comparator's input range"),
    OUTPUT_VOLTAGE(Family.COMPARATOR, Dimension.VOLTAGE, "pull-up voltage within the comparator's output rating"),
    SHUNT_POWER(Family.SHUNT, Dimension.POWER, "dissipation at the no-trip current within the derated power"),
    SHUNT_PULSE(Family.SHUNT, Dimension.ENERGY, "energy of a cleared fault within the pulse rating"),
    ADC_FULL_SCALE(Family.AMPLIFIER, Dimension.VOLTAGE, "output at full scale within the ADC's range");

    /** The kind of part a limit excludes. */
    public enum Family {
        SHUNT("shunts"), AMPLIFIER("amplifiers"), COMPARATOR("comparators"), THRESHOLD("thresholds");

        private final String word;

        Family(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    private final Family family;
    private final Dimension dimension;
    private final String words;

    Limit(Family family, Dimension dimension, String words) {
        this.family = family;
        this.dimension = dimension;
        this.words = words;
    }

    public Family family() {
        return family;
    }

    public Dimension dimension() {
        return dimension;
    }

    /** What is counted where this limit excludes something, in words. */
    public String counted() {
        return switch (this) {
            case SHUNT_POWER, SHUNT_PULSE, COMMON_MODE_HIGH, COMMON_MODE_LOW, AMPLIFIER_SUPPLY, COMPARATOR_SUPPLY,
                    OUTPUT_VOLTAGE ->
                family.word();
            case SWING_AT_FULL_SCALE, OUTPUT_FLOOR, DIFFERENTIAL_RANGE, DIFFERENTIAL_SURVIVAL, ADC_FULL_SCALE ->
                "pairs of shunt and amplifier";
            case SWING_AT_TRIP, TRIP_FLOOR, RELEASE_FLOOR, COMPARATOR_HEADROOM, COMPARATOR_FLOOR -> "circuits tried";
        };
    }

    /** What must hold, in words. */
    public String words() {
        return words;
    }
}
