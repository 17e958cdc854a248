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

    /** A corner of the box, with an ambient temperature anywhere in its range. */
    static void corner(InputDescription description, double[] x, RandomGenerator random) {
        for (Input input : description.inputs()) {
            boolean upper = random.nextBoolean();
            x[Layout.index(input)] = upper ? input.limits().max() : input.limits().min();
        }
        ambient(description, x, random);
    }

    /** A given corner with a few of its inputs moved within their limits. */
    static void near(InputDescription description, double[] x, double[] corner, RandomGenerator random) {
        System.arraycopy(corner, 0, x, 0, x.length);
        if (random.nextBoolean()) {
            ambient(description, x, random);
        }
        int most = Math.min(3, description.inputs().size() + 1);
        for (int moved = random.nextInt(most); moved > 0; moved--) {
            Input input = description.inputs().get(random.nextInt(description.inputs().size()));
            double share = random.nextBoolean() ? random.nextDouble() : random.nextInt(2);
            x[Layout.index(input)] = input.limits().min() + share * input.limits().width();
        }
    }

    private static void ambient(InputDescription description, double[] x, RandomGenerator random) {
        for (Input input : description.inputs()) {
            if (input.slot() == Slot.AMBIENT) {
                x[Layout.index(input)] = input.limits().min() + random.nextDouble() * input.limits().width();
            }
        }
    }
}
