package shuntwright.plan;

import java.util.List;
import java.util.OptionalDouble;

import shuntwright.quantity.Dimension;

/**
 * Demands that cannot all be met.
 *
 * @param members of the set: shared limits first, then channels
 * @param minimal true when it is proven that leaving out any one of them makes the others possible
 * @param words   what conflicts with what, with numbers
 */
public record Conflict(List<Member> members, boolean minimal, String words) {
    public Conflict {
        members = List.copyOf(members);
    }

    /** What kind of demand. */
    public enum Kind {
        /** A limit that channels share: heat of board or zone, supply current, load of a reference. */
        SHARED_LIMIT,
        /** All demands of one channel. */
        CHANNEL,
        /** One voltage for all channels of a tap. */
        TAP
    }

    /**
     * One demand of the set.
     *
     * @param kind      of demand
     * @param name      of limit, channel or tap
     * @param what      is demanded, in words: "heat limit", "must-trip current"
     * @param now       as demanded
     * @param relaxed   what it would have to be, relaxed alone, for all others to be met; empty when that alone does not cure it or
     *                  was not found
     * @param dimension of both
     */
    public record Member(Kind kind, String name, String what, OptionalDouble now, OptionalDouble relaxed,
            Dimension dimension) {}
}
