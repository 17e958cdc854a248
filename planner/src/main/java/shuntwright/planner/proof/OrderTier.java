package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.List;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.selection.Selection;

/**
 * Orders of a line at one price: a number of packs at it. Only tiers that are cheapest for some number of pieces are kept.
 *
 * @param least      pieces on one board for which it is the cheapest
 * @param most       pieces on one board for which it is the cheapest
 * @param pack       pieces in a pack
 * @param leastPacks of an order at the price
 * @param mostPacks  of an order at the price that is ever worth while
 * @param price      of one piece
 */
record OrderTier(int least, int most, int pack, long leastPacks, long mostPacks, double price) {

    /** Orders of more pieces than this are not worked with. */
    private static final long LARGEST = 1_000_000_000;

    /** Packs needed for so many pieces on each of so many boards, at the tier's price. */
    long packs(int pieces, int boards) {
        return Math.max(leastPacks, Math.ceilDiv((long) pieces * boards, pack));
    }

    /** True when the order is the same for all numbers of pieces of the tier. */
    boolean constant(int boards) {
        return packs(least, boards) == packs(most, boards);
    }

    /**
     * Tiers of a line, by price break.
     *
     * @param cap most pieces on one board
     * @throws IllegalArgumentException when an order would be too large
     */
    static List<OrderTier> of(Selection selection, int line, int cap) {
        Purchase purchase = selection.lines().get(line).purchase();
        int boards = selection.boards();
        if ((long) cap * boards + purchase.packSize() > LARGEST || purchase.minimumOrder() > LARGEST) {
            throw new IllegalArgumentException("an order of more than " + LARGEST + " pieces");
        }
        List<PriceBreak> breaks = purchase.prices().isEmpty() ? List.of(new PriceBreak(1, 0)) : purchase.prices();
        int[] least = new int[breaks.size()];
        int[] most = new int[breaks.size()];
        for (int pieces = 1; pieces <= cap; pieces++) {
            int at = tierOf(breaks, purchase.cheapestOrder(pieces * boards).quantity());
            least[at] = least[at] == 0 ? pieces : least[at];
            most[at] = pieces;
        }
        List<OrderTier> tiers = new ArrayList<>();
        for (int i = 0; i < breaks.size(); i++) {
            if (most[i] > 0) {
                long from = Math.ceilDiv(Math.max(breaks.get(i).quantity(), purchase.minimumOrder()),
                        purchase.packSize());
                OrderTier tier = new OrderTier(least[i], most[i], purchase.packSize(), from, Long.MAX_VALUE,
                        breaks.get(i).unitPrice());
                tiers.add(new OrderTier(least[i], most[i], purchase.packSize(), from, tier.packs(most[i], boards),
                        breaks.get(i).unitPrice()));
            }
        }
        return tiers;
    }

    private static int tierOf(List<PriceBreak> breaks, int quantity) {
        int at = 0;
        while (at + 1 < breaks.size() && breaks.get(at + 1).quantity() <= quantity) {
            at++;
        }
        return at;
    }

    /** Which of the tiers is cheapest for so many pieces, by its index. */
    static int cheapest(List<OrderTier> tiers, int pieces, int boards) {
        int best = -1;
        double cost = Double.POSITIVE_INFINITY;
        for (int i = 0; i < tiers.size(); i++) {
            OrderTier tier = tiers.get(i);
            double own = tier.packs(pieces, boards) * (double) tier.pack * tier.price;
            if (pieces >= tier.least && pieces <= tier.most && own < cost) {
                best = i;
                cost = own;
            }
        }
        return best;
    }
}
