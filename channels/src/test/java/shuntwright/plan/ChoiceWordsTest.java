package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.board.Objective;
import shuntwright.plan.Reached.Proof;
import shuntwright.quantity.Dimension;

class ChoiceWordsTest {

    private static Reached bounded(Objective objective, double value, double bound) {
        return new Reached(objective, value, OptionalDouble.of(bound), Proof.BOUNDED);
    }

    private static String value(Objective objective, double value) {
        return ChoiceWords.value(objective, value, "EUR");
    }

    @Test
    void valuesHaveTheUnitsOfTheirObjectives() {
        assertThat(value(Objective.LEAST_HEAT, 4.3125)).isEqualTo("4.313 W");
        assertThat(value(Objective.MOST_EVEN_HEAT, 0.87)).isEqualTo("87 % of a heat limit");
        assertThat(value(Objective.LEAST_COST, 1234.5)).isEqualTo("1,234.50 EUR");
        assertThat(value(Objective.FEWEST_PARTS, 12)).isEqualTo("12 part numbers");
        assertThat(value(Objective.FEWEST_PARTS, 1)).isEqualTo("1 part number");
        assertThat(value(Objective.FEWEST_PARTS, 10.25)).as("a bound between whole numbers")
                .isEqualTo("10.3 part numbers");
        assertThat(value(Objective.WIDEST_MARGIN, -0.05)).isEqualTo("-5 % margin");
        assertThat(value(Objective.WIDEST_MARGIN, Double.POSITIVE_INFINITY)).isEqualTo("none");
    }

    @Test
    void onlyWhatIsProvenIsCalledBest() {
        Reached proven = new Reached(Objective.LEAST_HEAT, 2, OptionalDouble.of(2), Proof.PROVEN);
        Reached open = new Reached(Objective.LEAST_HEAT, 2, OptionalDouble.empty(), Proof.OPEN);

        assertThat(ChoiceWords.proof(proven, "EUR")).isEqualTo("proven best");
        assertThat(ChoiceWords.proof(bounded(Objective.LEAST_HEAT, 2, 1.9), "EUR"))
                .isEqualTo("not proven best: nothing is better than 1.9 W, 5 % away");
        assertThat(ChoiceWords.proof(bounded(Objective.WIDEST_MARGIN, 0, 0.1), "EUR")).as("no share of nothing")
                .isEqualTo("not proven best: nothing is better than 10 % margin");
        assertThat(ChoiceWords.proof(open, "EUR")).startsWith("not proven best").contains("nothing is known");
        assertThat(List.of(proven, open).stream().map(ChoiceWords::distance)).containsExactly("proven", "open");
    }

    @Test
    void whatIsBestOnlyWithinTheHeatStepSaysSo() {
        Reached stepped = new Reached(Objective.LEAST_HEAT, 0.28, OptionalDouble.of(0.03), Proof.PROVEN);

        assertThat(ChoiceWords.proof(stepped, "EUR"))
                .isEqualTo("proven best within the heat step; nothing is better than 30 mW");
        assertThat(ChoiceWords.distance(stepped)).isEqualTo("within step");
        assertThat(ChoiceWords.withinStep(new Reached(Objective.LEAST_HEAT, 0.1 + 0.2, OptionalDouble.of(0.3),
                Proof.PROVEN))).as("rounding is no step").isFalse();
    }

    @Test
    void aDistanceIsRoundedUpAndNeverAway() {
        assertThat(ChoiceWords.distance(bounded(Objective.LEAST_COST, 1000, 987.6))).isEqualTo("1.3 %");
        assertThat(ChoiceWords.distance(bounded(Objective.LEAST_COST, 1000, 988))).isEqualTo("1.2 %");
        assertThat(ChoiceWords.distance(bounded(Objective.LEAST_COST, 1000, 999.99))).isEqualTo("below 0.01 %");
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(20260103);
        for (int i = 0; i < 1000; i++) {
            double gap = Math.pow(10, random.nextDouble(-3.9, 0.5));
            String said = ChoiceWords.distance(bounded(Objective.LEAST_COST, 1, 1 - gap));
            assertThat(said).endsWith(" %");
            double share = Double.parseDouble(said.replace(" %", "")) / 100;
            assertThat(share).as(said).isBetween(gap * (1 - 1e-9), gap * 1.11);
        }
    }

    @Test
    void aSearchThatWasCutShortSaysSo() {
        BoardChoice whole = new BoardChoice(List.of(), 300, 1, false, 1, 1, List.of(), Optional.empty());
        BoardChoice cut = new BoardChoice(List.of(), 12, -7, true, 12_345, 67, List.of(), Optional.empty());

        assertThat(ChoiceWords.search(whole)).isEqualTo("300 rounds, seed 1");
        assertThat(ChoiceWords.search(cut)).startsWith("12 rounds, seed -7; ended before its rounds");
        assertThat(ChoiceWords.among(cut))
                .isEqualTo("12,345 ways to serve the channels, 67 of them compared for the whole board");
    }

    @Test
    void aDemandSaysWhatItWouldHaveToBe() {
        Conflict.Member zone = new Conflict.Member(Conflict.Kind.SHARED_LIMIT, "zone port", "heat limit",
                OptionalDouble.of(2.5), OptionalDouble.of(2.9), Dimension.POWER);
        Conflict.Member winch = new Conflict.Member(Conflict.Kind.CHANNEL, "winch", "must-trip current",
                OptionalDouble.of(40), OptionalDouble.empty(), Dimension.CURRENT);
        Conflict.Member tap = new Conflict.Member(Conflict.Kind.TAP, "low", "one voltage", OptionalDouble.empty(),
                OptionalDouble.empty(), Dimension.VOLTAGE);

        assertThat(ChoiceWords.demand(zone) + " " + ChoiceWords.relaxed(zone))
                .isEqualTo("zone port: heat limit 2.5 W → 2.9 W would do");
        assertThat(ChoiceWords.demand(winch)).isEqualTo("channel winch: must-trip current");
        assertThat(ChoiceWords.relaxed(winch)).isEqualTo("40 A; no value was found that would do alone");
        assertThat(ChoiceWords.owner(tap)).isEqualTo("tap low");
        assertThat(ChoiceWords.relaxed(tap)).isEqualTo("no value was found that would do alone");
    }

    @Test
    void theOrderIsRead() {
        assertThat(ChoiceWords.order(List.of(Objective.LEAST_COST, Objective.FEWEST_PARTS)))
                .isEqualTo("least cost, then fewest parts");
    }
}
