package shuntwright.planner.command;

import java.io.Console;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.IllegalCharsetNameException;
import java.nio.charset.StandardCharsets;
import java.nio.charset.UnsupportedCharsetException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/**
 * Where the commands print.
 *
 * @param out      results
 * @param err      problems and progress
 * @param charset  what {@code out} and {@code err} encode text in
 * @param colour   whether colours may be used
 * @param progress whether progress may be shown on {@code err}
 */
record Terminal(PrintStream out, PrintStream err, Charset charset, boolean colour, boolean progress) {

    /** Streams that no person watches: no colours, no progress, UTF-8. */
    static Terminal piped(PrintStream out, PrintStream err) {
        return new Terminal(out, err, StandardCharsets.UTF_8, false, false);
    }

    /** This process's own streams: UTF-8 into files and pipes, a terminal's own encoding on a terminal. */
    @SuppressWarnings("SystemConsoleNull") // Java 25 again gives null where none of the streams is a terminal
    static Terminal system(Map<String, String> environment) {
        Console console = System.console();
        boolean watched = console != null && console.isTerminal();
        Charset charset = watched ? charset(System.getProperty("stdout.encoding", "UTF-8")) : StandardCharsets.UTF_8;
        boolean colour = watched && environment.getOrDefault("NO_COLOR", "").isEmpty()
                && !environment.getOrDefault("TERM", "").equals("dumb");
        return new Terminal(stream(FileDescriptor.out, charset), stream(FileDescriptor.err, charset), charset, colour,
                watched && errorsWatched());
    }

    private static PrintStream stream(FileDescriptor descriptor, Charset charset) {
        return new PrintStream(new FileOutputStream(descriptor), true, charset);
    }

    /** A console says nothing of the error stream, which may go to a file all the same. */
    private static boolean errorsWatched() {
        Path link = Path.of("/proc/self/fd/2");
        try {
            return !Files.isSymbolicLink(link) || Files.readSymbolicLink(link).toString().matches("/dev/(pts/|tty).*");
        } catch (IOException _) {
            return false;
        }
    }

    private static Charset charset(String name) {
        try {
            return Charset.forName(name);
        } catch (IllegalCharsetNameException | UnsupportedCharsetException _) {
            return StandardCharsets.UTF_8;
        }
    }

    /** Prints a line of text, spelling out signs that the terminal cannot show. */
    void print(String text) {
        out.println(Spelling.in(charset, text));
    }

    /** Prints a line about a problem. */
    void complain(String text) {
        err.println(Spelling.in(charset, text));
    }

    /** Prints the bytes as they are, whatever the terminal's encoding. */
    void printBytes(byte[] bytes) {
        out.write(bytes, 0, bytes.length);
        out.flush();
    }
}
