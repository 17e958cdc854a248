package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.StringTokenizer;
import java.util.function.Supplier;

import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;

/**
 * A task as text and back: words and numbers parted by white space, each list after its length, numbers in full so that they come back
 * bit by bit. Names of lines, slots and resources are left out.
 */
final class Wire {

    static final String END = "end";
    private static final String NONE = "none";

    private final StringBuilder out = new StringBuilder();

    private Wire() {
    }

    /** Lines of text, the last of them {@link #END}. */
    static String write(Task task) {
        Wire wire = new Wire();
        wire.limits(task.limits());
        wire.selection(task.selection());
        wire.question(task.question());
        return wire.line().put(END).line().out.toString();
    }

    /** @throws IllegalArgumentException when the text is no task */
    static Task read(String text) {
        try {
            return new Reader(text).task();
        } catch (IllegalArgumentException | java.util.NoSuchElementException e) {
            throw new IllegalArgumentException("this is no task for the solver: " + e.getMessage(), e);
        }
    }

    private Wire put(Object each) {
        out.append(each).append(' ');
        return this;
    }

    private Wire line() {
        out.append('\n');
        return this;
    }

    private Wire put(OptionalDouble value) {
        return value.isPresent() ? put(value.getAsDouble()) : put(NONE);
    }

    private void limits(SolverLimits limits) {
        put(limits.seconds()).put(limits.steadyEffort()).put(limits.workers()).put(limits.memory());
    }

    private void selection(Selection s) {
        line().put(s.boards()).put(s.lineCost()).line().put(s.lines().size());
        for (Selection.Line each : s.lines()) {
            Purchase bought = each.purchase();
            line().put(each.fixed()).put(bought.packSize()).put(bought.minimumOrder()).put(bought.prices().size());
            bought.prices().forEach(price -> put(price.quantity()).put(price.unitPrice()));
        }
        line().put(s.pools().size());
        s.pools().forEach(
                each -> line().put(each.line()).put(each.sections()).put(each.resource()).put(each.amount()));
        line().put(s.resources().size());
        s.resources().forEach(each -> line().put(each.limit()).put(each.fixed()));
        numbers(s.even());
        numbers(s.groups());
        line().put(s.menus().size());
        for (Selection.Menu menu : s.menus()) {
            line().put(menu.group()).put(menu.options().size());
            menu.options().forEach(this::option);
        }
        numbers(s.slots().stream().map(Selection.Slot::menu).toList());
    }

    private void option(Option option) {
        line().put(option.margin()).put(option.value()).put(option.lines().size());
        option.lines().forEach((line, pieces) -> put(line).put(pieces));
        put(option.pools().length);
        for (int pool : option.pools()) {
            put(pool);
        }
        put(option.resources().size());
        option.resources().forEach((resource, amount) -> put(resource).put(amount));
    }

    private void numbers(List<Integer> all) {
        line().put(all.size());
        all.forEach(this::put);
    }

    private void question(Prover.Question question) {
        line().put(question.caps().size());
        question.caps().forEach(cap -> aim(cap.aim()).put(cap.most()));
        line();
        question.aim().ifPresentOrElse(this::aim, () -> put(NONE));
        numbers(question.hint());
    }

    private Wire aim(Aim aim) {
        return switch (aim) {
            case Aim.Use(int resource) -> put("use").put(resource);
            case Aim.LargestShare _ -> put("share");
            case Aim.Cost _ -> put("cost");
            case Aim.Lines _ -> put("lines");
            case Aim.LeastMargin _ -> put("margin");
        };
    }

    private static final class Reader {
        private final StringTokenizer words;

        Reader(String text) {
            words = new StringTokenizer(text);
        }

        Task task() {
            SolverLimits limits = new SolverLimits(real(), real(), whole(), whole());
            Selection selection = selection();
            Prover.Question question = question();
            String end = word();
            if (!end.equals(END)) {
                throw new IllegalArgumentException("\"" + end + "\" where it should end");
            }
            return new Task(selection, question, limits);
        }

        private Selection selection() {
            Selection.Builder b = new Selection.Builder(whole(), real());
            list(this::readLine).forEach(b::line);
            list(() -> new Selection.Pool(whole(), whole(), whole(), real())).forEach(b::pool);
            list(() -> new Selection.Resource("", optional(), real())).forEach(b::resource);
            list(this::whole).forEach(b::even);
            list(this::whole).forEach(b::group);
            list(this::menu).forEach(b::menu);
            list(() -> new Selection.Slot("", whole())).forEach(b::slot);
            return b.build();
        }

        private Selection.Line readLine() {
            int fixed = whole();
            int pack = whole();
            int least = whole();
            List<PriceBreak> prices = list(() -> new PriceBreak(whole(), real()));
            return new Selection.Line("", new Purchase("", prices, pack, least, "", ""), fixed);
        }

        private Selection.Menu menu() {
            int group = whole();
            return new Selection.Menu(list(this::option), group);
        }

        private Option option() {
            double margin = real();
            int value = whole();
            Map<Integer, Integer> lines = new HashMap<>();
            list(() -> lines.put(whole(), whole()));
            List<Integer> pools = list(this::whole);
            Map<Integer, Double> resources = new HashMap<>();
            list(() -> resources.put(whole(), real()));
            return new Option(lines, pools, resources, margin, value);
        }

        private Prover.Question question() {
            List<Aim.Cap> caps = list(
                    () -> new Aim.Cap(aim().orElseThrow(() -> new IllegalArgumentException("a cap on nothing")),
                            real()));
            Optional<Aim> aim = aim();
            return new Prover.Question(caps, aim, list(this::whole));
        }

        private Optional<Aim> aim() {
            String kind = word();
            return switch (kind) {
                case NONE -> Optional.empty();
                case "use" -> Optional.of(new Aim.Use(whole()));
                case "share" -> Optional.of(new Aim.LargestShare());
                case "cost" -> Optional.of(new Aim.Cost());
                case "lines" -> Optional.of(new Aim.Lines());
                case "margin" -> Optional.of(new Aim.LeastMargin());
                default -> throw new IllegalArgumentException("no aim is called \"" + kind + "\"");
            };
        }

        private <T extends @org.jspecify.annotations.Nullable Object> List<T> list(Supplier<T> each) {
            int size = whole();
            if (size < 0) {
                throw new IllegalArgumentException("a list of length " + size);
            }
            List<T> all = new ArrayList<>();
            for (int i = 0; i < size; i++) {
                all.add(each.get());
            }
            return all;
        }

        private String word() {
            return words.nextToken();
        }

        private int whole() {
            return Integer.parseInt(word());
        }

        private double real() {
            return Double.parseDouble(word());
        }

        private OptionalDouble optional() {
            String word = word();
            return word.equals(NONE) ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(word));
        }
    }
}
