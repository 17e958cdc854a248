package shuntwright.parts;

/** Something that can be bought under one part number (or, for a series, under one part number for each value). */
public sealed interface Part permits Shunt, SenseAmplifier, Comparator, Reference, ResistorSeries, CapacitorSeries {

    /** Unique within a catalogue; never empty. */
    String partNumber();

    /** Free text for the parts list. */
    String description();

    Purchase purchase();
}
