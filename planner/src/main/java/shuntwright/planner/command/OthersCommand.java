package shuntwright.planner.command;

import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import java.util.stream.Stream;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import shuntwright.io.planfile.AnswerFile;
import shuntwright.plan.OtherChoice;

/** Other circuits for a channel. */
@Command(name = "others", description = "Other circuits for one channel, and what each would mean for the whole board, chosen again around it. Not sampled.")
final class OthersCommand implements Callable<Integer> {
    static final int MOST = 50;

    private final Terminal terminal;
    private final Supplier<Solver> solvers;

    @Mixin
    private BoardOptions input = new BoardOptions();

    @Parameters(index = "1", paramLabel = "CHANNEL", description = "Name of the channel.")
    private String channel = "";

    @Option(names = "--most", paramLabel = "N", description = "Most other circuits, 1 to 50; 8 if not given.")
    private int most = 8;

    @Mixin
    private ChoiceOptions.Wanted wanted = new ChoiceOptions.Wanted();

    @Mixin
    private ChoiceOptions.Search search = new ChoiceOptions.Search();

    @Mixin
    private ChoiceOptions.Price price = new ChoiceOptions.Price();

    @Option(names = "--json", description = "Print JSON instead of the table, and nothing else.")
    private boolean json;

    OthersCommand(Terminal terminal, Supplier<Solver> solvers) {
        this.terminal = terminal;
        this.solvers = solvers;
    }

    @Override
    public Integer call() {
        if (most < 1 || most > MOST) {
            throw new BadInput("--most: type a whole number from 1 to " + MOST + ", got " + most);
        }
        Question question = Question.of(input.board(), input.parts(),
                Stream.of(wanted.chosen(), search.chosen(), price.chosen()).flatMap(List::stream).toList());
        Opening.known("CHANNEL", channel, question.board());
        Question.Answered<List<OtherChoice>> answered = question.answered(solvers, terminal, json,
                (explorer, board, catalogue, progress) -> explorer.others(board, catalogue, channel, most, progress));
        if (json) {
            terminal.printBytes(AnswerFile.others(answered.plan(), channel, answered.answer()));
        } else {
            OthersText.of(answered, channel).forEach(terminal::print);
        }
        boolean found = answered.answer().stream()
                .anyMatch(each -> each.channel().accepted() && each.broken().isEmpty());
        return (found ? ExitCode.ACCEPTED : ExitCode.NOT_ACCEPTED).number();
    }
}
