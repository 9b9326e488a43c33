package sillet.desktop.intake;

import java.util.List;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;

/** Warnings for what is merely out of the ordinary; they ask and never block. */
public interface Unusual {
  /** For a scale. */
  List<Message> scale(Length scale);

  /** For a gauge in inches. */
  List<Message> gauge(double gaugeIn);
}
