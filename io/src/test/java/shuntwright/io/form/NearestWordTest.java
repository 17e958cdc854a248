package shuntwright.io.form;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;

class NearestWordTest {
    @Test
    void editsAreCounted() {
        assertThat(NearestWord.distance("", "abc")).isEqualTo(3);
        assertThat(NearestWord.distance("kitten", "sitting")).isEqualTo(3);
        assertThat(NearestWord.distance("laod", "load")).isEqualTo(1);
        assertThat(NearestWord.distance("same", "same")).isZero();
    }

    @Test
    void theNearestWordIsFoundWhateverItsCapitals() {
        assertThat(NearestWord.find("NOTRIP", List.of("note", "noTrip", "mustTrip"))).hasValue("noTrip");
    }

    @Test
    void aWordThatIsFarFromAllIsNotGuessed() {
        assertThat(NearestWord.find("colour", List.of("load", "rail"))).isEmpty();
        assertThat(NearestWord.unknown("key", "colour", List.of("load", "rail"))).endsWith("known are load, rail");
    }
}
