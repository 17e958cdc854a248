package shuntwright.io.boardfile;

import java.util.Optional;

import shuntwright.accuracy.Slot;
import shuntwright.board.StatedDistribution;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Distribution;

final class DistributionForm extends Form<StatedDistribution> {
    /** The words for the six distributions. */
    private enum Word {
        UNIFORM("uniform"), NORMAL("normal"), TRIANGULAR("triangular"), ARCSINE("arcsine"), TRAPEZOID("trapezoid"), T(
                "t");

        private final String text;

        Word(String text) {
            this.text = text;
        }

        boolean hasK() {
            return this == NORMAL || this == T;
        }
    }

    private static final String NEEDS_K = "how many standard uncertainties the limits lie from their middle, for example "
            + "\"k\": 3";
    private static final String NEEDS_RATIO = "the width of its top over the width of its base, for example "
            + "\"ratio\": \"50 %\"";
    private static final String NEEDS_DEGREES = "how well its standard uncertainty is known, for example "
            + "\"degreesOfFreedom\": 9 from ten readings";

    private final Key<String> input = required("input", new InputWords(),
            "which input, in the words of the error budget");
    private final Key<String> part = optional("part", Kinds.name(), "every part",
            "only of this part number, or of all that begin so where it ends with an asterisk, as in `STRIP-*`");
    private final Key<Word> distribution = required("distribution", Kinds.choice(word -> word.text, Word.values()),
            "how it lies between or around its limits");
    private final Key<Double> k = optional("k", Kinds.bare("standard uncertainties", Bounds.POSITIVE),
            "needed for `normal` and `t` only", "how far the limits lie from their middle");
    private final Key<Double> ratio = optional("ratio", Quantities.number(Dimension.RATIO, Bounds.SHARE),
            "needed for `trapezoid` only", "width of the top over width of the base");
    private final Key<Double> degreesOfFreedom = optional("degreesOfFreedom",
            Kinds.bare("number", new Bounds(2, false, Double.POSITIVE_INFINITY, false)), "needed for `t` only",
            "of the standard uncertainty");

    DistributionForm() {
        super("Distribution");
    }

    @Override
    protected void check(Fields fields) {
        fields.find(distribution).ifPresent(word -> {
            belongs(fields, word, k, word.hasK(), NEEDS_K);
            belongs(fields, word, ratio, word == Word.TRAPEZOID, NEEDS_RATIO);
            belongs(fields, word, degreesOfFreedom, word == Word.T, NEEDS_DEGREES);
        });
        Optional<Slot> slot = fields.find(input).flatMap(Slot::of);
        if (fields.has(part) && slot.isPresent() && slot.get().part().isEmpty()) {
            fields.problem(part, "the input \"" + slot.get().words() + "\" is no property of a shunt, an amplifier, a "
                    + "comparator or a resistor series, so no part can be named; remove \"part\"");
        }
    }

    private static void belongs(Fields fields, Word word, Key<?> key, boolean needed, String needs) {
        if (needed && !fields.has(key)) {
            fields.problem(key, "the key \"" + key.name() + "\" is missing: the distribution \"" + word.text
                    + "\" needs " + needs);
        }
        if (!needed && fields.has(key)) {
            fields.problem(key, "the distribution \"" + word.text + "\" has no \"" + key.name()
                    + "\"; remove it or change \"distribution\"");
        }
    }

    @Override
    protected StatedDistribution bind(Fields fields) {
        Distribution bound = switch (fields.get(distribution)) {
            case UNIFORM -> new Distribution.Uniform();
            case NORMAL -> new Distribution.Normal(fields.get(k));
            case TRIANGULAR -> new Distribution.Triangular();
            case ARCSINE -> new Distribution.ArcSine();
            case TRAPEZOID -> new Distribution.Trapezoid(fields.get(ratio));
            case T -> new Distribution.StudentT(fields.get(degreesOfFreedom), fields.get(k));
        };
        return new StatedDistribution(fields.get(input), fields.find(part), bound);
    }

    @Override
    protected void fill(StatedDistribution value, Sheet sheet) {
        sheet.put(input, value.input());
        sheet.put(part, value.part());
        switch (value.distribution()) {
            case Distribution.Uniform _ -> sheet.put(distribution, Word.UNIFORM);
            case Distribution.Normal(double limits) -> {
                sheet.put(distribution, Word.NORMAL);
                sheet.put(k, limits);
            }
            case Distribution.Triangular _ -> sheet.put(distribution, Word.TRIANGULAR);
            case Distribution.ArcSine _ -> sheet.put(distribution, Word.ARCSINE);
            case Distribution.Trapezoid(double top) -> {
                sheet.put(distribution, Word.TRAPEZOID);
                sheet.put(ratio, top);
            }
            case Distribution.StudentT(double degrees, double limits) -> {
                sheet.put(distribution, Word.T);
                sheet.put(degreesOfFreedom, degrees);
                sheet.put(k, limits);
            }
        }
    }
}
