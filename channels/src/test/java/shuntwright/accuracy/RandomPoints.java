package shuntwright.accuracy;

import java.util.random.RandomGenerator;

import shuntwright.fixture.RandomCircuits;

/** Points in the box of a circuit's inputs. */
final class RandomPoints {

    private RandomPoints() {
    }

    static InputDescription describe(RandomCircuits.Drawn drawn) {
        return InputDescription.of(drawn.circuit(), drawn.around(), drawn.demand());
    }

    /** Uniform in the box. */
    static double[] within(RandomCircuits.Drawn drawn, RandomGenerator random) {
        InputDescription description = describe(drawn);
        double[] x = description.nominal();
        move(description, x, random);
        return x;
    }

    static void move(InputDescription description, double[] x, RandomGenerator random) {
        for (Input input : description.inputs()) {
            x[Layout.index(input)] = input.limits().min() + random.nextDouble() * input.limits().width();
        }
    }
}
