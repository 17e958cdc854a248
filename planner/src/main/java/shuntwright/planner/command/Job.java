package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.Problem;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;
import shuntwright.io.workbook.Workbook;
import shuntwright.io.workplace.Workplace;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Plan;

/**
 * Opens a board, plans or checks it, saves and prints.
 *
 * @param kind   what to do with the board
 * @param board  board file
 * @param parts  parts files besides the board's own
 * @param output what to make of the plan
 * @param pinned where to write the board with every choice pinned
 */
record Job(Kind kind, Path board, List<Path> parts, Output output, Optional<Path> pinned) {

    /** What is done with the board. */
    enum Kind {
        PLAN, CHECK
    }

    /**
     * What is made of a plan.
     *
     * @param workbook where to write the workbook
     * @param plan     where to write the plan file
     * @param json     whether to print JSON instead of the table
     */
    record Output(Optional<Path> workbook, Optional<Path> plan, boolean json) {}

    Job {
        parts = List.copyOf(parts);
    }

    /** @throws BadInput when a file cannot be opened or saved */
    ExitCode run(Terminal terminal) {
        List<Path> inputs = new ArrayList<>(parts);
        inputs.add(board);
        List<Path> targets = Stream.of(output.workbook(), output.plan(), pinned).flatMap(Optional::stream).toList();
        Targets.check(inputs, targets);
        Workplace opened = open();
        Targets.check(PartsPaths.of(opened.board(), board), targets);
        Plan plan = judge(opened, terminal);
        List<String> failed = save(plan);
        if (output.json()) {
            terminal.printBytes(PlanFile.bytes(plan));
        } else {
            PlanText.of(plan, terminal.colour()).forEach(terminal::print);
        }
        if (!failed.isEmpty()) {
            throw new BadInput(failed);
        }
        if (!output.json()) {
            targets.forEach(each -> terminal.print("Written: " + each));
        }
        return plan.accepted() ? ExitCode.ACCEPTED : ExitCode.NOT_ACCEPTED;
    }

    private Workplace open() {
        return switch (Workplace.open(board, parts)) {
            case FileReading.Opened<Workplace>(Workplace opened) -> opened;
            case FileReading.Refused<Workplace>(List<Problem> problems) ->
                throw new BadInput(problems.stream().map(Problem::toString).toList());
        };
    }

    private Plan judge(Workplace opened, Terminal terminal) {
        try (ProgressLine progress = ProgressLine.on(terminal, !output.json())) {
            BoardPlanner planner = new BoardPlanner();
            return switch (kind) {
                case PLAN -> planner.plan(opened.board(), opened.catalogue(), progress);
                case CHECK -> planner.check(opened.board(), opened.catalogue(), progress);
            };
        }
    }

    /** Saves what is wanted. @return why something could not be saved */
    private List<String> save(Plan plan) {
        List<SaveResult> results = new ArrayList<>();
        output.plan().ifPresent(file -> results.add(SafeSave.save(file, out -> PlanFile.write(plan, out))));
        output.workbook()
                .ifPresent(file -> results.add(SafeSave.save(file, out -> Workbook.write(plan, out))));
        pinned.ifPresent(file -> results
                .add(BoardFiles.save(PartsPaths.moved(BoardPlanner.pinned(plan), board, parts, file), file)));
        return results.stream().flatMap(each -> switch (each) {
            case SaveResult.Saved _ -> Stream.<String>empty();
            case SaveResult.Failed(String message) -> Stream.of(message);
        }).toList();
    }
}
