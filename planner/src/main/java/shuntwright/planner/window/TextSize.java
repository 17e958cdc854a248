package shuntwright.planner.window;

import javafx.css.PseudoClass;
import javafx.scene.Node;

/** Sizes of all text; the style sheet says how large each is. */
enum TextSize {
    SMALL, NORMAL, LARGE, LARGER, LARGEST;

    void show(Node root) {
        for (TextSize each : values()) {
            root.pseudoClassStateChanged(
                    PseudoClass.getPseudoClass("text-" + each.name().toLowerCase(java.util.Locale.ROOT)),
                    each == this);
        }
    }
}
