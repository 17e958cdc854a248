package shuntwright.planner.command;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;
import shuntwright.board.Sampling;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.Range;
import shuntwright.quantity.Reading;

/** How a plan is sampled, for this run only. */
final class SamplingOptions {
    private static final String ADAPTIVE = "adaptive";
    /** Signs of a wrong value that are repeated to the user. */
    private static final int LONGEST = 40;

    /** What a coverage probability may be, as the board file has it; the upper end is excluded. */
    private static final Range COVERAGE = Range.of(0.5, 1);

    @Option(names = "--trials", paramLabel = "N|adaptive", converter = TrialsReader.class, description = "Trials of each channel, 10000 to 100000000, or adaptive: until the results are stable. Instead of what the board says, for this run only.")
    private Optional<Sampling.Trials> trials = Optional.empty();

    @Option(names = "--seed", paramLabel = "N", converter = SeedReader.class, description = "Seed of all draws, a whole number. The same seed gives the same results to the last digit on any number of threads.")
    private Optional<Long> seed = Optional.empty();

    @Option(names = "--coverage", paramLabel = "P", converter = CoverageReader.class, description = "Coverage probability of the coverage intervals, from 50 %% to below 100 %%: 99.9%% or 0.999. Instead of the board's, for this run only.")
    private Optional<Double> coverage = Optional.empty();

    @Option(names = "--no-sampling", description = "Do not sample: faster, but without probabilities and yield, and coverage intervals rest on a first look.")
    private boolean skipped;

    /** @throws BadInput when there is nothing to which an option could apply */
    SamplingChoice chosen() {
        List<String> idle = new ArrayList<>();
        trials.ifPresent(_ -> idle.add("--trials"));
        seed.ifPresent(_ -> idle.add("--seed"));
        if (skipped && !idle.isEmpty()) {
            throw new BadInput("With --no-sampling nothing is drawn, so " + String.join(" and ", idle)
                    + " can have no effect; leave out one or the other.");
        }
        return new SamplingChoice(trials,
                seed.map(OptionalLong::of).orElseGet(OptionalLong::empty),
                coverage.map(OptionalDouble::of).orElseGet(OptionalDouble::empty), skipped);
    }

    /** Reads "adaptive" or a whole number, "1e6" too. */
    static final class TrialsReader implements ITypeConverter<Sampling.Trials> {
        @Override
        public Sampling.Trials convert(String text) {
            if (text.equals(ADAPTIVE)) {
                return SamplingChoice.ADAPTIVE;
            }
            try {
                int count = new BigDecimal(text).intValueExact();
                if (count >= Sampling.LEAST && count <= Sampling.MOST) {
                    return new Sampling.Trials.Fixed(count);
                }
            } catch (ArithmeticException | NumberFormatException _) {
                // Said below: no such number can be drawn.
            }
            throw new TypeConversionException(quoted(text) + " is no number of trials; allowed is a whole number from "
                    + Sampling.LEAST + " to " + Sampling.MOST + ", or " + ADAPTIVE + ", for example "
                    + "1000000.");
        }
    }

    /** Reads a seed. */
    static final class SeedReader implements ITypeConverter<Long> {
        @Override
        public Long convert(String text) {
            try {
                return Long.valueOf(text);
            } catch (NumberFormatException _) {
                throw new TypeConversionException(quoted(text) + " is no seed; allowed is a whole number from "
                        + Long.MIN_VALUE + " to " + Long.MAX_VALUE + ", for example 1.");
            }
        }
    }

    /** Reads a coverage probability. */
    static final class CoverageReader implements ITypeConverter<Double> {
        @Override
        public Double convert(String text) {
            return switch (QuantityReader.number(text, Dimension.RATIO)) {
                case Reading.Misread<Double>(String problem) -> throw new TypeConversionException(problem);
                case Reading.Value<Double>(Double value) when value >= COVERAGE.min() && value < COVERAGE.max() ->
                    value;
                case Reading.Value<Double>(Double value) -> throw new TypeConversionException(quoted(text)
                        + " is no coverage probability; allowed is from 50 % to below 100 %, for example 99.9% or "
                        + "0.999." + (forgotten(text, value) ? " Maybe " + text.strip() + "% was meant." : ""));
            };
        }

        private static boolean forgotten(String text, double value) {
            return !text.contains("%") && COVERAGE.contains(value / 100) && value < 100;
        }
    }

    private static String quoted(String text) {
        return "\"" + (text.length() > LONGEST ? text.substring(0, LONGEST) + "…" : text) + "\"";
    }
}
