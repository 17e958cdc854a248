package shuntwright.planner.session;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.quantity.Reading;

/**
 * Everything a person has entered, right or wrong; one snapshot of the undo history.
 *
 * @param board   what was typed rightly
 * @param rows    an identity for each channel, in the board's order; it stays when channels move or change their name
 * @param wrong   texts that could not be taken over
 * @param nextRow identity of the next channel
 */
public record BoardState(Board board, List<Integer> rows, Map<Place, WrongEntry> wrong, int nextRow) {
    public BoardState {
        rows = List.copyOf(rows);
        wrong = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(wrong));
    }

    public static BoardState of(Board board) {
        List<Integer> rows = new ArrayList<>();
        for (int row = 0; row < board.channels().size(); row++) {
            rows.add(row);
        }
        return new BoardState(board, rows, Map.of(), rows.size());
    }

    public Optional<Channel> channel(int row) {
        int at = rows.indexOf(row);
        return at < 0 ? Optional.empty() : Optional.of(board.channels().get(at));
    }

    public Optional<WrongEntry> wrong(Place place) {
        return Optional.ofNullable(wrong.get(place));
    }

    /** What the place shows: the text as typed while it is wrong, otherwise the value. */
    public String text(Place place) {
        WrongEntry entry = wrong.get(place);
        if (entry != null) {
            return entry.text();
        }
        return switch (place) {
            case Place.Cell(int row, var field) -> channel(row).map(field::text).orElse("");
            case Place.OfBoard(var field) -> field.text(board);
        };
    }

    /** Takes a text over, or keeps it as a wrong entry. Wrong entries elsewhere that this makes right are taken too. */
    public BoardState enter(Place place, String text) {
        return taken(place, text).settled();
    }

    /** Drops a wrong entry, so that the last good value shows again. */
    public BoardState revert(Place place) {
        Map<Place, WrongEntry> left = new LinkedHashMap<>(wrong);
        left.remove(place);
        return new BoardState(board, rows, left, nextRow);
    }

    private BoardState taken(Place place, String text) {
        return switch (read(place, text)) {
            case Reading.Value<Board>(Board next) -> new BoardState(next, rows, revert(place).wrong(), nextRow);
            case Reading.Misread<Board>(String reason) -> {
                Map<Place, WrongEntry> more = new LinkedHashMap<>(wrong);
                more.put(place, new WrongEntry(text, reason));
                yield new BoardState(board, rows, more, nextRow);
            }
        };
    }

    private BoardState settled() {
        BoardState state = this;
        for (Map.Entry<Place, WrongEntry> each : wrong.entrySet()) {
            state = state.taken(each.getKey(), each.getValue().text());
        }
        return state;
    }

    private Reading<Board> read(Place place, String text) {
        return switch (place) {
            case Place.Cell(int row, var field) -> {
                int at = rows.indexOf(row);
                yield at < 0
                        ? Reading.misread("The channel is no longer there.")
                        : field.read(text, board.channels().get(at), board)
                                .then(channel -> Reading.value(board.withChannels(replaced(at, channel))));
            }
            case Place.OfBoard(var field) -> field.read(text, board);
        };
    }

    private List<Channel> replaced(int at, Channel channel) {
        List<Channel> all = new ArrayList<>(board.channels());
        all.set(at, channel);
        return all;
    }

    public BoardState withChannel(int row, Channel channel) {
        int at = rows.indexOf(row);
        return at < 0 ? this : new BoardState(board.withChannels(replaced(at, channel)), rows, wrong, nextRow);
    }

    /** A board with the same channels in the same order but something else changed. */
    public BoardState withBoard(Board next) {
        if (next.channels().size() != rows.size()) {
            throw new IllegalArgumentException("channels are added and removed by row, got " + next.channels().size()
                    + " channels for " + rows.size() + " rows");
        }
        return new BoardState(next, rows, wrong, nextRow).settled();
    }

    /** Puts a channel behind a row, or last when that row is not there; its identity is {@link #nextRow}. */
    public BoardState add(Channel channel, int behind) {
        int at = rows.contains(behind) ? rows.indexOf(behind) + 1 : rows.size();
        List<Channel> channels = new ArrayList<>(board.channels());
        channels.add(at, channel.withName(freeName(channel.name())));
        List<Integer> ids = new ArrayList<>(rows);
        ids.add(at, nextRow);
        return new BoardState(board.withChannels(channels), ids, wrong, nextRow + 1);
    }

    /** Puts a copy of each row behind it, wrong entries included. */
    public BoardState duplicate(List<Integer> which) {
        BoardState state = this;
        for (int row : which) {
            Optional<Channel> channel = state.channel(row);
            if (channel.isPresent()) {
                int copy = state.nextRow;
                state = state.add(channel.get(), row);
                Map<Place, WrongEntry> more = new LinkedHashMap<>(state.wrong);
                state.wrong.forEach((place, entry) -> {
                    if (place instanceof Place.Cell(int at, var field) && at == row) {
                        more.put(new Place.Cell(copy, field), entry);
                    }
                });
                state = new BoardState(state.board, state.rows, more, state.nextRow);
            }
        }
        return state;
    }

    public BoardState remove(List<Integer> which) {
        List<Channel> channels = new ArrayList<>();
        List<Integer> ids = new ArrayList<>();
        for (int at = 0; at < rows.size(); at++) {
            if (!which.contains(rows.get(at))) {
                channels.add(board.channels().get(at));
                ids.add(rows.get(at));
            }
        }
        Map<Place, WrongEntry> left = new LinkedHashMap<>(wrong);
        left.keySet().removeIf(place -> place instanceof Place.Cell(int row, var _) && which.contains(row));
        return new BoardState(board.withChannels(channels), ids, left, nextRow).settled();
    }

    /** The name itself if no channel has it, otherwise with the smallest number behind it that makes it free. */
    public String freeName(String wanted) {
        List<String> taken = board.channels().stream().map(Channel::name).toList();
        if (!taken.contains(wanted)) {
            return wanted;
        }
        String stem = wanted.replaceFirst(" \\d+$", "");
        int number = 2;
        while (taken.contains(stem + " " + number)) {
            number++;
        }
        return stem + " " + number;
    }
}
