package shuntwright.planner.command;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.Optional;
import java.util.Set;

import picocli.CommandLine;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;
import shuntwright.io.form.NearestWord;

/** Says what went wrong and gives the exit code for it. */
final class Failures {

    private Failures() {
    }

    static int ofOptions(Terminal terminal, ParameterException wrong) {
        CommandLine line = wrong.getCommandLine();
        terminal.complain(String.valueOf(wrong.getMessage()));
        if (wrong instanceof UnmatchedArgumentException unmatched) {
            nearest(unmatched).ifPresent(word -> terminal.complain("Maybe " + word + "?"));
        }
        if (wrong instanceof MissingParameterException missing
                && missing.getMissing().stream().anyMatch(ArgSpec::isPositional)) {
            terminal.complain("Maybe the board was taken for a parts file: put it before --parts.");
        }
        terminal.complain("See: " + line.getCommandSpec().qualifiedName() + " --help");
        return ExitCode.BAD_INPUT.number();
    }

    static int of(Terminal terminal, Throwable failure, boolean trace) {
        if (failure instanceof BadInput bad) {
            bad.problems().forEach(each -> terminal.complain(Spelling.harmless(each)));
            return ExitCode.BAD_INPUT.number();
        }
        String message = Optional.ofNullable(failure.getMessage()).map(text -> ": " + text).orElse("");
        terminal.complain("Shuntwright itself failed: " + failure.getClass().getSimpleName() + message);
        terminal.complain("This is a fault of the program, not of your files. Please report it with the board file"
                + (trace ? " and what follows." : "; the same command with --trace shows where it happened."));
        if (trace) {
            StringWriter text = new StringWriter();
            failure.printStackTrace(new PrintWriter(text));
            terminal.complain(text.toString());
        }
        return ExitCode.OUR_FAULT.number();
    }

    /** The command or option that is nearest to the first unknown word. */
    private static Optional<String> nearest(UnmatchedArgumentException unmatched) {
        CommandLine line = unmatched.getCommandLine();
        Set<String> known = unmatched.isUnknownOption()
                ? line.getCommandSpec().optionsMap().keySet()
                : line.getSubcommands().keySet();
        return NearestWord.find(unmatched.getUnmatched().getFirst(), known);
    }
}
