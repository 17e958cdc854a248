package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

import shuntwright.circuit.SenseCircuit;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** Other circuits of a channel as text: what is chosen now, then a line for each other. */
final class OthersText {
    private static final int NOT_PAINTED = -1;

    private OthersText() {
    }

    static List<String> of(Question.Answered<List<OtherChoice>> answered, String channel) {
        Plan now = answered.plan();
        List<String> lines = new ArrayList<>();
        lines.add(Spelling.harmless(now.board().name()) + ": other choices for " + Spelling.harmless(channel)
                + ", the whole board chosen again around each, " + ChoiceText.words(answered.took()));
        lines.add("");
        List<Reached> own = now.choice().map(BoardChoice::reached).orElse(List.of());
        List<Reached> wanted = own.isEmpty() && !answered.answer().isEmpty()
                ? answered.answer().getFirst().board()
                : own;
        Columns table = new Columns(NOT_PAINTED);
        table.add(Stream.of(List.of("", "shunt", "amplifier", "comparator", "verdict", "margin"),
                wanted.stream().flatMap(each -> Stream.of(each.objective().word(), "from bound")).toList(),
                List.of("whole build", "part numbers", "limits broken")).flatMap(List::stream).toList());
        now.channel(channel).ifPresent(plan -> table.add(row("now", plan, own, now,
                List.of(ChoiceWords.money(now.buildCost(), now.currency()), Integer.toString(now.parts().size()),
                        broken(now.choice().map(BoardChoice::broken).orElse(List.of()))))));
        int number = 0;
        for (OtherChoice each : answered.answer()) {
            table.add(row(Integer.toString(++number), each.channel(), each.board(), now,
                    List.of(ChoiceWords.money(each.cost(), now.currency()), Integer.toString(each.parts()),
                            broken(each.broken()))));
        }
        lines.addAll(table.lines());
        lines.add("");
        if (answered.answer().isEmpty()) {
            lines.add("No other circuit of the catalogue serves this channel.");
        } else {
            lines.add(
                    "From bound: nothing is better by more with that circuit; \"within step\" of the board's heat step, within");
            lines.add(
                    "which heats count as equal; \"open\" where nothing is known. Nothing here is sampled: pin a choice in");
            lines.add("the board file and plan it to see its probabilities.");
        }
        lines.add("");
        lines.add(Cautions.LINE);
        return List.copyOf(lines);
    }

    private static List<String> row(String name, ChannelPlan plan, List<Reached> reached, Plan now, List<String> sums) {
        List<String> row = new ArrayList<>(List.of(name));
        row.addAll(plan.solved().map(solved -> circuit(solved.circuit())).orElse(List.of("-", "-", "-")));
        row.add(PlanText.verdict(plan));
        row.add(plan.solved().map(solved -> percent(solved.margin())).orElse("-"));
        for (Reached each : reached) {
            row.add(ChoiceWords.value(each.objective(), each.value(), now.currency()));
            row.add(ChoiceWords.distance(each));
        }
        row.addAll(sums);
        return row;
    }

    private static List<String> circuit(SenseCircuit circuit) {
        return List.of(PlanText.shunt(circuit), circuit.amplifier().partNumber(), circuit.comparator().partNumber());
    }

    private static String percent(double share) {
        return Double.isFinite(share) ? QuantityWriter.show(share, Dimension.RATIO, 3) : "-";
    }

    private static String broken(List<String> limits) {
        return limits.isEmpty() ? "none" : String.join(", ", limits);
    }
}
