package sillet.acoustics.virtual;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import org.junit.jupiter.api.Test;

class NotTheModelTest {
  @Test
  void virtualInstrumentsUseNothingOfTheModel() {
    JavaClasses all = new ClassFileImporter().importUrl(VirtualString.class.getResource("."));
    assertThat(all).isNotEmpty();
    noClasses()
        .that()
        .resideInAPackage("sillet.acoustics.virtual..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "sillet.acoustics.solve..",
            "sillet.acoustics.pitch..",
            "sillet.acoustics.wire..",
            "sillet.acoustics.stiff..",
            "sillet.acoustics.neck..",
            "sillet.acoustics.readings..",
            "sillet.acoustics.estimate..",
            "sillet.acoustics.moves..")
        .because("a model tried on itself is always right")
        .check(all);
  }
}
