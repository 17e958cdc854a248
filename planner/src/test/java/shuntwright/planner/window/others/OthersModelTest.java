package shuntwright.planner.window.others;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeParts;
import shuntwright.planner.Sessions;
import shuntwright.planner.session.BoardSession;

class OthersModelTest {
    private final BoardSession session = Sessions.chosen(HandMadeBoards.boat());
    private final OthersModel model = new OthersModel(session, Sessions.exploring());

    @Test
    void eachChoiceStandsWithTheSumsOfTheWholeBoardAgainstNow() {
        session.selectionProperty().set(List.of(1));
        assertThat(model.rows()).isEmpty();
        assertThat(model.emptyProperty().get()).startsWith("Not looked for yet");
        model.ask();
        assertThat(model.rows()).extracting(OtherRow::number).containsExactly("now", "1", "2", "3");
        assertThat(model.rows()).extracting(OtherRow::shunt).containsExactly("2 × 4 mΩ SH-4M", "3 × 4 mΩ SH-4M",
                "4 × 4 mΩ SH-4M", "5 × 4 mΩ SH-4M");
        assertThat(model.rows()).extracting(row -> row.heat().value()).containsExactly("1.128 W", "2.700 W", "2.500 W",
                "2.300 W");
        assertThat(model.rows()).extracting(row -> row.heat().difference()).containsExactly("", "+1.572 W", "+1.372 W",
                "+1.172 W");
        assertThat(model.rows()).extracting(row -> row.parts().difference()).containsExactly("", "same", "+1", "+2");
        assertThat(model.rows()).extracting(OtherRow::broken).containsExactly("", "", "", "supply");
        // packs of ten at 0.60: 5 shunts take one pack, 15 two
        assertThat(model.rows().get(0).cost().value()).isEqualTo("6.00 EUR");
        assertThat(model.rows().get(1).cost().difference()).isEqualTo("+6.00 EUR");
        assertThat(model.saidProperty().get()).startsWith("3 other choices for windlass, found in ");
    }

    @Test
    void aChoiceIsPinnedByOneEdit() {
        session.selectionProperty().set(List.of(1));
        model.ask();
        model.pin(model.rows().get(2));
        assertThat(session.state().board().channels().get(1).pins().shunt())
                .contains(HandMadeParts.SHUNT.partNumber());
        assertThat(session.state().board().channels().get(1).pins().shuntCount()).hasValue(4);
        assertThat(session.state().board().channels().get(0)).isEqualTo(HandMadeBoards.boat().channels().get(0));
        assertThat(session.undoNameProperty().get()).isEqualTo("pin 4 × 4 mΩ SH-4M and AMP-50 (windlass)");
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
    }

    @Test
    void whatTheChannelHasAndWhatIsOfAnEarlierBoardCannotBePinned() {
        session.selectionProperty().set(List.of(1));
        model.ask();
        model.pin(model.rows().getFirst());
        assertThat(session.undoNameProperty().get()).isEmpty();
        session.addChannel("horn");
        session.selectionProperty().set(List.of(1));
        assertThat(model.pinnable(model.rows().get(1))).isFalse();
        model.pin(model.rows().get(1));
        assertThat(session.undoNameProperty().get()).isEqualTo("add horn");
        assertThat(model.saidProperty().get()).contains("look again");
    }

    @Test
    void choicesOfOneChannelAreNotShownForAnother() {
        session.selectionProperty().set(List.of(1));
        model.ask();
        session.selectionProperty().set(List.of(0));
        assertThat(model.rows()).isEmpty();
        session.selectionProperty().set(List.of(1));
        assertThat(model.rows()).hasSize(4);
        session.selectionProperty().set(List.of(4));
        assertThat(model.possibleBinding().get()).isFalse();
        assertThat(model.emptyProperty().get()).isEqualTo("Nothing could be chosen for spare; see its findings.");
        session.selectionProperty().set(List.of());
        assertThat(model.emptyProperty().get()).startsWith("Select a channel");
    }
}
