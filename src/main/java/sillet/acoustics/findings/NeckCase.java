package sillet.acoustics.findings;

import java.util.List;

/**
 * All notes that were read on an instrument, linear about the most likely lie, and the shapes of
 * the causes looked for, as columns over the rows.
 */
final class NeckCase {
  /** The fret of a row that is no note but a clearance. */
  static final int HEIGHT = 0;

  private final List<Row> rows;
  private final LinearNeck linear;
  private final Shapes shapes;
  private final Straying stray;

  NeckCase(List<Row> rows, LinearNeck linear, Shapes shapes, Straying stray) {
    this.rows = rows;
    this.linear = linear;
    this.shapes = shapes;
    this.stray = stray;
  }

  List<Row> rows() {
    return rows;
  }

  /** The problem with nothing found. */
  LinearNeck linear() {
    return linear;
  }

  int strings() {
    return shapes.slots().size();
  }

  /** Cents per metre that the nut stands too far from the bridge. */
  double[] nut() {
    return shapes.nut().get(0);
  }

  /** Per fret, 0 unused: cents per metre that the fret lies toward the bridge. */
  List<double[]> frets() {
    return shapes.frets();
  }

  /** Per string: cents (and metres of measured clearance) per metre of clearance at fret 1. */
  List<double[]> slots() {
    return shapes.slots();
  }

  /** Columns over the rows. */
  record Shapes(List<double[]> nut, List<double[]> frets, List<double[]> slots) {}

  /**
   * One row.
   *
   * @param string from 0
   * @param fret from 1; {@link #HEIGHT} = a clearance that was measured
   * @param pass number of the round
   * @param low whether the note lies where a guitar's top resounds most
   */
  record Row(int string, int fret, int pass, boolean low) {}

  /** Whether the top resounds at single pitches. */
  boolean resounds() {
    return stray.together();
  }

  /** Whether a string's clearance at fret 1 was measured. */
  boolean gapMeasured(int string) {
    return rows.stream().anyMatch(row -> row.string == string && row.fret == HEIGHT);
  }

  /** Which rows are notes of a string. */
  boolean[] rowsOf(int string) {
    boolean[] own = new boolean[rows.size()];
    for (int i = 0; i < own.length; i++) {
      own[i] = rows.get(i).string == string && rows.get(i).fret != HEIGHT;
    }
    return own;
  }

  /** Which rows are low or high notes of a string. */
  boolean[] rowsOf(int string, boolean low) {
    boolean[] own = rowsOf(string);
    for (int i = 0; i < own.length; i++) {
      own[i] &= rows.get(i).low == low;
    }
    return own;
  }

  /** How many different frets of a string were read. */
  int fretsOf(int string) {
    return (int)
        rows.stream().filter(row -> isNote(row, string)).mapToInt(Row::fret).distinct().count();
  }

  /** Lowest fret read of a string; a very high one where none was. */
  int lowestFret(int string) {
    return rows.stream()
        .filter(row -> isNote(row, string))
        .mapToInt(Row::fret)
        .min()
        .orElse(Integer.MAX_VALUE);
  }

  /** How many strings were read at so many frets or more. */
  int stringsWith(int fewestFrets) {
    int count = 0;
    for (int string = 0; string < strings(); string++) {
      count += fretsOf(string) >= fewestFrets ? 1 : 0;
    }
    return count;
  }

  /** On how many strings a fret was read. */
  int stringsReadAt(int fret) {
    return (int)
        rows.stream().filter(row -> row.fret == fret).mapToInt(Row::string).distinct().count();
  }

  /** A shape times the place across the board, from -1 at the first string to 1 at the last. */
  double[] acrossTheBoard(double[] shape) {
    double[] across = shape.clone();
    for (int i = 0; i < across.length; i++) {
      across[i] *= across(rows.get(i).string, strings());
    }
    return across;
  }

  /** The part of a shape that belongs to one string. */
  double[] ofString(double[] shape, int string) {
    double[] own = shape.clone();
    for (int i = 0; i < own.length; i++) {
      own[i] = rows.get(i).string == string ? own[i] : 0;
    }
    return own;
  }

  /** Whether a string was read at a fret. */
  boolean reads(int string, int fret) {
    return rows.stream().anyMatch(row -> isNote(row, string) && row.fret == fret);
  }

  /** Place of a string across the board, -1 to 1. */
  static double across(int string, int strings) {
    return strings == 1 ? 0 : 2.0 * string / (strings - 1) - 1;
  }

  /** Cents of one string for a mass that swings by the whole of itself. */
  double[] ripple(int string, int wave, boolean cosine) {
    double[] shape = new double[rows.size()];
    for (int i = 0; i < shape.length; i++) {
      Row row = rows.get(i);
      shape[i] = isNote(row, string) ? RippleShapes.cents(wave, cosine, row.fret) : 0;
    }
    return shape;
  }

  private static boolean isNote(Row row, int string) {
    return row.string == string && row.fret != HEIGHT;
  }
}
