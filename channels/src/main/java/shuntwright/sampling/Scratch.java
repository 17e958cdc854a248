package shuntwright.sampling;

import java.util.ArrayList;
import java.util.List;

/** Columns for intermediate results of one thread. */
public final class Scratch {

    private final List<double[]> columns = new ArrayList<>();

    /** Column number {@code index}, of {@link Draws#BLOCK} places with whatever was left in them. */
    public double[] column(int index) {
        while (columns.size() <= index) {
            columns.add(new double[Draws.BLOCK]);
        }
        return columns.get(index);
    }
}
