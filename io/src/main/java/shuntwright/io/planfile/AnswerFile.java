package shuntwright.io.planfile;

import java.util.List;

import shuntwright.plan.Front;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Plan;
import shuntwright.plan.WhatIf;

/** Writes answers to questions about a board as JSON, by the same rules as {@link PlanFile}. */
public final class AnswerFile {

    private AnswerFile() {
    }

    /** @param plan of the board as it is */
    public static byte[] front(Plan plan, Front front) {
        return PlanFile.bytes(AnswerTables.FRONT, new AnswerTables.FrontAnswer(plan, front));
    }

    /**
     * @param plan    of the board as it is
     * @param channel whose other choices they are
     */
    public static byte[] others(Plan plan, String channel, List<OtherChoice> others) {
        return PlanFile.bytes(AnswerTables.OTHERS, new AnswerTables.OthersAnswer(plan, channel, others));
    }

    /** @param plan of the board as it is */
    public static byte[] whatIf(Plan plan, WhatIf whatIf) {
        return PlanFile.bytes(AnswerTables.WHAT_IF, new AnswerTables.WhatIfAnswer(plan, whatIf));
    }
}
