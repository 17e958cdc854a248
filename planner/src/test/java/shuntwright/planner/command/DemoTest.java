package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DemoTest {

    @Test
    void the_demo_board_is_found_from_within_the_checkout() throws IOException {
        Path found = Demo.find().orElseThrow();

        assertThat(Files.isSameFile(found, Run.WREN)).as("%s is %s", found, Run.WREN).isTrue();
    }

    @ParameterizedTest
    @CsvSource({"Linux, '', '', false", "Linux, :0, '', true", "Linux, '', wayland-0, true", "FreeBSD, '', '', false",
            "Windows 11, '', '', true", "Mac OS X, '', '', true"})
    void a_display_is_expected_where_there_is_one(String system, String display, String wayland, boolean expected) {
        assertThat(WindowStarter.display(Map.of("DISPLAY", display, "WAYLAND_DISPLAY", wayland), system))
                .isEqualTo(expected);
    }
}
