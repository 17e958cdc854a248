package shuntwright.planner.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.List;
import java.util.Optional;
import java.util.Queue;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Verdict;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.BoardField;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;

class BoardSessionTest {
    private final Queue<Runnable> background = new ArrayDeque<>();
    private final BoardSession session = new BoardSession(
            new Planning(HandMadePlans::plan, background::add, Runnable::run), Sessions.sampling(), Sessions.PATIENT);
    private final Place load = new Place.Cell(0, ChannelField.LOAD);

    @BeforeEach
    void open() {
        session.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        work();
    }

    private void work() {
        while (!background.isEmpty()) {
            background.remove().run();
        }
    }

    private Verdict verdict(int row) {
        return session.plannedProperty().get().orElseThrow().channel(row).orElseThrow().verdict();
    }

    @Test
    void anEditPlansAgainWhileTheLastPlanStays() {
        assertThat(session.currentBinding().get()).isTrue();
        session.enter(new Place.Cell(0, ChannelField.MUST_TRIP), "25.2 A");
        assertThat(session.currentBinding().get()).as("current before the planning is done").isFalse();
        assertThat(verdict(0)).isEqualTo(Verdict.INSIDE);
        work();
        assertThat(session.currentBinding().get()).isTrue();
        assertThat(verdict(0)).isEqualTo(Verdict.OUTSIDE);
    }

    @Test
    void editsHaveNamesAndCanBeUndone() {
        session.enter(load, "19");
        assertThat(session.undoNameProperty().get()).isEqualTo("load current of bilge pump");
        assertThat(session.unsavedProperty().get()).isTrue();
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
        assertThat(session.unsavedProperty().get()).isFalse();
        assertThat(session.redoNameProperty().get()).isEqualTo("load current of bilge pump");
        session.redo();
        assertThat(session.state().text(load)).isEqualTo("19 A");
    }

    @Test
    void aWrongEntryIsKeptUntilItIsCorrectedOrGivenUp() {
        session.enter(load, "lots");
        assertThat(session.state().text(load)).isEqualTo("lots");
        assertThat(session.state().wrong(load)).isPresent();
        assertThat(session.state().board()).as("board with a wrong entry").isEqualTo(HandMadeBoards.boat());

        session.enter(new Place.Cell(1, ChannelField.LOAD), "11");
        session.duplicateSelected();
        work();
        assertThat(session.state().text(load)).isEqualTo("lots");

        session.revert(load);
        assertThat(session.state().text(load)).isEqualTo("20 A");
        session.undo();
        assertThat(session.state().text(load)).isEqualTo("lots");
        session.enter(load, "18 A");
        assertThat(session.state().wrong(load)).isEmpty();
    }

    @Test
    void aWrongEntryThatAnotherEditMakesRightIsTakenOver() {
        Place zone = new Place.Cell(0, ChannelField.ZONE);
        session.enter(zone, "stern");
        assertThat(session.state().wrong(zone)).isPresent();
        session.enter(new Place.OfBoard(BoardField.ZONES), "port 2 W, starboard, stern 1 W");
        assertThat(session.state().wrong(zone)).isEmpty();
        assertThat(session.state().board().channels().getFirst().zone()).contains("stern");
    }

    @Test
    void rowsAreAddedDuplicatedAndRemoved() {
        session.selectionProperty().set(List.of(1));
        session.duplicateSelected();
        assertThat(session.state().board().channels()).extracting(each -> each.name()).containsExactly("bilge pump",
                "windlass", "windlass 2", "radar", "anchor light", "spare");
        assertThat(session.selectionProperty().get()).containsExactly(5);
        session.removeSelected();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
        assertThat(session.selectionProperty().get()).as("selected after removing").hasSize(1);
        int row = session.appendChannel(ChannelField.LOAD, "7");
        assertThat(session.state().channel(row).orElseThrow().currents().load()).hasValue(7);
        session.undo();
        assertThat(session.state().channel(row)).isEmpty();
        assertThat(session.selectionProperty().get()).as("selected after undo of adding").isEmpty();
    }

    @Test
    void onlyTheLastOfSeveralQuickEditsIsPlanned() {
        session.enter(load, "19");
        session.enter(load, "18");
        assertThat(background).hasSize(2);
        background.remove().run();
        assertThat(session.currentBinding().get()).isFalse();
        work();
        assertThat(session.plannedProperty().get().orElseThrow().plan().board()).isEqualTo(session.state().board());
    }

    @Test
    void aPlannersMistakeIsToldAndTheLastPlanStays() {
        BoardSession broken = Sessions.planned((board, catalogue, progress) -> {
            if (board.channels().getFirst().currents().load().orElse(0) < 20) {
                throw new IllegalStateException("divided by zero");
            }
            return HandMadePlans.plan(board, catalogue, progress);
        });
        broken.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        Optional<Planned> before = broken.plannedProperty().get();
        broken.enter(load, "19");
        assertThat(broken.messageProperty().get()).contains("divided by zero");
        assertThat(broken.plannedProperty().get()).isEqualTo(before);
        broken.undo();
        assertThat(broken.messageProperty().get()).isEmpty();
    }

    @Test
    void namesStayUnique() {
        session.enter(new Place.Cell(1, ChannelField.NAME), "bilge pump");
        assertThat(session.state().wrong(new Place.Cell(1, ChannelField.NAME))).isPresent();
        session.selectionProperty().set(List.of());
        session.addChannel("bilge pump");
        assertThat(session.state().board().channels().getLast().name()).isEqualTo("bilge pump 2");
    }

    @Test
    void aBoardThatIsInNoFileCountsAsUnsavedOnceEdited() {
        session.start(Board.named("empty"), Catalogue.EMPTY, true);
        assertThat(session.unsavedProperty().get()).isFalse();
        session.appendChannel(ChannelField.NAME, "horn");
        assertThat(session.unsavedProperty().get()).isTrue();
        session.markSaved(session.state().board());
        assertThat(session.unsavedProperty().get()).isFalse();
    }

    private final Queue<Runnable> drawing = new ArrayDeque<>();
    private final Queue<Runnable> patience = new ArrayDeque<>();

    private BoardSession sampledLater() {
        BoardSession later = new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run),
                new PlanSampling(HandMadeStudies::sample, drawing::add, Runnable::run), patience::add);
        later.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        return later;
    }

    private static Verdict radar(BoardSession of) {
        return of.plannedProperty().get().orElseThrow().channel(2).orElseThrow().verdict();
    }

    @Test
    void theFirstPlanIsOnShowBeforeItIsSampled() {
        BoardSession later = sampledLater();
        assertThat(later.currentBinding().get()).isTrue();
        assertThat(radar(later)).as("without trials nothing is likely").isEqualTo(Verdict.OUTSIDE);
        drawing.remove().run();
        assertThat(radar(later)).isEqualTo(Verdict.LIKELY);
        assertThat(later.currentBinding().get()).isTrue();
    }

    @Test
    void verdictsDoNotGoToAndFroWithEachEdit() {
        BoardSession later = sampledLater();
        drawing.remove().run();
        later.enter(load, "19");
        assertThat(radar(later)).as("until the new plan has its first picture").isEqualTo(Verdict.LIKELY);
        assertThat(later.currentBinding().get()).isFalse();
        drawing.remove().run();
        assertThat(radar(later)).isEqualTo(Verdict.LIKELY);
        assertThat(later.currentBinding().get()).isTrue();
    }

    @Test
    void aPlanWaitsOnlyAMomentForItsFirstPicture() {
        BoardSession later = sampledLater();
        drawing.remove().run();
        later.enter(load, "19");
        patience.forEach(Runnable::run);
        assertThat(later.currentBinding().get()).isTrue();
        assertThat(later.plannedProperty().get().orElseThrow().plan().study()).isEmpty();
        drawing.remove().run();
        patience.forEach(Runnable::run);
        assertThat(later.plannedProperty().get().orElseThrow().plan().study()).as("the pictures stay").isPresent();
    }

    @Test
    void aStoppedPlanIsShownWithoutTrialsAndCanBeSampledOn() {
        BoardSession later = sampledLater();
        drawing.remove().run();
        later.enter(load, "19");
        later.stopSampling();
        assertThat(later.currentBinding().get()).isTrue();
        assertThat(later.plannedProperty().get().orElseThrow().plan().study()).isEmpty();
        drawing.clear();
        later.sampleAgain();
        drawing.remove().run();
        assertThat(later.plannedProperty().get().orElseThrow().plan().study()).isPresent();
    }

    @Test
    void aNewerEditEndsTheSamplingOfTheOlderPlan() {
        BoardSession later = sampledLater();
        later.enter(load, "19");
        later.enter(load, "18");
        assertThat(drawing).hasSize(3);
        List<Double> loads = new java.util.ArrayList<>();
        later.plannedProperty().subscribe(plan -> plan.ifPresent(each -> loads
                .add(each.plan().board().channels().getFirst().currents().load().orElseThrow())));
        loads.clear();
        drawing.forEach(Runnable::run);
        assertThat(loads).as("three pictures of the last plan only").containsExactly(18.0, 18.0, 18.0);
    }

    @Test
    void aSamplersMistakeIsToldAndThePlanStands() {
        BoardSession broken = new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run),
                new PlanSampling((_, _, _, _) -> {
                    throw new IllegalStateException("no numbers left");
                }, Runnable::run, Runnable::run), Sessions.PATIENT);
        broken.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        assertThat(broken.messageProperty().get()).contains("no numbers left");
        assertThat(broken.currentBinding().get()).isTrue();
        broken.enter(load, "19");
        assertThat(broken.currentBinding().get()).as("plans are made as before").isTrue();
    }
}
