package shuntwright.bench;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/**
 * Invented boards for benchmarks of the board-wide choice, the same for the same number of channels: 400 shunts, 30 amplifiers, 16
 * comparators and 80 resistor values; 24 to 440 options a channel; four zones, supply, price breaks, packs.
 */
public final class SeededSelection {

    /** Resource: heat of the board. */
    public static final int HEAT = 0;
    private static final int SUPPLY = 1;
    private static final int ZONES = 4;
    private static final int SHUNTS = 400;
    private static final int AMPLIFIERS = 30;
    private static final int COMPARATORS = 16;
    private static final int VALUES = 80;

    private final SplittableRandom random;
    private final Selection.Builder b;
    private final int channels;
    private final List<Double> ohms = new ArrayList<>();
    private final int[][] amplifierPools = new int[ZONES][AMPLIFIERS];
    private final int[][] comparatorPools = new int[ZONES][COMPARATORS];

    private SeededSelection(int channels, long seed) {
        this.channels = channels;
        random = new SplittableRandom(seed);
        b = new Selection.Builder(250, 25);
    }

    public static Selection of(int channels, int distinct, long seed) {
        return new SeededSelection(channels, seed).build(distinct);
    }

    private Selection build(int distinct) {
        for (int i = 0; i < SHUNTS; i++) {
            ohms.add(1e-4 * Math.pow(10, 3.0 * i / SHUNTS));
            b.line(new Selection.Line("shunt " + i, purchase(random.nextDouble(0.2, 2)), 0));
        }
        int amplifiers = b.line(new Selection.Line("amplifier 0", purchase(1.2), 0));
        for (int i = 1; i < AMPLIFIERS; i++) {
            b.line(new Selection.Line("amplifier " + i, purchase(random.nextDouble(0.6, 3)), 0));
        }
        int comparators = amplifiers + AMPLIFIERS;
        for (int i = 0; i < COMPARATORS; i++) {
            b.line(new Selection.Line("comparator " + i, purchase(random.nextDouble(0.3, 1.5)), 0));
        }
        int values = comparators + COMPARATORS;
        for (int i = 0; i < VALUES; i++) {
            b.line(new Selection.Line("value " + i, purchase(0.01), 0));
        }
        double[] load = new double[distinct];
        double heat = 0;
        double[] zoneHeat = new double[ZONES];
        for (int i = 0; i < distinct; i++) {
            load[i] = Math.exp(random.nextDouble(0, Math.log(150)));
            double middling = load[i] * 15e-3 * channels / distinct;
            heat += middling;
            zoneHeat[i % ZONES] += middling;
        }
        b.resource(new Selection.Resource("heat", OptionalDouble.of(heat), 0));
        b.resource(new Selection.Resource("supply", OptionalDouble.of(1.5e-3 * channels), 0.01));
        for (int zone = 0; zone < ZONES; zone++) {
            b.even(b.resource(new Selection.Resource("zone " + zone, OptionalDouble.of(zoneHeat[zone] * 1.1), 0)));
            for (int i = 0; i < AMPLIFIERS; i++) {
                amplifierPools[zone][i] = b
                        .pool(new Selection.Pool(amplifiers + i, 1 + i % 3 / 2, SUPPLY, 3e-4 + 1e-5 * i));
            }
            for (int i = 0; i < COMPARATORS; i++) {
                comparatorPools[zone][i] = b.pool(new Selection.Pool(comparators + i, 1 + i % 2, SUPPLY, 1e-4));
            }
        }
        for (int i = 0; i < distinct; i++) {
            b.menu(new Selection.Menu(options(load[i], i % ZONES, values), -1));
        }
        for (int i = 0; i < channels; i++) {
            b.slot(new Selection.Slot("channel " + i, i % distinct));
        }
        return b.build();
    }

    /** Every shunt with every amplifier with every comparator that suit the channel, as in a real catalogue. */
    private List<Option> options(double load, int zone, int values) {
        List<Option> options = new ArrayList<>();
        int shunts = random.nextInt(4, 12);
        int amplifiers = random.nextInt(3, 9);
        int comparators = random.nextInt(2, 6);
        int firstAmplifier = random.nextInt(AMPLIFIERS);
        int firstComparator = random.nextInt(COMPARATORS);
        double volt = 5e-3 * Math.exp(random.nextDouble(0, 1));
        for (int i = 0; i < shunts; i++) {
            int pieces = 1 + random.nextInt(3);
            double wanted = volt * Math.exp(0.2 * i) / load * pieces;
            int shunt = Math.min(SHUNTS - 1, Math.max(0, (int) Math.round(Math.log10(wanted / 1e-4) / 3 * SHUNTS)));
            double heat = load * load * ohms.get(shunt) / pieces;
            for (int j = 0; j < amplifiers; j++) {
                int amplifier = (firstAmplifier + j) % AMPLIFIERS;
                Map<Integer, Integer> lines = new HashMap<>();
                lines.put(shunt, pieces);
                lines.merge(values + random.nextInt(VALUES), 1, Integer::sum);
                lines.merge(values + random.nextInt(VALUES), 1, Integer::sum);
                for (int k = 0; k < comparators; k++) {
                    options.add(new Option(lines,
                            List.of(amplifierPools[zone][amplifier],
                                    comparatorPools[zone][(firstComparator + k) % COMPARATORS]),
                            Map.of(HEAT, heat, 2 + zone, heat, SUPPLY, 2e-4), random.nextDouble(0.3), Option.NO_VALUE));
                }
            }
        }
        return options;
    }

    private Purchase purchase(double price) {
        List<PriceBreak> breaks = new ArrayList<>();
        double each = price;
        for (int from : new int[]{1, 100, 1000, 5000, 25000}) {
            breaks.add(new PriceBreak(from, each));
            each *= random.nextDouble(0.6, 0.95);
        }
        return new Purchase("", breaks, random.nextBoolean() ? 1 : 500, 1, "", "");
    }
}
