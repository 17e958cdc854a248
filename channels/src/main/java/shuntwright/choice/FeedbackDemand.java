package shuntwright.choice;

import java.util.OptionalDouble;

import shuntwright.circuit.SourceVoltage;

/** What a feedback network must do, and the values it may be made of; a plain carrier between builder and search. */
final class FeedbackDemand {

    private final SourceVoltage source;
    private final Levels levels;
    private final PullUp pullUp;
    private final Values values;

    /**
     * @param tripAt    wanted threshold while not tripped, V
     * @param releaseAt wanted threshold while tripped, V
     * @param outputLow output voltage while tripped, V
     */
    record Levels(double tripAt, double releaseAt, double outputLow) {}

    /** Resistances that may be used, ascending, Ω. */
    static final class Values {
        private final double[] dividers;
        private final double[] bottoms;
        private final double[] feedbacks;
        private final double leastTotal;
        private final OptionalDouble pinned;

        /**
         * @param dividers   for R_t
         * @param bottoms    for R_b
         * @param feedbacks  for R_F
         * @param leastTotal smallest R_t + R_b
         * @param pinned     R_F where the user fixed it
         */
        Values(double[] dividers, double[] bottoms, double[] feedbacks, double leastTotal, OptionalDouble pinned) {
            this.dividers = dividers;
            this.bottoms = bottoms;
            this.feedbacks = feedbacks;
            this.leastTotal = leastTotal;
            this.pinned = pinned;
        }
    }

    FeedbackDemand(SourceVoltage source, Levels levels, PullUp pullUp, Values values) {
        this.source = source;
        this.levels = levels;
        this.pullUp = pullUp;
        this.values = values;
    }

    SourceVoltage source() {
        return source;
    }

    double tripAt() {
        return levels.tripAt();
    }

    double releaseAt() {
        return levels.releaseAt();
    }

    double outputLow() {
        return levels.outputLow();
    }

    PullUp pullUp() {
        return pullUp;
    }

    double[] values() {
        return values.dividers;
    }

    double[] bottoms() {
        return values.bottoms;
    }

    double[] feedbacks() {
        return values.feedbacks;
    }

    double leastTotal() {
        return values.leastTotal;
    }

    OptionalDouble pinned() {
        return values.pinned;
    }
}
