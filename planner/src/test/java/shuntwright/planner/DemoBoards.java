package shuntwright.planner;

import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.io.json.FileReading;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;

/** The demo boards with their parts. */
public final class DemoBoards {
    /** Channels that are kept; more take longer and show no more. */
    private static final int CHANNELS = 3;

    private DemoBoards() {
    }

    /** A board and what it is chosen from. */
    public record Demo(Board board, Catalogue catalogue) {}

    /** The first channels of the smallest. */
    public static Demo camp() {
        Path file = Path.of(System.getProperty("shuntwright.root", "."), "demo-boards", "camp-lantern.board.json");
        return switch (Workplace.open(file, List.of())) {
            case FileReading.Opened<Workplace>(Workplace opened) -> new Demo(
                    opened.board().withChannels(opened.board().channels().subList(0, CHANNELS)), opened.catalogue());
            case FileReading.Refused<Workplace>(var problems) -> throw new IllegalStateException(problems.toString());
        };
    }
}
