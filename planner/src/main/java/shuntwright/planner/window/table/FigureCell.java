package shuntwright.planner.window.table;

import javafx.css.PseudoClass;
import javafx.scene.control.TableCell;

import org.jspecify.annotations.Nullable;

/** A computed figure; faded while it belongs to an earlier state of the channel. */
final class FigureCell extends TableCell<RowModel, RowFigures> {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final java.util.function.Function<RowFigures, Figure> which;

    /** A computed cell of words, which stand to the left and may be longer than the cell. */
    static FigureCell ofWords(java.util.function.Function<RowFigures, Figure> which) {
        FigureCell cell = new FigureCell(which);
        cell.getStyleClass().remove("figure-cell");
        return cell;
    }

    FigureCell(java.util.function.Function<RowFigures, Figure> which) {
        this.which = which;
        getStyleClass().addAll("figure-cell", "computed");
    }

    @Override
    protected void updateItem(@Nullable RowFigures figures, boolean empty) {
        super.updateItem(figures, empty);
        if (empty || figures == null) {
            setText(null);
            pseudoClassStateChanged(STALE, false);
        } else {
            setText(which.apply(figures).text());
            pseudoClassStateChanged(STALE, figures.stale());
        }
    }
}
