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

class PlanFileTest {

    private static final Plan PLAN = PlanFixtures.full();
    private static final JsonNode FILE = JsonMapper.shared().readTree(PlanFile.bytes(PLAN));

    @Test
    void startsWithItsFormatAndCautions() {
        String text = new String(PlanFile.bytes(PLAN), StandardCharsets.UTF_8);
        assertThat(text).startsWith("{\n  \"format\" : \"shuntwright plan 1\",\n  \"cautions\"").endsWith("}\n")
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
    void infiniteDegreesOfFreedomAreAbsent() {
        assertThat(FILE.at("/channels/0/solved/assessments/0/combined").has("degreesOfFreedom")).isFalse();
        assertThat(FILE.at("/channels/0/solved/assessments/1/combined/degreesOfFreedom").doubleValue()).isEqualTo(42.5);
    }
}
