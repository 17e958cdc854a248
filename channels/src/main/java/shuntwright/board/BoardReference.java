package shuntwright.board;

/**
 * A precision reference that stands on the board.
 *
 * @param name what channels, taps and the ADC call it; not "supply"
 * @param part part number of a reference in the catalogue
 */
public record BoardReference(String name, String part) {}
