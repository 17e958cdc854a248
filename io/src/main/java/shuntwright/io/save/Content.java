package shuntwright.io.save;

import java.io.IOException;
import java.io.OutputStream;

/** Writes what is to stand in a file. */
@FunctionalInterface
public interface Content {
    void writeTo(OutputStream out) throws IOException;
}
