package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.channel;
import static shuntwright.plan.TrialBoards.inZone;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import org.junit.jupiter.api.Test;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.Zone;
import shuntwright.choice.TrialParts;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Comparator;
import shuntwright.parts.Part;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/**
 * Three channels of 10 A with 2 mΩ each, all pinned: two in zone "left", one in zone "right". Amplifiers come two, comparators
 * four to a package; dividers of 10 kΩ + 10 kΩ, two of them on the reference of 2.5 V ±0.1 %, one on the supply of 3.3 V ±2 %.
 */
class SharedBudgetTest {

    private static final Purchase BREAKS = new Purchase("", List.of(new PriceBreak(1, 3), new PriceBreak(10, 2),
            new PriceBreak(100, 1)), 1, 1, "", "");

    private static Catalogue catalogue() {
        SenseAmplifier a = TrialParts.amplifier("A50", 50, 0.002, 50e-6);
        SenseAmplifier twin = new SenseAmplifier("TWIN", "twin amplifier", a.gain(), a.gainError(), a.gainDrift(),
                0, a.input(), a.ranges(), a.bandwidth(), a.slewRate(), 2e-3, 2, a.purchase());
        Comparator quad = TrialParts.comparator("QUAD", TrialParts.injected(), Range.exactly(0), 4);
        Shunt s = TrialParts.shunt("R2", 0.002, 0.005);
        Shunt shunt = new Shunt("R2", "2 mΩ", s.resistance(), s.tolerance(), s.temperatureCoefficient(), s.ageing(),
                0, s.terminals(), s.mountingResistance(), s.thermalEmf(), s.rating(), BREAKS);
        return Catalogue.of("EUR", List.<Part>of(shunt, twin, quad, TrialParts.reference("REF25", 2.5, 0.001),
                TrialParts.series("RES", ESeries.E96, 0.001)));
    }

    private static Channel pinned(String name, String zone, Source source) {
        Pins pins = new Pins(Optional.of("R2"), OptionalInt.of(1), Optional.of("TWIN"), Optional.of("QUAD"),
                Optional.of("RES"), OptionalDouble.of(10e3), OptionalDouble.of(10e3), OptionalDouble.of(2e3));
        return inZone(channel(name, 10), zone).withThreshold(new ThresholdDemand.OwnDivider(source)).withPins(pins);
    }

    private static Board board(OptionalDouble heat, OptionalDouble left) {
        Source quiet = new Source.OfReference("quiet");
        Board board = TrialBoards.board(pinned("a", "left", quiet), pinned("b", "left", quiet),
                pinned("c", "right", new Source.Supply()));
        return TrialBoards.withZones(TrialBoards.withLines(board, AlertLine.named("alert")), heat,
                new Zone("left", left, OptionalDouble.empty()),
                new Zone("right", OptionalDouble.empty(), OptionalDouble.empty()));
    }

    private static Plan check(Board board) {
        return new BoardPlanner().check(board, catalogue(), Progress.SILENT);
    }

    private static SharedUse use(Plan plan, SharedUse.Kind kind, String name) {
        return plan.shared().stream().filter(each -> each.kind() == kind && each.name().contains(name)).findFirst()
                .orElseThrow();
    }

    @Test
    void addsUpCurrents() {
        Plan plan = check(board(OptionalDouble.empty(), OptionalDouble.empty()));
        assertThat(plan.channels()).allSatisfy(each -> assertThat(each.solved()).isPresent());
        double byReference = 2 * 2.5025 / 20e3;
        double bySupply = 3.366 / 20e3;
        assertThat(use(plan, SharedUse.Kind.REFERENCE, "quiet").used()).isEqualTo(byReference, within(1e-12));
        assertThat(use(plan, SharedUse.Kind.REFERENCE, "quiet").limit()).hasValue(5e-3);
        // Left: one twin, one quad; right: one twin, one quad; reference 0.1 mA; pull-up of 10 kΩ held low.
        double packages = 2 * 2e-3 + 2 * 0.5e-3;
        double alert = 3.366 / 10e3;
        assertThat(use(plan, SharedUse.Kind.SUPPLY, "supply").used())
                .isEqualTo(packages + byReference + bySupply + 0.1e-3 + alert, within(1e-12));
        assertThat(use(plan, SharedUse.Kind.SUPPLY, "supply").limit()).hasValue(0.1);
    }

    @Test
    void addsUpHeat() {
        Plan plan = check(board(OptionalDouble.of(0.59), OptionalDouble.of(0.5)));
        assertThat(use(plan, SharedUse.Kind.BOARD_HEAT, "").used()).isEqualTo(0.6, within(1e-12));
        assertThat(use(plan, SharedUse.Kind.ZONE_HEAT, "left").used()).isEqualTo(0.4, within(1e-12));
        assertThat(use(plan, SharedUse.Kind.ZONE_HEAT, "right").used()).isEqualTo(0.2, within(1e-12));
        assertThat(plan.findings()).filteredOn(each -> each.key() == Finding.Key.HEAT_OVER_LIMIT).singleElement()
                .satisfies(finding -> assertThat(finding.text()).startsWith("Board heat").contains("600 mW", "590 mW",
                        "10 mW"));
        assertThat(plan.accepted()).isFalse();
    }

    @Test
    void overloadsAreFindings() {
        Board board = board(OptionalDouble.empty(), OptionalDouble.of(0.3));
        Plan plan = check(TrialBoards.withSupply(board, 3.3, 0.02, 5e-3));
        assertThat(plan.findings()).extracting(Finding::key).contains(Finding.Key.SUPPLY_OVERLOADED,
                Finding.Key.HEAT_OVER_LIMIT);
    }

    @Test
    void packagesServeTheirZoneAndDesignatorsAreUnique() {
        Plan plan = check(board(OptionalDouble.empty(), OptionalDouble.empty()));
        assertThat(plan.parts()).extracting(PartUse::partNumber).containsExactlyInAnyOrder("R2", "TWIN", "QUAD",
                "REF25", "RES-10K", "RES-2K0");
        assertThat(part(plan, "R2").quantity()).isEqualTo(3);
        assertThat(part(plan, "R2").users()).containsExactly("a", "b", "c");
        assertThat(part(plan, "TWIN").quantity()).isEqualTo(2);
        assertThat(part(plan, "TWIN").users()).containsExactly("a, b", "c");
        assertThat(part(plan, "QUAD").users()).containsExactly("a, b", "c");
        assertThat(part(plan, "REF25").users()).containsExactly("reference quiet");
        // Three dividers of two and the pull-up share one value.
        assertThat(part(plan, "RES-10K").quantity()).isEqualTo(7);
        assertThat(part(plan, "RES-10K").users()).endsWith("alert line alert");
        assertThat(part(plan, "RES-2K0").quantity()).isEqualTo(3);
        List<String> designators = plan.parts().stream().flatMap(each -> each.designators().stream()).toList();
        assertThat(designators).doesNotHaveDuplicates().hasSize(3 + 2 + 2 + 1 + 7 + 3)
                .allMatch(each -> each.matches("[RU][0-9]+"));
        assertThat(plan.parts()).allSatisfy(each -> {
            assertThat(each.designators()).hasSize(each.quantity());
            assertThat(each.users()).hasSize(each.quantity());
        });
        assertThat(part(plan, "R2").designators().getFirst()).isEqualTo("R1");
    }

    private static PartUse part(Plan plan, String number) {
        return plan.parts().stream().filter(each -> each.partNumber().equals(number)).findFirst().orElseThrow();
    }

    @Test
    void pricesFollowTheQuantityOfTheWholeBuild() {
        Board one = board(OptionalDouble.empty(), OptionalDouble.empty());
        // Two twins at 2, two quads at 0.5, a reference at 1.5, ten resistors at 0.01, and three shunts.
        double others = 4 + 1 + 1.5 + 0.1;
        assertThat(check(one).costPerBoard()).isEqualTo(others + 3 * 3, within(1e-9));
        assertThat(check(TrialBoards.withRules(one, one.rules(), 3)).costPerBoard()).isEqualTo(others + 3 * 3,
                within(1e-9));
        assertThat(check(TrialBoards.withRules(one, one.rules(), 4)).costPerBoard()).isEqualTo(others + 3 * 2,
                within(1e-9));
        assertThat(check(TrialBoards.withRules(one, one.rules(), 34)).costPerBoard()).isEqualTo(others + 3,
                within(1e-9));
        // A channel's own cost: shunt, half a twin, a quarter of a quad, three resistors.
        assertThat(check(one).channels().getFirst().solved().orElseThrow().cost())
                .isEqualTo(3 + 1 + 0.125 + 0.03, within(1e-9));
    }
}
