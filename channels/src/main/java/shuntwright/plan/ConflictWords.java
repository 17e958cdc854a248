package shuntwright.plan;

import static shuntwright.quantity.QuantityWriter.show;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.quantity.Dimension;
import shuntwright.selection.Conflicts;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Watch;

/** Says which demands of a board cannot be met together, and what each would have to be. */
final class ConflictWords {

    /** Must-trip currents are tried up to this many times what is demanded. */
    private static final double MOST_FACTOR = 2;
    private static final int BISECTIONS = 7;
    /** Channels of a conflict whose must-trip current is tried. */
    private static final int MOST_CHANNELS = 4;
    /** Values are rounded up to this many digits. */
    private static final int DIGITS = 4;

    private final Board board;
    private final ChoiceModel model;
    private final Rechoice rechoice;
    private final long seed;
    private final Watch watch;

    /** Whether the board with another channel can keep all its shared limits. */
    interface Rechoice {
        boolean possible(Channel before, Channel after);
    }

    private ConflictWords(Board board, ChoiceModel model, Rechoice rechoice, Watch watch) {
        this.board = board;
        this.model = model;
        this.rechoice = rechoice;
        this.seed = board.preference().seed();
        this.watch = watch;
    }

    static Optional<Conflict> of(Board board, ChoiceModel model, Prover prover, Rechoice rechoice, Watch watch) {
        ConflictWords words = new ConflictWords(board, model, rechoice, watch);
        return Conflicts.find(model.selection(), prover, board.preference().seed(), watch).map(words::conflict);
    }

    private Conflict conflict(Conflicts.Core core) {
        List<Conflict.Member> members = new ArrayList<>();
        core.limits().forEach(r -> members.add(limit(r)));
        int tried = 0;
        for (int slot : core.slots()) {
            String name = model.selection().slots().get(slot).name();
            Optional<Channel> channel = board.channels().stream().filter(each -> each.name().equals(name)).findFirst();
            if (channel.isPresent() && model.isChannel(slot)) {
                members.add(channel(channel.get(), tried++ < MOST_CHANNELS));
            } else {
                members.add(new Conflict.Member(Conflict.Kind.TAP, name, "one voltage for its channels",
                        OptionalDouble.empty(),
                        OptionalDouble.empty(), Dimension.VOLTAGE));
            }
        }
        return new Conflict(members, core.minimal(), words(core));
    }

    private Conflict.Member limit(int resource) {
        Selection.Resource each = model.selection().resources().get(resource);
        OptionalDouble needed = Conflicts.needed(model.selection(), resource, seed, watch);
        return new Conflict.Member(Conflict.Kind.SHARED_LIMIT, each.name(),
                model.isHeat(resource) ? "heat limit" : "available current", each.limit(),
                needed.isPresent() ? OptionalDouble.of(roundedUp(needed.getAsDouble())) : OptionalDouble.empty(),
                dimension(resource));
    }

    private Dimension dimension(int resource) {
        return model.isHeat(resource) ? Dimension.POWER : Dimension.CURRENT;
    }

    private Conflict.Member channel(Channel channel, boolean tried) {
        double now = channel.currents().mustTrip().orElseThrow();
        return new Conflict.Member(Conflict.Kind.CHANNEL, channel.name(), "must-trip current", OptionalDouble.of(now),
                tried ? relaxed(channel, now) : OptionalDouble.empty(), Dimension.CURRENT);
    }

    private OptionalDouble relaxed(Channel channel, double now) {
        if (!possible(channel, now * MOST_FACTOR)) {
            return OptionalDouble.empty();
        }
        double no = now;
        double yes = now * MOST_FACTOR;
        for (int i = 0; i < BISECTIONS; i++) {
            double middle = Math.sqrt(no * yes);
            if (possible(channel, middle)) {
                yes = middle;
            } else {
                no = middle;
            }
        }
        double rounded = roundedUp(yes);
        return OptionalDouble.of(possible(channel, rounded) ? rounded : yes);
    }

    private boolean possible(Channel channel, double mustTrip) {
        Channel.Currents c = channel.currents();
        return rechoice.possible(channel, channel.withCurrents(new Channel.Currents(c.load(), c.noTrip(),
                OptionalDouble.of(mustTrip), c.tripTarget(), c.least(), c.fullScale())));
    }

    private static double roundedUp(double value) {
        if (!(value > 0)) {
            return value;
        }
        double unit = Math.pow(10, Math.floor(Math.log10(value)) - DIGITS + 1);
        double up = Math.ceil(value / unit - 1e-6) * unit;
        // As it will be read: the shortest decimal of so many digits.
        return Double.parseDouble(String.format(java.util.Locale.ROOT, "%." + (DIGITS - 1) + "e", up));
    }

    private String words(Conflicts.Core core) {
        List<String> limits = new ArrayList<>();
        for (int r : core.limits()) {
            Selection.Resource each = model.selection().resources().get(r);
            double least = Conflicts.leastUse(model.selection().with(core.slots(), core.limits()), r);
            limits.add(each.name() + ": allowed " + show(each.most(), dimension(r)) + ", these take at least "
                    + show(least, dimension(r)));
        }
        List<String> names = core.slots().stream().map(slot -> model.selection().slots().get(slot).name()).toList();
        String who = names.size() == 1 ? "\"" + names.getFirst() + "\"" : "\"" + String.join("\", \"", names) + "\"";
        return (core.limits().size() == 1
                ? "Whatever is chosen for " + who + ", the limit cannot be kept: "
                : "Each limit alone could be kept, but not all of them together for " + who + ": ")
                + String.join("; ", limits) + "."
                + (core.minimal()
                        ? " Without any one of these demands the others can be met."
                        : " It is not proven that all of them are needed for the conflict.");
    }
}
