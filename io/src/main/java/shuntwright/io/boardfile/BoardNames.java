package shuntwright.io.boardfile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import shuntwright.io.form.NearestWord;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/**
 * Checks the names by which the objects of a board file call each other. It looks at the file's tree, not at bound
 * values, so that a tap with a broken voltage still counts as defined.
 */
final class BoardNames {
    private final LocatedJson.Obj board;
    private final Problems problems;

    private BoardNames(LocatedJson.Obj board, Problems problems) {
        this.board = board;
        this.problems = problems;
    }

    static void check(LocatedJson.Obj board, Problems problems) {
        BoardNames names = new BoardNames(board, problems);
        List<String> references = names.define("references", "reference");
        List<String> taps = names.define("taps", "tap");
        List<String> lines = names.define("alertLines", "alert line");
        List<String> zones = names.define("zones", "zone");
        names.define("channels", "channel");
        names.checkSources(references);
        for (LocatedJson.Obj channel : names.objects("channels")) {
            channel.text("alertLine").ifPresent(name -> names.known("alert line", name, name.value(), lines));
            channel.text("zone").ifPresent(name -> names.known("zone", name, name.value(), zones));
            channel.text("threshold").ifPresent(text -> {
                ThresholdWords.named(text.value(), ThresholdWords.TAP)
                        .ifPresent(name -> names.known("tap", text, name, taps));
                ThresholdWords.named(text.value(), ThresholdWords.REFERENCE)
                        .ifPresent(name -> names.known("reference", text, name, references));
            });
        }
    }

    private void checkSources(List<String> references) {
        List<LocatedJson.Obj> users = new ArrayList<>(objects("taps"));
        if (board.find("adc").orElse(board) instanceof LocatedJson.Obj adc) {
            users.add(adc);
        }
        List<String> sources = new ArrayList<>(references);
        sources.add(SourceWords.SUPPLY);
        for (LocatedJson.Obj user : users) {
            user.text("source").ifPresent(name -> known("source", name, name.value(), sources));
        }
        for (LocatedJson.Obj reference : objects("references")) {
            Optional<LocatedJson.Text> name = reference.text("name");
            if (name.isPresent() && name.get().value().equals(SourceWords.SUPPLY)) {
                problems.add(name.get(), "a reference cannot be named \"supply\", which means the sense supply; "
                        + "give it another name");
            }
        }
    }

    private List<LocatedJson.Obj> objects(String key) {
        List<LocatedJson.Obj> objects = new ArrayList<>();
        for (LocatedJson each : board.elements(key)) {
            if (each instanceof LocatedJson.Obj object) {
                objects.add(object);
            }
        }
        return objects;
    }

    /** The names defined in that list; a name that stands twice is a problem. */
    private List<String> define(String key, String what) {
        Map<String, LocatedJson> first = new LinkedHashMap<>();
        for (LocatedJson.Obj each : objects(key)) {
            each.text("name").ifPresent(name -> {
                LocatedJson before = first.putIfAbsent(name.value(), name);
                if (before != null) {
                    problems.add(name, "the " + what + " \"" + name.value() + "\" stands twice, first in line "
                            + before.place().line() + "; give one of them another name");
                }
            });
        }
        return List.copyOf(first.keySet());
    }

    private void known(String what, LocatedJson place, String name, List<String> names) {
        if (!names.contains(name)) {
            problems.add(place, NearestWord.unknown(what, name, names));
        }
    }
}
