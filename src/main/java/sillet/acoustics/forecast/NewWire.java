package sillet.acoustics.forecast;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.WireSpread;

/**
 * Constants of the string that will lie there.
 *
 * <p>A string that stays on keeps what was learned of it; its packet's figures only take it to the
 * other pitch (polymers are stiffer under more stress). A new string is what its packet says,
 * within {@link WireSpread}, and has nothing of the old one's own: cores and drawing differ from
 * piece to piece. What belongs to nut, frets, hand and neck is not here and stays.
 */
final class NewWire {
  private final StringChange change;
  private final StringConstants packetNow;
  private final StringConstants packetThen;

  NewWire(StringChange change) {
    this.change = change;
    this.packetNow = change.now().constants();
    this.packetThen = change.then().constants();
  }

  /** Most likely constants, if the string that lies there now has the given ones. */
  StringConstants likely(StringConstants now) {
    if (!change.keepsTheString()) {
      return packetThen;
    }
    return scaled(
        now,
        packetThen.unitMass() / packetNow.unitMass(),
        packetThen.axialStiffness() / packetNow.axialStiffness(),
        packetThen.bendingStiffness() / packetNow.bendingStiffness());
  }

  /** Each independent way in which a new string may be otherwise, by one standard deviation. */
  List<StringConstants> otherwise() {
    List<StringConstants> ways = new ArrayList<>();
    if (change.keepsTheString()) {
      return ways;
    }
    WireSpread spread = packetThen.spread();
    double core = Math.exp(spread.core());
    double modulus = Math.exp(spread.modulus());
    ways.add(scaled(packetThen, 1, core * core, core * core * core * core));
    ways.add(scaled(packetThen, 1, modulus, modulus));
    ways.add(scaled(packetThen, 1, 1, Math.exp(spread.bending())));
    ways.add(scaled(packetThen, Math.exp(spread.mass()), 1, 1));
    return ways;
  }

  private static StringConstants scaled(
      StringConstants string, double mass, double stretch, double bending) {
    return new StringConstants(
        string.unitMass() * mass,
        string.axialStiffness() * stretch,
        string.bendingStiffness() * bending,
        string.relativeSd(),
        string.spread());
  }
}
