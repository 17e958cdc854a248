package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.board.StatedDistribution;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Distribution;

/** What a board states of its inputs reaches exactly the inputs that it is stated for. */
class StatedDistributionsTest {
    private static final Distribution UNIFORM = new Distribution.Uniform();
    private static final Distribution NORMAL = new Distribution.Normal(3);
    private static final Distribution ARCSINE = new Distribution.ArcSine();

    private static List<Input> inputs(RandomCircuits.Drawn drawn, List<StatedDistribution> stated) {
        Surroundings around = drawn.around();
        Surroundings told = new Surroundings(around.ambient(), around.supply(), around.rules(), around.adc(), stated,
                around.zone());
        return ChannelAccuracy.of(drawn.circuit(), told, drawn.demand()).inputs();
    }

    private static Map<PartKind, String> numbers(SenseCircuit circuit) {
        Map<PartKind, String> numbers = new LinkedHashMap<>();
        numbers.put(PartKind.SHUNT, circuit.shunt().partNumber());
        numbers.put(PartKind.AMPLIFIER, circuit.amplifier().partNumber());
        numbers.put(PartKind.COMPARATOR, circuit.comparator().partNumber());
        numbers.put(PartKind.RESISTORS, circuit.resistors().partNumber());
        return numbers;
    }

    private static StatedDistribution stated(Slot slot, String part, Distribution distribution) {
        return new StatedDistribution(slot.words(), part.isEmpty() ? Optional.empty() : Optional.of(part),
                distribution);
    }

    @Test
    void theWordsOfAnInputFindItsSlot() {
        assertThat(Arrays.stream(Slot.values()).map(Slot::words)).doesNotHaveDuplicates();
        assertThat(Slot.values()).allSatisfy(each -> assertThat(Slot.of(each.words())).contains(each));
        assertThat(Slot.of("shunt")).isEmpty();
    }

    @Test
    void aStatementWithoutPartReachesAllInputsOfItsSlotAndNoOther() {
        RandomCircuits circuits = RandomCircuits.full(new SplittableRandom(11));
        Set<Slot> seen = EnumSet.noneOf(Slot.class);
        for (int i = 0; i < 40; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            for (Slot slot : Slot.values()) {
                for (Input input : inputs(drawn, List.of(stated(slot, "", NORMAL)))) {
                    seen.add(input.slot());
                    assertThat(input.distribution()).as(input.label()).isEqualTo(input.slot() == slot
                            ? NORMAL
                            : UNIFORM);
                }
            }
        }
        assertThat(seen).hasSizeGreaterThan(35);
    }

    @Test
    void aStatementForAPartReachesTheInputsThatThePartOwns() {
        RandomCircuits circuits = RandomCircuits.full(new SplittableRandom(12));
        for (int i = 0; i < 40; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            Map<PartKind, String> numbers = numbers(drawn.circuit());
            assertThat(numbers.values()).doesNotHaveDuplicates();
            numbers.forEach((kind, number) -> {
                List<StatedDistribution> all = Arrays.stream(Slot.values()).map(slot -> stated(slot, number, NORMAL))
                        .toList();
                for (Input input : inputs(drawn, all)) {
                    boolean owned = input.slot().part().equals(Optional.of(kind));
                    assertThat(input.distribution()).as("%s, stated for %s", input.label(), kind.words())
                            .isEqualTo(owned ? NORMAL : UNIFORM);
                }
            });
        }
    }

    @Test
    void aPartGoesBeforeEveryPartAndTheLastBeforeTheOthers() {
        RandomCircuits.Drawn drawn = RandomCircuits.full(new SplittableRandom(13)).next();
        String number = drawn.circuit().shunt().partNumber();
        Slot slot = Slot.SHUNT_TOLERANCE;

        assertThat(of(drawn, stated(slot, number, NORMAL), stated(slot, "", ARCSINE))).isEqualTo(NORMAL);
        assertThat(of(drawn, stated(slot, "", ARCSINE), stated(slot, "", NORMAL))).isEqualTo(NORMAL);
        assertThat(of(drawn, stated(slot, number, ARCSINE), stated(slot, number, NORMAL))).isEqualTo(NORMAL);
        assertThat(of(drawn, stated(slot, number + "X", NORMAL), stated(slot, "", ARCSINE))).isEqualTo(ARCSINE);
    }

    @Test
    void anAsteriskStandsForTheRestOfAPartNumber() {
        RandomCircuits.Drawn drawn = RandomCircuits.full(new SplittableRandom(13)).next();
        assertThat(drawn.circuit().shunt().partNumber()).isEqualTo("shunt");

        assertThat(of(drawn, stated(Slot.SHUNT_TOLERANCE, "sh*", NORMAL))).isEqualTo(NORMAL);
        assertThat(of(drawn, stated(Slot.SHUNT_TOLERANCE, "shunt*", NORMAL))).isEqualTo(NORMAL);
        assertThat(of(drawn, stated(Slot.SHUNT_TOLERANCE, "shunts*", NORMAL))).isEqualTo(UNIFORM);
        assertThat(of(drawn, stated(Slot.SHUNT_TOLERANCE, "sh", NORMAL))).isEqualTo(UNIFORM);
    }

    private static Distribution of(RandomCircuits.Drawn drawn, StatedDistribution... stated) {
        return inputs(drawn, List.of(stated)).stream().filter(each -> each.slot() == Slot.SHUNT_TOLERANCE).findFirst()
                .orElseThrow().distribution();
    }
}
