package shuntwright.planner.window.table;

import java.util.Optional;

import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;

import org.jspecify.annotations.Nullable;

import shuntwright.plan.Verdict;
import shuntwright.quantity.Range;

/** Draws a {@link TripDrawing}: the allowed window as a track, limits and coverage interval as bars, nominal as a tick. */
final class IntervalBar extends Region {
    private static final double LABEL = 50;
    private static final double GAP = 5;

    private final Label lower = new Label();
    private final Label upper = new Label();
    private final Region window = part("allowed-window");
    private final Region limits = part("limits-bar");
    private final Region coverage = part("coverage-bar");
    private final Region nominal = part("nominal-tick");
    private @Nullable TripDrawing drawing;

    IntervalBar() {
        getStyleClass().add("interval-bar");
        lower.setAlignment(Pos.CENTER_RIGHT);
        lower.getStyleClass().add("interval-end");
        upper.getStyleClass().add("interval-end");
        getChildren().addAll(window, limits, coverage, nominal, lower, upper);
    }

    private static Region part(String style) {
        Region region = new Region();
        region.getStyleClass().add(style);
        region.setManaged(false);
        return region;
    }

    void show(TripDrawing shown, Optional<Verdict> verdict) {
        drawing = shown;
        lower.setText(shown.lower());
        upper.setText(shown.upper());
        for (Verdict each : Verdict.values()) {
            PseudoClass state = VerdictMark.pseudoClass(each);
            boolean on = verdict.equals(Optional.of(each));
            limits.pseudoClassStateChanged(state, on);
            coverage.pseudoClassStateChanged(state, on);
        }
        requestLayout();
    }

    @Override
    protected double computePrefHeight(double width) {
        return 20;
    }

    @Override
    protected double computePrefWidth(double height) {
        return 210;
    }

    @Override
    protected void layoutChildren() {
        TripDrawing shown = drawing;
        if (shown == null) {
            return;
        }
        double width = getWidth();
        double height = getHeight();
        lower.resizeRelocate(0, 0, LABEL, height);
        upper.resizeRelocate(width - LABEL, 0, LABEL, height);
        double middle = Math.rint(height / 2);
        span(window, Range.of(-1, 1), middle, height - 2);
        span(limits, shown.limits(), middle, 10);
        span(coverage, shown.coverage(), middle, 4);
        nominal.resizeRelocate(Math.rint(x(shown.nominal())) - 1, 2, 2, height - 4);
    }

    private void span(Region part, Range range, double middle, double thickness) {
        double left = Math.rint(x(range.min()));
        double right = Math.max(left + 2, Math.rint(x(range.max())));
        part.resizeRelocate(left, Math.rint(middle - thickness / 2), right - left, thickness);
    }

    private double x(double share) {
        double left = LABEL + GAP;
        double right = getWidth() - LABEL - GAP;
        double clipped = Math.clamp(share, -TripDrawing.SPAN, TripDrawing.SPAN);
        return left + (right - left) * (clipped + TripDrawing.SPAN) / (2 * TripDrawing.SPAN);
    }
}
