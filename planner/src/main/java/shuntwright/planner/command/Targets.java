package shuntwright.planner.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Files to be written, looked at before any work is done. */
final class Targets {

    private Targets() {
    }

    /** @throws BadInput when one would replace an input or another output, or has no folder to stand in */
    static void check(List<Path> inputs, List<Path> targets) {
        List<String> problems = new ArrayList<>();
        for (int i = 0; i < targets.size(); i++) {
            Path target = targets.get(i);
            if (inputs.stream().anyMatch(each -> same(each, target))) {
                problems.add(target + " is a file this command reads and would be replaced; choose another name");
            }
            if (targets.subList(0, i).stream().anyMatch(each -> same(each, target))) {
                problems.add(target + " is named for two outputs; give each a name of its own");
            }
            Path folder = target.toAbsolutePath().getParent();
            if (folder == null || !Files.isDirectory(folder)) {
                problems.add(target + " cannot be written: there is no folder " + folder
                        + "; create it or choose another one");
            }
        }
        if (!problems.isEmpty()) {
            throw new BadInput(problems);
        }
    }

    private static boolean same(Path one, Path other) {
        if (one.toAbsolutePath().normalize().equals(other.toAbsolutePath().normalize())) {
            return true;
        }
        try {
            return Files.exists(one) && Files.exists(other) && Files.isSameFile(one, other);
        } catch (IOException _) {
            // Two names of which one cannot be looked up are not known to be one file; opening it tells what is wrong.
            return false;
        }
    }
}
