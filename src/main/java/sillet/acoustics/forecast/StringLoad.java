package sillet.acoustics.forecast;

import java.util.OptionalDouble;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.stiff.OpenTension;
import sillet.acoustics.wire.WireStrength;

/**
 * How hard a string pulls.
 *
 * @param tension of the open string at pitch, in N
 * @param tensionSd its standard deviation in N, from the unit mass as far as it is known
 * @param shareOfBreaking share of the breaking tension of steel ({@link WireStrength}); empty for
 *     polymers and gut, for which no sound figure was found
 */
public record StringLoad(double tension, double tensionSd, OptionalDouble shareOfBreaking) {

  /** Of a string between its nominal ends. */
  public static Outcome<StringLoad> of(Stringing stringing) {
    return of(stringing, 0);
  }

  /**
   * Of a string whose length is not quite its scale.
   *
   * @param setbacks how much longer it is than the scale, saddle and nut together, in m; a
   *     millimetre on a guitar is 0.3 % of the tension
   * @return the load; not solved where no tension brings the string to pitch
   * @throws IllegalArgumentException where the setbacks leave no length
   */
  public static Outcome<StringLoad> of(Stringing stringing, double setbacks) {
    double length = stringing.scale() + setbacks;
    return OpenTension.of(stringing.constants(), length, stringing.openHz(), EndCondition.USUAL)
        .map(tension -> of(stringing, setbacks, tension));
  }

  private static StringLoad of(Stringing stringing, double setbacks, double tension) {
    double sd = tension * UnitMassSpread.of(stringing);
    double scale = stringing.scale() + setbacks;
    return new StringLoad(
        tension, sd, WireStrength.shareOfBreaking(stringing.spec(), scale, tension));
  }
}
