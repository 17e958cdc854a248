package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import java.util.stream.Stream;

import picocli.CommandLine.Command;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;
import shuntwright.board.Objective;
import shuntwright.io.form.NearestWord;
import shuntwright.io.planfile.AnswerFile;
import shuntwright.plan.Front;

/** Plans between two objectives. */
@Command(name = "front", description = "Plans a board several times between two objectives: none of these plans is better in one without being worse in the other, as far as was found. Not sampled.")
final class FrontCommand implements Callable<Integer> {
    static final int LEAST = 2;
    static final int MOST = 50;

    private final Terminal terminal;
    private final Supplier<Solver> solvers;

    @Mixin
    private BoardOptions input = new BoardOptions();

    @Option(names = "--of", paramLabel = "OBJECTIVE", converter = Aim.class, description = "Objective along the front: least heat (if not given), most even heat, least cost, fewest parts or widest margin.")
    private Objective first = Objective.LEAST_HEAT;

    @Option(names = "--against", paramLabel = "OBJECTIVE", converter = Aim.class, description = "The other objective: least cost if not given.")
    private Objective second = Objective.LEAST_COST;

    @Option(names = "--points", paramLabel = "N", description = "Most plans, 2 to 50; 9 if not given. Those that another one beats in both are left out.")
    private int points = 9;

    @Option(names = "--out", paramLabel = "DIR", description = "Write each plan into this folder: front-01.plan.json and, with every choice pinned, front-01.board.json, from which check and plan go on.")
    private Optional<Path> out = Optional.empty();

    @Mixin
    private ChoiceOptions.Search search = new ChoiceOptions.Search();

    @Mixin
    private ChoiceOptions.Price price = new ChoiceOptions.Price();

    @Option(names = "--json", description = "Print JSON instead of the table, and nothing else.")
    private boolean json;

    FrontCommand(Terminal terminal, Supplier<Solver> solvers) {
        this.terminal = terminal;
        this.solvers = solvers;
    }

    @Override
    public Integer call() {
        if (first == second) {
            throw new BadInput("--of and --against are both " + first.word() + "; name two different ones of "
                    + Aim.words());
        }
        if (points < LEAST || points > MOST) {
            throw new BadInput("--points: type a whole number from " + LEAST + " to " + MOST + ", got " + points);
        }
        Optional<FrontFiles> files = out.map(folder -> FrontFiles.in(folder, points));
        Question question = Question.of(input.board(), input.parts(),
                Stream.concat(search.chosen().stream(), price.chosen().stream()).toList());
        Question.Answered<Front> answered = question.answered(solvers, terminal, json,
                (explorer, board, catalogue, progress) -> explorer.front(board, catalogue, first, second, points,
                        progress));
        List<Path> written = files.map(each -> each.write(answered.answer(), question, input.parts()))
                .orElse(List.of());
        if (json) {
            terminal.printBytes(AnswerFile.front(answered.plan(), answered.answer()));
        } else {
            FrontText.of(answered).forEach(terminal::print);
            written.forEach(each -> terminal.print("Written: " + each));
        }
        boolean accepted = !answered.answer().points().isEmpty()
                && answered.answer().points().stream().allMatch(each -> each.plan().accepted());
        return (accepted ? ExitCode.ACCEPTED : ExitCode.NOT_ACCEPTED).number();
    }

    /** Reads an objective. */
    static final class Aim implements ITypeConverter<Objective> {

        static String words() {
            return String.join(", ", Arrays.stream(Objective.values()).map(Objective::word).toList());
        }

        @Override
        public Objective convert(String text) {
            String typed = text.strip().toLowerCase(Locale.ROOT).replaceAll("\\s+", " ");
            List<String> known = Arrays.stream(Objective.values()).map(Objective::word).toList();
            return Arrays.stream(Objective.values()).filter(each -> each.word().equals(typed)).findFirst()
                    .orElseThrow(() -> new TypeConversionException(NearestWord.unknown("objective", text, known)));
        }
    }
}
