package shuntwright.parts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Derated power against the convention of IEC 60115-1. */
class DeratingTest {

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/parts/derating.csv", delimiter = ';', useHeadersInDisplayName = true)
    void allowedPower(double power, double rated, double maximum, double ambient, double allowed) {
        ShuntRating rating = new ShuntRating(power, rated, maximum, 0, OptionalDouble.empty());
        assertThat(rating.powerAt(ambient)).isCloseTo(allowed, within(5e-7));
    }
}
