package shuntwright.planner.command;

import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** The demo board that comes with the program, for a first look. */
final class Demo {
    private static final Path BOARD = Path.of("demo-boards", "sledge-wren.board.json");
    private static final String WORKBOOK = "demo-board.xlsx";

    private Demo() {
    }

    /** Plans the demo board and writes its workbook; {@code reason} says why there is no window instead. */
    static ExitCode plan(Terminal terminal, String reason) {
        Path board = find().orElseThrow(() -> new BadInput(List.of(reason,
                "The demo board " + BOARD + " stands neither in the working folder nor beside the program, or above "
                        + "them; name a board: shuntwright plan BOARD")));
        terminal.print(reason);
        terminal.print("Planning the demo board instead: " + board);
        terminal.print("");
        Job.Output output = new Job.Output(Optional.of(place().resolve(WORKBOOK)), Optional.empty(), false,
                Optional.empty());
        ExitCode result = new Job(Job.Kind.PLAN, board, List.of(), List.of(), SamplingChoice.OF_THE_BOARD, output,
                Optional.empty(), OptionalDouble.empty()).run(terminal);
        terminal.print("");
        terminal.print("To plan a board of your own: shuntwright plan BOARD; for more: shuntwright --help");
        return result;
    }

    /** In the working folder, or one above it or above the program. */
    static Optional<Path> find() {
        Stream<Path> starts = Stream.concat(Stream.of(Path.of("").toAbsolutePath()), program().stream());
        return starts.flatMap(start -> Stream.iterate(start, each -> each != null, Path::getParent))
                .map(each -> each.resolve(BOARD)).filter(Files::isRegularFile).findFirst();
    }

    /** The build's own output folder where the program runs from one, otherwise the working folder. */
    private static Path place() {
        return program().flatMap(each -> Optional.ofNullable(each.getParent()))
                .filter(each -> each.endsWith("target") && Files.isWritable(each)).orElse(Path.of(""));
    }

    /** The jar or folder this class was loaded from. */
    private static Optional<Path> program() {
        CodeSource source = Demo.class.getProtectionDomain().getCodeSource();
        try {
            return source == null ? Optional.empty() : Optional.of(Path.of(source.getLocation().toURI()));
        } catch (URISyntaxException _) {
            return Optional.empty();
        }
    }
}
