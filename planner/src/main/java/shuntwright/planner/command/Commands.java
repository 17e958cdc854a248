package shuntwright.planner.command;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;

import picocli.CommandLine;
import picocli.CommandLine.Help;
import picocli.CommandLine.TypeConversionException;

/** The program's commands; the one place where the outcome of a command becomes an exit code. */
public final class Commands {

    private Commands() {
    }

    /** Runs with this process's own streams. @return exit code */
    public static int run(String[] args) {
        return run(args, Terminal.system(System.getenv()));
    }

    /** Runs with those streams, in UTF-8, as if they were pipes. @return exit code */
    public static int run(String[] args, PrintStream out, PrintStream err) {
        return run(args, Terminal.piped(out, err));
    }

    static int run(String[] args, Terminal terminal) {
        return run(args, terminal, Solver.OWN);
    }

    /** @param solvers what answers questions about whole boards */
    static int run(String[] args, Terminal terminal, Supplier<Solver> solvers) {
        ShuntwrightCommand top = new ShuntwrightCommand(terminal);
        CommandLine line = new CommandLine(top).addSubcommand(new PlanCommand(terminal))
                .addSubcommand(new CheckCommand(terminal)).addSubcommand(new FrontCommand(terminal, solvers))
                .addSubcommand(new OthersCommand(terminal, solvers)).addSubcommand(new WhatIfCommand(terminal, solvers))
                .addSubcommand(new WindowCommand());
        HelpText.addTo(line);
        line.registerConverter(Path.class, Commands::path);
        line.setOut(new PrintWriter(terminal.out(), true, terminal.charset()))
                .setErr(new PrintWriter(terminal.err(), true, terminal.charset()));
        line.setColorScheme(Help.defaultColorScheme(terminal.colour() ? Help.Ansi.ON : Help.Ansi.OFF));
        line.setUsageHelpWidth(120).setUsageHelpLongOptionsMaxWidth(30);
        line.setParameterExceptionHandler((wrong, _) -> Failures.ofOptions(terminal, wrong));
        line.setExecutionExceptionHandler((failure, _, _) -> Failures.of(terminal, failure, top.trace()));
        try {
            return line.execute(args);
        } catch (StackOverflowError | OutOfMemoryError exhausted) {
            return Failures.of(terminal, exhausted, top.trace());
        } finally {
            List.of(terminal.out(), terminal.err()).forEach(PrintStream::flush);
        }
    }

    private static Path path(String text) {
        try {
            return Path.of(text);
        } catch (InvalidPathException wrong) {
            throw new TypeConversionException("\"" + text + "\" cannot be a file name on this system with its present "
                    + "settings (" + wrong.getReason() + "). Maybe the locale is not UTF-8.");
        }
    }
}
