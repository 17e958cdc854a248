package shuntwright.planner.work;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import java.util.concurrent.atomic.AtomicLong;

import org.junit.jupiter.api.Test;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.BoardPlanner;

class InquiryTest {
    private final Queue<Runnable> background = new ArrayDeque<>();
    private final Queue<Runnable> publisher = new ArrayDeque<>();
    private final List<String> heard = new ArrayList<>();
    private final AtomicLong clock = new AtomicLong();
    private final Inquiry<String> inquiry = new Inquiry<>(background::add, publisher::add, clock::get);

    private static void run(Queue<Runnable> queue) {
        while (!queue.isEmpty()) {
            queue.remove().run();
        }
    }

    private void ask(Inquiry.Question<String> question) {
        inquiry.ask("asking", question, heard::add, problem -> heard.add("failed: " + problem.getMessage()));
    }

    private static BoardChoice choice(int rounds) {
        return new BoardChoice(List.of(), rounds, 1, false, 0, 0, List.of(), Optional.empty());
    }

    @Test
    void theBestSoFarIsPublishedWhileItIsLookedFor() {
        ask(progress -> {
            for (int round = 1; round <= 1000; round++) {
                progress.better(choice(round));
            }
            return "done";
        });
        run(background);
        assertThat(publisher).as("messages under way").hasSize(2);
        publisher.remove().run();
        assertThat(inquiry.bestProperty().get()).contains(choice(1000));
        run(publisher);
        assertThat(inquiry.bestProperty().get()).as("once there is an answer").isEmpty();
        assertThat(heard).containsExactly("done");
    }

    @Test
    void stoppingGivesTheBestThereIs() {
        ask(progress -> {
            inquiry.stop();
            return progress.enough() && !progress.cancelled() ? "best so far" : "all of it";
        });
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("best so far");
    }

    @Test
    void stoppingWithoutAnythingToShowEndsWithoutAnAnswer() {
        ask(progress -> {
            throw new BoardPlanner.Cancelled();
        });
        inquiry.stop();
        run(background);
        run(publisher);
        assertThat(heard).isEmpty();
        assertThat(inquiry.runningProperty().get()).isFalse();
    }

    @Test
    void cancellingGivesNoAnswerAndForgetsTheBest() {
        ask(progress -> {
            progress.better(choice(1));
            return "late";
        });
        run(background);
        publisher.remove().run();
        inquiry.cancel();
        assertThat(inquiry.bestProperty().get()).isEmpty();
        run(publisher);
        assertThat(heard).isEmpty();
    }

    @Test
    void theTimeIsThatOfTheWorkAlone() {
        ask(progress -> {
            clock.addAndGet(1_500_000_000);
            return "a";
        });
        clock.addAndGet(5_000_000_000L);
        run(background);
        clock.addAndGet(7_000_000_000L);
        run(publisher);
        assertThat(inquiry.took()).isEqualTo(Duration.ofMillis(1500));
    }

    @Test
    void aMistakeIsToldAndEndsIt() {
        ask(progress -> {
            throw new IllegalStateException("wrong");
        });
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("failed: wrong");
        assertThat(inquiry.runningProperty().get()).isFalse();
    }
}
