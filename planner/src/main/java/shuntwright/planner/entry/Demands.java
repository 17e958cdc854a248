package shuntwright.planner.entry;

import java.util.List;
import java.util.Locale;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Channel.Side;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/** Readers and writers of the demands that are words rather than numbers. */
final class Demands {
    private static final String TAP = "tap ";

    private Demands() {
    }

    static Reading<Channel> name(String text, ChannelField.At at) {
        String name = text.strip();
        if (name.isEmpty()) {
            return Reading.misread("A channel needs a name.");
        }
        boolean taken = at.board().channels().stream().map(Channel::name)
                .anyMatch(other -> other.equals(name) && !other.equals(at.channel().name()));
        return taken
                ? Reading.misread("Another channel is called \"" + name + "\" already. Type a name of its own.")
                : Reading.value(at.channel().withName(name));
    }

    static String side(Side side) {
        return switch (side) {
            case HIGH -> "high";
            case LOW -> "low";
        };
    }

    static Reading<Channel> withSide(String text, ChannelField.At at) {
        return switch (Words.plain(text)) {
            case "high", "h", "hi" -> Reading.value(at.channel().withSide(Side.HIGH));
            case "low", "l", "lo" -> Reading.value(at.channel().withSide(Side.LOW));
            default -> Reading.misread("The shunt stands on the high or the low side; type high or low.");
        };
    }

    static String release(ReleaseDemand release) {
        return switch (release) {
            case ReleaseDemand.Between _ -> "auto";
            case ReleaseDemand.Window(var window) -> QuantityWriter.write(window, Dimension.CURRENT);
            case ReleaseDemand.Latch _ -> "latch";
        };
    }

    static Reading<Channel> withRelease(String text, ChannelField.At at) {
        return switch (Words.plain(text)) {
            case "", "auto", "between" -> Reading.value(at.channel().withRelease(new ReleaseDemand.Between()));
            case "latch", "latched" -> Reading.value(at.channel().withRelease(new ReleaseDemand.Latch()));
            default -> QuantityReader.range(text, Dimension.CURRENT).then(window -> {
                if (!(window.min() >= 0 && window.max() > window.min())) {
                    return Reading.misread("A release window needs two currents, the smaller first, both ≥ 0 A, such "
                            + "as 21 .. 24 A; or type auto or latch.");
                }
                return Reading.value(at.channel().withRelease(new ReleaseDemand.Window(window)));
            });
        };
    }

    static String threshold(ThresholdDemand demand) {
        return switch (demand) {
            case ThresholdDemand.Free _ -> "any";
            case ThresholdDemand.OwnDivider(Source source) -> source.word();
            case ThresholdDemand.SharedTap(String tap) -> TAP + tap;
        };
    }

    static Reading<Channel> withThreshold(String text, ChannelField.At at) {
        return thresholdOf(text, at.board()).then(demand -> Reading.value(at.channel().withThreshold(demand)));
    }

    private static Reading<ThresholdDemand> thresholdOf(String text, Board board) {
        String plain = Words.plain(text);
        if (plain.isEmpty() || plain.equals("any")) {
            return Reading.value(new ThresholdDemand.Free());
        }
        if (plain.equals("supply")) {
            return Reading.value(new ThresholdDemand.OwnDivider(new Source.Supply()));
        }
        if (plain.startsWith(TAP)) {
            List<Tap> taps = board.taps();
            return Words.oneOf(text.strip().substring(TAP.length()), "tap", taps, Tap::name)
                    .then(name -> name.isEmpty()
                            ? Reading.misread("Type the tap's name after the word tap.")
                            : Reading.value(new ThresholdDemand.SharedTap(name.get())));
        }
        for (var reference : board.references()) {
            String name = reference.name().toLowerCase(Locale.ROOT);
            if (name.equals(plain) || plain.equals("reference " + name)) {
                return Reading.value(new ThresholdDemand.OwnDivider(new Source.OfReference(reference.name())));
            }
        }
        StringBuilder allowed = new StringBuilder("any, supply");
        board.references().forEach(each -> allowed.append(", ").append(each.name()));
        board.taps().forEach(each -> allowed.append(", tap ").append(each.name()));
        return Reading.misread("\"" + text.strip() + "\" is no source of this board. It has " + allowed + ".");
    }

    static Reading<Channel> withDiversity(String text, ChannelField.At at) {
        if (text.isBlank()) {
            return Reading.value(at.channel().withDiversity(1));
        }
        return QuantityReader.number(text, Dimension.RATIO).then(value -> value >= 0 && value <= 1
                ? Reading.value(at.channel().withDiversity(value))
                : Reading.misread("Diversity is the share of the heat that counts, 0 to 100 %, got "
                        + QuantityWriter.show(value, Dimension.RATIO) + "."));
    }
}
