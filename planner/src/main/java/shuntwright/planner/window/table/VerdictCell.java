package shuntwright.planner.window.table;

import javafx.css.PseudoClass;
import javafx.scene.control.TableCell;
import javafx.scene.control.Tooltip;

import org.jspecify.annotations.Nullable;

/** The verdict by shape, colour and word, with the most serious finding as a tip. */
final class VerdictCell extends TableCell<RowModel, RowFigures> {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final VerdictMark mark = new VerdictMark();
    private final Tooltip tip = new Tooltip();

    VerdictCell() {
        getStyleClass().add("verdict-cell");
        tip.setWrapText(true);
        tip.setMaxWidth(420);
    }

    @Override
    protected void updateItem(@Nullable RowFigures figures, boolean empty) {
        super.updateItem(figures, empty);
        if (empty || figures == null || figures.verdict().isEmpty()) {
            setText(null);
            setGraphic(null);
            setTooltip(null);
            pseudoClassStateChanged(STALE, false);
            return;
        }
        mark.show(figures.verdict());
        setGraphic(mark);
        setText((figures.stale() ? "was " : "") + figures.verdict().get().word());
        pseudoClassStateChanged(STALE, figures.stale());
        String words = figures.stale() ? "As of the last good entries. " + figures.first() : figures.first();
        tip.setText(words);
        setTooltip(words.isBlank() ? null : tip);
        setAccessibleText("Verdict " + figures.verdict().get().word() + ". " + words);
    }
}
