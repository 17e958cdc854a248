package shuntwright.io.workbook;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.time.LocalDateTime;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** Takes the clock out of a zip file. */
final class FixedZip {

    /** Within what the plain time field of an entry holds, so that no time zone enters. */
    private static final LocalDateTime FIXED = LocalDateTime.of(1981, 1, 1, 0, 0);

    private FixedZip() {
    }

    /** The same entries in the same order, all with one time. */
    static byte[] of(byte[] zip) throws IOException {
        ByteArrayOutputStream fixed = new ByteArrayOutputStream(zip.length);
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(zip));
                ZipOutputStream out = new ZipOutputStream(fixed)) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                ZipEntry same = new ZipEntry(entry.getName());
                same.setTimeLocal(FIXED);
                out.putNextEntry(same);
                in.transferTo(out);
                out.closeEntry();
            }
        }
        return fixed.toByteArray();
    }
}
