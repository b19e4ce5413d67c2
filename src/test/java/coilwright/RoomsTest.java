package coilwright;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaCall.Predicates.target;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.type;
import static com.tngtech.archunit.core.domain.properties.HasName.Predicates.nameMatching;
import static com.tngtech.archunit.core.domain.properties.HasOwner.Predicates.With.owner;
import static com.tngtech.archunit.lang.conditions.ArchConditions.callMethodWhere;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchCondition;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The rooms, in order: each imports only those behind it, and only the foreign code it may. */
class RoomsTest {

  private static final Path SOURCES = Path.of("src/main/java/coilwright");

  private static final List<String> ORDER =
      List.of(
          "cli",
          "report",
          "rank",
          "search",
          "limit",
          "problem",
          "spring",
          "material",
          "source",
          "unit");

  private static final Map<String, String> FOREIGN =
      Map.of(
          "cli", "picocli..",
          "report", "com.fasterxml.jackson.core..",
          "rank", "org.apache.commons.math3..",
          "limit", "org.apache.commons.math3..");

  private static final String[] PARSERS = {
    "com.fasterxml.jackson.core..",
    "com.fasterxml.jackson.dataformat.yaml..",
    "org.yaml.snakeyaml.."
  };

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("coilwright");

  @TestFactory
  Stream<DynamicTest> roomImportsOnlyRoomsBehindItAndItsForeignCode() {
    return ORDER.stream().map(room -> DynamicTest.dynamicTest(room, () -> importsOnly(room)));
  }

  private static void importsOnly(String room) {
    Stream<String> own =
        ORDER.subList(ORDER.indexOf(room), ORDER.size()).stream().map(RoomsTest::packageOf);
    Stream<String> foreign =
        room.equals("problem") ? Stream.of(PARSERS) : Stream.ofNullable(FOREIGN.get(room));
    String[] allowed =
        Stream.concat(Stream.concat(own, foreign), Stream.of("java..")).toArray(String[]::new);
    classes()
        .that()
        .resideInAPackage(packageOf(room))
        .should()
        .onlyDependOnClassesThat(resideInAnyPackage(allowed))
        .check(CLASSES);
  }

  @Test
  void everyClassIsInARoom() {
    String[] rooms = ORDER.stream().map(room -> "coilwright." + room).toArray(String[]::new);
    classes().should().resideInAnyPackage(rooms).check(CLASSES);
  }

  @Test
  void roomsDoNotRunInCircles() {
    slices().matching("coilwright.(*)..").should().beFreeOfCycles().check(CLASSES);
  }

  @Test
  void onlyMainTouchesTheProcess() {
    noClasses()
        .that()
        .doNotHaveFullyQualifiedName("coilwright.cli.Main")
        .should(ACCESS_STANDARD_STREAMS)
        .orShould(call(System.class, "exit"))
        .orShould(call(Runtime.class, "getRuntime"))
        .check(CLASSES);
  }

  @Test
  void answersDependOnNeitherClockNorChanceNorPlace() {
    noClasses()
        .that(not(resideInAPackage(packageOf("cli"))))
        .should()
        .dependOnClassesThat(
            resideInAnyPackage("java.time..", "java.util.random..", "java.net..", "java.nio.file..")
                .or(nameMatching("java\\.util\\.(concurrent\\.ThreadLocal|Splittable)?Random")))
        .orShould(call(Math.class, "random"))
        .orShould(call(System.class, "currentTimeMillis|nanoTime|getenv|getProperty"))
        .check(CLASSES);
  }

  @Test
  void textDependsOnNoLocale() {
    noClasses()
        .should()
        .callMethod(String.class, "format", String.class, Object[].class)
        .orShould()
        .callMethod(String.class, "toLowerCase")
        .orShould()
        .callMethod(String.class, "toUpperCase")
        .orShould(call(String.class, "formatted"))
        .orShould(call(System.class, "lineSeparator"))
        .orShould(call(Locale.class, "getDefault"))
        .check(CLASSES);
  }

  @Test
  void digitsDependOnNoMachine() {
    noClasses()
        .should(
            call(
                Math.class,
                "a?(sin|cos|tan)|atan2|(sin|cos|tan)h|exp|expm1|log|log10|log1p|pow|cbrt|hypot"))
        .check(CLASSES);
  }

  @Test
  void everyRoomSaysWhatItIsFor() throws IOException {
    for (String room : ORDER) {
      Path file = SOURCES.resolve(room).resolve("package-info.java");
      assertThat(file).content().contains("/**").endsWith("package coilwright." + room + ";\n");
    }
    try (Stream<Path> rooms = Files.list(SOURCES)) {
      assertThat(rooms.map(path -> path.getFileName().toString()))
          .containsExactlyInAnyOrderElementsOf(ORDER);
    }
  }

  private static ArchCondition<JavaClass> call(Class<?> owner, String names) {
    return callMethodWhere(target(owner(type(owner))).and(target(nameMatching(names))));
  }

  private static String packageOf(String room) {
    return "coilwright." + room + "..";
  }
}
