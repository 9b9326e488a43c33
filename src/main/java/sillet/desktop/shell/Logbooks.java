package sillet.desktop.shell;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Objects;
import java.util.Optional;
import sillet.logbook.actions.NameShop;
import sillet.logbook.demo.DemoAction;
import sillet.logbook.demo.DemoShop;
import sillet.logbook.shop.Shop;
import sillet.store.Logbook;
import sillet.store.place.LogbookPlace;
import sillet.store.reading.Kept;

/** Opens the shop's logbook, a new one, or the demo's. Call in the background. */
final class Logbooks {
  private static final String DEMO_FOLDER = "demo";
  private static final String DEMO_FILE = "demo-shop.mv.db";

  private final LogbookPlace own;

  /**
   * Opens nothing yet.
   *
   * @param own where the shop's logbook lies or will lie
   */
  Logbooks(LogbookPlace own) {
    this.own = own;
  }

  LogbookPlace own() {
    return own;
  }

  /** The folder of the shop's logbook; the demo and the window's settings lie beside it. */
  Path folder() {
    return Objects.requireNonNull(own.file().getParent(), "a logbook lies in a folder");
  }

  /**
   * Opens what lies at a place.
   *
   * @return the logbook; empty where there is none, or none with a shop yet
   */
  Optional<OpenLogbook> find(LogbookPlace place) {
    return Files.exists(place.file()) ? named(place, Logbook.open(place)) : Optional.empty();
  }

  /** Opens what must lie at a place; one whose shop was never named counts as none. */
  Optional<OpenLogbook> open(LogbookPlace place) {
    return named(place, Logbook.open(place));
  }

  /** Makes the shop's logbook; one that is there with a shop already is opened as it is. */
  OpenLogbook begin(Shop shop) {
    Logbook logbook = Logbook.openOrCreate(own);
    boolean begun = false;
    try {
      Optional<Kept<Shop>> before = logbook.shop().shop();
      if (before.isEmpty()) {
        String first = shop.technicians().isEmpty() ? "" : shop.technicians().get(0);
        logbook.perform(new NameShop(shop), first);
      }
      begun = true;
      return new OpenLogbook(logbook, before.map(Kept::what).orElse(shop), own);
    } finally {
      if (!begun) {
        logbook.close();
      }
    }
  }

  /** Opens the demo's own logbook, told from the start where it does not exist yet. */
  OpenLogbook demo(LocalDate today) {
    LogbookPlace place = new LogbookPlace(folder().resolve(DEMO_FOLDER).resolve(DEMO_FILE));
    Optional<OpenLogbook> there = find(place);
    if (there.isPresent()) {
      return there.get();
    }
    Logbook logbook = Logbook.openOrCreate(place);
    boolean told = false;
    try {
      for (DemoAction step : DemoShop.story(today)) {
        logbook.perform(step.action(), step.technician());
      }
      Shop shop = logbook.shop().shop().orElseThrow().what();
      told = true;
      return new OpenLogbook(logbook, shop, place);
    } finally {
      if (!told) {
        logbook.close();
      }
    }
  }

  private static Optional<OpenLogbook> named(LogbookPlace place, Logbook logbook) {
    boolean kept = false;
    try {
      Optional<OpenLogbook> open =
          logbook.shop().shop().map(shop -> new OpenLogbook(logbook, shop.what(), place));
      kept = open.isPresent();
      return open;
    } finally {
      if (!kept) {
        logbook.close();
      }
    }
  }
}
