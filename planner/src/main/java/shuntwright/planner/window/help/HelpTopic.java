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
            "5. The error budget shows which tolerance costs most, and the trials inside the allowed window. The shared strip shows what all channels take of "
                    + "supply, references and heat; click a tile to change its limits.",
            "6. Export the workbook for purchasing and for the bench.")),
    VERDICTS("Verdicts", List.of(
            "● inside – even in the worst case of all tolerances it trips (releases, reads) within what is asked.",
            "○ likely – not in the worst case, but the coverage interval of the propagated distribution is within. The "
                    + "board's acceptance decides whether that counts.",
            "▲ outside – neither; the findings say by how much and what would cure it.",
            "✕ no fit – no choice of parts respects the limits, such as an amplifier's output swing or a shunt's "
                    + "power; the findings name the nearest miss.",
            "▫ incomplete – something needed is not typed yet; the findings say what.")),
    ERROR_BUDGET("Error budget", List.of(
            "The same inputs, with the same limits and distributions, are read in three ways.",
            "Limits – the exact extremes when every input may stand anywhere within its limits at once. A channel inside "
                    + "by limits is inside whatever the distributions are.",
            "Combined – the combined uncertainty of JCGM 100: standard uncertainties, weighted by sensitivity and added "
                    + "as squares, times the coverage factor k. It supposes that the outcome is nearly normal.",
            "Propagated – the distribution that random trials give (JCGM 101). Its symmetric interval leaves as many "
                    + "trials below as above, its shortest interval is the shortest that holds as many. After ± stands "
                    + "the standard error that more trials would make smaller.",
            "Combined uncertainty valid – whether the combined uncertainty may stand for the distribution (JCGM 101, "
                    + "clause 8). Where one input with flat limits leads, it is not, and the propagated interval is "
                    + "narrower.",
            "Outside allowed – the probability that this outcome is not within its window. Trials cannot prove that "
                    + "something never happens: where none failed, the bound is given that holds with 95 % confidence.",
            "Limits, Lower, Upper, of target – what each input does to the limits by itself, in amperes and of the trip "
                    + "target.",
            "Variance – its share of the combined variance.",
            "First-order – the share of the trials' variance that it explains by itself. Total effect – the share it "
                    + "takes part in together with the inputs it multiplies, as a drift takes part with the ambient. "
                    + "Where the two differ, mending one of the partners helps as well.",
            "Before and after calibration – a calibrated reading can be seen as it would be without calibration; its "
                    + "trials are of the calibrated reading.",
            "Board yield – on how many boards all channels are inside together, with one supply, ambient and reference "
                    + "for all of them; beside it what the product of the channels' own probabilities would have "
                    + "claimed. Click it to see what each shared thing costs.",
            "The trials are drawn in the background: a first picture of 10,000, a better one of 100,000, then as many as "
                    + "the board asks for. The status bar shows it and can stop it; the best picture stays. The same "
                    + "board and seed give the same figures on every machine.",
            "Distributions that nobody stated are uniform between the limits. The figures are as good as the limits and "
                    + "distributions stated.")),
    CHOICE("Board-wide choice", List.of(
            "The parts of all channels are chosen together, so that the limits they share are kept and what is wanted of the "
                    + "board is reached. The tab Choice puts what is wanted in order: the first decides, each next one among "
                    + "choices equally good so far.",
            "Bound – no choice of any kind is better than this. Distance – nothing is better by more than this share of the "
                    + "value. Proven best – the distance is nothing. No bound known – nothing is known of what could be "
                    + "better.",
            "While a better choice is looked for, the best so far shows; it can be kept at once. A click on the tile Choice "
                    + "opens rounds, time limit and seed of the search. The same board, rounds and seed give the same plan, "
                    + "unless a time limit or a person ends the search.",
            "Conflict – demands that cannot be met together, with what each would have to be for the others to be met. A "
                    + "limit is relaxed by its button; of a channel the findings tell more. Until then the choice that breaks "
                    + "least is shown and marked.",
            "Other choices – the next-best circuits of the selected channel; cost, heat and parts are those of the whole "
                    + "board, chosen again around each. Pin this takes one.",
            "Front – plans of which none is better in one of two objectives without being worse in the other. The line is "
                    + "the edge of what was found; ◆ is the board as it is planned. Take this plan pins what a point chose.",
            "What if – cost, heat and parts as a limit or the number of boards changes. Where nothing meets the limits, "
                    + "there is a gap.",
            "What a front, other choices and what-if show is computed in the background, can be cancelled, and is marked "
                    + "once the board has been changed.")),
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
