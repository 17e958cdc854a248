package shuntwright.accuracy;

import java.util.Arrays;

import shuntwright.board.Calibration;

/**
 * The current that firmware reads after calibration at production. With the uncalibrated readings r in service and r₁, r₂ at the
 * calibration currents I₁, I₂, all by the same equation with the same parts, and the relative error e of the injected current:
 * one point I = r·I₂(1+e)/r₂; two points I = (1+e)·(I₁ + (I₂−I₁)·(r−r₁)/(r₂−r₁)).
 *
 * <p>At calibration the parts are new, at the calibration temperature, not warmed by their zone, at supply and rail of their own;
 * the ADC's non-linearity is another at each point, and so is the shunt's thermal EMF, since other heat flows through it. So
 * whatever is the same in both places cancels by itself.
 *
 * <p>Where errors outweigh the signal so far that the readings at calibration do not rise with the current, or a shunt runs away
 * there, nothing can be calibrated, and the value is infinite.
 *
 * @param equations   of the channel
 * @param calibration at production
 * @param load        load current, A
 * @param current     that flows in service, A
 */
record CalibratedReading(ChannelEquations equations, Calibration calibration, double load, double current)
        implements
            Equation {

    /** A point of the calibration and what is drawn anew there. */
    private enum Point {
        LOWER(Slot.CALIBRATION_STEP_LOWER, Slot.CALIBRATION_EMF_LOWER), UPPER(Slot.CALIBRATION_STEP_UPPER,
                Slot.CALIBRATION_EMF_UPPER);

        private final Slot step;
        private final Slot emf;

        Point(Slot step, Slot emf) {
            this.step = step;
            this.emf = emf;
        }
    }

    @Override
    public double value(double[] x) {
        return evaluate(x, new double[0]);
    }

    @Override
    public double gradient(double[] x, double[] gradient) {
        Arrays.fill(gradient, 0);
        return evaluate(x, gradient);
    }

    /**
     * What rises with the current at calibration: the reading at the only point, or the difference of the two; infinite where a
     * shunt runs away. Where it may be 0 or infinite the calibrated reading has no limits.
     */
    Equation signal() {
        return new Equation() {
            @Override
            public double value(double[] x) {
                return rise(x, new double[0]);
            }

            @Override
            public double gradient(double[] x, double[] gradient) {
                Arrays.fill(gradient, 0);
                return rise(x, gradient);
            }
        };
    }

    private double rise(double[] x, double[] g) {
        double[] slopes = g.clone();
        double upper = reading(calibration.upperCurrent(load), atCalibration(x, Point.UPPER), slopes);
        addFromCalibration(slopes, 1, Point.UPPER, g);
        if (calibration.points() == Calibration.Points.ONE || Double.isInfinite(upper)) {
            return upper;
        }
        double lower = reading(calibration.lowerCurrent(load), atCalibration(x, Point.LOWER), slopes);
        addFromCalibration(slopes, -1, Point.LOWER, g);
        return Double.isInfinite(lower) ? lower : upper - lower;
    }

    private double evaluate(double[] x, double[] g) {
        double error = 1 + x[Slot.CALIBRATION_CURRENT.place()];
        double[] none = new double[0];
        boolean slopes = g.length > 0;
        double[] service = slopes ? new double[g.length] : none;
        double[] upper = slopes ? new double[g.length] : none;
        double r = reading(current, x, service);
        double[] atUpper = atCalibration(x, Point.UPPER);
        double i2 = calibration.upperCurrent(load);
        double r2 = reading(i2, atUpper, upper);
        if (!rises(0, r2)) {
            return Double.POSITIVE_INFINITY;
        }
        if (calibration.points() == Calibration.Points.ONE) {
            double scale = i2 * error / r2;
            if (slopes) {
                add(service, scale, g);
                addFromCalibration(upper, -r * scale / r2, Point.UPPER, g);
                g[Slot.CALIBRATION_CURRENT.place()] += r * i2 / r2;
            }
            return r * scale;
        }
        double i1 = calibration.lowerCurrent(load);
        double[] lower = slopes ? new double[g.length] : none;
        double r1 = reading(i1, atCalibration(x, Point.LOWER), lower);
        if (!rises(r1, r2)) {
            return Double.POSITIVE_INFINITY;
        }
        double span = r2 - r1;
        double slope = (i2 - i1) / span;
        double plain = i1 + slope * (r - r1);
        if (slopes) {
            add(service, error * slope, g);
            addFromCalibration(lower, error * slope * (r - r2) / span, Point.LOWER, g);
            addFromCalibration(upper, -error * slope * (r - r1) / span, Point.UPPER, g);
            g[Slot.CALIBRATION_CURRENT.place()] += plain;
        }
        return error * plain;
    }

    private static boolean rises(double from, double to) {
        return from < to && to < Double.POSITIVE_INFINITY;
    }

    private double reading(double at, double[] x, double[] g) {
        Equation plain = equations.reading(at);
        return g.length > 0 ? plain.gradient(x, g) : plain.value(x);
    }

    /** x as it was at a point of the calibration. */
    private double[] atCalibration(double[] x, Point point) {
        double[] then = x.clone();
        for (Slot aged : AGEING) {
            then[aged.place()] = 0;
        }
        for (int i = 0; i < equations.shuntCount(); i++) {
            then[Layout.index(Slot.SHUNT_AGEING, i)] = 0;
        }
        then[Slot.ZONE_RISE.place()] = 0;
        then[Slot.AMBIENT.place()] = x[Slot.CALIBRATION_TEMPERATURE.place()];
        then[Slot.SUPPLY.place()] = x[Slot.CALIBRATION_SUPPLY.place()];
        then[Slot.RAIL.place()] = x[Slot.CALIBRATION_RAIL.place()];
        then[Slot.ADC_STEP.place()] = x[point.step.place()];
        then[Slot.THERMAL_EMF.place()] = x[point.emf.place()];
        return then;
    }

    private static final Slot[] AGEING = {Slot.GAIN_AGEING, Slot.ADC_REFERENCE_AGEING};

    private static void add(double[] slopes, double weight, double[] g) {
        for (int i = 0; i < g.length; i++) {
            g[i] += weight * slopes[i];
        }
    }

    /** Adds slopes by the inputs at calibration: what stood elsewhere goes back there, what was set to 0 is left out. */
    private void addFromCalibration(double[] slopes, double weight, Point point, double[] g) {
        if (g.length == 0) {
            return;
        }
        for (Slot aged : AGEING) {
            slopes[aged.place()] = 0;
        }
        for (int i = 0; i < equations.shuntCount(); i++) {
            slopes[Layout.index(Slot.SHUNT_AGEING, i)] = 0;
        }
        slopes[Slot.ZONE_RISE.place()] = 0;
        move(slopes, weight, Slot.AMBIENT, Slot.CALIBRATION_TEMPERATURE, g);
        move(slopes, weight, Slot.SUPPLY, Slot.CALIBRATION_SUPPLY, g);
        move(slopes, weight, Slot.RAIL, Slot.CALIBRATION_RAIL, g);
        move(slopes, weight, Slot.ADC_STEP, point.step, g);
        move(slopes, weight, Slot.THERMAL_EMF, point.emf, g);
        add(slopes, weight, g);
    }

    private static void move(double[] slopes, double weight, Slot from, Slot to, double[] g) {
        g[to.place()] += weight * slopes[from.place()];
        slopes[from.place()] = 0;
    }
}
