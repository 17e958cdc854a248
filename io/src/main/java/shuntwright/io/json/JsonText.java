package shuntwright.io.json;

import java.util.List;

/**
 * Prints JSON for people: what fits on a line of 110 characters stands on one line, everything else is broken and
 * indented by two. The same value always gives the same text; lines end with a line feed on every system.
 */
public final class JsonText {
    private static final int WIDTH = 110;

    private final StringBuilder out = new StringBuilder();

    private JsonText() {
    }

    /** The value as text, ending with a line feed. */
    public static String print(Json value) {
        JsonText text = new JsonText();
        text.value(value, "", 0);
        return text.out.append('\n').toString();
    }

    private void value(Json value, String indent, int used) {
        switch (value) {
            case Json.Obj(List<Json.Member> members) -> {
                if (!fits(value, used)) {
                    broken(members, '{', '}', indent, (member, inner) -> {
                        String key = quoted(member.key()) + ": ";
                        out.append(key);
                        value(member.value(), inner, inner.length() + key.length() + 1);
                    });
                }
            }
            case Json.Arr(List<? extends Json> elements) -> {
                if (!fits(value, used)) {
                    broken(elements, '[', ']', indent, (each, inner) -> value(each, inner, inner.length() + 1));
                }
            }
            case Json.Text _,Json.Num _,Json.Whole _,Json.Bool _ -> out.append(flat(value, Integer.MAX_VALUE));
        }
    }

    private boolean fits(Json value, int used) {
        String flat = flat(value, WIDTH - used);
        boolean fits = (used > 0 && used + flat.length() <= WIDTH) || flat.length() == 2;
        if (fits) {
            out.append(flat);
        }
        return fits;
    }

    private interface Part<T> {
        void print(T part, String indent);
    }

    private <T> void broken(List<T> parts, char open, char close, String indent, Part<T> print) {
        String inner = indent + "  ";
        out.append(open);
        String separator = "\n";
        for (T part : parts) {
            out.append(separator).append(inner);
            print.print(part, inner);
            separator = ",\n";
        }
        out.append('\n').append(indent).append(close);
    }

    /** On one line; may stop early, longer than {@code room}, once it is too long. */
    private static String flat(Json value, int room) {
        return switch (value) {
            case Json.Obj(List<Json.Member> members) -> {
                StringBuilder line = new StringBuilder("{");
                for (Json.Member each : members) {
                    if (line.length() > room) {
                        break;
                    }
                    line.append(line.length() > 1 ? ", " : "").append(quoted(each.key())).append(": ")
                            .append(flat(each.value(), room));
                }
                yield line.append('}').toString();
            }
            case Json.Arr(List<? extends Json> elements) -> {
                StringBuilder line = new StringBuilder("[");
                for (Json each : elements) {
                    if (line.length() > room) {
                        break;
                    }
                    line.append(line.length() > 1 ? ", " : "").append(flat(each, room));
                }
                yield line.append(']').toString();
            }
            case Json.Text(String text) -> quoted(text);
            case Json.Num(double number) -> number(number);
            case Json.Whole(long number) -> Long.toString(number);
            case Json.Bool(boolean bool) -> Boolean.toString(bool);
        };
    }

    /** The shortest text that reads back as the same double, without ".0". */
    private static String number(double value) {
        boolean whole = value == Math.rint(value) && Math.abs(value) < 1e15;
        return whole && Double.doubleToRawLongBits(value) != Double.doubleToRawLongBits(-0.0)
                ? Long.toString((long) value)
                : Double.toString(value);
    }

    private static String quoted(String text) {
        StringBuilder quoted = new StringBuilder("\"");
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '"' -> quoted.append("\\\"");
                case '\\' -> quoted.append("\\\\");
                case '\n' -> quoted.append("\\n");
                case '\r' -> quoted.append("\\r");
                case '\t' -> quoted.append("\\t");
                default -> {
                    boolean escape = c < 0x20 || c == 0x7F || c == 0x2028 || c == 0x2029 || c == 0xFEFF;
                    if (escape || loneSurrogate(text, i)) {
                        quoted.append(String.format("\\u%04x", (int) c));
                    } else {
                        quoted.append(c);
                    }
                }
            }
        }
        return quoted.append('"').toString();
    }

    /** Half of a surrogate pair has no UTF-8 form of its own. */
    private static boolean loneSurrogate(String text, int at) {
        char c = text.charAt(at);
        if (Character.isHighSurrogate(c)) {
            return at + 1 >= text.length() || !Character.isLowSurrogate(text.charAt(at + 1));
        }
        return Character.isLowSurrogate(c) && (at == 0 || !Character.isHighSurrogate(text.charAt(at - 1)));
    }
}
