package shuntwright.planner.window.table;

/**
 * A computed cell.
 *
 * @param text for people
 * @param key  for sorting, before the text
 */
record Figure(String text, double key) implements Comparable<Figure> {
    static final Figure NONE = new Figure("", Double.NaN);

    @Override
    public int compareTo(Figure other) {
        int byKey = Double.compare(key, other.key);
        return byKey != 0 ? byKey : text.compareTo(other.text);
    }
}
