package shuntwright.io.partsfile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import shuntwright.io.json.FileReading;
import shuntwright.io.json.JsonFiles;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problem;
import shuntwright.io.json.Problems;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Part;

/** Reads parts files one after the other into one catalogue; what is wrong with any of them is collected. */
public final class PartsMerge {
    private static final List<String> LISTS = List.of("shunts", "amplifiers", "comparators", "references",
            "resistorSeries", "capacitorSeries");

    private final List<Problem> problems = new ArrayList<>();
    private final List<Part> parts = new ArrayList<>();
    /** For each part number where it stands first, in words. */
    private final Map<String, String> numbers = new HashMap<>();
    private Optional<Stated> currency = Optional.empty();

    private record Stated(String code, String file) {}

    /** Adds the parts of that file. */
    public void add(Path file) {
        Problems found = new Problems(String.valueOf(file.getFileName()));
        JsonFiles.read(file, found).flatMap(root -> read(root, found)).ifPresent(read -> parts.addAll(read.parts()));
        problems.addAll(found.list());
    }

    /** Reads one file and checks it against those before it. */
    Optional<PartsFile> read(LocatedJson root, Problems found) {
        return PartsFiles.FORMAT.check(root, found).flatMap(object -> {
            checkNumbers(object, found);
            checkCurrency(object, found);
            return PartsFiles.FORM.read(object, found);
        });
    }

    private void checkNumbers(LocatedJson.Obj file, Problems found) {
        for (String list : LISTS) {
            for (LocatedJson each : file.elements(list)) {
                if (each instanceof LocatedJson.Obj part) {
                    part.text("partNumber").ifPresent(number -> checkNumber(number, found));
                }
            }
        }
    }

    private void checkNumber(LocatedJson.Text number, Problems found) {
        String here = found.file() + ", line " + number.place().line();
        String before = numbers.putIfAbsent(number.value(), here);
        if (before != null) {
            found.add(number, "the part number \"" + number.value() + "\" stands twice, first in " + before
                    + "; a part number may stand once in all parts files of a board");
        }
    }

    private void checkCurrency(LocatedJson.Obj file, Problems found) {
        file.text("currency").ifPresent(code -> {
            if (currency.isEmpty()) {
                currency = Optional.of(new Stated(code.value(), found.file()));
            }
            currency.filter(first -> !first.code().equals(code.value()))
                    .ifPresent(first -> found.add(code, "the prices are in " + code.value() + ", but " + first.file()
                            + " has them in " + first.code() + "; all parts files of a board need one currency"));
        });
    }

    /** Everything that is wrong with the files so far. */
    public List<Problem> problems() {
        return List.copyOf(problems);
    }

    /** The catalogue of all files, or everything that is wrong with them. */
    public FileReading<Catalogue> finish() {
        if (!problems.isEmpty()) {
            return new FileReading.Refused<>(problems);
        }
        return new FileReading.Opened<>(
                currency.map(stated -> Catalogue.of(stated.code(), parts)).orElse(Catalogue.EMPTY));
    }
}
