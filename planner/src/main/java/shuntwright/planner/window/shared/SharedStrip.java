package shuntwright.planner.window.shared;

import java.util.List;

import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

import org.controlsfx.control.PopOver;

/** The strip of shared things; a click opens the editor. */
public final class SharedStrip {
    private static final PseudoClass OVER = PseudoClass.getPseudoClass("over");

    private final SharedStripModel model;
    private final FlowPane strip = new FlowPane();
    private final PopOver popOver = new PopOver();

    public SharedStrip(SharedStripModel model) {
        this.model = model;
        strip.getStyleClass().add("shared-strip");
        strip.setId("shared-strip");
        popOver.setDetachable(false);
        popOver.setAnimated(false);
        popOver.setArrowLocation(PopOver.ArrowLocation.TOP_CENTER);
        model.tiles().addListener((ListChangeListener<SharedTile>) _ -> show());
        show();
    }

    /** The control for the window. */
    public Region node() {
        return strip;
    }

    /** Closes the editor, if it is open. */
    public void closeEditor() {
        popOver.hide(javafx.util.Duration.ZERO);
    }

    private void show() {
        List<SharedTile> tiles = model.tiles();
        // buttons are kept where they can be, so that an open editor keeps its owner
        while (strip.getChildren().size() > tiles.size()) {
            strip.getChildren().removeLast();
        }
        for (int at = 0; at < tiles.size(); at++) {
            if (at == strip.getChildren().size()) {
                strip.getChildren().add(new Button());
            }
            if (strip.getChildren().get(at) instanceof Button button) {
                fill(button, tiles.get(at));
            }
        }
    }

    private void fill(Button button, SharedTile tile) {
        button.getStyleClass().setAll("button", "shared-tile");
        Label title = new Label(tile.note().isEmpty() ? tile.title() : tile.title() + ", " + tile.note());
        title.getStyleClass().add("tile-title");
        Label value = new Label(tile.well()
                ? tile.value()
                : "✕ " + tile.value() + (tile.wrong().isPresent() ? " – wrong entry" : ""));
        value.getStyleClass().add("tile-value");
        VBox box = new VBox(title, value);
        box.setFillWidth(true);
        if (tile.share().isPresent()) {
            ProgressBar bar = new ProgressBar(Math.clamp(tile.share().getAsDouble(), 0, 1));
            bar.getStyleClass().add("use-bar");
            bar.pseudoClassStateChanged(OVER, !tile.holds());
            bar.setMaxWidth(Double.MAX_VALUE);
            bar.setFocusTraversable(false);
            box.getChildren().add(bar);
        }
        button.setGraphic(box);
        button.setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        button.setAccessibleText(tile.words() + ". Opens its editor.");
        button.pseudoClassStateChanged(OVER, !tile.well());
        Tooltip tip = new Tooltip(tile.words());
        tip.setWrapText(true);
        tip.setMaxWidth(520);
        button.setTooltip(tip);
        button.setOnAction(_ -> {
            popOver.setTitle(tile.title());
            popOver.setContentNode(new BoardFieldEditor(model.session(), tile.fields(), tile.details()).node());
            popOver.getRoot().getStylesheets().setAll(strip.getScene().getStylesheets());
            popOver.show(button);
        });
    }
}
