package sillet.logbook.moves;

import java.util.Optional;
import java.util.OptionalDouble;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.stiff.OpenTension;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;
import sillet.acoustics.wire.WireStrength;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.LengthUnit;

/** The packet's view of a string turned into that of the physics: inches into metres. */
public final class AcousticString {
  /** Metres in a millimetre. */
  public static final double M_PER_MM = 1e-3;

  private static final double M_PER_INCH = LengthUnit.MM_PER_INCH * M_PER_MM;
  private static final double KG_PER_G = 1e-3;

  private AcousticString() {}

  /**
   * What the packet says, in SI units.
   *
   * @param make gauge and construction
   * @return the same in metres and kilograms
   */
  public static StringSpec spec(StringMake make) {
    // a plain string is its own core
    Optional<Double> core =
        ConstructionWords.wound(make.construction())
            ? Optional.ofNullable(make.coreIn())
            : Optional.empty();
    Double unitMass = make.unitMassGPerM();
    return new StringSpec(
        make.gaugeIn() * M_PER_INCH,
        make.construction(),
        CoreShape.ROUND,
        core.map(in -> in * M_PER_INCH).orElse(null),
        unitMass == null ? null : unitMass * KG_PER_G);
  }

  static StringConstants constants(FittedString string) {
    return StringEstimate.of(spec(string.make()), string.pitch().hz(), scale(string));
  }

  static double scale(FittedString string) {
    return string.scaleMm() * M_PER_MM;
  }

  /** Share of the breaking tension, 1 = it breaks; empty where no strength is known. */
  static OptionalDouble shareOfBreaking(FittedString string) {
    var tension =
        OpenTension.of(constants(string), scale(string), string.pitch().hz(), EndCondition.USUAL);
    return tension instanceof Solved<Double> solved
        ? WireStrength.shareOfBreaking(spec(string.make()), scale(string), solved.value())
        : OptionalDouble.empty();
  }
}
