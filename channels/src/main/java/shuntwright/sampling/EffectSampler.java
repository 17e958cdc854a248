package shuntwright.sampling;

import java.util.ArrayList;
import java.util.List;

/**
 * First-order and total effect indices of all inputs on all outputs. With two independent sets of trials A and B, and A with one
 * column taken from B: first order by A. Saltelli et al., Comput. Phys. Commun. 181 (2010), table 2 (b); total by M. J. W. Jansen,
 * Comput. Phys. Commun. 117 (1999). Drawn once, evaluated once for each input.
 */
final class EffectSampler {

    private static final int BLOCKS = 32;
    private static final int OTHER = 1;

    private final Model model;
    private final Columns columns;
    private final Draws draws = new Draws();
    private final Scratch scratch = new Scratch();
    private final List<List<Integer>> groups = new ArrayList<>();

    EffectSampler(Model model, List<Variable> variables, long seed) {
        this.model = model;
        this.columns = new Columns(variables, seed);
        List<String> reels = new ArrayList<>();
        for (int i = 0; i < variables.size(); i++) {
            if (columns.constant(i)) {
                continue;
            }
            String reel = variables.get(i).reel().map(each -> each.name()).orElse("");
            int known = reel.isEmpty() ? -1 : reels.indexOf(reel);
            if (known >= 0) {
                groups.get(known).add(i);
            } else {
                reels.add(reel);
                groups.add(new ArrayList<>(List.of(i)));
            }
        }
    }

    /** Indices of one group of columns that move together. */
    record Index(double first, double firstError, double total, double totalError) {
        static final Index NONE = new Index(0, 0, 0, 0);
    }

    /** By output, by column; constant columns have none. */
    List<List<Index>> indices(Watch watch) {
        int outputs = model.outputs();
        double[][][] firsts = new double[outputs][groups.size()][BLOCKS];
        double[][][] totals = new double[outputs][groups.size()][BLOCKS];
        double[] sum = new double[outputs];
        double[] squares = new double[outputs];
        long[] values = new long[outputs];
        double[] centres = centres();
        double[][] a = columns.allocate();
        double[][] b = columns.allocate();
        double[][] ya = new double[outputs][Draws.BLOCK];
        double[][] yb = new double[outputs][Draws.BLOCK];
        double[][] mixed = new double[outputs][Draws.BLOCK];
        for (int block = 0; block < BLOCKS; block++) {
            if (watch.cancelled()) {
                throw new MonteCarlo.Cancelled();
            }
            columns.draw(block, 0, draws, scratch, a);
            columns.draw(block, OTHER, draws, scratch, b);
            model.evaluate(a, Draws.BLOCK, ya, scratch);
            model.evaluate(b, Draws.BLOCK, yb, scratch);
            for (int o = 0; o < outputs; o++) {
                for (double[] column : List.of(ya[o], yb[o])) {
                    for (int j = 0; j < Draws.BLOCK; j++) {
                        if (Double.isFinite(column[j])) {
                            double away = column[j] - centres[o];
                            column[j] = away;
                            sum[o] += away;
                            squares[o] += away * away;
                            values[o]++;
                        }
                    }
                }
            }
            for (int g = 0; g < groups.size(); g++) {
                double[][] x = a.clone();
                for (int column : groups.get(g)) {
                    x[column] = b[column];
                }
                model.evaluate(x, Draws.BLOCK, mixed, scratch);
                for (int o = 0; o < outputs; o++) {
                    products(ya[o], yb[o], mixed[o], centres[o], firsts[o][g], totals[o][g], block);
                }
            }
        }
        List<List<Index>> indices = new ArrayList<>();
        for (int o = 0; o < outputs; o++) {
            double mean = values[o] == 0 ? 0 : sum[o] / values[o];
            double variance = values[o] == 0 ? 0 : squares[o] / values[o] - mean * mean;
            indices.add(byColumn(firsts[o], totals[o], variance));
        }
        return indices;
    }

    /** Outputs at the middle of the first block, near which differences keep their digits. */
    private double[] centres() {
        double[][] x = columns.allocate();
        double[][] y = new double[model.outputs()][Draws.BLOCK];
        columns.draw(0, 0, draws, scratch, x);
        model.evaluate(x, Draws.BLOCK, y, scratch);
        double[] centres = new double[y.length];
        for (int o = 0; o < y.length; o++) {
            double sum = 0;
            int there = 0;
            for (double value : y[o]) {
                if (Double.isFinite(value)) {
                    sum += value;
                    there++;
                }
            }
            centres[o] = there == 0 ? 0 : sum / there;
        }
        return centres;
    }

    private static void products(double[] ya, double[] yb, double[] mixed, double centre, double[] first,
            double[] total, int block) {
        double product = 0;
        double difference = 0;
        int there = 0;
        for (int j = 0; j < ya.length; j++) {
            double m = mixed[j] - centre;
            if (Double.isFinite(ya[j]) && Double.isFinite(yb[j]) && Double.isFinite(m)) {
                product += yb[j] * (m - ya[j]);
                difference += (ya[j] - m) * (ya[j] - m) / 2;
                there++;
            }
        }
        first[block] = there == 0 ? 0 : product / there;
        total[block] = there == 0 ? 0 : difference / there;
    }

    private List<Index> byColumn(double[][] firsts, double[][] totals, double variance) {
        List<Index> all = new ArrayList<>();
        for (int i = 0; i < columns.size(); i++) {
            all.add(Index.NONE);
        }
        for (int g = 0; variance > 0 && g < groups.size(); g++) {
            Index index = new Index(mean(firsts[g]) / variance, error(firsts[g]) / variance,
                    mean(totals[g]) / variance, error(totals[g]) / variance);
            for (int column : groups.get(g)) {
                all.set(column, index);
            }
        }
        return all;
    }

    private static double mean(double[] values) {
        double sum = 0;
        for (double value : values) {
            sum += value;
        }
        return sum / values.length;
    }

    private static double error(double[] values) {
        double mean = mean(values);
        double squares = 0;
        for (double value : values) {
            squares += (value - mean) * (value - mean);
        }
        return Math.sqrt(squares / (values.length - 1.0) / values.length);
    }
}
