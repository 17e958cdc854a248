package shuntwright.io.partsfile;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

import shuntwright.io.form.Form;
import shuntwright.io.form.FormatLine;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.JsonText;
import shuntwright.io.json.JsonTree;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;
import shuntwright.parts.Catalogue;

/** Opens and saves parts files. */
public final class PartsFiles {
    static final FormatLine FORMAT = new FormatLine("parts", 1);
    static final PartsFileForm FORM = new PartsFileForm();

    private PartsFiles() {
    }

    /** Opens parts files as one catalogue; an empty one when there are none. */
    public static FileReading<Catalogue> open(List<Path> files) {
        PartsMerge merge = new PartsMerge();
        files.forEach(merge::add);
        return merge.finish();
    }

    /**
     * Reads the text of a parts file.
     *
     * @param name what problems call the file
     */
    public static FileReading<PartsFile> parse(String name, String text) {
        Problems problems = new Problems(name);
        return reading(JsonTree.parse(text, problems), problems);
    }

    private static FileReading<PartsFile> reading(Optional<LocatedJson> root, Problems problems) {
        PartsMerge alone = new PartsMerge();
        Optional<PartsFile> file = root.flatMap(there -> alone.read(there, problems));
        return file.isPresent() && problems.isEmpty()
                ? new FileReading.Opened<>(file.get())
                : new FileReading.Refused<>(problems.list());
    }

    /** The text of the file: the same parts always give the same text. */
    public static String write(PartsFile parts) {
        return JsonText.print(FORM.write(parts));
    }

    /** Saves the parts; the file is either replaced as a whole or left as it was. */
    public static SaveResult save(PartsFile parts, Path file) {
        byte[] text = write(parts).getBytes(StandardCharsets.UTF_8);
        return SafeSave.save(file, out -> out.write(text));
    }

    /** Every type of object in a parts file, the file itself first. */
    public static List<Form<?>> forms() {
        return FORM.all();
    }
}
