package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.List;

import com.google.ortools.sat.CpModel;

/** Variables of the solver's model and what must hold between them. */
final class SolverVars {

    final CpModel model = new CpModel();
    private final List<Var> all = new ArrayList<>();

    /** A whole number from 0. */
    Var whole(long most, long hint) {
        Var var = new Var(model.newIntVar(0, most, ""), most, hint);
        all.add(var);
        return var;
    }

    /** Whole factors. */
    void notNegative(Sum sum) {
        model.addGreaterOrEqual(sum.exact(), -sum.constant().longValueExact());
    }

    void equal(Sum sum, long value) {
        model.addEquality(sum.exact(), value);
    }

    void atMost(Sum sum, long value) {
        model.addLessOrEqual(sum.exact(), value);
    }

    /** The parts make up the whole. */
    void same(Sum whole, List<Sum> parts) {
        Sum difference = new Sum().add(-1, whole);
        parts.forEach(part -> difference.add(1, part));
        equal(difference, 0);
    }

    /** Hands all hints to the solver; they must be complete. */
    void hint() {
        all.forEach(each -> model.addHint(each.it(), each.hint()));
    }

    List<Var> all() {
        return all;
    }
}
