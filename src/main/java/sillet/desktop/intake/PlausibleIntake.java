package sillet.desktop.intake;

import java.util.List;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** Wonders at what lies outside the usual spans. */
final class PlausibleIntake implements Unusual {
  private final Plausibility plausibility;

  PlausibleIntake(LengthUnit unit) {
    this.plausibility = new Plausibility(unit);
  }

  @Override
  public List<Message> scale(Length scale) {
    return plausibility.scaleMm(scale.mm()).stream().toList();
  }

  @Override
  public List<Message> gauge(double gaugeIn) {
    return plausibility.gaugeIn(gaugeIn).stream().toList();
  }
}
