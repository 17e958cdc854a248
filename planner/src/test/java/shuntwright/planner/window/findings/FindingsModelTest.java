package shuntwright.planner.window.findings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.List;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.parts.Catalogue;
import shuntwright.plan.Verdict;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeParts;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.work.Planning;

class FindingsModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final FindingsModel model = new FindingsModel(session);

    @Test
    void showsTheSelectedChannel() {
        session.selectionProperty().set(List.of(3));
        assertThat(model.shownProperty().get().title()).isEqualTo("anchor light");
        assertThat(model.shownProperty().get().verdict()).contains(Verdict.OUTSIDE);
        assertThat(model.shownProperty().get().findings()).hasSize(1);
        session.selectionProperty().set(List.of());
        assertThat(model.shownProperty().get().title()).isEmpty();
    }

    @Test
    void aCureIsAppliedAndCanBeUndone() {
        session.selectionProperty().set(List.of(3));
        model.apply(model.shownProperty().get().cures().getFirst());
        assertThat(model.shownProperty().get().verdict()).contains(Verdict.INSIDE);
        assertThat(session.undoNameProperty().get()).contains("window widened").contains("anchor light");
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
    }

    @Test
    void aCureOfAnEarlierStateIsNotApplied() {
        Queue<Runnable> background = new ArrayDeque<>();
        BoardSession slow = new BoardSession(new Planning(HandMadePlans::plan, background::add, Runnable::run),
                Sessions.sampling(), Sessions.PATIENT);
        FindingsModel findings = new FindingsModel(slow);
        slow.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        background.remove().run();
        slow.selectionProperty().set(List.of(3));
        var cure = findings.shownProperty().get().cures().getFirst();
        slow.enter(new Place.Cell(3, ChannelField.LOAD), "1.9");
        assertThat(findings.shownProperty().get().stale()).isTrue();
        findings.apply(cure);
        assertThat(slow.state().board().channels().get(3).currents().mustTrip()).hasValue(5.05);
    }

    @Test
    void aWrongEntryIsNamedWithWhatCountsUntilThen() {
        session.selectionProperty().set(List.of(0));
        session.enter(new Place.Cell(0, ChannelField.MUST_TRIP), "garbage");
        assertThat(model.shownProperty().get().wrong()).singleElement().asString()
                .startsWith("Must-trip \"garbage\": ").endsWith("Until then 31 A counts.");
        session.selectionProperty().set(List.of(1));
        assertThat(model.shownProperty().get().wrong()).isEmpty();
    }

    @Test
    void theChosenCircuitIsNamed() {
        session.selectionProperty().set(List.of(0));
        assertThat(model.shownProperty().get().chosen())
                .extracting(line -> line.title() + ": " + line.words())
                .contains("Shunt: 2 × 4 mΩ " + HandMadeParts.SHUNT.partNumber(),
                        "Comparator: " + HandMadeParts.COMPARATOR.partNumber(),
                        "Hysteresis: injected current, 4.7 kΩ")
                .anyMatch(line -> line.startsWith("Threshold: ") && line.endsWith(" from 10 kΩ over 10 kΩ at supply"));
        session.selectionProperty().set(List.of(4));
        assertThat(model.shownProperty().get().chosen()).isEmpty();
    }
}
