package shuntwright.io.boardfile;

import java.util.Optional;

import shuntwright.board.Source;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;

/** A source in a file: "supply" or the name of a reference. */
final class SourceWords {
    static final String SUPPLY = "supply";

    static final Kind<Source> KIND = Kinds.text("`\"supply\"` or name of a reference",
            "\"supply\" or the name of a reference", SourceWords::read, Source::word);

    private SourceWords() {
    }

    static Optional<Source> read(String text) {
        if (text.isBlank()) {
            return Optional.empty();
        }
        return Optional.of(text.equals(SUPPLY) ? new Source.Supply() : new Source.OfReference(text));
    }
}
