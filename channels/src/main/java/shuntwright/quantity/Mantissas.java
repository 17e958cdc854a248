package shuntwright.quantity;

/** The three-digit mantissas of the preferred number series of IEC 60063:2015. */
final class Mantissas {

    /** Listed in the standard, given by no formula; E12, E6 and E3 are every second, fourth and eighth of it. */
    private static final int[] E24 = {100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430,
            470, 510, 560, 620, 680, 750, 820, 910};
    /** E96 and E48 are every second and fourth of it. */
    private static final int[] E192 = fine();
    /** The one value of E192 that is not the rounded power of ten. */
    private static final int IRREGULAR = 185;
    private static final int IRREGULAR_VALUE = 920;

    private Mantissas() {
    }

    /** The mantissa, 100 ≤ m &lt; 1000, with that index in the series with that many values per decade. */
    static int at(int index, int perDecade) {
        return perDecade <= E24.length
                ? E24[index * (E24.length / perDecade)]
                : E192[index * (E192.length / perDecade)];
    }

    private static int[] fine() {
        int[] mantissas = new int[192];
        for (int i = 0; i < mantissas.length; i++) {
            mantissas[i] = (int) Math.round(100 * Math.pow(10, i / 192.0));
        }
        mantissas[IRREGULAR] = IRREGULAR_VALUE;
        return mantissas;
    }
}
