package shuntwright.io.json;

/** Says in plain words why a text is not JSON. */
final class SyntaxWords {
    private SyntaxWords() {
    }

    /**
     * @param message what the parser says
     * @param text    the whole text
     * @param offset  where in the text the parser stopped
     */
    static String of(String message, String text, int offset) {
        String found = offset >= 0 && offset < text.length()
                ? "\"" + text.charAt(offset) + "\""
                : "the end of the file";
        if (message.startsWith("Unexpected end-of-input")) {
            return message.contains("quote for a string")
                    ? "the file ends within a text; its closing quote (\") is missing"
                    : "the file ends too early; a closing brace } or bracket ] is missing";
        }
        if (message.contains("comma to separate")) {
            return "a comma or a closing brace or bracket is missing before " + found
                    + "; a value with a unit needs quotes, for example \"35 A\"";
        }
        if (message.contains("start property name")) {
            return afterComma(text, offset)
                    ? "there is a comma before " + found + " but no further key; remove the comma"
                    : "a key in double quotes is needed here, but " + found + " was found";
        }
        if (message.contains("colon to separate")) {
            return "a colon (:) is missing between the key and its value, before " + found;
        }
        if (message.contains("maybe a (non-standard) comment")) {
            return "comments are not allowed in this file; put the text into \"note\" or \"description\"";
        }
        if (message.contains("Non-standard token") || message.contains("Unrecognized token")) {
            String word = message.replaceFirst("^[^']*'", "").replaceFirst("'.*$", "");
            return "\"" + word + "\" is neither a number nor true, false or null; a text needs double quotes";
        }
        if (message.contains("CTRL-CHAR")) {
            return "a line break or control character stands within a text; maybe its closing quote (\") is missing";
        }
        if (message.contains("escape")) {
            return "a backslash starts an escape that JSON does not have; write two backslashes for one";
        }
        if (message.contains("close marker")) {
            return "the closing " + found + " does not match what was opened last";
        }
        if (message.contains("umeric value")) {
            return "the number is not written as JSON wants it (digits, at most one point with digits on both sides, "
                    + "no plus sign, no leading zero) at " + found;
        }
        if (message.contains("expected a valid value")) {
            return afterComma(text, offset)
                    ? "there is a comma before " + found + " but no further value; remove the comma"
                    : "a value is missing before " + found;
        }
        return "the file is not JSON here: " + message.lines().findFirst().orElse(message);
    }

    private static boolean afterComma(String text, int offset) {
        int at = Math.min(offset, text.length()) - 1;
        while (at >= 0 && Character.isWhitespace(text.charAt(at))) {
            at--;
        }
        boolean closes = offset < text.length() && "}]".indexOf(text.charAt(offset)) >= 0;
        return closes && at >= 0 && text.charAt(at) == ',';
    }
}
