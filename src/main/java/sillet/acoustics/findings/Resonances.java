package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * Pitches at which the top of an instrument resounds: where the bridge yields by X at a frequency,
 * a note of the length L under the tension T sounds C T X / L cents flat, on whatever string it is
 * played, and an open string there makes all notes of its string sharp by as much (N. H. Fletcher,
 * T. D. Rossing, The Physics of Musical Instruments, from memory). One unknown for each semitone.
 */
final class Resonances {
  private static final double LOWEST_HZ = 27.5;

  /** Length ratio at which a pitch's straying counts as learned: the middle of the neck. */
  private static final double MIDDLE = 1.4;

  private final Map<Integer, double[]> columns = new TreeMap<>();
  private final Map<Integer, Boolean> lows = new HashMap<>();

  Resonances(NeckEstimate estimate, List<NeckCase.Row> rows) {
    double[] pull = new double[estimate.strings()];
    double mean = 0;
    for (int string = 0; string < pull.length; string++) {
      StringLie lie = estimate.lie(string);
      double speed = 2 * lie.scale() * lie.openHz();
      pull[string] = lie.constants().unitMass() * speed * speed;
      mean += pull[string] / pull.length;
    }
    for (int i = 0; i < rows.size(); i++) {
      NeckCase.Row row = rows.get(i);
      if (row.fret() != NeckCase.HEIGHT) {
        double hz = estimate.lie(row.string()).openHz();
        double share = pull[row.string()] / mean / MIDDLE;
        double ratio = EqualTemperament.ratio(row.fret());
        column(hz * ratio, rows.size())[i] += share * ratio;
        column(hz, rows.size())[i] -= share;
      }
    }
  }

  private double[] column(double hz, int rows) {
    int semitone = (int) Math.rint(Cents.between(LOWEST_HZ, hz) / 100);
    lows.put(semitone, hz < Straying.LOW_BELOW);
    return columns.computeIfAbsent(semitone, unused -> new double[rows]);
  }

  /** The shapes, from the lowest pitch. */
  List<double[]> shapes() {
    return new ArrayList<>(columns.values());
  }

  /** Which of them are low. */
  List<Boolean> low() {
    return columns.keySet().stream().map(lows::get).toList();
  }
}
