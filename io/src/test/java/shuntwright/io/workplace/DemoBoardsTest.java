package shuntwright.io.workplace;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.ReleaseDemand;
import shuntwright.io.json.FileReading;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.Reference;
import shuntwright.parts.Shunt;

/** The demo boards open as they are delivered, and show what they are there to show. */
class DemoBoardsTest {

    private static final String WREN = "sledge-wren";
    private static final String PLOVER = "tractor-plover";
    private static final String LANTERN = "camp-lantern";

    private static Workplace open(String name) {
        Path file = Path.of(System.getProperty("shuntwright.root"), "demo-boards", name + ".board.json");
        FileReading<Workplace> reading = Workplace.open(file, List.of());
        assertThat(reading.problems()).isEmpty();
        return reading.ifOpened().orElseThrow();
    }

    private static List<Board> boards() {
        return Stream.of(WREN, PLOVER, LANTERN).map(name -> open(name).board()).toList();
    }

    @ParameterizedTest
    @CsvSource({WREN + ", 8", PLOVER + ", 24", LANTERN + ", 64"})
    void hasItsChannelsUnderDifferentNames(String name, int channels) {
        assertThat(open(name).board().channels()).hasSize(channels).extracting(Channel::name).doesNotHaveDuplicates();
    }

    @ParameterizedTest
    @ValueSource(strings = {WREN, PLOVER, LANTERN})
    void saysWhatNeedsSayingForAPlan(String name) {
        assertThat(open(name).board().channels()).allSatisfy(channel -> {
            assertThat(channel.rail()).isPresent();
            double load = channel.currents().load().orElseThrow();
            double noTrip = channel.currents().noTrip().orElseThrow();
            assertThat(noTrip).isGreaterThan(load);
            assertThat(channel.currents().mustTrip().orElseThrow()).isGreaterThan(noTrip);
        });
    }

    @ParameterizedTest
    @ValueSource(strings = {WREN, PLOVER, LANTERN})
    void namesPartsThatTheCatalogueHas(String name) {
        Workplace place = open(name);
        Catalogue catalogue = place.catalogue();

        assertThat(place.board().references()).isNotEmpty()
                .allSatisfy(each -> assertThat(catalogue.find(each.part(), Reference.class)).isPresent());
        assertThat(place.board().channels()).extracting(Channel::pins).allSatisfy(pins -> {
            assertThat(pins.shunt().stream())
                    .allSatisfy(part -> assertThat(catalogue.find(part, Shunt.class)).isPresent());
            assertThat(pins.comparator().stream())
                    .allSatisfy(part -> assertThat(catalogue.find(part, Comparator.class)).isPresent());
        });
    }

    @ParameterizedTest
    @ValueSource(strings = {WREN, PLOVER, LANTERN})
    void saysThatItIsInvented(String name) {
        assertThat(open(name).board().description()).contains("invented");
    }

    @Test
    void hasACatalogueLargeEnoughToChooseFrom() {
        Catalogue catalogue = open(WREN).catalogue();

        assertThat(catalogue.shunts()).hasSizeGreaterThanOrEqualTo(380);
        assertThat(catalogue.amplifiers()).hasSize(40);
        assertThat(catalogue.comparators()).hasSize(12);
        assertThat(catalogue.references()).hasSize(6);
        assertThat(catalogue.resistors()).isNotEmpty();
        assertThat(catalogue.capacitors()).isNotEmpty();
        assertThat(catalogue.parts()).allSatisfy(part -> assertThat(part.purchase().prices()).isNotEmpty());
    }

    @Test
    void offersEveryKindOfHysteresis() {
        assertThat(kinds(open(WREN).catalogue().comparators().stream().map(Comparator::hysteresis)))
                .containsExactlyInAnyOrder(Hysteresis.class.getPermittedSubclasses());
    }

    /** Beside these the boards have channels that leave the kind to the program. */
    @Test
    void asksForKindsOfHysteresisThatTheProgramWouldNotChooseByItself() {
        Catalogue catalogue = open(WREN).catalogue();
        List<Channel> channels = boards().stream().flatMap(board -> board.channels().stream()).toList();

        Stream<Hysteresis> pinned = channels.stream().map(channel -> channel.pins().comparator())
                .flatMap(Optional::stream)
                .map(part -> catalogue.find(part, Comparator.class).orElseThrow().hysteresis());
        assertThat(kinds(pinned)).contains(Hysteresis.BuiltIn.class, Hysteresis.PositiveFeedback.class);
        assertThat(channels).extracting(Channel::release).hasAtLeastOneElementOfType(ReleaseDemand.Latch.class)
                .hasAtLeastOneElementOfType(ReleaseDemand.Between.class)
                .hasAtLeastOneElementOfType(ReleaseDemand.Window.class);
    }

    @Test
    void everyBoardHasShuntsOnBothSides() {
        assertThat(boards()).allSatisfy(board -> assertThat(board.channels()).extracting(Channel::side)
                .contains(Channel.Side.values()));
    }

    private static Set<Class<?>> kinds(Stream<Hysteresis> all) {
        Set<Class<?>> kinds = new HashSet<>();
        all.forEach(each -> kinds.add(each.getClass()));
        return kinds;
    }
}
