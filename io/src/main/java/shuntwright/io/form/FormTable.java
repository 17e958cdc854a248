package shuntwright.io.form;

/** The documentation of a form: its keys as a table in Markdown. */
public final class FormTable {
    private FormTable() {
    }

    /** Header and one row for each key, in the order in which they are written. */
    public static String markdown(Form<?> form) {
        StringBuilder table = new StringBuilder("""
                | attribute | unit | required | meaning | default |
                |---|---|---|---|---|
                """);
        for (Key<?> key : form.keys()) {
            table.append("| `").append(key.name()).append("` | ").append(key.kind().unit()).append(" | ")
                    .append(key.isRequired() ? "yes" : "no").append(" | ").append(key.meaning()).append(" | ")
                    .append(key.isRequired() ? "" : key.absent()).append(" |\n");
        }
        return table.toString();
    }
}
