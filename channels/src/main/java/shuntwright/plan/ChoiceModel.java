package shuntwright.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Demand;
import shuntwright.board.Objective;
import shuntwright.board.Source;
import shuntwright.board.Zone;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Part;
import shuntwright.parts.Purchase;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/**
 * The board as a selection: channels and taps are slots, circuits are options, part numbers are lines, packages that several channels of
 * a zone share are pools; heat, supply current and the load of references are resources.
 */
final class ChoiceModel {

    private static final int HEAT = 0;
    private static final int SUPPLY = 1;

    private final BoardContext context;
    private final Selection.Builder builder;
    private final Map<String, Integer> lines = new LinkedHashMap<>();
    private final Map<String, Integer> fixed = new HashMap<>();
    private final Map<String, Purchase> purchases = new LinkedHashMap<>();
    private final Map<String, Integer> pools = new HashMap<>();
    private final Map<String, Integer> zones = new HashMap<>();
    private final Map<String, Integer> references = new LinkedHashMap<>();
    private final List<Entry> entries = new ArrayList<>();
    private final List<TapEntry> taps;
    private final Selection selection;
    private final List<List<SenseCircuit>> menus = new ArrayList<>();

    /**
     * A channel that takes part.
     *
     * @param kind    equal for channels that have the same choices
     * @param name    of the channel
     * @param demand  of it
     * @param tap     index of the tap it uses, or -1
     * @param choices its circuits; at a tap one list for each voltage of the tap
     * @param margins of the circuits, as far as they are wanted
     */
    record Entry(Object kind, String name, Demand demand, int tap, List<List<SenseCircuit>> choices, Margins margins) {}

    /** Slack of a circuit as a share of what is allowed. */
    interface Margins {
        double of(SenseCircuit circuit, int value);
    }

    /**
     * A tap with the voltages that may be chosen.
     *
     * @param name       of the tap
     * @param thresholds at least one
     */
    record TapEntry(String name, List<Threshold> thresholds) {}

    ChoiceModel(BoardContext context, List<Entry> channels, List<TapEntry> taps) {
        this.context = context;
        this.taps = taps;
        Board board = context.board();
        builder = new Selection.Builder(board.buildQuantity(), board.preference().partNumberCost());
        entries.addAll(channels);
        fixedParts();
        channels.forEach(this::collect);
        for (TapEntry tap : taps) {
            tap.thresholds().forEach(each -> tapLines(each).forEach(number -> purchases.putIfAbsent(number,
                    context.tapResistors().getFirst().purchase())));
        }
        purchases.forEach((number, purchase) -> lines.put(number,
                builder.line(new Selection.Line(number, purchase, fixed.getOrDefault(number, 0)))));
        resources();
        taps.forEach(tap -> builder.group(tap.thresholds().size()));
        Map<Object, Integer> known = new HashMap<>();
        for (int i = 0; i < entries.size(); i++) {
            slot(i, known);
        }
        for (int tap = 0; tap < taps.size(); tap++) {
            tapSlot(tap);
        }
        selection = builder.build();
    }

    private void fixedParts() {
        context.referenceParts().values().forEach(part -> fix(part.partNumber(), part.purchase()));
        for (AlertLine line : context.board().alertLines()) {
            if (!context.onLine(line).isEmpty()) {
                context.pullUpResistors().ifPresent(
                        series -> fix(PartsList.number(series, context.pullUp(line)), series.purchase()));
            }
        }
    }

    private void fix(String number, Purchase purchase) {
        purchases.putIfAbsent(number, purchase);
        fixed.merge(number, 1, Integer::sum);
    }

    private void collect(Entry entry) {
        for (List<SenseCircuit> circuits : entry.choices()) {
            for (SenseCircuit circuit : circuits) {
                for (Part part : List.of(circuit.shunt(), circuit.amplifier(), circuit.comparator())) {
                    purchases.putIfAbsent(part.partNumber(), part.purchase());
                }
                values(circuit).keySet()
                        .forEach(number -> purchases.putIfAbsent(number, circuit.resistors().purchase()));
            }
        }
    }

    /** Resistors of a circuit's own, by part number. */
    private static Map<String, Integer> values(SenseCircuit circuit) {
        Map<String, Integer> values = new TreeMap<>();
        ResistorSeries series = circuit.resistors();
        if (circuit.threshold() instanceof Threshold.Divider divider && divider.tap().isEmpty()) {
            values.merge(PartsList.number(series, divider.top()), 1, Integer::sum);
            values.merge(PartsList.number(series, divider.bottom()), 1, Integer::sum);
        }
        switch (circuit.network()) {
            case HysteresisNetwork.None _ -> {
            }
            case HysteresisNetwork.SenseResistor(double ohm) ->
                values.merge(PartsList.number(series, ohm), 1, Integer::sum);
            case HysteresisNetwork.Feedback feedback ->
                values.merge(PartsList.number(series, feedback.resistance()), 1, Integer::sum);
        }
        return values;
    }

    private void resources() {
        Board board = context.board();
        builder.resource(new Selection.Resource("board heat", board.heatLimit(), 0));
        double supplied = 0;
        for (AlertLine line : board.alertLines()) {
            if (line.voltage().isEmpty() && !context.onLine(line).isEmpty()) {
                supplied += context.lineVoltage(line).max() / context.pullUp(line);
            }
        }
        for (Reference part : context.referenceParts().values()) {
            supplied += part.supplyCurrent();
        }
        builder.resource(new Selection.Resource("sense supply", OptionalDouble.of(board.supply().availableCurrent()),
                supplied));
        context.referenceParts().forEach((name, part) -> references.put(name, builder.resource(new Selection.Resource(
                "reference " + name, OptionalDouble.of(part.availableCurrent()), 0))));
        for (Zone zone : board.zones()) {
            int resource = builder.resource(new Selection.Resource("zone " + zone.name(), zone.heatLimit(), 0));
            zones.put(zone.name(), resource);
            if (zone.heatLimit().isPresent()) {
                builder.even(resource);
            }
        }
    }

    private int line(String number) {
        return Objects.requireNonNull(lines.get(number));
    }

    /** Slots of channels come first, in the order of the entries. */
    private void slot(int index, Map<Object, Integer> known) {
        Entry entry = entries.get(index);
        String zone = entry.demand().channel().zone().orElse("");
        Object key = List.of(entry.kind(), zone, entry.tap());
        int menu = known.computeIfAbsent(key, _ -> {
            List<Option> options = new ArrayList<>();
            List<SenseCircuit> circuits = new ArrayList<>();
            for (int value = 0; value < entry.choices().size(); value++) {
                for (SenseCircuit circuit : entry.choices().get(value)) {
                    options.add(option(entry, circuit, value, zone));
                    circuits.add(circuit);
                }
            }
            menus.add(circuits);
            return builder.menu(new Selection.Menu(options, entry.tap()));
        });
        builder.slot(new Selection.Slot(entry.name(), menu));
    }

    private Option option(Entry entry, SenseCircuit circuit, int value, String zone) {
        Map<Integer, Integer> pieces = new TreeMap<>();
        pieces.merge(line(circuit.shunt().partNumber()), circuit.shuntCount(), Integer::sum);
        values(circuit).forEach((number, count) -> pieces.merge(line(number), count, Integer::sum));
        double load = entry.demand().load();
        double heat = load * load * circuit.resistance() * entry.demand().channel().diversity();
        Map<Integer, Double> amounts = new TreeMap<>();
        amounts.put(HEAT, heat);
        if (zones.containsKey(zone)) {
            amounts.put(Objects.requireNonNull(zones.get(zone)), heat);
        }
        if (circuit.threshold() instanceof Threshold.Divider divider && divider.tap().isEmpty()) {
            draw(divider, amounts);
        }
        return new Option(pieces, List.of(pool(circuit.amplifier(), circuit.amplifier().sections(),
                circuit.amplifier().supplyCurrent(), zone),
                pool(circuit.comparator(), circuit.comparator().sections(), circuit.comparator().supplyCurrent(),
                        zone)),
                amounts, entry.margins().of(circuit, value), entry.tap() < 0 ? Option.NO_VALUE : value);
    }

    private void draw(Threshold.Divider divider, Map<Integer, Double> amounts) {
        double current = divider.source().voltage().max() / (divider.top() + divider.bottom());
        amounts.merge(SUPPLY, current, Double::sum);
        if (divider.source().source() instanceof Source.OfReference(String name) && references.containsKey(name)) {
            amounts.merge(Objects.requireNonNull(references.get(name)), current, Double::sum);
        }
    }

    private int pool(Part part, int sections, double supply, String zone) {
        return pools.computeIfAbsent(zone + "\n" + part.partNumber(),
                _ -> builder.pool(new Selection.Pool(line(part.partNumber()), sections, SUPPLY, supply)));
    }

    /** Part numbers of a tap's own resistors. */
    private List<String> tapLines(Threshold threshold) {
        return threshold instanceof Threshold.Divider divider && !context.tapResistors().isEmpty()
                ? List.of(PartsList.number(context.tapResistors().getFirst(), divider.top()),
                        PartsList.number(context.tapResistors().getFirst(), divider.bottom()))
                : List.of();
    }

    private void tapSlot(int tap) {
        List<Option> options = new ArrayList<>();
        List<Threshold> thresholds = taps.get(tap).thresholds();
        for (int value = 0; value < thresholds.size(); value++) {
            Map<Integer, Integer> pieces = new TreeMap<>();
            tapLines(thresholds.get(value)).forEach(number -> pieces.merge(line(number), 1, Integer::sum));
            Map<Integer, Double> amounts = new TreeMap<>();
            if (thresholds.get(value) instanceof Threshold.Divider divider) {
                draw(divider, amounts);
            }
            options.add(new Option(pieces, List.of(), amounts, Double.POSITIVE_INFINITY, value));
        }
        builder.slot(new Selection.Slot("tap " + taps.get(tap).name(), builder.menu(new Selection.Menu(options, tap))));
    }

    Selection selection() {
        return selection;
    }

    /** True for a channel's slot, false for a tap's. */
    boolean isChannel(int slot) {
        return slot < entries.size();
    }

    /** True for heat, false for current. */
    boolean isHeat(int resource) {
        return resource == HEAT || zones.containsValue(resource);
    }

    /** Options of all kinds of channels together. */
    int kept() {
        return menus.stream().mapToInt(List::size).sum();
    }

    List<Entry> entries() {
        return entries;
    }

    /** The circuit of an entry. */
    SenseCircuit circuit(int entry, List<Integer> choice) {
        return menus.get(selection.slots().get(entry).menu()).get(choice.get(entry));
    }

    /** The option of an entry that is this circuit; empty when it is not among them. */
    Optional<Integer> optionOf(int entry, SenseCircuit circuit) {
        int at = menus.get(selection.slots().get(entry).menu()).indexOf(circuit);
        return at < 0 ? Optional.empty() : Optional.of(at);
    }

    /** Index of the tap of that name; empty when it takes no part. */
    Optional<Integer> tap(String name) {
        for (int tap = 0; tap < taps.size(); tap++) {
            if (taps.get(tap).name().equals(name)) {
                return Optional.of(tap);
            }
        }
        return Optional.empty();
    }

    /** The threshold of a tap. */
    Threshold threshold(int tap, List<Integer> choice) {
        return taps.get(tap).thresholds().get(selection.options(entries.size() + tap)
                .get(choice.get(entries.size() + tap)).value());
    }

    Aim aim(Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> new Aim.Use(HEAT);
            case MOST_EVEN_HEAT -> new Aim.LargestShare();
            case LEAST_COST -> new Aim.Cost();
            case FEWEST_PARTS -> new Aim.Lines();
            case WIDEST_MARGIN -> new Aim.LeastMargin();
        };
    }

    /** By how much a later objective may worsen this one. */
    double slack(Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> context.board().rules().heatStep() * entries.size();
            case MOST_EVEN_HEAT, LEAST_COST, FEWEST_PARTS, WIDEST_MARGIN -> 0;
        };
    }

    /** Money a part costs more when one more channel uses it, with what is ordered now. */
    double marginal(Part part, int pieces, Map<String, Integer> ordered) {
        int there = ordered.getOrDefault(part.partNumber(), 0);
        int boards = context.board().buildQuantity();
        double before = there == 0 ? 0 : cost(part, there * (long) boards);
        double after = cost(part, (there + pieces) * (long) boards);
        double opening = there == 0 ? context.board().preference().partNumberCost() : 0;
        return (after - before + opening) / boards;
    }

    private static double cost(Part part, long needed) {
        return part.purchase().cheapestOrder((int) Math.min(Integer.MAX_VALUE, needed)).cost();
    }

}
