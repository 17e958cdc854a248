package shuntwright.planner.window.explore;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.window.figures.Aims;

/** Sums over a planned board. */
public final class Sums {
    private Sums() {
    }

    /** Heat of all shunts together with their diversity, W. */
    public static double heat(Plan plan) {
        return plan.shared().stream().filter(each -> each.kind() == SharedUse.Kind.BOARD_HEAT)
                .mapToDouble(SharedUse::used).findFirst()
                .orElseGet(() -> plan.channels().stream().flatMap(each -> each.solved().stream())
                        .mapToDouble(SolvedChannel::heat).sum());
    }

    /** Of a plan that might be, against the one that is. */
    public static List<Sum> of(Plan plan, Optional<Plan> now) {
        List<Sum> sums = new ArrayList<>();
        sums.add(heat(heat(plan), now.map(Sums::heat)));
        sums.add(cost("Cost of the build", plan.buildCost(), now.map(Plan::buildCost), plan.currency()));
        sums.add(cost("Parts of a board", plan.costPerBoard(), now.map(Plan::costPerBoard), plan.currency()));
        sums.add(count("Part numbers", plan.parts().size(), now.map(each -> each.parts().size())));
        sums.add(count("Accepted channels", accepted(plan), now.map(Sums::accepted)));
        return sums;
    }

    private static int accepted(Plan plan) {
        return (int) plan.channels().stream().filter(ChannelPlan::accepted).count();
    }

    private static Sum heat(double value, Optional<Double> now) {
        return new Sum("Heat of all shunts", Aims.watts(value),
                now.map(each -> heatDifference(value, each)).orElse(""));
    }

    private static Sum cost(String title, double value, Optional<Double> now, String currency) {
        return new Sum(title, Aims.money(value, currency),
                now.map(each -> costDifference(value, each, currency)).orElse(""));
    }

    private static Sum count(String title, int value, Optional<Integer> now) {
        return new Sum(title, Integer.toString(value), now.map(each -> countDifference(value, each)).orElse(""));
    }

    /** "+1.372 W", "same". */
    public static String heatDifference(double value, double now) {
        return Math.abs(value - now) < 0.0005 ? "same" : (value > now ? "+" : "−") + Aims.watts(Math.abs(value - now));
    }

    /** "−40.00 EUR", "same". */
    public static String costDifference(double value, double now, String currency) {
        return Math.abs(value - now) < 0.005 ? "same" : (value > now ? "+" : "") + Aims.money(value - now, currency);
    }

    /** "+3", "same". */
    public static String countDifference(int value, int now) {
        return value == now ? "same" : value > now ? "+" + (value - now) : "−" + (now - value);
    }
}
