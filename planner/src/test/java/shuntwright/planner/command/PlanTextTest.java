package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;

class PlanTextTest {
    private final Plan plan = PlanFixture.plan();
    private final List<String> lines = PlanText.of(plan, false);

    private String row(int channel) {
        String name = plan.channels().get(channel).channel().name();
        return lines.stream().filter(line -> line.startsWith(name + " ")).findFirst().orElseThrow();
    }

    @Test
    void the_first_line_sums_up() {
        assertThat(lines.getFirst()).isEqualTo(
                "Instrument sledge Wren: 1 of 5 channels accepted, parts 0.00 EUR for each board of a build of 6");
    }

    @Test
    void every_channel_has_a_row_with_its_verdict_and_numbers() {
        assertThat(row(0)).contains("inside", "30.25 .. 41.5 A", "30 .. 42 A", "2 × 50 mΩ FILM-0805-R050-F",
                "20 V/V", "1.65 V", "125 mW");
        assertThat(row(1)).contains("likely, not accepted", "250 mW");
        assertThat(row(2)).contains("outside");
        assertThat(row(3)).contains("no fit", " - ");
        assertThat(row(4)).contains("incomplete", " - ");
    }

    @Test
    void columns_stand_below_their_headings() {
        String header = lines.stream().filter(line -> line.startsWith("channel ")).findFirst().orElseThrow();
        for (String heading : List.of("verdict", "trips within", "allowed", "shunt", "gain", "threshold", "heat")) {
            int column = header.indexOf(heading);
            for (int i = 0; i < plan.channels().size(); i++) {
                assertThat(row(i).substring(column - 2, column + 1)).as(heading + " in " + row(i)).matches("  \\S");
            }
        }
    }

    @Test
    void what_fails_is_told_with_its_cures_below_the_channel() {
        assertThat(lines).containsSubsequence("Radar transmitter",
                "  fault  outside its window: misses by 300 mA",
                "  cure   a wider window: must-trip 12.5 A → 13.1 A gives inside with 7 % margin",
                "  tried  another source for the threshold: vref gives likely with -2 % margin");
        assertThat(lines).containsSubsequence("Radar receiver",
                "  refused  88 of 90 shunts: dissipation at the no-trip current within the derated power; "
                        + "nearest is NEAR-R010 with 1.25 W, at most 500 mW");
        assertThat(lines).containsSubsequence("Board",
                "  fault  heat over limit: zone rear edge is over its limit by 50 mW");
    }

    @Test
    void notes_are_counted_only() {
        assertThat(lines).noneMatch(line -> line.contains("little is left"))
                .anyMatch(line -> line.startsWith("1 note"));
    }

    @Test
    void shared_things_stand_with_their_limits() {
        assertThat(lines).contains("supply          31 mA   of 40 mA",
                "zone rear edge  250 mW  of 200 mW  over its limit");
    }

    @Test
    void the_last_line_is_the_caution() {
        assertThat(lines.getLast()).contains("Verify by test");
    }

    @Test
    void colours_change_nothing_but_colour() {
        List<String> coloured = PlanText.of(plan, true);

        assertThat(coloured).anyMatch(line -> line.contains("\u001b[31m"));
        assertThat(coloured.stream().map(line -> line.replaceAll("\u001b\\[\\d+m", ""))).hasSameSizeAs(lines);
        for (ChannelPlan each : plan.channels()) {
            assertThat(coloured).anyMatch(line -> line.startsWith(each.channel().name())
                    && line.contains("m" + each.verdict().word()));
        }
    }
}
