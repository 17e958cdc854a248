package shuntwright.planner.command;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

import shuntwright.accuracy.LimitWords;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.FamilyRefusal;
import shuntwright.plan.Finding;
import shuntwright.plan.Plan;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.Verdict;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;

/** A plan as text for people: the table of channels, then what to know, then what is shared. */
final class PlanText {
    private static final int DIGITS = 4;
    private static final String NOT_SAMPLED = "not sampled: no probabilities, and \"likely\" rests on a first look";

    private final Plan plan;
    private final boolean colour;
    private final Optional<Duration> took;
    private final List<String> lines = new ArrayList<>();

    private PlanText(Plan plan, Optional<Duration> took, boolean colour) {
        this.plan = plan;
        this.took = took;
        this.colour = colour;
    }

    /** The lines to print. */
    static List<String> of(Plan plan, boolean colour) {
        return of(plan, Optional.empty(), colour);
    }

    /** @param took to choose the parts */
    static List<String> of(Plan plan, Optional<Duration> took, boolean colour) {
        PlanText text = new PlanText(plan, took, colour);
        text.summary();
        text.choice();
        text.channels();
        text.sampled();
        text.findings();
        text.conflict();
        text.shared();
        text.lines.add("");
        text.lines.add(Cautions.LINE);
        return List.copyOf(text.lines);
    }

    private void summary() {
        long accepted = plan.channels().stream().filter(ChannelPlan::accepted).count();
        lines.add(Spelling.harmless(plan.board().name()) + ": " + accepted + " of " + plan.channels().size()
                + " channels accepted, parts "
                + String.format(Locale.ROOT, "%.2f %s", plan.costPerBoard(), plan.currency())
                + " for each board of a build of " + plan.board().buildQuantity());
        lines.addAll(plan.study().map(StudyText::board).orElse(List.of(NOT_SAMPLED)));
        lines.add("");
    }

    private void choice() {
        lines.add(ChoiceText.build(plan));
        plan.choice().ifPresent(choice -> lines.addAll(ChoiceText.of(choice, plan.currency(), took)));
        lines.add("");
    }

    private void conflict() {
        plan.choice().flatMap(BoardChoice::conflict).ifPresent(conflict -> {
            lines.add("");
            lines.addAll(ChoiceText.of(conflict));
        });
    }

    private void channels() {
        Columns table = new Columns(1);
        table.add(List.of("channel", "verdict", "trips within", "allowed", "shunt", "gain", "threshold", "heat"));
        for (ChannelPlan each : plan.channels()) {
            List<String> start = List.of(each.channel().name(), verdict(each));
            List<String> cells = each.solved().map(PlanText::solved).orElse(List.of("-", "-", "-", "-", "-", "-"));
            table.add(Stream.concat(start.stream(), cells.stream()).toList(), Paint.of(each, colour));
        }
        lines.addAll(table.lines());
    }

    private void sampled() {
        List<String> sampled = plan.study().map(StudyText::channels).orElse(List.of());
        if (!sampled.isEmpty()) {
            lines.add("");
            lines.addAll(sampled);
        }
    }

    /** The verdict's word; where acceptance does not follow from it, that too. */
    static String verdict(ChannelPlan channel) {
        String word = channel.verdict().word();
        return switch (channel.verdict()) {
            case INSIDE -> channel.accepted() ? word : word + ", not accepted";
            case LIKELY -> word + (channel.accepted() ? ", accepted" : ", not accepted");
            case OUTSIDE, NO_FIT, INCOMPLETE -> word;
        };
    }

    private static List<String> solved(SolvedChannel solved) {
        SenseCircuit circuit = solved.circuit();
        return List.of(range(solved.trip().limits()), range(solved.trip().allowed()), shunt(circuit),
                show(circuit.amplifier().gain(), Dimension.GAIN),
                show(solved.settings().threshold(), Dimension.VOLTAGE), show(solved.heat(), Dimension.POWER));
    }

    /** "2 × 50 mΩ" with the part number. */
    static String shunt(SenseCircuit circuit) {
        String count = circuit.shuntCount() > 1 ? circuit.shuntCount() + " × " : "";
        return count + show(circuit.shunt().resistance(), Dimension.RESISTANCE) + " " + circuit.shunt().partNumber();
    }

    private void findings() {
        for (ChannelPlan each : plan.channels()) {
            Columns about = new Columns(1);
            each.findings().stream().filter(PlanText::worthALine).forEach(finding -> add(about, finding));
            if (each.findings().stream().noneMatch(finding -> finding.key() == Finding.Key.NO_FIT)) {
                each.refusals().forEach(refusal -> about.add(List.of("", "refused", words(refusal))));
            }
            each.cures().forEach(cure -> about.add(List.of("", cure.cures() ? "cure" : "tried", words(cure))));
            section(each.channel().name(), about);
        }
        Columns about = new Columns(1);
        plan.findings().stream().filter(PlanText::worthALine).forEach(finding -> add(about, finding));
        section("Board", about);
        long notes = Stream.concat(plan.channels().stream().flatMap(each -> each.findings().stream()),
                plan.findings().stream()).filter(each -> !worthALine(each)).count();
        if (notes > 0) {
            lines.add("");
            lines.add(notes + (notes == 1 ? " note" : " notes") + " more with --json, in the workbook and the window");
        }
    }

    private static boolean worthALine(Finding finding) {
        return finding.key().severity() != Finding.Severity.NOTE;
    }

    private void add(Columns about, Finding finding) {
        UnaryOperator<String> paint = Paint.of(finding.key().severity(), colour);
        about.add(List.of("", finding.key().severity().word(), finding.key().words() + ": " + finding.text()), paint);
    }

    private void section(String title, Columns about) {
        List<String> body = about.lines();
        if (!body.isEmpty()) {
            lines.add("");
            lines.add(Spelling.harmless(title));
            lines.addAll(body);
        }
    }

    private static String words(FamilyRefusal refusal) {
        LimitCheck miss = refusal.nearMiss();
        Dimension dimension = miss.limit().dimension();
        return refusal.refused() + " of " + refusal.examined() + " " + miss.limit().counted() + ": "
                + miss.limit().words() + "; nearest is " + refusal.nearest() + " with "
                + show(miss.reached(), dimension)
                + ", " + (miss.atMost() ? "at most " : "at least ") + show(miss.bound(), dimension);
    }

    private static String words(Cure cure) {
        Optional<String> margin = cure.margin().map(share -> Math.round(share * 100) + " % margin");
        boolean none = cure.reached() == Verdict.NO_FIT || cure.reached() == Verdict.INCOMPLETE;
        return cure.lever().words() + ": " + cure.change() + " gives " + cure.reached().word()
                + (none ? "" : margin.map(text -> " with " + text).orElse(""));
    }

    private void shared() {
        if (plan.shared().isEmpty()) {
            return;
        }
        Columns table = new Columns(1);
        for (SharedUse each : plan.shared()) {
            String limit = each.limit().isPresent() ? "of " + show(each.limit().getAsDouble(), each.dimension()) : "";
            UnaryOperator<String> paint = Paint.of(
                    each.holds() ? Finding.Severity.NOTE : Finding.Severity.FAULT, colour);
            String state = each.holds() ? "" : "over its limit";
            table.add(List.of(each.name(), show(each.used(), each.dimension()), limit, state), paint);
        }
        lines.add("");
        lines.addAll(table.lines());
    }

    private static String show(double value, Dimension dimension) {
        return QuantityWriter.show(value, dimension, DIGITS);
    }

    private static String range(Range range) {
        return LimitWords.show(range, DIGITS);
    }
}
