package shuntwright.selection;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.parts.Purchase;

/**
 * What is to be selected: slots with their menus of options, and what all of them share. Immutable once built.
 */
public final class Selection {

    /**
     * A part number as it is ordered.
     *
     * @param name     part number
     * @param purchase prices, pack and minimum order
     * @param fixed    pieces on one board whatever is selected
     */
    public record Line(String name, Purchase purchase, int fixed) {}

    /**
     * Packages of a line whose sections several slots share.
     *
     * @param line     ordered
     * @param sections of one package, ≥ 1
     * @param resource that one package takes of, or -1
     * @param amount   it takes
     */
    public record Pool(int line, int sections, int resource, double amount) {}

    /**
     * Something all slots take of.
     *
     * @param name  in words
     * @param limit largest use; empty for none
     * @param fixed used whatever is selected
     */
    public record Resource(String name, OptionalDouble limit, double fixed) {

        /** The limit; infinite for none. */
        public double most() {
            return limit.orElse(Double.POSITIVE_INFINITY);
        }
    }

    /**
     * Where one option is to be selected.
     *
     * @param name in words
     * @param menu index of its menu
     */
    public record Slot(String name, int menu) {}

    /**
     * Options of one kind of slot.
     *
     * @param options at least one
     * @param group   whose value all its options name, or -1
     */
    public record Menu(List<Option> options, int group) {
        public Menu {
            options = List.copyOf(options);
            if (options.isEmpty()) {
                throw new IllegalArgumentException("a menu needs at least one option");
            }
        }
    }

    private final List<Line> lines;
    private final List<Pool> pools;
    private final List<Resource> resources;
    private final List<Menu> menus;
    private final List<Slot> slots;
    private final List<Integer> groups;
    private final List<Integer> even;
    private final int boards;
    private final double lineCost;

    private Selection(Builder b) {
        lines = List.copyOf(b.lines);
        pools = List.copyOf(b.pools);
        resources = List.copyOf(b.resources);
        menus = List.copyOf(b.menus);
        slots = List.copyOf(b.slots);
        groups = List.copyOf(b.groups);
        even = List.copyOf(b.even);
        boards = b.boards;
        lineCost = b.lineCost;
    }

    public List<Line> lines() {
        return lines;
    }

    public List<Pool> pools() {
        return pools;
    }

    public List<Resource> resources() {
        return resources;
    }

    public List<Menu> menus() {
        return menus;
    }

    public List<Slot> slots() {
        return slots;
    }

    /** Number of values of each group. */
    public List<Integer> groups() {
        return groups;
    }

    /** Resources that are to be used evenly; each has a limit. */
    public List<Integer> even() {
        return even;
    }

    /** Boards built at once. */
    public int boards() {
        return boards;
    }

    /** Cost of one more distinct line. */
    public double lineCost() {
        return lineCost;
    }

    /** Options of a slot. */
    public List<Option> options(int slot) {
        return menu(slot).options();
    }

    Menu menu(int slot) {
        return menus.get(slots.get(slot).menu());
    }

    /** Cost of a line of which one board takes so many pieces, with the cost of its being there; 0 for none. */
    public double cost(int line, int pieces) {
        if (pieces == 0) {
            return 0;
        }
        int needed = (int) Math.min(Integer.MAX_VALUE, (long) pieces * boards);
        return lines.get(line).purchase().cheapestOrder(needed).cost() + lineCost;
    }

    /** The same with only some of the slots and limits. */
    public Selection with(List<Integer> keptSlots, List<Integer> keptLimits) {
        Builder b = new Builder(boards, lineCost);
        b.lines.addAll(lines);
        b.pools.addAll(pools);
        for (int r = 0; r < resources.size(); r++) {
            Resource each = resources.get(r);
            b.resources.add(
                    keptLimits.contains(r) ? each : new Resource(each.name(), OptionalDouble.empty(), each.fixed()));
        }
        b.menus.addAll(menus);
        b.groups.addAll(groups);
        keptSlots.forEach(slot -> b.slots.add(slots.get(slot)));
        even.stream().filter(keptLimits::contains).forEach(b.even::add);
        return b.build();
    }

    /** Builds a selection part by part; each method answers the index of what it adds. */
    public static final class Builder {
        private final List<Line> lines = new ArrayList<>();
        private final List<Pool> pools = new ArrayList<>();
        private final List<Resource> resources = new ArrayList<>();
        private final List<Menu> menus = new ArrayList<>();
        private final List<Slot> slots = new ArrayList<>();
        private final List<Integer> groups = new ArrayList<>();
        private final List<Integer> even = new ArrayList<>();
        private final int boards;
        private final double lineCost;

        /**
         * @param boards   built at once, ≥ 1
         * @param lineCost cost of one more distinct line, ≥ 0
         */
        public Builder(int boards, double lineCost) {
            this.boards = boards;
            this.lineCost = lineCost;
        }

        public int line(Line line) {
            lines.add(line);
            return lines.size() - 1;
        }

        public int pool(Pool pool) {
            pools.add(pool);
            return pools.size() - 1;
        }

        public int resource(Resource resource) {
            resources.add(resource);
            return resources.size() - 1;
        }

        /** A resource with a limit that counts for {@link Aim.LargestShare}. */
        public void even(int resource) {
            even.add(resource);
        }

        /** @param values how many there are, ≥ 1 */
        public int group(int values) {
            groups.add(values);
            return groups.size() - 1;
        }

        public int menu(Menu menu) {
            menus.add(menu);
            return menus.size() - 1;
        }

        public int slot(Slot slot) {
            slots.add(slot);
            return slots.size() - 1;
        }

        public Selection build() {
            return new Selection(this);
        }
    }
}
