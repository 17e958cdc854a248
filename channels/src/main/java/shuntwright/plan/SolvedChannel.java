package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Demand;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;

/**
 * A channel with chosen parts and everything computed of them.
 *
 * @param demand      with defaults filled in
 * @param circuit     parts and values
 * @param around      what it shares with the board, its zone's warmth included
 * @param settings    nominal figures for the bench
 * @param inputs      the one description of the uncertain inputs
 * @param assessments trip first, then release and readings where asked
 * @param uncalibrated readings as they would be without calibration; empty where nothing is calibrated
 * @param limits      every limit with its numbers
 * @param heat        I_L²·R_s times diversity, W
 * @param cost        of its own parts for one board at the build quantity's prices, in the catalogue's currency
 */
public record SolvedChannel(Demand demand, SenseCircuit circuit, Surroundings around, Settings settings,
        List<Input> inputs, List<Assessment> assessments, List<Assessment> uncalibrated, List<LimitCheck> limits,
        double heat, double cost) {

    public SolvedChannel {
        inputs = List.copyOf(inputs);
        assessments = List.copyOf(assessments);
        uncalibrated = List.copyOf(uncalibrated);
        limits = List.copyOf(limits);
    }

    public SolvedChannel withAssessments(List<Assessment> newAssessments) {
        return new SolvedChannel(demand, circuit, around, settings, inputs, newAssessments, uncalibrated, limits, heat,
                cost);
    }

    public Assessment trip() {
        return assessments.getFirst();
    }

    public Optional<Assessment> assessment(Outcome outcome) {
        return assessments.stream().filter(each -> each.outcome() == outcome).findFirst();
    }

    /** The smallest margin of all outcomes, a share of the allowed half-width. */
    public double margin() {
        return assessments.stream().mapToDouble(Assessment::margin).min().orElseThrow();
    }

    /** The outcome with the smallest margin. */
    public Assessment tightest() {
        return assessments.stream().min(java.util.Comparator.comparingDouble(Assessment::margin)).orElseThrow();
    }
}
