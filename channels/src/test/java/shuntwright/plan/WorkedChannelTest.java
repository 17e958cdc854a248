package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.TrialParts;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.parts.Part;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.parts.Terminals;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;

/** Reads docs/worked-channel.md: its arithmetic, and its results against the plan's. */
class WorkedChannelTest {

    private static final Pattern LINE = Pattern.compile(
            "(?<label>[^:]+): (?:(?<sum>[^=]+) = )?(?<value>-?[0-9.]+) (?<unit>\\S+)(?: <- (?<key>\\S+))?");

    private static final Map<String, Double> UNITS = Map.ofEntries(Map.entry("V", 1.0), Map.entry("mV", 1e-3),
            Map.entry("µV", 1e-6), Map.entry("µV/K", 1e-6), Map.entry("A", 1.0), Map.entry("mA", 1e-3),
            Map.entry("µA", 1e-6), Map.entry("mΩ", 1e-3), Map.entry("kΩ", 1e3), Map.entry("W", 1.0),
            Map.entry("K/W", 1.0), Map.entry("°C", 1.0), Map.entry("%", 1e-2), Map.entry("ppm/K", 1e-6),
            Map.entry("V/V", 1.0), Map.entry("dB", 1.0), Map.entry("1", 1.0));

    private static Plan plan() {
        Shunt shunt = new Shunt("R1", "", 1e-3, Tolerance.symmetric(0.01), 50e-6, 0, 0, Terminals.FOUR,
                Range.exactly(0), 0, new ShuntRating(5, 70, 170, 20, OptionalDouble.empty()), TrialParts.price(1));
        SenseAmplifier amplifier = new SenseAmplifier("A50", "", 50, 0.002, 10e-6,
                0, new InputErrors(50e-6, 0.5e-6, 100, 12, 80, 3.3, 0),
                new AmplifierRanges(Range.of(0, 30), 0.1, 10, Range.of(2.7, 5.5), 0.2, 0.02), 100e3, 1e6, 1e-3, 1,
                TrialParts.price(2));
        Catalogue catalogue = Catalogue.of("EUR",
                List.<Part>of(shunt, amplifier, TrialParts.comparator("CI", TrialParts.injected()),
                        TrialParts.reference("REF25", 2.5, 0.001), TrialParts.series("RES", ESeries.E24, 0.001)));
        Pins pins = new Pins(Optional.of("R1"), OptionalInt.of(1), Optional.of("A50"), Optional.of("CI"),
                Optional.of("RES"), OptionalDouble.of(10e3), OptionalDouble.of(24e3), OptionalDouble.of(5.1e3));
        Channel channel = TrialBoards.channel("worked", 20, 30, 42).withRail(Optional.of(new Spread(10, 12, 14)))
                .withThreshold(new ThresholdDemand.OwnDivider(new Source.OfReference("quiet"))).withPins(pins);
        Board board = TrialBoards.withReferences(Board.named("worked"), new BoardReference("quiet", "REF25"))
                .withChannels(List.of(channel));
        return new BoardPlanner().check(board, catalogue, Progress.SILENT);
    }

    /** Everything the text may quote, SI. */
    private static Map<String, Double> results(Plan plan) {
        Map<String, Double> all = new LinkedHashMap<>();
        SolvedChannel solved = TrialBoards.only(plan).solved().orElseThrow();
        inputs(plan.board(), solved, all);
        all.put("threshold", solved.settings().threshold());
        all.put("threshold.least", solved.settings().thresholdLimits().min());
        all.put("threshold.most", solved.settings().thresholdLimits().max());
        all.put("release.voltage", solved.settings().releaseVoltage().orElseThrow());
        all.put("trip.shunt", solved.settings().tripShunt());
        all.put("output.load", solved.settings().outputAtLoad());
        all.put("heat", solved.heat());
        for (LimitCheck check : solved.limits()) {
            all.putIfAbsent("limit." + check.limit() + ".reached", check.reached());
            all.putIfAbsent("limit." + check.limit() + ".bound", check.bound());
        }
        outcome("trip", solved.trip(), all);
        outcome("release", solved.assessment(Outcome.RELEASE).orElseThrow(), all);
        for (BudgetLine line : solved.trip().budget()) {
            all.put("low." + line.input().slot(), -line.towardsLow());
            all.put("u." + line.input().slot(), line.standard());
        }
        for (SharedUse use : plan.shared()) {
            switch (use.kind()) {
                case SUPPLY -> all.put("supply.current", use.used());
                case REFERENCE -> all.put("reference.current", use.used());
                case BOARD_HEAT, ZONE_HEAT, ZONE_RISE -> {
                }
            }
        }
        return all;
    }

    private static void outcome(String name, Assessment each, Map<String, Double> all) {
        all.put(name + ".nominal", each.nominal());
        all.put(name + ".least", each.limits().min());
        all.put(name + ".most", each.limits().max());
        all.put(name + ".standard", each.combined().standard());
        all.put(name + ".expanded", each.combined().expanded());
        all.put(name + ".from", each.combined().interval().min());
        all.put(name + ".to", each.combined().interval().max());
        all.put(name + ".margin", each.margin());
    }

    private static void inputs(Board board, SolvedChannel solved, Map<String, Double> all) {
        SenseCircuit circuit = solved.circuit();
        all.put("in.rail.least", solved.demand().commonMode().min());
        all.put("in.rail", solved.demand().commonMode().nominal());
        all.put("in.rail.most", solved.demand().commonMode().max());
        all.put("in.load", solved.demand().load());
        all.put("in.no-trip", solved.demand().tripWindow().min());
        all.put("in.must-trip", solved.demand().tripWindow().max());
        all.put("in.ambient.least", board.ambient().min());
        all.put("in.ambient.most", board.ambient().max());
        all.put("in.supply", board.supply().voltage().nominal());
        all.put("in.supply.tolerance", board.supply().voltage().tolerance().widest());
        all.put("in.shunt", circuit.shunt().resistance());
        all.put("in.shunt.tolerance", circuit.shunt().tolerance().widest());
        all.put("in.shunt.drift", circuit.shunt().temperatureCoefficient());
        all.put("in.shunt.power", circuit.shunt().rating().power());
        all.put("in.shunt.thermal", circuit.shunt().rating().thermalResistance());
        all.put("in.gain", circuit.amplifier().gain());
        all.put("in.gain.error", circuit.amplifier().gainError());
        all.put("in.gain.drift", circuit.amplifier().gainDrift());
        all.put("in.offset", circuit.amplifier().input().offset());
        all.put("in.offset.drift", circuit.amplifier().input().offsetDrift());
        all.put("in.common-mode", circuit.amplifier().input().rejection());
        all.put("in.supply-rejection", circuit.amplifier().input().supplyRejection());
        Threshold.Divider divider = (Threshold.Divider) circuit.threshold();
        all.put("in.reference", divider.source().voltage().nominal());
        all.put("in.reference.tolerance", divider.source().voltage().tolerance().widest());
        all.put("in.reference.drift", divider.source().drift());
        all.put("in.top", divider.top());
        all.put("in.bottom", divider.bottom());
        all.put("in.resistors.tolerance", circuit.resistors().tolerance());
        all.put("in.resistors.drift", circuit.resistors().temperatureCoefficient());
        all.put("in.comparator.offset", circuit.comparator().inputs().offset());
        Hysteresis.InjectedCurrent injected = (Hysteresis.InjectedCurrent) circuit.comparator().hysteresis();
        all.put("in.injected", injected.current().nominal());
        all.put("in.injected.tolerance", injected.current().tolerance().widest());
        all.put("in.hysteresis", ((HysteresisNetwork.SenseResistor) circuit.network()).resistance());
    }

    private static List<String> lines() throws IOException {
        List<String> lines = new ArrayList<>();
        boolean within = false;
        for (String line : Files.readAllLines(Path.of(System.getProperty("shuntwright.root"), "docs",
                "worked-channel.md"))) {
            if (line.startsWith("```")) {
                within = !within;
            } else if (within) {
                lines.add(line);
            }
        }
        return lines;
    }

    @Test
    void everyNumberIsRight() throws IOException {
        Map<String, Double> results = results(plan());
        TreeSet<String> left = new TreeSet<>(results.keySet());
        List<String> wrong = new ArrayList<>();
        int sums = 0;
        for (String line : lines()) {
            Matcher matcher = LINE.matcher(line);
            assertThat(matcher.matches()).as("can be read: " + line).isTrue();
            BigDecimal printed = new BigDecimal(matcher.group("value"));
            if (matcher.group("sum") != null) {
                compare(line, "worked out", Arithmetic.evaluate(matcher.group("sum")), printed, wrong);
                sums++;
            }
            String key = matcher.group("key");
            if (key != null) {
                compare(line, "by the program", number(results, key) / number(UNITS, matcher.group("unit")), printed,
                        wrong);
                left.remove(key);
            }
        }
        assertThat(wrong).isEmpty();
        assertThat(sums).isGreaterThan(60);
        assertThat(left).as("inputs, contributions and outcomes that the text leaves out")
                .noneMatch(each -> each.startsWith("in.")
                        || (each.startsWith("low.") && number(results, each) != 0)
                        || each.matches("(trip|release)\\.(nominal|least|most)"));
    }

    private static double number(Map<String, Double> of, String key) {
        Double value = of.get(key);
        if (value == null) {
            throw new AssertionError("the text names \"" + key + "\", known are " + of.keySet());
        }
        return value;
    }

    private static void compare(String line, String how, double value, BigDecimal printed, List<String> wrong) {
        if (!(Math.abs(value - printed.doubleValue()) <= 0.501 * printed.ulp().doubleValue())) {
            wrong.add(line + ": " + how + " " + value);
        }
    }

    @Test
    void theChannelIsInside() {
        Plan plan = plan();
        assertThat(TrialBoards.only(plan).verdict()).isEqualTo(Verdict.INSIDE);
        assertThat(plan.accepted()).isTrue();
    }
}
