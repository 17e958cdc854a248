package shuntwright.quantity;

/** What a number measures; each has one SI unit in which the program computes and files take bare numbers. */
public enum Dimension {
    CURRENT("current", "A"),
    VOLTAGE("voltage", "V"),
    RESISTANCE("resistance", "Ω"),
    POWER("power", "W"),
    ENERGY("energy", "J"),
    TIME("time", "s"),
    FREQUENCY("frequency", "Hz"),
    CAPACITANCE("capacitance", "F"),
    CHARGE_HEAT("I²t value", "A²s"),
    /** A temperature on the Celsius scale. */
    TEMPERATURE("temperature", "°C"),
    /** A difference of temperatures. */
    TEMPERATURE_DIFFERENCE("temperature difference", "K"),
    THERMAL_RESISTANCE("thermal resistance", "K/W"),
    /** A pure number; text may carry %, ppm. Bare numbers are fractions (0.01 is 1 %). */
    RATIO("ratio", "1"),
    /** Gain of an amplifier, output volts per input volt. */
    GAIN("gain", "V/V"),
    /** Relative change per kelvin; text usually ppm/K or %/K. */
    TEMPERATURE_COEFFICIENT("temperature coefficient", "1/K"),
    /** Voltage change per kelvin, such as an offset drift or a thermal EMF. */
    VOLTAGE_PER_KELVIN("voltage drift", "V/K"),
    /** Rejection ratios in decibel (20 log10). */
    DECIBEL("rejection", "dB"),
    SLEW_RATE("slew rate", "V/s"),
    MONEY("price", "");

    private final String word;
    private final String unit;

    Dimension(String word, String unit) {
        this.word = word;
        this.unit = unit;
    }

    /** The name used in sentences, for example "resistance". */
    public String word() {
        return word;
    }

    /** The unit's symbol without prefix, for example "Ω"; empty for money, whose currency the catalogue states. */
    public String unit() {
        return unit;
    }
}
