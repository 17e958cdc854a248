package shuntwright.planner.proof;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.LinkedHashMap;
import java.util.Map;

import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;

/** A sum of variables, each times a decimal number, and a constant. */
final class Sum {

    /** Sums of solver numbers stay under this. */
    private static final BigDecimal LARGEST = BigDecimal.valueOf(1L << 60);

    private final Map<Var, BigDecimal> terms = new LinkedHashMap<>();
    private BigDecimal constant = BigDecimal.ZERO;

    static Sum of(Var var) {
        return new Sum().add(1, var);
    }

    Sum add(BigDecimal factor, Var var) {
        terms.merge(var, factor, BigDecimal::add);
        return this;
    }

    Sum add(double factor, Var var) {
        return add(BigDecimal.valueOf(factor), var);
    }

    Sum add(long factor, Var var) {
        return add(BigDecimal.valueOf(factor), var);
    }

    Sum add(BigDecimal factor, Sum other) {
        other.terms.forEach((var, each) -> add(each.multiply(factor), var));
        constant = constant.add(other.constant.multiply(factor));
        return this;
    }

    Sum add(long factor, Sum other) {
        return add(BigDecimal.valueOf(factor), other);
    }

    Sum plus(BigDecimal value) {
        constant = constant.add(value);
        return this;
    }

    boolean empty() {
        return terms.isEmpty();
    }

    BigDecimal constant() {
        return constant;
    }

    /** Its value, without the constant, at the selection known beforehand. */
    long hint() {
        BigDecimal sum = BigDecimal.ZERO;
        for (Map.Entry<Var, BigDecimal> each : terms.entrySet()) {
            sum = sum.add(each.getValue().multiply(BigDecimal.valueOf(each.getKey().hint())));
        }
        return sum.longValue();
    }

    /** The value of {@link #floor(int)} at the selection known beforehand. */
    long hintFloor(int decimals) {
        return terms.entrySet().stream().mapToLong(each -> floor(each.getValue(), decimals) * each.getKey().hint())
                .sum();
    }

    /** Largest value without the constant, when no factor is negative. */
    BigDecimal most() {
        BigDecimal sum = BigDecimal.ZERO;
        for (Map.Entry<Var, BigDecimal> each : terms.entrySet()) {
            sum = sum.add(each.getValue().abs().multiply(BigDecimal.valueOf(each.getKey().most())));
        }
        return sum;
    }

    /**
     * The power of ten by which its factors become whole: exactly where they have few enough decimals, else as exactly as is useful for
     * values of the size given.
     */
    int decimals(double size, int digits) {
        int exact = 0;
        for (BigDecimal each : terms.values()) {
            exact = Math.max(exact, each.stripTrailingZeros().scale());
        }
        int useful = digits - (int) Math.ceil(Math.log10(Math.max(size, 1e-12)));
        int decimals = Math.min(exact, useful);
        while (most().scaleByPowerOfTen(decimals).compareTo(LARGEST) > 0) {
            decimals--;
        }
        return decimals;
    }

    /** Its terms, without the constant, times a power of ten, each factor rounded down: never more than the true sum. */
    LinearExpr floor(int decimals) {
        LinearExprBuilder sum = LinearExpr.newBuilder();
        terms.forEach((var, each) -> {
            long whole = floor(each, decimals);
            if (whole != 0) {
                sum.addTerm(var.it(), whole);
            }
        });
        return sum.build();
    }

    /** Its terms with whole factors. */
    LinearExpr exact() {
        return floor(0);
    }

    static long floor(BigDecimal value, int decimals) {
        return value.scaleByPowerOfTen(decimals).setScale(0, RoundingMode.FLOOR).longValueExact();
    }
}
