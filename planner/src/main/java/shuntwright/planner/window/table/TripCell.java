package shuntwright.planner.window.table;

import javafx.css.PseudoClass;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.TableCell;
import javafx.scene.control.Tooltip;

import org.jspecify.annotations.Nullable;

/** The trip interval drawn inside its allowed window. */
final class TripCell extends TableCell<RowModel, RowFigures> {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final IntervalBar bar = new IntervalBar();
    private final Tooltip tip = new Tooltip();

    TripCell() {
        getStyleClass().addAll("trip-cell", "computed");
        setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        tip.setWrapText(true);
        tip.setMaxWidth(420);
    }

    @Override
    protected void updateItem(@Nullable RowFigures figures, boolean empty) {
        super.updateItem(figures, empty);
        if (empty || figures == null || figures.trip().isEmpty()) {
            setGraphic(null);
            setTooltip(null);
            setAccessibleText(null);
            return;
        }
        TripDrawing drawing = figures.trip().get();
        bar.show(drawing, figures.verdict());
        pseudoClassStateChanged(STALE, figures.stale());
        setGraphic(bar);
        tip.setText(drawing.words());
        setTooltip(tip);
        setAccessibleText(drawing.words());
    }
}
