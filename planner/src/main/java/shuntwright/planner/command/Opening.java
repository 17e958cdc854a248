package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.io.form.NearestWord;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.Problem;
import shuntwright.io.workplace.Workplace;

/** Opens boards and finds in them what options name. */
final class Opening {

    private Opening() {
    }

    /**
     * @param parts files besides the board's own
     * @throws BadInput with every problem of every file
     */
    static Workplace of(Path board, List<Path> parts) {
        return switch (Workplace.open(board, parts)) {
            case FileReading.Opened<Workplace>(Workplace opened) -> opened;
            case FileReading.Refused<Workplace>(List<Problem> problems) ->
                throw new BadInput(problems.stream().map(Problem::toString).toList());
        };
    }

    /**
     * @param option that names the channel
     * @throws BadInput when the board has no such channel
     */
    static void known(String option, String channel, Board board) {
        List<String> names = board.channels().stream().map(Channel::name).toList();
        if (!names.contains(channel)) {
            throw new BadInput(option + ": " + NearestWord.unknown("channel", channel, names));
        }
    }
}
