package shuntwright.planner.proof;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

import shuntwright.selection.Selection;

/**
 * One line in the solver's model: how it is ordered for what the slots take of it. Only one price tier is open. What each menu
 * takes is split by tier, and taken of a tier only when that one is open, which makes the relaxation close; where prices differ by little,
 * only the sum of pieces is split, which makes it quick.
 */
final class OrderModel {

    private final Selection selection;
    private final int line;
    private final SolverVars vars;
    /** Slots of a menu that take a number of pieces, by menu and pieces. */
    private final Map<Integer, Map<Integer, Sum>> direct = new TreeMap<>();
    /** Slots of a menu that take a section of a pool, by pool and menu. */
    private final Map<Integer, Map<Integer, Sum>> sections = new TreeMap<>();
    private final Map<Integer, Integer> slots = new HashMap<>();
    private final int cap;
    private int hintPieces;

    /** Packages of each of the line's pools, after {@link #build}. */
    final Map<Integer, Sum> packages = new TreeMap<>();
    /** Cost of ordering, with the line's being there. */
    final Sum cost = new Sum();
    /** 1 when the line is there. */
    final Sum there = new Sum();

    /** @param cap most pieces of it on one board */
    OrderModel(Selection selection, int line, int cap, SolverVars vars) {
        this.selection = selection;
        this.line = line;
        this.cap = cap;
        this.vars = vars;
    }

    /** Slots of a menu, of which there are so many, take pieces with an option. */
    void takes(int menu, int count, int pieces, Var option) {
        slots.put(menu, count);
        direct.computeIfAbsent(menu, _ -> new TreeMap<>()).computeIfAbsent(pieces, _ -> new Sum()).add(1, option);
    }

    /** Slots of a menu, of which there are so many, take a section of a pool of this line with an option. */
    void takesSection(int pool, int menu, int count, Var option) {
        slots.put(menu, count);
        sections.computeIfAbsent(pool, _ -> new TreeMap<>()).computeIfAbsent(menu, _ -> new Sum()).add(1, option);
    }

    /**
     * @param leastSpread between prices of a piece from which on what is taken is split by tier
     * @param money       false when it does not count what and whether is ordered, only how many packages of pools there are
     */
    void build(boolean money, double leastSpread) {
        int fixed = selection.lines().get(line).fixed();
        if (!money || cap == 0) {
            for (int pool : sections.keySet()) {
                packages.put(pool, packagesFor(pool, List.copyOf(sections.getOrDefault(pool, Map.of()).values())));
            }
            return;
        }
        hintPieces = fixed + hintPieces();
        List<OrderTier> tiers = OrderTier.of(selection, line, cap);
        int hinted = OrderTier.cheapest(tiers, hintPieces, selection.boards());
        boolean split = tiers.size() > 1 && spread(tiers) > leastSpread;
        Sum opened = new Sum();
        List<Tier> all = new ArrayList<>();
        for (int t = 0; t < tiers.size(); t++) {
            Tier tier = new Tier(tiers.get(t), t == hinted, split);
            all.add(tier);
            opened.add(1, tier.open);
        }
        there.add(1, opened);
        if (fixed > 0) {
            vars.equal(opened, 1);
        } else {
            vars.atMost(opened, 1);
        }
        if (split) {
            all.forEach(tier -> tier.buy(tier.pieces(opened).add(fixed, tier.open)));
            direct.forEach((menu, byPieces) -> byPieces.forEach(
                    (pieces, taken) -> vars.same(taken, all.stream().map(each -> each.taken(menu, pieces)).toList())));
            sections.forEach((pool, byMenu) -> byMenu.forEach((menu, taken) -> vars.same(taken,
                    all.stream().map(each -> each.takenSections(pool, menu)).toList())));
            for (int pool : sections.keySet()) {
                Sum sum = new Sum();
                all.forEach(each -> sum.add(1, each.packagesOf(pool)));
                packages.put(pool, sum);
            }
        } else {
            together(all, opened, fixed);
        }
    }

    /** What is taken is not split by tier, only the sum of pieces is. */
    private void together(List<Tier> all, Sum opened, int fixed) {
        Tier first = all.getFirst();
        Sum pieces = first.pieces(opened);
        sections.keySet().forEach(pool -> packages.put(pool, first.packagesOf(pool)));
        if (all.size() == 1) {
            first.buy(pieces.add(fixed, first.open));
            return;
        }
        List<Sum> parts = new ArrayList<>();
        for (Tier tier : all) {
            Sum part = Sum.of(vars.whole(tier.tier.most(), tier.hinted ? hintPieces : 0));
            tier.buy(part);
            parts.add(new Sum().add(1, part).add(-fixed, tier.open));
        }
        vars.same(pieces, parts);
    }

    /** By how much a piece on each board costs more in the first tier than in the last. */
    private double spread(List<OrderTier> tiers) {
        return perPiece(tiers.getFirst()) - perPiece(tiers.getLast());
    }

    private double perPiece(OrderTier tier) {
        return tier.packs(tier.most(), selection.boards()) * (double) tier.pack() * tier.price() / tier.most();
    }

    private int hintPieces() {
        int sum = 0;
        for (Map<Integer, Sum> byPieces : direct.values()) {
            for (Map.Entry<Integer, Sum> each : byPieces.entrySet()) {
                sum += each.getKey() * (int) each.getValue().hint();
            }
        }
        for (Map.Entry<Integer, Map<Integer, Sum>> each : sections.entrySet()) {
            int taken = each.getValue().values().stream().mapToInt(all -> (int) all.hint()).sum();
            sum += Math.ceilDiv(taken, selection.pools().get(each.getKey()).sections());
        }
        return sum;
    }

    /** Packages of a pool for sections taken of it. */
    private Sum packagesFor(int pool, List<Sum> menus) {
        Sum taken = new Sum();
        menus.forEach(each -> taken.add(1, each));
        int size = selection.pools().get(pool).sections();
        if (size == 1) {
            return taken;
        }
        Var number = vars.whole(Math.ceilDiv(taken.most().longValue(), size), Math.ceilDiv(taken.hint(), size));
        vars.notNegative(new Sum().add(size, number).add(-1, taken));
        return Sum.of(number);
    }

    /** One price tier and, if split, what is taken of it; if not, what is taken of all tiers. */
    private final class Tier {
        private final OrderTier tier;
        private final boolean hinted;
        private final boolean split;
        private final Var open;
        private final Map<List<Integer>, Sum> parts = new HashMap<>();
        private final Map<Integer, Sum> poolPackages = new HashMap<>();

        Tier(OrderTier tier, boolean hinted, boolean split) {
            this.tier = tier;
            this.hinted = hinted;
            this.split = split;
            open = vars.whole(1, hinted ? 1 : 0);
        }

        private int most() {
            return split ? tier.most() : cap;
        }

        Sum taken(int menu, int pieces) {
            Sum all = direct.getOrDefault(menu, Map.of()).getOrDefault(pieces, new Sum());
            return part(List.of(menu, pieces), all, Math.min(slots.getOrDefault(menu, 0), most() / pieces));
        }

        Sum takenSections(int pool, int menu) {
            Sum all = sections.getOrDefault(pool, Map.of()).getOrDefault(menu, new Sum());
            return part(List.of(pool, menu, -1), all, slots.getOrDefault(menu, 0));
        }

        private Sum part(List<Integer> key, Sum all, int most) {
            return split
                    ? parts.computeIfAbsent(key, _ -> Sum.of(vars.whole(most, hinted ? all.hint() : 0)))
                    : all;
        }

        Sum packagesOf(int pool) {
            return poolPackages.computeIfAbsent(pool, _ -> packagesFor(pool, sections.getOrDefault(pool, Map.of())
                    .keySet().stream().map(menu -> takenSections(pool, menu)).toList()));
        }

        /** Pieces the slots take, only when the tier, or one of them, is open. */
        Sum pieces(Sum opened) {
            Sum needed = split ? Sum.of(open) : opened;
            Sum pieces = new Sum();
            direct.forEach((menu, byPieces) -> {
                Sum ofMenu = new Sum();
                byPieces.keySet().forEach(each -> {
                    pieces.add(each, taken(menu, each));
                    ofMenu.add(1, taken(menu, each));
                });
                int least = byPieces.keySet().iterator().next();
                onlyWhen(needed, ofMenu, Math.min(slots.getOrDefault(menu, 0), most() / least));
            });
            sections.forEach((pool, byMenu) -> {
                byMenu.keySet()
                        .forEach(menu -> onlyWhen(needed, takenSections(pool, menu), slots.getOrDefault(menu, 0)));
                pieces.add(1, packagesOf(pool));
            });
            return pieces;
        }

        private void onlyWhen(Sum opened, Sum taken, int most) {
            vars.notNegative(new Sum().add(most, opened).add(-1, taken));
        }

        /** The order for so many pieces on each board, none when the tier is not open. */
        void buy(Sum pieces) {
            vars.notNegative(new Sum().add(1, pieces).add(-tier.least(), open));
            vars.notNegative(new Sum().add(tier.most(), open).add(-1, pieces));
            int boards = selection.boards();
            BigDecimal packCost = BigDecimal.valueOf(tier.price()).multiply(BigDecimal.valueOf(tier.pack()));
            cost.add(BigDecimal.valueOf(selection.lineCost()), open);
            if (tier.constant(boards)) {
                cost.add(packCost.multiply(BigDecimal.valueOf(tier.packs(tier.least(), boards))), open);
                return;
            }
            Var packs = vars.whole(tier.mostPacks(), hinted ? tier.packs(hintPieces, boards) : 0);
            cost.add(packCost, packs);
            vars.notNegative(new Sum().add(tier.mostPacks(), open).add(-1, packs));
            vars.notNegative(new Sum().add(1, packs).add(-tier.leastPacks(), open));
            vars.notNegative(new Sum().add(tier.pack(), packs).add(-boards, pieces));
            hull(pieces, packs, boards);
        }

        /** The convex hull from below of packs over pieces, which packs of many pieces lift above pieces by pack size. */
        private void hull(Sum pieces, Var packs, int boards) {
            int at = tier.least();
            while (at < tier.most()) {
                int next = at + 1;
                for (int to = at + 2; to <= tier.most(); to++) {
                    // Compare slopes from at: the least, and of equal ones the farthest.
                    long one = (tier.packs(to, boards) - tier.packs(at, boards)) * (next - at);
                    long other = (tier.packs(next, boards) - tier.packs(at, boards)) * (to - at);
                    next = one <= other ? to : next;
                }
                long rise = tier.packs(next, boards) - tier.packs(at, boards);
                long run = (long) next - at;
                // packs ≥ packs(at) + rise/run·(pieces − at), only when open
                vars.notNegative(new Sum().add(run, packs).add(-rise, pieces)
                        .add(rise * at - run * tier.packs(at, boards), open));
                at = next;
            }
        }
    }
}
