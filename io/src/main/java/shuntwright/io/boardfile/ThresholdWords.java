package shuntwright.io.boardfile;

import java.util.Optional;

import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;

/** Where a threshold may come from, in a file: "free", "supply", "reference NAME" or "tap NAME". */
final class ThresholdWords {
    static final String TAP = "tap ";
    static final String REFERENCE = "reference ";

    static final Kind<ThresholdDemand> KIND = Kinds.text(
            "`\"free\"`, `\"supply\"`, `\"reference NAME\"` or `\"tap NAME\"`",
            "\"free\", \"supply\", \"reference NAME\" or \"tap NAME\"", ThresholdWords::read, ThresholdWords::write);

    private ThresholdWords() {
    }

    /** The name behind that first word. */
    static Optional<String> named(String text, String first) {
        return text.startsWith(first) && text.length() > first.length()
                ? Optional.of(text.substring(first.length()))
                : Optional.empty();
    }

    private static Optional<ThresholdDemand> read(String text) {
        return switch (text) {
            case "free" -> Optional.of(new ThresholdDemand.Free());
            case SourceWords.SUPPLY -> Optional.of(new ThresholdDemand.OwnDivider(new Source.Supply()));
            default -> named(text, TAP).<ThresholdDemand>map(ThresholdDemand.SharedTap::new)
                    .or(() -> named(text, REFERENCE)
                            .map(name -> new ThresholdDemand.OwnDivider(new Source.OfReference(name))));
        };
    }

    private static String write(ThresholdDemand demand) {
        return switch (demand) {
            case ThresholdDemand.Free _ -> "free";
            case ThresholdDemand.OwnDivider(Source.Supply _) -> SourceWords.SUPPLY;
            case ThresholdDemand.OwnDivider(Source.OfReference(String name)) -> REFERENCE + name;
            case ThresholdDemand.SharedTap(String tap) -> TAP + tap;
        };
    }
}
