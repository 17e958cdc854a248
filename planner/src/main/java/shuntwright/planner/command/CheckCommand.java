package shuntwright.planner.command;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Judges a board as its pins have it. */
@Command(name = "check", description = "Judges a board with exactly the parts it has pinned; chooses nothing.")
final class CheckCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Mixin
    private BoardOptions input = new BoardOptions();

    @Mixin
    private ChoiceOptions.Price price = new ChoiceOptions.Price();

    @Mixin
    private SamplingOptions sampling = new SamplingOptions();

    @Mixin
    private OutputOptions output = new OutputOptions();

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        return new Job(Job.Kind.CHECK, input.board(), input.parts(), price.chosen(), sampling.chosen(), output.chosen(),
                Optional.empty(), OptionalDouble.empty()).run(terminal)
                .number();
    }
}
