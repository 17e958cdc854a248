package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;

import shuntwright.choice.ChannelProblem;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;

/** What a circuit cannot even be tried without, in words. */
final class Lacks {

    private Lacks() {
    }

    static List<String> of(ChannelProblem problem) {
        List<String> lacks = new ArrayList<>();
        if (problem.catalogue().shunts().isEmpty()) {
            lacks.add("no parts file holds a shunt");
        }
        if (problem.catalogue().amplifiers().isEmpty()) {
            lacks.add("no parts file holds a sense amplifier");
        }
        if (problem.resistors().isEmpty()) {
            lacks.add("no parts file holds a resistor series of 1 % or better with values from 1 kΩ to 100 kΩ");
        }
        if (problem.tap().isEmpty() && problem.sources().isEmpty()) {
            lacks.add("the source of its threshold is not on the board, or its part is in no parts file");
        }
        comparator(problem, lacks);
        return lacks;
    }

    private static void comparator(ChannelProblem problem, List<String> lacks) {
        var pinned = problem.demand().channel().pins().comparator();
        List<Comparator> comparators = problem.catalogue().comparators().stream()
                .filter(each -> pinned.isEmpty() || pinned.get().equals(each.partNumber())).toList();
        boolean rearms = problem.demand().rearm().isPresent();
        String which = pinned.map(number -> "the pinned comparator " + number).orElse("every comparator");
        if (comparators.isEmpty()) {
            lacks.add("no parts file holds a comparator");
        } else if (comparators.stream().allMatch(each -> latches(each) == rearms)) {
            lacks.add(rearms
                    ? which + " latches, but re-arming is asked for"
                    : which + " re-arms, but latching is asked for");
        } else if (problem.tap().filter(Threshold.DacOutput.class::isInstance).isPresent()
                && comparators.stream().allMatch(each -> each.hysteresis() instanceof Hysteresis.PositiveFeedback)) {
            lacks.add(which + " needs a divider for its positive feedback, but the tap is a DAC output");
        }
    }

    private static boolean latches(Comparator comparator) {
        return comparator.hysteresis() instanceof Hysteresis.Latched;
    }
}
