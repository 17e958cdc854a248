package shuntwright.io.json;

/**
 * Something that is wrong with a file.
 *
 * @param file    name of the file
 * @param place   where in the file
 * @param message what is wrong, what is allowed, what to do
 */
public record Problem(String file, Place place, String message) {
    public int line() {
        return place.line();
    }

    public int column() {
        return place.column();
    }

    public String path() {
        return place.path();
    }

    /** As compilers write it: {@code boat.board.json:12:17 channels[3].load: what is wrong}. */
    @Override
    public String toString() {
        String where = place.line() == 0 ? file : file + ":" + place.line() + ":" + place.column();
        return where + (place.path().isEmpty() ? "" : " " + place.path()) + ": " + message;
    }
}
