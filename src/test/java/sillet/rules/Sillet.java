package sillet.rules;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.function.Predicate;

/** The program's own classes, tests left out, and the names of its layers. */
final class Sillet {
  static final String ENTRY = "sillet";
  static final String DESKTOP = "sillet.desktop..";
  static final String COMMAND = "sillet.command..";
  static final String STORE = "sillet.store..";
  static final String SHEETS = "sillet.sheets..";
  static final String LOGBOOK = "sillet.logbook..";
  static final String ACOUSTICS = "sillet.acoustics..";

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages(ENTRY);

  private Sillet() {}

  static JavaClasses classes() {
    return CLASSES;
  }

  /** Checks a rule; a layer that has no class yet is no violation. */
  static void holds(ArchRule rule) {
    rule.allowEmptyShould(true).check(CLASSES);
  }

  static DescribedPredicate<JavaClass> describe(String words, Predicate<JavaClass> test) {
    return DescribedPredicate.describe(words, test);
  }
}
