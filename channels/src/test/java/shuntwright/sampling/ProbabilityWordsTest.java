package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

import shuntwright.quantity.Range;

class ProbabilityWordsTest {

    private static final Pattern BOTH = Pattern.compile("(\\S+) \\(95 %: (\\S+) to (\\S+)\\)");

    @Test
    void nothingCountedIsABoundAndNeverZero() {
        assertThat(words(0, 0, 3.6889e-6)).isEqualTo("below 3.7e-6 (95 %)");
        assertThat(words(0, 0, 3.61e-6)).as("rounded upwards").isEqualTo("below 3.7e-6 (95 %)");
        assertThat(words(0, 0, 0.0301)).isEqualTo("below 0.031 (95 %)");
        assertThat(words(1, 1 - 3.6889e-6, 1)).isEqualTo("above 1 - 3.7e-6 (95 %)");
    }

    @Test
    void anEstimateHasItsIntervalBesideIt() {
        assertThat(words(0.012345, 0.01208, 0.01252)).isEqualTo("0.0123 (95 %: 0.012 to 0.0126)");
        assertThat(words(2.5e-8, 2.31e-8, 2.7e-8)).isEqualTo("2.5e-8 (95 %: 2.3e-8 to 2.71e-8)");
    }

    @Test
    void nearOneTheDistanceFromOneKeepsItsDigits() {
        assertThat(words(0.97123, 0.97087, 0.97153)).isEqualTo("0.9712 (95 %: 0.9708 to 0.9716)");
        assertThat(words(1 - 2.5e-7, 1 - 5e-7, 1)).startsWith("0.99999975 (95 %: 0.9999995").endsWith(" to 1)");
    }

    @RepeatedTest(200)
    void whatIsReadIsWithinAHundredthAndTheIntervalNotNarrower(RepetitionInfo run) {
        Random random = new Random(run.getCurrentRepetition());
        double estimate = Math.pow(10, -10 * random.nextDouble());
        if (random.nextBoolean()) {
            estimate = 1 - estimate;
        }
        double low = estimate * random.nextDouble();
        double high = estimate + (1 - estimate) * random.nextDouble();
        Matcher words = BOTH.matcher(words(estimate, low, high));
        assertThat(words.matches()).isTrue();
        double rest = Math.min(estimate, 1 - estimate);
        assertThat(Math.abs(number(words.group(1)) - estimate)).isLessThanOrEqualTo(0.01 * rest);
        assertThat(number(words.group(2))).isLessThanOrEqualTo(low);
        assertThat(number(words.group(3))).isGreaterThanOrEqualTo(high);
    }

    private static double number(String text) {
        return new BigDecimal(text).doubleValue();
    }

    private static String words(double estimate, double low, double high) {
        return ProbabilityWords.of(new Probability(estimate, Range.of(low, high), 0, Probability.Method.COUNTED, 1000));
    }
}
