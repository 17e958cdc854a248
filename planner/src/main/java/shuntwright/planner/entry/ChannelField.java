package shuntwright.planner.entry;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Channel.Currents;
import shuntwright.board.Channel.ReadingDemand;
import shuntwright.board.Channel.Stress;
import shuntwright.board.Pins;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/** A column of the channel table that takes what is typed. */
@SuppressWarnings("ImmutableEnumChecker") // the functions keep no state
public enum ChannelField {
    NAME("Channel", "name", "a name that no other channel has", Channel::name, Demands::name),
    ZONE("Zone", "zone", "a zone of the board, or nothing", channel -> channel.zone().orElse(""),
            (text, at) -> Words.oneOf(text, "zone", at.board().zones(), shuntwright.board.Zone::name)
                    .then(zone -> Reading.value(at.channel().withZone(zone)))),
    SIDE("Side", "side of the shunt", "high (between rail and load) or low (between load and ground)",
            channel -> Demands.side(channel.side()), Demands::withSide),
    RAIL("Rail", "rail voltage", "12 V, 12 V ±10 % or 10.5 .. 12 .. 14.4 V",
            channel -> channel.rail().map(rail -> QuantityWriter.write(rail, Dimension.VOLTAGE)).orElse(""),
            (text, at) -> text.isBlank()
                    ? Reading.value(at.channel().withRail(Optional.empty()))
                    : QuantityReader.spread(text, Dimension.VOLTAGE)
                            .then(rail -> Reading.value(at.channel().withRail(Optional.of(rail))))),
    LOAD("Load", "load current", "the continuous current, such as 20 A", channel -> amperes(channel.currents().load()),
            current("load current", (old, value) -> new Currents(value, old.noTrip(), old.mustTrip(), old.tripTarget(),
                    old.least(), old.fullScale()))),
    NO_TRIP("No-trip", "no-trip current", "the largest current that must never trip",
            channel -> amperes(channel.currents().noTrip()),
            current("no-trip current", (old, value) -> new Currents(old.load(), value, old.mustTrip(),
                    old.tripTarget(), old.least(), old.fullScale()))),
    MUST_TRIP("Must-trip", "must-trip current", "by this current it must have tripped",
            channel -> amperes(channel.currents().mustTrip()),
            current("must-trip current", (old, value) -> new Currents(old.load(), old.noTrip(), value,
                    old.tripTarget(), old.least(), old.fullScale()))),
    RELEASE("Release", "release", "auto (between load and no-trip), a window such as 21 .. 24 A, or latch",
            channel -> Demands.release(channel.release()), Demands::withRelease),
    SOURCE("Source", "threshold source", "any, supply, a reference of the board, or tap NAME",
            channel -> Demands.threshold(channel.threshold()), Demands::withThreshold),
    TRIP_TARGET("Trip target", "trip target", "the wanted trip current; empty for the geometric mean",
            channel -> amperes(channel.currents().tripTarget()),
            current("trip target", (old, value) -> new Currents(old.load(), old.noTrip(), old.mustTrip(), value,
                    old.least(), old.fullScale()))),
    LEAST("Least", "least current", "the smallest current that must be read",
            channel -> amperes(channel.currents().least()),
            current("least current", (old, value) -> new Currents(old.load(), old.noTrip(), old.mustTrip(),
                    old.tripTarget(), value, old.fullScale()))),
    FULL_SCALE("Full scale", "full-scale current", "the largest current the ADC must read; empty for must-trip",
            channel -> amperes(channel.currents().fullScale()),
            current("full-scale current", (old, value) -> new Currents(old.load(), old.noTrip(), old.mustTrip(),
                    old.tripTarget(), old.least(), value))),
    READING_AT_LOAD("Asked at load", "reading error allowed at load", "such as 1 %",
            channel -> Words.text(channel.reading().atLoad(), Dimension.RATIO),
            (text, at) -> Words.fraction(text, "the reading error").then(value -> Reading.value(
                    at.channel().withReading(new ReadingDemand(at.channel().reading().atLeast(), value,
                            at.channel().reading().calibration()))))),
    READING_AT_LEAST("Asked at least", "reading error allowed at the least current", "such as 10 %",
            channel -> Words.text(channel.reading().atLeast(), Dimension.RATIO),
            (text, at) -> Words.fraction(text, "the reading error").then(value -> Reading.value(
                    at.channel().withReading(new ReadingDemand(value, at.channel().reading().atLoad(),
                            at.channel().reading().calibration()))))),
    ALERT_LINE("Alert line", "alert line", "an alert line of the board; empty for its first",
            channel -> channel.alertLine().orElse(""),
            (text, at) -> Words.oneOf(text, "alert line", at.board().alertLines(), shuntwright.board.AlertLine::name)
                    .then(line -> Reading.value(at.channel().withAlertLine(line)))),
    DIVERSITY("Diversity", "diversity", "share of its heat counted in totals, 0 to 100 %",
            channel -> QuantityWriter.write(channel.diversity(), Dimension.RATIO), Demands::withDiversity),
    FAULT("Fault", "fault current", "the prospective short-circuit current, such as 400 A",
            channel -> amperes(channel.stress().fault()),
            (text, at) -> Words.positive(text, "the fault current", Dimension.CURRENT)
                    .then(value -> Reading.value(at.channel().withStress(new Stress(value,
                            at.channel().stress().clearingTime(), at.channel().stress().inrush(),
                            at.channel().stress().withstand()))))),
    PINNED_SHUNT("Pinned shunt", "pinned shunt", "a part number, or nothing to let the plan choose",
            channel -> channel.pins().shunt().orElse(""),
            (text, at) -> pins(at, old -> new Pins(Words.word(text), old.shuntCount(), old.amplifier(),
                    old.comparator(), old.resistors(), old.dividerTop(), old.dividerBottom(),
                    old.hysteresisResistor()))),
    PINNED_AMPLIFIER("Pinned amplifier", "pinned amplifier", "a part number, or nothing to let the plan choose",
            channel -> channel.pins().amplifier().orElse(""),
            (text, at) -> pins(at,
                    old -> new Pins(old.shunt(), old.shuntCount(), Words.word(text), old.comparator(), old.resistors(),
                            old.dividerTop(), old.dividerBottom(), old.hysteresisResistor()))),
    PINNED_COMPARATOR("Pinned comparator", "pinned comparator", "a part number, or nothing to let the plan choose",
            channel -> channel.pins().comparator().orElse(""),
            (text, at) -> pins(at,
                    old -> new Pins(old.shunt(), old.shuntCount(), old.amplifier(), Words.word(text), old.resistors(),
                            old.dividerTop(), old.dividerBottom(), old.hysteresisResistor()))),
    NOTE("Note", "note", "anything worth remembering", Channel::note,
            (text, at) -> Reading.value(at.channel().withNote(text.strip())));

    /**
     * Where a text is typed.
     *
     * @param channel the row's channel as it is
     * @param board   the board it stands on
     */
    record At(Channel channel, Board board) {}

    private final String title;
    private final String words;
    private final String hint;
    private final Function<Channel, String> writer;
    private final BiFunction<String, At, Reading<Channel>> reader;

    ChannelField(String title, String words, String hint, Function<Channel, String> writer,
            BiFunction<String, At, Reading<Channel>> reader) {
        this.title = title;
        this.words = words;
        this.hint = hint;
        this.writer = writer;
        this.reader = reader;
    }

    /** The column's header. */
    public String title() {
        return title;
    }

    /** What it is, within a sentence. */
    public String words() {
        return words;
    }

    /** What can be typed. */
    public String hint() {
        return hint;
    }

    /** What the cell shows for a channel; read back it gives the same channel. */
    public String text(Channel channel) {
        return writer.apply(channel);
    }

    /** The channel with this text typed, or why not. */
    public Reading<Channel> read(String text, Channel channel, Board board) {
        return reader.apply(text, new At(channel, board));
    }

    /** True for numbers, which stand to the right. */
    public boolean isNumber() {
        return switch (this) {
            case RAIL, LOAD, NO_TRIP, MUST_TRIP, RELEASE, TRIP_TARGET, LEAST, FULL_SCALE, READING_AT_LOAD,
                    READING_AT_LEAST, DIVERSITY, FAULT ->
                true;
            case NAME, ZONE, SIDE, SOURCE, ALERT_LINE, PINNED_SHUNT, PINNED_AMPLIFIER, PINNED_COMPARATOR, NOTE ->
                false;
        };
    }

    /** What rows are sorted by, before their texts: the value for numbers, 0 for words; NaN where nothing is typed. */
    public double key(Channel channel) {
        Currents currents = channel.currents();
        return switch (this) {
            case RAIL -> channel.rail().map(shuntwright.quantity.Spread::nominal).orElse(Double.NaN);
            case LOAD -> currents.load().orElse(Double.NaN);
            case NO_TRIP -> currents.noTrip().orElse(Double.NaN);
            case MUST_TRIP -> currents.mustTrip().orElse(Double.NaN);
            case TRIP_TARGET -> currents.tripTarget().orElse(Double.NaN);
            case LEAST -> currents.least().orElse(Double.NaN);
            case FULL_SCALE -> currents.fullScale().orElse(Double.NaN);
            case READING_AT_LOAD -> channel.reading().atLoad().orElse(Double.NaN);
            case READING_AT_LEAST -> channel.reading().atLeast().orElse(Double.NaN);
            case DIVERSITY -> channel.diversity();
            case FAULT -> channel.stress().fault().orElse(Double.NaN);
            case RELEASE -> channel.release() instanceof shuntwright.board.ReleaseDemand.Window(var window)
                    ? window.min()
                    : 0;
            case NAME, ZONE, SIDE, SOURCE, ALERT_LINE, PINNED_SHUNT, PINNED_AMPLIFIER, PINNED_COMPARATOR, NOTE -> 0;
        };
    }

    private static String amperes(OptionalDouble value) {
        return Words.text(value, Dimension.CURRENT);
    }

    private static BiFunction<String, At, Reading<Channel>> current(String what,
            BiFunction<Currents, OptionalDouble, Currents> change) {
        return (text, at) -> Words.positive(text, "the " + what, Dimension.CURRENT).then(value -> Reading.value(
                at.channel().withCurrents(change.apply(at.channel().currents(), value))));
    }

    private static Reading<Channel> pins(At at, Function<Pins, Pins> change) {
        return Reading.value(at.channel().withPins(change.apply(at.channel().pins())));
    }
}
