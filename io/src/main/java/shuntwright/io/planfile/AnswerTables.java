package shuntwright.io.planfile;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

import shuntwright.plan.Front;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Plan;
import shuntwright.plan.WhatIf;

/** Answers to questions about a whole board that are no single plan: front, other choices, what if. */
final class AnswerTables {

    /** @param plan as chosen before the question, whose board and currency hold */
    record FrontAnswer(Plan plan, Front front) {}

    /** @param channel whose other choices they are */
    record OthersAnswer(Plan plan, String channel, List<OtherChoice> others) {
        OthersAnswer {
            others = List.copyOf(others);
        }
    }

    record WhatIfAnswer(Plan plan, WhatIf whatIf) {}

    private record FrontPoint(Front front, Front.Point point) {}

    private record WhatIfPoint(WhatIf.Varied varied, WhatIf.Point point) {}

    private static final Form<FrontPoint> FRONT_POINT = ObjectTable.<FrontPoint>named("front point",
            "A plan of the whole board.")
            .numberIn(each -> Unit.of(each.front().first()), "first", "value of the first objective",
                    each -> each.point().first())
            .numberIn(each -> Unit.of(each.front().second()), "second", "value of the second",
                    each -> each.point().second())
            .flag("accepted", "every channel is accepted and no finding about the board is a fault",
                    each -> each.point().plan().accepted())
            .number("buildCost", Unit.CURRENCY, "of the whole build", each -> each.point().plan().buildCost())
            .count("partNumbers", "distinct part numbers", each -> each.point().plan().parts().size())
            .maybeObject("choice", ChoiceTables.CHOICE, "how good it is", each -> each.point().plan().choice()).form();

    static final ObjectTable<FrontAnswer> FRONT = start("front", "Answer of the command `front`: plans of which none "
            + "is better in one of two objectives without being worse in the other, as far as was found. Not sampled.",
            FrontAnswer::plan)
            .text("first", "objective along the front", each -> each.front().first().word())
            .text("second", "the other", each -> each.front().second().word())
            .list("points", FRONT_POINT, "by ascending value of the first",
                    each -> each.front().points().stream().map(point -> new FrontPoint(each.front(), point)).toList());

    private static final Form<OtherChoice> OTHER = ObjectTable.<OtherChoice>named("other choice",
            "Another circuit for one channel, with the whole board chosen again around it.")
            .object("circuit", CircuitTables.CIRCUIT, "of the channel", OtherChoice::circuit)
            .text("verdict", "of the channel", each -> each.channel().verdict().word())
            .flag("accepted", "whether the board's acceptance takes that verdict", each -> each.channel().accepted())
            .maybeNumber("margin", Unit.FRACTION, "smallest of all outcomes of the channel, of the allowed half-width",
                    each -> each.channel().solved().map(solved -> OptionalDouble.of(solved.margin()))
                            .orElseGet(OptionalDouble::empty))
            .number("buildCost", Unit.CURRENCY, "of the whole build", OtherChoice::cost)
            .number("boardHeat", Unit.WATT, "of all shunts", OtherChoice::heat)
            .count("partNumbers", "distinct part numbers of the board", OtherChoice::parts)
            .list("reached", ChoiceTables.REACHED, "by the whole board, in the order wanted", OtherChoice::board)
            .texts("broken", "shared limits broken with it", OtherChoice::broken).form();

    static final ObjectTable<OthersAnswer> OTHERS = start("others",
            "Answer of the command `others`: what other circuits "
                    + "of one channel would mean for the whole board.",
            OthersAnswer::plan)
            .text("channel", "its name", OthersAnswer::channel)
            .maybeObject("chosen", CircuitTables.CIRCUIT, "circuit that the plan of the board has; absent where none "
                    + "fits",
                    each -> each.plan().channel(each.channel()).flatMap(plan -> plan.solved())
                            .map(solved -> solved.circuit()))
            .maybeObject("choice", ChoiceTables.CHOICE, "what that plan reaches", each -> each.plan().choice())
            .number("buildCost", Unit.CURRENCY, "of that plan, for the whole build", each -> each.plan().buildCost())
            .list("others", OTHER, "best for the whole board first", OthersAnswer::others);

    private static final Form<WhatIf.Sums> SUMS = ObjectTable.<WhatIf.Sums>named("sums", "Sums over the board.")
            .number("cost", Unit.CURRENCY, "of the whole build", WhatIf.Sums::cost)
            .number("costPerBoard", Unit.CURRENCY, "that, divided by the boards built", WhatIf.Sums::costPerBoard)
            .number("heat", Unit.WATT, "of all shunts", WhatIf.Sums::heat)
            .count("partNumbers", "distinct part numbers", WhatIf.Sums::parts).form();

    private static final Form<WhatIfPoint> WHAT_IF_POINT = ObjectTable.<WhatIfPoint>named("what-if point",
            "The board at one value.")
            .numberIn(each -> Unit.of(each.varied()), "value", "value of what is varied", each -> each.point().value())
            .maybeObject("sums", SUMS, "reached there; absent where no choice meets every shared limit",
                    each -> each.point().reached())
            .form();

    static final ObjectTable<WhatIfAnswer> WHAT_IF = start("what-if", "Answer of the command `what-if`: what the board "
            + "becomes as one of its limits changes.", WhatIfAnswer::plan)
            .text("varied", "board heat limit, zone heat limit, supply current or build quantity",
                    each -> switch (each.whatIf().varied()) {
                        case BOARD_HEAT_LIMIT -> "board heat limit";
                        case ZONE_HEAT_LIMIT -> "zone heat limit";
                        case SUPPLY_CURRENT -> "supply current";
                        case BUILD_QUANTITY -> "build quantity";
                    })
            .maybeText("zone", "its name, for a zone's heat limit",
                    each -> Optional.of(each.whatIf().name()).filter(name -> !name.isEmpty()))
            .list("points", WHAT_IF_POINT, "by ascending value", each -> each.whatIf().points().stream()
                    .map(point -> new WhatIfPoint(each.whatIf().varied(), point)).toList());

    private AnswerTables() {
    }

    private static <T> ObjectTable<T> start(String name, String meaning, Function<T, Plan> plan) {
        return ObjectTable.<T>named(name, meaning)
                .text("format", "always \"" + format(name) + "\"", _ -> format(name))
                .texts("cautions", "what a user of these numbers must know", each -> Cautions.of(plan.apply(each)))
                .text("currency", "ISO 4217 code of all costs", each -> plan.apply(each).currency())
                .object("board", BoardTables.BOARD, "what was asked", each -> plan.apply(each).board());
    }

    /** Name and version of the format. */
    static String format(String name) {
        return "shuntwright " + name + " 1";
    }
}
