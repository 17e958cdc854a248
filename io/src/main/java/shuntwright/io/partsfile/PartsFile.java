package shuntwright.io.partsfile;

import java.util.ArrayList;
import java.util.List;

import shuntwright.parts.CapacitorSeries;
import shuntwright.parts.Comparator;
import shuntwright.parts.Part;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/**
 * What one parts file holds.
 *
 * @param currency    ISO 4217 code of all prices
 * @param note        free text, for example where the data are from
 * @param shunts      in the order of the file, like the others
 * @param amplifiers  sense amplifiers
 * @param comparators comparators
 * @param references  voltage references
 * @param resistors   resistor series
 * @param capacitors  capacitor series
 */
public record PartsFile(String currency, String note, List<Shunt> shunts, List<SenseAmplifier> amplifiers,
        List<Comparator> comparators, List<Reference> references, List<ResistorSeries> resistors,
        List<CapacitorSeries> capacitors) {
    public PartsFile {
        shunts = List.copyOf(shunts);
        amplifiers = List.copyOf(amplifiers);
        comparators = List.copyOf(comparators);
        references = List.copyOf(references);
        resistors = List.copyOf(resistors);
        capacitors = List.copyOf(capacitors);
    }

    /** The parts sorted into a file by their kinds, otherwise in their order. */
    public static PartsFile of(String currency, String note, List<? extends Part> parts) {
        List<Shunt> shunts = new ArrayList<>();
        List<SenseAmplifier> amplifiers = new ArrayList<>();
        List<Comparator> comparators = new ArrayList<>();
        List<Reference> references = new ArrayList<>();
        List<ResistorSeries> resistors = new ArrayList<>();
        List<CapacitorSeries> capacitors = new ArrayList<>();
        for (Part part : parts) {
            switch (part) {
                case Shunt shunt -> shunts.add(shunt);
                case SenseAmplifier amplifier -> amplifiers.add(amplifier);
                case Comparator comparator -> comparators.add(comparator);
                case Reference reference -> references.add(reference);
                case ResistorSeries series -> resistors.add(series);
                case CapacitorSeries series -> capacitors.add(series);
            }
        }
        return new PartsFile(currency, note, shunts, amplifiers, comparators, references, resistors, capacitors);
    }

    /** All parts, kind after kind. */
    public List<Part> parts() {
        List<Part> all = new ArrayList<>(shunts);
        all.addAll(amplifiers);
        all.addAll(comparators);
        all.addAll(references);
        all.addAll(resistors);
        all.addAll(capacitors);
        return List.copyOf(all);
    }
}
