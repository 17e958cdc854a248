package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DesignatorsTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"R1 R2 R3 R7 | R1–R3, R7", "R1 | R1", "R1 R2 | R1, R2", "R8 R9 R10 | R8–R10",
            "R1 R2 R3 U4 U5 U6 | R1–R3, U4–U6", "R3 U4 R5 | R3, U4, R5", "R3 R2 R1 | R3, R2, R1",
            "R1 R2 R3 R5 R6 R7 R9 | R1–R3, R5–R7, R9", "R01 R02 R03 | R01, R02, R03",
            "TP1 TP2 TP3 TP4 | TP1–TP4", "R1 R1 R2 | R1, R1, R2", "R999999999 R1000000000 | R999999999, R1000000000"})
    void foldsRunsOfThreeAndMore(String given, String folded) {
        assertThat(Designators.fold(List.of(given.trim().split(" ")))).isEqualTo(folded);
    }

    @Test
    void nothingFoldsToNothing() {
        assertThat(Designators.fold(List.of())).isEmpty();
    }
}
