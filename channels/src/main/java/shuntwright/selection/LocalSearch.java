package shuntwright.selection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.random.RandomGenerator;

/**
 * Improves a state: each slot takes its best option given all others, until none finds a better one; then a kick (a line closed or
 * opened, a group at another value, a few slots at random) and the same again among the slots it touched. Repeats exactly for a
 * generator and a number of rounds.
 */
final class LocalSearch {

    /** Slots tried after a kick besides those it touched. */
    private static final int BYSTANDERS = 6;
    /** All slots are tried again every so many rounds. */
    private static final int SWEEP = 40;
    /** A round may leave the state worse by this share at the start, by nothing at the end. */
    private static final double PATIENCE = 0.004;
    /** One of so many rounds may leave it worse by any amount, for so many rounds at most. */
    private static final int EXCURSION = 16;
    private static final int LONGEST_EXCURSION = 10;
    /** Passes after which a descent ends, converged or not. */
    private static final int MOST_PASSES = 60;

    private final Selection selection;
    private final State state;
    private final Goal goal;
    private final RandomGenerator random;
    private final double[] now;
    private final double[] trial;
    private final double[] best;
    private int[] bestChoice;
    /** Rounds since the state was last as good as patience asks. */
    private int away;
    private final List<Integer> closable;
    private final int[][] members;

    LocalSearch(Selection selection, State state, Goal goal, RandomGenerator random) {
        this.selection = selection;
        this.state = state;
        this.goal = goal;
        this.random = random;
        now = new double[goal.size()];
        trial = new double[goal.size()];
        best = new double[goal.size()];
        closable = new ArrayList<>();
        for (int line = 0; line < selection.lines().size(); line++) {
            if (selection.lines().get(line).fixed() == 0) {
                closable.add(line);
            }
        }
        members = new int[selection.groups().size()][];
        for (int group = 0; group < members.length; group++) {
            int wanted = group;
            members[group] = java.util.stream.IntStream.range(0, state.choice.length)
                    .filter(slot -> selection.menu(slot).group() == wanted).toArray();
        }
        goal.score(state, now);
        goal.score(state, best);
        bestChoice = state.choice.clone();
    }

    /** True when limits and caps hold at the best. */
    boolean holds() {
        return best[0] == 0;
    }

    /** Value of the first aim at the best. */
    double value() {
        return best[1];
    }

    int[] best() {
        return bestChoice.clone();
    }

    /** Each slot its best option until none finds a better one. */
    void descend() {
        descend(allSlots());
        keep();
    }

    private int[] allSlots() {
        int[] slots = new int[state.choice.length];
        Arrays.setAll(slots, i -> i);
        return slots;
    }

    private void descend(int[] slots) {
        boolean better = true;
        for (int pass = 0; better && pass < MOST_PASSES; pass++) {
            better = false;
            shuffle(slots);
            for (int slot : slots) {
                better |= improve(slot);
            }
            if (pass == 0 || !better) {
                for (int group = 0; group < members.length; group++) {
                    better |= touches(slots, group) && improveGroup(group);
                }
            }
        }
    }

    private boolean touches(int[] slots, int group) {
        for (int slot : slots) {
            if (selection.menu(slot).group() == group) {
                return true;
            }
        }
        return false;
    }

    private void shuffle(int[] slots) {
        for (int i = slots.length - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            int kept = slots[i];
            slots[i] = slots[j];
            slots[j] = kept;
        }
    }

    /** The best option of a slot given all others; true when that is a better one than it had. */
    private boolean improve(int slot) {
        int before = state.choice[slot];
        int chosen = bestOption(slot, -1, -1);
        state.set(slot, chosen);
        goal.score(state, now);
        return chosen != before;
    }

    /**
     * The best option; that which the slot has when none is better.
     *
     * @param without line it must not use, or -1
     * @param with    line it must use, or -1
     */
    private int bestOption(int slot, int without, int with) {
        Option[] options = state.options(slot);
        int group = selection.menu(slot).group();
        int needed = group < 0 ? Option.NO_VALUE : state.value[group];
        int before = state.choice[slot];
        boolean free = without < 0 && with < 0;
        int chosen = free ? before : -1;
        boolean any = false;
        double[] least = new double[goal.size()];
        if (free) {
            goal.score(state, least);
            any = true;
        }
        for (int option = 0; option < options.length; option++) {
            if (options[option].value != needed || (free && option == before)
                    || (without >= 0 && uses(options[option], without))
                    || (with >= 0 && !uses(options[option], with))) {
                continue;
            }
            state.set(slot, option);
            goal.score(state, trial);
            if (!any || Goal.compare(trial, least) < 0) {
                System.arraycopy(trial, 0, least, 0, least.length);
                chosen = option;
                any = true;
            }
        }
        state.set(slot, before);
        return any ? chosen : before;
    }

    private boolean uses(Option option, int line) {
        for (int each : option.lines) {
            if (each == line) {
                return true;
            }
        }
        for (int pool : option.pools) {
            if (selection.pools().get(pool).line() == line) {
                return true;
            }
        }
        return false;
    }

    /** The best value of a group, each member with its best option there; true when that is a better one. */
    private boolean improveGroup(int group) {
        int before = state.value[group];
        int[] choices = choices(group);
        double[] least = new double[goal.size()];
        goal.score(state, least);
        int chosen = before;
        int[] chosenOptions = choices;
        for (int value = 0; value < selection.groups().get(group); value++) {
            if (value != before && move(group, value)) {
                goal.score(state, trial);
                if (Goal.compare(trial, least) < 0) {
                    System.arraycopy(trial, 0, least, 0, least.length);
                    chosen = value;
                    chosenOptions = choices(group);
                }
            }
        }
        put(group, chosen, chosenOptions);
        goal.score(state, now);
        return chosen != before;
    }

    private int[] choices(int group) {
        return Arrays.stream(members[group]).map(slot -> state.choice[slot]).toArray();
    }

    private void put(int group, int value, int[] choices) {
        state.value[group] = value;
        for (int i = 0; i < choices.length; i++) {
            state.set(members[group][i], choices[i]);
        }
    }

    /** Moves a group to a value; false, with nothing changed, when a member has no option there. */
    private boolean move(int group, int value) {
        int before = state.value[group];
        int[] choices = choices(group);
        state.value[group] = value;
        for (int slot : members[group]) {
            Option[] options = state.options(slot);
            int first = -1;
            for (int option = 0; option < options.length && first < 0; option++) {
                first = options[option].value == value ? option : -1;
            }
            if (first < 0) {
                put(group, before, choices);
                return false;
            }
            state.set(slot, first);
            state.set(slot, bestOption(slot, -1, -1));
        }
        return true;
    }

    /**
     * Rounds of kicks, some of a total; the state is left as it is for the next ones.
     *
     * @return rounds run, fewer when the watch ended them
     */
    int rounds(int from, int to, int total, Watch watch) {
        int run = 0;
        while (from + run < to && !watch.ended() && state.choice.length > 0) {
            round(from + run, PATIENCE * (1 - (from + run) / (double) total));
            run++;
        }
        return run;
    }

    /** Takes up the best again. */
    void finish() {
        state.restore(bestChoice);
        state.refresh();
        goal.score(state, now);
    }

    private void round(int number, double patience) {
        int[] before = state.choice.clone();
        double[] score = now.clone();
        int[] touched = kick();
        descend(number % SWEEP == SWEEP - 1 ? allSlots() : withBystanders(touched));
        goal.score(state, now);
        if (Goal.compare(now, best) < 0) {
            keep();
            away = 0;
        } else if (!worse(patience)) {
            away = 0;
        } else if (away == 0 ? random.nextInt(EXCURSION) > 0 : Goal.compare(now, score) > 0) {
            state.restore(before);
            goal.score(state, now);
        }
        away = worse(patience) ? away + 1 : 0;
        if (away > LONGEST_EXCURSION) {
            state.restore(bestChoice);
            goal.score(state, now);
            away = 0;
        }
        if (number % SWEEP == SWEEP - 1) {
            state.refresh();
        }
    }

    /** True when the state is so much worse than the best that it is given up. */
    private boolean worse(double patience) {
        if (now[0] > best[0]) {
            return true;
        }
        return now.length > 1 && now[1] - best[1] > patience * Math.abs(best[1]);
    }

    private void keep() {
        if (Goal.compare(now, best) < 0) {
            System.arraycopy(now, 0, best, 0, now.length);
            bestChoice = state.choice.clone();
        }
    }

    private int[] withBystanders(int[] touched) {
        int[] slots = Arrays.copyOf(touched, touched.length + BYSTANDERS);
        for (int i = touched.length; i < slots.length; i++) {
            slots[i] = random.nextInt(state.choice.length);
        }
        return Arrays.stream(slots).distinct().toArray();
    }

    /** Changes something at random; the slots that were touched. */
    private int[] kick() {
        int kind = random.nextInt(members.length > 0 ? 10 : 9);
        if (kind < 4) {
            return close();
        }
        if (kind < 6) {
            return open();
        }
        if (kind < 9) {
            return scatter();
        }
        int group = random.nextInt(members.length);
        move(group, random.nextInt(selection.groups().get(group)));
        return members[group].clone();
    }

    /** All users of a line go without it. */
    private int[] close() {
        List<Integer> there = closable.stream().filter(line -> state.quantity(line) > 0).toList();
        if (there.isEmpty()) {
            return scatter();
        }
        int line = there.get(random.nextInt(there.size()));
        List<Integer> touched = new ArrayList<>();
        for (int slot = 0; slot < state.choice.length; slot++) {
            if (uses(state.option(slot), line)) {
                state.set(slot, bestOption(slot, line, -1));
                touched.add(slot);
            }
        }
        return touched.stream().mapToInt(Integer::intValue).toArray();
    }

    /** A line of some slot's options is used by all who can, or by about half of them. */
    private int[] open() {
        int from = random.nextInt(state.choice.length);
        Option option = state.options(from)[random.nextInt(state.options(from).length)];
        int[] lines = linesOf(option);
        if (lines.length == 0) {
            return scatter();
        }
        int line = lines[random.nextInt(lines.length)];
        boolean half = random.nextBoolean();
        List<Integer> touched = new ArrayList<>();
        for (int slot = 0; slot < state.choice.length; slot++) {
            if (!uses(state.option(slot), line) && (!half || random.nextBoolean())) {
                int chosen = bestOption(slot, -1, line);
                if (chosen != state.choice[slot]) {
                    state.set(slot, chosen);
                    touched.add(slot);
                }
            }
        }
        return touched.stream().mapToInt(Integer::intValue).toArray();
    }

    private int[] linesOf(Option option) {
        int[] lines = Arrays.copyOf(option.lines, option.lines.length + option.pools.length);
        for (int i = 0; i < option.pools.length; i++) {
            lines[option.lines.length + i] = selection.pools().get(option.pools[i]).line();
        }
        return lines;
    }

    /** A few slots take options at random. */
    private int[] scatter() {
        int count = Math.min(state.choice.length, 1 + random.nextInt(4));
        int[] touched = new int[count];
        for (int i = 0; i < count; i++) {
            int slot = random.nextInt(state.choice.length);
            int option = random.nextInt(state.options(slot).length);
            int group = selection.menu(slot).group();
            if (group < 0 || state.options(slot)[option].value == state.value[group]) {
                state.set(slot, option);
            }
            touched[i] = slot;
        }
        return touched;
    }
}
