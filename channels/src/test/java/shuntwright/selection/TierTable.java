package shuntwright.selection;

import shuntwright.parts.Purchase;

/** The cost of covering a need, found by trying every order from the need upwards to past the last price break. */
final class TierTable {

    private TierTable() {
    }

    static double leastCost(Purchase purchase, int needed) {
        int last = purchase.prices().isEmpty() ? 1 : purchase.prices().getLast().quantity();
        double least = Double.POSITIVE_INFINITY;
        for (int packs = 1; least == Double.POSITIVE_INFINITY || packs * purchase.packSize() <= last
                + 2 * purchase.packSize(); packs++) {
            int pieces = packs * purchase.packSize();
            if (pieces >= needed && pieces >= purchase.minimumOrder()) {
                double price = 0;
                for (var each : purchase.prices()) {
                    if (each.quantity() <= pieces) {
                        price = each.unitPrice();
                    }
                }
                least = Math.min(least, price * pieces);
            }
        }
        return least;
    }
}
