package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.board.Acceptance;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.ChannelStudy;

/** Lets the propagated distributions decide what the combined uncertainty or a first look had to. */
final class Studied {

    private Studied() {
    }

    /** The plan with the study, and with verdicts and findings that rest on it. */
    static Plan with(Plan plan, BoardStudy study) {
        List<ChannelPlan> channels = new ArrayList<>();
        for (ChannelPlan each : plan.channels()) {
            Optional<ChannelStudy> found = each.solved().isPresent()
                    ? study.channel(each.channel().name())
                    : Optional.empty();
            channels.add(found.map(one -> with(each, one, plan.board().acceptance())).orElse(each));
        }
        return new Plan(plan.board(), plan.currency(), channels, plan.shared(), plan.alerts(), plan.taps(),
                plan.references(), plan.parts(), plan.findings(), plan.choice(), Optional.of(study));
    }

    private static ChannelPlan with(ChannelPlan plan, ChannelStudy study, Acceptance acceptance) {
        SolvedChannel solved = plan.solved().orElseThrow();
        List<Assessment> assessments = solved.assessments().stream()
                .map(each -> study.outcome(each.outcome())
                        .map(found -> each.withPropagated(found.sampled().symmetric().range())).orElse(each))
                .toList();
        SolvedChannel sampled = solved.withAssessments(assessments);
        Verdict verdict = ChannelSolver.verdict(sampled);
        boolean accepted = ChannelSolver.accepted(verdict, acceptance);
        List<Finding> findings = new ArrayList<>();
        for (Finding each : plan.findings()) {
            if (each.key() != Finding.Key.BY_COVERAGE_ONLY && each.key() != Finding.Key.OUTSIDE_WINDOW) {
                findings.add(each);
            }
        }
        findings.addAll(Findings.outside(sampled, verdict));
        return new ChannelPlan(plan.channel(), verdict, accepted, Optional.of(sampled), Findings.sorted(findings),
                accepted ? List.of() : plan.cures(), plan.refusals());
    }
}
