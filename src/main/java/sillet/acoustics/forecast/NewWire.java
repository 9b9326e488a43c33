package sillet.acoustics.forecast;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.WireSpread;

/**
 * Constants of the string that will lie there.
 *
 * <p>A string that stays on keeps what was learned of it; its packet's figures only take it to the
 * other pitch (polymers are stiffer under more stress). A new string of the same construction has
 * {@link #SHARED} of what the old one was found to differ from its packet, because sets for one
 * place are drawn alike, and that much less of its own; one of another construction has none of it.
 * What belongs to nut, frets, hand and neck is not here and stays.
 */
final class NewWire {
  /**
   * Correlation of two strings for the same place: half of all changes keep the make, whose cores
   * are the same share in every gauge (chosen; no source).
   */
  private static final double SHARED = 0.5;

  /** Logarithm of a thickness that does as much, standard deviation over round and hexagonal. */
  private static final double CORE_SHAPE = 0.025;

  private static final double OWN = Math.sqrt(1 - SHARED * SHARED);

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
    double kept = change.keepsTheString() ? 1 : shared();
    if (kept == 0) {
      return packetThen;
    }
    return scaled(
        packetThen,
        Math.pow(now.unitMass() / packetNow.unitMass(), kept),
        ratio(now.axialStiffness(), packetNow.axialStiffness(), kept),
        ratio(now.bendingStiffness(), packetNow.bendingStiffness(), kept));
  }

  /** Each independent way in which a new string may be otherwise, by one standard deviation. */
  List<StringConstants> otherwise(StringConstants likely) {
    List<StringConstants> ways = new ArrayList<>();
    if (change.keepsTheString()) {
      return ways;
    }
    WireSpread spread = packetThen.spread();
    double part = shared() == 0 ? 1 : OWN;
    double core = Math.exp(part * Math.hypot(spread.core(), shape()));
    double modulus = Math.exp(part * spread.modulus());
    ways.add(scaled(likely, 1, core * core, core * core * core * core));
    ways.add(scaled(likely, 1, modulus, modulus));
    ways.add(scaled(likely, 1, 1, Math.exp(part * spread.bending())));
    ways.add(scaled(likely, Math.exp(part * spread.mass()), 1, 1));
    return ways;
  }

  /** A core typed by its thickness may be hexagonal: a tenth more area, a fifth more bending. */
  private double shape() {
    boolean typed =
        change.then().spec().core() != null && change.then().spec().construction().wound();
    return typed ? CORE_SHAPE : 0;
  }

  /** Nothing is shared where one core was guessed and the other is known. */
  private double shared() {
    boolean alike =
        change.now().spec().construction() == change.then().spec().construction()
            && packetNow.spread().core() > 0 == packetThen.spread().core() > 0;
    return alike ? SHARED : 0;
  }

  private static double ratio(double one, double other, double power) {
    return other == 0 ? 1 : Math.pow(one / other, power);
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
