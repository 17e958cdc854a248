package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

import shuntwright.board.AlertLine;
import shuntwright.fixture.IdealParts;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.quantity.Range;

/** Limits of pull-up resistors against published examples. */
class PullUpLimitsTest {

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/plan/pull-ups.csv", delimiter = ';', useHeadersInDisplayName = true)
    void leastAndMostAreThePublished(double volts, double low, double sink, int outputs, double leakage,
            double inputHigh, double inputLeakage, double capacitance, double rise, double least,
            @Nullable Double most, double tolerance) {
        AlertLine line = new AlertLine("alert", Optional.empty(), OptionalDouble.empty(),
                OptionalDouble.of(inputHigh), OptionalDouble.empty(), inputLeakage, capacitance,
                rise > 0 ? OptionalDouble.of(rise) : OptionalDouble.empty());
        OpenDrainOutput output = new OpenDrainOutput(Range.exactly(low), sink, leakage, 40);
        AlertPlan plan = AlertJudge.judge(line, IdealParts.exactly(volts), OptionalDouble.empty(), List.of(),
                Collections.nCopies(outputs, output));
        assertThat(plan.least()).isCloseTo(least, within(tolerance));
        if (most == null) {
            assertThat(plan.most()).isGreaterThanOrEqualTo(1e9);
        } else {
            assertThat(plan.most()).isCloseTo(most, within(tolerance));
        }
        assertThat(plan.allowed().isPresent()).isEqualTo(plan.least() <= plan.most());
        plan.allowed().ifPresent(allowed -> assertThat(allowed.contains(plan.pullUp())).isTrue());
        assertThat(plan.current()).isCloseTo(volts / plan.pullUp(), within(1e-15));
    }

    @Test
    void riseFactorIsThatOfThirtyToSeventyPercent() {
        assertThat(AlertJudge.RISE_FACTOR).isCloseTo(1.2039729 - 0.3566749, within(1e-6));
    }
}
