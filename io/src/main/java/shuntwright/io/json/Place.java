package shuntwright.io.json;

/**
 * Where a value stands in a file.
 *
 * @param line   from 1; 0 when a problem concerns the file as a whole
 * @param column from 1, counted in characters; 0 like the line
 * @param path   of the value, for example "channels[3].load"; empty for the file's outermost value
 */
public record Place(int line, int column, String path) {
    /** Stands for the file as a whole. */
    public static final Place WHOLE_FILE = new Place(0, 0, "");

    static String child(String parent, String key) {
        return parent.isEmpty() ? key : parent + "." + key;
    }

    static String element(String parent, int index) {
        return parent + "[" + index + "]";
    }
}
