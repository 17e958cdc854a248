package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;

import shuntwright.accuracy.LimitWords;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Sampling;
import shuntwright.planner.work.TrialWords;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield.SharedCost;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.ProbabilityWords;

/** What sampling says, as text: the board in a few lines, then a line for each channel. */
final class StudyText {
    private static final int DIGITS = 4;
    /** Shared inputs named at most. */
    private static final int COSTS = 3;
    /** Channels named at most. */
    private static final int NAMES = 3;
    /** A cost of fewer standard errors than this may be chance (common practice: two for about 95 %). */
    private static final double ERRORS = 2;
    private static final int NOT_PAINTED = -1;

    /** What the headings are too short to say. */
    private static final List<String> LEGEND = List.of(
            "Outside: in any outcome asked for. JCGM 100: whether its combined uncertainty is valid for all",
            "outcomes (JCGM 101, clause 8). Details with --budget CHANNEL.");

    private StudyText() {
    }

    /** The board: what was drawn, how many boards have every circuit inside, what costs most of them. */
    static List<String> board(BoardStudy study) {
        Columns lines = new Columns(NOT_PAINTED);
        lines.add(List.of("sampled", trials(study)));
        List<String> unsettled = study.channels().stream().filter(each -> !each.settled()).map(ChannelStudy::channel)
                .toList();
        if (!unsettled.isEmpty()) {
            lines.add(List.of("not stable yet", names(unsettled) + "; more with --trials"));
        }
        if (study.channels().isEmpty()) {
            return lines.lines();
        }
        lines.add(List.of("boards with every circuit inside", ProbabilityWords.of(study.yield().inside())));
        lines.add(List.of("claimed by the product of channels", ProbabilityWords.product(study)));
        if (!study.yield().shared().isEmpty()) {
            lines.add(List.of("shared inputs that cost most of it", costs(study.yield().shared())));
        }
        return lines.lines();
    }

    private static String trials(BoardStudy study) {
        List<Long> drawn = study.channels().stream().flatMap(each -> each.outcomes().stream())
                .map(each -> each.sampled().trials()).distinct().sorted().toList();
        String kind = switch (study.sampling().trials()) {
            case Sampling.Trials.Fixed _ -> "";
            case Sampling.Trials.Adaptive _ -> " (adaptive)";
        };
        String count = drawn.isEmpty()
                ? "no circuit, so no"
                : drawn.size() == 1
                        ? TrialWords.count(drawn.getFirst())
                        : TrialWords.count(drawn.getFirst()) + " to " + TrialWords.count(drawn.getLast());
        return count + " trials of each channel" + kind + ", seed " + study.sampling().seed();
    }

    private static String names(List<String> channels) {
        String first = String.join(", ", channels.subList(0, Math.min(NAMES, channels.size())));
        return channels.size() > NAMES ? first + " and " + (channels.size() - NAMES) + " more" : first;
    }

    private static String costs(List<SharedCost> shared) {
        List<String> clear = shared.stream().filter(each -> each.cost() > ERRORS * each.standardError()).limit(COSTS)
                .map(each -> each.owner() + " " + ProbabilityWords.estimate(each.cost()) + " ±"
                        + ProbabilityWords.estimate(each.standardError()))
                .toList();
        return clear.isEmpty() ? "none that stands out from chance" : String.join(", ", clear);
    }

    /** The table of channels: the trip current's coverage interval, then what holds for all outcomes together. */
    static List<String> channels(BoardStudy study) {
        if (study.channels().isEmpty()) {
            return List.of();
        }
        Columns table = new Columns(NOT_PAINTED);
        table.add(List.of("channel", percent(study.channels().getFirst().coverage()) + " of trips",
                "probability of being outside", "JCGM 100"));
        for (ChannelStudy each : study.channels()) {
            String interval = each.outcome(Outcome.TRIP).map(trip -> range(trip.sampled().symmetric().range()))
                    .orElse("-");
            table.add(List.of(each.channel(), interval, ProbabilityWords.of(each.outside()), validity(each)));
        }
        List<String> lines = new ArrayList<>(table.lines());
        lines.addAll(LEGEND);
        return lines;
    }

    private static String validity(ChannelStudy study) {
        return study.outcomes().stream().allMatch(each -> each.validation().valid()) ? "valid" : "not valid";
    }

    static String percent(double share) {
        return QuantityWriter.write(share, Dimension.RATIO);
    }

    static String range(Range range) {
        return LimitWords.show(range, DIGITS);
    }
}
