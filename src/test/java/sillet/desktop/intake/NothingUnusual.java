package sillet.desktop.intake;

import java.util.List;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;

/** A shop that wonders at nothing. */
final class NothingUnusual implements Unusual {
  @Override
  public List<Message> scale(Length scale) {
    return List.of();
  }

  @Override
  public List<Message> gauge(double gaugeIn) {
    return List.of();
  }
}
