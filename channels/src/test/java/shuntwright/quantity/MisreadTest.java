package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static shuntwright.quantity.Readings.problem;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class MisreadTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            5 A        | VOLTAGE                | '5 A' is a current, but a voltage is asked for here. Write it in V
            5 mV       | CURRENT                | '5 mV' is a voltage, but a current is asked for here. Write it in A
            5 J        | CHARGE_HEAT            | is an energy, but an I²t value is asked for
            20 °C      | TEMPERATURE_DIFFERENCE | is a temperature, but a temperature difference is asked for
            20 K       | TEMPERATURE            | is a temperature difference, but a temperature is asked for
            20 K       | CURRENT                | is a temperature difference, but a current is asked for
            4 R        | TIME                   | is a resistance, but a time is asked for
            25 ppm     | TEMPERATURE_COEFFICIENT| is a ratio, but a temperature coefficient is asked for
            20 dB      | GAIN                   | is a rejection, but a gain is asked for
            1 V/s      | VOLTAGE                | is a slew rate, but a voltage is asked for
            5 %        | MONEY                  | is a ratio, but a price is asked for here. Write a plain number
            3,3 V      | VOLTAGE                | write '3.3 V' with a point; a comma is not taken because
            1,000 A    | CURRENT                | write '1.000 A' with a point or '1000 A' for thousands; a comma is not taken because
            1,000.5    | CURRENT                | write the digits without separators and with one point; a comma is not taken because
            1 000 A    | CURRENT                | without thousands separators
            1'000 A    | CURRENT                | without thousands separators
            1_000 A    | CURRENT                | without thousands separators
            1.000.000  | CURRENT                | more than one decimal point
            NaN        | CURRENT                | is not a finite number
            -Infinity  | CURRENT                | is not a finite number
            inf A      | CURRENT                | is not a finite number
            ∞          | CURRENT                | is not a finite number
            1e400      | CURRENT                | too large. Allowed are magnitudes up to 1.7e308
            1e-400     | CURRENT                | too small. Allowed are 0 and magnitudes from 4.9e-324
            1e99999999999 | CURRENT             | exponent outside ±9999
            A          | CURRENT                | does not begin with a number. Write a current such as 35 A
            five       | CURRENT                | does not begin with a number
            ٣٫٣        | VOLTAGE                | does not begin with a number
            5 Q        | CURRENT                | 'Q' is not a unit of a current. Write it in A
            100 khz    | FREQUENCY              | Maybe kHz was meant: capitals and small letters differ.
            5 mv       | VOLTAGE                | Maybe mV or MV was meant
            3 kA²s     | CHARGE_HEAT            | a prefix before A²s may mean the ampere or the whole
            3 .. 5 A   | CURRENT                | has 2 values, but at most 1 value is asked for
            3-5 A      | CURRENT                | is more than one value
            3 A ±2 %   | CURRENT                | is more than one value
            4RR7       | RESISTANCE             | is not a resistance code
            R          | RESISTANCE             | is not a resistance code
            4K7K       | RESISTANCE             | is not a resistance code
            4m7        | RESISTANCE             | Write 4.7 mΩ for milliohm or 4.7 MΩ for megohm
            m5         | RESISTANCE             | Write 0.5 mΩ for milliohm or 0.5 MΩ for megohm
            """)
    void saysWhatIsWrongAndWhatToDo(String text, Dimension dimension, String phrase) {
        assertThat(problem(QuantityReader.number(text, dimension))).contains(phrase);
    }

    @ParameterizedTest
    @EnumSource
    void asksForSomethingWhereNothingIsWritten(Dimension dimension) {
        assertThat(problem(QuantityReader.number("  ", dimension)))
                .isEqualTo(problem(QuantityReader.range("", dimension)))
                .isEqualTo(problem(QuantityReader.spread("\t", dimension)))
                .isEqualTo(problem(QuantityReader.toleranced("\n", dimension)))
                .startsWith("Nothing is written here. Write ").contains(dimension.word(), Units.example(dimension));
        assertThat(problem(QuantityReader.tolerance(""))).startsWith("Nothing is written here. Write it as ±0.5 %");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            60 .. 20 A       | does not ascend. Write the least value first
            3 .. A           | does not begin with a number
            3 ..             | lacks an end of the range
            .. 3 A           | lacks an end of the range
            1 .. 2 .. 3 A    | has 3 values, but at most 2 values are asked for
            4 mA .. 10       | has no unit at its last value
            1 V .. 5 A       | is a voltage, but a current is asked for
            0...5            | Write a range with spaces around two points, 0 .. 5 or 0 .. 0.5.
            3-5 A            | A range is written 3 .. 5.
            """)
    void refusesRanges(String text, String phrase) {
        assertThat(problem(QuantityReader.range(text, Dimension.CURRENT))).contains(phrase);
    }

    @Test
    void doesNotGuessWhetherACodeLetterHoldsForBothEnds() {
        assertThat(problem(QuantityReader.range("10 .. 33K2", Dimension.RESISTANCE)))
                .contains("does not say whether the letter of the last value holds for the others");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -0.5 %      | is negative, but a tolerance is 0 or more
            ±-1 %       | is negative
            100 %       | reaches 100 % below the nominal value; less than 100 % is allowed
            5           | reaches 500 % below the nominal value; less than 100 % is allowed. A bare number is a fraction
            +1/-100 %   | less than 100 % is allowed
            +1 %        | gives one side of the tolerance only
            +1/+3 %     | gives the same side of the tolerance twice
            +1 % / -3   | has no unit at its second value
            ±           | has no number. Write it as ±0.5 %
            ±50 mV      | is a voltage, but a ratio is asked for
            0,5 %       | a comma is not taken because
            ±NaN %      | is not a finite number
            +1/-3 km    | 'km' is not a unit of a ratio
            """)
    void refusesTolerances(String text, String phrase) {
        assertThat(problem(QuantityReader.tolerance(text))).contains(phrase);
        if (!Character.isDigit(text.charAt(0))) {
            assertThat(QuantityReader.toleranced("3.3 V " + text, Dimension.VOLTAGE).ifValue()).isEmpty();
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"1.7e308 V ±50 %", "-1.7e308 V +1/-50 %"})
    void refusesToleratedValuesBeyondDoubles(String text) {
        assertThat(problem(QuantityReader.toleranced(text, Dimension.VOLTAGE))).contains("too large");
        assertThat(problem(QuantityReader.range(text, Dimension.VOLTAGE))).contains("too large");
        assertThat(problem(QuantityReader.spread(text, Dimension.VOLTAGE))).contains("too large");
    }

    @Test
    void quotesLongTextsInPart() {
        String problem = Readings.problem(QuantityReader.number("1".repeat(5000), Dimension.CURRENT));
        assertThat(problem).contains("is too long").hasSizeLessThan(200);
    }

    @Test
    void answersWithASentenceWhateverIsTyped() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(7);
        String alphabet = "0123456789.,+-±/%eEmkKMRGLµuΩAVWs²°C to…∞\u2212'";
        List<Dimension> dimensions = List.of(Dimension.values());
        for (int i = 0; i < 50_000; i++) {
            StringBuilder text = new StringBuilder();
            for (int k = random.nextInt(9); k >= 0; k--) {
                text.append(alphabet.charAt(random.nextInt(alphabet.length())));
            }
            Dimension dimension = dimensions.get(random.nextInt(dimensions.size()));
            check(QuantityReader.number(text.toString(), dimension));
            check(QuantityReader.range(text.toString(), dimension));
            check(QuantityReader.spread(text.toString(), dimension));
            check(QuantityReader.toleranced(text.toString(), dimension));
            check(QuantityReader.tolerance(text.toString()));
        }
    }

    private static void check(Reading<?> reading) {
        reading.ifProblem().ifPresent(problem -> assertThat(problem).hasSizeGreaterThan(20).endsWith("."));
    }
}
