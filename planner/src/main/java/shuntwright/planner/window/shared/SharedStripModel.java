package shuntwright.planner.window.shared;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

import shuntwright.board.Board;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SharedUse;
import shuntwright.plan.TapPlan;
import shuntwright.planner.entry.BoardField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.session.Planned;
import shuntwright.planner.session.WrongEntry;
import shuntwright.planner.work.PlanSampling;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** What the channels share, with use and limit. */
public final class SharedStripModel {
    private final BoardSession session;
    private final ObservableList<SharedTile> tiles = FXCollections.observableArrayList();

    public SharedStripModel(BoardSession session) {
        this.session = session;
        session.stateProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        session.sampling().stateProperty().subscribe(this::refresh);
        refresh();
    }

    ObservableList<SharedTile> tiles() {
        return tiles;
    }

    BoardSession session() {
        return session;
    }

    private void refresh() {
        Board board = session.state().board();
        Optional<Plan> plan = session.plannedProperty().get().map(Planned::plan);
        List<SharedTile> all = new ArrayList<>();
        all.add(supply(board, plan));
        all.addAll(references(board, plan));
        all.addAll(heat(board, plan));
        all.add(alerts(board, plan));
        taps(board, plan).ifPresent(all::add);
        all.add(new SharedTile("Ambient", QuantityWriter.show(board.ambient(), Dimension.TEMPERATURE, 3),
                OptionalDouble.empty(), true, List.of(BoardField.AMBIENT)));
        all.add(new SharedTile("Accepted", switch (board.acceptance().basis()) {
            case LIMITS -> "inside by limits";
            case COVERAGE -> "likely too, " + QuantityWriter.show(board.acceptance().coverage(), Dimension.RATIO);
        }, OptionalDouble.empty(), true, List.of(BoardField.BASIS, BoardField.COVERAGE)));
        all.add(ChoiceTile.of(board, plan));
        plan.flatMap(each -> inside(each, session.sampling().stateProperty().get())).ifPresent(all::add);
        all.add(new SharedTile("Board and build", board.buildQuantity() == 1
                ? "1 board"
                : board.buildQuantity() + " boards"
                        + plan.map(SharedStripModel::cost).orElse(""),
                OptionalDouble.empty(), true,
                List.of(BoardField.NAME, BoardField.BUILD_QUANTITY, BoardField.PARALLEL_SHUNTS,
                        BoardField.POWER_MARGIN, BoardField.HEAT_STEP)));
        all.replaceAll(tile -> tile.withWrong(tile.fields().stream()
                .flatMap(field -> session.state().wrong(new Place.OfBoard(field)).stream()).map(WrongEntry::reason)
                .findFirst()));
        if (!all.equals(tiles)) {
            tiles.setAll(all);
        }
    }

    /** Empty for a board without circuits. */
    private static Optional<SharedTile> inside(Plan plan, PlanSampling.State state) {
        if (plan.channels().stream().allMatch(each -> each.solved().isEmpty())) {
            return Optional.empty();
        }
        return Optional.of(plan.study().map(YieldTile::of).orElseGet(() -> YieldTile.without(state)));
    }

    private static String cost(Plan plan) {
        return plan.parts().isEmpty()
                ? ""
                : String.format(java.util.Locale.ROOT, ", %.2f %s each", plan.costPerBoard(),
                        plan.currency());
    }

    private static SharedTile supply(Board board, Optional<Plan> plan) {
        String voltage = QuantityWriter.write(board.supply().voltage(), Dimension.VOLTAGE);
        List<BoardField> fields = List.of(BoardField.SUPPLY_VOLTAGE, BoardField.SUPPLY_CURRENT);
        return use(plan, SharedUse.Kind.SUPPLY).stream().findFirst().map(use -> tile("Supply " + voltage, use, fields))
                .orElseGet(() -> new SharedTile("Supply " + voltage,
                        QuantityWriter.show(board.supply().availableCurrent(), Dimension.CURRENT, 3) + " available",
                        OptionalDouble.empty(), true, fields));
    }

    private static List<SharedTile> references(Board board, Optional<Plan> plan) {
        List<BoardField> fields = List.of(BoardField.REFERENCES);
        List<SharedUse> uses = use(plan, SharedUse.Kind.REFERENCE);
        if (board.references().isEmpty()) {
            return List.of(new SharedTile("References", "none", OptionalDouble.empty(), true, fields));
        }
        return uses.isEmpty()
                ? board.references().stream().map(each -> new SharedTile("Reference " + each.name(), each.part(),
                        OptionalDouble.empty(), true, fields)).toList()
                : uses.stream().map(use -> tile(capital(use.name()), use, fields)).toList();
    }

    private static List<SharedTile> heat(Board board, Optional<Plan> plan) {
        List<BoardField> fields = List.of(BoardField.HEAT_LIMIT, BoardField.ZONES);
        List<SharedTile> all = new ArrayList<>();
        use(plan, SharedUse.Kind.BOARD_HEAT).forEach(use -> all.add(tile("Heat", use, fields)));
        use(plan, SharedUse.Kind.ZONE_HEAT).forEach(use -> all.add(tile(capital(use.name()), use, fields)));
        if (all.isEmpty()) {
            all.add(new SharedTile("Heat", board.heatLimit().isPresent()
                    ? "limit " + QuantityWriter.show(board.heatLimit().getAsDouble(), Dimension.POWER, 3)
                    : "no limit", OptionalDouble.empty(), true, fields));
        }
        return all;
    }

    private static SharedTile alerts(Board board, Optional<Plan> plan) {
        List<AlertPlan> alerts = plan.map(Plan::alerts).orElse(List.of());
        List<BoardField> fields = List.of(BoardField.ALERT_LINES);
        if (alerts.isEmpty()) {
            return new SharedTile("Alert lines", board.alertLines().isEmpty()
                    ? "none"
                    : Integer.toString(board.alertLines().size()), OptionalDouble.empty(), true, fields);
        }
        AlertPlan first = alerts.getFirst();
        String value = first.line().name() + " " + QuantityWriter.show(first.pullUp(), Dimension.RESISTANCE, 3)
                + (alerts.size() > 1 ? " and " + (alerts.size() - 1) + " more" : "");
        boolean holds = alerts.stream().allMatch(each -> each.allowed().isPresent());
        return new SharedTile("Alert pull-up", holds ? value : value + " – no value fits", OptionalDouble.empty(),
                holds, fields).withDetails(alerts.stream().map(SharedStripModel::line).toList());
    }

    private static String line(AlertPlan alert) {
        return alert.line().name() + ": pull-up " + QuantityWriter.show(alert.pullUp(), Dimension.RESISTANCE, 3)
                + alert.allowed().map(range -> " (" + QuantityWriter.show(range, Dimension.RESISTANCE, 3) + " allowed)")
                        .orElse(" (no value fits)")
                + ", " + counted(alert.channels());
    }

    private static Optional<SharedTile> taps(Board board, Optional<Plan> plan) {
        if (board.taps().isEmpty()) {
            return Optional.empty();
        }
        List<TapPlan> taps = plan.map(Plan::taps).orElse(List.of());
        String value = taps.isEmpty()
                ? Integer.toString(board.taps().size())
                : tap(taps.getFirst())
                        + (taps.size() > 1 ? " and " + (taps.size() - 1) + " more" : "");
        return Optional.of(new SharedTile("Taps", value, OptionalDouble.empty(),
                taps.stream().allMatch(each -> each.threshold().isPresent() || each.channels().isEmpty()), List.of())
                .withDetails(java.util.stream.Stream.concat(taps.stream().map(each -> tap(each) + " from "
                        + each.tap().source().word() + ", " + counted(each.channels())),
                        java.util.stream.Stream.of("Taps are made and changed in the board file.")).toList()));
    }

    private static String tap(TapPlan tap) {
        return tap.tap().name() + tap.threshold()
                .map(made -> " " + QuantityWriter.show(made.nominalVoltage(), Dimension.VOLTAGE, 4))
                .orElse(tap.channels().isEmpty() ? " unused" : " – no voltage fits");
    }

    private static String counted(List<String> channels) {
        return switch (channels.size()) {
            case 0 -> "no channel";
            case 1 -> channels.getFirst();
            default -> channels.size() + " channels: " + String.join(", ", channels.stream().limit(3).toList())
                    + (channels.size() > 3 ? " …" : "");
        };
    }

    private static List<SharedUse> use(Optional<Plan> plan, SharedUse.Kind kind) {
        return plan.map(Plan::shared).orElse(List.of()).stream().filter(use -> use.kind() == kind).toList();
    }

    private static SharedTile tile(String title, SharedUse use, List<BoardField> fields) {
        String used = QuantityWriter.show(use.used(), use.dimension(), 3);
        return use.limit().isEmpty()
                ? new SharedTile(title, used + ", no limit", OptionalDouble.empty(), true, fields)
                : new SharedTile(title,
                        used + " of " + QuantityWriter.show(use.limit().getAsDouble(), use.dimension(), 3),
                        OptionalDouble.of(use.used() / use.limit().getAsDouble()), use.holds(), fields);
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }
}
