package shuntwright.io.planfile;

import java.util.List;

import shuntwright.quantity.Distribution;

/** Probability distributions around or between limits. */
final class DistributionTables {

    private static final ObjectTable<Distribution.Uniform> UNIFORM = ObjectTable.variant("uniform", "uniform",
            "Equal probability between the limits.");
    private static final ObjectTable<Distribution.Normal> NORMAL = ObjectTable.<Distribution.Normal>variant("normal",
            "normal", "Normal, limits at k standard deviations.")
            .number("k", Unit.PURE, "standard deviations from the mean to a limit", Distribution.Normal::k);
    private static final ObjectTable<Distribution.Triangular> TRIANGULAR = ObjectTable.variant("triangular",
            "triangular", "Triangular between the limits.");
    private static final ObjectTable<Distribution.ArcSine> ARCSINE = ObjectTable.variant("arcsine", "arcsine",
            "U-shaped between the limits.");
    private static final ObjectTable<Distribution.Trapezoid> TRAPEZOID = ObjectTable.<Distribution.Trapezoid>variant(
            "trapezoid", "trapezoid", "Trapezoidal between the limits.")
            .number("ratio", Unit.PURE, "width of the top over width of the base", Distribution.Trapezoid::ratio);
    private static final ObjectTable<Distribution.StudentT> STUDENT = ObjectTable.<Distribution.StudentT>variant("t",
            "t", "Scaled and shifted t, limits at k scale units.")
            .number("degreesOfFreedom", Unit.PURE, "of the scale", Distribution.StudentT::degreesOfFreedom)
            .number("k", Unit.PURE, "scale units from the mean to a limit", Distribution.StudentT::k);
    static final Form<Distribution> DISTRIBUTION = new Form.Either<>(
            List.of(UNIFORM, NORMAL, TRIANGULAR, ARCSINE, TRAPEZOID, STUDENT), distribution -> switch (distribution) {
                case Distribution.Uniform uniform -> new Form.Chosen<>(UNIFORM, uniform);
                case Distribution.Normal normal -> new Form.Chosen<>(NORMAL, normal);
                case Distribution.Triangular triangular -> new Form.Chosen<>(TRIANGULAR, triangular);
                case Distribution.ArcSine arcSine -> new Form.Chosen<>(ARCSINE, arcSine);
                case Distribution.Trapezoid trapezoid -> new Form.Chosen<>(TRAPEZOID, trapezoid);
                case Distribution.StudentT student -> new Form.Chosen<>(STUDENT, student);
            });

    private DistributionTables() {
    }
}
