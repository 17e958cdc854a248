package shuntwright.io.boardfile;

import shuntwright.board.BoardReference;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Sheet;

final class ReferenceForm extends Form<BoardReference> {
    private final Key<String> name = required("name", Kinds.name(),
            "what channels, taps and the ADC call it; not `supply`");
    private final Key<String> part = required("part", Kinds.name(), "part number of a reference in the parts files");

    ReferenceForm() {
        super("Reference");
    }

    @Override
    protected BoardReference bind(Fields fields) {
        return new BoardReference(fields.get(name), fields.get(part));
    }

    @Override
    protected void fill(BoardReference value, Sheet sheet) {
        sheet.put(name, value.name());
        sheet.put(part, value.part());
    }
}
