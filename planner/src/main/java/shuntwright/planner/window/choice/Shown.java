package shuntwright.planner.window.choice;

import java.util.List;
import java.util.Optional;

import shuntwright.plan.Conflict;
import shuntwright.plan.Reached;

/**
 * What the panel shows of a choice.
 *
 * @param title    whose it is and how far it is
 * @param working  true while a better one is looked for
 * @param aims     in the order wanted
 * @param facts    how it was found
 * @param broken   shared limits it breaks
 * @param conflict demands that cannot be met together
 */
record Shown(String title, boolean working, List<Aim> aims, List<Fact> facts, List<String> broken,
        Optional<Clash> conflict) {
    static final Shown NOTHING = new Shown("", false, List.of(), List.of(), List.of(), Optional.empty());

    Shown {
        aims = List.copyOf(aims);
        facts = List.copyOf(facts);
        broken = List.copyOf(broken);
    }

    /**
     * What is reached of one objective.
     *
     * @param wanted   the objective
     * @param value    reached
     * @param bound    nothing is better than this; empty when nothing is known
     * @param distance from the bound
     * @param proof    how sure it is
     * @param words    the same in words
     */
    record Aim(String wanted, String value, String bound, String distance, Reached.Proof proof, String words) {}

    /** One thing about the search. */
    record Fact(String title, String value) {}

    /**
     * Demands that cannot be met together.
     *
     * @param title how sure it is that all of them are needed for the conflict
     * @param words what conflicts with what
     */
    record Clash(String title, String words, List<Part> parts) {
        Clash {
            parts = List.copyOf(parts);
        }
    }

    /**
     * One demand of a conflict.
     *
     * @param member  of the conflict
     * @param demand  "zone port, heat limit"
     * @param change  "2.5 W → would need 2.9 W"
     * @param applies true when it can be applied to the board on show
     */
    record Part(Conflict.Member member, String demand, String change, boolean applies) {}
}
