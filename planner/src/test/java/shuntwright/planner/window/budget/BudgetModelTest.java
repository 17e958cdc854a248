package shuntwright.planner.window.budget;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Outcome;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;

class BudgetModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final BudgetModel model = new BudgetModel(session);

    @Test
    void contributionsAreInAmperesAndOfTheTripTarget() {
        session.selectionProperty().set(List.of(2));
        BudgetRow first = model.rows().getFirst();
        assertThat(first.label()).isEqualTo("sense supply (supply)");
        assertThat(first.low()).isEqualTo("−200 mA");
        assertThat(first.lowPercent()).isEqualTo("−2.00 %");
        assertThat(first.highPercent()).isEqualTo("+1.80 %");
        assertThat(first.variance()).isEqualTo("70.0 %");
        assertThat(first.lowBar()).isEqualTo(-1);
        assertThat(model.rows()).extracting(BudgetRow::widest).isSortedAccordingTo((a, b) -> Double.compare(b, a));
        assertThat(model.summaryProperty().get()).contains("radar").contains("allowed 9.8 A to 10.2 A");
    }

    @Test
    void anotherOutcomeCanBeChosen() {
        session.selectionProperty().set(List.of(0));
        assertThat(model.outcomes()).containsExactly(Outcome.TRIP, Outcome.READING_AT_LOAD);
        model.outcomeProperty().set(Outcome.READING_AT_LOAD);
        assertThat(model.summaryProperty().get()).contains("reading at load current").contains("nominal 20 A");
    }

    @Test
    void anIncompleteChannelHasNoBudget() {
        session.selectionProperty().set(List.of(4));
        assertThat(model.rows()).isEmpty();
        assertThat(model.summaryProperty().get()).startsWith("No error budget");
    }
}
