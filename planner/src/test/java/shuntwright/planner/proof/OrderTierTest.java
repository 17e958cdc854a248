package shuntwright.planner.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.selection.Selection;

class OrderTierTest {

    static IntStream seeds() {
        return IntStream.range(0, 60);
    }

    /** The cheapest tier costs what the cheapest order does, for every number of pieces. */
    @ParameterizedTest
    @MethodSource("seeds")
    void theCheapestTierIsTheCheapestOrder(int seed) {
        Selection selection = SmallSelections.of(seed, 3, 3, 1);
        for (int line = 0; line < selection.lines().size(); line++) {
            List<OrderTier> tiers = OrderTier.of(selection, line, 30);
            for (int pieces = 1; pieces <= 30; pieces++) {
                int at = OrderTier.cheapest(tiers, pieces, selection.boards());
                OrderTier tier = tiers.get(at);
                double cost = tier.packs(pieces, selection.boards()) * tier.pack() * tier.price();
                double least = EverySelection.leastCost(selection.lines().get(line).purchase(),
                        pieces * selection.boards());
                assertThat(cost).isCloseTo(least, within(1e-9 * (1 + least)));
            }
        }
    }

    /**
     * Worked by hand: 10 boards, packs of 25; 1.00 from 1, 0.80 from 100, 0.10 from 1000. 7 pieces need 70: 75 for 75.00, less than 100
     * for 80.00. 8 need 80: 100 for 80.00. 12 need 120: 125 for 100.00, and 1000 cost 100.00 too, so the smaller order stands. 13 need
     * 130: 150 for 120.00, so 1000 for 100.00 are cheaper.
     */
    @Test
    void aTableWorkedByHand() {
        Purchase purchase = new Purchase("",
                List.of(new PriceBreak(1, 1), new PriceBreak(100, 0.8), new PriceBreak(1000, 0.1)), 25, 1, "", "");
        Selection.Builder b = new Selection.Builder(10, 0);
        b.line(new Selection.Line("R", purchase, 0));
        assertThat(OrderTier.of(b.build(), 0, 20)).containsExactly(new OrderTier(1, 7, 25, 1, 3, 1),
                new OrderTier(8, 12, 25, 4, 5, 0.8), new OrderTier(13, 20, 25, 40, 40, 0.1));
    }
}
