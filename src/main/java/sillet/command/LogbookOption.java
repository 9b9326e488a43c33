package sillet.command;

import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import sillet.logbook.shop.Shop;
import sillet.store.Logbook;
import sillet.store.place.LogbookPlace;
import sillet.store.place.Surroundings;

/** The option that names a logbook, for every command that works on one. */
final class LogbookOption {
  private final Surroundings around;

  @Option(names = "--logbook", paramLabel = "PLACE", descriptionKey = "usage.logbook")
  private @Nullable String place;

  LogbookOption(Surroundings around) {
    this.around = around;
  }

  /** The place that was named, or the usual one. */
  LogbookPlace place() {
    return LogbookPlace.choose(place, around);
  }

  /** Opens the logbook, which has to be there. */
  Logbook open() {
    return Logbook.open(place());
  }

  /** How much of its breaking tension this shop lets a string take, percent. */
  static double breakingSharePercent(Logbook logbook) {
    return logbook
        .shop()
        .shop()
        .map(shop -> shop.what().breakingSharePercent())
        .orElse(Shop.USUAL_BREAKING_SHARE_PERCENT);
  }
}
