package shuntwright.planner.proof;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.TimeUnit;

import org.jspecify.annotations.Nullable;

import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Watch;

/**
 * Asks a solver in a child process, which is ended when its time or its memory is used up or the watch says so; what it had found by then
 * counts. Whatever happens to the child is told as a complaint.
 */
public final class ChildProver implements Prover {

    public static final Duration USUAL_LIMIT = Duration.ofSeconds(10);

    private static final int WORKERS = 2;
    private static final int MEMORY_MIB = 960;
    /** After its own time limit the child still has to say what it found. */
    private static final Duration GRACE = Duration.ofMillis(500);
    private static final long LOOK_MILLIS = 20;
    private static final String CLOSED = "";

    private final Launch launch;
    private final SolverLimits limits;

    public ChildProver() {
        this(USUAL_LIMIT);
    }

    /** @param limit of each question, from start to end of the child */
    public ChildProver(Duration limit) {
        this(Launch.own(), new SolverLimits(limit.toNanos() / 1e9, 0, WORKERS, MEMORY_MIB));
    }

    ChildProver(Launch launch, SolverLimits limits) {
        this.launch = launch;
        this.limits = limits;
    }

    /**
     * A prover that repeats exactly, if the limit of time does not cut in.
     *
     * @param effort of each question, in the solver's own count of work, about a second each
     * @param limit  of each question, from start to end of the child
     */
    public static ChildProver repeatable(double effort, Duration limit) {
        return new ChildProver(Launch.own(), new SolverLimits(limit.toNanos() / 1e9, effort, WORKERS, MEMORY_MIB));
    }

    @Override
    public Finding ask(Selection selection, Question question, Watch watch) {
        Conversation conversation = new Conversation(selection, question);
        try {
            Path folder = Files.createTempDirectory("shuntwright-proof-");
            try {
                talk(folder, Wire.write(new Task(selection, question, limits)), conversation, watch);
            } finally {
                Leftovers.delete(folder, true);
            }
        } catch (IOException e) {
            conversation.complain("The solver cannot be started: " + e.getMessage() + ".");
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        return conversation.finding();
    }

    private void talk(Path folder, String task, Conversation conversation, Watch watch)
            throws IOException, InterruptedException {
        long from = System.nanoTime();
        Process child = launch.start(folder);
        BlockingQueue<String> lines = new ArrayBlockingQueue<>(1000);
        Thread teller = Thread.ofVirtual().start(() -> tell(child, task));
        Thread listener = Thread.ofVirtual().start(() -> listen(child, lines));
        try {
            long most = (long) (limits.seconds() * 1e9) + GRACE.toNanos();
            boolean open = true;
            while (open && !watch.ended() && System.nanoTime() - from < most) {
                String line = lines.poll(LOOK_MILLIS, TimeUnit.MILLISECONDS);
                if (line == null) {
                    open = !tooLarge(child, conversation);
                } else if (line.equals(CLOSED)) {
                    open = false;
                    closed(child, folder, conversation);
                } else {
                    open = conversation.heard(line);
                }
            }
        } finally {
            teller.interrupt();
            listener.interrupt();
            end(child);
        }
    }

    /** The child closed its output: it has said all, or it has broken down. */
    private static void closed(Process child, Path folder, Conversation conversation)
            throws IOException, InterruptedException {
        if (conversation.isDone()) {
            return;
        }
        boolean ended = child.waitFor(1, TimeUnit.SECONDS);
        List<String> errors = Files.readAllLines(folder.resolve(Launch.ERRORS), StandardCharsets.ISO_8859_1);
        conversation.complain("The solver broke down" + (ended ? " (exit code " + child.exitValue() + ")" : "")
                + (errors.isEmpty() ? "" : ": " + Conversation.shortened(errors.getFirst())) + ".");
    }

    private static void end(Process child) throws InterruptedException {
        child.destroyForcibly();
        // Its files can only be deleted everywhere once it is gone.
        child.waitFor(2, TimeUnit.SECONDS);
    }

    /** Writes the task and leaves the child's input open: it ends when that is closed. */
    private static void tell(Process child, String task) {
        try {
            OutputStream out = child.getOutputStream();
            out.write(task.getBytes(StandardCharsets.UTF_8));
            out.flush();
        } catch (IOException e) {
            // It has ended; whoever listens hears of it.
        }
    }

    private static void listen(Process child, BlockingQueue<String> lines) {
        try (BufferedReader in = new BufferedReader(
                new InputStreamReader(child.getInputStream(), StandardCharsets.UTF_8))) {
            String line = next(in);
            while (line != null) {
                if (!line.isEmpty()) {
                    lines.put(line);
                }
                line = next(in);
            }
            lines.put(CLOSED);
        } catch (IOException e) {
            // Nothing was left to close.
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private static @Nullable String next(BufferedReader in) {
        try {
            return in.readLine();
        } catch (IOException e) {
            // Ended in the middle of a line.
            return null;
        }
    }

    private boolean tooLarge(Process child, Conversation conversation) {
        if (ChildMemory.mebibytes(child.pid()) <= limits.memory()) {
            return false;
        }
        conversation.complain("The solver was ended because it took more than " + limits.memory()
                + " MiB of memory; what it had found by then counts.");
        return true;
    }
}
