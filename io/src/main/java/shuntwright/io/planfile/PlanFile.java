package shuntwright.io.planfile;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;

import tools.jackson.core.JsonGenerator;
import tools.jackson.core.util.DefaultIndenter;
import tools.jackson.core.util.DefaultPrettyPrinter;
import tools.jackson.databind.json.JsonMapper;

import shuntwright.plan.Plan;

/**
 * Writes plans as JSON, UTF-8, lines ended by a line feed. Every number is the shortest decimal that reads back as the
 * same double and has its unit in its key; one that is not finite stands as the text NaN, Infinity or -Infinity. The
 * same plan gives the same bytes: no clock, no locale.
 */
public final class PlanFile {

    /** Name and version of the format, the first attribute of every file. */
    public static final String FORMAT = "shuntwright plan 2";

    private static final JsonMapper MAPPER = JsonMapper.builder().build();

    private PlanFile() {
    }

    /**
     * Writes the plan and leaves the stream open.
     *
     * @throws IOException when the stream cannot be written to
     */
    public static void write(Plan plan, OutputStream out) throws IOException {
        out.write(bytes(plan));
    }

    /** The whole file. */
    public static byte[] bytes(Plan plan) {
        return bytes(PlanTables.PLAN, plan);
    }

    /** An object as a whole file. */
    static <T> byte[] bytes(ObjectTable<T> table, T object) {
        ByteArrayOutputStream buffer = new ByteArrayOutputStream();
        DefaultPrettyPrinter layout = new DefaultPrettyPrinter()
                .withObjectIndenter(new DefaultIndenter("  ", "\n"));
        try (JsonGenerator out = MAPPER.writer().with(layout).createGenerator(buffer)) {
            table.write(object, out);
            out.writeRaw('\n');
        }
        return buffer.toByteArray();
    }
}
