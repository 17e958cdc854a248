package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.DesignRules;
import shuntwright.board.Pins;
import shuntwright.board.SenseSupply;
import shuntwright.board.Tap;
import shuntwright.board.Uncertainty;
import shuntwright.board.Zone;
import shuntwright.choice.TrialParts;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.Part;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** A catalogue with round numbers, and boards made of it piece by piece. */
final class TrialBoards {

    static final Catalogue CATALOGUE = catalogue();

    private TrialBoards() {
    }

    private static Catalogue catalogue() {
        List<Part> parts = new ArrayList<>();
        for (double milliohm : new double[]{0.5, 1, 2, 5, 10, 20, 50, 100}) {
            parts.add(TrialParts.shunt("R" + milliohm, milliohm / 1e3, 0.005));
        }
        parts.add(TrialParts.shunt("COARSE", 0.002, 0.05));
        for (double gain : new double[]{20, 50, 100}) {
            parts.add(TrialParts.amplifier("A" + (int) gain, gain, 0.002, 50e-6));
        }
        parts.add(TrialParts.amplifier("ROUGH", 50, 0.03, 500e-6));
        parts.add(TrialParts.comparator("CI", TrialParts.injected(), Range.of(-10e-9, 10e-9), 2));
        parts.add(TrialParts.comparator("CF", new Hysteresis.PositiveFeedback(Range.exactly(0))));
        parts.add(TrialParts.comparator("CL", new Hysteresis.Latched()));
        parts.add(TrialParts.reference("REF25", 2.5, 0.001));
        parts.add(TrialParts.reference("REF25X", 2.5, 0.01));
        parts.add(TrialParts.series("RES", ESeries.E96, 0.001));
        return Catalogue.of("EUR", parts);
    }

    static Channel channel(String name, double load, double noTrip, double mustTrip) {
        return Channel.named(name).withRail(Optional.of(new Spread(11, 12, 13)))
                .withCurrents(new Channel.Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip),
                        OptionalDouble.of(mustTrip), OptionalDouble.empty(), OptionalDouble.empty(),
                        OptionalDouble.empty()));
    }

    static Channel channel(String name, double load) {
        return channel(name, load, load * 1.5, load * 2);
    }

    static Channel inZone(Channel c, String zone) {
        return new Channel(c.name(), c.note(), c.rail(), c.side(), c.currents(), c.release(), c.reading(),
                c.threshold(), c.alertLine(), Optional.of(zone), c.diversity(), c.stress(), c.pins());
    }

    static Channel onLine(Channel c, String line) {
        return new Channel(c.name(), c.note(), c.rail(), c.side(), c.currents(), c.release(), c.reading(),
                c.threshold(), Optional.of(line), c.zone(), c.diversity(), c.stress(), c.pins());
    }

    static Pins pins(Optional<String> shunt, Optional<String> amplifier, Optional<String> comparator) {
        return new Pins(shunt, OptionalInt.empty(), amplifier, comparator, Optional.empty(), OptionalDouble.empty(),
                OptionalDouble.empty(), OptionalDouble.empty());
    }

    /** 3.3 V ±2 %, reference "quiet" of 2.5 V, no ADC. */
    static Board board(Channel... channels) {
        return withReferences(Board.named("trial"), new BoardReference("quiet", "REF25"))
                .withChannels(List.of(channels));
    }

    static Board withReferences(Board b, BoardReference... references) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                List.of(references), b.adc(), b.alertLines(), b.taps(), b.zones(), b.heatLimit(), b.acceptance(),
                b.rules(), Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withAdc(Board b, Adc adc) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                b.references(), Optional.of(adc), b.alertLines(), b.taps(), b.zones(), b.heatLimit(), b.acceptance(),
                b.rules(), Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withTaps(Board b, Tap... taps) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                b.references(), b.adc(), b.alertLines(), List.of(taps), b.zones(), b.heatLimit(), b.acceptance(),
                b.rules(), Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withLines(Board b, AlertLine... lines) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                b.references(), b.adc(), List.of(lines), b.taps(), b.zones(), b.heatLimit(), b.acceptance(),
                b.rules(), Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withZones(Board b, OptionalDouble heatLimit, Zone... zones) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                b.references(), b.adc(), b.alertLines(), b.taps(), List.of(zones), heatLimit, b.acceptance(),
                b.rules(), Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withSupply(Board b, double volt, double tolerance, double ampere) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(),
                new SenseSupply(new Toleranced(volt, Tolerance.symmetric(tolerance)), ampere), b.references(), b.adc(),
                b.alertLines(), b.taps(), b.zones(), b.heatLimit(), b.acceptance(), b.rules(), Uncertainty.DEFAULT,
                b.preference(),
                b.channels());
    }

    static Board withRules(Board b, DesignRules rules, int buildQuantity) {
        return new Board(b.name(), b.description(), b.partsFiles(), buildQuantity, b.ambient(), b.supply(),
                b.references(), b.adc(), b.alertLines(), b.taps(), b.zones(), b.heatLimit(), b.acceptance(), rules,
                Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Board withAcceptance(Board b, Acceptance acceptance) {
        return new Board(b.name(), b.description(), b.partsFiles(), b.buildQuantity(), b.ambient(), b.supply(),
                b.references(), b.adc(), b.alertLines(), b.taps(), b.zones(), b.heatLimit(), acceptance, b.rules(),
                Uncertainty.DEFAULT, b.preference(), b.channels());
    }

    static Plan plan(Board board) {
        return new BoardPlanner().plan(board, CATALOGUE, Progress.SILENT);
    }

    static ChannelPlan only(Plan plan) {
        return plan.channels().getFirst();
    }
}
