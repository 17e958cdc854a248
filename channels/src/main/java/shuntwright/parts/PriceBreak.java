package shuntwright.parts;

import shuntwright.quantity.Finite;

/**
 * The price of one piece from an order quantity upwards.
 *
 * @param quantity  smallest quantity at this price, ≥ 1
 * @param unitPrice price of one piece in the catalogue's currency, finite, ≥ 0
 */
public record PriceBreak(int quantity, double unitPrice) {

    /** @throws IllegalArgumentException unless quantity ≥ 1 and unitPrice is finite and ≥ 0 */
    public PriceBreak {
        if (quantity < 1 || !Finite.notNegative(unitPrice)) {
            throw new IllegalArgumentException(
                    "a price break needs quantity ≥ 1 and a finite price ≥ 0, got " + quantity + " at " + unitPrice);
        }
    }
}
