package shuntwright.board;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;

class DemandTest {

    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static Channel.Currents currents(double load, double noTrip, double mustTrip) {
        return new Channel.Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip), OptionalDouble.of(mustTrip),
                NONE, NONE, NONE);
    }

    private static Channel channel(Channel.Currents currents) {
        return Channel.named("c").withRail(Optional.of(new Spread(10.5, 12, 14.4))).withCurrents(currents);
    }

    private static Demand complete(Channel channel) {
        return ((Demand.Reading.Complete) Demand.of(channel)).demand();
    }

    private static List<String> missing(Channel channel) {
        return ((Demand.Reading.Incomplete) Demand.of(channel)).missing();
    }

    @Test
    void fillsInDefaults() {
        Demand demand = complete(channel(currents(20, 25, 36)));
        assertThat(demand.load()).isEqualTo(20);
        assertThat(demand.tripWindow()).isEqualTo(Range.of(25, 36));
        assertThat(demand.tripTarget()).isEqualTo(30, within(1e-12));
        assertThat(demand.rearm()).contains(Range.of(20, 25));
        assertThat(demand.fullScale()).isEqualTo(36);
        assertThat(demand.commonMode()).isEqualTo(new Spread(10.5, 12, 14.4));
    }

    @Test
    void keepsWhatIsTyped() {
        Channel channel = channel(new Channel.Currents(OptionalDouble.of(20), OptionalDouble.of(25),
                OptionalDouble.of(36), OptionalDouble.of(28), OptionalDouble.of(1), OptionalDouble.of(50)));
        Demand demand = complete(channel.withRelease(new ReleaseDemand.Window(Range.of(15, 22))));
        assertThat(demand.tripTarget()).isEqualTo(28);
        assertThat(demand.fullScale()).isEqualTo(50);
        assertThat(demand.rearm()).contains(Range.of(15, 22));
        assertThat(complete(channel.withRelease(new ReleaseDemand.Latch())).rearm()).isEmpty();
    }

    @Test
    void aLowSideShuntSitsAtGround() {
        Channel c = channel(currents(20, 25, 36));
        Channel low = new Channel(c.name(), "", c.rail(), Channel.Side.LOW, c.currents(), c.release(), c.reading(),
                c.threshold(), c.alertLine(), c.zone(), 1, c.stress(), c.pins());
        assertThat(complete(low).commonMode()).isEqualTo(Spread.exactly(0));
    }

    @Test
    void aTurnedWindowIsNotBlamedOnATargetNobodyTyped() {
        assertThat(missing(channel(currents(20, 50, 36))))
                .containsExactly("the no-trip current 50 A must be below the must-trip current 36 A");
    }

    @Test
    void saysWhatIsMissing() {
        assertThat(missing(Channel.named("c"))).containsExactly("the rail voltage is missing",
                "the load current is missing", "the no-trip current is missing", "the must-trip current is missing");
        assertThat(missing(channel(currents(0, -1, 5)))).containsExactly("the load current must be above 0 A",
                "the no-trip current must be above 0 A");
        assertThat(missing(channel(currents(Double.NaN, 25, 36))))
                .containsExactly("the load current must be above 0 A");
    }

    @Test
    void saysWhatContradicts() {
        assertThat(missing(channel(currents(26, 25, 36))))
                .anyMatch(each -> each.contains("no-trip current 25 A must not be below the load current 26 A"));
        assertThat(missing(channel(currents(20, 36, 36))))
                .anyMatch(each -> each.contains("below the must-trip current 36 A"));
        assertThat(missing(channel(currents(25, 25, 36)))).anyMatch(each -> each.contains("release window between"));
        assertThat(missing(channel(currents(20, 25, 36))
                .withRelease(new ReleaseDemand.Window(Range.exactly(22))))).containsExactly(
                        "the release window is empty");
        assertThat(missing(channel(new Channel.Currents(OptionalDouble.of(20), OptionalDouble.of(25),
                OptionalDouble.of(36), OptionalDouble.of(40), OptionalDouble.of(21), OptionalDouble.of(19)))))
                .hasSize(3).anyMatch(each -> each.contains("trip target"))
                .anyMatch(each -> each.contains("least current")).anyMatch(each -> each.contains("full-scale"));
        assertThat(missing(channel(currents(20, 25, 36))
                .withReading(new Channel.ReadingDemand(OptionalDouble.of(0.01), NONE, Optional.empty()))))
                .singleElement().satisfies(each -> assertThat(each).contains("least current is missing"));
        assertThat(missing(channel(currents(20, 25, 36)).withStress(
                new Channel.Stress(OptionalDouble.of(30), NONE, List.of(), Optional.empty()))))
                .singleElement().satisfies(each -> assertThat(each).contains("fault current"));
    }

    private static Channel calibrated(Calibration.Points points, OptionalDouble lower, OptionalDouble upper) {
        return channel(currents(20, 25, 36)).withReading(new Channel.ReadingDemand(NONE, OptionalDouble.of(0.01),
                Optional.of(new Calibration(points, lower, upper, 1e-3, Calibration.DEFAULT_TEMPERATURE))));
    }

    @Test
    void aCalibrationWithItsDefaultsLiesAtTheLoadAndATenthOfIt() {
        Demand demand = complete(calibrated(Calibration.Points.TWO, NONE, NONE));
        Calibration calibration = demand.channel().reading().calibration().orElseThrow();
        assertThat(calibration.upperCurrent(demand.load())).isEqualTo(20);
        assertThat(calibration.lowerCurrent(demand.load())).isEqualTo(2);
    }

    @Test
    void aLowerCalibrationCurrentMustBeBelowTheUpperOne() {
        assertThat(missing(calibrated(Calibration.Points.TWO, OptionalDouble.of(20), NONE))).containsExactly(
                "the lower calibration current 20 A must be below the upper one 20 A, which is the load current");
        assertThat(missing(calibrated(Calibration.Points.TWO, OptionalDouble.of(30), NONE))).hasSize(1);
        assertThat(complete(calibrated(Calibration.Points.TWO, OptionalDouble.of(19.9), NONE)).load()).isEqualTo(20);
        assertThat(complete(calibrated(Calibration.Points.TWO, OptionalDouble.of(30), OptionalDouble.of(32))).load())
                .isEqualTo(20);
        assertThat(complete(calibrated(Calibration.Points.ONE, OptionalDouble.of(30), NONE)).load())
                .as("with one point nothing lies at the lower current").isEqualTo(20);
    }

    @Test
    void aCalibrationCurrentMustBeReadable() {
        assertThat(missing(calibrated(Calibration.Points.ONE, NONE, OptionalDouble.of(37))))
                .containsExactly("the calibration current 37 A must not be above the full-scale current 36 A, beyond "
                        + "which nothing is read");
        assertThat(complete(calibrated(Calibration.Points.ONE, NONE, OptionalDouble.of(36))).load()).isEqualTo(20);
    }

    @Test
    void aLatchNeedsNoRoomBetweenLoadAndNoTrip() {
        assertThat(complete(channel(currents(25, 25, 36)).withRelease(new ReleaseDemand.Latch())).load())
                .isEqualTo(25);
    }
}
