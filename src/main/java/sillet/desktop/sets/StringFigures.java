package sillet.desktop.sets;

import java.util.OptionalDouble;
import sillet.acoustics.forecast.StringLoad;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShare;
import sillet.logbook.strings.AcousticMake;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.LengthUnit;

/**
 * One string of a set at its pitch.
 *
 * @param string number, pitch, scale and make
 * @param coreIn its core in inches, given or estimated; empty for a plain string and where nobody
 *     can say
 * @param massGPerM unit mass, given or estimated
 * @param load how hard it pulls; empty where no tension brings it to that pitch
 */
record StringFigures(
    FittedString string, OptionalDouble coreIn, double massGPerM, Outcome<StringLoad> load) {
  private static final double GRAMS = 1e3;
  private static final double PERCENT = 100;

  static StringFigures of(FittedString string) {
    Stringing strung = AcousticMake.stringing(string);
    double mass = strung.constants().unitMass() * GRAMS;
    return new StringFigures(string, core(string), mass, StringLoad.of(strung));
  }

  private static OptionalDouble core(FittedString string) {
    StringMake make = string.make();
    boolean steel = make.construction().steel();
    if (!ConstructionWords.wound(make.construction()) || (make.coreIn() == null && !steel)) {
      return OptionalDouble.empty();
    }
    if (make.coreIn() != null) {
      return OptionalDouble.of(make.coreIn());
    }
    double inMetres = make.gaugeIn() * LengthUnit.MM_PER_INCH / 1000;
    double share = CoreShare.usual(inMetres, string.scaleMm() / 1000).share();
    return OptionalDouble.of(share * make.gaugeIn());
  }

  /** Whether the core shown is a guess. */
  boolean coreGuessed() {
    return string.make().coreIn() == null && coreIn.isPresent();
  }

  /** Whether the unit mass shown is a guess; that of plain steel follows from its gauge. */
  boolean massGuessed() {
    StringMake make = string.make();
    return make.unitMassGPerM() == null && make.construction() != Construction.PLAIN_STEEL;
  }

  /** Tension in N. */
  OptionalDouble tensionN() {
    return load instanceof Solved<StringLoad> solved
        ? OptionalDouble.of(solved.value().tension())
        : OptionalDouble.empty();
  }

  /** Percent of the breaking tension; empty for what no strength is known of. */
  OptionalDouble breakingPercent() {
    if (load instanceof Solved<StringLoad> solved && solved.value().shareOfBreaking().isPresent()) {
      return OptionalDouble.of(solved.value().shareOfBreaking().getAsDouble() * PERCENT);
    }
    return OptionalDouble.empty();
  }
}
