package sillet.desktop.shell;

import javafx.beans.property.StringProperty;
import sillet.desktop.bench.BenchScreen;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.Screen;
import sillet.desktop.forecast.ForecastScreen;
import sillet.desktop.frets.FretScreen;
import sillet.desktop.history.HistoryScreen;
import sillet.desktop.instruments.InstrumentsScreen;
import sillet.desktop.intake.IntakeScreen;
import sillet.desktop.pickups.PickupScreen;
import sillet.desktop.sets.SetsScreen;
import sillet.desktop.visit.VisitScreen;

/**
 * The screens of the program. Lists and shop are made once, so that one's place in them is kept.
 */
final class AllScreens implements Screens {
  private final Desk desk;
  private final Screen bench;
  private final Screen instruments;
  private final Screen sets;
  private final Screen shop;

  /**
   * The screens of one open logbook.
   *
   * @param desk what each is handed
   * @param searched the words of the search field
   * @param shop the shop's own screen
   */
  AllScreens(Desk desk, StringProperty searched, Screen shop) {
    this.desk = desk;
    this.bench = new BenchScreen(desk);
    this.sets = new SetsScreen(desk);
    this.shop = shop;
    this.instruments = new InstrumentsScreen(desk, searched);
  }

  @Override
  public Screen at(Place place) {
    if (place instanceof Place.History history) {
      return new HistoryScreen(desk, history.instrumentId());
    }
    if (place instanceof Place.Frets frets) {
      return new FretScreen(desk, frets.instrumentId());
    }
    if (place instanceof Place.Pickups pickups) {
      return new PickupScreen(desk, pickups.instrumentId());
    }
    if (place instanceof Place.AtVisit visit) {
      return new VisitScreen(desk, visit.ticket());
    }
    if (place instanceof Place.Forecast forecast) {
      return new ForecastScreen(desk, forecast.ticket());
    }
    if (place instanceof Place.TakeIn takeIn) {
      return new IntakeScreen(desk, takeIn.instrumentId());
    }
    if (place instanceof Place.Sets) {
      return sets;
    }
    if (place instanceof Place.ShopPlace) {
      return shop;
    }
    return place instanceof Place.Instruments ? instruments : bench;
  }
}
