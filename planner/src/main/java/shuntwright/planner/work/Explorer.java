package shuntwright.planner.work;

import java.util.List;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Front;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Progress;
import shuntwright.plan.WhatIf;

/** Answers questions about plans that might be; each throws {@link BoardPlanner.Cancelled} when progress says so. */
public interface Explorer {

    /** @param points most plans wanted */
    Front front(Board board, Catalogue catalogue, Objective first, Objective second, int points, Progress progress);

    /** @param most circuits wanted, best first */
    List<OtherChoice> others(Board board, Catalogue catalogue, String channel, int most, Progress progress);

    /**
     * @param zone   whose heat limit is varied; empty for the others
     * @param values SI, ascending
     */
    WhatIf whatIf(Board board, Catalogue catalogue, WhatIf.Varied varied, String zone, List<Double> values,
            Progress progress);

    /** Asks a planner, which must not be used by another thread. */
    static Explorer of(BoardPlanner planner) {
        return new Explorer() {
            @Override
            public Front front(Board board, Catalogue catalogue, Objective first, Objective second, int points,
                    Progress progress) {
                return planner.front(board, catalogue, first, second, points, progress);
            }

            @Override
            public List<OtherChoice> others(Board board, Catalogue catalogue, String channel, int most,
                    Progress progress) {
                return planner.others(board, catalogue, channel, most, progress);
            }

            @Override
            public WhatIf whatIf(Board board, Catalogue catalogue, WhatIf.Varied varied, String zone,
                    List<Double> values, Progress progress) {
                return planner.whatIf(board, catalogue, varied, zone, values, progress);
            }
        };
    }
}
