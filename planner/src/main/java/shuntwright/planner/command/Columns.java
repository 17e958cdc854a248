package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/** Text in aligned columns. */
final class Columns {
    private static final String GAP = "  ";

    private record Row(List<String> cells, UnaryOperator<String> paint) {}

    private final List<Row> rows = new ArrayList<>();
    private final List<Integer> widths = new ArrayList<>();
    private final int painted;

    /** @param painted index of the column that colours apply to */
    Columns(int painted) {
        this.painted = painted;
    }

    void add(List<String> cells) {
        add(cells, UnaryOperator.identity());
    }

    /** Adds a row whose painted column goes through {@code paint} once it has its width. */
    void add(List<String> cells, UnaryOperator<String> paint) {
        List<String> tame = cells.stream().map(Spelling::harmless).toList();
        rows.add(new Row(tame, paint));
        for (int i = 0; i < tame.size(); i++) {
            int width = width(tame.get(i));
            if (i == widths.size()) {
                widths.add(width);
            } else {
                widths.set(i, Math.max(widths.get(i), width));
            }
        }
    }

    List<String> lines() {
        return rows.stream().map(this::line).toList();
    }

    private String line(Row row) {
        StringBuilder line = new StringBuilder();
        for (int i = 0; i < row.cells().size(); i++) {
            String cell = row.cells().get(i);
            boolean last = i == row.cells().size() - 1;
            String padded = last ? cell : cell + " ".repeat(widths.get(i) - width(cell));
            line.append(i == painted ? row.paint().apply(padded) : padded).append(last ? "" : GAP);
        }
        return line.toString().stripTrailing();
    }

    private static int width(String text) {
        return text.codePointCount(0, text.length());
    }
}
