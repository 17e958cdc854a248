package shuntwright.io.workbook;

/** How a cell looks; each with its number format. */
enum Style {
    TEXT("@"), WRAPPED("@"), COUNT("#,##0"), VOLT("0.0000"), AMPERE("0.0000"), MILLIOHM("0.0000"), OHM("General"),
    GAIN("General"), PERCENT("0.00"), WATT("0.0000"), MONEY("#,##0.00"), UNIT_PRICE("#,##0.0000"), GENERAL("General"),
    /** Small currents beside large ones. */
    FINE_AMPERE("0.00000"), EXPONENT("0.00E+00"), FACTOR("0.000"), TENTH("0.0"), FINE_PERCENT("0.000"),
    /** A formula that says yes or no. */
    ANSWER("General"),
    TITLE("@"), LABEL("@"), GROUP("@"), HEADER("@"), NUMBER_HEADER("@"), ANSWER_HEADER("@"), INPUT_COUNT("#,##0"),
    INPUT_SHARE("0.0%"),
    INPUT_MONEY("#,##0.00"),
    TOTAL_MONEY("#,##0.00"),
    TOTAL_COUNT("#,##0"), TOTAL_PERCENT("0.000"), GOOD("@"), FAIR("@"), BAD("@");

    private final String format;

    Style(String format) {
        this.format = format;
    }

    String format() {
        return format;
    }

    /** How the header of such cells looks. */
    Style header() {
        return this == ANSWER ? ANSWER_HEADER : isNumber() ? NUMBER_HEADER : HEADER;
    }

    /** True for cells that hold numbers. */
    boolean isNumber() {
        return !format.equals("@");
    }
}
