package shuntwright.planner.window.shared;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.planner.entry.BoardField;
import shuntwright.planner.window.figures.Chance;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.TrialWords;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;

/** The tile that says on how many boards all channels are inside together. */
final class YieldTile {
    private static final String TITLE = "Board yield";

    private static final List<BoardField> FIELDS = List.of(BoardField.TRIALS, BoardField.SEED);

    /** A cost of fewer standard errors than this may be chance (common practice: two for about 95 %). */
    private static final double ERRORS = 2;

    private YieldTile() {
    }

    static SharedTile of(BoardStudy study) {
        BoardYield yield = study.yield();
        String product = product(study);
        String costly = yield.shared().stream().filter(each -> each.cost() > ERRORS * each.standardError())
                .findFirst()
                .map(each -> ", " + each.owner() + " costs " + Chance.difference(each.cost()))
                .orElse("");
        return new SharedTile(TITLE, Chance.of(yield.inside()), OptionalDouble.empty(), true, FIELDS)
                .withNote("product " + product + costly).withDetails(details(study, product));
    }

    private static String product(BoardStudy study) {
        return Chance.about(study.yield().product(), study.productAtLeast());
    }

    private static List<String> details(BoardStudy study, String product) {
        BoardYield yield = study.yield();
        List<String> lines = new ArrayList<>();
        lines.add("All channels with a circuit are inside together on " + Chance.of(yield.inside())
                + " of the boards, with one supply, ambient and reference for all channels of a board.");
        lines.add("The product of the channels' own probabilities would have claimed " + product + ".");
        if (yield.shared().isEmpty()) {
            lines.add("What each shared thing costs is found with the last trials, where any board is outside.");
        }
        for (BoardYield.SharedCost each : yield.shared()) {
            lines.add(each.owner() + " at its nominal value: "
                    + (each.without() < 1 ? Chance.about(each.without(), 0) : "no trial outside") + ", so it costs "
                    + Chance.difference(each.cost(), each.standardError()));
        }
        lines.add(TrialWords.count(yield.inside().trials()) + " boards tried.");
        return lines;
    }

    static SharedTile without(PlanSampling.State state) {
        String value = switch (state) {
            case RUNNING -> "sampling …";
            case STOPPED -> "not sampled: stopped";
            case FAILED -> "not sampled: error";
            case IDLE, DONE -> "not sampled";
        };
        return new SharedTile(TITLE, value, OptionalDouble.empty(), true, FIELDS);
    }
}
