package shuntwright.planner.entry;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
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
        return board.zones().stream().map(BoardLists::shown).collect(Collectors.joining(", "));
    }

    private static String shown(Zone zone) {
        StringBuilder text = new StringBuilder(zone.name());
        zone.heatLimit().ifPresent(limit -> text.append(' ').append(QuantityWriter.write(limit, Dimension.POWER)));
        zone.thermalResistance().ifPresent(resistance -> text.append(' ')
                .append(QuantityWriter.write(resistance, Dimension.THERMAL_RESISTANCE)));
        return text.toString();
    }

    static Reading<Board> withZones(String text, Board board) {
        return list(text, "zone", piece -> zone(piece, board), Zone::name)
                .then(zones -> Reading.value(board.withZones(zones)));
    }

    /** A zone as it is shown, or a name and behind it a power and a thermal resistance, each if there is one. */
    private static Reading<Zone> zone(String text, Board board) {
        for (Zone there : board.zones()) {
            if (text.equals(shown(there))) {
                return Reading.value(there);
            }
        }
        OptionalDouble limit = OptionalDouble.empty();
        OptionalDouble resistance = OptionalDouble.empty();
        String rest = text;
        while (true) {
            boolean perWatt = rest.endsWith("/W");
            Optional<Tail> tail = perWatt ? tail(rest, Dimension.THERMAL_RESISTANCE) : tail(rest, Dimension.POWER);
            if (tail.isEmpty()) {
                return Reading.value(new Zone(rest, limit, resistance));
            }
            if ((perWatt ? resistance : limit).isPresent()) {
                return Reading.misread("\"" + text + "\" has two " + (perWatt ? "thermal resistances" : "heat limits")
                        + "; leave one.");
            }
            if (perWatt) {
                resistance = OptionalDouble.of(tail.get().value());
            } else {
                limit = OptionalDouble.of(tail.get().value());
            }
            rest = tail.get().before();
        }
    }

    /**
     * A quantity at the end of a text.
     *
     * @param before the text without it
     * @param value  in the SI unit, above 0
     */
    private record Tail(String before, double value) {}

    /** The longest tail that reads as such a quantity. */
    private static Optional<Tail> tail(String text, Dimension dimension) {
        for (int at = text.indexOf(' '); at > 0; at = text.indexOf(' ', at + 1)) {
            Optional<Double> value = QuantityReader.number(text.substring(at), dimension).ifValue();
            if (value.isPresent() && value.get() > 0) {
                return Optional.of(new Tail(text.substring(0, at).strip(), value.get()));
            }
        }
        return Optional.empty();
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
