package shuntwright.planner.window.budget;

import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/** A share of the variance as a bar with its standard error as a whisker, and in words. */
final class ShareBar extends Region {
    private static final double TEXT = 54;

    private final Region track = part("share-track");
    private final Region bar = part("share-fill");
    private final Region whisker = part("share-error");
    private final Label text = new Label();
    private BudgetRow.Share shown = BudgetRow.Share.OPEN;

    ShareBar() {
        getStyleClass().add("share-bar");
        text.getStyleClass().add("share-text");
        getChildren().addAll(track, bar, whisker, text);
    }

    private static Region part(String style) {
        Region region = new Region();
        region.getStyleClass().add(style);
        region.setManaged(false);
        return region;
    }

    void show(BudgetRow.Share share) {
        shown = share;
        text.setText(share.text());
        track.setVisible(share.known());
        bar.setVisible(share.known());
        whisker.setVisible(share.known() && share.error() > 0);
        requestLayout();
    }

    @Override
    protected double computePrefWidth(double height) {
        return 60 + TEXT;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 16;
    }

    @Override
    protected void layoutChildren() {
        if (!shown.known()) {
            text.resizeRelocate(0, 0, getWidth(), getHeight());
            return;
        }
        double room = Math.max(8, getWidth() - Math.max(TEXT, text.prefWidth(-1)) - 4);
        double height = getHeight();
        double end = at(shown.value(), room);
        track.resizeRelocate(0, 3, room, height - 6);
        bar.resizeRelocate(0, 3, end, height - 6);
        double low = at(shown.value() - shown.error(), room);
        double high = Math.max(low + 1, at(shown.value() + shown.error(), room));
        whisker.resizeRelocate(low, Math.rint(height / 2) - 1, high - low, 2);
        text.resizeRelocate(room + 4, 0, getWidth() - room - 4, height);
    }

    private static double at(double share, double room) {
        return Math.rint(room * Math.clamp(share, 0, 1));
    }
}
