package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static shuntwright.quantity.Readings.meaning;
import static shuntwright.quantity.Readings.problem;

import java.util.Locale;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberReadingTest {

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/typed-numbers.csv", delimiter = '|', useHeadersInDisplayName = true)
    void readsWhatEngineersType(String text, Dimension dimension, double expected) {
        assertThat(meaning(QuantityReader.number(text, dimension))).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/letter-codes.csv", delimiter = ';', useHeadersInDisplayName = true)
    void readsPublishedLetterCodes(String code, double ohm) {
        assertThat(meaning(QuantityReader.number(code, Dimension.RESISTANCE))).isEqualTo(ohm);
    }

    @ParameterizedTest
    @ValueSource(strings = {"ar-EG-u-nu-arab", "de-DE", "tr-TR", "hi-IN-u-nu-deva", "sv-SE", "en-US"})
    void readsAndWritesAlikeUnderEveryLocale(String tag) {
        Locale before = Locale.getDefault();
        Locale.setDefault(Locale.forLanguageTag(tag));
        try {
            assertThat(meaning(QuantityReader.number("3.3 MHz", Dimension.FREQUENCY))).isEqualTo(3.3e6);
            assertThat(meaning(QuantityReader.number("1e-3", Dimension.VOLTAGE))).isEqualTo(0.001);
            assertThat(meaning(QuantityReader.number("4 mohm", Dimension.RESISTANCE))).isEqualTo(0.004);
            assertThat(problem(QuantityReader.number("INFINITY", Dimension.POWER))).contains("not a finite");
            assertThat(QuantityWriter.write(-33200.5, Dimension.RESISTANCE)).isEqualTo("-33.2005 kΩ");
            assertThat(QuantityWriter.show(1234567.8, Dimension.MONEY, 9)).isEqualTo("1234567.8");
            assertThat(QuantityWriter.letterCode(47300)).isEqualTo("47K3");
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void keepsTheSignOfZero() {
        assertThat(Double.doubleToRawLongBits(meaning(QuantityReader.number("-0 A", Dimension.CURRENT))))
                .isEqualTo(Double.doubleToRawLongBits(-0.0));
        assertThat(Double.doubleToRawLongBits(meaning(QuantityReader.number("0 A", Dimension.CURRENT)))).isZero();
    }

    @Test
    void takesEverySiUnitItNamesItself() {
        for (Dimension dimension : Dimension.values()) {
            String text = "7 " + (dimension == Dimension.RATIO ? "" : dimension.unit());
            assertThat(meaning(QuantityReader.number(text, dimension))).as(text).isEqualTo(7.0);
        }
    }

    @Test
    void readsItsOwnExamples() {
        for (Dimension dimension : Dimension.values()) {
            String example = Units.example(dimension);
            assertThat(QuantityWriter.write(meaning(QuantityReader.number(example, dimension)), dimension))
                    .as(dimension.word()).isIn(example, "100 nV/K", "500 mW");
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"4M", "4 MΩ", "4M00", "4M0", "4 Mohm"})
    void refusesMegohmForAShuntAndNamesTheLikelyMeaning(String text) {
        assertThat(problem(QuantityReader.shuntResistance(text)))
                .isEqualTo("4 MΩ is not plausible for a shunt (allowed 1 µΩ to 10 Ω); M is mega. "
                        + "Maybe 4 mΩ was meant: write 4m, 4 mΩ or R004.");
    }

    @ParameterizedTest
    @CsvSource({"M500, 500 kΩ, M is mega. Maybe 0.5 mΩ was meant: write 0.5m", "50, 50 Ω, 'write 50m, 50 mΩ or R05.'",
            "33K2, 33.2 kΩ, for example 4 mΩ or R004", "0, 0 Ω, for example 4 mΩ", "-4m, -4 mΩ, allowed 1 µΩ to 10 Ω"})
    void refusesImplausibleShunts(String text, String what, String advice) {
        assertThat(problem(QuantityReader.shuntResistance(text)))
                .startsWith(what + " is not plausible for a shunt").contains(advice);
    }

    @ParameterizedTest
    @CsvSource({"4m, 0.004", "R004, 0.004", "4L0, 0.004", "1 µΩ, 1e-6", "10R, 10", "250u, 250e-6"})
    void readsPlausibleShunts(String text, double ohm) {
        assertThat(meaning(QuantityReader.shuntResistance(text))).isEqualTo(ohm);
    }
}
