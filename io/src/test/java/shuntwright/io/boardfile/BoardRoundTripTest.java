package shuntwright.io.boardfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
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

import shuntwright.board.Board;
import shuntwright.board.Calibration;
import shuntwright.board.Sampling;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Uncertainty;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

class BoardRoundTripTest {
    static String fixture() throws IOException {
        try (InputStream in = BoardRoundTripTest.class.getResourceAsStream("format-1.board.json")) {
            return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private static Board read(String text) {
        assertThat(BoardFiles.parse("board", text).problems()).isEmpty();
        return BoardFiles.parse("board", text).ifOpened().orElseThrow();
    }

    @Test
    void theStoredFileOfFormat1IsReadAndWrittenBackTheSame() throws IOException {
        Board board = read(fixture());

        String written = BoardFiles.write(board);

        assertThat(read(written)).isEqualTo(board);
        assertThat(BoardFiles.write(read(written))).isEqualTo(written);
        assertThat(board.channels().getFirst().currents().tripTarget()).hasValue(14);
        assertThat(board.ambient().max()).isEqualTo(55);
        assertThat(board.zones().getFirst().thermalResistance()).hasValue(12);
        assertThat(board.uncertainty().sampling()).isEqualTo(
                new Sampling(new Sampling.Trials.Adaptive(1, 2_000_000), 7));
        assertThat(board.uncertainty().stated()).extracting(StatedDistribution::distribution).containsExactly(
                new Distribution.Normal(3), new Distribution.Triangular(), new Distribution.Trapezoid(0.4),
                new Distribution.ArcSine(), new Distribution.StudentT(9, 2.5), new Distribution.Uniform());
        assertThat(board.channels().getFirst().reading().calibration()).contains(
                new Calibration(Calibration.Points.TWO, OptionalDouble.of(0.8), OptionalDouble.of(7.5), 1e-3,
                        Range.of(18, 28)));
        assertThat(board.channels().get(1).reading().calibration()).contains(
                new Calibration(Calibration.Points.ONE, OptionalDouble.empty(), OptionalDouble.empty(), 2e-3,
                        Range.of(20, 30)));
    }

    @Test
    void theStoredFileUsesEveryKey() throws IOException {
        String text = fixture();
        Set<String> unused = new TreeSet<>();
        for (Form<?> form : BoardFiles.forms()) {
            for (Key<?> key : form.keys()) {
                if (!text.contains("\"" + key.name() + "\"")) {
                    unused.add(key.name());
                }
            }
        }

        assertThat(unused).isEmpty();
    }

    @Test
    void defaultsAreNotWritten() {
        assertThat(BoardFiles.write(Board.named("Bare"))).isEqualTo("""
                {
                  "format": "shuntwright board 1",
                  "name": "Bare"
                }
                """);
    }

    @Test
    void adaptiveTrialsHaveDefaultsOfTheirOwn() {
        Board board = read("{\"format\": \"shuntwright board 1\", \"name\": \"x\", \"uncertainty\": "
                + "{\"trials\": \"adaptive\"}}");

        assertThat(board.uncertainty()).isEqualTo(new Uncertainty(List.of(),
                new Sampling(new Sampling.Trials.Adaptive(2, 10_000_000), 1)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-1", "9223372036854775807", "-9223372036854775808", "1e3", "9007199254740993"})
    void aSeedIsAnyWholeNumber(String seed) {
        Board board = read("{\"format\": \"shuntwright board 1\", \"name\": \"x\", \"uncertainty\": {\"seed\": " + seed
                + "}}");

        assertThat(board.uncertainty().sampling().seed()).isEqualTo(new BigDecimal(seed).longValueExact());
        assertThat(read(BoardFiles.write(board))).isEqualTo(board);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void randomBoardsComeBackEqualAndWithTheSameBytes(long seed) {
        RandomGenerator random = new SplittableRandom(seed);
        for (int i = 0; i < 20; i++) {
            Board board = new RandomBoards(random).board();

            String written = BoardFiles.write(board);

            assertThat(read(written)).isEqualTo(board);
            assertThat(BoardFiles.write(read(written))).isEqualTo(written);
            assertThat(BoardFiles.objections(board)).isEmpty();
        }
    }
}
