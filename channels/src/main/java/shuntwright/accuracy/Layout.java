package shuntwright.accuracy;

/** Where each input stands in the vector x of a channel's equations: first the single slots, then four for each shunt. */
final class Layout {

    private static final int FIRST_OF_SHUNT = Slot.SHUNT_TOLERANCE.place();
    private static final int PER_SHUNT = Slot.values().length - FIRST_OF_SHUNT;

    private Layout() {
    }

    static int size(int shunts) {
        return FIRST_OF_SHUNT + PER_SHUNT * shunts;
    }

    static int index(Slot slot, int piece) {
        int ordinal = slot.place();
        return ordinal < FIRST_OF_SHUNT ? ordinal : ordinal + PER_SHUNT * piece;
    }

    static int index(Input input) {
        return index(input.slot(), input.piece());
    }
}
