package shuntwright.io.workbook;

import java.util.Locale;
import java.util.OptionalDouble;

import shuntwright.accuracy.Input;
import shuntwright.board.Calibration;
import shuntwright.board.Sampling;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.QuantityWriter;

/** Distributions and trials in words. */
final class SamplingWords {

    private SamplingWords() {
    }

    static String of(Input input) {
        return of(input.distribution());
    }

    /** "normal, k = 3". */
    static String of(Distribution distribution) {
        return distribution.word() + switch (distribution) {
            case Distribution.Uniform _,Distribution.Triangular _,Distribution.ArcSine _ -> "";
            case Distribution.Normal(double k) -> ", k = " + plain(k);
            case Distribution.Trapezoid(double ratio) -> ", top " + plain(ratio);
            case Distribution.StudentT(double degrees, double k) -> ", ν = " + plain(degrees) + ", k = " + plain(k);
        };
    }

    /**
     * "at 1 A and 8 A, current known to 0.2 %, at 20 .. 30 °C".
     *
     * @param load of the channel, A; empty where it is not typed yet
     */
    static String of(Calibration calibration, OptionalDouble load) {
        String upper = calibration.upper().isEmpty() && load.isEmpty()
                ? "the load current"
                : current(calibration.upperCurrent(load.orElse(0)));
        String lower = calibration.lower().isEmpty() && calibration.upper().isEmpty() && load.isEmpty()
                ? "a tenth of it"
                : current(calibration.lowerCurrent(load.orElse(0)));
        return switch (calibration.points()) {
            case ONE -> "at " + upper;
            case TWO -> "at " + lower + " and " + upper;
        } + ", current known to " + QuantityWriter.write(calibration.uncertainty(), Dimension.RATIO) + ", at "
                + QuantityWriter.write(calibration.temperature(), Dimension.TEMPERATURE);
    }

    private static String current(double value) {
        return QuantityWriter.show(value, Dimension.CURRENT);
    }

    static String of(Sampling sampling) {
        return switch (sampling.trials()) {
            case Sampling.Trials.Fixed(int count) -> String.format(Locale.ROOT, "%,d trials of each channel", count);
            case Sampling.Trials.Adaptive(int digits, int most) -> String.format(Locale.ROOT,
                    "trials of each channel until %d %s of the standard deviation settled, at most %,d", digits,
                    digits == 1 ? "digit" : "digits", most);
        } + ", seed " + sampling.seed();
    }

    private static String plain(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e15
                ? Long.toString((long) value)
                : Double.toString(value);
    }
}
