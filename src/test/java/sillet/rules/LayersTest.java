package sillet.rules;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.library.dependencies.Slice;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Which part of the program may know which other part. */
class LayersTest {
  private static final String[] SHARED = {
    "sillet.desktop.controls..", "sillet.desktop.drawing..", "sillet.desktop.theme.."
  };
  private static final Set<String> NO_SCREEN = Set.of("shell", "controls", "drawing", "theme");

  @Test
  void everyLayerUsesOnlyLayersBelowIt() {
    Sillet.holds(
        layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .withOptionalLayers(true)
            .layer("Main")
            .definedBy(Sillet.ENTRY)
            .layer("desktop")
            .definedBy(Sillet.DESKTOP)
            .layer("command")
            .definedBy(Sillet.COMMAND)
            .layer("store")
            .definedBy(Sillet.STORE)
            .layer("sheets")
            .definedBy(Sillet.SHEETS)
            .layer("logbook")
            .definedBy(Sillet.LOGBOOK)
            .layer("acoustics")
            .definedBy(Sillet.ACOUSTICS)
            .whereLayer("Main")
            .mayNotBeAccessedByAnyLayer()
            .whereLayer("desktop")
            .mayOnlyBeAccessedByLayers("Main")
            .whereLayer("command")
            .mayOnlyBeAccessedByLayers("Main")
            .whereLayer("store")
            .mayOnlyBeAccessedByLayers("Main", "desktop", "command")
            .whereLayer("sheets")
            .mayOnlyBeAccessedByLayers("Main", "desktop", "command")
            .whereLayer("logbook")
            .mayOnlyBeAccessedByLayers("Main", "desktop", "command", "store", "sheets")
            .whereLayer("acoustics")
            .mayOnlyBeAccessedByLayers("Main", "desktop", "command", "store", "sheets", "logbook")
            .because("string physics and the shop's rules must run without window and database"));
  }

  @Test
  void everyClassBelongsToALayer() {
    Sillet.holds(
        classes()
            .should()
            .resideInAnyPackage(
                Sillet.ENTRY,
                Sillet.DESKTOP,
                Sillet.COMMAND,
                Sillet.STORE,
                Sillet.SHEETS,
                Sillet.LOGBOOK,
                Sillet.ACOUSTICS)
            .because("a package beside the layers would escape every other rule here"));
  }

  @Test
  void noLeafPackagesFormACycle() {
    Sillet.holds(
        slices()
            .matching("sillet.(**)")
            .should()
            .beFreeOfCycles()
            .because("packages that need each other can only be understood together"));
  }

  @Test
  void screensDoNotKnowEachOther() {
    Sillet.holds(
        slices()
            .matching("sillet.desktop.(*)..")
            .that(
                DescribedPredicate.<Slice>describe(
                    "are screens", slice -> !NO_SCREEN.contains(slice.getNamePart(1))))
            .should()
            .notDependOnEachOther()
            .because("a screen reaches another one only by asking the shell to go there"));
  }

  @Test
  void nothingInTheDesktopKnowsTheShell() {
    Sillet.holds(
        noClasses()
            .that()
            .resideInAPackage(Sillet.DESKTOP)
            .and()
            .resideOutsideOfPackage("sillet.desktop.shell..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("sillet.desktop.shell..")
            .because("the shell assembles the screens; they see interfaces of desktop.controls"));
  }

  @Test
  void whatEveryScreenIsBuiltFromKnowsNoScreen() {
    Sillet.holds(
        classes()
            .that()
            .resideInAnyPackage(SHARED)
            .should()
            .onlyDependOnClassesThat(
                resideOutsideOfPackage(Sillet.DESKTOP)
                    .or(resideInAnyPackage(SHARED))
                    .as("are neither screen nor shell"))
            .because("every screen is built from them"));
  }
}
