package org.seepledger;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.core.domain.JavaCall.Predicates.target;
import static com.tngtech.archunit.core.domain.properties.HasName.Predicates.name;
import static com.tngtech.archunit.core.domain.properties.HasOwner.Predicates.With.owner;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.properties.HasName;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.time.format.DateTimeFormatter;
import java.util.Formatter;
import java.util.List;
import java.util.Scanner;

/** The rules of the house: which package may know which, and who may do what. */
@AnalyzeClasses(packages = "org.seepledger", importOptions = ImportOption.DoNotIncludeTests.class)
class HouseTest {

    private static final String ROOT = "org.seepledger.";

    /** From the top down; packages of one floor do not know each other. */
    private static final List<List<String>> FLOORS = List.of(
            List.of("cli"),
            List.of("desktop"),
            List.of("job"),
            List.of("intake"),
            List.of("report"),
            List.of("io"),
            List.of("picture"),
            List.of("ensemble"),
            List.of("review"),
            List.of("uncertainty"),
            List.of("plume"),
            List.of("balance"),
            List.of("sketch"),
            List.of("prism"),
            List.of("aquifer"),
            List.of("ledger"),
            List.of("statistics"),
            List.of("unit", "fault", "progress"));

    private static final String[] ENGINE = {
        ROOT + "balance..",
        ROOT + "plume..",
        ROOT + "sketch..",
        ROOT + "prism..",
        ROOT + "aquifer..",
        ROOT + "ledger..",
    };

    @ArchTest
    static final ArchRule EVERY_PACKAGE_HAS_A_FLOOR = classes()
            .should(new ArchCondition<>("live in a package that has its place") {
                @Override
                public void check(JavaClass type, ConditionEvents events) {
                    boolean placed = floor(type) >= 0;
                    events.add(new SimpleConditionEvent(type, placed, type.getName() + " has no floor"));
                }
            })
            .because("a package without a place in the order could become a back door between two that have one");

    @ArchTest
    static final ArchRule ARROWS_GO_DOWN = classes()
            .should(new ArchCondition<>("depend only on packages further down") {
                @Override
                public void check(JavaClass type, ConditionEvents events) {
                    type.getDirectDependenciesFromSelf().stream()
                            .filter(dependency -> isOurs(dependency.getTargetClass()))
                            .filter(dependency -> !mayKnow(type, dependency.getTargetClass()))
                            .forEach(dependency ->
                                    events.add(SimpleConditionEvent.violated(type, dependency.getDescription())));
                }
            })
            .because("whoever reads a package need know only what lies below it; leaves know nobody, and the command"
                    + " line opens the window, never the other way round");

    @ArchTest
    static final ArchRule READERS_HAVE_NO_CYCLES = slices().matching(ROOT + "io.(*)..")
            .should()
            .beFreeOfCycles()
            .because("each kind of file can then be read, tested and replaced by itself");

    @ArchTest
    static final ArchRule PACKAGES_HAVE_NO_CYCLES = slices().matching(ROOT + "(**)")
            .should()
            .beFreeOfCycles()
            .because("two packages that need each other are one package");

    @ArchTest
    static final ArchRule FORMATS_STAY_IN_IO = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "io..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.geotools..", "com.fasterxml..", "org.apache.commons.csv..", "com.networknt..", "org.ejml..")
            .because("a library that reads or writes files can then be changed in one place");

    @ArchTest
    static final ArchRule HTML_STAYS_IN_THE_PAGE = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "report.page..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("j2html..")
            .because("what a report says must be there for the window too, and text is escaped in one place");

    @ArchTest
    static final ArchRule UNIT_LIBRARY_STAYS_IN_UNIT = noClasses()
            .that()
            .resideOutsideOfPackages(ROOT + "unit..", ROOT + "io.crs..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javax.measure..", "tech.units..", "tech.uom..")
            .because("everybody else speaks of units as users write them; the axes of a CRS come with the library's");

    @ArchTest
    static final ArchRule OPTIONS_STAY_IN_CLI = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "cli..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("picocli..")
            .because("a job must not know whether a command line or a window asked for it");

    @ArchTest
    static final ArchRule GUESSES_WRITE_NO_FILES = noClasses()
            .that()
            .resideInAPackage(ROOT + "intake..")
            .should()
            .callMethodWhere(target(owner(type("java.nio.file.Files")))
                    .and(target(HasName.Predicates.nameMatching(
                            "write.*|new.*(Writer|OutputStream)|copy|move|delete.*|create.*|set.*"))))
            .orShould()
            .dependOnClassesThat()
            .resideInAnyPackage(ROOT + "balance..", ROOT + "prism..", ROOT + "report..")
            .because("what a person brings is only read, and what it is can be told without a budget");

    @ArchTest
    static final ArchRule ENGINE_KNOWS_NO_FILES = noClasses()
            .that()
            .resideInAnyPackage(ENGINE)
            .should()
            .dependOnClassesThat(describe("files", HouseTest::isAboutFiles))
            .because("the engine asks suppliers for one interval and band at a time, wherever they have it from");

    @ArchTest
    static final ArchRule BUDGETS_KNOW_NO_DRAWINGS = noClasses()
            .that()
            .resideInAnyPackage(ROOT + "balance..", ROOT + "plume..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage(ROOT + "sketch..")
            .because("a budget is struck for prisms, however they came to be");

    @ArchTest
    static final ArchRule ENGINE_KNOWS_NO_WINDOWS = noClasses()
            .that()
            .resideInAnyPackage(ENGINE)
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.awt..", "javax.swing..", "javafx..")
            .because("the same engine serves the command line, the window and the tests");

    @ArchTest
    static final ArchRule ONLY_CLI_EXITS = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "cli..")
            .should()
            .callMethodWhere(target(owner(type("java.lang.System")))
                    .and(target(name("exit")))
                    .or(target(owner(type("java.lang.Runtime"))).and(target(name("halt")))))
            .because("who calls a job must get an answer, not an end");

    @ArchTest
    static final ArchRule ONLY_CLI_PRINTS = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "cli..")
            .should()
            .accessField(System.class, "out")
            .orShould()
            .accessField(System.class, "err")
            .orShould()
            .callMethod(Throwable.class, "printStackTrace")
            .because("what a run has to say is a result, and goes where the caller wants it");

    @ArchTest
    static final ArchRule WINDOWS_STAY_IN_DESKTOP = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "desktop..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx..", "atlantafx..")
            .because("everything but the window must run where there is no screen");

    @ArchTest
    static final ArchRule VIEW_MODELS_KNOW_NO_SCENE = noClasses()
            .that()
            .resideInAPackage(ROOT + "desktop..")
            .and()
            .haveSimpleNameEndingWith("Model")
            .or()
            .resideInAnyPackage(ROOT + "desktop.session..", ROOT + "desktop.port..", ROOT + "desktop.task..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx.scene..", "javafx.stage..", "javafx.animation..")
            .because("a view model is tested without a toolkit, and a view can then be built anew");

    @ArchTest
    static final ArchRule DIALOGS_STAY_IN_PLATFORM = noClasses()
            .that()
            .resideOutsideOfPackage(ROOT + "desktop.platform..")
            .should()
            .dependOnClassesThat()
            .haveNameMatching(
                    "javafx\\.stage\\.(File|Directory)Chooser|javafx\\.scene\\.(input\\.Clipboard|control\\.Alert)")
            .because("tests must be able to give every answer that a person can give");

    @ArchTest
    static final ArchRule THREADS_STAY_IN_TASK = noClasses()
            .that()
            .resideInAPackage(ROOT + "desktop..")
            .and()
            .resideOutsideOfPackage(ROOT + "desktop.task..")
            .should()
            .dependOnClassesThat()
            .haveNameMatching(
                    "java\\.lang\\.Thread|java\\.util\\.concurrent\\.Executor(Service|s)|javafx\\.concurrent\\..*")
            .because("work that nobody can cancel or run at once in a test would come in by the back door");

    @ArchTest
    static final ArchRule NO_TEXT_DEPENDS_ON_THE_COUNTRY = noClasses()
            .should()
            .callMethod(String.class, "toLowerCase")
            .orShould()
            .callMethod(String.class, "toUpperCase")
            .orShould()
            .callMethod(String.class, "format", String.class, Object[].class)
            .orShould()
            .callMethod(String.class, "formatted", Object[].class)
            .orShould()
            .callMethod(PrintWriter.class, "printf", String.class, Object[].class)
            .orShould()
            .callMethod(PrintStream.class, "printf", String.class, Object[].class)
            .orShould()
            .callMethod(DateTimeFormatter.class, "ofPattern", String.class)
            .orShould()
            .callConstructor(Formatter.class)
            .orShould()
            .callConstructor(Scanner.class, String.class)
            .orShould()
            .dependOnClassesThat()
            .haveNameMatching("java\\.text\\.(Decimal|Number|SimpleDate|Message)Format")
            .because("where the language is Turkish, lower case of I is not i, and where it is German, a number has a"
                    + " comma: files, parsers and drawings would differ from machine to machine. Name Locale.ROOT")
            .allowEmptyShould(false);

    @ArchTest
    static final ArchRule NAMES_SAY_WHAT_A_THING_IS = noClasses()
            .should()
            .haveSimpleNameEndingWith("Util")
            .orShould()
            .haveSimpleNameEndingWith("Utils")
            .orShould()
            .haveSimpleNameEndingWith("Helper")
            .orShould()
            .haveSimpleNameEndingWith("Manager")
            .orShould()
            .haveSimpleNameEndingWith("Impl")
            .orShould()
            .haveNameMatching(".*[.$]Base[A-Z]\\w*")
            .because("a class named by what it is in the trade cannot become a dumping ground");

    private static DescribedPredicate<JavaClass> type(String name) {
        return describe(name, type -> type.getName().equals(name));
    }

    /** Being serialisable and passing a read error on are no dealings with files. */
    private static boolean isAboutFiles(JavaClass type) {
        String name = type.getName();
        return name.startsWith("java.nio.file.")
                || name.startsWith("java.nio.channels.")
                || name.startsWith("java.io.") && !name.equals("java.io.Serializable");
    }

    private static boolean isOurs(JavaClass type) {
        return type.getName().startsWith(ROOT);
    }

    private static boolean mayKnow(JavaClass type, JavaClass other) {
        return idea(type).equals(idea(other)) || floor(type) < floor(other);
    }

    private static int floor(JavaClass type) {
        for (int floor = 0; floor < FLOORS.size(); floor++) {
            if (FLOORS.get(floor).contains(idea(type))) {
                return floor;
            }
        }
        return -1;
    }

    /** The package directly below the root. */
    private static String idea(JavaClass type) {
        return type.getPackageName().substring(ROOT.length()).replaceFirst("\\..*", "");
    }
}
