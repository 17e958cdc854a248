package shuntwright.planner.window.choice;

import javafx.css.PseudoClass;
import javafx.scene.layout.Region;

import shuntwright.plan.Reached;

/** A shape for each proof; colour and shape are the style sheet's. */
final class ProofMark extends Region {
    ProofMark(Reached.Proof proof) {
        getStyleClass().add("proof-mark");
        setMinSize(USE_PREF_SIZE, USE_PREF_SIZE);
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        pseudoClassStateChanged(PseudoClass.getPseudoClass(switch (proof) {
            case PROVEN -> "proven";
            case BOUNDED -> "bounded";
            case OPEN -> "open";
        }), true);
    }
}
