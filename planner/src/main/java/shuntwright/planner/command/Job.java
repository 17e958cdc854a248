package shuntwright.planner.command;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;
import shuntwright.io.workbook.Workbook;
import shuntwright.io.workplace.Workplace;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.plan.Plan;
import shuntwright.planner.proof.ChildProver;
import shuntwright.selection.Prover;

/**
 * Opens a board, plans or checks it, samples the plan, saves and prints.
 *
 * @param kind     what to do with the board
 * @param board    board file
 * @param parts    parts files besides the board's own
 * @param wanted   of the choice of parts, for this run
 * @param sampling how to sample the plan
 * @param output   what to make of the plan
 * @param pinned   where to write the board with every choice pinned
 * @param proving  seconds a solver in a process of its own may take for each objective; empty for own bounds only
 */
record Job(Kind kind, Path board, List<Path> parts, List<Entered> wanted, SamplingChoice sampling, Output output,
        Optional<Path> pinned, OptionalDouble proving) {

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
     * @param budget   name of the channel whose error budget to print instead of the table
     */
    record Output(Optional<Path> workbook, Optional<Path> plan, boolean json, Optional<String> budget) {}

    Job {
        parts = List.copyOf(parts);
        wanted = List.copyOf(wanted);
    }

    /** @param choosing time it took to choose the parts, or to check them */
    private record Judged(Plan plan, Duration choosing) {}

    /** @throws BadInput when a file cannot be opened or saved */
    ExitCode run(Terminal terminal) {
        List<Path> inputs = new ArrayList<>(parts);
        inputs.add(board);
        List<Path> targets = Stream.of(output.workbook(), output.plan(), pinned).flatMap(Optional::stream).toList();
        Targets.check(inputs, targets);
        Workplace opened = Opening.of(board, parts);
        Targets.check(PartsPaths.of(opened.board(), board), targets);
        output.budget().ifPresent(name -> Opening.known("--budget", name, opened.board()));
        Judged judged = judge(opened, terminal);
        Plan plan = judged.plan();
        List<String> failed = save(plan, opened.board());
        if (output.json()) {
            terminal.printBytes(PlanFile.bytes(plan));
        } else {
            output.budget().flatMap(plan::channel)
                    .map(each -> BudgetText.of(plan, each, terminal.colour()))
                    .orElseGet(() -> PlanText.of(plan, Optional.of(judged.choosing()), terminal.colour()))
                    .forEach(terminal::print);
        }
        if (!failed.isEmpty()) {
            throw new BadInput(failed);
        }
        if (!output.json()) {
            targets.forEach(each -> terminal.print("Written: " + each));
        }
        return plan.accepted() ? ExitCode.ACCEPTED : ExitCode.NOT_ACCEPTED;
    }

    private Judged judge(Workplace opened, Terminal terminal) {
        Board asked = Entered.applied(wanted, sampling.applied(opened.board()));
        try (ProgressLine progress = ProgressLine.on(terminal, !output.json())) {
            Set<String> complaints = new LinkedHashSet<>();
            BoardPlanner planner = proving.isEmpty() ? Solver.planner() : new BoardPlanner(prover(complaints));
            long start = System.nanoTime();
            Plan plan = switch (kind) {
                case PLAN -> planner.plan(asked, opened.catalogue(), progress);
                case CHECK -> planner.check(asked, opened.catalogue(), progress);
            };
            Duration choosing = Duration.ofNanos(System.nanoTime() - start);
            complaints.forEach(
                    each -> terminal.complain("The solver was no help; the bounds are the program's own. " + each));
            return new Judged(sampling.skipped()
                    ? plan
                    : new BoardSampler(Runtime.getRuntime().availableProcessors()).sample(plan,
                            asked.uncertainty().sampling(), BoardSampler.Depth.FULL, progress),
                    choosing);
        }
    }

    private Prover prover(Set<String> complaints) {
        Prover child = new ChildProver(Duration.ofMillis(Math.max(1, Math.round(proving.orElseThrow() * 1000))));
        return (selection, question, watch) -> {
            Prover.Finding finding = child.ask(selection, question, watch);
            if (!finding.complaint().isEmpty()) {
                complaints.add(finding.complaint());
            }
            return finding;
        };
    }

    /**
     * Saves what is wanted.
     *
     * @param original the board as its file has it
     * @return why something could not be saved
     */
    private List<String> save(Plan plan, Board original) {
        List<SaveResult> results = new ArrayList<>();
        output.plan().ifPresent(file -> results.add(SafeSave.save(file, out -> PlanFile.write(plan, out))));
        output.workbook()
                .ifPresent(file -> results.add(SafeSave.save(file, out -> Workbook.write(plan, out))));
        pinned.ifPresent(file -> {
            Board own = Entered.restored(BoardPlanner.pinned(plan), original);
            results.add(BoardFiles.save(PartsPaths.moved(own, board, parts, file), file));
        });
        return results.stream().flatMap(each -> switch (each) {
            case SaveResult.Saved _ -> Stream.<String>empty();
            case SaveResult.Failed(String message) -> Stream.of(message);
        }).toList();
    }
}
