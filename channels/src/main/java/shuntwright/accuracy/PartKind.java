package shuntwright.accuracy;

import shuntwright.parts.Comparator;
import shuntwright.parts.Part;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/** Kinds of parts whose inputs are told apart by part number. */
public enum PartKind {
    SHUNT("shunt", Shunt.class), AMPLIFIER("amplifier", SenseAmplifier.class), COMPARATOR("comparator",
            Comparator.class),
    RESISTORS("resistor series", ResistorSeries.class);

    private final String words;
    private final Class<? extends Part> type;

    PartKind(String words, Class<? extends Part> type) {
        this.words = words;
        this.type = type;
    }

    public String words() {
        return words;
    }

    public Class<? extends Part> type() {
        return type;
    }
}
