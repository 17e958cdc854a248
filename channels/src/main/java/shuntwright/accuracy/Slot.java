package shuntwright.accuracy;

import java.util.Arrays;
import java.util.Optional;

/** The place at which an input enters the equations of a channel; the unit is that of the input. */
public enum Slot {
    AMBIENT("ambient temperature", "°C"),
    SUPPLY("sense supply", "V"),
    RAIL("rail voltage", "V"),
    ZONE_RISE("rise of the zone above ambient", "K"),
    GAIN_ERROR("gain error", "1"),
    GAIN_DRIFT("gain drift", "1/K"),
    GAIN_AGEING("gain ageing", "1"),
    OFFSET("amplifier offset", "V"),
    OFFSET_DRIFT("amplifier offset drift", "V/K"),
    COMMON_MODE("common-mode rejection", "V/V"),
    SUPPLY_REJECTION("supply rejection", "V/V"),
    INPUT_BIAS("input bias current on resistor mismatch", "A"),
    THERMAL_EMF("thermal EMF of the shunt", "V"),
    REFERENCE_TOLERANCE("reference tolerance", "1"),
    REFERENCE_DRIFT("reference drift", "1/K"),
    REFERENCE_AGEING("reference ageing", "1"),
    REFERENCE_LOAD("reference load regulation", "V"),
    TOP_TOLERANCE("divider top tolerance", "1"),
    TOP_DRIFT("divider top drift", "1/K"),
    BOTTOM_TOLERANCE("divider bottom tolerance", "1"),
    BOTTOM_DRIFT("divider bottom drift", "1/K"),
    TOP_AGEING("divider top ageing", "1"),
    BOTTOM_AGEING("divider bottom ageing", "1"),
    DAC_GAIN("DAC gain error", "1"),
    DAC_OFFSET("DAC offset and non-linearity", "V"),
    FEEDBACK_TOLERANCE("feedback resistor tolerance", "1"),
    FEEDBACK_DRIFT("feedback resistor drift", "1/K"),
    FEEDBACK_AGEING("feedback resistor ageing", "1"),
    PULL_UP_TOLERANCE("pull-up tolerance and drift", "1"),
    PULL_UP_VOLTAGE("pull-up voltage", "V"),
    OUTPUT_LOW("comparator output low level", "V"),
    COMPARATOR_BIAS("bias current of the threshold input", "A"),
    SENSE_BIAS("bias current of the sense input", "A"),
    COMPARATOR_OFFSET("comparator offset", "V"),
    COMPARATOR_DRIFT("comparator offset drift", "V/K"),
    BUILT_IN("built-in hysteresis", "V"),
    INJECTED_CURRENT("injected hysteresis current", "A"),
    SENSE_RESISTOR_TOLERANCE("hysteresis resistor tolerance", "1"),
    SENSE_RESISTOR_DRIFT("hysteresis resistor drift", "1/K"),
    SENSE_RESISTOR_AGEING("hysteresis resistor ageing", "1"),
    ADC_GAIN("ADC gain error", "1"),
    ADC_OFFSET("ADC offset", "V"),
    ADC_STEP("ADC non-linearity and half a step", "V"),
    ADC_REFERENCE_TOLERANCE("ADC reference tolerance", "1"),
    ADC_REFERENCE_DRIFT("ADC reference drift", "1/K"),
    ADC_REFERENCE_AGEING("ADC reference ageing", "1"),
    ADC_REFERENCE_LOAD("ADC reference load regulation", "V"),
    CALIBRATION_CURRENT("calibration current", "1"),
    CALIBRATION_TEMPERATURE("temperature at calibration", "°C"),
    CALIBRATION_SUPPLY("sense supply at calibration", "V"),
    CALIBRATION_RAIL("rail voltage at calibration", "V"),
    CALIBRATION_STEP_LOWER("ADC non-linearity at the lower calibration point", "V"),
    CALIBRATION_STEP_UPPER("ADC non-linearity at the upper calibration point", "V"),
    CALIBRATION_EMF_LOWER("thermal EMF at the lower calibration point", "V"),
    CALIBRATION_EMF_UPPER("thermal EMF at the upper calibration point", "V"),
    /** From here on one slot for each shunt in parallel. */
    SHUNT_TOLERANCE("shunt tolerance", "1"),
    SHUNT_DRIFT("shunt temperature coefficient", "1/K"),
    SHUNT_AGEING("shunt ageing", "1"),
    MOUNTING("mounting resistance", "Ω");

    private final String words;
    private final String unit;

    Slot(String words, String unit) {
        this.words = words;
        this.unit = unit;
    }

    public String words() {
        return words;
    }

    /** The slot with these words. */
    public static Optional<Slot> of(String words) {
        return Arrays.stream(values()).filter(each -> each.words.equals(words)).findFirst();
    }

    /** The kind of part that owns such an input; empty where it belongs to the board, a reference, a tap or a converter. */
    public Optional<PartKind> part() {
        return switch (this) {
            case SHUNT_TOLERANCE, SHUNT_DRIFT, SHUNT_AGEING, MOUNTING, THERMAL_EMF, CALIBRATION_EMF_LOWER,
                    CALIBRATION_EMF_UPPER ->
                Optional.of(PartKind.SHUNT);
            case GAIN_ERROR, GAIN_DRIFT, GAIN_AGEING, OFFSET, OFFSET_DRIFT, COMMON_MODE, SUPPLY_REJECTION, INPUT_BIAS ->
                Optional.of(PartKind.AMPLIFIER);
            case OUTPUT_LOW, COMPARATOR_BIAS, SENSE_BIAS, COMPARATOR_OFFSET, COMPARATOR_DRIFT, BUILT_IN,
                    INJECTED_CURRENT ->
                Optional.of(PartKind.COMPARATOR);
            case TOP_TOLERANCE, TOP_DRIFT, TOP_AGEING, BOTTOM_TOLERANCE, BOTTOM_DRIFT, BOTTOM_AGEING,
                    FEEDBACK_TOLERANCE, FEEDBACK_DRIFT, FEEDBACK_AGEING, SENSE_RESISTOR_TOLERANCE,
                    SENSE_RESISTOR_DRIFT, SENSE_RESISTOR_AGEING ->
                Optional.of(PartKind.RESISTORS);
            case AMBIENT, SUPPLY, RAIL, ZONE_RISE, REFERENCE_TOLERANCE, REFERENCE_DRIFT, REFERENCE_AGEING,
                    REFERENCE_LOAD, DAC_GAIN, DAC_OFFSET, PULL_UP_TOLERANCE, PULL_UP_VOLTAGE, ADC_GAIN, ADC_OFFSET,
                    ADC_STEP, ADC_REFERENCE_TOLERANCE, ADC_REFERENCE_DRIFT, ADC_REFERENCE_AGEING, ADC_REFERENCE_LOAD,
                    CALIBRATION_CURRENT, CALIBRATION_TEMPERATURE, CALIBRATION_SUPPLY, CALIBRATION_RAIL,
                    CALIBRATION_STEP_LOWER, CALIBRATION_STEP_UPPER ->
                Optional.empty();
        };
    }

    /** True for temperatures, supply and rail, which multiply other inputs. */
    public boolean multiplies() {
        return switch (this) {
            case AMBIENT, ZONE_RISE, SUPPLY, RAIL, CALIBRATION_TEMPERATURE, CALIBRATION_SUPPLY, CALIBRATION_RAIL ->
                true;
            default -> false;
        };
    }

    /** Its place in the order above; the vector of inputs is laid out by it. */
    @SuppressWarnings("EnumOrdinal")
    public int place() {
        return ordinal();
    }

    /** SI unit of the input that enters here. */
    public String unit() {
        return unit;
    }
}
