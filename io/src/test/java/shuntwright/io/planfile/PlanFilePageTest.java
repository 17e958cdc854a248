package shuntwright.io.planfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

import org.junit.jupiter.api.Test;

import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

import shuntwright.accuracy.Slot;
import shuntwright.io.fixture.ChoiceFixtures;
import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.Plan;

class PlanFilePageTest {

    private static final Path PAGE = Path.of(System.getProperty("shuntwright.root", ".."), "docs", "plan-file.md");
    private static final String START = "<!-- tables: made from the code, checked by PlanFilePageTest -->\n";

    @Test
    void thePageHoldsTheTablesByWhichTheFileIsWritten() throws IOException {
        String page = Files.readString(PAGE);
        int start = page.indexOf(START) + START.length();
        assertThat(page).contains(START);
        if (Boolean.getBoolean("shuntwright.rewrite")) {
            page = page.substring(0, start) + PlanFilePage.tablesInMarkdown();
            Files.writeString(PAGE, page);
        }
        assertThat(page.substring(start))
                .as("run the tests of io once with -Dextra.test.jvm=-Dshuntwright.rewrite=true to repair the page")
                .isEqualTo(PlanFilePage.tablesInMarkdown());
    }

    @Test
    void everyTableIsNamedOnce() {
        List<String> names = new ArrayList<>();
        PlanFilePage.tables().forEach(each -> names.add(each.name()));
        assertThat(names).doesNotHaveDuplicates().hasSizeGreaterThan(50);
    }

    @Test
    void aFullPlanWithItsAnswersEmitsEveryDocumentedAttributeAndNoOther() {
        Plan plan = PlanFixtures.full();
        Set<String> emitted = new TreeSet<>();
        for (byte[] file : List.of(PlanFile.bytes(plan), AnswerFile.front(plan, ChoiceFixtures.front(plan)),
                AnswerFile.others(plan, "Pump", ChoiceFixtures.others(plan)),
                AnswerFile.whatIf(plan, ChoiceFixtures.whatIf()))) {
            collect(JsonMapper.shared().readTree(file), emitted);
        }
        Set<String> fixed = new TreeSet<>();
        List<String> stems = new ArrayList<>();
        for (ObjectTable<?> table : PlanFilePage.tables()) {
            for (Attribute<?> each : table.attributes()) {
                if (each.key().endsWith("_UNIT")) {
                    stems.add(each.key().substring(0, each.key().length() - "UNIT".length()));
                } else {
                    fixed.add(each.key());
                }
            }
        }
        assertThat(emitted).containsAll(fixed);
        Set<String> rest = new HashSet<>(emitted);
        rest.removeAll(fixed);
        assertThat(rest).isNotEmpty()
                .allSatisfy(key -> assertThat(stems).anySatisfy(stem -> assertThat(key).startsWith(stem)));
        assertThat(stems).allSatisfy(stem -> assertThat(emitted).anySatisfy(key -> assertThat(key).startsWith(stem)));
    }

    @Test
    void everyInputHasAKnownUnit() {
        for (Slot each : Slot.values()) {
            assertThat(Unit.of(each).symbol()).isEqualTo(each.unit());
        }
    }

    private static void collect(JsonNode node, Set<String> keys) {
        for (Map.Entry<String, JsonNode> each : node.properties()) {
            keys.add(each.getKey());
            collect(each.getValue(), keys);
        }
        if (node.isArray()) {
            node.forEach(each -> collect(each, keys));
        }
    }
}
