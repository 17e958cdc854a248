package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.board.Calibration;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.Furnished;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;
import shuntwright.sampling.ChannelModel;
import shuntwright.sampling.Draws;
import shuntwright.sampling.Scratch;

/** The equations by columns, from which trials are sampled, against those that limits and combined uncertainty read. */
class ChannelModelTest {

    private static final int CIRCUITS = 600;
    private static final int POINTS = 24;

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(41);
    private final Map<String, Integer> seen = new TreeMap<>();
    private final Map<Outcome, Integer> outcomes = new EnumMap<>(Outcome.class);

    private void saw(String what) {
        seen.merge(what, 1, Integer::sum);
    }

    @Test
    void columnsGiveWhatTheEquationsGive() {
        RandomCircuits circuits = RandomCircuits.full(random);
        for (int i = 0; i < CIRCUITS; i++) {
            RandomCircuits.Drawn drawn = Furnished.furnish(circuits.next(), random);
            note(drawn);
            compare(drawn, i % 2 == 0);
        }
        // Every kind was there: hysteresis, threshold, sources, shunts, calibration, zones.
        for (String kind : List.of("InjectedCurrent", "PositiveFeedback", "BuiltIn", "Latched", "DacOutput", "Divider",
                "tap", "threshold from supply", "threshold from reference", "pull-up from supply", "pull-up of its own",
                "1 shunts", "2 shunts", "3 shunts", "calibrated ONE", "calibrated TWO", "not calibrated", "zone",
                "ADC by supply", "ADC by reference")) {
            assertThat(seen).as("circuits seen").hasEntrySatisfying(kind, count -> assertThat(count).isGreaterThan(20));
        }
        assertThat(outcomes).containsOnlyKeys(Outcome.values());
    }

    private void note(RandomCircuits.Drawn drawn) {
        SenseCircuit circuit = drawn.circuit();
        saw(circuit.comparator().hysteresis().getClass().getSimpleName());
        saw(circuit.threshold().getClass().getSimpleName());
        saw(circuit.shuntCount() + " shunts");
        saw(circuit.threshold().source().isSupply() ? "threshold from supply" : "threshold from reference");
        if (circuit.threshold() instanceof Threshold.Divider divider && !divider.tap().isEmpty()) {
            saw("tap");
        }
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            saw(feedback.supplied() ? "pull-up from supply" : "pull-up of its own");
        }
        if (drawn.around().zone().isPresent()) {
            saw("zone");
        }
        if (drawn.around().adc().isPresent()) {
            saw(drawn.around().adc().get().source().isSupply() ? "ADC by supply" : "ADC by reference");
            saw(drawn.demand().channel().reading().calibration().map(each -> "calibrated " + each.points())
                    .orElse("not calibrated"));
        }
    }

    private Equation equation(ChannelEquations equations, ChannelAccuracy.Asked asked, Demand demand) {
        return switch (asked.outcome()) {
            case TRIP -> equations.trip();
            case RELEASE -> equations.release();
            case READING_AT_LEAST, READING_AT_LOAD -> {
                Equation plain = equations.reading(asked.current());
                yield demand.channel().reading().calibration().<Equation>map(
                        (Calibration each) -> new CalibratedReading(equations, each, demand.load(), asked.current()))
                        .orElse(plain);
            }
        };
    }

    private void compare(RandomCircuits.Drawn drawn, boolean corners) {
        InputDescription description = RandomPoints.describe(drawn);
        ChannelModel model = new ChannelModel(drawn.circuit(), drawn.around(), drawn.demand());
        double[] nominal = description.nominal();
        double[][] points = new double[POINTS][];
        double[][] x = new double[model.inputs()][Draws.BLOCK];
        assertThat(nominal).hasSize(model.inputs());
        for (int j = 0; j < POINTS; j++) {
            points[j] = nominal.clone();
            if (corners) {
                RandomPoints.corner(description, points[j], random);
            } else if (j > 0) {
                RandomPoints.move(description, points[j], random);
            }
            for (int i = 0; i < x.length; i++) {
                x[i][j] = points[j][i];
            }
        }
        double[][] y = new double[model.outputs()][Draws.BLOCK];
        model.evaluate(x, POINTS, y, new Scratch());
        ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
        for (int o = 0; o < model.outputs(); o++) {
            ChannelAccuracy.Asked asked = model.asked().get(o);
            outcomes.merge(asked.outcome(), 1, Integer::sum);
            Equation equation = equation(equations, asked, drawn.demand());
            for (int j = 0; j < POINTS; j++) {
                double expected = equation.value(points[j]);
                if (Double.isFinite(expected)) {
                    assertThat(y[o][j]).as("%s of %s", asked.outcome(), drawn).isCloseTo(expected,
                            within(1e-12 * Math.abs(expected)));
                } else {
                    assertThat(y[o][j]).as("%s of %s", asked.outcome(), drawn).isNotFinite();
                }
            }
        }
    }

    /** Falling resistance never reaches the threshold: no value, whatever stands for it. */
    @Test
    void runawayHasNoValue() {
        SenseCircuit circuit = IdealParts.circuit(IdealParts.shunt(1e-3, Tolerance.NONE, 1e-3, 50),
                IdealParts.amplifier(50), IdealParts.divider(20, 1e4, 1e4));
        Surroundings around = new Surroundings(Range.exactly(25), IdealParts.exactly(20), DesignRules.DEFAULT,
                Optional.empty(), List.of(), Optional.empty());
        ChannelModel model = new ChannelModel(circuit, around, IdealParts.demand(12));
        double[] nominal = InputDescription.of(circuit, around, IdealParts.demand(12)).nominal();
        double[][] x = new double[model.inputs()][Draws.BLOCK];
        for (int i = 0; i < x.length; i++) {
            x[i][0] = nominal[i];
            x[i][1] = nominal[i];
        }
        x[Layout.index(Slot.SHUNT_DRIFT, 0)][1] = -1e-3;
        double[][] y = new double[model.outputs()][Draws.BLOCK];
        model.evaluate(x, 2, y, new Scratch());
        assertThat(y[0][0]).isCloseTo(200, within(1e-9));
        assertThat(y[0][1]).isNotFinite();
    }
}
