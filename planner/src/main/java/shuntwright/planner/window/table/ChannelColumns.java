package shuntwright.planner.window.table;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;

import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.util.Callback;

import shuntwright.planner.entry.ChannelField;

/** The columns of the channel table. */
final class ChannelColumns {
    private static final String WORDS = "words";
    private static final List<ChannelField> ASKED = List.of(ChannelField.ZONE, ChannelField.SIDE, ChannelField.RAIL,
            ChannelField.LOAD, ChannelField.NO_TRIP, ChannelField.MUST_TRIP, ChannelField.RELEASE,
            ChannelField.SOURCE);

    private final Function<ChannelField, TableCell<RowModel, CellEntry>> entryCells;
    private final List<TableColumn<RowModel, ?>> columns = new ArrayList<>();

    private ChannelColumns(Function<ChannelField, TableCell<RowModel, CellEntry>> entryCells) {
        this.entryCells = entryCells;
    }

    /** All columns, the fixed name column first. */
    static List<TableColumn<RowModel, ?>> all(Function<ChannelField, TableCell<RowModel, CellEntry>> entryCells) {
        ChannelColumns all = new ChannelColumns(entryCells);
        all.addColumns();
        return List.copyOf(all.columns);
    }

    /** What a column holds, as an explanation. */
    static String words(TableColumn<RowModel, ?> column) {
        return String.valueOf(column.getProperties().get(WORDS));
    }

    private void addColumns() {
        TableColumn<RowModel, ?> name = asked(ChannelField.NAME, 140);
        name.setReorderable(false);
        columns.add(name);
        columns.add(computed("Verdict",
                "whether the demand is met; \"was\" while something typed is not taken over or planned yet", 106,
                _ -> new VerdictCell(),
                Comparator.comparing(figures -> figures.verdict().map(Enum::ordinal).orElse(-1))));
        for (ChannelField field : ASKED) {
            columns.add(asked(field, switch (field) {
                case RAIL -> 128;
                case RELEASE -> 84;
                case SOURCE -> 84;
                case ZONE -> 90;
                case SIDE -> 46;
                case MUST_TRIP -> 72;
                default -> 64;
            }));
        }
        columns.add(figure("Shunt", "chosen shunts in parallel × resistance of one", 84, RowFigures::shunt));
        columns.add(figure("Gain", "of the chosen amplifier, V/V", 48, RowFigures::gain));
        columns.add(figure("Threshold", "nominal voltage at which the comparator trips", 74, RowFigures::threshold));
        columns.add(computed("Trip interval in its window",
                "limits (wide bar) and coverage interval (inner bar) of the trip current; the frame is no-trip to must-trip",
                206, _ -> new TripCell(), Comparator.comparing(
                        figures -> figures.trip().map(trip -> trip.limits().width()).orElse(-1.0))));
        columns.add(figure("Reading", "largest reading error at load current", 64, RowFigures::reading));
        columns.add(figure("Heat", "of the shunts at load current", 64, RowFigures::heat));
        columns.add(figure("Margin", "smallest distance of a limit from the end of its window, of the half-width", 66,
                RowFigures::margin));
        chosen("Shunt part", "part number of the chosen shunt", Chosen::shunt);
        chosen("Amplifier", "part number of the chosen amplifier", Chosen::amplifier);
        chosen("Comparator", "part number of the chosen comparator", Chosen::comparator);
        chosen("Hysteresis", "kind of hysteresis and the value that sets it", Chosen::hysteresis);
        chosen("Threshold from", "divider or tap that makes the threshold", Chosen::threshold);
        for (ChannelField field : ChannelField.values()) {
            if (field != ChannelField.NAME && !ASKED.contains(field)) {
                TableColumn<RowModel, ?> column = asked(field, 110);
                column.setVisible(false);
                columns.add(column);
            }
        }
    }

    private TableColumn<RowModel, CellEntry> asked(ChannelField field, double width) {
        TableColumn<RowModel, CellEntry> column = new TableColumn<>();
        head(column, field.title(), field.words() + ": " + field.hint(), width);
        column.setUserData(field);
        column.setEditable(true);
        column.setCellValueFactory(row -> row.getValue().entryProperty(field));
        column.setCellFactory(_ -> entryCells.apply(field));
        column.getStyleClass().add(field.isNumber() ? "number-column" : "word-column");
        return column;
    }

    private TableColumn<RowModel, RowFigures> figure(String title, String words, double width,
            Function<RowFigures, Figure> which) {
        TableColumn<RowModel, RowFigures> column = computed(title, words, width, _ -> new FigureCell(which),
                Comparator.comparing(which));
        column.getStyleClass().add("number-column");
        return column;
    }

    private void chosen(String title, String words, Function<Chosen, String> which) {
        TableColumn<RowModel, RowFigures> column = figure(title, words, 130,
                figures -> new Figure(which.apply(figures.chosen()), 0));
        column.getStyleClass().setAll("computed-column", "word-column");
        column.setCellFactory(_ -> FigureCell.ofWords(figures -> new Figure(which.apply(figures.chosen()), 0)));
        column.setVisible(false);
        columns.add(column);
    }

    private TableColumn<RowModel, RowFigures> computed(String title, String words, double width,
            Callback<TableColumn<RowModel, RowFigures>, TableCell<RowModel, RowFigures>> cells,
            Comparator<RowFigures> order) {
        TableColumn<RowModel, RowFigures> column = new TableColumn<>();
        head(column, title, words, width);
        column.setEditable(false);
        column.setCellValueFactory(row -> row.getValue().isEmptyRow()
                ? new SimpleObjectProperty<>()
                : row.getValue().figuresProperty());
        column.setCellFactory(cells);
        column.setComparator(Comparator.nullsLast(order));
        column.getStyleClass().add("computed-column");
        return column;
    }

    private static void head(TableColumn<RowModel, ?> column, String title, String words, double width) {
        column.setText(title);
        column.setPrefWidth(width);
        column.setMinWidth(40);
        column.setId("column-" + title.toLowerCase(Locale.ROOT).replaceAll("[^a-z]+", "-"));
        column.getProperties().put(WORDS, words);
    }

}
