package shuntwright.planner.window.help;

import java.util.List;

/** A page of the help menu. */
@SuppressWarnings("ImmutableEnumChecker") // the lists are never changed
public enum HelpTopic {
    FIRST_STEPS("First steps", List.of(
            "1. Open a demo board, or make a new board; it chooses from the demo parts where they are at hand, and from "
                    + "parts files of your own (File menu, Add parts file).",
            "2. Type a channel's name into the last row of the table, then its rail voltage, load current, no-trip and "
                    + "must-trip current. Cells take 35, 35 A, 4m, 12 V ±10 % or 10.5 .. 12 .. 14.4 V.",
            "3. Each edit plans the board again. The verdict says whether the channel meets its demand; the drawing "
                    + "shows where in the allowed window it trips.",
            "4. Select a channel that is not inside and read its findings. A cure that is a change of the demand has a "
                    + "button; Undo takes it back.",
            "5. The error budget shows which tolerance costs most. The shared strip shows what all channels take of "
                    + "supply, references and heat; click a tile to change its limits.",
            "6. Export the workbook for purchasing and for the bench.")),
    VERDICTS("Verdicts", List.of(
            "● inside – even in the worst case of all tolerances it trips (releases, reads) within what is asked.",
            "○ likely – not in the worst case, but the coverage interval is within. The board's acceptance decides "
                    + "whether that counts.",
            "▲ outside – neither; the findings say by how much and what would cure it.",
            "✕ no fit – no choice of parts respects the limits, such as an amplifier's output swing or a shunt's "
                    + "power; the findings name the nearest miss.",
            "▫ incomplete – something needed is not typed yet; the findings say what.")),
    KEYBOARD("Keyboard",
            List.of("Arrow keys: move between cells",
                    "Tab, Shift+Tab: move to the next, the last cell that can be typed into (Ctrl+Tab leaves the "
                            + "table)",
                    "Typing, F2 or Enter: edit the cell",
                    "Enter: take the text over and go down; Tab: and go to the next cell that can be typed into",
                    "Ctrl+Enter: type the text into all selected cells of the column",
                    "Esc: leave the cell as it was; on a wrong entry: give it up",
                    "Delete: clear the selected cells", "Ctrl+C, Ctrl+V: copy and paste blocks of cells",
                    "Ctrl+Z, Ctrl+Shift+Z: undo, redo", "Insert: add a channel",
                    "Ctrl+D: duplicate the selected channels",
                    "Ctrl+Delete: remove the selected channels", "Ctrl+F: find a channel",
                    "Ctrl+N, Ctrl+O, Ctrl+S, Ctrl+Shift+S: new, open, save, save as",
                    "Ctrl+E: export the workbook", "Ctrl+plus, Ctrl+minus: larger, smaller text")),
    CAUTIONS("Cautions",
            List.of("Electronic overcurrent detection is not a replacement for the fuse or circuit breaker "
                    + "that codes ask for.",
                    "Verify every channel by test, at both ends of its temperature range.",
                    "The figures are as good as the part data typed in; compare them with the data sheets of "
                            + "the parts you buy.",
                    "Local codes and a licensed practitioner decide what is permitted."));

    private final String title;
    private final List<String> lines;

    HelpTopic(String title, List<String> lines) {
        this.title = title;
        this.lines = lines;
    }

    public String title() {
        return title;
    }

    public List<String> lines() {
        return lines;
    }
}
