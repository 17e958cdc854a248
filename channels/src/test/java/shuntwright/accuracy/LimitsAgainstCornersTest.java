package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.board.Channel;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.RandomCircuits;
import shuntwright.parts.Hysteresis;
import shuntwright.quantity.Range;

/** The limits reader against every corner of the box, each shunt's temperature coefficient on its own. */
class LimitsAgainstCornersTest {

    private static final int CIRCUITS = 800;
    /** Of those that act on the outcome. */
    private static final int MOST_INPUTS = 13;

    @Test
    void limitsAreTheExtremesOfAllCorners() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(5005);
        Map<String, Integer> tried = new HashMap<>();
        Set<Slot> uncertain = EnumSet.noneOf(Slot.class);
        Set<String> kinds = new TreeSet<>();
        for (int circuit = 0; circuit < CIRCUITS; circuit++) {
            RandomCircuits.Drawn drawn = RandomCircuits.sparse(random, random.nextDouble(0.1, 0.5)).next();
            for (Outcomes.Named outcome : Outcomes.of(drawn)) {
                InputDescription description = RandomPoints.describe(drawn);
                List<Input> acting = acting(outcome.equation(), description, random);
                if (acting.size() > MOST_INPUTS || !Outcomes.hasLimits(outcome.equation(), description)) {
                    continue;
                }
                tried.merge(outcome.name(), 1, Integer::sum);
                kinds.addAll(kinds(drawn));
                acting.forEach(each -> uncertain.add(each.slot()));
                compare(drawn, outcome, acting);
            }
        }
        assertThat(tried).hasSize(8);
        assertThat(tried.values()).as(tried.toString()).allMatch(count -> count > CIRCUITS / 10);
        assertThat(kinds).contains("shunts 1", "shunts 2", "shunts 3", "HIGH", "LOW", "from the supply",
                "from a reference", Threshold.DacOutput.class.getSimpleName(), Threshold.Divider.class.getSimpleName(),
                Hysteresis.InjectedCurrent.class.getSimpleName(), Hysteresis.PositiveFeedback.class.getSimpleName(),
                Hysteresis.BuiltIn.class.getSimpleName(), Hysteresis.Latched.class.getSimpleName());
        assertThat(uncertain).containsExactlyInAnyOrder(Slot.values());
    }

    private static List<String> kinds(RandomCircuits.Drawn drawn) {
        return List.of(drawn.circuit().comparator().hysteresis().getClass().getSimpleName(),
                drawn.circuit().threshold().getClass().getSimpleName(), "shunts " + drawn.circuit().shuntCount(),
                (drawn.demand().commonMode().nominal() > 0 ? Channel.Side.HIGH : Channel.Side.LOW).name(),
                drawn.circuit().threshold().source().isSupply() ? "from the supply" : "from a reference");
    }

    /** The inputs that change the outcome somewhere. */
    private static List<Input> acting(Equation equation, InputDescription description, RandomGenerator random) {
        List<Input> acting = new ArrayList<>();
        double[] x = description.nominal();
        RandomPoints.move(description, x, random);
        double value = equation.value(x);
        for (Input input : description.inputs()) {
            double before = x[Layout.index(input)];
            x[Layout.index(input)] = input.limits().min() + random.nextDouble() * input.limits().width();
            if (equation.value(x) != value) {
                acting.add(input);
            }
            x[Layout.index(input)] = before;
        }
        return acting;
    }

    private static void compare(RandomCircuits.Drawn drawn, Outcomes.Named outcome, List<Input> acting) {
        InputDescription description = RandomPoints.describe(drawn);
        LimitsReader reader = new LimitsReader(outcome.equation(), description);
        Range corners = corners(outcome.equation(), description, acting);
        check(corners.min(), reader.lowest(), -1, outcome.name(), description);
        check(corners.max(), reader.highest(), 1, outcome.name(), description);
        assertThat(outcome.equation().value(reader.lowest().x())).isEqualTo(reader.lowest().value());
    }

    /** An extreme between the ends of the ambient range lies a little beyond the best corner, or else it is that corner. */
    private static void check(double corner, LimitsReader.Corner found, int sign, String outcome,
            InputDescription description) {
        double beyond = sign * (found.value() - corner);
        boolean atEnds = description.inputs().stream()
                .allMatch(input -> found.x()[Layout.index(input)] == input.limits().min()
                        || found.x()[Layout.index(input)] == input.limits().max());
        double rounding = 1e-12 * Math.abs(corner);
        assertThat(beyond).as("%s of %s", outcome, description.inputs()).isBetween(-rounding,
                atEnds ? rounding : 1e-4 * Math.abs(corner));
    }

    private static Range corners(Equation equation, InputDescription description, List<Input> inputs) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        double[] x = description.nominal();
        for (int corner = 0; corner < 1 << inputs.size(); corner++) {
            for (int i = 0; i < inputs.size(); i++) {
                Range limits = inputs.get(i).limits();
                x[Layout.index(inputs.get(i))] = (corner >> i & 1) == 1 ? limits.max() : limits.min();
            }
            double value = equation.value(x);
            least = Math.min(least, value);
            most = Math.max(most, value);
        }
        return Range.of(least, most);
    }
}
