package shuntwright.io.planfile;

import shuntwright.accuracy.Slot;
import shuntwright.board.Objective;
import shuntwright.plan.WhatIf;
import shuntwright.quantity.Dimension;

/** The unit of a number, as the end of its key and as a symbol. */
enum Unit {
    AMPERE("A", "A"), VOLT("V", "V"), OHM("ohm", "Ω"), WATT("W", "W"), JOULE("J", "J"), SECOND("s", "s"),
    HERTZ("Hz", "Hz"), FARAD("F", "F"), AMPERE_SQUARED_SECOND("A2s", "A²s"), CELSIUS("degC", "°C"), KELVIN("K", "K"),
    KELVIN_PER_WATT("K_per_W", "K/W"), FRACTION("fraction", "1"), VOLT_PER_VOLT("V_per_V", "V/V"),
    PER_KELVIN("per_K", "1/K"), VOLT_PER_KELVIN("V_per_K", "V/K"), DECIBEL("dB", "dB"),
    VOLT_PER_SECOND("V_per_s", "V/s"), SQUARE_MILLIMETRE("mm2", "mm²"),
    CONDUCTOR_CONSTANT("A_sqrt_s_per_mm2", "A·√s/mm²"), STEP("steps", "LSB"), CURRENCY("currency", "currency"),
    PARTS("parts", "part numbers"), BOARDS("boards", "boards"),
    /** A number that is neither a quantity nor a fraction of one; its key has no ending. */
    PURE("", "");

    private final String suffix;
    private final String symbol;

    Unit(String suffix, String symbol) {
        this.suffix = suffix;
        this.symbol = symbol;
    }

    /** How the unit ends a key, in ASCII. */
    String suffix() {
        return suffix;
    }

    String symbol() {
        return symbol;
    }

    static Unit of(Dimension dimension) {
        return switch (dimension) {
            case CURRENT -> AMPERE;
            case VOLTAGE -> VOLT;
            case RESISTANCE -> OHM;
            case POWER -> WATT;
            case ENERGY -> JOULE;
            case TIME -> SECOND;
            case FREQUENCY -> HERTZ;
            case CAPACITANCE -> FARAD;
            case CHARGE_HEAT -> AMPERE_SQUARED_SECOND;
            case TEMPERATURE -> CELSIUS;
            case TEMPERATURE_DIFFERENCE -> KELVIN;
            case THERMAL_RESISTANCE -> KELVIN_PER_WATT;
            case RATIO -> FRACTION;
            case GAIN -> VOLT_PER_VOLT;
            case TEMPERATURE_COEFFICIENT -> PER_KELVIN;
            case VOLTAGE_PER_KELVIN -> VOLT_PER_KELVIN;
            case DECIBEL -> DECIBEL;
            case SLEW_RATE -> VOLT_PER_SECOND;
            case MONEY -> CURRENCY;
        };
    }

    static Unit of(Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> WATT;
            case MOST_EVEN_HEAT, WIDEST_MARGIN -> FRACTION;
            case LEAST_COST -> CURRENCY;
            case FEWEST_PARTS -> PARTS;
        };
    }

    static Unit of(WhatIf.Varied varied) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT, ZONE_HEAT_LIMIT -> WATT;
            case SUPPLY_CURRENT -> AMPERE;
            case BUILD_QUANTITY -> BOARDS;
        };
    }

    static Unit of(Slot slot) {
        for (Unit each : values()) {
            if (each.symbol.equals(slot.unit())) {
                return each;
            }
        }
        throw new IllegalArgumentException("no unit is known under the symbol " + slot.unit() + " of " + slot);
    }
}
