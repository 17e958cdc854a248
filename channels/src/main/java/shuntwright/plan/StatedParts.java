package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.PartKind;
import shuntwright.accuracy.Slot;
import shuntwright.board.Board;
import shuntwright.board.StatedDistribution;
import shuntwright.parts.Catalogue;

/** Parts whose distributions a board states. */
final class StatedParts {

    private StatedParts() {
    }

    /** Statements that are for no part of the catalogue and so would be silently without effect. */
    static List<Finding> unknown(Board board, Catalogue catalogue) {
        List<Finding> findings = new ArrayList<>();
        for (StatedDistribution stated : board.uncertainty().stated()) {
            Optional<PartKind> kind = Slot.of(stated.input()).flatMap(Slot::part);
            if (stated.part().isPresent() && kind.isPresent() && catalogue.parts().stream()
                    .noneMatch(each -> kind.get().type().isInstance(each) && stated.names(each.partNumber()))) {
                findings.add(Findings.board(Finding.Key.UNKNOWN_PART, "The distribution of \"" + stated.input()
                        + "\" is stated for the part \"" + stated.part().get() + "\", but the parts files hold no "
                        + kind.get().words() + " of that number. Correct the number, or add the parts file that holds "
                        + "it.", List.of()));
            }
        }
        return findings;
    }
}
