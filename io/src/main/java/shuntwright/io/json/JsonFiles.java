package shuntwright.io.json;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;

/** Reads a file into a tree of located values. */
public final class JsonFiles {
    /** Largest file that is read, bytes. */
    public static final int LARGEST = 64 << 20;

    private JsonFiles() {
    }

    /** The file's outermost value; empty, with the reasons in {@code problems}, when it cannot be read. */
    public static Optional<LocatedJson> read(Path file, Problems problems) {
        return bytes(file, problems).flatMap(bytes -> decode(bytes, problems))
                .flatMap(text -> JsonTree.parse(text, problems));
    }

    private static Optional<byte[]> bytes(Path file, Problems problems) {
        if (Files.isDirectory(file)) {
            return refuse(problems, file + " is a folder; a file is needed");
        }
        if (!Files.exists(file)) {
            return refuse(problems, "there is no file " + file + "; maybe it was moved or its name is misspelt");
        }
        if (!Files.isRegularFile(file)) {
            return refuse(problems, file + " is not an ordinary file");
        }
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(LARGEST + 1);
            if (bytes.length > LARGEST) {
                return refuse(problems, "the file is larger than 64 MB; maybe this is not the file you meant");
            }
            return Optional.of(bytes);
        } catch (AccessDeniedException _) {
            return refuse(problems, "you may not read " + file + "; check its permissions");
        } catch (IOException e) {
            return refuse(problems, file + " cannot be read: " + e.getMessage());
        }
    }

    private static <T> Optional<T> refuse(Problems problems, String message) {
        problems.add(Place.WHOLE_FILE, message);
        return Optional.empty();
    }

    /** Strict UTF-8, with or without byte order mark. */
    static Optional<String> decode(byte[] bytes, Problems problems) {
        if (startsWith(bytes, 0xFE, 0xFF) || startsWith(bytes, 0xFF, 0xFE)) {
            return refuse(problems, "the file is stored as UTF-16; save it as UTF-8");
        }
        int start = startsWith(bytes, 0xEF, 0xBB, 0xBF) ? 3 : 0;
        ByteBuffer in = ByteBuffer.wrap(bytes, start, bytes.length - start);
        CharBuffer out = CharBuffer.allocate(bytes.length);
        CoderResult result = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT).decode(in, out, true);
        String text = out.flip().toString();
        if (result.isError()) {
            int lineStart = text.lastIndexOf('\n') + 1;
            int line = 1 + (int) text.chars().filter(c -> c == '\n').count();
            problems.add(new Place(line, text.length() - lineStart + 1, ""),
                    String.format("the byte 0x%02X is not UTF-8 text; save the file as UTF-8", bytes[in.position()]));
            return Optional.empty();
        }
        if (text.isBlank()) {
            return refuse(problems, "the file is empty");
        }
        return Optional.of(text);
    }

    private static boolean startsWith(byte[] bytes, int... wanted) {
        if (bytes.length < wanted.length) {
            return false;
        }
        return Arrays.equals(Arrays.stream(wanted).toArray(), toInts(bytes, wanted.length));
    }

    private static int[] toInts(byte[] bytes, int count) {
        int[] ints = new int[count];
        for (int i = 0; i < count; i++) {
            ints[i] = bytes[i] & 0xFF;
        }
        return ints;
    }
}
