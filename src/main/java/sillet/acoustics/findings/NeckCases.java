package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.acoustics.estimate.Linear;
import sillet.acoustics.estimate.Misfit;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.Unknown;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.readings.FretReading;

/**
 * Makes the problem that causes are looked for in from an estimate: the same readings and unknowns,
 * but with nut and frets as a sound instrument has them ({@link Spread}), without the estimate's
 * patience for wild readings, and with clearances at fret 1 that follow a straight line across the
 * board, which the strings themselves set.
 *
 * <p>The estimate explains a fault by what it knows: a high slot by a hand that presses hard.
 * Slopes there are not those of the fault. So the model is made linear anew, twice, at the point
 * where causes have room ({@link Spread#FAULTY}).
 */
final class NeckCases {
  private static final int ROUNDS = 2;

  /**
   * Clearances at fret 1, m, standard deviation: the whole set's, and their fall from side to side.
   */
  private static final double GAPS = 2.5e-4;

  private static final double GAPS_ACROSS = 8e-5;

  /** One slot's edge against the others, m. */
  private static final double EDGE = 4e-5;

  private final NeckEstimate estimate;
  private final Gaps gaps;
  private final List<NeckCase.Row> rows;

  private NeckCases(NeckEstimate estimate) {
    this.estimate = estimate;
    this.gaps = new Gaps(estimate, estimate.linear());
    this.rows = rows(estimate.linear());
  }

  static NeckCase of(NeckEstimate estimate) {
    NeckCases cases = new NeckCases(estimate);
    Linear linear = estimate.linear();
    Straying even = Straying.even(estimate.strayCents());
    int rounds = linear.rows().isEmpty() ? 0 : ROUNDS;
    for (int round = 0; round < rounds; round++) {
      List<Double> point = new Build(cases, linear, Spread.FAULTY, even).likely();
      Optional<Linear> there = estimate.linear(point);
      if (there.isEmpty()) {
        break;
      }
      linear = there.get();
    }
    NeckCase first = new Build(cases, linear, Spread.SOUND, even).sound();
    Straying stray = Straying.of(first, estimate.strayCents());
    Build sound = new Build(cases, linear, Spread.SOUND, stray);
    return stray.together() ? sound.resounding(estimate).sound() : sound.sound();
  }

  private boolean low(int string, int fret) {
    double hz = estimate.lie(string).openHz() * EqualTemperament.ratio(fret);
    return hz < Straying.LOW_BELOW;
  }

  /** How often the note of a row was read in all; it strays alike each time. */
  private int timesRead(int row) {
    NeckCase.Row note = rows.get(row);
    return (int)
        rows.stream()
            .filter(one -> one.string() == note.string() && one.fret() == note.fret())
            .count();
  }

  private List<NeckCase.Row> rows(Linear linear) {
    List<NeckCase.Row> all = new ArrayList<>();
    for (Linear.Row row : linear.rows()) {
      Misfit misfit = row.misfit();
      all.add(
          new NeckCase.Row(
              misfit.string(), misfit.fret(), misfit.pass(), low(misfit.string(), misfit.fret())));
    }
    for (int string = 0; string < estimate.strings(); string++) {
      if (gaps.measured(string)) {
        all.add(new NeckCase.Row(string, NeckCase.HEIGHT, 0, false));
      }
    }
    return all;
  }

  /** One such problem. */
  private static final class Build {
    private final NeckCases cases;
    private final Linear linear;
    private final Spread spread;
    private final Straying stray;
    private final int notes;
    private final int count;
    private final double[] misfit;
    private final double[] sd;
    private final double[] nut;
    private final List<double[]> frets;
    private final List<double[]> slots;
    private final List<double[]> columns = new ArrayList<>();
    private final List<Double> columnSds = new ArrayList<>();

    Build(NeckCases cases, Linear linear, Spread spread, Straying stray) {
      this.cases = cases;
      this.linear = linear;
      this.spread = spread;
      this.stray = stray;
      this.notes = linear.rows().size();
      this.count = cases.rows.size();
      this.misfit = new double[count];
      this.sd = new double[count];
      this.nut = new double[count];
      this.frets = zeros(FretReading.LAST_FRET + 1);
      this.slots = zeros(cases.estimate.strings());
      double learned = cases.estimate.strayCents();
      for (int i = 0; i < notes; i++) {
        misfit[i] = linear.rows().get(i).misfit().residual();
        double read = linear.rows().get(i).misfit().sd();
        sd[i] = stray.in(read, learned, cases.rows.get(i).low(), cases.timesRead(i));
      }
      unknowns();
      heights();
      gapsInLine();
    }

    private List<double[]> zeros(int many) {
      List<double[]> all = new ArrayList<>();
      for (int i = 0; i < many; i++) {
        all.add(new double[count]);
      }
      return all;
    }

    /** All but the clearances at fret 1 last typed, which get a line of their own. */
    private void unknowns() {
      for (int k = 0; k < linear.unknowns().size(); k++) {
        Unknown unknown = linear.unknowns().get(k);
        double[] column = new double[count];
        for (int i = 0; i < notes; i++) {
          double slope = linear.rows().get(i).slope(k);
          column[i] = slope / unknown.sd();
          misfit[i] += slope * linear.point().get(k);
        }
        switch (unknown.kind()) {
          case NUT -> {
            add(nut, column, 1);
            unknown(column, spread.nut());
          }
          case FRET -> {
            add(frets.get(unknown.fret()), column, 1);
            unknown(column, spread.fret());
          }
          case GAP -> {
            boolean last = unknown.string() >= 0 && cases.gaps.isLast(k, unknown.string());
            if (last) {
              add(slots.get(unknown.string()), column, 1);
            }
            boolean replaced = last || unknown.string() < 0;
            unknown(replaced ? new double[count] : column, unknown.sd());
          }
          case SLOT -> unknown(column, edge(unknown.string()));
          default -> unknown(column, unknown.sd());
        }
      }
    }

    /** A slot's edge, and how the open string strays as every note does. */
    private double edge(int string) {
      return Math.hypot(
          EDGE,
          stray.alone(cases.low(string, 0)) / Cents.PER_UNIT * cases.estimate.lie(string).scale());
    }

    private void unknown(double[] column, double sd) {
      double[] scaled = new double[count];
      add(scaled, column, sd);
      columns.add(scaled);
      columnSds.add(sd);
    }

    /** The line is counted from the middle of what was typed; a measured clearance is a row. */
    private void heights() {
      double middle = cases.gaps.middle();
      for (int i = 0; i < count; i++) {
        int string = cases.rows.get(i).string();
        double off = cases.gaps.typed(string) - middle;
        if (i < notes) {
          misfit[i] += slots.get(string)[i] * off;
        } else {
          slots.get(string)[i] = 1;
          misfit[i] = off;
          sd[i] = cases.gaps.sd(string);
        }
      }
    }

    private void gapsInLine() {
      double[] all = new double[count];
      double[] across = new double[count];
      for (int string = 0; string < slots.size(); string++) {
        add(all, slots.get(string), 1);
        add(across, slots.get(string), NeckCase.across(string, slots.size()));
      }
      unknown(all, GAPS);
      unknown(across, GAPS_ACROSS);
      for (double[] slot : slots) {
        unknown(slot, spread.gap());
      }
    }

    /** With pitches that resound; those found loud may be louder still. */
    Build resounding(NeckEstimate estimate) {
      Resonances resonances = new Resonances(estimate, cases.rows);
      List<double[]> shapes = resonances.shapes();
      int first = columns.size();
      for (int i = 0; i < shapes.size(); i++) {
        unknown(shapes.get(i), stray.together(resonances.low().get(i)));
      }
      double[] likely = new LinearNeck(misfit, sd, turned()).likely();
      for (int i = 0; i < shapes.size(); i++) {
        double louder = Math.max(1, Math.abs(likely[first + i]) / LOUD);
        columns.set(first + i, times(columns.get(first + i), louder));
      }
      return this;
    }

    private double[] times(double[] column, double factor) {
      double[] times = new double[count];
      add(times, column, factor);
      return times;
    }

    NeckCase sound() {
      LinearNeck neck = new LinearNeck(misfit, sd, turned());
      return new NeckCase(cases.rows, neck, new NeckCase.Shapes(List.of(nut), frets, slots), stray);
    }

    /** The most likely point, counted as the estimate counts it. */
    List<Double> likely() {
      double[] patient = sd.clone();
      for (int i = 0; i < notes; i++) {
        patient[i] /= Math.sqrt(linear.rows().get(i).misfit().weight());
      }
      double[] likely = new LinearNeck(misfit, patient, turned()).likely();
      List<Double> point = new ArrayList<>();
      int known = linear.unknowns().size();
      for (int k = 0; k < known; k++) {
        Unknown unknown = linear.unknowns().get(k);
        boolean gap = unknown.kind() == Unknown.Kind.GAP;
        point.add(gap ? 0 : likely[k] * columnSds.get(k) / unknown.sd());
      }
      for (int string = 0; string < slots.size(); string++) {
        double gap =
            cases.gaps.middle()
                + likely[known] * GAPS
                + likely[known + 1] * GAPS_ACROSS * NeckCase.across(string, slots.size())
                + likely[known + 2 + string] * spread.gap();
        int own = cases.gaps.unknown(string);
        double off = Math.max(gap, LEAST_GAP) - cases.gaps.typed(string);
        point.set(own, off / linear.unknowns().get(own).sd());
      }
      return point;
    }

    private double[][] turned() {
      double[][] turned = new double[count][columns.size()];
      for (int k = 0; k < columns.size(); k++) {
        double[] column = columns.get(k);
        for (int i = 0; i < count; i++) {
          turned[i][k] = column[i];
        }
      }
      return turned;
    }

    private static void add(double[] to, double[] column, double times) {
      for (int i = 0; i < to.length; i++) {
        to[i] += times * column[i];
      }
    }
  }

  /** A pitch this many standard deviations off is given more room. */
  private static final double LOUD = 1.2;

  /** Below this clearance the model would press the string through the fret, m. */
  private static final double LEAST_GAP = 5e-5;
}
