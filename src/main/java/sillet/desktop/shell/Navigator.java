package sillet.desktop.shell;

import java.util.UUID;
import java.util.function.BiConsumer;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.GoTo;
import sillet.desktop.controls.Screen;

/** Goes from place to place within one open logbook, and back. */
final class Navigator implements GoTo {
  private final Trail trail = new Trail();
  private final Screens screens;
  private final BiConsumer<Screen, Place> shower;
  private final Runnable leaver;

  /**
   * Stands at the bench, nothing shown yet.
   *
   * @param screens makes the screens, given the way to go on from them
   * @param shower shows a screen
   * @param leaver leaves the logbook
   */
  Navigator(Function<GoTo, Screens> screens, BiConsumer<Screen, Place> shower, Runnable leaver) {
    this.screens = screens.apply(this);
    this.shower = shower;
    this.leaver = leaver;
  }

  Place here() {
    return trail.here();
  }

  @Override
  public void bench() {
    to(new Place.Bench());
  }

  @Override
  public void instruments() {
    to(new Place.Instruments());
  }

  /** The drawer of string sets; a place the screens do not ask for. */
  void sets() {
    to(new Place.Sets());
  }

  /** The shop itself; a place the screens do not ask for. */
  void shop() {
    to(new Place.ShopPlace());
  }

  @Override
  public void takeIn(@Nullable UUID instrumentId) {
    to(new Place.TakeIn(instrumentId));
  }

  @Override
  public void visit(int ticket) {
    to(new Place.AtVisit(ticket));
  }

  @Override
  public void forecast(int ticket) {
    to(new Place.Forecast(ticket));
  }

  @Override
  public void history(UUID instrumentId) {
    to(new Place.History(instrumentId));
  }

  @Override
  public void frets(UUID instrumentId) {
    to(new Place.Frets(instrumentId));
  }

  @Override
  public void pickups(UUID instrumentId) {
    to(new Place.Pickups(instrumentId));
  }

  @Override
  public void start() {
    leaver.run();
  }

  @Override
  public void back() {
    show(trail.back());
  }

  private void to(Place place) {
    trail.to(place);
    show(place);
  }

  private void show(Place place) {
    shower.accept(screens.at(place), place);
  }
}
