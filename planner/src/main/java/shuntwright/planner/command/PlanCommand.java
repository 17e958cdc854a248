package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Stream;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import shuntwright.board.Board;

/** Plans a board. */
@Command(name = "plan", description = "Chooses parts for every channel of a board and judges the result.")
final class PlanCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Mixin
    private BoardOptions input = new BoardOptions();

    @Mixin
    private ChoiceOptions.Wanted wanted = new ChoiceOptions.Wanted();

    @Mixin
    private ChoiceOptions.Search search = new ChoiceOptions.Search();

    @Mixin
    private ChoiceOptions.Price price = new ChoiceOptions.Price();

    @Mixin
    private SamplingOptions sampling = new SamplingOptions();

    @Mixin
    private OutputOptions output = new OutputOptions();

    @Option(names = "--pinned", paramLabel = "FILE", description = "Write the board with every choice pinned, so that check judges exactly this plan.")
    private Optional<Path> pinned = Optional.empty();

    @Option(names = "--prove", paramLabel = "T", converter = ChoiceOptions.TimeLimit.class, description = "Let a solver in a process of its own look for a better bound, or a proof, of each objective for at most this time, such as 10s. Without it the bounds are the program's own.")
    private Optional<Entered> proving = Optional.empty();

    PlanCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        return new Job(Job.Kind.PLAN, input.board(), input.parts(),
                Stream.of(wanted.chosen(), search.chosen(), price.chosen()).flatMap(List::stream).toList(),
                sampling.chosen(), output.chosen(), pinned,
                Entered.applied(proving.stream().toList(), Board.named("")).preference().timeLimit())
                .run(terminal)
                .number();
    }
}
