package sillet.rules;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.lang.ArchRule;
import org.junit.jupiter.api.Test;

/** One layer for each outside library; an upgrade or a swap stays inside it. */
class LibrariesTest {
  @Test
  void acousticsStandsOnJavaAndHipparchusAlone() {
    Sillet.holds(
        classes()
            .that()
            .resideInAPackage(Sillet.ACOUSTICS)
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                "java.lang..",
                "java.util",
                "java.util.function",
                "java.util.stream",
                "org.hipparchus..",
                "org.jspecify.annotations",
                Sillet.ACOUSTICS)
            .because("the physics is to be read and checked by itself"));
  }

  @Test
  void hipparchusStaysInAcoustics() {
    Sillet.holds(only(Sillet.ACOUSTICS, "org.hipparchus.."));
  }

  @Test
  void databasesAndStoredTextStayInTheStore() {
    Sillet.holds(
        only(
            Sillet.STORE,
            "java.sql..",
            "javax.sql..",
            "org.jdbi..",
            "org.flywaydb..",
            "org.h2..",
            "org.postgresql..",
            "com.google.gson.."));
  }

  @Test
  void spreadsheetsAndPaperStayInSheets() {
    Sillet.holds(
        only(Sillet.SHEETS, "com.opencsv..", "org.apache.pdfbox..", "org.apache.fontbox.."));
  }

  @Test
  void theWindowToolkitStaysInTheDesktop() {
    Sillet.holds(
        only(
            Sillet.DESKTOP,
            "javafx..",
            "com.sun.javafx..",
            "atlantafx..",
            "java.awt..",
            "javax.swing.."));
  }

  @Test
  void theCommandLineLibraryStaysInCommand() {
    Sillet.holds(only(Sillet.COMMAND, "picocli.."));
  }

  @Test
  void noLibraryComesInUnnoticed() {
    Sillet.holds(
        classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                "sillet..",
                "java..",
                "javax.sql..",
                "javafx..",
                "atlantafx..",
                "com.google.gson..",
                "com.opencsv..",
                "org.flywaydb..",
                "org.h2..",
                "org.hipparchus..",
                "org.jdbi..",
                "org.jspecify.annotations..",
                "org.slf4j..",
                "picocli..")
            .because("what a library drags along is not ours to build on"));
  }

  @Test
  void theLogbookLayerTouchesNoFileAndNoNetwork() {
    Sillet.holds(
        noClasses()
            .that()
            .resideInAPackage(Sillet.LOGBOOK)
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.nio.file..", "java.nio.channels..", "java.net..")
            .orShould()
            .dependOnClassesThat()
            .haveNameMatching("java\\.io\\.(File|RandomAccessFile).*")
            .because("rules and records are tested without a disk"));
  }

  @Test
  void modelsHoldNoControls() {
    Sillet.holds(
        noClasses()
            .that(
                Sillet.describe(
                    "are models",
                    type ->
                        type.getName().startsWith("sillet.")
                            && type.getName().replaceFirst("\\$.*", "").endsWith("Model")))
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx.scene..", "javafx.stage..", "javafx.fxml..")
            .because("a model is tested without a window"));
  }

  private static ArchRule only(String layer, String... libraries) {
    return noClasses()
        .that()
        .resideOutsideOfPackage(layer)
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(libraries)
        .because("only " + layer + " knows this library");
  }
}
