package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.ChannelProblem;
import shuntwright.choice.PullUp;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/** A board with its names resolved: what the shared things mean for each channel. */
final class BoardContext {

    /** Pull-up assumed where neither user nor program has chosen one yet, Ω (common practice). */
    static final double DEFAULT_PULL_UP = 10e3;
    /** A resistor series serves dividers when it is at least this accurate, a fraction. */
    private static final double DIVIDER_CLASS = 0.0101;
    private static final Range DIVIDER_VALUES = Range.of(1e3, 100e3);

    private final Board board;
    private final Catalogue catalogue;
    private final Map<String, SourceVoltage> references = new LinkedHashMap<>();
    private final Map<String, Reference> parts = new LinkedHashMap<>();
    private final List<Finding> findings = new ArrayList<>();
    private final Surroundings around;
    private final List<ResistorSeries> resistors;
    private final Map<String, Double> pullUps;
    private final Map<String, Double> rises;

    /**
     * @param pullUps chosen pull-up of each alert line, Ω; lines without an entry take what the board gives or a default
     * @param rises   largest rise of each zone above ambient, K; zones without an entry stay at ambient
     */
    BoardContext(Board board, Catalogue catalogue, Map<String, Double> pullUps, Map<String, Double> rises) {
        this.board = board;
        this.catalogue = catalogue;
        this.pullUps = Map.copyOf(pullUps);
        this.rises = Map.copyOf(rises);
        for (BoardReference reference : board.references()) {
            Optional<Reference> part = catalogue.find(reference.part(), Reference.class);
            if (part.isPresent()) {
                parts.put(reference.name(), part.get());
                references.put(reference.name(), voltage(reference, part.get()));
                fed(reference, part.get());
            } else {
                findings.add(Findings.board(Finding.Key.UNKNOWN_PART, "Reference \"" + reference.name()
                        + "\" names the part \"" + reference.part() + "\", which no parts file holds. Choose one of "
                        + names(catalogue.references()) + ", or add the parts file that holds it.", List.of()));
            }
        }
        findings.addAll(StatedParts.unknown(board, catalogue));
        this.around = new Surroundings(board.ambient(), board.supply().voltage(), board.rules(),
                board.adc().flatMap(adc -> source(adc.source())
                        .map(voltage -> new Surroundings.Converter(adc, voltage))),
                board.uncertainty().stated(), Optional.empty());
        this.resistors = resistors();
    }

    /** Says so where the sense supply, at both ends of its tolerance, does not feed a reference. */
    private void fed(BoardReference reference, Reference part) {
        Range supply = board.supply().voltage().range();
        if (!part.supply().contains(supply)) {
            findings.add(Findings.board(Finding.Key.REFERENCE_SUPPLY, "Reference \"" + reference.name() + "\", part "
                    + part.partNumber() + ", needs a supply of " + show(part.supply(), Dimension.VOLTAGE, 4)
                    + ", but the sense supply is " + show(supply, Dimension.VOLTAGE, 4)
                    + ". Its voltage is not assured. Choose another part, or change the supply.",
                    List.of(new Measure("supply least", supply.min(), Dimension.VOLTAGE),
                            new Measure("supply most", supply.max(), Dimension.VOLTAGE),
                            new Measure("needed least", part.supply().min(), Dimension.VOLTAGE),
                            new Measure("needed most", part.supply().max(), Dimension.VOLTAGE))));
        }
    }

    private static String names(List<Reference> references) {
        return references.isEmpty()
                ? "none (no parts file holds a reference)"
                : String.join(", ", references.stream().map(Reference::partNumber).toList());
    }

    /** The load regulation is taken at the full available current, so that no channel depends on its neighbours' load. */
    private static SourceVoltage voltage(BoardReference reference, Reference part) {
        return new SourceVoltage(new Source.OfReference(reference.name()), part.voltage(), part.drift(), part.ageing(),
                part.loadRegulation() * part.availableCurrent());
    }

    private List<ResistorSeries> resistors() {
        Optional<ResistorSeries> ruled = board.rules().resistors()
                .flatMap(number -> catalogue.find(number, ResistorSeries.class));
        if (ruled.isPresent()) {
            return List.of(ruled.get());
        }
        if (board.rules().resistors().isPresent()) {
            findings.add(Findings.board(Finding.Key.UNKNOWN_PART, "The design rules name the resistor series \""
                    + board.rules().resistors().get() + "\", which no parts file holds.", List.of()));
        }
        return catalogue.resistors().stream()
                .filter(each -> each.tolerance() <= DIVIDER_CLASS && each.values().contains(DIVIDER_VALUES))
                .sorted(Comparator
                        .comparingDouble((ResistorSeries each) -> each.purchase().unitPriceAt(board.buildQuantity()))
                        .thenComparingDouble(ResistorSeries::tolerance))
                .toList();
    }

    /** The same with another board. */
    BoardContext with(Board other) {
        return new BoardContext(other, catalogue, pullUps, rises);
    }

    Board board() {
        return board;
    }

    Catalogue catalogue() {
        return catalogue;
    }

    Surroundings around() {
        return around;
    }

    /** What a channel shares, its zone's warmth included. */
    private Surroundings around(Channel channel) {
        double rise = channel.zone().map(zone -> rises.getOrDefault(zone, 0.0)).orElse(0.0);
        return rise > 0
                ? around.withZone(Optional.of(new Surroundings.ZoneRise(channel.zone().orElseThrow(), rise)))
                : around;
    }

    /** The same board with other rises of its zones. */
    BoardContext withRises(Map<String, Double> newRises) {
        return new BoardContext(board, catalogue, pullUps, newRises);
    }

    Map<String, Double> rises() {
        return rises;
    }

    List<Finding> findings() {
        return findings;
    }

    Map<String, Reference> referenceParts() {
        return parts;
    }

    Optional<SourceVoltage> source(Source source) {
        return switch (source) {
            case Source.Supply _ -> Optional.of(supply());
            case Source.OfReference(String name) -> Optional.ofNullable(references.get(name));
        };
    }

    private SourceVoltage supply() {
        return new SourceVoltage(new Source.Supply(), board.supply().voltage(), 0, 0, 0);
    }

    /** Sources an own divider of this channel may start from. */
    List<SourceVoltage> sources(Channel channel) {
        return switch (channel.threshold()) {
            case ThresholdDemand.Free _ -> {
                List<SourceVoltage> all = new ArrayList<>(references.values());
                all.add(supply());
                yield all;
            }
            case ThresholdDemand.OwnDivider(Source source) -> source(source).map(List::of).orElse(List.of());
            case ThresholdDemand.SharedTap(String tap) -> board.tap(tap).flatMap(each -> source(each.source()))
                    .map(List::of).orElse(List.of());
        };
    }

    /** The series for a tap's divider: the most accurate one. */
    List<ResistorSeries> tapResistors() {
        return resistors.stream().min(Comparator.comparingDouble(ResistorSeries::tolerance)).map(List::of)
                .orElse(List.of());
    }

    /** The series for pull-ups: the cheapest. */
    Optional<ResistorSeries> pullUpResistors() {
        return resistors.stream().findFirst();
    }

    Optional<AlertLine> line(Channel channel) {
        return channel.alertLine().isPresent()
                ? channel.alertLine().flatMap(board::alertLine)
                : board.alertLines().stream().findFirst();
    }

    List<Channel> onLine(AlertLine line) {
        return board.channels().stream().filter(each -> line(each).filter(line::equals).isPresent()).toList();
    }

    PullUp pullUp(Channel channel) {
        Optional<AlertLine> line = line(channel);
        Toleranced voltage = line.flatMap(AlertLine::voltage).orElse(board.supply().voltage());
        boolean supplied = line.flatMap(AlertLine::voltage).isEmpty();
        double resistance = line.map(this::pullUp).orElse(DEFAULT_PULL_UP);
        boolean shared = line.map(each -> onLine(each).size() > 1).orElse(false);
        return new PullUp(resistance, voltage, supplied, shared);
    }

    double pullUp(AlertLine line) {
        return line.pullUp().orElse(pullUps.getOrDefault(line.name(), DEFAULT_PULL_UP));
    }

    /** The pull-up that was settled before this pass, Ω. */
    OptionalDouble settledPullUp(AlertLine line) {
        Double settled = pullUps.get(line.name());
        return settled == null ? OptionalDouble.empty() : OptionalDouble.of(settled);
    }

    /** The voltage a line is pulled up to. */
    Toleranced lineVoltage(AlertLine line) {
        return line.voltage().orElse(board.supply().voltage());
    }

    /** The problem of one channel; the tap's threshold where it uses one that is settled. */
    ChannelProblem problem(Demand demand, Optional<Threshold> tap) {
        Channel channel = demand.channel();
        List<SourceVoltage> sources = tap.isPresent() ? List.of() : sources(channel);
        Optional<ResistorSeries> pinned = channel.pins().resistors()
                .flatMap(number -> catalogue.find(number, ResistorSeries.class));
        boolean onTap = channel.threshold() instanceof ThresholdDemand.SharedTap;
        List<ResistorSeries> series = onTap ? tapResistors() : pinned.map(List::of).orElse(resistors);
        return new ChannelProblem(demand, around(channel), catalogue, sources, tap, series, pullUp(channel),
                board.acceptance(), board.buildQuantity());
    }

}
