package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.TreeSet;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/** Small invented selections with every kind of constraint; the same for the same seed. */
final class SmallSelections {

    static final int HEAT = 0;
    static final int SUPPLY = 1;
    private static final int LEFT = 2;
    private static final int RIGHT = 3;

    private final SplittableRandom random;
    private final Selection.Builder b;
    private final int slots;
    private final int most;

    private SmallSelections(long seed, int slots, int most) {
        random = new SplittableRandom(seed);
        this.slots = slots;
        this.most = most;
        b = new Selection.Builder(1 + random.nextInt(200), random.nextInt(3) * 5.0);
    }

    /**
     * @param slots how many
     * @param most  options in a menu
     * @param room  of the limits: 1 is about what a middling selection takes
     */
    static Selection of(long seed, int slots, int most, double room) {
        return new SmallSelections(seed, slots, most).build(room);
    }

    private Selection build(double room) {
        for (int i = 0; i < 4; i++) {
            b.line(new Selection.Line("R" + i, purchase(), i == 3 ? random.nextInt(2) : 0));
        }
        int dual = b.line(new Selection.Line("U dual", purchase(), 0));
        int single = b.line(new Selection.Line("U single", purchase(), random.nextInt(2)));
        b.resource(new Selection.Resource("heat", limit(room * slots * 0.5), random.nextInt(2) * 0.05));
        b.resource(new Selection.Resource("supply", limit(room * slots * 1.4), 0.1));
        b.resource(new Selection.Resource("left", OptionalDouble.of(room * slots * 0.3), 0));
        b.resource(new Selection.Resource("right", OptionalDouble.of(room * slots * 0.3), 0.01));
        b.even(LEFT);
        b.even(RIGHT);
        int[][] pools = new int[2][];
        for (int zone = 0; zone < 2; zone++) {
            pools[zone] = new int[]{b.pool(new Selection.Pool(dual, 2, SUPPLY, 1)),
                    b.pool(new Selection.Pool(single, 1, SUPPLY, 0.6)), b.pool(new Selection.Pool(0, 4, -1, 0))};
        }
        int group = random.nextBoolean() ? b.group(2) : -1;
        int menus = Math.max(1, slots - random.nextInt(3));
        for (int menu = 0; menu < menus; menu++) {
            int zone = random.nextInt(2);
            boolean grouped = group >= 0 && random.nextInt(3) == 0;
            List<Option> all = new ArrayList<>();
            int count = Math.max(1 + random.nextInt(most), grouped ? 2 : 1);
            for (int o = 0; o < count; o++) {
                all.add(option(zone, pools[zone], grouped ? o % 2 : Option.NO_VALUE));
            }
            b.menu(new Selection.Menu(all, grouped ? group : -1));
        }
        for (int slot = 0; slot < slots; slot++) {
            b.slot(new Selection.Slot("slot " + slot, slot < menus ? slot : random.nextInt(menus)));
        }
        return b.build();
    }

    private Option option(int zone, int[] pools, int value) {
        Map<Integer, Integer> lines = new HashMap<>();
        lines.put(random.nextInt(4), 1 + random.nextInt(3));
        lines.putIfAbsent(random.nextInt(4), 1);
        TreeSet<Integer> sections = new TreeSet<>();
        sections.add(pools[random.nextInt(3)]);
        if (random.nextInt(4) == 0) {
            sections.add(pools[random.nextInt(2)]);
        }
        double heat = random.nextDouble(0.1, 1);
        return new Option(lines, sections,
                Map.of(HEAT, heat, zone == 0 ? LEFT : RIGHT, heat, SUPPLY, random.nextDouble(0.1)),
                random.nextDouble(-0.1, 0.5), value);
    }

    private OptionalDouble limit(double value) {
        return random.nextInt(3) == 0 ? OptionalDouble.empty() : OptionalDouble.of(value * random.nextDouble(0.7, 1.5));
    }

    private Purchase purchase() {
        List<PriceBreak> breaks = new ArrayList<>();
        double price = random.nextDouble(0.1, 5);
        int from = 1;
        for (int i = 0; i < 1 + random.nextInt(4); i++) {
            // Prices have four decimals, as in catalogues.
            breaks.add(new PriceBreak(from, Math.rint(price * 1e4) / 1e4));
            from += 1 + random.nextInt(300);
            // Now and then more pieces cost more each; nobody says they may not.
            price *= random.nextDouble(0.5, 1.05);
        }
        return new Purchase("", breaks, 1 + random.nextInt(3) * 24, 1 + random.nextInt(100), "", "");
    }
}
