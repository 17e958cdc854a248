package shuntwright.bench;

/**
 * What the machine reaches when it does nothing but as many operations as sampling the trip current cannot do without: the bar that
 * no arrangement of the same arithmetic passes, short of other instructions than the compiler makes of plain loops.
 *
 * <p>Counted per number drawn: 24 integer operations (Threefry-2x32 with 13 rounds makes two numbers of 13 additions, 13 rotations, 13
 * exclusive ors and 8 additions of key words), one conversion, one multiplication, one addition. Counted per trial: 60 additions
 * and multiplications, 5 divisions and one square root. Not counted: where trials are put into the histogram, which is no vector
 * operation, and passing from one loop to the next. All data fit the first-level cache.
 */
final class VectorLimit {
    private static final int BLOCK = 1024;
    private static final int INTEGER_PASSES = 4;
    private static final int ARITHMETIC_PASSES = 6;

    private final int[] words = new int[BLOCK];
    private final double[] numbers = new double[BLOCK];
    private final double[] result = new double[BLOCK];
    private final double[] other = new double[BLOCK];

    /** Does the operations of so many trials of so many inputs; the sum only so that nothing is left out. */
    double run(int inputs, int trials) {
        double sum = 0;
        for (int block = 0; block < trials / BLOCK; block++) {
            for (int i = 0; i < inputs; i++) {
                for (int pass = 0; pass < INTEGER_PASSES; pass++) {
                    integers(words, block + i);
                }
                convert(words, numbers, 1e-9 * i);
            }
            for (int pass = 0; pass < ARITHMETIC_PASSES; pass++) {
                arithmetic(numbers, result);
            }
            divisions(numbers, result, other);
            sum += result[block % BLOCK];
        }
        return sum;
    }

    /** Six operations. */
    private static void integers(int[] words, int key) {
        for (int j = 0; j < BLOCK; j++) {
            int w = words[j];
            w += key;
            w ^= 0x1BD11BDA;
            w = Integer.rotateLeft(w, 13);
            w += 0x9E3779B9;
            w = Integer.rotateLeft(w, 15);
            w ^= key;
            words[j] = w;
        }
    }

    private static void convert(int[] words, double[] numbers, double offset) {
        for (int j = 0; j < BLOCK; j++) {
            numbers[j] = offset + 0x1p-32 * words[j];
        }
    }

    /** Five additions and five multiplications. */
    private static void arithmetic(double[] numbers, double[] result) {
        for (int j = 0; j < BLOCK; j++) {
            double a = numbers[j];
            double b = result[j];
            b = 0.5 * b + a;
            b = 0.5 * b + a;
            b = 0.5 * b + a;
            b = 0.5 * b + a;
            b = 0.5 * b + a;
            result[j] = b;
        }
    }

    private static void divisions(double[] numbers, double[] result, double[] other) {
        for (int j = 0; j < BLOCK; j++) {
            double a = 3 + numbers[j];
            other[j] = 1 / a + 2 / (a + 1);
        }
        for (int j = 0; j < BLOCK; j++) {
            double a = 3 + other[j];
            result[j] = (1 / a + 2 / (a + 1)) / Math.sqrt(a);
        }
    }
}
