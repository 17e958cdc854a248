package shuntwright.planner.proof;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Children as they should not be. */
final class Misbehaving {

    private Misbehaving() {
    }

    private static PrintStream out() {
        return new PrintStream(new FileOutputStream(FileDescriptor.out), true, StandardCharsets.UTF_8);
    }

    /** Breaks down in the middle, with files left. */
    static final class BreaksDown {
        public static void main(String[] args) throws IOException {
            Files.writeString(Path.of(System.getProperty("java.io.tmpdir"), "left"), "behind");
            out().println(Word.BOUND.line("0.001"));
            Runtime.getRuntime().halt(134);
        }
    }

    /** Talks of something else and ends as if all were well. */
    static final class Babbles {
        public static void main(String[] args) {
            for (int i = 0; i < 5000; i++) {
                out().println("\u0000 answer? bound BOUND 17 better 1 2 3 " + i);
            }
        }
    }

    /** Numbers that are none. */
    static final class Mumbles {
        public static void main(String[] args) {
            out().println(Word.BOUND.line("about seven"));
            out().println(Word.DONE.line(""));
        }
    }

    /** A bound above what is known, and a selection of options that are not there. */
    static final class Lies {
        public static void main(String[] args) {
            out().println(Word.BETTER.line("999 -4 12"));
            out().println(Word.BOUND.line("1e30"));
            out().println(Word.DONE.line(""));
        }
    }

    /** Never says anything, and does not read either. */
    static final class Sleeps {
        public static void main(String[] args) throws InterruptedException {
            Thread.sleep(60_000);
        }
    }
}
