package shuntwright.accuracy;

/** Where each input stands in the vector x of a channel's equations: first the single slots, then four for each shunt. */
public final class Layout {

    private static final int FIRST_OF_SHUNT = Slot.SHUNT_TOLERANCE.place();
    private static final int PER_SHUNT = Slot.values().length - FIRST_OF_SHUNT;

    private Layout() {
    }

    /** Length of x. */
    public static int size(int shunts) {
        return FIRST_OF_SHUNT + PER_SHUNT * shunts;
    }

    /** Place of a slot; {@code piece} counts for the shunts' slots only. */
    public static int index(Slot slot, int piece) {
        int ordinal = slot.place();
        return ordinal < FIRST_OF_SHUNT ? ordinal : ordinal + PER_SHUNT * piece;
    }

    /** Place of an input. */
    public static int index(Input input) {
        return index(input.slot(), input.piece());
    }
}
