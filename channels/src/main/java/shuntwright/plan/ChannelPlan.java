package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Channel;

/**
 * The plan of one channel.
 *
 * @param channel  what was asked
 * @param verdict  whether it is met
 * @param accepted whether the board's acceptance takes that verdict
 * @param solved   parts and numbers; empty for no fit and incomplete
 * @param findings what a user should know, most serious first
 * @param cures    single changes tried, the smallest that cures first; empty for accepted channels
 * @param refusals why no part fits, by family; empty unless no fit
 */
public record ChannelPlan(Channel channel, Verdict verdict, boolean accepted, Optional<SolvedChannel> solved,
        List<Finding> findings, List<Cure> cures, List<FamilyRefusal> refusals) {

    public ChannelPlan {
        findings = List.copyOf(findings);
        cures = List.copyOf(cures);
        refusals = List.copyOf(refusals);
    }
}
