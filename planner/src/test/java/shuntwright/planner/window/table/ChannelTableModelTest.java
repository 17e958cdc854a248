package shuntwright.planner.window.table;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

import shuntwright.plan.Verdict;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.window.table.ChannelTableModel.Spot;

class ChannelTableModelTest {
    private final BoardSession session = Sessions.of(HandMadeBoards.boat());
    private final ChannelTableModel model = new ChannelTableModel(session);

    private RowModel row(int at) {
        return model.shown().get(at);
    }

    private List<String> names() {
        return model.shown().stream().map(RowModel::name).toList();
    }

    @Test
    void aRowForEachChannelAndAnEmptyOneLast() {
        assertThat(names()).containsExactly("bilge pump", "windlass", "radar", "anchor light", "spare", "");
        assertThat(row(5).isEmptyRow()).isTrue();
        assertThat(row(1).entryProperty(ChannelField.ZONE).get().text()).isEqualTo("port");
        assertThat(model.shown()).extracting(row -> row.figuresProperty().get().verdict().orElse(Verdict.NO_FIT))
                .startsWith(Verdict.INSIDE, Verdict.INSIDE, Verdict.LIKELY, Verdict.OUTSIDE, Verdict.INCOMPLETE);
    }

    @Test
    void figuresAreWrittenForPeople() {
        RowFigures figures = row(0).figuresProperty().get();
        assertThat(figures.shunt().text()).isEqualTo("2 × 4 mΩ");
        assertThat(figures.gain().text()).isEqualTo("50");
        assertThat(figures.reading().text()).isEqualTo("±3.0 %");
        assertThat(figures.heat().text()).isEqualTo("800 mW");
        assertThat(row(3).figuresProperty().get().margin().text()).startsWith("−");
        assertThat(row(4).figuresProperty().get().shunt().text()).isEmpty();
    }

    @Test
    void figuresAreAsOfThenWhileAnEntryIsWrong() {
        assertThat(row(0).figuresProperty().get().stale()).isFalse();
        session.enter(new Place.Cell(0, ChannelField.LOAD), "twelve");
        assertThat(row(0).figuresProperty().get().stale()).isTrue();
        assertThat(row(0).figuresProperty().get().verdict()).contains(Verdict.INSIDE);
        assertThat(row(1).figuresProperty().get().stale()).isFalse();
        session.undo();
        assertThat(row(0).figuresProperty().get().stale()).isFalse();
    }

    @Test
    void rowsKeepTheirIdentityWhenOthersComeAndGo() {
        RowModel radar = row(2);
        session.selectionProperty().set(List.of(0));
        session.removeSelected();
        assertThat(row(1)).isSameAs(radar);
        session.undo();
        assertThat(row(2)).isSameAs(radar);
        assertThat(names()).startsWith("bilge pump", "windlass", "radar");
    }

    @Test
    void theFilterLeavesTheEmptyRow() {
        model.filterProperty().set("RA");
        assertThat(names()).containsExactly("radar", "");
        model.enter(new Spot(RowModel.EMPTY_ROW, ChannelField.NAME), "horn");
        assertThat(model.filterProperty().get()).as("filter after adding").isEmpty();
        assertThat(names()).endsWith("horn", "");
    }

    @Test
    void oneTextGoesIntoSeveralCellsAsOneEdit() {
        List<Spot> spots = List.of(new Spot(0, ChannelField.ZONE), new Spot(2, ChannelField.ZONE),
                new Spot(RowModel.EMPTY_ROW, ChannelField.ZONE));
        model.enterAll(spots, "starboard");
        assertThat(row(2).entryProperty(ChannelField.ZONE).get().text()).isEqualTo("starboard");
        assertThat(session.undoNameProperty().get()).isEqualTo("zone of 2 channels");
        session.undo();
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
    }

    @Test
    void clearingLeavesNames() {
        model.clear(List.of(new Spot(0, ChannelField.NAME), new Spot(0, ChannelField.LOAD)));
        assertThat(names()).startsWith("bilge pump");
        assertThat(row(0).entryProperty(ChannelField.LOAD).get().text()).isEmpty();
    }

    @Test
    void blocksGoToASpreadsheetAndBack() {
        List<ChannelField> fields = List.of(ChannelField.NAME, ChannelField.LOAD, ChannelField.MUST_TRIP);
        String block = model.copy(List.of(0, 1), fields);
        assertThat(block).isEqualTo("bilge pump\t20 A\t31 A\nwindlass\t12 A\t18 A\n");
        model.paste(block.replace("bilge pump", "horn").replace("windlass", "siren"),
                List.of(4, RowModel.EMPTY_ROW), fields);
        assertThat(names()).endsWith("horn", "siren", "");
        assertThat(row(5).entryProperty(ChannelField.LOAD).get().text()).isEqualTo("12 A");
        assertThat(session.undoNameProperty().get()).isEqualTo("paste 2 rows");
    }

    @Test
    void aWrongTextShowsItsReasonAndSortsWithItsLastGoodValue() {
        model.enter(new Spot(0, ChannelField.LOAD), "lots");
        CellEntry entry = row(0).entryProperty(ChannelField.LOAD).get();
        assertThat(entry.text()).isEqualTo("lots");
        assertThat(entry.reason()).isPresent();
        assertThat(entry.key()).isEqualTo(20);
        assertThat(row(1).entryProperty(ChannelField.LOAD).get()).isLessThan(entry);
    }

    @Test
    void theDrawingPutsTheWindowAtOneOnEitherSide() {
        TripDrawing drawing = row(3).figuresProperty().get().trip().orElseThrow();
        double target = Math.sqrt(4.95 * 5.05);
        assertThat(drawing.limits().min()).isCloseTo((target * 0.97 - 5) / 0.05, within(1e-9));
        assertThat(drawing.limits().max()).isCloseTo((target * 1.03 - 5) / 0.05, within(1e-9));
        assertThat(drawing.words()).contains("allowed are 4.95 A to 5.05 A");
    }

    private static org.assertj.core.data.Offset<Double> within(double offset) {
        return org.assertj.core.api.Assertions.within(offset);
    }
}
