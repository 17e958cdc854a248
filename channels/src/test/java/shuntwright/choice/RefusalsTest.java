package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.board.Acceptance;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.parts.Comparator;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/** The reasons for no fit, worked out again. */
class RefusalsTest {

    private record Named(String name, LimitCheck check) {}

    /** Every broken limit of parts and pairs, as long as the parts before them are left. */
    private static List<Named> broken(ChannelProblem problem) {
        List<Named> broken = new ArrayList<>();
        List<Named> pairs = new ArrayList<>();
        for (Shunt shunt : problem.catalogue().shunts()) {
            for (int n = 1; n <= problem.around().rules().parallelShunts(); n++) {
                String name = n == 1 ? shunt.partNumber() : n + " × " + shunt.partNumber();
                List<LimitCheck> own = LimitRules.ofShunt(shunt, n, problem.demand(), problem.around());
                take(name, own, broken);
                for (SenseAmplifier amplifier : problem.catalogue().amplifiers()) {
                    boolean left = holds(own)
                            && holds(LimitRules.ofAmplifier(amplifier, problem.demand(), problem.around()));
                    double ohm = (shunt.resistance() + shunt.mountingResistance().mid()) / n;
                    if (left) {
                        take(name + " with " + amplifier.partNumber(),
                                LimitRules.ofPair(amplifier, ohm, problem.demand(), problem.around()), pairs);
                    }
                }
            }
        }
        for (SenseAmplifier amplifier : problem.catalogue().amplifiers()) {
            take(amplifier.partNumber(), LimitRules.ofAmplifier(amplifier, problem.demand(), problem.around()),
                    broken);
        }
        for (Comparator comparator : problem.catalogue().comparators()) {
            take(comparator.partNumber(),
                    LimitRules.ofComparator(comparator, problem.pullUp().voltage().max(), problem.around()), broken);
        }
        broken.addAll(pairs);
        return broken;
    }

    private static boolean holds(List<LimitCheck> checks) {
        return checks.stream().allMatch(LimitCheck::holds);
    }

    private static void take(String name, List<LimitCheck> checks, List<Named> into) {
        checks.stream().filter(each -> !each.holds()).forEach(each -> into.add(new Named(name, each)));
    }

    @Test
    void namesEveryLimitWithItsNearestMiss() {
        Set<Limit> seen = EnumSet.noneOf(Limit.class);
        for (int seed = 0; seed < 1500; seed++) {
            ChannelProblem problem = RandomProblems.problem(new SplittableRandom(seed), Acceptance.Basis.LIMITS);
            if (!(new ChannelPicker(new DividerTables()).pick(problem) instanceof ChannelChoice.NoFit none)) {
                continue;
            }
            List<Named> broken = broken(problem);
            for (ChannelChoice.Refusal refusal : none.refusals()) {
                LimitCheck miss = refusal.miss();
                seen.add(miss.limit());
                assertThat(miss.holds()).isFalse();
                assertThat(miss.limit().family()).isEqualTo(refusal.family());
                assertThat(refusal.refused()).isBetween(1, refusal.examined());
                if (ofThreshold(miss.limit())) {
                    continue;
                }
                List<Named> same = broken.stream().filter(each -> each.check().limit() == miss.limit()).toList();
                assertThat(same).as("seed %s, %s", seed, miss).contains(new Named(refusal.nearest(), miss))
                        .hasSize(refusal.refused())
                        .allSatisfy(each -> assertThat(relative(each.check()))
                                .isGreaterThanOrEqualTo(relative(miss)));
            }
            assertThat(none.refusals()).extracting(each -> each.miss().limit())
                    .containsAll(broken.stream().map(each -> each.check().limit()).toList());
        }
        assertThat(seen).contains(Limit.SHUNT_POWER, Limit.SWING_AT_FULL_SCALE, Limit.DIFFERENTIAL_RANGE);
    }

    private static double relative(LimitCheck check) {
        return check.miss() / Math.abs(check.bound());
    }

    private static boolean ofThreshold(Limit limit) {
        return limit == Limit.SWING_AT_TRIP || limit == Limit.TRIP_FLOOR || limit == Limit.RELEASE_FLOOR
                || limit == Limit.COMPARATOR_HEADROOM || limit == Limit.COMPARATOR_FLOOR;
    }

    @Test
    void copesWithoutResistors() {
        ChannelProblem p = RandomProblems.problem(new SplittableRandom(2), Acceptance.Basis.LIMITS);
        ChannelProblem without = new ChannelProblem(p.demand(), p.around(), p.catalogue(),
                List.of(TrialParts.supply(3.3, 0.02)), java.util.Optional.empty(), List.of(), p.pullUp(),
                p.acceptance(), p.buildQuantity());
        assertThat(new ChannelPicker(new DividerTables()).pick(without)).isInstanceOf(ChannelChoice.NoFit.class);
    }
}
