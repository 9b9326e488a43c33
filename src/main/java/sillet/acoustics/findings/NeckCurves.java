package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/** Cents at frets 1 to 12, string by string: as they stand, and what a cause adds to them. */
final class NeckCurves {
  /** Lowest clearance at fret 1 that a lowered slot is reckoned with, m. */
  private static final double LEAST_GAP = 5e-5;

  private final NeckEstimate estimate;
  private final List<double[]> cents = new ArrayList<>();
  private final List<double[]> strays = new ArrayList<>();

  NeckCurves(NeckEstimate estimate, NeckCase notes) {
    this.estimate = estimate;
    for (int string = 0; string < estimate.strings(); string++) {
      double[] curve = new double[Worth.FRETS + 1];
      for (int fret = 1; fret <= Worth.FRETS; fret++) {
        curve[fret] = estimate.cents(string, fret).value();
      }
      cents.add(curve);
      strays.add(strays(notes, string));
    }
  }

  int strings() {
    return cents.size();
  }

  /** Best estimate of the true notes, place 0 unused. */
  double[] cents(int string) {
    return cents.get(string);
  }

  StringSituation situation(int string) {
    return estimate.situation(string);
  }

  /** How far a string's notes lie off what the whole neck explains, where read last. */
  double[] strays(int string) {
    return strays.get(string);
  }

  private static double[] strays(NeckCase notes, int string) {
    double[] off = new double[Worth.FRETS + 1];
    for (int row = 0; row < notes.rows().size(); row++) {
      NeckCase.Row note = notes.rows().get(row);
      if (note.string() == string && note.fret() >= 1 && note.fret() <= Worth.FRETS) {
        off[note.fret()] = notes.linear().alone(row).value();
      }
    }
    return off;
  }

  /** What a slot so much higher adds; lowering it takes half as much off the action at fret 12. */
  double[] ofSlot(int string, double amount) {
    StringSituation now = situation(string);
    Clearances high = now.lie().clearances();
    double lowered = Math.min(amount, Math.max(0, high.atFirst() - LEAST_GAP));
    double atNut = lowered * EqualTemperament.ratio(1);
    Clearances low =
        new Clearances(high.atTwelve() - atNut / 2, high.atFirst() - lowered, high.relief());
    return less(now, now.withClearances(low));
  }

  /** What a nut so much too far from the bridge adds. */
  double[] ofNut(int string, double far) {
    StringSituation now = situation(string);
    return less(now, now.withLie(now.lie().withNutSetback(now.lie().nutSetback() - far)));
  }

  /** What one fret so much nearer to the bridge adds. */
  double[] ofFret(int string, int fret, double place) {
    double[] adds = new double[Worth.FRETS + 1];
    if (fret <= Worth.FRETS) {
      double length = situation(string).lie().scale() / EqualTemperament.ratio(fret);
      adds[fret] = Cents.ofSmallShare(place / length);
    }
    return adds;
  }

  double[] ofReading(int fret, double off) {
    double[] adds = new double[Worth.FRETS + 1];
    if (fret <= Worth.FRETS) {
      adds[fret] = off;
    }
    return adds;
  }

  static double[] less(StringSituation one, StringSituation other) {
    double[] difference = new double[Worth.FRETS + 1];
    for (int fret = 1; fret <= Worth.FRETS; fret++) {
      difference[fret] = one.cents(fret) - other.cents(fret);
    }
    return difference;
  }
}
