package shuntwright.planner.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;

import shuntwright.selection.Aim;
import shuntwright.selection.Answer;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Selector;
import shuntwright.selection.Watch;

@SuppressWarnings("NullAway.Init")
class ChildProverTest {

    private static final SolverLimits LIMITS = new SolverLimits(20, 0, 2, 960);
    private static final Aim HEAT = new Aim.Use(SmallSelections.HEAT);

    /** 14 slots with 12 options. */
    private final Selection selection = SmallSelections.of(3, 14, 12, 1.3);
    private Set<String> before;

    private static Set<String> folders() throws IOException {
        try (Stream<Path> all = Files.list(Path.of(System.getProperty("java.io.tmpdir")))) {
            return all.map(each -> each.getFileName().toString())
                    .filter(each -> each.startsWith("shuntwright-proof") || each.startsWith("ortools"))
                    .collect(Collectors.toSet());
        }
    }

    @BeforeEach
    void look() throws IOException {
        before = folders();
    }

    @AfterEach
    void nothingIsLeft() throws IOException {
        assertThat(folders()).isSubsetOf(before);
    }

    private static Prover with(Class<?> main) {
        Launch own = Launch.own();
        return new ChildProver(new Launch(own.java(), own.classPath(), main.getName()), LIMITS);
    }

    private Prover.Finding asked(Prover prover, Watch watch) {
        return prover.ask(selection, new Prover.Question(List.of(), Optional.of(HEAT), List.of()), watch);
    }

    private Answer found(Aim aim) {
        return Selector.select(selection, new Selector.Order(List.of(aim), List.of(0.0), List.of()),
                new Selector.Effort(400, 0, 1), List.of(), Prover.NONE, Watch.NONE);
    }

    @Test
    void agreesWithTheSearchOnMiddlingSelections() {
        for (Aim aim : List.of(new Aim.Cost(), HEAT)) {
            Answer answer = found(aim);
            assertThat(answer.keepsLimits()).isTrue();
            double value = answer.reached().getFirst().value();
            Prover.Finding cold = new ChildProver(Duration.ofSeconds(20)).ask(selection,
                    new Prover.Question(List.of(), Optional.of(aim), List.of()), Watch.NONE);
            assertThat(cold.complaint()).isEmpty();
            assertThat(cold.bound().orElseThrow()).as("%s", aim).isCloseTo(value, within(1e-7 * value));
            assertThat(cold.better()).isPresent();
        }
    }

    @Test
    void provesWhatTheSearchFound() {
        Answer answer = Selector.select(selection,
                new Selector.Order(List.of(new Aim.Cost(), HEAT), List.of(0.0, 0.0), List.of()),
                new Selector.Effort(400, 0, 1), List.of(), new ChildProver(), Watch.NONE);
        assertThat(answer.reached().getFirst().proven()).as("cost, whose prices are exact").isTrue();
        Answer.Reached heat = answer.reached().getLast();
        assertThat(heat.bound().orElseThrow()).as("heat, of which the solver has nine digits")
                .isCloseTo(heat.value(), within(1e-7 * heat.value()));
    }

    @Test
    void repeatsExactlyWithSteadyEffort() {
        Prover prover = ChildProver.repeatable(0.5, Duration.ofSeconds(20));
        Prover.Question question = new Prover.Question(List.of(), Optional.of(new Aim.Cost()),
                found(new Aim.Cost()).choice());
        Prover.Finding first = prover.ask(selection, question, Watch.NONE);
        assertThat(first.bound()).isPresent();
        assertThat(prover.ask(selection, question, Watch.NONE)).isEqualTo(first);
    }

    @Test
    void withoutTheLibraryItSaysSo() {
        Launch own = Launch.own();
        String without = Stream.of(own.classPath().split(File.pathSeparator))
                .filter(each -> !Path.of(each).getFileName().toString().matches("ortools-(linux|darwin|win32).*"))
                .collect(Collectors.joining(File.pathSeparator));
        Prover.Finding finding = asked(new ChildProver(new Launch(own.java(), without, own.main()), LIMITS),
                Watch.NONE);
        assertThat(finding.complaint()).contains("library");
        nothingFound(finding);
        String bare = Stream.of(own.classPath().split(File.pathSeparator)).filter(each -> !each.contains("ortools"))
                .collect(Collectors.joining(File.pathSeparator));
        assertThat(asked(new ChildProver(new Launch(own.java(), bare, own.main()), LIMITS), Watch.NONE).complaint())
                .isNotEmpty();
    }

    @Test
    void withoutJavaItSaysSo() {
        Launch own = Launch.own();
        Prover.Finding finding = asked(
                new ChildProver(new Launch(Path.of("no", "such", "java"), own.classPath(), own.main()), LIMITS),
                Watch.NONE);
        assertThat(finding.complaint()).contains("cannot be started");
        nothingFound(finding);
    }

    private static void nothingFound(Prover.Finding finding) {
        assertThat(finding.bound()).isEmpty();
        assertThat(finding.better()).isEmpty();
        assertThat(finding.impossible()).isFalse();
    }

    /** A bound said before a breakdown was a bound. */
    @Test
    void aBreakdownIsToldAndWhatWasSaidBeforeCounts() {
        Prover.Finding finding = asked(with(Misbehaving.BreaksDown.class), Watch.NONE);
        assertThat(finding.complaint()).contains("broke down").contains("134");
        assertThat(finding.bound()).hasValue(0.001);
    }

    @Test
    void nonsenseIsNoAnswer() {
        Prover.Finding babble = asked(with(Misbehaving.Babbles.class), Watch.NONE);
        assertThat(babble.complaint()).contains("broke down");
        nothingFound(babble);
        Prover.Finding mumble = asked(with(Misbehaving.Mumbles.class), Watch.NONE);
        assertThat(mumble.complaint()).contains("about seven");
        nothingFound(mumble);
    }

    @Test
    void whatContradictsAKnownSelectionIsLeftAside() {
        Prover.Finding finding = with(Misbehaving.Lies.class).ask(selection,
                new Prover.Question(List.of(), Optional.of(HEAT), found(HEAT).choice()), Watch.NONE);
        assertThat(finding.complaint()).contains("contradicts");
        nothingFound(finding);
    }

    @Test
    void endsAtItsLimitOfTime() {
        Launch own = Launch.own();
        long from = System.nanoTime();
        nothingFound(asked(new ChildProver(new Launch(own.java(), own.classPath(), Misbehaving.Sleeps.class.getName()),
                new SolverLimits(0.5, 0, 2, 960)), Watch.NONE));
        assertThat((System.nanoTime() - from) / 1e9).isBetween(0.5, 3.0);
    }

    @Test
    @EnabledOnOs(OS.LINUX)
    void endsAtItsLimitOfMemory() {
        Launch own = Launch.own();
        Prover.Finding finding = asked(
                new ChildProver(new Launch(own.java(), own.classPath(), Misbehaving.Sleeps.class.getName()),
                        new SolverLimits(20, 0, 2, 5)),
                Watch.NONE);
        assertThat(finding.complaint()).contains("memory");
    }

    /** Cancelled while the solver works on a selection that keeps it busy for long. */
    @Test
    void endsSoonAfterTheWatchSaysSo() {
        Selection hard = SmallSelections.of(5, 60, 60, 1.1);
        List<Integer> any = IntStream.range(0, 60).mapToObj(_ -> 0).toList();
        long[] ended = new long[1];
        long from = System.nanoTime();
        Watch watch = () -> {
            boolean now = System.nanoTime() - from > 1.5e9;
            ended[0] = now && ended[0] == 0 ? System.nanoTime() : ended[0];
            return now;
        };
        Prover.Finding finding = new ChildProver(Duration.ofSeconds(30)).ask(hard,
                new Prover.Question(List.of(), Optional.of(new Aim.Cost()), any), watch);
        assertThat(ended[0]).as("still at work when cancelled").isPositive();
        assertThat((System.nanoTime() - ended[0]) / 1e9).isLessThan(0.5);
        assertThat(finding.complaint()).isEmpty();
    }
}
