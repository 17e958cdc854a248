package shuntwright.planner.window.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.stream.DoubleStream;

import org.junit.jupiter.api.Test;

class ScaleTest {
    private static List<String> texts(Scale scale, int most) {
        return scale.ticks(most).stream().map(Scale.Tick::text).toList();
    }

    @Test
    void numbersAreRoundAndHaveTheSameDecimals() {
        Scale watts = new Scale(Unit.of("Heat", "W", 4), 1.9, 4.1, false);
        assertThat(texts(watts, 6)).containsExactly("2.0", "2.5", "3.0", "3.5", "4.0");
        assertThat(texts(new Scale(Unit.money("Cost", "EUR"), 980, 12_400, false), 5)).containsExactly("5,000",
                "10,000");
        assertThat(texts(new Scale(Unit.of("Share", "x", 5), -0.02, 0.02, false), 3)).containsExactly("−0.02", "0.00",
                "0.02");
    }

    @Test
    void countsHaveNoFractions() {
        Scale parts = Scale.around(Unit.count("Parts"), DoubleStream.of(14, 14), false);
        assertThat(texts(parts, 9)).containsExactly("13", "14", "15");
    }

    @Test
    void smallQuantitiesHaveAPrefix() {
        Unit milli = Unit.of("Current", "A", 0.08);
        assertThat(milli.words()).isEqualTo("Current, mA");
        Scale scale = Scale.around(milli, DoubleStream.of(0.02, 0.08), false);
        assertThat(texts(scale, 4)).containsExactly("20", "40", "60", "80");
        assertThat(scale.place(0.05)).isCloseTo(0.5, within(1e-9));
    }

    @Test
    void equalRatiosAreEquallyWideOnALogarithmicScale() {
        Scale boards = Scale.around(Unit.count("Boards"), DoubleStream.of(1, 10, 100), true);
        assertThat(boards.place(10) - boards.place(1)).isCloseTo(boards.place(100) - boards.place(10), within(1e-12));
        assertThat(texts(boards, 9)).containsExactly("1", "2", "5", "10", "20", "50", "100");
        assertThat(texts(boards, 6)).containsExactly("1", "3", "10", "30", "100");
        assertThat(texts(boards, 4)).as("powers alone where there is little room").containsExactly("1", "10", "100");
    }

    /** Whatever the values are, all stand on the scale, and there are neither none nor too many numbers. */
    @Test
    void everyValueStandsOnTheScale() {
        Random random = new Random(4);
        for (int round = 0; round < 2000; round++) {
            double about = Math.pow(10, random.nextInt(8) - 3);
            double[] values = random.doubles(1 + random.nextInt(5), 0, about).toArray();
            Scale scale = Scale.around(round % 2 == 0 ? Unit.count("n") : Unit.of("n", "W", about),
                    DoubleStream.of(values), random.nextBoolean());
            for (double each : values) {
                assertThat(scale.place(each)).isBetween(0.0, 1.0);
            }
            assertThat(scale.ticks(6)).hasSizeLessThanOrEqualTo(7).allSatisfy(
                    tick -> assertThat(tick.at()).isBetween(-1e-9, 1 + 1e-9));
            if (!scale.logarithmic()) {
                assertThat(scale.ticks(6)).isNotEmpty();
            }
        }
    }
}
