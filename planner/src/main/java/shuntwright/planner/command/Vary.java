package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;
import shuntwright.board.Board;
import shuntwright.board.Zone;
import shuntwright.io.form.NearestWord;
import shuntwright.plan.WhatIf;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/**
 * What is varied.
 *
 * @param varied what kind of limit
 * @param zone   its name for a zone's heat limit; empty for the others
 */
record Vary(WhatIf.Varied varied, String zone) {

    private static final String WORDS = "heat limit, zone NAME heat limit, supply current or build quantity";
    private static final Pattern ZONE = Pattern.compile("zone\\s+(.+?)\\s+heat\\s+limit", Pattern.CASE_INSENSITIVE);
    /** As in the board's own field. */
    private static final int MOST_BOARDS = 10_000_000;

    /** Reads what is varied. */
    static final class Converter implements ITypeConverter<Vary> {
        @Override
        public Vary convert(String text) {
            String typed = text.strip();
            Matcher zone = ZONE.matcher(typed);
            if (zone.matches()) {
                return new Vary(WhatIf.Varied.ZONE_HEAT_LIMIT, zone.group(1));
            }
            return switch (typed.toLowerCase(Locale.ROOT).replaceAll("\\s+", " ")) {
                case "heat limit" -> new Vary(WhatIf.Varied.BOARD_HEAT_LIMIT, "");
                case "supply current" -> new Vary(WhatIf.Varied.SUPPLY_CURRENT, "");
                case "build quantity" -> new Vary(WhatIf.Varied.BUILD_QUANTITY, "");
                default -> throw new TypeConversionException("\"" + text + "\" cannot be varied; type " + WORDS + ".");
            };
        }
    }

    /** @throws BadInput when the board has no such zone */
    void check(Board board) {
        if (varied == WhatIf.Varied.ZONE_HEAT_LIMIT && board.zone(zone).isEmpty()) {
            throw new BadInput("--vary: "
                    + NearestWord.unknown("zone", zone, board.zones().stream().map(Zone::name).toList()));
        }
    }

    /** "zone port heat limit". */
    String words() {
        return switch (varied) {
            case BOARD_HEAT_LIMIT -> "heat limit";
            case ZONE_HEAT_LIMIT -> "zone " + zone + " heat limit";
            case SUPPLY_CURRENT -> "supply current";
            case BUILD_QUANTITY -> "build quantity";
        };
    }

    /** The value that the board has; empty where it has no such limit. */
    OptionalDouble now(Board board) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT -> board.heatLimit();
            case ZONE_HEAT_LIMIT -> board.zone(zone).map(Zone::heatLimit).orElseGet(OptionalDouble::empty);
            case SUPPLY_CURRENT -> OptionalDouble.of(board.supply().availableCurrent());
            case BUILD_QUANTITY -> OptionalDouble.of(board.buildQuantity());
        };
    }

    String show(double value) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT, ZONE_HEAT_LIMIT -> QuantityWriter.show(value, Dimension.POWER);
            case SUPPLY_CURRENT -> QuantityWriter.show(value, Dimension.CURRENT);
            case BUILD_QUANTITY -> Long.toString(Math.round(value)) + (value == 1 ? " board" : " boards");
        };
    }

    /**
     * Evenly spaced values, both ends included; of boards whole ones, each once.
     *
     * @param from  typed
     * @param to    typed
     * @param steps how many values
     * @throws BadInput when an end cannot be read or the ends are not in order
     */
    List<Double> values(String from, String to, int steps) {
        List<String> problems = new ArrayList<>();
        double low = read("--from", from, problems);
        double high = read("--to", to, problems);
        if (problems.isEmpty() && !(low < high)) {
            problems.add("--from " + show(low) + " must be below --to " + show(high) + "; exchange or change them");
        }
        if (!problems.isEmpty()) {
            throw new BadInput(problems);
        }
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < steps; i++) {
            double value = i == steps - 1 ? high : low + (high - low) * i / (steps - 1);
            double allowed = varied == WhatIf.Varied.BUILD_QUANTITY ? Math.rint(value) : value;
            if (values.isEmpty() || values.getLast() < allowed) {
                values.add(allowed);
            }
        }
        return List.copyOf(values);
    }

    private double read(String option, String text, List<String> problems) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT, ZONE_HEAT_LIMIT -> read(option, text, Dimension.POWER, problems);
            case SUPPLY_CURRENT -> read(option, text, Dimension.CURRENT, problems);
            case BUILD_QUANTITY -> boards(option, text, problems);
        };
    }

    private double read(String option, String text, Dimension dimension, List<String> problems) {
        return switch (QuantityReader.number(text, dimension)) {
            case Reading.Value<Double>(Double value) when value > 0 && Double.isFinite(value) -> value;
            case Reading.Value<Double>(Double value) -> {
                problems.add(option + ": the " + words() + " must be above 0 " + dimension.unit() + ", got "
                        + QuantityWriter.show(value, dimension) + "; type a larger value");
                yield Double.NaN;
            }
            case Reading.Misread<Double>(String problem) -> {
                problems.add(option + ": " + problem);
                yield Double.NaN;
            }
        };
    }

    private static double boards(String option, String text, List<String> problems) {
        try {
            int count = Integer.parseInt(text.strip());
            if (count >= 1 && count <= MOST_BOARDS) {
                return count;
            }
        } catch (NumberFormatException _) {
            // told below with the allowed range
        }
        problems.add(option + ": type a whole number of boards from 1 to " + MOST_BOARDS + ", got \"" + text.strip()
                + "\"");
        return Double.NaN;
    }
}
