package shuntwright.planner.command;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;

import picocli.CommandLine;
import picocli.CommandLine.Model.UsageMessageSpec;
import shuntwright.io.planfile.Cautions;

/** What the help says besides the options: examples and exit codes. */
final class HelpText {
    private static final String START = "  java -jar planner/target/shuntwright.jar ";
    private static final String OWN = "my.board.json";
    private static final String CHANNEL = "Radar transmitter";
    private static final String DEMO = "demo-boards/sledge-wren.board.json";

    private HelpText() {
    }

    /** Adds examples to every command, and exit codes to those that judge a board. */
    static void addTo(CommandLine line) {
        line.getCommandSpec().usageMessage().synopsisSubcommandLabel("[COMMAND]").description(
                "Plans the overcurrent protection of every output of a power distribution board.",
                "Without a command: opens the window; where there is no display, plans a demo board.");
        examples(line, "window " + DEMO, "plan " + DEMO + " --workbook wren.xlsx",
                "plan " + DEMO + " --pinned wren-chosen.board.json", "check wren-chosen.board.json",
                "front " + DEMO + " --points 5");
        for (Map.Entry<String, CommandLine> each : line.getSubcommands().entrySet()) {
            switch (each.getKey()) {
                case "plan" -> {
                    examples(each.getValue(), "plan " + DEMO, "plan " + DEMO + " --workbook wren.xlsx",
                            "plan " + OWN + " --prefer \"least cost, least heat\" --time-limit 20s",
                            "plan " + DEMO + " --pinned wren-chosen.board.json",
                            "plan " + DEMO + " --json > wren.plan.json");
                    exitCodes(each.getValue());
                }
                case "check" -> {
                    examples(each.getValue(), "plan " + DEMO + " --pinned wren-chosen.board.json",
                            "check wren-chosen.board.json", "check wren-chosen.board.json --workbook wren.xlsx",
                            "check wren-chosen.board.json --json");
                    exitCodes(each.getValue());
                }
                case "front" -> {
                    examples(each.getValue(), "front " + DEMO,
                            "front " + OWN + " --of \"fewest parts\" --against \"least heat\"",
                            "front " + OWN + " --points 5 --out my-front",
                            "front " + DEMO + " --json > wren.front.json");
                    exitCodes(each.getValue(), "every plan of the front is accepted",
                            "there is none, or one is not accepted");
                }
                case "others" -> {
                    examples(each.getValue(), "others " + DEMO + " \"" + CHANNEL + "\"",
                            "others " + DEMO + " \"" + CHANNEL + "\" --most 3 --json");
                    exitCodes(each.getValue(), "another circuit is accepted and breaks no shared limit", "none is");
                }
                case "what-if" -> {
                    examples(each.getValue(), "what-if " + OWN + " --vary \"heat limit\" --from 1W --to 6W",
                            "what-if " + OWN + " --vary \"build quantity\" --from 10 --to 500 --steps 6",
                            "what-if " + OWN + " --vary \"supply current\" --from 10mA --to 40mA --json");
                    exitCodes(each.getValue(), "some value has a plan that keeps to every shared limit", "none has");
                }
                default -> examples(each.getValue(), "window", "window " + DEMO);
            }
        }
    }

    private static void examples(CommandLine line, String... examples) {
        UsageMessageSpec usage = line.getCommandSpec().usageMessage();
        usage.description(Stream.concat(Arrays.stream(usage.description()), Stream.of(Cautions.LINE))
                .toArray(String[]::new));
        String[] lines = new String[examples.length];
        for (int i = 0; i < examples.length; i++) {
            lines[i] = START + examples[i];
        }
        usage.footerHeading("%nExamples:%n").footer(lines);
    }

    private static void exitCodes(CommandLine line) {
        exitCodes(line, ExitCode.ACCEPTED.words(), ExitCode.NOT_ACCEPTED.words());
    }

    private static void exitCodes(CommandLine line, String accepted, String notAccepted) {
        Map<String, String> codes = new LinkedHashMap<>();
        for (ExitCode each : ExitCode.values()) {
            codes.put(Integer.toString(each.number()), switch (each) {
                case ACCEPTED -> accepted;
                case NOT_ACCEPTED -> notAccepted;
                case BAD_INPUT, OUR_FAULT -> each.words();
            });
        }
        line.getCommandSpec().usageMessage().exitCodeListHeading("%nExit codes:%n").exitCodeList(codes);
    }
}
