package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reference designators (letters by IEEE 315 and a number) as people list them. */
public final class Designators {

    private static final Pattern LETTERS_NUMBER = Pattern.compile("(\\D+)([1-9]\\d{0,8})");

    private Designators() {
    }

    /**
     * Folds runs of three or more consecutive numbers: R1, R2, R3, R7 become "R1–R3, R7". The order given is kept;
     * anything that is not letters and a number stands as it is.
     */
    public static String fold(List<String> designators) {
        List<String> folded = new ArrayList<>();
        int start = 0;
        while (start < designators.size()) {
            int end = start + 1;
            while (end < designators.size() && follows(designators.get(end - 1), designators.get(end))) {
                end++;
            }
            if (end - start >= 3) {
                folded.add(designators.get(start) + "–" + designators.get(end - 1));
            } else {
                folded.addAll(designators.subList(start, end));
            }
            start = end;
        }
        return String.join(", ", folded);
    }

    private static boolean follows(String first, String second) {
        Matcher one = LETTERS_NUMBER.matcher(first);
        Matcher two = LETTERS_NUMBER.matcher(second);
        return one.matches() && two.matches() && one.group(1).equals(two.group(1))
                && Integer.parseInt(two.group(2)) == Integer.parseInt(one.group(2)) + 1;
    }
}
