package sillet.desktop.sets;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.acoustics.sets.GaugeLadder;
import sillet.acoustics.sets.GaugeLadder.Rung;
import sillet.acoustics.solve.Solved;
import sillet.logbook.strings.AcousticMake;
import sillet.logbook.units.LengthUnit;

/**
 * A string on the ladder of gauges at equal tension.
 *
 * @param now the string as it is
 * @param rung the gauge that pulls as wanted; empty where none does or the construction is not
 *     known by its gauge
 */
record LadderLine(StringFigures now, Optional<Rung> rung) {
  private static final double INCHES_PER_M = 1000 / LengthUnit.MM_PER_INCH;

  /** The ladder of a set. */
  static List<LadderLine> of(SetFigures figures, double wantedN) {
    List<LadderLine> lines = new ArrayList<>();
    for (StringFigures one : figures.strings()) {
      var rung = GaugeLadder.rung(AcousticMake.stringing(one.string()), wantedN);
      lines.add(
          new LadderLine(
              one,
              rung instanceof Solved<Rung> solved
                  ? Optional.of(solved.value())
                  : Optional.empty()));
    }
    return lines;
  }

  /** The gauge that gives the wanted tension, in inches to a ten-thousandth. */
  Optional<Double> exactIn() {
    return rung.map(one -> rounded(one.exact() * INCHES_PER_M, 1e4));
  }

  /** The nearest usual gauge, in inches as it is printed. */
  Optional<Double> usualIn() {
    return rung.map(one -> rounded(one.usual() * INCHES_PER_M, 1e4));
  }

  private static double rounded(double value, double parts) {
    return Math.round(value * parts) / parts;
  }
}
