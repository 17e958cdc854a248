package shuntwright.choice;

import shuntwright.parts.Part;

/** What parts count for while circuits are sought cheapest first; need not be money. */
@FunctionalInterface
public interface Prices {

    /** Of so many pieces of a part in one channel. */
    double of(Part part, int pieces);

    /** Of one piece. */
    default double of(Part part) {
        return of(part, 1);
    }

    /** Money, as if nobody but one channel of each board used the part. */
    static Prices ofOneChannel(int boards) {
        return (part, pieces) -> pieces
                * part.purchase().unitPriceAt((int) Math.min(Integer.MAX_VALUE, (long) pieces * boards));
    }
}
