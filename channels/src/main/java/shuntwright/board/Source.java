package shuntwright.board;

/** Where a threshold or the ADC takes its voltage from. */
public sealed interface Source {

    /** The sense supply: its error is the supply's tolerance. */
    record Supply() implements Source {}

    /** @param name of a reference of the board */
    record OfReference(String name) implements Source {}

    /** The word a file uses: "supply" or the reference's name. */
    default String word() {
        return switch (this) {
            case Supply _ -> "supply";
            case OfReference(String name) -> name;
        };
    }
}
