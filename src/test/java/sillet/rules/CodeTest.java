package sillet.rules;

import static com.tngtech.archunit.core.domain.JavaModifier.SYNTHETIC;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;

import com.tngtech.archunit.lang.ArchCondition;
import java.text.MessageFormat;
import java.util.Locale;
import java.util.Set;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** Habits that hold in every layer. */
class CodeTest {
  private static final Set<String> DRAWERS =
      Set.of(
          "util",
          "utils",
          "common",
          "commons",
          "helper",
          "helpers",
          "manager",
          "managers",
          "impl",
          "misc");

  @Test
  void standardStreamsBelongToTheCommandLine() {
    Sillet.holds(
        noClasses()
            .that()
            .resideOutsideOfPackage(Sillet.COMMAND)
            .and()
            .doNotHaveFullyQualifiedName("sillet.Main")
            .should(ACCESS_STANDARD_STREAMS)
            .orShould()
            .accessField(System.class, "in")
            .because("data goes to standard output and nothing else may stand there"));
  }

  @Test
  void onlyMainEndsTheProgram() {
    Sillet.holds(
        noClasses()
            .that()
            .doNotHaveFullyQualifiedName("sillet.Main")
            .should()
            .callMethod(System.class, "exit", int.class)
            .orShould()
            .callMethod(Runtime.class, "exit", int.class)
            .orShould()
            .callMethod(Runtime.class, "halt", int.class)
            .because("whatever is open has to be closed first"));
  }

  /** The compiler refuses the formatters that take the default locale; this is what it lets by. */
  @Test
  void textIsMadeForAGivenLocale() {
    Sillet.holds(
        noClasses()
            .that()
            .resideOutsideOfPackages(Sillet.ENTRY, "sillet.desktop.shell..")
            .should()
            .callMethod(Locale.class, "getDefault")
            .orShould()
            .callMethod(Locale.class, "getDefault", Locale.Category.class)
            .orShould()
            .callMethod(MessageFormat.class, "format", String.class, Object[].class)
            .because("a comma that turns up on some machines spoils files and figures"));
  }

  @Test
  void nothingStaticChanges() {
    Sillet.holds(
        fields()
            .that()
            .areStatic()
            .and()
            .doNotHaveModifier(SYNTHETIC)
            .should()
            .beFinal()
            .because("collaborators are handed in"));
  }

  @Test
  void packagesAreNamedForTheirPart() {
    Sillet.holds(
        classes()
            .should()
            .resideOutsideOfPackages(
                DRAWERS.stream().map(name -> "..%s..".formatted(name)).toArray(String[]::new))
            .because("a drawer takes everything and says nothing"));
  }

  @Test
  void everyPackageIsNullMarked() {
    Sillet.holds(
        classes()
            .should(
                ArchCondition.from(
                    Sillet.describe(
                        "reside in a package marked @NullMarked",
                        type -> type.getPackage().isAnnotatedWith(NullMarked.class))))
            .because("null is checked only where the package says so"));
  }
}
