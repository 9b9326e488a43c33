package sillet.logbook.instruments;

import java.util.UUID;
import org.jspecify.annotations.Nullable;

/**
 * An instrument that comes to the shop.
 *
 * @param id identity
 * @param customerId whose it is now; null if nobody's
 * @param kind what it is
 * @param maker may be empty
 * @param model may be empty
 * @param serial may be empty
 * @param tag the shop's own mark on it, may be empty
 * @param neck strings and scale
 * @param saddle bridge and screws
 */
public record Instrument(
    UUID id,
    @Nullable UUID customerId,
    InstrumentKind kind,
    String maker,
    String model,
    String serial,
    String tag,
    Neck neck,
    Saddle saddle) {

  /**
   * What the bench calls it.
   *
   * @return maker and model, or whichever is known
   */
  public String name() {
    return (maker + " " + model).strip();
  }
}
