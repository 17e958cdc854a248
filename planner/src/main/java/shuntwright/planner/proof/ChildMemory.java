package shuntwright.planner.proof;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Memory that another process holds, where the platform tells. */
final class ChildMemory {

    private static final Path PROCESSES = Path.of("/proc");
    private static final String HELD = "VmRSS:";

    private ChildMemory() {
    }

    /** MiB in memory; 0 where that is not told, and when the process is gone. */
    static long mebibytes(long process) {
        Path status = PROCESSES.resolve(Long.toString(process)).resolve("status");
        try {
            if (!Files.exists(status)) {
                return 0;
            }
            for (String line : Files.readAllLines(status, StandardCharsets.ISO_8859_1)) {
                if (line.startsWith(HELD)) {
                    return Long.parseLong(line.substring(HELD.length()).replaceAll("[^0-9]", "")) / 1024;
                }
            }
        } catch (IOException | NumberFormatException e) {
            return 0;
        }
        return 0;
    }
}
