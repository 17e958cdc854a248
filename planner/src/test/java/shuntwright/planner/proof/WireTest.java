package shuntwright.planner.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;

class WireTest {

    private static final List<Aim> AIMS = List.of(new Aim.Use(SmallSelections.HEAT), new Aim.LargestShare(),
            new Aim.Cost(), new Aim.Lines(), new Aim.LeastMargin());
    private static final SolverLimits LIMITS = new SolverLimits(1.25, 0.1 + 0.2, 2, 960);

    static IntStream seeds() {
        return IntStream.range(0, 40);
    }

    private static Task task(int seed) {
        Selection selection = SmallSelections.of(seed, 2 + seed % 6, 9, 1.1);
        List<Aim.Cap> caps = AIMS.stream().limit(seed % 6).map(aim -> new Aim.Cap(aim, Math.sqrt(seed) / 3)).toList();
        Optional<Aim> aim = seed % 6 == 5 ? Optional.empty() : Optional.of(AIMS.get(seed % 6));
        return new Task(selection, new Prover.Question(caps, aim, IntStream.range(0, seed % 3).boxed().toList()),
                LIMITS);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void comesBackAsItWas(int seed) {
        Task task = task(seed);
        Task back = Wire.read(Wire.write(task));
        assertThat(back.question()).isEqualTo(task.question());
        assertThat(back.limits()).isEqualTo(task.limits());
        Selection one = task.selection();
        Selection other = back.selection();
        assertThat(other.boards()).isEqualTo(one.boards());
        assertThat(other.lineCost()).isEqualTo(one.lineCost());
        assertThat(other.pools()).isEqualTo(one.pools());
        assertThat(other.groups()).isEqualTo(one.groups());
        assertThat(other.even()).isEqualTo(one.even());
        assertThat(other.lines()).usingRecursiveComparison().ignoringFields("name").isEqualTo(one.lines());
        assertThat(other.resources()).usingRecursiveComparison().ignoringFields("name").isEqualTo(one.resources());
        assertThat(other.slots()).usingRecursiveComparison().ignoringFields("name").isEqualTo(one.slots());
        assertThat(other.menus().stream().map(Selection.Menu::group).toList())
                .isEqualTo(one.menus().stream().map(Selection.Menu::group).toList());
        assertThat(options(other)).isEqualTo(options(one));
    }

    private static List<List<Object>> options(Selection selection) {
        return selection.menus().stream().flatMap(menu -> menu.options().stream()).map(WireTest::option).toList();
    }

    private static List<Object> option(Option option) {
        return List.of(option.lines(), IntStream.of(option.pools()).boxed().toList(), option.resources(),
                option.margin(), option.value());
    }

    @Test
    void anythingElseIsRefused() {
        String text = Wire.write(task(4));
        for (String wrong : List.of("", "hello", text.substring(0, text.length() / 2), "-1 " + text,
                text.replace("end", "more"))) {
            assertThatThrownBy(() -> Wire.read(wrong)).isInstanceOf(IllegalArgumentException.class)
                    .hasMessageContaining("no task");
        }
    }
}
