package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.Optional;

import picocli.CommandLine.Option;

/** What to make of a plan. */
final class OutputOptions {

    @Option(names = "--workbook", paramLabel = "FILE", description = "Write the workbook (.xlsx): parts list with prices, settings, findings, assumptions, cautions.")
    private Optional<Path> workbook = Optional.empty();

    @Option(names = "--plan", paramLabel = "FILE", description = "Write the plan file (.json): everything computed.")
    private Optional<Path> plan = Optional.empty();

    @Option(names = "--json", description = "Print the plan file's JSON instead of the table, and nothing else.")
    private boolean json;

    @Option(names = "--budget", paramLabel = "CHANNEL", description = "Print this channel's error budget instead of the table: limits, combined uncertainty, sampled distribution.")
    private Optional<String> budget = Optional.empty();

    /** @throws BadInput when two options would decide what is printed */
    Job.Output chosen() {
        if (json && budget.isPresent()) {
            throw new BadInput("--json prints the plan file and nothing else, --budget an error budget; leave out one "
                    + "or the other. The plan file has every channel's budget.");
        }
        return new Job.Output(workbook, plan, json, budget);
    }
}
