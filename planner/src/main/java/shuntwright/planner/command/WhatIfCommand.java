package shuntwright.planner.command;

import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import java.util.stream.Stream;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import shuntwright.io.planfile.AnswerFile;
import shuntwright.plan.WhatIf;

/** The board as one of its limits changes. */
@Command(name = "what-if", description = "Plans a board at several values of one of its limits: cost, heat and part numbers at each. Not sampled.")
final class WhatIfCommand implements Callable<Integer> {
    static final int LEAST = 2;
    static final int MOST = 100;

    private final Terminal terminal;
    private final Supplier<Solver> solvers;

    @Mixin
    private BoardOptions input = new BoardOptions();

    @Option(names = "--vary", paramLabel = "WHAT", required = true, converter = Vary.Converter.class, description = "heat limit, zone NAME heat limit, supply current or build quantity.")
    private Vary vary = new Vary(WhatIf.Varied.BOARD_HEAT_LIMIT, "");

    @Option(names = "--from", paramLabel = "X", required = true, description = "Smallest value, such as 1.5W, 40mA or 10 (boards).")
    private String from = "";

    @Option(names = "--to", paramLabel = "X", required = true, description = "Largest value.")
    private String to = "";

    @Option(names = "--steps", paramLabel = "N", description = "How many values, evenly spaced with both ends among them, 2 to 100; 9 if not given.")
    private int steps = 9;

    @Mixin
    private ChoiceOptions.Wanted wanted = new ChoiceOptions.Wanted();

    @Mixin
    private ChoiceOptions.Search search = new ChoiceOptions.Search();

    @Mixin
    private ChoiceOptions.Price price = new ChoiceOptions.Price();

    @Option(names = "--json", description = "Print JSON instead of the table, and nothing else.")
    private boolean json;

    WhatIfCommand(Terminal terminal, Supplier<Solver> solvers) {
        this.terminal = terminal;
        this.solvers = solvers;
    }

    @Override
    public Integer call() {
        if (steps < LEAST || steps > MOST) {
            throw new BadInput("--steps: type a whole number from " + LEAST + " to " + MOST + ", got " + steps);
        }
        List<Double> values = vary.values(from, to, steps);
        Question question = Question.of(input.board(), input.parts(),
                Stream.of(wanted.chosen(), search.chosen(), price.chosen()).flatMap(List::stream).toList());
        vary.check(question.board());
        Question.Answered<WhatIf> answered = question.answered(solvers, terminal, json,
                (explorer, board, catalogue, progress) -> explorer.whatIf(board, catalogue, vary.varied(), vary.zone(),
                        values, progress));
        if (json) {
            terminal.printBytes(AnswerFile.whatIf(answered.plan(), answered.answer()));
        } else {
            WhatIfText.of(answered, vary).forEach(terminal::print);
        }
        boolean some = answered.answer().points().stream().anyMatch(each -> each.reached().isPresent());
        return (some ? ExitCode.ACCEPTED : ExitCode.NOT_ACCEPTED).number();
    }
}
