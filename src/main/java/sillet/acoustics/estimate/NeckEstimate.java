package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.solve.Outcome;

/** What is known of an instrument after all its readings. Strings are counted from 0. */
public final class NeckEstimate {
  /** Highest fret of which a note is kept. */
  public static final int LAST_FRET = NotesNow.FRETS;

  private final Solution solution;
  private final List<NotesNow> notes;

  private NeckEstimate(Solution solution, List<NotesNow> notes) {
    this.solution = solution;
    this.notes = notes;
  }

  static Outcome<NeckEstimate> of(Solution solution) {
    List<NotesNow> notes = new ArrayList<>();
    for (OccasionModel now : solution.model().now()) {
      NotesNow string = NotesNow.of(solution, now);
      if (string == null) {
        return Outcome.notSolved("a string has no note at every fret");
      }
      notes.add(string);
    }
    return Outcome.solved(new NeckEstimate(solution, List.copyOf(notes)));
  }

  /** How many strings there are. */
  public int strings() {
    return notes.size();
  }

  /** What was typed and read of a string last. */
  public Occasion occasion(int string) {
    return solution.model().now().get(string).occasion();
  }

  /** Everything typed and read of a string, oldest first. */
  public List<Occasion> occasions(int string) {
    return solution.model().occasions().stream()
        .filter(one -> one.string() == string)
        .map(OccasionModel::occasion)
        .toList();
  }

  /** How a string most likely lies now. */
  public StringLie lie(int string) {
    return situation(string).lie();
  }

  /** The most likely situation of a string now, frets and finger included. */
  public StringSituation situation(int string) {
    OccasionModel now = solution.model().now().get(string);
    return now.situation(now.quantities(solution.point(), solution.sds()), solution.frets());
  }

  /**
   * The true note now against the open string, in cents: the reading where it was read, the model
   * where not, each as far as it is to be believed.
   *
   * @param fret 1 to {@value #LAST_FRET}
   */
  public Figure cents(int string, int fret) {
    NoteEstimate note = note(string, fret);
    double variance = solution.posterior().variance(note.slopes()) + note.ownVariance();
    return new Figure(note.cents(), Math.sqrt(variance));
  }

  /**
   * A weighted sum of true notes over all strings, with what they share in its sd.
   *
   * @param weights by string and by fret, index 0 of each row for fret 1; at most {@value
   *     #LAST_FRET} frets
   */
  public Figure weighed(double[][] weights) {
    double[] slopes = new double[solution.point().length];
    double value = 0;
    double own = 0;
    for (int string = 0; string < weights.length; string++) {
      for (int i = 0; i < weights[string].length; i++) {
        double weight = weights[string][i];
        if (weight != 0) {
          NoteEstimate note = note(string, i + 1);
          note.addTo(slopes, weight);
          value += weight * note.cents();
          own += weight * weight * note.ownVariance();
        }
      }
    }
    return new Figure(value, Math.sqrt(solution.posterior().variance(slopes) + own));
  }

  private NoteEstimate note(int string, int fret) {
    if (fret < 1 || fret > LAST_FRET) {
      throw new IllegalArgumentException("fret " + fret + " is not within 1 to " + LAST_FRET);
    }
    return notes.get(string).at(fret);
  }

  /**
   * Any figure of one string, by the delta method over every unknown that touches it: its value at
   * the most likely point and its sd. A note's own straying is not in it.
   *
   * @param figure smooth in the situation; gives a finite number near the most likely one
   * @throws IllegalArgumentException if it does not
   */
  public Figure figure(int string, ToDoubleFunction<StringSituation> figure) {
    return new DeltaMethod(solution, string).figure(figure);
  }

  /** Every reading against the estimate, string by string, oldest first. */
  public List<Misfit> misfits() {
    return misfits(solution.rows());
  }

  private List<Misfit> misfits(Linearized rows) {
    List<Misfit> misfits = new ArrayList<>();
    for (int row = 0; row < solution.noise().readings().count(); row++) {
      Readings.One one = solution.noise().readings().at(row);
      OccasionModel occasion = solution.model().occasions().get(one.occasion());
      misfits.add(
          new Misfit(
              occasion.string(),
              occasion.occasion().pass(),
              one.fret(),
              rows.residual(row),
              solution.noise().sd(row),
              solution.noise().weight(row)));
    }
    return List.copyOf(misfits);
  }

  /** How far notes of this instrument stray from smooth curves, cents (sd), as learned. */
  public double strayCents() {
    return solution.noise().stray();
  }

  /** Where the nut stands, m, positive away from the bridge, all strings together. */
  public Figure nutOffset() {
    return unknown(solution.model().unknowns().placeOf(Unknown.Kind.NUT, Unknown.SHARED, ""));
  }

  /** How far a fret lies from where the scale puts it, m, positive toward the bridge. */
  public Figure fretPlace(int fret) {
    int place = solution.model().unknowns().placeOfFret(fret);
    return place < 0 ? new Figure(0, Expectations.FRET_PLACE) : unknown(place);
  }

  private Figure unknown(int place) {
    double[] slopes = new double[solution.point().length];
    slopes[place] = solution.sds()[place];
    return new Figure(
        solution.sds()[place] * solution.point()[place],
        Math.sqrt(solution.posterior().variance(slopes)));
  }

  /** Clearance of the open string over fret 1, m. */
  public Figure gapAtFirst(int string) {
    return figure(string, situation -> situation.lie().clearances().atFirst());
  }

  /** Clearance of the open string over fret 12, m. */
  public Figure actionAtTwelve(int string) {
    return figure(string, situation -> situation.lie().clearances().atTwelve());
  }

  /** Axial stiffness as times what the packet says. */
  public Figure stiffnessFactor(int string) {
    double typed = occasion(string).lie().constants().axialStiffness();
    return typed == 0
        ? new Figure(1, 0)
        : figure(string, situation -> situation.lie().constants().axialStiffness() / typed);
  }

  /** Bending stiffness as times what the packet says. */
  public Figure bendingFactor(int string) {
    double typed = occasion(string).lie().constants().bendingStiffness();
    return typed == 0
        ? new Figure(1, 0)
        : figure(string, situation -> situation.lie().constants().bendingStiffness() / typed);
  }

  /** Where the saddle stands, m from its nominal place, positive away from the neck. */
  public Figure saddleSetback(int string) {
    return figure(string, situation -> situation.lie().saddleSetback());
  }

  /** The linear problem behind the estimate. */
  public Linear linear() {
    return Linear.of(misfits(), solution, solution.rows(), solution.point());
  }

  /**
   * The same problem made linear at another point; empty where a string cannot be tuned there.
   *
   * @param point of all unknowns, in the sds of {@link #linear()}
   */
  public Optional<Linear> linear(List<Double> point) {
    double[] there = point.stream().mapToDouble(Double::doubleValue).toArray();
    Linearized moved =
        Linearized.at(solution.model(), solution.noise().readings(), there, solution.sds());
    return moved == null
        ? Optional.empty()
        : Optional.of(Linear.of(misfits(moved), solution, moved, there));
  }
}
