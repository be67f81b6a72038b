package hissledger;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** The rooms of the house and who may call whom. */
class ArchitectureTest {
    /** Lowest first: a package uses only those before it. */
    private static final List<String> ROOMS = List.of(
            "physics", "twoport", "device", "circuit", "ledger", "choose", "spread", "fit", "files", "chart", "report",
            "cli", "desk");

    /**
     * The rules would hold for an empty house; no more classes than this means
     * that they were not seen. Raise it as the house grows.
     */
    private static final int FEWEST_CLASSES = 80;

    private static final JavaClasses HOUSE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("hissledger");

    @Test
    void everyPackageIsARoom() {
        assertThatTheHouseIsSeen();
        assertThat(packages())
                .isSubsetOf(ROOMS.stream().map(room -> "hissledger." + room).toList());
    }

    /** An unmarked package would pass the null check unseen. */
    @Test
    void everyPackageIsMarkedAgainstNull() {
        assertThatTheHouseIsSeen();
        assertThat(packages()).allMatch(name -> HOUSE.getPackage(name).isAnnotatedWith(NullMarked.class));
    }

    @Test
    void aPackageUsesOnlyThoseBeforeIt() {
        for (int room = 0; room < ROOMS.size() - 1; room++) {
            String[] after = ROOMS.subList(room + 1, ROOMS.size()).stream()
                    .map(ArchitectureTest::inside)
                    .toArray(String[]::new);
            holds(noClasses()
                    .that()
                    .resideInAPackage(inside(ROOMS.get(room)))
                    .should()
                    .dependOnClassesThat()
                    .resideInAnyPackage(after));
        }
    }

    @Test
    void thereAreNoCycles() {
        holds(slices().matching("hissledger.(*)..").should().beFreeOfCycles());
    }

    @Test
    void nothingDependsOnTheCommandLine() {
        onlyIn(inside("cli"), "cli");
    }

    @Test
    void nothingDependsOnTheDesktop() {
        onlyIn(inside("desk"), "desk");
    }

    @Test
    void onlyFilesKnowsJackson() {
        onlyIn("com.fasterxml.jackson..", "files");
    }

    @Test
    void onlyChartKnowsTheChartLibrary() {
        onlyIn("org.jfree..", "chart");
    }

    @Test
    void onlyChooseAndFitKnowOptimisersAndRootFinders() {
        onlyIn("org.apache.commons.math3.optim..", "choose", "fit");
        onlyIn("org.apache.commons.math3.fitting..", "choose", "fit");
        onlyIn("org.apache.commons.math3.analysis.solvers..", "choose", "fit");
    }

    @Test
    void onlyCliKnowsTheCommandLineLibrary() {
        onlyIn("picocli..", "cli");
    }

    @Test
    void onlyCliTouchesTheStandardStreams() {
        holds(noClasses()
                .that()
                .resideOutsideOfPackage(inside("cli"))
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .orShould()
                .callMethod(Throwable.class, "printStackTrace"));
    }

    @Test
    void everyPublicClassOfPhysicsIsAValueOrAFormula() {
        holds(classes()
                .that()
                .resideInAPackage(inside("physics"))
                .and()
                .arePublic()
                .should()
                .haveOnlyFinalFields());
    }

    private static void onlyIn(String known, String... rooms) {
        holds(noClasses()
                .that()
                .resideOutsideOfPackages(
                        Stream.of(rooms).map(ArchitectureTest::inside).toArray(String[]::new))
                .should()
                .dependOnClassesThat()
                .resideInAPackage(known));
    }

    /** A rule about a room that is still empty holds; a rule about a house that was not seen does not. */
    private static void holds(ArchRule rule) {
        assertThatTheHouseIsSeen();
        rule.allowEmptyShould(true).check(HOUSE);
    }

    private static void assertThatTheHouseIsSeen() {
        assertThat(HOUSE.size()).as("classes seen").isGreaterThan(FEWEST_CLASSES);
    }

    private static Set<String> packages() {
        return HOUSE.stream().map(JavaClass::getPackageName).collect(Collectors.toSet());
    }

    private static String inside(String room) {
        return "hissledger." + room + "..";
    }
}
