package shuntwright.io.planfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.Propagated;

class PlanFileTest {

    private static final Plan PLAN = PlanFixtures.full();
    private static final JsonNode FILE = JsonMapper.shared().readTree(PlanFile.bytes(PLAN));

    @Test
    void startsWithItsFormatAndCautions() {
        String text = new String(PlanFile.bytes(PLAN), StandardCharsets.UTF_8);
        assertThat(text).startsWith("{\n  \"format\" : \"shuntwright plan 2\",\n  \"cautions\"").endsWith("}\n")
                .doesNotContain("\r");
        assertThat(FILE.at("/cautions").size()).isEqualTo(5);
        assertThat(JsonMapper.shared().readTree(PlanFile.bytes(PlanFixtures.empty())).at("/cautions").size())
                .isEqualTo(4);
    }

    @Test
    void samePlanSameBytesInAnyLocale() throws IOException {
        byte[] first = PlanFile.bytes(PLAN);
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            PlanFile.write(PlanFixtures.full(), out);
            assertThat(out.toByteArray()).isEqualTo(first);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void numbersReadBackAsTheSameDoubles() {
        for (int index = 0; index < PLAN.channels().size(); index++) {
            JsonNode channel = FILE.at("/channels/" + index);
            assertThat(channel.at("/verdict").stringValue()).isEqualTo(PLAN.channels().get(index).verdict().word());
            if (PLAN.channels().get(index).solved().isEmpty()) {
                assertThat(channel.has("solved")).isFalse();
                continue;
            }
            SolvedChannel solved = PLAN.channels().get(index).solved().get();
            JsonNode there = channel.at("/solved");
            assertThat(there.at("/tripNominal_A").doubleValue()).isEqualTo(solved.trip().nominal());
            assertThat(there.at("/tripLimits_A/0").doubleValue()).isEqualTo(solved.trip().limits().min());
            assertThat(there.at("/tripLimits_A/1").doubleValue()).isEqualTo(solved.trip().limits().max());
            assertThat(there.at("/heat_W").doubleValue()).isEqualTo(solved.heat());
            assertThat(there.at("/settings/threshold_V").doubleValue()).isEqualTo(solved.settings().threshold());
            assertThat(there.at("/inputs").size()).isEqualTo(solved.inputs().size());
        }
    }

    @Test
    void theNominalTripCanBeRecomputedFromTheFileAlone() {
        JsonNode pump = FILE.at("/channels/0/solved");
        JsonNode circuit = pump.at("/circuit");
        double source = circuit.at("/threshold/source/voltage/nominal_V").doubleValue();
        double top = circuit.at("/threshold/top_ohm").doubleValue();
        double bottom = circuit.at("/threshold/bottom_ohm").doubleValue();
        double joints = (circuit.at("/shunt/mountingResistance_ohm/0").doubleValue()
                + circuit.at("/shunt/mountingResistance_ohm/1").doubleValue()) / 2;
        double shunts = (circuit.at("/shunt/resistance_ohm").doubleValue() + joints)
                / circuit.at("/shuntCount").intValue();
        double trip = source * bottom / (top + bottom) / circuit.at("/amplifier/gain_V_per_V").doubleValue() / shunts;
        assertThat(pump.at("/tripNominal_A").doubleValue()).isCloseTo(trip, within(1e-12 * trip));
    }

    @Test
    void unitsStandInTheKeys() {
        assertThat(FILE.at("/channels/0/solved/limits/0").has("reached_W")).isTrue();
        assertThat(FILE.at("/channels/0/solved/limits/2").has("reached_J")).isTrue();
        assertThat(FILE.at("/channels/1/findings/0/measures/0").has("value_A")).isTrue();
        JsonNode inputs = FILE.at("/channels/0/solved/inputs");
        assertThat(inputs.at("/1").has("standardUncertainty_V")).isTrue();
        assertThat(inputs.at("/2").has("low_degC")).isTrue();
        assertThat(FILE.at("/channels/0/solved/assessments/0/budget/4").has("sensitivity_A_per_per_K")).isTrue();
    }

    @Test
    void whatIsKnownOfInputsAndHowTheyWereSampledStandsThere() {
        JsonNode asked = FILE.at("/board/uncertainty");
        assertThat(asked.at("/stated/0/part").stringValue()).isEqualTo("1E3");
        assertThat(asked.at("/stated/1").has("part")).isFalse();
        assertThat(asked.at("/stated/1/distribution/degreesOfFreedom").doubleValue()).isEqualTo(9);
        assertThat(asked.at("/sampling/trials/kind").stringValue()).isEqualTo("adaptive");
        assertThat(FILE.at("/board/zones/0/thermalResistance_K_per_W").doubleValue()).isEqualTo(12);
        assertThat(FILE.at("/study/sampling/trials/count").intValue()).isEqualTo(1_000_000);
        JsonNode pump = FILE.at("/channels/0");
        assertThat(pump.at("/asked/reading/calibration/points").intValue()).isEqualTo(2);
        assertThat(pump.at("/solved/zoneRise/most_K").doubleValue()).isEqualTo(9.5);
        assertThat(pump.at("/solved/localTemperature_degC/1").doubleValue()).isEqualTo(69.5);
        assertThat(pump.at("/solved/inputs/0/reel/correlation_fraction").doubleValue()).isEqualTo(0.3);
        assertThat(pump.at("/solved/uncalibrated").size()).isEqualTo(2);
        assertThat(FILE.at("/channels/1/solved/uncalibrated").size()).isZero();
    }

    @Test
    void propagatedDistributionsReadBackAsTheSameDoubles() {
        BoardStudy study = PLAN.study().orElseThrow();
        for (int index = 0; index < study.channels().size(); index++) {
            ChannelStudy channel = study.channels().get(index);
            JsonNode there = FILE.at("/study/channels/" + index);
            assertThat(there.at("/channel").stringValue()).isEqualTo(channel.channel());
            assertThat(there.at("/settled").booleanValue()).isEqualTo(channel.settled());
            for (int at = 0; at < channel.outcomes().size(); at++) {
                Propagated outcome = channel.outcomes().get(at);
                JsonNode sampled = there.at("/outcomes/" + at + "/sampled");
                assertThat(sampled.at("/mean_A").doubleValue()).isEqualTo(outcome.sampled().mean());
                assertThat(sampled.at("/symmetric/range_A/0").doubleValue())
                        .isEqualTo(outcome.sampled().symmetric().range().min());
                assertThat(sampled.at("/shortest/highStandardError_A").doubleValue())
                        .isEqualTo(outcome.sampled().shortest().standardErrors().high());
                assertThat(sampled.at("/histogram/counts").size()).isEqualTo(4);
                assertThat(there.at("/outcomes/" + at + "/effects").size()).isEqualTo(outcome.effects().size());
                assertThat(there.at("/outcomes/" + at + "/validation/valid").booleanValue())
                        .isEqualTo(outcome.validation().valid());
            }
        }
        assertThat(FILE.at("/study/yield/inside/estimate_fraction").doubleValue()).isEqualTo(0.9712);
        assertThat(FILE.at("/study/yield/shared/0/owner").stringValue()).isEqualTo("ambient");
    }

    @Test
    void aProbabilityOfWhichNothingWasCountedHasItsIntervalAndNoStandardError() {
        JsonNode none = FILE.at("/study/channels/0/outside");
        assertThat(none.at("/words").stringValue()).isEqualTo("below 3.7e-6 (95 %)");
        assertThat(none.at("/interval95_fraction/1").doubleValue()).isEqualTo(3.6889e-6);
        assertThat(none.has("standardError_fraction")).isFalse();
        JsonNode all = FILE.at("/study/channels/3/outside");
        assertThat(all.at("/words").stringValue()).startsWith("above 1 - 3.");
        assertThat(all.has("standardError_fraction")).isFalse();
        assertThat(FILE.at("/study/channels/1/outside/standardError_fraction").doubleValue()).isEqualTo(1.1e-4);
    }

    @Test
    void anUnsampledPlanHasNoStudy() {
        assertThat(JsonMapper.shared().readTree(PlanFile.bytes(PlanFixtures.unsampled())).has("study")).isFalse();
    }

    @Test
    void whereEveryTrialRanAwayNumbersAreAbsentAndTheFileStaysReadable() {
        JsonNode file = JsonMapper.shared().readTree(PlanFile.bytes(PlanFixtures.allRanAway()));
        JsonNode sampled = file.at("/study/channels/0/outcomes/0/sampled");
        assertThat(sampled.at("/runaways").longValue()).isEqualTo(sampled.at("/trials").longValue());
        assertThat(sampled.has("mean_A")).isFalse();
        assertThat(sampled.has("standard_A")).isFalse();
        assertThat(sampled.at("/symmetric").has("lowStandardError_A")).isFalse();
        assertThat(new String(PlanFile.bytes(PlanFixtures.allRanAway()), StandardCharsets.UTF_8)).doesNotContain("NaN");
    }

    @Test
    void infiniteDegreesOfFreedomAreAbsent() {
        assertThat(FILE.at("/channels/0/solved/assessments/0/combined").has("degreesOfFreedom")).isFalse();
        assertThat(FILE.at("/channels/0/solved/assessments/1/combined/degreesOfFreedom").doubleValue()).isEqualTo(42.5);
    }
}
