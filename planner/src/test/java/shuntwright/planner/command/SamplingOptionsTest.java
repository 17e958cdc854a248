package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import picocli.CommandLine;
import shuntwright.board.Acceptance;
import shuntwright.board.Board;
import shuntwright.board.Sampling;
import shuntwright.board.Sampling.Trials;
import shuntwright.board.Uncertainty;

/** The options that say how a plan is sampled. */
class SamplingOptionsTest {
    private static final Board BOARD = Board.named("boat")
            .withAcceptance(new Acceptance(Acceptance.Basis.COVERAGE, 0.95))
            .withUncertainty(Uncertainty.DEFAULT.withSampling(new Sampling(new Trials.Fixed(20_000), 5)));

    private static SamplingChoice chosen(String... args) {
        SamplingOptions options = new SamplingOptions();
        new CommandLine(CommandLine.Model.CommandSpec.create().addMixin("sampling",
                CommandLine.Model.CommandSpec.forAnnotatedObject(options))).parseArgs(args);
        return options.chosen();
    }

    @Test
    void without_options_everything_is_as_the_board_has_it() {
        assertThat(chosen()).isEqualTo(SamplingChoice.OF_THE_BOARD);
        assertThat(chosen().applied(BOARD)).isEqualTo(BOARD);
    }

    @Test
    void options_override_the_board_and_nothing_else() {
        Board run = chosen("--trials", "1e6", "--seed", "-3", "--coverage", "99.9 %").applied(BOARD);

        assertThat(run.uncertainty().sampling()).isEqualTo(new Sampling(new Trials.Fixed(1_000_000), -3));
        assertThat(run.acceptance()).isEqualTo(new Acceptance(Acceptance.Basis.COVERAGE, 0.999));
        assertThat(Entered.restored(run, BOARD)).isEqualTo(BOARD);
    }

    @ParameterizedTest
    @CsvSource({"10000, 10000", "100000000, 100000000", "2.5e5, 250000", "'1,000,000', 1000000"})
    void a_number_of_trials_is_read_however_it_is_typed(String typed, int trials) {
        assertThat(chosen("--trials", typed).applied(BOARD).uncertainty().sampling().trials())
                .isEqualTo(new Trials.Fixed(trials));
    }

    @ParameterizedTest
    @CsvSource({"99.9%, 0.999", "0.999, 0.999", "50 %, 0.5", "99.9937 %, 0.999937"})
    void a_coverage_probability_is_a_share_or_a_percentage(String typed, double coverage) {
        assertThat(chosen("--coverage", typed).applied(BOARD).acceptance().coverage()).isEqualTo(coverage);
    }

    @ParameterizedTest
    @CsvSource({"adaptive, 2, 10000000", "'adaptive, 1 digit, most 500,000', 1, 500000"})
    void trials_may_be_adaptive(String typed, int digits, int most) {
        assertThat(chosen("--trials", typed).applied(BOARD).uncertainty().sampling().trials())
                .isEqualTo(new Trials.Adaptive(digits, most));
    }

    @Test
    void sampling_can_be_left_out() {
        SamplingChoice choice = chosen("--no-sampling", "--coverage", "0.9");

        assertThat(choice.skipped()).isTrue();
        assertThat(choice.applied(BOARD).acceptance().coverage()).isEqualTo(0.9);
    }

    @ParameterizedTest
    @ValueSource(strings = {"9999", "100000001", "0", "-5", "1e99999", "10000.5", "1.00005e4", "many", "adaptif", "",
            "NaN"})
    void a_wrong_number_of_trials_is_refused_with_the_range(String typed) {
        Run run = Run.of("plan", Run.WREN, "--trials", typed);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("--trials", typed, "from 10,000 to 100,000,000");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1.5", "x", "9223372036854775808", "1e3", ""})
    void a_wrong_seed_is_refused_with_the_range(String typed) {
        Run run = Run.of("check", Run.WREN, "--seed", typed);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--seed", "\"" + typed + "\"", "-9223372036854775808 to 9223372036854775807");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1", "0.49", "100 %", "-1", "1e9"})
    void a_coverage_out_of_range_is_refused_with_the_range(String typed) {
        Run run = Run.of("plan", Run.WREN, "--coverage", typed);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--coverage", "from 50 % to below 100 %")
                .doesNotContain("Maybe");
    }

    @Test
    void a_percentage_without_its_sign_is_guessed() {
        assertThat(Run.of("plan", Run.WREN, "--coverage", "99.9").err()).contains("Maybe 99.9 % was meant");
    }

    @ParameterizedTest
    @ValueSource(strings = {"much", "99 A", "NaN"})
    void a_coverage_that_is_no_number_is_refused(String typed) {
        Run run = Run.of("plan", Run.WREN, "--coverage", typed);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--coverage", typed).doesNotContain("Exception");
    }

    @Test
    void options_without_effect_are_refused() {
        Run run = Run.of("plan", Run.WREN, "--no-sampling", "--trials", "20000", "--seed", "4");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--no-sampling", "--trials and --seed", "leave out");
    }

    @Test
    void only_one_thing_is_printed() {
        Run run = Run.of("plan", Run.WREN, "--json", "--budget", "Heating mat");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("--json", "--budget", "leave out");
    }

    @Test
    void the_budget_of_a_channel_that_is_not_there_is_refused_with_the_nearest() {
        Run run = Run.of("plan", Run.WREN, "--budget", "Heating mad");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("--budget", "Heating mad", "maybe \"Heating mat\" is meant");
    }
}
