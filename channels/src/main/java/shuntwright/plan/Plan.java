package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Board;
import shuntwright.sampling.BoardStudy;

/**
 * A planned board.
 *
 * @param board    what was asked
 * @param currency ISO 4217 code of all costs
 * @param channels in the board's order
 * @param shared   supply, references, heat
 * @param alerts   alert lines
 * @param taps     shared thresholds
 * @param references with their parts
 * @param parts    the consolidated parts list, by designator letter and part number
 * @param findings about the board as a whole
 * @param choice   how all channels were chosen together; empty for a board that was only checked
 * @param study    propagated distributions; empty until sampled
 */
public record Plan(Board board, String currency, List<ChannelPlan> channels, List<SharedUse> shared,
        List<AlertPlan> alerts, List<TapPlan> taps,
        List<ReferencePlan> references, List<PartUse> parts, List<Finding> findings, Optional<BoardChoice> choice,
        Optional<BoardStudy> study) {

    public Plan {
        channels = List.copyOf(channels);
        shared = List.copyOf(shared);
        alerts = List.copyOf(alerts);
        taps = List.copyOf(taps);
        references = List.copyOf(references);
        parts = List.copyOf(parts);
        findings = List.copyOf(findings);
    }

    public Optional<ChannelPlan> channel(String name) {
        return channels.stream().filter(each -> each.channel().name().equals(name)).findFirst();
    }

    Plan withChoice(BoardChoice newChoice) {
        return new Plan(board, currency, channels, shared, alerts, taps, references, parts, findings,
                Optional.of(newChoice),
                study);
    }

    /** True when every channel is accepted and no finding about the board is a fault. */
    public boolean accepted() {
        return channels.stream().allMatch(ChannelPlan::accepted)
                && findings.stream().noneMatch(each -> each.key().severity() == Finding.Severity.FAULT);
    }

    /** Cost of the parts of one board at the prices of the build quantity. */
    public double costPerBoard() {
        return parts.stream().mapToDouble(
                each -> each.quantity() * each.purchase().unitPriceAt(pieces(each))).sum();
    }

    /** Cost of the whole build: the cheapest orders for it, and the cost of each distinct part number. */
    public double buildCost() {
        double cost = parts.size() * board.preference().partNumberCost();
        for (PartUse each : parts) {
            cost += each.purchase().cheapestOrder(pieces(each)).cost();
        }
        return cost;
    }

    /** Pieces of a part that the whole build needs, at most the largest whole number. */
    private int pieces(PartUse use) {
        return (int) Math.min(Integer.MAX_VALUE, (long) use.quantity() * board.buildQuantity());
    }
}
