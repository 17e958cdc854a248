package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityRecordsTest {

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refuseWhatIsNotFinite(double bad) {
        assertThatIllegalArgumentException().isThrownBy(() -> new Range(bad, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> new Range(1, bad));
        assertThatIllegalArgumentException().isThrownBy(() -> Range.exactly(bad));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tolerance(bad, 0.1));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tolerance(0.1, bad));
        assertThatIllegalArgumentException().isThrownBy(() -> Tolerance.symmetric(bad));
        assertThatIllegalArgumentException().isThrownBy(() -> new Toleranced(bad, Tolerance.NONE));
        assertThatIllegalArgumentException().isThrownBy(() -> new Spread(bad, 1, 2));
        assertThatIllegalArgumentException().isThrownBy(() -> new Spread(1, bad, 2));
        assertThatIllegalArgumentException().isThrownBy(() -> new Spread(1, 2, bad));
        assertThatIllegalArgumentException().isThrownBy(() -> Spread.exactly(bad));
    }

    @Test
    void refuseWrongOrderAndSize() {
        assertThatIllegalArgumentException().isThrownBy(() -> Range.of(2, 1)).withMessageContaining("2.0 .. 1.0");
        assertThatIllegalArgumentException().isThrownBy(() -> new Spread(1, 3, 2));
        assertThatIllegalArgumentException().isThrownBy(() -> new Spread(2, 1, 3));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tolerance(-0.1, 0.1));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tolerance(0.1, -0.1));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tolerance(1, 0.1));
        assertThat(new Tolerance(0.2, 5).widest()).isEqualTo(5);
    }

    @Test
    void rangeKnowsItsMiddleAndWhatItHolds() {
        assertThat(Range.of(10, 14).mid()).isEqualTo(12);
        assertThat(Range.of(-Double.MAX_VALUE, Double.MAX_VALUE).mid()).isZero();
        assertThat(Range.of(-20, 60).width()).isEqualTo(80);
        assertThat(Range.of(1, 2).contains(2)).isTrue();
        assertThat(Range.of(1, 2).contains(Math.nextUp(2.0))).isFalse();
        assertThat(Range.of(1, 2).contains(Double.NaN)).isFalse();
        assertThat(Range.of(1, 3).contains(Range.of(1, 3))).isTrue();
        assertThat(Range.of(1, 3).contains(Range.of(0, 3))).isFalse();
    }

    @Test
    void toleranceOfANegativeValueOpensOutwards() {
        Toleranced value = new Toleranced(-10, new Tolerance(0.1, 0.2));
        assertThat(value.min()).isCloseTo(-11, within(1e-12));
        assertThat(value.max()).isCloseTo(-8, within(1e-12));
    }

    @Test
    void zeroTolerancesAreEqualWhateverTheSignOfZero() {
        assertThat(new Tolerance(-0.0, 0)).isEqualTo(Tolerance.NONE);
        assertThat(Tolerance.NONE.isSymmetric()).isTrue();
    }

    @Test
    void readingsChain() {
        Reading<Integer> four = Reading.value(4);
        assertThat(four.then(n -> Reading.value(n + 1)).ifValue()).contains(5);
        assertThat(four.then(_ -> Reading.misread("no")).ifProblem()).contains("no");
        assertThat(Reading.<Integer>misread("bad").then(n -> Reading.value(n + 1)).ifProblem()).contains("bad");
    }
}
