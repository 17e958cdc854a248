package shuntwright.planner.proof;

import java.io.BufferedReader;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.ToLongFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

import com.google.ortools.Loader;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverSolutionCallback;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.SatParameters;

/**
 * The child: reads one task from its standard input, answers on its standard output as it finds, and ends; at once when its input is
 * closed, as it is when the parent is gone.
 */
public final class ProofChild {

    /** A bound in the solver's log, which tells of it sooner than the solver itself: "#Bound 1.2s best:9 next:[5,8] max_lp". */
    private static final Pattern BOUND = Pattern.compile("^#\\S+.* next:\\[([-+0-9.eE]+),");

    /** The log shows nine digits; what it rounded up must not count. */
    private static final double SHOWN = 1e-8;
    /** Seconds that starting this process takes before it reads. */
    private static final double START = 0.3;
    private static final double MUST_HAVE = 0.1;

    private final PrintStream out;
    private double told = Double.NEGATIVE_INFINITY;

    private ProofChild(PrintStream out) {
        this.out = out;
    }

    public static void main(String[] args) throws IOException {
        try (PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8);
                BufferedReader in = new BufferedReader(
                        new InputStreamReader(new FileInputStream(FileDescriptor.in), StandardCharsets.UTF_8))) {
            answer(task(in), out, solver -> Thread.ofVirtual().start(() -> stopWhenClosed(in, solver)));
        }
    }

    /** The text of one task. */
    static String task(BufferedReader in) throws IOException {
        StringBuilder text = new StringBuilder();
        for (String line = in.readLine(); line != null; line = in.readLine()) {
            text.append(line).append('\n');
            if (line.strip().equals(Wire.END)) {
                break;
            }
        }
        return text.toString();
    }

    /** Answers one task. */
    static void answer(String task, PrintStream out, Consumer<CpSolver> starts) {
        ProofChild child = new ProofChild(out);
        try {
            child.solve(Wire.read(task), starts);
        } catch (IllegalArgumentException | ArithmeticException | IllegalStateException e) {
            child.say(Word.FAILED, String.valueOf(e.getMessage()));
        } catch (LinkageError e) {
            child.say(Word.FAILED, "the solver's library does not load: " + e.getMessage());
        }
    }

    private synchronized void say(Word word, String rest) {
        out.println(word.line(rest.replaceAll("\\s+", " ")));
        out.flush();
    }

    private void solve(Task task, Consumer<CpSolver> starts) {
        long from = System.nanoTime();
        load();
        SolverModel model = new SolverModel(task.selection(), task.question());
        say(Word.READY, "");
        if (model.impossible()) {
            say(Word.IMPOSSIBLE, "");
            say(Word.DONE, "");
            return;
        }
        CpSolver solver = new CpSolver();
        double used = (System.nanoTime() - from) / 1e9 + START;
        set(solver.getParameters(), task.limits(), Math.max(MUST_HAVE, task.limits().seconds() - used));
        solver.setLogCallback(line -> log(model, line));
        starts.accept(solver);
        boolean aims = task.question().aim().isPresent();
        CpSolverStatus status = solver.solve(model.model(), new CpSolverSolutionCallback() {
            @Override
            public void onSolutionCallback() {
                better(model, var -> value(var.it()));
            }
        });
        if (status == CpSolverStatus.MODEL_INVALID) {
            say(Word.FAILED, "the solver does not take the model: " + model.model().validate());
            return;
        }
        if (status == CpSolverStatus.INFEASIBLE) {
            say(Word.IMPOSSIBLE, "");
        } else if (aims) {
            bound(model, solver.response().getBestObjectiveBound());
        }
        say(Word.DONE, "");
    }

    /** Loads the library; then removes what was unpacked for it, where the platform allows that while it is in use. */
    private static void load() {
        try {
            Loader.loadNativeLibraries();
        } catch (RuntimeException e) {
            throw new IllegalStateException("the solver's library does not load: " + e.getMessage(), e);
        }
        String folder = System.getProperty(Launch.FOLDER);
        if (folder != null) {
            Leftovers.delete(Path.of(folder), false);
        }
    }

    private static void set(SatParameters.Builder parameters, SolverLimits limits, double seconds) {
        parameters.setMaxTimeInSeconds(seconds).setNumWorkers(limits.workers()).setRandomSeed(1)
                .setMaxMemoryInMb(limits.memory()).setLogSearchProgress(true).setLogToStdout(false)
                // Preparing the model for long gains less than the relaxation does in the same time.
                .setCpModelProbingLevel(0).setSymmetryLevel(0).setMaxPresolveIterations(1)
                // What went wrong in the solver's preparation with large numbers; see SolverModel's digits.
                .setPresolveInclusionWorkLimit(0);
        if (limits.workers() > 1) {
            parameters.addSubsolvers("max_lp").addSubsolvers("lb_tree_search");
        } else {
            parameters.setLinearizationLevel(2);
        }
        if (limits.steadyEffort() > 0) {
            parameters.setInterleaveSearch(true).setMaxDeterministicTime(limits.steadyEffort());
        }
    }

    private static void stopWhenClosed(BufferedReader in, CpSolver solver) {
        try {
            while (in.readLine() != null) {
                // Nothing more is expected.
            }
        } catch (IOException e) {
            // Closed as well.
        }
        solver.stopSearch();
    }

    private void log(SolverModel model, String text) {
        for (String line : text.lines().toList()) {
            Matcher matcher = BOUND.matcher(line);
            if (matcher.find()) {
                double shown = Double.parseDouble(matcher.group(1));
                bound(model, shown - SHOWN * Math.abs(shown));
            }
        }
    }

    private synchronized void bound(SolverModel model, double solvers) {
        if (solvers > told) {
            told = solvers;
            say(Word.BOUND, Double.toString(model.value(solvers)));
        }
    }

    private void better(SolverModel model, ToLongFunction<Var> values) {
        List<Integer> choice = model.choice(values);
        say(Word.BETTER, choice.stream().map(String::valueOf).collect(Collectors.joining(" ")));
    }
}
