package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.Hysteresis;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

final class HysteresisForm extends Form<Hysteresis> {
    /** The words for the four kinds. */
    private enum Word {
        INJECTED_CURRENT("injectedCurrent"), POSITIVE_FEEDBACK("positiveFeedback"), BUILT_IN("builtIn"), LATCHED(
                "latched");

        private final String text;

        Word(String text) {
            this.text = text;
        }
    }

    private final Key<Word> kind = required("kind", Kinds.choice(word -> word.text, Word.values()),
            "how release is separated from trip");
    private final Key<Toleranced> current = optional("current",
            Quantities.toleranced(Dimension.CURRENT, Bounds.POSITIVE), "needed for `injectedCurrent` only",
            "driven out of the sense input while tripped");
    private final Key<Range> builtIn = withDefault("builtIn",
            Quantities.range(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE), Range.exactly(0),
            "built-in hysteresis; none with `latched`");

    HysteresisForm() {
        super("Hysteresis");
    }

    @Override
    protected void check(Fields fields) {
        fields.find(kind).ifPresent(word -> {
            boolean injected = word == Word.INJECTED_CURRENT;
            if (injected && !fields.has(current)) {
                fields.problem(current, "the key \"current\" is missing: an injected current needs its value, for "
                        + "example \"10 µA ±5 %\"");
            }
            if (!injected && fields.has(current)) {
                fields.problem(current,
                        "only the kind \"injectedCurrent\" has a current; remove it or change \"kind\"");
            }
            if (word == Word.LATCHED && fields.has(builtIn)) {
                fields.problem(builtIn, "the kind \"latched\" has no built-in hysteresis; remove \"builtIn\"");
            }
        });
    }

    @Override
    protected Hysteresis bind(Fields fields) {
        return switch (fields.get(kind)) {
            case INJECTED_CURRENT -> new Hysteresis.InjectedCurrent(fields.get(current), fields.get(builtIn));
            case POSITIVE_FEEDBACK -> new Hysteresis.PositiveFeedback(fields.get(builtIn));
            case BUILT_IN -> new Hysteresis.BuiltIn(fields.get(builtIn));
            case LATCHED -> new Hysteresis.Latched();
        };
    }

    @Override
    protected void fill(Hysteresis value, Sheet sheet) {
        switch (value) {
            case Hysteresis.InjectedCurrent injected -> {
                sheet.put(kind, Word.INJECTED_CURRENT);
                sheet.put(current, injected.current());
            }
            case Hysteresis.PositiveFeedback _ -> sheet.put(kind, Word.POSITIVE_FEEDBACK);
            case Hysteresis.BuiltIn _ -> sheet.put(kind, Word.BUILT_IN);
            case Hysteresis.Latched _ -> sheet.put(kind, Word.LATCHED);
        }
        sheet.put(builtIn, value.builtIn());
    }
}
