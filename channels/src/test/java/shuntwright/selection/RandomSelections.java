package shuntwright.selection;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.TreeSet;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;

/** Small invented selections with every kind of constraint; the same for the same seed. */
final class RandomSelections {

    static final int HEAT = 0;
    static final int SUPPLY = 1;
    static final int LEFT = 2;
    static final int RIGHT = 3;

    private final SplittableRandom random;

    RandomSelections(long seed) {
        random = new SplittableRandom(seed);
    }

    /**
     * @param slots   how many
     * @param options most in a menu
     * @param tight   limits as a share of what a middling selection takes
     */
    Selection small(int slots, int options, double tight) {
        Selection.Builder b = new Selection.Builder(1 + random.nextInt(200), random.nextInt(3) * 5.0);
        int shunts = 4;
        List<Integer> direct = new ArrayList<>();
        for (int i = 0; i < shunts; i++) {
            direct.add(b.line(new Selection.Line("R" + i, purchase(), 0)));
        }
        int amplifierA = b.line(new Selection.Line("U1", purchase(), 0));
        int amplifierB = b.line(new Selection.Line("U2", purchase(), random.nextInt(2)));
        b.resource(new Selection.Resource("heat", limit(tight * slots * 0.5), 0));
        b.resource(new Selection.Resource("supply", limit(tight * slots * 1.4), 0.1));
        b.resource(new Selection.Resource("left", OptionalDouble.of(tight * slots * 0.3), 0));
        b.resource(new Selection.Resource("right", OptionalDouble.of(tight * slots * 0.3), 0));
        b.even(LEFT);
        b.even(RIGHT);
        int[][] pools = new int[2][2];
        for (int zone = 0; zone < 2; zone++) {
            pools[zone][0] = b.pool(new Selection.Pool(amplifierA, 2, SUPPLY, 1));
            pools[zone][1] = b.pool(new Selection.Pool(amplifierB, 1, SUPPLY, 0.6));
        }
        int group = random.nextBoolean() ? b.group(2) : -1;
        int menus = Math.max(1, slots - random.nextInt(3));
        for (int m = 0; m < menus; m++) {
            int zone = random.nextInt(2);
            boolean grouped = group >= 0 && random.nextInt(3) == 0;
            List<Option> all = new ArrayList<>();
            int count = 1 + random.nextInt(options);
            for (int o = 0; o < Math.max(count, grouped ? 2 : 1); o++) {
                Map<Integer, Integer> lines = new HashMap<>();
                lines.put(direct.get(random.nextInt(shunts)), 1 + random.nextInt(3));
                if (random.nextInt(3) == 0) {
                    lines.put(direct.get(random.nextInt(shunts)), 1);
                }
                double heat = random.nextDouble(0.1, 1);
                Map<Integer, Double> resources = new HashMap<>();
                resources.put(HEAT, heat);
                resources.put(zone == 0 ? LEFT : RIGHT, heat);
                resources.put(SUPPLY, random.nextDouble(0.1));
                all.add(new Option(lines, new TreeSet<>(List.of(pools[zone][random.nextInt(2)])), resources,
                        random.nextDouble(-0.1, 0.5), grouped ? o % 2 : Option.NO_VALUE));
            }
            b.menu(new Selection.Menu(all, grouped ? group : -1));
        }
        for (int s = 0; s < slots; s++) {
            b.slot(new Selection.Slot("slot " + s, s < menus ? s : random.nextInt(menus)));
        }
        return b.build();
    }

    private OptionalDouble limit(double value) {
        return random.nextInt(3) == 0 ? OptionalDouble.empty() : OptionalDouble.of(value * random.nextDouble(0.7, 1.5));
    }

    private Purchase purchase() {
        List<PriceBreak> breaks = new ArrayList<>();
        double price = random.nextDouble(0.1, 5);
        int from = 1;
        for (int i = 0; i < 1 + random.nextInt(4); i++) {
            breaks.add(new PriceBreak(from, price));
            from += 1 + random.nextInt(300);
            price *= random.nextDouble(0.5, 1);
        }
        return new Purchase("", breaks, 1 + random.nextInt(3) * 24, 1 + random.nextInt(100), "", "");
    }
}
