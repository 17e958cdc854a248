package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

import shuntwright.board.Source;
import shuntwright.board.Zone;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Part;
import shuntwright.parts.Reference;
import shuntwright.quantity.Dimension;

/**
 * What all channels together take: supply current (packages, dividers, references with their load, alert lines all pulled
 * low), load of each reference, heat of board and zones.
 */
final class SharedBudget {

    /** Stands for the rise of a zone in thermal runaway, K. */
    static final double RUNAWAY = 1e6;

    private final BoardContext context;
    private final List<ChannelPlan> channels;
    private final List<TapPlan> taps;
    private final List<AlertPlan> alerts;

    SharedBudget(BoardContext context, List<ChannelPlan> channels, List<TapPlan> taps, List<AlertPlan> alerts) {
        this.context = context;
        this.channels = channels;
        this.taps = taps;
        this.alerts = alerts;
    }

    List<SharedUse> uses() {
        List<SharedUse> uses = new ArrayList<>();
        uses.add(new SharedUse(SharedUse.Kind.SUPPLY, "sense supply", supplyCurrent(),
                OptionalDouble.of(context.board().supply().availableCurrent()), Dimension.CURRENT));
        context.referenceParts().forEach((name, part) -> uses.add(new SharedUse(SharedUse.Kind.REFERENCE,
                "reference " + name, loadOf(name), OptionalDouble.of(part.availableCurrent()), Dimension.CURRENT)));
        uses.add(new SharedUse(SharedUse.Kind.BOARD_HEAT, "board heat", heat(""), context.board().heatLimit(),
                Dimension.POWER));
        for (Zone zone : context.board().zones()) {
            uses.add(new SharedUse(SharedUse.Kind.ZONE_HEAT, "zone " + zone.name(), heat(zone.name()),
                    zone.heatLimit(), Dimension.POWER));
        }
        ZoneHeat.rises(context.board().zones(), channels, context.board().ambient().max())
                .forEach((zone, rise) -> uses.add(new SharedUse(SharedUse.Kind.ZONE_RISE,
                        "zone " + zone + " above ambient", Math.min(rise, RUNAWAY), OptionalDouble.empty(),
                        Dimension.TEMPERATURE_DIFFERENCE)));
        return uses;
    }

    List<ReferencePlan> references() {
        List<ReferencePlan> references = new ArrayList<>();
        context.referenceParts().forEach((name, part) -> references.add(new ReferencePlan(name, part, loadOf(name))));
        return references;
    }

    private double heat(String zone) {
        return channels.stream().filter(each -> zone.isEmpty() || each.channel().zone().orElse("").equals(zone))
                .flatMap(each -> each.solved().stream()).mapToDouble(SolvedChannel::heat).sum();
    }

    private double supplyCurrent() {
        double current = packages();
        for (AlertPlan alert : alerts) {
            if (alert.line().voltage().isEmpty() && !alert.channels().isEmpty()) {
                current += alert.current();
            }
        }
        current += dividers(new Source.Supply());
        for (Map.Entry<String, Reference> each : context.referenceParts().entrySet()) {
            current += each.getValue().supplyCurrent() + loadOf(each.getKey());
        }
        return current;
    }

    private double packages() {
        Map<String, Integer> sections = new HashMap<>();
        double current = 0;
        for (ChannelPlan channel : channels) {
            if (channel.solved().isEmpty()) {
                continue;
            }
            var circuit = channel.solved().get().circuit();
            String zone = channel.channel().zone().orElse("");
            current += opens(sections, zone, circuit.amplifier(), circuit.amplifier().sections())
                    ? circuit.amplifier().supplyCurrent()
                    : 0;
            current += opens(sections, zone, circuit.comparator(), circuit.comparator().sections())
                    ? circuit.comparator().supplyCurrent()
                    : 0;
        }
        return current;
    }

    /** True when one more section of this part in this zone needs one more package. */
    private static boolean opens(Map<String, Integer> sections, String zone, Part part, int perPackage) {
        int before = sections.merge(zone + "\n" + part.partNumber(), 1, Integer::sum) - 1;
        return before % perPackage == 0;
    }

    private double loadOf(String reference) {
        return dividers(new Source.OfReference(reference));
    }

    /** Largest current of all dividers from a source, A. */
    private double dividers(Source source) {
        double current = 0;
        for (ChannelPlan channel : channels) {
            if (channel.solved().isPresent()
                    && channel.solved().get().circuit().threshold() instanceof Threshold.Divider divider
                    && divider.tap().isEmpty()) {
                current += current(divider, source);
            }
        }
        for (TapPlan tap : taps) {
            if (tap.threshold().isPresent() && tap.threshold().get() instanceof Threshold.Divider divider) {
                current += current(divider, source);
            }
        }
        return current;
    }

    private static double current(Threshold.Divider divider, Source source) {
        SourceVoltage from = divider.source();
        return from.source().equals(source) ? from.voltage().max() / (divider.top() + divider.bottom()) : 0;
    }

    static List<Finding> findings(List<SharedUse> uses) {
        List<Finding> findings = new ArrayList<>();
        for (SharedUse use : uses) {
            if (!use.holds()) {
                double limit = use.limit().orElseThrow();
                findings.add(Findings.board(key(use.kind()),
                        Findings.capital(use.name()) + ": " + show(use.used(), use.dimension()) + " of "
                                + show(limit, use.dimension()) + ", over by "
                                + show(use.used() - limit, use.dimension())
                                + ". " + advice(use.kind()),
                        List.of(new Measure("used", use.used(), use.dimension()),
                                new Measure("limit", limit, use.dimension()))));
            }
        }
        return findings;
    }

    private static String advice(SharedUse.Kind kind) {
        return switch (kind) {
            case SUPPLY -> "A stronger supply, a smaller divider current in the design rules, higher pull-ups or fewer "
                    + "channels would cure it.";
            case REFERENCE -> "A smaller divider current in the design rules, a shared tap, a second reference or a "
                    + "reference for more current would cure it.";
            case ZONE_RISE -> "";
            case BOARD_HEAT, ZONE_HEAT ->
                "Each channel alone has about the least heat it can have; a higher limit, fewer "
                        + "channels or wider windows would cure it.";
        };
    }

    private static Finding.Key key(SharedUse.Kind kind) {
        return switch (kind) {
            case SUPPLY -> Finding.Key.SUPPLY_OVERLOADED;
            case REFERENCE -> Finding.Key.REFERENCE_OVERLOADED;
            case BOARD_HEAT, ZONE_HEAT, ZONE_RISE -> Finding.Key.HEAT_OVER_LIMIT;
        };
    }
}
