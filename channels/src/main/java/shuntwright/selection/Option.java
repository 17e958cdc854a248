package shuntwright.selection;

import java.util.Collection;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * One way to serve a slot: pieces of lines, sections of pools, amounts of resources. Immutable.
 */
public final class Option {

    /** A value of no tap. */
    public static final int NO_VALUE = -1;

    final int[] lines;
    final int[] pieces;
    final int[] pools;
    final int[] resources;
    final double[] amounts;
    final double margin;
    final int value;

    /**
     * @param lines     pieces of each line on one board, by line
     * @param pools     pools of which it takes one section each
     * @param resources amounts of each resource, by resource, in its unit
     * @param margin    slack of the slot with it, a share
     * @param value     of its group that it needs, or {@link #NO_VALUE}
     */
    public Option(Map<Integer, Integer> lines, Collection<Integer> pools, Map<Integer, Double> resources, double margin,
            int value) {
        SortedMap<Integer, Integer> byLine = new TreeMap<>(lines);
        SortedMap<Integer, Double> byResource = new TreeMap<>(resources);
        this.lines = byLine.keySet().stream().mapToInt(Integer::intValue).toArray();
        this.pieces = byLine.values().stream().mapToInt(Integer::intValue).toArray();
        this.pools = pools.stream().mapToInt(Integer::intValue).sorted().toArray();
        this.resources = byResource.keySet().stream().mapToInt(Integer::intValue).toArray();
        this.amounts = byResource.values().stream().mapToDouble(Double::doubleValue).toArray();
        for (int i = 1; i < this.pools.length; i++) {
            if (this.pools[i] == this.pools[i - 1]) {
                throw new IllegalArgumentException("an option takes at most one section of a pool");
            }
        }
        this.margin = margin;
        this.value = value;
    }

    /** Amount of a resource, 0 where it takes none. */
    public double amount(int resource) {
        for (int i = 0; i < resources.length; i++) {
            if (resources[i] == resource) {
                return amounts[i];
            }
        }
        return 0;
    }

    /** Pieces by line. */
    public Map<Integer, Integer> lines() {
        SortedMap<Integer, Integer> map = new TreeMap<>();
        for (int i = 0; i < lines.length; i++) {
            map.put(lines[i], pieces[i]);
        }
        return map;
    }

    /** Pools of which it takes a section. */
    public int[] pools() {
        return pools.clone();
    }

    /** Amounts by resource. */
    public Map<Integer, Double> resources() {
        SortedMap<Integer, Double> map = new TreeMap<>();
        for (int i = 0; i < resources.length; i++) {
            map.put(resources[i], amounts[i]);
        }
        return map;
    }

    public double margin() {
        return margin;
    }

    public int value() {
        return value;
    }
}
