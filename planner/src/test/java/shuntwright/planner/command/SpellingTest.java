package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;

import org.junit.jupiter.api.Test;

class SpellingTest {

    @Test
    void signs_stay_where_they_can_be_shown() {
        assertThat(Spelling.in(StandardCharsets.UTF_8, "4 mΩ ±1 % → 25 µV")).isEqualTo("4 mΩ ±1 % → 25 µV");
    }

    @Test
    void signs_are_spelt_out_for_plain_terminals() {
        assertThat(Spelling.in(StandardCharsets.US_ASCII, "4 mΩ ±1 % → 25 µV")).isEqualTo("4 mOhm +/-1 % -> 25 uV");
    }

    @Test
    void only_signs_that_are_lacking_are_spelt_out() {
        assertThat(Spelling.in(StandardCharsets.ISO_8859_1, "2 × 4 mΩ ±1 %")).isEqualTo("2 × 4 mOhm ±1 %");
    }

    @Test
    void words_from_files_do_not_steer_the_terminal() {
        assertThat(Spelling.harmless("4 mΩ\u001b[31m\nred\u202e\u2028🔌"))
                .isEqualTo("4 mΩ\uFFFD[31m\uFFFDred\uFFFD\uFFFD🔌");
    }

    @Test
    void whatever_has_no_words_becomes_a_question_mark() {
        assertThat(Spelling.in(StandardCharsets.US_ASCII, "Küche 🔌")).isEqualTo("K?che ?");
    }
}
