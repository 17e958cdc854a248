package shuntwright.bench;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;

import org.jspecify.annotations.Nullable;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

import shuntwright.board.Board;
import shuntwright.io.json.FileReading;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;

/** A demo board with its parts, found from the root folder. */
@State(Scope.Benchmark)
public class DemoBoard {
    /** Name of the board's file. */
    @Param({"sledge-wren", "tractor-plover", "camp-lantern"})
    public String name = "";

    private @Nullable Workplace opened;

    @Setup
    public void open() {
        Path file = Path.of("demo-boards", name + ".board.json");
        opened = switch (Workplace.open(file, List.of())) {
            case FileReading.Opened<Workplace>(Workplace value) -> value;
            case FileReading.Refused<Workplace> refused -> throw new IllegalStateException(refused.text());
        };
    }

    Board board() {
        return Objects.requireNonNull(opened).board();
    }

    Catalogue catalogue() {
        return Objects.requireNonNull(opened).catalogue();
    }

    /** Combinations of parts for all channels. */
    long candidates() {
        return Candidates.count(board(), catalogue());
    }
}
