package shuntwright.planner;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;

/** The rooms of the program and the arrows between them. */
class ArchitectureTest {
    private static final JavaClasses ALL = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS).importPackages("shuntwright");

    /** Packages of channels; each may use itself and those before it. */
    private static final List<String> CHANNELS = List.of("quantity", "parts", "board", "circuit", "accuracy",
            "sampling", "timing", "selection",
            "choice", "plan");

    private static final Set<String> NOT_CHANNELS = Set.of("io", "planner");

    private static final List<String> FOUNDATION = List.of("java..", "org.jspecify..", "org.hipparchus..");

    private static String[] packages(List<String> own, String... others) {
        return Stream.concat(own.stream().map(each -> "shuntwright." + each + ".."), Stream.of(others))
                .toArray(String[]::new);
    }

    private static String[] channelsAnd(String... others) {
        return packages(CHANNELS, others);
    }

    /** The first word after "shuntwright." of each package that holds classes. */
    private static Set<String> rooms() {
        return ALL.stream().map(each -> each.getPackageName().split("\\.")[1])
                .collect(Collectors.toCollection(TreeSet::new));
    }

    @Test
    void the_rules_look_at_the_whole_program() {
        assertThat(ALL.that(resideInAPackage("shuntwright.io..")).size()).as("classes of io").isGreaterThan(20);
        assertThat(ALL.that(resideInAPackage("shuntwright.planner..")).size()).as("classes of planner")
                .isGreaterThan(15);
        long channels = ALL.stream().filter(each -> CHANNELS.contains(each.getPackageName().split("\\.")[1])).count();
        assertThat(channels).as("classes of channels").isGreaterThan(60);
    }

    @Test
    void every_package_has_its_place_in_the_order() {
        Set<String> unplaced = rooms();
        unplaced.removeAll(CHANNELS);
        unplaced.removeAll(NOT_CHANNELS);
        assertThat(unplaced).as("packages without a place in the order; add them to it").isEmpty();
    }

    @Test
    void channels_know_no_file_format_and_no_window() {
        classes().that().resideInAnyPackage(channelsAnd()).should().onlyDependOnClassesThat()
                .resideInAnyPackage(channelsAnd(FOUNDATION.toArray(String[]::new)))
                .because("the domain must be usable, testable and understandable without files and windows").check(ALL);
    }

    @Test
    void io_knows_formats_but_no_window() {
        classes().that().resideInAPackage("shuntwright.io..").should().onlyDependOnClassesThat()
                .resideInAnyPackage(channelsAnd("shuntwright.io..", "java..", "javax.imageio..", "org.jspecify..",
                        "tools.jackson..", "org.apache.poi.."))
                .because("whatever opens a window or parses options stays in planner").check(ALL);
    }

    @Test
    void planner_leaves_formats_to_io() {
        classes().that().resideInAPackage("shuntwright.planner..").should().onlyDependOnClassesThat()
                .resideInAnyPackage(channelsAnd("shuntwright.io..", "shuntwright.planner..", "java..",
                        "org.jspecify..", "javafx..", "org.controlsfx..", "picocli..", "com.google.ortools..",
                        "com.google.protobuf.."))
                .because("a window or a command that reads JSON or spreadsheets itself would be a second way in")
                .check(ALL);
    }

    @Test
    void only_the_child_process_knows_the_solver() {
        noClasses().that().resideOutsideOfPackage("shuntwright.planner.proof..").should().dependOnClassesThat()
                .resideInAnyPackage("com.google.ortools..", "com.google.protobuf..")
                .because("the solver's library could end the process it runs in, and take the user's work with it")
                .check(ALL);
        noClasses().that()
                .haveNameMatching("shuntwright\\.planner\\.proof\\.(ChildProver|Conversation|Check|Launch|Wire|Task).*")
                .should().dependOnClassesThat().resideInAPackage("com.google.ortools..")
                .because("these run in the parent").check(ALL);
    }

    static Stream<String> placedPackages() {
        return CHANNELS.stream().filter(rooms()::contains);
    }

    @ParameterizedTest
    @MethodSource("placedPackages")
    void packages_of_channels_use_only_those_before_them(String name) {
        List<String> upToHere = CHANNELS.subList(0, CHANNELS.indexOf(name) + 1);
        classes().that().resideInAPackage("shuntwright." + name + "..").should().onlyDependOnClassesThat()
                .resideInAnyPackage(packages(upToHere, FOUNDATION.toArray(String[]::new)))
                .because("a reader follows one current: " + String.join(" → ", CHANNELS)).check(ALL);
    }

    @ParameterizedTest
    @ValueSource(strings = {"shuntwright.io.(*)..", "shuntwright.planner.(*).."})
    void packages_have_no_cycles(String slices) {
        slices().matching(slices).should().beFreeOfCycles()
                .because("packages in a ring can only be understood and changed all at once").check(ALL);
    }

    @Test
    void view_models_know_no_scene_and_no_stage() {
        noClasses().that().haveSimpleNameEndingWith("Model").and().resideInAPackage("shuntwright.planner..").should()
                .dependOnClassesThat().resideInAnyPackage("javafx.scene..", "javafx.stage..", "org.controlsfx..")
                .because("a view model is tested without a screen").allowEmptyShould(true).check(ALL);
    }

    @Test
    void only_the_command_line_prints() {
        noClasses().that().resideOutsideOfPackage("shuntwright.planner.command..").should(ACCESS_STANDARD_STREAMS)
                .because("with --json nothing else may stand on the standard output").check(ALL);
    }

    @Test
    void only_main_ends_the_program() {
        noClasses().that().doNotHaveFullyQualifiedName(Main.class.getName()).should()
                .callMethod(System.class, "exit", int.class).orShould()
                .callMethod(Runtime.class, "exit", int.class).orShould().callMethod(Runtime.class, "halt", int.class)
                .because("unsaved work, tests and other windows live in the same process").check(ALL);
    }

    @Test
    void only_the_command_line_and_main_know_options() {
        noClasses().that().resideOutsideOfPackage("shuntwright.planner.command..").should().dependOnClassesThat()
                .resideInAPackage("picocli..").because("the command line is thin and stands alone").check(ALL);
    }

    @Test
    void a_plan_depends_on_its_inputs_only() {
        DescribedPredicate<JavaAccess<?>> impure = describe("the clock, chance without a seed or the locale",
                access -> impure(access.getTargetOwner(), access.getTarget().getName()));
        noClasses().that().resideInAnyPackage(channelsAnd()).should().accessTargetWhere(impure)
                .because("the same board, catalogue and seed give the same plan, byte by byte").check(ALL);
    }

    private static boolean impure(JavaClass owner, String name) {
        return switch (owner.getName()) {
            case "java.lang.System" -> Set.of("currentTimeMillis", "nanoTime", "getenv").contains(name);
            case "java.lang.Math" -> name.equals("random");
            case "java.util.Locale" -> name.equals("getDefault");
            case "java.time.Instant", "java.time.LocalDate", "java.time.LocalDateTime" -> name.equals("now");
            default -> owner.isAssignableTo(Clock.class);
        };
    }

    @Test
    void every_package_is_null_marked() {
        Set<String> unmarked = ALL.stream().map(JavaClass::getPackage)
                .filter(each -> !each.isAnnotatedWith(NullMarked.class)).map(each -> each.getName())
                .collect(Collectors.toCollection(TreeSet::new));
        assertThat(unmarked).as("packages without @NullMarked in a package-info, where null would go unchecked")
                .isEmpty();
    }
}
