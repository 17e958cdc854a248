package shuntwright.planner.window;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.StringBinding;
import javafx.beans.property.ReadOnlyStringWrapper;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Finding;
import shuntwright.plan.Plan;
import shuntwright.plan.Verdict;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;
import shuntwright.planner.session.WrongEntry;
import shuntwright.planner.window.figures.Aims;
import shuntwright.planner.work.TrialWords;

/** What the status bar says. */
final class StatusModel {
    private final BoardSession session;
    private final ReadOnlyStringWrapper done = new ReadOnlyStringWrapper("");
    private final StringBinding text;
    private final StringBinding wrong;

    StatusModel(BoardSession session) {
        this.session = session;
        text = Bindings.createStringBinding(this::words, session.openProperty(), session.messageProperty(), done,
                session.planning().stageProperty(), session.planning().bestProperty(), session.plannedProperty(),
                session.stateProperty(),
                session.sampling().stageProperty(), session.sampling().stateProperty());
        wrong = Bindings.createStringBinding(() -> {
            var entries = session.state().wrong();
            return switch (entries.size()) {
                case 0 -> "";
                case 1 -> "1 wrong entry: " + entries.values().stream().map(WrongEntry::reason).findFirst().orElse("");
                default -> entries.size() + " wrong entries, the last: "
                        + entries.values().stream().map(WrongEntry::reason).reduce((_, last) -> last).orElse("");
            };
        }, session.stateProperty());
        session.stateProperty().subscribe(() -> done.set(""));
    }

    private String words() {
        if (!session.messageProperty().get().isEmpty()) {
            return session.messageProperty().get();
        }
        if (!session.planning().stageProperty().get().isEmpty()) {
            return capital(session.planning().stageProperty().get()) + " …" + best();
        }
        String last = done.get().isEmpty()
                ? session.plannedProperty().get().map(this::verdicts).orElse("")
                : capital(done.get());
        return last.isEmpty() ? capital(sampling()) : last + (sampling().isEmpty() ? "" : " – " + sampling());
    }

    /** The best choice so far, by what decides first. */
    private String best() {
        String currency = session.currency();
        return session.planning().bestProperty().get().flatMap(each -> each.reached().stream().findFirst())
                .map(each -> " best so far " + Aims.show(each.objective(), each.value(), currency)).orElse("");
    }

    private String sampling() {
        return switch (session.sampling().stateProperty().get()) {
            case IDLE, FAILED, DONE -> "";
            case RUNNING -> session.sampling().stageProperty().get() + " …";
            case STOPPED -> "sampling stopped" + session.plannedProperty().get().flatMap(each -> each.plan().study())
                    .map(study -> " at " + TrialWords.of(study.sampling())).orElse("");
        };
    }

    private String verdicts(Planned planned) {
        int all = planned.plan().channels().size();
        long accepted = planned.plan().channels().stream().filter(ChannelPlan::accepted).count();
        String words = all == 0
                ? "No channels yet: type a name into the last row."
                : accepted + " of " + all + (all == 1 ? " channel accepted" : " channels accepted")
                        + others(planned.plan()) + faults(planned.plan());
        return session.currentBinding().get() ? words : words + ", as of before the last edit";
    }

    /** How many there are of each verdict that is not inside, such as " (2 outside, 1 no fit)". */
    private static String others(Plan plan) {
        String counted = Arrays.stream(Verdict.values()).filter(verdict -> verdict != Verdict.INSIDE)
                .map(verdict -> Map.entry(verdict.word(),
                        plan.channels().stream().filter(each -> each.verdict() == verdict).count()))
                .filter(each -> each.getValue() > 0).map(each -> each.getValue() + " " + each.getKey())
                .collect(Collectors.joining(", "));
        return counted.isEmpty() ? "" : " (" + counted + ")";
    }

    private static String faults(Plan plan) {
        List<Finding> faults = plan.findings().stream()
                .filter(each -> each.key().severity() == Finding.Severity.FAULT).toList();
        return switch (faults.size()) {
            case 0 -> "";
            case 1 -> "; board: " + faults.getFirst().key().words();
            default -> "; board: " + faults.getFirst().key().words() + " and " + (faults.size() - 1) + " more";
        };
    }

    private static String capital(String words) {
        return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    /** Says that something was done, until the next edit. */
    void done(String what) {
        done.set(what);
    }

    StringBinding textBinding() {
        return text;
    }

    /** Number of wrong entries and the reason of the last; empty when there is none. */
    StringBinding wrongBinding() {
        return wrong;
    }
}
