package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.board.Preference;

/** The options that say what is wanted of the board-wide choice. */
class ChoiceOptionsTest {

    private static Board asked(Object... options) {
        ChoiceFixture.Asked solver = new ChoiceFixture.Asked();
        Object[] args = new Object[options.length + 3];
        args[0] = "others";
        args[1] = Run.WREN;
        args[2] = "Radar transmitter";
        System.arraycopy(options, 0, args, 3, options.length);
        Run run = Run.with(solver, args);
        assertThat(run.err()).isEmpty();
        return solver.board;
    }

    @Test
    void without_options_everything_is_as_the_board_has_it() {
        assertThat(asked()).isEqualTo(PlanFixture.board());
    }

    @Test
    void options_override_the_board_and_nothing_else() {
        Board run = asked("--prefer", "Least cost,  widest  margin", "--rounds", "20", "--time-limit", "10s",
                "--choice-seed", "-7", "--part-number-cost", "12.5");

        assertThat(run.preference()).isEqualTo(new Preference(List.of(Objective.LEAST_COST, Objective.WIDEST_MARGIN),
                12.5, 20, OptionalDouble.of(10), -7));
        assertThat(Entered.restored(run, PlanFixture.board())).isEqualTo(PlanFixture.board());
    }

    @ParameterizedTest
    @CsvSource({"--prefer, least heet, 'least heat, most even heat'", "--prefer, 'least heat, least heat', twice",
            "--prefer, '', At least one", "--rounds, -1, from 0 to 1000000", "--rounds, 1000001, from 0 to 1000000",
            "--rounds, many, 'from 0 to 1000000, got \"many\"'", "--time-limit, 0 s, above 0 s",
            "--time-limit, -3s, got -3 s",
            "--time-limit, 3 W, 3 W", "--choice-seed, 1.5, -9223372036854775808 to 9223372036854775807",
            "--part-number-cost, -1, from 0", "--part-number-cost, NaN, from 0", "--part-number-cost, dear, from 0"})
    void a_wrong_value_is_refused_with_what_is_allowed(String option, String value, String allowed) {
        Run run = Run.of("plan", Run.WREN, option, value);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(option, allowed).doesNotContain("Exception");
    }

    @ParameterizedTest
    @ValueSource(strings = {"--prefer", "--rounds", "--time-limit", "--choice-seed"})
    void checking_chooses_nothing_so_it_has_no_options_for_it(String option) {
        Run run = Run.of("check", Run.WREN, option, "1");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains(option);
    }
}
