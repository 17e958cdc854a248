package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.CATALOGUE;
import static shuntwright.plan.TrialBoards.board;
import static shuntwright.plan.TrialBoards.channel;
import static shuntwright.plan.TrialBoards.onLine;
import static shuntwright.plan.TrialBoards.pins;
import static shuntwright.plan.TrialBoards.plan;

import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

import shuntwright.board.AlertLine;
import shuntwright.board.Channel;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.quantity.Range;

/** Pull-ups at 3.3 V ±2 %; each output leaks 1 µA, sinks 5 mA, and pulls down to 0.1 V to 0.3 V. */
class AlertLinesTest {

    private static AlertLine line(OptionalDouble pullUp, double leakage, OptionalDouble rise, OptionalDouble low) {
        return new AlertLine("alert", Optional.empty(), pullUp, OptionalDouble.empty(), low, leakage, 100e-12, rise);
    }

    private static AlertPlan alert(AlertLine line) {
        return plan(TrialBoards.withLines(board(channel("a", 5), channel("b", 6)), line)).alerts().getFirst();
    }

    @Test
    void theIntervalFollowsSinkCurrentAndHighLevel() {
        AlertPlan alert = alert(line(OptionalDouble.empty(), 1e-6, OptionalDouble.empty(), OptionalDouble.empty()));
        // (3.366 V − 0.1 V)/5 mA and (3.234 V − 0.7·3.3 V)/3 µA.
        Range allowed = alert.allowed().orElseThrow();
        assertThat(allowed.min()).isEqualTo(653.2, within(1e-6));
        assertThat(allowed.max()).isEqualTo(308e3, within(1e-6));
        assertThat(alert.pullUp()).isEqualTo(10e3);
        assertThat(alert.current()).isEqualTo(3.366 / 10e3, within(1e-12));
        assertThat(alert.channels()).containsExactly("a", "b");
    }

    @Test
    void theRiseTimeBoundsThePullUp() {
        // 169.46 ns/(ln(0.7/0.3)·100 pF) = 2 kΩ.
        AlertPlan alert = alert(line(OptionalDouble.empty(), 1e-6, OptionalDouble.of(169.46e-9),
                OptionalDouble.empty()));
        assertThat(alert.most()).isEqualTo(2000, within(0.1));
        assertThat(alert.pullUp()).isEqualTo(2000);
    }

    @Test
    void anEmptyIntervalIsAFinding() {
        Plan plan = plan(TrialBoards.withLines(board(channel("a", 5)),
                line(OptionalDouble.empty(), 1e-6, OptionalDouble.of(10e-9), OptionalDouble.empty())));
        assertThat(plan.alerts().getFirst().allowed()).isEmpty();
        assertThat(plan.findings()).extracting(Finding::key).containsExactly(Finding.Key.ALERT_LEVELS);
        assertThat(plan.findings().getFirst().text()).contains("no pull-up satisfies both ends", "653", "118");
        assertThat(plan.accepted()).isFalse();
    }

    @Test
    void aGivenPullUpOutsideTheIntervalIsAFinding() {
        Plan plan = plan(TrialBoards.withLines(board(channel("a", 5)),
                line(OptionalDouble.of(470), 1e-6, OptionalDouble.empty(), OptionalDouble.empty())));
        assertThat(plan.alerts().getFirst().pullUp()).isEqualTo(470);
        assertThat(plan.findings()).extracting(Finding::key).containsExactly(Finding.Key.ALERT_LEVELS);
    }

    @Test
    void aLowLevelThatIsNotLowEnoughIsAFinding() {
        Plan plan = plan(TrialBoards.withLines(board(channel("a", 5)),
                line(OptionalDouble.empty(), 1e-6, OptionalDouble.empty(), OptionalDouble.of(0.25))));
        assertThat(plan.findings()).anySatisfy(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.ALERT_LEVELS);
            assertThat(finding.text()).contains("300 mV", "250 mV");
        });
    }

    private static Channel feedback(String name) {
        return channel(name, 5).withPins(pins(Optional.empty(), Optional.empty(), Optional.of("CF")));
    }

    @Test
    void feedbackOnASharedLineOnlyWherePinned() {
        AlertLine line = AlertLine.named("alert");
        Plan free = plan(TrialBoards.withLines(board(channel("a", 5), channel("b", 6)), line));
        assertThat(free.channels()).allSatisfy(each -> assertThat(
                each.solved().orElseThrow().circuit().network()).isNotInstanceOf(HysteresisNetwork.Feedback.class));
        Plan pinned = plan(TrialBoards.withLines(board(feedback("a"), channel("b", 6)), line));
        assertThat(pinned.channels().getFirst().solved().orElseThrow().circuit().network())
                .isInstanceOf(HysteresisNetwork.Feedback.class);
        assertThat(pinned.channels().getFirst().findings()).extracting(Finding::key)
                .contains(Finding.Key.FEEDBACK_COUPLES);
        Plan alone = plan(TrialBoards.withLines(board(onLine(feedback("a"), "mine"), onLine(channel("b", 6), "alert")),
                line, AlertLine.named("mine")));
        assertThat(alone.channels().getFirst().findings()).extracting(Finding::key)
                .doesNotContain(Finding.Key.FEEDBACK_COUPLES);
    }

    @Test
    void feedbackKnowsTheChosenPullUp() {
        AlertLine fast = line(OptionalDouble.empty(), 1e-6, OptionalDouble.of(169.46e-9), OptionalDouble.empty());
        Plan plan = plan(TrialBoards.withLines(board(feedback("a")), fast));
        HysteresisNetwork.Feedback network = (HysteresisNetwork.Feedback) plan.channels().getFirst().solved()
                .orElseThrow().circuit().network();
        assertThat(network.pullUp()).isEqualTo(plan.alerts().getFirst().pullUp()).isEqualTo(2000);
        Plan checked = new BoardPlanner().check(BoardPlanner.pinned(plan), CATALOGUE, Progress.SILENT);
        assertThat(checked.channels().getFirst().solved()).hasValueSatisfying(solved -> assertThat(
                solved.assessments()).isEqualTo(plan.channels().getFirst().solved().get().assessments()));
    }
}
