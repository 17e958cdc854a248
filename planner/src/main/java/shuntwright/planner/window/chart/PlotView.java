package shuntwright.planner.window.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntConsumer;

import javafx.css.PseudoClass;
import javafx.geometry.HPos;
import javafx.geometry.Pos;
import javafx.geometry.VPos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.Region;
import javafx.scene.shape.LineTo;
import javafx.scene.shape.MoveTo;
import javafx.scene.shape.Path;

import org.jspecify.annotations.Nullable;

/** Draws a {@link Plot}; its points can be chosen with mouse and arrow keys. */
public final class PlotView extends Region {
    private static final PseudoClass CHOSEN = PseudoClass.getPseudoClass("chosen");
    private static final PseudoClass PRESENT = PseudoClass.getPseudoClass("present");
    private static final double GAP = 6;
    private static final double TICK = 4;
    private static final double ROOM_OF_A_TICK = 66;
    private static final double LINES_OF_A_TICK = 2.2;
    private static final double SPOT = 11;
    private static final double CHOSEN_SPOT = 15;

    private final Region paper = part("plot-paper");
    private final Region left = part("plot-axis");
    private final Region bottom = part("plot-axis");
    private final Path lines = new Path();
    private final Label xTitle = new Label();
    private final Label yTitle = new Label();
    private final Label empty = new Label();
    private final List<Node> drawn = new ArrayList<>();
    private IntConsumer chosen = _ -> {
    };
    private @Nullable Plot plot;
    private @Nullable Drawn last;

    public PlotView(String id) {
        setId(id);
        getStyleClass().add("plot");
        lines.getStyleClass().add("plot-line");
        lines.setManaged(false);
        lines.setMouseTransparent(true);
        for (Label title : List.of(xTitle, yTitle)) {
            title.getStyleClass().addAll("plot-label", "plot-title");
            title.setManaged(false);
        }
        empty.getStyleClass().add("plot-empty");
        empty.setWrapText(true);
        empty.setAlignment(Pos.CENTER);
        getChildren().addAll(paper, lines, left, bottom, xTitle, yTitle, empty);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setFocusTraversable(true);
        setMinSize(180, 0);
        addEventHandler(KeyEvent.KEY_PRESSED, this::step);
        setOnMouseClicked(_ -> requestFocus());
    }

    private static Region part(String style) {
        Region region = new Region();
        region.getStyleClass().add(style);
        region.setManaged(false);
        return region;
    }

    /** @param heard the place among the points of the point chosen */
    public void onChosen(IntConsumer heard) {
        chosen = heard;
    }

    public void show(Plot shown) {
        plot = shown;
        setAccessibleText(shown.words());
        requestLayout();
    }

    @Override
    protected double computePrefWidth(double height) {
        return 420;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 240;
    }

    /** Left and right go from point to point. */
    private void step(KeyEvent event) {
        Plot shown = plot;
        int by = event.getCode() == KeyCode.LEFT ? -1 : event.getCode() == KeyCode.RIGHT ? 1 : 0;
        if (shown == null || by == 0) {
            return;
        }
        List<Integer> there = new ArrayList<>();
        int now = -1;
        for (int at = 0; at < shown.spots().size(); at++) {
            if (shown.spots().get(at).kind() != Plot.Kind.PRESENT) {
                if (shown.spots().get(at).kind() == Plot.Kind.CHOSEN) {
                    now = there.size();
                }
                there.add(at);
            }
        }
        if (!there.isEmpty()) {
            chosen.accept(there.get(now < 0 ? 0 : Math.clamp(now + by, 0, there.size() - 1)));
        }
        event.consume();
    }

    /** What a drawing depends on; while it is the same the drawing stays, so that a point under the mouse does too. */
    private record Drawn(Plot plot, double width, double height, double line) {}

    @Override
    protected void layoutChildren() {
        Plot shown = plot;
        if (shown == null) {
            return;
        }
        xTitle.setText(shown.x().unit().words());
        yTitle.setText(shown.y().unit().words());
        Drawn wanted = new Drawn(shown, getWidth(), getHeight(), yTitle.prefHeight(-1));
        if (!wanted.equals(last)) {
            last = wanted;
            draw(shown, wanted.line());
        }
    }

    private void draw(Plot shown, double line) {
        getChildren().removeAll(drawn);
        drawn.clear();
        lines.getElements().clear();
        double top = snappedTopInset() + line + GAP;
        double floor = getHeight() - snappedBottomInset() - 2 * line - TICK;
        double right = getWidth() - snappedRightInset() - ROOM_OF_A_TICK / 4;
        boolean bare = !shown.empty().isEmpty();
        List<Scale.Tick> rows = bare
                ? List.of()
                : shown.y().ticks((int) Math.max(2, (floor - top) / (LINES_OF_A_TICK * line)));
        List<Label> numbers = rows.stream().map(each -> label(each.text())).toList();
        double from = snappedLeftInset() + GAP + TICK
                + numbers.stream().mapToDouble(each -> each.prefWidth(-1)).max().orElse(0);
        if (right - from < 40 || floor - top < line) {
            return;
        }
        Field field = new Field(Math.rint(from), Math.rint(right), Math.rint(top), Math.rint(floor));
        yTitle.resizeRelocate(snappedLeftInset(), snappedTopInset(), getWidth() - snappedLeftInset(), line);
        xTitle.setAlignment(Pos.CENTER_RIGHT);
        xTitle.resizeRelocate(snappedLeftInset(), getHeight() - snappedBottomInset() - line, right - snappedLeftInset(),
                line);
        paper.resizeRelocate(field.left(), field.top(), field.right() - field.left(), field.floor() - field.top());
        left.resizeRelocate(field.left(), field.top(), 1, field.floor() - field.top());
        bottom.resizeRelocate(field.left(), field.floor(), field.right() - field.left(), 1);
        rows(rows, numbers, field, line);
        if (!bare) {
            columns(shown, field, line);
            gaps(shown, field, line);
            now(shown, field, line);
            lines(shown, field);
            spots(shown, field);
        }
        empty.setText(shown.empty());
        layoutInArea(empty, field.left() + GAP, field.top(), field.right() - field.left() - 2 * GAP,
                field.floor() - field.top(), 0, HPos.CENTER, VPos.CENTER);
    }

    /** Maps shares of the scales to places. */
    private record Field(double left, double right, double top, double floor) {
        double x(double share) {
            return Math.rint(left + (right - left) * Math.clamp(share, 0, 1));
        }

        double y(double share) {
            return Math.rint(floor - (floor - top) * Math.clamp(share, 0, 1));
        }
    }

    private Label label(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("plot-label");
        add(label);
        label.applyCss();
        return label;
    }

    private void add(Node node) {
        node.setManaged(false);
        drawn.add(node);
        getChildren().add(node);
    }

    private void rows(List<Scale.Tick> ticks, List<Label> numbers, Field field, double line) {
        for (int at = 0; at < ticks.size(); at++) {
            double y = field.y(ticks.get(at).at());
            Region grid = part("plot-grid");
            add(grid);
            grid.toBack();
            paper.toBack();
            grid.resizeRelocate(field.left(), y, field.right() - field.left(), 1);
            double width = numbers.get(at).prefWidth(-1);
            numbers.get(at).resizeRelocate(field.left() - TICK - width, y - Math.rint(line / 2), width, line);
        }
    }

    private void columns(Plot shown, Field field, double line) {
        int most = (int) Math.max(2, (field.right() - field.left()) / ROOM_OF_A_TICK);
        for (Scale.Tick tick : shown.x().ticks(most)) {
            double x = field.x(tick.at());
            Region mark = part("plot-axis");
            add(mark);
            mark.resizeRelocate(x, field.floor(), 1, TICK);
            Label text = label(tick.text());
            double width = text.prefWidth(-1);
            text.resizeRelocate(Math.rint(x - width / 2), field.floor() + TICK, width, line);
        }
    }

    private void gaps(Plot shown, Field field, double line) {
        for (Plot.Gap gap : shown.gaps()) {
            Region band = part("plot-gap");
            add(band);
            double from = Math.max(field.left() + 1, field.x(gap.from()));
            double width = Math.max(2, field.x(gap.to()) - from);
            band.resizeRelocate(from, field.top(), width, field.floor() - field.top());
            Label why = label(shown.gap());
            why.setWrapText(true);
            why.setAlignment(Pos.CENTER);
            why.getStyleClass().add("plot-gap-words");
            double height = why.prefHeight(width - 2 * GAP);
            if (width > 70 && height < field.floor() - field.top()) {
                why.resizeRelocate(from + GAP, field.floor() - height - line / 2, width - 2 * GAP, height);
            } else {
                why.setVisible(false);
                Tooltip.install(band, new Tooltip(shown.gap()));
            }
        }
    }

    private void now(Plot shown, Field field, double line) {
        shown.now().ifPresent(share -> {
            if (share >= 0 && share <= 1) {
                double x = field.x(share);
                Region mark = part("plot-now");
                add(mark);
                mark.resizeRelocate(x, field.top(), 2, field.floor() - field.top());
                Label word = label("now");
                double width = word.prefWidth(-1);
                boolean room = x + GAP + width < field.right();
                word.resizeRelocate(room ? x + GAP : x - GAP - width, field.top() + 1, width, line);
            }
        });
    }

    private void lines(Plot shown, Field field) {
        for (Plot.Line each : shown.lines()) {
            for (int at = 0; at < each.places().size(); at++) {
                double x = field.x(each.places().get(at).x());
                double y = field.y(each.places().get(at).y());
                lines.getElements().add(at == 0 ? new MoveTo(x, y) : new LineTo(x, y));
            }
        }
        lines.toFront();
    }

    private void spots(Plot shown, Field field) {
        for (int at = 0; at < shown.spots().size(); at++) {
            Plot.Spot spot = shown.spots().get(at);
            int index = at;
            Region mark = part("plot-spot");
            mark.pseudoClassStateChanged(CHOSEN, spot.kind() == Plot.Kind.CHOSEN);
            mark.pseudoClassStateChanged(PRESENT, spot.kind() == Plot.Kind.PRESENT);
            add(mark);
            double size = spot.kind() == Plot.Kind.POINT ? SPOT : CHOSEN_SPOT;
            mark.resizeRelocate(field.x(spot.place().x()) - Math.floor(size / 2),
                    field.y(spot.place().y()) - Math.floor(size / 2), size, size);
            Tooltip.install(mark, new Tooltip(spot.words()));
            if (spot.kind() == Plot.Kind.PRESENT) {
                Label word = label("now");
                double width = word.prefWidth(-1);
                boolean room = mark.getLayoutX() + size + width + GAP < field.right();
                word.resizeRelocate(room ? mark.getLayoutX() + size + 2 : mark.getLayoutX() - 2 - width,
                        mark.getLayoutY(), width, size);
            } else {
                mark.setOnMouseClicked(event -> {
                    if (event.getButton() == MouseButton.PRIMARY) {
                        requestFocus();
                        chosen.accept(index);
                    }
                });
            }
        }
    }
}
