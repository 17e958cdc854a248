package shuntwright.planner.proof;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

import org.jspecify.annotations.Nullable;

import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Watch;

/** Asks the model and the solver in one child for all questions. */
final class BatchProver implements Prover, AutoCloseable {

    private static final SolverLimits LIMITS = new SolverLimits(20, 0, 1, 960);

    private final Path folder;
    private final Process child;
    private final BufferedReader in;

    /** @param main answers task after task */
    BatchProver(Class<?> main) throws IOException {
        folder = Files.createTempDirectory("shuntwright-proof-");
        Launch own = Launch.own();
        child = new Launch(own.java(), own.classPath(), main.getName()).start(folder);
        in = child.inputReader(StandardCharsets.UTF_8);
    }

    @Override
    public Finding ask(Selection selection, Question question, Watch watch) {
        Conversation conversation = new Conversation(selection, question);
        try {
            child.getOutputStream()
                    .write(Wire.write(new Task(selection, question, LIMITS)).getBytes(StandardCharsets.UTF_8));
            child.getOutputStream().flush();
            @Nullable
            String line = in.readLine();
            while (line != null && !line.equals("next")) {
                conversation.heard(line);
                line = in.readLine();
            }
            if (line == null) {
                conversation.complain("the batch broke down: " + Files.readString(folder.resolve(Launch.ERRORS)));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return conversation.finding();
    }

    @Override
    public void close() {
        child.destroyForcibly();
        child.onExit().join();
        Leftovers.delete(folder, true);
    }
}
