package shuntwright.planner.window.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.board.Zone;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Conflict;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.work.Planning;
import shuntwright.quantity.Dimension;

class ChoiceModelTest {
    /** The boat may give off half its heat in port. */
    private static final Board WARM = HandMadeBoards.boat().withZones(
            List.of(new Zone("port", OptionalDouble.of(0.4), OptionalDouble.of(12))));

    private final BoardSession session = Sessions.chosen(HandMadeBoards.boat());
    private final ChoiceModel model = new ChoiceModel(session);

    private List<Objective> wanted() {
        return session.state().board().preference().order();
    }

    @Test
    void saysWhatIsReachedAndHowGoodThatIs() {
        assertThat(model.shownProperty().get().title()).isEqualTo("The best choice found");
        assertThat(model.shownProperty().get().aims()).extracting(Shown.Aim::wanted).containsExactly("Least heat",
                "Least cost");
        Shown.Aim heat = model.shownProperty().get().aims().getFirst();
        // I²R/2 at 4 mΩ of 20, 12, 4 and 2 A: 2 (400 + 144 + 16 + 4) mW
        assertThat(heat.value()).isEqualTo("1.128 W");
        assertThat(heat.bound()).isEqualTo("1.015 W");
        assertThat(heat.proof()).isEqualTo(Reached.Proof.BOUNDED);
        assertThat(heat.words()).isEqualTo("at most 10 % from the best");
        Shown.Aim cost = model.shownProperty().get().aims().getLast();
        assertThat(cost.value()).endsWith(" EUR");
        assertThat(cost.words()).isEqualTo("proven best");
        assertThat(cost.distance()).isEqualTo("0 %");
        assertThat(model.shownProperty().get().facts()).extracting(each -> each.title() + ": " + each.value())
                .contains("Rounds: 300", "Seed: 1", "Candidates: 12,345, compared 678")
                .anyMatch(each -> each.matches("Time it took: \\d+ ms"));
    }

    @Test
    void theOrderIsChangedByNamedEditsThatCanBeUndone() {
        model.move(Objective.LEAST_COST, -1);
        assertThat(wanted()).containsExactly(Objective.LEAST_COST, Objective.LEAST_HEAT);
        assertThat(session.undoNameProperty().get()).isEqualTo("put least cost before least heat");
        assertThat(model.shownProperty().get().aims().getFirst().wanted()).isEqualTo("Least cost");
        model.add(Objective.FEWEST_PARTS);
        assertThat(model.others()).containsExactly(Objective.MOST_EVEN_HEAT, Objective.WIDEST_MARGIN);
        model.remove(Objective.LEAST_COST);
        assertThat(wanted()).containsExactly(Objective.LEAST_HEAT, Objective.FEWEST_PARTS);
        session.undo();
        session.undo();
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
    }

    @Test
    void theLastObjectiveStaysAndTheFirstCannotGoEarlier() {
        model.remove(Objective.LEAST_COST);
        model.remove(Objective.LEAST_HEAT);
        assertThat(wanted()).containsExactly(Objective.LEAST_HEAT);
        model.move(Objective.LEAST_HEAT, -1);
        assertThat(session.undoNameProperty().get()).isEqualTo("do not want least cost");
    }

    @Test
    void theBestSoFarShowsWhileABetterOneIsLookedForAndCanBeKept() {
        Queue<Runnable> background = new ArrayDeque<>();
        Queue<Runnable> publisher = new ArrayDeque<>();
        Planning.Planner patient = (board, catalogue, progress) -> {
            Plan plan = HandMadePlans.plan(board, catalogue, progress);
            progress.better(HandMadeChoices.choice(plan, 20, false));
            while (!publisher.isEmpty()) {
                publisher.remove().run();
            }
            return HandMadeChoices.plan(board, catalogue, shuntwright.plan.Progress.SILENT);
        };
        BoardSession slow = new BoardSession(new Planning(patient, background::add, publisher::add),
                Sessions.sampling(), Sessions.PATIENT);
        ChoiceModel looking = new ChoiceModel(slow);
        Shown[] seen = new Shown[1];
        slow.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        assertThat(looking.shownProperty().get().title()).contains("looked for");
        slow.planning().bestProperty().subscribe(best -> {
            if (best.isPresent()) {
                seen[0] = looking.shownProperty().get();
                looking.keepBest();
            }
        });
        background.remove().run();
        assertThat(slow.planning().stageProperty().get()).contains("best so far");
        publisher.forEach(Runnable::run);
        assertThat(seen[0].working()).isTrue();
        assertThat(seen[0].title()).startsWith("Best so far");
        assertThat(seen[0].aims().getFirst().value()).isEqualTo("1.128 W");
        assertThat(seen[0].facts()).extracting(Shown.Fact::title).doesNotContain("Time it took");
        assertThat(looking.shownProperty().get().working()).isFalse();
        assertThat(slow.plannedProperty().get()).isPresent();
    }

    @Test
    void aConflictNamesWhatEachDemandWouldNeed() {
        BoardSession warm = Sessions.chosen(WARM);
        ChoiceModel clashing = new ChoiceModel(warm);
        Shown shown = clashing.shownProperty().get();
        assertThat(shown.title()).contains("breaks least");
        assertThat(shown.broken()).containsExactly("zone port");
        Shown.Clash clash = shown.conflict().orElseThrow();
        assertThat(clash.title()).endsWith("without any one of them the others can");
        assertThat(clash.parts()).extracting(each -> each.demand() + ": " + each.change()).containsExactly(
                "zone port, heat limit: 400 mW → 564.1 mW would do",
                "channel windlass, must-trip current: 18 A → 21.3 A would do",
                "channel bilge pump, no-trip current: 25 A; no value was found that would do alone");
        assertThat(clash.parts()).extracting(Shown.Part::applies).containsExactly(true, false, false);
    }

    @Test
    void aLimitIsRelaxedAsFarAsIsShownAndThatEndsTheConflict() {
        BoardSession warm = Sessions.chosen(WARM);
        ChoiceModel clashing = new ChoiceModel(warm);
        clashing.apply(clashing.shownProperty().get().conflict().orElseThrow().parts().getFirst());
        // half of 1.128 W, a ten-thousandth more, rounded up
        assertThat(warm.state().board().zones().getFirst())
                .isEqualTo(new Zone("port", OptionalDouble.of(0.5641), OptionalDouble.of(12)));
        assertThat(clashing.shownProperty().get().conflict()).isEmpty();
        assertThat(warm.undoNameProperty().get()).startsWith("zone port, heat limit");
        warm.undo();
        assertThat(warm.state().board()).isEqualTo(WARM);
    }

    @Test
    void supplyAndBoardLimitsAreRelaxedToo() {
        Board board = HandMadeBoards.boat();
        assertThat(relaxed("sense supply", 0.012345, Dimension.CURRENT, board).supply().availableCurrent())
                .isEqualTo(0.01235);
        assertThat(relaxed("board heat", 7.0001, Dimension.POWER, board).heatLimit()).hasValue(7.001);
        assertThat(Relaxing.change(member("reference quiet", 0.01, Dimension.CURRENT), board))
                .as("a part's own limit").isEmpty();
        assertThat(Relaxing.change(member("zone nowhere", 1, Dimension.POWER), board)).isEmpty();
    }

    private static Conflict.Member member(String name, double relaxed, Dimension dimension) {
        return new Conflict.Member(Conflict.Kind.SHARED_LIMIT, name, "limit", OptionalDouble.of(relaxed / 2),
                OptionalDouble.of(relaxed), dimension);
    }

    private static Board relaxed(String name, double relaxed, Dimension dimension, Board board) {
        return Relaxing.change(member(name, relaxed, dimension), board).orElseThrow().apply(board);
    }

    @Test
    void theChannelOfADemandIsSelected() {
        BoardSession warm = Sessions.chosen(WARM);
        ChoiceModel clashing = new ChoiceModel(warm);
        clashing.select(clashing.shownProperty().get().conflict().orElseThrow().parts().get(1).member());
        assertThat(warm.selectionProperty().get()).containsExactly(1);
    }

    @Test
    void aBoardThatWasNotChosenSaysWhy() {
        ChoiceModel bare = new ChoiceModel(Sessions.of(HandMadeBoards.boat()));
        assertThat(bare.shownProperty().get().title()).startsWith("Nothing was chosen");
        assertThat(new ChoiceModel(Sessions.closed()).shownProperty().get().title()).startsWith("Nothing is chosen");
        assertThat(bare.orderProperty().get()).isEqualTo(Preference.DEFAULT.order());
    }
}
