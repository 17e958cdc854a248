package shuntwright.accuracy;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;

/** Reads the published tables that are one data set, not one check a row. */
public final class Table {

    private Table() {
    }

    /** Rows without comments and header. */
    public static List<String[]> rows(String resource) {
        try (InputStream in = Objects.requireNonNull(Table.class.getResourceAsStream(resource), resource)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines()
                    .filter(line -> !line.startsWith("#")).skip(1).map(line -> line.split(";", -1)).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
