package shuntwright.io.json;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects everything that is wrong with one file. */
public final class Problems {
    private final String file;
    private final List<Problem> found = new ArrayList<>();

    /** @param file name of the file the problems are in */
    public Problems(String file) {
        this.file = file;
    }

    public String file() {
        return file;
    }

    public void add(Place place, String message) {
        found.add(new Problem(file, place, message));
    }

    public void add(LocatedJson value, String message) {
        add(value.place(), message);
    }

    public int count() {
        return found.size();
    }

    public boolean isEmpty() {
        return found.isEmpty();
    }

    /** In the order of the file. */
    public List<Problem> list() {
        return found.stream().sorted(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column)).toList();
    }
}
