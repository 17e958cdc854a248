package shuntwright.io.planfile;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** The documentation of the plan file, made from the tables by which it is written. */
final class PlanFilePage {

    private PlanFilePage() {
    }

    /** All tables that can be reached from the plan file and from the files of answers, outer ones first. */
    static Set<ObjectTable<?>> tables() {
        Set<ObjectTable<?>> found = new LinkedHashSet<>();
        for (ObjectTable<?> file : List.of(PlanTables.PLAN, AnswerTables.FRONT, AnswerTables.OTHERS,
                AnswerTables.WHAT_IF)) {
            Deque<ObjectTable<?>> open = new ArrayDeque<>();
            open.add(file);
            while (!open.isEmpty()) {
                ObjectTable<?> next = open.remove();
                if (found.add(next)) {
                    next.attributes().forEach(each -> open.addAll(each.tables()));
                }
            }
        }
        return found;
    }

    /** The tables in Markdown. */
    static String tablesInMarkdown() {
        StringBuilder page = new StringBuilder();
        for (ObjectTable<?> table : tables()) {
            page.append("\n### ").append(table.name()).append("\n\n").append(table.meaning())
                    .append("\n\n| attribute | value | unit | required | meaning |\n|---|---|---|---|---|\n");
            for (Attribute<?> each : table.attributes()) {
                page.append("| `").append(each.key()).append("` | ").append(value(each)).append(" | ")
                        .append(each.unit()).append(" | ").append(each.always() ? "yes" : "no").append(" | ")
                        .append(each.meaning()).append(" |\n");
            }
        }
        return page.toString();
    }

    private static String value(Attribute<?> attribute) {
        if (attribute.tables().isEmpty()) {
            return attribute.value();
        }
        return attribute.value() + " " + attribute.tables().stream()
                .map(each -> "[" + each.name() + "](#" + each.name().replace(' ', '-') + ")")
                .collect(Collectors.joining(" or "));
    }
}
