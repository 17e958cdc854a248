package shuntwright.io.planfile;

import java.util.OptionalDouble;

import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.Conflict;
import shuntwright.plan.Reached;

/** What was wanted of the board-wide choice, and what it reaches. */
final class ChoiceTables {

    static final Form<Preference> PREFERENCE = ObjectTable.<Preference>named("preference",
            "What was wanted of all choices that serve the whole board, and how long it was looked for.")
            .texts("order", "objectives: the first decides, each next one among choices equally good so far",
                    each -> each.order().stream().map(Objective::word).toList())
            .number("partNumberCost", Unit.CURRENCY, "of one more distinct part number in the whole build",
                    Preference::partNumberCost)
            .count("rounds", "of the search, asked for", Preference::rounds)
            .maybeNumber("timeLimit", Unit.SECOND, "after which the search ends with the best found; absent for none. "
                    + "A search that it ends may end elsewhere on another machine", Preference::timeLimit)
            .count("seed", "of the search", Preference::seed).form();

    static final Form<Reached> REACHED = ObjectTable.<Reached>named("reached",
            "What the choice reaches of one objective. A value says nothing of how good it is without its proof.")
            .text("objective", "least heat: of all shunts, with diversity; most even heat: largest share of a zone's "
                    + "heat limit in use; least cost: of the whole build; fewest parts: distinct part numbers; "
                    + "widest margin: of the channel that has least", each -> each.objective().word())
            .numberIn(each -> Unit.of(each.objective()), "value", "reached", Reached::value)
            .maybeNumberIn(each -> Unit.of(each.objective()), "bound",
                    "no choice of any kind is better than this under "
                            + "the objectives before it; absent where nothing is known",
                    Reached::bound)
            .text("proof",
                    "\"proven\": no choice is better, of heat by more than the design rules' heat step for each channel, "
                            + "which later objectives may use; \"bounded\": none is better than the bound, between the two "
                            + "there may be something; \"open\": nothing is known",
                    each -> switch (each.proof()) {
                        case PROVEN -> "proven";
                        case BOUNDED -> "bounded";
                        case OPEN -> "open";
                    })
            .maybeNumber("gap", Unit.FRACTION, "distance of the value from the bound, of the value: nothing is better "
                    + "by more; 0 where proven; absent where nothing is known or the value is 0",
                    each -> finite(each.gap()))
            .form();

    private static final Form<Conflict.Member> MEMBER = ObjectTable.<Conflict.Member>named("conflict member",
            "One of several demands that cannot be met together.")
            .text("kind", "shared limit, channel or tap", each -> switch (each.kind()) {
                case SHARED_LIMIT -> "shared limit";
                case CHANNEL -> "channel";
                case TAP -> "tap";
            })
            .text("name", "of limit, channel or tap", Conflict.Member::name)
            .text("what", "is demanded, in words", Conflict.Member::what)
            .maybeNumberIn(each -> Unit.of(each.dimension()), "now", "as demanded; absent where it is no single number",
                    Conflict.Member::now)
            .maybeNumberIn(each -> Unit.of(each.dimension()), "relaxed", "what it would have to be, relaxed alone, for "
                    + "all others to be met; absent where none was found", Conflict.Member::relaxed)
            .form();

    private static final Form<Conflict> CONFLICT = ObjectTable.<Conflict>named("conflict",
            "Demands that cannot be met together.").text("words", "what conflicts with what", Conflict::words)
            .flag("minimal", "true: proven that without any one member the others can be met; false: not proven that "
                    + "all of them are needed for the conflict", Conflict::minimal)
            .list("members", MEMBER, "shared limits first, then channels", Conflict::members).form();

    static final Form<BoardChoice> CHOICE = ObjectTable.<BoardChoice>named("choice",
            "How the parts of all channels were chosen together, and how good that choice is.")
            .list("reached", REACHED, "of each objective, in the order wanted", BoardChoice::reached)
            .count("rounds", "of the search that were run", BoardChoice::rounds)
            .count("seed", "of the search", BoardChoice::seed)
            .flag("cutShort", "true when a time limit or a cancel ended it before its rounds: another run may end "
                    + "elsewhere", BoardChoice::cutShort)
            .count("candidates", "ways to serve the channels, all channels together, that limits leave open",
                    BoardChoice::candidates)
            .count("kept", "of them compared for the whole board", BoardChoice::kept)
            .texts("broken", "shared limits that this choice breaks; empty when it keeps to all", BoardChoice::broken)
            .maybeObject("conflict", CONFLICT, "absent when everything is met", BoardChoice::conflict).form();

    private ChoiceTables() {
    }

    private static OptionalDouble finite(OptionalDouble gap) {
        return Double.isFinite(gap.orElse(0)) ? gap : OptionalDouble.empty();
    }
}
