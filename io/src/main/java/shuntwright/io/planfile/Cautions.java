package shuntwright.io.planfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import shuntwright.plan.Plan;

/** What everyone who uses numbers of a plan must know; the same words in every file that leaves the program. */
public final class Cautions {

    /** The shortest form, for footers. */
    public static final String LINE = "Planning aid. Not a substitute for the fuse or breaker that codes require. "
            + "Verify by test.";

    private static final String INVENTED = "invented";

    private Cautions() {
    }

    /** The cautions that apply to a plan, each one or two sentences. */
    public static List<String> of(Plan plan) {
        List<String> cautions = new ArrayList<>(List.of(
                "This plan is no substitute for the fuse or circuit breaker that codes require. An electronic trip can "
                        + "fail with its switch closed.",
                "Verify trip, release and reading of every channel by test, on real hardware, at both ends of the "
                        + "ambient temperature range.",
                "Local codes and a person licensed to practise where the equipment is used decide, not this file.",
                "The numbers hold for the limits stated in the parts data. Check these against the data sheets of the "
                        + "parts you buy."));
        if (saysInvented(plan)) {
            cautions.add("Parts of this plan are described as invented: such parts cannot be bought, and their numbers "
                    + "stand for no product.");
        }
        return List.copyOf(cautions);
    }

    private static boolean saysInvented(Plan plan) {
        return contains(plan.board().description()) || plan.parts().stream()
                .anyMatch(each -> contains(each.description()) || contains(each.purchase().supplier())
                        || contains(each.purchase().lifecycle()));
    }

    private static boolean contains(String text) {
        return text.toLowerCase(Locale.ROOT).contains(INVENTED);
    }
}
