package sillet.desktop.drawing.strings;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Invented instruments to draw. No maker, no person, no real set. */
final class Samples {
  static final List<Integer> FRETS = List.of(1, 5, 12, 17);

  private Samples() {}

  static StringRow row(int number, String note, double gaugeIn, double scaleMm) {
    return new StringRow(number, note, gauge(gaugeIn), gaugeIn, 0, scaleMm, 0, List.of(), null);
  }

  private static String gauge(double gaugeIn) {
    return String.format(java.util.Locale.ROOT, "%.3f", gaugeIn).substring(1);
  }

  static StringRow with(StringRow row, SaddleMark saddle, FretMark... frets) {
    return new StringRow(
        row.number(),
        row.note(),
        row.gauge(),
        row.gaugeIn(),
        row.course(),
        row.scaleMm(),
        row.startFret(),
        List.of(frets),
        saddle);
  }

  static StringRow inCourse(StringRow row, int course) {
    return new StringRow(
        row.number(),
        row.note(),
        row.gauge(),
        row.gaugeIn(),
        course,
        row.scaleMm(),
        row.startFret(),
        row.frets(),
        row.saddle());
  }

  static FretMark[] readings(double... cents) {
    FretMark[] marks = new FretMark[cents.length];
    for (int i = 0; i < cents.length; i++) {
      FretMark mark =
          Double.isNaN(cents[i])
              ? FretMark.unread(FRETS.get(i))
              : FretMark.read(FRETS.get(i), cents[i]);
      boolean truth = Math.abs(cents[i]) <= 1;
      marks[i] = Double.isNaN(cents[i]) || truth ? mark : mark.expecting(i == 0 ? 6.2 : i - 1.5);
    }
    return marks;
  }

  private static StringsPicture picture(List<StringRow> rows, int frets, Lie lie) {
    return new StringsPicture(
        rows,
        StringsPicture.Board.of(frets, FRETS),
        new Bridge.SingleSaddles("648.0"),
        lie,
        List.of(),
        OptionalDouble.of(52.5));
  }

  private static SaddleMark saddle(double now) {
    return SaddleMark.at(now).within(-1, 7);
  }

  static List<StringRow> sixRows() {
    return List.of(
        with(
            row(1, "E4", 0.010, 648),
            saddle(0.4).to(2.26, 2.05, 2.47),
            readings(0.6, 1.8, 5.0, 8.4)),
        with(
            row(2, "Bb3", 0.013, 648),
            saddle(1).to(2.19, 1.96, 2.42),
            readings(6.4, 2.6, 3.2, 5.1)),
        with(
            row(3, "F#3", 0.017, 648),
            saddle(0.2).to(3.08, 2.81, 3.35),
            readings(0.9, 2.6, 7.8, 12.9)),
        with(row(4, "D3", 0.026, 648), saddle(1.9).leave(1.8, 2.2), readings(0.4, 0.2, 0.3, 0.6)),
        with(
            row(5, "A2", 0.036, 648),
            saddle(1.9).to(2.68, 2.46, 2.9),
            readings(0.3, 0.8, 2.1, 3.4)),
        with(
            row(6, "E2", 0.046, 648),
            saddle(4.55).to(3.6, 3.35, 3.84),
            readings(-0.3, -0.9, -2.6, -4.1)));
  }

  static StringsPicture six() {
    return six(Lie.USUAL);
  }

  static StringsPicture six(Lie lie) {
    StringsPicture plain = picture(sixRows(), 22, lie);
    return new StringsPicture(
        plain.rows(),
        plain.board(),
        plain.bridge(),
        lie,
        List.of(new FindingMark(1, 1, 1, "Nut slot high, string 2")),
        plain.spreadMm());
  }

  /** The same after the move: old places, stale readings, an unread string, nothing to do. */
  static StringsPicture secondPass() {
    List<StringRow> rows =
        List.of(
            with(row(1, "E4", 0.010, 648), saddle(2.26).from(0.4), after(5, 0.3, 0.2, 0.1, 0.3)),
            with(row(2, "Bb3", 0.013, 648), saddle(2.19).from(1), stale(6.1, 1.4, -0.2, -0.4)),
            with(row(3, "F#3", 0.017, 648), saddle(3.08).from(0.2), after(7.8, 0.5, 0.6, 1.6, 2.5)),
            with(
                row(4, "D3", 0.026, 648),
                saddle(1.9).leave(1.8, 2.2),
                after(0.3, 0.4, 0.2, 0.3, 0.6)),
            with(
                row(5, "A2", 0.036, 648),
                saddle(2.68).from(1.9),
                after(2.1, Double.NaN, Double.NaN, 0.4, Double.NaN)),
            with(
                row(6, "E2", 0.046, 648),
                saddle(3.6).from(4.55),
                after(-2.6, Double.NaN, Double.NaN, Double.NaN, Double.NaN)));
    return picture(rows, 22, Lie.USUAL);
  }

  private static FretMark[] after(double before, double... cents) {
    FretMark[] marks = readings(cents);
    for (int i = 0; i < marks.length; i++) {
      Double seen = marks[i].cents();
      double past = i < 2 ? before / 4 : before * (i - 1);
      marks[i] = new FretMark(marks[i].fret(), seen, null, past, false);
    }
    return marks;
  }

  private static FretMark[] stale(double... cents) {
    FretMark[] marks = readings(cents);
    for (int i = 0; i < marks.length; i++) {
      marks[i] = marks[i].gone();
    }
    return marks;
  }

  static StringsPicture twelve() {
    String[] notes = {"E4", "E4", "B3", "B3", "G3", "G4", "D3", "D4", "A2", "A3", "E2", "E3"};
    double[] gauges = {
      0.010, 0.010, 0.013, 0.013, 0.017, 0.008, 0.026, 0.012, 0.036, 0.018, 0.046, 0.026
    };
    double[] moves = {0.78, 0.89, 1.22, 1.11, 1.7, -1.18, 0, -0.7, 0.52, 9, 9, 9};
    List<StringRow> rows = new ArrayList<>();
    for (int i = 0; i < 12; i++) {
      double now = 1.2 + Math.floor(i / 2.0) * 0.35;
      SaddleMark saddle = SaddleMark.at(now).within(-1, 7);
      boolean read = moves[i] < 9;
      double to = now + moves[i];
      if (read) {
        saddle =
            moves[i] == 0 ? saddle.leave(now - 0.1, now + 0.3) : saddle.to(to, to - 0.2, to + 0.2);
      }
      double twelve = read ? moves[i] * 2.7 : Double.NaN;
      double[] cents = {
        read ? 0.3 : Double.NaN, read ? 0.6 + 0.1 * i : Double.NaN, twelve, twelve * 1.6
      };
      rows.add(
          inCourse(with(row(i + 1, notes[i], gauges[i], 648), saddle, readings(cents)), i / 2 + 1));
    }
    StringsPicture plain = picture(rows, 22, Lie.USUAL);
    FindingMark finding = new FindingMark(1, 5, 1, "Nut slot high, string 6");
    return new StringsPicture(
        rows, plain.board(), plain.bridge(), Lie.USUAL, List.of(finding), OptionalDouble.of(51));
  }

  static StringsPicture bass() {
    List<StringRow> rows =
        List.of(
            bassRow(1, "G2", 0.045, 3),
            bassRow(2, "D2", 0.065, 4),
            bassRow(3, "A1", 0.085, 6),
            bassRow(4, "E1", 0.105, 9));
    return new StringsPicture(
        rows,
        StringsPicture.Board.of(20, FRETS),
        new Bridge.SingleSaddles("864.0"),
        Lie.USUAL,
        List.of(),
        OptionalDouble.of(57));
  }

  private static StringRow bassRow(int number, String note, double gauge, double now) {
    SaddleMark saddle = SaddleMark.at(now).within(-2, 14).to(now + 1.4, now + 1, now + 1.8);
    return with(row(number, note, gauge, 864), saddle, readings(0.2, 1.4, 3.1, 4.4));
  }

  /** Two strings want more than the bone has; one of them far more. */
  static StringsPicture onePiece() {
    List<StringRow> rows =
        List.of(
            file(row(1, "E4", 0.012, 645.2), 1.6, 2.08),
            file(row(2, "B3", 0.016, 645.2), 1.6, 2.67),
            file(row(3, "G3", 0.024, 645.2), 1.6, 0.57),
            with(
                row(4, "D3", 0.032, 645.2),
                SaddleMark.at(1.6).within(0.4, 2.8).leave(1.25, 1.67),
                readings(0.3, 0.1, -0.2, -0.4)),
            file(row(5, "A2", 0.042, 645.2), 1.6, 2.19),
            file(row(6, "E2", 0.053, 645.2), 1.6, 3.37));
    return new StringsPicture(
        rows,
        StringsPicture.Board.of(20, FRETS),
        new Bridge.OnePiece(3.2, "front", "3.2"),
        Lie.USUAL,
        List.of(new FindingMark(1, 5, FindingMark.AT_SADDLE, "Slot too far forward, string 6")),
        OptionalDouble.empty());
  }

  private static StringRow file(StringRow row, double now, double best) {
    SaddleMark saddle = SaddleMark.at(now).within(0.4, 2.8).to(best, best - 0.24, best + 0.24);
    double cents = (best - now) * 2.7;
    return with(row, saddle, readings(0.4, 0.7, cents, cents * 1.3));
  }

  static StringsPicture multiScale() {
    String[] notes = {"E4", "B3", "G3", "D3", "A2", "E2", "B1", "F#1"};
    double[] gauges = {0.010, 0.013, 0.017, 0.026, 0.036, 0.046, 0.060, 0.074};
    List<StringRow> rows = new ArrayList<>();
    for (int i = 0; i < 8; i++) {
      double now = 1 + 0.4 * i;
      rows.add(
          with(
              row(i + 1, notes[i], gauges[i], 648 + 38.0 * i / 7),
              saddle(now).to(now + 1, now + 0.8, now + 1.2),
              readings(0.4, 1.3, 2.7, 4.2)));
    }
    return new StringsPicture(
        rows,
        new StringsPicture.Board(24, FRETS, 7),
        new Bridge.SingleSaddles("nominal"),
        Lie.USUAL,
        List.of(),
        OptionalDouble.of(73.5));
  }
}
