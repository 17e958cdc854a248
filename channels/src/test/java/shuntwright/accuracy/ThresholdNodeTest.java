package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.junit.jupiter.api.Test;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.RandomCircuits;

/** The threshold's voltage against nodal analysis of the whole network with a linear algebra library. */
class ThresholdNodeTest {

    private static final int NODE = 0;
    private static final int OUTPUT = 1;

    @Test
    void nodeVoltageIsThatOfNodalAnalysis() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(11);
        RandomCircuits circuits = RandomCircuits.full(random);
        int withFeedback = 0;
        int without = 0;
        while (withFeedback < 150 || without < 150) {
            RandomCircuits.Drawn drawn = circuits.next();
            if (!(drawn.circuit().threshold() instanceof Threshold.Divider divider)) {
                continue;
            }
            if (drawn.circuit().network() instanceof HysteresisNetwork.Feedback) {
                withFeedback++;
            } else {
                without++;
            }
            double[] x = RandomPoints.within(drawn, random);
            for (boolean tripped : new boolean[]{false, true}) {
                double expected = solve(drawn.circuit(), divider, tripped, x);
                assertThat(ThresholdNode.voltage(drawn.circuit(), tripped, x, 0, new double[0]))
                        .isCloseTo(expected, within(1e-12 * Math.abs(expected)));
            }
        }
    }

    /** Two nodes, threshold and comparator output; a conducting output is a voltage source of V_OL. */
    private static double solve(SenseCircuit circuit, Threshold.Divider divider, boolean tripped, double[] x) {
        double local = x[Slot.AMBIENT.place()] - 25 + x[Slot.ZONE_RISE.place()];
        double dT = divider.tap().isEmpty() ? local : x[Slot.AMBIENT.place()] - 25;
        RealMatrix conductance = new Array2DRowRealMatrix(2, 2);
        RealVector current = new ArrayRealVector(2);
        double top = divider.top() * (1 + x[Slot.TOP_TOLERANCE.place()] + dT * x[Slot.TOP_DRIFT.place()]
                + x[Slot.TOP_AGEING.place()]);
        double bottom = divider.bottom() * (1 + x[Slot.BOTTOM_TOLERANCE.place()] + dT * x[Slot.BOTTOM_DRIFT.place()]
                + x[Slot.BOTTOM_AGEING.place()]);
        conductance.addToEntry(NODE, NODE, 1 / top + 1 / bottom);
        current.addToEntry(NODE, source(divider.source(), x) / top
                - divider.users() * x[Slot.COMPARATOR_BIAS.place()]);
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            double back = feedback.resistance()
                    * (1 + x[Slot.FEEDBACK_TOLERANCE.place()] + local * x[Slot.FEEDBACK_DRIFT.place()]
                            + x[Slot.FEEDBACK_AGEING.place()]);
            conductance.addToEntry(NODE, NODE, 1 / back);
            conductance.addToEntry(NODE, OUTPUT, -1 / back);
            if (tripped) {
                conductance.setEntry(OUTPUT, OUTPUT, 1);
                current.setEntry(OUTPUT, x[Slot.OUTPUT_LOW.place()]);
            } else {
                double pullUp = feedback.pullUp() * (1 + x[Slot.PULL_UP_TOLERANCE.place()]);
                Slot io = feedback.supplied() ? Slot.SUPPLY : Slot.PULL_UP_VOLTAGE;
                conductance.setEntry(OUTPUT, NODE, -1 / back);
                conductance.setEntry(OUTPUT, OUTPUT, 1 / back + 1 / pullUp);
                current.setEntry(OUTPUT, x[io.place()] / pullUp);
            }
        } else {
            conductance.setEntry(OUTPUT, OUTPUT, 1);
        }
        return new LUDecomposition(conductance, 0).getSolver().solve(current).getEntry(NODE);
    }

    private static double source(SourceVoltage source, double[] x) {
        if (source.isSupply()) {
            return x[Slot.SUPPLY.place()];
        }
        double relative = x[Slot.REFERENCE_TOLERANCE.place()] + x[Slot.REFERENCE_AGEING.place()]
                + x[Slot.REFERENCE_DRIFT.place()] * (x[Slot.AMBIENT.place()] - 25);
        return source.voltage().nominal() * (1 + relative) - x[Slot.REFERENCE_LOAD.place()];
    }
}
