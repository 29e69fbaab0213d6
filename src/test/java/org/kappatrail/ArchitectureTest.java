package org.kappatrail;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption.DoNotIncludeTests;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.Arrays;
import java.util.stream.Stream;

/** Which package may use which: the data runs one way, and each library has its place. */
@AnalyzeClasses(packages = "org.kappatrail", importOptions = DoNotIncludeTests.class)
class ArchitectureTest {
  private static final String ROOT = "org.kappatrail.";

  @ArchTest
  static final ArchRule TRIBOLOGY_KNOWS_JAVA_AND_MATHEMATICS_ALONE =
      classes()
          .that(resideInAPackage(ROOT + "tribology.."))
          .should()
          .onlyDependOnClassesThat(coreOf("tribology"));

  @ArchTest
  static final ArchRule STATISTICS_KNOWS_JAVA_AND_MATHEMATICS_ALONE =
      classes()
          .that(resideInAPackage(ROOT + "statistics.."))
          .should()
          .onlyDependOnClassesThat(coreOf("statistics"));

  @ArchTest static final ArchRule HISTORY_USES_TRIBOLOGY = onlyUses("history", "tribology");

  /** Beyond the table: the intake builds the oils' viscosities and reads cleanliness codes. */
  @ArchTest static final ArchRule INTAKE_USES_HISTORY = onlyUses("intake", "history", "tribology");

  @ArchTest static final ArchRule DUTY_USES_HISTORY = onlyUses("duty", "history");

  @ArchTest
  static final ArchRule REVIEW_USES_METHODS_RECORDS_AND_CELLS =
      onlyUses("review", "tribology", "statistics", "history", "duty");

  /** Beyond the table: the charts draw regimes, grades and codes of the method itself. */
  @ArchTest
  static final ArchRule REPORT_USES_REVIEW = onlyUses("report", "review", "history", "tribology");

  @ArchTest
  static final ArchRule REVIEW_KNOWS_NOTHING_OF_HOW_LOGS_ARE_READ =
      noClasses()
          .that(resideInAPackage(ROOT + "review.."))
          .should()
          .dependOnClassesThat()
          .haveNameMatching(
              ROOT.replace(".", "\\.")
                  + "duty\\.(?!DutyLog$|DutyCells|BearingDuty|"
                  + "DroppedReadings).*");

  /** Every package by itself, so that parts of the report do not lean on the pack either. */
  @ArchTest
  static final ArchRule NO_CYCLES_BETWEEN_PACKAGES =
      slices().matching(ROOT + "(**)").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule TABLES_ARE_OF_INTAKE_AND_REPORT =
      onlyIn(new String[] {"tech.tablesaw.."}, "intake", "report");

  @ArchTest
  static final ArchRule CHARTS_ARE_OF_THE_REPORT =
      onlyIn(new String[] {"org.knowm.xchart..", "de.erichseifert.."}, "report");

  @ArchTest
  static final ArchRule WORKBOOKS_ARE_OF_INTAKE_AND_REPORT =
      onlyIn(new String[] {"org.apache.poi.."}, "intake", "report");

  @ArchTest
  static final ArchRule DATABASES_ARE_OF_DUTY =
      onlyIn(new String[] {"java.sql..", "javax.sql..", "org.duckdb.."}, "duty");

  @ArchTest
  static final ArchRule THE_COMMAND_LINE_IS_OF_CLI =
      onlyIn(new String[] {"picocli..", "me.tongfei.progressbar.."}, "cli");

  @ArchTest
  static final ArchRule NOTHING_BUT_THE_PROGRAM_ENTRY_ENDS_THE_PROCESS =
      noClasses()
          .that()
          .doNotHaveFullyQualifiedName(ROOT + "cli.Main")
          .should()
          .callMethod(System.class, "exit", int.class);

  private static DescribedPredicate<JavaClass> coreOf(String name) {
    return resideInAnyPackage(
        ROOT + name + "..", "java..", "org.apache.commons.math3..", "org.jspecify.annotations..");
  }

  /** Of the project's own packages a package uses itself and these. */
  private static ArchRule onlyUses(String name, String... others) {
    String[] allowed =
        Stream.concat(Stream.of(name), Arrays.stream(others))
            .map(other -> ROOT + other + "..")
            .toArray(String[]::new);
    return classes()
        .that(resideInAPackage(ROOT + name + ".."))
        .should()
        .onlyDependOnClassesThat(
            not(resideInAPackage("org.kappatrail..")).or(resideInAnyPackage(allowed)));
  }

  private static ArchRule onlyIn(String[] libraries, String... names) {
    String[] homes = Arrays.stream(names).map(name -> ROOT + name + "..").toArray(String[]::new);
    return noClasses()
        .that(not(resideInAnyPackage(homes)))
        .should()
        .dependOnClassesThat(resideInAnyPackage(libraries));
  }
}
