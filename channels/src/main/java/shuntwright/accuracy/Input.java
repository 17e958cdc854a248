package shuntwright.accuracy;

import java.util.Optional;

import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/**
 * One uncertain input of a channel.
 *
 * @param slot         where it enters the equations
 * @param piece        which of the parallel shunts, from 0; 0 for everything else
 * @param owner        whose draw it is
 * @param nominal      in the slot's unit
 * @param limits       in the slot's unit
 * @param distribution assigned to the limits; it lies around their middle (JCGM 100:2008, 4.3.8, where they are asymmetric)
 * @param reel         whose pieces deviate alike; empty for an independent input
 */
public record Input(Slot slot, int piece, Owner owner, double nominal, Range limits, Distribution distribution,
        Optional<Reel> reel) {

    /** Standard uncertainty in the slot's unit. */
    public double standardUncertainty() {
        return distribution.standardUncertainty(limits);
    }

    /** What it is, for tables: "shunt tolerance (shunt 2)". */
    public String label() {
        return slot.words() + " (" + owner.name() + ")";
    }
}
