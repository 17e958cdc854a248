package shuntwright.planner.window.whatif;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.plan.WhatIf;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.window.chart.Plot;

class WhatIfModelTest {
    private final BoardSession session = Sessions.chosen(HandMadeBoards.boat());
    private final WhatIfModel model = new WhatIfModel(session, Sessions.exploring());

    private static Lever lever(WhatIf.Varied varied) {
        return new Lever(varied, "");
    }

    @Test
    void everythingThatCanBeVariedIsOffered() {
        assertThat(model.levers()).extracting(Lever::words).containsExactly("Heat limit of the board",
                "Heat limit of zone port", "Heat limit of zone starboard", "Current available from the supply",
                "Boards built at once");
    }

    @Test
    void aRangeAroundTheLimitIsSuggested() {
        assertThat(model.fromProperty().get() + " to " + model.toProperty().get()).isEqualTo("3.6 W to 9.6 W");
        model.leverProperty().set(lever(WhatIf.Varied.BUILD_QUANTITY));
        assertThat(model.fromProperty().get() + " to " + model.toProperty().get()).isEqualTo("1 to 10");
        model.leverProperty().set(new Lever(WhatIf.Varied.ZONE_HEAT_LIMIT, "starboard"));
        // without a limit around what is used, half of 1.128 W
        assertThat(model.fromProperty().get() + " to " + model.toProperty().get()).isEqualTo("338 mW to 902 mW");
    }

    @Test
    void curvesHaveAGapWhereNothingMeetsTheLimits() {
        model.ask();
        List<Plot> plots = model.plotsProperty().get();
        assertThat(plots).extracting(each -> each.y().unit().words()).containsExactly("Cost of the build, EUR",
                "Heat of all shunts, W", "Distinct part numbers");
        Plot cost = plots.getFirst();
        assertThat(cost.spots()).as("three of nine values are not met").hasSize(6);
        assertThat(cost.lines()).singleElement().satisfies(line -> assertThat(line.places()).hasSize(6));
        Plot.Gap gap = cost.gaps().getFirst();
        assertThat(gap.from()).isZero();
        // the middle of the third and the fourth of nine values from 3.6 to 9.6 W
        assertThat(gap.to()).isCloseTo(cost.x().place(3.6 + 2.5 * 0.75), within(1e-9));
        assertThat(cost.now()).hasValue(cost.x().place(6));
        assertThat(cost.words()).contains("3.6 W: nothing meets the limits").contains("9.6 W: ");
        assertThat(model.saidProperty().get()).startsWith("9 values, 6 can be met, the first at 5.85 W");
    }

    @Test
    void aGapInTheMiddleBreaksTheLine() {
        WhatIf answer = new WhatIf(WhatIf.Varied.SUPPLY_CURRENT, "", List.of(point(0.01, true), point(0.02, true),
                point(0.03, false), point(0.04, true)));
        Plot cost = WhatIfPlots.of(answer, lever(WhatIf.Varied.SUPPLY_CURRENT), java.util.OptionalDouble.empty(), "EUR")
                .getFirst();
        assertThat(cost.lines()).extracting(line -> line.places().size()).containsExactly(2, 1);
        assertThat(cost.gaps()).singleElement().satisfies(gap -> {
            assertThat(gap.from()).isCloseTo(cost.x().place(0.025), within(1e-9));
            assertThat(gap.to()).isCloseTo(cost.x().place(0.035), within(1e-9));
        });
        assertThat(cost.x().unit().symbol()).isEqualTo("mA");
    }

    private static WhatIf.Point point(double value, boolean met) {
        return new WhatIf.Point(value, met
                ? java.util.Optional.of(new WhatIf.Sums(value * 100, value, 1, 3))
                : java.util.Optional.empty());
    }

    @Test
    void numbersOfBoardsGoInEqualRatiosAndCostIsThatOfABoard() {
        model.leverProperty().set(lever(WhatIf.Varied.BUILD_QUANTITY));
        model.fromProperty().set("1");
        model.toProperty().set("10000");
        model.countProperty().set("5");
        model.ask();
        Plot cost = model.plotsProperty().get().getFirst();
        assertThat(cost.x().logarithmic()).isTrue();
        assertThat(cost.y().unit().title()).isEqualTo("Cost of a board");
        assertThat(cost.spots()).extracting(each -> each.words().split(":")[0]).containsExactly("1", "10", "100",
                "1000", "10000");
        assertThat(cost.gaps()).isEmpty();
        assertThat(lever(WhatIf.Varied.BUILD_QUANTITY).values(1, 3, 9)).as("no number of boards twice")
                .containsExactly(1.0, 2.0, 3.0);
    }

    @ParameterizedTest
    @CsvSource({"x,9 W,9,number", "-1,9 W,9,above 0 W", "9 W,3 W,9,must go up", "1 W,9 W,1,from 2 to 60",
            "1 W,9 W,61,from 2 to 60", "1 W,9 V,9,V"})
    void aWrongRangeStaysAndSaysWhy(String from, String to, String count, String reason) {
        model.fromProperty().set(from);
        model.toProperty().set(to);
        model.countProperty().set(count);
        assertThat(model.problemProperty().get()).contains(reason);
        assertThat(model.possibleBinding().get()).isFalse();
        model.ask();
        assertThat(model.plotsProperty().get().getFirst().empty()).isEqualTo("Not computed yet.");
        assertThat(model.fromProperty().get()).isEqualTo(from);
    }

    @Test
    void whatWasTypedStaysWhenTheBoardIsEdited() {
        model.fromProperty().set("5 W");
        model.ask();
        session.addChannel("horn");
        assertThat(model.fromProperty().get()).isEqualTo("5 W");
        assertThat(model.saidProperty().get()).endsWith("as of before the last edit");
    }

    @Test
    void theCurvesOfOneLimitAreNotShownForAnother() {
        model.ask();
        model.leverProperty().set(lever(WhatIf.Varied.SUPPLY_CURRENT));
        assertThat(model.plotsProperty().get().getFirst().empty()).isEqualTo("Not computed yet.");
        model.leverProperty().set(lever(WhatIf.Varied.BOARD_HEAT_LIMIT));
        assertThat(model.plotsProperty().get().getFirst().empty()).isEmpty();
    }
}
