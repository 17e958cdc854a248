package shuntwright.sampling;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;

/** Draws the columns of a model's inputs, block by block. Safe for several threads. */
final class Columns {

    private final Column[] columns;

    /** How one column comes about. */
    private sealed interface Column {

        /** @param values the same in every block */
        @SuppressWarnings("ArrayRecordComponent")
        record Constant(double[] values) implements Column {}

        /** Uniform between limits, the common case. */
        record Uniform(long key, double from, double width) implements Column {}

        /** Any other independent one: mid + half × deviation. */
        record Shaped(long key, double mid, double half, Distribution distribution) implements Column {}

        /** A normal or t piece of a reel: √r·z₀ + √(1−r)·z is normal, and is given its distribution. */
        record JointlyNormal(long key, long reel, double correlation, double mid, double half,
                Distribution distribution)
                implements
                    Column {}

        /**
         * Any other piece of a reel: with probability √r it takes the reel's own draw, else one of its own, so that two pieces
         * have the correlation r whatever the distribution (M. Fréchet's family of joint distributions, 1958).
         */
        record OftenAlike(long key, long reel, long choice, double share, double mid, double half,
                Distribution distribution)
                implements
                    Column {}
    }

    Columns(List<Variable> variables, long seed) {
        Map<Double, double[]> constants = new HashMap<>();
        columns = variables.stream().map(each -> column(each, seed, constants)).toArray(Column[]::new);
    }

    private static Column column(Variable variable, long seed, Map<Double, double[]> constants) {
        double width = variable.limits().width();
        double mid = variable.limits().mid();
        if (width == 0) {
            return new Column.Constant(constants.computeIfAbsent(mid, value -> {
                double[] column = new double[Draws.BLOCK];
                Arrays.fill(column, value);
                return column;
            }));
        }
        long key = Draws.key(seed, variable.key());
        if (variable.reel().isPresent()) {
            Reel reel = variable.reel().get();
            long common = Draws.key(seed, reel.name());
            return variable.distribution().bounded()
                    ? new Column.OftenAlike(key, common, Draws.key(seed, "choice of " + variable.key()),
                            Math.sqrt(reel.correlation()), mid, width / 2, variable.distribution())
                    : new Column.JointlyNormal(key, common, reel.correlation(), mid, width / 2,
                            variable.distribution());
        }
        return variable.distribution() instanceof Distribution.Uniform
                ? new Column.Uniform(key, variable.limits().min(), width)
                : new Column.Shaped(key, mid, width / 2, variable.distribution());
    }

    /** How many. */
    int size() {
        return columns.length;
    }

    /** True when the column is the same number in every trial. */
    boolean constant(int column) {
        return columns[column] instanceof Column.Constant;
    }

    /** Columns to draw into; constant ones already have their values and share their array. */
    double[][] allocate() {
        double[][] x = new double[columns.length][];
        for (int i = 0; i < x.length; i++) {
            x[i] = columns[i] instanceof Column.Constant(double[] values) ? values : new double[Draws.BLOCK];
        }
        return x;
    }

    /** Draws one block of all columns. */
    void draw(int block, int stream, Draws draws, Scratch scratch, double[][] x) {
        for (int i = 0; i < columns.length; i++) {
            draw(i, block, stream, draws, scratch, x[i]);
        }
    }

    /** Draws one block of one column. */
    void draw(int column, int block, int stream, Draws draws, Scratch scratch, double[] into) {
        switch (columns[column]) {
            case Column.Constant _ -> {
                // Has its values already.
            }
            case Column.Uniform(long key, double from, double width) -> draws.uniform(key, block, stream, from, width,
                    into);
            case Column.Shaped(long key, double mid, double half, Distribution distribution) -> {
                draws.uniform(key, block, stream, 0, 1, into);
                Shape.apply(distribution, into);
                scale(mid, half, into);
            }
            case Column.JointlyNormal c -> jointlyNormal(c, block, stream, draws, scratch.column(0), into);
            case Column.OftenAlike c -> {
                double[] common = scratch.column(0);
                draws.uniform(c.reel(), block, stream, 0, 1, common);
                draws.uniform(c.key(), block, stream, 0, 1, into);
                draws.choose(c.choice(), block, stream, c.share(), common, into);
                Shape.apply(c.distribution(), into);
                scale(c.mid(), c.half(), into);
            }
        }
    }

    private static void jointlyNormal(Column.JointlyNormal c, int block, int stream, Draws draws, double[] common,
            double[] into) {
        draws.uniform(c.reel(), block, stream, 0, 1, common);
        draws.uniform(c.key(), block, stream, 0, 1, into);
        double whole = Math.sqrt(c.correlation());
        double own = Math.sqrt(1 - c.correlation());
        for (int j = 0; j < into.length; j++) {
            into[j] = whole * Normal.quantile(common[j]) + own * Normal.quantile(into[j]);
        }
        Shape.applyToNormal(c.distribution(), into);
        scale(c.mid(), c.half(), into);
    }

    private static void scale(double mid, double half, double[] column) {
        for (int j = 0; j < column.length; j++) {
            column[j] = mid + half * column[j];
        }
    }
}
