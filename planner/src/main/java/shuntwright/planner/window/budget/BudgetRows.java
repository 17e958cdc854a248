package shuntwright.planner.window.budget;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Owner;
import shuntwright.planner.window.budget.BudgetRow.Share;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.QuantityWriter;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Propagated;

/** The lines of a budget beside their effect indices. */
final class BudgetRows {
    private BudgetRows() {
    }

    /**
     * One row for each input that does anything, widest limits first.
     *
     * @param target trip target, A
     */
    static List<BudgetRow> of(Assessment assessment, Optional<Propagated> propagated, double target) {
        List<EffectIndex> effects = propagated.map(Propagated::effects).orElse(List.of());
        double longest = assessment.budget().stream().mapToDouble(BudgetLine::widest).max().orElse(0);
        List<BudgetLine> lines = new ArrayList<>(assessment.budget());
        for (EffectIndex effect : effects) {
            if (assessment.budget().stream().noneMatch(line -> line.input().equals(effect.input()))) {
                lines.add(new BudgetLine(effect.input(), 0, 0, 0, 0, 0));
            }
        }
        Map<String, Input> reels = new HashMap<>();
        List<BudgetRow> rows = new ArrayList<>();
        for (BudgetLine line : lines) {
            Input piece = line.input().reel()
                    .map(reel -> reels.computeIfAbsent(reel.name() + line.input().slot().unit(),
                            _ -> line.input()))
                    .orElse(line.input());
            Effects shown = piece.equals(line.input()) ? effects(effects, line.input()) : Effects.with(piece);
            rows.add(row(line, shown, target, longest > 0 ? longest : 1));
        }
        return rows;
    }

    /** Both indices of an input. */
    private record Effects(Share first, Share total) {
        /** Pieces of one reel move together and have one index, which stands with the first of them. */
        static Effects with(Input piece) {
            Share share = new Share("with " + piece.owner().name(), "pieces of one reel have one index", -1, 0);
            return new Effects(share, share);
        }
    }

    private static Effects effects(List<EffectIndex> effects, Input input) {
        String reel = input.reel().map(each -> ", of all pieces of " + each.name() + " together").orElse("");
        Optional<EffectIndex> found = effects.stream().filter(each -> each.input().equals(input)).findFirst();
        Share none = effects.isEmpty() ? Share.OPEN : new Share(share(0), "no effect in the trials", 0, 0);
        return new Effects(found.map(each -> share(each.first(), each.firstError(), reel)).orElse(none),
                found.map(each -> share(each.total(), each.totalError(), reel)).orElse(none));
    }

    private static BudgetRow row(BudgetLine line, Effects effects, double target, double longest) {
        Input input = line.input();
        return new BudgetRow(input.slot().words(), owner(input.owner()), distribution(input.distribution()),
                new BudgetRow.Limits(signed(line.towardsLow()), signed(line.towardsHigh()),
                        percent(line.towardsLow() / target, line.towardsHigh() / target),
                        line.towardsLow() / longest, line.towardsHigh() / longest, line.widest()),
                new Share(share(line.varianceShare()), "", line.varianceShare(), 0), effects.first(), effects.total());
    }

    private static String owner(Owner owner) {
        return switch (owner) {
            case Owner.Own(String name) -> name;
            case Owner.Shared(String name) -> name + ", shared";
        };
    }

    private static String distribution(Distribution distribution) {
        return switch (distribution) {
            case Distribution.Uniform _,Distribution.Triangular _,Distribution.ArcSine _,Distribution.Trapezoid _ ->
                distribution.word();
            case Distribution.Normal(double k) -> distribution.word() + ", k " + plain(k);
            case Distribution.StudentT(double degrees, double _) -> distribution.word() + ", ν " + plain(degrees);
        };
    }

    private static String plain(double value) {
        return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
    }

    private static Share share(double value, double error, String reel) {
        return new Share(share(value), "± " + share(error) + " (standard error)" + reel, value, error);
    }

    private static String share(double value) {
        return String.format(Locale.ROOT, "%.1f %%", value * 100).replace('-', '−').replace("−0.0 %", "0.0 %");
    }

    private static String signed(double current) {
        String size = QuantityWriter.show(Math.abs(current), Dimension.CURRENT, 3);
        return current == 0 ? size : current < 0 ? "−" + size : "+" + size;
    }

    /** "±2 %" or "−0.1 +0.11 %". */
    private static String percent(double low, double high) {
        String below = percent(Math.abs(low));
        String above = percent(Math.abs(high));
        return below.equals(above) && low <= 0 && high >= 0
                ? (low == 0 && high == 0 ? "" : "±") + below + " %"
                : sign(low) + below + " " + sign(high) + above + " %";
    }

    private static String sign(double value) {
        return value < 0 ? "−" : value > 0 ? "+" : "";
    }

    private static String percent(double size) {
        double value = size * 100;
        return value == 0 ? "0" : String.format(Locale.ROOT, value < 0.01 ? "%.4f" : "%.2f", value);
    }
}
