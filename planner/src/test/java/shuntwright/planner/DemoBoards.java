package shuntwright.planner;

import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.io.json.FileReading;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;

/** The demo boards with their parts. */
public final class DemoBoards {
    /** Rounds of the search; what is tested does not need the best choice. */
    private static final int FEW = 2;

    private DemoBoards() {
    }

    /** A board and what it is chosen from. */
    public record Demo(Board board, Catalogue catalogue) {}

    /** The smallest, looked at briefly. */
    public static Demo camp() {
        Path file = Path.of(System.getProperty("shuntwright.root", "."), "demo-boards", "camp-lantern.board.json");
        return switch (Workplace.open(file, List.of())) {
            case FileReading.Opened<Workplace>(Workplace opened) -> new Demo(
                    opened.board().withPreference(opened.board().preference().withRounds(FEW)), opened.catalogue());
            case FileReading.Refused<Workplace>(var problems) -> throw new IllegalStateException(problems.toString());
        };
    }
}
