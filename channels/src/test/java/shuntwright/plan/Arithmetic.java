package shuntwright.plan;

/** Evaluates sums and products of decimal numbers with brackets and square roots. */
final class Arithmetic {

    private final String text;
    private int at;

    private Arithmetic(String text) {
        this.text = text.replace(" ", "");
    }

    static double evaluate(String text) {
        Arithmetic arithmetic = new Arithmetic(text);
        double value = arithmetic.sum();
        if (arithmetic.at < arithmetic.text.length()) {
            throw new IllegalArgumentException("cannot read \"" + text + "\" from \""
                    + arithmetic.text.substring(arithmetic.at) + "\"");
        }
        return value;
    }

    private boolean take(String wanted) {
        boolean there = text.startsWith(wanted, at);
        at += there ? wanted.length() : 0;
        return there;
    }

    private double sum() {
        double value = product();
        while (true) {
            if (take("+")) {
                value += product();
            } else if (take("-")) {
                value -= product();
            } else {
                return value;
            }
        }
    }

    private double product() {
        double value = factor();
        while (true) {
            if (take("*")) {
                value *= factor();
            } else if (take("/")) {
                value /= factor();
            } else {
                return value;
            }
        }
    }

    private double factor() {
        if (take("-")) {
            return -factor();
        }
        boolean root = take("sqrt");
        if (take("(")) {
            double value = sum();
            if (!take(")")) {
                throw new IllegalArgumentException("a bracket is not closed in " + text);
            }
            return root ? Math.sqrt(value) : value;
        }
        int start = at;
        while (at < text.length() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
            at++;
        }
        return Double.parseDouble(text.substring(start, at));
    }
}
