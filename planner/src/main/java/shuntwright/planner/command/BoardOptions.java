package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;

import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Which board, with which parts. */
final class BoardOptions {

    @Parameters(index = "0", paramLabel = "BOARD", description = "Board file (.board.json).")
    private Path board = Path.of("");

    @Option(names = "--parts", paramLabel = "FILE", arity = "1..*", description = "Parts files to use besides those the board names; put BOARD before this option.")
    private List<Path> parts = List.of();

    Path board() {
        return board;
    }

    List<Path> parts() {
        return parts;
    }
}
