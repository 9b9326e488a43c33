package sillet.command;

import java.nio.file.Path;
import java.time.LocalDate;
import sillet.logbook.demo.DemoShop;
import sillet.store.Logbook;
import sillet.store.place.LogbookPlace;

/** A logbook file with the demo shop in it. */
final class DemoLogbook {
  private DemoLogbook() {}

  static Path in(Path folder) {
    Path file = folder.resolve("demo.mv.db");
    try (Logbook logbook = Logbook.create(LogbookPlace.of(file.toString()))) {
      DemoShop.story(LocalDate.of(2026, 3, 2))
          .forEach(told -> logbook.perform(told.action(), told.technician()));
    }
    return file;
  }
}
