package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SafeTextTest {

    @ParameterizedTest
    @ValueSource(strings = {"4 mΩ ±0.5 %", "_x0041_", "a_x005F_b", "_x_", "=1+1", " leading", "two\nlines", "😀"})
    void comesBackAsItWas(String text) throws IOException {
        assertThat(throughAFile(text)).isEqualTo(text);
    }

    @Test
    void dropsWhatXmlCannotHold() throws IOException {
        assertThat(throughAFile("a\u0000b\u001bc\ud800d\uffff")).isEqualTo("abcd");
    }

    @Test
    void keepsToTheLengthOfACell() {
        assertThat(SafeText.cell("x".repeat(40_000))).hasSize(32_767).endsWith("…");
    }

    @Test
    void knowsWhatASpreadsheetTakesForAFormula() {
        assertThat("=+-@".chars()).allSatisfy(
                it -> assertThat(SafeText.looksLikeFormula(Character.toString(it) + "1")).isTrue());
        assertThat(SafeText.looksLikeFormula("")).isFalse();
        assertThat(SafeText.looksLikeFormula("1E3")).isFalse();
    }

    @Test
    void doublesAmpersandsInMargins() {
        assertThat(SafeText.margin("pump & fan")).isEqualTo("pump && fan");
    }

    private static String throughAFile(String text) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (XSSFWorkbook book = new XSSFWorkbook()) {
            book.createSheet("s").createRow(0).createCell(0).setCellValue(SafeText.cell(text));
            book.write(out);
        }
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(out.toByteArray()))) {
            return book.getSheet("s").getRow(0).getCell(0).getStringCellValue();
        }
    }
}
