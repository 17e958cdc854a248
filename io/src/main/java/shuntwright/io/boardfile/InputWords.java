package shuntwright.io.boardfile;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

import shuntwright.accuracy.PartKind;
import shuntwright.accuracy.Slot;
import shuntwright.io.form.Kind;
import shuntwright.io.form.NearestWord;
import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/** An uncertain input in a file, in the words of the error budget. */
final class InputWords implements Kind<String> {
    private static final List<String> ALL = Arrays.stream(Slot.values()).map(Slot::words).toList();
    private static final String WHERE = "the guide to the board file lists all inputs under \"Inputs\", and the error "
            + "budget of a planned channel those of that channel";
    /** Shorter words, such as "of" and "the", say nothing. */
    private static final int TELLING = 4;

    @Override
    public Optional<String> read(LocatedJson value, Problems problems) {
        if (value instanceof LocatedJson.Text(var _, String text)) {
            if (ALL.contains(text)) {
                return Optional.of(text);
            }
            problems.add(value, "there is no input \"" + text + "\"; " + meant(text) + WHERE);
        } else {
            problems.add(value, "the words of an input such as \"" + Slot.SHUNT_TOLERANCE.words()
                    + "\" are needed here, not " + value.inWords() + "; " + WHERE);
        }
        return Optional.empty();
    }

    /** What was probably meant: words spelled nearly so, else those that share a word with it. */
    private static String meant(String typed) {
        List<String> near = NearestWord.find(typed, ALL).map(List::of)
                .orElseGet(() -> ALL.stream().filter(each -> shareWord(each, typed)).toList());
        return near.isEmpty() ? "" : "maybe \"" + String.join("\" or \"", near) + "\" is meant; ";
    }

    private static boolean shareWord(String one, String other) {
        Set<String> words = Set.copyOf(words(one));
        return words(other).stream().anyMatch(each -> each.length() >= TELLING && words.contains(each));
    }

    private static List<String> words(String text) {
        return Arrays.asList(text.toLowerCase(Locale.ROOT).split("[^\\p{Alnum}]+", -1));
    }

    @Override
    public Json write(String value) {
        return new Json.Text(value);
    }

    @Override
    public String unit() {
        return "words of an [input](#inputs)";
    }

    /** All inputs as a table in Markdown, in their order. */
    static String markdown() {
        StringBuilder table = new StringBuilder("""
                | input | unit | whose `part` can be named |
                |---|---|---|
                """);
        for (Slot each : Slot.values()) {
            table.append("| `").append(each.words()).append("` | ").append(each.unit().equals("1") ? "" : each.unit())
                    .append(" | ").append(each.part().map(PartKind::words).orElse("")).append(" |\n");
        }
        return table.toString();
    }
}
