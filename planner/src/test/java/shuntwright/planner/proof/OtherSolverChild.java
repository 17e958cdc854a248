package shuntwright.planner.proof;

import java.io.IOException;
import java.io.PrintStream;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import com.google.ortools.Loader;
import com.google.ortools.linearsolver.MPConstraint;
import com.google.ortools.linearsolver.MPObjective;
import com.google.ortools.linearsolver.MPSolver;
import com.google.ortools.linearsolver.MPSolverParameters;
import com.google.ortools.linearsolver.MPVariable;
import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/** Answers with another solver (SCIP) and a plain model: each slot's option, each line's number of pieces with its cost, in real numbers. */
final class OtherSolverChild {

    private static final double INFINITY = Double.POSITIVE_INFINITY;
    private static final int MOST_PIECES = 5;

    private final MPSolver solver = MPSolver.createSolver("SCIP");
    private final List<MPConstraint> use = new ArrayList<>();
    private final List<MPConstraint> pieces = new ArrayList<>();
    private final List<MPConstraint> sections = new ArrayList<>();
    private final Map<Integer, MPVariable> taps = new HashMap<>();

    private OtherSolverChild() {
    }

    public static void main(String[] args) throws IOException {
        Loader.loadNativeLibraries();
        BatchChild.answerAll((task, out) -> new OtherSolverChild().answer(Wire.read(task), out));
    }

    private void answer(Task task, PrintStream out) {
        Selection selection = task.selection();
        Aim aim = task.question().aim().orElseThrow();
        MPObjective objective = solver.objective();
        objective.setMinimization();
        selection.resources().forEach(each -> use
                .add(solver.makeConstraint(-INFINITY, each.limit().orElse(INFINITY) - each.fixed())));
        for (int line = 0; line < selection.lines().size(); line++) {
            orders(selection, line, aim instanceof Aim.Cost ? objective : null);
        }
        selection.pools().forEach(each -> packages(each, aim, objective));
        for (int slot = 0; slot < selection.slots().size(); slot++) {
            slot(selection, slot, aim, objective);
        }
        MPSolverParameters parameters = new MPSolverParameters();
        parameters.setDoubleParam(MPSolverParameters.DoubleParam.RELATIVE_MIP_GAP, 0);
        MPSolver.ResultStatus status = solver.solve(parameters);
        if (status == MPSolver.ResultStatus.OPTIMAL) {
            double fixed = aim instanceof Aim.Use(int resource) ? selection.resources().get(resource).fixed() : 0;
            out.println(Word.BOUND.line(Double.toString(objective.value() + fixed)));
        } else if (status == MPSolver.ResultStatus.INFEASIBLE) {
            out.println(Word.IMPOSSIBLE.line(""));
        } else {
            out.println(Word.FAILED.line(status.toString()));
        }
    }

    /** One binary for every number of pieces, at its cost. */
    private void orders(Selection selection, int line, @org.jspecify.annotations.Nullable MPObjective cost) {
        Selection.Line each = selection.lines().get(line);
        MPConstraint sum = solver.makeConstraint(-each.fixed(), -each.fixed());
        pieces.add(sum);
        MPConstraint one = solver.makeConstraint(1, 1);
        for (int n = 0; n <= MOST_PIECES * selection.slots().size() + each.fixed(); n++) {
            MPVariable ordered = solver.makeBoolVar("");
            one.setCoefficient(ordered, 1);
            sum.setCoefficient(ordered, -n);
            if (cost != null && n > 0) {
                cost.setCoefficient(ordered, selection.lineCost()
                        + EverySelection.leastCost(each.purchase(), n * selection.boards()));
            }
        }
    }

    private void packages(Selection.Pool pool, Aim aim, MPObjective objective) {
        MPVariable number = solver.makeIntVar(0, 1000, "");
        MPConstraint room = solver.makeConstraint(0, pool.sections() - 1);
        room.setCoefficient(number, pool.sections());
        sections.add(room);
        pieces.get(pool.line()).setCoefficient(number, 1);
        if (pool.resource() >= 0) {
            use.get(pool.resource()).setCoefficient(number, pool.amount());
            if (aim instanceof Aim.Use(int resource) && resource == pool.resource()) {
                objective.setCoefficient(number, pool.amount());
            }
        }
    }

    private void slot(Selection selection, int slot, Aim aim, MPObjective objective) {
        MPConstraint one = solver.makeConstraint(1, 1);
        int group = selection.menus().get(selection.slots().get(slot).menu()).group();
        MPConstraint tapped = solver.makeConstraint(0, group < 0 ? INFINITY : 0);
        if (group >= 0) {
            tapped.setCoefficient(taps.computeIfAbsent(group, _ -> solver.makeBoolVar("")), -1);
        }
        for (Option option : selection.options(slot)) {
            MPVariable taken = solver.makeBoolVar("");
            one.setCoefficient(taken, 1);
            option.lines().forEach((line, n) -> pieces.get(line).setCoefficient(taken, n));
            option.resources().forEach((resource, amount) -> use.get(resource).setCoefficient(taken, amount));
            for (int pool : option.pools()) {
                sections.get(pool).setCoefficient(taken, -1);
            }
            if (group >= 0 && option.value() == 1) {
                tapped.setCoefficient(taken, 1);
            }
            if (aim instanceof Aim.Use(int resource)) {
                objective.setCoefficient(taken, option.amount(resource));
            }
        }
    }
}
