package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.actions.NameShop;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Texts;
import sillet.store.Logbook;

/** A logbook that cannot be opened is never replaced by an empty one. */
class TroubleTest {
  private static final Texts TEXTS = Texts.english();

  @TempDir Path folder;

  @Test
  void saysThatTheLogbookIsInUseAndOpensItOnceItIsFree() throws TimeoutException {
    TestWindow window;
    try (Logbook other = Logbook.create(TestWindow.placeIn(folder))) {
      other.perform(new NameShop(Shop.usual("Quay", List.of())), "Noor");
      window = TestWindow.over(folder);
      window.untilShown("#trouble");
      assertThat(window.text("#trouble")).contains("in use");
      assertThat(window.texts()).contains(TEXTS.say("start.in-use"));
    }
    try (window) {
      window.press(KeyCode.SPACE);
      window.untilShown("#bench-said");
    }
  }

  @Test
  void saysThatTheLogbookIsDamagedAndLeavesItAsItIs() throws TimeoutException, IOException {
    Path file = Files.writeString(TestWindow.placeIn(folder).file(), "no logbook at all");
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#trouble");

      assertThat(window.text("#trouble")).contains("damaged");
      assertThat(window.texts()).contains(TEXTS.say("start.damaged"));
      assertThat(file).hasContent("no logbook at all");
    }
  }

  @Test
  void closesTheLogbookSoThatAnotherCanOpenIt() throws TimeoutException {
    try (Logbook first = Logbook.create(TestWindow.placeIn(folder))) {
      first.perform(new NameShop(Shop.usual("Quay", List.of())), "Noor");
    }
    TestWindow window = TestWindow.over(folder);
    window.untilShown("#bench-said");
    window.close();

    try (Logbook after = Logbook.open(TestWindow.placeIn(folder))) {
      assertThat(after.shop().shop()).isPresent();
    }
  }
}
