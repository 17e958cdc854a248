package shuntwright.planner;

import shuntwright.planner.command.Commands;

/** Starts Shuntwright: the window, or a command. */
public final class Main {

    private Main() {
    }

    public static void main(String[] args) {
        System.exit(Commands.run(args));
    }
}
