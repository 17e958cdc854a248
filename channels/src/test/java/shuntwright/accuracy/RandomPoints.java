package shuntwright.accuracy;

import java.util.EnumSet;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.random.RandomGenerator;

import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Distribution;

/** Points in the box of a circuit's inputs. */
final class RandomPoints {

    private static final Set<Slot> TEMPERATURES = EnumSet.of(Slot.AMBIENT, Slot.ZONE_RISE,
            Slot.CALIBRATION_TEMPERATURE);

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

    /** From the distributions; pieces of one reel deviate alike as often as their correlation coefficient says. */
    static void draw(InputDescription description, double[] x, RandomGenerator random) {
        Map<String, Double> alike = new HashMap<>();
        for (Input input : description.inputs()) {
            double share = share(input.distribution(), random);
            if (input.reel().isPresent()) {
                // Drawn of the whole reel, or of the piece: then the coefficient is how often it is of the reel.
                String quantity = input.reel().get().name() + input.slot().unit();
                double own = share;
                double reel = alike.computeIfAbsent(quantity, _ -> random.nextDouble() < input.reel().get()
                        .correlation() ? own : Double.NaN);
                share = Double.isNaN(reel) ? own : reel;
            }
            x[Layout.index(input)] = input.limits().min() + share * input.limits().width();
        }
    }

    /** Where between the limits, 0 to 1. */
    private static double share(Distribution distribution, RandomGenerator random) {
        return switch (distribution) {
            case Distribution.Uniform _ -> random.nextDouble();
            case Distribution.Triangular _ -> (random.nextDouble() + random.nextDouble()) / 2;
            case Distribution.ArcSine _ -> (1 + Math.cos(Math.PI * random.nextDouble())) / 2;
            // The sum of two uniform draws of widths (1 + ratio)/2 and (1 - ratio)/2 (JCGM 101, 6.4.4).
            case Distribution.Trapezoid(double ratio) ->
                random.nextDouble() * (1 + ratio) / 2 + random.nextDouble() * (1 - ratio) / 2;
            case Distribution.Normal _,Distribution.StudentT _ ->
                throw new IllegalArgumentException("not bounded: " + distribution);
        };
    }

    /** A corner of the box, with temperatures anywhere in their ranges. */
    static void corner(InputDescription description, double[] x, RandomGenerator random) {
        for (Input input : description.inputs()) {
            boolean upper = random.nextBoolean();
            x[Layout.index(input)] = upper ? input.limits().max() : input.limits().min();
        }
        temperatures(description, x, random);
    }

    /** A given corner with a few of its inputs moved within their limits. */
    static void near(InputDescription description, double[] x, double[] corner, RandomGenerator random) {
        System.arraycopy(corner, 0, x, 0, x.length);
        if (random.nextBoolean()) {
            temperatures(description, x, random);
        }
        int most = Math.min(3, description.inputs().size() + 1);
        for (int moved = random.nextInt(most); moved > 0; moved--) {
            Input input = description.inputs().get(random.nextInt(description.inputs().size()));
            double share = random.nextBoolean() ? random.nextDouble() : random.nextInt(2);
            x[Layout.index(input)] = input.limits().min() + share * input.limits().width();
        }
    }

    private static void temperatures(InputDescription description, double[] x, RandomGenerator random) {
        for (Input input : description.inputs()) {
            if (TEMPERATURES.contains(input.slot()) && random.nextBoolean()) {
                x[Layout.index(input)] = input.limits().min() + random.nextDouble() * input.limits().width();
            }
        }
    }
}
