package shuntwright.planner.window.table;

import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.Outcome;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.Verdict;
import shuntwright.planner.window.circuit.CircuitWords;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/**
 * The computed cells of a row.
 *
 * @param verdict   empty until planned
 * @param accepted  whether the board's acceptance takes the verdict
 * @param stale     true when they belong to an earlier state of the channel, or something typed could not be taken over
 * @param first     the most serious finding; empty when there is none
 * @param shunt     "2 × 4 mΩ"
 * @param gain      of the amplifier
 * @param threshold nominal threshold voltage
 * @param trip      the drawing
 * @param reading   largest reading error at load current
 * @param heat      of the shunts
 * @param margin    smallest margin of all outcomes
 * @param chosen    parts in words
 */
record RowFigures(Optional<Verdict> verdict, boolean accepted, boolean stale, String first, Figure shunt, Figure gain,
        Figure threshold, Optional<TripDrawing> trip, Figure reading, Figure heat, Figure margin,
        Chosen chosen) {
    static final RowFigures NONE = new RowFigures(Optional.empty(), false, false, "", Figure.NONE, Figure.NONE,
            Figure.NONE, Optional.empty(), Figure.NONE, Figure.NONE, Figure.NONE, Chosen.NOTHING);

    static RowFigures of(ChannelPlan plan, boolean stale) {
        String first = plan.findings().isEmpty() ? "" : plan.findings().getFirst().text();
        return plan.solved().map(solved -> of(plan, solved, stale, first))
                .orElseGet(() -> new RowFigures(Optional.of(plan.verdict()), plan.accepted(), stale, first, Figure.NONE,
                        Figure.NONE, Figure.NONE, Optional.empty(), Figure.NONE, Figure.NONE, Figure.NONE,
                        Chosen.NOTHING));
    }

    private static RowFigures of(ChannelPlan plan, SolvedChannel solved, boolean stale, String first) {
        var circuit = solved.circuit();
        return new RowFigures(Optional.of(plan.verdict()), plan.accepted(), stale, first,
                new Figure(CircuitWords.shunt(circuit), circuit.resistance()),
                new Figure(plain(circuit.amplifier().gain()), circuit.amplifier().gain()),
                new Figure(QuantityWriter.show(solved.settings().threshold(), Dimension.VOLTAGE),
                        solved.settings().threshold()),
                Optional.of(TripDrawing.of(solved.trip())),
                solved.assessment(Outcome.READING_AT_LOAD).map(each -> reading(each, solved.demand().load()))
                        .orElse(new Figure("–", Double.NaN)),
                new Figure(QuantityWriter.show(solved.heat(), Dimension.POWER, 3), solved.heat()),
                new Figure(percent(solved.margin()), solved.margin()), Chosen.of(circuit));
    }

    private static Figure reading(Assessment reading, double load) {
        double error = Math.max(Math.abs(reading.limits().min() - load), Math.abs(reading.limits().max() - load))
                / load;
        return new Figure("±" + oneDecimal(error * 100) + " %", error);
    }

    private static String percent(double share) {
        return oneDecimal(share * 100) + " %";
    }

    private static String oneDecimal(double value) {
        return String.format(java.util.Locale.ROOT, "%.1f", value).replace('-', '−');
    }

    private static String plain(double value) {
        return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
    }
}
