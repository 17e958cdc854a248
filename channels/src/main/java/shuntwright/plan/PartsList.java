package shuntwright.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Part;
import shuntwright.parts.Purchase;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/**
 * The consolidated parts list: designators by IEEE 315 class letters (R resistors and shunts, U integrated circuits), in
 * the order of the channels; amplifiers and comparators with several sections are shared by the channels of a zone.
 */
final class PartsList {

    /** One line as it grows. */
    private static final class Line {
        private final String description;
        private final Purchase purchase;
        private final List<String> designators = new ArrayList<>();
        private final List<String> users = new ArrayList<>();

        Line(String description, Purchase purchase) {
            this.description = description;
            this.purchase = purchase;
        }
    }

    /** A package with free sections. */
    private static final class Housing {
        private final Line line;
        private final int at;
        private int free;

        Housing(Line line, int at, int free) {
            this.line = line;
            this.at = at;
            this.free = free;
        }
    }

    private final Map<String, Line> lines = new LinkedHashMap<>();
    private final Map<String, Integer> numbers = new HashMap<>();
    private final Map<String, Housing> open = new HashMap<>();

    private PartsList() {
    }

    static List<PartUse> of(List<ChannelPlan> channels, Map<String, Reference> references,
            List<TapPlan> taps, List<AlertPlan> alerts, List<ResistorSeries> tapResistors,
            Optional<ResistorSeries> pullUpResistors) {
        PartsList list = new PartsList();
        for (ChannelPlan channel : channels) {
            channel.solved().ifPresent(solved -> list.channel(channel, solved.circuit()));
        }
        references.forEach((name, part) -> list.add("U", part.partNumber(), part.description(), part.purchase(),
                "reference " + name));
        for (TapPlan tap : taps) {
            if (tap.threshold().isPresent() && tap.threshold().get() instanceof Threshold.Divider divider
                    && !tapResistors.isEmpty()) {
                list.resistor(tapResistors.getFirst(), divider.top(), "tap " + tap.tap().name());
                list.resistor(tapResistors.getFirst(), divider.bottom(), "tap " + tap.tap().name());
            }
        }
        for (AlertPlan alert : alerts) {
            if (!alert.channels().isEmpty()) {
                pullUpResistors.ifPresent(series -> list.resistor(series, alert.pullUp(),
                        "alert line " + alert.line().name()));
            }
        }
        return list.uses();
    }

    private void channel(ChannelPlan plan, SenseCircuit circuit) {
        String user = plan.channel().name();
        String zone = plan.channel().zone().orElse("");
        Shunt shunt = circuit.shunt();
        for (int i = 0; i < circuit.shuntCount(); i++) {
            add("R", shunt.partNumber(), shunt.description(), shunt.purchase(), user);
        }
        section(circuit.amplifier(), circuit.amplifier().sections(), zone, user);
        section(circuit.comparator(), circuit.comparator().sections(), zone, user);
        if (circuit.threshold() instanceof Threshold.Divider divider && divider.tap().isEmpty()) {
            resistor(circuit.resistors(), divider.top(), user);
            resistor(circuit.resistors(), divider.bottom(), user);
        }
        switch (circuit.network()) {
            case HysteresisNetwork.None _ -> {
            }
            case HysteresisNetwork.SenseResistor(double ohm) -> resistor(circuit.resistors(), ohm, user);
            case HysteresisNetwork.Feedback feedback -> resistor(circuit.resistors(), feedback.resistance(), user);
        }
    }

    private void section(Part part, int sections, String zone, String user) {
        String key = zone + "\n" + part.partNumber();
        Housing there = open.get(key);
        if (there != null && there.free > 0) {
            there.free--;
            there.line.users.set(there.at, there.line.users.get(there.at) + ", " + user);
            return;
        }
        Line line = add("U", part.partNumber(), part.description(), part.purchase(), user);
        open.put(key, new Housing(line, line.users.size() - 1, sections - 1));
    }

    private void resistor(ResistorSeries series, double ohm, String user) {
        String value = QuantityWriter.show(ohm, Dimension.RESISTANCE, 4);
        add("R", number(series, ohm),
                "resistor " + value + ", " + series.description(), series.purchase(), user);
    }

    /** Part number of one value of a series. */
    static String number(ResistorSeries series, double ohm) {
        return series.partNumber() + "-" + QuantityWriter.letterCode(ohm);
    }

    private Line add(String letter, String number, String description, Purchase purchase, String user) {
        Line line = lines.computeIfAbsent(number, _ -> new Line(description, purchase));
        line.designators.add(letter + numbers.merge(letter, 1, Integer::sum));
        line.users.add(user);
        return line;
    }

    private List<PartUse> uses() {
        List<PartUse> uses = new ArrayList<>();
        lines.forEach((number, line) -> uses.add(new PartUse(number, line.description, line.designators.size(),
                line.designators, line.users, line.purchase)));
        uses.sort(Comparator.comparingInt((PartUse use) -> use.designators().getFirst().charAt(0))
                .thenComparing(PartUse::partNumber));
        return uses;
    }
}
