package shuntwright.plan;

import java.util.OptionalDouble;

import shuntwright.quantity.Dimension;

/**
 * What all channels together take of a shared thing.
 *
 * @param kind      which kind of thing
 * @param name      which one, for example "supply", "reference quiet", "zone port"
 * @param used      SI
 * @param limit     SI; empty when none is set
 * @param dimension current, power or temperature difference
 */
public record SharedUse(Kind kind, String name, double used, OptionalDouble limit, Dimension dimension) {

    /** Kinds of shared things. */
    public enum Kind {
        SUPPLY, REFERENCE, BOARD_HEAT, ZONE_HEAT,
        /** How far a zone's own heat warms it above ambient, by limits. */
        ZONE_RISE
    }

    /** True when there is no limit or it is kept. */
    public boolean holds() {
        return limit.isEmpty() || used <= limit.getAsDouble();
    }
}
