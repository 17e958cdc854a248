package shuntwright.io.boardfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Objects;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.random.RandomGenerator;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Board;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;

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
