package shuntwright.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * The decimal digits of a double: the fewest that identify it, or those rounded for people.
 *
 * @param minus whether a minus is written
 * @param size  the magnitude, without trailing zeros
 */
record Decimal(boolean minus, BigDecimal size) {

    /** @throws IllegalArgumentException unless the value is finite */
    static Decimal exact(double value) {
        boolean minus = Double.doubleToRawLongBits(value) < 0;
        return new Decimal(minus, shortest(value).stripTrailingZeros());
    }

    /**
     * Rounded half up to significant digits; no minus before zero.
     *
     * @throws IllegalArgumentException unless the value is finite and the digits are 1 to 15
     */
    static Decimal rounded(double value, int digits) {
        if (!(digits >= 1 && digits <= 15)) {
            throw new IllegalArgumentException("a number is shown with 1 to 15 significant digits, got " + digits);
        }
        BigDecimal size = shortest(value).round(new MathContext(digits, RoundingMode.HALF_UP));
        return new Decimal(value < 0, size.stripTrailingZeros());
    }

    private static BigDecimal shortest(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("only finite values can be written, got " + value);
        }
        return new BigDecimal(Double.toString(Math.abs(value)));
    }

    boolean isZero() {
        return size.signum() == 0;
    }

    /** The power of ten of the first digit. */
    int exponent() {
        return size.precision() - size.scale() - 1;
    }

    /** Without exponent, in units of 10^shift. */
    String plain(int shift) {
        return sign() + (isZero() ? "0" : size.scaleByPowerOfTen(-shift).toPlainString());
    }

    /** With exponent, "1.5e-20", in units of 10^shift. */
    String scientific(int shift) {
        String digits = size.unscaledValue().toString();
        String fraction = digits.length() == 1 ? "" : "." + digits.substring(1);
        return sign() + digits.charAt(0) + fraction + "e" + (exponent() - shift);
    }

    private String sign() {
        return minus ? "-" : "";
    }
}
