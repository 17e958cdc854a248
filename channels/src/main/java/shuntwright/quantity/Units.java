package shuntwright.quantity;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The spellings of units that are taken for each dimension, with and without prefix. */
final class Units {

    private static final List<Unit> PREFIXES = List.of(new Unit("", 0), new Unit("m", -3), new Unit("µ", -6),
            new Unit("u", -6), new Unit("n", -9), new Unit("p", -12), new Unit("f", -15), new Unit("k", 3),
            new Unit("M", 6), new Unit("G", 9), new Unit("T", 12));
    private static final List<Unit> RELATIVE = List.of(new Unit("%", -2), new Unit("ppm", -6), new Unit("ppb", -9));
    private static final List<String> KELVIN = List.of("K", "°C", "C", "degC");
    private static final List<String> SQUARED = List.of("A²s", "A2s", "A^2s", "A²·s", "A2·s", "A^2·s");

    private static final Map<Dimension, Map<String, Unit>> KNOWN = known();

    private Units() {
    }

    /** The unit of that spelling for the dimension, or a sentence that names what the spelling means instead. */
    static Reading<Unit> find(String symbol, Dimension dimension, String wholeText) {
        Unit unit = spellings(dimension).get(symbol);
        if (unit != null) {
            return Reading.value(unit);
        }
        String quoted = TypedText.quote(wholeText);
        String instead = dimension.unit().isEmpty()
                ? " Write a plain number, for example " + example(dimension) + "."
                : " Write it in " + symbolOf(dimension) + ", for example " + example(dimension) + ".";
        if (isPrefixedSquare(symbol)) {
            return Reading.misread(quoted + ": a prefix before A²s may mean the ampere or the whole, so none is taken."
                    + " Write plain A²s, for example " + example(Dimension.CHARGE_HEAT) + ".");
        }
        Optional<Dimension> other = owner(symbol);
        if (other.isPresent()) {
            return Reading.misread(quoted + " is " + TypedText.oneOf(other.get()) + ", but "
                    + TypedText.oneOf(dimension) + " is asked for here." + instead);
        }
        List<String> alike = spellings(dimension).keySet().stream()
                .filter(known -> known.equalsIgnoreCase(symbol) && !known.equals(symbol)).toList();
        String maybe = alike.isEmpty()
                ? ""
                : " Maybe " + String.join(" or ", alike) + " was meant: capitals and small letters differ.";
        return Reading.misread(quoted + ": " + TypedText.quote(symbol) + " is not a unit of "
                + TypedText.oneOf(dimension) + "." + maybe + instead);
    }

    /** How a quantity of the dimension looks, for sentences. */
    static String example(Dimension dimension) {
        return switch (dimension) {
            case CURRENT -> "35 A";
            case VOLTAGE -> "3.3 V";
            case RESISTANCE -> "4 mΩ";
            case POWER -> "0.5 W";
            case ENERGY -> "10 mJ";
            case TIME -> "50 µs";
            case FREQUENCY -> "100 kHz";
            case CAPACITANCE -> "10 nF";
            case CHARGE_HEAT -> "3500 A²s";
            case TEMPERATURE -> "-20 °C";
            case TEMPERATURE_DIFFERENCE -> "40 K";
            case THERMAL_RESISTANCE -> "25 K/W";
            case RATIO -> "0.5 %";
            case GAIN -> "50 V/V";
            case TEMPERATURE_COEFFICIENT -> "25 ppm/K";
            case VOLTAGE_PER_KELVIN -> "0.1 µV/K";
            case DECIBEL -> "110 dB";
            case SLEW_RATE -> "2 V/µs";
            case MONEY -> "0.12";
        };
    }

    private static String symbolOf(Dimension dimension) {
        return switch (dimension) {
            case RATIO -> "% or ppm";
            case TEMPERATURE_COEFFICIENT -> "ppm/K or %/K";
            case SLEW_RATE -> "V/µs or V/s";
            case CURRENT, VOLTAGE, RESISTANCE, POWER, ENERGY, TIME, FREQUENCY, CAPACITANCE, CHARGE_HEAT, TEMPERATURE,
                    TEMPERATURE_DIFFERENCE, THERMAL_RESISTANCE, GAIN, VOLTAGE_PER_KELVIN, DECIBEL, MONEY ->
                dimension
                        .unit();
        };
    }

    private static boolean isPrefixedSquare(String symbol) {
        return SQUARED.stream().anyMatch(square -> PREFIXES.stream()
                .anyMatch(prefix -> !prefix.symbol().isEmpty() && symbol.equals(prefix.symbol() + square)));
    }

    private static Optional<Dimension> owner(String symbol) {
        for (Dimension dimension : Dimension.values()) {
            boolean prefixAlone = PREFIXES.stream().anyMatch(prefix -> prefix.symbol().equals(symbol));
            if (!prefixAlone && spellings(dimension).containsKey(symbol)) {
                return symbol.equals("K") ? Optional.of(Dimension.TEMPERATURE_DIFFERENCE) : Optional.of(dimension);
            }
        }
        return Optional.empty();
    }

    private static Map<String, Unit> spellings(Dimension dimension) {
        return KNOWN.getOrDefault(dimension, Map.of());
    }

    private static Map<Dimension, Map<String, Unit>> known() {
        Map<Dimension, Map<String, Unit>> known = new EnumMap<>(Dimension.class);
        for (Dimension dimension : Dimension.values()) {
            Map<String, Unit> spellings = new LinkedHashMap<>();
            for (Unit unit : units(dimension)) {
                spellings.put(unit.symbol(), unit);
            }
            known.put(dimension, spellings);
        }
        return known;
    }

    private static List<Unit> units(Dimension dimension) {
        return switch (dimension) {
            case CURRENT, VOLTAGE, POWER, TIME, FREQUENCY, CAPACITANCE, TEMPERATURE_DIFFERENCE ->
                prefixed(List.of(dimension.unit()));
            case RESISTANCE -> resistance();
            case ENERGY -> prefixed(List.of("J", "Ws"));
            case CHARGE_HEAT -> plain(SQUARED);
            case TEMPERATURE -> plain(List.of("°C", "degC", "C"));
            case THERMAL_RESISTANCE -> prefixed(KELVIN.stream().map(kelvin -> kelvin + "/W").toList());
            case RATIO -> RELATIVE;
            case GAIN -> plain(List.of("V/V", "x", "×"));
            case TEMPERATURE_COEFFICIENT -> perKelvin();
            case VOLTAGE_PER_KELVIN -> prefixed(KELVIN.stream().map(kelvin -> "V/" + kelvin).toList());
            case DECIBEL -> plain(List.of("dB"));
            case SLEW_RATE -> slewRate();
            case MONEY -> List.of();
        };
    }

    private static List<Unit> plain(List<String> symbols) {
        return symbols.stream().map(symbol -> new Unit(symbol, 0)).toList();
    }

    /** Each symbol with each prefix, and the prefix alone. */
    private static List<Unit> prefixed(List<String> symbols) {
        List<Unit> units = new ArrayList<>();
        for (Unit prefix : PREFIXES) {
            for (String symbol : symbols) {
                units.add(new Unit(prefix.symbol() + symbol, prefix.shift()));
            }
            if (!prefix.symbol().isEmpty()) {
                units.add(prefix);
            }
        }
        return units;
    }

    /** For resistances a capital K is kilo too, as in the letter code. */
    private static List<Unit> resistance() {
        List<String> ohms = List.of("Ω", "ohm", "Ohm", "ohms", "Ohms", "R");
        List<Unit> units = new ArrayList<>(prefixed(ohms));
        ohms.forEach(ohm -> units.add(new Unit("K" + ohm, 3)));
        units.add(new Unit("K", 3));
        return units;
    }

    private static List<Unit> perKelvin() {
        List<Unit> units = new ArrayList<>();
        for (String kelvin : KELVIN) {
            for (Unit relative : RELATIVE) {
                units.add(new Unit(relative.symbol() + "/" + kelvin, relative.shift()));
            }
            units.add(new Unit("1/" + kelvin, 0));
            units.add(new Unit("/" + kelvin, 0));
        }
        return units;
    }

    private static List<Unit> slewRate() {
        List<Unit> units = new ArrayList<>();
        for (Unit volts : PREFIXES) {
            for (Unit seconds : PREFIXES) {
                if (seconds.shift() <= 0) {
                    units.add(new Unit(volts.symbol() + "V/" + seconds.symbol() + "s",
                            volts.shift() - seconds.shift()));
                }
            }
        }
        return units;
    }
}
