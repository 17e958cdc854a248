package shuntwright.sampling;

/** Selection by weight: what sorting and adding up would find, in time proportional to the number of values. */
final class WeightedRank {

    private WeightedRank() {
    }

    /**
     * The least value up to and including which the weights add up to {@code wanted}; the largest where all together do not.
     *
     * @param values  at least one, none of them NaN; rearranged
     * @param weights of the values, ≥ 0; rearranged with them
     */
    static double value(double[] values, double[] weights, double wanted) {
        int low = 0;
        int high = values.length - 1;
        double below = 0;
        double last = values[0];
        while (low <= high) {
            double pivot = middle(values[low], values[(low + high) >>> 1], values[high]);
            int less = low;
            int more = high;
            double sum = 0;
            double same = 0;
            for (int i = low; i <= more;) {
                double value = values[i];
                if (value < pivot) {
                    sum += weights[i];
                    swap(values, weights, i++, less++);
                } else if (value > pivot) {
                    swap(values, weights, i, more--);
                } else {
                    same += weights[i++];
                }
            }
            if (below + sum >= wanted && less > low) {
                high = less - 1;
            } else if (below + sum + same >= wanted) {
                return pivot;
            } else {
                below += sum + same;
                low = more + 1;
            }
            last = pivot;
        }
        return last;
    }

    private static double middle(double a, double b, double c) {
        return Math.max(Math.min(a, b), Math.min(Math.max(a, b), c));
    }

    private static void swap(double[] values, double[] weights, int i, int j) {
        double value = values[i];
        values[i] = values[j];
        values[j] = value;
        double weight = weights[i];
        weights[i] = weights[j];
        weights[j] = weight;
    }
}
