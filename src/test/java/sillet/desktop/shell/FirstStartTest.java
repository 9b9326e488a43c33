package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.store.Logbook;

class FirstStartTest {
  @TempDir Path folder;

  @Test
  void namesTheShopAndStandsAtItsBench() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#shop-name");
      window.type("Quay Street Strings");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilShown("#bench-said");

      assertThat(window.text("#bench-said")).isEqualTo(Texts.english().say("bench.nothing"));
      assertThat(window.shown("#demo-mark")).isFalse();
    }
    try (Logbook logbook = Logbook.open(TestWindow.placeIn(folder))) {
      assertThat(logbook.shop().shop().orElseThrow().what().name())
          .isEqualTo("Quay Street Strings");
    }
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#bench-said");
    }
  }

  @Test
  void takesUnitsPitchAndTechnicians() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#shop-name");
      window.type("Quay");
      window.fire("#unit-64ths");
      window.robot.clickOn("#reference-hz");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("442,5");
      window.robot.clickOn("#technicians");
      window.type("Noor\n Edda \n\n");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilShown("#bench-said");
      assertThat(window.text("#technician")).isEqualTo("Noor");
    }
    try (Logbook logbook = Logbook.open(TestWindow.placeIn(folder))) {
      var shop = logbook.shop().shop().orElseThrow().what();
      assertThat(shop.lengthUnit()).isEqualTo(LengthUnit.SIXTY_FOURTHS);
      assertThat(shop.referenceHz()).isEqualTo(442.5);
      assertThat(shop.technicians()).containsExactly("Noor", "Edda");
    }
  }

  @Test
  void saysBesideTheFieldWhatIsAmissAndMakesNothing() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#shop-name");
      window.robot.clickOn("#reference-hz");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("44");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);

      assertThat(window.texts()).contains("The shop needs a name.", "44 was read.");
      assertThat(window.shown("#shop-name")).isTrue();
      assertThat(window.own().file()).doesNotExist();
    }
  }

  @Test
  void saysWhyTheLogbookCouldNotBeMade() throws TimeoutException, IOException {
    Path file = Files.writeString(folder.resolve("in-the-way"), "a file, no folder");
    try (TestWindow window = TestWindow.over(file)) {
      window.untilShown("#shop-name");
      window.type("Quay");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilShown("#start-trouble");

      assertThat(window.text("#start-trouble")).contains(window.own().file().toString());
      assertThat(window.texts()).contains("Quay");
    }
  }

  @Test
  void opensTheDemoInItsOwnLogbookMarksItAndLeavesIt() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#open-demo");
      window.press(KeyCode.CONTROL, KeyCode.D);
      window.untilRows("#bench-list", 3);

      assertThat(window.shown("#demo-mark")).isTrue();
      assertThat(window.own().file()).doesNotExist();

      window.fire("#leave-demo");
      window.untilShown("#shop-name");
      assertThat(window.shown("#demo-mark")).isFalse();
    }
  }

  @Test
  void opensALogbookThatLiesElsewhere() throws TimeoutException {
    Path elsewhere = folder.resolve("elsewhere");
    try (TestWindow window = TestWindow.over(elsewhere)) {
      window.untilShown("#shop-name");
      window.type("Elsewhere");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilShown("#bench-said");
    }
    try (TestWindow window = TestWindow.over(folder.resolve("here"))) {
      window.untilShown("#shop-name");
      window.ask.file = Optional.of(TestWindow.placeIn(elsewhere).file());
      window.press(KeyCode.CONTROL, KeyCode.O);
      window.untilShown("#bench-said");
      assertThat(window.own().file()).doesNotExist();
    }
  }
}
