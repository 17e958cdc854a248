package shuntwright.accuracy;

/** The place at which an input enters the equations of a channel; the unit is that of the input. */
public enum Slot {
    AMBIENT("ambient temperature", "°C"),
    SUPPLY("sense supply", "V"),
    RAIL("rail voltage", "V"),
    GAIN_ERROR("gain error", "1"),
    GAIN_DRIFT("gain drift", "1/K"),
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
    DAC_GAIN("DAC gain error", "1"),
    DAC_OFFSET("DAC offset and non-linearity", "V"),
    FEEDBACK_TOLERANCE("feedback resistor tolerance", "1"),
    FEEDBACK_DRIFT("feedback resistor drift", "1/K"),
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
    ADC_GAIN("ADC gain error", "1"),
    ADC_OFFSET("ADC offset", "V"),
    ADC_STEP("ADC non-linearity and half a step", "V"),
    ADC_REFERENCE_TOLERANCE("ADC reference tolerance", "1"),
    ADC_REFERENCE_DRIFT("ADC reference drift", "1/K"),
    ADC_REFERENCE_AGEING("ADC reference ageing", "1"),
    ADC_REFERENCE_LOAD("ADC reference load regulation", "V"),
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

    /** True for ambient, supply and rail, which multiply other inputs. */
    public boolean multiplies() {
        return this == AMBIENT || this == SUPPLY || this == RAIL;
    }

    /** Its place in the order above; the vector of inputs is laid out by it. */
    @SuppressWarnings("EnumOrdinal")
    int place() {
        return ordinal();
    }

    /** SI unit of the input that enters here. */
    public String unit() {
        return unit;
    }
}
