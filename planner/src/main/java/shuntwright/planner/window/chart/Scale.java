package shuntwright.planner.window.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;

/**
 * One axis of a chart, in the numbers of its unit.
 *
 * @param unit        of its numbers
 * @param min         left or lower end
 * @param max         right or upper end
 * @param logarithmic true when equal ratios are equally wide
 */
public record Scale(Unit unit, double min, double max, boolean logarithmic) {
    private static final double ROOM = 0.07;

    public Scale {
        if (!(min < max) || (logarithmic && !(min > 0))) {
            throw new IllegalArgumentException("a scale goes up, got " + min + " to " + max);
        }
    }

    /**
     * A round number on the scale.
     *
     * @param at   share of the scale
     * @param text with as many decimals as all the others
     */
    public record Tick(double at, String text) {}

    /** A scale with room around the values; around nothing from 0 to 1. */
    public static Scale around(Unit unit, DoubleStream values, boolean logarithmic) {
        double[] all = values.map(each -> each * unit.factor()).toArray();
        double min = DoubleStream.of(all).min().orElse(0);
        double max = DoubleStream.of(all).max().orElse(1);
        if (logarithmic && min > 0) {
            double wider = Math.pow(Math.max(max / min, 1.5), ROOM);
            return new Scale(unit, min / wider, max * wider, true);
        }
        double least = Math.max(Math.abs(max) * 0.02, unit.whole() ? 2 : 1e-9);
        double lacking = Math.max(0, least - (max - min)) / 2;
        double room = ROOM * Math.max(max - min, least);
        double low = min - lacking - room;
        // nothing here is below zero: no room beyond it
        return new Scale(unit, min >= 0 ? Math.max(low, -room * 0.01) : low, max + lacking + room, false);
    }

    /** Where a value stands, as a share of the scale. */
    public double place(double value) {
        double number = value * unit.factor();
        return logarithmic ? Math.log(number / min) / Math.log(max / min) : (number - min) / (max - min);
    }

    /** Round numbers, at most so many. */
    public List<Tick> ticks(int most) {
        return logarithmic && max / min > 8 ? decades(most) : even(most);
    }

    private List<Tick> even(int most) {
        double rough = (max - min) / Math.max(1, most);
        double power = Math.pow(10, Math.floor(Math.log10(rough)));
        double step = power * (rough <= power ? 1 : rough <= 2 * power ? 2 : rough <= 5 * power ? 5 : 10);
        if (unit.whole()) {
            step = Math.max(1, step);
        }
        int decimals = (int) Math.max(0, Math.ceil(-Math.log10(step) - 1e-9));
        List<Tick> ticks = new ArrayList<>();
        for (double number = Math.ceil(min / step - 1e-9); number * step <= max; number++) {
            ticks.add(tick(number * step, decimals));
        }
        return ticks;
    }

    /** 1, 2 and 5 of each power of ten, where those are too many 1 and 3, or the powers alone. */
    private List<Tick> decades(int most) {
        List<Tick> all = decades(List.of(1, 2, 5));
        List<Tick> fewer = all.size() <= most ? all : decades(List.of(1, 3));
        return fewer.size() <= most ? fewer : decades(List.of(1));
    }

    private List<Tick> decades(List<Integer> digits) {
        List<Tick> ticks = new ArrayList<>();
        for (int exponent = (int) Math.floor(Math.log10(min)); Math.pow(10, exponent) <= max; exponent++) {
            for (int digit : digits) {
                double number = digit * Math.pow(10, exponent);
                if (number >= min && number <= max) {
                    ticks.add(tick(number, Math.max(0, -exponent)));
                }
            }
        }
        return ticks;
    }

    private Tick tick(double number, int decimals) {
        return new Tick(place(number / unit.factor()),
                String.format(Locale.ROOT, "%,." + decimals + "f", number == 0 ? 0 : number).replace('-', '−'));
    }
}
