package shuntwright.parts;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** All parts a board may use, with one currency for their prices; immutable. */
public final class Catalogue {

    /** A catalogue without parts. */
    public static final Catalogue EMPTY = new Catalogue("XXX", List.of());

    private final String currency;
    private final Map<String, Part> parts;
    private final List<Shunt> shunts;
    private final List<Shunt> byResistance;
    private final List<SenseAmplifier> amplifiers;
    private final List<shuntwright.parts.Comparator> comparators;
    private final List<Reference> references;
    private final List<ResistorSeries> resistors;
    private final List<CapacitorSeries> capacitors;

    private Catalogue(String currency, List<? extends Part> all) {
        this.currency = currency;
        parts = new LinkedHashMap<>();
        for (Part part : all) {
            if (parts.put(part.partNumber(), part) != null) {
                throw new IllegalArgumentException("part number " + part.partNumber() + " stands twice");
            }
        }
        shunts = only(Shunt.class);
        byResistance = shunts.stream()
                .sorted(Comparator.comparingDouble(each -> each.inParallel(1)))
                .toList();
        amplifiers = only(SenseAmplifier.class);
        comparators = only(shuntwright.parts.Comparator.class);
        references = only(Reference.class);
        resistors = only(ResistorSeries.class);
        capacitors = only(CapacitorSeries.class);
    }

    /**
     * @param currency ISO 4217 code of all prices
     * @param parts    in the order they are to be shown
     * @throws IllegalArgumentException if two parts have one part number
     */
    public static Catalogue of(String currency, List<? extends Part> parts) {
        return new Catalogue(currency, parts);
    }

    private <T extends Part> List<T> only(Class<T> kind) {
        List<T> found = new ArrayList<>();
        for (Part part : parts.values()) {
            if (kind.isInstance(part)) {
                found.add(kind.cast(part));
            }
        }
        return List.copyOf(found);
    }

    /** ISO 4217 code of all prices. */
    public String currency() {
        return currency;
    }

    public List<Part> parts() {
        return List.copyOf(parts.values());
    }

    public List<Shunt> shunts() {
        return shunts;
    }

    /** The shunts by ascending resistance with their mounting. */
    public List<Shunt> shuntsByResistance() {
        return byResistance;
    }

    public List<SenseAmplifier> amplifiers() {
        return amplifiers;
    }

    public List<shuntwright.parts.Comparator> comparators() {
        return comparators;
    }

    public List<Reference> references() {
        return references;
    }

    public List<ResistorSeries> resistors() {
        return resistors;
    }

    public List<CapacitorSeries> capacitors() {
        return capacitors;
    }

    /** The part of that kind under that number, if there is one. */
    public <T extends Part> Optional<T> find(String partNumber, Class<T> kind) {
        Part part = parts.get(partNumber);
        return kind.isInstance(part) ? Optional.of(kind.cast(part)) : Optional.empty();
    }

    /** This catalogue with a part exchanged for, or added as, {@code part}. */
    public Catalogue with(Part part) {
        List<Part> all = new ArrayList<>();
        boolean there = false;
        for (Part each : parts.values()) {
            boolean same = each.partNumber().equals(part.partNumber());
            all.add(same ? part : each);
            there |= same;
        }
        if (!there) {
            all.add(part);
        }
        return new Catalogue(currency, all);
    }
}
