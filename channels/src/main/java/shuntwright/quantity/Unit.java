package shuntwright.quantity;

/**
 * One spelling of a unit and what it is worth in the SI unit of its dimension.
 *
 * @param symbol as written after the number, "mΩ"; may be empty
 * @param shift  the power of ten: one of this unit is 10^shift SI units, −3 for "mΩ"
 */
record Unit(String symbol, int shift) {}
