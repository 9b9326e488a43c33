package sillet.desktop.visit.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import sillet.desktop.drawing.strings.Bridge;
import sillet.desktop.drawing.strings.FindingMark;
import sillet.desktop.drawing.strings.Lie;
import sillet.desktop.drawing.strings.StringRow;
import sillet.desktop.drawing.strings.StringsPicture;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.FindingSpot;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.strings.FittedString;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.StringPass;

/** Makes the picture of a pass. */
public final class VisitPicture {
  private static final int OCTAVE = 12;

  private final Instrument instrument;
  private final List<List<StringPass>> passes;
  private final int pass;
  private final ShownNeck shown;
  private final Texts texts;

  /**
   * A picture to be made.
   *
   * @param instrument what lies on the bench
   * @param passes every pass, in each the strings in order
   * @param pass the one that is looked at, from 1
   * @param shown which notes
   * @param texts the words
   */
  public VisitPicture(
      Instrument instrument,
      List<List<StringPass>> passes,
      int pass,
      ShownNeck shown,
      Texts texts) {
    this.instrument = instrument;
    this.passes = passes;
    this.pass = pass;
    this.shown = shown;
    this.texts = texts;
  }

  /**
   * Makes it.
   *
   * @param findings those not dealt with
   * @param turned head and foot about
   */
  public StringsPicture make(List<FindingLine> findings, boolean turned) {
    Bridge bridge = bridge();
    return new StringsPicture(
        rows(bridge instanceof Bridge.OnePiece),
        board(),
        bridge,
        Lie.of(instrument.neck().leftHanded(), turned),
        marks(findings),
        OptionalDouble.empty(),
        NutMarks.of(strings()));
  }

  private StringsPicture.Board board() {
    StringsPicture.Board board = StringsPicture.Board.of(instrument.neck().frets(), neckFrets());
    Integer open = shown.open();
    return open == null ? board : board.with(new StringsPicture.Column(open, shown.head()));
  }

  private List<StringPass> strings() {
    return passes.get(pass - 1);
  }

  private List<StringRow> rows(boolean fromFrontEdge) {
    List<FittedString> fitted = strings().stream().map(s -> s.string().string()).toList();
    List<Integer> courses = Courses.of(fitted);
    SaddleMarks saddles = new SaddleMarks(passes, pass, fromFrontEdge);
    List<StringRow> rows = new ArrayList<>();
    for (int row = 0; row < fitted.size(); row++) {
      FittedString string = fitted.get(row);
      StringPass before = pass > 1 ? passes.get(pass - 2).get(row) : null;
      rows.add(
          new StringRow(
              string.number(),
              string.pitch().typed(),
              Figures.gauge(string.make().gaugeIn()),
              string.make().gaugeIn(),
              courses.get(row),
              string.scaleMm(),
              ShortNut.startFret(string, instrument.neck()),
              new FretMarks(strings().get(row), before)
                  .at(shown.marked(instrument.neck().frets()), shown.open() != null),
              saddles.of(row)));
    }
    return rows;
  }

  /** Columns of cells along the neck; a short string has its own where its frets stand. */
  private List<Integer> neckFrets() {
    Set<Integer> along = new TreeSet<>();
    for (StringPass string : strings()) {
      int start = ShortNut.startFret(string.string().string(), instrument.neck());
      shown.cells().forEach(fret -> along.add(fret + start));
    }
    return List.copyOf(along);
  }

  private Bridge bridge() {
    Double thickness = instrument.saddle().thicknessMm();
    boolean placed = strings().stream().anyMatch(s -> s.string().room().forwardMm() != null);
    if (instrument.saddle().kind() == SaddleKind.ONE_PIECE && thickness != null && placed) {
      return new Bridge.OnePiece(
          thickness, texts.say("visit.sheet.front"), Figures.fixed(thickness, 1));
    }
    return new Bridge.SingleSaddles(Figures.fixed(instrument.neck().scaleTrebleMm(), 1));
  }

  private List<FindingMark> marks(List<FindingLine> findings) {
    List<FindingMark> marks = new ArrayList<>();
    for (int i = 0; i < findings.size(); i++) {
      FindingLine line = findings.get(i);
      if (line.spot().part() == FindingSpot.Part.NOWHERE) {
        continue;
      }
      if (line.strings().isEmpty()) {
        marks.add(new FindingMark(i + 1, FindingMark.ALL_STRINGS, place(line), line.head()));
      }
      for (int string : line.strings()) {
        marks.add(new FindingMark(i + 1, string - 1, place(line), line.head()));
      }
    }
    return marks;
  }

  private int place(FindingLine line) {
    return switch (line.spot().part()) {
      case SADDLE -> FindingMark.AT_SADDLE;
      case STRING -> FindingMark.ON_STRING;
      case FRET -> line.spot().fret();
      case NUT, NOWHERE -> 0;
      case NOTE -> line.spot().fret() > 0 ? line.spot().fret() : usualNote();
    };
  }

  /** A finding about the string's notes shows at the octave, or at the last fret one reads. */
  private int usualNote() {
    List<Integer> cells = shown.cells();
    return cells.contains(OCTAVE) ? OCTAVE : cells.get(cells.size() - 1);
  }
}
