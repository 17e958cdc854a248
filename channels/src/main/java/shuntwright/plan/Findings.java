package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.LimitWords;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Channel;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.parts.Part;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

/** Words and numbers for what a plan has found. */
final class Findings {

    private static final Dimension AMPERE = Dimension.CURRENT;

    private Findings() {
    }

    static Finding board(Finding.Key key, String text, List<Measure> measures) {
        return new Finding(key, Optional.empty(), text, measures);
    }

    static Finding channel(Finding.Key key, Channel channel, String text, Measure... measures) {
        return new Finding(key, Optional.of(channel.name()), text, List.of(measures));
    }

    /** Most serious first. */
    static List<Finding> sorted(List<Finding> findings) {
        return findings.stream()
                .sorted(Comparator.comparing((Finding each) -> each.key().severity()).reversed()).toList();
    }

    /** What there is to say about a solved channel. */
    static List<Finding> of(SolvedChannel solved, Verdict verdict, boolean coupled) {
        Channel channel = solved.demand().channel();
        List<Finding> findings = new ArrayList<>();
        for (LimitCheck check : solved.limits()) {
            if (!check.holds()) {
                findings.add(broken(channel, check));
            }
        }
        findings.addAll(outside(solved, verdict));
        runaway(solved, findings);
        release(solved, findings);
        if (coupled && solved.circuit().network() instanceof HysteresisNetwork.Feedback) {
            findings.add(channel(Finding.Key.FEEDBACK_COUPLES, channel,
                    "Its positive feedback acts on a shared tap or alert line: one trip moves the thresholds of all "
                            + "other channels there. Give it a threshold and line of its own, or another comparator."));
        }
        time(channel, findings);
        missingPrices(solved, findings);
        if (verdict == Verdict.INSIDE) {
            findings.add(margin(channel, solved.tightest()));
        }
        return findings;
    }

    /** The outcomes that are not inside by limits. */
    static List<Finding> outside(SolvedChannel solved, Verdict verdict) {
        return solved.assessments().stream().filter(each -> !each.insideByLimits())
                .map(each -> outside(solved.demand().channel(), each, verdict)).toList();
    }

    private static Finding broken(Channel channel, LimitCheck check) {
        Dimension dimension = check.limit().dimension();
        Finding.Key key = check.limit() == Limit.ADC_FULL_SCALE ? Finding.Key.ADC_SATURATES : Finding.Key.LIMIT_BROKEN;
        return channel(key, channel,
                "Limit broken: " + check.limit().words() + ". Reached " + show(check.reached(), dimension)
                        + ", allowed " + (check.atMost() ? "at most " : "at least ")
                        + show(check.bound(), dimension) + ".",
                new Measure("reached", check.reached(), dimension), new Measure("allowed", check.bound(), dimension));
    }

    private static Finding outside(Channel channel, Assessment each, Verdict verdict) {
        Range reached = each.limits();
        Range allowed = each.allowed();
        double low = allowed.min() - reached.min();
        double high = reached.max() - allowed.max();
        List<String> misses = new ArrayList<>();
        if (low > 0 && !LimitWords.none(low)) {
            misses.add("too low by " + show(low, AMPERE));
        }
        if (high > 0 && !LimitWords.none(high)) {
            misses.add("too high by " + show(high, AMPERE));
        }
        boolean likely = verdict == Verdict.LIKELY;
        String text = capital(each.outcome().words()) + ": by limits " + LimitWords.show(reached, 4) + ", allowed "
                + show(allowed, AMPERE, 4) + (misses.isEmpty() ? "" : "; " + String.join(" and ", misses)) + "."
                + (LimitWords.none(reached.max()) ? "" : " " + largest(each))
                + (likely
                        ? " The coverage interval " + show(each.coverage(), AMPERE, 4) + " is within."
                        : "");
        return channel(likely ? Finding.Key.BY_COVERAGE_ONLY : Finding.Key.OUTSIDE_WINDOW, channel, text,
                new Measure("reached least", reached.min(), AMPERE),
                new Measure("reached most", reached.max(), AMPERE),
                new Measure("allowed least", allowed.min(), AMPERE),
                new Measure("allowed most", allowed.max(), AMPERE),
                new Measure("misses by", Math.max(low, high), AMPERE));
    }

    private static String largest(Assessment each) {
        if (each.budget().isEmpty()) {
            return "";
        }
        BudgetLine line = each.budget().getFirst();
        return "Largest contributor: " + line.input().label() + " with " + show(line.widest(), AMPERE, 3) + " ("
                + show(line.widest() / each.nominal(), Dimension.RATIO, 2) + ").";
    }

    private static Finding margin(Channel channel, Assessment tightest) {
        return channel(Finding.Key.MARGIN, channel,
                "Tightest: " + tightest.outcome().words() + ", " + show(tightest.limits(), AMPERE, 4)
                        + " by limits within " + show(tightest.allowed(), AMPERE, 4) + ", margin "
                        + show(tightest.margin(), Dimension.RATIO, 2) + " of the allowed half-width. "
                        + largest(tightest),
                new Measure("margin", tightest.margin(), Dimension.RATIO));
    }

    /** Says why an outcome has no limits. */
    private static void runaway(SolvedChannel solved, List<Finding> findings) {
        Channel channel = solved.demand().channel();
        for (Assessment each : solved.assessments()) {
            String what = Findings.capital(each.outcome().words()) + ": by limits ";
            if (each.limits().max() < ChannelAccuracy.BEYOND) {
                continue;
            }
            if (each.limits().min() <= -ChannelAccuracy.BEYOND) {
                findings.add(channel(Finding.Key.CALIBRATION_FAILS, channel, what
                        + "the errors at the calibration currents "
                        + "may outweigh the signal, so that nothing can be calibrated. Calibrate at a larger current, or at "
                        + "two that lie further apart."));
                continue;
            }
            findings.add(channel(Finding.Key.THERMAL_RUNAWAY, channel, what + switch (each.outcome()) {
                case TRIP, RELEASE ->
                    "the resistance of the shunts falls with their own heat so far that their voltage never "
                            + "reaches the threshold: it may never trip. ";
                case READING_AT_LEAST, READING_AT_LOAD ->
                    "the shunts run away thermally at this current: their resistance "
                            + "rises faster with their own heat than they can give that heat away. ";
            } + "Shunts of lower thermal resistance, less resistance or smaller temperature coefficient would cure it."));
        }
    }

    private static void release(SolvedChannel solved, List<Finding> findings) {
        Optional<Assessment> release = solved.assessment(Outcome.RELEASE);
        if (release.isEmpty()) {
            return;
        }
        Channel channel = solved.demand().channel();
        Range reached = release.get().limits();
        if (reached.min() <= solved.demand().load()) {
            findings.add(channel(Finding.Key.RELEASE_BELOW_LOAD, channel,
                    "The release current can be as low as " + show(reached.min(), AMPERE)
                            + ", at or below the load current of " + show(solved.demand().load(), AMPERE)
                            + ": after a trip it may never re-arm in service.",
                    new Measure("release least", reached.min(), AMPERE),
                    new Measure("load", solved.demand().load(), AMPERE)));
        }
        Range trip = solved.trip().limits();
        if (reached.max() >= trip.min()) {
            findings.add(channel(Finding.Key.HYSTERESIS_VANISHES, channel,
                    "By limits the release current reaches " + show(reached.max(), AMPERE)
                            + " while the trip current may be as low as " + show(trip.min(), AMPERE)
                            + "; the intervals overlap. One part draws both errors alike, so this is a bound, not yet a "
                            + "fault of every board; more hysteresis removes the doubt.",
                    new Measure("release most", reached.max(), AMPERE),
                    new Measure("trip least", trip.min(), AMPERE)));
        }
    }

    private static void time(Channel channel, List<Finding> findings) {
        if (!channel.stress().inrush().isEmpty() || channel.stress().withstand().isPresent()) {
            findings.add(channel(Finding.Key.TIME_NOT_JUDGED, channel,
                    "Inrush and withstand are kept with the channel, but this version does not judge response times: "
                            + "verify on the bench that it rides the inrush and opens in time."));
        }
    }

    private static void missingPrices(SolvedChannel solved, List<Finding> findings) {
        List<Part> parts = List.of(solved.circuit().shunt(), solved.circuit().amplifier(),
                solved.circuit().comparator());
        List<String> without = parts.stream().filter(part -> part.purchase().prices().isEmpty())
                .map(Part::partNumber).toList();
        if (!without.isEmpty()) {
            findings.add(channel(Finding.Key.PRICE_MISSING, solved.demand().channel(),
                    "No price is known for " + String.join(", ", without) + "; costs count them as 0."));
        }
    }

    static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
