package shuntwright.choice;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.parts.Comparator;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/** Why no circuit respects the limits: for each limit how many parts it excludes and the one that misses by least. */
final class Refusals {

    /** What one limit has excluded so far. */
    private static final class Tally {
        private int examined;
        private int refused;
        private String nearest = "";
        private Optional<LimitCheck> miss = Optional.empty();

        void add(String part, LimitCheck check) {
            refused++;
            if (miss.isEmpty() || relative(check) < relative(miss.get())) {
                miss = Optional.of(check);
                nearest = part;
            }
        }

        private static double relative(LimitCheck check) {
            return check.miss() / Math.max(Math.abs(check.bound()), Double.MIN_NORMAL);
        }
    }

    private final Map<Limit, Tally> tallies = new EnumMap<>(Limit.class);

    private Refusals() {
    }

    static List<ChannelChoice.Refusal> of(ChannelProblem problem, DividerTables tables) {
        Refusals refusals = new Refusals();
        List<ShuntChoice> shunts = refusals.shunts(problem);
        List<SenseAmplifier> amplifiers = refusals.amplifiers(problem);
        List<Comparator> comparators = refusals.comparators(problem);
        if (!shunts.isEmpty() && !amplifiers.isEmpty()) {
            refusals.pairs(problem, shunts, amplifiers);
        }
        if (!shunts.isEmpty() && !amplifiers.isEmpty() && !comparators.isEmpty()
                && !problem.resistors().isEmpty()) {
            refusals.thresholds(problem, tables, comparators);
        }
        return refusals.list();
    }

    private record ShuntChoice(Shunt shunt, int count) {
        double resistance() {
            return shunt.inParallel(count);
        }

        String words() {
            return count == 1 ? shunt.partNumber() : count + " × " + shunt.partNumber();
        }
    }

    private List<ShuntChoice> shunts(ChannelProblem problem) {
        Optional<String> pinned = problem.demand().channel().pins().shunt();
        List<ShuntChoice> left = new ArrayList<>();
        for (Shunt shunt : problem.catalogue().shunts()) {
            if (pinned.isPresent() && !pinned.get().equals(shunt.partNumber())) {
                continue;
            }
            for (int count : CandidateSearch.counts(problem)) {
                ShuntChoice choice = new ShuntChoice(shunt, count);
                if (take(choice.words(), LimitRules.ofShunt(shunt, count, problem.demand(), problem.around()))) {
                    left.add(choice);
                }
            }
        }
        return left;
    }

    private List<SenseAmplifier> amplifiers(ChannelProblem problem) {
        Optional<String> pinned = problem.demand().channel().pins().amplifier();
        List<SenseAmplifier> left = new ArrayList<>();
        for (SenseAmplifier amplifier : problem.catalogue().amplifiers()) {
            if (pinned.isEmpty() || pinned.get().equals(amplifier.partNumber())) {
                if (take(amplifier.partNumber(),
                        LimitRules.ofAmplifier(amplifier, problem.demand(), problem.around()))) {
                    left.add(amplifier);
                }
            }
        }
        return left;
    }

    private List<Comparator> comparators(ChannelProblem problem) {
        Optional<String> pinned = problem.demand().channel().pins().comparator();
        for (Comparator comparator : problem.catalogue().comparators()) {
            if (pinned.isEmpty() || pinned.get().equals(comparator.partNumber())) {
                take(comparator.partNumber(), LimitRules.ofComparator(comparator,
                        problem.pullUp().voltage().max(), problem.around()));
            }
        }
        return ChannelPicker.comparators(problem);
    }

    private void pairs(ChannelProblem problem, List<ShuntChoice> shunts, List<SenseAmplifier> amplifiers) {
        for (ShuntChoice shunt : shunts) {
            for (SenseAmplifier amplifier : amplifiers) {
                take(shunt.words() + " with " + amplifier.partNumber(), LimitRules.ofPair(amplifier,
                        shunt.resistance(), problem.demand(), problem.around()));
            }
        }
    }

    private void thresholds(ChannelProblem problem, DividerTables tables, List<Comparator> comparators) {
        CandidateSearch search = new CandidateSearch(problem);
        Candidates found = search.nearest(20);
        CircuitBuilder builder = new CircuitBuilder(problem, tables);
        Judge judge = new Judge(problem);
        for (int candidate = 0; candidate < found.size(); candidate++) {
            ShuntTerms shunt = search.shunt(found.shunt(candidate));
            int amplifier = found.amplifier(candidate);
            for (Comparator comparator : comparators) {
                Window window = search.window(found, candidate, comparator);
                for (var source : problem.tap().isPresent()
                        ? List.of(problem.tap().get().source())
                        : problem.sources()) {
                    for (var circuit : builder.build(shunt, search.amplifiers(), amplifier, window,
                            Optional.of(source), problem.resistors().getFirst())) {
                        take(search.amplifiers().amplifiers[amplifier].partNumber() + " with "
                                + comparator.partNumber(), judge.thresholdLimits(circuit));
                    }
                }
            }
        }
    }

    private boolean take(String part, List<LimitCheck> checks) {
        boolean holds = true;
        for (Limit limit : checks.stream().map(LimitCheck::limit).distinct().toList()) {
            tallies.computeIfAbsent(limit, _ -> new Tally()).examined++;
        }
        for (LimitCheck check : checks) {
            if (!check.holds()) {
                tallies.computeIfAbsent(check.limit(), _ -> new Tally()).add(part, check);
                holds = false;
            }
        }
        return holds;
    }

    private List<ChannelChoice.Refusal> list() {
        List<ChannelChoice.Refusal> list = new ArrayList<>();
        for (Map.Entry<Limit, Tally> entry : tallies.entrySet()) {
            Tally tally = entry.getValue();
            if (tally.refused > 0) {
                list.add(new ChannelChoice.Refusal(entry.getKey().family(), Math.max(tally.examined, tally.refused),
                        tally.refused, tally.nearest, tally.miss.orElseThrow()));
            }
        }
        return list;
    }
}
