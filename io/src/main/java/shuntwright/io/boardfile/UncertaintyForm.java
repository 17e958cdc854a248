package shuntwright.io.boardfile;

import java.util.List;
import java.util.OptionalInt;

import shuntwright.board.Sampling;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Uncertainty;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Sheet;

final class UncertaintyForm extends Form<Uncertainty> {
    private static final int DEFAULT_DIGITS = 2;
    private static final int DEFAULT_MOST = 10_000_000;

    final DistributionForm distributionForm = new DistributionForm();

    private final Key<OptionalInt> trials = withDefault("trials", new TrialsKind(),
            OptionalInt.of(Sampling.DEFAULT.trials().atMost()),
            "of each channel: a fixed number, or until the results are stable");
    private final Key<Integer> digits = withDefault("digits", Kinds.whole(1, 2), DEFAULT_DIGITS,
            "significant digits of the standard uncertainty that must be stable; with `adaptive` only");
    private final Key<Integer> mostTrials = withDefault("mostTrials", Kinds.whole(Sampling.LEAST, Sampling.MOST),
            DEFAULT_MOST, "trials after which it ends, stable or not; with `adaptive` only");
    private final Key<Long> seed = withDefault("seed", Kinds.whole(), Sampling.DEFAULT.seed(), "of all draws");
    private final Key<List<StatedDistribution>> distributions = withDefault("distributions",
            Kinds.list(distributionForm), List.of(), "of inputs of which more is known than limits");

    UncertaintyForm() {
        super("Uncertainty");
    }

    @Override
    protected void check(Fields fields) {
        boolean fixed = !fields.has(trials) || fields.find(trials).filter(OptionalInt::isPresent).isPresent();
        for (Key<Integer> key : List.of(digits, mostTrials)) {
            if (fixed && fields.has(key)) {
                fields.problem(key, "only adaptive trials have \"" + key.name()
                        + "\"; remove it or set \"trials\" to \"" + TrialsKind.ADAPTIVE + "\"");
            }
        }
    }

    @Override
    protected Uncertainty bind(Fields fields) {
        OptionalInt fixed = fields.get(trials);
        Sampling.Trials bound = fixed.isPresent()
                ? new Sampling.Trials.Fixed(fixed.getAsInt())
                : new Sampling.Trials.Adaptive(fields.get(digits), fields.get(mostTrials));
        return new Uncertainty(fields.get(distributions), new Sampling(bound, fields.get(seed)));
    }

    @Override
    protected void fill(Uncertainty value, Sheet sheet) {
        switch (value.sampling().trials()) {
            case Sampling.Trials.Fixed(int count) -> sheet.put(trials, OptionalInt.of(count));
            case Sampling.Trials.Adaptive(int stable, int most) -> {
                sheet.put(trials, OptionalInt.empty());
                sheet.put(digits, stable);
                sheet.put(mostTrials, most);
            }
        }
        sheet.put(seed, value.sampling().seed());
        sheet.put(distributions, value.stated());
    }
}
