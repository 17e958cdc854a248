package shuntwright.parts;

import java.util.List;

/**
 * How a part is sold.
 *
 * @param body         name of the package or case, free text
 * @param prices       price breaks by ascending quantity, the first from quantity 1; empty when no price is known
 * @param packSize     pieces in one pack, ≥ 1; orders are whole packs
 * @param minimumOrder smallest order in pieces, ≥ 1
 * @param supplier     free text
 * @param lifecycle    free text, for example "active" or "last orders 2027"
 */
public record Purchase(String body, List<PriceBreak> prices, int packSize, int minimumOrder, String supplier,
        String lifecycle) {

    /** @throws IllegalArgumentException unless the breaks start at 1 and ascend, and sizes are ≥ 1 */
    public Purchase {
        prices = List.copyOf(prices);
        if (packSize < 1 || minimumOrder < 1) {
            throw new IllegalArgumentException(
                    "pack size and minimum order must be at least 1, got " + packSize + " and " + minimumOrder);
        }
        int last = 0;
        for (PriceBreak each : prices) {
            if (each.quantity() <= last || (last == 0 && each.quantity() != 1)) {
                throw new IllegalArgumentException("price breaks must start at quantity 1 and ascend, got " + prices);
            }
            last = each.quantity();
        }
    }

    /** Price of one piece when {@code quantity} are ordered; 0 when no price is known. */
    public double unitPriceAt(int quantity) {
        double price = prices.isEmpty() ? 0 : prices.getFirst().unitPrice();
        for (PriceBreak each : prices) {
            if (each.quantity() <= quantity) {
                price = each.unitPrice();
            }
        }
        return price;
    }

    /** Pieces to order so that {@code needed} are there: at least the minimum order, in whole packs; at most the largest whole number. */
    public int orderQuantity(int needed) {
        if (needed <= 0) {
            return 0;
        }
        int least = Math.max(needed, minimumOrder);
        return (int) Math.min(Integer.MAX_VALUE, ((long) least + packSize - 1) / packSize * packSize);
    }

    /**
     * An order.
     *
     * @param quantity pieces
     * @param price    of one piece
     */
    public record Order(int quantity, double price) {

        public double cost() {
            return quantity * price;
        }
    }

    /**
     * The cheapest order that covers what is needed: at least the minimum order, in whole packs, and more than needed where a price
     * break makes that cheaper; of equally cheap ones the smallest.
     */
    public Order cheapestOrder(int needed) {
        int least = orderQuantity(needed);
        Order best = new Order(least, unitPriceAt(least));
        for (PriceBreak each : prices) {
            if (each.quantity() > least) {
                int quantity = orderQuantity(each.quantity());
                Order order = new Order(quantity, unitPriceAt(quantity));
                if (needed > 0 && order.cost() < best.cost()) {
                    best = order;
                }
            }
        }
        return best;
    }
}
