package shuntwright.planner.entry;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Zone;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/** Lists of named things as one line of text, separated by commas. */
final class BoardLists {
    private BoardLists() {
    }

    static String zones(Board board) {
        return board.zones().stream()
                .map(zone -> zone.heatLimit().isPresent()
                        ? zone.name() + " " + QuantityWriter.write(zone.heatLimit().getAsDouble(), Dimension.POWER)
                        : zone.name())
                .collect(Collectors.joining(", "));
    }

    static Reading<Board> withZones(String text, Board board) {
        return list(text, "zone", BoardLists::zone, Zone::name)
                .then(zones -> Reading.value(board.withZones(zones)));
    }

    /** A name, or a name and behind it a power: the longest tail that reads as a power is the limit. */
    private static Reading<Zone> zone(String text) {
        for (int at = text.indexOf(' '); at > 0; at = text.indexOf(' ', at + 1)) {
            var limit = QuantityReader.number(text.substring(at), Dimension.POWER).ifValue();
            if (limit.isPresent() && limit.get() > 0) {
                return Reading.value(new Zone(text.substring(0, at).strip(), OptionalDouble.of(limit.get()),
                        OptionalDouble.empty()));
            }
        }
        return Reading.value(new Zone(text, OptionalDouble.empty(), OptionalDouble.empty()));
    }

    static String references(Board board) {
        return board.references().stream().map(each -> each.name() + " = " + each.part())
                .collect(Collectors.joining(", "));
    }

    static Reading<Board> withReferences(String text, Board board) {
        return list(text, "reference", BoardLists::reference, BoardReference::name)
                .then(references -> Reading.value(board.withReferences(references)));
    }

    private static Reading<BoardReference> reference(String text) {
        int at = text.indexOf('=');
        if (at <= 0 || text.substring(at + 1).isBlank()) {
            return Reading.misread("\"" + text + "\" needs the form name = part number.");
        }
        String name = text.substring(0, at).strip();
        return name.equals("supply") || name.equals("any")
                ? Reading.misread("A reference cannot be called " + name + "; choose another name.")
                : Reading.value(new BoardReference(name, text.substring(at + 1).strip()));
    }

    static String alertLines(Board board) {
        return board.alertLines().stream().map(AlertLine::name).collect(Collectors.joining(", "));
    }

    static Reading<Board> withAlertLines(String text, Board board) {
        return list(text, "alert line",
                name -> Reading.value(board.alertLine(name).orElseGet(() -> AlertLine.named(name))), AlertLine::name)
                .then(lines -> Reading.value(board.withAlertLines(lines)));
    }

    private static <T> Reading<List<T>> list(String text, String what, Function<String, Reading<T>> reader,
            Function<T, String> name) {
        List<T> all = new ArrayList<>();
        Set<String> names = new HashSet<>();
        for (String piece : text.split(",")) {
            if (piece.isBlank()) {
                continue;
            }
            switch (reader.apply(piece.strip())) {
                case Reading.Misread<T>(String problem) -> {
                    return Reading.misread(problem);
                }
                case Reading.Value<T>(T value) -> {
                    if (!names.add(name.apply(value))) {
                        return Reading.misread("The " + what + " \"" + name.apply(value) + "\" stands twice.");
                    }
                    all.add(value);
                }
            }
        }
        return Reading.value(List.copyOf(all));
    }
}
