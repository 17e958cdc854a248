package shuntwright.io.planfile;

import java.util.List;

import shuntwright.board.Calibration;
import shuntwright.board.Sampling;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Uncertainty;

/** What was asked of distributions, trials and calibration. */
final class UncertaintyTables {

    private static final Form<StatedDistribution> STATED = ObjectTable.<StatedDistribution>named("stated distribution",
            "What is known of an input beyond its limits. Of several that suit an input the last that names its part "
                    + "counts, else the last.")
            .text("input", "which, by its `words`", StatedDistribution::input)
            .maybeText("part", "only of this part number; without it of every part", StatedDistribution::part)
            .object("distribution", DistributionTables.DISTRIBUTION, "between or around the limits",
                    StatedDistribution::distribution)
            .form();

    private static final ObjectTable<Sampling.Trials.Fixed> FIXED = ObjectTable.<Sampling.Trials.Fixed>variant(
            "fixed trials", "fixed", "A number of trials given beforehand.")
            .count("count", "of each channel", Sampling.Trials.Fixed::count);
    private static final ObjectTable<Sampling.Trials.Adaptive> ADAPTIVE = ObjectTable.<Sampling.Trials.Adaptive>variant(
            "adaptive trials", "adaptive", "Trials until the results are stable (JCGM 101:2008, 7.9).")
            .count("digits", "significant digits of the standard uncertainty that must be stable",
                    Sampling.Trials.Adaptive::digits)
            .count("most", "trials after which it ends in any case", Sampling.Trials.Adaptive::most);
    private static final Form<Sampling.Trials> TRIALS = new Form.Either<>(List.of(FIXED, ADAPTIVE),
            trials -> switch (trials) {
                case Sampling.Trials.Fixed fixed -> new Form.Chosen<>(FIXED, fixed);
                case Sampling.Trials.Adaptive adaptive -> new Form.Chosen<>(ADAPTIVE, adaptive);
            });

    static final Form<Sampling> SAMPLING = ObjectTable.<Sampling>named("sampling",
            "How distributions are propagated: the same board, seed and trials give the same digits.")
            .object("trials", TRIALS, "how many", Sampling::trials).count("seed", "of all draws", Sampling::seed)
            .form();

    static final Form<Uncertainty> UNCERTAINTY = ObjectTable.<Uncertainty>named("uncertainty",
            "What is known of the inputs beyond their limits, and how distributions are propagated.")
            .list("stated", STATED, "distributions of some inputs; all others are uniform", Uncertainty::stated)
            .object("sampling", SAMPLING, "trials asked for", Uncertainty::sampling).form();

    static final Form<Calibration> CALIBRATION = ObjectTable.<Calibration>named("calibration",
            "How a reading is calibrated at production.")
            .count("points", "currents injected: one corrects the gain, two correct gain and offset",
                    each -> switch (each.points()) {
                        case ONE -> 1;
                        case TWO -> 2;
                    })
            .maybeNumber("lower", Unit.AMPERE, "first of two points; without it a tenth of the upper",
                    Calibration::lower)
            .maybeNumber("upper", Unit.AMPERE, "only or second point; without it the load current", Calibration::upper)
            .number("uncertainty", Unit.FRACTION, "limit of the relative error of the injected current",
                    Calibration::uncertainty)
            .range("temperature", Unit.CELSIUS, "at which production calibrates", Calibration::temperature).form();

    private UncertaintyTables() {
    }
}
