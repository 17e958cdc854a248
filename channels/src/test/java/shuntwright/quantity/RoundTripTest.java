package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static shuntwright.quantity.Readings.meaning;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What is written reads back as the same bits, for every dimension and every finite double. */
class RoundTripTest {

    private static final double[] EXTREMES = {0.0, -0.0, Double.MIN_VALUE, -Double.MIN_VALUE, Double.MIN_NORMAL,
            Math.nextDown(Double.MIN_NORMAL), Double.MAX_VALUE, -Double.MAX_VALUE, 1, Math.nextUp(1.0),
            Math.nextDown(1.0), 999.9999999999999, 1000, 1e-15, Math.nextDown(1e-15), 1e15, Math.nextDown(1e15), 2e23,
            0.1, 0.3, 1e22, 1e23, 9007199254740992.0};

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(60063);

    @ParameterizedTest
    @EnumSource
    void numbers(Dimension dimension) {
        for (double value : EXTREMES) {
            check(value, dimension);
        }
        for (int i = 0; i < 6_000; i++) {
            check(anyBits(), dimension);
            check(everyday(), dimension);
        }
    }

    private static void check(double value, Dimension dimension) {
        String text = QuantityWriter.write(value, dimension);
        double back = meaning(QuantityReader.number(text, dimension));
        if (Double.doubleToRawLongBits(back) != Double.doubleToRawLongBits(value)) {
            throw new AssertionError(value + " was written as " + text + " and read as " + back);
        }
    }

    @ParameterizedTest
    @EnumSource
    void rangesAndSpreads(Dimension dimension) {
        for (int i = 0; i < 3_000; i++) {
            boolean wild = i % 2 == 0;
            List<Double> values = List.of(value(wild), i % 10 == 3 ? 0.0 : value(wild), value(wild)).stream().sorted()
                    .toList();
            Range range = Range.of(values.getFirst(), values.getLast());
            assertThat(meaning(QuantityReader.range(QuantityWriter.write(range, dimension), dimension)))
                    .isEqualTo(range);
            Spread spread = new Spread(values.getFirst(), values.get(1), values.getLast());
            assertThat(meaning(QuantityReader.spread(QuantityWriter.write(spread, dimension), dimension)))
                    .isEqualTo(spread);
            Range one = Range.exactly(values.get(1));
            assertThat(meaning(QuantityReader.range(QuantityWriter.write(one, dimension), dimension))).isEqualTo(one);
        }
    }

    @Test
    void tolerances() {
        for (int i = 0; i < 8_000; i++) {
            double below = i % 3 == 0 ? Math.abs(anyBits()) % 1 : random.nextDouble();
            double above = i % 4 == 0 ? below : i % 5 == 0 ? Math.abs(anyBits()) : random.nextDouble() * 1e-4;
            Tolerance tolerance = new Tolerance(below, above);
            String text = QuantityWriter.write(tolerance);
            assertThat(meaning(QuantityReader.tolerance(text))).as(text).isEqualTo(tolerance);
            Toleranced value = new Toleranced(everyday(), new Tolerance(below, Math.min(above, 1e9)));
            String whole = QuantityWriter.write(value, Dimension.VOLTAGE);
            assertThat(meaning(QuantityReader.toleranced(whole, Dimension.VOLTAGE))).as(whole).isEqualTo(value);
        }
        assertThat(meaning(QuantityReader.tolerance("±0 %"))).isEqualTo(Tolerance.NONE);
    }

    @Test
    void largerValuesNeverGetASmallerPrefix() {
        for (int i = 0; i < 8_000; i++) {
            double one = Math.pow(10, random.nextDouble(-15, 15));
            double two = Math.pow(10, random.nextDouble(-15, 15));
            assertThat(prefixOf(Math.min(one, two))).isLessThanOrEqualTo(prefixOf(Math.max(one, two)));
        }
    }

    private static int prefixOf(double value) {
        String text = QuantityWriter.write(value, Dimension.VOLTAGE);
        String unit = text.substring(text.indexOf(' ') + 1);
        double number = Double.parseDouble(text.substring(0, text.indexOf(' ')));
        assertThat(number).as(text).isBetween(1.0, Math.nextDown(1000.0));
        return List.of("fV", "pV", "nV", "µV", "mV", "V", "kV", "MV", "GV", "TV").indexOf(unit);
    }

    private double value(boolean wild) {
        return wild ? anyBits() : everyday();
    }

    /** Every bit pattern alike, which covers subnormals and both ends of the exponent. */
    private double anyBits() {
        double value = Double.longBitsToDouble(random.nextLong());
        if (random.nextInt(20) == 0) {
            value = Double.longBitsToDouble(random.nextLong() & 0x800FFFFFFFFFFFFFL);
        }
        return Double.isFinite(value) ? value : Double.MIN_VALUE;
    }

    /** Magnitudes a board deals in, some with few digits and some with all. */
    private double everyday() {
        double value = Math.pow(10, random.nextDouble(-12, 9)) * (random.nextBoolean() ? 1 : -1);
        return random.nextBoolean() ? value : Math.round(value * 1e6) / 1e6 + 0.0;
    }
}
