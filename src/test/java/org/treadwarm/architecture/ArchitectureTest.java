package org.treadwarm.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption.DoNotIncludeTests;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** The map of the house: which package may use which. What is not on the map fails. */
@AnalyzeClasses(packages = ArchitectureTest.ROOT, importOptions = DoNotIncludeTests.class)
class ArchitectureTest {
    static final String ROOT = "org.treadwarm";

    private static final Map<String, Set<String>> MAP = Map.ofEntries(
            Map.entry("", Set.of("commands")),
            Map.entry("units", Set.of()),
            Map.entry("physics", Set.of()),
            Map.entry("tables", Set.of()),
            Map.entry("draw", Set.of()),
            Map.entry("meter", Set.of()),
            Map.entry("store", Set.of("meter")),
            Map.entry("survey", Set.of("units", "physics", "tables")),
            Map.entry("intake", Set.of("survey", "units")),
            Map.entry("sizing", Set.of("survey", "physics", "tables", "units")),
            Map.entry("wire", Set.of("sizing", "survey", "tables", "units")),
            Map.entry("checks", Set.of("intake", "sizing", "survey", "physics", "tables", "units")),
            Map.entry("jobs", Set.of("store", "intake", "sizing", "survey")),
            Map.entry("sheets", Set.of("jobs", "store", "intake", "sizing", "survey", "wire")),
            Map.entry(
                    "web",
                    Set.of(
                            "checks", "draw", "intake", "jobs", "meter", "sheets", "sizing", "store", "survey",
                            "tables", "units", "wire")),
            Map.entry("commands", Set.of("checks", "intake", "jobs", "sizing", "store", "survey", "web", "wire")));

    @ArchTest
    static final ArchRule EVERY_CLASS_IS_ON_THE_MAP = classes().should().resideInAnyPackage(onTheMap());

    @ArchTest
    static void packagesUseOneAnotherOnlyAsTheMapSays(JavaClasses program) {
        Set<String> offMap = new TreeSet<>();
        program.forEach(type -> type.getDirectDependenciesFromSelf().stream()
                .filter(arrow -> ours().test(arrow.getTargetClass()))
                .filter(arrow -> !isAllowed(part(type), part(arrow.getTargetClass())))
                .forEach(arrow -> offMap.add(arrow.getDescription())));

        assertThat(offMap).isEmpty();
    }

    private static boolean isAllowed(String from, String to) {
        return from.equals(to) || MAP.getOrDefault(from, Set.of()).contains(to);
    }

    @ArchTest
    static final ArchRule SUBJECTS_OF_PHYSICS_DO_NOT_USE_ONE_ANOTHER =
            slices().matching(ROOT + ".physics.(*)..").should().notDependOnEachOther();

    @ArchTest
    static final ArchRule PHYSICS_SEES_NO_FILES_CLOCK_OR_CHANCE = noClasses()
            .that(inPart("physics"))
            .should()
            .dependOnClassesThat(
                    resideInAnyPackage("java.io..", "java.nio..", "java.time..", "java.net..", "java.util.random..")
                            .or(named("java.util.Random", "java.util.SplittableRandom")));

    @ArchTest
    static final ArchRule PAGES_AND_HTTP_STAND_IN_WEB_ALONE = noClasses()
            .that(notIn("web"))
            .should()
            .dependOnClassesThat(
                    resideInAnyPackage("io.javalin..", "org.thymeleaf..", "jakarta.servlet..", "org.eclipse.jetty..")
                            // The command must tell a taken port from other faults.
                            .and(DescribedPredicate.not(named("io.javalin.util.JavalinBindException"))));

    @ArchTest
    static final ArchRule ONLY_COMMANDS_KNOW_OF_A_TAKEN_PORT = noClasses()
            .that(notIn("web", "commands"))
            .should()
            .dependOnClassesThat(named("io.javalin.util.JavalinBindException"));

    @ArchTest
    static final ArchRule JSON_STANDS_WHERE_DOCUMENTS_ARE_READ_OR_WRITTEN = noClasses()
            .that(notIn("intake", "wire", "jobs", "sheets", "tables", "checks", "web"))
            .should()
            .dependOnClassesThat(resideInAnyPackage("com.fasterxml.."));

    @ArchTest
    static final ArchRule SQL_STANDS_IN_THE_STORE_ALONE = noClasses()
            .that(notIn("store"))
            .should()
            .dependOnClassesThat(resideInAnyPackage(
                    "java.sql..",
                    "javax.sql..",
                    "org.jdbi..",
                    "com.zaxxer..",
                    "org.flywaydb..",
                    "org.sqlite..",
                    "org.postgresql.."));

    @ArchTest
    static final ArchRule COMMAND_LINE_STANDS_IN_COMMANDS_ALONE =
            noClasses().that(notIn("commands", "")).should().dependOnClassesThat(resideInAnyPackage("picocli.."));

    // Bodies are read as bytes of a bounded length; these two would bind them by reflection or without a bound.
    @ArchTest
    static final ArchRule BODIES_ARE_READ_IN_ONE_WAY = noClasses()
            .should()
            .callMethodWhere(describe(
                    "reads a body as a stream or binds it",
                    call -> Set.of("bodyStreamAsClass", "bodyInputStream", "bodyAsClass", "bodyValidator")
                                    .contains(call.getName())
                            && call.getTargetOwner().getPackageName().startsWith("io.javalin")));

    @ArchTest
    static final ArchRule LOGS_GO_ONE_WAY =
            noClasses().should().dependOnClassesThat(resideInAnyPackage("java.util.logging.."));

    @ArchTest
    static final ArchRule ONLY_COMMANDS_SPEAK_ON_THE_CONSOLE = noClasses()
            .that(notIn("commands"))
            .should()
            .accessField(System.class, "out")
            .orShould()
            .accessField(System.class, "err");

    @ArchTest
    static final ArchRule NOBODY_SLEEPS = noClasses()
            .should()
            .callMethodWhere(describe(
                    "sleeps",
                    call -> call.getName().equals("sleep")
                            && call.getTargetOwner().isEquivalentTo(Thread.class)));

    private static String[] onTheMap() {
        return MAP.keySet().stream()
                .map(part -> part.isEmpty() ? ROOT : ROOT + "." + part + "..")
                .toArray(String[]::new);
    }

    private static DescribedPredicate<JavaClass> ours() {
        return resideInAnyPackage(ROOT + "..");
    }

    private static DescribedPredicate<JavaClass> inPart(String name) {
        return describe("stand in \"" + name + "\"", type -> part(type).equals(name));
    }

    private static DescribedPredicate<JavaClass> notIn(String... parts) {
        return describe("stand elsewhere", type -> !Set.of(parts).contains(part(type)));
    }

    private static DescribedPredicate<JavaClass> named(String... names) {
        return describe(
                "are " + String.join(" or ", names), type -> Set.of(names).contains(type.getName()));
    }

    /** The first package below the root, or empty for the root itself. */
    private static String part(JavaClass type) {
        String[] names = type.getPackageName().split("\\.");
        return names.length > 2 ? names[2] : "";
    }
}
