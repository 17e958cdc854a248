package shuntwright.planner.window;

import javafx.css.PseudoClass;
import javafx.scene.Node;

/** Sizes of all text; the style sheet says how large each is. */
enum TextSize {
    SMALL, NORMAL, LARGE, LARGER, LARGEST;

    TextSize larger() {
        return switch (this) {
            case SMALL -> NORMAL;
            case NORMAL -> LARGE;
            case LARGE -> LARGER;
            case LARGER, LARGEST -> LARGEST;
        };
    }

    TextSize smaller() {
        return switch (this) {
            case SMALL, NORMAL -> SMALL;
            case LARGE -> NORMAL;
            case LARGER -> LARGE;
            case LARGEST -> LARGER;
        };
    }

    void show(Node root) {
        for (TextSize each : values()) {
            root.pseudoClassStateChanged(
                    PseudoClass.getPseudoClass("text-" + each.name().toLowerCase(java.util.Locale.ROOT)),
                    each == this);
        }
    }
}
