package shuntwright.planner.window.budget;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import javafx.geometry.Pos;
import javafx.geometry.VPos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.shape.ClosePath;
import javafx.scene.shape.LineTo;
import javafx.scene.shape.MoveTo;
import javafx.scene.shape.Path;

import org.jspecify.annotations.Nullable;

/** Draws a {@link HistogramDrawing}: labelled intervals over the trials, the allowed window as a framed band behind both. */
final class HistogramView extends Region {
    private static final double GAP = 8;
    private static final double TICK = 4;
    private static final double ROOM_OF_A_TICK = 62;

    private final Region window = part("histogram-window");
    private final Path inside = new Path();
    private final Path outside = new Path();
    private final Region axis = part("histogram-axis");
    private final Label empty = new Label();
    private final Label title = new Label();
    private final Label caption = new Label();
    private final List<Node> drawn = new ArrayList<>();
    private @Nullable HistogramDrawing drawing;

    HistogramView() {
        getStyleClass().add("histogram");
        setId("histogram");
        inside.getStyleClass().add("histogram-inside");
        outside.getStyleClass().add("histogram-outside");
        inside.setManaged(false);
        outside.setManaged(false);
        empty.getStyleClass().add("histogram-empty");
        empty.setWrapText(true);
        empty.setAlignment(Pos.CENTER);
        caption.getStyleClass().add("histogram-label");
        title.getStyleClass().addAll("histogram-label", "histogram-title");
        title.setWrapText(true);
        title.setAlignment(Pos.TOP_LEFT);
        getChildren().addAll(window, inside, outside, axis, empty, title, caption);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setFocusTraversable(true);
        setMinSize(320, 0);
    }

    private static Region part(String style) {
        Region region = new Region();
        region.getStyleClass().add(style);
        region.setManaged(false);
        return region;
    }

    void show(Optional<HistogramDrawing> shown) {
        drawing = shown.orElse(null);
        setVisible(shown.isPresent());
        setAccessibleText(shown.map(HistogramDrawing::words).orElse(""));
        requestLayout();
    }

    @Override
    protected double computePrefWidth(double height) {
        return 480;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 220;
    }

    @Override
    protected void layoutChildren() {
        getChildren().removeAll(drawn);
        drawn.clear();
        HistogramDrawing shown = drawing;
        if (shown == null) {
            return;
        }
        List<HistogramDrawing.Span> spans = new ArrayList<>(List.of(shown.allowed()));
        spans.addAll(shown.spans());
        List<Label> names = spans.stream().map(each -> label(each.label() + "  " + each.value())).toList();
        double line = names.getFirst().prefHeight(-1);
        double left = names.stream().mapToDouble(each -> each.prefWidth(-1)).max().orElse(0) + snappedLeftInset() + GAP;
        double right = getWidth() - snappedRightInset() - ROOM_OF_A_TICK / 3;
        double top = snappedTopInset();
        double bottom = getHeight() - snappedBottomInset() - line - TICK;
        if (right - left < 40 || bottom - top < line) {
            return;
        }
        Field field = new Field(left, right);
        for (int at = 0; at < spans.size(); at++) {
            double y = Math.rint(top + at * line);
            names.get(at).resizeRelocate(snappedLeftInset(), y, left - GAP - snappedLeftInset(), line);
            if (at > 0) {
                interval(spans.get(at), field, Math.rint(y + line / 2));
            }
        }
        double from = field.x(shown.allowed().from());
        window.resizeRelocate(from, top, Math.max(1, field.x(shown.allowed().to()) - from), bottom - top);
        double ceiling = top + spans.size() * line + 2;
        bars(shown, field, ceiling, bottom);
        axis.resizeRelocate(left, bottom, right - left, 1);
        ticks(shown, field, bottom, line);
        empty.setText(shown.empty());
        layoutInArea(empty, left, ceiling, right - left, Math.max(0, bottom - ceiling), 0, javafx.geometry.HPos.CENTER,
                VPos.CENTER);
        title.setText(shown.title());
        title.setVisible(bottom - ceiling > 3 * line);
        title.resizeRelocate(snappedLeftInset(), ceiling + line / 2, left - GAP - snappedLeftInset(),
                Math.min(2 * line, bottom - ceiling - line / 2));
        caption.setText(shown.caption());
        caption.setVisible(bottom - ceiling > line);
        caption.resizeRelocate(snappedLeftInset(), bottom - line, left - GAP - snappedLeftInset(), line);
    }

    /** Maps shares of the axis to places. */
    private record Field(double left, double right) {
        double x(double share) {
            return Math.rint(left + (right - left) * share);
        }
    }

    private Label label(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("histogram-label");
        add(label);
        label.applyCss();
        return label;
    }

    private void add(Node node) {
        node.setManaged(false);
        drawn.add(node);
        getChildren().add(node);
    }

    /** A line with an upright at each end that is on the axis. */
    private void interval(HistogramDrawing.Span span, Field field, double y) {
        double from = field.x(span.from());
        double to = Math.max(from + 1, field.x(span.to()));
        upright(from, to, y - 1, 2);
        if (!span.before()) {
            upright(from, from + 2, y - TICK, 2 * TICK);
        }
        if (!span.beyond()) {
            upright(to - 2, to, y - TICK, 2 * TICK);
        }
    }

    private void upright(double from, double to, double top, double height) {
        Region line = part("interval-line");
        add(line);
        line.resizeRelocate(from, top, to - from, height);
    }

    private void bars(HistogramDrawing shown, Field field, double ceiling, double floor) {
        inside.getElements().clear();
        outside.getElements().clear();
        for (HistogramDrawing.Bar bar : shown.bars()) {
            if (bar.height() > 0) {
                double left = field.x(bar.from());
                double right = Math.max(left + 1, field.x(bar.to()));
                // the rarest cells stay visible
                double height = Math.max(1, (floor - ceiling) * bar.height());
                (bar.outside() ? outside : inside).getElements().addAll(new MoveTo(left, floor),
                        new LineTo(left, floor - height), new LineTo(right, floor - height), new LineTo(right, floor),
                        new ClosePath());
            }
        }
    }

    private void ticks(HistogramDrawing shown, Field field, double bottom, double line) {
        int most = (int) Math.max(2, (field.right() - field.left()) / ROOM_OF_A_TICK);
        for (HistogramDrawing.Tick tick : shown.ticks(most)) {
            double x = field.x(tick.at());
            Region mark = part("histogram-axis");
            add(mark);
            mark.resizeRelocate(x, bottom, 1, TICK);
            Label text = label(tick.text());
            double width = text.prefWidth(-1);
            text.resizeRelocate(Math.rint(x - width / 2), bottom + TICK, width, line);
        }
    }
}
