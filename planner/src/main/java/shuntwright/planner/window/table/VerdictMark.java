package shuntwright.planner.window.table;

import java.util.Optional;

import javafx.css.PseudoClass;
import javafx.scene.layout.Region;

import shuntwright.plan.Verdict;

/** A shape for each verdict; colour and shape are the style sheet's. */
public final class VerdictMark extends Region {
    /** Sets the mark without a verdict. */
    public VerdictMark() {
        getStyleClass().add("verdict-mark");
        setMinSize(USE_PREF_SIZE, USE_PREF_SIZE);
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
    }

    /** Shows a verdict, or nothing. */
    public void show(Optional<Verdict> verdict) {
        for (Verdict each : Verdict.values()) {
            pseudoClassStateChanged(pseudoClass(each), verdict.equals(Optional.of(each)));
        }
        setVisible(verdict.isPresent());
    }

    /** The style sheet's name of a verdict. */
    public static PseudoClass pseudoClass(Verdict verdict) {
        return PseudoClass.getPseudoClass(verdict.word().replace(' ', '-'));
    }
}
