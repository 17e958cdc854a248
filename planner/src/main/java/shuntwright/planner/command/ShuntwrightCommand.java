package shuntwright.planner.command;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;

/** What happens without a command: the window, or the demo board where there is no display. */
@Command(name = "shuntwright", mixinStandardHelpOptions = true, versionProvider = Version.class, scope = ScopeType.INHERIT)
final class ShuntwrightCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Option(names = "--trace", scope = ScopeType.INHERIT, description = "Show where the program failed, if it does.")
    private boolean trace;

    ShuntwrightCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    boolean trace() {
        return trace;
    }

    @Override
    public Integer call() {
        Optional<String> reason = WindowStarter.open(Optional.empty(), List.of());
        if (reason.isEmpty()) {
            return ExitCode.ACCEPTED.number();
        }
        return Demo.plan(terminal, reason.get()).number();
    }
}
