package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;

import javafx.application.ColorScheme;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;

import org.junit.jupiter.api.Test;

import shuntwright.parts.Catalogue;
import shuntwright.plan.Finding;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;

class StatusModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final StatusModel status = new StatusModel(session);

    @Test
    void countsTheAcceptedChannels() {
        assertThat(status.textBinding().get())
                .isEqualTo("2 of 5 channels accepted (1 likely, 1 outside, 1 incomplete)");
    }

    @Test
    void aFaultOfTheBoardIsNamed() {
        Finding fault = new Finding(Finding.Key.SUPPLY_OVERLOADED, Optional.empty(), "120 mA of 100 mA.", List.of());
        BoardSession overloaded = Sessions.planned((board, parts, progress) -> {
            Plan plan = HandMadePlans.plan(board, parts, progress);
            return new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), plan.alerts(), plan.taps(),
                    plan.references(),
                    plan.parts(), List.of(fault), plan.choice(), Optional.empty());
        });
        StatusModel words = new StatusModel(overloaded);
        overloaded.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        assertThat(words.textBinding().get()).endsWith("; board: supply overloaded");
    }

    @Test
    void whatWasDoneStaysUntilTheNextEdit() {
        status.done("saved boat.board.json");
        assertThat(status.textBinding().get()).isEqualTo("Saved boat.board.json");
        session.enter(new Place.Cell(0, ChannelField.LOAD), "19");
        assertThat(status.textBinding().get())
                .isEqualTo("2 of 5 channels accepted (1 likely, 1 outside, 1 incomplete)");
    }

    @Test
    void samplingIsSaidBesideTheVerdicts() {
        Queue<Runnable> drawing = new ArrayDeque<>();
        BoardSession sampled = new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run),
                new PlanSampling((plan, how, depth, progress) -> {
                    progress.reached("channels", 3, 4);
                    return HandMadeStudies.sample(plan, how, depth, Progress.SILENT);
                }, drawing::add, Runnable::run), Sessions.PATIENT);
        StatusModel words = new StatusModel(sampled);
        List<String> said = new ArrayList<>();
        words.textBinding().subscribe(text -> {
            said.add(text);
        });
        sampled.start(HandMadeBoards.boat(), Catalogue.EMPTY, true);
        drawing.remove().run();
        assertThat(said).contains(
                "2 of 5 channels accepted (2 outside, 1 incomplete) – sampling 10,000 trials of 4 channels, 75 % …",
                "2 of 5 channels accepted (1 likely, 1 outside, 1 incomplete) – sampling 1,000,000 trials of 4 channels, 75 % …");
        assertThat(said.getLast()).isEqualTo("2 of 5 channels accepted (1 likely, 1 outside, 1 incomplete)");
        sampled.enter(new Place.Cell(0, ChannelField.LOAD), "19");
        sampled.stopSampling();
        assertThat(said.getLast()).endsWith(" – sampling stopped");
    }

    @Test
    void wrongEntriesAreCountedWithTheReasonOfTheLast() {
        assertThat(status.wrongBinding().get()).isEmpty();
        session.enter(new Place.Cell(0, ChannelField.SIDE), "middle");
        assertThat(status.wrongBinding().get()).startsWith("1 wrong entry: ").contains("high or low");
        session.enter(new Place.Cell(1, ChannelField.LOAD), "-1");
        assertThat(status.wrongBinding().get()).startsWith("2 wrong entries, the last: ").contains("above 0 A");
    }

    @Test
    void theLookFollowsTheSystemUnlessChosen() {
        ObjectProperty<ColorScheme> system = new SimpleObjectProperty<>(ColorScheme.LIGHT);
        ThemeChoice choice = new ThemeChoice(system);
        assertThat(choice.themeProperty().get()).isEqualTo(Theme.LIGHT);
        system.set(ColorScheme.DARK);
        assertThat(choice.themeProperty().get()).isEqualTo(Theme.DARK);
        choice.wishProperty().set(ThemeChoice.Wish.LIGHT);
        assertThat(choice.themeProperty().get()).isEqualTo(Theme.LIGHT);
    }
}
