package shuntwright.choice;

import java.util.Optional;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Threshold;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/**
 * The search for R_t and R_F at a given R_b: with g_p = 1/(R_F + R_PU) and g = 1/R_F, the node equations
 * V₊·(g_t + g_b + g_p) = V_X·g_t + V_IO·g_p and V₋·(g_t + g_b + g) = V_X·g_t + V_OL·g.
 */
final class FeedbackSearch {

    private final HysteresisChoice.FeedbackDemand demand;
    private final double source;
    private final double io;
    private double best = Double.POSITIVE_INFINITY;
    private double top;
    private double bottom;
    private double feedback;

    FeedbackSearch(HysteresisChoice.FeedbackDemand demand) {
        this.demand = demand;
        this.source = demand.source().voltage().nominal();
        this.io = demand.pullUp().voltage().nominal();
    }

    void look(double rb) {
        Range values = demand.series().values();
        ESeries series = demand.series().series();
        if (demand.pinned().isPresent()) {
            tryTop(rb, demand.pinned().getAsDouble(), series, values);
            return;
        }
        // The hysteresis falls as R_F grows: bisect for the R_F whose exact R_t gives the wanted lower threshold.
        double low = Math.log(values.min());
        double high = Math.log(values.max());
        if (!(lower(rb, Math.exp(low)) < demand.releaseAt()) || !(lower(rb, Math.exp(high)) > demand.releaseAt())) {
            return;
        }
        for (int i = 0; i < 40; i++) {
            double middle = (low + high) / 2;
            if (lower(rb, Math.exp(middle)) < demand.releaseAt()) {
                low = middle;
            } else {
                high = middle;
            }
        }
        double rf = HysteresisChoice.below(series, Math.exp(low));
        for (int i = 0; i < 4; i++) {
            if (values.contains(rf)) {
                tryTop(rb, rf, series, values);
            }
            rf = HysteresisChoice.above(series, rf);
        }
    }

    private void tryTop(double rb, double rf, ESeries series, Range values) {
        double ideal = exactTop(rb, rf);
        if (!(ideal > values.min() && ideal < values.max())) {
            return;
        }
        double rt = HysteresisChoice.below(series, ideal);
        for (int i = 0; i < 4; i++) {
            if (values.contains(rt) && rt + rb >= demand.leastTotal() && DividerTable.TOTAL.contains(rt + rb)) {
                judge(rt, rb, rf);
            }
            rt = HysteresisChoice.above(series, rt);
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
