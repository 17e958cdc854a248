package shuntwright.selection;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;

class ConflictsTest {

    private static boolean possible(Selection selection, List<Integer> slots, List<Integer> limits) {
        return new Exhaustive(selection.with(slots, limits), List.of(), List.of()).best().isPresent();
    }

    private static List<Integer> without(List<Integer> all, Integer one) {
        return all.stream().filter(each -> !each.equals(one)).toList();
    }

    /** Against every selection there is: the core is impossible, and possible without any one of its members. */
    @Test
    void isImpossibleAndMinimal() {
        int found = 0;
        int several = 0;
        int undecided = 0;
        for (int seed = 0; seed < 500; seed++) {
            Selection selection = new RandomSelections(seed).small(3 + seed % 4, 5, 0.55 + 0.1 * (seed % 5));
            List<Integer> slots = new ArrayList<>();
            List<Integer> limits = new ArrayList<>();
            for (int i = 0; i < selection.slots().size(); i++) {
                slots.add(i);
            }
            for (int r = 0; r < selection.resources().size(); r++) {
                if (selection.resources().get(r).limit().isPresent()) {
                    limits.add(r);
                }
            }
            boolean can = possible(selection, slots, limits);
            Optional<Conflicts.Core> core = Conflicts.find(selection, Prover.NONE, 1, Watch.NONE);
            if (can) {
                assertThat(core).as("seed %s", seed).isEmpty();
                continue;
            }
            if (core.isEmpty()) {
                undecided++;
                continue;
            }
            found++;
            several += core.get().limits().size() > 1 ? 1 : 0;
            assertThat(possible(selection, core.get().slots(), core.get().limits())).as("seed %s", seed).isFalse();
            if (core.get().minimal()) {
                for (Integer limit : core.get().limits()) {
                    assertThat(possible(selection, core.get().slots(), without(core.get().limits(), limit))).isTrue();
                }
                for (Integer slot : core.get().slots()) {
                    assertThat(possible(selection, without(core.get().slots(), slot), core.get().limits())).isTrue();
                }
            }
        }
        assertThat(found).isGreaterThan(60);
        assertThat(several).isPositive();
        // Fractions of packages leave some that the own bound cannot decide.
        assertThat(undecided).isLessThan(found / 4);
    }

    /** Relaxed to what is needed, and no more than rounding above it, the limits can be kept; a little below they cannot. */
    @Test
    void whatIsNeededIsNeeded() {
        int tried = 0;
        for (int seed = 0; seed < 300; seed++) {
            Selection selection = new RandomSelections(seed).small(3 + seed % 3, 5, 0.6);
            Optional<Conflicts.Core> core = Conflicts.find(selection, Prover.NONE, 1, Watch.NONE);
            if (core.isEmpty()) {
                continue;
            }
            for (int resource : core.get().limits()) {
                Exhaustive exhaustive = new Exhaustive(
                        selection.with(java.util.stream.IntStream.range(0, selection.slots().size()).boxed().toList(),
                                java.util.stream.IntStream.range(0, selection.resources().size()).boxed()
                                        .filter(r -> r != resource).toList()),
                        List.of(new Aim.Use(resource)), List.of(0.0));
                var needed = Conflicts.needed(selection, resource, 1, Watch.NONE);
                assertThat(needed.isPresent()).isEqualTo(exhaustive.best().isPresent());
                if (needed.isPresent()) {
                    assertThat(needed.getAsDouble()).isCloseTo(exhaustive.best().get().getFirst(),
                            org.assertj.core.api.Assertions.within(1e-9));
                    tried++;
                }
            }
        }
        assertThat(tried).isGreaterThan(20);
    }
}
