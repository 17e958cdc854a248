package shuntwright.choice;

import java.util.Arrays;
import java.util.Optional;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Threshold;

/**
 * The search for R_t and R_F at a given R_b: with g_p = 1/(R_F + R_PU) and g = 1/R_F, the node equations
 * V₊·(g_t + g_b + g_p) = V_X·g_t + V_IO·g_p and V₋·(g_t + g_b + g) = V_X·g_t + V_OL·g.
 */
final class FeedbackSearch {

    private final FeedbackDemand demand;
    private final double source;
    private final double io;
    private double best = Double.POSITIVE_INFINITY;
    private double top;
    private double bottom;
    private double feedback;

    FeedbackSearch(FeedbackDemand demand) {
        this.demand = demand;
        this.source = demand.source().voltage().nominal();
        this.io = demand.pullUp().voltage().nominal();
    }

    void look(double rb) {
        double[] values = demand.values();
        if (demand.pinned().isPresent()) {
            tryTop(rb, demand.pinned().getAsDouble(), values);
            return;
        }
        // The hysteresis falls as R_F grows: bisect for the R_F whose exact R_t gives the wanted lower threshold.
        double[] feedbacks = demand.feedbacks();
        int low = 0;
        int high = feedbacks.length;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (lower(rb, feedbacks[middle]) < demand.releaseAt()) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        for (int at = Math.max(0, low - 2); at < Math.min(feedbacks.length, low + 2); at++) {
            tryTop(rb, feedbacks[at], values);
        }
    }

    private void tryTop(double rb, double rf, double[] values) {
        double ideal = exactTop(rb, rf);
        if (!(ideal > 0)) {
            return;
        }
        int found = Arrays.binarySearch(values, ideal);
        int from = found < 0 ? -found - 1 : found;
        for (int at = Math.max(0, from - 2); at < Math.min(values.length, from + 2); at++) {
            double rt = values[at];
            if (rt + rb >= demand.leastTotal() && DividerTable.TOTAL.contains(rt + rb)) {
                judge(rt, rb, rf);
            }
        }
    }

    private void judge(double rt, double rb, double rf) {
        double upper = node(rt, rb, rf + demand.pullUp().resistance(), io);
        double lower = node(rt, rb, rf, demand.outputLow());
        double gap = demand.tripAt() - demand.releaseAt();
        double miss = Math.max(Math.abs(upper - demand.tripAt()), Math.abs(lower - demand.releaseAt()) * 0.5) / gap;
        if (miss < best) {
            best = miss;
            top = rt;
            bottom = rb;
            feedback = rf;
        }
    }

    /** R_t that gives exactly the wanted upper threshold; not positive when there is none. */
    private double exactTop(double rb, double rf) {
        double gp = 1 / (rf + demand.pullUp().resistance());
        double current = demand.tripAt() / rb + (demand.tripAt() - io) * gp;
        return (source - demand.tripAt()) / current;
    }

    private double lower(double rb, double rf) {
        double rt = exactTop(rb, rf);
        return rt > 0 ? node(rt, rb, rf, demand.outputLow()) : Double.NEGATIVE_INFINITY;
    }

    private double node(double rt, double rb, double branch, double far) {
        return (source / rt + far / branch) / (1 / rt + 1 / rb + 1 / branch);
    }

    Optional<HysteresisChoice.Feedback> best() {
        if (!(best < Double.POSITIVE_INFINITY)) {
            return Optional.empty();
        }
        PullUp pull = demand.pullUp();
        return Optional.of(new HysteresisChoice.Feedback(new Threshold.Divider(demand.source(), top, bottom, "", 1),
                new HysteresisNetwork.Feedback(feedback, pull.resistance(), pull.voltage(), pull.supplied())));
    }
}
