package shuntwright.quantity;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.IntSummaryStatistics;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;

/**
 * The units a dimension is written in, by size of the value; beyond them numbers get an exponent.
 *
 * @param steps the units, ascending
 * @param until the power of ten from which on the largest unit no longer serves
 * @param far   the unit that goes with an exponent
 * @param zero  the unit that goes with zero
 */
record Scale(List<Step> steps, int until, Unit far, Unit zero) {

    /** @param from the power of ten of the value from which on this unit is taken */
    record Step(Unit unit, int from) {}

    private static final String[] PREFIXES = {"f", "p", "n", "µ", "m", "", "k", "M", "G", "T"};
    private static final int SMALLEST = -15;
    private static final int LARGEST = 12;
    /** In one range values further apart than this many powers of ten get a prefix of their own. */
    private static final int TOGETHER = 3;

    private static final Map<Dimension, Scale> SCALES = scales();

    static Scale of(Dimension dimension) {
        return Objects.requireNonNull(SCALES.get(dimension));
    }

    private static Map<Dimension, Scale> scales() {
        Map<Dimension, Scale> scales = new EnumMap<>(Dimension.class);
        for (Dimension dimension : Dimension.values()) {
            scales.put(dimension, scale(dimension));
        }
        return scales;
    }

    private static Scale scale(Dimension dimension) {
        return switch (dimension) {
            case CURRENT, VOLTAGE, RESISTANCE, POWER, ENERGY, FREQUENCY, CAPACITANCE ->
                prefixed(dimension, SMALLEST, LARGEST, LARGEST + 3);
            case TIME, VOLTAGE_PER_KELVIN -> prefixed(dimension, SMALLEST, 0, 7);
            case TEMPERATURE_DIFFERENCE, THERMAL_RESISTANCE -> prefixed(dimension, -6, 0, 7);
            case CHARGE_HEAT, TEMPERATURE, GAIN, DECIBEL, MONEY -> single(new Unit(dimension.unit(), 0), -5, 12);
            case RATIO -> {
                Unit percent = new Unit("%", -2);
                yield new Scale(List.of(new Step(new Unit("ppm", -6), -9), new Step(percent, -4)), 6, percent, percent);
            }
            case TEMPERATURE_COEFFICIENT -> {
                Unit ppm = new Unit("ppm/K", -6);
                yield new Scale(List.of(new Step(ppm, -9), new Step(new Unit("%/K", -2), -2)), 4, new Unit("1/K", 0),
                        ppm);
            }
            case SLEW_RATE -> {
                Unit slow = new Unit("V/s", 0);
                Unit fast = new Unit("V/µs", 6);
                yield new Scale(List.of(new Step(slow, -3), new Step(fast, 3)), 11, slow, fast);
            }
        };
    }

    private static Scale prefixed(Dimension dimension, int least, int largest, int until) {
        List<Step> steps = new ArrayList<>();
        for (int shift = least; shift <= largest; shift += 3) {
            steps.add(new Step(new Unit(PREFIXES[(shift - SMALLEST) / 3] + dimension.unit(), shift), shift));
        }
        Unit base = new Unit(dimension.unit(), 0);
        return new Scale(steps, until, base, base);
    }

    private static Scale single(Unit unit, int from, int until) {
        return new Scale(List.of(new Step(unit, from)), until, unit, unit);
    }

    /** The number with its unit. */
    String text(Decimal value) {
        Unit unit = unit(value);
        return with(unit, reaches(value) ? value.plain(unit.shift()) : value.scientific(unit.shift()));
    }

    /** The values with ".." between them, under one unit where they are near enough to each other. */
    String text(List<Decimal> values) {
        if (!share(values)) {
            return values.stream().map(this::text).collect(Collectors.joining(" .. "));
        }
        Unit unit = common(values);
        return with(unit, values.stream().map(value -> value.plain(unit.shift())).collect(Collectors.joining(" .. ")));
    }

    private Unit common(List<Decimal> values) {
        return values.stream().filter(value -> !value.isZero()).max((a, b) -> a.size().compareTo(b.size()))
                .map(this::unit).orElse(zero);
    }

    private boolean share(List<Decimal> values) {
        if (!values.stream().allMatch(this::reaches)) {
            return false;
        }
        List<Decimal> sized = values.stream().filter(value -> !value.isZero()).toList();
        IntSummaryStatistics span = sized.stream().mapToInt(Decimal::exponent).summaryStatistics();
        return sized.stream().map(this::unit).distinct().count() <= 1 || span.getMax() - span.getMin() <= TOGETHER;
    }

    private boolean reaches(Decimal value) {
        return value.isZero() || (value.exponent() >= steps.getFirst().from() && value.exponent() < until);
    }

    private Unit unit(Decimal value) {
        if (value.isZero()) {
            return zero;
        }
        if (!reaches(value)) {
            return far;
        }
        Unit unit = steps.getFirst().unit();
        for (Step step : steps) {
            if (value.exponent() >= step.from()) {
                unit = step.unit();
            }
        }
        return unit;
    }

    private static String with(Unit unit, String number) {
        return unit.symbol().isEmpty() ? number : number + " " + unit.symbol();
    }
}
