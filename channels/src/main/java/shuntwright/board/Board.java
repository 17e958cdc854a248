package shuntwright.board;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * A power distribution board whose outputs are to be protected.
 *
 * @param name          shown in titles and exports
 * @param description   free text
 * @param partsFiles    parts files to use, relative to the board file
 * @param buildQuantity boards built at once, ≥ 1; decides the price breaks
 * @param ambient       temperature of the air around the parts, °C
 * @param supply        feeds amplifiers, comparators and dividers
 * @param references    precision references on the board
 * @param adc           reads the amplifiers; empty when nothing is read
 * @param alertLines    wired lines that comparators pull low
 * @param taps          thresholds that several channels share
 * @param zones         areas of the board with a heat limit of their own
 * @param heatLimit     largest heat of all shunts together, W; empty for none
 * @param acceptance    when a channel counts as accepted
 * @param rules         design rules for every channel
 * @param uncertainty   what is known of the inputs beyond their limits, and how distributions are propagated
 * @param preference    what is wanted of all choices that serve, and how long it is looked for
 * @param channels      one for each output rail
 */
public record Board(String name, String description, List<String> partsFiles, int buildQuantity, Range ambient,
        SenseSupply supply, List<BoardReference> references, Optional<Adc> adc, List<AlertLine> alertLines,
        List<Tap> taps, List<Zone> zones, OptionalDouble heatLimit, Acceptance acceptance, DesignRules rules,
        Uncertainty uncertainty, Preference preference, List<Channel> channels) {

    /** Common practice for equipment in a housing. */
    public static final Range DEFAULT_AMBIENT = Range.of(-20, 60);

    /** @throws IllegalArgumentException unless buildQuantity ≥ 1 and the heat limit is &gt; 0 */
    public Board {
        if (buildQuantity < 1) {
            throw new IllegalArgumentException("build quantity must be at least 1, got " + buildQuantity);
        }
        if (!Finite.positive(heatLimit.orElse(1))) {
            throw new IllegalArgumentException("the board's heat limit must be > 0 W, got " + heatLimit);
        }
        partsFiles = List.copyOf(partsFiles);
        references = List.copyOf(references);
        alertLines = List.copyOf(alertLines);
        taps = List.copyOf(taps);
        zones = List.copyOf(zones);
        channels = List.copyOf(channels);
    }

    /** A board with every default and no channels. */
    public static Board named(String name) {
        return new Board(name, "", List.of(), 1, DEFAULT_AMBIENT, SenseSupply.DEFAULT, List.of(), Optional.empty(),
                List.of(), List.of(), List.of(), OptionalDouble.empty(), Acceptance.DEFAULT, DesignRules.DEFAULT,
                Uncertainty.DEFAULT, Preference.DEFAULT, List.of());
    }

    public Board withChannels(List<Channel> newChannels) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, newChannels);
    }

    public Board withName(String newName) {
        return new Board(newName, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withPartsFiles(List<String> newPartsFiles) {
        return new Board(name, description, newPartsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withBuildQuantity(int newBuildQuantity) {
        return new Board(name, description, partsFiles, newBuildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withAmbient(Range newAmbient) {
        return new Board(name, description, partsFiles, buildQuantity, newAmbient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withSupply(SenseSupply newSupply) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, newSupply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withReferences(List<BoardReference> newReferences) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, newReferences, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withAlertLines(List<AlertLine> newAlertLines) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, newAlertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withTaps(List<Tap> newTaps) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                newTaps, zones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withZones(List<Zone> newZones) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, newZones, heatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withHeatLimit(OptionalDouble newHeatLimit) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, newHeatLimit, acceptance, rules, uncertainty, preference, channels);
    }

    public Board withAcceptance(Acceptance newAcceptance) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, newAcceptance, rules, uncertainty, preference, channels);
    }

    public Board withRules(DesignRules newRules) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, newRules, uncertainty, preference, channels);
    }

    public Board withUncertainty(Uncertainty newUncertainty) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, newUncertainty, preference, channels);
    }

    public Board withPreference(Preference newPreference) {
        return new Board(name, description, partsFiles, buildQuantity, ambient, supply, references, adc, alertLines,
                taps, zones, heatLimit, acceptance, rules, uncertainty, newPreference, channels);
    }

    public Optional<Tap> tap(String wanted) {
        return taps.stream().filter(tap -> tap.name().equals(wanted)).findFirst();
    }

    public Optional<BoardReference> reference(String wanted) {
        return references.stream().filter(reference -> reference.name().equals(wanted)).findFirst();
    }

    public Optional<AlertLine> alertLine(String wanted) {
        return alertLines.stream().filter(line -> line.name().equals(wanted)).findFirst();
    }

    public Optional<Zone> zone(String wanted) {
        return zones.stream().filter(zone -> zone.name().equals(wanted)).findFirst();
    }
}
