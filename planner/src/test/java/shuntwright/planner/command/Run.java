package shuntwright.planner.command;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;
import java.util.stream.Stream;

/**
 * A command that was run.
 *
 * @param code exit code
 * @param out  standard output
 * @param err  standard error
 */
record Run(int code, String out, String err) {
    /** The checkout. */
    static final Path ROOT = Path.of(System.getProperty("shuntwright.root"));

    static final Path WREN = ROOT.resolve("demo-boards").resolve("sledge-wren.board.json");

    static Run of(Object... args) {
        return with(Solver.OWN, args);
    }

    /** With other answers to questions about whole boards than the program's own. */
    static Run with(Supplier<Solver> solvers, Object... args) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Commands.run(Stream.of(args).map(Object::toString).toArray(String[]::new),
                Terminal.piped(new PrintStream(out, true, StandardCharsets.UTF_8),
                        new PrintStream(err, true, StandardCharsets.UTF_8)),
                solvers);
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    List<String> errors() {
        return err.lines().toList();
    }
}
