package sillet.store;

import static org.assertj.core.api.Assertions.assertThat;
import static sillet.store.Refusals.refuses;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.actions.AddCustomer;
import sillet.store.engine.ProblemKind;
import sillet.store.place.LogbookPlace;
import sillet.store.reading.Kept;

class LogbookFileTest {
  @TempDir private Path folder;
  private LogbookPlace place;

  @BeforeEach
  void choosePlace() {
    place = LogbookPlace.of(folder.resolve("shop/deep/logbook.mv.db").toString());
  }

  @Test
  void findsAgainWhatWasSavedBeforeItWasClosed() {
    try (Logbook logbook = Logbook.openOrCreate(place)) {
      logbook.perform(new AddCustomer(BenchDay.customer()), "Ada Quill");
    }
    try (Logbook logbook = Logbook.openOrCreate(place)) {
      assertThat(logbook.shop().customer(BenchDay.CUSTOMER_ID))
          .contains(new Kept<>(BenchDay.customer(), 1));
    }
  }

  @Test
  void makesNothingWhereNothingLiesUnlessAsked() {
    refuses(ProblemKind.NO_SUCH, () -> Logbook.open(place));
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void createsNothingOverSomething() throws IOException {
    Files.createDirectories(place.file().getParent());
    Files.writeString(place.file(), "something");
    refuses(ProblemKind.EXISTS, () -> Logbook.create(place));
    assertThat(place.file()).hasContent("something");
  }

  @Test
  void leavesNothingBesideTheLogbook() throws IOException {
    Logbook.create(place).close();
    try (Stream<Path> files = Files.list(place.file().getParent())) {
      assertThat(files).containsExactly(place.file());
    }
  }

  @Test
  void isForItsOwnerOnly() throws IOException {
    Assumptions.assumeTrue(
        folder.getFileSystem().supportedFileAttributeViews().contains("posix"),
        "no POSIX rights on this system");
    Logbook.create(place).close();
    assertThat(rights(place.file())).isEqualTo("rw-------");
    assertThat(rights(place.file().getParent())).isEqualTo("rwx------");
    assertThat(rights(folder.resolve("shop"))).isEqualTo("rwx------");
  }

  private static String rights(Path path) throws IOException {
    return PosixFilePermissions.toString(Files.getPosixFilePermissions(path));
  }

  @Test
  void opensOnceInOneProgram() {
    try (Logbook logbook = Logbook.create(place)) {
      refuses(ProblemKind.IN_USE, () -> Logbook.open(place));
      logbook.perform(new AddCustomer(BenchDay.customer()), "Ada Quill");
      assertThat(logbook.shop().customers("").count()).isEqualTo(1);
    }
    Logbook.open(place).close();
  }

  @Test
  void saysThatItIsClosed() {
    Logbook logbook = Logbook.create(place);
    logbook.close();
    logbook.close();
    refuses(ProblemKind.CLOSED, () -> logbook.shop().shop());
  }

  @Test
  void keepsFoldersWithQuotesSpacesAndSignsApart() {
    for (String name : List.of("a b", "it's", "caf\u00e9", "50%", "#1", "a:b", "what?", "${x}")) {
      LogbookPlace odd = LogbookPlace.of(folder.resolve(name).resolve("log book").toString());
      Logbook.create(odd).close();
      assertThat(folder.resolve(name).resolve("log book.mv.db")).isRegularFile();
    }
  }
}
