package shuntwright.board;

import java.util.List;

import shuntwright.quantity.Finite;

/** How long an output survives a current. */
public sealed interface Withstand {

    /** @param value I²t, A²s */
    record Energy(double value) implements Withstand {
        /** @throws IllegalArgumentException unless value &gt; 0 */
        public Energy {
            if (!Finite.positive(value)) {
                throw new IllegalArgumentException("an I²t value must be > 0, got " + value);
            }
        }
    }

    /** @param points longest time for each current, interpolated between points on log-log axes */
    record Curve(List<TimePoint> points) implements Withstand {
        public Curve {
            points = List.copyOf(points);
        }
    }

    /**
     * A conductor heated adiabatically, t = (k·S/I)² (IEC 60364-4-43, 434.5.2).
     *
     * @param area     S, mm²
     * @param constant k, A·√s/mm²
     */
    record Conductor(double area, double constant) implements Withstand {
        /** @throws IllegalArgumentException unless both are &gt; 0 */
        public Conductor {
            if (!Finite.positive(area) || !Finite.positive(constant)) {
                throw new IllegalArgumentException("a conductor needs area and k > 0, got " + area + ", " + constant);
            }
        }
    }
}
