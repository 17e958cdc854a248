package shuntwright.plan;

import java.util.List;
import java.util.Optional;

/**
 * Something a user should know about a channel or the board.
 *
 * @param key      what kind
 * @param channel  name of the channel; empty for the board
 * @param text     one or two sentences with numbers and units
 * @param measures the numbers for machines and tables
 */
public record Finding(Key key, Optional<String> channel, String text, List<Measure> measures) {

    /** How serious. */
    public enum Severity {
        NOTE("note"), WARNING("warning"), FAULT("fault");

        private final String word;

        Severity(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /** Kinds of findings. */
    public enum Key {
        DATA_MISSING(Severity.FAULT, "data missing"),
        DEMAND_CONTRADICTS(Severity.FAULT, "contradictory demand"), NO_CHANNELS(Severity.WARNING, "no channels"),
        NOT_PINNED(Severity.FAULT, "not pinned"),
        UNKNOWN_PART(Severity.FAULT, "unknown part"),
        OUTSIDE_WINDOW(Severity.FAULT, "outside its window"),
        BY_COVERAGE_ONLY(Severity.WARNING, "inside by coverage only"),
        LIMIT_BROKEN(Severity.FAULT, "limit broken"),
        NO_FIT(Severity.FAULT, "no fit"),
        RELEASE_BELOW_LOAD(Severity.WARNING, "will not re-arm in service"),
        HYSTERESIS_VANISHES(Severity.WARNING, "hysteresis vanishes"),
        ADC_SATURATES(Severity.FAULT, "ADC saturates"),
        READING_WITHOUT_ADC(Severity.WARNING, "reading without ADC"),
        FEEDBACK_COUPLES(Severity.WARNING, "feedback couples channels"),
        TAP_CONFLICT(Severity.FAULT, "tap conflict"),
        TAP_UNUSED(Severity.NOTE, "tap unused"),
        ALERT_LEVELS(Severity.FAULT, "alert line levels"),
        SUPPLY_OVERLOADED(Severity.FAULT, "supply overloaded"),
        REFERENCE_SUPPLY(Severity.FAULT, "reference outside its supply range"),
        REFERENCE_OVERLOADED(Severity.FAULT, "reference overloaded"),
        HEAT_OVER_LIMIT(Severity.FAULT, "heat over limit"),
        THERMAL_RUNAWAY(Severity.FAULT, "thermal runaway"),
        CALIBRATION_FAILS(Severity.FAULT, "calibration fails"),
        TIME_NOT_JUDGED(Severity.NOTE, "time not judged"),
        MARGIN(Severity.NOTE, "margin"),
        PRICE_MISSING(Severity.NOTE, "price missing");

        private final Severity severity;
        private final String words;

        Key(Severity severity, String words) {
            this.severity = severity;
            this.words = words;
        }

        public Severity severity() {
            return severity;
        }

        public String words() {
            return words;
        }
    }

    public Finding {
        measures = List.copyOf(measures);
    }
}
