package shuntwright.io.form;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/**
 * The first key of every file: {@code "format": "shuntwright board 1"}.
 *
 * @param content what such a file holds, for example "board"
 * @param version the version that is written, and so far the only one that is read
 */
public record FormatLine(String content, int version) {
    private static final Pattern FORM = Pattern.compile("shuntwright (\\p{Alpha}+) (\\d+)");

    public String text() {
        return "shuntwright " + content + " " + version;
    }

    /** The kind of value behind the key "format". */
    public Kind<String> kind() {
        return Kinds.choice(text -> text, text());
    }

    /** The file's outermost object, when it is of this format; otherwise {@code problems} says what it is instead. */
    public Optional<LocatedJson.Obj> check(LocatedJson root, Problems problems) {
        if (!(root instanceof LocatedJson.Obj object)) {
            problems.add(root, "a " + content + " file holds one object { … }, not " + root.inWords());
            return Optional.empty();
        }
        Optional<LocatedJson> line = object.find("format");
        if (line.isEmpty()) {
            problems.add(object, "the key \"format\" is missing; a " + content + " file has " + wanted());
            return Optional.empty();
        }
        if (line.get() instanceof LocatedJson.Text(var _, String text) && text.equals(text())) {
            return Optional.of(object);
        }
        problems.add(line.get(), explain(line.get()));
        return Optional.empty();
    }

    private String explain(LocatedJson line) {
        if (line instanceof LocatedJson.Text(var _, String text)) {
            Matcher form = FORM.matcher(text);
            if (form.matches() && !form.group(1).equals(content)) {
                return "this is a " + form.group(1) + " file; a " + content + " file with " + wanted()
                        + " is needed here";
            }
            if (form.matches()) {
                return "version " + form.group(2) + " of the " + content + " file is not known; known is version "
                        + version + ". Maybe the file was written by a newer version of this program";
            }
        }
        return wanted() + " is needed here, not " + line.inWords();
    }

    private String wanted() {
        return "\"format\": \"" + text() + "\"";
    }
}
