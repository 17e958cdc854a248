package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Opens the window. */
@Command(name = "window", description = "Opens the window, with a board if one is named.")
final class WindowCommand implements Callable<Integer> {

    @Parameters(index = "0", arity = "0..1", paramLabel = "BOARD", description = "Board file (.board.json).")
    private Optional<Path> board = Optional.empty();

    @Option(names = "--parts", paramLabel = "FILE", arity = "1..*", description = "Parts files to use besides those the board names; put BOARD before this option.")
    private List<Path> parts = List.of();

    @Override
    public Integer call() {
        Optional<String> reason = WindowStarter.open(board, parts);
        if (reason.isPresent()) {
            throw new BadInput(reason.get());
        }
        return ExitCode.ACCEPTED.number();
    }
}
