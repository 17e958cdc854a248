package shuntwright.parts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Price breaks 1: 0.50, 100: 0.40, 1,000: 0.25; packs of 50, minimum order 100. The table is worked by hand. */
class CheapestOrderTest {

    private static final Purchase PURCHASE = new Purchase("",
            List.of(new PriceBreak(1, 0.50), new PriceBreak(100, 0.40),
                    new PriceBreak(1000, 0.25)),
            50, 100, "", "");

    @ParameterizedTest
    @CsvSource({
            // needed, order, cost: the minimum order
            "1, 100, 40.00", "100, 100, 40.00",
            // whole packs
            "101, 150, 60.00", "130, 150, 60.00",
            // 600 at 0.40 would cost 240, 650 would cost 260; a thousand cost 250
            "600, 600, 240.00", "601, 1000, 250.00", "999, 1000, 250.00",
            // above the last break
            "1000, 1000, 250.00", "1001, 1050, 262.50",
            // nothing needed
            "0, 0, 0"})
    void isAsWorkedByHand(int needed, int order, double cost) {
        assertThat(PURCHASE.cheapestOrder(needed).quantity()).isEqualTo(order);
        assertThat(PURCHASE.cheapestOrder(needed).cost()).isCloseTo(cost, within(1e-9));
    }
}
