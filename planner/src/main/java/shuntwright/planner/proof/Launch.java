package shuntwright.planner.proof;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * How the child is started.
 *
 * @param java      the program
 * @param classPath of the child
 * @param main      its class
 */
record Launch(Path java, String classPath, String main) {

    /** Names the folder that the child may empty. */
    static final String FOLDER = "shuntwright.proof.folder";

    static final String ERRORS = "errors.txt";

    private static final int HEAP_MIB = 320;

    /** With the Java and the classes this program runs on. */
    static Launch own() {
        boolean windows = System.getProperty("os.name", "").toLowerCase(Locale.ROOT).contains("windows");
        String classPath = Stream.of(System.getProperty("java.class.path").split(File.pathSeparator))
                .filter(each -> !each.isEmpty()).map(each -> Path.of(each).toAbsolutePath().toString())
                .collect(Collectors.joining(File.pathSeparator));
        return new Launch(Path.of(System.getProperty("java.home"), "bin", windows ? "java.exe" : "java"), classPath,
                ProofChild.class.getName());
    }

    /**
     * Starts it with a folder of its own for everything it writes.
     *
     * @throws IOException when it cannot be started
     */
    Process start(Path folder) throws IOException {
        Path unpacked = Files.createDirectory(folder.resolve("unpacked"));
        ProcessBuilder builder = new ProcessBuilder(List.of(java.toString(), "-Xmx" + HEAP_MIB + "m",
                "-XX:+UseSerialGC", "-XX:TieredStopAtLevel=1", "-XX:-UsePerfData", "-XX:-CreateCoredumpOnCrash",
                "-XX:ErrorFile=" + folder.resolve("crash.txt"), "--enable-native-access=ALL-UNNAMED",
                "--sun-misc-unsafe-memory-access=allow", "-Djava.io.tmpdir=" + unpacked, "-Djna.tmpdir=" + unpacked,
                "-D" + FOLDER + "=" + unpacked, main));
        Map<String, String> environment = builder.environment();
        environment.keySet().removeAll(List.of("JAVA_TOOL_OPTIONS", "JDK_JAVA_OPTIONS", "_JAVA_OPTIONS"));
        environment.put("CLASSPATH", classPath);
        return builder.directory(folder.toFile()).redirectError(folder.resolve(ERRORS).toFile()).start();
    }
}
