package shuntwright.planner.window;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.StringBinding;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

import shuntwright.plan.ChannelPlan;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Planned;
import shuntwright.planner.session.WrongEntry;

/** What the status bar says. */
final class StatusModel {
    private final BoardSession session;
    private final ReadOnlyStringWrapper done = new ReadOnlyStringWrapper("");
    private final StringBinding text;
    private final StringBinding wrong;

    StatusModel(BoardSession session) {
        this.session = session;
        text = Bindings.createStringBinding(this::words, session.openProperty(), session.messageProperty(), done,
                session.planning().stageProperty(), session.plannedProperty(), session.stateProperty());
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
            return capital(session.planning().stageProperty().get()) + " …";
        }
        if (!done.get().isEmpty()) {
            return capital(done.get());
        }
        return session.plannedProperty().get().map(this::verdicts).orElse("");
    }

    private String verdicts(Planned planned) {
        int all = planned.plan().channels().size();
        long accepted = planned.plan().channels().stream().filter(ChannelPlan::accepted).count();
        String words = all == 0
                ? "No channels yet: type a name into the last row."
                : accepted + " of " + all + " channels accepted";
        return session.currentBinding().get() ? words : words + ", as of before the last edit";
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    /** Says that something was done, until the next edit. */
    void done(String what) {
        done.set(what);
    }

    ReadOnlyStringProperty doneProperty() {
        return done.getReadOnlyProperty();
    }

    StringBinding textBinding() {
        return text;
    }

    /** Number of wrong entries and the reason of the last; empty when there is none. */
    StringBinding wrongBinding() {
        return wrong;
    }
}
