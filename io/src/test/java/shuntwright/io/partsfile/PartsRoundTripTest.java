package shuntwright.io.partsfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.random.RandomGenerator;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.InputErrors;
import shuntwright.parts.Part;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.parts.Terminals;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

class PartsRoundTripTest {
    static String fixture() throws IOException {
        try (InputStream in = PartsRoundTripTest.class.getResourceAsStream("format-1.parts.json")) {
            return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private static PartsFile read(String text) {
        assertThat(PartsFiles.parse("parts", text).problems()).isEmpty();
        return PartsFiles.parse("parts", text).ifOpened().orElseThrow();
    }

    @Test
    void theStoredFileOfFormat1IsReadAndWrittenBackTheSame() throws IOException {
        PartsFile parts = read(fixture());

        String written = PartsFiles.write(parts);

        assertThat(read(written)).isEqualTo(parts);
        assertThat(PartsFiles.write(read(written))).isEqualTo(written);
        assertThat(PartsFile.of(parts.currency(), parts.note(), parts.parts())).isEqualTo(parts);
        assertThat(parts.shunts().getFirst().resistance()).isEqualTo(0.004);
        assertThat(parts.shunts().getFirst().correlation()).isEqualTo(0.25);
        assertThat(parts.shunts().getLast().correlation()).isZero();
        assertThat(parts.amplifiers().getFirst().gainAgeing()).isEqualTo(5e-4);
        assertThat(parts.shunts().getFirst().purchase().unitPriceAt(100)).isEqualTo(0.31);
    }

    @Test
    void theStoredFileUsesEveryKey() throws IOException {
        String text = fixture();
        Set<String> unused = new TreeSet<>();
        for (Form<?> form : PartsFiles.forms()) {
            for (Key<?> key : form.keys()) {
                if (!text.contains("\"" + key.name() + "\"")) {
                    unused.add(key.name());
                }
            }
        }

        assertThat(unused).isEmpty();
    }

    @Test
    void aShuntWithoutThermalResistanceGetsThatOfItsDeratingLine() throws IOException {
        // 3 W at 70 °C, nothing at 170 °C: 100 K / 3 W.
        assertThat(read(fixture()).shunts().getLast().rating().thermalResistance()).isEqualTo(100.0 / 3.0);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void randomPartsComeBackEqualAndWithTheSameBytes(long seed) {
        RandomGenerator random = new SplittableRandom(seed);
        for (int i = 0; i < 20; i++) {
            List<Part> all = List.of(shunt(random, "A" + i), amplifier(random, "B" + i));
            PartsFile parts = PartsFile.of("USD", "", all);

            String written = PartsFiles.write(parts);

            assertThat(read(written)).isEqualTo(parts);
            assertThat(PartsFiles.write(read(written))).isEqualTo(written);
        }
    }

    /** A share, or none. */
    private static double maybe(RandomGenerator random) {
        return random.nextBoolean() ? 0 : random.nextDouble();
    }

    private static Shunt shunt(RandomGenerator random, String number) {
        boolean two = random.nextBoolean();
        double mounting = random.nextDouble(0, 1e-4);
        return new Shunt(number, "", random.nextDouble(1e-4, 1),
                new Tolerance(random.nextDouble(), random.nextDouble()),
                random.nextDouble(0, 1e-3), random.nextDouble(), maybe(random), two ? Terminals.TWO : Terminals.FOUR,
                two ? Range.of(mounting, 2 * mounting) : Range.exactly(0), random.nextDouble(0, 1e-5),
                new ShuntRating(random.nextDouble(0.1, 5), random.nextDouble(20, 100), random.nextDouble(110, 300),
                        random.nextDouble(0, 100), OptionalDouble.of(random.nextDouble(0.01, 10))),
                new Purchase("b", List.of(new PriceBreak(1, random.nextDouble()), new PriceBreak(7, 0.1)),
                        random.nextInt(1, 9), random.nextInt(1, 9), "", ""));
    }

    private static SenseAmplifier amplifier(RandomGenerator random, String number) {
        double differential = random.nextDouble(0.01, 1);
        return new SenseAmplifier(number, "", random.nextDouble(1, 500), random.nextDouble(),
                random.nextDouble(0, 1e-3),
                maybe(random),
                new InputErrors(random.nextDouble(0, 1e-3), random.nextDouble(0, 1e-5), random.nextDouble(40, 140),
                        random.nextDouble(-1, 50), random.nextDouble(40, 140), random.nextDouble(1, 6),
                        random.nextDouble(0, 1e-4)),
                new AmplifierRanges(Range.of(random.nextDouble(-16, 0), random.nextDouble(1, 80)), differential,
                        differential * random.nextDouble(1, 9), Range.of(random.nextDouble(1, 3), 5.5),
                        random.nextDouble(), random.nextDouble()),
                random.nextDouble(1e3, 1e7), random.nextDouble(1e4, 1e8), random.nextDouble(0, 1e-2), 2,
                new Purchase("", List.of(), 1, 1, "", ""));
    }
}
