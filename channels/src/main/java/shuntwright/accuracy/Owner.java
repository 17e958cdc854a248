package shuntwright.accuracy;

/** Whose draw an input is. */
public sealed interface Owner {

    /** What the owner is called. */
    String name();

    /** @param name the part within the channel, for example "shunt 2" */
    record Own(String name) implements Owner {}

    /** @param name the shared thing, for example "supply", "reference quiet" or "ambient": one draw for every channel */
    record Shared(String name) implements Owner {}
}
