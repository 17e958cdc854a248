package shuntwright.io.planfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

import shuntwright.io.fixture.ChoiceFixtures;
import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.Plan;

class ChoiceInPlanFileTest {

    private static final Plan PLAN = PlanFixtures.full();
    private static final JsonNode FILE = read(PlanFile.bytes(PLAN));

    private static JsonNode read(byte[] file) {
        return JsonMapper.shared().readTree(file);
    }

    @Test
    void everyValueHasItsUnitItsBoundAndItsProof() {
        JsonNode reached = FILE.at("/choice/reached");
        assertThat(reached.at("/0/value_W").doubleValue()).isEqualTo(1.8);
        assertThat(reached.at("/0/proof").stringValue()).isEqualTo("proven");
        assertThat(reached.at("/0/gap_fraction").doubleValue()).isZero();
        assertThat(reached.at("/1/value_currency").doubleValue()).isEqualTo(1250);
        assertThat(reached.at("/1/bound_currency").doubleValue()).isEqualTo(1225);
        assertThat(reached.at("/1/proof").stringValue()).isEqualTo("bounded");
        assertThat(reached.at("/1/gap_fraction").doubleValue()).isCloseTo(25 / 1250.0, within(1e-15));
        assertThat(reached.at("/2/value_fraction").doubleValue()).isEqualTo(0.8);
        assertThat(reached.at("/3/value_parts").doubleValue()).isEqualTo(12);
        assertThat(reached.at("/3/proof").stringValue()).isEqualTo("open");
    }

    @Test
    void whatIsNotKnownIsAbsent() {
        JsonNode reached = FILE.at("/choice/reached");
        assertThat(reached.at("/3").has("bound_parts")).isFalse();
        assertThat(reached.at("/3").has("gap_fraction")).isFalse();
        assertThat(reached.at("/4/bound_fraction").doubleValue()).isEqualTo(0.1);
        assertThat(reached.at("/4").has("gap_fraction")).as("a share of a value of 0").isFalse();
    }

    @Test
    void howItWasSearchedAndWhatConflictsStandsThere() {
        JsonNode choice = FILE.at("/choice");
        assertThat(choice.at("/rounds").intValue()).isEqualTo(420);
        assertThat(choice.at("/seed").intValue()).isEqualTo(9);
        assertThat(choice.at("/cutShort").booleanValue()).isTrue();
        assertThat(choice.at("/candidates").intValue()).isEqualTo(12_345);
        assertThat(choice.at("/kept").intValue()).isEqualTo(678);
        assertThat(choice.at("/broken/0").stringValue()).isEqualTo("zone port");
        JsonNode conflict = choice.at("/conflict");
        assertThat(conflict.at("/minimal").booleanValue()).isFalse();
        assertThat(conflict.at("/members/0/now_W").doubleValue()).isEqualTo(2.5);
        assertThat(conflict.at("/members/0/relaxed_W").doubleValue()).isEqualTo(2.9);
        assertThat(conflict.at("/members/1/now_A").doubleValue()).isEqualTo(12.5);
        assertThat(conflict.at("/members/1").has("relaxed_A")).isFalse();
        assertThat(conflict.at("/members/2/kind").stringValue()).isEqualTo("tap");
    }

    @Test
    void whatWasWantedStandsWithTheBoard() {
        JsonNode wanted = FILE.at("/board/preference");
        List<String> order = new ArrayList<>();
        wanted.at("/order").forEach(each -> order.add(each.stringValue()));
        assertThat(order).containsExactly("least cost", "most even heat", "widest margin");
        assertThat(wanted.at("/timeLimit_s").doubleValue()).isEqualTo(20);
    }

    @Test
    void theCostOfTheBuildIsThatOfTheOrdersAndOfThePartNumbers() {
        double orders = 0;
        for (JsonNode part : FILE.at("/parts")) {
            int needed = part.at("/quantity").intValue() * FILE.at("/board/buildQuantity").intValue();
            orders += cheapest(part.at("/purchase"), needed);
        }
        double numbers = FILE.at("/parts").size() * FILE.at("/board/preference/partNumberCost_currency").doubleValue();
        assertThat(orders).isPositive();
        assertThat(FILE.at("/buildCost_currency").doubleValue()).isCloseTo(orders + numbers, within(1e-9));
    }

    /** By trying every number of packs up to one pack beyond the last price break. */
    private static double cheapest(JsonNode purchase, int needed) {
        int pack = purchase.at("/packSize").intValue();
        int least = Math.max(needed, purchase.at("/minimumOrder").intValue());
        int last = 0;
        for (JsonNode each : purchase.at("/prices")) {
            last = each.at("/quantity").intValue();
        }
        double best = Double.POSITIVE_INFINITY;
        for (int pieces = pack; pieces < Math.max(least, last) + 2 * pack; pieces += pack) {
            double price = 0;
            for (JsonNode each : purchase.at("/prices")) {
                price = each.at("/quantity").intValue() <= pieces
                        ? each.at("/unitPrice_currency").doubleValue()
                        : price;
            }
            best = pieces >= least ? Math.min(best, pieces * price) : best;
        }
        return best;
    }

    @Test
    void aCheckedBoardHasNoChoice() {
        assertThat(read(PlanFile.bytes(PlanFixtures.checked())).has("choice")).isFalse();
    }

    @Test
    void answersSayWhatWasAskedAndCarryCautions() {
        JsonNode front = read(AnswerFile.front(PLAN, ChoiceFixtures.front(PLAN)));
        assertThat(front.at("/format").stringValue()).isEqualTo("shuntwright front 1");
        assertThat(front.at("/first").stringValue()).isEqualTo("least heat");
        assertThat(front.at("/points/1/first_W").doubleValue()).isEqualTo(2.1);
        assertThat(front.at("/points/1/second_currency").doubleValue()).isEqualTo(1100);
        JsonNode others = read(AnswerFile.others(PLAN, "Pump", ChoiceFixtures.others(PLAN)));
        assertThat(others.at("/channel").stringValue()).isEqualTo("Pump");
        assertThat(others.at("/chosen/shunt/partNumber").stringValue()).isEqualTo("1E3");
        assertThat(others.at("/others/0/boardHeat_W").doubleValue()).isEqualTo(1.9);
        assertThat(others.at("/others/0/broken/0").stringValue()).isEqualTo("supply");
        JsonNode whatIf = read(AnswerFile.whatIf(PLAN, ChoiceFixtures.whatIf()));
        assertThat(whatIf.at("/zone").stringValue()).isEqualTo("port");
        assertThat(whatIf.at("/points/0").has("sums")).isFalse();
        assertThat(whatIf.at("/points/1/value_W").doubleValue()).isEqualTo(3);
        assertThat(whatIf.at("/points/1/sums/costPerBoard_currency").doubleValue()).isEqualTo(10);
        for (JsonNode each : List.of(front, others, whatIf)) {
            assertThat(each.at("/cautions").size()).isEqualTo(FILE.at("/cautions").size());
        }
    }
}
