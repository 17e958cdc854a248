package shuntwright.choice;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import shuntwright.circuit.SenseCircuit;

/** Makes menus of channels; remembers which circuits it judged, so that a wider menu, or one at other prices, judges only what is new. */
public final class MenuMaker {

    private static final double SAME = 1e-9;

    /** Circuits looked at for each band and prices, at most so many times as many as are taken. */
    private static final int LOOKED = 4;
    /** Circuits of one band and prices with the same shunts, or the same amplifier, at most. */
    private static final int ALIKE = 3;

    private final DividerTables tables;
    private final Map<ChannelProblem, Known> known = new HashMap<>();
    private final Map<ChannelProblem, Map<Judge.Read, Double>> outside = new HashMap<>();

    public MenuMaker(DividerTables tables) {
        this.tables = tables;
    }

    /** Judgements of one problem. */
    private record Known(Judge judge, Map<SenseCircuit, Boolean> accepted) {}

    /** Problems that are remembered. */
    public int size() {
        return known.size();
    }

    public void forget() {
        known.clear();
        outside.clear();
    }

    private Known known(ChannelProblem problem) {
        return known.computeIfAbsent(problem, key -> new Known(
                new Judge(key, outside.computeIfAbsent(key.atAmbient(), _ -> new HashMap<>())), new HashMap<>()));
    }

    /** The menu; depends on nothing but its arguments. */
    public ChannelMenu menu(ChannelProblem problem, ChannelMenu.Breadth breadth, List<Prices> prices) {
        return new Maker(problem, known(problem), tables, breadth, prices).make();
    }

    private static final class Maker {
        private final CandidateSearch search;
        private final ChannelMenu.Breadth breadth;
        private final List<Prices> prices;
        private final List<Completions> completions = new ArrayList<>();
        private final Candidates found = new Candidates();
        private final Known known;
        private final double step;
        private final Set<SenseCircuit> circuits = new LinkedHashSet<>();

        Maker(ChannelProblem problem, Known known, DividerTables tables, ChannelMenu.Breadth breadth,
                List<Prices> prices) {
            this.search = new CandidateSearch(problem);
            this.breadth = breadth;
            this.prices = prices;
            this.known = known;
            this.step = problem.around().rules().heatStep();
            List<shuntwright.parts.Comparator> comparators = ChannelPicker.comparators(problem);
            for (Prices each : prices) {
                completions.add(new Completions(problem, search, found, comparators, tables, each));
            }
        }

        ChannelMenu make() {
            Candidates all = search.promising();
            int from = 0;
            // The least heat first, however few circuits have it.
            while (from < search.shunts() && circuits.isEmpty()) {
                int to = to(from, search.shunt(from).heat);
                band(from, to);
                from = to;
            }
            if (!circuits.isEmpty() && from < search.shunts()) {
                double least = search.shunt(from - 1).heat;
                double edge = least + step;
                for (int band = 0; band < breadth.bands() && from < search.shunts(); band++) {
                    int to = to(from, edge);
                    band(from, to);
                    from = to;
                    edge = Math.max(edge * breadth.ratio(), from < search.shunts() ? search.shunt(from).heat : 0);
                }
            }
            return new ChannelMenu(new ArrayList<>(circuits), all.size());
        }

        private int to(int from, double heat) {
            int to = from;
            while (to < search.shunts() && search.shunt(to).heat <= heat * (1 + SAME)) {
                to++;
            }
            return to;
        }

        private void band(int from, int to) {
            found.clear();
            search.promising(from, to, found);
            if (found.size() == 0) {
                return;
            }
            for (int i = 0; i < prices.size(); i++) {
                taken(completions.get(i));
            }
        }

        private void taken(Completions completion) {
            Map<Object, Integer> alike = new HashMap<>();
            int count = 0;
            int looked = 0;
            Completions.CheapestFirst options = completion.cheapestFirst();
            while (count < breadth.perBand() && looked < LOOKED * breadth.perBand() && options.hasNext()) {
                Completions.Option option = options.next();
                int shunt = found.shunt(option.candidate());
                int amplifier = found.amplifier(option.candidate());
                List<Object> parts = List.of("shunts " + shunt, "amplifier " + amplifier);
                List<Object> set = List.of(shunt, amplifier, option.comparator().partNumber());
                if (alike.containsKey(set) || parts.stream().anyMatch(each -> alike.getOrDefault(each, 0) >= ALIKE)) {
                    continue;
                }
                looked++;
                for (SenseCircuit circuit : completion.build(option)) {
                    if (known.accepted().computeIfAbsent(circuit, known.judge()::accepts)) {
                        circuits.add(circuit);
                        count++;
                        parts.forEach(each -> alike.merge(each, 1, Integer::sum));
                        alike.put(set, 1);
                        break;
                    }
                }
            }
        }
    }
}
