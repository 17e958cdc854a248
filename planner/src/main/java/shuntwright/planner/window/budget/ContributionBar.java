package shuntwright.planner.window.budget;

import javafx.scene.layout.Region;

/** A bar to the left for what lowers the lower limit, one to the right for what raises the upper limit. */
final class ContributionBar extends Region {
    private final Region low = part("bar-low");
    private final Region high = part("bar-high");
    private final Region axis = part("bar-axis");
    private double lowShare;
    private double highShare;

    ContributionBar() {
        getStyleClass().add("contribution-bar");
        getChildren().addAll(low, high, axis);
    }

    private static Region part(String style) {
        Region region = new Region();
        region.getStyleClass().add(style);
        region.setManaged(false);
        return region;
    }

    void show(double lowBar, double highBar) {
        lowShare = lowBar;
        highShare = highBar;
        requestLayout();
    }

    @Override
    protected double computePrefWidth(double height) {
        return 72;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 14;
    }

    @Override
    protected void layoutChildren() {
        double middle = Math.rint(getWidth() / 2);
        double half = middle - 4;
        place(low, middle, middle + half * lowShare);
        place(high, middle, middle + half * highShare);
        axis.resizeRelocate(middle, 0, 1, getHeight());
    }

    private void place(Region bar, double from, double to) {
        double left = Math.rint(Math.min(from, to));
        bar.resizeRelocate(left, 2, Math.rint(Math.max(from, to)) - left, getHeight() - 4);
    }
}
